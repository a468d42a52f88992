import type { ReactNode } from 'react';
import { ENGLISH_CHART_WORDS } from '@/lib/charts/chart-words';
import { soundingSpecOf } from '@/lib/charts/sounding-spec-of';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import type { CheckAnswer, CheckDocument, TestableFinding } from '@/lib/findings/check-types';
import type { MissingDisclosure } from '@/lib/findings/disclosure';
import { headingOf } from '@/lib/findings/heading';
import { formatDayRange } from '@/lib/format/date';
import { comparisonReason, type ComparisonTold } from '@/lib/wording/comparison-words';
import { explain } from '@/lib/wording/why';
import { betweenReleases } from '../findings/between';
import { FindingCard } from '../findings/finding-card';
import { DefinitionList } from '../ui/definition-list';
import { Details } from '../ui/details';
import { SectionHeading } from '../ui/section-heading';
import { BaseFacts } from './base-facts';
import { Duties } from './duties';
import { MissingNote } from './missing-note';
import { ReadIn } from './read-in';
import { SharesTable } from './shares-table';
import { testRows } from './test-rows';

export type EvidenceShown = {
  finding: TestableFinding;
  release: ReleaseFacts;
  previous: ReleaseFacts | null;
  document: CheckDocument;
  answer: CheckAnswer;
  missing: MissingDisclosure[];
  comparison: ComparisonTold;
  enteredBy: Record<string, string>;
};

/** All that a sheet rests on: the picture and its test, then the figures, where they were read, what is missing. */
export function EvidencePanel({
  evidence,
  action,
  places,
}: {
  evidence: EvidenceShown;
  /** A way to the release itself. */
  action?: ReactNode;
  /** What else stands over these figures, such as bans. */
  places?: ReactNode;
}) {
  const { release, previous, answer, missing, enteredBy } = evidence;
  return (
    <section aria-labelledby="evidence" className="evidence">
      <div className="evidence-test">
        <SectionHeading id="evidence">The evidence</SectionHeading>
        <TestedClaim evidence={evidence} />
      </div>
      <div className="evidence-figures">
        <SharesTable release={release} previous={previous} enteredBy={enteredBy} />
        <ReadIn release={release} action={action} />
        <MissingNote missing={missing} />
        <Duties missing={missing} />
        {places}
        <BaseFacts release={release} base={answer.base} />
      </div>
    </section>
  );
}

function TestedClaim({ evidence }: { evidence: EvidenceShown }) {
  const { finding, release, previous, document, answer, comparison } = evidence;
  const between = previous ? betweenReleases(previous.fieldStartOn, release.fieldStartOn) : undefined;
  return (
    <>
      <div className="evidence-finding">
        <FindingCard
          id="evidence-finding"
          heading={headingOf(finding, document, between)}
          verdict={finding.verdict}
          spec={soundingSpecOf(finding, document, ENGLISH_CHART_WORDS)}
          why={[]}
        />
      </div>
      <DefinitionList
        items={[
          ...testRows(finding, answer),
          { term: 'Compared with', value: previous ? comparedName(release, previous) : 'no earlier release' },
        ]}
        className="particulars"
      />
      <div className="evidence-whys">
        <Details summary="Why this verdict">
          <Sentences of={explain(finding, answer)} />
        </Details>
        <Details summary={previous ? 'Why that comparison' : 'Why no comparison'}>
          <Sentences of={comparisonReason(comparison)} />
        </Details>
      </div>
    </>
  );
}

function Sentences({ of }: { of: readonly string[] }) {
  return <p className="max-w-prose text-13 text-soft">{of.join(' ')}</p>;
}

/** By its dates, and by its pollster where that is another. */
function comparedName(release: ReleaseFacts, { pollster, fieldStartOn, fieldEndOn }: ReleaseFacts): string {
  const dates = formatDayRange(fieldStartOn, fieldEndOn, 'en-GB', { withYear: true });
  return pollster.name === release.pollster.name ? dates : `${pollster.name}, ${dates}`;
}
