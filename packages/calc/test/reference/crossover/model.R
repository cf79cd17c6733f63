# Crossovers in base R, written from docs/crossover.md, with nothing of Steelyard's own code: ordinary least squares
# with one indicator for each participant. Sourced by the scripts here; the tests come from ../periods/model.R.

source("../periods/model.R")

# One row per participant and period: participants, periods, carryover where asked for, treatments.
design_matrix <- function(sequences, carryover, copies = 1) {
  given <- do.call(rbind, strsplit(sequences, ""))
  given <- given[rep(seq_len(nrow(given)), copies), , drop = FALSE]
  letters_used <- sort(unique(c(given)))
  n <- nrow(given); periods <- ncol(given)
  who <- rep(seq_len(n), each = periods); when <- rep(seq_len(periods), n)
  now <- c(t(given)); before <- c(t(cbind("", given[, -periods, drop = FALSE])))
  indicator <- function(values, levels) outer(values, levels, "==") * 1
  active <- letters_used[-1]
  list(X = cbind(indicator(who, seq_len(n)), indicator(when, seq_len(periods)[-1]),
      if (carryover) indicator(before, active), indicator(now, active)),
    nuisance = n + periods - 1 + (if (carryover) length(active) else 0),
    active = active, given = given, who = who, when = when)
}

# Variances of each active treatment's difference from A for sigma^2 (1 - rho) = 1 and one participant in each
# sequence; NULL where something is not estimable.
variances_of <- function(sequences, carryover) {
  d <- design_matrix(sequences, carryover)
  if (qr(d$X, tol = 1e-9)$rank < ncol(d$X)) return(NULL)
  inverse <- chol2inv(qr.R(qr(d$X, LAPACK = FALSE)))
  diag(inverse)[seq(d$nuisance + 1, ncol(d$X))]
}
