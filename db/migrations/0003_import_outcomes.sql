CREATE TABLE `import_documents` (
	`import_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`row_no` int NOT NULL,
	`side` varchar(8) NOT NULL,
	`reference` varchar(120),
	`outcome` varchar(10) NOT NULL,
	`shipment_id` char(36) character set ascii collate ascii_bin,
	`problem` longtext character set utf8mb4 collate utf8mb4_bin,
	CONSTRAINT `import_documents_import_id_row_no_pk` PRIMARY KEY(`import_id`,`row_no`)
);
--> statement-breakpoint
DROP INDEX `receipt_matches_state` ON `receipt_matches`;--> statement-breakpoint
ALTER TABLE `receipt_matches` MODIFY COLUMN `why` varchar(400) NOT NULL;--> statement-breakpoint
ALTER TABLE `imports` ADD `phase` varchar(12) DEFAULT 'read' NOT NULL;--> statement-breakpoint
ALTER TABLE `imports` ADD `totals` longtext character set utf8mb4 collate utf8mb4_bin;--> statement-breakpoint
ALTER TABLE `imports` ADD `confirmed_by` char(36) character set ascii collate ascii_bin;--> statement-breakpoint
ALTER TABLE `imports` ADD `confirmed_at` datetime(3);--> statement-breakpoint
ALTER TABLE `imports` ADD `ended_at` datetime(3);--> statement-breakpoint
ALTER TABLE `receipt_lines` ADD `damaged` bigint DEFAULT 0 NOT NULL;--> statement-breakpoint
ALTER TABLE `receipt_lines` ADD `dirty` bigint DEFAULT 0 NOT NULL;--> statement-breakpoint
ALTER TABLE `receipt_matches` ADD `import_id` char(36) character set ascii collate ascii_bin NOT NULL;--> statement-breakpoint
ALTER TABLE `receipt_matches` ADD `group_id` char(36) character set ascii collate ascii_bin NOT NULL;--> statement-breakpoint
ALTER TABLE `receipt_matches` ADD `problem` longtext character set utf8mb4 collate utf8mb4_bin;--> statement-breakpoint
ALTER TABLE `receipts` ADD `row_no` int NOT NULL;--> statement-breakpoint
ALTER TABLE `receipts` ADD CONSTRAINT `receipts_row` UNIQUE(`import_id`,`row_no`);--> statement-breakpoint
DROP INDEX `receipts_import` ON `receipts`;--> statement-breakpoint
ALTER TABLE `import_documents` ADD CONSTRAINT `import_documents_import_id_imports_id_fk` FOREIGN KEY (`import_id`) REFERENCES `imports`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `import_documents` ADD CONSTRAINT `import_documents_shipment_id_shipments_id_fk` FOREIGN KEY (`shipment_id`) REFERENCES `shipments`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX `import_documents_outcome` ON `import_documents` (`import_id`,`side`,`outcome`,`row_no`);--> statement-breakpoint
ALTER TABLE `imports` ADD CONSTRAINT `imports_confirmed_by_people_id_fk` FOREIGN KEY (`confirmed_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `receipt_matches` ADD CONSTRAINT `receipt_matches_import_id_imports_id_fk` FOREIGN KEY (`import_id`) REFERENCES `imports`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `receipt_matches` ADD CONSTRAINT `receipt_matches_shipment_id_shipments_id_fk` FOREIGN KEY (`shipment_id`) REFERENCES `shipments`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX `receipt_matches_shipment` ON `receipt_matches` (`shipment_id`);--> statement-breakpoint
CREATE INDEX `receipt_matches_group` ON `receipt_matches` (`group_id`);--> statement-breakpoint
CREATE INDEX `receipt_matches_import` ON `receipt_matches` (`import_id`,`state`,`rule`,`group_id`);--> statement-breakpoint
CREATE INDEX `receipts_import` ON `receipts` (`import_id`,`state`,`id`);