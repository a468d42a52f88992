import type { Hit } from '../phrases';
import type { Reading } from '../reading';

/** Whether the sentence of a phrase speaks of a poll at all: a word of the trade, a name of a release, a percentage. */
export function isAboutPoll(reading: Reading, { from }: Hit): boolean {
  const sentence = reading.sentenceAt(from);
  if (reading.has('poll', sentence)) return true;
  const isShare = reading.quantities.some(
    ({ from: at, to, unit }) =>
      at >= sentence.from && to <= sentence.to && (unit === 'percent' || unit === 'points'),
  );
  if (isShare) return true;
  return reading.mentions.some((one) => one.from >= sentence.from && one.to <= sentence.to);
}

/** Whether the sentence has a word of the trade, a number or a time: a name alone does not make a claim about a poll. */
export function isOfTrade(reading: Reading, { from }: Hit): boolean {
  const sentence = reading.sentenceAt(from);
  return (
    reading.has('poll', sentence) ||
    reading.has('periodWords', sentence) ||
    reading.quantities.some((one) => one.from >= sentence.from && one.to <= sentence.to) ||
    reading.dates.some((one) => one.from >= sentence.from && one.to <= sentence.to) ||
    reading.mentions.some(
      (one) => one.kind === 'pollster' && one.from >= sentence.from && one.to <= sentence.to,
    )
  );
}

/** Whether the sentence is about a part of the sample, which figures of the whole say nothing about. */
export function isAboutSubgroup(reading: Reading, { from }: Hit): boolean {
  const sentence = reading.sentenceAt(from);
  return subgroupsIn(reading, sentence).length > 0;
}

/** Subgroups named in a stretch: "young voters", "among islanders". */
export function subgroupsIn(reading: Reading, { from, to }: Hit): Hit[] {
  const named = reading.cues('subgroup').filter((hit) => hit.from >= from && hit.to <= to);
  const among = reading
    .cues('amongst')
    .filter((hit) => hit.from >= from && hit.to <= to && isPart(reading, hit));
  return [
    ...among.map((hit) => ({ from: hit.from, to: Math.min(to, endOfGroup(reading, hit)) })),
    ...named,
  ].filter(
    (hit, index, all) =>
      !all.some((other, place) => place < index && other.from <= hit.from && hit.to <= other.to),
  );
}

/** "Among the 1,012 asked", "among likely voters", "among several comparisons" are no parts. */
function isPart(reading: Reading, { to }: Hit): boolean {
  if (reading.quantityAt(to) || reading.mentionAt(to) || reading.mentionAt(to + 1)) return false;
  if (reading.has('subgroup', { from: to, to: to + 2 })) return true;
  return !reading.cueAt('wholeSample', to) && reading.tokens[to]?.kind === 'word';
}

function endOfGroup(reading: Reading, { to }: Hit): number {
  const group = reading.cueAt('subgroup', to) ?? reading.cueAt('subgroup', to + 1);
  if (group) return group.to;
  return reading.cueAt('voters', to + 1)?.to ?? to + 1;
}
