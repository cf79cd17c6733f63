# Nimblegrip's three arms, sqrt(2) : 1 : 1, each dose against advice; Bonferroni: two comparisons at 2.5 %, two-sided.
# Prints analysed by arm, power, recruited, EUR and months: the figures in demo.test.ts.
power <- function(control) {
  active <- ceiling(control / sqrt(2) - 1e-9)
  df <- control + 2 * active - 3 - 1
  se <- 17 * sqrt((1 - 0.5^2) * (1 / control + 1 / active))
  1 - pt(qt(1 - 0.05 / 2 / 2, df), df, 6 / se)
}
control <- 2; while (power(control) < 0.9) control <- control + 1
active <- ceiling(control / sqrt(2) - 1e-9)
recruited <- c(ceiling(control / 0.88), rep(ceiling(active / 0.88), 2))
cat(control, active, power(control), sum(recruited), 372400 + 290 * sum(recruited) + sum(recruited * c(12, 101, 329)), 6 + sum(recruited) / 21.6 + 6 + 5, "\n")
