# Crossovers simulated in base R: participants with their own level, period effects, and the analysis within
# participants. Run: Rscript simulation.R [seed] [runs] > simulated.json

source("model.R")
arguments <- as.numeric(commandArgs(TRUE))
set.seed(if (length(arguments) > 0) arguments[1] else 20261206)
runs <- if (length(arguments) > 1) arguments[2] else 20000

# Least squares of all treatments against A with participants fixed, in every simulated trial at once.
fitted <- function(sequences, carryover, units, sd, rho) {
  d <- design_matrix(sequences, carryover, units); n <- nrow(d$X)
  noise <- sd * (sqrt(rho) * matrix(rnorm(runs * max(d$who)), runs)[, d$who] +
    sqrt(1 - rho) * matrix(rnorm(runs * n), runs))
  Q <- qr.Q(qr(d$X)); df <- n - ncol(d$X)
  solver <- chol2inv(qr.R(qr(d$X))); estimates <- noise %*% d$X %*% solver
  rest <- noise - (noise %*% Q) %*% t(Q)
  sigma <- sqrt(rowSums(rest^2) / df); at <- seq(d$nuisance + 1, ncol(d$X))
  list(estimate = estimates[, at, drop = FALSE], se = outer(sigma, sqrt(diag(solver)[at])), df = df)
}
means <- function(id, sequences, units, difference, sd, rho, carryover = FALSE, alpha = 0.05, sides = 2, adjust = NULL,
                  hypothesis = "superiority", margin = NULL, better = NULL) {
  fit <- fitted(sequences, carryover, units, sd, rho); k <- ncol(fit$estimate)
  tail <- alpha / sides / (if (identical(adjust, "bonferroni")) k else 1)
  bound <- qt(tail, fit$df, lower.tail = FALSE); sign <- if (identical(better, "lower")) -1 else 1
  reject <- function(delta) {
    estimate <- fit$estimate + delta
    colSums(switch(hypothesis, "superiority" = sign(difference) * estimate / fit$se > bound,
      "non-inferiority" = (sign * estimate + margin) / fit$se > bound,
      "equivalence" = (margin - estimate) / fit$se > bound & (estimate + margin) / fit$se > bound))
  }
  null <- switch(hypothesis, "superiority" = 0, "non-inferiority" = -sign * margin, "equivalence" = margin)
  design <- list(family = "crossover", sequences = as.list(sequences), correlation = rho, carryover = carryover)
  if (!is.null(adjust)) design$comparisons <- list(against = "control", adjust = adjust, powerGoal = "per-comparison")
  list(id = id, request = list(outcome = c(list(kind = "continuous", difference = difference, sd = sd), if (!is.null(better)) list(better = better)),
    test = c(list(hypothesis = hypothesis, alpha = alpha, sides = sides), if (!is.null(margin)) list(margin = margin)),
    design = design, aim = list(find = "power", units = units)), runs = runs, tail = tail,
    rejected = as.list(reject(difference)), rejectedUnderNull = as.list(reject(null)))
}

# McNemar's test without continuity correction; its statistic is (b - c)/sqrt(b + c).
proportions <- function(id, p0, p1, phi, units, alpha = 0.05, sides = 2) {
  draw <- function(p0, p1) {
    pi <- phi * sqrt(p0 * (1 - p0) * p1 * (1 - p1))
    cells <- c(p1 * (1 - p0) - pi, p0 * (1 - p1) - pi)
    gained <- rbinom(runs, 2 * units, cells[1]); lost <- rbinom(runs, 2 * units - gained, cells[2] / (1 - cells[1]))
    sum((sign(target) * (gained - lost) / sqrt(pmax(1, gained + lost))) > qnorm(alpha / sides, lower.tail = FALSE))
  }
  target <- p1 - p0
  list(id = id, request = list(outcome = list(kind = "binary", control = p0, active = p1),
    test = list(hypothesis = "superiority", alpha = alpha, sides = sides),
    design = list(family = "crossover", sequences = list("AB", "BA"), correlation = phi), aim = list(find = "power", units = units)),
    runs = runs, tail = alpha / sides, rejected = list(draw(p0, p1)), rejectedUnderNull = list(draw(p0, p0)))
}

out <- list(
  means("AB/BA", c("AB", "BA"), 8, 5, 6, 0.5),
  means("AB/BA, non-inferiority", c("AB", "BA"), 10, -0.5, 6, 0.6, sides = 1, alpha = 0.025, hypothesis = "non-inferiority", margin = 4.5, better = "higher"),
  means("AB/BA, equivalence", c("AB", "BA"), 9, 0.3, 5, 0.6, sides = 1, hypothesis = "equivalence", margin = 3.5),
  means("ABB/BAA with carryover", c("ABB", "BAA"), 7, -5, 8, 0.4, carryover = TRUE, sides = 1),
  means("ABBA/BAAB", c("ABBA", "BAAB"), 6, 4, 7, 0.3),
  means("Williams square of four with carryover", c("ADBC", "BACD", "CBDA", "DCAB"), 5, 6, 8, 0.5, carryover = TRUE, adjust = "bonferroni"),
  means("three treatments in six orders", c("ABC", "BCA", "CAB", "ACB", "BAC", "CBA"), 3, 5, 8, 0.6, adjust = "none"),
  proportions("proportions in AB/BA", 0.4, 0.55, 0.3, 75),
  proportions("few proportions in AB/BA", 0.3, 0.6, 0.2, 16, alpha = 0.05, sides = 1))
cat("[\n", paste(vapply(out, json, ""), collapse = ",\n"), "\n]\n", sep = "")
