import { fold } from './fold';
import { houseMarks } from './house-marks';
import { lexiconOf } from './lexicon/compiled';
import { settleMarks } from './marks';
import { readText, type Reading } from './reading';
import { markByEye } from './rules/by-eye';
import { markChanges } from './rules/change';
import { markForecasts, markProofs } from './rules/claims-of-polls';
import { markDates } from './rules/date';
import { markFigures } from './rules/figure';
import { markLeads } from './rules/lead';
import { markLevels } from './rules/level';
import { markMajorities } from './rules/majority';
import { markMargins } from './rules/margin';
import { markMissing } from './rules/missing';
import { markNoChanges } from './rules/no-change';
import { markPercentForPoints } from './rules/percent-points';
import { markPluralities } from './rules/plurality';
import { markPopulations } from './rules/population';
import { markRecords } from './rules/record';
import { markSignificance } from './rules/significance';
import { markSubgroups } from './rules/subgroup';
import { markThresholds } from './rules/threshold';
import type { WordingCheck, WordingCheckInput, WordingMark } from './types';

/** The longest text that is read, in UTF-16 units: some ten newspaper pages. */
export const MAX_TEXT = 20_000;

const RULES: readonly ((reading: Reading) => WordingMark[])[] = [
  markLeads,
  markLevels,
  markChanges,
  markNoChanges,
  markMajorities,
  markPluralities,
  markThresholds,
  markForecasts,
  markProofs,
  markRecords,
  markFigures,
  markDates,
  markPercentForPoints,
  markMargins,
  markSubgroups,
  markPopulations,
  markMissing,
  markByEye,
  markSignificance,
];

/**
 * Every phrase about a poll that says more than the figures given, with what may be said in its place.
 *
 * Use it on any text a desk is about to print. It reads phrases, names and numbers, not meaning: no mark means only
 * that no rule objects, and what it cannot judge it says. It never marks what the desk's own drafting writes.
 *
 * @param input the text, its language, the releases it is about (none: only rules that need no figures), the desk's
 *   style and policy; make releases with checkedReleaseOf
 * @returns marks in the order of the text; a mark of a whole text stands at its start with no length
 * @throws RangeError `checkWording requires a text of at most 20000 characters`
 * @example
 * checkWording({ text: 'A statistical tie', language: 'en', releases: [], houseStyle, policy }).marks[0].rule
 *   // => 'level'
 */
export function checkWording(input: WordingCheckInput): WordingCheck {
  if (input.text.length > MAX_TEXT) {
    throw new RangeError(`checkWording requires a text of at most ${MAX_TEXT} characters`);
  }
  const house = houseMarks(input);
  const lexicon = lexiconOf(input.language);
  if (!lexicon) return { marks: settleMarks(house), cannotJudge: [NO_RULES] };
  const reading = readText(input, lexicon);
  const marks = RULES.flatMap((rule) => rule(reading)).filter((mark) => !isQuestion(input, mark));
  const taste = house.filter((mark) => !marks.some((graver) => isFactOf(graver, mark)));
  return { marks: settleMarks([...marks, ...taste]), cannotJudge: unjudged(input) };
}

const NO_RULES = 'There are no rules for this language yet: only house style was looked at.';

/** Percent that should be points is a fault; how it is printed is then beside the matter. */
function isFactOf({ rule, start, end }: WordingMark, taste: WordingMark): boolean {
  return rule === 'percent-points' && taste.rule === 'house-print' && start < taste.end && taste.start < end;
}

/** Words of the question that a release asked, in quotation marks, are quoted for what they are. */
function isQuestion({ text, releases }: WordingCheckInput, { quoted, start, end }: WordingMark): boolean {
  if (!quoted) return false;
  const around = fold(text.slice(Math.max(0, start - 20), Math.min(text.length, end + 20))).text;
  const phrase = fold(text.slice(start, end)).text;
  return releases.some(({ facts: { questionWording } }) => {
    if (questionWording.status !== 'given') return false;
    const question = fold(questionWording.value).text.replace(/\s+/g, ' ');
    const at = question.indexOf(phrase);
    const before = question.slice(Math.max(0, at - 8), at + phrase.length);
    return at >= 0 && around.replace(/\s+/g, ' ').includes(before);
  });
}

function unjudged({ releases }: WordingCheckInput): string[] {
  return releases.length === 0
    ? ['No release is given: leads, changes, names, figures and dates were not judged.']
    : [];
}
