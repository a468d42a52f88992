import { describe, expect, test } from 'vitest';
import type { ReleaseDocument, SubgroupQuestion } from '@/lib/findings/judge-types';
import { findingOf, judge, sample, testedOf, untestedOf } from './release-documents';

const parties = { A: 31, B: 27, C: 14, D: 9, Undecided: 19 };
const pp = 10;

describe('net scores', () => {
  const release = sample(900, { Approve: 42, Disapprove: 53 });
  const netScores = [{ approve: 'Approve', disapprove: 'Disapprove' }];

  test('are tested as leads', () => {
    // R 4.2.2: se <- sqrt((.42 + .53 - .11^2) / 900); c(100 * se, 100 * qnorm(.975) * se, -.11 / se)
    const net = testedOf({ release, netScores }, 'net-score:Approve|Disapprove');
    expect(net.estimatePp).toBe(-11);
    expect(net.sePp).toBeCloseTo(3.2281745787846, pp);
    expect(net.marginPp).toBeCloseTo(6.32710591022557, pp);
    expect(net.z).toBeCloseTo(-3.40749848917449, pp);
    expect(net.p).toBeCloseTo(0.000655612714819214, 12);
  });

  test('stand in place of the lead that would be asked by default', () => {
    expect(judge({ release, netScores }).findings.map(({ kind }) => kind)).toEqual([
      'share',
      'share',
      'net-score',
    ]);
    expect(judge({ release }).findings.map(({ kind }) => kind)).toEqual(['share', 'share', 'lead']);
  });

  test('change as leads do, in the family of changes', () => {
    const comparison = { base: sample(900, { Approve: 47, Disapprove: 48 }) };
    const change = testedOf({ release, comparison, netScores }, 'net-score-change:Approve|Disapprove');
    expect(change.estimatePp).toBe(-10);
    expect(change.trace.family.size).toBe(3);
  });

  test('share one family with leads', () => {
    const asked = { release: sample(1000, parties), netScores: [{ approve: 'A', disapprove: 'C' }] };
    const document: ReleaseDocument = { ...asked, pairs: [['A', 'B']] };
    expect(testedOf(document, 'lead:A|B').trace.family).toEqual({ size: 2, before: 1 });
    expect(testedOf({ ...asked, pairs: [] }, 'net-score:A|C').trace.family.size).toBe(1);
  });
});

describe('blocs', () => {
  const release = sample(1000, parties);
  const blocs = [
    { name: 'Left', options: ['A', 'C'] },
    { name: 'Right', options: ['B', 'D'] },
  ];

  test('are one share each, and a lead between them is that of two shares', () => {
    // R 4.2.2: se <- sqrt((.45 + .36 - .09^2) / 1000); c(100 * se, .09 / se)
    const lead = testedOf({ release, blocs, pairs: [['Left', 'Right']] }, 'lead:Left|Right');
    expect(lead.estimatePp).toBe(9);
    expect(lead.sePp).toBeCloseTo(2.83178389005941, pp);
    expect(lead.z).toBeCloseTo(3.17820863081864, pp);
    expect(findingOf({ release, blocs }, 'share:Left')).toMatchObject({
      estimatePct: 45,
      bloc: { options: ['A', 'C'], source: 'summed' },
    });
  });

  test('carry the rounding of every option they sum, or of the figure that tables give', () => {
    const pairs: ReleaseDocument['pairs'] = [['Left', 'Right']];
    // the sum of four roundings of whole percents
    expect(testedOf({ release, blocs, pairs }, 'lead:Left|Right').roundingPp).toBeCloseTo(
      1.1198882632066058,
      pp,
    );
    const printed = blocs.map((bloc, index) => ({
      ...bloc,
      printed: { pct: index === 0 ? 44.6 : 36.3, decimals: 1 },
    }));
    const lead = testedOf({ release, blocs: printed, pairs }, 'lead:Left|Right');
    expect(lead.estimatePp).toBe(8.3);
    expect(lead.roundingPp).toBeCloseTo(0.0776393202250021, pp);
    expect(findingOf({ release, blocs: printed }, 'share:Left')).toMatchObject({
      bloc: { source: 'printed' },
    });
  });

  test('change, and are held against thresholds', () => {
    const document: ReleaseDocument = {
      release,
      comparison: { base: sample(1000, { ...parties, A: 25, Undecided: 25 }) },
      blocs,
      pairs: [['Left', 'B']],
      thresholds: [{ option: 'Left', pct: 50 }],
    };
    expect(testedOf(document, 'change:Left').estimatePp).toBe(6);
    expect(testedOf(document, 'lead-change:Left|B').estimatePp).toBe(6);
    expect(testedOf(document, 'threshold:Left|50').estimatePp).toBe(-5);
  });

  test('take the earlier figure from tables where it is given', () => {
    const document: ReleaseDocument = {
      release,
      comparison: { base: sample(1000, parties), blocs: [{ name: 'Left', pct: 44.6, decimals: 1 }] },
      blocs,
      changes: ['Left'],
    };
    expect(testedOf(document, 'change:Left').estimatePp).toBe(0.4);
  });

  test('are not disclosed with an option that is not, and lack what the earlier base lacks', () => {
    const hidden = sample(1000, { ...parties, C: null });
    expect(untestedOf({ release: hidden, blocs, pairs: [['Left', 'B']] }, 'lead:Left|B')).toMatchObject({
      estimatePp: null,
      reasons: ['not-disclosed'],
    });
    const comparison = { base: sample(1000, { A: 40, B: 30 }) };
    expect(untestedOf({ release, comparison, blocs, changes: ['Left'] }, 'change:Left').reasons).toEqual([
      'not-comparable',
    ]);
  });
});

describe('re-based questions', () => {
  const shares = { A: 48, B: 52 };
  const stated = { deff: { source: 'stated' as const, value: 1.4 } };

  test('stand on the people left in, with the design effect of everyone asked', () => {
    // R 4.2.2: se <- sqrt(1.4 * (1 - .04^2) / 860); c(100 * se, .04 / se)
    const release = { ...sample(1000, shares, stated), rebased: { n: 860 } };
    const lead = testedOf({ release }, 'lead:B|A');
    expect(lead.sePp).toBeCloseTo(4.03150384544204, pp);
    expect(lead.z).toBeCloseTo(0.992185584672663, pp);
    expect(judge({ release })).toMatchObject({ rebasedN: 860, base: { nEff: 860 / 1.4 } });
  });

  test('read a stated margin as that of everyone asked', () => {
    const statedMargin = { pp: 3.6, unit: 0.1, level: 0.95 };
    const whole = sample(1000, shares, { statedMargin });
    expect(judge({ release: { ...whole, rebased: { n: 860 } } }).base.deff).toBe(
      judge({ release: whole }).base.deff,
    );
  });

  test('cannot be tested, nor have an interval, where nobody says how many are left', () => {
    const document = { release: { ...sample(1000, shares), rebased: { n: null } } };
    expect(untestedOf(document, 'lead:B|A')).toMatchObject({ estimatePp: 4, reasons: ['rebased-size'] });
    expect(findingOf(document, 'share:A')).not.toHaveProperty('intervalPct');
    expect(judge(document).rebasedN).toBeNull();
  });

  test('need no number of everyone asked where the number left is known', () => {
    const release = { ...sample(null, shares, stated), rebased: { n: 860 } };
    expect(testedOf({ release }, 'lead:B|A').sePp).toBeCloseTo(4.03150384544204, pp);
  });
});

describe('thresholds of a rule', () => {
  test('are tested only on the base that the rule counts', () => {
    const shares = [
      { option: 'A', pct: 6 },
      { option: 'Undecided', pct: 20, answer: false },
    ];
    const release = { ...sample(1000, {}), shares };
    const ask = (countedBase: 'answers' | 'valid-votes') => ({
      release,
      pairs: [],
      thresholds: [{ option: 'A', pct: 5, countedBase }],
    });
    expect(testedOf(ask('answers'), 'threshold:A|5').trace.thresholdPct).toBe(5);
    expect(untestedOf(ask('valid-votes'), 'threshold:A|5').reasons).toEqual(['other-base']);
  });
});

describe('gaps between subgroups', () => {
  const design = { design: 'weighted' as const };
  const question: SubgroupQuestion = {
    question: 'Toll',
    total: { name: 'Everyone', base: sample(1000, { Yes: 31 }) },
    groups: [
      { name: 'Coast', by: 'region', base: sample(480, { Yes: 36 }, design) },
      { name: 'Hills', by: 'region', base: sample(520, { Yes: 26 }, design) },
    ],
    gaps: [{ option: 'Yes', group: 'Coast', against: 'Hills' }],
  };
  const release = sample(1000, { Yes: 31 });

  test('are tested as a change, each group with its own size and design effect', () => {
    // R 4.2.2: se <- sqrt(1.4 * .36 * .64 / 480 + 1.4 * .26 * .74 / 520); c(100 * se, .1 / se, 2 * pnorm(-.1 / se))
    const gap = testedOf({ release, subgroups: [question] }, 'gap:Toll|Yes|Coast|Hills');
    expect(gap.estimatePp).toBe(10);
    expect(gap.sePp).toBeCloseTo(3.44963766213207, pp);
    expect(gap.p).toBeCloseTo(0.0037452784241778, 12);
    expect(gap.secondTests.map(({ name }) => name)).toEqual(['pooled', 'newcombe']);
    expect(gap.trace.bases.map(({ name }) => name)).toEqual(['Coast', 'Hills']);
  });

  test('against the rest of the sample take the rest out of the whole', () => {
    // R 4.2.2: r <- (.31 - .49 * .36) / .51; se <- sqrt(.36 * .64 / 480 + r * (1 - r) / 520); c(.36 - r, se)
    const plain = question.groups.map((group) => ({
      ...group,
      base: { ...group.base, design: 'unweighted' as const },
    }));
    const asked = {
      ...question,
      groups: plain,
      gaps: [{ option: 'Yes', group: 'Coast', against: { restOfWeightPct: 49 } }],
    };
    const gap = testedOf({ release, subgroups: [asked] }, 'gap:Toll|Yes|Coast|');
    expect(gap.estimatePp).toBeCloseTo(9.80392156862745, pp);
    expect(gap.sePp).toBeCloseTo(2.91856567708373, pp);
    // both printed figures count 1 / (1 − .49) times
    expect(gap.roundingPp).toBeCloseTo(0.776393202250021 / 0.51, pp);
  });

  test('of one question are one family, and of another question another', () => {
    const second = { ...question, question: 'Ferry', gaps: [] };
    const both = {
      ...question,
      gaps: [...question.gaps, { option: 'Yes', group: 'Coast', against: { restOfWeightPct: 49 } }],
    };
    const document = { release, subgroups: [both, { ...second, gaps: question.gaps }] };
    expect(testedOf(document, 'gap:Toll|Yes|Coast|Hills').trace.family.size).toBe(2);
    expect(testedOf(document, 'gap:Ferry|Yes|Coast|Hills').trace.family).toEqual({ size: 1, before: 0 });
  });

  test('get no verdict where a group is below the presentation standard', () => {
    const groups = [
      { name: 'Coast', by: 'region', base: sample(110, { Yes: 2 }) },
      { name: 'Hills', by: 'region', base: sample(520, { Yes: 26 }) },
    ];
    const document = { release, subgroups: [{ ...question, groups }] };
    const gap = findingOf(document, 'gap:Toll|Yes|Coast|Hills');
    expect(gap).toMatchObject({
      verdict: 'cannot-be-tested',
      estimatePp: -24,
      reasons: ['below-presentation-standard'],
      presentation: [{ outcome: 'suppress', reasons: ['relative-width'] }, { outcome: 'show' }],
    });
    expect(judge(document).subgroups[0]?.groups[0]?.shares[0]?.presentation?.outcome).toBe('suppress');
  });
});
