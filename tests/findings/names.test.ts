import { describe, expect, test } from 'vitest';
import { check } from '@/lib/findings/check';
import type { Base, CheckDocument } from '@/lib/findings/check-types';
import { claimKey, findClaim } from '@/lib/findings/claim-key';
import { DISCLOSURE_LABELS, missingDisclosure } from '@/lib/findings/disclosure';
import { headingOf } from '@/lib/findings/heading';
import { figure } from '@/lib/findings/working-step';

const base = (decimals: number, alder: number, brook: number): Base => ({
  sampleSource: 'probability',
  n: 1000,
  design: 'weighted',
  decimals,
  shares: [
    { option: 'Alder', pct: alder },
    { option: 'Brook', pct: brook },
    { option: 'Crane', pct: null },
  ],
});
const document: CheckDocument = {
  release: base(0, 47, 41),
  previous: base(1, 43.5, 44.5),
  pairs: [
    ['Alder', 'Brook'],
    ['Alder', 'Crane'],
  ],
  changes: ['Alder', 'Brook'],
  thresholds: [
    { option: 'Brook', pct: 50 },
    { option: 'Alder', pct: 33.3 },
  ],
};
const answer = check(document);

describe('headingOf', () => {
  test('is a quantity with the decimals that its figures are printed with', () => {
    expect(answer.findings.map((finding) => headingOf(finding, document))).toEqual([
      'Alder: 47%',
      'Brook: 41%',
      'Crane: no figure',
      'Alder minus Brook: +6',
      'Alder minus Crane: no figure',
      'Alder, earlier to this: +3.5',
      'Brook, earlier to this: −3.5',
      'Alder minus Brook, earlier to this: +7.0',
      'Alder minus Crane, earlier to this: no figure',
      'Brook against 50%: −9',
      'Alder against 33.3%: +13.7',
    ]);
  });

  test('gives no sign to 0', () => {
    const even: CheckDocument = { release: base(1, 44, 44) };
    const [lead] = check(even).findings.filter(({ kind }) => kind === 'lead');
    expect(lead && headingOf(lead, even)).toBe('Alder minus Brook: 0.0');
  });
});

describe('claimKey', () => {
  test('names each finding of an answer differently and finds it again', () => {
    const keys = answer.findings.map(claimKey);
    expect(keys).toContain('lead:Alder|Brook');
    expect(keys).toContain('threshold:Brook|50');
    expect(new Set(keys).size).toBe(keys.length);
    keys.forEach((key, index) => {
      expect(findClaim(answer, key)).toEqual({ finding: answer.findings[index], index });
    });
    expect(findClaim(answer, 'lead:Brook|Alder')).toBeNull();
  });

  test('keeps names with its own signs apart', () => {
    const lead = (first: string, second: string) =>
      claimKey({
        kind: 'lead',
        pair: [first, second],
        estimatePp: null,
        verdict: 'cannot-be-tested',
        reasons: [],
      });
    expect(lead('A|B', 'C')).not.toBe(lead('A', 'B|C'));
    expect(lead('A\\', 'B')).not.toBe(lead('A', '\\B'));
  });
});

describe('missingDisclosure', () => {
  const allGiven = Object.fromEntries(Object.keys(DISCLOSURE_LABELS).map((item) => [item, 'given' as const]));

  test('is empty where all is given or does not apply', () => {
    expect(missingDisclosure({ ...allGiven, sponsor: 'not-applicable' })).toEqual([]);
  });

  test('tells what is withheld from what nobody has entered, in the order of the list', () => {
    expect(missingDisclosure({ ...allGiven, weighting: 'not-disclosed', mode: 'not-entered' })).toEqual([
      { item: 'mode', label: 'How they were interviewed', status: 'not-entered' },
      { item: 'weighting', label: 'Weighting', status: 'not-disclosed' },
    ]);
  });

  test('counts what is left out as not entered', () => {
    expect(missingDisclosure({})).toHaveLength(Object.keys(DISCLOSURE_LABELS).length);
    expect(missingDisclosure({}).every(({ status }) => status === 'not-entered')).toBe(true);
  });
});

describe('figure', () => {
  test('writes six digits, a real minus and no closing zeros', () => {
    expect([3.5345555, -0.25, 1012, 0, 1e-20, 50].map(figure)).toEqual([
      '3.53456',
      '−0.25',
      '1012',
      '0',
      '1e−20',
      '50',
    ]);
  });
});
