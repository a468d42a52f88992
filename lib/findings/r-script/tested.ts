import type { AskedInR } from './asked-in-r';
import type { FunctionName } from './functions';

/** What every tested finding's script needs beside its own question and second tests. */
export const TESTED_NEEDS: readonly FunctionName[] = [
  'isBelow',
  'criticalValue',
  'reasonsUntested',
  'twoSidedP',
  'holm',
  'rounding',
];

/**
 * The sections from the family to the verdict, for a finding that can be tested.
 *
 * @param asked the question of the finding
 * @param family calls of every question of its family, its own among them
 * @param place where in the family it is, from 0
 */
export function testedSections(
  asked: AskedInR,
  family: readonly AskedInR[],
  place: number,
): { title: string; code: string }[] {
  return [
    {
      title: 'Family: what the document asks of one kind is tested together (Holm)',
      code: familyCode(family, place),
    },
    { title: 'Estimate, standard error, interval, test', code: testCode(asked) },
    {
      title: 'Rounding allowance: each printed share hides an error within half a unit',
      code: ROUNDING_CODE,
    },
    { title: 'Second tests, at the level of this finding', code: secondCode(asked) },
    {
      title: 'Verdict: |estimate| against rounding r, and SE at the high design effects',
      code: VERDICT_CODE,
    },
    { title: 'Beside the verdict', code: [BESIDE_CODE, asked.littleChanged].filter(Boolean).join('\n\n') },
  ];
}

function familyCode(family: readonly AskedInR[], place: number): string {
  const calls = family.map(({ call }, index) => `  ${call}${index < family.length - 1 ? ',' : ''}`);
  return `family <- list(
${calls.join('\n')})
this <- ${place + 1}
finding <- family[[this]]

testable <- vapply(family, function(one) length(reasons_untested(one, policy)) == 0, logical(1))
stopifnot(testable[this])
tested <- family[testable]
family_p <- vapply(tested, function(one) two_sided_p(one$estimate_pp / 100, one$se("chosen"), one$df), numeric(1))
levels <- holm_levels(family_p, 1 - policy$level)
rank <- sum(testable[seq_len(this)])
own_alpha <- levels$alpha[rank]
p_adjusted <- p.adjust(family_p, "holm")[rank]
is_significant <- levels$significant[rank]`;
}

function testCode({ interval }: AskedInR): string {
  return `estimate_pp <- finding$estimate_pp
estimate <- estimate_pp / 100
se <- finding$se("chosen")
se_low <- finding$se("low")
se_high <- finding$se("high")

# Margin and interval at the desk's level, unadjusted for the family.
q <- critical_value(1 - policy$level, finding$df)
margin <- q * se
${interval}

# The test statistic; without variance there is none, but 0 for an estimate of 0.
z <- if (se > 0) estimate / se else if (estimate == 0) 0
p_value <- family_p[rank]
critical <- critical_value(own_alpha, finding$df)`;
}

const ROUNDING_CODE = 'rounding_pp <- rounding_allowance(finding$units_pp)';

function secondCode({ secondTests }: AskedInR): string {
  if (secondTests === '')
    return '# None applies to this kind of finding.\nsecond_tests <- list()\nagrees <- logical(0)';
  return `second_tests <- list()
${secondTests}

# A second test agrees when it is significant too, with the sign of the estimate.
agrees <- vapply(second_tests, function(test) {
  if (estimate_pp == 0) FALSE
  else if (is.null(test$interval)) test$p < own_alpha
  else if (estimate_pp > 0) test$interval[1] > 0
  else test$interval[2] < 0
}, logical(1))`;
}

const VERDICT_CODE = `basis <- vapply(finding$bases, function(base) base$basis, character(1))
size <- abs(estimate)
r <- rounding_pp / 100
survives_rounding <- size - r > critical * se
survives_design <- size > critical * se_high
survives_both <- size - r > critical * se_high

if (!is_significant) {
  verdict <- "does-not-hold"
  reasons <- c(
    if (p_value < 1 - policy$level) "family",
    if (p_value >= own_alpha && size > critical * se_low && all(basis == "sampling")) "would-hold-at-lower-deff")
} else {
  reasons <- c(
    if (!survives_rounding) "rounding",
    if (!survives_design) "design-effect",
    if (!all(agrees)) "second-test",
    if (survives_rounding && survives_design && !survives_both) "together",
    if (any(basis == "modelled")) "modelled",
    if (any(basis == "comparison")) "comparison")
  verdict <- if (length(reasons) == 0) "holds" else "fragile"
}`;

const BESIDE_CODE = `# How far the design effect could rise before the finding ceases to be significant: (z / c)^2 times.
breaking_factor <- if (!is.null(z)) (z / critical)^2

# The true difference that such polls would have found four times in five.
detectable_80_pp <- if (verdict == "does-not-hold" && se > 0) 100 * (critical + qnorm(0.8)) * se_high + rounding_pp

# Whether it would stand if total error were twice the sampling error.
survives_twice_error <- if (verdict == "holds") is.null(z) || abs(z) >= 2 * critical`;

/** The lines that print a tested finding, in the order of the answer's keys. */
export function testedOutput({ breaking, littleChanged }: AskedInR): string {
  return [
    'show("estimatePp", estimate_pp)',
    'show("sePp", 100 * se)',
    'show("marginPp", 100 * margin)',
    'show("intervalPp", 100 * interval)',
    'show("z", z)',
    'show("p", p_value)',
    'show("pAdjusted", p_adjusted)',
    'show("alpha", own_alpha)',
    'show("roundingPp", rounding_pp)',
    'show_list("secondTests", names(second_tests))',
    'for (name in names(second_tests)) {',
    '  test <- second_tests[[name]]',
    '  if (is.null(test$interval)) show(paste0("secondTests.", name, ".p"), test$p)',
    '  else show(paste0("secondTests.", name, ".intervalPp"), 100 * test$interval)',
    '  show(paste0("secondTests.", name, ".significant"), agrees[[name]])',
    '}',
    'show("verdict", verdict)',
    'show_list("reasons", reasons)',
    breaking === 'breakingDeff'
      ? 'show("breakingDeff", if (!is.null(breaking_factor)) finding$bases[[1]]$deff * breaking_factor)'
      : 'show("breakingFactor", breaking_factor)',
    'show("detectable80Pp", detectable_80_pp)',
    'show("survivesTwiceError", survives_twice_error)',
    ...(littleChanged === null ? [] : ['show("littleChanged", little_changed)']),
  ].join('\n');
}
