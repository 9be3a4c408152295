CREATE TABLE `attachment` (
	`id` text PRIMARY KEY NOT NULL,
	`owner_kind` text NOT NULL,
	`owner_id` text NOT NULL,
	`source` text,
	`name` text NOT NULL,
	`media_type` text NOT NULL,
	`size` integer NOT NULL,
	`sha256` text NOT NULL,
	`licence` text NOT NULL,
	`active_content` text NOT NULL,
	`at` text NOT NULL,
	`by_id` text NOT NULL,
	`by_name` text NOT NULL
);
--> statement-breakpoint
CREATE INDEX `attachment_by_owner` ON `attachment` (`owner_kind`,`owner_id`,`at`);--> statement-breakpoint
CREATE UNIQUE INDEX `attachment_once` ON `attachment` (`owner_kind`,`owner_id`,`sha256`);