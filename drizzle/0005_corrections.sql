CREATE TABLE `correction_effects` (
	`correction_id` integer NOT NULL,
	`sheet_id` integer NOT NULL,
	`evidence_id` integer NOT NULL,
	`effect` text NOT NULL,
	`replacement_sheet_id` integer,
	`at` integer NOT NULL,
	PRIMARY KEY(`correction_id`, `sheet_id`),
	FOREIGN KEY (`correction_id`) REFERENCES `corrections`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`sheet_id`) REFERENCES `sheets`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`evidence_id`) REFERENCES `evidence`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`replacement_sheet_id`) REFERENCES `sheets`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `correction_effects_sheet_id` ON `correction_effects` (`sheet_id`);--> statement-breakpoint
CREATE INDEX `correction_effects_evidence_id` ON `correction_effects` (`evidence_id`);--> statement-breakpoint
CREATE INDEX `correction_effects_replacement_sheet_id` ON `correction_effects` (`replacement_sheet_id`);--> statement-breakpoint
CREATE TABLE `corrections` (
	`id` integer PRIMARY KEY NOT NULL,
	`public_id` text NOT NULL,
	`release_id` integer NOT NULL,
	`from_version_id` integer NOT NULL,
	`to_version_id` integer NOT NULL,
	`whose` text NOT NULL,
	`explanation` text NOT NULL,
	`changed` text NOT NULL,
	`state` text NOT NULL,
	`created_by` integer NOT NULL,
	`created_at` integer NOT NULL,
	`settled_by` integer,
	`settled_at` integer,
	`notices_by` integer,
	`notices_at` integer,
	FOREIGN KEY (`release_id`) REFERENCES `releases`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`from_version_id`) REFERENCES `release_versions`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`to_version_id`) REFERENCES `release_versions`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`created_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`settled_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`notices_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `corrections_public_id` ON `corrections` (`public_id`);--> statement-breakpoint
CREATE UNIQUE INDEX `corrections_one_staged` ON `corrections` (`release_id`) WHERE "corrections"."state" = 'staged';--> statement-breakpoint
CREATE INDEX `corrections_release_id` ON `corrections` (`release_id`);--> statement-breakpoint
CREATE INDEX `corrections_from_version_id` ON `corrections` (`from_version_id`);--> statement-breakpoint
CREATE INDEX `corrections_to_version_id` ON `corrections` (`to_version_id`);--> statement-breakpoint
CREATE INDEX `corrections_created_by` ON `corrections` (`created_by`);--> statement-breakpoint
CREATE INDEX `corrections_settled_by` ON `corrections` (`settled_by`);--> statement-breakpoint
CREATE INDEX `corrections_notices_by` ON `corrections` (`notices_by`);--> statement-breakpoint
ALTER TABLE `sheets` ADD `correction_id` integer REFERENCES corrections(id);--> statement-breakpoint
ALTER TABLE `sheets` ADD `replaces_sheet_id` integer REFERENCES sheets(id);--> statement-breakpoint
CREATE INDEX `sheets_correction_id` ON `sheets` (`correction_id`);--> statement-breakpoint
CREATE INDEX `sheets_replaces_sheet_id` ON `sheets` (`replaces_sheet_id`);