# Appraisals of randomly varied designs over cluster periods in base R. Run: Rscript cases.R > cases.json
# Sizes are found by stepping over whole numbers; power comes from pt(ncp), pnorm and, for equivalence, from
# integrating over the estimated SD.

source("model.R")
set.seed(20261203)
pick <- function(...) sample(c(...), 1)
number <- function(low, high, digits = 3) signif(runif(1, low, high), digits)
chance <- function(p) runif(1) < p

draw_schedule <- function() repeat {
  periods <- sample(2:5, 1); sequences <- sample(2:5, 1)
  cells <- matrix(sample(c(0, 1), periods * sequences, TRUE), sequences)
  cells[matrix(runif(periods * sequences) < pick(0, 0, 0.25), sequences)] <- NA
  if (periods > 3 && chance(0.2)) cells[, 2] <- NA
  both <- apply(cells, 2, function(column) any(column == 0, na.rm = TRUE) && any(column == 1, na.rm = TRUE))
  if (any(both) && all(rowSums(!is.na(cells)) > 0)) return(cells)
}

design_of <- function(i) {
  d <- list(family = pick("cluster-baseline", "cluster-crossover", "stepped-wedge", "stepped-wedge",
    "cluster-schedule", "cluster-schedule"))
  if (d$family == "cluster-baseline") cells <- rbind(c(0, 0), c(0, 1))
  if (d$family == "cluster-crossover") cells <- rbind(c(0, 1), c(1, 0))
  if (d$family == "stepped-wedge") {
    d$steps <- sample(2:6, 1); baseline <- 1; transition <- 0
    if (chance(0.3)) { baseline <- pick(0, 2, 3); d$baselinePeriods <- baseline }
    if (chance(0.3)) { transition <- pick(1, 2); d$transitionPeriods <- transition }
    cells <- wedge(d$steps, baseline, transition)
    measured <- cells; measured[measured == 2] <- NA
    both <- apply(measured, 2, function(x) any(x == 0, na.rm = TRUE) && any(x == 1, na.rm = TRUE))
    if (!any(both)) return(design_of(i))
  }
  if (d$family == "cluster-schedule") { cells <- draw_schedule(); d$schedule <- rows_of(cells) }
  d$icc <- pick(0, 0.3, number(0.001, 0.3), number(0.005, 0.1), number(0.005, 0.1))
  d$cac <- pick(1, 0.2, 0, number(0.3, 0.99), number(0.3, 0.99), number(0.3, 0.99))
  if (chance(0.3)) d$decay <- TRUE
  if (chance(0.4)) d$iac <- pick(0, 0.9, number(0.1, 0.9))
  d$clusterSize <- pick(1, 2, 5000, sample(3:100, 4))
  if (chance(0.35)) d$clusterSizeCv <- pick(0, 1, number(0.1, 0.9))
  if (chance(0.35)) d$allocation <- as.list(sample(c(1, 1, 2, 3, 1.5, 0.7), nrow(cells), TRUE))
  list(d = d, cells = cells)
}

one_case <- function(i) {
  drawn <- design_of(i); d <- drawn$d; cells <- drawn$cells
  binary <- chance(0.3)
  hypothesis <- if (binary) pick("superiority", "superiority", "non-inferiority")
    else pick("superiority", "superiority", "non-inferiority", "equivalence")
  test <- list(hypothesis = hypothesis, alpha = pick(0.001, 0.01, 0.025, 0.05, 0.1),
    sides = if (hypothesis == "superiority") pick(1, 2) else 1)
  if (chance(0.2)) test$reference <- "normal"
  better <- pick("higher", "lower"); sign <- if (better == "higher") 1 else -1

  measured <- cells; measured[measured == 2] <- NA
  share <- if (is.null(d$allocation)) rep(1, nrow(cells)) else unlist(d$allocation)
  clusters <- function(u) up(u * share / share[1])
  low <- 1; while (any(clusters(low) < 1) || sum(clusters(low)) < 3) low <- low + 1
  info <- information(cells, d, d$clusterSize)
  # A target that some tens of clusters can detect.
  size <- sqrt(variance(info, clusters(low + sample(0:8, 1)))) * runif(1, 2.2, 5)
  if (binary) {
    p0 <- number(0.25, 0.75); size <- min(size * 0.45, 0.2)
    if (hypothesis == "superiority") p1 <- signif(p0 + size * pick(-1, 1), 4)
    else { p1 <- signif(p0 + size * pick(0, 0.1, -0.1), 4); test$margin <- signif(size, 3) }
    outcome <- list(kind = "binary", control = p0, active = p1)
  } else {
    sd <- number(0.5, 20)
    outcome <- list(kind = "continuous", difference = signif(sd * size * pick(-1, 1), 4), sd = sd)
    if (hypothesis != "superiority") {
      outcome$difference <- signif(sd * size * pick(0, 0.1, -0.1), 4); test$margin <- signif(sd * size, 4)
    }
  }
  if (hypothesis != "superiority") outcome$better <- better
  request <- list(outcome = outcome, test = test, design = d)
  lost <- pick(0, 0, 0.1, 0.25); lost_clusters <- pick(0, 0, 0.1)
  if (lost + lost_clusters > 0) request$attrition <- list(participants = lost, units = lost_clusters)
  kept <- 1
  if (chance(0.2)) {
    request$dilution <- list(contamination = number(0.01, 0.2), nonAdherence = number(0.01, 0.1))
    kept <- (1 - request$dilution$contamination) * (1 - request$dilution$nonAdherence)
  }
  target <- if (binary) outcome$active else outcome$difference
  null <- if (binary) outcome$control else 0
  unit_variance <- function(x) if (!binary) outcome$sd^2 else {
    p <- c(null, null + (x - null) * kept); mean(p * (1 - p))
  }
  at <- function(u, x = target, known = info) {
    k <- clusters(u); v <- variance(known, k); se <- sqrt(unit_variance(x) * v)
    list(k = k, v = v, se = se, df = sum(k) - 2,
      power = power_of(test, sign, (x - null) * kept, se, sum(k) - 2))
  }

  aim <- pick(0.8, 0.9, number(0.5, 0.95)); u <- low
  while (at(u)$power < aim && u < 400) u <- u + 1
  if (at(u)$power < aim) return(one_case(i))
  # Rounded shares can reach the power below a size that does not.
  kind <- pick("size", "size", "power", if (hypothesis == "superiority") "effect" else "power", "cluster-size")
  m <- d$clusterSize; x <- target; expected <- list()
  if (kind == "size") request$aim <- list(find = "size", power = aim)
  if (kind %in% c("power", "effect")) u <- if (chance(0.25)) low else max(low, u + sample(-4:4, 1))
  if (kind == "power") request$aim <- list(find = "power", units = u)
  if (kind == "effect") {
    edge <- if (!binary) 1000 * target else if (target > null) 1 - 1e-9 else 1e-9
    reach <- function(x) at(u, x)$power - aim
    if (reach(edge) < 0) return(one_case(i))
    x <- uniroot(reach, c(null + 1e-12 * (target - null), edge), tol = 1e-16, maxiter = 10000)$root
    request$aim <- list(find = "effect", units = u, power = aim); expected$detectable <- x
  }
  if (kind == "cluster-size") {
    u <- max(low, u + sample(-2:3, 1))
    request$aim <- list(find = "cluster-size", units = u, power = aim)
    # The limit is left to the cases in which it is not singular.
    if (d$icc == 0 || d$cac == 1) limit <- 1 else {
      unlimited <- information(cells, d, Inf); limit <- at(u, known = unlimited)$power
    }
    if (limit <= aim) {
      fewest <- low; while (at(fewest, known = unlimited)$power <= aim) fewest <- fewest + 1
      return(list(request = request, expected = list(limitingPower = limit, fewestUnits = fewest)))
    }
    by_size <- function(m) at(u, known = information(cells, d, m))$power
    m <- 1; while (by_size(m) < aim && m < 3000) m <- 2 * m
    if (by_size(m) < aim) return(one_case(i))
    while (m > 1 && by_size(m - 1) >= aim) m <- m - 1
    if (m == 1 && d$clusterSize == 1) return(one_case(i))
    info <- information(cells, d, m); expected$clusterSize <- m
  }
  a <- at(u, x); k <- a$k
  visits <- rowSums(!is.na(measured)); cohort <- !is.null(d$iac) && d$iac > 0
  intakes <- if (cohort) rep(1, length(visits)) else visits
  kr <- up(k / (1 - lost_clusters)); mr <- up(m / (1 - lost))
  under <- function(arm) sum(kr * rowSums(!is.na(measured) & measured == arm)) * mr
  expected <- c(expected, list(units = u, clusters = sum(k), participants = sum(k * intakes) * m,
    recruited = sum(kr * intakes) * mr, recruitedClusters = sum(kr), measurements = sum(kr * visits) * mr,
    exposures = list(under(0), under(1)), power = a$power, standardError = a$se,
    designEffect = a$v * sum(k * visits) * m / 4))
  if (is.null(test$reference)) expected$df <- a$df
  list(request = request, expected = expected)
}

# Where the limit is singular and treatment stays with the cluster, only the means of clusters tell:
# variance rho (1/k0 + 1/k1).
parallel_in_periods <- function(periods, k, icc, aim) {
  schedule <- rbind(rep(0, periods), rep(1, periods))
  limit <- one_bound(5, 10 * sqrt(icc * 2 / k), 2 * k - 2, 0.025)
  fewest <- k; while (one_bound(5, 10 * sqrt(icc * 2 / fewest), 2 * fewest - 2, 0.025) <= aim) fewest <- fewest + 1
  list(request = list(outcome = list(kind = "continuous", difference = 5, sd = 10),
    test = list(hypothesis = "superiority", alpha = 0.05, sides = 2),
    design = list(family = "cluster-schedule", schedule = rows_of(schedule), icc = icc, cac = 1, clusterSize = 1),
    aim = list(find = "cluster-size", units = k, power = aim)),
    expected = list(limitingPower = limit, fewestUnits = fewest))
}

cases <- lapply(1:200, function(i) c(list(id = paste("periods", i)), one_case(i)))
cases <- c(cases, list(c(list(id = "parallel in two periods"), parallel_in_periods(2, 6, 0.1, 0.9)),
  c(list(id = "parallel in four periods"), parallel_in_periods(4, 4, 0.2, 0.8))))
cat("[\n", paste(vapply(cases, json, ""), collapse = ",\n"), "\n]\n", sep = "")
