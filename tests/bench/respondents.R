# Times and figures of svymean on a respondent file, by weights and by replicate weights. Arguments: a folder with
# respondents.csv (answer, weight) and replicates.bin (doubles, one respondent after another); number of replicates.
suppressPackageStartupMessages(library(survey))
folder <- commandArgs(TRUE)[1]
replicates <- as.integer(commandArgs(TRUE)[2])
rows <- read.csv(file.path(folder, "respondents.csv"))
weights <- matrix(
  readBin(file.path(folder, "replicates.bin"), "double", n = nrow(rows) * replicates, endian = "little"),
  nrow = nrow(rows), byrow = TRUE
)
# Processor time, which other work on the machine does not lengthen.
fastest_seconds <- function(f, batches) {
  f()
  min(replicate(batches, sum(system.time(f())[1:2])))
}
design <- function() svydesign(ids = ~1, weights = ~weight, data = rows)
by_weights <- design()
by_replicates <- svrepdesign(
  data = rows, repweights = weights, weights = rows$weight, type = "bootstrap", combined.weights = TRUE,
  scale = 1 / replicates, rscales = 1, mse = TRUE, degf = replicates - 1
)
linear <- function() svymean(~answer, by_weights)
replicate_mean <- function() svymean(~answer, by_replicates)
answer <- function(name, mean) data.frame(name = name, estimate = coef(mean)[[1]], se = SE(mean)[[1]])
write.csv(
  format(rbind(answer("weights", linear()), answer("replicates", replicate_mean())), digits = 17),
  file.path(folder, "answers.csv"), row.names = FALSE, quote = FALSE
)
write.csv(
  format(data.frame(
    name = c("design", "weights", "replicates"),
    seconds = c(fastest_seconds(design, 5), fastest_seconds(linear, 11), fastest_seconds(replicate_mean, 7))
  ), digits = 17),
  file.path(folder, "times.csv"), row.names = FALSE, quote = FALSE
)
