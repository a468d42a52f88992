CREATE TABLE `files` (
	`id` integer PRIMARY KEY NOT NULL,
	`hash` text NOT NULL,
	`size` integer NOT NULL,
	`type` text NOT NULL,
	`created_by` integer NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`created_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `files_hash` ON `files` (`hash`);--> statement-breakpoint
CREATE INDEX `files_created_by` ON `files` (`created_by`);--> statement-breakpoint
CREATE TABLE `job_process` (
	`id` integer PRIMARY KEY NOT NULL,
	`pid` integer NOT NULL,
	`started_at` integer NOT NULL,
	`beat_at` integer NOT NULL
);
--> statement-breakpoint
CREATE TABLE `outbox` (
	`id` integer PRIMARY KEY NOT NULL,
	`public_id` text NOT NULL,
	`channel` text NOT NULL,
	`kind` text NOT NULL,
	`entity` text NOT NULL,
	`entity_id` text NOT NULL,
	`release_id` integer,
	`to_person` integer,
	`payload` text NOT NULL,
	`created_at` integer NOT NULL,
	`sent_at` integer,
	FOREIGN KEY (`release_id`) REFERENCES `releases`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`to_person`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `outbox_public_id` ON `outbox` (`public_id`);--> statement-breakpoint
CREATE INDEX `outbox_sent_at` ON `outbox` (`sent_at`,`channel`);--> statement-breakpoint
CREATE INDEX `outbox_release_id` ON `outbox` (`release_id`);--> statement-breakpoint
CREATE INDEX `outbox_to_person` ON `outbox` (`to_person`);--> statement-breakpoint
-- Nothing has written to this table before: it is made anew, with a public id that no row can lack.
DROP TABLE `jobs`;
--> statement-breakpoint
CREATE TABLE `jobs` (
	`id` integer PRIMARY KEY NOT NULL,
	`public_id` text NOT NULL,
	`kind` text NOT NULL,
	`payload` text NOT NULL,
	`idempotency_key` text NOT NULL,
	`state` text NOT NULL,
	`run_at` integer NOT NULL,
	`attempts` integer DEFAULT 0 NOT NULL,
	`last_error` text,
	`cursor` text,
	`progress_done` integer DEFAULT 0 NOT NULL,
	`progress_total` integer,
	`progress_note` text,
	`lease_by` text,
	`lease_until` integer,
	`release_id` integer,
	`asked_by` integer,
	`created_at` integer NOT NULL,
	`started_at` integer,
	`ended_at` integer,
	`cancel_requested_at` integer,
	`cancel_requested_by` integer,
	FOREIGN KEY (`release_id`) REFERENCES `releases`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`asked_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`cancel_requested_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `jobs_public_id` ON `jobs` (`public_id`);--> statement-breakpoint
CREATE UNIQUE INDEX `jobs_idempotency_key` ON `jobs` (`idempotency_key`);--> statement-breakpoint
CREATE INDEX `jobs_state_run_at` ON `jobs` (`state`,`run_at`);--> statement-breakpoint
CREATE INDEX `jobs_release_id` ON `jobs` (`release_id`);--> statement-breakpoint
CREATE INDEX `jobs_asked_by` ON `jobs` (`asked_by`);--> statement-breakpoint
CREATE INDEX `jobs_cancel_requested_by` ON `jobs` (`cancel_requested_by`);
