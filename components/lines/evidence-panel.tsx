import type { ReactNode } from 'react';
import { ENGLISH_CHART_WORDS } from '@/lib/charts/chart-words';
import { soundingSpecOf } from '@/lib/charts/sounding-spec-of';
import type { ReleaseFacts } from '@/lib/domain/release-facts';
import type { CheckAnswer, CheckDocument, TestableFinding } from '@/lib/findings/check-types';
import type { MissingDisclosure } from '@/lib/findings/disclosure';
import { headingOf } from '@/lib/findings/heading';
import type { ComparisonTold } from '@/lib/wording/comparison-words';
import { explain } from '@/lib/wording/why';
import { betweenReleases } from '../findings/between';
import { ComparedWith } from '../findings/compared-with';
import { FindingCard } from '../findings/finding-card';
import { DefinitionList } from '../ui/definition-list';
import { Details } from '../ui/details';
import { SectionHeading } from '../ui/section-heading';
import { BaseFacts } from './base-facts';
import { MissingNote } from './missing-note';
import { SharesTable } from './shares-table';
import { testRows } from './test-rows';

/** Close rows: the verdict, its test and the words are read together. */
const PARTICULARS = 'text-13 [&>div]:py-0.5';

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

/** All that a sheet rests on: the picture and its test, the figures and who typed them, what is missing. */
export function EvidencePanel({
  evidence,
  action,
}: {
  evidence: EvidenceShown;
  /** A way to the release itself. */
  action?: ReactNode;
}) {
  const { finding, release, previous, document, answer, missing, comparison, enteredBy } = evidence;
  const between = previous ? betweenReleases(previous.fieldStartOn, release.fieldStartOn) : undefined;
  return (
    <section aria-labelledby="evidence">
      <SectionHeading id="evidence">The evidence</SectionHeading>
      <div className="[&>article]:mb-2 [&>article]:border-b-0 [&>article]:pb-0">
        <FindingCard
          id="evidence-finding"
          heading={headingOf(finding, document, between)}
          verdict={finding.verdict}
          spec={soundingSpecOf(finding, document, ENGLISH_CHART_WORDS)}
          why={[]}
        />
      </div>
      <DefinitionList items={testRows(finding, answer)} className={PARTICULARS} />
      <Details summary="Why this verdict">
        <p className="max-w-prose text-soft">{explain(finding, answer).join(' ')}</p>
      </Details>
      <SharesTable release={release} previous={previous} enteredBy={enteredBy} />
      <MissingNote missing={missing} />
      <BaseFacts release={release} base={answer.base} />
      <div className="mt-4">
        <SectionHeading level={3}>Compared with</SectionHeading>
        <ComparedWith previous={previous} told={comparison} />
      </div>
      {action ? <p className="mt-4">{action}</p> : null}
    </section>
  );
}
