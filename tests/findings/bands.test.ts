import { describe, expect, it } from 'vitest';
import { uncertaintyOf } from '@/lib/findings/bands';
import { check } from '@/lib/findings/check';
import type { CheckDocument, Finding } from '@/lib/findings/check-types';
import cases from '../reference/findings/cases.json';

const corpus = cases.flatMap(({ input }) => {
  const document = input as unknown as CheckDocument;
  return check(document).findings.map((finding) => ({ finding, document }));
});

/** The interval that the finding itself answers, where the picture has one. */
function ownInterval(finding: Finding): readonly [number, number] | null {
  if (finding.kind === 'share') return finding.intervalPct ?? null;
  if (finding.verdict === 'cannot-be-tested') return null;
  const shift = finding.kind === 'threshold' ? finding.thresholdPct : 0;
  return [finding.intervalPp[0] + shift, finding.intervalPp[1] + shift];
}

describe('the bands of a finding', () => {
  it('begin with its own interval, over every reference case', () => {
    let compared = 0;
    for (const { finding, document } of corpus) {
      const own = ownInterval(finding);
      const outer = uncertaintyOf(finding, document)?.bands[0];
      expect(outer === undefined).toBe(own === null);
      if (!own || !outer) continue;
      compared += 1;
      expect(outer.level).toBe(document.policy?.level ?? 0.95);
      expect(outer.low).toBeCloseTo(own[0], 9);
      expect(outer.high).toBeCloseTo(own[1], 9);
    }
    expect(compared).toBeGreaterThan(100);
  });

  it('lie within one another, and the far end of the design effect around them', () => {
    for (const { finding, document } of corpus) {
      const uncertainty = uncertaintyOf(finding, document);
      if (!uncertainty) continue;
      const { bands, far } = uncertainty;
      for (const [at, band] of bands.entries()) {
        const outside = bands[at - 1] ?? far;
        if (!outside) continue;
        expect(band.low).toBeGreaterThanOrEqual(outside.low - 1e-9);
        expect(band.high).toBeLessThanOrEqual(outside.high + 1e-9);
      }
    }
  });

  it('take the exact normal quantiles: 80 and 50 percent are 1.2816 and 0.6745 standard errors', () => {
    const document: CheckDocument = {
      release: {
        sampleSource: 'probability',
        n: 1012,
        design: 'weighted',
        decimals: 0,
        shares: [
          { option: 'Alder', pct: 49 },
          { option: 'Brook', pct: 41 },
        ],
      },
    };
    const lead = check(document).findings.find((finding) => finding.kind === 'lead');
    if (!lead || lead.verdict === 'cannot-be-tested') throw new Error('the lead is not tested');
    const { bands, far } = uncertaintyOf(lead, document) ?? { bands: [], far: null };
    // Quantiles: R 4.2.2 qnorm(0.9), qnorm(0.75).
    expect((bands[1]?.high ?? 0) - 8).toBeCloseTo(1.2815515655446004 * lead.sePp, 9);
    expect((bands[2]?.high ?? 0) - 8).toBeCloseTo(0.6744897501960817 * lead.sePp, 9);
    expect((far?.high ?? 0) - 8).toBeCloseTo(lead.marginPp * Math.sqrt(2 / 1.4), 9);
  });

  it('have no far end where the design effect is known', () => {
    const document: CheckDocument = {
      release: {
        sampleSource: 'probability',
        n: 1000,
        design: 'weighted',
        deff: { source: 'design', value: 1.5, df: 40 },
        decimals: 0,
        shares: [{ option: 'Alder', pct: 50 }],
      },
    };
    const [share] = check(document).findings;
    expect(share && uncertaintyOf(share, document)?.far).toBeNull();
  });

  it('are fewer where the policy asks for a level that lies among them', () => {
    const document: CheckDocument = {
      policy: { level: 0.8 },
      release: {
        sampleSource: 'probability',
        n: 1000,
        design: 'unweighted',
        decimals: 0,
        shares: [{ option: 'Alder', pct: 50 }],
      },
    };
    const [share] = check(document).findings;
    expect(share && uncertaintyOf(share, document)?.bands.map(({ level }) => level)).toEqual([0.8, 0.5]);
  });
});
