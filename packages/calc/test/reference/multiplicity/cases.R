# Appraisals of several comparisons in base R, written from docs/multi-arm.md with nothing of Steelyard's own code.
# Run: Rscript cases.R > cases.json (a few minutes)
# Joint probabilities by Gauss-Legendre panels over the shared normal value and the scale; Holm's test by going
# through every place of every statistic between its limits; sizes by bisection, then every size just below.

set.seed(20261201)

ceiling_forgiving <- function(x) ceiling(x - 1e-9)
pick <- function(...) sample(list(...), 1)[[1]]
number <- function(low, high, digits = 3) signif(runif(1, low, high), digits)

# Nodes and weights on -1...1, from the eigenvalues of the Jacobi matrix (Golub & Welsch 1969).
legendre <- local({
  n <- 20
  k <- seq_len(n - 1)
  b <- k / sqrt(4 * k^2 - 1)
  e <- eigen(rbind(cbind(0, diag(b)), 0) + t(rbind(cbind(0, diag(b)), 0)), symmetric = TRUE)
  list(x = e$values, w = 2 * e$vectors[1, ]^2)
})
panels <- function(edges) {
  half <- diff(edges) / 2
  middle <- edges[-1] - half
  list(x = as.vector(outer(legendre$x, half) + rep(middle, each = 20)), w = as.vector(outer(legendre$w, half)))
}
over_z <- panels(seq(-9, 9, 2))
over_z$w <- over_z$w * dnorm(over_z$x)

grid <- function(df) {
  if (is.null(df)) return(list(z = over_z$x, s = rep(1, length(over_z$x)), w = over_z$w))
  width <- 1 / sqrt(2 * df)
  scale <- panels(seq(max(0, 1 - 11 * width), 1 + 13 * width, length.out = 11))
  scale$w <- scale$w * 2 * df * scale$x * dchisq(df * scale$x^2, df)
  list(z = rep(over_z$x, length(scale$x)), s = rep(scale$x, each = length(over_z$x)),
    w = as.vector(outer(over_z$w, scale$w)))
}
# P(T_i > c) at every node, one column a comparison.
tails <- function(g, c, lambda, ncp) vapply(seq_along(lambda), function(i)
  pnorm((c * g$s - ncp[i] - lambda[i] * g$z) / sqrt(1 - lambda[i]^2), lower.tail = FALSE), g$z)
rows <- function(m, f) Reduce(f, lapply(seq_len(ncol(m)), function(i) m[, i]))
any_above <- function(g, c, lambda, ncp) 1 - sum(g$w * rows(1 - tails(g, c, lambda, ncp), `*`))
all_above <- function(g, c, lambda, ncp) sum(g$w * rows(tails(g, c, lambda, ncp), `*`))
any_outside <- function(g, c, lambda)
  1 - sum(g$w * rows(1 - tails(g, c, lambda, 0 * lambda) - 1 + tails(g, -c, lambda, 0 * lambda), `*`))

quantile_of <- function(tail, df) if (is.null(df)) qnorm(tail, lower.tail = FALSE) else qt(tail, df, lower.tail = FALSE)
alone <- function(c, df, ncp) if (is.null(df)) pnorm(ncp - c) else
  vapply(ncp, function(d) { g <- grid(df); sum(g$w * pnorm(d - c * g$s)) }, 0)
dunnett <- function(alpha, sides, lambda, df) {
  g <- grid(df)
  excess <- function(c) (if (sides == 2) any_outside(g, c, lambda) else any_above(g, c, lambda, 0 * lambda)) - alpha
  k <- length(lambda)
  uniroot(excess, c(quantile_of(alpha / sides, df) - 1e-6, quantile_of(alpha / sides / k, df) + 1e-6), tol = 1e-14)$root
}
holm <- function(g, limits, lambda, ncp) {
  k <- length(lambda)
  above <- c(list(matrix(0, length(g$z), k)), lapply(limits, function(c) tails(g, c, lambda, ncp)),
    list(matrix(1, length(g$z), k)))
  between <- lapply(seq_len(k + 1), function(b) above[[b + 1]] - above[[b]])
  each <- numeric(k); all <- 0
  places <- as.matrix(expand.grid(rep(list(seq_len(k + 1)), k)))
  for (row in seq_len(nrow(places))) {
    place <- places[row, ]
    order_of <- order(place)
    kept <- which(place[order_of] > seq_len(k))
    rejected <- if (length(kept)) order_of[seq_len(kept[1] - 1)] else order_of
    if (!length(rejected)) next
    chance <- sum(g$w * Reduce(`*`, lapply(seq_len(k), function(i) between[[place[i]]][, i])))
    each[rejected] <- each[rejected] + chance
    if (length(rejected) == k) all <- all + chance
  }
  list(each = each, all = all)
}

# Critical value and powers of one strategy; lambda NULL for all pairs.
strategy <- function(adjust, goal, alpha, sides, df, lambda, ncp) {
  k <- length(ncp)
  c <- switch(adjust, none = , `fixed-sequence` = quantile_of(alpha / sides, df),
    bonferroni = , holm = quantile_of(alpha / k / sides, df), dunnett = dunnett(alpha, sides, lambda, df))
  if (is.null(lambda)) { each <- alone(c, df, ncp); return(list(c = c, each = each, power = min(each))) }
  g <- grid(df)
  if (adjust == "holm") {
    h <- holm(g, vapply(k:1, function(j) quantile_of(alpha / j / sides, df), 0), lambda, ncp)
    each <- h$each; any <- any_above(g, c, lambda, ncp); all <- h$all
  } else if (adjust == "fixed-sequence") {
    each <- vapply(seq_len(k), function(i) all_above(g, c, lambda[1:i], ncp[1:i]), 0); any <- each[1]; all <- each[k]
  } else {
    each <- alone(c, df, ncp); any <- any_above(g, c, lambda, ncp); all <- all_above(g, c, lambda, ncp)
  }
  list(c = c, each = each, any = any, all = all,
    power = switch(goal, `per-comparison` = min(each), disjunctive = any, conjunctive = all))
}

json <- function(x) {
  if (is.list(x)) {
    if (is.null(names(x))) return(paste0("[", paste(vapply(x, json, ""), collapse = ","), "]"))
    return(paste0("{", paste0("\"", names(x), "\":", vapply(x, json, ""), collapse = ","), "}"))
  }
  if (is.character(x)) return(paste0("\"", x, "\""))
  format(x, digits = 15, scientific = FALSE, trim = TRUE)
}
array_of <- function(v) as.list(unname(v))

one_case <- function(adjust, goal, clustered, pairs = FALSE) {
  arms <- if (adjust == "holm") pick(3, 3, 4) else pick(3, 4, 5); active <- arms - 1
  margin <- runif(1) < 0.25
  sides <- if (margin) 1 else pick(1, 2); alpha <- pick(0.01, 0.025, 0.05, 0.1)
  test <- list(hypothesis = if (margin) "non-inferiority" else "superiority", alpha = alpha, sides = sides)
  normal <- runif(1) < 0.2
  if (normal) test$reference <- "normal"
  sd <- number(1, 20)
  outcome <- list(kind = "continuous", difference = signif(sd * number(0.5, 1.1) * pick(-1, 1), 4), sd = sd)
  if (clustered) outcome$difference <- signif(outcome$difference * 0.6, 4)
  direction <- 1
  if (margin) {
    outcome$better <- pick("higher", "lower"); direction <- if (outcome$better == "higher") 1 else -1
    test$margin <- signif(sd * number(0.6, 1), 3); outcome$difference <- signif(direction * sd * number(-0.1, 0.3), 3)
  }
  covariates <- 0; v <- sd^2
  if (!clustered && runif(1) < 0.3) {
    rho <- number(0.2, 0.8); outcome$repeated <- list(baselines = 1, followUps = 1, correlation = rho)
    v <- v * (1 - rho^2); covariates <- 1
  }
  ratios <- if (runif(1) < 0.5) rep(1, arms) else c(1, round(runif(active, 0.4, 1.4), 2))
  comparisons <- list(against = if (pairs) "all-pairs" else "control", adjust = adjust, powerGoal = goal)
  own <- rep(outcome$difference, active)
  if (!pairs && runif(1) < 0.4) {
    own <- signif(outcome$difference * runif(active, 0.7, 1.3), 4)
    if (!margin && runif(1) < 0.4) own <- own * sample(c(-1, 1), active, TRUE)
    comparisons$effects <- array_of(own)
  }
  design <- if (clustered) list(family = "cluster", icc = number(0.005, 0.1), clusterSize = sample(5:40, 1),
    allocation = array_of(ratios), comparisons = comparisons)
    else list(family = "multi-arm", allocation = array_of(ratios), comparisons = comparisons)
  request <- list(outcome = outcome, test = test, design = design)
  kept <- 1
  if (!margin && runif(1) < 0.2) {
    request$dilution <- list(contamination = number(0.02, 0.2)); kept <- 1 - request$dilution$contamination
  }
  m <- if (clustered) design$clusterSize else 1
  per_unit <- if (clustered) v * (1 + (m - 1) * design$icc) / m else v
  versus <- if (pairs) unlist(lapply(seq_len(active), function(i) rep(i, arms - i))) else rep(1, active)
  arm <- if (pairs) unlist(lapply(seq_len(active), function(i) (i + 1):arms)) else 2:arms
  at <- function(u, target = own) {
    n <- ceiling_forgiving(u * ratios)
    df <- if (normal) NULL else sum(n) - arms - covariates
    effect <- kept * if (pairs) rep(target[1], length(arm)) else target
    se <- sqrt(per_unit * (1 / n[versus] + 1 / n[arm]))
    ncp <- if (margin) (direction * effect + test$margin) / se else abs(effect) / se
    lambda <- if (!pairs) sqrt(n[arm] / (n[arm] + n[1])) * (if (margin) 1 else sign(effect))
    c(list(n = n, se = se[1], df = df), strategy(adjust, goal, alpha, sides, df, lambda, ncp))
  }
  low <- 2
  while (any(ceiling_forgiving(low * ratios) < 2)) low <- low + 1
  aim <- pick(0.8, 0.9, number(0.5, 0.95))
  reaches <- function(u) at(u)$power >= aim
  high <- low
  while (!reaches(high)) { if (high > 400) return(one_case(adjust, goal, clustered, pairs)); high <- 2 * high }
  below <- low - 1
  while (high - below > 1) { middle <- (high + below) %/% 2; if (reaches(middle)) high <- middle else below <- middle }
  u <- high
  for (less in (high - 1):max(low, high - 8)) if (less >= low && less < high && reaches(less)) u <- less
  kind <- pick("size", "size", "power", if (margin) "size" else "effect")
  expected <- list()
  a <- at(u)
  if (kind == "size") request$aim <- list(find = "size", power = aim)
  else u <- max(low, u + sample(-4:4, 1))
  if (kind == "power") { request$aim <- list(find = "power", units = u); a <- at(u) }
  if (kind == "effect") {
    request$aim <- list(find = "effect", units = u, power = aim)
    side <- sign(own[1]); reach <- function(x) at(u, rep(side * x, active))$power - aim
    if (reach(1e-9 * sd) > 0) return(one_case(adjust, goal, clustered, pairs))
    found <- uniroot(reach, c(1e-9 * sd, 40 * sd), tol = 1e-14)$root
    expected$detectable <- side * found
    a <- at(u, rep(side * found, active))
  }
  expected <- c(expected, list(units = u, participants = sum(a$n) * m, power = a$power, standardError = a$se,
    criticalValue = a$c, perComparison = array_of(a$each)))
  if (!normal) expected$df <- a$df
  if (!pairs) { expected$disjunctivePower <- a$any; expected$conjunctivePower <- a$all }
  if (adjust %in% c("none", "fixed-sequence")) expected$alphaPerComparison <- alpha
  if (adjust == "bonferroni") expected$alphaPerComparison <- alpha / length(arm)
  list(request = request, expected = expected)
}

cases <- list()
for (adjust in c("none", "bonferroni", "holm", "dunnett", "fixed-sequence"))
  for (goal in c("per-comparison", "disjunctive", "conjunctive"))
    for (family in c("multi-arm", "multi-arm", "multi-arm", "cluster"))
      cases <- c(cases, list(c(list(id = paste(family, adjust, goal, length(cases) + 1)),
        one_case(adjust, goal, family == "cluster"))))
for (adjust in c("none", "bonferroni"))
  for (family in c("multi-arm", "multi-arm", "cluster"))
    cases <- c(cases, list(c(list(id = paste(family, adjust, "all pairs", length(cases) + 1)),
      one_case(adjust, "per-comparison", family == "cluster", TRUE))))
cat("[\n", paste(vapply(cases, json, ""), collapse = ",\n"), "\n]\n", sep = "")
