"""Category probabilities under a shift of the cumulative odds, and 1 − Σp̄³, to 40 digits.

Run: python3 ordinal.py > ordinal.json
Each case: control probabilities, odds ratio, active probabilities, share of the information at a weight of the
control arm.
"""

import json
import random

from mpmath import mp, mpf

mp.dps = 40


def shifted(control, ratio):
    control = [mpf(p) for p in control]
    total = sum(control)
    before, cumulative, active = mpf(0), mpf(0), []
    for p in control:
        cumulative += p
        odds = mpf(ratio) * cumulative
        upto = odds / (odds + (total - cumulative))
        active.append(upto - before)
        before = upto
    return active


random.seed(1993)
scales = [
    [0.2, 0.5, 0.2, 0.1],
    [0.5, 0.5],
    [0.999999, 0.000001],
    [0.0, 0.25, 0.5, 0.25],
    [1e-9, 0.5 - 1e-9, 0.5],
    [0.05, 0.05, 0.9, 0.0],
    [0.01] * 100,
    [0.0000001, 0.9999999],
]
for size in (3, 5, 7, 11):
    drawn = [random.expovariate(1) for _ in range(size)]
    whole = [round(1e6 * d / sum(drawn)) for d in drawn]
    whole[-1] = 10**6 - sum(whole[:-1])
    scales.append([w / 1e6 for w in whole])

cases = []
for control in scales:
    for ratio in (1.0, 1.8, 0.55, 1 + 1e-9, 60.0, 1e-6):
        active = shifted(control, ratio)
        weight = random.choice([1, 1, 2, 5]) / 6
        mean = [mpf(weight) * mpf(c) + (1 - mpf(weight)) * a for c, a in zip(control, active)]
        whole = sum(mean)
        share = 1 - sum((p / whole) ** 3 for p in mean)
        cases.append(
            {
                "control": control,
                "oddsRatio": ratio,
                "active": [float(a) for a in active],
                "controlWeight": weight,
                "share": float(share),
            }
        )
print("[\n" + ",\n".join("  " + json.dumps(case) for case in cases) + "\n]")
