import { markAt, type Judged } from '../marks';
import { fold } from '../fold';
import type { Reading } from '../reading';
import type { WordingMark } from '../types';
import { isAboutPoll, subgroupsIn } from './about';

/**
 * Subgroups: no figure of a part of the sample below the presentation standard, and none that the release does not
 * give. BBC Editorial Guidelines, section 10, and NCPP, from memory.
 */
export function markSubgroups(reading: Reading): WordingMark[] {
  const { releases } = reading.input;
  if (releases.length === 0) return [];
  return reading.sentences.flatMap((sentence) =>
    subgroupsIn(reading, sentence)
      .filter((hit) => isAboutPoll(reading, hit))
      .flatMap((hit) => {
        const phrase = reading.folded.text.slice(
          reading.tokens[hit.from]?.from,
          reading.tokens[hit.to - 1]?.to,
        );
        const known = releases
          .flatMap(({ subgroups }) => subgroups)
          .find(({ name }) => phrase.includes(fold(name).text));
        if (!known) return [markAt(reading, hit, UNKNOWN)];
        return known.isBelowStandard ? [markAt(reading, hit, BELOW)] : [];
      }),
  );
}

const UNKNOWN: Judged = {
  rule: 'subgroup',
  grade: 'cannot-judge',
  message: 'No figures of this part of the sample are given.',
};
const BELOW: Judged = {
  rule: 'subgroup',
  grade: 'not-supported',
  message: 'Too few of this part of the sample were asked for a figure of its own.',
};
