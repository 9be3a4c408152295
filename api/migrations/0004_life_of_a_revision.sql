CREATE TABLE `former_journal` (
	`place` integer PRIMARY KEY NOT NULL,
	`checkpoints` text NOT NULL,
	`keys` text NOT NULL
);
--> statement-breakpoint
CREATE TABLE `former_journal_entry` (
	`place` integer NOT NULL,
	`index` integer NOT NULL,
	`entry` text NOT NULL,
	PRIMARY KEY(`place`, `index`),
	FOREIGN KEY (`place`) REFERENCES `former_journal`(`place`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `former_person` (
	`id` text PRIMARY KEY NOT NULL,
	`name` text NOT NULL
);
--> statement-breakpoint
CREATE TABLE `problem_report` (
	`id` integer PRIMARY KEY NOT NULL,
	`revision_id` integer NOT NULL,
	`hash` text NOT NULL,
	`severity` text NOT NULL,
	`text` text NOT NULL,
	`by_id` text NOT NULL,
	`by_name` text NOT NULL,
	`at` text NOT NULL,
	FOREIGN KEY (`revision_id`) REFERENCES `revision`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `problem_report_by_revision` ON `problem_report` (`revision_id`);--> statement-breakpoint
CREATE TABLE `problem_report_answer` (
	`id` integer PRIMARY KEY NOT NULL,
	`report_id` integer NOT NULL,
	`outcome` text NOT NULL,
	`text` text NOT NULL,
	`by_id` text NOT NULL,
	`by_name` text NOT NULL,
	`at` text NOT NULL,
	FOREIGN KEY (`report_id`) REFERENCES `problem_report`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `problem_report_answer_report_id_unique` ON `problem_report_answer` (`report_id`);--> statement-breakpoint
CREATE TABLE `comment_answer` (
	`id` integer PRIMARY KEY NOT NULL,
	`comment_id` integer NOT NULL,
	`text` text NOT NULL,
	`by_id` text NOT NULL,
	`by_name` text NOT NULL,
	`at` text NOT NULL,
	FOREIGN KEY (`comment_id`) REFERENCES `comment`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `comment_answer_by_comment` ON `comment_answer` (`comment_id`);--> statement-breakpoint
CREATE TABLE `comment_resolution` (
	`id` integer PRIMARY KEY NOT NULL,
	`comment_id` integer NOT NULL,
	`by_id` text NOT NULL,
	`by_name` text NOT NULL,
	`at` text NOT NULL,
	FOREIGN KEY (`comment_id`) REFERENCES `comment`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `comment_resolution_comment_id_unique` ON `comment_resolution` (`comment_id`);--> statement-breakpoint
ALTER TABLE `approval` ADD `effective_from` text;--> statement-breakpoint
ALTER TABLE `approval` ADD `review_due` text;--> statement-breakpoint
ALTER TABLE `comment` ADD `iteration` integer DEFAULT 1 NOT NULL;--> statement-breakpoint
ALTER TABLE `review` ADD `iteration` integer DEFAULT 1 NOT NULL;--> statement-breakpoint
ALTER TABLE `review` ADD `round` integer DEFAULT 1 NOT NULL;--> statement-breakpoint
ALTER TABLE `submission` ADD `iteration` integer DEFAULT 1 NOT NULL;--> statement-breakpoint
ALTER TABLE `submission` ADD `round` integer DEFAULT 1 NOT NULL;--> statement-breakpoint
ALTER TABLE `submission` ADD `note` text;--> statement-breakpoint
ALTER TABLE `standing_event` ADD `successor` text;--> statement-breakpoint
ALTER TABLE `standing_event` ADD `problem_report_id` integer;--> statement-breakpoint
-- Rows written before say which iteration they spoke of by its hash and their time. The guards that keep these rows
-- are set again after every migration.
DROP TRIGGER IF EXISTS submission_keeps_rows;--> statement-breakpoint
DROP TRIGGER IF EXISTS review_keeps_rows;--> statement-breakpoint
DROP TRIGGER IF EXISTS comment_keeps_rows;--> statement-breakpoint
UPDATE submission SET
  iteration = coalesce((
    SELECT max(c.iteration) FROM revision_content c
    WHERE c.revision_id = submission.revision_id AND c.hash = submission.hash AND c.at <= submission.at), 1),
  round = (SELECT count(*) FROM submission s WHERE s.revision_id = submission.revision_id AND s.id <= submission.id);
--> statement-breakpoint
UPDATE review SET
  iteration = coalesce((
    SELECT max(c.iteration) FROM revision_content c
    WHERE c.revision_id = review.revision_id AND c.hash = review.hash AND c.at <= review.at), 1),
  round = max(1, (SELECT count(*) FROM submission s WHERE s.revision_id = review.revision_id AND s.at <= review.at));
--> statement-breakpoint
UPDATE comment SET
  iteration = coalesce((
    SELECT max(c.iteration) FROM revision_content c
    WHERE c.revision_id = comment.revision_id AND c.hash = comment.hash AND c.at <= comment.at), 1);
--> statement-breakpoint
DROP VIEW revision_now;
--> statement-breakpoint
-- Each revision with its last standing and its latest content. An approved one is superseded from the moment on at
-- which a later one that still stands approved becomes effective.
CREATE VIEW revision_now AS
SELECT
  r.id AS id,
  CASE WHEN r.correlation_id IS NULL THEN 'property-equation' ELSE 'correlation' END AS kind,
  coalesce(k.slug, e.slug) AS slug,
  k.geometry AS geometry,
  r.number AS number,
  r.originator_id AS originator_id,
  r.created_at AS created_at,
  s.standing AS standing,
  s.at AS standing_at,
  s.note AS standing_note,
  c.id AS content_id,
  c.iteration AS iteration,
  c.hash AS hash,
  c.title AS title,
  c.phase AS phase,
  coalesce(a.effective_from, a.at) AS effective_from,
  a.review_due AS review_due,
  later.from_then AS superseded_from,
  later.number AS superseded_by
FROM revision r
LEFT JOIN correlation k ON k.id = r.correlation_id
LEFT JOIN property_equation e ON e.id = r.property_equation_id
JOIN standing_event s
  ON s.id = (SELECT x.id FROM standing_event x WHERE x.revision_id = r.id ORDER BY x.id DESC LIMIT 1)
JOIN revision_content c
  ON c.id = (SELECT y.id FROM revision_content y WHERE y.revision_id = r.id ORDER BY y.iteration DESC LIMIT 1)
LEFT JOIN approval a ON a.revision_id = r.id
LEFT JOIN (
  SELECT m.id AS id, m.number AS number,
    max(coalesce(b.effective_from, b.at), t.at) AS from_then
  FROM revision m
  JOIN approval b ON b.revision_id = m.id
  JOIN standing_event t
    ON t.id = (SELECT z.id FROM standing_event z WHERE z.revision_id = m.id ORDER BY z.id DESC LIMIT 1)
  WHERE t.standing = 'approved'
) later ON later.id = (
  SELECT m.id FROM revision m
  JOIN approval b ON b.revision_id = m.id
  JOIN standing_event t
    ON t.id = (SELECT z.id FROM standing_event z WHERE z.revision_id = m.id ORDER BY z.id DESC LIMIT 1)
  WHERE t.standing = 'approved' AND m.number > r.number
    AND (m.correlation_id = r.correlation_id OR m.property_equation_id = r.property_equation_id)
  ORDER BY max(coalesce(b.effective_from, b.at), t.at), m.number LIMIT 1
);
