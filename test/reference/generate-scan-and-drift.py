"""Writes scan-and-drift.json: python3 generate-scan-and-drift.py > scan-and-drift.json (mpmath 1.3, SciPy 1.17).

Edges of a window with 40 digits from Taylor series in xi of the even and the odd solution at pi/2: beta_y = 0 where the
even solution of the y plane has no slope there, beta_x = 1 where the odd solution of the x plane has none. Their
derivatives by U/V are differences of such roots with 40 digits. Straight lines in double precision from SciPy's
characteristic values: the least worst width by its three equal and alternating errors, and proved by all other points.
"""

import json

import numpy as np
from mpmath import diff, findroot, mp, mpf, pi
from scipy.optimize import brentq, fsolve
from scipy.special import mathieu_a, mathieu_b

mp.dps = 40
E_OVER_U = mpf("1.602176634e-19") / mpf("1.66053906892e-27")


def slope_at_end(a, q, odd):
    """w'(pi/2) of the odd or even solution, over its scale."""
    x = (pi / 2) ** 2
    cosine = [mpf(1)]
    for j in range(1, 60):
        cosine.append(cosine[-1] * -4 * x / ((2 * j) * (2 * j - 1)))
    w = [mpf(1)]
    for k in range(58):
        drive = sum(cosine[j] * w[k - j] for j in range(k + 1))
        w.append(-x * (a * w[k] - 2 * q * drive) / ((2 * k + 2 + odd) * (2 * k + 1 + odd)))
        if k > 20 and abs(w[-1]) < mpf(10) ** -45:
            break
    return sum((2 * k + odd) * c for k, c in enumerate(w))


def residual_y(q, ratio):
    return slope_at_end(-2 * ratio * q, -q, 0)


def residual_x(q, ratio):
    return slope_at_end(2 * ratio * q, q, 1)


def window(resolution):
    r = mpf(resolution)
    spread = (2 * r + 1) / (2 * r - 1)
    ratio0 = mpf("0.16784370570837") - mpf("0.1264018") / (r + mpf("0.265"))
    q0 = mpf("0.70599607") * (1 - mpf("0.83") / r)
    return findroot(lambda q, s: [residual_y(q, s), residual_x(q * spread, s)], (q0, ratio0)), spread


drift = []
for mz, width in [("1000", "0.7"), ("500", "0.7"), ("28", "1"), ("100", "0.02"), ("609.2807", "0.6")]:
    centre, wide = mpf(mz), mpf(width)
    (q_low, ratio), spread = window(centre / wide)
    q_high = q_low * spread
    by = lambda residual, q: diff(lambda s: findroot(lambda x: residual(x, s), q), ratio, h=mpf(10) ** -12)
    low = -(ratio / q_high) * by(residual_x, q_high)
    high = -(ratio / q_low) * by(residual_y, q_low)
    drift.append([float(mz), float(width), float(ratio), float(q_low), float(q_high), float(low), float(high)])


def edge(curve, sign, ratio, bracket):
    return brentq(lambda q: curve(q) - sign * 2 * ratio * q, *bracket, xtol=1e-16, rtol=9e-16)


APEX = 0.16784370570836985


def window_of(ratio):
    low = edge(lambda q: mathieu_a(0, q), -1, ratio, (1e-6, 0.705996069))
    high = edge(lambda q: mathieu_b(1, q), 1, ratio, (0.70599607, 0.9081))
    return low, high


R0, F = 0.004, 1.2e6
PER_VOLT = float(E_OVER_U) / np.pi**2 / (R0 * F) ** 2


def exact(mz, width):
    def excess(ratio):
        low, high = window_of(ratio)
        return (low + high) / 2 / (high - low) - mz / width

    ratio = brentq(excess, 1e-4, APEX - 1e-6, xtol=1e-17, rtol=9e-16)
    low, high = window_of(ratio)
    volts = mz * 2 * low * high / (low + high) / PER_VOLT
    return ratio * volts, volts


lines = []
for mz_from, mz_to, width in [(5, 2000, 0.7), (50, 1000, 0.7), (2, 260, 0.8)]:
    mz = [mz_from * np.exp(np.log(mz_to / mz_from) * k / 128) for k in range(129)]
    points = np.array([exact(m, width) for m in mz])
    u, v = points[:, 0], points[:, 1]
    slope, minus = np.polyfit(v, u, 1)

    def error(line, k):
        ratio = line[0] - line[1] / v[k]
        low, high = window_of(ratio)
        return PER_VOLT * v[k] * (1 / low - 1 / high) - width

    best = (slope, -minus)
    three = [0, 64, 128]
    for _ in range(12):
        found = fsolve(
            lambda p: [error(p, k) - s * p[2] for k, s in zip(three, (1, -1, 1))], [*best, 0.001], xtol=1e-14
        )
        best = found[:2]
        all_errors = [error(best, k) for k in range(129)]
        worst = int(np.argmin(all_errors))
        if worst == three[1]:
            break
        three[1] = worst
    assert max(map(abs, all_errors)) <= abs(found[2]) * (1 + 1e-7)
    assert abs(all_errors[0] - all_errors[128]) < 1e-8
    squares = (slope, -minus)
    errors = [error(squares, k) for k in range(129)]
    far = int(np.argmax(np.abs(errors)))
    lines.append(
        {
            "mzFrom": mz_from,
            "mzTo": mz_to,
            "width": width,
            "leastSquares": {"slope": slope, "offset": -minus, "worstMz": mz[far], "worstError": errors[far]},
            "leastWorst": {"slope": best[0], "offset": best[1], "worstError": abs(found[2])},
        }
    )

print(
    json.dumps(
        {
            "header": {
                "origin": "generate-scan-and-drift.py says how; r0 4 mm and 1.2 MHz for the lines, judged at 129 m/z evenly spaced in the logarithm.",
                "drift_columns": ["mzCentre", "mzWidth", "U_over_V", "q_low", "q_high", "dln_mzLow_by_dln_ratio", "dln_mzHigh_by_dln_ratio"],
            },
            "drift": drift,
            "lines": lines,
        },
        indent=1,
    )
)
