CREATE TABLE `rate_limits` (
	`key` text PRIMARY KEY NOT NULL,
	`points` integer NOT NULL,
	`expire` integer
);
--> statement-breakpoint
CREATE INDEX `rate_limits_expire` ON `rate_limits` (`expire`);--> statement-breakpoint
CREATE TABLE `revisions` (
	`id` text PRIMARY KEY NOT NULL,
	`sheet_id` text NOT NULL,
	`letter` text NOT NULL,
	`answers` text NOT NULL,
	`inputs` text NOT NULL,
	`result` text NOT NULL,
	`engine_version` text NOT NULL,
	`rules_version` integer NOT NULL,
	`data_hash` text NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`sheet_id`) REFERENCES `sheets`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `revisions_sheet_letter` ON `revisions` (`sheet_id`,`letter`);--> statement-breakpoint
CREATE TABLE `sheets` (
	`id` text PRIMARY KEY NOT NULL,
	`number` integer NOT NULL,
	`code` text NOT NULL,
	`name` text,
	`owner_id` text,
	`request_key` text,
	`archived_at` integer,
	`created_at` integer NOT NULL
);
--> statement-breakpoint
CREATE UNIQUE INDEX `sheets_number_unique` ON `sheets` (`number`);--> statement-breakpoint
CREATE UNIQUE INDEX `sheets_code_unique` ON `sheets` (`code`);--> statement-breakpoint
CREATE UNIQUE INDEX `sheets_request_key_unique` ON `sheets` (`request_key`);