import type { Metadata } from 'next';
import Link from 'next/link';
import { ConsequenceList, consequenceSummary } from '@/components/corrections/consequence-list';
import { DefinitionList } from '@/components/ui/definition-list';
import { NextBar } from '@/components/ui/next-bar';
import { PageTitle } from '@/components/ui/page-title';
import { SectionHeading } from '@/components/ui/section-heading';
import { deskPage } from '@/lib/auth/desk-page';
import { CORRECTION_SOURCE_NAMES } from '@/lib/domain/corrections';
import { LINE_STATE_NAMES } from '@/lib/domain/sheet';
import { readEnv } from '@/lib/env';
import { CORRECTED_ITEM_NAMES } from '@/lib/findings/what-changed';
import { formatInstant } from '@/lib/format/date';
import { newId } from '@/lib/security/ids';
import { type CorrectionView, getCorrection } from '@/lib/services/correction/get-correction';
import {
  applyStagedAction,
  confirmNoticesAction,
  draftReplacementAction,
  withdrawStagedAction,
} from '../../actions';
import { ApplyStaged, ConfirmNotices, DraftReplacement, WithdrawStaged } from './_components/correction-acts';

export const metadata: Metadata = { title: 'Correction' };

const HEADINGS: Record<CorrectionView['state'], string> = {
  staged: 'What applying it would do now',
  applied: 'What it did',
  withdrawn: 'Nothing in print was changed',
};

export default async function CorrectionPage({ params }: { params: Promise<{ correction: string }> }) {
  const { correction } = await params;
  const view = await deskPage((actor, ctx) => getCorrection(actor, correction, ctx));
  return (
    <>
      <PageTitle
        title={`Correction, version ${view.fromVersion} to ${view.toVersion}`}
        crumbs={[
          { label: 'Releases', href: '/releases' },
          { label: view.race, href: `/releases/${view.releaseId}` },
          { label: 'Versions', href: `/releases/${view.releaseId}/versions` },
          { label: 'Correction' },
        ]}
        sub={`${view.race}, ${view.pollster}`}
      />
      <Next view={view} />
      <div className="grid gap-x-11 lg:grid-cols-[minmax(0,1fr)_19rem]">
        <section aria-labelledby="effects" className="min-w-0">
          <SectionHeading id="effects">{HEADINGS[view.state]}</SectionHeading>
          {view.whyNot ? <p className="my-3 max-w-prose">{view.whyNot}</p> : null}
          <ConsequenceList
            consequences={view.consequences}
            actionOf={
              view.state === 'staged'
                ? ({ sheetId }) => <Replacing view={view} sheetId={sheetId} />
                : undefined
            }
          />
        </section>
        <aside aria-label="About this correction" className="mt-6 min-w-0 lg:mt-0">
          <SectionHeading>About it</SectionHeading>
          <DefinitionList stacked items={entriesOf(view)} />
        </aside>
      </div>
    </>
  );
}

function Next({ view }: { view: CorrectionView }) {
  if (view.state === 'staged')
    return (
      <NextBar
        actions={
          <>
            <WithdrawStaged id={view.id} withdraw={withdrawStagedAction} />
            {view.hash ? <ApplyStaged id={view.id} seen={view.hash} apply={applyStagedAction} /> : null}
          </>
        }
      >
        <strong>Staged: nothing in print has changed yet.</strong> {consequenceSummary(view.consequences)}
      </NextBar>
    );
  if (view.state === 'withdrawn')
    return (
      <NextBar>
        <strong>Withdrawn.</strong> The version is kept, and the release never had it.
      </NextBar>
    );
  return (
    <NextBar
      actions={view.mayConfirm ? <ConfirmNotices id={view.id} confirm={confirmNoticesAction} /> : null}
    >
      <strong>Applied.</strong> {consequenceSummary(view.consequences)}{' '}
      {view.notices ? 'Its notices are let out.' : 'Its notices leave once an editor lets them out.'}
    </NextBar>
  );
}

function Replacing({ view, sheetId }: { view: CorrectionView; sheetId: string }) {
  const replacement = view.replacements.find(({ replaces }) => replaces === sheetId);
  if (replacement)
    return (
      <p className="text-15">
        <Link href={`/lines/${replacement.sheetId}`}>Its replacement</Link>:{' '}
        {LINE_STATE_NAMES[replacement.state]}
      </p>
    );
  if (!view.replaceable.includes(sheetId)) return null;
  return (
    <DraftReplacement
      correctionId={view.id}
      sheetId={sheetId}
      submissionKey={newId()}
      draft={draftReplacementAction}
    />
  );
}

function entriesOf(view: CorrectionView) {
  const at = (instant: number) => formatInstant(instant, readEnv().LEADLINE_ZONE, 'en-GB');
  return [
    { term: 'Whose', value: CORRECTION_SOURCE_NAMES[view.whose] },
    { term: 'What was wrong', value: view.explanation },
    { term: 'What differs', value: view.changed.map((item) => CORRECTED_ITEM_NAMES[item]).join(', ') },
    { term: 'Entered by', value: `${view.createdBy}, ${at(view.createdAt)}` },
    ...(view.settledBy && view.settledAt
      ? [
          {
            term: view.state === 'applied' ? 'Applied by' : 'Withdrawn by',
            value: `${view.settledBy}, ${at(view.settledAt)}`,
          },
        ]
      : []),
    ...(view.notices
      ? [{ term: 'Notices let out by', value: `${view.notices.by}, ${at(view.notices.at)}` }]
      : []),
  ];
}
