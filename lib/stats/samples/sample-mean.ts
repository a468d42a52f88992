import type { Column } from './columns';
import { copyNumbers, refuse, sameLength } from './columns';
import { linearizedVariance } from './linearized-variance';
import type { ReplicateDesign } from './replicate-design';
import { replicateRank } from './replicate-rank';
import { replicateVariance } from './replicate-variance';
import { scratch } from './scratch';
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

/** A standard error this small beside the mean and the spread is what rounding leaves of 0. */
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

/** A copy of an outcome in the memory given, 0 outside the domain, where it is not looked at. */
export function readOutcome(
  fn: string,
  name: string,
  outcome: Column,
  domain: Uint8Array | null,
  isBinary: boolean,
  memory: Float64Array,
): Float64Array {
  sameLength(fn, name, outcome, memory.length);
  const values = copyNumbers(outcome, memory);
  for (let row = 0; row < values.length; row += 1) {
    const value = values[row] as number;
    if (value === 0 || value === 1) {
      if (domain !== null && domain[row] === 0) values[row] = 0;
    } else if (domain !== null && domain[row] === 0) {
      values[row] = 0;
    } else if (isBinary || !(Math.abs(value) <= LARGEST_VALUE)) {
      const given = String(outcome[row]);
      refuse(fn, `${isBinary ? '0 or 1' : 'a number'} as ${name}; ${name}[${row}] is ${given}`);
    }
  }
  return values;
}

/** The weighted mean of values from `readOutcome`, which are used up, with its variance. */
export function sampleMean(
  fn: string,
  design: SampleDesign,
  values: Float64Array,
  domain: Uint8Array | null,
): SampleMean {
  const { weights } = design;
  const { n, sumWeights, sumSquares, sumValues } = weightedTotals(weights, values, domain);
  const estimate = sumValues / sumWeights;
  const replicated =
    design.method === 'replicates' ? replicateVariance(fn, design, values, domain, estimate) : 0;
  const spread = intoParts(weights, values, domain, estimate, sumWeights);
  const variance =
    design.method === 'replicates' ? replicated : linearizedVariance(design, unitTotals(design, values));
  const isNothing = Math.sqrt(variance) <= NO_VARIANCE * (Math.abs(estimate) + Math.sqrt(spread));
  const se = isNothing ? 0 : Math.sqrt(variance);
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

/** How many respondents there are, Σw, Σw² and Σwy. */
function weightedTotals(weights: Float64Array, values: Float64Array, domain: Uint8Array | null) {
  let n = 0;
  let sumWeights = 0;
  let sumSquares = 0;
  let sumValues = 0;
  for (let row = 0; row < weights.length; row += 1) {
    if (domain !== null && domain[row] === 0) continue;
    const weight = weights[row] as number;
    n += 1;
    sumWeights += weight;
    sumSquares += weight * weight;
    sumValues += weight * (values[row] as number);
  }
  return { n, sumWeights, sumSquares, sumValues };
}

/** Puts wᵢ(yᵢ − mean)/Σw in the place of each value; gives Σ wᵢ(yᵢ − mean)²/Σw. */
function intoParts(
  weights: Float64Array,
  values: Float64Array,
  domain: Uint8Array | null,
  estimate: number,
  sumWeights: number,
): number {
  let spread = 0;
  for (let row = 0; row < values.length; row += 1) {
    if (domain !== null && domain[row] === 0) continue;
    const deviation = (values[row] as number) - estimate;
    const part = ((weights[row] as number) * deviation) / sumWeights;
    spread += part * deviation;
    values[row] = part;
  }
  return spread;
}

function unitTotals(design: SurveyDesign, parts: Float64Array): Float64Array {
  const { psuOfRow, stratumOfPsu } = design;
  if (psuOfRow === null) return parts;
  const totals = scratch(design, 'totals', stratumOfPsu.length).fill(0);
  for (let row = 0; row < parts.length; row += 1) {
    const psu = psuOfRow[row] as number;
    totals[psu] = (totals[psu] as number) + (parts[row] as number);
  }
  return totals;
}

/** Degrees of freedom counted in the domain: its units less its strata, or the rank of its replicates less 1. */
function domainDf(design: SampleDesign, domain: Uint8Array): number {
  if (design.method === 'replicates') {
    return design.dfStated ? design.df : replicateRank(design.matrix, design.replicates, domain) - 1;
  }
  const { psuOfRow, stratumOfPsu, psusInStratum } = design;
  const psus = new Uint8Array(stratumOfPsu.length);
  const strata = new Uint8Array(psusInStratum.length);
  let df = 0;
  for (let row = 0; row < domain.length; row += 1) {
    if (domain[row] === 0) continue;
    const psu = psuOfRow === null ? row : (psuOfRow[row] as number);
    const stratum = stratumOfPsu[psu] as number;
    if (psus[psu] === 0) df += 1;
    if (strata[stratum] === 0) df -= 1;
    psus[psu] = 1;
    strata[stratum] = 1;
  }
  return df;
}
