CREATE TABLE `audit_log` (
	`id` uuid NOT NULL,
	`company_id` uuid,
	`actor_id` uuid,
	`action` varchar(60) character set ascii collate ascii_bin NOT NULL,
	`subject_id` uuid,
	`details` mediumtext character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`request_id` uuid,
	`at` datetime(3) NOT NULL,
	CONSTRAINT `audit_log_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `companies` (
	`id` uuid NOT NULL,
	`name` varchar(120) NOT NULL,
	`time_zone` varchar(64) character set ascii collate ascii_bin NOT NULL,
	`altitude_rule` varchar(40) character set ascii collate ascii_bin NOT NULL,
	`units_shown` varchar(20) character set ascii collate ascii_bin NOT NULL,
	`mode` varchar(8) character set ascii collate ascii_bin NOT NULL,
	`next_call_number` int NOT NULL DEFAULT 1,
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `companies_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `devices` (
	`id` uuid NOT NULL,
	`company_id` uuid NOT NULL,
	`person_id` uuid NOT NULL,
	`name` varchar(80) NOT NULL,
	`registered_at` datetime(3) NOT NULL,
	`last_seen_at` datetime(3) NOT NULL,
	`revoked_at` datetime(3),
	CONSTRAINT `devices_id` PRIMARY KEY(`id`),
	CONSTRAINT `devices_company` UNIQUE(`company_id`,`id`)
);
--> statement-breakpoint
CREATE TABLE `one_time_tokens` (
	`token_hash` char(64) character set ascii collate ascii_bin NOT NULL,
	`kind` varchar(20) character set ascii collate ascii_bin NOT NULL,
	`person_id` uuid,
	`expires_at` datetime(3) NOT NULL,
	`used_at` datetime(3),
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `one_time_tokens_token_hash` PRIMARY KEY(`token_hash`)
);
--> statement-breakpoint
CREATE TABLE `people` (
	`id` uuid NOT NULL,
	`company_id` uuid NOT NULL,
	`name` varchar(120) NOT NULL,
	`email` varchar(254) NOT NULL,
	`role` varchar(20) character set ascii collate ascii_bin NOT NULL,
	`password_hash` varchar(255),
	`disabled_at` datetime(3),
	`totp_secret` varchar(255),
	`totp_pending` varchar(255),
	`totp_confirmed_at` datetime(3),
	`last_seen_at` datetime(3),
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `people_id` PRIMARY KEY(`id`),
	CONSTRAINT `people_email` UNIQUE(`email`),
	CONSTRAINT `people_company` UNIQUE(`company_id`,`id`)
);
--> statement-breakpoint
CREATE TABLE `rate_windows` (
	`key_hash` char(64) character set ascii collate ascii_bin NOT NULL,
	`hits` int NOT NULL,
	`resets_at` datetime(3) NOT NULL,
	CONSTRAINT `rate_windows_key_hash` PRIMARY KEY(`key_hash`)
);
--> statement-breakpoint
CREATE TABLE `recovery_codes` (
	`code_hash` char(64) character set ascii collate ascii_bin NOT NULL,
	`person_id` uuid NOT NULL,
	`used_at` datetime(3),
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `recovery_codes_code_hash` PRIMARY KEY(`code_hash`)
);
--> statement-breakpoint
CREATE TABLE `sessions` (
	`id` char(64) character set ascii collate ascii_bin NOT NULL,
	`person_id` uuid NOT NULL,
	`expires_at` datetime(3) NOT NULL,
	`public_id` uuid NOT NULL,
	`device_id` uuid,
	`created_at` datetime(3) NOT NULL,
	`last_used_at` datetime(3) NOT NULL,
	`two_step_passed` boolean NOT NULL,
	CONSTRAINT `sessions_id` PRIMARY KEY(`id`),
	CONSTRAINT `sessions_public` UNIQUE(`public_id`)
);
--> statement-breakpoint
CREATE TABLE `sign_in_throttles` (
	`key_hash` char(64) character set ascii collate ascii_bin NOT NULL,
	`attempts` int NOT NULL,
	`last_attempt_at` datetime(3) NOT NULL,
	`blocked_until` datetime(3),
	CONSTRAINT `sign_in_throttles_key_hash` PRIMARY KEY(`key_hash`)
);
--> statement-breakpoint
CREATE TABLE `totp_used_steps` (
	`id` uuid NOT NULL,
	`person_id` uuid NOT NULL,
	`step` int NOT NULL,
	CONSTRAINT `totp_used_steps_id` PRIMARY KEY(`id`),
	CONSTRAINT `totp_used_steps_once` UNIQUE(`person_id`,`step`)
);
--> statement-breakpoint
CREATE TABLE `diagnoses` (
	`id` uuid NOT NULL,
	`company_id` uuid NOT NULL,
	`server_seq` int NOT NULL,
	`chain_hash` char(64) character set ascii collate ascii_bin NOT NULL,
	`call_id` uuid NOT NULL,
	`unit_id` uuid NOT NULL,
	`technician_id` uuid NOT NULL,
	`status` varchar(10) character set ascii collate ascii_bin NOT NULL,
	`outcome` varchar(40) character set ascii collate ascii_bin,
	`last_stage` varchar(40) character set ascii collate ascii_bin,
	`opened_at` datetime(3) NOT NULL,
	`last_event_at` datetime(3) NOT NULL,
	`closed_at` datetime(3),
	`flags` int NOT NULL,
	`waits_for_release` boolean NOT NULL,
	`wants_report` boolean NOT NULL,
	`is_demo` boolean NOT NULL,
	CONSTRAINT `diagnoses_id` PRIMARY KEY(`id`),
	CONSTRAINT `diagnoses_company` UNIQUE(`company_id`,`id`)
);
--> statement-breakpoint
CREATE TABLE `event_flags` (
	`id` uuid NOT NULL,
	`company_id` uuid NOT NULL,
	`diagnosis_id` uuid NOT NULL,
	`event_id` uuid NOT NULL,
	`rule` varchar(80) character set ascii collate ascii_bin NOT NULL,
	`params` mediumtext character set utf8mb4 collate utf8mb4_bin,
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `event_flags_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `events` (
	`id` uuid NOT NULL,
	`company_id` uuid NOT NULL,
	`diagnosis_id` uuid NOT NULL,
	`device_id` uuid NOT NULL,
	`device_seq` bigint NOT NULL,
	`server_seq` int NOT NULL,
	`type` varchar(64) character set ascii collate ascii_bin NOT NULL,
	`schema_version` int NOT NULL,
	`canonical_text` mediumtext character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`hash` char(64) character set ascii collate ascii_bin NOT NULL,
	`prev_hash` char(64) character set ascii collate ascii_bin NOT NULL,
	`chain_hash` char(64) character set ascii collate ascii_bin NOT NULL,
	`actor_id` uuid NOT NULL,
	`received_at` datetime(3) NOT NULL,
	CONSTRAINT `events_id` PRIMARY KEY(`id`),
	CONSTRAINT `events_server_seq` UNIQUE(`diagnosis_id`,`server_seq`),
	CONSTRAINT `events_device_seq` UNIQUE(`device_id`,`device_seq`)
);
--> statement-breakpoint
CREATE TABLE `note_texts` (
	`id` uuid NOT NULL,
	`company_id` uuid NOT NULL,
	`diagnosis_id` uuid NOT NULL,
	`hash` char(64) character set ascii collate ascii_bin NOT NULL,
	`salt` varchar(32) NOT NULL,
	`text` mediumtext character set utf8mb4 collate utf8mb4_bin,
	`erased_at` datetime(3),
	`erased_by` uuid,
	`erase_reason` varchar(500),
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `note_texts_id` PRIMARY KEY(`id`),
	CONSTRAINT `note_texts_hash` UNIQUE(`diagnosis_id`,`hash`)
);
--> statement-breakpoint
CREATE TABLE `report_links` (
	`token_hash` char(64) character set ascii collate ascii_bin NOT NULL,
	`report_id` uuid NOT NULL,
	`expires_at` datetime(3) NOT NULL,
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `report_links_token_hash` PRIMARY KEY(`token_hash`)
);
--> statement-breakpoint
CREATE TABLE `reports` (
	`id` uuid NOT NULL,
	`company_id` uuid NOT NULL,
	`diagnosis_id` uuid NOT NULL,
	`content` mediumtext character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`pdf_file` varchar(80),
	`made_at` datetime(3) NOT NULL,
	CONSTRAINT `reports_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `jobs` (
	`id` uuid NOT NULL,
	`company_id` uuid,
	`kind` varchar(40) character set ascii collate ascii_bin NOT NULL,
	`payload` json NOT NULL,
	`state` varchar(12) character set ascii collate ascii_bin NOT NULL,
	`attempts` int NOT NULL,
	`progress` int NOT NULL,
	`run_after` datetime(3) NOT NULL,
	`lease_until` datetime(3),
	`last_error` varchar(200),
	`created_at` datetime(3) NOT NULL,
	`finished_at` datetime(3),
	CONSTRAINT `jobs_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
CREATE TABLE `tree_versions` (
	`id` uuid NOT NULL,
	`company_id` uuid NOT NULL,
	`tree_id` uuid NOT NULL,
	`version` int NOT NULL,
	`document` mediumtext character set utf8mb4 collate utf8mb4_bin NOT NULL,
	`hash` char(64) character set ascii collate ascii_bin NOT NULL,
	`in_force` boolean NOT NULL,
	`note` varchar(500),
	`author_id` uuid,
	`published_by` uuid,
	`published_at` datetime(3) NOT NULL,
	CONSTRAINT `tree_versions_id` PRIMARY KEY(`id`),
	CONSTRAINT `tree_versions_number` UNIQUE(`tree_id`,`version`)
);
--> statement-breakpoint
CREATE TABLE `trees` (
	`id` uuid NOT NULL,
	`company_id` uuid NOT NULL,
	`slug` varchar(80) character set ascii collate ascii_bin NOT NULL,
	`name` varchar(120) NOT NULL,
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `trees_id` PRIMARY KEY(`id`),
	CONSTRAINT `trees_company` UNIQUE(`company_id`,`id`),
	CONSTRAINT `trees_slug` UNIQUE(`company_id`,`slug`)
);
--> statement-breakpoint
CREATE TABLE `calls` (
	`id` uuid NOT NULL,
	`company_id` uuid NOT NULL,
	`number` int NOT NULL,
	`unit_id` uuid NOT NULL,
	`assigned_to` uuid,
	`status` varchar(20) character set ascii collate ascii_bin NOT NULL,
	`complaint` varchar(500) NOT NULL,
	`scheduled_for` datetime(3) NOT NULL,
	`version` int NOT NULL DEFAULT 1,
	`created_by` uuid,
	`created_at` datetime(3) NOT NULL,
	`done_at` datetime(3),
	CONSTRAINT `calls_id` PRIMARY KEY(`id`),
	CONSTRAINT `calls_company` UNIQUE(`company_id`,`id`),
	CONSTRAINT `calls_number` UNIQUE(`company_id`,`number`)
);
--> statement-breakpoint
CREATE TABLE `customers` (
	`id` uuid NOT NULL,
	`company_id` uuid NOT NULL,
	`first_name` varchar(120) NOT NULL,
	`last_name` varchar(120),
	`email` varchar(254),
	`phone` varchar(40),
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `customers_id` PRIMARY KEY(`id`),
	CONSTRAINT `customers_company` UNIQUE(`company_id`,`id`)
);
--> statement-breakpoint
CREATE TABLE `sites` (
	`id` uuid NOT NULL,
	`company_id` uuid NOT NULL,
	`customer_id` uuid NOT NULL,
	`address` varchar(200) NOT NULL,
	`town` varchar(120) NOT NULL,
	`region` varchar(120),
	`postal_code` varchar(20),
	`time_zone` varchar(64) character set ascii collate ascii_bin,
	`altitude_ft` int,
	`access_note` varchar(500),
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `sites_id` PRIMARY KEY(`id`),
	CONSTRAINT `sites_company` UNIQUE(`company_id`,`id`)
);
--> statement-breakpoint
CREATE TABLE `units` (
	`id` uuid NOT NULL,
	`company_id` uuid NOT NULL,
	`site_id` uuid NOT NULL,
	`name` varchar(120) NOT NULL,
	`profile` json NOT NULL,
	`version` int NOT NULL DEFAULT 1,
	`created_at` datetime(3) NOT NULL,
	CONSTRAINT `units_id` PRIMARY KEY(`id`),
	CONSTRAINT `units_company` UNIQUE(`company_id`,`id`)
);
--> statement-breakpoint
ALTER TABLE `devices` ADD CONSTRAINT `devices_person` FOREIGN KEY (`company_id`,`person_id`) REFERENCES `people`(`company_id`,`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `one_time_tokens` ADD CONSTRAINT `one_time_tokens_person_id_people_id_fk` FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `people` ADD CONSTRAINT `people_company_id_companies_id_fk` FOREIGN KEY (`company_id`) REFERENCES `companies`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `recovery_codes` ADD CONSTRAINT `recovery_codes_person_id_people_id_fk` FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `sessions` ADD CONSTRAINT `sessions_person_id_people_id_fk` FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `sessions` ADD CONSTRAINT `sessions_device_id_devices_id_fk` FOREIGN KEY (`device_id`) REFERENCES `devices`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `totp_used_steps` ADD CONSTRAINT `totp_used_steps_person_id_people_id_fk` FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `diagnoses` ADD CONSTRAINT `diagnoses_company_id_companies_id_fk` FOREIGN KEY (`company_id`) REFERENCES `companies`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `diagnoses` ADD CONSTRAINT `diagnoses_call_of` FOREIGN KEY (`company_id`,`call_id`) REFERENCES `calls`(`company_id`,`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `diagnoses` ADD CONSTRAINT `diagnoses_unit_of` FOREIGN KEY (`company_id`,`unit_id`) REFERENCES `units`(`company_id`,`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `diagnoses` ADD CONSTRAINT `diagnoses_technician` FOREIGN KEY (`company_id`,`technician_id`) REFERENCES `people`(`company_id`,`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `event_flags` ADD CONSTRAINT `event_flags_diagnosis_of` FOREIGN KEY (`company_id`,`diagnosis_id`) REFERENCES `diagnoses`(`company_id`,`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `events` ADD CONSTRAINT `events_diagnosis` FOREIGN KEY (`company_id`,`diagnosis_id`) REFERENCES `diagnoses`(`company_id`,`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `events` ADD CONSTRAINT `events_device` FOREIGN KEY (`company_id`,`device_id`) REFERENCES `devices`(`company_id`,`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `note_texts` ADD CONSTRAINT `note_texts_erased_by_people_id_fk` FOREIGN KEY (`erased_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `note_texts` ADD CONSTRAINT `note_texts_diagnosis` FOREIGN KEY (`company_id`,`diagnosis_id`) REFERENCES `diagnoses`(`company_id`,`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `report_links` ADD CONSTRAINT `report_links_report_id_reports_id_fk` FOREIGN KEY (`report_id`) REFERENCES `reports`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `reports` ADD CONSTRAINT `reports_diagnosis_of` FOREIGN KEY (`company_id`,`diagnosis_id`) REFERENCES `diagnoses`(`company_id`,`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `jobs` ADD CONSTRAINT `jobs_company_id_companies_id_fk` FOREIGN KEY (`company_id`) REFERENCES `companies`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `tree_versions` ADD CONSTRAINT `tree_versions_author_id_people_id_fk` FOREIGN KEY (`author_id`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `tree_versions` ADD CONSTRAINT `tree_versions_published_by_people_id_fk` FOREIGN KEY (`published_by`) REFERENCES `people`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `tree_versions` ADD CONSTRAINT `tree_versions_tree` FOREIGN KEY (`company_id`,`tree_id`) REFERENCES `trees`(`company_id`,`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `trees` ADD CONSTRAINT `trees_company_id_companies_id_fk` FOREIGN KEY (`company_id`) REFERENCES `companies`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `calls` ADD CONSTRAINT `calls_unit` FOREIGN KEY (`company_id`,`unit_id`) REFERENCES `units`(`company_id`,`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `calls` ADD CONSTRAINT `calls_assigned_to` FOREIGN KEY (`company_id`,`assigned_to`) REFERENCES `people`(`company_id`,`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `customers` ADD CONSTRAINT `customers_company_id_companies_id_fk` FOREIGN KEY (`company_id`) REFERENCES `companies`(`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `sites` ADD CONSTRAINT `sites_customer` FOREIGN KEY (`company_id`,`customer_id`) REFERENCES `customers`(`company_id`,`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE `units` ADD CONSTRAINT `units_site` FOREIGN KEY (`company_id`,`site_id`) REFERENCES `sites`(`company_id`,`id`) ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX `audit_log_company` ON `audit_log` (`company_id`,`at`);--> statement-breakpoint
CREATE INDEX `one_time_tokens_person` ON `one_time_tokens` (`person_id`,`kind`);--> statement-breakpoint
CREATE INDEX `recovery_codes_person` ON `recovery_codes` (`person_id`);--> statement-breakpoint
CREATE INDEX `sessions_person` ON `sessions` (`person_id`);--> statement-breakpoint
CREATE INDEX `diagnoses_when` ON `diagnoses` (`company_id`,`opened_at`);--> statement-breakpoint
CREATE INDEX `diagnoses_unit` ON `diagnoses` (`company_id`,`unit_id`,`opened_at`);--> statement-breakpoint
CREATE INDEX `diagnoses_call` ON `diagnoses` (`company_id`,`call_id`);--> statement-breakpoint
CREATE INDEX `event_flags_diagnosis` ON `event_flags` (`diagnosis_id`);--> statement-breakpoint
CREATE INDEX `reports_diagnosis` ON `reports` (`diagnosis_id`,`made_at`);--> statement-breakpoint
CREATE INDEX `jobs_next` ON `jobs` (`state`,`run_after`);--> statement-breakpoint
CREATE INDEX `jobs_company` ON `jobs` (`company_id`,`created_at`);--> statement-breakpoint
CREATE INDEX `calls_when` ON `calls` (`company_id`,`scheduled_for`);--> statement-breakpoint
CREATE INDEX `customers_name` ON `customers` (`company_id`,`last_name`,`first_name`);