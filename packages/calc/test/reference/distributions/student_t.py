"""student-t.json: tails and quantiles of Student's t. Run with Debian's python3-mpmath (a few minutes):

    /usr/bin/python3 student_t.py
"""
from exact import exp, expm1, log, mpf, root, sqrt, t_tails, write

DEGREES = [0.1, 0.5, 1, 1.5, 2, 3, 4.7, 7, 10, 19, 23.9, 24.1, 38, 61.3, 98, 198, 1e3, 12345.6, 1e5, 1e7, 1e9, 1e12]
TAILS = [0.499, 0.45, 0.35, 0.301, 0.299, 0.2, 0.1, 0.05, 0.025, 0.005, 1e-3, 1e-5, 1e-8, 1e-13, 1e-20, 1e-50, 1e-150, 1e-300]


def upper_quantile(p, df):
    """On log(1 + t²/df), which no tail here drives out of reach."""
    at = lambda q: sqrt(df * expm1(q))
    excess = lambda q: log(p) - log(t_tails(at(q), df)[1])
    reach = mpf(10) ** -10 / df
    while excess(2 * reach) < 0:
        reach *= 2
    return at(root(excess, reach, 2 * reach))


quantiles = []
for df in DEGREES:
    for p in TAILS:
        t = upper_quantile(p, df)
        if t < 1e300:
            quantiles.append([p, df, t])
write("student-t-quantile.json", ["p", "df", "upperQuantile"], quantiles)

points = [[float(t), df] for _, df, t in quantiles]
points += [[x, df] for df in DEGREES for x in (1e-200, 1e-9, 0.01, 0.3, 1, 1.7, 2.6, 4.2, 8.5, 36.5)]
rows = [[x, df, *t_tails(x, df)] for x, df in points]
rows += [[-x, df, upper, lower] for x, df, lower, upper in rows[::5]]
write("student-t.json", ["x", "df", "lower", "upper"], [row for row in rows if min(row[2:]) > 1e-305])
