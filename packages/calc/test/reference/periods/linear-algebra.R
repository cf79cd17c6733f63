# Inverses, Schur complements and eigenvalues of symmetric matrices in base R. Run: Rscript linear-algebra.R > linear-algebra.json

source("model.R")
set.seed(20261207)
rows <- function(x) unname(apply(x, 1, as.list, simplify = FALSE))
one <- function(n, kind) {
  A <- switch(kind, random = crossprod(matrix(rnorm(n * n), n)), decay = 0.9^abs(outer(1:n, 1:n, "-")),
    nearly = matrix(1, n, n) + 1e-6 * diag(n))
  k <- n %/% 2
  left <- A[-(1:k), -(1:k), drop = FALSE] - A[-(1:k), 1:k, drop = FALSE] %*% solve(A[1:k, 1:k, drop = FALSE], A[1:k, -(1:k), drop = FALSE])
  list(id = paste(kind, n), matrix = rows(A), inverse = rows(solve(A)), eliminated = k, complement = rows(left),
    values = as.list(sort(eigen(A, symmetric = TRUE, only.values = TRUE)$values)), condition = kappa(A, exact = TRUE))
}
cases <- list()
for (kind in c("random", "decay", "nearly")) for (n in c(2, 3, 5, 9)) cases <- c(cases, list(one(n, kind)))
cat("[\n", paste(vapply(cases, json, ""), collapse = ",\n"), "\n]\n", sep = "")
