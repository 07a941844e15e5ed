CREATE TABLE `mailbox_messages` (
	`id` text PRIMARY KEY NOT NULL,
	`message_id` text NOT NULL,
	`recipient` text NOT NULL,
	`subject` text NOT NULL,
	`html` text NOT NULL,
	`plain` text NOT NULL,
	`raw` text NOT NULL,
	`received_at` integer NOT NULL
);
--> statement-breakpoint
CREATE UNIQUE INDEX `mailbox_messages_message_id_unique` ON `mailbox_messages` (`message_id`);--> statement-breakpoint
CREATE INDEX `mailbox_messages_received` ON `mailbox_messages` (`received_at`,`id`);--> statement-breakpoint
CREATE INDEX `mailbox_messages_recipient` ON `mailbox_messages` (`recipient`,`received_at`);--> statement-breakpoint
CREATE TABLE `outbox` (
	`id` text PRIMARY KEY NOT NULL,
	`message_id` text NOT NULL,
	`template` text NOT NULL,
	`props` text NOT NULL,
	`recipient` text NOT NULL,
	`subject` text,
	`html` text,
	`plain` text,
	`status` text NOT NULL,
	`attempts` integer DEFAULT 0 NOT NULL,
	`next_try_at` integer NOT NULL,
	`good_until` integer,
	`last_answer` text,
	`claim` text,
	`claimed_at` integer,
	`claimed_until` integer,
	`created_at` integer NOT NULL,
	`sent_at` integer,
	`given_up_at` integer
);
--> statement-breakpoint
CREATE UNIQUE INDEX `outbox_message_id_unique` ON `outbox` (`message_id`);--> statement-breakpoint
CREATE INDEX `outbox_due` ON `outbox` (`status`,`next_try_at`);--> statement-breakpoint
CREATE INDEX `outbox_claimed` ON `outbox` (`status`,`claimed_until`);--> statement-breakpoint
CREATE INDEX `outbox_status_created` ON `outbox` (`status`,`created_at`,`id`);