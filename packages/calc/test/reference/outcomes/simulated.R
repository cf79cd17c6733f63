# Trials simulated participant by participant and analysed as they would be: how often each test rejects.
# Run: Rscript simulated.R > simulated.json (about two minutes; base R with its recommended survival and MASS).
# Where the planning formula is an approximation, `departure` bounds what it may be off by, and `because` says why.

suppressPackageStartupMessages({ library(survival); library(MASS) })
set.seed(20100214)

json <- function(x) {
  if (is.list(x)) {
    if (is.null(names(x))) return(paste0("[", paste(vapply(x, json, ""), collapse = ","), "]"))
    return(paste0("{", paste0("\"", names(x), "\":", vapply(x, json, ""), collapse = ","), "}"))
  }
  if (is.character(x)) return(paste0("\"", x, "\""))
  format(x, digits = 15, scientific = FALSE, trim = TRUE)
}
array_of <- function(v) as.list(unname(v))

results <- list()
# `rejects(request)` simulates one trial, or many where it returns a vector, until `runs` are done.
record <- function(id, kind, request, rejects, runs, departure = 0, because = "") {
  hits <- 0; done <- 0
  while (done < runs) { r <- rejects(); hits <- hits + sum(r); done <- done + length(r) }
  results[[length(results) + 1]] <<- list(id = id, kind = kind, request = request, rejections = hits,
    simulations = done, departure = departure, because = because)
}
power_of <- function(...) record(kind = "power", ...)
error_of <- function(...) record(kind = "type I error", ...)

request_of <- function(outcome, test, design, units)
  list(outcome = outcome, test = test, design = design, aim = list(find = "power", units = units))
superiority <- list(hypothesis = "superiority", alpha = 0.05, sides = 2)
against <- function(margin, alpha = 0.025)
  list(hypothesis = "non-inferiority", alpha = alpha, sides = 1, margin = margin)
within <- function(margin, alpha = 0.05) list(hypothesis = "equivalence", alpha = alpha, sides = 1, margin = margin)
parallel <- list(family = "parallel")
allocated <- function(...) list(family = "parallel", allocation = list(...))

# From an estimate and its standard error to rejection, on `df` or the normal.
reject <- function(est, se, test, df = Inf, up = 1, log_margin = FALSE) {
  margin <- if (is.null(test$margin)) 0 else if (log_margin) log(test$margin) else test$margin
  c <- qt(test$alpha / test$sides, df, lower.tail = FALSE)
  switch(test$hypothesis,
    "superiority" = up * est / se > c,
    "non-inferiority" = (up * est + margin) / se > c,
    "equivalence" = (est + margin) / se > c & (margin - est) / se > c)
}

# --- means -------------------------------------------------------------------------------------------------------

batch <- 500
means_rejects <- function(n, delta, sd, test, up = 1, welch = FALSE) function() {
  y <- lapply(1:2, function(g) matrix(rnorm(batch * n[g], c(0, delta)[g], sd[g]), batch))
  m <- sapply(y, rowMeans); v <- sapply(1:2, function(g) rowSums((y[[g]] - m[, g])^2) / (n[g] - 1))
  if (welch) {
    parts <- t(t(v) / n); se <- sqrt(rowSums(parts))
    df <- rowSums(parts)^2 / (parts[, 1]^2 / (n[1] - 1) + parts[, 2]^2 / (n[2] - 1))
  } else {
    df <- sum(n) - 2; se <- sqrt(((n[1] - 1) * v[, 1] + (n[2] - 1) * v[, 2]) / df * sum(1 / n))
  }
  reject(m[, 2] - m[, 1], se, test, df, up)
}
ancova_rejects <- function(n, delta, sd, rho, test, up = 1) function() {
  arm <- rep(0:1, n)
  vapply(1:200, function(i) {
    x <- rnorm(sum(n), 0, sd); y <- delta * arm + rho * x + rnorm(sum(n), 0, sd * sqrt(1 - rho^2))
    fit <- lm.fit(cbind(1, arm, x), y); s2 <- sum(fit$residuals^2) / fit$df.residual
    se <- sqrt(s2 * chol2inv(fit$qr$qr)[2, 2])
    reject(fit$coefficients[2], se, test, fit$df.residual, up)
  }, TRUE)
}
mean_of <- function(difference, sd, better = "higher", ...)
  list(kind = "continuous", difference = difference, sd = sd, better = better, ...)

power_of("non-inferior means", request_of(mean_of(0.5, 6, "lower"), against(2.5), parallel, 60),
  means_rejects(c(60, 60), 0.5, c(6, 6), against(2.5), -1), 20000)
error_of("non-inferior means at the margin", request_of(mean_of(2.5, 6, "lower"), against(2.5), parallel, 60),
  means_rejects(c(60, 60), 2.5, c(6, 6), against(2.5), -1), 20000)
power_of("equivalent means", request_of(mean_of(1, 10), within(6), parallel, 60),
  means_rejects(c(60, 60), 1, c(10, 10), within(6)), 20000)
power_of("equivalent means of few", request_of(mean_of(0.3, 1), within(2), parallel, 5),
  means_rejects(c(5, 5), 0.3, c(1, 1), within(2)), 40000)
error_of("equivalent means at the margin", request_of(mean_of(6, 10), within(6), parallel, 60),
  means_rejects(c(60, 60), 6, c(10, 10), within(6)), 20000)
power_of("equivalent means with unequal SDs and arms",
  request_of(mean_of(1, 5, sdActive = 12), within(6), allocated(1, 2), 20),
  means_rejects(c(20, 40), 1, c(5, 12), within(6), welch = TRUE), 20000)
power_of("non-inferior means with a baseline",
  request_of(mean_of(0, 10, repeated = list(baselines = 1, followUps = 1, correlation = 0.6)),
    against(5), parallel, 60),
  ancova_rejects(c(60, 60), 0, 10, 0.6, against(5)), 8000)

# --- proportions ---------------------------------------------------------------------------------------------------

proportions_rejects <- function(n, p, test, up = 1) function() {
  y <- sapply(1:2, function(g) rbinom(5000, n[g], p[g]) / n[g])
  se <- sqrt(y[, 1] * (1 - y[, 1]) / n[1] + y[, 2] * (1 - y[, 2]) / n[2])
  reject(y[, 2] - y[, 1], se, test, up = up)
}
binary <- function(control, active, better = "higher")
  list(kind = "binary", control = control, active = active, better = better)
power_of("non-inferior proportions", request_of(binary(0.85, 0.85), against(0.1), parallel, 268),
  proportions_rejects(c(268, 268), c(0.85, 0.85), against(0.1)), 40000)
error_of("non-inferior proportions at the margin", request_of(binary(0.85, 0.75), against(0.1), parallel, 268),
  proportions_rejects(c(268, 268), c(0.85, 0.75), against(0.1)), 40000)
power_of("equivalent proportions, 1 to 2", request_of(binary(0.4, 0.42), within(0.12), allocated(1, 2), 250),
  proportions_rejects(c(250, 500), c(0.4, 0.42), within(0.12)), 40000)
error_of("equivalent proportions at the margin", request_of(binary(0.4, 0.52), within(0.12), parallel, 400),
  proportions_rejects(c(400, 400), c(0.4, 0.52), within(0.12)), 40000)

# --- hazards -------------------------------------------------------------------------------------------------------

survival_of <- function(hr, accrual = 18, followUp = 12, probability = 0.6, ...) list(kind = "time-to-event",
  hazardRatio = hr, controlSurvival = list(at = 12, probability = probability),
  accrual = accrual, followUp = followUp, ...)
trial <- function(n, o, hr = o$hazardRatio) {
  arm <- rep(0:1, n); lambda <- -log(o$controlSurvival$probability) / o$controlSurvival$at
  time <- rexp(sum(n), lambda * hr^arm); end <- o$followUp + o$accrual * runif(sum(n))
  if (!is.null(o$dropoutHazard)) end <- pmin(end, rexp(sum(n), o$dropoutHazard))
  list(arm = arm, time = pmin(time, end), event = time <= end)
}
# The log-rank statistic; positive where the active arm has more events than expected.
log_rank <- function(d) {
  o <- order(d$time); arm <- d$arm[o]; event <- d$event[o]; n <- length(o)
  at_risk <- n:1; active <- rev(cumsum(rev(arm))); p <- active / at_risk
  sum((arm - p)[event]) / sqrt(sum((p * (1 - p))[event]))
}
stopifnot({ d <- trial(c(60, 90), survival_of(0.6)); s <- survdiff(Surv(d$time, d$event) ~ d$arm)
  abs(log_rank(d)^2 - s$chisq) < 1e-9 })
log_rank_rejects <- function(n, o, test, hr = o$hazardRatio, up = -1) function()
  vapply(1:500, function(i) up * log_rank(trial(n, o, hr)) > qnorm(test$alpha / test$sides, lower.tail = FALSE), TRUE)
cox_rejects <- function(n, o, test, hr = o$hazardRatio, up = -1) function() vapply(1:100, function(i) {
  d <- trial(n, o, hr)
  fit <- coxph.fit(matrix(as.double(d$arm)), Surv(d$time, d$event), NULL, NULL, NULL, coxph.control(), NULL,
    "efron", NULL)
  reject(fit$coefficients, sqrt(fit$var[1]), test, up = up, log_margin = TRUE)
}, TRUE)
freedman <- "Freedman's variance is exact only where hazards and events stay in proportion"
power_of("hazard ratio 0.7", request_of(survival_of(0.7), superiority, parallel, 250),
  log_rank_rejects(c(250, 250), survival_of(0.7), superiority), 20000)
power_of("hazard ratio 0.5 of few", request_of(survival_of(0.5, 12, 12, 0.5), superiority, parallel, 60),
  log_rank_rejects(c(60, 60), survival_of(0.5, 12, 12, 0.5), superiority), 20000)
power_of("hazard ratio 0.5 of few, Freedman",
  request_of(survival_of(0.5, 12, 12, 0.5, method = "freedman"), superiority, parallel, 60),
  log_rank_rejects(c(60, 60), survival_of(0.5, 12, 12, 0.5), superiority), 20000, 0.03, freedman)
power_of("hazard ratio 0.65 with dropout",
  request_of(survival_of(0.65, dropoutHazard = 0.03), superiority, parallel, 250),
  log_rank_rejects(c(250, 250), survival_of(0.65, dropoutHazard = 0.03), superiority), 20000)
power_of("hazard ratio 0.6, 1 to 3", request_of(survival_of(0.6), superiority, allocated(1, 3), 80),
  log_rank_rejects(c(80, 240), survival_of(0.6), superiority), 20000, 0.06,
  "with unequal arms the larger effect shifts who is at risk, and Schoenfeld's formula errs either way")
power_of("hazard ratio 1.4 without accrual time",
  request_of(survival_of(1.4, 0, 24), superiority, parallel, 180),
  log_rank_rejects(c(180, 180), survival_of(1.4, 0, 24), superiority, up = 1), 20000)
error_of("no difference in hazards", request_of(survival_of(0.7), superiority, parallel, 250),
  log_rank_rejects(c(250, 250), survival_of(0.7), superiority, hr = 1), 20000)
power_of("non-inferior hazards", request_of(survival_of(1, better = "lower"), against(1.4), parallel, 250),
  cox_rejects(c(250, 250), survival_of(1), against(1.4)), 6000)
error_of("non-inferior hazards at the margin",
  request_of(survival_of(1.4, better = "lower"), against(1.4), parallel, 250),
  cox_rejects(c(250, 250), survival_of(1.4), against(1.4)), 6000)
power_of("equivalent hazards", request_of(survival_of(1.05), within(1.4), parallel, 300),
  cox_rejects(c(300, 300), survival_of(1.05), within(1.4)), 6000)

# --- counts --------------------------------------------------------------------------------------------------------

rate_of <- function(rr, control, exposure = 1, better = "lower", ...)
  list(kind = "count", controlRate = control, rateRatio = rr, exposure = exposure, better = better, ...)
poisson_rejects <- function(n, o, test, rr = o$rateRatio, up = -1) function() {
  y <- sapply(1:2, function(g) rpois(5000, n[g] * o$exposure * o$controlRate * c(1, rr)[g]))
  reject(log(y[, 2] / n[2]) - log(y[, 1] / n[1]), sqrt(1 / y[, 1] + 1 / y[, 2]), test, up = up, log_margin = TRUE)
}
negative_binomial_rejects <- function(n, o, test, rr = o$rateRatio, up = -1) function() vapply(1:100, function(i) {
  arm <- rep(0:1, n); y <- rnbinom(sum(n), size = 1 / o$dispersion, mu = o$exposure * o$controlRate * rr^arm)
  fit <- suppressWarnings(glm.nb(y ~ arm)); s <- summary(fit)$coefficients
  reject(s[2, 1], s[2, 2], test, up = up, log_margin = TRUE)
}, TRUE)
wald <- "Wald's test of a log rate keeps its level, and its planned variance, only in large samples"
power_of("Poisson rates", request_of(rate_of(0.7, 0.8), superiority, parallel, 150),
  poisson_rejects(c(150, 150), rate_of(0.7, 0.8), superiority), 40000)
power_of("Poisson rates, 2 to 1", request_of(rate_of(1.5, 0.4, 2), superiority, allocated(2, 1), 140),
  poisson_rejects(c(140, 70), rate_of(1.5, 0.4, 2), superiority, up = 1), 40000, 0.012, wald)
error_of("no difference of Poisson rates", request_of(rate_of(0.7, 0.8), superiority, parallel, 150),
  poisson_rejects(c(150, 150), rate_of(0.7, 0.8), superiority, rr = 1), 40000)
power_of("negative binomial rates",
  request_of(rate_of(0.7, 1.2, dispersion = 0.5), superiority, parallel, 180),
  negative_binomial_rejects(c(180, 180), rate_of(0.7, 1.2, dispersion = 0.5), superiority), 4000)
error_of("no difference of negative binomial rates",
  request_of(rate_of(0.7, 1.2, dispersion = 0.5), superiority, parallel, 180),
  negative_binomial_rejects(c(180, 180), rate_of(0.7, 1.2, dispersion = 0.5), superiority, rr = 1), 4000)
power_of("non-inferior rates", request_of(rate_of(1, 1.1), against(1.3), parallel, 220),
  poisson_rejects(c(220, 220), rate_of(1, 1.1), against(1.3)), 40000)
error_of("non-inferior rates at the margin", request_of(rate_of(1.3, 1.1), against(1.3), parallel, 220),
  poisson_rejects(c(220, 220), rate_of(1.3, 1.1), against(1.3)), 40000)
power_of("equivalent rates", request_of(rate_of(1.03, 1.1), within(1.3), parallel, 300),
  poisson_rejects(c(300, 300), rate_of(1.03, 1.1), within(1.3)), 40000, 0.005, wald)

# --- ordered categories --------------------------------------------------------------------------------------------

scale_of <- function(or, p, better = "lower")
  list(kind = "ordinal", controlProbabilities = array_of(p), oddsRatio = or, better = better)
shifted <- function(p, or) { c <- cumsum(p); diff(c(0, (or * c / (or * c + 1 - c))[-length(p)], 1)) }
# The rank-sum test with ties, from the table; positive where the active arm has earlier categories.
rank_sum_rejects <- function(n, p, test, or, up = 1) function() {
  a <- rmultinom(5000, n[1], p); b <- rmultinom(5000, n[2], shifted(p, or)); both <- a + b; total <- sum(n)
  rank <- apply(both, 2, cumsum) - both + (both + 1) / 2
  w <- colSums(b * rank); v <- n[1] * n[2] / 12 * (total + 1 - colSums(both^3 - both) / (total * (total - 1)))
  up * -(w - n[2] * (total + 1) / 2) / sqrt(v) > qnorm(test$alpha / test$sides, lower.tail = FALSE)
}
proportional_odds_rejects <- function(n, p, test, or, up = 1) function() vapply(1:100, function(i) {
  y <- c(rmultinom(1, n[1], p), rmultinom(1, n[2], shifted(p, or)))
  d <- data.frame(category = factor(rep(seq_along(p), 2), ordered = TRUE), arm = rep(0:1, each = length(p)), n = y)
  fit <- suppressWarnings(polr(category ~ arm, d[d$n > 0, ], weights = n, Hess = TRUE))
  # polr's coefficient is positive towards later categories.
  reject(-fit$coefficients[1], sqrt(vcov(fit)[1, 1]), test, up = up, log_margin = TRUE)
}, TRUE)
score <- "the information is that at no effect, with the categories of both arms together"
scale <- c(0.2, 0.5, 0.2, 0.1)
power_of("odds ratio 1.8", request_of(scale_of(1.8, scale), superiority, parallel, 150),
  rank_sum_rejects(c(150, 150), scale, superiority, 1.8), 40000)
power_of("odds ratio 0.5 of seven categories, 1 to 2",
  request_of(scale_of(0.5, c(0.3, 0.2, 0.15, 0.1, 0.1, 0.1, 0.05)), superiority, allocated(1, 2), 50),
  rank_sum_rejects(c(50, 100), c(0.3, 0.2, 0.15, 0.1, 0.1, 0.1, 0.05), superiority, 0.5, -1), 40000, 0.01, score)
error_of("no difference of ordered categories", request_of(scale_of(1.8, scale), superiority, parallel, 150),
  rank_sum_rejects(c(150, 150), scale, superiority, 1), 40000)
power_of("non-inferior ordered categories", request_of(scale_of(1, scale), against(1.6), parallel, 200),
  proportional_odds_rejects(c(200, 200), scale, against(1.6), 1), 4000)
error_of("non-inferior ordered categories at the margin",
  request_of(scale_of(0.625, scale), against(1.6), parallel, 200),
  proportional_odds_rejects(c(200, 200), scale, against(1.6), 0.625), 4000)
power_of("equivalent ordered categories", request_of(scale_of(1.05, scale), within(1.7), parallel, 250),
  proportional_odds_rejects(c(250, 250), scale, within(1.7), 1.05), 4000)

# --- clusters ------------------------------------------------------------------------------------------------------

cluster_t <- function(y0, y1, test, up, log_margin = FALSE) {
  k <- c(ncol(y0), ncol(y1)); m <- cbind(rowMeans(y0), rowMeans(y1))
  v <- (rowSums((y0 - m[, 1])^2) + rowSums((y1 - m[, 2])^2)) / (sum(k) - 2)
  reject(m[, 2] - m[, 1], sqrt(v * sum(1 / k)), test, sum(k) - 2, up, log_margin)
}
cluster_means <- function(k, m, icc, sd, delta, test, up = 1) function() {
  draw <- function(count, shift) matrix(shift + rnorm(batch * count, 0, sd * sqrt(icc)) +
    rowMeans(matrix(rnorm(batch * count * m, 0, sd * sqrt(1 - icc)), ncol = m)), batch)
  cluster_t(draw(k[1], 0), draw(k[2], delta), test, up)
}
cluster_proportions <- function(k, m, icc, p, test, up = 1) function() {
  s <- 1 / icc - 1
  draw <- function(count, p)
    matrix(rbinom(5000 * count, m, rbeta(5000 * count, p * s, (1 - p) * s)) / m, 5000)
  cluster_t(draw(k[1], p[1]), draw(k[2], p[2]), test, up)
}
cluster_rates <- function(k, m, cv, rate, rr, test, up = -1) function() {
  draw <- function(count, rate)
    matrix(log(pmax(0.5, rpois(5000 * count, m * rate * rgamma(5000 * count, 1 / cv^2, 1 / cv^2))) / m), 5000)
  cluster_t(draw(k[1], rate), draw(k[2], rate * rr), test, up)
}
clusters <- function(...) list(family = "cluster", ...)
power_of("non-inferior means in clusters",
  request_of(mean_of(0, 10), against(4), clusters(icc = 0.04, clusterSize = 25), 8),
  cluster_means(c(8, 8), 25, 0.04, 10, 0, against(4)), 10000)
error_of("non-inferior means in clusters at the margin",
  request_of(mean_of(-4, 10), against(4), clusters(icc = 0.04, clusterSize = 25), 8),
  cluster_means(c(8, 8), 25, 0.04, 10, -4, against(4)), 10000)
power_of("equivalent means in clusters",
  request_of(mean_of(0.5, 10), within(5), clusters(icc = 0.05, clusterSize = 20), 9),
  cluster_means(c(9, 9), 20, 0.05, 10, 0.5, within(5)), 10000)
power_of("equivalent means in 1 to 2 clusters",
  request_of(mean_of(0, 10), within(6), clusters(icc = 0.1, clusterSize = 10, allocation = list(1, 2)), 8),
  cluster_means(c(8, 16), 10, 0.1, 10, 0, within(6)), 10000)
power_of("non-inferior proportions in clusters",
  request_of(binary(0.7, 0.7), against(0.12), clusters(icc = 0.03, clusterSize = 30), 12),
  cluster_proportions(c(12, 12), 30, 0.03, c(0.7, 0.7), against(0.12)), 20000)
error_of("non-inferior proportions in clusters at the margin",
  request_of(binary(0.7, 0.58), against(0.12), clusters(icc = 0.03, clusterSize = 30), 12),
  cluster_proportions(c(12, 12), 30, 0.03, c(0.7, 0.58), against(0.12)), 20000)
delta_method <- "the variance of a log rate is a first-order one, too small where clusters see few events"
power_of("rates in clusters",
  request_of(rate_of(0.7, 0.2), superiority, clusters(rateCv = 0.25, clusterSize = 100), 17),
  cluster_rates(c(17, 17), 100, 0.25, 0.2, 0.7, superiority), 20000, 0.025, delta_method)
power_of("rates in large clusters",
  request_of(rate_of(0.75, 0.3), superiority, clusters(rateCv = 0.2, clusterSize = 1000), 10),
  cluster_rates(c(10, 10), 1000, 0.2, 0.3, 0.75, superiority), 20000)
error_of("no difference of rates in clusters",
  request_of(rate_of(0.7, 0.2), superiority, clusters(rateCv = 0.25, clusterSize = 100), 17),
  cluster_rates(c(17, 17), 100, 0.25, 0.2, 1, superiority), 20000)

# --- equivalence at the margin --------------------------------------------------------------------------------------

error_of("equivalent means with unequal SDs at the margin",
  request_of(mean_of(6, 5, sdActive = 12), within(6), allocated(1, 2), 40),
  means_rejects(c(40, 80), 6, c(5, 12), within(6), welch = TRUE), 20000)
error_of("equivalent hazards at the margin", request_of(survival_of(1.4), within(1.4), parallel, 300),
  cox_rejects(c(300, 300), survival_of(1.4), within(1.4)), 6000)
error_of("equivalent rates at the margin", request_of(rate_of(1.3, 1.1), within(1.3), parallel, 300),
  poisson_rejects(c(300, 300), rate_of(1.3, 1.1), within(1.3)), 40000)
error_of("equivalent ordered categories at the margin", request_of(scale_of(1.7, scale), within(1.7), parallel, 250),
  proportional_odds_rejects(c(250, 250), scale, within(1.7), 1.7), 4000)
error_of("equivalent means in clusters at the margin",
  request_of(mean_of(5, 10), within(5), clusters(icc = 0.05, clusterSize = 20), 9),
  cluster_means(c(9, 9), 20, 0.05, 10, 5, within(5)), 10000)

cat("[\n", paste(vapply(results, json, ""), collapse = ",\n"), "\n]\n", sep = "")
