import type { Labels } from './columns';
import { refuse } from './columns';

/**
 * A column of 0 and 1 that says which respondents gave an answer, or belong to a group.
 *
 * Use it to make outcomes and domains out of a column of labels.
 *
 * @param labels one a respondent; none missing
 * @param label the answer or group asked about; it may be one that nobody gave
 * @returns 1 where the label is the one asked about, 0 elsewhere
 * @throws RangeError `indicator requires a label for every respondent; labels[<row>] is missing`
 * @example
 * Array.from(indicator(['A', 'B', 'A'], 'A')); // => [1, 0, 1]
 */
export function indicator(labels: Labels, label: string | number): Uint8Array {
  const column = new Uint8Array(labels.length);
  for (let row = 0; row < labels.length; row += 1) {
    const own = labels[row];
    if (own === undefined || own === null || own === '' || Number.isNaN(own)) {
      refuse('indicator', `a label for every respondent; labels[${row}] is missing`);
    }
    if (own === label) column[row] = 1;
  }
  return column;
}
