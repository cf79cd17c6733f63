"""Power of two one-sided tests, integrated to 30 digits.

Run: python3 two_one_sided.py > two-one-sided.json
Each row takes its double-precision inputs as exact: effect, standard error, df (0: normal), critical value, margin.
"""

import json
import random

from mpmath import erfc, exp, loggamma, log, mp, mpf, quad, sqrt

mp.dps = 30


def phi(x):
    return erfc(-x / sqrt(2)) / 2


def power(effect, se, df, critical, margin):
    effect, se, critical, margin = map(mpf, (abs(effect), se, critical, margin))
    near, far = (margin - effect) / se, (margin + effect) / se
    inside = lambda s: phi(near - critical * s) - phi(critical * s - far)
    if df == 0:
        return max(mpf(0), inside(mpf(1)))
    nu = mpf(df)
    constant = log(2) + nu / 2 * log(nu / 2) - loggamma(nu / 2)
    density = lambda s: exp(constant + (nu - 1) * log(s) - nu * s * s / 2) if s > 0 else mpf(0)
    last = (near + far) / (2 * critical)
    spread = 1 / sqrt(2 * nu)
    # Break where the density or either bound turns, so that each panel is smooth.
    breaks = [1 + k * spread for k in (-12, -8, -5, -3, -1, 0, 1, 3, 5, 8, 12, 20, 40)]
    breaks += [(near + k) / critical for k in (-9, -5, -2, 0, 2, 5, 9)]
    breaks += [(far + k) / critical for k in (-9, -5, -2, 0, 2, 5, 9)]
    breaks += [mpf(10) ** -k for k in (1, 2, 4, 8)]
    points = sorted({mpf(0), last} | {b for b in breaks if 0 < b < last})
    return quad(lambda s: inside(s) * density(s), points)


random.seed(1987)
rows = []


def add(effect, se, df, critical, margin):
    rows.append([effect, se, df, critical, margin, float(power(effect, se, df, critical, margin))])


# Critical values near those of alpha 0.1 to 0.001 on the df; df whole and broken.
critical = {
    0: [1.2815515655446004, 1.6448536269514722, 3.090232306167813],
    1: [6.313751514675043, 318.3088389855503],
    1.37: [4.0, 60.0],
    2: [2.919985580353725, 22.327124770119877],
    3.5: [2.2, 8.1],
    6: [1.9431802805153016, 5.207626238838443],
    17.25: [1.74, 3.63],
    38: [1.6859544601667387, 3.319],
    126: [1.657, 3.155],
    999.5: [1.646, 3.098],
    50000: [1.645, 3.0903],
    4e7: [1.6448536],
}
for df, values in critical.items():
    for c in values:
        for margin, effect in ((0.02, 0), (0.8, 0.1), (3, -2.9), (3.5, 0), (5, 1), (30, -25), (30, 3), (400, 10), (5, 6)):
            add(effect, 1.0, df, c, float(margin))
for _ in range(60):
    df = random.choice([1, 2, 5, 9.5, 30, 61.125, 240])
    c = random.choice(critical[2] if df < 4 else critical[38])
    se = round(random.uniform(0.05, 3), 3)
    margin = round(random.uniform(0.5, 12) * se, 4)
    add(round(random.uniform(-1.1, 1.1) * margin, 4), se, df, c, margin)

body = ",\n".join("    " + json.dumps(row) for row in rows)
print('{\n  "columns": ["effect", "standardError", "df", "critical", "margin", "power"],\n  "rows": [\n' + body + "\n  ]\n}")
