/** R functions for the questions that can be asked of printed shares, each with what its test needs. */

export const ROUNDING_UNITS = String.raw`
# Rounding units, in points, of the printed figures that make up a share.
rounding_units <- function(base, option) {
  if (is.null(base$rounding)) 10^-base$decimals else base$rounding[[match(option, base$options)]]
}
`;

export const QUESTION = String.raw`
# A question: its bases, its options, the estimate as a signed sum of printed shares in points, its standard error
# (proportions) with every base at the "chosen", "low" or "high" design effect, the smallest degrees of freedom
# among its bases, and the rounding unit of each printed figure in the estimate.
question <- function(bases, options, signs, base_of_share, se) {
  printed <- bases[base_of_share]
  named <- rep_len(options, length(signs))
  decimals <- vapply(printed, function(base) base$decimals, numeric(1))
  units <- mapply(share_units, printed, named)
  known_df <- unlist(lapply(bases, function(base) base$df))
  list(bases = bases, options = options,
       estimate_pp = sum(signs * units * 10^(max(decimals) - decimals)) / 10^max(decimals),
       se = se, df = if (length(known_df) > 0) min(known_df),
       units_pp = unlist(mapply(rounding_units, printed, named, SIMPLIFY = FALSE)))
}
deff_at <- function(base, end) switch(end, chosen = base$deff, low = base$deff_range[1], high = base$deff_range[2])
`;

export const LEAD_ERROR = String.raw`
# Multinomial standard error of a lead in one sample: sqrt(d * (a + b - (a - b)^2) / n).
lead_se <- function(base, first, second, end) {
  a <- proportion(base, first)
  b <- proportion(base, second)
  sqrt(deff_at(base, end) * max(0, a + b - (a - b)^2) / base$n)
}
`;

export const LEAD = String.raw`
# Lead of one option over another on one base.
lead <- function(base, first, second) {
  question(list(base), c(first, second), signs = c(1, -1), base_of_share = c(1, 1),
           se = function(end) lead_se(base, first, second, end))
}
`;

export const SHARE_ERROR = String.raw`
# Standard error of a share: sqrt(d * p * (1 - p) / n).
share_se <- function(base, p, end) sqrt(deff_at(base, end) * p * (1 - p) / base$n)
`;

export const CHANGE = String.raw`
# Change of a share between two independent samples; the variances add.
change <- function(earlier, later, option) {
  question(list(later, earlier), option, signs = c(1, -1), base_of_share = c(1, 2),
           se = function(end) sqrt(share_se(later, proportion(later, option), end)^2 +
                                   share_se(earlier, proportion(earlier, option), end)^2))
}
`;

export const LEAD_CHANGE = String.raw`
# Change of a lead between two independent samples; the variances add.
lead_change <- function(earlier, later, first, second) {
  question(list(later, earlier), c(first, second), signs = c(1, -1, -1, 1), base_of_share = c(1, 1, 2, 2),
           se = function(end) sqrt(lead_se(later, first, second, end)^2 + lead_se(earlier, first, second, end)^2))
}
`;

export const THRESHOLD = String.raw`
# A share against a fixed value p0; the standard error is the one at p0: sqrt(d * p0 * (1 - p0) / n).
threshold <- function(base, option, threshold_pct) {
  asked <- question(list(base), option, signs = 1, base_of_share = 1,
                    se = function(end) share_se(base, threshold_pct / 100, end))
  asked$estimate_pp <- asked$estimate_pp - threshold_pct
  asked
}
`;

export const REASONS_UNTESTED = String.raw`
# Why a question cannot be tested: every reason that applies; none where it can be.
reasons_untested <- function(asked, policy) {
  holds <- function(test) vapply(asked$bases, test, logical(1))
  places <- function(base) match(asked$options, base$options)
  is_random <- holds(function(base) base$sample_source == "probability")
  c(if (any(holds(function(base) is.null(base$n)))) "no-sample-size",
    if (any(!is_random & holds(function(base) is.null(base$modelled_interval)) & !policy$comparison_basis))
      "no-sampling-basis",
    if (any(holds(function(base) base$basis != "none" && is_below(base$n_eff, policy$minimum_n_eff)))) "too-small",
    if (any(holds(function(base) isTRUE(base$df < 8)))) "few-clusters",
    if (length(unique(is_random)) > 1 || any(holds(function(base) anyNA(places(base))))) "not-comparable",
    if (any(holds(function(base) any(is.na(base$pct[na.omit(places(base))]))))) "not-disclosed")
}
`;
