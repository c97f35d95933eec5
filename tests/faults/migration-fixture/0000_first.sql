CREATE TABLE `sites` (
	`id` uuid NOT NULL,
	`company_id` uuid NOT NULL,
	`name` varchar(80) NOT NULL,
	CONSTRAINT `sites_id` PRIMARY KEY(`id`),
	CONSTRAINT `sites_company` UNIQUE(`company_id`,`id`)
);
--> statement-breakpoint
CREATE TABLE `units` (
	`id` uuid NOT NULL,
	`site_id` uuid NOT NULL,
	`input` int NOT NULL,
	`note` varchar(20),
	CONSTRAINT `units_id` PRIMARY KEY(`id`)
);
--> statement-breakpoint
ALTER TABLE `units` ADD CONSTRAINT `units_site` FOREIGN KEY (`site_id`) REFERENCES `sites`(`id`) ON DELETE no action ON UPDATE no action;
--> statement-breakpoint
CREATE INDEX `units_input` ON `units` (`input`);
