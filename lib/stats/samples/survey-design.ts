import type { Column, Labels } from './columns';
import { readLabels, readWeights, refuse, sameLength } from './columns';

/** What a stratum with a single unit adds to the variance. */
export type LonelyPsu = 'fail' | 'remove' | 'average' | 'adjust';

export type SurveyColumns = {
  readonly weights: Column;
  readonly stratum?: Labels;
  readonly psu?: Labels;
  readonly populationSize?: Column;
  readonly nest?: boolean;
  readonly lonelyPsu?: LonelyPsu;
};

/** A sample whose variance is linearized; made by `surveyDesign`, not to be changed. */
export type SurveyDesign = {
  readonly method: 'linearized';
  readonly rows: number;
  readonly weights: Float64Array;
  /** For each respondent the number of the primary sampling unit; null where every respondent is one. */
  readonly psuOfRow: Int32Array | null;
  readonly stratumOfPsu: Int32Array;
  readonly psusInStratum: Int32Array;
  /** For each stratum 1 − units in the sample / units in the population; 1 where no size is stated. */
  readonly correction: Float64Array;
  /** Degrees of freedom: units less strata. */
  readonly df: number;
  /** The convention in use; null where no stratum needs one. */
  readonly lonelyPsu: Exclude<LonelyPsu, 'fail'> | null;
};

const FN = 'surveyDesign';
const CONVENTIONS: readonly LonelyPsu[] = ['fail', 'remove', 'average', 'adjust'];

/**
 * How a sample was drawn, checked and indexed once, for every estimate that is made on it.
 *
 * Use it for respondent files with weights and, where known, strata and primary sampling units. Without `psu`
 * every respondent is a unit, without `stratum` there is one stratum. Where the file brings replicate weights
 * use `replicateDesign`. A weight of 0 is refused: such a row was not interviewed or not kept, so leave it out
 * (`kishDesignEffect` counts it). Cost: one pass over the columns; all of them are copied.
 *
 * @param columns.weights one a respondent, 1e-100 to 1e100; their scale changes nothing but their sum
 * @param columns.stratum labels of the strata
 * @param columns.psu labels of the primary sampling units (clusters)
 * @param columns.populationSize number of units in the population of the respondent's stratum, the same for all
 *   of the stratum, at least the units in the sample: applies the finite population correction. A stratum
 *   that is a census of its units adds nothing and cannot be lonely
 * @param columns.nest true where units are numbered anew in each stratum; by default a unit may be in one only
 * @param columns.lonelyPsu a stratum with a single unit is refused (`fail`, the default), adds nothing
 *   (`remove`), counts as the average of the others (`average`), or is centred at the mean of all units (`adjust`)
 * @throws RangeError `surveyDesign requires at least one respondent`
 * @throws RangeError `surveyDesign requires weights from 1e-100 to 1e+100; weights[<row>] is <weight>`
 * @throws RangeError `surveyDesign requires <name> for each of the <rows> respondents; <length> are given`
 * @throws RangeError `surveyDesign requires a <name> for every respondent; <name>[<row>] is missing`
 * @throws RangeError `surveyDesign requires units inside one stratum, or nest; psu "<unit>" is in strata "<a>"
 *   and "<b>"`
 * @throws RangeError `surveyDesign requires lonelyPsu 'fail', 'remove', 'average' or 'adjust'`
 * @throws RangeError `surveyDesign requires two units or more in a stratum, or a lonelyPsu convention; stratum
 *   "<stratum>" has one`
 * @throws RangeError `surveyDesign requires two units or more in some stratum`
 * @throws RangeError `surveyDesign requires one populationSize in a stratum, at least its <units> units; stratum
 *   "<stratum>" has <size> in populationSize[<row>]`
 * @see R 4.2.2, survey 4.1.1 `svydesign(ids, strata, weights, fpc, nest)`, `options(survey.lonely.psu)`
 * @example
 * surveyDesign({ weights: [1, 2, 1, 1], psu: ['a', 'a', 'b', 'c'] }).df; // => 2
 * surveyDesign({ weights: [1, 2, 1, 1], stratum: ['n', 'n', 's', 's'] }).df; // => 2
 */
export function surveyDesign(columns: SurveyColumns): SurveyDesign {
  const weights = readWeights(FN, columns.weights);
  const rows = weights.length;
  const strata = stratumOfRows(columns.stratum, rows);
  const { psuOfRow, stratumOfPsu } = unitsOfRows(columns, strata, rows);

  const psusInStratum = new Int32Array(strata.names.length);
  for (const stratum of stratumOfPsu) psusInStratum[stratum] = (psusInStratum[stratum] ?? 0) + 1;
  const correction = corrections(columns.populationSize, strata, psusInStratum);
  return Object.freeze({
    method: 'linearized' as const,
    rows,
    weights,
    psuOfRow,
    stratumOfPsu,
    psusInStratum,
    correction,
    df: stratumOfPsu.length - psusInStratum.length,
    lonelyPsu: conventionInUse(columns.lonelyPsu ?? 'fail', strata.names, psusInStratum, correction),
  });
}

type Units = Pick<SurveyDesign, 'psuOfRow' | 'stratumOfPsu'>;
type Strata = { indices: Int32Array; names: readonly (string | number)[] };

function stratumOfRows(stratum: Labels | undefined, rows: number): Strata {
  if (!stratum) return { indices: new Int32Array(rows), names: ['the whole sample'] };
  sameLength(FN, 'stratum', stratum, rows);
  return readLabels(FN, 'stratum', stratum);
}

function unitsOfRows({ psu, nest = false }: SurveyColumns, strata: Strata, rows: number): Units {
  if (!psu)
    return { psuOfRow: Int32Array.from({ length: rows }, (_, row) => row), stratumOfPsu: strata.indices };
  sameLength(FN, 'psu', psu, rows);
  const units = readLabels(FN, 'psu', psu);
  return nest ? nestedUnits(units, strata) : wholeUnits(units, strata);
}

/** Units that are numbered through the whole sample: none may lie in two strata. */
function wholeUnits(units: Strata, strata: Strata): Units {
  const stratumOfPsu = new Int32Array(units.names.length).fill(-1);
  units.indices.forEach((unit, row) => {
    const stratum = strata.indices[row] ?? 0;
    const known = stratumOfPsu[unit] ?? 0;
    if (known >= 0 && known !== stratum) {
      const [name, first, second] = [units.names[unit], strata.names[known], strata.names[stratum]];
      refuse(FN, `units inside one stratum, or nest; psu "${name}" is in strata "${first}" and "${second}"`);
    }
    stratumOfPsu[unit] = stratum;
  });
  return { psuOfRow: units.indices, stratumOfPsu };
}

/** Units that are numbered anew in each stratum: a pair of stratum and number is one unit. */
function nestedUnits(units: Strata, strata: Strata): Units {
  const known = new Map<number, number>();
  const stratumOfPsu: number[] = [];
  const psuOfRow = units.indices.map((unit, row) => {
    const stratum = strata.indices[row] ?? 0;
    const pair = stratum * units.names.length + unit;
    const psu = known.get(pair);
    if (psu !== undefined) return psu;
    known.set(pair, stratumOfPsu.length);
    return stratumOfPsu.push(stratum) - 1;
  });
  return { psuOfRow, stratumOfPsu: Int32Array.from(stratumOfPsu) };
}

function corrections(
  populationSize: Column | undefined,
  strata: Strata,
  psusInStratum: Int32Array,
): Float64Array {
  const correction = new Float64Array(psusInStratum.length).fill(1);
  if (!populationSize) return correction;
  sameLength(FN, 'populationSize', populationSize, strata.indices.length);
  const sizes = new Float64Array(psusInStratum.length);
  strata.indices.forEach((stratum, row) => {
    const size = populationSize[row] ?? Number.NaN;
    const units = psusInStratum[stratum] ?? 0;
    const earlier = sizes[stratum] || size;
    if (!(size >= units && Number.isFinite(size) && size === earlier)) {
      const condition = `one populationSize in a stratum, at least its ${units} units`;
      refuse(FN, `${condition}; stratum "${strata.names[stratum]}" has ${size} in populationSize[${row}]`);
    }
    sizes[stratum] = size;
    correction[stratum] = (size - units) / size;
  });
  return correction;
}

function conventionInUse(
  asked: LonelyPsu,
  names: readonly (string | number)[],
  psusInStratum: Int32Array,
  correction: Float64Array,
): SurveyDesign['lonelyPsu'] {
  if (!CONVENTIONS.includes(asked)) refuse(FN, "lonelyPsu 'fail', 'remove', 'average' or 'adjust'");
  const lonely = psusInStratum.findIndex((units, stratum) => units === 1 && correction[stratum] !== 0);
  if (lonely < 0) return null;
  if (asked === 'fail') {
    const condition = 'two units or more in a stratum, or a lonelyPsu convention';
    refuse(FN, `${condition}; stratum "${names[lonely]}" has one`);
  }
  if (psusInStratum.every((units) => units === 1)) refuse(FN, 'two units or more in some stratum');
  return asked;
}
