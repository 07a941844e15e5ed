CREATE TABLE `catalogue_entries` (
	`id` text PRIMARY KEY NOT NULL,
	`kind` text NOT NULL,
	`type` text,
	`maker` text NOT NULL,
	`name` text NOT NULL,
	`sort_name` text NOT NULL,
	`search_tight` text NOT NULL,
	`data` text NOT NULL,
	`demo_hash` text,
	`created_at` integer NOT NULL,
	`updated_at` integer NOT NULL
);
--> statement-breakpoint
CREATE INDEX `catalogue_entries_kind_name` ON `catalogue_entries` (`kind`,`sort_name`,`id`);--> statement-breakpoint
CREATE INDEX `catalogue_entries_kind_type_name` ON `catalogue_entries` (`kind`,`type`,`sort_name`,`id`);