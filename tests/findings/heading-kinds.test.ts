import { describe, expect, it } from 'vitest';
import { uncertaintyOf } from '@/lib/findings/bands';
import { checkDocumentOf } from '@/lib/findings/check-document-of';
import { headingOf } from '@/lib/findings/heading';
import type { ReleaseTestable } from '@/lib/findings/judge-types';
import { JUDGED_CASES } from '@/tests/wording/judged-cases';

// Every one of these carries the trace of its judgement.
const cases = Object.entries(JUDGED_CASES).map(([name, input]) => ({
  name,
  input: { ...input, finding: input.finding as ReleaseTestable },
}));

describe('findings of a whole release', () => {
  it.each(cases)('have a heading and an interval of their own: $name', ({ input }) => {
    const { finding, release, previous, policy } = input;
    const document = checkDocumentOf(release, previous, policy);
    expect(headingOf(finding, document)).toMatch(/: (?:no figure|[+−]?\d)/);
    const uncertainty = uncertaintyOf(finding, document);
    if (finding.verdict === 'cannot-be-tested') return expect(uncertainty).toBeNull();
    const from = finding.kind === 'threshold' ? finding.thresholdPct : 0;
    expect(uncertainty?.bands[0]?.low).toBeCloseTo(finding.intervalPp[0] + from, 6);
    expect(uncertainty?.bands[0]?.high).toBeCloseTo(finding.intervalPp[1] + from, 6);
  });

  it('are named by what they compare', () => {
    const titles = ['net-score-holds', 'net-score-change-holds', 'gap-holds', 'gap-against-the-rest'].map(
      (name) => {
        const { finding, release } = cases.find((one) => one.name === name)!.input;
        return headingOf(finding, { release }).replace(/: .*/, '');
      },
    );
    expect(titles).toEqual(titles.map(() => expect.stringMatching(/minus/) as string));
    expect(titles[0]).toMatch(/^Net score, /);
    expect(titles[3]).toContain('everyone else');
  });
});
