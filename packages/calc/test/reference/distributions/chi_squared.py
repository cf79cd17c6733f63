"""chi-squared.json: tails and quantiles of the chi-squared distribution. Run with Debian's python3-mpmath:

    /usr/bin/python3 chi_squared.py
"""
from exact import exp, gamma_tails, log, log_quantile, mpf, write

DEGREES = [0.1, 0.3, 1, 1.5, 2, 3, 5, 9, 19.9, 20.1, 29, 50, 99, 314.2, 1e3, 2e4, 1e5, 1e7, 1e9, 1e12]
TAILS = [0.499, 0.4, 0.2, 0.1, 0.05, 0.025, 0.005, 1e-3, 1e-5, 1e-9, 1e-14, 1e-20, 1e-60, 1e-150, 1e-300]


def quantile(p, df, side):
    """On log x, turned round for the upper side."""
    a, sign = mpf(df) / 2, 1 if side == 0 else -1
    tail = lambda u: gamma_tails(a, exp(sign * u))[side]
    return 2 * exp(sign * log_quantile(tail, p, sign * log(a), 1 / a**0.5))


quantiles = []
for df in DEGREES:
    for p in TAILS:
        lower, upper = quantile(p, df, 0), quantile(p, df, 1)
        if lower > 1e-300:
            quantiles.append([p, df, lower, upper])
write("chi-squared-quantile.json", ["p", "df", "quantile", "upperQuantile"], quantiles)

points = [[float(x), df] for _, df, lower, upper in quantiles for x in (lower, upper)]
points += [[float(df) * share, df] for df in DEGREES for share in (1, 0.999, 1.001)]
points += [[x, df] for df in DEGREES if df < 5 for x in (1e-200, 1e-20, 1e-3, 0.4, 1.9, 2.1)]
rows = [[x, df, *gamma_tails(mpf(df) / 2, mpf(x) / 2)] for x, df in points]
write("chi-squared.json", ["x", "df", "lower", "upper"], [row for row in rows if min(row[2:]) > 1e-305])
