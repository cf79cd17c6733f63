# Reads "alpha df loading1 loading2 …" a line, unused loadings as 0. Prints the processor seconds that mvtnorm's
# qmvt takes for the two-sided critical values, those values, and the same from the double integral over the
# shared normal and the scale of the SD, by integrate and uniroot to 1e-10.
library(mvtnorm)
set.seed(20261203)
lines <- as.matrix(read.table(file("stdin")))
cases <- lapply(seq_len(nrow(lines)), function(i)
  list(alpha = lines[i, 1], df = lines[i, 2], loadings = lines[i, -(1:2)][lines[i, -(1:2)] != 0]))

by_qmvt <- function(case) {
  correlation <- outer(case$loadings, case$loadings); diag(correlation) <- 1
  qmvt(1 - case$alpha, tail = "both.tails", df = case$df, corr = correlation)$quantile
}
by_integrals <- function(case) {
  all_within <- function(limit) {
    given <- function(z) vapply(z, function(y) dnorm(y) * prod(
      pnorm((limit - case$loadings * y) / sqrt(1 - case$loadings^2)) -
      pnorm((-limit - case$loadings * y) / sqrt(1 - case$loadings^2))), 0)
    2 * integrate(given, 0, 9, rel.tol = 1e-11, subdivisions = 500)$value
  }
  inside <- function(c) {
    over <- function(s) vapply(s, function(each) all_within(c * each), 0) * 2 * case$df * s * dchisq(case$df * s^2, case$df)
    ends <- sqrt(qchisq(c(1e-17, 0.5), case$df) / case$df); last <- sqrt(qchisq(1e-17, case$df, lower.tail = FALSE) / case$df)
    integrate(over, ends[1], ends[2], rel.tol = 1e-10)$value + integrate(over, ends[2], last, rel.tol = 1e-10)$value
  }
  uniroot(function(c) inside(c) - (1 - case$alpha), c(1.5, 6), tol = 1e-11)$root
}
invisible(by_qmvt(cases[[1]]))
seconds <- sum(system.time(values <- vapply(cases, by_qmvt, 0))[c("user.self", "sys.self")])
cat(seconds, format(c(values, vapply(cases, by_integrals, 0)), digits = 15), sep = "\n")
