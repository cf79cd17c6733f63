"""normal.json: tails and quantiles of the standard normal distribution. Run with Debian's python3-mpmath:

    /usr/bin/python3 normal.py
"""
from exact import log, mpf, normal_upper, root, write

points = [k / 8 for k in range(0, 41)] + [5.3 + 0.4 * k for k in range(80)] + [1e-300, 1e-9, 0.674489, 1.959964]
write(
    "normal.json",
    ["x", "lower", "upper"],
    [[x, normal_upper(-mpf(x)), normal_upper(x)] for point in points if point < 37.5 for x in (point, -point)],
)

tails = [k / 100 for k in range(1, 50)] + [0.4999, 0.4999999, 0.499999999999, 0.0749, 0.0751]
tails += [m * 10.0**-k for k in range(3, 20) for m in (1, 2.5, 6)] + [10.0**-k for k in range(20, 308, 7)]
write(
    "normal-quantile.json",
    ["p", "upperQuantile"],
    [[p, root(lambda z: log(p) - log(normal_upper(z)), mpf(0), mpf(40))] for p in tails],
)
