import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { check } from '@/lib/findings/check';
import type { Base, CheckDocument, Finding, TestableFinding } from '@/lib/findings/check-types';
import { parseCheckDocument } from '@/lib/findings/parse-check';
import { agrees } from '../support/reference';

const OPTIONS = ['Alder', 'Brook', 'Crane', "Don't know"];

function pressNote(n: number, pcts: number[], pp: number): Base {
  return {
    sampleSource: 'probability',
    n,
    design: 'weighted',
    statedMargin: { pp, unit: 0.1, level: 0.95 },
    decimals: 0,
    shares: OPTIONS.map((option, index) => ({
      option,
      pct: pcts[index] ?? 0,
      ...(option === "Don't know" ? { answer: false } : {}),
    })),
  };
}

const example: CheckDocument = {
  release: pressNote(1012, [47, 41, 4, 8], 3.7),
  previous: pressNote(1005, [44, 43, 4, 9], 3.8),
};

function find<Kind extends Finding['kind']>(findings: Finding[], kind: Kind) {
  const found = findings.find(
    (finding): finding is Extract<Finding, { kind: Kind }> => finding.kind === kind,
  );
  if (!found) throw new Error(`no ${kind}`);
  return found;
}

describe('an invented press note, n = 1,012, 47–41–4–8, stated ±3.7 at 95%', () => {
  const answer = check(parseCheckDocument(example));

  test('implies a design effect of 1.4426 (1.4039–1.4819)', () => {
    const { deff, deffRange, deffSource, notes } = answer.base;
    expect(deff?.toFixed(4)).toBe('1.4426');
    expect(deffRange?.map((end) => end.toFixed(4))).toEqual(['1.4039', '1.4819']);
    expect([deffSource, notes]).toEqual(['implied', []]);
  });

  test('has a lead of 6 points that is not shown, z = 1.6975', () => {
    const lead = find(answer.findings, 'lead');
    expect(lead).toMatchObject({
      pair: ['Alder', 'Brook'],
      estimatePp: 6,
      verdict: 'does-not-hold',
      reasons: [],
    });
    expect('z' in lead && lead.z?.toFixed(4)).toBe('1.6975');
  });

  test('asks for the changes of the pair and of its lead by default', () => {
    expect(answer.findings.map(({ kind }) => kind)).toEqual([
      ...Array.from({ length: 4 }, () => 'share'),
      'lead',
      'change',
      'change',
      'lead-change',
    ]);
  });

  test('the same input gives the same bytes', () => {
    expect(JSON.stringify(check(example))).toBe(JSON.stringify(check(structuredClone(example))));
  });

  test('an input that nothing can be written to is answered', () => {
    const frozen = JSON.parse(JSON.stringify(example), (_key, value: unknown) => Object.freeze(value));
    expect(check(frozen)).toEqual(answer);
  });
});

const counts = fc.integer({ min: 200, max: 5000 });
const shares = fc.tuple(fc.integer({ min: 1, max: 50 }), fc.integer({ min: 1, max: 49 }));

function withDeff(n: number, [a, b]: [number, number], value: number): CheckDocument {
  return {
    release: {
      sampleSource: 'probability',
      n,
      design: 'weighted',
      deff: { source: 'stated', value },
      decimals: 0,
      shares: [
        { option: 'Alder', pct: a },
        { option: 'Brook', pct: b },
      ],
    },
    pairs: [['Alder', 'Brook']],
    policy: { minimumNEff: 20 },
  };
}

const STRENGTH = { 'cannot-be-tested': 0, 'does-not-hold': 1, fragile: 2, holds: 3 };
const strength = (finding: TestableFinding) => STRENGTH[finding.verdict];

describe('answers', () => {
  test('a lead lies within its interval, which widens with the design effect', () => {
    fc.assert(
      fc.property(counts, shares, fc.double({ min: 1, max: 4, noNaN: true }), (n, pair, deff) => {
        const lead = find(check(withDeff(n, pair, deff)).findings, 'lead');
        const wider = find(check(withDeff(n, pair, deff + 0.5)).findings, 'lead');
        if (lead.verdict === 'cannot-be-tested' || wider.verdict === 'cannot-be-tested') return;
        expect(lead.intervalPp[0]).toBeLessThanOrEqual(lead.estimatePp);
        expect(lead.intervalPp[1]).toBeGreaterThanOrEqual(lead.estimatePp);
        expect(wider.marginPp).toBeGreaterThan(lead.marginPp);
        expect(strength(wider)).toBeLessThanOrEqual(strength(lead));
      }),
    );
  });

  test('a verdict never grows stronger when the range of the design effect grows wider', () => {
    fc.assert(
      fc.property(counts, shares, fc.double({ min: 1.4, max: 4, noNaN: true }), (n, pair, high) => {
        const assume = (range: [number, number]): CheckDocument => {
          const { release, pairs } = withDeff(n, pair, 1.4);
          const policy = { minimumNEff: 20, assumed: { weighted: { value: 1.4, range } } };
          return { release: { ...release, deff: null }, policy, ...(pairs ? { pairs } : {}) };
        };
        const narrow = find(check(assume([1.4, 1.4])).findings, 'lead');
        const wide = find(check(assume([1, high])).findings, 'lead');
        expect(strength(wide)).toBeLessThanOrEqual(strength(narrow));
      }),
    );
  });

  test('at the breaking design effect the test is exactly at its level', () => {
    fc.assert(
      fc.property(counts, shares, (n, pair) => {
        const lead = find(check(withDeff(n, pair, 1.3)).findings, 'lead');
        if (lead.verdict === 'cannot-be-tested' || !lead.breakingDeff) return;
        if (lead.breakingDeff < 0.5 || lead.breakingDeff > 10) return;
        const atLimit = find(check(withDeff(n, pair, lead.breakingDeff)).findings, 'lead');
        if (atLimit.verdict !== 'cannot-be-tested') expect(agrees(atLimit.p, atLimit.alpha)).toBe(true);
      }),
    );
  });

  test('turning a pair round turns the sign and nothing else', () => {
    fc.assert(
      fc.property(counts, shares, (n, pair) => {
        const document = withDeff(n, pair, 1.3);
        const lead = find(check(document).findings, 'lead');
        const turned = find(check({ ...document, pairs: [['Brook', 'Alder']] }).findings, 'lead');
        if (lead.verdict === 'cannot-be-tested' || turned.verdict === 'cannot-be-tested') return;
        expect(turned.estimatePp).toBe(-lead.estimatePp + 0);
        expect(turned.p).toBe(lead.p);
        expect([turned.verdict, turned.reasons]).toEqual([lead.verdict, lead.reasons]);
      }),
    );
  });

  test('a sample that is not random is never better than fragile', () => {
    fc.assert(
      fc.property(counts, shares, fc.boolean(), (n, pair, modelled) => {
        const { release, pairs } = withDeff(n, pair, 1.3);
        const answer = check({
          release: {
            ...release,
            sampleSource: 'opt-in',
            ...(modelled ? { modelledInterval: { pp: 3, unit: 0.5, level: 0.95 } } : {}),
          },
          policy: { comparisonBasis: true, minimumNEff: 20 },
          ...(pairs ? { pairs } : {}),
        });
        expect(find(answer.findings, 'lead').verdict).not.toBe('holds');
      }),
    );
  });

  test('equal printed shares are level, in any decimals', () => {
    for (const [decimals, pct] of [
      [0, 44],
      [1, 44.1],
      [2, 33.33],
    ] as const) {
      const { release } = withDeff(1000, [1, 1], 1.3);
      const even = [
        { option: 'Alder', pct },
        { option: 'Brook', pct },
      ];
      const lead = find(check({ release: { ...release, decimals, shares: even } }).findings, 'lead');
      expect(lead).toMatchObject({ estimatePp: 0, z: 0, p: 1, verdict: 'does-not-hold' });
    }
  });

  test('a lead change of printed decimals that cancel is exactly 0', () => {
    const at = (a: number, b: number): Base => ({
      ...withDeff(1000, [1, 1], 1.3).release,
      decimals: 1,
      shares: [
        { option: 'Alder', pct: a },
        { option: 'Brook', pct: b },
      ],
    });
    const answer = check({ release: at(47.1, 41.3), previous: at(44.2, 38.4) });
    expect(find(answer.findings, 'lead-change')).toMatchObject({
      estimatePp: 0,
      z: 0,
      p: 1,
      breakingFactor: 0,
    });
  });

  test('reasons against a test stand in their order, with every one that applies', () => {
    const { release } = withDeff(30, [40, 20], 1);
    const few: Base = { ...release, deff: { source: 'design', value: 1, df: 5 } };
    const other: Base = {
      ...release,
      sampleSource: 'opt-in',
      n: null,
      shares: [
        { option: 'Alder', pct: null },
        { option: 'Crane', pct: 9 },
      ],
    };
    const answer = check({
      release: few,
      previous: other,
      changes: ['Alder', 'Brook'],
      policy: { minimumNEff: 50 },
    });
    const all = ['no-sample-size', 'no-sampling-basis', 'too-small', 'few-clusters', 'not-comparable'];
    expect(answer.findings.filter(({ kind }) => kind === 'change')).toEqual([
      {
        kind: 'change',
        option: 'Alder',
        estimatePp: null,
        verdict: 'cannot-be-tested',
        reasons: [...all, 'not-disclosed'],
      },
      { kind: 'change', option: 'Brook', estimatePp: null, verdict: 'cannot-be-tested', reasons: all },
    ]);
  });

  test('a document is read and answered fast enough for every keystroke', () => {
    const started = performance.now();
    const runs = 20;
    for (let run = 0; run < runs; run += 1) check(parseCheckDocument(example));
    expect((performance.now() - started) / runs).toBeLessThan(50);
  });
});
