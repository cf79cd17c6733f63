# Appraisals of randomly varied requests in base R, written from the formulas in docs/, with nothing of
# Steelyard's own code. Run: Rscript cases.R > cases.json
# Sizes are found by stepping over whole numbers, power comes from pt(ncp) and pnorm.

set.seed(20260412)

ceiling_forgiving <- function(x) ceiling(x - 1e-9)
pick <- function(...) sample(c(...), 1)
number <- function(low, high, digits = 3) signif(runif(1, low, high), digits)

power_t <- function(delta, se, df, tail) pt(qt(tail, df, lower.tail = FALSE), df, abs(delta) / se, lower.tail = FALSE)
power_z <- function(delta, se, tail, se0 = se, correction = 0)
  pnorm((abs(delta) - correction - qnorm(tail, lower.tail = FALSE) * se0) / se)

# Smallest u >= low whose power reaches the aim, taking every whole number in turn.
smallest <- function(power_at, aim, low) {
  u <- low
  while (power_at(u) < aim) u <- u + 1
  u
}
lowest <- function(ratios, least = 2) {
  u <- least
  while (any(ceiling_forgiving(u * ratios) < least)) u <- u + 1
  u
}

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
array_of <- function(v) as.list(unname(v))

test_plan <- function() {
  sides <- pick(1, 2)
  alpha <- pick(0.001, 0.01, 0.025, 0.05, 0.1)
  list(plan = list(hypothesis = "superiority", alpha = alpha, sides = sides), alpha = alpha, tail = alpha / sides)
}

with_reference <- function(test, df_free) {
  if (df_free && runif(1) < 0.25) test$plan$reference <- "normal"
  test
}

attrition_and_dilution <- function(request, clusters = FALSE) {
  lost <- pick(0, 0, 0.05, 0.12, 0.2, 0.33)
  if (lost > 0) request$attrition <- list(participants = lost)
  if (clusters && runif(1) < 0.3) {
    if (is.null(request$attrition)) request$attrition <- list()
    request$attrition$units <- pick(0.05, 0.1, 0.25)
  }
  if (runif(1) < 0.2) request$dilution <- list(contamination = number(0.01, 0.3), nonAdherence = number(0.01, 0.2))
  request
}
kept <- function(request) {
  d <- request$dilution
  if (is.null(d)) 1 else (1 - d$contamination) * (1 - d$nonAdherence)
}
lost_of <- function(request, what) { v <- request$attrition[[what]]; if (is.null(v)) 0 else v }

two_means <- function() {
  test <- with_reference(test_plan(), TRUE)
  sd <- number(1, 20); outcome <- list(kind = "continuous", difference = sd * number(0.15, 1.5) * pick(-1, 1), sd = sd)
  outcome$difference <- signif(outcome$difference, 4)
  kind <- pick("plain", "plain", "welch", "repeated")
  f <- 1; covariates <- 0; v <- c(sd, sd)^2
  if (kind == "welch") { outcome$sdActive <- number(1, 20); v[2] <- outcome$sdActive^2 }
  if (kind == "repeated") {
    p <- pick(0, 1, 2, 3); m <- pick(1, 2, 3, 4); rho <- number(0.05, 0.9)
    outcome$repeated <- list(baselines = p, followUps = m, correlation = rho)
    f <- (1 + (m - 1) * rho) / m - p * rho^2 / (1 + (p - 1) * rho)
    covariates <- as.numeric(p > 0); v <- v * f
  }
  ratios <- if (runif(1) < 0.5) c(1, 1) else c(1, pick(0.5, 2 / 3, 1.5, 2, 3))
  request <- attrition_and_dilution(list(outcome = outcome, test = test$plan, design = list(family = "parallel")))
  if (ratios[2] != 1) request$design$allocation <- array_of(ratios)
  at <- function(u, target = outcome$difference) {
    delta <- target * kept(request)
    n <- ceiling_forgiving(u * ratios); se <- sqrt(sum(v / n))
    df <- if (kind == "welch") sum(v / n)^2 / sum((v / n)^2 / (n - 1)) else sum(n) - 2 - covariates
    list(n = n, se = se, df = df,
      power = if (is.null(test$plan$reference)) power_t(delta, se, df, test$tail) else power_z(delta, se, test$tail))
  }
  finish(request, at, lowest(ratios), is.null(test$plan$reference), outcome$difference, 0)
}

two_proportions <- function() {
  test <- test_plan(); method <- pick("pooled", "unpooled", "continuity-corrected", "arcsine")
  p0 <- number(0.1, 0.9); p1 <- NA
  while (is.na(p1) || p1 < 0.03 || p1 > 0.97) p1 <- signif(p0 + number(0.08, 0.4) * pick(-1, 1), 3)
  request <- attrition_and_dilution(list(
    outcome = list(kind = "binary", control = p0, active = p1, method = method),
    test = test$plan, design = list(family = "parallel")))
  ratios <- if (runif(1) < 0.5) c(1, 1) else c(1, pick(0.5, 1.5, 2, 3))
  if (ratios[2] != 1) request$design$allocation <- array_of(ratios)
  at <- function(u, target = p1) {
    p <- c(p0, p0 + (target - p0) * kept(request))
    n <- ceiling_forgiving(u * ratios)
    se <- sqrt(sum(p * (1 - p) / n)); pbar <- sum(n * p) / sum(n); se0 <- sqrt(pbar * (1 - pbar) * sum(1 / n))
    delta <- p[2] - p[1]
    power <- switch(method,
      "pooled" = power_z(delta, se, test$tail, se0),
      "unpooled" = power_z(delta, se, test$tail),
      "continuity-corrected" = power_z(delta, se, test$tail, se0, sum(1 / n) / 2),
      "arcsine" = power_z(2 * asin(sqrt(p[2])) - 2 * asin(sqrt(p[1])), sqrt(sum(1 / n)), test$tail))
    list(n = n, se = if (method == "arcsine") sqrt(sum(1 / n)) else se, df = NULL, power = power)
  }
  finish(request, at, lowest(ratios), FALSE, p1, p0)
}

crossed <- function() {
  test <- with_reference(test_plan(), TRUE); sd <- number(1, 20); rho <- number(-0.3, 0.9)
  request <- attrition_and_dilution(list(
    outcome = list(kind = "continuous", difference = signif(sd * number(0.1, 1.2) * pick(-1, 1), 4), sd = sd),
    test = test$plan, design = list(family = "crossover", sequences = list("AB", "BA"), correlation = rho)))
  at <- function(u, target = request$outcome$difference) {
    delta <- target * kept(request)
    se <- sd * sqrt(2 * (1 - rho) / (2 * u)); df <- 2 * u - 2
    list(n = c(u, u), se = se, df = df,
      power = if (is.null(test$plan$reference)) power_t(delta, se, df, test$tail) else power_z(delta, se, test$tail))
  }
  finish(request, at, 2, is.null(test$plan$reference), request$outcome$difference, 0)
}

clustered <- function() {
  test <- with_reference(test_plan(), TRUE); binary <- runif(1) < 0.4
  icc <- pick(0, number(0.001, 0.3)); m <- sample(1:80, 1); cv <- pick(0, number(0.1, 0.9))
  if (binary) {
    p0 <- number(0.2, 0.8); p1 <- signif(p0 + number(0.1, 0.19) * pick(-1, 1), 3)
    outcome <- list(kind = "binary", control = p0, active = p1)
  } else {
    sd <- number(1, 20); outcome <- list(kind = "continuous", difference = signif(sd * number(0.2, 1) * pick(-1, 1), 4), sd = sd)
  }
  design <- list(family = "cluster", icc = icc, clusterSize = m)
  if (cv > 0) design$clusterSizeCv <- cv
  ratios <- if (runif(1) < 0.6) c(1, 1) else c(1, pick(0.5, 1.5, 2))
  if (ratios[2] != 1) design$allocation <- array_of(ratios)
  request <- attrition_and_dilution(list(outcome = outcome, test = test$plan, design = design), clusters = TRUE)
  at <- function(u, target = if (binary) p1 else outcome$difference, size = m) {
    if (binary) { p <- c(p0, p0 + (target - p0) * kept(request)); v <- p * (1 - p); delta <- p[2] - p[1] }
    else { v <- c(sd, sd)^2; delta <- target * kept(request) }
    effect <- 1 + ((1 + cv^2) * size - 1) * icc
    k <- ceiling_forgiving(u * ratios); se <- sqrt(sum(v * effect / (k * size))); df <- sum(k) - 2
    list(n = k, se = se, df = df,
      power = if (is.null(test$plan$reference)) power_t(delta, se, df, test$tail) else power_z(delta, se, test$tail))
  }
  if (runif(1) < 0.25) return(sized_clusters(request, at, lowest(ratios)))
  finish(request, at, lowest(ratios), is.null(test$plan$reference), if (binary) p1 else outcome$difference,
    if (binary) p0 else 0, cluster_size = m, design_effect = 1 + ((1 + cv^2) * m - 1) * icc)
}

many_arms <- function() {
  test <- test_plan(); arms <- sample(3:6, 1); active <- arms - 1; adjust <- pick("none", "bonferroni")
  binary <- runif(1) < 0.3
  ratios <- c(1, round(runif(active, 0.4, 1.2), 2))
  if (runif(1) < 0.4) ratios <- rep(1, arms)
  covariates <- 0
  if (binary) {
    p0 <- number(0.2, 0.8); p1 <- signif(p0 + number(0.1, 0.19) * pick(-1, 1), 3)
    outcome <- list(kind = "binary", control = p0, active = p1)
  } else {
    sd <- number(1, 20); outcome <- list(kind = "continuous", difference = signif(sd * number(0.2, 1) * pick(-1, 1), 4), sd = sd)
    v <- sd^2
    if (runif(1) < 0.4) {
      rho <- number(0.1, 0.9); outcome$repeated <- list(baselines = 1, followUps = 1, correlation = rho)
      v <- v * (1 - rho^2); covariates <- 1
    }
  }
  comparisons <- list(against = "control", adjust = adjust, powerGoal = "per-comparison")
  vary <- runif(1) < 0.3
  own <- if (binary) p1 else outcome$difference
  if (vary) {
    own <- if (binary) signif(p0 + (p1 - p0) * runif(active, 0.8, 1.1), 4) else signif(outcome$difference * runif(active, 0.7, 1.3), 4)
    comparisons$effects <- array_of(own)
  }
  request <- attrition_and_dilution(list(outcome = outcome, test = test$plan,
    design = list(family = "multi-arm", allocation = array_of(ratios), comparisons = comparisons)))
  share <- kept(request); tail <- test$tail / (if (adjust == "bonferroni") active else 1)
  at <- function(u, target = own) {
    target <- rep_len(target, active)
    n <- ceiling_forgiving(u * ratios); df <- sum(n) - arms - covariates
    each <- vapply(seq_len(active), function(i) {
      if (binary) {
        p <- c(p0, p0 + (target[i] - p0) * share); m <- n[c(1, i + 1)]
        se <- sqrt(sum(p * (1 - p) / m)); pbar <- sum(m * p) / sum(m)
        c(se, power_z(p[2] - p[1], se, tail, sqrt(pbar * (1 - pbar) * sum(1 / m))))
      } else {
        se <- sqrt(v * (1 / n[1] + 1 / n[i + 1])); c(se, power_t(target[i] * share, se, df, tail))
      }
    }, c(0, 0))
    list(n = n, se = each[1, 1], df = if (binary) NULL else df, power = min(each[2, ]), each = each[2, ])
  }
  finish(request, at, lowest(ratios), !binary, if (vary) NULL else own, if (binary) p0 else 0)
}

# One case: the size for an aimed power, the power at some size near it, or the effect detectable there.
finish <- function(request, at, low, t_reference, target, null, cluster_size = 1, design_effect = NULL) {
  aim <- pick(0.8, 0.9, number(0.5, 0.95))
  u <- smallest(function(u) at(u)$power, aim, low)
  kind <- pick("size", "size", "power", if (is.null(target)) "size" else "effect")
  if (kind == "size") request$aim <- list(find = "size", power = aim)
  else u <- max(low, u + sample(-5:5, 1))
  if (kind == "power") request$aim <- list(find = "power", units = u)
  a <- at(u); expected <- list()
  if (kind == "effect") {
    edge <- if (null == 0) null + 1000 * (target - null) else if (target > null) 1 - 1e-9 else 1e-9
    reach <- function(x) at(u, x)$power - aim
    if (reach(edge) < 0) return(finish(request, at, low, t_reference, NULL, null, cluster_size, design_effect))
    request$aim <- list(find = "effect", units = u, power = aim)
    expected$detectable <- uniroot(reach, c(null + 1e-12 * (target - null), edge), tol = 1e-15, maxiter = 10000)$root
    a <- at(u, expected$detectable)
  }
  clustered <- !is.null(design_effect)
  a1 <- lost_of(request, "participants"); au <- lost_of(request, "units")
  expected <- c(expected, list(units = u, participants = sum(a$n) * cluster_size, power = a$power,
    standardError = a$se, recruited = if (clustered)
      sum(ceiling_forgiving(a$n / (1 - au))) * ceiling_forgiving(cluster_size / (1 - a1))
      else sum(ceiling_forgiving(a$n / (1 - a1)))))
  if (t_reference) expected$df <- a$df
  if (clustered) { expected$clusters <- sum(a$n); expected$designEffect <- design_effect }
  if (!is.null(a$each)) expected$perComparison <- array_of(a$each)
  list(request = request, expected = expected)
}

# The smallest cluster size for a number of clusters, where some size reaches the power; else the limiting power.
sized_clusters <- function(request, at, low) {
  aim <- pick(0.8, 0.9, number(0.5, 0.95))
  u <- max(low, smallest(function(u) at(u)$power, aim, low) + sample(-3:6, 1))
  request$aim <- list(find = "cluster-size", units = u, power = aim)
  limit <- at(u, size = 1e15)$power
  if (limit <= aim) return(list(request = request, expected = list(limitingPower = limit)))
  m <- smallest(function(m) at(u, size = m)$power, aim, 1); a <- at(u, size = m)
  list(request = request, expected = list(clusterSize = m, units = u, power = a$power, standardError = a$se))
}

makers <- list("two means" = two_means, "two proportions" = two_proportions, crossover = crossed,
  cluster = clustered, "several arms" = many_arms)
cases <- unlist(lapply(names(makers), function(name)
  lapply(1:80, function(i) c(list(id = paste(name, i)), makers[[name]]()))), recursive = FALSE)
cat("[\n", paste(vapply(cases, json, ""), collapse = ",\n"), "\n]\n", sep = "")
