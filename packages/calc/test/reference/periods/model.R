# Generalised least squares of designs over cluster periods in base R, written from docs/, with nothing of
# Steelyard's own code: one design matrix and one covariance matrix for each sequence. Sourced by the scripts here.

up <- function(x) ceiling(x - 1e-9)

# Rows of 0 control, 1 active, NA unmeasured; 2 marks a transition period, unmeasured but treated.
wedge <- function(steps, baseline = 1, transition = 0) {
  t(vapply(seq_len(steps), function(s) {
    cross <- baseline + s
    vapply(seq_len(baseline + steps + transition), function(j)
      if (j < cross) 0 else if (j < cross + transition) 2 else 1, 0)
  }, numeric(baseline + steps + transition)))
}

covariance <- function(periods, d, m) {
  n <- length(periods)
  apart <- abs(outer(periods, periods, "-"))
  R <- if (isTRUE(d$decay)) d$cac^apart else matrix(d$cac, n, n)
  diag(R) <- 1
  Q <- matrix(if (is.null(d$iac)) 0 else d$iac, n, n); diag(Q) <- 1
  within <- if (is.infinite(m)) 0 else (1 - d$icc) / m
  d$icc * R + within * Q
}

# The inverse covariance averaged over gamma sizes with mean m, by the trapezoid rule on their logarithm.
precision <- function(periods, d, m) {
  cv <- if (is.null(d$clusterSizeCv)) 0 else d$clusterSizeCv
  if (cv == 0 || is.infinite(m)) return(solve(covariance(periods, d, m)))
  shape <- 1 / cv^2
  ends <- log(c(qgamma(1e-17, shape, rate = shape), qgamma(1e-17, shape, rate = shape, lower.tail = FALSE)))
  u <- seq(ends[1], ends[2], length.out = 800)
  weight <- exp(dgamma(exp(u), shape, rate = shape, log = TRUE) + u)
  total <- 0
  for (i in seq_along(u)) total <- total + weight[i] * solve(covariance(periods, d, m * exp(u[i])))
  total / sum(weight)
}

# Information matrix of one cluster of each sequence, over the kept periods and the treatment.
information <- function(schedule, d, m) {
  seen <- schedule; seen[seen == 2] <- NA
  kept <- which(colSums(!is.na(seen)) > 0)
  lapply(seq_len(nrow(seen)), function(s) {
    at <- kept[!is.na(seen[s, kept])]
    X <- cbind(outer(at, kept, "==") * 1, seen[s, at])
    list(info = t(X) %*% precision(at, d, m) %*% X)
  })
}

# The variance of the treatment effect for sigma = 1, with k clusters in each sequence.
variance <- function(info, k) {
  total <- Reduce(`+`, Map(function(one, n) n * one$info, info, k))
  scale <- 1 / sqrt(diag(total))
  n <- nrow(total)
  solve(total * outer(scale, scale))[n, n] * scale[n]^2
}

json <- function(x) {
  if (is.null(x)) return("null")
  if (is.list(x)) {
    if (is.null(names(x))) return(paste0("[", paste(vapply(x, json, ""), collapse = ","), "]"))
    return(paste0("{", paste0("\"", names(x), "\":", vapply(x, json, ""), collapse = ","), "}"))
  }
  if (is.character(x)) return(paste0("\"", x, "\""))
  if (is.logical(x)) return(if (is.na(x)) "null" else if (x) "true" else "false")
  if (is.na(x)) return("null")
  format(x, digits = 15, scientific = abs(x) < 1e-4 && x != 0, trim = TRUE)
}
rows_of <- function(schedule) lapply(seq_len(nrow(schedule)), function(i) as.list(schedule[i, ]))

# pt() is a rough approximation beyond a noncentrality of 37.62: there the scale is integrated out.
one_bound <- function(distance, se, df, tail) {
  if (!is.finite(df)) return(pnorm(distance / se - qnorm(tail, lower.tail = FALSE)))
  t <- qt(tail, df, lower.tail = FALSE); ncp <- distance / se
  if (abs(ncp) < 37) return(pt(t, df, ncp, lower.tail = FALSE))
  ends <- sqrt(qchisq(c(0, 0.01, 0.1, 0.3, 0.5, 0.7, 0.9, 0.99, 1 - 1e-15), df) / df)
  sum(vapply(seq_len(length(ends) - 1), function(i) integrate(function(s)
    pnorm(ncp - t * s) * 2 * df * s * dchisq(df * s^2, df), ends[i], ends[i + 1], rel.tol = 1e-13,
    subdivisions = 2000)$value, 0))
}
both_bounds <- function(delta, margin, se, df, alpha) {
  low <- (-margin - delta) / se; high <- (margin - delta) / se
  if (!is.finite(df)) { z <- qnorm(alpha, lower.tail = FALSE); return(max(0, pnorm(high - z) - pnorm(low + z))) }
  t <- qt(alpha, df, lower.tail = FALSE)
  most <- (high - low) / (2 * t)
  inside <- function(s) pmax(0, pnorm(high - t * s) - pnorm(low + t * s)) * 2 * df * s * dchisq(df * s^2, df)
  ends <- sqrt(qchisq(c(1e-18, 0.1, 0.5, 0.9), df) / df)
  ends <- sort(unique(c(0, ends[ends < most], min(most, sqrt(qchisq(1e-18, df, lower.tail = FALSE) / df)))))
  sum(vapply(seq_len(length(ends) - 1), function(i)
    integrate(inside, ends[i], ends[i + 1], rel.tol = 1e-12, abs.tol = 1e-14, subdivisions = 2000)$value, 0))
}
power_of <- function(test, sign, delta, se, df) {
  if (!is.null(test$reference)) df <- Inf
  switch(test$hypothesis,
    "superiority" = one_bound(abs(delta), se, df, test$alpha / test$sides),
    "non-inferiority" = one_bound(sign * delta + test$margin, se, df, test$alpha),
    "equivalence" = both_bounds(delta, test$margin, se, df, test$alpha))
}
