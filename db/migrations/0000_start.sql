CREATE TABLE `log` (
	`id` bigint AUTO_INCREMENT NOT NULL,
	`at` datetime(3) NOT NULL,
	`person_id` char(36) character set ascii collate ascii_bin,
	`company_id` char(36) character set ascii collate ascii_bin,
	`action` varchar(60) NOT NULL,
	`outcome` varchar(40) NOT NULL,
	`subject_kind` varchar(30),
	`subject_id` varchar(60),
	`detail` longtext character set utf8mb4 collate utf8mb4_bin,
	`request_id` varchar(60) NOT NULL,
	`address` varchar(60),
	CONSTRAINT `log_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `rate_limits` (
	`key` varchar(255) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`points` int NOT NULL DEFAULT 0,
	`expire` bigint unsigned,
	CONSTRAINT `rate_limits_key` PRIMARY KEY(`key`)
);
--> statement-breakpoint
CREATE TABLE `requests` (
	`person_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`key` varchar(80) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`operation` varchar(60) NOT NULL,
	`content_hash` varchar(64) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`status` smallint NOT NULL,
	`answer` longtext character set utf8mb4 collate utf8mb4_bin,
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `requests_person_id_key_pk` PRIMARY KEY(`person_id`,`key`)
);
--> statement-breakpoint
CREATE TABLE `sessions` (
	`session_id` varchar(128) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`expires` int unsigned NOT NULL,
	`data` longtext character set utf8mb4 collate utf8mb4_bin,
	CONSTRAINT `sessions_session_id` PRIMARY KEY(`session_id`)
);
--> statement-breakpoint
CREATE TABLE `companies` (
	`id` char(36) character set ascii collate ascii_bin NOT NULL,
	`kind` varchar(10) NOT NULL,
	`code` varchar(20) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`name` varchar(120) NOT NULL,
	`gln` varchar(13),
	`email` varchar(200),
	`address` varchar(300),
	`currency` varchar(3) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`language` varchar(5) NOT NULL DEFAULT 'en',
	`tax_rate` decimal(19,6) NOT NULL DEFAULT '0.000000',
	`tax_treatment` varchar(10) NOT NULL DEFAULT 'excluded',
	`objection_days` int NOT NULL DEFAULT 14,
	`auto_count_days` int NOT NULL DEFAULT 10,
	`overdue_after_days` int NOT NULL DEFAULT 7,
	`tolerance_units` int NOT NULL DEFAULT 0,
	`tolerance_pct` decimal(19,6) NOT NULL DEFAULT '0.000000',
	`active` boolean NOT NULL DEFAULT true,
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `companies_id` PRIMARY KEY(`id`),
	CONSTRAINT `companies_code` UNIQUE(`code`)
);
--> statement-breakpoint
CREATE TABLE `people` (
	`id` char(36) character set ascii collate ascii_bin NOT NULL,
	`company_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`email` varchar(200) NOT NULL,
	`name` varchar(120) NOT NULL,
	`password_hash` varchar(200),
	`language` varchar(5) NOT NULL DEFAULT 'en',
	`active` boolean NOT NULL DEFAULT true,
	`sessions_from` datetime(3) NOT NULL,
	`last_signed_in_at` datetime(3),
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `people_id` PRIMARY KEY(`id`),
	CONSTRAINT `people_email` UNIQUE(`email`)
);
--> statement-breakpoint
CREATE TABLE `person_roles` (
	`person_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`role` varchar(20) NOT NULL,
	CONSTRAINT `person_roles_person_id_role_pk` PRIMARY KEY(`person_id`,`role`)
);
--> statement-breakpoint
CREATE TABLE `person_tokens` (
	`id` char(36) character set ascii collate ascii_bin NOT NULL,
	`person_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`purpose` varchar(12) NOT NULL,
	`token_hash` varchar(64) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`expires_at` datetime(3) NOT NULL,
	`used_at` datetime(3),
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `person_tokens_id` PRIMARY KEY(`id`),
	CONSTRAINT `person_tokens_hash` UNIQUE(`token_hash`)
);
--> statement-breakpoint
CREATE TABLE `sites` (
	`id` char(36) character set ascii collate ascii_bin NOT NULL,
	`company_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`code` varchar(20) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`name` varchar(120) NOT NULL,
	`gln` varchar(13),
	`time_zone` varchar(60) NOT NULL,
	`active` boolean NOT NULL DEFAULT true,
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `sites_id` PRIMARY KEY(`id`),
	CONSTRAINT `sites_code` UNIQUE(`code`)
);
--> statement-breakpoint
CREATE TABLE `terms` (
	`id` char(36) character set ascii collate ascii_bin NOT NULL,
	`company_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`type_code` varchar(20) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`valid_from` date NOT NULL,
	`deposit` decimal(19,4) NOT NULL,
	`replacement` decimal(19,4) NOT NULL,
	`free_days` int NOT NULL,
	`daily_fee` decimal(19,6) NOT NULL,
	`lost_after_days` int,
	`useful_life_months` int NOT NULL,
	`residual_floor_pct` decimal(19,6) NOT NULL,
	`damage_fee` decimal(19,6) NOT NULL,
	`cleaning_fee` decimal(19,6) NOT NULL,
	`recovery_days` int NOT NULL,
	`created_by` char(36) character set ascii collate ascii_bin,
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `terms_id` PRIMARY KEY(`id`),
	CONSTRAINT `terms_version` UNIQUE(`company_id`,`type_code`,`valid_from`)
);
--> statement-breakpoint
CREATE TABLE `container_types` (
	`code` varchar(20) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`name` varchar(80) NOT NULL,
	`kind` varchar(10) NOT NULL,
	`length_mm` int NOT NULL,
	`width_mm` int NOT NULL,
	`height_mm` int NOT NULL,
	`tare_kg` decimal(8,3) NOT NULL,
	`payload_kg` decimal(8,1) NOT NULL,
	`stack_limit` int NOT NULL,
	`units_per_stack` int NOT NULL DEFAULT 1,
	`grai_asset_type` varchar(14),
	`in_service_from` date NOT NULL,
	`replacement` decimal(19,4) NOT NULL,
	`useful_life_months` int NOT NULL,
	`note` varchar(300) NOT NULL DEFAULT '',
	`active` boolean NOT NULL DEFAULT true,
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `container_types_code` PRIMARY KEY(`code`)
);
--> statement-breakpoint
CREATE TABLE `packed_with` (
	`type_code` varchar(20) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`with_type_code` varchar(20) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`quantity` int NOT NULL,
	CONSTRAINT `packed_with_type_code_with_type_code_pk` PRIMARY KEY(`type_code`,`with_type_code`)
);
--> statement-breakpoint
CREATE TABLE `parts` (
	`id` char(36) character set ascii collate ascii_bin NOT NULL,
	`number` varchar(40) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`name` varchar(120) NOT NULL,
	`type_code` varchar(20) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`supplier_site_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`plant_site_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`units_per_container` int NOT NULL,
	`units_per_day_mean` decimal(19,6) NOT NULL,
	`units_per_day_sd` decimal(19,6) NOT NULL,
	`active` boolean NOT NULL DEFAULT true,
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `parts_id` PRIMARY KEY(`id`),
	CONSTRAINT `parts_spec` UNIQUE(`number`,`supplier_site_id`,`plant_site_id`)
);
--> statement-breakpoint
CREATE TABLE `pool_approvals` (
	`id` char(36) character set ascii collate ascii_bin NOT NULL,
	`type_code` varchar(20) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`size` int NOT NULL,
	`input` longtext character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`result` longtext character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`levels` longtext character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`note` varchar(300) NOT NULL DEFAULT '',
	`approved_by` char(36) character set ascii collate ascii_bin NOT NULL,
	`approved_at` datetime(3) NOT NULL,
	CONSTRAINT `pool_approvals_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `pool_plans` (
	`type_code` varchar(20) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`travel` varchar(12) NOT NULL,
	`legs` longtext character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`buffer_days` decimal(19,6) NOT NULL,
	`cover_probability` decimal(19,6) NOT NULL,
	`held_pct` decimal(19,6) NOT NULL,
	`repair_pct` decimal(19,6) NOT NULL,
	`loss_per_trip_pct` decimal(19,6) NOT NULL,
	`working_days_per_year` int NOT NULL,
	`changed_by` char(36) character set ascii collate ascii_bin,
	`changed_at` datetime(3) NOT NULL,
	CONSTRAINT `pool_plans_type_code` PRIMARY KEY(`type_code`)
);
--> statement-breakpoint
CREATE TABLE `differences` (
	`id` char(36) character set ascii collate ascii_bin NOT NULL,
	`shipment_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`count_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`type_code` varchar(20) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`declared` bigint NOT NULL,
	`counted` bigint NOT NULL,
	`open_units` bigint NOT NULL,
	`partner_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`at_stake` decimal(19,4) NOT NULL,
	`opened_on` date NOT NULL,
	`state` varchar(8) NOT NULL,
	`created_at` datetime(3) NOT NULL,
	`settled_at` datetime(3),
	CONSTRAINT `differences_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `dispute_files` (
	`message_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`file_id` char(36) character set ascii collate ascii_bin NOT NULL
);
--> statement-breakpoint
CREATE TABLE `dispute_messages` (
	`id` char(36) character set ascii collate ascii_bin NOT NULL,
	`dispute_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`step` varchar(20) NOT NULL,
	`text` varchar(4000) NOT NULL,
	`company_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`person_id` char(36) character set ascii collate ascii_bin,
	`at` datetime(3) NOT NULL,
	CONSTRAINT `dispute_messages_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `disputes` (
	`id` char(36) character set ascii collate ascii_bin NOT NULL,
	`company_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`subject` varchar(14) NOT NULL,
	`shipment_id` char(36) character set ascii collate ascii_bin,
	`count_id` char(36) character set ascii collate ascii_bin,
	`type_code` varchar(20) character set utf8mb4 collate utf8mb4_bin,
	`statement_id` char(36) character set ascii collate ascii_bin,
	`statement_line_id` char(36) character set ascii collate ascii_bin,
	`stated` bigint NOT NULL,
	`claimed` bigint NOT NULL,
	`reason` varchar(20) NOT NULL,
	`state` varchar(20) NOT NULL,
	`amount_held` decimal(19,4) NOT NULL,
	`accepted_units` bigint,
	`opened_by` char(36) character set ascii collate ascii_bin,
	`opened_at` datetime(3) NOT NULL,
	`last_word_at` datetime(3) NOT NULL,
	`closed_by` char(36) character set ascii collate ascii_bin,
	`closed_at` datetime(3),
	CONSTRAINT `disputes_id` PRIMARY KEY(`id`),
	CONSTRAINT `disputes_claim_differs` CHECK(stated <> claimed)
);
--> statement-breakpoint
CREATE TABLE `settlements` (
	`id` char(36) character set ascii collate ascii_bin NOT NULL,
	`difference_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`way` varchar(24) NOT NULL,
	`units` bigint NOT NULL,
	`bearer_company_id` char(36) character set ascii collate ascii_bin,
	`swapped_with_id` char(36) character set ascii collate ascii_bin,
	`entry_id` bigint NOT NULL,
	`reason` varchar(500) NOT NULL,
	`settled_by` char(36) character set ascii collate ascii_bin,
	`settled_at` datetime(3) NOT NULL,
	CONSTRAINT `settlements_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `files` (
	`id` char(36) character set ascii collate ascii_bin NOT NULL,
	`company_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`name` varchar(200) NOT NULL,
	`media_type` varchar(100) NOT NULL,
	`bytes` bigint NOT NULL,
	`sha256` varchar(64) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`uploaded_by` char(36) character set ascii collate ascii_bin,
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `files_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `accounts` (
	`id` bigint AUTO_INCREMENT NOT NULL,
	`kind` varchar(10) NOT NULL,
	`site_id` char(36) character set ascii collate ascii_bin,
	`shipment_id` char(36) character set ascii collate ascii_bin,
	`company_id` char(36) character set ascii collate ascii_bin,
	CONSTRAINT `accounts_id` PRIMARY KEY(`id`),
	CONSTRAINT `accounts_site` UNIQUE(`site_id`),
	CONSTRAINT `accounts_shipment` UNIQUE(`shipment_id`)
);
--> statement-breakpoint
CREATE TABLE `balances` (
	`account_id` bigint NOT NULL,
	`type_code` varchar(20) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`units` bigint NOT NULL,
	CONSTRAINT `balances_account_id_type_code_pk` PRIMARY KEY(`account_id`,`type_code`)
);
--> statement-breakpoint
CREATE TABLE `daily_nets` (
	`account_id` bigint NOT NULL,
	`type_code` varchar(20) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`day` date NOT NULL,
	`net` bigint NOT NULL,
	CONSTRAINT `daily_nets_account_id_type_code_day_pk` PRIMARY KEY(`account_id`,`type_code`,`day`)
);
--> statement-breakpoint
CREATE TABLE `ledger_entries` (
	`id` bigint AUTO_INCREMENT NOT NULL,
	`kind` varchar(24) NOT NULL,
	`value_date` date NOT NULL,
	`recorded_at` datetime(3) NOT NULL DEFAULT (utc_timestamp(3)),
	`shipment_id` char(36) character set ascii collate ascii_bin,
	`count_id` char(36) character set ascii collate ascii_bin,
	`difference_id` char(36) character set ascii collate ascii_bin,
	`dispute_id` char(36) character set ascii collate ascii_bin,
	`corrects_entry_id` bigint,
	`reason` varchar(500) NOT NULL DEFAULT '',
	`person_id` char(36) character set ascii collate ascii_bin,
	CONSTRAINT `ledger_entries_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `ledger_lines` (
	`entry_id` bigint NOT NULL,
	`line_no` int NOT NULL,
	`type_code` varchar(20) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`from_account_id` bigint NOT NULL,
	`to_account_id` bigint NOT NULL,
	`units` bigint NOT NULL,
	`value_date` date NOT NULL,
	`charged_company_id` char(36) character set ascii collate ascii_bin,
	CONSTRAINT `ledger_lines_entry_id_line_no_pk` PRIMARY KEY(`entry_id`,`line_no`),
	CONSTRAINT `ledger_lines_positive` CHECK(units > 0 and units <= 1000000000),
	CONSTRAINT `ledger_lines_moves` CHECK(from_account_id <> to_account_id)
);
--> statement-breakpoint
CREATE TABLE `ledger_seals` (
	`through_entry_id` bigint NOT NULL,
	`hash` varchar(64) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`sealed_at` datetime(3) NOT NULL,
	CONSTRAINT `ledger_seals_through_entry_id` PRIMARY KEY(`through_entry_id`)
);
--> statement-breakpoint
CREATE TABLE `partner_events` (
	`id` bigint AUTO_INCREMENT NOT NULL,
	`company_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`date` date NOT NULL,
	`type_code` varchar(20) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`kind` varchar(10) NOT NULL,
	`quantity` bigint NOT NULL,
	`corrects_id` bigint,
	`entry_id` bigint,
	`count_id` char(36) character set ascii collate ascii_bin,
	`shipment_id` char(36) character set ascii collate ascii_bin,
	`dispute_id` char(36) character set ascii collate ascii_bin,
	`cause` varchar(200) NOT NULL DEFAULT '',
	`recorded_at` datetime(3) NOT NULL DEFAULT (utc_timestamp(3)),
	CONSTRAINT `partner_events_id` PRIMARY KEY(`id`),
	CONSTRAINT `partner_events_quantity` CHECK(quantity <> 0 and (kind = 'corrected' or quantity > 0)),
	CONSTRAINT `partner_events_corrects` CHECK((kind = 'corrected') = (corrects_id is not null))
);
--> statement-breakpoint
CREATE TABLE `reference_numbers` (
	`number` bigint AUTO_INCREMENT NOT NULL,
	`taken_at` datetime(3) NOT NULL,
	CONSTRAINT `reference_numbers_number` PRIMARY KEY(`number`)
);
--> statement-breakpoint
CREATE TABLE `count_lines` (
	`count_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`type_code` varchar(20) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`counted` bigint NOT NULL,
	`damaged` bigint NOT NULL,
	`dirty` bigint NOT NULL,
	CONSTRAINT `count_lines_count_id_type_code_pk` PRIMARY KEY(`count_id`,`type_code`)
);
--> statement-breakpoint
CREATE TABLE `count_photos` (
	`count_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`file_id` char(36) character set ascii collate ascii_bin NOT NULL,
	CONSTRAINT `count_photos_count_id_file_id_pk` PRIMARY KEY(`count_id`,`file_id`)
);
--> statement-breakpoint
CREATE TABLE `counts` (
	`id` char(36) character set ascii collate ascii_bin NOT NULL,
	`shipment_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`sequence` int NOT NULL,
	`counted_on` date NOT NULL,
	`source` varchar(10) NOT NULL,
	`note` varchar(300) NOT NULL DEFAULT '',
	`counted_by` char(36) character set ascii collate ascii_bin,
	`counted_at` datetime(3) NOT NULL,
	CONSTRAINT `counts_id` PRIMARY KEY(`id`),
	CONSTRAINT `counts_sequence` UNIQUE(`shipment_id`,`sequence`)
);
--> statement-breakpoint
CREATE TABLE `shipment_lines` (
	`shipment_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`type_code` varchar(20) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`declared` bigint NOT NULL,
	CONSTRAINT `shipment_lines_shipment_id_type_code_pk` PRIMARY KEY(`shipment_id`,`type_code`)
);
--> statement-breakpoint
CREATE TABLE `shipments` (
	`id` char(36) character set ascii collate ascii_bin NOT NULL,
	`reference` varchar(40) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`contents` varchar(10) NOT NULL,
	`from_site_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`to_site_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`from_company_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`to_company_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`left_on` date NOT NULL,
	`expected_on` date NOT NULL,
	`state` varchar(12) NOT NULL,
	`origin` varchar(12) NOT NULL,
	`note` varchar(300) NOT NULL DEFAULT '',
	`import_id` char(36) character set ascii collate ascii_bin,
	`created_by` char(36) character set ascii collate ascii_bin,
	`created_at` datetime(3) NOT NULL,
	`counted_at` datetime(3),
	`counted_on` date,
	`counted_by` char(36) character set ascii collate ascii_bin,
	CONSTRAINT `shipments_id` PRIMARY KEY(`id`),
	CONSTRAINT `shipments_reference` UNIQUE(`from_company_id`,`reference`)
);
--> statement-breakpoint
CREATE TABLE `credits` (
	`id` char(36) character set ascii collate ascii_bin NOT NULL,
	`company_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`type_code` varchar(20) character set utf8mb4 collate utf8mb4_bin,
	`amount` decimal(19,4) NOT NULL,
	`reason` varchar(500) NOT NULL,
	`dispute_id` char(36) character set ascii collate ascii_bin,
	`month` char(7) character set ascii collate ascii_bin NOT NULL,
	`created_by` char(36) character set ascii collate ascii_bin,
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `credits_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `months` (
	`month` char(7) character set ascii collate ascii_bin NOT NULL,
	`state` varchar(8) NOT NULL,
	`closed_by` char(36) character set ascii collate ascii_bin,
	`closed_at` datetime(3),
	`reason` varchar(500) NOT NULL DEFAULT '',
	CONSTRAINT `months_month` PRIMARY KEY(`month`)
);
--> statement-breakpoint
CREATE TABLE `statement_lines` (
	`id` char(36) character set ascii collate ascii_bin NOT NULL,
	`statement_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`line_no` int NOT NULL,
	`component` varchar(20) NOT NULL,
	`account_month` char(7) character set ascii collate ascii_bin NOT NULL,
	`type_code` varchar(20) character set utf8mb4 collate utf8mb4_bin,
	`quantity` bigint NOT NULL,
	`rate` decimal(19,6),
	`reckoned_from` longtext character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`amount` decimal(19,4) NOT NULL,
	CONSTRAINT `statement_lines_id` PRIMARY KEY(`id`),
	CONSTRAINT `statement_lines_no` UNIQUE(`statement_id`,`line_no`)
);
--> statement-breakpoint
CREATE TABLE `statement_steps` (
	`id` bigint AUTO_INCREMENT NOT NULL,
	`statement_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`step` varchar(24) NOT NULL,
	`person_id` char(36) character set ascii collate ascii_bin,
	`at` datetime(3) NOT NULL,
	CONSTRAINT `statement_steps_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `statements` (
	`id` char(36) character set ascii collate ascii_bin NOT NULL,
	`company_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`month` char(7) character set ascii collate ascii_bin NOT NULL,
	`number` varchar(40) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`currency` varchar(3) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`state` varchar(8) NOT NULL,
	`payable` decimal(19,4) NOT NULL,
	`tax` decimal(19,4) NOT NULL,
	`content` longtext character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`sha256` varchar(64) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`workbook_file_id` char(36) character set ascii collate ascii_bin,
	`issued_by` char(36) character set ascii collate ascii_bin,
	`issued_at` datetime(3),
	`objection_until` date,
	`answer` varchar(22) NOT NULL,
	`answered_by` char(36) character set ascii collate ascii_bin,
	`answered_at` datetime(3),
	`reminded_at` datetime(3),
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `statements_id` PRIMARY KEY(`id`),
	CONSTRAINT `statements_month` UNIQUE(`company_id`,`month`),
	CONSTRAINT `statements_number` UNIQUE(`number`)
);
--> statement-breakpoint
CREATE TABLE `import_rows` (
	`import_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`row_no` int NOT NULL,
	`cells` longtext character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`problems` longtext character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`bad` int NOT NULL,
	CONSTRAINT `import_rows_import_id_row_no_pk` PRIMARY KEY(`import_id`,`row_no`)
);
--> statement-breakpoint
CREATE TABLE `imports` (
	`id` char(36) character set ascii collate ascii_bin NOT NULL,
	`file_name` varchar(200) NOT NULL,
	`state` varchar(10) NOT NULL,
	`rows_good` int NOT NULL,
	`rows_bad` int NOT NULL,
	`job_id` char(36) character set ascii collate ascii_bin,
	`result` longtext character set utf8mb4 collate utf8mb4_bin,
	`created_by` char(36) character set ascii collate ascii_bin,
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `imports_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `jobs` (
	`id` char(36) character set ascii collate ascii_bin NOT NULL,
	`kind` varchar(40) NOT NULL,
	`payload` longtext character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`state` varchar(10) NOT NULL,
	`done` int NOT NULL DEFAULT 0,
	`total` int NOT NULL DEFAULT 0,
	`result` longtext character set utf8mb4 collate utf8mb4_bin,
	`problem` varchar(500),
	`attempts` int NOT NULL DEFAULT 0,
	`claimed_until` datetime(3),
	`once_key` varchar(120) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`company_id` char(36) character set ascii collate ascii_bin,
	`created_by` char(36) character set ascii collate ascii_bin,
	`created_at` datetime(3) NOT NULL,
	`ended_at` datetime(3),
	CONSTRAINT `jobs_id` PRIMARY KEY(`id`),
	CONSTRAINT `jobs_once` UNIQUE(`once_key`)
);
--> statement-breakpoint
CREATE TABLE `outbox` (
	`id` char(36) character set ascii collate ascii_bin NOT NULL,
	`kind` varchar(40) NOT NULL,
	`to_name` varchar(120) NOT NULL,
	`to_address` varchar(200) NOT NULL,
	`subject` varchar(200) NOT NULL,
	`text` varchar(8000) NOT NULL,
	`message_id` varchar(120) NOT NULL,
	`state` varchar(10) NOT NULL,
	`attempts` int NOT NULL DEFAULT 0,
	`not_before` datetime(3) NOT NULL,
	`claimed_until` datetime(3),
	`problem` varchar(300),
	`sent_at` datetime(3),
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `outbox_id` PRIMARY KEY(`id`),
	CONSTRAINT `outbox_message` UNIQUE(`message_id`)
);
--> statement-breakpoint
CREATE TABLE `receipt_lines` (
	`receipt_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`type_code` varchar(20) character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`counted` bigint NOT NULL,
	CONSTRAINT `receipt_lines_receipt_id_type_code_pk` PRIMARY KEY(`receipt_id`,`type_code`)
);
--> statement-breakpoint
CREATE TABLE `receipt_matches` (
	`id` char(36) character set ascii collate ascii_bin NOT NULL,
	`receipt_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`shipment_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`state` varchar(10) NOT NULL,
	`rule` varchar(24) NOT NULL,
	`score` int NOT NULL,
	`why` varchar(300) NOT NULL,
	`decided_by` char(36) character set ascii collate ascii_bin,
	`decided_at` datetime(3),
	CONSTRAINT `receipt_matches_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `receipts` (
	`id` char(36) character set ascii collate ascii_bin NOT NULL,
	`import_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`reference` varchar(120),
	`from_site_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`to_site_id` char(36) character set ascii collate ascii_bin NOT NULL,
	`counted_on` date NOT NULL,
	`state` varchar(12) NOT NULL,
	`rule` varchar(24),
	`duplicate_of` char(36) character set ascii collate ascii_bin,
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `receipts_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `schedule_slots` (
	`name` varchar(40) NOT NULL,
	`slot` varchar(30) NOT NULL,
	`taken_at` datetime(3) NOT NULL,
	CONSTRAINT `schedule_slots_name_slot_pk` PRIMARY KEY(`name`,`slot`)
);
--> statement-breakpoint
ALTER TABLE `people` ADD CONSTRAINT `people_company_id_companies_id_fk` FOREIGN KEY (`company_id`) REFERENCES `companies`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `person_roles` ADD CONSTRAINT `person_roles_person_id_people_id_fk` FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `person_tokens` ADD CONSTRAINT `person_tokens_person_id_people_id_fk` FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `sites` ADD CONSTRAINT `sites_company_id_companies_id_fk` FOREIGN KEY (`company_id`) REFERENCES `companies`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `terms` ADD CONSTRAINT `terms_company_id_companies_id_fk` FOREIGN KEY (`company_id`) REFERENCES `companies`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `terms` ADD CONSTRAINT `terms_created_by_people_id_fk` FOREIGN KEY (`created_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `packed_with` ADD CONSTRAINT `packed_with_type_code_container_types_code_fk` FOREIGN KEY (`type_code`) REFERENCES `container_types`(`code`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `packed_with` ADD CONSTRAINT `packed_with_with_type_code_container_types_code_fk` FOREIGN KEY (`with_type_code`) REFERENCES `container_types`(`code`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `parts` ADD CONSTRAINT `parts_type_code_container_types_code_fk` FOREIGN KEY (`type_code`) REFERENCES `container_types`(`code`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `parts` ADD CONSTRAINT `parts_supplier_site_id_sites_id_fk` FOREIGN KEY (`supplier_site_id`) REFERENCES `sites`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `parts` ADD CONSTRAINT `parts_plant_site_id_sites_id_fk` FOREIGN KEY (`plant_site_id`) REFERENCES `sites`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `pool_approvals` ADD CONSTRAINT `pool_approvals_type_code_container_types_code_fk` FOREIGN KEY (`type_code`) REFERENCES `container_types`(`code`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `pool_approvals` ADD CONSTRAINT `pool_approvals_approved_by_people_id_fk` FOREIGN KEY (`approved_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `pool_plans` ADD CONSTRAINT `pool_plans_type_code_container_types_code_fk` FOREIGN KEY (`type_code`) REFERENCES `container_types`(`code`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `pool_plans` ADD CONSTRAINT `pool_plans_changed_by_people_id_fk` FOREIGN KEY (`changed_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `differences` ADD CONSTRAINT `differences_shipment_id_shipments_id_fk` FOREIGN KEY (`shipment_id`) REFERENCES `shipments`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `differences` ADD CONSTRAINT `differences_count_id_counts_id_fk` FOREIGN KEY (`count_id`) REFERENCES `counts`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `differences` ADD CONSTRAINT `differences_partner_id_companies_id_fk` FOREIGN KEY (`partner_id`) REFERENCES `companies`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `dispute_files` ADD CONSTRAINT `dispute_files_message_id_dispute_messages_id_fk` FOREIGN KEY (`message_id`) REFERENCES `dispute_messages`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `dispute_files` ADD CONSTRAINT `dispute_files_file_id_files_id_fk` FOREIGN KEY (`file_id`) REFERENCES `files`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `dispute_messages` ADD CONSTRAINT `dispute_messages_dispute_id_disputes_id_fk` FOREIGN KEY (`dispute_id`) REFERENCES `disputes`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `dispute_messages` ADD CONSTRAINT `dispute_messages_company_id_companies_id_fk` FOREIGN KEY (`company_id`) REFERENCES `companies`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `dispute_messages` ADD CONSTRAINT `dispute_messages_person_id_people_id_fk` FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `disputes` ADD CONSTRAINT `disputes_company_id_companies_id_fk` FOREIGN KEY (`company_id`) REFERENCES `companies`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `disputes` ADD CONSTRAINT `disputes_shipment_id_shipments_id_fk` FOREIGN KEY (`shipment_id`) REFERENCES `shipments`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `disputes` ADD CONSTRAINT `disputes_count_id_counts_id_fk` FOREIGN KEY (`count_id`) REFERENCES `counts`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `disputes` ADD CONSTRAINT `disputes_opened_by_people_id_fk` FOREIGN KEY (`opened_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `disputes` ADD CONSTRAINT `disputes_closed_by_people_id_fk` FOREIGN KEY (`closed_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `settlements` ADD CONSTRAINT `settlements_difference_id_differences_id_fk` FOREIGN KEY (`difference_id`) REFERENCES `differences`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `settlements` ADD CONSTRAINT `settlements_bearer_company_id_companies_id_fk` FOREIGN KEY (`bearer_company_id`) REFERENCES `companies`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `settlements` ADD CONSTRAINT `settlements_settled_by_people_id_fk` FOREIGN KEY (`settled_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `files` ADD CONSTRAINT `files_company_id_companies_id_fk` FOREIGN KEY (`company_id`) REFERENCES `companies`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `files` ADD CONSTRAINT `files_uploaded_by_people_id_fk` FOREIGN KEY (`uploaded_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `accounts` ADD CONSTRAINT `accounts_site_id_sites_id_fk` FOREIGN KEY (`site_id`) REFERENCES `sites`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `accounts` ADD CONSTRAINT `accounts_shipment_id_shipments_id_fk` FOREIGN KEY (`shipment_id`) REFERENCES `shipments`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `accounts` ADD CONSTRAINT `accounts_company_id_companies_id_fk` FOREIGN KEY (`company_id`) REFERENCES `companies`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `balances` ADD CONSTRAINT `balances_account_id_accounts_id_fk` FOREIGN KEY (`account_id`) REFERENCES `accounts`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `daily_nets` ADD CONSTRAINT `daily_nets_account_id_accounts_id_fk` FOREIGN KEY (`account_id`) REFERENCES `accounts`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `ledger_entries` ADD CONSTRAINT `ledger_entries_shipment_id_shipments_id_fk` FOREIGN KEY (`shipment_id`) REFERENCES `shipments`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `ledger_entries` ADD CONSTRAINT `ledger_entries_person_id_people_id_fk` FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `ledger_lines` ADD CONSTRAINT `ledger_lines_entry_id_ledger_entries_id_fk` FOREIGN KEY (`entry_id`) REFERENCES `ledger_entries`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `ledger_lines` ADD CONSTRAINT `ledger_lines_type_code_container_types_code_fk` FOREIGN KEY (`type_code`) REFERENCES `container_types`(`code`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `ledger_lines` ADD CONSTRAINT `ledger_lines_from_account_id_accounts_id_fk` FOREIGN KEY (`from_account_id`) REFERENCES `accounts`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `ledger_lines` ADD CONSTRAINT `ledger_lines_to_account_id_accounts_id_fk` FOREIGN KEY (`to_account_id`) REFERENCES `accounts`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `ledger_lines` ADD CONSTRAINT `ledger_lines_charged_company_id_companies_id_fk` FOREIGN KEY (`charged_company_id`) REFERENCES `companies`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `partner_events` ADD CONSTRAINT `partner_events_company_id_companies_id_fk` FOREIGN KEY (`company_id`) REFERENCES `companies`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `partner_events` ADD CONSTRAINT `partner_events_type_code_container_types_code_fk` FOREIGN KEY (`type_code`) REFERENCES `container_types`(`code`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `partner_events` ADD CONSTRAINT `partner_events_entry_id_ledger_entries_id_fk` FOREIGN KEY (`entry_id`) REFERENCES `ledger_entries`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `partner_events` ADD CONSTRAINT `partner_events_shipment_id_shipments_id_fk` FOREIGN KEY (`shipment_id`) REFERENCES `shipments`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `count_lines` ADD CONSTRAINT `count_lines_type_code_container_types_code_fk` FOREIGN KEY (`type_code`) REFERENCES `container_types`(`code`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `count_lines` ADD CONSTRAINT `count_lines_count` FOREIGN KEY (`count_id`) REFERENCES `counts`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `count_photos` ADD CONSTRAINT `count_photos_count_id_counts_id_fk` FOREIGN KEY (`count_id`) REFERENCES `counts`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `count_photos` ADD CONSTRAINT `count_photos_file_id_files_id_fk` FOREIGN KEY (`file_id`) REFERENCES `files`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `counts` ADD CONSTRAINT `counts_shipment_id_shipments_id_fk` FOREIGN KEY (`shipment_id`) REFERENCES `shipments`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `counts` ADD CONSTRAINT `counts_counted_by_people_id_fk` FOREIGN KEY (`counted_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `shipment_lines` ADD CONSTRAINT `shipment_lines_shipment_id_shipments_id_fk` FOREIGN KEY (`shipment_id`) REFERENCES `shipments`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `shipment_lines` ADD CONSTRAINT `shipment_lines_type_code_container_types_code_fk` FOREIGN KEY (`type_code`) REFERENCES `container_types`(`code`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `shipments` ADD CONSTRAINT `shipments_from_site_id_sites_id_fk` FOREIGN KEY (`from_site_id`) REFERENCES `sites`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `shipments` ADD CONSTRAINT `shipments_to_site_id_sites_id_fk` FOREIGN KEY (`to_site_id`) REFERENCES `sites`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `shipments` ADD CONSTRAINT `shipments_from_company_id_companies_id_fk` FOREIGN KEY (`from_company_id`) REFERENCES `companies`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `shipments` ADD CONSTRAINT `shipments_to_company_id_companies_id_fk` FOREIGN KEY (`to_company_id`) REFERENCES `companies`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `shipments` ADD CONSTRAINT `shipments_created_by_people_id_fk` FOREIGN KEY (`created_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `shipments` ADD CONSTRAINT `shipments_counted_by_people_id_fk` FOREIGN KEY (`counted_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `credits` ADD CONSTRAINT `credits_company_id_companies_id_fk` FOREIGN KEY (`company_id`) REFERENCES `companies`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `credits` ADD CONSTRAINT `credits_dispute_id_disputes_id_fk` FOREIGN KEY (`dispute_id`) REFERENCES `disputes`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `credits` ADD CONSTRAINT `credits_created_by_people_id_fk` FOREIGN KEY (`created_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `months` ADD CONSTRAINT `months_closed_by_people_id_fk` FOREIGN KEY (`closed_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `statement_lines` ADD CONSTRAINT `statement_lines_statement_id_statements_id_fk` FOREIGN KEY (`statement_id`) REFERENCES `statements`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `statement_steps` ADD CONSTRAINT `statement_steps_statement_id_statements_id_fk` FOREIGN KEY (`statement_id`) REFERENCES `statements`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `statement_steps` ADD CONSTRAINT `statement_steps_person_id_people_id_fk` FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `statements` ADD CONSTRAINT `statements_company_id_companies_id_fk` FOREIGN KEY (`company_id`) REFERENCES `companies`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `statements` ADD CONSTRAINT `statements_workbook_file_id_files_id_fk` FOREIGN KEY (`workbook_file_id`) REFERENCES `files`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `statements` ADD CONSTRAINT `statements_issued_by_people_id_fk` FOREIGN KEY (`issued_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `statements` ADD CONSTRAINT `statements_answered_by_people_id_fk` FOREIGN KEY (`answered_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `import_rows` ADD CONSTRAINT `import_rows_import_id_imports_id_fk` FOREIGN KEY (`import_id`) REFERENCES `imports`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `imports` ADD CONSTRAINT `imports_created_by_people_id_fk` FOREIGN KEY (`created_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `jobs` ADD CONSTRAINT `jobs_company_id_companies_id_fk` FOREIGN KEY (`company_id`) REFERENCES `companies`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `jobs` ADD CONSTRAINT `jobs_created_by_people_id_fk` FOREIGN KEY (`created_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `receipt_lines` ADD CONSTRAINT `receipt_lines_receipt_id_receipts_id_fk` FOREIGN KEY (`receipt_id`) REFERENCES `receipts`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `receipt_matches` ADD CONSTRAINT `receipt_matches_receipt_id_receipts_id_fk` FOREIGN KEY (`receipt_id`) REFERENCES `receipts`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `receipt_matches` ADD CONSTRAINT `receipt_matches_decided_by_people_id_fk` FOREIGN KEY (`decided_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `receipts` ADD CONSTRAINT `receipts_import_id_imports_id_fk` FOREIGN KEY (`import_id`) REFERENCES `imports`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `receipts` ADD CONSTRAINT `receipts_from_site_id_sites_id_fk` FOREIGN KEY (`from_site_id`) REFERENCES `sites`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `receipts` ADD CONSTRAINT `receipts_to_site_id_sites_id_fk` FOREIGN KEY (`to_site_id`) REFERENCES `sites`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX `log_person` ON `log` (`person_id`,`id`);--> statement-breakpoint
CREATE INDEX `log_subject` ON `log` (`subject_id`,`id`);--> statement-breakpoint
CREATE INDEX `requests_created` ON `requests` (`created_at`);--> statement-breakpoint
CREATE INDEX `companies_name` ON `companies` (`name`,`id`);--> statement-breakpoint
CREATE INDEX `people_company` ON `people` (`company_id`,`name`,`id`);--> statement-breakpoint
CREATE INDEX `person_tokens_person` ON `person_tokens` (`person_id`);--> statement-breakpoint
CREATE INDEX `sites_company` ON `sites` (`company_id`);--> statement-breakpoint
CREATE INDEX `parts_type` ON `parts` (`type_code`);--> statement-breakpoint
CREATE INDEX `pool_approvals_type` ON `pool_approvals` (`type_code`,`id`);--> statement-breakpoint
CREATE INDEX `differences_state` ON `differences` (`state`,`opened_on`,`id`);--> statement-breakpoint
CREATE INDEX `differences_partner` ON `differences` (`partner_id`,`state`,`id`);--> statement-breakpoint
CREATE INDEX `differences_shipment` ON `differences` (`shipment_id`);--> statement-breakpoint
CREATE INDEX `dispute_files_message` ON `dispute_files` (`message_id`);--> statement-breakpoint
CREATE INDEX `dispute_files_file` ON `dispute_files` (`file_id`);--> statement-breakpoint
CREATE INDEX `dispute_messages_dispute` ON `dispute_messages` (`dispute_id`,`id`);--> statement-breakpoint
CREATE INDEX `disputes_company` ON `disputes` (`company_id`,`state`,`last_word_at`,`id`);--> statement-breakpoint
CREATE INDEX `disputes_state` ON `disputes` (`state`,`last_word_at`,`id`);--> statement-breakpoint
CREATE INDEX `disputes_statement` ON `disputes` (`statement_id`);--> statement-breakpoint
CREATE INDEX `disputes_shipment` ON `disputes` (`shipment_id`);--> statement-breakpoint
CREATE INDEX `settlements_difference` ON `settlements` (`difference_id`);--> statement-breakpoint
CREATE INDEX `files_company` ON `files` (`company_id`,`id`);--> statement-breakpoint
CREATE INDEX `files_content` ON `files` (`sha256`);--> statement-breakpoint
CREATE INDEX `accounts_company` ON `accounts` (`company_id`,`kind`);--> statement-breakpoint
CREATE INDEX `ledger_entries_shipment` ON `ledger_entries` (`shipment_id`,`id`);--> statement-breakpoint
CREATE INDEX `ledger_entries_day` ON `ledger_entries` (`value_date`,`id`);--> statement-breakpoint
CREATE INDEX `ledger_lines_from` ON `ledger_lines` (`from_account_id`,`type_code`,`value_date`,`entry_id`);--> statement-breakpoint
CREATE INDEX `ledger_lines_to` ON `ledger_lines` (`to_account_id`,`type_code`,`value_date`,`entry_id`);--> statement-breakpoint
CREATE INDEX `partner_events_company` ON `partner_events` (`company_id`,`date`,`id`);--> statement-breakpoint
CREATE INDEX `partner_events_shipment` ON `partner_events` (`shipment_id`);--> statement-breakpoint
CREATE INDEX `partner_events_corrects` ON `partner_events` (`corrects_id`);--> statement-breakpoint
CREATE INDEX `shipments_to` ON `shipments` (`to_company_id`,`state`,`expected_on`,`id`);--> statement-breakpoint
CREATE INDEX `shipments_from` ON `shipments` (`from_company_id`,`state`,`expected_on`,`id`);--> statement-breakpoint
CREATE INDEX `shipments_left` ON `shipments` (`left_on`,`id`);--> statement-breakpoint
CREATE INDEX `shipments_state` ON `shipments` (`state`,`expected_on`,`id`);--> statement-breakpoint
CREATE INDEX `credits_company` ON `credits` (`company_id`,`month`);--> statement-breakpoint
CREATE INDEX `statement_steps_statement` ON `statement_steps` (`statement_id`,`id`);--> statement-breakpoint
CREATE INDEX `statements_by_month` ON `statements` (`month`,`company_id`);--> statement-breakpoint
CREATE INDEX `import_rows_bad` ON `import_rows` (`import_id`,`bad`,`row_no`);--> statement-breakpoint
CREATE INDEX `imports_created` ON `imports` (`created_at`,`id`);--> statement-breakpoint
CREATE INDEX `jobs_waiting` ON `jobs` (`state`,`claimed_until`);--> statement-breakpoint
CREATE INDEX `outbox_waiting` ON `outbox` (`state`,`not_before`);--> statement-breakpoint
CREATE INDEX `receipt_matches_receipt` ON `receipt_matches` (`receipt_id`);--> statement-breakpoint
CREATE INDEX `receipt_matches_state` ON `receipt_matches` (`state`,`id`);--> statement-breakpoint
CREATE INDEX `receipts_state` ON `receipts` (`state`,`counted_on`,`id`);--> statement-breakpoint
CREATE INDEX `receipts_import` ON `receipts` (`import_id`);