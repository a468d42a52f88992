import type { ReactNode } from 'react';
import { ENGLISH_CHART_WORDS } from '@/lib/charts/chart-words';
import { soundingSpecOf } from '@/lib/charts/sounding-spec-of';
import type { CheckAnswer, CheckDocument, TestableFinding } from '@/lib/findings/check-types';
import { claimKey } from '@/lib/findings/claim-key';
import { headingOf } from '@/lib/findings/heading';
import { explain } from '@/lib/wording/why';
import { FindingCard } from './finding-card';

/** Every finding that was asked about, in the engine's order; shares stand in their own table. */
export function FindingList({
  idPrefix,
  document,
  answer,
  between,
  besideOf,
  workingOf,
  actionOf,
}: {
  /** Unique on the page. */
  idPrefix: string;
  document: CheckDocument;
  answer: CheckAnswer;
  /** The two releases of a change, such as "August to September". */
  between?: string;
  /** A reading that a house style wants beside the verdict; it never changes it. */
  besideOf?: (finding: TestableFinding) => string | null;
  workingOf?: (finding: TestableFinding) => ReactNode;
  actionOf?: (finding: TestableFinding) => ReactNode;
}) {
  return testedFindings(answer).map((finding, at) => (
    <FindingCard
      key={claimKey(finding)}
      id={`${idPrefix}-${at}`}
      heading={headingOf(finding, document, between)}
      verdict={finding.verdict}
      spec={soundingSpecOf(finding, document, ENGLISH_CHART_WORDS)}
      why={[...explain(finding, answer), besideOf?.(finding) ?? ''].filter((sentence) => sentence !== '')}
      working={workingOf?.(finding)}
      action={actionOf?.(finding)}
    />
  ));
}

export function testedFindings({ findings }: CheckAnswer): TestableFinding[] {
  return findings.flatMap((finding) => (finding.kind === 'share' ? [] : [finding]));
}
