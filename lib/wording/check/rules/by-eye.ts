import { markAt } from '../marks';
import type { Reading } from '../reading';
import type { WordingMark } from '../types';
import { isAboutPoll } from './about';

/** Figures of two pollsters set against each other without a test: BBC Editorial Guidelines, section 10, from memory. */
export function markByEye(reading: Reading): WordingMark[] {
  const comparing = [...reading.cues('comparatives'), ...reading.cues('compare')];
  const moving = ['up', 'down', 'leadUp', 'leadDown', 'dramatic'] as const;
  return reading.sentences.flatMap((sentence) => {
    const within = ({ from, to }: { from: number; to: number }) => from >= sentence.from && to <= sentence.to;
    const pollsters = new Set(
      reading.mentions.filter((one) => one.kind === 'pollster' && within(one)).map(({ name }) => name),
    );
    if (pollsters.size < 2 || moving.some((group) => reading.has(group, sentence))) return [];
    if (isTheComparison(reading, pollsters)) return [];
    const [hit] = comparing.filter(within);
    if (!hit || !isAboutPoll(reading, hit)) return [];
    return [
      markAt(reading, hit, {
        rule: 'by-eye',
        grade: 'not-supported',
        message: 'Two pollsters’ figures are compared by eye: their difference was not tested.',
      }),
    ];
  });
}

/** The two pollsters of a release and the one it is compared with: judged as a change where it is said to be one. */
function isTheComparison({ input }: Reading, pollsters: ReadonlySet<string>): boolean {
  return input.releases.some(({ facts, previous }) =>
    [...pollsters].every((name) => name === facts.pollster.name || name === previous?.pollster.name),
  );
}
