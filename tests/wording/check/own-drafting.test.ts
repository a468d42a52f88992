import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { checkWording } from '@/lib/wording/check/check-wording';
import { checkedReleaseOf } from '@/lib/wording/check/checked-release';
import { lexiconOf } from '@/lib/wording/check/lexicon/compiled';
import { type CheckedRelease, WORDING_LANGUAGES, type WordingLanguage } from '@/lib/wording/check/types';
import type { DraftInput } from '@/lib/wording/draft-input';
import { draftSheet } from '@/lib/wording/draft-sheet';
import { anyRace, draftInputsOf, type AnyRace } from '@/tests/support/any-race';
import { GOLDEN_CASES } from '../golden-cases';

const RELEASES = Number(process.env.WORDING_RELEASES ?? 2000);
const LANGUAGES = WORDING_LANGUAGES.filter((language) => lexiconOf(language) !== null);
/** The long run drafts every release in every language, the short one in one of them, picked with the release. */
const IN_EVERY = process.env.WORDING_RELEASES !== undefined;

/** What the check says of the lines of one sheet, in the language they are drafted in. */
function objectionsTo(
  input: DraftInput,
  language: WordingLanguage,
  releases: readonly CheckedRelease[],
): string[] {
  const { policy, houseStyle } = input;
  return draftSheet({ ...input, language }).flatMap(({ kind, text }) =>
    checkWording({ text, language, releases, houseStyle, policy, part: 'line' }).marks.map(
      ({ rule, grade, phrase, message }) =>
        `${language} ${kind}: ${rule} ${grade} “${phrase}” (${message}) in: ${text}`,
    ),
  );
}

/** The release of a sheet; an editor has chosen to compare it, so the sheets of changes exist. */
function releasesOf({ answer, release, previous, policy }: DraftInput): CheckedRelease[] {
  const comparability = previous && {
    comparable: true,
    differences: [],
    unknowns: [],
    isOverridden: true,
  };
  return [checkedReleaseOf(release, previous, policy, { answer, comparability })];
}

function objectionsToRace(race: AnyRace, picked: number | null, languages: readonly WordingLanguage[]) {
  const inputs = draftInputsOf(race);
  const [first] = inputs;
  if (!first) return [];
  const releases = releasesOf(first);
  const chosen = picked === null ? inputs : inputs.slice(picked % inputs.length).slice(0, 1);
  return chosen.flatMap((input) => languages.flatMap((language) => objectionsTo(input, language, releases)));
}

describe('the wording check and our own drafting', () => {
  it(
    `has no objection to the lines drafted from ${RELEASES} random releases`,
    { timeout: 60_000 + RELEASES * 240 },
    () => {
      const seed = Number(process.env.WORDING_SEED ?? Math.floor(performance.timeOrigin % 2 ** 31));
      process.stdout.write(`own drafting: ${RELEASES} releases, ${LANGUAGES.join(' ')}, seed ${seed}\n`);
      fc.assert(
        fc.property(anyRace, fc.nat(100), fc.constantFrom(...LANGUAGES), (race, picked, language) => {
          expect(objectionsToRace(race, picked, IN_EVERY ? LANGUAGES : [language])).toEqual([]);
        }),
        { numRuns: RELEASES, seed },
      );
    },
  );

  it('has no objection to any line of every claim of some releases', { timeout: 120_000 }, () => {
    fc.assert(
      fc.property(anyRace, (race) => {
        expect(objectionsToRace(race, null, LANGUAGES)).toEqual([]);
      }),
      { numRuns: 20 },
    );
  });

  it.each(Object.entries(GOLDEN_CASES))(
    'has no objection to the golden sheet %s in any language',
    (_, input) => {
      const releases = releasesOf(input);
      expect(LANGUAGES.flatMap((language) => objectionsTo(input, language, releases))).toEqual([]);
    },
  );
});
