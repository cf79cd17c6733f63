"""Coefficients of millsRatio: the rational function of degree 10 over 11 closest, in relative terms, to
(1 - Phi(z)) / phi(z) on 0..39.

Weighted least squares of numerator - ratio * denominator, reweighted until the largest errors are level.
Run with Debian's python3 and python3-mpmath (about half a minute); prints the largest relative error and the
two polynomials, lowest power first, as they stand in src/distributions/mills-ratio.ts:

    /usr/bin/python3 mills_ratio.py
"""
from mpmath import cos, erfc, exp, lu_solve, matrix, mp, mpf, norm, nstr, pi, polyval, sqrt

mp.dps = 60
TERMS = 11
POINTS = 12 * TERMS
END = mpf(39)


def ratio(z):
    return exp(z * z / 2) * erfc(z / sqrt(2)) * sqrt(pi / 2)


def nodes():
    """Chebyshev points in z / (z + 2), dense where the ratio bends."""
    last = END / (END + 2)
    for k in range(POINTS):
        t = last * (1 - cos(pi * (k + mpf(1) / 2) / POINTS)) / 2
        yield 2 * t / (1 - t)


def least_squares(zs, values, scales):
    a, b = matrix(POINTS, 2 * TERMS), matrix(POINTS, 1)
    for i, (z, value, scale) in enumerate(zip(zs, values, scales)):
        for j in range(TERMS):
            a[i, j] = scale * z**j
            a[i, TERMS + j] = -scale * value * z ** (j + 1)
        b[i] = scale * value
    columns = [norm(a[:, j]) for j in range(2 * TERMS)]
    for j, column in enumerate(columns):
        for i in range(POINTS):
            a[i, j] /= column
    solved = lu_solve(a.T * a, a.T * b)
    solved = [solved[j] / column for j, column in enumerate(columns)]
    return solved[:TERMS], [mpf(1)] + solved[TERMS:]


zs = list(nodes())
values = [ratio(z) for z in zs]
weights, below = [mpf(1)] * POINTS, [mpf(1)] * POINTS
best = None
for step in range(25):
    scales = [sqrt(w) / (v * d) for w, v, d in zip(weights, values, below)]
    numerator, denominator = least_squares(zs, values, scales)
    below = [polyval(denominator[::-1], z) for z in zs]
    errors = [abs(polyval(numerator[::-1], z) / d / v - 1) for z, d, v in zip(zs, below, values)]
    if best is None or max(errors) < best[0]:
        best = max(errors), numerator, denominator
    if step >= 3:
        weights = [w * (e / max(errors) + mpf("1e-3")) for w, e in zip(weights, errors)]
        total = sum(weights)
        weights = [w * POINTS / total for w in weights]

print("largest relative error", nstr(best[0], 3))
for name, coefficients in (("above", best[1]), ("below", best[2])):
    print(name, *(nstr(c, 17) for c in coefficients), sep="\n  ")
