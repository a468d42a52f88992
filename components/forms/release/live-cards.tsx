import { FindingCard } from '../../findings/finding-card';
import { testedFindings } from '../../findings/finding-list';
import { ENGLISH_CHART_WORDS } from '@/lib/charts/chart-words';
import { soundingSpecOf } from '@/lib/charts/sounding-spec-of';
import type { TestableFinding } from '@/lib/findings/check-types';
import { claimKey } from '@/lib/findings/claim-key';
import { headingOf } from '@/lib/findings/heading';
import { explain } from '@/lib/wording/why';
import type { LiveFindings } from './live-findings';

type Answered = Extract<LiveFindings, { kind: 'answer' }>;

/** Every finding so far. A sample size that is still being typed is not taken for one that was withheld. */
export function LiveCards({ findings, between }: { findings: Answered; between?: string }) {
  const { document, answer, sizeGap } = findings;
  return testedFindings(answer).map((finding, at) => (
    <FindingCard
      key={claimKey(finding)}
      id={`live-${at}`}
      heading={headingOf(finding, document, between)}
      verdict={finding.verdict}
      spec={soundingSpecOf(finding, document, ENGLISH_CHART_WORDS)}
      why={sizeGap && lacksSize(finding) ? [sizeGap] : explain(finding, answer)}
    />
  ));
}

function lacksSize(finding: TestableFinding): boolean {
  return finding.verdict === 'cannot-be-tested' && finding.reasons.includes('no-sample-size');
}
