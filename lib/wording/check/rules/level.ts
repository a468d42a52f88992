import { markAt, replacementOf, type Judged } from '../marks';
import { optionsIn } from '../parties';
import type { Hit } from '../phrases';
import type { Reading } from '../reading';
import { scopeOf } from '../scope';
import type { WordingMark } from '../types';
import { leadOf, rankedOptions } from '../verdicts';
import { releasesFor } from '../which-release';
import { isAboutPoll, isAboutSubgroup } from './about';
import { agreed } from './agreed';

/**
 * Ties. "Statistical tie" and its like are never supported, "tied" only means equal printed figures, "too close to
 * call" belongs to counts: AP Stylebook polls chapter and NCPP as quoted publicly, from memory.
 */
export function markLevels(reading: Reading): WordingMark[] {
  const isClaimed = (hit: Hit) => scopeOf(reading, hit) === 'claimed' && !isAboutSubgroup(reading, hit);
  const notional = reading.cues('notional').filter((hit) => scopeOf(reading, hit) === 'claimed');
  const inNotional = (hit: Hit) => reading.has('notional', hit);
  const plain = [
    ...reading.cues('tied').map((hit) => ({ ...hit, isTied: true })),
    ...reading.cues('level').map((hit) => ({ ...hit, isTied: false })),
  ];
  return [
    ...notional.map((hit) => markAt(reading, hit, NOTIONAL)),
    ...plain.filter((hit) => !inNotional(hit) && isClaimed(hit)).flatMap((hit) => judgePlain(reading, hit)),
  ];
}

const NOTIONAL: Judged = {
  rule: 'level',
  grade: 'not-supported',
  message:
    'A poll cannot show a tie: say the figures, and that chance alone could produce a gap of that size.',
};

function judgePlain(reading: Reading, hit: Hit & { isTied: boolean }): WordingMark[] {
  if (!isAboutPoll(reading, hit)) return [];
  const { releases } = reading.input;
  if (releases.length === 0) return hit.isTied ? [markAt(reading, hit, UNKNOWN)] : [];
  const { from, to } = reading.sentenceAt(hit.from);
  const names = [...new Set(optionsIn(reading, from, to).map(({ name }) => name))];
  const judgements = releasesFor(reading, hit, names.slice(0, 2)).flatMap((release) => {
    const ranked = rankedOptions(releases[release]!);
    const [a = ranked[0], b = ranked.find((option) => option !== a)] = names;
    const found = a && b ? leadOf(releases, release, a, b) : null;
    return found ? [{ found, release }] : [];
  });
  return agreed(
    reading,
    hit,
    judgements.map(({ found, release }): Judged | null => {
      const base = { rule: 'level' as const, release, claim: found.claim };
      const replacement = replacementOf(reading.lexicon.words, 'level');
      if (found.estimatePp === null)
        return { ...base, grade: 'cannot-judge', message: 'The figures are not disclosed.' };
      if (found.estimatePp !== 0)
        return { ...base, grade: 'wrong', message: 'The printed figures differ.', replacement: null };
      return hit.isTied
        ? {
            ...base,
            grade: 'house-style',
            message: 'Equal figures are level in this poll; the race is not tied.',
            replacement,
          }
        : null;
    }),
    'level',
  );
}

const UNKNOWN: Judged = {
  rule: 'level',
  grade: 'cannot-judge',
  message: 'Only equal printed figures are level, and no release is given to compare them in.',
};
