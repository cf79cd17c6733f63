# Trials over cluster periods simulated in base R: participants, their clusters' means, and the analysis each request
# stands for. Run: Rscript simulation.R [seed] [runs] > simulated.json
#
# With `reference: normal` the analysis is generalised least squares with the covariance known, against the normal
# distribution. With the t reference it is a t test on one figure per cluster, where such a figure is that same
# estimator: the later mean less its regression on the baseline mean, or the difference of the two periods.

source("model.R")
arguments <- as.numeric(commandArgs(TRUE))
set.seed(if (length(arguments) > 0) arguments[1] else 20261205)
runs <- if (length(arguments) > 1) arguments[2] else 20000
value <- function(x, otherwise) if (is.null(x)) otherwise else x

# Means of participants simulated one by one: runs x clusters x periods.
period_means <- function(runs, clusters, periods, d, sizes = NULL) {
  n <- length(periods); apart <- abs(outer(periods, periods, "-"))
  R <- if (isTRUE(d$decay)) d$cac^apart else matrix(d$cac, n, n); diag(R) <- 1
  decomposed <- eigen(R, symmetric = TRUE)
  root <- decomposed$vectors %*% diag(sqrt(pmax(0, decomposed$values)), n)
  y <- sqrt(d$icc) * matrix(rnorm(runs * clusters * n), ncol = n) %*% t(root)
  iac <- value(d$iac, 0); each <- 0
  if (!is.null(sizes)) {
    # Sizes are real numbers here, so the mean of a cluster's participants is drawn at once.
    person <- sqrt(iac) * rnorm(runs * clusters) + sqrt(1 - iac) * matrix(rnorm(runs * clusters * n), ncol = n)
    return(y + sqrt((1 - d$icc) / c(sizes)) * person)
  }
  for (i in seq_len(d$clusterSize)) {
    person <- sqrt(iac) * rnorm(runs * clusters)
    each <- each + person + sqrt(1 - iac) * matrix(rnorm(runs * clusters * n), ncol = n)
  }
  y + sqrt(1 - d$icc) * each / d$clusterSize
}

# One trial after the other, each a list of cluster means by sequence, would be slow: sums over clusters suffice.
gls <- function(cells, k, d) {
  measured <- cells; measured[measured == 2] <- NA
  X <- list(); Y <- list()
  kept <- which(colSums(!is.na(measured)) > 0)
  total <- 0; score <- 0
  for (s in seq_len(nrow(cells))) {
    at <- kept[!is.na(measured[s, kept])]
    design <- cbind(outer(at, kept, "==") * 1, measured[s, at])
    W <- solve(covariance(at, d, d$clusterSize))
    y <- period_means(runs, k[s], at, d)
    sums <- rowsum(y, rep(seq_len(runs), k[s]))
    score <- score + sums %*% W %*% design
    total <- total + k[s] * t(design) %*% W %*% design
  }
  inverse <- solve(total); last <- ncol(inverse)
  list(estimate = c(score %*% inverse[, last]), se = sqrt(inverse[last, last]))
}

# Generalised least squares in which every cluster has its own gamma size.
gls_unequal <- function(cells, k, d) {
  periods <- seq_len(ncol(cells)); shape <- 1 / d$clusterSizeCv^2
  total <- array(0, c(runs, length(periods) + 1, length(periods) + 1)); score <- matrix(0, runs, length(periods) + 1)
  for (s in seq_len(nrow(cells))) for (cluster in seq_len(k[s])) {
    size <- d$clusterSize * rgamma(runs, shape, rate = shape)
    y <- period_means(runs, 1, periods, d, size)
    X <- cbind(diag(length(periods)), cells[s, ])
    for (i in seq_len(runs)) {
      W <- solve(covariance(periods, d, size[i]))
      total[i, , ] <- total[i, , ] + t(X) %*% W %*% X
      score[i, ] <- score[i, ] + t(X) %*% W %*% y[i, ]
    }
  }
  last <- length(periods) + 1
  solved <- vapply(seq_len(runs), function(i) {
    inverse <- solve(total[i, , ]); c(inverse[last, ] %*% score[i, ], sqrt(inverse[last, last]))
  }, c(0, 0))
  list(estimate = solved[1, ], se = solved[2, ])
}

t_on_clusters <- function(figures, sequence, scale) {
  a <- figures[, sequence == 1, drop = FALSE]; b <- figures[, sequence == 2, drop = FALSE]
  df <- ncol(figures) - 2
  pooled <- (rowSums((a - rowMeans(a))^2) + rowSums((b - rowMeans(b))^2)) / df
  list(estimate = scale * (rowMeans(b) - rowMeans(a)), se = abs(scale) * sqrt(pooled * (1 / ncol(a) + 1 / ncol(b))))
}
one_figure <- function(k, d, of, scale) {
  y <- period_means(runs, sum(k), 1:2, d)
  t_on_clusters(matrix(of(y), runs), rep(1:2, k), scale)
}

# Unequal variances of the arms and a cluster effect on the proportions themselves, uniform so as to stay in 0 to 1.
gls_binary <- function(cells, k, d, p) {
  sigma <- sqrt(mean(p * (1 - p))); periods <- seq_len(ncol(cells)); score <- 0; total <- 0
  for (s in seq_len(nrow(cells))) {
    effect <- runif(runs * k[s], -1, 1) * sqrt(3 * d$icc) * sigma
    y <- vapply(periods, function(j)
      rbinom(runs * k[s], d$clusterSize, p[cells[s, j] + 1] + effect) / d$clusterSize, numeric(runs * k[s]))
    W <- solve(sigma^2 * covariance(periods, d, d$clusterSize)); X <- cbind(diag(length(periods)), cells[s, ])
    score <- score + rowsum(y, rep(seq_len(runs), k[s])) %*% W %*% X
    total <- total + k[s] * t(X) %*% W %*% X
  }
  inverse <- solve(total); last <- ncol(inverse)
  list(estimate = c(score %*% inverse[, last]), se = sqrt(inverse[last, last]))
}

# Estimates are of no effect and sigma = 1: an effect only moves them.
rejections <- function(request, fit, df, sigma) {
  test <- request$test; delta <- request$outcome$difference
  bound <- if (is.finite(df)) qt(test$alpha / test$sides, df, lower.tail = FALSE) else qnorm(test$alpha / test$sides, lower.tail = FALSE)
  reject <- function(delta) {
    estimate <- sigma * fit$estimate + delta; se <- sigma * fit$se
    sign <- if (identical(request$outcome$better, "lower")) -1 else 1
    switch(test$hypothesis,
      "superiority" = sum(sign(request$outcome$difference) * estimate / se > bound),
      "non-inferiority" = sum((sign * estimate + test$margin) / se > bound),
      "equivalence" = sum((test$margin - estimate) / se > bound & (estimate + test$margin) / se > bound))
  }
  sign <- if (identical(request$outcome$better, "lower")) -1 else 1
  null <- switch(test$hypothesis, "superiority" = 0, "non-inferiority" = -sign * test$margin, "equivalence" = test$margin)
  list(runs = runs, rejected = reject(delta), rejectedUnderNull = reject(null))
}

case <- function(id, design, units, difference, sd = 10, hypothesis = "superiority", alpha = 0.05, sides = 2,
                 margin = NULL, better = NULL, reference = NULL) {
  list(id = id, request = list(outcome = c(list(kind = "continuous", difference = difference, sd = sd),
    if (!is.null(better)) list(better = better)),
    test = c(list(hypothesis = hypothesis, alpha = alpha, sides = sides), if (!is.null(margin)) list(margin = margin),
      if (!is.null(reference)) list(reference = reference)), design = design, aim = list(find = "power", units = units)))
}
add <- function(c, fit, df) c(c, rejections(c$request, fit, df, c$request$outcome$sd))

out <- list()
d <- list(family = "cluster-baseline", icc = 0.05, cac = 0.8, clusterSize = 10)
V <- covariance(1:2, d, 10); r <- V[1, 2] / V[1, 1]
out[[1]] <- add(case("baseline period, t test on adjusted means", d, 8, 6.5), one_figure(c(8, 8), d, function(y) y[, 2] - r * y[, 1], 1), 14)
d <- list(family = "cluster-baseline", icc = 0.1, cac = 0.6, iac = 0.7, clusterSize = 12, allocation = list(1, 2))
V <- covariance(1:2, d, 12); r <- V[1, 2] / V[1, 1]
out[[2]] <- add(case("baseline period in a cohort, one to two", d, 4, -7, alpha = 0.025, sides = 1), one_figure(c(4, 8), d, function(y) y[, 2] - r * y[, 1], 1), 10)
d <- list(family = "cluster-crossover", icc = 0.05, cac = 0.7, iac = 0.5, clusterSize = 8)
out[[3]] <- add(case("cluster crossover, t test on differences", d, 5, 4), one_figure(c(5, 5), d, function(y) y[, 2] - y[, 1], -0.5), 8)
out[[4]] <- add(case("cluster crossover, non-inferiority", d, 6, 0, hypothesis = "non-inferiority", sides = 1, margin = 3.5, better = "lower"),
  one_figure(c(6, 6), d, function(y) y[, 2] - y[, 1], -0.5), 10)
out[[5]] <- add(case("cluster crossover, equivalence", d, 6, 0.5, hypothesis = "equivalence", sides = 1, margin = 4.5),
  one_figure(c(6, 6), d, function(y) y[, 2] - y[, 1], -0.5), 10)
d <- list(family = "stepped-wedge", steps = 4, icc = 0.08, cac = 0.7, decay = TRUE, clusterSize = 10)
out[[6]] <- add(case("wedge with decay, covariance known", d, 3, 4.5, reference = "normal"), gls(wedge(4), rep(3, 4), d), Inf)
d <- list(family = "stepped-wedge", steps = 3, baselinePeriods = 2, transitionPeriods = 1, icc = 0.06, cac = 0.9, iac = 0.6, clusterSize = 8)
out[[7]] <- add(case("wedge with transition in a cohort, covariance known", d, 3, -5, reference = "normal"), gls(wedge(3, 2, 1), rep(3, 3), d), Inf)
schedule <- rbind(c(0, 0, 1, NA), c(0, 1, NA, 1), c(NA, 0, 0, 1))
d <- list(family = "cluster-schedule", schedule = rows_of(schedule), icc = 0.1, cac = 0.8, clusterSize = 6, allocation = list(2, 1, 3))
out[[8]] <- add(case("schedule with unmeasured cells, covariance known", d, 4, 6, reference = "normal", alpha = 0.01), gls(schedule, c(4, 2, 6), d), Inf)
d <- list(family = "cluster-baseline", icc = 0.1, cac = 0.8, clusterSize = 15, clusterSizeCv = 0.8)
out[[9]] <- add(case("baseline period, unequal sizes, covariance known", d, 10, 4.5, reference = "normal"),
  gls_unequal(rbind(c(0, 0), c(0, 1)), c(10, 10), d), Inf)
d <- list(family = "stepped-wedge", steps = 4, icc = 0.03, cac = 1, clusterSize = 20)
binary <- list(id = "wedge of proportions, planning covariance", request = list(outcome = list(kind = "binary", control = 0.3, active = 0.2),
  test = list(hypothesis = "superiority", alpha = 0.05, sides = 2, reference = "normal"), design = d, aim = list(find = "power", units = 5)))
z <- qnorm(0.975); fit <- gls_binary(wedge(4), rep(5, 4), d, c(0.3, 0.2))
nothing <- gls_binary(wedge(4), rep(5, 4), d, c(0.25, 0.25))
out[[10]] <- c(binary, list(runs = runs, rejected = sum(-fit$estimate / fit$se > z), rejectedUnderNull = sum(-nothing$estimate / nothing$se > z)))
cat("[\n", paste(vapply(out, json, ""), collapse = ",\n"), "\n]\n", sep = "")
