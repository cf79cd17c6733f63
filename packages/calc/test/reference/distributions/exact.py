"""Distribution functions in several hundred digits, for the tables beside this file.

Every tail comes from a series of positive terms (or, for the noncentral t, a mixture of such series), carried to
so many digits that one minus it is still right; none of it is the method of the package. Doubles are taken
exactly as they are.
"""
import json
import pathlib

from mpmath import beta, erfc, exp, expm1, gamma, log, loggamma, mp, mpf, quad, sqrt

mp.dps = 400


def normal_upper(x):
    return erfc(mpf(x) / sqrt(mpf(2))) / 2


def gamma_tails(a, x):
    """Lower and upper tail of the gamma distribution with shape a."""
    a, x = mpf(a), mpf(x)
    if a > 20000:
        return by_quadrature(lambda u: a * u - x * expm1(u), exp(a * log(x) - x - loggamma(a)), a - x, x)
    term = exp(a * log(x) - x - loggamma(a + 1))
    total, k = term, 0
    while term > total * mpf(10) ** -mp.dps:
        k += 1
        term *= x / (a + k)
        total += term
    return total, 1 - total


def beta_tails(a, b, odds):
    """Lower and upper tail of the beta distribution at x/(1 - x) = odds."""
    a, b, odds = mpf(a), mpf(b), mpf(odds)
    x, y, n = odds / (1 + odds), 1 / (1 + odds), a + b
    if odds > 1 and n * y < 40000:
        return beta_tails(b, a, 1 / odds)[::-1]
    start = a * log(x) + b * log(y) - log_beta(a, b)
    if n * min(x, y) > 40000:
        return by_quadrature(lambda u: a * u - n * log(1 + x * expm1(u)), exp(start), a - n * x, n * x * y)
    term = exp(start) / a
    total, k = term, 0
    while term > total * mpf(10) ** -mp.dps:
        term *= (n + k) * x / (a + 1 + k)
        total += term
        k += 1
    return total, 1 - total


def log_beta(a, b):
    with mp.extradps(40):
        return loggamma(a) + loggamma(b) - loggamma(a + b)


def by_quadrature(rise, density, slope, bend):
    """Both tails beyond 0 of density * exp(rise(u)) where every shape is large, in 50 digits."""
    digits, mp.dps = mp.dps, 50
    try:
        side = -1 if slope > 0 else 1
        width = 1 / (abs(slope) / 4 + sqrt(bend))
        total, k = mpf(0), 0
        while True:
            piece = quad(lambda u: exp(rise(side * u)), [k * width, (k + 1) * width], method="gauss-legendre")
            total, k = total + piece, k + 1
            if piece < total * mpf(10) ** -45:
                break
        tail = +density * total
    finally:
        mp.dps = digits
    return (tail, 1 - tail) if side < 0 else (1 - tail, tail)


def t_tails(x, df):
    x, df = mpf(x), mpf(df)
    if x == 0:
        return mpf(1) / 2, mpf(1) / 2
    inside, outside = beta_tails(mpf(1) / 2, df / 2, x * x / df)
    above = outside / 2 if x > 0 else 1 - outside / 2
    return 1 - above, above


def noncentral_t_tails(x, df, ncp):
    """Lower and upper tail as a Poisson mixture of beta tails (Lenth 1989, Applied Statistics 38:185, AS 243)."""
    x, df, ncp = mpf(x), mpf(df), mpf(ncp)
    if x < 0:
        return noncentral_t_tails(-x, df, -ncp)[::-1]
    lower = normal_upper(ncp)
    if x > 0:
        b, odds, half = df / 2, x * x / df, ncp * ncp / 2
        y, rest = odds / (1 + odds), 1 / (1 + odds)
        even, odd = beta_tails(mpf(1) / 2, b, odds)[0], beta_tails(1, b, odds)[0]
        # What the beta tails lose as their first shape grows by one.
        even_step = exp(log(y) / 2 + b * log(rest) - log_beta(mpf(1) / 2, b)) * 2
        odd_step = exp(log(y) + b * log(rest) - log_beta(mpf(1), b))
        p, q = exp(-half), ncp / sqrt(mpf(2)) * exp(-half) / gamma(mpf(3) / 2)
        j = 0
        while True:
            added = (p * even + q * odd) / 2
            lower += added
            if j > half and abs(added) < mpf(10) ** -(mp.dps - 20) * lower:
                break
            even, odd = even - even_step, odd - odd_step
            even_step *= y * (j + mpf(1) / 2 + b) / (j + mpf(3) / 2)
            odd_step *= y * (j + 1 + b) / (j + 2)
            j += 1
            p, q = p * half / j, q * half / (j + mpf(1) / 2)
    return lower, 1 - lower


def root(f, low, high):
    """Where the rising function f passes 0 between low and high: bisection, then secants, to 25 digits."""
    low, high = mpf(low), mpf(high)
    for _ in range(150):
        if high - low < abs(low + high) / 1000:
            break
        middle = (low + high) / 2
        if f(middle) < 0:
            low = middle
        else:
            high = middle
    at_low, at_high = f(low), f(high)
    for _ in range(60):
        if at_high == at_low:
            return high
        following = high - at_high * (high - low) / (at_high - at_low)
        low, at_low, high = high, at_high, following
        if abs(high - low) < abs(high) * mpf(10) ** -25:
            return high
        at_high = f(high)
    raise ArithmeticError("no root")


def log_quantile(lower, p, start, step):
    """The u below which lies p, where lower(u) is the tail: widening from a start in the middle by doubled steps."""

    def excess(u):
        return log(max(lower(u), mpf(10) ** -390)) - log(mpf(p))

    low = high = start
    while excess(low) > 0:
        low, step = low - step, 2 * step
    while excess(high) < 0:
        high, step = high + step, 2 * step
    return root(excess, low, high)


def write(name, columns, rows):
    """One row a line, each figure the double nearest to the exact value."""
    lines = ",\n".join(json.dumps([float(value) for value in row]) for row in rows)
    text = f'{{"columns": {json.dumps(columns)}, "rows": [\n{lines}\n]}}\n'
    pathlib.Path(__file__).with_name(name).write_text(text)
    print(name, len(rows), "rows", len(text), "bytes")
