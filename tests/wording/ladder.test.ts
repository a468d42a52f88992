import { describe, expect, it } from 'vitest';
import { draftSheet } from '@/lib/wording/draft-sheet';
import { DEFAULT_HOUSE_STYLE } from '@/lib/wording/house-style';
import { claimsAbove } from '@/lib/wording/never-says-more';
import { claimMessage, VERDICT_OF_STATE, wordingState, type WordingState } from '@/lib/wording/wording-state';
import type { DraftInput } from '@/lib/wording/draft-input';
import { GOLDEN_CASES } from './golden-cases';
import { JUDGED_CASES } from './judged-cases';

const { ladder, messages } = DEFAULT_HOUSE_STYLE;
const KINDS = ['lead', 'change', 'lead-change', 'threshold', 'net-score', 'net-score-change', 'gap'] as const;
const CASES = Object.entries<DraftInput>({ ...GOLDEN_CASES, ...JUDGED_CASES });
const STATES = Object.keys(VERDICT_OF_STATE) as WordingState[];
const LINES = ['headline', 'body', 'chartTitle', 'told'] as const;

describe('the ladder of verbs', () => {
  const cases = LINES.flatMap((line) =>
    KINDS.flatMap((kind) =>
      STATES.filter((state) => state !== 'little-changed' || kind === 'change').map(
        (state) => [line, kind, state] as const,
      ),
    ),
  );

  it.each(cases)('%s of a %s that is %s says no more', (line, kind, state) => {
    const message = claimMessage(messages.en[line], kind, state);
    expect(claimsAbove(VERDICT_OF_STATE[state], message)).toEqual([]);
  });

  it.each(CASES)('carries the headline and the chart title of %s', (_, input) => {
    const titles = draftSheet(input).filter(({ kind }) => kind === 'headline' || kind === 'chart-title');
    for (const { text } of titles) {
      const own = ladder[input.finding.verdict].filter((verb) => text.toLowerCase().includes(verb));
      expect(own, text).not.toEqual([]);
    }
  });

  it('has a case for every state of every kind of claim among the golden sheets', () => {
    const seen = CASES.map(([, { finding }]) => `${finding.kind} ${VERDICT_OF_STATE[wordingState(finding)]}`);
    const wanted = KINDS.flatMap((kind) =>
      Object.values(VERDICT_OF_STATE).map((verdict) => `${kind} ${verdict}`),
    );
    expect(new Set(seen)).toEqual(new Set(wanted));
  });

  it('is refused where a kind of claim has no such state', () => {
    expect(() => claimMessage(messages.en.body, 'lead', 'little-changed')).toThrow(
      new RangeError('claimMessage requires a state of its kind of claim'),
    );
  });

  it('gives different headlines to different verdicts on one pair of names', () => {
    const headlines = ['lead-holds', 'lead-fragile-rounding', 'lead-not-shown', 'lead-untested-opt-in'].map(
      (name) => draftSheet(GOLDEN_CASES[name as keyof typeof GOLDEN_CASES])[0]?.text,
    );
    expect(new Set(headlines).size).toBe(4);
  });
});
