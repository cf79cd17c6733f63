# Trials simulated and analysed as docs/ says, counting rejections in the hypothesised direction: with the target
# effect (power), and at the edge of the null hypothesis (type I error). Run: Rscript simulation.R > simulated.json

set.seed(20261202)
runs <- 40000

json <- function(x) {
  if (is.list(x)) {
    if (is.null(names(x))) return(paste0("[", paste(vapply(x, json, ""), collapse = ","), "]"))
    return(paste0("{", paste0("\"", names(x), "\":", vapply(x, json, ""), collapse = ","), "}"))
  }
  if (is.character(x)) return(paste0("\"", x, "\""))
  format(x, digits = 15, scientific = FALSE, trim = TRUE)
}

# Row means and variances of a matrix with one simulated trial a row.
spread <- function(x) rowSums((x - rowMeans(x))^2) / (ncol(x) - 1)
normal_matrix <- function(columns, mean = 0, sd = 1) matrix(rnorm(runs * columns, mean, sd), runs)

# Means of g groups of m: a group effect of variance rho and members of variance 1 - rho, sigma = 1.
group_means <- function(g, m, rho, mean) normal_matrix(g, mean, sqrt(rho + (1 - rho) / m))

factorial <- function(u, delta, interaction) {
  w <- if (interaction) c(1, -1, -1, 1) else c(-1, 1, -1, 1) / 2
  means <- c(0, 0, 0, delta / w[4])
  cells <- lapply(means, function(mean) normal_matrix(u, mean))
  estimate <- Reduce(`+`, Map(function(cell, weight) weight * rowMeans(cell), cells, w))
  pooled <- Reduce(`+`, lapply(cells, spread)) / 4
  list(t = estimate / sqrt(pooled * sum(w^2) / u), df = 4 * u - 4)
}

nested <- function(n0, g, m, rho, delta) {
  control <- normal_matrix(n0); active <- group_means(g, m, rho, delta)
  a <- spread(control) / n0; b <- spread(active) / g
  list(t = (rowMeans(active) - rowMeans(control)) / sqrt(a + b), df = (a + b)^2 / (a^2 / (n0 - 1) + b^2 / (g - 1)))
}

pooled_t <- function(control, active) {
  k <- c(ncol(control), ncol(active))
  s2 <- ((k[1] - 1) * spread(control) + (k[2] - 1) * spread(active)) / (sum(k) - 2)
  list(t = (rowMeans(active) - rowMeans(control)) / sqrt(s2 * sum(1 / k)), df = sum(k) - 2)
}

# Cluster means of n2 subclusters of n1: variances rho1, rho2 - rho1 and 1 - rho2 at the three levels.
three_levels <- function(k, n1, n2, rho, delta) {
  sd <- sqrt(rho[1] + (rho[2] - rho[1]) / n2 + (1 - rho[2]) / (n1 * n2))
  pooled_t(normal_matrix(k[1], 0, sd), normal_matrix(k[2], delta, sd))
}

# Proportions: a member shows its cluster's draw, its subcluster's or its own with probabilities that make the
# correlations rho1 and rho2 exact.
three_level_proportions <- function(k, n1, n2, rho, p) {
  from_cluster <- sqrt(rho[1]); from_subcluster <- sqrt(rho[2] - rho[1])
  arm <- function(clusters, p) {
    cells <- runs * clusters
    shared <- rep(rbinom(cells, 1, p), each = n2); sub <- rbinom(cells * n2, 1, p)
    counts <- rmultinom_rows(cells * n2, n1, c(from_cluster, from_subcluster, 1 - from_cluster - from_subcluster))
    total <- counts[, 1] * shared + counts[, 2] * sub + rbinom(cells * n2, counts[, 3], p)
    matrix(colSums(matrix(total, n2)) / (n1 * n2), runs)
  }
  pooled_t(arm(k[1], p[1]), arm(k[2], p[2]))
}
rmultinom_rows <- function(n, size, prob) t(rmultinom(n, size, prob))

rejections <- function(result, tail, shift = 0) sum(result$t + shift > qt(tail, result$df, lower.tail = FALSE))

superiority <- list(hypothesis = "superiority", alpha = 0.05, sides = 2)
means <- function(delta) list(kind = "continuous", difference = delta, sd = 1)
trial <- function(id, request, power, error, tail) list(id = id, request = request, runs = runs,
  rejected = rejections(power, tail), rejectedUnderNull = rejections(error, tail))
case <- function(outcome, design, units, test = superiority)
  list(outcome = outcome, test = test, design = design, aim = list(find = "power", units = units))

nested_design <- function(rho, m, share = c(1, 1))
  list(family = "partially-nested", icc = rho, groupSize = m, allocation = as.list(share))
levels_design <- function(rho, n1, n2) list(family = "three-level-cluster", iccCluster = rho[1],
  iccSubcluster = rho[2], subclusterSize = n1, subclustersPerCluster = n2)
non_inferiority <- function(margin) list(hypothesis = "non-inferiority", alpha = 0.025, sides = 1, margin = margin)

cases <- list(
  trial("factorial, main effect", case(means(0.5), list(family = "factorial", estimand = "main-effect"), 32),
    factorial(32, 0.5, FALSE), factorial(32, 0, FALSE), 0.025),
  trial("factorial, main effect in the smallest cells",
    case(means(2), list(family = "factorial", estimand = "main-effect"), 2),
    factorial(2, 2, FALSE), factorial(2, 0, FALSE), 0.025),
  trial("factorial, interaction", case(means(1), list(family = "factorial", estimand = "interaction"), 32),
    factorial(32, 1, TRUE), factorial(32, 0, TRUE), 0.025),
  trial("partially nested", case(means(0.5), nested_design(0.05, 8), 10),
    nested(80, 10, 8, 0.05, 0.5), nested(80, 10, 8, 0.05, 0), 0.025),
  trial("partially nested, few large groups", case(means(0.8), nested_design(0.2, 12, c(1, 2)), 5),
    nested(30, 5, 12, 0.2, 0.8), nested(30, 5, 12, 0.2, 0), 0.025),
  trial("partially nested, three groups", case(means(0.8), nested_design(0.1, 10), 3),
    nested(30, 3, 10, 0.1, 0.8), nested(30, 3, 10, 0.1, 0), 0.025),
  trial("partially nested, non-inferiority",
    case(c(means(0.1), list(better = "higher")), nested_design(0.1, 6), 12, non_inferiority(0.4)),
    nested(72, 12, 6, 0.1, 0.1 + 0.4), nested(72, 12, 6, 0.1, 0), 0.025),
  trial("three levels", case(means(1 / 3), levels_design(c(0.02, 0.06), 10, 4), 9),
    three_levels(c(9, 9), 10, 4, c(0.02, 0.06), 1 / 3), three_levels(c(9, 9), 10, 4, c(0.02, 0.06), 0), 0.025),
  trial("three levels, four clusters an arm", case(means(0.6), levels_design(c(0.05, 0.2), 5, 3), 4),
    three_levels(c(4, 4), 5, 3, c(0.05, 0.2), 0.6), three_levels(c(4, 4), 5, 3, c(0.05, 0.2), 0), 0.025),
  trial("three levels, proportions",
    case(list(kind = "binary", control = 0.4, active = 0.55), levels_design(c(0.02, 0.05), 8, 4), 12),
    three_level_proportions(c(12, 12), 8, 4, c(0.02, 0.05), c(0.4, 0.55)),
    three_level_proportions(c(12, 12), 8, 4, c(0.02, 0.05), c(0.4, 0.4)), 0.025)
)
cat("[\n", paste(vapply(cases, json, ""), collapse = ",\n"), "\n]\n", sep = "")
