# What clusters of gamma-distributed size tell on average of a mean whose variance is b + w/M, by mpmath's quadrature
# over the size itself. Run: python3 expected_precision.py > expected-precision.json
import json

from mpmath import exp, gamma, inf, log, mp, mpf, quad

mp.dps = 40


def expected(between, within, mean, cv):
    shape = 1 / mpf(cv) ** 2
    b, w, m = mpf(between), mpf(within), mpf(mean)

    def integrand(u):
        relative = exp(u)
        return exp(shape * (log(shape) + u - relative)) / gamma(shape) / (b + w / (m * relative))

    spread = 1 / (shape**0.5)
    points = [-60 / shape - 60, -8 * spread - 8, -4 * spread, -spread, 0, spread, 4 * spread, 8 * spread + 3]
    return quad(integrand, points)


rows = []
for cv in (0.01, 0.1, 0.35, 0.7, 1, 1.5, 3):
    for between in (0, 0.001, 0.05, 0.3, 1):
        for within in (0.7, 0.05):
            for mean in (1, 20, 5000, 10**7):
                rows.append([between, within, mean, cv, float(expected(str(between), str(within), mean, str(cv)))])
print("[\n" + ",\n".join(json.dumps(row) for row in rows) + "\n]")
