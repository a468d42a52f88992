import type { AssumedDeff, Base, GivenDeff, Policy, StatedInterval } from '../check-types';
import type { Section } from './assemble';
import type { FunctionName } from './functions';
import { rLogical, rNumber, rNumbers, rString, rStrings } from './r-literal';

/** What a script starts from, the functions that it calls for that, and the lines that print the bases. */
export type InputsInR = {
  sections: readonly Section[];
  needs: readonly FunctionName[];
  output: readonly string[];
};

export type Labels = ReadonlyMap<string, string>;

/** The name an option goes by in this script, as a string of R. */
export function rName(option: string, labels: Labels): string {
  return rString(labels.get(option) ?? option);
}

/**
 * The sections that every script begins with.
 *
 * @param printed code that holds the printed figures
 * @param made code that makes bases of them
 */
export function inputSections(
  policy: Policy,
  printed: readonly string[],
  made: readonly string[],
): Section[] {
  return [
    { title: 'Policy of the desk', code: writePolicy(policy) },
    {
      title: 'Printed figures, shares in percent; NULL and NA: not disclosed',
      code: printed.join('\n\n'),
    },
    { title: 'Design effect, effective size, maximum margin', code: made.join('\n') },
  ];
}

/** The policy as a list of R. */
function writePolicy(policy: Policy): string {
  const { weighted, clustered, unweighted } = policy.assumed;
  return [
    'policy <- list(',
    `  level = ${rNumber(policy.level)},`,
    '  assumed = list(',
    `    weighted = ${writeAssumed(weighted)},`,
    `    clustered = ${writeAssumed(clustered)},`,
    `    unweighted = ${writeAssumed(unweighted)}),`,
    `  kish_range = ${rNumbers(policy.kishRange)},`,
    `  comparison_basis = ${rLogical(policy.comparisonBasis)},`,
    `  indifference_pp = ${rNumber(policy.indifferencePp)},`,
    `  minimum_n_eff = ${rNumber(policy.minimumNEff)})`,
  ].join('\n');
}

/**
 * The printed figures of a base as a list of R. NULL and NA: not disclosed.
 *
 * @param name the variable that holds it
 * @param base a validated base
 * @param labels the names its options go by
 */
export function writeBase(name: string, base: Base, labels: Labels): string {
  return [
    `${name} <- list(`,
    `  sample_source = ${rString(base.sampleSource)},`,
    `  n = ${base.n === null ? 'NULL' : rNumber(base.n)},`,
    `  design = ${rString(base.design)},`,
    `  given_deff = ${writeDeff(base.deff)},`,
    `  stated_margin = ${writeStated(base.statedMargin)},`,
    `  modelled_interval = ${writeStated(base.modelledInterval)},`,
    `  decimals = ${rNumber(base.decimals)},`,
    `  options = ${rStrings(base.shares.map(({ option }) => labels.get(option) ?? option))},`,
    `  pct = ${rNumbers(base.shares.map(({ pct }) => pct))})`,
  ].join('\n');
}

function writeAssumed({ value, range }: AssumedDeff): string {
  return `list(value = ${rNumber(value)}, range = ${rNumbers(range)})`;
}

function writeDeff(deff: GivenDeff | null | undefined): string {
  if (!deff) return 'NULL';
  const df = deff.df === undefined ? 'NULL' : rNumber(deff.df);
  return `list(source = ${rString(deff.source)}, value = ${rNumber(deff.value)}, df = ${df})`;
}

function writeStated(stated: StatedInterval | null | undefined): string {
  if (!stated) return 'NULL';
  return `list(pp = ${rNumber(stated.pp)}, unit = ${rNumber(stated.unit)}, level = ${rNumber(stated.level)})`;
}
