# The cheapest design that reaches a power, and the most power within a budget, each by going through every whole
# number of clusters or participants, and every cluster size, in base R, with nothing of Steelyard's own code.
# Run: Rscript enumerated.R > enumerated.json

set.seed(20261204)
pick <- function(...) sample(c(...), 1)
number <- function(low, high, digits = 3) signif(runif(1, low, high), digits)
up <- function(x) ceiling(x - 1e-9)

json <- function(x) {
  if (is.list(x)) {
    if (is.null(names(x))) return(paste0("[", paste(vapply(x, json, ""), collapse = ","), "]"))
    return(paste0("{", paste0("\"", names(x), "\":", vapply(x, json, ""), collapse = ","), "}"))
  }
  if (is.character(x)) return(paste0("\"", x, "\""))
  format(x, digits = 15, scientific = FALSE, trim = TRUE)
}
power_t <- function(delta, se, df, tail) pt(qt(tail, df, lower.tail = FALSE), df, abs(delta) / se, lower.tail = FALSE)

study <- function() {
  sd <- number(1, 20)
  list(difference = signif(sd * number(0.35, 0.8), 4), sd = sd, sides = pick(1, 2), power = pick(0.8, 0.9, number(0.6, 0.95)),
    lost = pick(0, 0.1, 0.25), fixed = number(1e3, 1e5), recruited = number(5, 300), exposure = c(number(1, 200), number(1, 900)),
    overhead = pick(0, 0.15))
}
request <- function(s, design, per_cluster = NULL) {
  costs <- list(currency = "EUR", fixed = s$fixed, perRecruited = s$recruited,
    perExposure = as.list(s$exposure), overhead = s$overhead)
  if (!is.null(per_cluster)) costs$perCluster <- per_cluster
  list(outcome = list(kind = "continuous", difference = s$difference, sd = s$sd),
    test = list(hypothesis = "superiority", alpha = 0.05, sides = s$sides), design = design,
    aim = list(find = "size", power = s$power), attrition = list(participants = s$lost), costs = costs)
}

# All designs of a grid with their cost and power; the best of them by what is asked.
answer <- function(s, ask, grid, search) {
  reaching <- grid[grid$power >= s$power, ]
  least <- min(reaching$cost)
  cheapest <- reaching[reaching$cost <= least * (1 + 1e-12), ]
  budget <- round(s$fixed * (1 + s$overhead) + number(0.4, 0.95) * (least - s$fixed * (1 + s$overhead)))
  affordable <- grid[grid$cost <= budget, ]
  list(request = ask, search = search, cheapest = list(cost = least, recruited = min(cheapest$recruited)),
    budget = budget, mostPower = max(affordable$power))
}

# Two arms of individuals, every number in each within the ratios allowed.
allocations <- function(i) {
  s <- study(); most <- 260
  grid <- expand.grid(n0 = 2:most, n1 = 2:most)
  grid <- grid[grid$n1 <= 4 * grid$n0 + 1e-9 & grid$n0 <= 4 * grid$n1 + 1e-9, ]
  grid$power <- power_t(s$difference, s$sd * sqrt(1 / grid$n0 + 1 / grid$n1), grid$n0 + grid$n1 - 2, 0.05 / s$sides)
  r0 <- up(grid$n0 / (1 - s$lost)); r1 <- up(grid$n1 / (1 - s$lost)); grid$recruited <- r0 + r1
  grid$cost <- (s$fixed + s$recruited * (r0 + r1) + s$exposure[1] * r0 + s$exposure[2] * r1) * (1 + s$overhead)
  answer(s, request(s, list(family = "parallel")), grid, list(allocation = list(from = 0.25, to = 4)))
}

# Two arms of clusters, every number of them and every size.
clusters <- function(i, shared) {
  s <- study(); icc <- number(0.005, 0.15); cv <- pick(0, 0.4); per_cluster <- number(100, 8000)
  sizes <- if (shared) 1:60 else 1:120
  grid <- if (shared) expand.grid(m = sizes, k0 = 2:40, k1 = 2:40) else expand.grid(m = sizes, k0 = 2:150)
  if (shared) grid <- grid[grid$k1 <= 3 * grid$k0 + 1e-9 & grid$k0 <= 3 * grid$k1 + 1e-9, ] else grid$k1 <- grid$k0
  effect <- 1 + ((1 + cv^2) * grid$m - 1) * icc
  se <- s$sd * sqrt(effect / grid$m * (1 / grid$k0 + 1 / grid$k1))
  grid$power <- power_t(s$difference, se, grid$k0 + grid$k1 - 2, 0.05 / s$sides)
  each <- up(grid$m / (1 - s$lost)); grid$recruited <- (grid$k0 + grid$k1) * each
  grid$cost <- (s$fixed + per_cluster * (grid$k0 + grid$k1) + s$recruited * grid$recruited +
    s$exposure[1] * grid$k0 * each + s$exposure[2] * grid$k1 * each) * (1 + s$overhead)
  search <- list(clusterSize = list(from = 1, to = max(sizes)))
  if (shared) search$allocation <- list(from = 0.333333333333333, to = 3)
  answer(s, request(s, list(family = "cluster", icc = icc, clusterSize = 10, clusterSizeCv = cv), per_cluster), grid, search)
}

cases <- c(
  lapply(1:20, function(i) c(list(id = paste("allocation", i)), allocations(i))),
  lapply(1:20, function(i) c(list(id = paste("cluster size", i)), clusters(i, FALSE))),
  lapply(1:20, function(i) c(list(id = paste("cluster size and allocation", i)), clusters(i, TRUE))))
cat("[\n", paste(vapply(cases, json, ""), collapse = ",\n"), "\n]\n", sep = "")
