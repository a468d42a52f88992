# Times of the prop.test calls that give a release's figures, and the figures. Arguments: a folder with figures.csv.
folder <- commandArgs(TRUE)[1]
figures <- read.csv(file.path(folder, "figures.csv"))

# One row is one call: kind one (x of n against p0), two (x1 of n1, x2 of n2) or lead (x1 against x2, score test).
call_of <- function(row) {
  if (row$kind == "one") return(prop.test(row$x1, row$n1, row$p0, correct = FALSE, conf.level = row$level))
  if (row$kind == "two") return(prop.test(c(row$x2, row$x1), c(row$n2, row$n1), correct = FALSE, conf.level = row$level))
  prop.test(row$x1, row$x1 + row$x2, 0.5, correct = FALSE, conf.level = row$level)
}
rows <- lapply(seq_len(nrow(figures)), function(i) as.list(figures[i, ]))
same <- function() for (row in rows) call_of(row)
eight <- function() for (i in 1:8) prop.test(520, 1000, 0.5, correct = FALSE)

# Processor time, which other work on the machine does not lengthen.
fastest_seconds <- function(f, per_batch, batches = 15) {
  f()
  min(replicate(batches, {
    start <- sum(proc.time()[1:2])
    for (i in seq_len(per_batch)) f()
    (sum(proc.time()[1:2]) - start) / per_batch
  }))
}
answers <- lapply(rows, function(row) {
  test <- call_of(row)
  interval <- if (row$kind == "lead") c(NA, NA) else test$conf.int
  data.frame(id = row$id, p = test$p.value, low = interval[1], high = interval[2])
})
write.csv(format(do.call(rbind, answers), digits = 17), file.path(folder, "answers.csv"), row.names = FALSE, quote = FALSE)
times <- data.frame(
  name = c("same", "eight"),
  seconds = c(fastest_seconds(same, 100), fastest_seconds(eight, 200))
)
write.csv(format(times, digits = 17), file.path(folder, "times.csv"), row.names = FALSE, quote = FALSE)
