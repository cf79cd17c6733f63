"""remainders.json, deviance.json, stirling.json: differences that lose their digits when taken as they stand. Run with Debian's python3-mpmath:

    /usr/bin/python3 elementary.py
"""
from exact import exp, log, loggamma, mp, mpf, write

mp.dps = 60
small = [10.0**-k for k in range(1, 17)] + [0.0999, 0.1001, 0.05, 0.1999, 0.2001, 0.5, 0.9]
arguments = [sign * u for u in small for sign in (1, -1)] + [1.7, 5.0, 30.0, -3.0, -40.0]
write(
    "remainders.json",
    ["u", "exponential", "logarithm"],
    [[u, exp(mpf(u)) - 1 - mpf(u), log(1 + mpf(u)) - mpf(u) if u > -1 else -1] for u in arguments],
)

pairs = [(k, k * (1 + sign * share)) for k in (0.05, 1, 37.5, 1e6, 5e11) for share in small[:10] + small[16:] for sign in (1, -1)]
write(
    "deviance.json",
    ["k", "m", "deviance"],
    [[k, m, mpf(k) * log(mpf(k) / mpf(m)) + mpf(m) - mpf(k)] for k, m in pairs],
)

shapes = [0.01, 0.05, 0.3, 0.5, 1, 1.5, 2, 4.4, 9.99, 10, 10.01, 17, 60.5, 1e3, 1e6, 5e11]
write(
    "stirling.json",
    ["a", "error"],
    [[a, loggamma(mpf(a) + 1) - (mpf(a) + 0.5) * log(mpf(a)) + mpf(a) - log(2 * mp.pi) / 2] for a in shapes],
)
