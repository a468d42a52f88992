import type { Column } from './columns';
import { refuse, sameLength } from './columns';
import { linearizedVariance } from './linearized-variance';
import type { ReplicateDesign } from './replicate-design';
import { replicateRank } from './replicate-rank';
import { replicateVariance } from './replicate-variance';
import type { LonelyPsu, SurveyDesign } from './survey-design';

/** A sample as it was drawn, or as its replicate weights describe it. */
export type SampleDesign = SurveyDesign | ReplicateDesign;

/** Which respondents an estimate is about: 1 or true for those in the domain, 0 or false for the rest. */
export type Domain = ArrayLike<number | boolean>;

/** Whom an estimate is about, and how sure its intervals are. */
export type EstimateOptions = {
  /** Confidence level, inside 0–1. */
  readonly level: number;
  /** Everyone where it is left out. */
  readonly domain?: Domain;
};

/** How an estimate was made. */
export type EstimateMethod = {
  readonly method: SampleDesign['method'];
  /** What strata with one unit add; null where there are none. */
  readonly lonelyPsu: Exclude<LonelyPsu, 'fail'> | null;
};

/** What every estimate on a sample rests on. */
export type SampleMean = EstimateMethod & {
  readonly n: number;
  readonly sumWeights: number;
  readonly estimate: number;
  /** Standard error; 0 where the sample shows no variance. */
  readonly se: number;
  readonly df: number;
  /** Variance over that of a simple random sample of n with replacement; null where either is 0. */
  readonly deff: number | null;
  /** n·Σw²/(Σw)² of the respondents in the domain. */
  readonly kishDeff: number;
};

/** A standard error this small beside the values themselves is what rounding leaves of 0. */
const NO_VARIANCE = 1e-12;
const LARGEST_VALUE = 1e100;

export function inDomain(fn: string, design: SampleDesign, domain: Domain | undefined): Uint8Array | null {
  if (domain === undefined) return null;
  sameLength(fn, 'domain', domain, design.rows);
  const mask = new Uint8Array(design.rows);
  for (let row = 0; row < design.rows; row += 1) {
    const inside = domain[row];
    if (inside === true || inside === 1) mask[row] = 1;
    else if (inside !== false && inside !== 0) refuse(fn, `a domain of 0 and 1; domain[${row}] is ${inside}`);
  }
  const members = mask.reduce((sum, inside) => sum + inside, 0);
  if (members === 0) refuse(fn, 'a respondent in the domain');
  return members === design.rows ? null : mask;
}

/** The values of an outcome, 0 outside the domain, where they are not looked at. */
export function readOutcome(
  fn: string,
  name: string,
  outcome: Column,
  domain: Uint8Array | null,
  isBinary: boolean,
  rows: number,
): Float64Array {
  sameLength(fn, name, outcome, rows);
  const values = new Float64Array(rows);
  for (let row = 0; row < rows; row += 1) {
    if (domain !== null && domain[row] === 0) continue;
    const value = outcome[row] ?? Number.NaN;
    const usable = isBinary ? value === 0 || value === 1 : Math.abs(value) <= LARGEST_VALUE;
    if (!usable) refuse(fn, `${isBinary ? '0 or 1' : 'a number'} as ${name}; ${name}[${row}] is ${value}`);
    values[row] = value;
  }
  return values;
}

/** The weighted mean of values already read, with its variance. */
export function sampleMean(
  fn: string,
  design: SampleDesign,
  values: Float64Array,
  domain: Uint8Array | null,
): SampleMean {
  const { weights } = design;
  let n = 0;
  let sumWeights = 0;
  let sumSquares = 0;
  let sumValues = 0;
  let largest = 0;
  for (let row = 0; row < design.rows; row += 1) {
    if (domain !== null && domain[row] === 0) continue;
    const weight = weights[row] as number;
    const value = values[row] as number;
    n += 1;
    sumWeights += weight;
    sumSquares += weight * weight;
    sumValues += weight * value;
    if (value > largest) largest = value;
    else if (-value > largest) largest = -value;
  }
  const estimate = sumValues / sumWeights;
  const { totals, spread } = unitTotals(design, values, domain, estimate, sumWeights);
  const variance =
    design.method === 'linearized'
      ? linearizedVariance(design, totals)
      : replicateVariance(fn, design, values, domain, estimate);
  const se = Math.sqrt(variance) <= NO_VARIANCE * largest ? 0 : Math.sqrt(variance);
  return {
    method: design.method,
    lonelyPsu: design.method === 'linearized' ? design.lonelyPsu : null,
    n,
    sumWeights,
    estimate,
    se,
    df: domain === null ? design.df : domainDf(design, domain),
    deff: se > 0 && n > 1 && spread > 0 ? (variance * (n - 1)) / spread : null,
    kishDeff: (n * sumSquares) / (sumWeights * sumWeights),
  };
}

/** Σ of wᵢ(yᵢ − mean)/Σw by sampling unit, and Σ of wᵢ(yᵢ − mean)²/Σw. */
function unitTotals(
  design: SampleDesign,
  values: Float64Array,
  domain: Uint8Array | null,
  estimate: number,
  sumWeights: number,
): { totals: Float64Array; spread: number } {
  const { weights } = design;
  const isLinearized = design.method === 'linearized';
  const totals = new Float64Array(isLinearized ? design.stratumOfPsu.length : 0);
  let spread = 0;
  for (let row = 0; row < design.rows; row += 1) {
    if (domain !== null && domain[row] === 0) continue;
    const deviation = (values[row] as number) - estimate;
    const part = ((weights[row] as number) * deviation) / sumWeights;
    spread += part * deviation;
    if (!isLinearized) continue;
    const psu = design.psuOfRow[row] as number;
    totals[psu] = (totals[psu] as number) + part;
  }
  return { totals, spread };
}

/** Degrees of freedom counted in the domain: its units less its strata, or the rank of its replicates less 1. */
function domainDf(design: SampleDesign, domain: Uint8Array): number {
  if (design.method === 'replicates') {
    return design.dfStated ? design.df : replicateRank(design.matrix, design.replicates, domain) - 1;
  }
  const psus = new Uint8Array(design.stratumOfPsu.length);
  domain.forEach((inside, row) => {
    if (inside === 1) psus[design.psuOfRow[row] as number] = 1;
  });
  const strata = new Set(design.stratumOfPsu.filter((_, psu) => psus[psu] === 1));
  return psus.reduce((sum, used) => sum + used, 0) - strata.size;
}
