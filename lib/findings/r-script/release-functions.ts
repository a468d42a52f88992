/** R functions for what a whole release asks beyond a check: blocs, re-based shares, subgroups, tracking waves. */

export const PEOPLE_LEFT = String.raw`
# Shares without the don't-knows stand on the people left in, with the design effect of everyone asked. Where that
# number is not disclosed they have no margin.
on_people_left <- function(base, n) {
  base$lacks_people <- is.null(n)
  if (is.null(n) || base$basis == "none") {
    base$basis <- "none"
    base[c("deff", "deff_source", "deff_range", "df", "n_eff")] <- list(NULL)
    return(base)
  }
  base$maximum_margin <- base$maximum_margin * sqrt(base$n / n)
  base$n <- n
  base$n_eff <- n / base$deff
  base
}
`;

export const WITH_SHARE = String.raw`
# One more share on a base, with the rounding units of the printed figures that it is made of.
with_share <- function(base, name, pct, units_pp) {
  own <- if (is.null(base$rounding)) rep(list(10^-base$decimals), length(base$options)) else base$rounding
  base$rounding <- c(own, list(units_pp))
  base$options <- c(base$options, name)
  base$pct <- c(base$pct, pct)
  base
}
`;

export const SUMMED_BLOC = String.raw`
# A bloc summed from printed shares carries the rounding of each; one with an option that the base lacks is lacking.
with_summed_bloc <- function(base, name, of) {
  if (anyNA(match(of, base$options))) return(base)
  units_pp <- unlist(lapply(of, function(option) rounding_units(base, option)))
  with_share(base, name, sum(share_units(base, of)) / 10^base$decimals, units_pp)
}
`;

export const PRINTED_BLOC = String.raw`
# A bloc whose figure tables give has its own rounding.
with_printed_bloc <- function(base, name, pct, decimals) {
  base <- with_share(base, name, pct, 10^-decimals)
  base$decimals <- max(base$decimals, decimals)
  base
}
`;

export const STATED_REASONS = String.raw`
# Reasons against a test that lie in the question and not in the figures: differences between two releases, people
# asked twice, waves not known, a rule that counts another base.
with_stated <- function(asked, reasons) {
  asked$stated <- reasons
  asked
}
`;

export const RELEASE_REASONS = String.raw`
# All reasons of a release's question, in order: from its figures, from the people left in, stated, and from the
# presentation standard for small bases.
reasons_from_figures <- reasons_untested
reasons_untested <- function(asked, policy) {
  lacks_people <- vapply(asked$bases, function(base) isTRUE(base$lacks_people), logical(1))
  suppressed <- vapply(asked$presentations, function(one) isTRUE(one$outcome == "suppress"), logical(1))
  found <- c(reasons_from_figures(asked, policy), asked$stated,
             if (any(lacks_people)) "rebased-size", if (any(suppressed)) "below-presentation-standard")
  in_order <- c("no-sample-size", "no-sampling-basis", "too-small", "few-clusters", "not-comparable",
                "not-disclosed", "shared-waves", "same-people", "rebased-size", "other-base",
                "below-presentation-standard")
  in_order[in_order %in% found]
}
`;

export const TRACKING = String.raw`
# Change between two tracking averages of as many waves, of a share or a lead: what both hold cancels.
# V = sum over waves of (weight in the later - weight in the earlier)^2 * d * v / n, v = p * (1 - p), for a lead
# a + b - (a - b)^2, with the larger d of the two averages. Interviews not known: as many in every wave of an
# average. Shares of single waves not known: every wave at the share pooled over both averages by their people.
tracking_change <- function(earlier, later, options, overlap) {
  wave <- seq_len(2 * overlap$window - overlap$shared)
  in_earlier <- wave <= overlap$window
  in_later <- wave > overlap$window - overlap$shared

  variance_without_d <- function() {
    if (is.null(overlap$interviews)) {
      interviews <- ifelse(in_earlier, earlier$n, later$n) / overlap$window
      weight <- rep(1, length(wave))
    } else {
      # An average may stand on fewer people than were asked.
      asked <- sum(overlap$interviews[in_earlier]) + sum(overlap$interviews[in_later])
      interviews <- overlap$interviews * (earlier$n + later$n) / asked
      weight <- interviews
    }
    moved <- weight * in_later / sum(weight[in_later]) - weight * in_earlier / sum(weight[in_earlier])
    places <- match(options, overlap$options)
    shares <- lapply(seq_along(options), function(i) {
      if (!anyNA(places)) return(overlap$pct[[places[i]]] / 100)
      both <- earlier$n * proportion(earlier, options[i]) + later$n * proportion(later, options[i])
      rep(both / (earlier$n + later$n), length(wave))
    })
    v <- if (length(options) == 1) shares[[1]] * (1 - shares[[1]])
      else pmax(0, shares[[1]] + shares[[2]] - (shares[[1]] - shares[[2]])^2)
    sum(moved^2 * v / interviews)
  }

  signs <- if (length(options) == 1) c(1, -1) else c(1, -1, -1, 1)
  question(list(later, earlier), options, signs, rep(c(1, 2), each = length(options)), se = function(end) {
    sqrt(max(deff_at(earlier, end), deff_at(later, end)) * variance_without_d())
  })
}
`;

export const REST = String.raw`
# The rest of a sample without one group of it, which is never independent of the total:
# p_rest = (p_total - w * p_group) / (1 - w), w the group's weighted share of the sample, on the people left and
# the total's design effect. gap = (p_group - p_total) / (1 - w), so that each printed figure's rounding counts
# 1 / (1 - w) times, once.
rest_of_sample <- function(total, group, option, weight_pct) {
  w <- weight_pct / 100
  people <- if (!is.null(total$n) && !is.null(group$n)) total$n - group$n
  rest <- on_people_left(total, people)
  rest["n"] <- list(people)
  rest$lacks_people <- FALSE
  rest$is_computed <- TRUE
  rest$options <- if (anyNA(c(match(option, total$options), match(option, group$options)))) character(0) else option
  share <- (proportion(total, option) - w * proportion(group, option)) / (1 - w)
  rest$pct <- 100 * if (isTRUE(nearly_equal(1 + share, 1))) 0 else if (isTRUE(nearly_equal(share, 1))) 1 else share
  rest$rounding <- list(rounding_units(total, option) / (1 - w))
  rest
}
with_stretched_rounding <- function(group, option, weight_pct) {
  units_pp <- rounding_units(group, option) / (1 - weight_pct / 100)
  group$rounding <- lapply(group$options, function(one) if (one == option) units_pp else 10^-group$decimals)
  group
}
`;

export const GAP = String.raw`
# Gap between two groups of one question that have nobody in common: as a change, each its own n and d.
gap <- function(group, against, option) {
  asked <- change(against, group, option)
  asked$presentations <- lapply(list(group, against), function(base) {
    p <- proportion(base, option)
    if (base$basis != "none" && isTRUE(p >= 0)) presentation_of(base, p, 0.95)
  })
  asked
}
`;

export const PRESENTATION = String.raw`
# Whether a share of a small base may be shown: Parker et al. (2017), Vital and Health Statistics 2(175), on the
# interval of Korn and Graubard (1998), Survey Methodology 24, 193-201.
presentation_of <- function(base, p, level) {
  shrink <- if (is.null(base$df) || base$n < 2) 1
    else (critical_value(1 - level, base$n - 1) / critical_value(1 - level, base$df))^2
  m <- min(base$n, base$n_eff * shrink)
  tail <- (1 - level) / 2
  interval <- c(if (p == 0) 0 else qbeta(tail, m * p, m * (1 - p) + 1),
                if (p == 1) 1 else qbeta(tail, m * p + 1, m * (1 - p), lower.tail = FALSE))
  width <- interval[2] - interval[1]
  too_wide_for <- function(share) share > 0 && is_below(0.05, width) && is_below(1.3, width / share)
  against <- c(if (base$n < 30 || is_below(m, 30)) "fewer-than-30",
               if (!is_below(width, 0.3)) "interval-too-wide",
               if (too_wide_for(p)) "relative-width")
  doubts <- c(if (p == 0 || p == 1) "no-events", if (isTRUE(base$df < 8)) "few-clusters")
  outcome <- if (length(against) > 0) "suppress" else if (length(doubts) > 0) "review" else "show"
  list(outcome = outcome, reasons = c(against, doubts), interval = interval, nEffUsed = m, width = width,
       relativeWidth = if (p > 0) width / p, relativeWidthOfRest = if (p < 1) width / (1 - p),
       restUnreliable = outcome != "suppress" && too_wide_for(1 - p))
}
`;

export const SHOW_PRESENTATION = String.raw`
show_presentation <- function(name, found) {
  if (is.null(found)) return(show(name, NULL))
  for (key in c("outcome", "reasons", "interval", "nEffUsed", "width", "relativeWidth", "relativeWidthOfRest",
                "restUnreliable")) {
    if (key == "reasons") show_list(paste0(name, ".reasons"), found$reasons)
    else show(paste0(name, ".", key), found[[key]])
  }
}
`;
