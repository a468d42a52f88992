import type { SurveyDesign } from './survey-design';

/**
 * The variance of a sum from the sums of its sampling units, stratum by stratum.
 *
 * V = Σₕ (1 − nₕ/Nₕ) nₕ/(nₕ − 1) Σ (t − mean)² over the units of a stratum; a unit without respondents in the
 * domain is a unit with 0. Strata with one unit follow the design's convention.
 *
 * @param design the sample
 * @param totals one a unit, in the order of the design
 * @see R 4.2.2, survey 4.1.1 `svyrecvar`
 */
export function linearizedVariance(design: SurveyDesign, totals: Float64Array): number {
  const { stratumOfPsu, psusInStratum, correction, lonelyPsu } = design;
  const strata = psusInStratum.length;
  const means = new Float64Array(strata);
  for (let psu = 0; psu < totals.length; psu += 1) {
    const stratum = stratumOfPsu[psu] as number;
    means[stratum] = (means[stratum] as number) + (totals[psu] as number);
  }
  const grandMean = means.reduce((sum, total) => sum + total, 0) / totals.length;
  for (let stratum = 0; stratum < strata; stratum += 1) {
    const units = psusInStratum[stratum] as number;
    means[stratum] = units === 1 && lonelyPsu === 'adjust' ? grandMean : (means[stratum] as number) / units;
  }

  const squares = new Float64Array(strata);
  for (let psu = 0; psu < totals.length; psu += 1) {
    const stratum = stratumOfPsu[psu] as number;
    const deviation = (totals[psu] as number) - (means[stratum] as number);
    squares[stratum] = (squares[stratum] as number) + deviation * deviation;
  }

  let variance = 0;
  let lonely = 0;
  for (let stratum = 0; stratum < strata; stratum += 1) {
    const units = psusInStratum[stratum] as number;
    const share = correction[stratum] as number;
    if (units === 1 && share !== 0) lonely += 1;
    variance += share * (units === 1 ? 1 : units / (units - 1)) * (squares[stratum] as number);
  }
  return lonelyPsu === 'average' ? (variance * strata) / (strata - lonely) : variance;
}
