import { markAt, percentText, replacementOf, type Judged } from '../marks';
import { optionsIn, subjectOf } from '../parties';
import type { Hit } from '../phrases';
import type { Reading } from '../reading';
import { clauseOf, scopeOf } from '../scope';
import type { WordingMark } from '../types';
import { shareOf, thresholdOf } from '../verdicts';
import { releasesFor } from '../which-release';
import { isAboutPoll, isAboutSubgroup } from './about';
import { agreed } from './agreed';

type Said = Hit & { kind: 'above' | 'below' | 'fraction'; valuePct: number };

/**
 * Majorities and fractions: more than half takes a test against half; a fraction is a figure and takes one that is
 * near it. Tolerances (half within 1 point, other fractions within 2): common practice, no source.
 */
export function markMajorities(reading: Reading): WordingMark[] {
  return saidFractions(reading)
    .filter(
      (hit) =>
        scopeOf(reading, hit) === 'claimed' && isAboutPoll(reading, hit) && !isAboutSubgroup(reading, hit),
    )
    .flatMap((hit) => judgeSaid(reading, hit));
}

function saidFractions(reading: Reading): Said[] {
  const of = (
    group: 'majority' | 'most' | 'overHalf' | 'underHalf' | 'minority',
    kind: 'above' | 'below',
  ): Said[] => reading.cues(group).map((hit) => ({ ...hit, kind, valuePct: 50 }));
  const sides = [
    ...of('underHalf', 'below'),
    ...of('overHalf', 'above'),
    ...of('majority', 'above'),
    ...of('most', 'above'),
    ...of('minority', 'below'),
  ];
  const fractions = reading.quantities
    .filter(
      ({ unit, from, to }) =>
        unit === 'fraction' &&
        (reading.lexicon.words.nounsHaveCapitals ||
          !reading.isCapital(from) ||
          reading.sentenceAt(from).from === from) &&
        !reading.cueAt('beforeNoFraction', from - 1) &&
        !reading.cueAt('afterNoFraction', to),
    )
    .map(({ from, to, value }): Said => ({ from, to, kind: 'fraction', valuePct: value }));
  const all = [...sides, ...fractions];
  return all.filter(
    (hit, index) => !all.some((other, place) => place < index && other.from < hit.to && hit.from < other.to),
  );
}

function judgeSaid(reading: Reading, said: Said): WordingMark[] {
  const { releases } = reading.input;
  if (releases.length === 0) return [];
  const option = holderOf(reading, said);
  if (!option) return said.kind === 'fraction' ? [] : [markAt(reading, said, NOBODY)];
  const ofDecided = reading.has('decided', reading.sentenceAt(said.from));
  const judgements = releasesFor(reading, said, [option]).map((release): Judged | null => {
    if (ofDecided && releases[release]!.facts.shares.some(({ isAnswer }) => !isAnswer))
      return { ...DECIDED, release };
    const share = shareOf(releases[release]!.facts, option);
    if (share === null) return null;
    return said.kind === 'fraction'
      ? judgeFraction(reading, said, share, release)
      : judgeSide(reading, said, option, share, release);
  });
  return agreed(reading, said, judgements, 'majority');
}

const NOBODY: Judged = {
  rule: 'majority',
  grade: 'cannot-judge',
  message: 'Nothing here names an answer of a release given, so this cannot be judged.',
};
const DECIDED: Judged = {
  rule: 'majority',
  grade: 'cannot-judge',
  message: 'The release counts the undecided among everyone asked; shares of the decided are not given.',
};

/** Whom a majority backs: named after it ("a majority back Alder") unless somebody has it. */
function holderOf(reading: Reading, said: Said): string | null {
  const clause = clauseOf(reading, said);
  const [after] = optionsIn(reading, said.to, clause.to);
  const link = reading.cues('backs').some(({ from }) => from >= said.to && after && from < after.from);
  if (after && (link || reading.cueAt('backs', after.from))) return after.name;
  const subject = subjectOf(reading, said);
  if (subject && subject !== 'unknown') return subject.option;
  const sentence = reading.sentenceAt(said.from);
  const [only, another] = new Set(optionsIn(reading, sentence.from, sentence.to).map(({ name }) => name));
  return another === undefined ? (only ?? null) : null;
}

function judgeSide(
  reading: Reading,
  said: Said,
  option: string,
  share: number,
  release: number,
): Judged | null {
  const found = thresholdOf(reading.input.releases, release, option, 50);
  const base = { rule: 'majority' as const, release, claim: found?.claim ?? null };
  const figure = replacementOf(reading.lexicon.words, 'atShare', {
    share: percentText(reading.lexicon.words, share),
  });
  const isAbove = said.kind === 'above';
  if (isAbove ? share <= 50 : share >= 50) {
    return {
      ...base,
      grade: 'wrong',
      message: `The release gives ${option} ${share}%.`,
      replacement: figure,
    };
  }
  if (found?.verdict === 'holds' || (found?.verdict === 'fragile' && isNumeric(reading, said))) return null;
  if (!isAbove && isNumeric(reading, said)) return null;
  return {
    ...base,
    grade: 'not-supported',
    message: 'The poll cannot say on which side of half opinion lies.',
    replacement: figure,
  };
}

/** "Above half" is said of a figure and may stand beside a fragile finding; "a majority" is said of opinion. */
const isNumeric = (reading: Reading, said: Said) =>
  reading.has('overHalf', said) || reading.has('underHalf', said);

function judgeFraction(reading: Reading, said: Said, share: number, release: number): Judged | null {
  const isLoose = reading.cueAt('almost', said.from - 1) !== null;
  const tolerance = (said.valuePct === 50 ? 1 : 2) + (isLoose ? 3 : 0);
  if (Math.abs(share - said.valuePct) <= tolerance + 1e-9) return null;
  return {
    rule: 'majority',
    grade: 'wrong',
    release,
    message: `The figure is ${share}%, which is not near this fraction.`,
    replacement: replacementOf(reading.lexicon.words, 'atShare', {
      share: percentText(reading.lexicon.words, share),
    }),
  };
}
