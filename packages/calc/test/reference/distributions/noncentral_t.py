"""noncentral-t.json, noncentrality.json: tails of the noncentral t, and the noncentrality for a power. Run with Debian's python3-mpmath
(several minutes):

    /usr/bin/python3 noncentral_t.py
"""
from exact import exp, log, loggamma, mp, mpf, noncentral_t_tails, normal_upper, quad, root, sqrt, write

DEGREES = [0.1, 0.5, 1, 2, 3.3, 5, 8, 14, 30, 77.7, 198, 1e3, 1e5, 1e7, 1e12]
NONCENTRALITIES = [-10, -4, -1.3, 0, 0.4, 1.5, 2.8, 3.3, 5, 8, 14, 25, 40]
DISTANCES = [-9, -5, -2.5, -0.7, 0, 1.1, 3, 6, 9]


def by_scale(x, df, ncp):
    """P(T' > x) as the mean of normal tails over the scale, a second opinion on the series."""
    digits, mp.dps = mp.dps, 30
    a = mpf(df) / 2
    constant = log(2) + a * log(a) - loggamma(a)
    density = lambda s: exp(constant + (df - 1) * log(s) - a * s * s)
    width = 1 / sqrt(2 * mpf(df))
    edges = [max(mpf(0), 1 + k * width) for k in range(-14, 26, 2)]
    edges = sorted(set(edges))
    value = quad(lambda s: normal_upper(x * s - ncp) * density(s), edges)
    mp.dps = digits
    return value


for x, df, ncp in ((2.2, 8, 3), (-1, 30, -2), (40, 14, 25), (1.98, 1000, 4), (3, 5, 0.4), (-6, 77.7, -10)):
    assert abs(by_scale(x, df, ncp) / noncentral_t_tails(x, df, ncp)[1] - 1) < 1e-15, (x, df, ncp)

rows = []
for i, df in enumerate(DEGREES):
    for j, ncp in enumerate(NONCENTRALITIES):
        for k, distance in enumerate(DISTANCES):
            # Points some standard deviations from the middle, where the normal approximation has it.
            middle = ncp * (1 + 0.75 / max(df, 2))
            x = float(f"{middle + distance * (1 + ncp * ncp / (2 * max(df, 2))) ** 0.5:.4g}")
            if (i + j + k) % 2 == 0:
                rows.append([x, df, ncp, *noncentral_t_tails(x, df, ncp)])
        for x in (-30.5, 1.96, 2.3):
            rows.append([x, df, ncp, *noncentral_t_tails(x, df, ncp)])
write("noncentral-t.json", ["x", "df", "ncp", "lower", "upper"], rows)

mp.dps = 50


def noncentrality(power, x, df):
    excess = lambda ncp: noncentral_t_tails(x, df, ncp)[1] - mpf(power)
    low, high, step = mpf(x) - 2, mpf(x) + 2, mpf(2)
    while excess(low) > 0:
        low, step = low - step, step * 1.5
    while excess(high) < 0:
        high, step = high + step, step * 1.5
    return root(excess, low, high)


tests = [(6.314, 1), (12.71, 1), (4.303, 2), (31.6, 2), (2.78, 3.3), (2.571, 5), (6.869, 5), (2.306, 8), (2.145, 14)]
tests += [(2.042, 30), (3.646, 30), (1.991, 77.7), (1.972, 198), (1.645, 1e3), (3.3, 1e3), (1.96, 1e5), (1.96, 1e12)]
cases = [(power, x, df) for x, df in tests for power in (1e-9, 0.01, 0.3, 0.8, 0.9, 0.99, 0.999999)]
# Where no test would look.
cases += [(power, x, df) for x in (-3.5, 0, 0.7, 12.5) for df in (1, 6, 40, 1e6) for power in (1e-6, 0.2, 0.5, 0.85, 0.9999)]
write("noncentrality.json", ["power", "x", "df", "ncp"], [[*case, noncentrality(*case)] for case in cases])
