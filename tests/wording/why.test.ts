import { describe, expect, it } from 'vitest';
import { check } from '@/lib/findings/check';
import { baseSummary, deffSourceText, noteText } from '@/lib/wording/base-words';
import type { BaseNote } from '@/lib/findings/check-types';
import { explain } from '@/lib/wording/why';
import { GOLDEN_CASES } from './golden-cases';

const shares = [
  { option: 'Alder', pct: 49 },
  { option: 'Brook', pct: 41 },
  { option: 'Cask', pct: null },
];
const ordinary = {
  sampleSource: 'probability' as const,
  n: 1012,
  design: 'weighted' as const,
  decimals: 0,
  shares,
};

describe('explain', () => {
  it('says of a fragile lead at which design effect it fails and what rounding does', () => {
    const { finding, answer } = GOLDEN_CASES['lead-fragile-design-effect'];
    expect(explain(finding, answer)).toEqual([
      'Larger than sampling error at the assumed design effect of 1.4, but not at 2.',
      'It fails once the design effect reaches 1.89.',
      'Rounding (±0.8) does not undo it.',
    ]);
  });

  it('says of a change that is not shown what would have been found', () => {
    const { finding, answer } = GOLDEN_CASES['change-not-shown'];
    expect(explain(finding, answer)).toEqual([
      'The change could be anything from −2.3 to 8.3.',
      'A true change of 9.6 points would have been found four times in five; smaller ones are often missed.',
    ]);
  });

  it('gives a share its range, or says why it has none', () => {
    const tested = check({ release: ordinary });
    const untested = check({ release: { ...ordinary, sampleSource: 'opt-in' } });
    const ofShares = [tested, untested].map((answer) =>
      answer.findings.filter(({ kind }) => kind === 'share').flatMap((finding) => explain(finding, answer)),
    );
    expect(ofShares).toEqual([
      [
        'The range runs from 45.4% to 52.6% (Wilson, on effective counts).',
        'The range runs from 37.5% to 44.6% (Wilson, on effective counts).',
        'This share is not disclosed.',
      ],
      [
        'No margin: the sample is not random, or its size is not disclosed.',
        'No margin: the sample is not random, or its size is not disclosed.',
        'This share is not disclosed.',
      ],
    ]);
  });
});

describe('the words of a base', () => {
  it('sum it up in one line', () => {
    expect(baseSummary(check({ release: ordinary }).base)).toBe(
      'Design effect 1.4, assumed by the desk’s policy (1.2–2); worth 723 interviews of a random sample; margin near 50% ±3.6.',
    );
    expect(baseSummary(check({ release: { ...ordinary, n: null } }).base)).toBe(
      'No margin: the sample is not random, or its size is not disclosed.',
    );
  });

  it('have a sentence for every note', () => {
    const notes: BaseNote[] = [
      'shares-exceed-100',
      'stated-margin-like-unweighted',
      'deff-assumed',
      'deff-below-one',
      'deff-above-four',
      'modelled-basis',
      'comparison-basis',
    ];
    expect(new Set(notes.map(noteText)).size).toBe(7);
    expect(notes.map(noteText).filter((text) => !/^[A-Z].*\.$/.test(text))).toEqual([]);
    expect(deffSourceText('kish')).toBe('from the weights alone');
  });
});
