import { printMarks } from './house-print';
import { houseTextOf, type HouseText, markOn, placesOf } from './house-text';
import { onePollMarks } from './one-poll';
import type { WordingCheckInput, WordingMark } from './types';

/**
 * What the desk decided about its words, held against a text: phrases it bans or prefers, how it prints percent and
 * points, headlines that rest on one poll.
 *
 * It needs no rules of the language, and never says more than "house style".
 */
export function houseMarks(input: WordingCheckInput): WordingMark[] {
  const text = houseTextOf(input);
  return [...phraseMarks(text), ...printMarks(text), ...onePollMarks(input)];
}

function phraseMarks(text: HouseText): WordingMark[] {
  const { houseStyle, language } = text.input;
  const banned = houseStyle.banned[language].map((phrase) => ({ phrase, say: null }));
  const preferred = houseStyle.preferred[language].map(({ say, insteadOf }) => ({ phrase: insteadOf, say }));
  return [...preferred, ...banned]
    .flatMap(({ phrase, say }) =>
      placesOf(phrase, text.folded.text).map((place) => {
        const message =
          say === null ? 'This desk does not use this phrase.' : `This desk says “${say}” instead.`;
        return markOn(text, place, { rule: 'house-phrase', message, replacement: say });
      }),
    )
    .filter((mark) => mark !== null);
}
