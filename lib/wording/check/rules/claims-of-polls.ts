import { markAt, replacementOf } from '../marks';
import type { Hit } from '../phrases';
import type { Reading } from '../reading';
import { isDeniedAfter, scopeOf } from '../scope';
import type { WordingMark } from '../types';

/** A poll measures opinion at its time and forecasts nothing: BBC Editorial Guidelines, section 10, from memory. */
export function markForecasts(reading: Reading): WordingMark[] {
  return reading
    .cues('forecast')
    .filter((hit) => !isDeniedOrAsked(reading, hit))
    .map((hit) =>
      markAt(reading, hit, {
        rule: 'forecast',
        grade: 'not-supported',
        message: 'A poll measures opinion at the time of its interviews; it is no forecast.',
        replacement: null,
      }),
    );
}

/** Polls suggest; they prove, confirm and show nothing: BBC Editorial Guidelines, section 10, from memory. */
export function markProofs(reading: Reading): WordingMark[] {
  const replacement = replacementOf(reading.lexicon.words, 'suggests');
  const proofs = reading
    .cues('proof')
    .filter((hit) => isSaidOfPoll(reading, hit, true) && !isDeniedOrAsked(reading, hit));
  const shows = reading
    .cues('shows')
    .filter((hit) => isSaidOfPoll(reading, hit, false) && !isDeniedOrAsked(reading, hit));
  return [
    ...proofs.map((hit) =>
      markAt(reading, hit, {
        rule: 'proof',
        grade: 'not-supported',
        message: 'A poll proves nothing; it suggests.',
        replacement,
      }),
    ),
    ...shows.map((hit) =>
      markAt(reading, hit, {
        rule: 'proof',
        grade: 'house-style',
        message: 'A poll suggests or indicates.',
        replacement,
      }),
    ),
  ];
}

function isDeniedOrAsked(reading: Reading, hit: Hit): boolean {
  const sentence = reading.sentenceAt(hit.from);
  let at = hit.from - 1;
  for (; at >= sentence.from && !reading.cueAt('clauseBreaks', at); at -= 1) {
    if (reading.cueAt('negators', at)) return true;
  }
  if (isDeniedAfter(reading, hit)) return true;
  return (
    scopeOf(reading, hit) === 'open' && !reading.has('conditionals', { from: sentence.from, to: hit.from })
  );
}

const REACH = 7;
/** Whether a poll stands before the verb as what does it; for proof any poll in the sentence will do. */
function isSaidOfPoll(reading: Reading, hit: Hit, anywhere: boolean): boolean {
  const sentence = reading.sentenceAt(hit.from);
  const from = anywhere ? sentence.from : Math.max(sentence.from, hit.from - REACH);
  const to = anywhere ? sentence.to : hit.from;
  for (let at = from; at < to; at += 1) {
    if (reading.cueAt('pollAsSubject', at) || reading.mentionAt(at)?.kind === 'pollster') return true;
  }
  return false;
}
