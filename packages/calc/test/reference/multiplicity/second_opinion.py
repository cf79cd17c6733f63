"""A second opinion on one-factor.json: some of its rows, none of nearly the same comparisons, computed anew, with nodes from mpmath and the C library's erfc in
place of R's. Prints the largest difference. Run after one_factor.R with Debian's python3-mpmath (some minutes):

    /usr/bin/python3 second_opinion.py
"""
import json
import math
import pathlib

from mpmath import mp, mpf

mp.dps = 30


def legendre(degree, x):
    """The Legendre polynomial and its slope."""
    before, value = mpf(1), x
    for n in range(2, degree + 1):
        before, value = value, ((2 * n - 1) * x * value - (n - 1) * before) / n
    return value, degree * (x * value - before) / (x * x - 1)


def legendre_rule(count):
    """Nodes and weights on -1...1."""
    rule = []
    for i in range(count):
        x = mp.cos(mp.pi * (i + mpf(3) / 4) / (count + mpf(1) / 2))
        for _ in range(8):
            value, slope = legendre(count, x)
            x -= value / slope
        slope = legendre(count, x)[1]
        rule.append((float(x), float(2 / ((1 - x * x) * slope * slope))))
    return rule


RULE = legendre_rule(20)
upper = lambda x: 0.5 * math.erfc(x / math.sqrt(2))


def panels(edges):
    for a, b in zip(edges, edges[1:]):
        half, middle = (b - a) / 2, (a + b) / 2
        for node, weight in RULE:
            yield middle + half * node, half * weight


def cut(points, low, high):
    inside = sorted({low, high, *(p for p in points if low < p < high)})
    return [p for p, q in zip(inside, inside[1:]) if q - p > 1e-12 * max(1, abs(p))] + [high]


def scales(df, limits, centres):
    """Nodes over s with the density of sqrt(chi-squared(df)/df)."""
    if df is None:
        return [(1.0, 1.0)]
    width = 1 / math.sqrt(2 * df)
    low, high = max(0.0, 1 - 14 * width), 1 + 14 * width
    points = [1 + k * width for k in range(-14, 15, 2)]
    for c in set(limits):
        if abs(c) * width > 1:
            for d in set(centres) | {0.0}:
                points += [(d + k) / abs(c) for k in range(-10, 11, 2)]
    points += [high * 2.0 ** -k for k in range(1, 24)]
    a = mpf(df) / 2
    constant = float(mp.log(2) + a * mp.log(a) - a - mp.loggamma(a))
    density = lambda s: math.exp(constant + (df - 1) * math.log(s) - 0.5 * df * (s - 1) * (s + 1))
    return [(s, w * density(s)) for s, w in panels(cut(points, low, high))]


def expectation(loadings, centres, df, limits, given):
    """The mean of given(tails) over z and s; tails[i](c) is P(T_i > c) there."""
    own = [math.sqrt(1 - l * l) for l in loadings]
    centres = [float(d) for d in centres]
    total = None
    for s, weight in scales(df, limits, centres):
        points = list(range(-10, 11, 2))
        for l, o, d in {(l, o, d) for l, o, d in zip(loadings, own, centres) if abs(o / l) < 0.5}:
            for c in set(limits) | {-c for c in limits}:
                points += [(c * s - d) / l + k * abs(o / l) for k in (-9, -6, -3, 0, 3, 6, 9)]
        inner = []
        for z, w in panels(cut(points, -10.0, 10.0)):
            w *= math.exp(-0.5 * z * z) / math.sqrt(2 * math.pi)
            tails = [lambda c, l=l, o=o, d=d: upper((c * s - d - l * z) / o) for l, o, d in zip(loadings, own, centres)]
            inner.append([w * value for value in given(tails)])
        sums = [weight * math.fsum(column) for column in zip(*inner)]
        total = sums if total is None else [t + x for t, x in zip(total, sums)]
    return total


def product(values):
    return math.prod(values)


def any_of(chances):
    total = 0.0
    for p in chances:
        total += p * (1 - total)
    return total


def joint(limits, centres):
    lower = [-c for c in limits]

    def given(tails):
        above = [t(c) for t, c in zip(tails, limits)]
        return [
            product(1 - p for p in above),
            any_of(above),
            product(above),
            any_of(p + 1 - t(c) for p, t, c in zip(above, tails, lower)),
        ]

    return given


table = json.loads(pathlib.Path(__file__).with_name("one-factor.json").read_text())
worst = 0.0
for loadings, centres, df, limits, *expected in table["rows"][::8]:
    if len(loadings) < 4 and max(map(abs, loadings)) < 0.99:
        found = expectation(loadings, centres, df, limits, joint(limits, centres))
        worst = max(worst, *(abs(a - b) for a, b in zip(found, expected)))
print(f"largest difference {worst:.1e}")
assert worst < 1e-11
