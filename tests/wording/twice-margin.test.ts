import { describe, expect, it } from 'vitest';
import { NOT_DISCLOSED } from '@/lib/domain/disclosed';
import { LANGUAGES } from '@/lib/domain/vocabulary';
import { checkWording } from '@/lib/wording/check/check-wording';
import { checkedReleaseOf } from '@/lib/wording/check/checked-release';
import type { DraftInput } from '@/lib/wording/draft-input';
import { draftLine } from '@/lib/wording/draft-sheet';
import { twiceTheMargin, twiceTheMarginNote } from '@/lib/wording/twice-margin';
import { GOLDEN_CASES } from './golden-cases';

const CASES = new Map<string, DraftInput>(Object.entries(GOLDEN_CASES));
const golden = (name: string) => CASES.get(name)!;
const read = ({ finding, answer, release, policy }: DraftInput) =>
  twiceTheMargin(finding, answer.base, release, policy.level);
const leads = Object.entries(GOLDEN_CASES).filter(([, input]) => read(input) !== null);

describe('the rule of thumb of twice the margin', () => {
  it('takes the margin that the pollster states, and ours where none is stated', () => {
    const input = golden('lead-not-shown');
    expect(read(input)).toEqual({ marginPp: 3.7, whose: 'stated', zone: 'between', test: 'agrees' });
    const silent = { ...input, release: { ...input.release, statedMargin: NOT_DISCLOSED } };
    expect(read(silent)).toMatchObject({ whose: 'ours', marginPp: input.answer.base.maximumMarginPp });
  });

  it('says where our own test is stricter or asks less', () => {
    const tests = new Set(leads.map(([, input]) => read(input)!.test));
    expect(tests.has('stricter')).toBe(true);
    expect(read(golden('lead-holds'))!.test).toMatch(/agrees|looser/);
  });

  it('has no answer for changes, equal figures, what cannot be tested and samples that are not random', () => {
    const names = ['change-fragile', 'lead-level', 'lead-untested-opt-in', 'lead-fragile-modelled'];
    expect(names.map((name) => read(golden(name)))).toEqual(names.map(() => null));
  });

  it('is told to staff beside the verdict', () => {
    expect(twiceTheMarginNote(read(golden('lead-not-shown'))!)).toBe(
      'Against twice the margin for a share (±3.7, as the pollster states it): the difference is between once and twice that margin. The verdict comes from the test of the difference itself.',
    );
  });
});

describe('the caveat', () => {
  const caveat = (input: DraftInput, isOn: boolean, language: DraftInput['language'] = 'en') =>
    draftLine({ ...input, language, houseStyle: { ...input.houseStyle, twiceTheMargin: isOn } }, 'caveat');

  it('has the reading where the desk wants it, and else not', () => {
    const input = golden('lead-not-shown');
    expect(caveat(input, false)).not.toContain('rule of thumb');
    expect(caveat(input, true)).toContain(
      'The rule of thumb of twice the margin (here ±3.7 points for a share) finds the difference between once and twice that margin; our desk goes by its own test of the difference.',
    );
  });

  it.each(LANGUAGES)('has it in a language of its own: %s', (language) => {
    const input = golden('lead-not-shown');
    expect(caveat(input, true, language).length).toBeGreaterThan(caveat(input, false, language).length + 60);
  });

  it.each(leads)('is not objected to by the wording check: %s', (_, input) => {
    const { release, previous, policy, answer, houseStyle } = input;
    const releases = [checkedReleaseOf(release, previous, policy, { answer })];
    const text = caveat(input, true);
    const { marks } = checkWording({ text, language: 'en', releases, houseStyle, policy, part: 'line' });
    expect(marks.map(({ phrase, message }) => `${phrase}: ${message}`)).toEqual([]);
  });
});
