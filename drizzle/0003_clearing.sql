CREATE TABLE `on_call_shifts` (
	`id` integer PRIMARY KEY NOT NULL,
	`public_id` text NOT NULL,
	`person_id` integer NOT NULL,
	`weekday` integer,
	`on_day` text,
	`from_time` text NOT NULL,
	`to_time` text NOT NULL,
	`zone` text NOT NULL,
	`added_by` integer NOT NULL,
	`added_at` integer NOT NULL,
	`removed_by` integer,
	`removed_at` integer,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`added_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`removed_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `on_call_shifts_public_id` ON `on_call_shifts` (`public_id`);--> statement-breakpoint
CREATE INDEX `on_call_shifts_person_id` ON `on_call_shifts` (`person_id`);--> statement-breakpoint
CREATE INDEX `on_call_shifts_removed_at` ON `on_call_shifts` (`removed_at`);--> statement-breakpoint
CREATE INDEX `on_call_shifts_added_by` ON `on_call_shifts` (`added_by`);--> statement-breakpoint
CREATE INDEX `on_call_shifts_removed_by` ON `on_call_shifts` (`removed_by`);--> statement-breakpoint
CREATE TABLE `publication_bans` (
	`id` integer PRIMARY KEY NOT NULL,
	`public_id` text NOT NULL,
	`jurisdiction` text NOT NULL,
	`race_id` integer,
	`bars` text NOT NULL,
	`from_at` integer NOT NULL,
	`from_local` text NOT NULL,
	`to_at` integer NOT NULL,
	`to_local` text NOT NULL,
	`zone` text NOT NULL,
	`rule` text NOT NULL,
	`entered_by` integer NOT NULL,
	`entered_at` integer NOT NULL,
	`ended_by` integer,
	`ended_at` integer,
	`end_reason` text,
	FOREIGN KEY (`race_id`) REFERENCES `races`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`entered_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`ended_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `publication_bans_public_id` ON `publication_bans` (`public_id`);--> statement-breakpoint
CREATE INDEX `publication_bans_race_id` ON `publication_bans` (`race_id`);--> statement-breakpoint
CREATE INDEX `publication_bans_to_at` ON `publication_bans` (`to_at`);--> statement-breakpoint
CREATE INDEX `publication_bans_entered_by` ON `publication_bans` (`entered_by`);--> statement-breakpoint
CREATE INDEX `publication_bans_ended_by` ON `publication_bans` (`ended_by`);--> statement-breakpoint
CREATE TABLE `clearing_line_reasons` (
	`clearing_id` integer NOT NULL,
	`line_version_id` integer NOT NULL,
	`reason` text NOT NULL,
	PRIMARY KEY(`clearing_id`, `line_version_id`),
	FOREIGN KEY (`clearing_id`) REFERENCES `clearings`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`line_version_id`) REFERENCES `line_versions`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `clearing_line_reasons_line_version_id` ON `clearing_line_reasons` (`line_version_id`);--> statement-breakpoint
CREATE TABLE `line_comments` (
	`id` integer PRIMARY KEY NOT NULL,
	`public_id` text NOT NULL,
	`line_id` integer NOT NULL,
	`line_version_id` integer NOT NULL,
	`start_at` integer NOT NULL,
	`end_at` integer NOT NULL,
	`quote` text NOT NULL,
	`body` text NOT NULL,
	`person_id` integer NOT NULL,
	`at` integer NOT NULL,
	`resolved_by` integer,
	`resolved_at` integer,
	FOREIGN KEY (`line_id`) REFERENCES `lines`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`line_version_id`) REFERENCES `line_versions`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`resolved_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `line_comments_public_id` ON `line_comments` (`public_id`);--> statement-breakpoint
CREATE INDEX `line_comments_line_id` ON `line_comments` (`line_id`);--> statement-breakpoint
CREATE INDEX `line_comments_line_version_id` ON `line_comments` (`line_version_id`);--> statement-breakpoint
CREATE INDEX `line_comments_person_id` ON `line_comments` (`person_id`);--> statement-breakpoint
CREATE INDEX `line_comments_resolved_by` ON `line_comments` (`resolved_by`);--> statement-breakpoint
CREATE TABLE `one_reader_releases` (
	`evidence_id` integer PRIMARY KEY NOT NULL,
	`sheet_id` integer NOT NULL,
	`person_id` integer NOT NULL,
	`house_style_id` integer NOT NULL,
	`local_time` text NOT NULL,
	`night_from` text NOT NULL,
	`night_to` text NOT NULL,
	`zone` text NOT NULL,
	`at` integer NOT NULL,
	`second_person_id` integer,
	`second_at` integer,
	FOREIGN KEY (`evidence_id`) REFERENCES `evidence`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`sheet_id`) REFERENCES `sheets`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`house_style_id`) REFERENCES `house_styles`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`second_person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `one_reader_releases_sheet_id` ON `one_reader_releases` (`sheet_id`);--> statement-breakpoint
CREATE INDEX `one_reader_releases_person_id` ON `one_reader_releases` (`person_id`);--> statement-breakpoint
CREATE INDEX `one_reader_releases_house_style_id` ON `one_reader_releases` (`house_style_id`);--> statement-breakpoint
CREATE INDEX `one_reader_releases_second_person_id` ON `one_reader_releases` (`second_person_id`);--> statement-breakpoint
CREATE TABLE `sheet_looks` (
	`id` integer PRIMARY KEY NOT NULL,
	`clearing_id` integer NOT NULL,
	`person_id` integer NOT NULL,
	`at` integer NOT NULL,
	FOREIGN KEY (`clearing_id`) REFERENCES `clearings`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `sheet_looks_clearing_person` ON `sheet_looks` (`clearing_id`,`person_id`);--> statement-breakpoint
CREATE INDEX `sheet_looks_person_id` ON `sheet_looks` (`person_id`);--> statement-breakpoint
CREATE TABLE `sheet_presence` (
	`sheet_id` integer NOT NULL,
	`person_id` integer NOT NULL,
	`doing` text NOT NULL,
	`seen_at` integer NOT NULL,
	PRIMARY KEY(`sheet_id`, `person_id`),
	FOREIGN KEY (`sheet_id`) REFERENCES `sheets`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `sheet_presence_person_id` ON `sheet_presence` (`person_id`);--> statement-breakpoint
CREATE INDEX `sheet_presence_seen_at` ON `sheet_presence` (`seen_at`);--> statement-breakpoint
CREATE TABLE `sheet_reviews` (
	`id` integer PRIMARY KEY NOT NULL,
	`sheet_id` integer NOT NULL,
	`cause_sheet_id` integer NOT NULL,
	`cause` text NOT NULL,
	`at` integer NOT NULL,
	`settled_by` integer,
	`settled_at` integer,
	`settled_as` text,
	FOREIGN KEY (`sheet_id`) REFERENCES `sheets`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`cause_sheet_id`) REFERENCES `sheets`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`settled_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `sheet_reviews_sheet_id` ON `sheet_reviews` (`sheet_id`,`settled_at`);--> statement-breakpoint
CREATE INDEX `sheet_reviews_cause_sheet_id` ON `sheet_reviews` (`cause_sheet_id`);--> statement-breakpoint
CREATE INDEX `sheet_reviews_settled_by` ON `sheet_reviews` (`settled_by`);--> statement-breakpoint
CREATE TABLE `sheet_terms` (
	`sheet_id` integer PRIMARY KEY NOT NULL,
	`wanted_at` integer,
	`wanted_local` text,
	`wanted_zone` text,
	`shelf_days` integer,
	`set_by` integer NOT NULL,
	`set_at` integer NOT NULL,
	FOREIGN KEY (`sheet_id`) REFERENCES `sheets`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`set_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `sheet_terms_wanted_at` ON `sheet_terms` (`wanted_at`);--> statement-breakpoint
CREATE INDEX `sheet_terms_set_by` ON `sheet_terms` (`set_by`);--> statement-breakpoint
CREATE TRIGGER line_comments_kept BEFORE UPDATE ON line_comments
WHEN OLD.resolved_at IS NOT NULL OR NEW.line_version_id <> OLD.line_version_id OR NEW.line_id <> OLD.line_id OR NEW.quote <> OLD.quote
  OR NEW.body <> OLD.body OR NEW.person_id <> OLD.person_id OR NEW.at <> OLD.at OR NEW.start_at <> OLD.start_at OR NEW.end_at <> OLD.end_at
BEGIN SELECT RAISE(ABORT, 'a comment is resolved, never rewritten'); END;
--> statement-breakpoint
CREATE TRIGGER line_comments_no_delete BEFORE DELETE ON line_comments
WHEN EXISTS (SELECT 1 FROM clearings c JOIN lines l ON l.sheet_id = c.sheet_id WHERE l.id = OLD.line_id)
BEGIN SELECT RAISE(ABORT, 'comments of a sheet that was filed are kept'); END;
--> statement-breakpoint
CREATE TRIGGER clearing_line_reasons_no_update BEFORE UPDATE ON clearing_line_reasons BEGIN SELECT RAISE(ABORT, 'an act is never rewritten'); END;
--> statement-breakpoint
CREATE TRIGGER clearing_line_reasons_no_delete BEFORE DELETE ON clearing_line_reasons BEGIN SELECT RAISE(ABORT, 'an act is never rewritten'); END;
--> statement-breakpoint
CREATE TRIGGER sheet_looks_no_update BEFORE UPDATE ON sheet_looks BEGIN SELECT RAISE(ABORT, 'a look is never rewritten'); END;
--> statement-breakpoint
CREATE TRIGGER sheet_looks_no_delete BEFORE DELETE ON sheet_looks BEGIN SELECT RAISE(ABORT, 'a look is never rewritten'); END;
--> statement-breakpoint
CREATE TRIGGER sheet_looks_second_person BEFORE INSERT ON sheet_looks
WHEN NOT EXISTS (SELECT 1 FROM clearings f WHERE f.id = NEW.clearing_id AND f.act = 'filed' AND f.person_id <> NEW.person_id)
BEGIN SELECT RAISE(ABORT, 'a filing is looked at by somebody else'); END;
--> statement-breakpoint
CREATE TRIGGER on_call_shifts_kept BEFORE UPDATE ON on_call_shifts
WHEN OLD.removed_at IS NOT NULL OR NEW.person_id <> OLD.person_id OR NEW.weekday IS NOT OLD.weekday OR NEW.on_day IS NOT OLD.on_day
  OR NEW.from_time <> OLD.from_time OR NEW.to_time <> OLD.to_time OR NEW.zone <> OLD.zone
BEGIN SELECT RAISE(ABORT, 'a shift is taken off, never rewritten'); END;
--> statement-breakpoint
CREATE TRIGGER on_call_shifts_no_delete BEFORE DELETE ON on_call_shifts BEGIN SELECT RAISE(ABORT, 'shifts are kept'); END;
--> statement-breakpoint
CREATE TRIGGER publication_bans_kept BEFORE UPDATE ON publication_bans
WHEN OLD.ended_at IS NOT NULL OR NEW.jurisdiction <> OLD.jurisdiction OR NEW.race_id IS NOT OLD.race_id OR NEW.bars <> OLD.bars
  OR NEW.from_at <> OLD.from_at OR NEW.to_at <> OLD.to_at OR NEW.rule <> OLD.rule
BEGIN SELECT RAISE(ABORT, 'a ban is ended, never rewritten'); END;
--> statement-breakpoint
CREATE TRIGGER publication_bans_no_delete BEFORE DELETE ON publication_bans BEGIN SELECT RAISE(ABORT, 'bans are kept'); END;
--> statement-breakpoint
CREATE TRIGGER clearings_not_under_ban BEFORE INSERT ON clearings
WHEN NEW.act = 'cleared' AND EXISTS (
  SELECT 1 FROM publication_bans b
  JOIN sheets s ON s.id = NEW.sheet_id
  JOIN releases r ON r.id = s.release_id
  JOIN races c ON c.id = r.race_id
  WHERE b.ended_at IS NULL AND b.from_at <= NEW.at AND NEW.at < b.to_at
    AND (b.race_id = c.id OR (b.race_id IS NULL AND c.kind IN ('candidate', 'party-list', 'referendum')))
)
BEGIN SELECT RAISE(ABORT, 'nothing is cleared while its publication is barred'); END;
--> statement-breakpoint
CREATE TRIGGER one_reader_releases_no_delete BEFORE DELETE ON one_reader_releases BEGIN SELECT RAISE(ABORT, 'an act is never rewritten'); END;
--> statement-breakpoint
CREATE TRIGGER one_reader_releases_second BEFORE UPDATE ON one_reader_releases
WHEN OLD.second_at IS NOT NULL OR NEW.second_person_id IS NULL OR NEW.second_person_id = OLD.person_id OR NEW.evidence_id <> OLD.evidence_id
  OR NEW.sheet_id <> OLD.sheet_id OR NEW.person_id <> OLD.person_id OR NEW.at <> OLD.at OR NEW.house_style_id <> OLD.house_style_id
  OR NEW.local_time <> OLD.local_time OR NEW.night_from <> OLD.night_from OR NEW.night_to <> OLD.night_to
BEGIN SELECT RAISE(ABORT, 'a release by one reader is read by a second person once'); END;
--> statement-breakpoint
CREATE TRIGGER one_reader_releases_at_night BEFORE INSERT ON one_reader_releases
WHEN NEW.second_at IS NOT NULL OR NEW.second_person_id IS NOT NULL
  OR NEW.night_from <> '22:00' OR NEW.night_to <> '06:00'
  OR NOT (NEW.local_time GLOB '[0-2][0-9]:[0-5][0-9]' AND (NEW.local_time >= NEW.night_from OR NEW.local_time < NEW.night_to))
  OR NEW.house_style_id <> (SELECT max(id) FROM house_styles)
  OR NOT EXISTS (
    SELECT 1 FROM house_styles h WHERE h.id = NEW.house_style_id AND json_type(h.body, '$.asPrintedNight') = 'true'
  )
BEGIN SELECT RAISE(ABORT, 'one reader releases only at night, and only where the desk switched it on'); END;
--> statement-breakpoint
DROP TRIGGER clearings_two_people;
--> statement-breakpoint
CREATE TRIGGER clearings_two_people BEFORE INSERT ON clearings
WHEN NEW.act = 'cleared' AND NOT EXISTS (
  SELECT 1 FROM clearings f WHERE f.evidence_id = NEW.evidence_id AND f.act = 'filed' AND f.person_id <> NEW.person_id
)
AND NOT (
  EXISTS (
    SELECT 1 FROM one_reader_releases o
    JOIN evidence e ON e.id = o.evidence_id
    JOIN sheets s ON s.id = o.sheet_id AND s.id = e.sheet_id
    JOIN clearings f ON f.evidence_id = o.evidence_id AND f.act = 'filed' AND f.person_id = o.person_id
    WHERE o.evidence_id = NEW.evidence_id AND o.sheet_id = NEW.sheet_id AND o.person_id = NEW.person_id AND o.at = NEW.at
      AND o.second_at IS NULL AND s.claim_key = 'as-printed'
  )
  AND EXISTS (SELECT 1 FROM json_each(NEW.roles) WHERE value = 'editor')
  AND EXISTS (SELECT 1 FROM person_roles p WHERE p.person_id = NEW.person_id AND p.role = 'editor')
  AND NOT EXISTS (
    SELECT 1 FROM lines l JOIN line_versions v ON v.line_id = l.id
    WHERE l.sheet_id = NEW.sheet_id
      AND v.number = (SELECT max(n.number) FROM line_versions n WHERE n.line_id = l.id)
      AND (l.knocked_out = 1 OR v.text <> v.draft_text)
  )
)
BEGIN SELECT RAISE(ABORT, 'two different people agree before anything is cleared'); END;
