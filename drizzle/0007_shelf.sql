CREATE TABLE `owned_cartridges` (
	`id` text PRIMARY KEY NOT NULL,
	`owner_id` text NOT NULL,
	`catalogue_id` text,
	`name` text NOT NULL,
	`answers` text NOT NULL,
	`stylus_hours` real,
	`notes` text DEFAULT '' NOT NULL,
	`archived_at` integer,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`owner_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE INDEX `owned_cartridges_owner` ON `owned_cartridges` (`owner_id`,`created_at`);--> statement-breakpoint
CREATE TABLE `unit_positions` (
	`id` text PRIMARY KEY NOT NULL,
	`unit_id` text NOT NULL,
	`step` integer NOT NULL,
	`board_id` text NOT NULL,
	`left` text,
	`right` text,
	`source` text NOT NULL,
	`sheet_id` text,
	`letter` text,
	`undone_at` integer,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`unit_id`) REFERENCES `units`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`sheet_id`) REFERENCES `sheets`(`id`) ON UPDATE no action ON DELETE set null
);
--> statement-breakpoint
CREATE UNIQUE INDEX `unit_positions_step` ON `unit_positions` (`unit_id`,`step`);--> statement-breakpoint
CREATE INDEX `unit_positions_sheet` ON `unit_positions` (`sheet_id`);--> statement-breakpoint
CREATE TABLE `units` (
	`id` text PRIMARY KEY NOT NULL,
	`owner_id` text NOT NULL,
	`name` text,
	`model_id` text NOT NULL,
	`board_id` text,
	`serial` text,
	`bought_on` text,
	`bought_from` text,
	`second_hand` integer,
	`archived_at` integer,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`owner_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE INDEX `units_owner` ON `units` (`owner_id`,`created_at`);--> statement-breakpoint
ALTER TABLE `sheets` ADD `unit_id` text REFERENCES units(id) ON DELETE set null;--> statement-breakpoint
ALTER TABLE `sheets` ADD `cartridge_id` text REFERENCES owned_cartridges(id) ON DELETE set null;--> statement-breakpoint
ALTER TABLE `sheets` ADD `letter` text DEFAULT 'A' NOT NULL;--> statement-breakpoint
ALTER TABLE `sheets` ADD `verdict` text DEFAULT 'cannot-say' NOT NULL;--> statement-breakpoint
ALTER TABLE `sheets` ADD `model_id` text DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE `sheets` ADD `model_name` text DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE `sheets` ADD `cartridge_name` text DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE `sheets` ADD `words` text DEFAULT '' NOT NULL;--> statement-breakpoint
ALTER TABLE `sheets` ADD `changed_at` integer DEFAULT 0 NOT NULL;--> statement-breakpoint
CREATE INDEX `sheets_owner` ON `sheets` (`owner_id`,`changed_at`,`number`);--> statement-breakpoint
CREATE INDEX `sheets_unit` ON `sheets` (`unit_id`,`cartridge_id`);--> statement-breakpoint
CREATE INDEX `sheets_cartridge` ON `sheets` (`cartridge_id`);--> statement-breakpoint
UPDATE `sheets` SET (`letter`, `changed_at`, `verdict`, `model_id`, `model_name`, `cartridge_name`, `words`) = (
	SELECT
		`letter`,
		`created_at`,
		json_extract(`result`, '$.match.verdict'),
		json_extract(`inputs`, '$.preamp.modelId'),
		json_extract(`inputs`, '$.preamp.modelName'),
		json_extract(`inputs`, '$.cartridge.name'),
		lower(json_extract(`inputs`, '$.preamp.modelName') || ' ' || json_extract(`inputs`, '$.preamp.boardName') || ' ' || json_extract(`inputs`, '$.cartridge.name'))
	FROM `revisions` WHERE `revisions`.`sheet_id` = `sheets`.`id` ORDER BY `letter` DESC LIMIT 1
) WHERE EXISTS (SELECT 1 FROM `revisions` WHERE `revisions`.`sheet_id` = `sheets`.`id`);
