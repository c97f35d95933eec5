ALTER TABLE `units` ADD `stages` int DEFAULT 1 NOT NULL;
--> statement-breakpoint
ALTER TABLE `units` ADD CONSTRAINT `units_stages` CHECK (`stages` in (1, 2));
--> statement-breakpoint
INSERT INTO `sites` (`id`, `company_id`, `name`) VALUES ('00000000-0000-7000-8000-000000000001', '00000000-0000-7000-8000-000000000002', 'Roof 1');
--> statement-breakpoint
UPDATE `sites` SET `name` = CONCAT(`name`, ' east');
--> statement-breakpoint
ALTER TABLE `units` MODIFY COLUMN `input` bigint NOT NULL;
--> statement-breakpoint
ALTER TABLE `units` RENAME COLUMN `input` TO `input_btuh`;
--> statement-breakpoint
DROP INDEX `units_input` ON `units`;
--> statement-breakpoint
ALTER TABLE `units` DROP COLUMN `note`;
--> statement-breakpoint
CREATE TABLE `scratch` (
	`id` int NOT NULL
);
--> statement-breakpoint
ALTER TABLE `scratch` ADD PRIMARY KEY (`id`);
--> statement-breakpoint
RENAME TABLE `scratch` TO `scratch_two`;
--> statement-breakpoint
DROP TABLE `scratch_two`;
