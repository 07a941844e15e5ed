CREATE TABLE `attempts` (
	`key` text PRIMARY KEY NOT NULL,
	`count` integer NOT NULL,
	`ends_at` integer NOT NULL
);
--> statement-breakpoint
CREATE INDEX `attempts_ends` ON `attempts` (`ends_at`);--> statement-breakpoint
CREATE TABLE `one_time_tokens` (
	`hash` text PRIMARY KEY NOT NULL,
	`purpose` text NOT NULL,
	`email` text NOT NULL,
	`email_key` text NOT NULL,
	`person_id` text,
	`name` text,
	`password_hash` text,
	`role` text,
	`pair` text,
	`expires_at` integer NOT NULL,
	`used_at` integer,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE INDEX `one_time_tokens_email` ON `one_time_tokens` (`email_key`);--> statement-breakpoint
CREATE INDEX `one_time_tokens_person` ON `one_time_tokens` (`person_id`);--> statement-breakpoint
CREATE INDEX `one_time_tokens_pair` ON `one_time_tokens` (`pair`);--> statement-breakpoint
CREATE INDEX `one_time_tokens_expires` ON `one_time_tokens` (`expires_at`);--> statement-breakpoint
CREATE TABLE `people` (
	`id` text PRIMARY KEY NOT NULL,
	`email` text NOT NULL,
	`email_key` text NOT NULL,
	`name` text NOT NULL,
	`role` text NOT NULL,
	`password_hash` text,
	`email_confirmed_at` integer NOT NULL,
	`disabled_at` integer,
	`deletion_asked_at` integer,
	`demo` integer DEFAULT false NOT NULL,
	`created_at` integer NOT NULL
);
--> statement-breakpoint
CREATE UNIQUE INDEX `people_email_key_unique` ON `people` (`email_key`);--> statement-breakpoint
CREATE INDEX `people_deletion` ON `people` (`deletion_asked_at`);--> statement-breakpoint
CREATE TABLE `recovery_codes` (
	`hash` text PRIMARY KEY NOT NULL,
	`person_id` text NOT NULL,
	`used_at` integer,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE INDEX `recovery_codes_person` ON `recovery_codes` (`person_id`);--> statement-breakpoint
CREATE TABLE `second_factors` (
	`id` text PRIMARY KEY NOT NULL,
	`person_id` text NOT NULL,
	`sealed_secret` blob NOT NULL,
	`confirmed_at` integer,
	`last_counter` integer NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE INDEX `second_factors_person` ON `second_factors` (`person_id`);--> statement-breakpoint
CREATE TABLE `sessions` (
	`id` text PRIMARY KEY NOT NULL,
	`person_id` text NOT NULL,
	`completed_at` integer,
	`last_seen_at` integer NOT NULL,
	`expires_at` integer NOT NULL,
	`ended_at` integer,
	`device` text NOT NULL,
	`origin` text NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE INDEX `sessions_person` ON `sessions` (`person_id`);--> statement-breakpoint
CREATE INDEX `sessions_expires` ON `sessions` (`expires_at`);