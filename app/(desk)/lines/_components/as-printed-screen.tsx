'use client';

import Link from 'next/link';
import { ActsList } from '@/components/lines/acts-list';
import { MissingNote } from '@/components/lines/missing-note';
import { PrintableLine } from '@/components/lines/printable-line';
import { SharesTable } from '@/components/lines/shares-table';
import { PageTitle } from '@/components/ui/page-title';
import { SectionHeading } from '@/components/ui/section-heading';
import type { ActionResult } from '@/lib/errors';
import { formatDayRange } from '@/lib/format/date';
import type { AsPrintedView } from '@/lib/services/sheet/get-as-printed';
import { AsPrintedBar } from './as-printed-bar';
import { HashLine } from './hash-line';
import { KeyList } from './key-list';
import { OneReaderMark } from './one-reader-mark';
import type { SheetActions } from './sheet-actions';
import { StandingNotes } from './standing-notes';
import { StateNote } from './state-note';
import { TermsForm } from './terms-form';

type Action<Input> = (input: Input) => Promise<ActionResult<unknown>>;
export type AsPrintedActions = SheetActions & {
  alone: Action<{ id: string; version: number; basisHash: string }>;
  second: Action<{ id: string; hash: string }>;
};

/** Figures as printed: house style's own words, the release they come from, and the next step. */
export function AsPrintedScreen({
  view,
  actions,
  now,
  zone,
}: {
  view: AsPrintedView;
  actions: AsPrintedActions;
  now: number;
  zone: string;
}) {
  const { release } = view;
  const dates = formatDayRange(release.fieldStartOn, release.fieldEndOn, 'en-GB');
  return (
    <>
      <PageTitle
        title="Figures as printed"
        crumbs={[{ label: 'Lines', href: '/lines' }, { label: release.race.name }]}
        note={<StateNote state={view.state} wanted={view.desk.wanted} now={now} />}
        sub={`${release.pollster.name}, ${dates}. No claim, no comparison, no chart: house style’s own words, which nobody edits.`}
      />
      <OneReaderMark oneReader={view.oneReader} />
      <StandingNotes id={view.id} desk={view.desk} review={actions.review} />
      <div className="mt-5 grid gap-x-10 gap-y-6 lg:grid-cols-2">
        <div className="min-w-0">
          {view.lines.map(({ kind, text }) => (
            <PrintableLine
              key={kind}
              {...{ kind, text }}
              before={null}
              knockedOut={false}
              marks={[]}
              lang="en"
            />
          ))}
          {view.hash ? <HashLine hash={view.hash} /> : null}
        </div>
        <div className="min-w-0">
          <SectionHeading>What the release says</SectionHeading>
          <SharesTable release={release} previous={null} enteredBy={view.enteredBy} />
          <MissingNote missing={view.missing} />
          <p className="mt-4">
            <Link href={`/releases/${release.releaseId}`}>Open the release</Link>
          </p>
        </div>
      </div>
      <AsPrintedBar key={`${view.state} ${view.version}`} view={view} actions={actions} />
      <div className="sheet-folds">
        <TermsForm id={view.id} desk={view.desk} zone={zone} set={actions.terms} />
        <ActsList acts={view.acts} now={now} zone={zone} />
        <KeyList />
      </div>
    </>
  );
}
