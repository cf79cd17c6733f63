# mvtnorm.json: probabilities of comparisons with one control from Debian's r-cran-mvtnorm, each with an error it stays
# within. Run: Rscript mvtnorm.R > mvtnorm.json
# TVPACK (Genz 2004) is exact to its abseps for two or three central statistics; Miwa, Hayter & Kuriki 2003 for normal
# ones; elsewhere Genz & Bretz 2009, with three times the error it states, which is an estimate.

library(mvtnorm)
set.seed(41)
load <- function(ratio) sqrt(ratio / (1 + ratio))
h <- sqrt(0.5)
correlation <- function(l) { r <- outer(l, l); diag(r) <- 1; r }

cases <- list()
add <- function(l, ncp, df, c, algorithm, error) {
  k <- length(l)
  ask <- function(lower, upper) {
    p <- if (is.null(df)) pmvnorm(lower - ncp, upper - ncp, corr = correlation(l), algorithm = algorithm)
      else pmvt(lower, upper, delta = ncp, df = df, corr = correlation(l), algorithm = algorithm, type = "Kshirsagar")
    c(p, if (is.null(error)) 3 * attr(p, "error") else error)
  }
  below <- ask(rep(-Inf, k), rep(c, k))
  # TVPACK takes one-sided limits alone.
  inside <- if (inherits(algorithm, "TVPACK")) c(NA, 0) else ask(rep(-c, k), rep(c, k))
  above <- ask(rep(c, k), rep(Inf, k))
  cases[[length(cases) + 1]] <<- list(l, ncp, df, rep(c, k), below[1], above[1], inside[1], max(below[2], above[2], inside[2]))
}
for (l in list(c(h, h), load(c(0.4, 1.7)), c(h, -h), load(c(1000, 1000)), c(h, h, h), load(c(0.3, 1, 3)), c(h, -h, h)))
  for (df in c(1, 2, 3, 10, 60, 4000))
    for (c in c(1.5, 2.4, 9)) add(l, 0 * l, df, c, TVPACK(abseps = 1e-14), 1e-12)
for (l in list(c(h, h), c(h, h, h), load(c(0.3, 1, 3)), rep(h, 4), load(c(0.5, 0.8, 1.2, 2))))
  for (c in c(1.8, 2.3)) add(l, seq(0, 3, length.out = length(l)), NULL, c, Miwa(steps = 1024), 1e-8)
precise <- GenzBretz(maxpts = 3e5, abseps = 1e-7, releps = 0)
for (l in list(rep(h, 3), rep(h, 6), rep(h, 10), load(c(0.4, 0.7, 1, 1.5)), c(h, -h, h, -h)))
  for (df in c(5, 40)) for (c in c(2.2, 3)) add(l, seq(1, 4, length.out = length(l)), df, c, precise, NULL)

json <- function(x) {
  if (is.null(x) || identical(x, NA_real_) || (length(x) == 1 && is.na(x))) return("null")
  x <- format(x, digits = 15, trim = TRUE)
  x
}
row_of <- function(case) {
  vector_of <- function(v) paste0("[", paste(vapply(v, json, ""), collapse = ", "), "]")
  paste0("[", paste(c(vector_of(case[[1]]), vector_of(case[[2]]), json(case[[3]]), vector_of(case[[4]]),
    vapply(case[5:8], json, "")), collapse = ", "), "]")
}
cat('{"columns": ["loadings", "noncentralities", "df", "limits", "allBelow", "allAbove", "allInside", "error"], "rows": [\n',
  paste(vapply(cases, row_of, ""), collapse = ",\n"), "\n]}\n", sep = "")
