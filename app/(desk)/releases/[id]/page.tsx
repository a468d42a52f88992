import type { Metadata } from 'next';
import Link from 'next/link';
import { cache } from 'react';
import { betweenReleases } from '@/components/findings/between';
import { FindingList, testedFindings } from '@/components/findings/finding-list';
import { verdictSummary } from '@/components/findings/verdict-summary';
import { WorkingSteps } from '@/components/findings/working-steps';
import { EmbargoBand } from '@/components/lines/embargo-band';
import { LinkButton } from '@/components/ui/link-button';
import { NextBar } from '@/components/ui/next-bar';
import { PageTitle } from '@/components/ui/page-title';
import { SectionHeading } from '@/components/ui/section-heading';
import { deskPage } from '@/lib/auth/desk-page';
import { ENGLISH_CHART_WORDS, formatLevel } from '@/lib/charts/chart-words';
import { canActAsEditor } from '@/lib/domain/roles';
import { readEnv } from '@/lib/env';
import type { TestableFinding } from '@/lib/findings/check-types';
import { claimKey } from '@/lib/findings/claim-key';
import { resolvePolicy } from '@/lib/findings/policy';
import { uncountedThresholds } from '@/lib/findings/threshold-base';
import { working } from '@/lib/findings/working';
import { formatInstant } from '@/lib/format/date';
import { getRelease, type ReleaseView } from '@/lib/services/release/get-release';
import { listEmbargoCandidates } from '@/lib/services/release/list-embargo-candidates';
import { liftEmbargoAction, setEmbargoReaderAction } from '../actions';
import { ComparisonOverride } from './_components/comparison-override';
import { EmbargoList } from './_components/embargo-list';
import { EmbargoViews } from './_components/embargo-views';
import { LiftEmbargo } from './_components/lift-embargo';
import { Particulars } from './_components/particulars';
import { missingSentence, particularsOf, tabOf, titleOf } from './_components/release-words';
import { SharesTable } from './_components/shares-table';
import { twiceTheMargin, twiceTheMarginNote } from '@/lib/wording/twice-margin';

type Props = { params: Promise<{ id: string }> };

/** Read once for the page and its name. */
const readPage = cache((id: string) =>
  deskPage((actor, ctx) => ({
    view: getRelease(actor, id, ctx),
    isEditor: canActAsEditor(actor),
    candidates: canActAsEditor(actor) ? listEmbargoCandidates(actor, ctx) : [],
  })),
);

/** A refusal is answered by the page, not by its name. */
export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { id } = await params;
  const page = await readPage(id).catch(() => null);
  return { title: page ? tabOf(page.view.facts) : 'Release' };
}

export default async function ReleasePage({ params }: Props) {
  const { id } = await params;
  const { view, isEditor, candidates } = await readPage(id);
  const { facts, embargo } = view;
  const isHeld = embargo?.isRunning ?? false;
  return (
    <>
      <EmbargoBand embargo={embargo} />
      {isHeld ? <div className="h-4" /> : null}
      <PageTitle
        crumbs={[{ label: 'Releases', href: '/releases' }, { label: facts.race.name }]}
        note={noteOf(view)}
        title={titleOf(facts)}
        sub={particularsOf(facts)}
      />
      <Next view={view} canLift={isEditor && isHeld} />
      <div className="grid gap-x-11 lg:grid-cols-[minmax(0,1fr)_19rem]">
        <Findings view={view} />
        <aside aria-label="What the findings stand on" className="min-w-0 [&_.table-scroll]:mt-0">
          <SharesTable view={view} />
          <Particulars
            view={view}
            override={
              isEditor ? <ComparisonOverride id={view.id} passedOver={view.comparison.passedOver} /> : null
            }
          />
          {isEditor && isHeld ? (
            <EmbargoList
              id={view.id}
              readers={view.embargoReaders}
              candidates={candidates}
              setReader={setEmbargoReaderAction}
            />
          ) : null}
          <EmbargoViews views={view.embargoViews} zone={readEnv().LEADLINE_ZONE} />
        </aside>
      </div>
    </>
  );
}

function noteOf({ id, loggedBy, loggedAt, facts }: ReleaseView) {
  const at = formatInstant(loggedAt, readEnv().LEADLINE_ZONE, 'en-GB');
  return (
    <>
      Logged by {loggedBy}, {at} · <Link href={`/releases/${id}/versions`}>version {facts.version}</Link>
    </>
  );
}

function Next({ view, canLift }: { view: ReleaseView; canLift: boolean }) {
  const findings = testedFindings(view.answer);
  const [first] = findings;
  return (
    <NextBar
      actions={
        <>
          {canLift ? <LiftEmbargo id={view.id} version={view.version} lift={liftEmbargoAction} /> : null}
          {view.whyNotRevised ? (
            <LinkButton href={`/releases/${view.id}/correct`}>Correct</LinkButton>
          ) : (
            <LinkButton href={`/releases/${view.id}/edit`}>Change figures</LinkButton>
          )}
          {first ? (
            <LinkButton href={draftHref(view.id, first)} tone="primary">
              Draft a sheet
            </LinkButton>
          ) : null}
        </>
      }
    >
      <strong>{verdictSummary(findings.map(({ verdict }) => verdict))}</strong>{' '}
      {missingSentence(view.missing)}
      {view.whyNotRevised ? <p className="mt-1 text-13 text-soft">{view.whyNotRevised}</p> : null}
    </NextBar>
  );
}

function draftHref(releaseId: string, finding: TestableFinding): string {
  return `/lines/new?${new URLSearchParams({ release: releaseId, claim: claimKey(finding) })}`;
}

function Findings({ view }: { view: ReleaseView }) {
  const { id, facts, previous, document, answer, houseStyle } = view;
  const policy = resolvePolicy(document.policy);
  const level = formatLevel(policy.level, ENGLISH_CHART_WORDS);
  const uncounted = uncountedThresholds(facts);
  return (
    <section aria-labelledby="findings" className="min-w-0">
      <div className="mb-2">
        <SectionHeading id="findings">What the numbers support, at {level}</SectionHeading>
      </div>
      {testedFindings(answer).length === 0 ? (
        <p className="my-4 max-w-prose">
          Nothing to test: fewer than two answers have a share, and the race has no threshold that these
          shares count.
        </p>
      ) : null}
      <FindingList
        idPrefix="finding"
        document={document}
        answer={answer}
        between={previous ? betweenReleases(previous.fieldEndOn, facts.fieldEndOn) : undefined}
        besideOf={(finding) => {
          const reading = houseStyle.twiceTheMargin
            ? twiceTheMargin(finding, answer.base, facts, policy.level)
            : null;
          return reading && twiceTheMarginNote(reading);
        }}
        workingOf={(finding) => (
          <WorkingSteps steps={working(document, answer, answer.findings.indexOf(finding))} />
        )}
        actionOf={(finding) => <LinkButton href={draftHref(id, finding)}>Draft a sheet</LinkButton>}
      />
      {uncounted.map(({ option, pct }) => (
        <p key={`${option} ${pct}`} className="mb-3 max-w-prose text-soft">
          {option} is not tested against {pct}%: the rule counts a different base from these shares.
        </p>
      ))}
      {answer.findings.some((one) => one.kind === 'share' && one.intervalPct) ? (
        <p className="mb-6 max-w-prose text-13 text-soft">
          Ranges cover sampling error only, with one design effect for every figure, which is an
          approximation. Other errors come on top.
        </p>
      ) : null}
    </section>
  );
}
