'use client';

import Link from 'next/link';
import { useRouter } from 'next/navigation';
import { StaleReasons } from '@/components/lines/stale-reasons';
import { Button } from '@/components/ui/button';
import { CautionNote } from '@/components/ui/caution-note';
import { LANGUAGE_NAMES, LANGUAGES } from '@/lib/domain/vocabulary';
import { LINE_KIND_NAMES } from '@/lib/domain/sheet';
import type { ActionResult } from '@/lib/errors';
import { formatInstant } from '@/lib/format/date';
import type { DeskView } from '@/lib/services/sheet/desk-view';
import { useAction } from '../../../_components/use-action';

const CAUSES = { changed: 'was changed', cleared: 'was cleared anew', pulled: 'was pulled' } as const;

/** What stands over a sheet now: a ban, words that are no longer the newest, a change in another language. */
export function StandingNotes({
  id,
  desk,
  review,
}: {
  id: string;
  desk: DeskView;
  review: (input: { id: string }) => Promise<ActionResult<void>>;
}) {
  return (
    <>
      {desk.holds.map((hold) => (
        <CautionNote
          key={`${hold.jurisdiction} ${hold.untilAt}`}
          title={`Held: publication is barred in ${hold.jurisdiction}`}
        >
          <p>
            Until {formatInstant(hold.untilAt, hold.zone, 'en-GB')} ({hold.zone}) these figures are not
            cleared, copied or newly shown. “{hold.rule}” <Link href="/releases/bans">All bans</Link>
          </p>
        </CautionNote>
      ))}
      {desk.currency && !desk.currency.isCurrent ? (
        <CautionNote title="These words are no longer current">
          <StaleReasons reasons={desk.currency.reasons} />
        </CautionNote>
      ) : null}
      {desk.reviews.length > 0 ? <NeedsReview id={id} desk={desk} review={review} /> : null}
      {desk.lineReasons.length > 0 ? (
        <CautionNote title="Why single lines came back">
          <ul>
            {desk.lineReasons.map(({ kind, reason }) => (
              <li key={kind}>
                <strong>{LINE_KIND_NAMES[kind]}:</strong> {reason}
              </li>
            ))}
          </ul>
        </CautionNote>
      ) : null}
    </>
  );
}

const nameOf = (language: string) =>
  LANGUAGES.flatMap((one) => (one === language ? [LANGUAGE_NAMES[one]] : []))[0] ?? language;

function NeedsReview({
  id,
  desk,
  review,
}: {
  id: string;
  desk: DeskView;
  review: (input: { id: string }) => Promise<ActionResult<void>>;
}) {
  const router = useRouter();
  const { run, isPending, failure } = useAction(review);
  const say = async () => {
    const { ok } = await run({ id });
    if (ok) router.refresh();
  };
  return (
    <CautionNote title="Needs review: the same claim changed in another language">
      <ul>
        {desk.reviews.map(({ sheetId, language, cause }) => (
          <li key={`${sheetId} ${cause}`}>
            <Link href={`/lines/${sheetId}`}>The sheet in {nameOf(language)}</Link> {CAUSES[cause]}.
          </li>
        ))}
      </ul>
      <Button className="mt-2" pending={isPending} pendingLabel="Saving…" onClick={say}>
        Reviewed: these words still fit
      </Button>
      {failure ? <p role="alert">{failure.message}</p> : null}
    </CautionNote>
  );
}
