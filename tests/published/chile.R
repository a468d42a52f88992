#!/usr/bin/env Rscript
# chile.json: the Chilean plebiscite survey of 1988 (data/Chile.csv), weighted so that the ten cells of region and sex
# count alike. Units are the places of a region, told apart by their population; region SA has a single one, so each
# convention for a stratum with one unit is shown. Usage: Rscript chile.R > chile.json
suppressPackageStartupMessages({ library(survey); library(jsonlite) })
me <- sub("--file=", "", grep("--file=", commandArgs(FALSE), value = TRUE))
all <- read.csv(file.path(dirname(me), "data", "Chile.csv"), na.strings = c("NA", ""))
d <- all[!is.na(all$vote), ]
cell <- paste(d$region, d$sex)
d$w <- nrow(d) / (10 * as.vector(table(cell)[cell]))
d$no <- as.integer(d$vote == "N"); d$yes <- as.integer(d$vote == "Y"); d$lead <- d$no - d$yes
d$place <- paste(d$region, d$population)
designs <- list(weights = svydesign(~1, weights = ~w, data = d), stratified = svydesign(~1, strata = ~region, weights = ~w, data = d),
  clustered = svydesign(~place, weights = ~w, data = d), stratified_clustered = svydesign(~place, strata = ~region, weights = ~w, data = d))
one <- function(s) {
  share <- function(f) { m <- svymean(f, s, deff = "replace"); p <- coef(m)[[1]]; v <- as.vector(vcov(m))
    list(estimate = p, se = sqrt(v), deff = deff(m)[[1]], effective_n = p * (1 - p) / v, mean_t = as.numeric(confint(m, level = .95, df = degf(s))),
      logit_t = as.numeric(attr(svyciprop(f, s, method = "xlogit"), "ci")), beta = as.numeric(attr(svyciprop(f, s, method = "beta"), "ci"))) }
  lead <- svymean(~lead, s)
  list(n = nrow(s), df = degf(s), N = share(~no), Y = share(~yes), lead = list(estimate = coef(lead)[[1]], se = as.vector(SE(lead))))
}
out <- lapply(designs[1:3], one)
for (lonely in c("remove", "average", "adjust")) { options(survey.lonely.psu = lonely); out[[paste0("stratified_clustered_", lonely)]] <- one(designs$stratified_clustered) }
out$kish_deff <- nrow(d) * sum(d$w^2) / sum(d$w)^2
out$women <- one(subset(designs$clustered, sex == "F"))
cat(toJSON(out, digits = I(17), auto_unbox = TRUE, pretty = TRUE), "\n", sep = "")
