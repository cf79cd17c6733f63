# one-factor.json, step-down.json, dunnett.json: joint probabilities of comparisons with one control, rejections of a
# step-down test, and Dunnett's critical values, in base R. Run: Rscript one_factor.R (about a minute)
# By Gauss-Legendre panels over the shared normal value z and, unlike the package, over the scale s itself, cut where
# a limit crosses a centre; each result is computed with 14 and with 22 nodes a panel, which must agree.

rule <- function(n) {
  k <- seq_len(n - 1)
  b <- k / sqrt(4 * k^2 - 1)
  half <- rbind(cbind(0, diag(b)), 0)
  e <- eigen(half + t(half), symmetric = TRUE)
  list(x = e$values, w = 2 * e$vectors[1, ]^2)
}
rules <- list(coarse = rule(14), fine = rule(22))

panels <- function(points, low, high, r) {
  edges <- sort(unique(c(low, high, points[points > low & points < high])))
  half <- diff(edges) / 2
  middle <- edges[-1] - half
  list(x = as.vector(outer(r$x, half) + rep(middle, each = length(r$x))), w = as.vector(outer(r$w, half)))
}

# Nodes over s with the density of sqrt(chi-squared(df)/df); df NULL is the normal distribution.
scales <- function(df, limits, lambda, centres, r) {
  if (is.null(df)) return(list(x = 1, w = 1))
  width <- 1 / sqrt(2 * df)
  low <- max(0, 1 - 14 * width); high <- 1 + 14 * width
  points <- c(1 + seq(-14, 14, 2) * width, high * 2^-(1:24))
  for (c in unique(limits)) if (abs(c) * width > 1)
    for (d in unique(c(centres, 0))) points <- c(points, (d + seq(-10, 10, 2)) / abs(c))
  # Where two steep limits cross in z.
  steep <- sqrt(1 - lambda^2) / abs(lambda)
  for (i in which(steep < 0.5)) for (j in which(steep < 0.5)) if (i < j) {
    slope <- limits[i] / lambda[i] - limits[j] / lambda[j]
    crossing <- (centres[i] / lambda[i] - centres[j] / lambda[j]) / slope
    points <- c(points, crossing + seq(-15, 15, 3) * max(steep[i], steep[j]) / abs(slope))
  }
  s <- panels(points[is.finite(points)], low, high, r)
  s$w <- s$w * 2 * df * s$x * dchisq(df * s$x^2, df)
  s
}

# The mean over z and s of given(above), above(i, c) being P(T_i > c) there.
expectation <- function(lambda, ncp, df, limits, given, r) {
  own <- sqrt(1 - lambda^2)
  s <- scales(df, limits, lambda, ncp, r)
  total <- 0
  for (j in seq_along(s$x)) {
    points <- seq(-10, 10, 2)
    for (i in which(own / abs(lambda) < 0.5)) for (c in unique(c(limits, -limits)))
      points <- c(points, (c * s$x[j] - ncp[i]) / lambda[i] + c(-9, -6, -3, 0, 3, 6, 9) * own[i] / abs(lambda[i]))
    z <- panels(points, -10, 10, r)
    weight <- s$w[j] * z$w * dnorm(z$x)
    above <- function(i, c) pnorm((c * s$x[j] - ncp[i] - lambda[i] * z$x) / own[i], lower.tail = FALSE)
    total <- total + vapply(given(above), function(v) sum(weight * v), 0)
  }
  total
}
checked <- function(lambda, ncp, df, limits, given) {
  coarse <- expectation(lambda, ncp, df, limits, given, rules$coarse)
  fine <- expectation(lambda, ncp, df, limits, given, rules$fine)
  if (!all(abs(coarse - fine) < 1e-12 + 1e-9 * abs(fine))) stop(paste(c("nodes:", lambda, ncp, df, limits, coarse - fine), collapse = " "))
  fine
}

any_of <- function(chances) Reduce(function(left, p) left + p * (1 - left), chances, 0)
joint <- function(limits) function(above) {
  k <- seq_along(limits)
  over <- lapply(k, function(i) above(i, limits[i]))
  list(Reduce(`*`, lapply(over, function(p) 1 - p)), any_of(over), Reduce(`*`, over),
    any_of(lapply(k, function(i) over[[i]] + 1 - above(i, -limits[i]))))
}

h <- sqrt(0.5)
load <- function(...) sqrt(c(...) / (1 + c(...)))
cases <- list()
add <- function(lambda, ncp, df, limits) {
  limits <- rep_len(limits, length(lambda))
  cases[[length(cases) + 1]] <<- c(list(lambda, ncp, df, limits), as.list(checked(lambda, ncp, df, limits, joint(limits))))
}
add(c(h, h), c(0, 0), 30, 2.3); add(c(h, h), c(3, 3), 30, 2.3); add(c(h, h), c(3, 1.4), 8, 2.6)
add(c(h, -h), c(2.8, 2.1), 12, 2.2); add(c(h, h, h), c(2.5, 3.1, 0.4), 60, 2.4); add(c(h, -h, h), c(0, 0, 0), 20, 2.1)
add(c(h, -h, h), c(3, 2, 4), 5, 3); add(load(0.3, 0.9, 2.5), c(1, 3, 2), 17, 2.35)
add(load(0.3, 0.9, 2.5), c(0, 0, 0), NULL, 2.1); add(load(0.5, 0.5), c(3.2, 2.9), NULL, 2.24)
add(rep(h, 4), rep(3, 4), 1000, 2.45); add(rep(h, 10), rep(0, 10), 40, 2.9); add(rep(h, 10), rep(3.4, 10), 40, 2.9)
add(rep(c(h, -h), 3), rep(3.1, 6), 25, 2.6); add(load(1:10), 2 + 0.2 * (0:9), 90, 2.6)
for (df in 1:3) for (c in c(2.5, 12.7, 44, 636)) {
  add(c(h, h), c(0, 0), df, c); add(c(h, h, h), c * c(0.9, 1.1, 0.5), df, c); add(c(h, -h), c * c(0.7, 1), df, c)
  add(load(1000, 1000), c * c(0.9, 0.6), df, c); add(load(1000, 0.001), c(0, 0), df, c)
}
for (df in c(10, 4000)) {
  add(load(1000, 1000), c(2.8, 3.1), df, 2.1); add(load(1000, 500), c(0, 0), df, 2)
  add(load(1000, 1000) * c(1, -1), c(2.4, 2.7), df, 2.2); add(load(1000, 1000) * c(1, -1), c(0, 0), df, 2.6)
  add(load(0.001, 0.001), c(2.5, 3), df, 2.25); add(load(0.001, 1), c(2.5, 3), df, 3.3)
}
add(c(h, h), c(-1, 3), 30, 2.3); add(c(h, h), c(0, 0), 1e7, 2.2); add(c(h, h), c(2.8, 2.8), 1e7, 2.2)
add(c(h, h), c(8, 9), 200, 2.3); add(c(0.999999, 0.5), c(2, 3), 40, 2.2); add(c(h, h, h), c(0, 0, 0), 18, 7)
add(c(h, h), c(0, 0), 12, 14); add(c(h, h), c(2, 3), 20, c(2, 2.5)); add(load(0.5, 2, 1), c(3, 1, 2), 9, c(2.8, 2.2, 1.9))
add(c(h, -h), c(2, 2.5), NULL, c(1.7, 2.3))

# Every way the statistics can lie between the limits, and whom the test rejects there.
stepping <- function(limits) {
  k <- length(limits)
  places <- as.matrix(expand.grid(rep(list(seq_len(k + 1)), k)))
  rejected <- apply(places, 1, function(place) {
    by_size <- order(place)
    failing <- which(place[by_size] > seq_len(k))
    if (length(failing)) by_size[seq_len(failing[1] - 1)] else by_size
  }, simplify = FALSE)
  function(above) {
    tails <- lapply(seq_len(k), function(i) c(list(0), lapply(limits, function(c) above(i, c)), list(1)))
    between <- lapply(tails, function(t) lapply(seq_len(k + 1), function(b) t[[b + 1]] - t[[b]]))
    each <- rep(list(0), k + 1)
    for (row in which(lengths(rejected) > 0)) {
      chance <- Reduce(`*`, lapply(seq_len(k), function(i) between[[i]][[places[row, i]]]))
      for (i in rejected[[row]]) each[[i]] <- each[[i]] + chance
      if (length(rejected[[row]]) == k) each[[k + 1]] <- each[[k + 1]] + chance
    }
    each
  }
}
steps <- list()
step <- function(lambda, ncp, df, limits) {
  found <- checked(lambda, ncp, df, limits, stepping(limits)); k <- length(limits)
  steps[[length(steps) + 1]] <<- list(lambda, ncp, df, limits, found[1:k], found[k + 1])
}
step(c(h, h), c(3, 3), 60, c(2.3, 2)); step(c(h, h), c(3, 1.5), 10, c(2.63, 2.23)); step(c(h, -h), c(2.5, 2.9), 24, c(2.39, 2.06))
step(rep(h, 3), rep(2.6, 3), 40, c(2.5, 2.33, 2.02)); step(load(0.4, 1, 2), c(3.2, 2, 1), 15, c(2.69, 2.49, 2.13))
step(rep(h, 3), c(3, 3, 1), NULL, c(2.39, 2.24, 1.96)); step(load(1000, 1000), c(2.9, 2.2), 3000, c(2.25, 1.97))
step(c(h, h), c(9, 7), 3, c(4.2, 3.2)); step(c(h, h, -h, h), c(3, 3, 2, 2), NULL, c(2.5, 2.39, 2.24, 1.96))
step(rep(h, 4), rep(3, 4), 30, c(2.66, 2.54, 2.36, 2.04)); step(load(0.5, 1, 0.5, 2), c(3, 3, 3, 2), 22, c(2.72, 2.6, 2.41, 2.07))

criticals <- list()
critical <- function(alpha, sides, lambda, df) {
  pick <- if (sides == 2) 4 else 2
  excess <- function(c, r = rules$coarse) {
    limits <- rep(c, length(lambda))
    log(expectation(lambda, 0 * lambda, df, limits, joint(limits), r)[pick] / alpha)
  }
  q <- function(p) if (is.null(df)) qnorm(p, lower.tail = FALSE) else qt(p, df, lower.tail = FALSE)
  ends <- c(q(alpha / sides), q(alpha / sides / length(lambda)))
  c <- uniroot(excess, ends + c(-1e-9, 1e-9), tol = 1e-13 * ends[2])$root
  stopifnot(abs(excess(c, rules$fine)) < 1e-11)
  criticals[[length(criticals) + 1]] <<- list(alpha, sides, lambda, df, c)
}
critical(0.05, 2, c(h, h), 60); critical(0.05, 1, c(h, h), 60); critical(0.05, 2, rep(h, 3), 5); critical(0.01, 1, rep(h, 4), 20)
critical(0.05, 2, rep(h, 5), NULL); critical(0.001, 2, c(h, h), 3); critical(0.001, 1, c(h, h), 1); critical(0.001, 2, c(h, h), 2)
critical(0.025, 1, load(0.5, 1.5), 33); critical(0.1, 2, load(0.3, 2, 0.7), 12); critical(0.025, 1, c(h, -h), 40)
critical(0.05, 2, c(h, -h), 40); critical(0.05, 2, load(1000, 1000), 4000); critical(0.001, 2, load(1000, 1000), 4000)
critical(0.001, 1, load(1000, 1000, 1000), 3); critical(0.05, 1, load(0.001, 0.001), 2000); critical(1e-6, 2, c(h, h), 50)
critical(0.5, 1, rep(h, 3), 4); critical(0.05, 2, rep(h, 10), 100); critical(0.001, 1, rep(h, 10), 30)
critical(0.05, 2, load(1:10 / 5), 200); critical(0.001, 1, c(h, -h, h), 2)

json <- function(x) {
  if (is.null(x)) return("null")
  values <- vapply(x, function(v) format(v, digits = 17, trim = TRUE), "")
  if (length(x) == 1) values else paste0("[", paste(values, collapse = ", "), "]")
}
write_table <- function(file, columns, rows) {
  lines <- vapply(rows, function(row) paste0("[", paste(vapply(row, json, ""), collapse = ", "), "]"), "")
  writeLines(paste0("{\"columns\": [", paste0("\"", columns, "\"", collapse = ", "), "], \"rows\": [\n",
    paste(lines, collapse = ",\n"), "\n]}"), file)
}
common <- c("loadings", "noncentralities", "df", "limits")
write_table("one-factor.json", c(common, "allBelow", "anyAbove", "allAbove", "anyOutside"), cases)
write_table("step-down.json", c(common, "each", "all"), steps)
write_table("dunnett.json", c("alpha", "sides", "loadings", "df", "criticalValue"), criticals)
