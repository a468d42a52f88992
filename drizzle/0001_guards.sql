-- What no statement may do, whoever asks.
CREATE TRIGGER records_no_update BEFORE UPDATE ON records BEGIN SELECT RAISE(ABORT, 'the history is append-only'); END;
--> statement-breakpoint
CREATE TRIGGER records_no_delete BEFORE DELETE ON records BEGIN SELECT RAISE(ABORT, 'the history is append-only'); END;
--> statement-breakpoint
CREATE TRIGGER records_gapless BEFORE INSERT ON records
WHEN NEW.seq <> (SELECT coalesce(max(seq), 0) + 1 FROM records)
BEGIN SELECT RAISE(ABORT, 'the history has no gaps'); END;
--> statement-breakpoint
CREATE TRIGGER evidence_no_update BEFORE UPDATE ON evidence BEGIN SELECT RAISE(ABORT, 'evidence never changes'); END;
--> statement-breakpoint
CREATE TRIGGER evidence_no_delete BEFORE DELETE ON evidence BEGIN SELECT RAISE(ABORT, 'evidence never changes'); END;
--> statement-breakpoint
CREATE TRIGGER evidence_sources_no_update BEFORE UPDATE ON evidence_sources BEGIN SELECT RAISE(ABORT, 'evidence never changes'); END;
--> statement-breakpoint
CREATE TRIGGER evidence_sources_no_delete BEFORE DELETE ON evidence_sources BEGIN SELECT RAISE(ABORT, 'evidence never changes'); END;
--> statement-breakpoint
CREATE TRIGGER clearings_no_update BEFORE UPDATE ON clearings BEGIN SELECT RAISE(ABORT, 'an act is never rewritten'); END;
--> statement-breakpoint
CREATE TRIGGER clearings_no_delete BEFORE DELETE ON clearings BEGIN SELECT RAISE(ABORT, 'an act is never rewritten'); END;
--> statement-breakpoint
CREATE TRIGGER clearing_lines_no_update BEFORE UPDATE ON clearing_lines BEGIN SELECT RAISE(ABORT, 'an act is never rewritten'); END;
--> statement-breakpoint
CREATE TRIGGER clearing_lines_no_delete BEFORE DELETE ON clearing_lines BEGIN SELECT RAISE(ABORT, 'an act is never rewritten'); END;
--> statement-breakpoint
CREATE TRIGGER release_versions_frozen BEFORE UPDATE ON release_versions
WHEN OLD.frozen_at IS NOT NULL BEGIN SELECT RAISE(ABORT, 'a filed sheet rests on this version'); END;
--> statement-breakpoint
CREATE TRIGGER release_versions_no_delete BEFORE DELETE ON release_versions BEGIN SELECT RAISE(ABORT, 'release versions are kept'); END;
--> statement-breakpoint
CREATE TRIGGER bases_frozen BEFORE UPDATE ON bases
WHEN (SELECT frozen_at FROM release_versions WHERE id = OLD.release_version_id) IS NOT NULL
BEGIN SELECT RAISE(ABORT, 'a filed sheet rests on this version'); END;
--> statement-breakpoint
CREATE TRIGGER questions_frozen BEFORE UPDATE ON questions
WHEN (SELECT v.frozen_at FROM release_versions v JOIN bases b ON b.release_version_id = v.id WHERE b.id = OLD.base_id) IS NOT NULL
BEGIN SELECT RAISE(ABORT, 'a filed sheet rests on this version'); END;
--> statement-breakpoint
CREATE TRIGGER shares_frozen BEFORE UPDATE ON shares
WHEN (SELECT v.frozen_at FROM release_versions v JOIN bases b ON b.release_version_id = v.id JOIN questions q ON q.base_id = b.id WHERE q.id = OLD.question_id) IS NOT NULL
BEGIN SELECT RAISE(ABORT, 'a filed sheet rests on this version'); END;
--> statement-breakpoint
CREATE TRIGGER shares_no_delete BEFORE DELETE ON shares
WHEN (SELECT v.frozen_at FROM release_versions v JOIN bases b ON b.release_version_id = v.id JOIN questions q ON q.base_id = b.id WHERE q.id = OLD.question_id) IS NOT NULL
BEGIN SELECT RAISE(ABORT, 'a filed sheet rests on this version'); END;
--> statement-breakpoint
CREATE TRIGGER line_versions_cleared_text BEFORE UPDATE OF text, draft_text ON line_versions
WHEN OLD.state <> 'draft' AND OLD.text <> NEW.text
BEGIN SELECT RAISE(ABORT, 'words change only as a new draft version'); END;
--> statement-breakpoint
CREATE TRIGGER clearings_two_people BEFORE INSERT ON clearings
WHEN NEW.act = 'cleared' AND NOT EXISTS (
  SELECT 1 FROM clearings f WHERE f.evidence_id = NEW.evidence_id AND f.act = 'filed' AND f.person_id <> NEW.person_id
)
BEGIN SELECT RAISE(ABORT, 'two different people agree before anything is cleared'); END;
