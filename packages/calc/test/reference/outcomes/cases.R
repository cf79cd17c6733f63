# Appraisals of time-to-event, count and ordinal outcomes, of non-inferiority and equivalence, and of the same in
# clusters, in base R from the formulas in docs/, with nothing of Steelyard's own code.
# Run: Rscript cases.R > cases.json
# Power comes from pt(ncp), pnorm and, for equivalence with a df, from integrate() over the scale of the estimate.

set.seed(19870413)

ceiling_forgiving <- function(x) ceiling(x - 1e-9)
pick <- function(...) sample(c(...), 1)
number <- function(low, high, digits = 3) signif(runif(1, low, high), digits)
log_number <- function(low, high, digits = 3) signif(exp(runif(1, log(low), log(high))), digits)
or_else <- function(x, other) if (is.null(x)) other else x
array_of <- function(v) as.list(unname(v))

json <- function(x) {
  if (is.null(x)) return("null")
  if (is.list(x)) {
    if (is.null(names(x))) return(paste0("[", paste(vapply(x, json, ""), collapse = ","), "]"))
    return(paste0("{", paste0("\"", names(x), "\":", vapply(x, json, ""), collapse = ","), "}"))
  }
  if (is.character(x)) return(paste0("\"", x, "\""))
  if (is.logical(x)) return(ifelse(x, "true", "false"))
  format(x, digits = 15, scientific = FALSE, trim = TRUE)
}

# --- tests -------------------------------------------------------------------------------------------------

critical <- function(tail, df) if (is.null(df)) qnorm(tail, lower.tail = FALSE) else qt(tail, df, lower.tail = FALSE)

beyond <- function(distance, se, df, c, se0 = se, correction = 0)
  if (is.null(df)) pnorm((distance - correction - c * se0) / se) else pt(c, df, distance / se, lower.tail = FALSE)

# Two one-sided tests: the rejection region at each scale s of the estimate, over the distribution of s.
within_both <- function(delta, margin, se, df, c) {
  inside <- function(s) pmax(0, pnorm((margin - delta) / se - c * s) - pnorm((-margin - delta) / se + c * s))
  if (is.null(df)) return(inside(1))
  density <- function(s) 2 * df * s * dchisq(df * s^2, df)
  turns <- (c((margin - delta), (margin + delta)) / se + rep(c(-6, -2, 0, 2, 6), each = 2)) / c
  cuts <- sort(c(0, sqrt(qchisq(c(1e-9, 1e-4, 0.01, 0.1, 0.3, 0.5, 0.7, 0.9, 0.99, 0.9999), df) / df), turns,
    sqrt(qchisq(c(1e-9, 1e-17), df, lower.tail = FALSE) / df)))
  cuts <- unique(cuts[cuts >= 0 & cuts <= margin / (se * c)])
  cuts <- c(cuts, margin / (se * c))
  sum(vapply(seq_len(length(cuts) - 1), function(i) {
    if (cuts[i + 1] - cuts[i] < 1e-14) return(0)
    integrate(function(s) inside(s) * density(s), cuts[i], cuts[i + 1], rel.tol = 1e-12, abs.tol = 1e-15,
      subdivisions = 1000, stop.on.error = FALSE)$value
  }, 0))
}

# `ratio` outcomes have their margin logged; `up` is +1 where a positive effect is a benefit.
tester <- function(plan, ratio, up) {
  tail <- plan$alpha / plan$sides
  margin <- if (is.null(plan$margin)) NULL else if (ratio) log(plan$margin) else plan$margin
  list(
    distance = function(delta) switch(plan$hypothesis, "superiority" = abs(delta),
      "non-inferiority" = up * delta + margin, "equivalence" = margin - abs(delta)),
    power = function(delta, se, df, se0 = se) {
      c <- critical(tail, df)
      switch(plan$hypothesis, "superiority" = beyond(abs(delta), se, df, c, se0),
        "non-inferiority" = beyond(up * delta + margin, se, df, c),
        "equivalence" = within_both(delta, margin, se, df, c))
    }
  )
}

# --- outcomes: what n in each arm makes of a target ----------------------------------------------------------

event_chance <- function(lambda, a, f, eta) {
  mu <- lambda + eta
  if (a == 0) return(lambda / mu * (1 - exp(-mu * f)))
  lambda / mu * (1 - (exp(-mu * f) - exp(-mu * (a + f))) / (mu * a))
}

outcomes <- list(
  "continuous" = function(o, share, plan) list(ratio = FALSE, null = 0, target = o$difference, at = function(n, target) {
    r <- o$repeated
    f <- if (is.null(r)) 1 else (1 + (r$followUps - 1) * r$correlation) / r$followUps -
      r$baselines * r$correlation^2 / (1 + (r$baselines - 1) * r$correlation)
    v <- c(o$sd, or_else(o$sdActive, o$sd))^2 * f
    df <- if (!is.null(o$sdActive)) sum(v / n)^2 / sum((v / n)^2 / (n - 1))
      else sum(n) - 2 - (!is.null(r) && r$baselines > 0)
    list(delta = share * target, v = v, se = sqrt(sum(v / n)), df = if (is.null(plan$reference)) df else NULL)
  }),
  "binary" = function(o, share, plan) list(ratio = FALSE, null = o$control, target = o$active, at = function(n, target) {
    p <- c(o$control, o$control + share * (target - o$control)); mean <- sum(n * p) / sum(n)
    list(delta = p[2] - p[1], v = p * (1 - p), se = sqrt(sum(p * (1 - p) / n)),
      se0 = if (plan$hypothesis == "superiority") sqrt(mean * (1 - mean) * sum(1 / n)))
  }),
  "time-to-event" = function(o, share, plan) list(ratio = TRUE, null = 1, target = o$hazardRatio, at = function(n, target) {
    hr <- target^share; lambda <- -log(o$controlSurvival$probability) / o$controlSurvival$at
    eta <- or_else(o$dropoutHazard, 0)
    chance <- c(event_chance(lambda, o$accrual, o$followUp, eta), event_chance(lambda * hr, o$accrual, o$followUp, eta))
    d <- sum(n * chance); r <- n[2] / n[1]
    se <- (1 + r) / sqrt(r * d)
    if (identical(o$method, "freedman")) se <- abs(log(hr)) / (sqrt(d * r) * abs(1 - hr) / (1 + r * hr))
    list(delta = log(hr), hr = hr, se = se, events = d)
  }),
  "count" = function(o, share, plan) list(ratio = TRUE, null = 1, target = o$rateRatio, at = function(n, target) {
    rr <- target^share; mean <- o$exposure * o$controlRate * c(1, rr)
    v <- 1 / mean + or_else(o$dispersion, 0)
    list(delta = log(rr), v = v, se = sqrt(sum(v / n)))
  }),
  "ordinal" = function(o, share, plan) list(ratio = TRUE, null = 1, target = o$oddsRatio, at = function(n, target) {
    or <- target^share; p0 <- unlist(o$controlProbabilities); cumulative <- cumsum(p0)
    shifted <- or * cumulative / (or * cumulative + 1 - cumulative)
    p1 <- diff(c(0, shifted[-length(p0)], 1)); mean <- (n[1] * p0 + n[2] * p1) / sum(n)
    list(delta = log(or), se = 1 / sqrt(n[1] * n[2] / (3 * sum(n)) * (1 - sum(mean^3))))
  })
)

# --- designs ---------------------------------------------------------------------------------------------------

kept <- function(request) {
  d <- request$dilution
  (1 - or_else(d$contamination, 0)) * (1 - or_else(d$nonAdherence, 0))
}

# Everything a request answers at `u` units of the control group and a target; `m` is a cluster size.
answerer <- function(request) {
  o <- request$outcome; design <- request$design; plan <- request$test
  model <- outcomes[[o$kind]](o, kept(request), plan)
  up <- if (identical(o$better, "lower")) -1 else 1
  if (o$kind == "ordinal") up <- -up
  test <- tester(plan, model$ratio, up)
  ratios <- unlist(or_else(design$allocation, list(1, 1))); ratios <- ratios / ratios[1]
  at <- function(u, target = model$target, m = design$clusterSize) {
    n <- ceiling_forgiving(u * ratios); a <- model$at(n, target)
    if (design$family == "cluster") {
      w <- if (o$kind == "count") a$v / m + design$rateCv^2
        else a$v * ((1 - design$icc) / m + design$icc * (1 + or_else(design$clusterSizeCv, 0)^2))
      a$se <- sqrt(sum(w / n)); a$se0 <- NULL
      a$df <- if (is.null(plan$reference)) sum(n) - 2 else NULL
    }
    c(a, list(n = n, power = test$power(a$delta, a$se, a$df, or_else(a$se0, a$se))))
  }
  low <- 2
  while (any(ceiling_forgiving(low * ratios) < 2)) low <- low + 1
  list(at = at, low = low, ratios = ratios, model = model, distance = test$distance)
}

# Smallest whole number whose power reaches the aim: doubled, halved, then every one of the thirty below tried.
smallest <- function(power_at, aim, low) {
  high <- low
  while (power_at(high) < aim) { high <- 2 * high; if (high > 1e9) return(NA) }
  from <- low
  while (high - from > 1) {
    middle <- floor((from + high) / 2)
    if (power_at(middle) < aim) from <- middle else high <- middle
  }
  below <- max(low, high - 30):high
  min(c(high, below[vapply(below, function(u) power_at(u) >= aim, TRUE)]))
}

lost_of <- function(request, what) or_else(request$attrition[[what]], 0)

fields <- function(request, q, u, a, m = request$design$clusterSize) {
  clustered <- !is.null(m)
  recruited <- if (clustered) sum(ceiling_forgiving(a$n / (1 - lost_of(request, "units")))) *
      ceiling_forgiving(m / (1 - lost_of(request, "participants")))
    else sum(ceiling_forgiving(a$n / (1 - lost_of(request, "participants"))))
  tail <- request$test$alpha / request$test$sides
  e <- list(units = u, participants = sum(a$n) * or_else(m, 1), recruited = recruited, power = a$power,
    standardError = a$se, criticalValue = critical(tail, a$df),
    expectedHalfWidth = critical(tail, a$df) * a$se)
  if (!is.null(a$df)) e$df <- a$df
  if (clustered && request$outcome$kind != "count")
    e$designEffect <- 1 + ((1 + or_else(request$design$clusterSizeCv, 0)^2) * m - 1) * request$design$icc
  if (!is.null(a$events)) {
    e$expectedEvents <- a$events
    if (!is.null(request$aim$power) && request$test$hypothesis != "equivalence") {
      z <- qnorm(tail, lower.tail = FALSE) + qnorm(request$aim$power); r <- q$ratios[2]
      e$requiredEvents <- if (identical(request$outcome$method, "freedman")) z^2 * (1 + r * a$hr)^2 / (r * (1 - a$hr)^2)
        else z^2 * (1 + r)^2 / (r * q$distance(a$delta)^2)
    }
  }
  e
}

# The target nearest the null that reaches the power, by small steps away from it and then a root.
detectable <- function(q, u, aim, target, null, ratio) {
  side <- sign(target - null)
  place <- if (ratio) function(x) exp(side * x) else function(x) null + side * x
  far <- if (ratio) 27.6 else if (null == 0) 1000 * abs(target) else if (side > 0) 1 - null else null
  steps <- if (ratio) seq(0.004, far, by = 0.004) else far * (1:4000) / 4000
  steps <- if (null == 0) far * (1:4000)^3 / 4000^3 else steps
  reach <- function(x) q$at(u, place(x))$power - aim
  before <- 1e-9
  for (x in steps) {
    if (reach(x) >= 0) return(place(uniroot(reach, c(before, x), tol = 1e-16, maxiter = 10000)$root))
    before <- x
  }
  NA
}

solved <- function(id, request, find, aim = 0.9, units = NULL) {
  q <- answerer(request); at <- q$at
  if (request$test$hypothesis != "superiority" && q$distance(at(q$low)$delta) <= 0) {
    request$aim <- list(find = "size", power = aim)
    return(list(id = id, request = request, expected = list(code = "margin")))
  }
  u <- or_else(units, smallest(function(u) at(u)$power, aim, q$low))
  if (find == "size") {
    request$aim <- list(find = "size", power = aim)
    return(list(id = id, request = request, expected = fields(request, q, u, at(u))))
  }
  if (is.null(units)) u <- max(q$low, u + sample(-4:4, 1))
  if (find == "power") {
    request$aim <- list(find = "power", units = u)
    return(list(id = id, request = request, expected = fields(request, q, u, at(u))))
  }
  if (find == "effect") {
    request$aim <- list(find = "effect", units = u, power = aim)
    target <- detectable(q, u, aim, q$model$target, q$model$null, q$model$ratio)
    if (is.na(target)) return(list(id = id, request = request, expected = list(code = "effect")))
    return(list(id = id, request = request,
      expected = c(list(detectable = target), fields(request, q, u, at(u, target)))))
  }
  request$aim <- list(find = "cluster-size", units = u, power = aim)
  limit <- at(u, m = 1e15)$power
  if (limit <= aim) {
    fewest <- smallest(function(k) at(k, m = 1e15)$power - 1e-12, aim, q$low)
    return(list(id = id, request = request, expected = list(code = "clusters", limitingPower = limit, fewestUnits = fewest)))
  }
  m <- smallest(function(m) at(u, m = m)$power, aim, 1)
  list(id = id, request = request, expected = c(list(clusterSize = m), fields(request, q, u, at(u, m = m), m)))
}

# --- varied requests ---------------------------------------------------------------------------------------------

varied_test <- function(hypothesis, margin = NULL) {
  alpha <- pick(0.001, 0.01, 0.025, 0.05, 0.1)
  plan <- list(hypothesis = hypothesis, alpha = alpha, sides = if (hypothesis == "superiority") pick(1, 2) else 1)
  if (hypothesis != "superiority") plan$margin <- margin
  plan
}
loss <- function(request) {
  if (runif(1) < 0.3) request$attrition <- list(participants = pick(0.05, 0.12, 0.33))
  if (request$design$family == "cluster" && runif(1) < 0.3) request$attrition$units <- pick(0.05, 0.25)
  if (runif(1) < 0.2) request$dilution <- list(contamination = number(0.01, 0.3), nonAdherence = number(0.01, 0.2))
  request
}
allocated <- function(request) {
  if (runif(1) < 0.5) request$design$allocation <- array_of(c(1, pick(0.2, 0.5, 1.5, 2, 5)))
  request
}
pick_hypothesis <- function(h = c("superiority", "non-inferiority", "equivalence")) sample(h, 1)
# A ratio near 1 for a margin, farther off for superiority.
ratio_for <- function(hypothesis)
  if (hypothesis == "superiority") log_number(1.15, 4)^pick(-1, 1) else log_number(0.93, 1.07, 4)

parallel_continuous <- function() {
  h <- pick_hypothesis(c("non-inferiority", "equivalence")); sd <- number(1, 20)
  margin <- signif(sd * number(0.3, 1.6), 3)
  o <- list(kind = "continuous", difference = signif(margin * runif(1, -0.6, 0.6), 3), sd = sd)
  kind <- pick("plain", "plain", "welch", "repeated")
  if (kind == "welch") o$sdActive <- number(1, 20)
  if (kind == "repeated")
    o$repeated <- list(baselines = pick(0, 1, 2), followUps = pick(1, 3), correlation = number(0.05, 0.9))
  if (h == "non-inferiority" || runif(1) < 0.3) o$better <- pick("higher", "lower")
  test <- varied_test(h, margin); if (runif(1) < 0.25) test$reference <- "normal"
  allocated(loss(list(outcome = o, test = test, design = list(family = "parallel"))))
}
parallel_binary <- function() {
  h <- pick_hypothesis(c("non-inferiority", "equivalence")); p0 <- number(0.03, 0.97); margin <- number(0.03, 0.2)
  p1 <- signif(min(0.995, max(0.005, p0 + margin * runif(1, -0.5, 0.5))), 3)
  o <- list(kind = "binary", control = p0, active = p1)
  if (h == "non-inferiority") o$better <- pick("higher", "lower")
  allocated(loss(list(outcome = o, test = varied_test(h, margin), design = list(family = "parallel"))))
}
time_to_event <- function() {
  h <- pick_hypothesis()
  o <- list(kind = "time-to-event", hazardRatio = signif(ratio_for(h), 3),
    controlSurvival = list(at = pick(1, 12, 36), probability = number(0.05, 0.97)),
    accrual = pick(0, 6, 24), followUp = pick(0.5, 12, 48))
  if (h == "superiority" && runif(1) < 0.4) o$method <- "freedman" else if (runif(1) < 0.3) o$method <- "schoenfeld"
  if (h == "non-inferiority") o$better <- pick("higher", "lower")
  request <- allocated(loss(list(outcome = o, test = varied_test(h, number(1.15, 1.9)), design = list(family = "parallel"))))
  if (is.null(request$attrition) && runif(1) < 0.5) request$outcome$dropoutHazard <- log_number(1e-4, 0.2)
  request
}
counts <- function() {
  h <- pick_hypothesis()
  o <- list(kind = "count", controlRate = log_number(0.05, 20), rateRatio = signif(ratio_for(h), 3),
    exposure = pick(0.5, 1, 3))
  if (runif(1) < 0.6) o$dispersion <- log_number(0.01, 3)
  if (h == "non-inferiority") o$better <- pick("higher", "lower")
  allocated(loss(list(outcome = o, test = varied_test(h, number(1.15, 1.9)), design = list(family = "parallel"))))
}
ordinal <- function() {
  h <- pick_hypothesis(); k <- sample(2:7, 1); drawn <- rexp(k); p <- round(drawn / sum(drawn), 3); p[k] <- 1 - sum(p[-k])
  if (p[k] < 0) return(ordinal())
  o <- list(kind = "ordinal", controlProbabilities = array_of(round(p, 3)), oddsRatio = signif(ratio_for(h), 3))
  if (h == "non-inferiority") o$better <- pick("higher", "lower")
  allocated(loss(list(outcome = o, test = varied_test(h, number(1.2, 2)), design = list(family = "parallel"))))
}
cluster <- function() {
  kind <- pick("continuous", "continuous", "binary", "count")
  h <- switch(kind, "continuous" = pick_hypothesis(c("non-inferiority", "equivalence")),
    "binary" = "non-inferiority", "count" = "superiority")
  m <- sample(5:150, 1); design <- list(family = "cluster", clusterSize = m)
  if (kind == "count") {
    o <- list(kind = "count", controlRate = log_number(0.02, 2),
      rateRatio = signif(log_number(1.3, 3)^pick(-1, 1), 3), exposure = pick(1, 2))
    design$rateCv <- pick(0, number(0.05, 0.6))
    margin <- NULL
  } else {
    design$icc <- pick(0.01, 0.05, number(0.005, 0.2)); if (runif(1) < 0.5) design$clusterSizeCv <- number(0, 0.9)
    if (kind == "continuous") {
      sd <- number(1, 20); margin <- signif(sd * number(0.2, 0.9), 3)
      o <- list(kind = "continuous", difference = signif(margin * runif(1, -0.5, 0.5), 3), sd = sd)
    } else {
      p0 <- number(0.1, 0.9); margin <- number(0.05, 0.25)
      o <- list(kind = "binary", control = p0, active = signif(min(0.98, max(0.02, p0 + margin * runif(1, -0.4, 0.4))), 3))
    }
    if (h == "non-inferiority") o$better <- pick("higher", "lower")
  }
  test <- varied_test(h, margin); if (runif(1) < 0.2) test$reference <- "normal"
  allocated(loss(list(outcome = o, test = test, design = design)))
}

makers <- list("mean against a margin" = parallel_continuous, "proportion against a margin" = parallel_binary,
  "hazard ratio" = time_to_event, "rate ratio" = counts, "odds ratio" = ordinal, "in clusters" = cluster)
varied <- unlist(lapply(names(makers), function(name) lapply(1:32, function(i) {
  request <- makers[[name]]()
  finds <- c("size", "size", "power", if (request$test$hypothesis == "superiority") c("effect", "effect"),
    if (request$design$family == "cluster") c("cluster-size", "cluster-size"))
  solved(paste(name, i), request, sample(finds, 1), pick(0.8, 0.9, number(0.5, 0.97)))
})), recursive = FALSE)

# --- corners -------------------------------------------------------------------------------------------------------

parallel <- function(outcome, hypothesis, alpha = 0.025, margin = NULL, sides = 1, allocation = NULL, reference = NULL) {
  test <- list(hypothesis = hypothesis, alpha = alpha, sides = sides)
  if (!is.null(margin)) test$margin <- margin
  if (!is.null(reference)) test$reference <- reference
  design <- list(family = "parallel"); if (!is.null(allocation)) design$allocation <- array_of(allocation)
  list(outcome = outcome, test = test, design = design)
}
mean_of <- function(difference, sd, better = NULL)
  c(list(kind = "continuous", difference = difference, sd = sd), if (!is.null(better)) list(better = better))
survival <- function(hr, probability = 0.6, accrual = 18, followUp = 12, ...) list(kind = "time-to-event", hazardRatio = hr,
  controlSurvival = list(at = 12, probability = probability), accrual = accrual, followUp = followUp, ...)
rate <- function(rr, control = 1, ...) list(kind = "count", controlRate = control, rateRatio = rr, exposure = 1, ...)
scale_of <- function(or, p, ...) list(kind = "ordinal", controlProbabilities = array_of(p), oddsRatio = or, ...)
two_sided <- function(outcome, alpha = 0.05, ...) parallel(outcome, "superiority", alpha, sides = 2, ...)

corners <- list(
  solved("equivalence with two in each arm, 2 df",
    parallel(mean_of(0, 1), "equivalence", 0.05, 9), "power", units = 2),
  solved("equivalence with 2 df at a type I error of 0.001",
    parallel(mean_of(1, 1), "equivalence", 0.001, 60), "power", units = 2),
  solved("equivalence 30 standard errors inside its margin, 2 df",
    parallel(mean_of(0, 1), "equivalence", 0.05, 30), "power", units = 2),
  solved("equivalence of a large trial", parallel(mean_of(0.001, 1), "equivalence", 0.05, 0.02), "size"),
  solved("equivalence just inside its margin", parallel(mean_of(4.9, 1), "equivalence", 0.05, 5), "size", 0.8),
  solved("equivalence at its margin", parallel(mean_of(5, 1), "equivalence", 0.05, 5), "size"),
  solved("equivalence beyond its margin", parallel(mean_of(-6, 1), "equivalence", 0.05, 5), "size"),
  solved("equivalence with 1 to 5 allocation",
    parallel(mean_of(0.1, 1), "equivalence", 0.001, 0.6, allocation = c(1, 5)), "size"),
  solved("equivalence with 5 to 1 allocation",
    parallel(mean_of(0.1, 1), "equivalence", 0.01, 0.6, allocation = c(5, 1)), "size"),
  solved("equivalence too small to be shown", parallel(mean_of(0, 1), "equivalence", 0.05, 0.5), "power", units = 4),
  solved("Welch equivalence with three against many",
    parallel(c(mean_of(0, 1), list(sdActive = 4)), "equivalence", 0.05, 5, allocation = c(1, 5)), "power", units = 3),
  solved("non-inferiority with 2 df",
    parallel(mean_of(0, 1, "higher"), "non-inferiority", 0.025, 4), "power", units = 2),
  solved("non-inferiority, superior by far",
    parallel(mean_of(29, 1, "higher"), "non-inferiority", 0.025, 1), "power", units = 2),
  solved("non-inferiority, worse but inside its margin",
    parallel(mean_of(-0.95, 1, "higher"), "non-inferiority", 0.025, 1), "size", 0.8),
  solved("non-inferiority beyond its margin", parallel(mean_of(2, 1, "lower"), "non-inferiority", 0.025, 1), "size"),
  solved("non-inferiority of a rare event",
    parallel(list(kind = "binary", control = 0.002, active = 0.002, better = "lower"),
      "non-inferiority", 0.025, 0.001), "size"),
  solved("non-inferiority of a near-certain event",
    parallel(list(kind = "binary", control = 0.998, active = 0.999, better = "higher"),
      "non-inferiority", 0.001, 0.002), "size"),
  solved("proportions at their margin but for rounding",
    parallel(list(kind = "binary", control = 0.85, active = 0.75, better = "higher"),
      "non-inferiority", 0.025, 0.09), "size"),
  solved("equivalence of proportions near 1",
    parallel(list(kind = "binary", control = 0.99, active = 0.985), "equivalence", 0.05, 0.02), "size"),
  solved("hazard ratio near 1", two_sided(survival(0.99)), "size", 0.8),
  solved("hazard ratio near 1, Freedman", two_sided(survival(1.01, method = "freedman")), "size", 0.8),
  solved("hazard ratio of 0.2", two_sided(survival(0.2, 0.3)), "size"),
  solved("hazard ratio of 0.2, Freedman, 1 to 5",
    two_sided(survival(0.2, 0.3, method = "freedman"), allocation = c(1, 5)), "size"),
  solved("heavy dropout", two_sided(survival(0.7, dropoutHazard = 0.4)), "size"),
  solved("nobody accrued over time", two_sided(survival(0.7, accrual = 0)), "size"),
  solved("no follow-up after accrual", two_sided(survival(0.7, followUp = 0)), "size"),
  solved("rare events", two_sided(survival(0.6, 0.9995)), "size"),
  solved("nearly all have the event", two_sided(survival(0.6, 0.001)), "size"),
  solved("detectable hazard ratio of a tiny trial", two_sided(survival(0.7)), "effect", units = 3),
  solved("detectable hazard ratio above 1, Freedman",
    two_sided(survival(1.4, method = "freedman")), "effect", units = 80),
  solved("detectable hazard ratio, 1 to 5",
    two_sided(survival(0.7, 0.9), allocation = c(1, 5)), "effect", units = 60),
  solved("hazard ratio against a margin near it",
    parallel(survival(1.18, better = "lower"), "non-inferiority", 0.025, 1.2), "size", 0.8),
  solved("hazard ratio where a longer time is worse",
    parallel(survival(1, better = "higher"), "non-inferiority", 0.025, 1.3), "size"),
  solved("equivalent hazards", parallel(survival(1.05), "equivalence", 0.05, 1.25), "size"),
  solved("a rare count", two_sided(rate(0.5, 0.001)), "size"),
  solved("a count with much dispersion", two_sided(rate(0.7, 4, dispersion = 8)), "size"),
  solved("a rate ratio no effect can show below 1", two_sided(rate(0.7, 0.5)), "effect", units = 4),
  solved("the same above 1", two_sided(rate(1.7, 0.5)), "effect", units = 4),
  solved("equivalent rates",
    parallel(rate(1.02, 2, dispersion = 0.3), "equivalence", 0.05, 1.25, allocation = c(1, 5)), "size"),
  solved("a rate at its margin", parallel(rate(1.25, 2, better = "lower"), "non-inferiority", 0.025, 1.25), "size"),
  solved("two ordered categories", two_sided(scale_of(2, c(0.3, 0.7))), "size"),
  solved("ten even categories", two_sided(scale_of(0.6, rep(0.1, 10))), "size", 0.8),
  solved("a scale with nearly all in one category", two_sided(scale_of(3, c(0.004, 0.99, 0.006))), "size"),
  solved("a scale with an empty category", two_sided(scale_of(1.5, c(0.3, 0, 0.3, 0.4))), "size"),
  solved("an odds ratio of 40", two_sided(scale_of(40, c(0.1, 0.3, 0.6))), "size", 0.99),
  solved("detectable odds ratio",
    two_sided(scale_of(0.5, c(0.1, 0.3, 0.6)), alpha = 0.001), "effect", 0.8, units = 60),
  solved("ordinal non-inferiority where later is better",
    parallel(scale_of(1, c(0.2, 0.5, 0.3), better = "higher"), "non-inferiority", 0.025, 1.5), "size"),
  solved("ordinal non-inferiority where earlier is better",
    parallel(scale_of(0.9, c(0.2, 0.5, 0.3), better = "lower"), "non-inferiority", 0.025, 1.5), "size")
)

cases <- c(varied, corners)
cat("[\n", paste(vapply(cases, json, ""), collapse = ",\n"), "\n]\n", sep = "")
