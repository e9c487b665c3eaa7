ALTER TABLE `dispute_files` ADD PRIMARY KEY(`message_id`,`file_id`);--> statement-breakpoint
DROP INDEX `dispute_files_message` ON `dispute_files`;
