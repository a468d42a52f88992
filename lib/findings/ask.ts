import type { Pair, Policy, Threshold } from './check-types';
import type { BaseFigures } from './base-figures';
import { measureChange, type SampledBase } from './measure-change';
import { measureLead } from './measure-lead';
import { measureLeadChange } from './measure-lead-change';
import { measureThreshold } from './measure-threshold';
import { sumOfShares, type Measured, type Term } from './measured';
import type { Question } from './settle';
import { untestedReasons } from './untested';

/** The question of a lead on one base. */
export function askLead(base: BaseFigures, pair: Pair, policy: Policy): Question {
  const terms: Term[] = leadTerms(base, pair, 1);
  return question([base], pair, terms, policy, ([only]) => measureLead(only.base, only.sampled, pair));
}

/** The question of a share's change between two bases. */
export function askChange(
  earlier: BaseFigures,
  later: BaseFigures,
  option: string,
  policy: Policy,
): Question {
  const terms: Term[] = [
    { base: later, option, sign: 1 },
    { base: earlier, option, sign: -1 },
  ];
  return question([later, earlier], [option], terms, policy, ([late, early = late]) =>
    measureChange(early, late, option),
  );
}

/** The question of a lead's change between two bases. */
export function askLeadChange(
  earlier: BaseFigures,
  later: BaseFigures,
  pair: Pair,
  policy: Policy,
): Question {
  const terms: Term[] = [...leadTerms(later, pair, 1), ...leadTerms(earlier, pair, -1)];
  return question([later, earlier], pair, terms, policy, ([late, early = late]) =>
    measureLeadChange(early, late, pair),
  );
}

/** The question of a share against a fixed value. */
export function askThreshold(base: BaseFigures, threshold: Threshold, policy: Policy): Question {
  const { option, pct } = threshold;
  const asked = question([base], [option], [{ base, option, sign: 1 }], policy, ([only]) =>
    measureThreshold(only.base, only.sampled, threshold, policy.level),
  );
  return { ...asked, estimatePp: asked.estimatePp === null ? null : asked.estimatePp - pct };
}

/** The printed shares of a lead; with the sign −1 those of a lead taken away. */
function leadTerms(base: BaseFigures, [first, second]: Pair, sign: 1 | -1): Term[] {
  return [
    { base, option: first, sign },
    { base, option: second, sign: sign === 1 ? -1 : 1 },
  ];
}

/** A base together with its sampled part; null on a base without any. */
export function sampledBase(base: BaseFigures): SampledBase | null {
  return base.sampled && { base, sampled: base.sampled };
}

/** A question on one base, or on a later and an earlier one, with what stands against testing it. */
export function question(
  bases: readonly BaseFigures[],
  options: readonly string[],
  terms: readonly Term[],
  policy: Policy,
  measure: (sampled: readonly [SampledBase, SampledBase?]) => Measured,
): Question {
  const reasons = untestedReasons(bases, options, policy);
  const isDisclosed = terms.every(({ base, option }) => typeof base.units.get(option) === 'number');
  const estimatePp = isDisclosed ? sumOfShares(terms) : null;
  const [first, second] = bases.map(sampledBase);
  const measured = reasons.length === 0 && first ? measure([first, second ?? undefined]) : null;
  return { terms, bases, reasons, estimatePp, measured };
}
