import type { WordingGrade, WordingMark, WordingRule } from '@/lib/wording/check/types';

export const GRADE_NAMES: Record<WordingGrade, string> = {
  wrong: 'Wrong',
  'not-supported': 'Not supported',
  'house-style': 'House style',
  'cannot-judge': 'Cannot judge',
};

export const RULE_NAMES: Record<WordingRule, string> = {
  lead: 'Who leads',
  level: 'Ties',
  change: 'Gains and losses',
  'no-change': 'No change',
  majority: 'Majorities and fractions',
  plurality: 'The largest share',
  threshold: 'Thresholds',
  forecast: 'Forecasts',
  proof: 'What polls can show',
  record: 'Records',
  figure: 'Figures',
  date: 'Dates',
  'percent-points': 'Percent and points',
  margin: 'Margins of error',
  'margin-basis': 'Margins without a random sample',
  'not-comparable': 'Comparisons',
  subgroup: 'Subgroups',
  population: 'Who was asked',
  missing: 'What is missing',
  'by-eye': 'Compared by eye',
  significance: 'Significance',
  'house-phrase': 'Phrases of this desk',
  'house-print': 'How this desk prints',
  'one-poll': 'Headlines on one poll',
};

/** "2 wrong, 1 not supported": in the order of gravity, grades without a mark left out. */
export function countWords(marks: readonly WordingMark[]): string {
  const grades = Object.keys(GRADE_NAMES) as WordingGrade[];
  return grades
    .flatMap((grade) => {
      const count = marks.filter((mark) => mark.grade === grade).length;
      return count === 0 ? [] : [`${count} ${GRADE_NAMES[grade].toLowerCase()}`];
    })
    .join(', ');
}

/** A mark of no length is about the text as a whole. */
export function isOfWhole({ start, end }: Pick<WordingMark, 'start' | 'end'>): boolean {
  return start === end;
}
