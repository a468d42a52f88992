CREATE TABLE `language_signatures` (
	`id` integer PRIMARY KEY NOT NULL,
	`language` text NOT NULL,
	`pack_hash` text NOT NULL,
	`house_style_id` integer NOT NULL,
	`act` text NOT NULL,
	`person_id` integer NOT NULL,
	`roles` text NOT NULL,
	`declaration` text NOT NULL,
	`at` integer NOT NULL,
	FOREIGN KEY (`house_style_id`) REFERENCES `house_styles`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `language_signatures_language_hash` ON `language_signatures` (`language`,`pack_hash`);--> statement-breakpoint
CREATE INDEX `language_signatures_house_style_id` ON `language_signatures` (`house_style_id`);--> statement-breakpoint
CREATE INDEX `language_signatures_person_id` ON `language_signatures` (`person_id`);--> statement-breakpoint
CREATE TABLE `style_acts` (
	`id` integer PRIMARY KEY NOT NULL,
	`style_version_id` integer NOT NULL,
	`act` text NOT NULL,
	`person_id` integer NOT NULL,
	`roles` text NOT NULL,
	`hash` text NOT NULL,
	`comment` text,
	`at` integer NOT NULL,
	FOREIGN KEY (`style_version_id`) REFERENCES `style_versions`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `style_acts_style_version_id` ON `style_acts` (`style_version_id`);--> statement-breakpoint
CREATE INDEX `style_acts_person_id` ON `style_acts` (`person_id`);--> statement-breakpoint
CREATE TABLE `style_versions` (
	`id` integer PRIMARY KEY NOT NULL,
	`public_id` text NOT NULL,
	`number` integer,
	`origin` text NOT NULL,
	`state` text NOT NULL,
	`author_id` integer,
	`note` text DEFAULT '' NOT NULL,
	`house_style` text NOT NULL,
	`policy` text NOT NULL,
	`shipped` text,
	`typed` text DEFAULT '{}' NOT NULL,
	`based_on_id` integer,
	`hash` text,
	`proposed_by` integer,
	`proposed_at` integer,
	`put_in_force_by` integer,
	`in_force_at` integer,
	`house_style_id` integer,
	`policy_id` integer,
	`created_at` integer NOT NULL,
	`updated_at` integer NOT NULL,
	`version` integer DEFAULT 1 NOT NULL,
	FOREIGN KEY (`author_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`proposed_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`put_in_force_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`house_style_id`) REFERENCES `house_styles`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`policy_id`) REFERENCES `policies`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `style_versions_public_id` ON `style_versions` (`public_id`);--> statement-breakpoint
CREATE UNIQUE INDEX `style_versions_number` ON `style_versions` (`number`);--> statement-breakpoint
CREATE UNIQUE INDEX `style_versions_one_in_force` ON `style_versions` (`state`) WHERE "style_versions"."state" = 'in-force';--> statement-breakpoint
CREATE UNIQUE INDEX `style_versions_one_proposed` ON `style_versions` (`state`) WHERE "style_versions"."state" = 'proposed';--> statement-breakpoint
CREATE INDEX `style_versions_state` ON `style_versions` (`state`);--> statement-breakpoint
CREATE INDEX `style_versions_author_id` ON `style_versions` (`author_id`);--> statement-breakpoint
CREATE INDEX `style_versions_based_on_id` ON `style_versions` (`based_on_id`);--> statement-breakpoint
CREATE INDEX `style_versions_proposed_by` ON `style_versions` (`proposed_by`);--> statement-breakpoint
CREATE INDEX `style_versions_put_in_force_by` ON `style_versions` (`put_in_force_by`);--> statement-breakpoint
CREATE INDEX `style_versions_house_style_id` ON `style_versions` (`house_style_id`);--> statement-breakpoint
CREATE INDEX `style_versions_policy_id` ON `style_versions` (`policy_id`);--> statement-breakpoint
CREATE TRIGGER style_acts_no_update BEFORE UPDATE ON style_acts BEGIN SELECT RAISE(ABORT, 'an act is never rewritten'); END;
--> statement-breakpoint
CREATE TRIGGER style_acts_no_delete BEFORE DELETE ON style_acts BEGIN SELECT RAISE(ABORT, 'an act is never rewritten'); END;
--> statement-breakpoint
CREATE TRIGGER language_signatures_no_update BEFORE UPDATE ON language_signatures BEGIN SELECT RAISE(ABORT, 'a signature is never rewritten'); END;
--> statement-breakpoint
CREATE TRIGGER language_signatures_no_delete BEFORE DELETE ON language_signatures BEGIN SELECT RAISE(ABORT, 'a signature is never rewritten'); END;
--> statement-breakpoint
CREATE TRIGGER house_styles_no_update BEFORE UPDATE ON house_styles BEGIN SELECT RAISE(ABORT, 'a house style in force is never rewritten'); END;
--> statement-breakpoint
CREATE TRIGGER house_styles_no_delete BEFORE DELETE ON house_styles BEGIN SELECT RAISE(ABORT, 'house styles are kept'); END;
--> statement-breakpoint
CREATE TRIGGER policies_no_update BEFORE UPDATE ON policies BEGIN SELECT RAISE(ABORT, 'a policy in force is never rewritten'); END;
--> statement-breakpoint
CREATE TRIGGER policies_no_delete BEFORE DELETE ON policies BEGIN SELECT RAISE(ABORT, 'policies are kept'); END;
--> statement-breakpoint
CREATE TRIGGER style_versions_no_delete BEFORE DELETE ON style_versions BEGIN SELECT RAISE(ABORT, 'versions are kept'); END;
--> statement-breakpoint
CREATE TRIGGER style_versions_agreed_body BEFORE UPDATE OF house_style, policy, note ON style_versions
WHEN OLD.state <> 'draft' AND (OLD.house_style <> NEW.house_style OR OLD.policy <> NEW.policy OR OLD.note <> NEW.note)
BEGIN SELECT RAISE(ABORT, 'a version changes only while it is a draft'); END;
--> statement-breakpoint
CREATE TRIGGER style_versions_two_people BEFORE UPDATE OF state ON style_versions
WHEN NEW.state = 'in-force' AND OLD.state <> 'in-force' AND (
  OLD.state <> 'proposed' OR NEW.hash IS NULL OR NEW.proposed_by IS NULL OR NEW.put_in_force_by IS NULL OR NEW.proposed_by = NEW.put_in_force_by
)
BEGIN SELECT RAISE(ABORT, 'two different people agree before a version is in force'); END;
