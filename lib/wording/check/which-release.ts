import type { Hit } from './phrases';
import type { Reading } from './reading';

/**
 * The releases that a phrase may be about: those of the pollster named in its sentence, else of the one named last
 * before, else all that have these options.
 */
export function releasesFor(reading: Reading, { from }: Hit, options: readonly string[] = []): number[] {
  const all = reading.input.releases.map((_, index) => index);
  const having = all.filter((index) =>
    options.every((option) =>
      reading.input.releases[index]?.facts.shares.some((share) => share.option === option),
    ),
  );
  if (having.length < 2) return having;
  const sentence = reading.sentenceAt(from);
  const pollsters = reading.mentions.filter(({ kind, to }) => kind === 'pollster' && to <= sentence.to);
  const nearest =
    pollsters.findLast((one) => one.from < from) ?? pollsters.find((one) => one.from >= sentence.from);
  const ofPollster = having.filter(
    (index) => reading.input.releases[index]?.facts.pollster.name === nearest?.name,
  );
  return ofPollster.length > 0 ? ofPollster : having;
}

/** The same, but where a sentence names several pollsters what it says may be of any of them. */
export function releasesNamed(reading: Reading, hit: Hit, options: readonly string[] = []): number[] {
  const { from, to } = reading.sentenceAt(hit.from);
  const named = reading.mentions.filter((one) => one.kind === 'pollster' && one.from >= from && one.to <= to);
  if (new Set(named.map(({ name }) => name)).size < 2) return releasesFor(reading, hit, options);
  return reading.input.releases.map((_, index) => index);
}
