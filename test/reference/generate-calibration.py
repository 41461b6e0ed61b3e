"""Writes calibration.json: python3 generate-calibration.py > calibration.json (mpmath 1.3).

Observations of the NIST StRD linear regression sets Norris and Pontius and their certified values are from memory. Both
are put to the test here: the fits are recomputed in exact rational arithmetic and must give every certified digit. Leverage
and Cook's distance come from the same exact arithmetic, from fits that leave one observation out. Quantiles of Student's t
are roots of the incomplete beta function with 30 digits.
"""

import json
from fractions import Fraction as Fr

from mpmath import betainc, findroot, mp, mpf, sqrt

mp.dps = 30

NORRIS = """0.1 0.2 338.8 337.4 118.1 118.2 888.0 884.6 9.2 10.1 228.1 226.5 668.5 666.3 998.5 996.3 449.1 448.6 778.9 777.0
559.2 558.2 0.3 0.4 0.1 0.6 778.1 775.5 668.8 666.9 339.3 338.0 448.9 447.5 10.8 11.6 557.7 556.0 228.3 228.1 998.0 995.8
888.8 887.6 119.6 120.2 0.3 0.3 0.6 0.3 557.6 556.8 339.3 339.1 888.0 887.2 998.5 999.0 778.9 779.0 10.2 11.1 117.6 118.3
228.9 229.2 668.4 669.1 449.2 448.9 0.2 0.5""".split()
PONTIUS = """.11019 .21956 .32949 .43899 .54803 .65694 .76562 .87487 .98292 1.09146 1.20001 1.30822 1.41599 1.52399 1.63194
1.73947 1.84646 1.95392 2.06128 2.16844 .11052 .22018 .32939 .43886 .54798 .65739 .76596 .87474 .98300 1.09150 1.20004 1.30818
1.41613 1.52408 1.63159 1.73965 1.84696 1.95445 2.06177 2.16829""".split()

CERTIFIED = {
    "Norris": (["-0.262323073774029", "1.00211681802045"], ["0.232818234301152", "0.429796848199937E-03"], "0.884796396144373"),
    "Pontius": (
        ["0.673565789473684E-03", "0.732059160401003E-06", "-0.316081871345029E-14"],
        ["0.107938612033077E-03", "0.157817399981659E-09", "0.486652849992036E-16"],
        "0.205177424076185E-03",
    ),
}
SETS = {
    # The set lists y before x.
    "Norris": ([Fr(x) for x in NORRIS[1::2]], [Fr(y) for y in NORRIS[0::2]], 1),
    "Pontius": ([Fr(150000 * (1 + k % 20)) for k in range(40)], [Fr(y) for y in PONTIUS], 2),
}


def inverse(m):
    n = len(m)
    m = [row[:] + [Fr(int(i == j)) for j in range(n)] for i, row in enumerate(m)]
    for i in range(n):
        pivot = next(r for r in range(i, n) if m[r][i] != 0)
        m[i], m[pivot] = m[pivot], m[i]
        m[i] = [v / m[i][i] for v in m[i]]
        for r in range(n):
            if r != i:
                m[r] = [v - m[r][i] * w for v, w in zip(m[r], m[i])]
    return [row[n:] for row in m]


def fit(xs, ys, degree, leave=None):
    n = degree + 1
    rows = [[x**p for p in range(n)] for x in xs]
    used = [k for k in range(len(xs)) if k != leave]
    inv = inverse([[sum(rows[k][i] * rows[k][j] for k in used) for j in range(n)] for i in range(n)])
    xty = [sum(rows[k][i] * ys[k] for k in used) for i in range(n)]
    beta = [sum(inv[i][j] * xty[j] for j in range(n)) for i in range(n)]
    fitted = [sum(b * r for b, r in zip(beta, row)) for row in rows]
    rss = sum((ys[k] - fitted[k]) ** 2 for k in used)
    return rows, inv, beta, fitted, rss


def real(f):
    return mpf(f.numerator) / mpf(f.denominator)


sets = {}
for name, (xs, ys, degree) in SETS.items():
    rows, inv, beta, fitted, rss = fit(xs, ys, degree)
    dof = len(xs) - degree - 1
    s2 = rss / dof
    values = [real(b) for b in beta]
    errors = [sqrt(real(s2 * inv[p][p])) for p in range(degree + 1)]
    scatter = sqrt(real(s2))
    for got, certified in zip([*values, *errors, scatter], [*CERTIFIED[name][0], *CERTIFIED[name][1], CERTIFIED[name][2]]):
        assert abs(got / mpf(certified) - 1) < mpf("1e-14"), (name, got, certified)
    influences = []
    for k in (0, 7, len(xs) - 1):
        leverage = sum(rows[k][i] * inv[i][j] * rows[k][j] for i in range(degree + 1) for j in range(degree + 1))
        without = fit(xs, ys, degree, leave=k)
        cook = sum((a - b) ** 2 for a, b in zip(fitted, without[3])) / ((degree + 1) * s2)
        without_s2 = without[4] / (dof - 1)
        studentized = real(ys[k] - fitted[k]) / sqrt(real(without_s2 * (1 - leverage)))
        influences.append([k, float(ys[k] - fitted[k]), float(leverage), float(studentized), float(cook)])
    middle = xs[len(xs) // 3] * 2 / 3
    row = [middle**p for p in range(degree + 1)]
    form = sum(row[i] * inv[i][j] * row[j] for i in range(degree + 1) for j in range(degree + 1))
    sets[name] = {
        "x": [float(x) for x in xs], "y": [float(y) for y in ys], "degree": degree,
        "coefficients": [float(v) for v in values], "standardUncertainties": [float(e) for e in errors],
        "residualStandardDeviation": float(scatter), "influences": influences,
        "prediction": {"at": float(middle), "value": float(sum(b * r for b, r in zip(beta, row))),
                       "standardUncertainty": float(sqrt(real(s2 * form))), "ofOneMore": float(sqrt(real(s2 * (1 + form))))},
    }

quantiles = []
for confidence in ("0.5", "0.9", "0.95", "0.99", "0.999", "0.9999"):
    for dof in (1, 2, 3, 4, 5, 8, 9, 13, 20, 38, 60, 120, 197):
        nu = mpf(dof)
        tail = 1 - mpf(confidence)
        bounds = (mpf("0.1"), mpf(10) ** 5)
        t = findroot(lambda t: betainc(nu / 2, mpf(1) / 2, 0, nu / (nu + t * t), regularized=True) - tail, bounds, solver="bisect", maxsteps=200)
        quantiles.append([float(confidence), dof, float(t)])
print(json.dumps({"header": {"origin": "generate-calibration.py says how. Influence: index, residual, leverage, residual over its scatter without the observation, Cook's distance."}, "sets": sets, "studentT": quantiles}, separators=(",", ":")))
