# Appraisals of factorial, partially nested and three-level requests in base R, written from the formulas in
# docs/, with nothing of Steelyard's own code. Run: Rscript cases.R > cases.json
# Sizes are found by stepping over whole numbers; power comes from pt(ncp), pnorm and, for equivalence, from
# integrating over the estimated SD.

set.seed(20261201)

up <- function(x) ceiling(x - 1e-9)
pick <- function(...) sample(c(...), 1)
number <- function(low, high, digits = 3) signif(runif(1, low, high), digits)

json <- function(x) {
  if (is.list(x)) {
    if (is.null(names(x))) return(paste0("[", paste(vapply(x, json, ""), collapse = ","), "]"))
    return(paste0("{", paste0("\"", names(x), "\":", vapply(x, json, ""), collapse = ","), "}"))
  }
  if (is.character(x)) return(paste0("\"", x, "\""))
  format(x, digits = 15, scientific = FALSE, trim = TRUE)
}

# Chance of rejecting, with df = Inf for the normal reference.
one_bound <- function(distance, se, df, tail) {
  if (!is.finite(df)) return(pnorm(distance / se - qnorm(tail, lower.tail = FALSE)))
  pt(qt(tail, df, lower.tail = FALSE), df, distance / se, lower.tail = FALSE)
}
both_bounds <- function(delta, margin, se, df, alpha) {
  low <- (-margin - delta) / se; high <- (margin - delta) / se
  if (!is.finite(df)) { z <- qnorm(alpha, lower.tail = FALSE); return(max(0, pnorm(high - z) - pnorm(low + z))) }
  t <- qt(alpha, df, lower.tail = FALSE)
  most <- (high - low) / (2 * t)
  density <- function(s) 2 * df * s * dchisq(df * s^2, df)
  inside <- function(s) pmax(0, pnorm(high - t * s) - pnorm(low + t * s)) * density(s)
  ends <- sqrt(qchisq(c(1e-18, 0.1, 0.5, 0.9), df) / df)
  ends <- c(0, ends[ends < most], min(most, sqrt(qchisq(1e-18, df, lower.tail = FALSE) / df)))
  ends <- sort(unique(ends))
  sum(vapply(seq_len(length(ends) - 1), function(i)
    integrate(inside, ends[i], ends[i + 1], rel.tol = 1e-12, abs.tol = 1e-14, subdivisions = 2000)$value, 0))
}

test_plan <- function(hypotheses) {
  hypothesis <- pick(hypotheses)
  sides <- if (hypothesis == "superiority") pick(1, 2) else 1
  plan <- list(hypothesis = hypothesis, alpha = pick(0.001, 0.01, 0.025, 0.05, 0.1), sides = sides)
  if (runif(1) < 0.2) plan$reference <- "normal"
  plan
}
losses <- function(request, clusters) {
  lost <- pick(0, 0, 0.05, 0.12, 0.2, 0.33, 0.5)
  if (lost > 0) request$attrition <- list(participants = lost)
  if (clusters && runif(1) < 0.4) request$attrition <- c(request$attrition, list(units = pick(0.05, 0.1, 0.25)))
  if (runif(1) < 0.25) request$dilution <- list(contamination = number(0.01, 0.3), nonAdherence = number(0.01, 0.2))
  request
}
lost_of <- function(request, what) { v <- request$attrition[[what]]; if (is.null(v)) 0 else v }
kept <- function(request) {
  d <- request$dilution
  if (is.null(d)) 1 else (1 - d$contamination) * (1 - d$nonAdherence)
}

# An outcome, its test and how far each target is from what must be ruled out.
question <- function(hypotheses, effect, binary = FALSE) {
  test <- test_plan(hypotheses); better <- pick("higher", "lower"); sign <- if (better == "higher") 1 else -1
  if (binary) {
    p0 <- number(0.2, 0.8)
    if (test$hypothesis == "superiority") p1 <- signif(p0 + number(effect, 0.19) * pick(-1, 1), 3)
    else { p1 <- signif(p0 + pick(0, 0.02, -0.03), 3); test$margin <- number(0.08, 0.2) }
    outcome <- list(kind = "binary", control = p0, active = p1)
  } else {
    sd <- pick(1, number(0.1, 30))
    if (test$hypothesis == "superiority") difference <- signif(sd * number(effect, 1.2) * pick(-1, 1), 4)
    else { difference <- signif(sd * pick(0, 0.05, -0.08), 4); test$margin <- signif(sd * number(effect, 1), 4) }
    outcome <- list(kind = "continuous", difference = difference, sd = sd)
  }
  if (test$hypothesis != "superiority" || runif(1) < 0.2) outcome$better <- better
  list(outcome = outcome, test = test, sign = sign, binary = binary)
}

# Effect and variances of the two arms at a target.
moved <- function(q, request, target) {
  if (!q$binary) return(list(delta = target * kept(request), v = rep(q$outcome$sd^2, 2)))
  p <- c(q$outcome$control, q$outcome$control + (target - q$outcome$control) * kept(request))
  list(delta = p[2] - p[1], v = p * (1 - p))
}
power_of <- function(q, delta, se, df) {
  test <- q$test; if (!is.null(test$reference)) df <- Inf
  switch(test$hypothesis,
    "superiority" = one_bound(abs(delta), se, df, test$alpha / test$sides),
    "non-inferiority" = one_bound(q$sign * delta + test$margin, se, df, test$alpha),
    "equivalence" = both_bounds(delta, test$margin, se, df, test$alpha))
}

# One case: the size for an aimed power, the power near it, or the effect detectable there.
finish <- function(q, request, shape, low) {
  target <- if (q$binary) q$outcome$active else q$outcome$difference
  null <- if (q$binary) q$outcome$control else 0
  at <- function(u, x = target) {
    s <- shape(u, moved(q, request, x)$v); s$delta <- moved(q, request, x)$delta
    c(s, list(power = power_of(q, s$delta, s$se, s$df)))
  }
  aim <- pick(0.8, 0.9, number(0.5, 0.95))
  u <- low; while (at(u)$power < aim) u <- u + 1
  kind <- pick("size", "size", "power", if (q$test$hypothesis == "superiority") "effect" else "power")
  if (kind != "size") u <- max(low, u + sample(-5:5, 1))
  if (kind == "power" && runif(1) < 0.2) u <- low
  request$aim <- switch(kind, size = list(find = "size", power = aim), power = list(find = "power", units = u),
    effect = list(find = "effect", units = u, power = aim))
  expected <- list(); x <- target
  if (kind == "effect") {
    edge <- if (!q$binary) 1000 * target else if (target > null) 1 - 1e-9 else 1e-9
    reach <- function(x) at(u, x)$power - aim
    if (reach(edge) < 0) return(finish(q, request[names(request) != "aim"], shape, low))
    x <- uniroot(reach, c(null + 1e-12 * (target - null), edge), tol = 1e-16, maxiter = 10000)$root
    expected$detectable <- x
  }
  a <- at(u, x)
  expected <- c(expected, list(units = u, participants = a$participants, recruited = a$recruited,
    power = a$power, standardError = a$se))
  if (is.null(q$test$reference)) expected$df <- a$df
  list(request = request, expected = c(expected, a$more))
}

factorial_case <- function(i) {
  q <- question("superiority", 0.15)
  request <- losses(list(outcome = q$outcome, test = q$test,
    design = list(family = "factorial", estimand = pick("main-effect", "interaction"))), FALSE)
  factor <- if (request$design$estimand == "main-effect") 2 else 4
  shape <- function(u, v) list(participants = 4 * u, recruited = 4 * up(u / (1 - lost_of(request, "participants"))),
    se = factor * sqrt(v[1] / (4 * u)), df = 4 * u - 4, more = NULL)
  finish(q, request, shape, 2)
}

nested_case <- function(i) {
  q <- question(c("superiority", "superiority", "non-inferiority"), 0.25)
  m <- if (i %% 10 == 0) 1 else sample(2:30, 1)
  rho <- if (i %% 10 == 1) 0 else if (i %% 20 == 2) 1 else number(0.001, 0.4)
  design <- list(family = "partially-nested", icc = rho, groupSize = m)
  share <- c(1, 1)
  if (runif(1) < 0.5) { share <- c(1, pick(0.5, 2 / 3, 1.4, 2, 3)); design$allocation <- as.list(share) }
  request <- losses(list(outcome = q$outcome, test = q$test, design = design), FALSE)
  shape <- function(u, v) {
    n <- c(up(u * m * share[1] / share[2]), u * m)
    part <- v[1] * c(1 / n[1], (1 + (m - 1) * rho) / n[2])
    list(participants = sum(n), recruited = sum(up(n / (1 - lost_of(request, "participants")))),
      se = sqrt(sum(part)), df = sum(part)^2 / (part[1]^2 / (n[1] - 1) + part[2]^2 / (u - 1)), more = NULL)
  }
  low <- 2; while (up(low * m * share[1] / share[2]) < 2) low <- low + 1
  finish(q, request, shape, low)
}

three_level_case <- function(i) {
  binary <- runif(1) < 0.35
  q <- question(if (binary) c("superiority", "superiority", "non-inferiority")
    else c("superiority", "non-inferiority", "equivalence"), if (binary) 0.08 else 0.3, binary)
  rho <- c(number(0.001, 0.1), 0); rho[2] <- signif(rho[1] + number(0.001, 0.3), 4)
  if (i %% 10 == 0) rho <- c(0, 0)
  if (i %% 10 == 1) rho[2] <- rho[1]
  if (i %% 10 == 2) rho <- c(0, 1)
  n1 <- if (i %% 8 == 3) 1 else sample(2:40, 1)
  n2 <- if (i %% 8 == 4) 1 else sample(2:12, 1)
  design <- list(family = "three-level-cluster", iccCluster = rho[1], iccSubcluster = rho[2],
    subclusterSize = n1, subclustersPerCluster = n2)
  ratio <- c(1, 1)
  if (runif(1) < 0.4) { ratio <- c(1, pick(0.5, 2 / 3, 1.5, 2)); design$allocation <- as.list(ratio) }
  request <- losses(list(outcome = q$outcome, test = q$test, design = design), TRUE)
  effect <- 1 + (n1 - 1) * rho[2] + n1 * (n2 - 1) * rho[1]
  shape <- function(u, v) {
    k <- up(u * ratio / ratio[1]); kr <- up(k / (1 - lost_of(request, "units")))
    list(participants = sum(k) * n1 * n2,
      recruited = sum(kr) * n2 * up(n1 / (1 - lost_of(request, "participants"))),
      se = sqrt(effect * sum(v / (k * n1 * n2))), df = sum(k) - 2,
      more = list(clusters = sum(k), recruitedClusters = sum(kr), designEffect = effect))
  }
  low <- 2; while (any(up(low * ratio / ratio[1]) < 2)) low <- low + 1
  finish(q, request, shape, low)
}

makers <- list(factorial = factorial_case, "partially nested" = nested_case, "three level" = three_level_case)
cases <- unlist(lapply(names(makers), function(name)
  lapply(1:80, function(i) c(list(id = paste(name, i)), makers[[name]](i)))), recursive = FALSE)
cat("[\n", paste(vapply(cases, json, ""), collapse = ",\n"), "\n]\n", sep = "")
