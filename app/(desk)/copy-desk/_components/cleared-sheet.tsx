import Link from 'next/link';
import { EmbargoBand, embargoEnd } from '@/components/lines/embargo-band';
import { StaleReasons } from '@/components/lines/stale-reasons';
import { when } from '@/components/lines/when';
import { CautionNote } from '@/components/ui/caution-note';
import { formatDayRange } from '@/lib/format/date';
import type { ActionResult } from '@/lib/errors';
import type { ClearedSheetItem } from '@/lib/services/copy/list-copy-desk';
import { CopyLines } from './copy-lines';
import { MakeEmbed } from './make-embed';

/** One cleared sheet: its words, line by line, ready to be copied. */
export function ClearedSheet({
  sheet,
  now,
  zone,
  createEmbed,
}: {
  sheet: ClearedSheetItem;
  now: number;
  zone: string;
  createEmbed: (input: { sheetId: string }) => Promise<ActionResult<{ id: string }>>;
}) {
  const id = `sheet-${sheet.id}`;
  const dates = formatDayRange(sheet.fieldStartOn, sheet.fieldEndOn, 'en-GB');
  const [hold] = sheet.holds;
  const blocked = hold
    ? `Held: publication is barred in ${hold.jurisdiction} until ${embargoEnd({ at: hold.untilAt, zone: hold.zone })}.`
    : blockedByEmbargo(sheet);
  return (
    <article aria-labelledby={id} className="mb-9 border-t-[1.5px] border-ink pt-3">
      {/* Not sticky here: several may stand on one page. */}
      <div className="[&_.band]:static [&_.band]:mb-2">
        <EmbargoBand embargo={sheet.embargo} />
      </div>
      <h2 id={id} className="text-18 font-semibold">
        {sheet.race}: {sheet.pollster}, {dates}
      </h2>
      <p className="mb-3 text-13 text-soft">
        Cleared{' '}
        <time dateTime={new Date(sheet.clearedAt).toISOString()}>{when(sheet.clearedAt, now, zone)}</time>.
        Evidence <code title={sheet.hash}>{sheet.hash.slice(0, 12)}</code>.
      </p>
      {sheet.oneReader ? (
        <CautionNote title="One reader">
          <p>{sheet.oneReader} released these words alone at night. A second person has not read them yet.</p>
        </CautionNote>
      ) : null}
      {sheet.stale.length > 0 ? (
        <CautionNote title="These words are no longer current">
          <StaleReasons reasons={sheet.stale} />
        </CautionNote>
      ) : null}
      {sheet.needsReview ? (
        <CautionNote title="Needs review">
          <p>The same claim changed in another language. Ask the desk before you print it.</p>
        </CautionNote>
      ) : null}
      <CopyLines id={sheet.id} lines={sheet.lines} blocked={blocked} zone={zone} />
      <div className="mt-3">
        {sheet.embedId ? (
          <Link href={`/embeds#embed-${sheet.embedId}`}>The embed of this sheet</Link>
        ) : (
          <MakeEmbed sheetId={sheet.id} create={createEmbed} />
        )}
      </div>
    </article>
  );
}

function blockedByEmbargo(sheet: ClearedSheetItem): string | null {
  return sheet.embargo?.isRunning && !sheet.mayCopy
    ? `Under embargo until ${embargoEnd(sheet.embargo)}: only people on its list copy before the hour.`
    : null;
}
