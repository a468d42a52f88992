import { describe, expect, it } from 'vitest';
import { testRows } from '@/components/lines/test-rows';
import { check } from '@/lib/findings/check';
import type { Base, TestableFinding } from '@/lib/findings/check-types';
import { parseCheckDocument } from '@/lib/findings/parse-check';

function rowsOf(release: Partial<Base>, previous: Partial<Base> | null = null, kind = 'lead') {
  const base = {
    sampleSource: 'probability',
    n: 1012,
    design: 'weighted',
    decimals: 0,
    shares: [
      { option: 'Alder', pct: 49 },
      { option: 'Brook', pct: 41 },
      { option: 'Don’t know', pct: 10, answer: false },
    ],
  };
  const document = parseCheckDocument({
    release: { ...base, ...release },
    ...(previous ? { previous: { ...base, ...previous } } : {}),
  });
  const answer = check(document);
  const finding = answer.findings.find((one): one is TestableFinding => one.kind === kind)!;
  return Object.fromEntries(testRows(finding, answer).map(({ term, value }) => [term, value]));
}

describe('the rows that a second reader checks a claim against', () => {
  it('say test, range, rounding, design effect with its turning point, second test and verdict', () => {
    expect(rowsOf({})).toEqual({
      'Test of the lead': 'z = 2.28, p = 0.023',
      Range: '1.1 to 14.9 points',
      Rounding: '± 0.8 points: still passes',
      'Design effect': '1.4 assumed by the desk’s policy (1.2–2)',
      'The result turns': 'at a design effect of 1.89',
      'Score test': 'p = 0.023: passes',
      Verdict: 'Fragile: design effect',
    });
  });

  it('say whether a finding that holds would stand at twice the error', () => {
    const rows = rowsOf({
      n: 2000,
      design: 'unweighted',
      shares: [
        { option: 'Alder', pct: 56 },
        { option: 'Brook', pct: 40 },
      ],
    });
    expect(rows).toMatchObject({ Verdict: 'Holds', 'At twice the sampling error': 'would stand' });
    expect(rows).not.toHaveProperty('Found four times in five');
  });

  it('say of a change what was tested together and what would have been found', () => {
    const rows = rowsOf({}, { n: 1004, deff: { source: 'kish', value: 1.6 } }, 'change');
    expect(rows).toMatchObject({
      'Adjusted for 3 tests': 'p = 1.000',
      'Design effect': '1.4 assumed by the desk’s policy (1.2–2)',
      'Design effect, earlier': '1.6 from the weights alone (1.28–2.08)',
      Verdict: 'Not shown',
    });
    expect(rows['Found four times in five']).toMatch(/^a true \d+\.\d points$/);
    expect(rows).not.toHaveProperty('The result turns');
  });

  it('say only why, where nothing can be tested', () => {
    expect(rowsOf({ sampleSource: 'opt-in' })).toEqual({
      Verdict: 'Cannot be tested: the sample is not random',
    });
    expect(rowsOf({ n: null })).toEqual({ Verdict: 'Cannot be tested: no sample size' });
  });
});
