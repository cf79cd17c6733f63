"""f.json and beta.json: tails and quantiles of the F and beta distributions. Run with Debian's python3-mpmath
(several minutes):

    /usr/bin/python3 f.py
"""
from exact import beta_tails, exp, log, log_quantile, mpf, write

SHAPES = [0.05, 0.25, 0.5, 1, 2.5, 7, 9.9, 10.1, 24, 88, 500, 3e4, 1e6, 5e11]
TAILS = [0.499, 0.3, 0.1, 0.025, 1e-3, 1e-7, 1e-14, 1e-30, 1e-120, 1e-300]


def log_odds(p, a, b):
    """The log odds below which lies p."""
    return log_quantile(lambda u: beta_tails(a, b, exp(u))[0], p, log(mpf(a) / mpf(b)), 1 / mpf(a + b) ** 0.5)


quantiles = []
for i, a in enumerate(SHAPES):
    for j, b in enumerate(SHAPES):
        # A third of the tails for each pair of shapes.
        for p in TAILS[(i + 2 * j) % 3 :: 3]:
            u = log_odds(p, a, b)
            if u > -640:
                quantiles.append([p, a, b, u])
write(
    "f-quantile.json",
    ["p", "df1", "df2", "quantile"],
    [[p, 2 * a, 2 * b, exp(u) * mpf(b) / mpf(a)] for p, a, b, u in quantiles],
)
write(
    "beta-quantile.json",
    ["p", "a", "b", "quantile"],
    [[p, a, b, 1 / (1 + exp(-u))] for p, a, b, u in quantiles],
)

f_rows, beta_rows = [], []
for p, a, b, u in quantiles:
    f = float(exp(u) * mpf(b) / mpf(a))
    f_rows.append([f, 2 * a, 2 * b, *beta_tails(a, b, mpf(f) * mpf(a) / mpf(b))])
    x = float(1 / (1 + exp(-u)))
    if 0 < x < 1:
        beta_rows.append([x, a, b, *beta_tails(a, b, mpf(x) / (1 - mpf(x)))])
for a in SHAPES:
    for b in SHAPES:
        f_rows.append([1, 2 * a, 2 * b, *beta_tails(a, b, mpf(a) / mpf(b))])
        x = float(mpf(a) / (mpf(a) + mpf(b)))
        beta_rows.append([x, a, b, *beta_tails(a, b, mpf(x) / (1 - mpf(x)))])
for name, columns, rows in (("f", ["df1", "df2"], f_rows), ("beta", ["a", "b"], beta_rows)):
    kept = [row for row in rows if min(row[3:]) > 1e-305]
    write(f"{name}.json", ["x", *columns, "lower", "upper"], kept)
