CREATE TABLE `embed_versions` (
	`id` integer PRIMARY KEY NOT NULL,
	`embed_id` integer NOT NULL,
	`number` integer NOT NULL,
	`evidence_id` integer NOT NULL,
	`state` text NOT NULL,
	`created_at` integer NOT NULL,
	`pulled_at` integer,
	`pulled_unseen` integer DEFAULT false NOT NULL,
	FOREIGN KEY (`embed_id`) REFERENCES `embeds`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`evidence_id`) REFERENCES `evidence`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `embed_versions_embed_number` ON `embed_versions` (`embed_id`,`number`);--> statement-breakpoint
CREATE INDEX `embed_versions_evidence_id` ON `embed_versions` (`evidence_id`);--> statement-breakpoint
CREATE TABLE `embeds` (
	`id` integer PRIMARY KEY NOT NULL,
	`public_id` text NOT NULL,
	`sheet_id` integer NOT NULL,
	`created_by` integer NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`sheet_id`) REFERENCES `sheets`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`created_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `embeds_public_id` ON `embeds` (`public_id`);--> statement-breakpoint
CREATE UNIQUE INDEX `embeds_sheet_id` ON `embeds` (`sheet_id`);--> statement-breakpoint
CREATE INDEX `embeds_created_by` ON `embeds` (`created_by`);--> statement-breakpoint
CREATE TABLE `first_administrator_codes` (
	`id` integer PRIMARY KEY NOT NULL,
	`code_hash` text NOT NULL,
	`used_at` integer
);
--> statement-breakpoint
CREATE TABLE `people` (
	`id` integer PRIMARY KEY NOT NULL,
	`public_id` text NOT NULL,
	`name` text NOT NULL,
	`email` text NOT NULL,
	`password_hash` text,
	`code_hash` text,
	`code_expires_at` integer,
	`disabled_at` integer,
	`created_at` integer NOT NULL,
	`version` integer DEFAULT 1 NOT NULL
);
--> statement-breakpoint
CREATE UNIQUE INDEX `people_public_id` ON `people` (`public_id`);--> statement-breakpoint
CREATE UNIQUE INDEX `people_email` ON `people` (`email`);--> statement-breakpoint
CREATE TABLE `person_roles` (
	`person_id` integer NOT NULL,
	`role` text NOT NULL,
	PRIMARY KEY(`person_id`, `role`),
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `sessions` (
	`id` integer PRIMARY KEY NOT NULL,
	`token_hash` text NOT NULL,
	`person_id` integer NOT NULL,
	`created_at` integer NOT NULL,
	`expires_at` integer NOT NULL,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `sessions_token_hash` ON `sessions` (`token_hash`);--> statement-breakpoint
CREATE INDEX `sessions_person_id` ON `sessions` (`person_id`);--> statement-breakpoint
CREATE TABLE `sign_in_failures` (
	`id` integer PRIMARY KEY NOT NULL,
	`bucket` text NOT NULL,
	`at` integer NOT NULL
);
--> statement-breakpoint
CREATE INDEX `sign_in_failures_bucket_at` ON `sign_in_failures` (`bucket`,`at`);--> statement-breakpoint
CREATE TABLE `pollsters` (
	`id` integer PRIMARY KEY NOT NULL,
	`public_id` text NOT NULL,
	`name` text NOT NULL,
	`created_at` integer NOT NULL
);
--> statement-breakpoint
CREATE UNIQUE INDEX `pollsters_public_id` ON `pollsters` (`public_id`);--> statement-breakpoint
CREATE UNIQUE INDEX `pollsters_name` ON `pollsters` (`name`);--> statement-breakpoint
CREATE TABLE `race_options` (
	`id` integer PRIMARY KEY NOT NULL,
	`race_id` integer NOT NULL,
	`name` text NOT NULL,
	`position` integer NOT NULL,
	FOREIGN KEY (`race_id`) REFERENCES `races`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `race_options_race_name` ON `race_options` (`race_id`,`name`);--> statement-breakpoint
CREATE TABLE `race_thresholds` (
	`id` integer PRIMARY KEY NOT NULL,
	`race_id` integer NOT NULL,
	`race_option_id` integer NOT NULL,
	`pct` real NOT NULL,
	`base` text NOT NULL,
	FOREIGN KEY (`race_id`) REFERENCES `races`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`race_option_id`) REFERENCES `race_options`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `race_thresholds_race_id` ON `race_thresholds` (`race_id`);--> statement-breakpoint
CREATE INDEX `race_thresholds_race_option_id` ON `race_thresholds` (`race_option_id`);--> statement-breakpoint
CREATE TABLE `races` (
	`id` integer PRIMARY KEY NOT NULL,
	`public_id` text NOT NULL,
	`name` text NOT NULL,
	`kind` text NOT NULL,
	`created_at` integer NOT NULL,
	`archived_at` integer
);
--> statement-breakpoint
CREATE UNIQUE INDEX `races_public_id` ON `races` (`public_id`);--> statement-breakpoint
CREATE UNIQUE INDEX `races_name` ON `races` (`name`);--> statement-breakpoint
CREATE TABLE `sponsors` (
	`id` integer PRIMARY KEY NOT NULL,
	`public_id` text NOT NULL,
	`name` text NOT NULL,
	`created_at` integer NOT NULL
);
--> statement-breakpoint
CREATE UNIQUE INDEX `sponsors_public_id` ON `sponsors` (`public_id`);--> statement-breakpoint
CREATE UNIQUE INDEX `sponsors_name` ON `sponsors` (`name`);--> statement-breakpoint
CREATE TABLE `jobs` (
	`id` integer PRIMARY KEY NOT NULL,
	`kind` text NOT NULL,
	`payload` text NOT NULL,
	`idempotency_key` text NOT NULL,
	`state` text NOT NULL,
	`run_at` integer NOT NULL,
	`attempts` integer DEFAULT 0 NOT NULL,
	`last_error` text,
	`created_at` integer NOT NULL
);
--> statement-breakpoint
CREATE UNIQUE INDEX `jobs_idempotency_key` ON `jobs` (`idempotency_key`);--> statement-breakpoint
CREATE INDEX `jobs_state_run_at` ON `jobs` (`state`,`run_at`);--> statement-breakpoint
CREATE TABLE `records` (
	`seq` integer PRIMARY KEY NOT NULL,
	`at` integer NOT NULL,
	`person_id` integer,
	`action` text NOT NULL,
	`entity` text NOT NULL,
	`entity_id` text NOT NULL,
	`before` text,
	`after` text,
	`reason` text,
	`release_id` integer,
	`row_hash` text NOT NULL,
	`previous_hash` text NOT NULL,
	`hash` text NOT NULL
);
--> statement-breakpoint
CREATE INDEX `records_entity` ON `records` (`entity`,`entity_id`);--> statement-breakpoint
CREATE INDEX `records_release_id` ON `records` (`release_id`);--> statement-breakpoint
CREATE TABLE `bases` (
	`id` integer PRIMARY KEY NOT NULL,
	`release_version_id` integer NOT NULL,
	`position` integer NOT NULL,
	`population_status` text NOT NULL,
	`population` text,
	`n_status` text NOT NULL,
	`n` integer,
	`design` text NOT NULL,
	`deff_source` text,
	`deff` real,
	`deff_df` integer,
	`stated_margin_status` text NOT NULL,
	`stated_margin_pp` text,
	`stated_margin_unit` text,
	`stated_margin_level` text,
	`modelled_pp` text,
	`modelled_unit` text,
	`modelled_level` text,
	FOREIGN KEY (`release_version_id`) REFERENCES `release_versions`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `bases_release_version_id` ON `bases` (`release_version_id`);--> statement-breakpoint
CREATE TABLE `comparison_overrides` (
	`id` integer PRIMARY KEY NOT NULL,
	`release_version_id` integer NOT NULL,
	`comparison_version_id` integer NOT NULL,
	`reason` text NOT NULL,
	`person_id` integer NOT NULL,
	`at` integer NOT NULL,
	FOREIGN KEY (`release_version_id`) REFERENCES `release_versions`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`comparison_version_id`) REFERENCES `release_versions`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `comparison_overrides_release_version` ON `comparison_overrides` (`release_version_id`);--> statement-breakpoint
CREATE INDEX `comparison_overrides_comparison_version` ON `comparison_overrides` (`comparison_version_id`);--> statement-breakpoint
CREATE INDEX `comparison_overrides_person` ON `comparison_overrides` (`person_id`);--> statement-breakpoint
CREATE TABLE `embargo_list` (
	`id` integer PRIMARY KEY NOT NULL,
	`release_id` integer NOT NULL,
	`person_id` integer,
	`added_by` integer NOT NULL,
	`added_at` integer NOT NULL,
	FOREIGN KEY (`release_id`) REFERENCES `releases`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`added_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `embargo_list_release_person` ON `embargo_list` (`release_id`,`person_id`);--> statement-breakpoint
CREATE INDEX `embargo_list_person_id` ON `embargo_list` (`person_id`);--> statement-breakpoint
CREATE INDEX `embargo_list_added_by` ON `embargo_list` (`added_by`);--> statement-breakpoint
CREATE TABLE `embargo_views` (
	`id` integer PRIMARY KEY NOT NULL,
	`release_id` integer NOT NULL,
	`person_id` integer NOT NULL,
	`at` integer NOT NULL,
	`what` text NOT NULL,
	FOREIGN KEY (`release_id`) REFERENCES `releases`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `embargo_views_release_id` ON `embargo_views` (`release_id`);--> statement-breakpoint
CREATE INDEX `embargo_views_person_id` ON `embargo_views` (`person_id`);--> statement-breakpoint
CREATE TABLE `finding_index` (
	`id` integer PRIMARY KEY NOT NULL,
	`release_version_id` integer NOT NULL,
	`policy_version` integer NOT NULL,
	`engine` text NOT NULL,
	`finding_key` text NOT NULL,
	`verdict` text NOT NULL,
	`z` real,
	`p` real,
	FOREIGN KEY (`release_version_id`) REFERENCES `release_versions`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `finding_index_key` ON `finding_index` (`release_version_id`,`policy_version`,`engine`,`finding_key`);--> statement-breakpoint
CREATE TABLE `questions` (
	`id` integer PRIMARY KEY NOT NULL,
	`base_id` integer NOT NULL,
	`position` integer NOT NULL,
	`wording_status` text NOT NULL,
	`wording` text,
	`same_question` integer DEFAULT false NOT NULL,
	`decimals` integer NOT NULL,
	FOREIGN KEY (`base_id`) REFERENCES `bases`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `questions_base_id` ON `questions` (`base_id`);--> statement-breakpoint
CREATE TABLE `release_drafts` (
	`id` integer PRIMARY KEY NOT NULL,
	`person_id` integer NOT NULL,
	`key` text NOT NULL,
	`body` text NOT NULL,
	`updated_at` integer NOT NULL,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `release_drafts_person_key` ON `release_drafts` (`person_id`,`key`);--> statement-breakpoint
CREATE TABLE `release_versions` (
	`id` integer PRIMARY KEY NOT NULL,
	`public_id` text NOT NULL,
	`release_id` integer NOT NULL,
	`number` integer NOT NULL,
	`sponsor_status` text NOT NULL,
	`sponsor_id` integer,
	`mode_status` text NOT NULL,
	`mode` text,
	`sample_source` text NOT NULL,
	`field_start_on` text NOT NULL,
	`field_end_on` text NOT NULL,
	`published_on` text NOT NULL,
	`source_url_status` text NOT NULL,
	`source_url` text,
	`method_note` text,
	`created_by` integer NOT NULL,
	`created_at` integer NOT NULL,
	`frozen_at` integer,
	FOREIGN KEY (`release_id`) REFERENCES `releases`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`sponsor_id`) REFERENCES `sponsors`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`created_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `release_versions_public_id` ON `release_versions` (`public_id`);--> statement-breakpoint
CREATE UNIQUE INDEX `release_versions_release_number` ON `release_versions` (`release_id`,`number`);--> statement-breakpoint
CREATE INDEX `release_versions_sponsor_id` ON `release_versions` (`sponsor_id`);--> statement-breakpoint
CREATE INDEX `release_versions_created_by` ON `release_versions` (`created_by`);--> statement-breakpoint
CREATE TABLE `releases` (
	`id` integer PRIMARY KEY NOT NULL,
	`public_id` text NOT NULL,
	`race_id` integer NOT NULL,
	`pollster_id` integer NOT NULL,
	`current_version_id` integer,
	`embargo_at` integer,
	`embargo_local` text,
	`embargo_zone` text,
	`embargo_lifted_at` integer,
	`created_by` integer NOT NULL,
	`created_at` integer NOT NULL,
	`submission_key` text NOT NULL,
	`archived_at` integer,
	`version` integer DEFAULT 1 NOT NULL,
	FOREIGN KEY (`race_id`) REFERENCES `races`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`pollster_id`) REFERENCES `pollsters`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`created_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `releases_public_id` ON `releases` (`public_id`);--> statement-breakpoint
CREATE UNIQUE INDEX `releases_submission_key` ON `releases` (`submission_key`);--> statement-breakpoint
CREATE INDEX `releases_race_id` ON `releases` (`race_id`);--> statement-breakpoint
CREATE INDEX `releases_pollster_id` ON `releases` (`pollster_id`);--> statement-breakpoint
CREATE INDEX `releases_created_by` ON `releases` (`created_by`);--> statement-breakpoint
CREATE INDEX `releases_created_at` ON `releases` (`created_at`);--> statement-breakpoint
CREATE TABLE `shares` (
	`id` integer PRIMARY KEY NOT NULL,
	`question_id` integer NOT NULL,
	`position` integer NOT NULL,
	`option` text NOT NULL,
	`status` text NOT NULL,
	`units` integer,
	`is_answer` integer NOT NULL,
	`entered_by` integer NOT NULL,
	FOREIGN KEY (`question_id`) REFERENCES `questions`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`entered_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `shares_question_option` ON `shares` (`question_id`,`option`);--> statement-breakpoint
CREATE INDEX `shares_entered_by` ON `shares` (`entered_by`);--> statement-breakpoint
CREATE TABLE `clearing_lines` (
	`clearing_id` integer NOT NULL,
	`line_version_id` integer NOT NULL,
	PRIMARY KEY(`clearing_id`, `line_version_id`),
	FOREIGN KEY (`clearing_id`) REFERENCES `clearings`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`line_version_id`) REFERENCES `line_versions`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `clearing_lines_line_version_id` ON `clearing_lines` (`line_version_id`);--> statement-breakpoint
CREATE TABLE `clearings` (
	`id` integer PRIMARY KEY NOT NULL,
	`public_id` text NOT NULL,
	`sheet_id` integer NOT NULL,
	`evidence_id` integer,
	`act` text NOT NULL,
	`person_id` integer NOT NULL,
	`roles` text NOT NULL,
	`comment` text,
	`at` integer NOT NULL,
	FOREIGN KEY (`sheet_id`) REFERENCES `sheets`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`evidence_id`) REFERENCES `evidence`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `clearings_public_id` ON `clearings` (`public_id`);--> statement-breakpoint
CREATE INDEX `clearings_sheet_id` ON `clearings` (`sheet_id`);--> statement-breakpoint
CREATE INDEX `clearings_person_id` ON `clearings` (`person_id`);--> statement-breakpoint
CREATE UNIQUE INDEX `clearings_one_filed` ON `clearings` (`evidence_id`) WHERE "clearings"."act" = 'filed';--> statement-breakpoint
CREATE UNIQUE INDEX `clearings_one_cleared` ON `clearings` (`evidence_id`) WHERE "clearings"."act" = 'cleared';--> statement-breakpoint
CREATE TABLE `copies` (
	`id` integer PRIMARY KEY NOT NULL,
	`line_version_id` integer NOT NULL,
	`person_id` integer NOT NULL,
	`form` text NOT NULL,
	`under_embargo` integer NOT NULL,
	`at` integer NOT NULL,
	FOREIGN KEY (`line_version_id`) REFERENCES `line_versions`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `copies_line_version_id` ON `copies` (`line_version_id`);--> statement-breakpoint
CREATE INDEX `copies_person_id` ON `copies` (`person_id`);--> statement-breakpoint
CREATE TABLE `evidence` (
	`id` integer PRIMARY KEY NOT NULL,
	`public_id` text NOT NULL,
	`sheet_id` integer NOT NULL,
	`hash` text NOT NULL,
	`bytes` blob NOT NULL,
	`engine` text NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`sheet_id`) REFERENCES `sheets`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `evidence_public_id` ON `evidence` (`public_id`);--> statement-breakpoint
CREATE INDEX `evidence_sheet_id` ON `evidence` (`sheet_id`);--> statement-breakpoint
CREATE TABLE `evidence_sources` (
	`evidence_id` integer NOT NULL,
	`release_version_id` integer NOT NULL,
	`part` text NOT NULL,
	PRIMARY KEY(`evidence_id`, `release_version_id`, `part`),
	FOREIGN KEY (`evidence_id`) REFERENCES `evidence`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`release_version_id`) REFERENCES `release_versions`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `evidence_sources_release_version_id` ON `evidence_sources` (`release_version_id`);--> statement-breakpoint
CREATE TABLE `house_styles` (
	`id` integer PRIMARY KEY NOT NULL,
	`body` text NOT NULL,
	`created_at` integer NOT NULL
);
--> statement-breakpoint
CREATE TABLE `line_versions` (
	`id` integer PRIMARY KEY NOT NULL,
	`public_id` text NOT NULL,
	`line_id` integer NOT NULL,
	`number` integer NOT NULL,
	`draft_text` text NOT NULL,
	`text` text NOT NULL,
	`state` text NOT NULL,
	`template_version` text NOT NULL,
	`changed_by` integer NOT NULL,
	`changed_at` integer NOT NULL,
	`filed_by` integer,
	`pull_reason` text,
	`version` integer DEFAULT 1 NOT NULL,
	FOREIGN KEY (`line_id`) REFERENCES `lines`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`changed_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`filed_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `line_versions_public_id` ON `line_versions` (`public_id`);--> statement-breakpoint
CREATE UNIQUE INDEX `line_versions_line_number` ON `line_versions` (`line_id`,`number`);--> statement-breakpoint
CREATE UNIQUE INDEX `line_versions_one_cleared` ON `line_versions` (`line_id`) WHERE "line_versions"."state" = 'cleared';--> statement-breakpoint
CREATE INDEX `line_versions_state` ON `line_versions` (`state`);--> statement-breakpoint
CREATE INDEX `line_versions_changed_by` ON `line_versions` (`changed_by`);--> statement-breakpoint
CREATE INDEX `line_versions_filed_by` ON `line_versions` (`filed_by`);--> statement-breakpoint
CREATE TABLE `lines` (
	`id` integer PRIMARY KEY NOT NULL,
	`public_id` text NOT NULL,
	`sheet_id` integer NOT NULL,
	`kind` text NOT NULL,
	`knocked_out` integer DEFAULT false NOT NULL,
	FOREIGN KEY (`sheet_id`) REFERENCES `sheets`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `lines_public_id` ON `lines` (`public_id`);--> statement-breakpoint
CREATE UNIQUE INDEX `lines_sheet_kind` ON `lines` (`sheet_id`,`kind`);--> statement-breakpoint
CREATE TABLE `policies` (
	`id` integer PRIMARY KEY NOT NULL,
	`body` text NOT NULL,
	`created_at` integer NOT NULL
);
--> statement-breakpoint
CREATE TABLE `sheets` (
	`id` integer PRIMARY KEY NOT NULL,
	`public_id` text NOT NULL,
	`release_id` integer NOT NULL,
	`release_version_id` integer NOT NULL,
	`question_id` integer NOT NULL,
	`claim` text NOT NULL,
	`claim_key` text NOT NULL,
	`language` text NOT NULL,
	`author_id` integer NOT NULL,
	`created_at` integer NOT NULL,
	`submission_key` text NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	FOREIGN KEY (`release_id`) REFERENCES `releases`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`release_version_id`) REFERENCES `release_versions`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`question_id`) REFERENCES `questions`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`author_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `sheets_public_id` ON `sheets` (`public_id`);--> statement-breakpoint
CREATE UNIQUE INDEX `sheets_submission_key` ON `sheets` (`submission_key`);--> statement-breakpoint
CREATE INDEX `sheets_release_id` ON `sheets` (`release_id`);--> statement-breakpoint
CREATE INDEX `sheets_release_version_id` ON `sheets` (`release_version_id`);--> statement-breakpoint
CREATE INDEX `sheets_question_id` ON `sheets` (`question_id`);--> statement-breakpoint
CREATE INDEX `sheets_author_id` ON `sheets` (`author_id`);