# Reads "difference sd power" a line; prints the processor seconds power.t.test takes with its default tolerance,
# then the sizes it finds with a tight one.
requests <- read.table(file("stdin"), col.names = c("difference", "sd", "power"))
solve <- function(i, ...)
  power.t.test(delta = requests$difference[i], sd = requests$sd[i], power = requests$power[i], ...)$n
each <- seq_len(nrow(requests))
invisible(lapply(1:100, solve))
seconds <- sum(system.time(lapply(each, solve))[c("user.self", "sys.self")])
cat(seconds, format(vapply(each, solve, 0, tol = 1e-10), digits = 15), sep = "\n")
