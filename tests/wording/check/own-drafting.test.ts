import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { checkWording } from '@/lib/wording/check/check-wording';
import { checkedReleaseOf } from '@/lib/wording/check/checked-release';
import { draftSheet } from '@/lib/wording/draft-sheet';
import { GOLDEN_CASES } from '../golden-cases';
import { anyRace, draftInputsOf, type AnyRace } from './any-release';

const RELEASES = Number(process.env.WORDING_RELEASES ?? 2000);

/** What the check says of the lines of a race's claims: of one of them, or of all where none is picked. */
function objectionsTo(race: AnyRace, picked: number | null): string[] {
  const inputs = draftInputsOf(race);
  const [first] = inputs;
  if (!first) return [];
  const { answer, release, previous, policy, houseStyle } = first;
  // An editor has chosen to compare the two, so the sheets of changes exist.
  const comparability = { comparable: true, differences: [], unknowns: [], isOverridden: true };
  const releases = [checkedReleaseOf(release, previous, policy, { answer, comparability })];
  const chosen = picked === null ? inputs : inputs.slice(picked % inputs.length).slice(0, 1);
  return chosen.flatMap((input) =>
    draftSheet(input).flatMap(({ kind, text }) =>
      checkWording({ text, language: 'en', releases, houseStyle, policy, part: 'line' }).marks.map(
        ({ rule, grade, phrase, message }) =>
          `${kind}: ${rule} ${grade} “${phrase}” (${message}) in: ${text}`,
      ),
    ),
  );
}

describe('the wording check and our own drafting', () => {
  it(
    `has no objection to the lines drafted from ${RELEASES} random releases`,
    { timeout: 60_000 + RELEASES * 60 },
    () => {
      const seed = Number(process.env.WORDING_SEED ?? Math.floor(performance.timeOrigin % 2 ** 31));
      process.stdout.write(`own drafting: ${RELEASES} releases, seed ${seed}\n`);
      fc.assert(
        fc.property(anyRace, fc.nat(100), (race, picked) => {
          expect(objectionsTo(race, picked)).toEqual([]);
        }),
        { numRuns: RELEASES, seed },
      );
    },
  );

  it('has no objection to any line of every claim of some releases', { timeout: 60_000 }, () => {
    fc.assert(
      fc.property(anyRace, (race) => {
        expect(objectionsTo(race, null)).toEqual([]);
      }),
      { numRuns: 20 },
    );
  });

  it.each(Object.entries(GOLDEN_CASES))('has no objection to the golden sheet %s', (_, input) => {
    const { release, previous, policy, answer, houseStyle } = input;
    const comparability = previous && { comparable: true, differences: [], unknowns: [], isOverridden: true };
    const releases = [checkedReleaseOf(release, previous, policy, { answer, comparability })];
    const marks = draftSheet(input).flatMap(
      ({ text }) => checkWording({ text, language: 'en', releases, houseStyle, policy, part: 'line' }).marks,
    );
    expect(marks).toEqual([]);
  });
});
