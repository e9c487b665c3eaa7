ALTER TABLE `disputes` DROP CONSTRAINT `disputes_claim_differs`;--> statement-breakpoint
ALTER TABLE `disputes` ADD `amount_claimed` decimal(19,4) DEFAULT '0.0000' NOT NULL;--> statement-breakpoint
ALTER TABLE `disputes` ADD `accepted_amount` decimal(19,4);--> statement-breakpoint
ALTER TABLE `disputes` ADD `open_key` varchar(90) character set utf8mb4 collate utf8mb4_bin;--> statement-breakpoint
ALTER TABLE `disputes` ADD `partner_mail_at` datetime(3);--> statement-breakpoint
ALTER TABLE `disputes` ADD `operator_mail_at` datetime(3);--> statement-breakpoint
ALTER TABLE `disputes` ADD CONSTRAINT `disputes_open_key` UNIQUE(`open_key`);--> statement-breakpoint
ALTER TABLE `disputes` ADD CONSTRAINT `disputes_claim_differs` CHECK (stated <> claimed or amount_claimed > 0);