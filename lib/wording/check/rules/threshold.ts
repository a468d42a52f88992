import { markAt, percentText, replacementOf, type Judged } from '../marks';
import { subjectOf } from '../parties';
import type { Hit } from '../phrases';
import type { Reading } from '../reading';
import { scopeOf } from '../scope';
import type { WordingMark } from '../types';
import { shareOf, thresholdOf } from '../verdicts';
import { releasesFor } from '../which-release';
import { isAboutSubgroup } from './about';
import { agreed } from './agreed';

type Said = Hit & { isAbove: boolean; pct: number | null };
const NEAR = 6;

/**
 * Sides of a hurdle, and seats that hang on it: takes a test of the share against it, never one poll's figure.
 * Advice of a Swedish handbook for reporters on the 4 percent hurdle, from memory.
 */
export function markThresholds(reading: Reading): WordingMark[] {
  return saidSides(reading)
    .filter((said) => scopeOf(reading, said) !== 'open' && !isAboutSubgroup(reading, said))
    .flatMap((said) => judgeSaid(reading, said));
}

function saidSides(reading: Reading): Said[] {
  const sides = (['aboveThreshold', 'belowThreshold'] as const).flatMap((group) =>
    reading.cues(group).flatMap((hit): Said[] => {
      const line = lineAfter(reading, hit) ?? lineBefore(reading, hit);
      return line ? [{ ...line, isAbove: group === 'aboveThreshold' }] : [];
    }),
  );
  const seats = (['intoAssembly', 'outOfAssembly'] as const).flatMap((group) =>
    reading.cues(group).map((hit): Said => ({ ...hit, isAbove: group === 'intoAssembly', pct: null })),
  );
  return [...sides, ...seats].filter(
    (said, index, all) =>
      !all.some((other, place) => place < index && other.from < said.to && said.from < other.to),
  );
}

/** "above the 5% threshold", "clears the hurdle", "below 5%" where a race has that threshold. */
function lineAfter(reading: Reading, { from, to }: Hit): Omit<Said, 'isAbove'> | null {
  let pct: number | null = null;
  for (let at = to; at < to + NEAR; at += 1) {
    const noun = reading.cueAt('thresholdNoun', at);
    if (noun) return { from, to: noun.to, pct };
    const quantity = reading.quantityAt(at);
    if (quantity && reading.cueAt('withWords', at - 1)) at = quantity.to - 1;
    else if (quantity) {
      pct = quantity.value;
      at = quantity.to - 1;
      const isEnd = !reading.has('thresholdNoun', { from: quantity.to, to: quantity.to + 2 });
      if (isEnd) return isRaceThreshold(reading, quantity.value) ? { from, to: quantity.to, pct } : null;
    } else if (reading.mentionAt(at) || reading.tokens[at]?.kind !== 'word') return null;
  }
  return null;
}

/** "die Hürde überspringt": where verbs come last, the hurdle stands before them. */
function lineBefore(reading: Reading, { from, to }: Hit): Omit<Said, 'isAbove'> | null {
  if (!reading.lexicon.words.verbsComeLast || reading.tokens[to]?.kind === 'word') return null;
  for (let at = from - 1; at >= from - NEAR && reading.tokens[at]?.kind === 'word'; at -= 1) {
    if (reading.cueAt('thresholdNoun', at)) return { from, to, pct: null };
  }
  return null;
}

function isRaceThreshold(reading: Reading, pct: number): boolean {
  return reading.input.releases.some(({ facts }) =>
    facts.race.thresholds.some((threshold) => threshold.pct === pct && pct !== 50),
  );
}

function judgeSaid(reading: Reading, said: Said): WordingMark[] {
  const { releases } = reading.input;
  const subject = subjectOf(reading, said);
  if (releases.length === 0 || !subject) return [];
  if (subject === 'unknown') return [markAt(reading, said, UNKNOWN)];
  const isAbove = scopeOf(reading, said) === 'denied' ? !said.isAbove : said.isAbove;
  const judgements = releasesFor(reading, said, [subject.option]).map((release) =>
    judge(reading, { ...said, isAbove }, subject.option, release),
  );
  return agreed(reading, said, judgements, 'threshold');
}

function judge(reading: Reading, said: Said, option: string, release: number): Judged | null {
  const checked = reading.input.releases[release]!;
  const own = checked.facts.race.thresholds.find((one) => one.option === option && one.pct !== 50);
  const any = own ?? checked.facts.race.thresholds.find((one) => one.pct !== 50);
  const pct = said.pct ?? any?.pct ?? null;
  const share = shareOf(checked.facts, option);
  const found = pct === null ? null : thresholdOf(reading.input.releases, release, option, pct);
  const base = { rule: 'threshold' as const, release, claim: found?.claim ?? null };
  if (share !== null && pct !== null && any?.pct === pct && (said.isAbove ? share < pct : share > pct)) {
    return { ...base, grade: 'wrong', message: `The release gives ${option} ${share}%.`, replacement: null };
  }
  if (!found)
    return { ...base, grade: 'cannot-judge', message: 'The release given has no such threshold for this.' };
  const isPlain = reading.has('aboveThreshold', said) || reading.has('belowThreshold', said);
  if (found.verdict === 'holds' || (found.verdict === 'fragile' && isPlain)) return null;
  const replacement =
    share === null
      ? null
      : replacementOf(reading.lexicon.words, 'atShare', { share: percentText(reading.lexicon.words, share) });
  return {
    ...base,
    grade: 'not-supported',
    message: 'The poll cannot say on which side of the threshold opinion lies.',
    replacement,
  };
}

const UNKNOWN: Judged = {
  rule: 'threshold',
  grade: 'cannot-judge',
  message: 'A name here is in none of the releases given.',
};
