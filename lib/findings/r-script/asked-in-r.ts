import type { Pair } from '../check-types';
import type { FunctionName } from './functions';
import { rName, type Labels } from './inputs';
import { rNumber } from './r-literal';

/** How a tested or untested question is asked in R. */
export type AskedInR = {
  /** The finding in words, safe inside a comment. */
  words: string;
  /** The call that makes the question. */
  call: string;
  /** The interval at the two-sided quantile q of the policy's level. */
  interval: string;
  /** Code that fills `second_tests`; empty where there are none. */
  secondTests: string;
  /** Code that sets `little_changed`; null where that is not asked. */
  littleChanged: string | null;
  breaking: 'breakingDeff' | 'breakingFactor';
  needs: readonly FunctionName[];
  secondNeeds: readonly FunctionName[];
  /** What only some findings of a whole release have beside their test. */
  further?: FurtherInR;
};

/** Code that a finding has beyond its test, and the lines that print what it computes. */
export type FurtherInR = {
  /** Printed whatever the verdict. */
  output?: string;
  /** Computed and printed only where the finding cannot be tested. */
  untested?: string;
  untestedOutput?: string;
};

/** The variables that hold a later and an earlier base, or a group and what it is held against. */
export type TwoVariables = { later: string; earlier: string };

export const SYMMETRIC = 'interval <- estimate + c(-1, 1) * margin';

/** A lead, or a net score, on the base in `release`. */
export function leadInR(pair: Pair, labels: Labels, what = 'lead'): AskedInR {
  const [first, second] = [rName(pair[0], labels), rName(pair[1], labels)];
  return {
    words: `${what} of ${first} over ${second}, one sample`,
    call: `lead(release, ${first}, ${second})`,
    interval: SYMMETRIC,
    secondTests: leadTests(first, second),
    littleChanged: null,
    breaking: 'breakingDeff',
    needs: ['lead'],
    secondNeeds: ['exactSign'],
  };
}

function leadTests(first: string, second: string): string {
  return `a <- proportion(release, ${first})
b <- proportion(release, ${second})

# Score test: the variance as if the two were level, sqrt(d * (a + b) / n).
se_level <- sqrt(release$deff * (a + b) / release$n)
second_tests$score <- list(p = two_sided_p(estimate, se_level, finding$df))

# Exact sign test where the two have fewer than 50 effective counts together.
if (is_below(release$n_eff * (a + b), 50)) {
  second_tests[["exact-sign"]] <- list(p = exact_sign_p(release$n_eff * a, release$n_eff * b))
}`;
}

/** The difference of one option's share between two independent bases. */
export function changeInR(option: string, { later, earlier }: TwoVariables, labels: Labels): AskedInR {
  const name = rName(option, labels);
  return {
    words: `change of ${name} between two samples`,
    call: `change(${earlier}, ${later}, ${name})`,
    interval: SYMMETRIC,
    secondTests: changeTests(name, { later, earlier }),
    littleChanged: null,
    breaking: 'breakingFactor',
    needs: ['change'],
    secondNeeds: ['newcombe', 'fisher'],
  };
}

/** Whether a change that is not shown is shown to be small. */
export function littleChangedInR(option: string, labels: Labels): string {
  return `# Little changed: two one-sided tests against the smaller of the margin of indifference and a fifth of the earlier
# share, with rounding and the high design effects allowed for; only where no change is shown.
one_sided <- critical_value(2 * (1 - policy$level), finding$df)
reach <- abs(estimate_pp) + rounding_pp + 100 * one_sided * se_high
fifth_pp <- 100 * proportion(previous, ${rName(option, labels)}) / 5
little_changed <- verdict == "does-not-hold" && reach < min(policy$indifference_pp, fifth_pp)`;
}

function changeTests(name: string, { later, earlier }: TwoVariables): string {
  return `p1 <- proportion(${earlier}, ${name})
p2 <- proportion(${later}, ${name})
m1 <- ${earlier}$n_eff
m2 <- ${later}$n_eff

# Pooled test: the variance as if both samples had one share, on effective counts.
pooled <- (m1 * p1 + m2 * p2) / (m1 + m2)
se_pooled <- sqrt(max(0, pooled * (1 - pooled)) * (1 / m1 + 1 / m2))
second_tests$pooled <- list(p = two_sided_p(estimate, se_pooled, finding$df))

# Hybrid score interval at this test's own level; it agrees where it excludes 0.
second_tests$newcombe <- list(interval = newcombe_interval(p1, m1, p2, m2, critical_value(own_alpha, NULL)))

# Fisher's exact test where any effective count is below ten.
counts <- c(m1 * p1, m1 * (1 - p1), m2 * p2, m2 * (1 - p2))
if (any(is_below(counts, 10))) {
  whole <- round_half_up(counts)
  second_tests$fisher <- list(p = fisher_p(whole[1], whole[2], whole[3], whole[4]))
}`;
}

/** The change of a lead, or of a net score, between the bases in `previous` and `release`. */
export function leadChangeInR(pair: Pair, labels: Labels, what = 'lead'): AskedInR {
  const [first, second] = [rName(pair[0], labels), rName(pair[1], labels)];
  return {
    words: `change of the ${what} of ${first} over ${second} between two samples`,
    call: `lead_change(previous, release, ${first}, ${second})`,
    interval: SYMMETRIC,
    secondTests: '',
    littleChanged: null,
    breaking: 'breakingFactor',
    needs: ['leadChange'],
    secondNeeds: [],
  };
}

/** A share of the base in `release` against a fixed value in percent. */
export function thresholdInR(option: string, thresholdPct: number, labels: Labels): AskedInR {
  const name = rName(option, labels);
  const pct = rNumber(thresholdPct);
  return {
    words: `${name} against ${pct} percent`,
    call: `threshold(release, ${name}, ${pct})`,
    interval: `# The interval is the share's own, less the threshold.
p <- proportion(release, ${name})
p0 <- ${pct} / 100
interval <- share_interval(p, release, policy$level) - p0`,
    secondTests: `# Exact test where any of the four effective counts is below ten.
m <- release$n_eff
if (any(is_below(m * c(p0, 1 - p0, p, 1 - p), 10))) {
  second_tests[["exact-binomial"]] <- list(p = exact_binomial_p(min(m * p, m), m, p0))
}`,
    littleChanged: null,
    breaking: 'breakingDeff',
    needs: ['threshold'],
    secondNeeds: ['exactBinomial', 'shareInterval'],
  };
}
