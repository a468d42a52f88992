/** R functions of tests, intervals, families and rounding. */

export const TWO_SIDED_P = String.raw`
# Two-sided p of an estimate: normal, or Student's t where a variance came with degrees of freedom. Without
# variance 1 for an estimate of 0, else 0.
two_sided_p <- function(estimate, se, df) {
  if (se == 0) return(if (estimate == 0) 1 else 0)
  statistic <- abs(estimate / se)
  if (is.null(df)) 2 * pnorm(statistic, lower.tail = FALSE) else 2 * pt(statistic, df, lower.tail = FALSE)
}
`;

export const WILSON = String.raw`
# Score interval of a share on an effective size. Wilson (1927), JASA 22, 209-212.
wilson_interval <- function(p, n_eff, q) {
  centre <- (p + q^2 / (2 * n_eff)) / (1 + q^2 / n_eff)
  half <- q / (1 + q^2 / n_eff) * sqrt(p * (1 - p) / n_eff + q^2 / (4 * n_eff^2))
  c(if (p == 0) 0 else max(0, centre - half), if (p == 1) 1 else min(1, centre + half))
}
`;

export const SHARE_INTERVAL = String.raw`
# Interval of a share: the score interval; the exact one of Clopper and Pearson (1934), Biometrika 26, 404-413,
# from beta quantiles, where either side has fewer than ten effective counts.
share_method <- function(p, n_eff) {
  if (is_below(n_eff * p, 10) || is_below(n_eff * (1 - p), 10)) "clopper-pearson" else "wilson"
}
share_interval <- function(p, base, level) {
  if (share_method(p, base$n_eff) == "wilson") {
    return(wilson_interval(p, base$n_eff, critical_value(1 - level, base$df)))
  }
  x <- p * base$n_eff
  others <- (1 - p) * base$n_eff
  tail <- (1 - level) / 2
  c(if (p == 0) 0 else qbeta(tail, x, others + 1),
    if (p == 1) 1 else qbeta(tail, x + 1, others, lower.tail = FALSE))
}
`;

export const HOLM = String.raw`
# Holm (1979), Scandinavian Journal of Statistics 6, 65-70: the k-th smallest of m p-values is tested at
# alpha / (m - k + 1) and is significant when it and all smaller ones are below theirs. p-values that differ by
# less than 1e-9 relatively, or are both below 1e-300, keep their order.
holm_levels <- function(p, alpha) {
  m <- length(p)
  ascending <- order(p)
  sorted <- p[ascending]
  is_new <- !(nearly_equal(sorted[-1], sorted[-m]) | (sorted[-1] < 1e-300 & sorted[-m] < 1e-300))
  ranked <- ascending[order(cumsum(c(TRUE, is_new)), ascending)]
  own_alpha <- alpha / (m - seq_len(m) + 1)
  significant <- cumprod(p[ranked] < own_alpha) == 1
  data.frame(alpha = own_alpha, significant = significant)[order(ranked), ]
}
`;

export const ROUNDING = String.raw`
# Distribution of a sum of independent errors, each uniform on 0 to its own width: the exact convolution. With x
# written as one fraction t of the sum of all widths, it is the mean over the errors of the distribution without
# that error, taken at x with weight t and at x less its width with weight 1 - t; no digits cancel.
# de Boor and Hollig (1982), Journal d'Analyse Mathematique 42, 99-115 (recurrence of box splines, from memory).
sum_of_uniforms_cdf <- function(x, widths) {
  width <- unique(widths)
  known <- new.env()
  below <- function(left, shifted) {
    from <- x - sum(shifted * width)
    reach <- sum(left * width)
    if (from <= 0) return(0)
    if (from >= reach) return(1)
    key <- paste(c(left, shifted), collapse = " ")
    if (is.null(known[[key]])) {
      t <- from / reach
      without <- function(i) {
        one <- seq_along(width) == i
        left[i] * (t * below(left - one, shifted) + (1 - t) * below(left - one, shifted + one))
      }
      known[[key]] <- sum(vapply(which(left > 0), without, numeric(1))) / sum(left)
    }
    known[[key]]
  }
  below(tabulate(match(widths, width)), rep(0, length(width)))
}

# Half-width that holds 95 percent of the summed rounding errors, each within half a unit of its printed share.
rounding_allowance <- function(units) {
  middle <- sum(units) / 2
  excess <- function(half_width) sum_of_uniforms_cdf(middle + half_width, units) - 0.975
  uniroot(excess, c(0, middle), tol = 1e-15 * middle, maxiter = 1000)$root
}
`;

export const SIGN_TEST = String.raw`
# Exact sign test on effective counts G >= S, which need not be whole: min(1, 2 * I_0.5(G, S + 1)), in R the
# distribution of a beta variable; twice the binomial tail for whole counts.
exact_sign_p <- function(first, second) {
  larger <- max(first, second)
  if (larger == 0) 1 else min(1, 2 * pbeta(0.5, larger, min(first, second) + 1))
}
`;

export const FISHER = String.raw`
# Fisher's exact test of two whole-number tables: all tables whose probability is at most 1 + 1e-7 times that of
# the observed one (the rule of R's fisher.test).
fisher_p <- function(hits_1, others_1, hits_2, others_2) {
  hits <- hits_1 + hits_2
  tables <- max(0, hits - hits_2 - others_2):min(hits, hits_1 + others_1)
  probability <- dhyper(tables, hits_1 + others_1, hits_2 + others_2, hits)
  observed <- dhyper(hits_1, hits_1 + others_1, hits_2 + others_2, hits)
  min(1, sum(probability[probability <= observed * (1 + 1e-7)]))
}

# Effective counts rounded to whole ones, halves upwards; what is nearly a half counts as one.
round_half_up <- function(count) floor(count) + ifelse(is_below(count, floor(count) + 0.5), 0, 1)
`;

export const BINOMIAL_TEST = String.raw`
# Exact test of an effective count x of m, which need not be whole, against p0: twice the smaller tail, the tails
# of the binomial written as beta distributions; the tail that holds every outcome is 1.
exact_binomial_p <- function(x, m, p0) {
  upper <- if (x == 0) 1 else pbeta(p0, x, m - x + 1)
  lower <- if (x == m) 1 else pbeta(1 - p0, m - x, x + 1)
  min(1, 2 * min(upper, lower))
}
`;

export const NEWCOMBE = String.raw`
# Hybrid score interval of p2 - p1. Newcombe (1998), Statistics in Medicine 17, 873-890, method 10.
newcombe_interval <- function(p1, n_eff_1, p2, n_eff_2, z) {
  first <- wilson_interval(p1, n_eff_1, z)
  second <- wilson_interval(p2, n_eff_2, z)
  p2 - p1 + c(-sqrt((p2 - second[1])^2 + (first[2] - p1)^2), sqrt((second[2] - p2)^2 + (p1 - first[1])^2))
}
`;
