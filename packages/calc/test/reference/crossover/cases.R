# Appraisals of randomly varied crossovers in base R. Run: Rscript cases.R > cases.json
# Degrees of freedom are counted as rows less the rank of the design matrix; sizes are found by stepping.

source("model.R")
set.seed(20261204)
pick <- function(...) sample(c(...), 1)
number <- function(low, high, digits = 3) signif(runif(1, low, high), digits)
chance <- function(p) runif(1) < p

known <- list(c("AB", "BA"), c("BA", "AB"), c("ABB", "BAA"), c("ABA", "BAB"), c("ABBA", "BAAB"), c("AABB", "BBAA"),
  c("AB", "BA", "AA", "BB"), c("ABB", "BAA", "AAB", "BBA"), c("ABC", "BCA", "CAB"),
  c("ABC", "BCA", "CAB", "ACB", "BAC", "CBA"), c("ADBC", "BACD", "CBDA", "DCAB"), c("AB", "BC", "CA", "BA", "CB", "AC"),
  c("ABCD", "BDAC", "CADB", "DCBA"), c("ABCDE", "BCDEA", "CDEAB", "DEABC", "EABCD", "EDCBA", "AEDCB", "BAEDC"),
  c("ABC", "ACB", "BAC"), c("AB", "AB", "BA"))
draw <- function() repeat {
  s <- if (chance(0.6)) known[[sample(length(known), 1)]] else {
    k <- sample(2:4, 1); periods <- sample(2:5, 1)
    replicate(sample(2:6, 1), paste(sample(LETTERS[1:k], periods, TRUE), collapse = ""))
  }
  used <- sort(unique(strsplit(paste(s, collapse = ""), "")[[1]]))
  if (length(used) > 1 && identical(used, LETTERS[seq_along(used)])) return(s)
}

mean_case <- function(i) repeat {
  s <- draw(); carryover <- chance(0.35)
  v <- variances_of(s, carryover)
  if (is.null(v)) next
  periods <- nchar(s[1]); hypothesis <- pick("superiority", "superiority", "non-inferiority", "equivalence")
  rho <- pick(number(0, 0.95), number(0.3, 0.9), if (periods == 2) number(-0.9, 0) else 0)
  test <- list(hypothesis = hypothesis, alpha = pick(0.001, 0.01, 0.025, 0.05, 0.1),
    sides = if (hypothesis == "superiority") pick(1, 2) else 1)
  if (chance(0.2)) test$reference <- "normal"
  better <- pick("higher", "lower"); sign <- if (better == "higher") 1 else -1
  sd <- number(0.5, 20); size <- sd * sqrt((1 - rho) * max(v) / sample(2:20, 1)) * runif(1, 2.2, 5)
  outcome <- list(kind = "continuous", difference = signif(size * pick(-1, 1), 4), sd = sd)
  if (hypothesis != "superiority") {
    outcome$difference <- signif(size * pick(0, 0.1, -0.1), 4); test$margin <- signif(size, 4); outcome$better <- better
  }
  design <- list(family = "crossover", sequences = as.list(s), correlation = rho)
  if (carryover || chance(0.1)) design$carryover <- carryover
  comparisons <- length(v); share <- 1; own <- rep(outcome$difference, comparisons)
  if (comparisons > 1 && chance(0.6)) {
    adjust <- pick("none", "bonferroni"); if (adjust == "bonferroni") share <- comparisons
    design$comparisons <- list(against = "control", adjust = adjust, powerGoal = "per-comparison")
    if (chance(0.3)) {
      own <- signif(outcome$difference * runif(comparisons, 0.8, 1.2), 4); design$comparisons$effects <- as.list(own)
    }
  }
  vary <- !is.null(design$comparisons$effects)
  if (any(own == 0) && hypothesis == "superiority") next
  request <- list(outcome = outcome, test = test, design = design)
  lost <- pick(0, 0, 0.1, 0.3); if (lost > 0) request$attrition <- list(participants = lost)
  kept <- 1
  if (chance(0.2)) { request$dilution <- list(contamination = 0.1, nonAdherence = 0.05); kept <- 0.9 * 0.95 }
  each <- test; each$alpha <- test$alpha / share
  within <- qr(design_matrix(s, carryover)$X, tol = 1e-9)$rank - length(s)
  at <- function(u, effects = own) {
    n <- u * length(s); df <- n * periods - n - within; se <- sd * sqrt((1 - rho) * v / u)
    power <- vapply(seq_along(v), function(k) power_of(each, sign, effects[k] * kept, se[k], df), 0)
    list(se = se[1], df = df, power = min(power), each = power)
  }
  aim <- pick(0.8, 0.9, number(0.5, 0.95)); u <- 2
  while (at(u)$power < aim && u < 500) u <- u + 1
  if (at(u)$power < aim) next
  kind <- pick("size", "size", "power", if (hypothesis == "superiority" && !vary) "effect" else "power")
  expected <- list(); effects <- own
  if (kind == "size") request$aim <- list(find = "size", power = aim)
  else u <- if (chance(0.25)) 2 else max(2, u + sample(-4:4, 1))
  if (kind == "power") request$aim <- list(find = "power", units = u)
  if (kind == "effect") {
    x <- uniroot(function(x) at(u, rep(x, comparisons))$power - aim, sort(own[1] * c(1e-12, 1000)), tol = 1e-16,
      maxiter = 10000)$root
    request$aim <- list(find = "effect", units = u, power = aim); expected$detectable <- x
    effects <- rep(x, comparisons)
  }
  a <- at(u, effects); recruited <- up(u / (1 - lost))
  given <- strsplit(paste(s, collapse = ""), "")[[1]]
  expected <- c(expected, list(units = u, participants = u * length(s), recruited = recruited * length(s),
    measurements = recruited * length(s) * periods,
    exposures = as.list(vapply(LETTERS[seq_len(comparisons + 1)], function(l) recruited * sum(given == l), 0, USE.NAMES = FALSE)),
    power = a$power, standardError = a$se, perComparison = as.list(a$each)))
  if (is.null(test$reference)) expected$df <- a$df
  return(list(request = request, expected = expected))
}

proportion_case <- function(i) repeat {
  p0 <- number(0.05, 0.95); p1 <- signif(p0 + number(0.05, 0.3) * pick(-1, 1), 3)
  if (p1 < 0.03 || p1 > 0.97) next
  phi <- pick(0, number(-0.5, 0.9), number(0, 0.8))
  table_at <- function(x) {
    pi <- phi * sqrt(p0 * (1 - p0) * x * (1 - x))
    c(p0 * x + pi, (1 - p0) * (1 - x) + pi, x * (1 - p0) - pi, p0 * (1 - x) - pi)
  }
  if (any(table_at(p1) < 0.002)) next
  test <- list(hypothesis = "superiority", alpha = pick(0.001, 0.01, 0.05, 0.1), sides = pick(1, 2))
  request <- list(outcome = list(kind = "binary", control = p0, active = p1), test = test,
    design = list(family = "crossover", sequences = list("AB", "BA"), correlation = phi))
  lost <- pick(0, 0, 0.15); if (lost > 0) request$attrition <- list(participants = lost)
  at <- function(u, x = p1) {
    cells <- table_at(x); psi <- cells[3] + cells[4]; delta <- x - p0; n <- 2 * u
    z <- qnorm(test$alpha / test$sides, lower.tail = FALSE)
    list(se = sqrt((psi - delta^2) / n), possible = all(cells > 0),
      power = pnorm((abs(delta) * sqrt(n) - z * sqrt(psi)) / sqrt(psi - delta^2)))
  }
  aim <- pick(0.8, 0.9, number(0.5, 0.95)); u <- 2; while (at(u)$power < aim) u <- u + 1
  kind <- pick("size", "size", "power", "effect"); x <- p1; expected <- list()
  if (kind == "size") request$aim <- list(find = "size", power = aim) else u <- max(2, u + sample(-4:4, 1))
  if (kind == "power") request$aim <- list(find = "power", units = u)
  if (kind == "effect") {
    edge <- p0 + (p1 - p0) * 1.5
    if (edge <= 0.01 || edge >= 0.99 || !at(u, edge)$possible || at(u, edge)$power < aim) next
    x <- uniroot(function(x) at(u, x)$power - aim, sort(c(p0 + 1e-9 * (p1 - p0), edge)), tol = 1e-16, maxiter = 10000)$root
    request$aim <- list(find = "effect", units = u, power = aim); expected$detectable <- x
  }
  a <- at(u, x)
  expected <- c(expected, list(units = u, participants = 2 * u, recruited = 2 * up(u / (1 - lost)), power = a$power,
    standardError = a$se))
  return(list(request = request, expected = expected))
}

cases <- c(lapply(1:110, function(i) c(list(id = paste("means", i)), mean_case(i))),
  lapply(1:40, function(i) c(list(id = paste("proportions", i)), proportion_case(i))))
cat("[\n", paste(vapply(cases, json, ""), collapse = ",\n"), "\n]\n", sep = "")
