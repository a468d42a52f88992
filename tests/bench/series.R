# Times and figures of R's own smoother on a series of polls. Arguments: a folder with days.csv (one row a day: the mean
# of the day's polls weighted by 1/variance, empty without a poll), the daily variance and one error variance.
# KalmanSmooth knows one error variance for all days, so the figures compared use one poll a day of that variance.
folder <- commandArgs(TRUE)[1]
daily <- as.numeric(commandArgs(TRUE)[2])
error <- as.numeric(commandArgs(TRUE)[3])
days <- read.csv(file.path(folder, "days.csv"))$y
model <- list(
  T = matrix(1), V = matrix(daily), h = error, Z = 1, a = 0, P = matrix(1e4), Pn = matrix(1e4)
)
smooth <- KalmanSmooth(days, model, nit = 0L)
# Processor time, which other work on the machine does not lengthen.
fastest_seconds <- function(f, per_batch, batches = 15) {
  f()
  min(replicate(batches, sum(system.time(for (i in seq_len(per_batch)) f())[1:2]) / per_batch))
}
fit <- StructTS(ts(days), "level")
write.csv(
  format(data.frame(mean = drop(smooth$smooth), variance = drop(smooth$var)), digits = 17),
  file.path(folder, "answers.csv"), row.names = FALSE, quote = FALSE
)
write.csv(
  format(data.frame(name = names(fit$coef), value = unname(fit$coef)), digits = 17),
  file.path(folder, "variances.csv"), row.names = FALSE, quote = FALSE
)
write.csv(
  format(data.frame(
    name = c("KalmanSmooth", "StructTS"),
    seconds = c(
      fastest_seconds(function() KalmanSmooth(days, model, nit = 0L), 500),
      fastest_seconds(function() StructTS(ts(days), "level"), 5, 7)
    )
  ), digits = 17),
  file.path(folder, "times.csv"), row.names = FALSE, quote = FALSE
)
