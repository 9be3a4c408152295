CREATE TABLE `evaluation` (
	`id` text PRIMARY KEY NOT NULL,
	`revision_id` integer NOT NULL,
	`standing` text NOT NULL,
	`person_id` text NOT NULL,
	`person_name` text NOT NULL,
	`at` text NOT NULL,
	`outcome` text NOT NULL,
	`request` text NOT NULL,
	`response` text NOT NULL,
	`provenance` text NOT NULL,
	FOREIGN KEY (`revision_id`) REFERENCES `revision`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `evaluation_by_revision` ON `evaluation` (`revision_id`);--> statement-breakpoint
CREATE INDEX `evaluation_by_person` ON `evaluation` (`person_id`,`at`);--> statement-breakpoint
CREATE TABLE `geometry` (
	`slug` text PRIMARY KEY NOT NULL,
	`name` text NOT NULL,
	`summary` text NOT NULL,
	`characteristic_length` text NOT NULL,
	`velocity` text NOT NULL,
	`cautions` text NOT NULL
);
--> statement-breakpoint
CREATE TABLE `journal` (
	`index` integer PRIMARY KEY NOT NULL,
	`entry` text NOT NULL,
	`at` text GENERATED ALWAYS AS ((json_extract("entry", '$.at'))) VIRTUAL,
	`actor_id` text GENERATED ALWAYS AS ((json_extract("entry", '$.actor.id'))) VIRTUAL,
	`act` text GENERATED ALWAYS AS ((json_extract("entry", '$.act'))) VIRTUAL,
	`subject` text GENERATED ALWAYS AS ((json_extract("entry", '$.subject'))) VIRTUAL
);
--> statement-breakpoint
CREATE INDEX `journal_by_actor` ON `journal` (`actor_id`,`index`);--> statement-breakpoint
CREATE INDEX `journal_by_subject` ON `journal` (`subject`,`index`);--> statement-breakpoint
CREATE TABLE `journal_checkpoint` (
	`size` integer PRIMARY KEY NOT NULL,
	`root` text NOT NULL,
	`at` text NOT NULL,
	`key_id` text NOT NULL,
	`text` text NOT NULL,
	`signature` text NOT NULL
);
--> statement-breakpoint
CREATE TABLE `journal_key` (
	`key_id` text PRIMARY KEY NOT NULL,
	`pem` text NOT NULL,
	`since` text NOT NULL
);
--> statement-breakpoint
CREATE TABLE `journal_node` (
	`level` integer NOT NULL,
	`position` integer NOT NULL,
	`hash` blob NOT NULL,
	PRIMARY KEY(`level`, `position`)
);
--> statement-breakpoint
CREATE TABLE `mail` (
	`id` text PRIMARY KEY NOT NULL,
	`to` text NOT NULL,
	`subject` text NOT NULL,
	`body` text NOT NULL,
	`written_at` text NOT NULL,
	`state` text NOT NULL,
	`tries` integer DEFAULT 0 NOT NULL,
	`next_try_at` text,
	`sent_at` text,
	`last_error` text
);
--> statement-breakpoint
CREATE INDEX `mail_due` ON `mail` (`state`,`next_try_at`);--> statement-breakpoint
CREATE TABLE `office` (
	`id` integer PRIMARY KEY NOT NULL,
	`founded_at` text NOT NULL,
	`demo` integer NOT NULL,
	CONSTRAINT "office_single" CHECK("office"."id" = 1)
);
--> statement-breakpoint
CREATE TABLE `person` (
	`id` text PRIMARY KEY NOT NULL,
	`name` text NOT NULL,
	`email` text NOT NULL,
	`password_hash` text,
	`active` integer DEFAULT true NOT NULL,
	`created_at` text NOT NULL,
	CONSTRAINT "person_email_lower" CHECK("person"."email" = lower("person"."email"))
);
--> statement-breakpoint
CREATE UNIQUE INDEX `person_email` ON `person` (`email`);--> statement-breakpoint
CREATE TABLE `person_role` (
	`person_id` text NOT NULL,
	`role` text NOT NULL,
	PRIMARY KEY(`person_id`, `role`),
	FOREIGN KEY (`person_id`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "person_role_known" CHECK("person_role"."role" IN ('engineer', 'reviewer', 'authority', 'auditor', 'administrator'))
);
--> statement-breakpoint
CREATE INDEX `person_role_by_role` ON `person_role` (`role`);--> statement-breakpoint
CREATE TABLE `correlation` (
	`id` integer PRIMARY KEY NOT NULL,
	`slug` text NOT NULL,
	`geometry` text NOT NULL,
	`created_at` text NOT NULL,
	`created_by` text NOT NULL,
	FOREIGN KEY (`geometry`) REFERENCES `geometry`(`slug`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `correlation_slug_unique` ON `correlation` (`slug`);--> statement-breakpoint
CREATE TABLE `property_equation` (
	`id` integer PRIMARY KEY NOT NULL,
	`slug` text NOT NULL,
	`created_at` text NOT NULL,
	`created_by` text NOT NULL
);
--> statement-breakpoint
CREATE UNIQUE INDEX `property_equation_slug_unique` ON `property_equation` (`slug`);--> statement-breakpoint
CREATE TABLE `approval` (
	`id` integer PRIMARY KEY NOT NULL,
	`revision_id` integer NOT NULL,
	`hash` text NOT NULL,
	`by_id` text NOT NULL,
	`by_name` text NOT NULL,
	`meaning` text NOT NULL,
	`note` text,
	`at` text NOT NULL,
	FOREIGN KEY (`revision_id`) REFERENCES `revision`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `approval_revision_id_unique` ON `approval` (`revision_id`);--> statement-breakpoint
CREATE TABLE `comment` (
	`id` integer PRIMARY KEY NOT NULL,
	`revision_id` integer NOT NULL,
	`hash` text NOT NULL,
	`field` text NOT NULL,
	`text` text NOT NULL,
	`by_id` text NOT NULL,
	`by_name` text NOT NULL,
	`at` text NOT NULL,
	FOREIGN KEY (`revision_id`) REFERENCES `revision`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `comment_by_revision` ON `comment` (`revision_id`);--> statement-breakpoint
CREATE TABLE `review` (
	`id` integer PRIMARY KEY NOT NULL,
	`revision_id` integer NOT NULL,
	`hash` text NOT NULL,
	`reviewer_id` text NOT NULL,
	`reviewer_name` text NOT NULL,
	`verdict` text NOT NULL,
	`checklist` text NOT NULL,
	`note` text,
	`at` text NOT NULL,
	FOREIGN KEY (`revision_id`) REFERENCES `revision`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `review_by_revision` ON `review` (`revision_id`);--> statement-breakpoint
CREATE TABLE `review_assignment` (
	`id` integer PRIMARY KEY NOT NULL,
	`revision_id` integer NOT NULL,
	`reviewer_id` text NOT NULL,
	`at` text NOT NULL,
	`by_id` text NOT NULL,
	FOREIGN KEY (`revision_id`) REFERENCES `revision`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `assignment_once` ON `review_assignment` (`revision_id`,`reviewer_id`);--> statement-breakpoint
CREATE TABLE `submission` (
	`id` integer PRIMARY KEY NOT NULL,
	`revision_id` integer NOT NULL,
	`hash` text NOT NULL,
	`at` text NOT NULL,
	`by_id` text NOT NULL,
	`by_name` text NOT NULL,
	`engine` text NOT NULL,
	`report` text NOT NULL,
	FOREIGN KEY (`revision_id`) REFERENCES `revision`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `submission_by_revision` ON `submission` (`revision_id`);--> statement-breakpoint
CREATE TABLE `revision` (
	`id` integer PRIMARY KEY NOT NULL,
	`correlation_id` integer,
	`property_equation_id` integer,
	`number` integer NOT NULL,
	`originator_id` text NOT NULL,
	`created_at` text NOT NULL,
	FOREIGN KEY (`correlation_id`) REFERENCES `correlation`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`property_equation_id`) REFERENCES `property_equation`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "revision_has_one_subject" CHECK((correlation_id IS NULL) <> (property_equation_id IS NULL))
);
--> statement-breakpoint
CREATE UNIQUE INDEX `revision_of_correlation` ON `revision` (`correlation_id`,`number`);--> statement-breakpoint
CREATE UNIQUE INDEX `revision_of_property_equation` ON `revision` (`property_equation_id`,`number`);--> statement-breakpoint
CREATE TABLE `revision_content` (
	`id` integer PRIMARY KEY NOT NULL,
	`revision_id` integer NOT NULL,
	`iteration` integer NOT NULL,
	`format` text NOT NULL,
	`canonical_text` text NOT NULL,
	`hash` text NOT NULL,
	`title` text GENERATED ALWAYS AS (json_extract(canonical_text, '$.title')) STORED NOT NULL,
	`phase` text GENERATED ALWAYS AS (json_extract(canonical_text, '$.phase')) STORED,
	`at` text NOT NULL,
	`by_id` text NOT NULL,
	FOREIGN KEY (`revision_id`) REFERENCES `revision`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `content_iteration` ON `revision_content` (`revision_id`,`iteration`);--> statement-breakpoint
CREATE TABLE `standing_event` (
	`id` integer PRIMARY KEY NOT NULL,
	`revision_id` integer NOT NULL,
	`standing` text NOT NULL,
	`hash` text NOT NULL,
	`at` text NOT NULL,
	`by_id` text NOT NULL,
	`by_name` text NOT NULL,
	`note` text,
	`withdrawal_class` text,
	FOREIGN KEY (`revision_id`) REFERENCES `revision`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `standing_event_by_revision` ON `standing_event` (`revision_id`,`id`);--> statement-breakpoint
CREATE TABLE `session` (
	`id_hash` text PRIMARY KEY NOT NULL,
	`person_id` text NOT NULL,
	`started_at` text NOT NULL,
	`seen_at` text NOT NULL,
	`idle_until` text NOT NULL,
	`ends_at` text NOT NULL,
	FOREIGN KEY (`person_id`) REFERENCES `person`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `session_by_person` ON `session` (`person_id`);--> statement-breakpoint
CREATE INDEX `session_by_end` ON `session` (`ends_at`);