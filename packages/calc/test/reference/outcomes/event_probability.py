"""Chance that an event is seen under exponential survival and dropout, integrated over entry times to 60 digits.

Run: python3 event_probability.py > event-probability.json
Entry is uniform on the accrual; a participant who enters at a is followed for accrual + follow-up − a, and the
event is seen if it comes before that and before dropout.
"""

import itertools
import json

from mpmath import exp, mp, mpf, quad

mp.dps = 60


def chance(hazard, accrual, follow_up, dropout):
    hazard, accrual, follow_up, dropout = map(mpf, (hazard, accrual, follow_up, dropout))
    leaving = hazard + dropout
    # ∫ hazard·e^(−leaving·t) dt up to each participant's own end of follow-up.
    seen = lambda followed: hazard / leaving * -mp.expm1(-leaving * followed)
    if accrual == 0:
        return seen(follow_up)
    points = [follow_up + accrual * k / 8 for k in range(9)]
    return quad(seen, points) / accrual


rows = []
for hazard, accrual, follow_up, dropout in itertools.product(
    (1e-9, 0.0004, 0.03, 0.7, 40.0), (0.0, 1e-8, 0.02, 18.0, 240.0), (0.0, 0.5, 12.0, 600.0), (0.0, 1e-6, 0.02, 1.5)
):
    if accrual + follow_up > 0:
        rows.append([hazard, accrual, follow_up, dropout, float(chance(hazard, accrual, follow_up, dropout))])

body = ",\n".join("    " + json.dumps(row) for row in rows)
print('{\n  "columns": ["hazard", "accrual", "followUp", "dropoutHazard", "chance"],\n  "rows": [\n' + body + "\n  ]\n}")
