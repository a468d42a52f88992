import { markAt, replacementOf, type Judged } from '../marks';
import { subjectOf } from '../parties';
import type { Reading } from '../reading';
import { scopeOf } from '../scope';
import type { WordingMark } from '../types';
import { leadOf, rankedOptions } from '../verdicts';
import { releasesFor } from '../which-release';
import { isAboutSubgroup } from './about';
import { agreed } from './agreed';

/** "The largest party": takes a lead over the runner-up that holds. Common practice, no source. */
export function markPluralities(reading: Reading): WordingMark[] {
  const { releases } = reading.input;
  return reading.cues('plurality').flatMap((hit) => {
    if (releases.length === 0 || scopeOf(reading, hit) !== 'claimed' || isAboutSubgroup(reading, hit))
      return [];
    const subject = subjectOf(reading, hit);
    if (subject === 'unknown') return [markAt(reading, hit, UNKNOWN)];
    if (!subject) return [];
    const { option } = subject;
    const judgements = releasesFor(reading, hit, [option]).map((release): Judged | null => {
      const other = rankedOptions(releases[release]!).find((one) => one !== option);
      const found = other ? leadOf(releases, release, option, other) : null;
      if (!found) return null;
      const base = { rule: 'plurality' as const, release, claim: found.claim };
      if ((found.estimatePp ?? 1) <= 0)
        return { ...base, grade: 'wrong', message: `${other} has no lower figure.` };
      if (found.verdict === 'holds') return null;
      const replacement = replacementOf(reading.lexicon.words, 'higherFigure');
      return {
        ...base,
        grade: 'not-supported',
        message: 'Being first is not shown by this poll.',
        replacement,
      };
    });
    return agreed(reading, hit, judgements, 'plurality');
  });
}

const UNKNOWN: Judged = {
  rule: 'plurality',
  grade: 'cannot-judge',
  message: 'A name here is in none of the releases given.',
};
