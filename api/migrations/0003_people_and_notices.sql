CREATE TABLE `appointment` (
	`id` text PRIMARY KEY NOT NULL,
	`person_id` text NOT NULL,
	`geometries` text,
	`until` text NOT NULL,
	`proposed_at` text NOT NULL,
	`proposed_by_id` text NOT NULL,
	`proposed_by_name` text NOT NULL,
	`confirmed_at` text,
	`confirmed_by_id` text,
	`confirmed_by_name` text,
	`ended_at` text,
	`ended_by_id` text,
	`ended_by_name` text,
	`end_reason` text,
	FOREIGN KEY (`person_id`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `appointment_by_person` ON `appointment` (`person_id`);--> statement-breakpoint
CREATE TABLE `notice` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`person_id` text NOT NULL,
	`kind` text NOT NULL,
	`text` text NOT NULL,
	`href` text NOT NULL,
	`at` text NOT NULL,
	`read_at` text,
	`once_key` text,
	FOREIGN KEY (`person_id`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `notice_by_person` ON `notice` (`person_id`,`id`);--> statement-breakpoint
CREATE UNIQUE INDEX `notice_once` ON `notice` (`person_id`,`once_key`);--> statement-breakpoint
CREATE TABLE `notice_preference` (
	`person_id` text NOT NULL,
	`kind` text NOT NULL,
	`mail` integer NOT NULL,
	PRIMARY KEY(`person_id`, `kind`),
	FOREIGN KEY (`person_id`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `one_time_link` (
	`token_hash` text PRIMARY KEY NOT NULL,
	`purpose` text NOT NULL,
	`person_id` text,
	`made_at` text NOT NULL,
	`expires_at` text NOT NULL,
	`ended_at` text,
	`ending` text,
	FOREIGN KEY (`person_id`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `one_time_link_by_person` ON `one_time_link` (`person_id`,`purpose`);--> statement-breakpoint
CREATE TABLE `settings` (
	`id` integer PRIMARY KEY NOT NULL,
	`office_name` text NOT NULL,
	`reviews_needed` integer NOT NULL,
	`principal_id` text,
	`review_due_months` integer NOT NULL,
	FOREIGN KEY (`principal_id`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "settings_single" CHECK("settings"."id" = 1),
	CONSTRAINT "settings_reviews_needed" CHECK("settings"."reviews_needed" BETWEEN 1 AND 5)
);
--> statement-breakpoint
ALTER TABLE `mail` ADD `link` text;--> statement-breakpoint
ALTER TABLE `session` ADD `agent` text;