/** R functions about a base and its printed shares. */

export const IS_BELOW = String.raw`
# Decided limits (10, 50, a smallest size, halves): relative differences below 1e-9 count as equal.
nearly_equal <- function(a, b) a == b | abs(a - b) < 1e-9 * pmax(abs(a), abs(b))
is_below <- function(value, limit) value < limit & !nearly_equal(value, limit)
`;

export const CRITICAL_VALUE = String.raw`
# Two-sided critical value: normal, or Student's t where a variance came with degrees of freedom.
critical_value <- function(alpha, df) {
  if (is.null(df)) qnorm(alpha / 2, lower.tail = FALSE) else qt(alpha / 2, df, lower.tail = FALSE)
}
`;

export const SHARES = String.raw`
# A printed share: in whole units of its last decimal, so that equal figures differ by exactly 0, and as a proportion.
share_units <- function(base, option) {
  units <- base$pct[match(option, base$options)] * 10^base$decimals
  if (isTRUE(base$is_computed)) units else round(units)
}
proportion <- function(base, option) share_units(base, option) / (100 * 10^base$decimals)
`;

export const DESIGN_EFFECT = String.raw`
# Design effect that a margin m at level L implies, at m and at either end of its rounding:
# d = (m / (z_L * sqrt(0.25 / n)))^2. Kish (1965), Survey Sampling, defines d.
implied_deff <- function(stated, n) {
  z <- qnorm((1 - stated$level) / 2, lower.tail = FALSE)
  at <- function(pp) (pp / 100 / (z * sqrt(0.25 / n)))^2
  list(value = at(stated$pp), range = c(at(stated$pp - stated$unit / 2), at(stated$pp + stated$unit / 2)))
}

# The best source of a design effect that the release offers: given (from the design, from the weights, stated),
# implied by the stated margin, else what the desk assumes for the kind of design.
best_deff <- function(base, policy) {
  given <- base$given_deff
  if (!is.null(given)) {
    # A design effect from the weights alone omits clustering; its range is the desk's.
    factors <- if (given$source == "kish") policy$kish_range else c(1, 1)
    return(list(source = given$source, value = given$value, unraised = given$value,
                range = factors * given$value, df = given$df, notes = NULL))
  }
  notes <- NULL
  if (!is.null(base$stated_margin)) {
    implied <- implied_deff(base$stated_margin, base$n)
    if (base$design == "unweighted") {
      return(list(source = "implied", value = max(1, implied$value), unraised = implied$value,
                  range = pmax(1, implied$range), df = NULL, notes = NULL))
    }
    # A margin printed as 1/sqrt(n) cannot be told from one that ignores the weighting.
    if (is_below((2 / qnorm(0.975))^2, implied$range[1])) {
      return(list(source = "implied", value = implied$value, unraised = implied$value,
                  range = implied$range, df = NULL, notes = NULL))
    }
    notes <- "stated-margin-like-unweighted"
  }
  assumed <- policy$assumed[[base$design]]
  list(source = "assumed", value = assumed$value, unraised = assumed$value, range = assumed$range, df = NULL,
       notes = c(notes, "deff-assumed"))
}

# Half-width of a modelled interval of a sample that is not random, read as if at 50 percent; never below 1.
modelled_deff <- function(base) {
  implied <- implied_deff(base$modelled_interval, base$n)
  list(source = "implied", value = max(1, implied$value), unraised = implied$value,
       range = pmax(1, implied$range), df = NULL, notes = NULL)
}
`;

export const WITH_DESIGN_EFFECT = String.raw`
# What a margin could rest on: a random sample, a modelled interval, the desk's comparison basis, or nothing.
basis_of <- function(base, policy) {
  if (is.null(base$n)) "none"
  else if (base$sample_source == "probability") "sampling"
  else if (!is.null(base$modelled_interval)) "modelled"
  else if (policy$comparison_basis) "comparison"
  else "none"
}

# The base with its basis, design effect and range, effective size n / d, and the maximum margin
# q * sqrt(0.25 * d / n), which no share of the sample exceeds.
with_design_effect <- function(base, policy) {
  basis <- basis_of(base, policy)
  exceeds <- sum(share_units(base, base$options), na.rm = TRUE) > 100 * 10^base$decimals
  notes <- if (exceeds) "shares-exceed-100"
  if (basis == "none") return(c(base, list(basis = basis, notes = notes)))
  chosen <- if (basis == "modelled") modelled_deff(base) else best_deff(base, policy)
  notes <- c(notes, chosen$notes,
             if (chosen$unraised < 1) "deff-below-one",
             if (chosen$value > 4) "deff-above-four",
             if (basis == "modelled") "modelled-basis",
             if (basis == "comparison") "comparison-basis")
  q <- critical_value(1 - policy$level, chosen$df)
  c(base, list(basis = basis, deff = chosen$value, deff_source = chosen$source, deff_range = chosen$range,
               df = chosen$df, n_eff = base$n / chosen$value,
               maximum_margin = q * sqrt(0.25 * chosen$value / base$n), notes = notes))
}
`;

export const SHOW = String.raw`
# One line for each figure: name = value, numbers with 17 significant digits, an interval as .low and .high.
show <- function(name, value) {
  if (is.numeric(value) && length(value) == 2) {
    show(paste0(name, ".low"), value[1])
    show(paste0(name, ".high"), value[2])
    return(invisible())
  }
  text <- if (is.null(value) || all(is.na(value))) "null"
    else if (is.logical(value)) tolower(value)
    else if (is.numeric(value)) sprintf("%.17g", value)
    else value
  cat(name, " = ", text, "\n", sep = "")
}
show_list <- function(name, values) show(name, if (length(values) == 0) "none" else paste(values, collapse = ", "))
show_base <- function(name, base) {
  show(paste0(name, ".basis"), base[["basis"]])
  show(paste0(name, ".deff"), base[["deff"]])
  show(paste0(name, ".deffSource"), base[["deff_source"]])
  show(paste0(name, ".deffRange"), base[["deff_range"]])
  show(paste0(name, ".nEff"), base[["n_eff"]])
  show(paste0(name, ".maximumMarginPp"), if (base[["basis"]] != "none") 100 * base[["maximum_margin"]])
  show_list(paste0(name, ".notes"), base[["notes"]])
}
`;
