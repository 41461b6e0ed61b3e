"""Prints the answers that stand as examples in services/http/examples/{drift-budget,scan-table,trajectory,mz-calibration}.ts:
python3 generate-endpoint-examples.py (NumPy, SciPy 1.17). Only formulas of the handbooks, SciPy's characteristic values, its
integrator DOP853, its least-squares solver and its t distribution; nothing of the project.
"""

import json

import numpy as np
from scipy.integrate import solve_ivp
from scipy.optimize import brentq, fsolve, minimize_scalar
from scipy.special import mathieu_a, mathieu_b
from scipy.stats import t as student

E, U_KG = 1.602176634e-19, 1.66053906892e-27
APEX, APEX_Q = 0.167843705708369849, 0.705996069713370897
R0, F = 0.004, 1.2e6
PER_VOLT = E / U_KG / np.pi**2 / (R0 * F) ** 2


def window_of(ratio):
    low = brentq(lambda q: mathieu_a(0, q) + 2 * ratio * q, 1e-6, 0.705996069, xtol=1e-16, rtol=9e-16)
    high = brentq(lambda q: mathieu_b(1, q) - 2 * ratio * q, 0.70599607, 0.9081, xtol=1e-16, rtol=9e-16)
    return low, high


def ratio_for(resolution):
    def excess(ratio):
        low, high = window_of(ratio)
        return (low + high) / 2 / (high - low) - resolution

    return brentq(excess, 1e-3, APEX - 1e-7, xtol=1e-17, rtol=9e-16)


def straight(x, y, confidence, degree=1):
    """Coefficients, their uncertainties, scatter and a function for predictions, by NumPy's solver."""
    x, y = np.array(x, float), np.array(y, float)
    rows = np.vander(x, degree + 1, increasing=True)
    beta, *_ = np.linalg.lstsq(rows, y, rcond=None)
    dof = len(x) - degree - 1
    s2 = float(np.sum((y - rows @ beta) ** 2)) / dof
    inv = np.linalg.inv(rows.T @ rows)

    def predict(at):
        row = np.array([at**p for p in range(degree + 1)], float)
        form = row @ inv @ row
        return float(row @ beta), float(np.sqrt(s2 * form)), float(student.isf((1 - confidence) / 2, dof) * np.sqrt(s2 * (1 + form)))

    hat = np.diag(rows @ inv @ rows.T)
    residual = y - rows @ beta
    internal = residual**2 / (s2 * (1 - hat))
    influence = [
        {"peak": k, "residual": float(residual[k]), "leverage": float(hat[k]),
         "studentizedResidual": float(np.sign(residual[k]) * np.sqrt(internal[k] * (dof - 1) / (dof - internal[k]))),
         "cookDistance": float(internal[k] * hat[k] / (1 - hat[k]) / (degree + 1))}
        for k in range(len(x))
    ]
    errors = np.sqrt(s2 * np.diag(inv))
    return beta, errors, dof, float(np.sqrt(s2)), influence, predict


def drift_example():
    table = json.load(open("scan-and-drift.json"))["drift"][0]
    mz, width, ratio, q_low, q_high, low_by, high_by = table
    low, high = mz - width / 2, mz + width / 2
    exponents = {"field-radius": (-2, -2), "frequency": (-2, -2), "amplitude": (1, 1), "ratio": (low_by, high_by)}
    tolerance = {"field-radius": 0, "frequency": 1, "amplitude": 50, "ratio": 20}

    def shifts(cause, ppm):
        lo, hi = (e * edge * ppm / 1e6 for e, edge in zip(exponents[cause], (low, high)))
        wide = exponents[cause][0] * width * ppm / 1e6 if cause != "ratio" else hi - lo
        return {"low": lo, "high": hi, "centre": (lo + hi) / 2, "width": wide}

    parts = [{"cause": c, "tolerance_ppm": tolerance[c], **shifts(c, tolerance[c])} for c in exponents]
    keys = ("low", "high", "centre", "width")
    allowed = []
    for c in exponents:
        per = shifts(c, 1)
        bounds = [(0.1 / abs(per["centre"]), "centreShift"), (0.1 / abs(per["width"]), "widthChange")]
        alone, by = min(bounds)
        allowed.append({"cause": c, "alone_ppm": alone, "sharedWorstCase_ppm": alone / 4, "sharedRootSumSquare_ppm": alone / 2, "boundBy": by})

    def width_at(change):
        lo, hi = window_of(ratio * (1 + change))
        return low * q_high * (1 / lo - 1 / hi)

    hours, offsets = [0, 24, 49, 72], [0.010, 0.020, 0.031, 0.039]
    beta, errors, dof, _, _, predict = straight(hours, offsets, 0.95)
    expected = (0.1 - predict(72)[0]) / beta[1]
    first = brentq(lambda h: predict(72 + h)[0] + predict(72 + h)[2] - 0.1, 0, 1000, xtol=1e-12)
    return {
        "window": {"mzLow": low, "mzHigh": high, "mzCentre": mz, "mzWidth": width, "resolution": mz / width, "apexMargin_ppm": (APEX - ratio) / APEX * 1e6},
        "reason": None,
        "sensitivities": [{"cause": c, **shifts(c, 1)} for c in exponents],
        "budget": {
            "causes": parts,
            "worstCase": {k: sum(abs(p[k]) for p in parts) for k in keys},
            "rootSumSquare": {k: sum(p[k] ** 2 for p in parts) ** 0.5 for k in keys},
            "widthAtRatioEnds": {"raised": width_at(20e-6), "lowered": width_at(-20e-6)},
        },
        "allowed": allowed,
        "retune": {"reason": None, "slope_perHour": beta[1], "slopeStandardUncertainty_perHour": errors[1], "degreesOfFreedom": dof, "expected_h": expected, "atConfidence_h": first},
    }


def scan_example():
    mz_from, mz_to, width = 50, 1000, 0.7
    line = next(l for l in json.load(open("scan-and-drift.json"))["lines"] if l["mzFrom"] == mz_from)
    rows = []
    for mz in (50, 525, 1000):
        ratio = ratio_for(mz / width)
        lo, hi = window_of(ratio)
        q = 2 * lo * hi / (lo + hi)
        volts = mz * q / PER_VOLT
        time = 0.2 * (mz * U_KG / (2 * E * 2)) ** 0.5
        rows.append({"mz": mz, "drive": {"rf": volts, "dc": ratio * volts}, "a": 2 * ratio * q, "q": q,
                     "mzLow": mz - width / 2, "mzHigh": mz + width / 2, "fastestRate_mzPerS": 0.33 * width / time})

    def worst(slope, offset, mz):
        ratio0 = ratio_for(mz / width)
        lo, hi = window_of(ratio0)
        volts = mz * 2 * lo * hi / (lo + hi) / PER_VOLT
        lo, hi = window_of(slope - offset / volts)
        wide, centre = PER_VOLT * volts * (1 / lo - 1 / hi), PER_VOLT * volts * (1 / lo + 1 / hi) / 2
        return {"mz": mz, "width": wide, "error": wide - width, "centreShift": centre - mz}

    middle = 50 * np.exp(np.log(20) * np.arange(129) / 128)
    best = line["leastWorst"]
    return {"rows": rows, "line": line, "leastSquaresWorst": worst(line["leastSquares"]["slope"], line["leastSquares"]["offset"], 50),
            "leastWorst": [worst(best["slope"], best["offset"], m) for m in (50, 1000)]}


def trajectory_example():
    mz, dc, rf = 500, 139.42457479, 831.55739482
    q = PER_VOLT * rf / mz
    a = 2 * PER_VOLT * dc / mz
    phase, speed = np.radians(30), np.pi * F * R0
    x0, y0, vx, vy, cycles, per = 0.2e-3, -0.1e-3, 100, 40, 2.5, 2
    answer = {"mz": mz, "a": a, "q": q}
    ends = np.array([k / per for k in range(int(cycles * per) + 1)])
    answer["time_us"] = (ends / F * 1e6).tolist()
    for name, s, at, v in (("x", 1, x0, vx), ("y", -1, y0, vy)):
        rhs = lambda t, w, s=s: [w[1], -s * (a - 2 * q * np.cos(2 * t + phase)) * w[0]]
        grid = np.pi * ends
        run = solve_ivp(rhs, (0, np.pi * cycles), [at / R0, v / speed], method="DOP853", rtol=3e-14, atol=1e-18, t_eval=grid, dense_output=True)
        answer[name + "_mm"] = (run.y[0] * R0 * 1e3).tolist()
        answer["v" + name] = float(run.y[1, -1] * speed)
        turn = lambda t, w: w[1]
        turns = solve_ivp(rhs, (0, np.pi * cycles), [at / R0, v / speed], method="DOP853", rtol=3e-14, atol=1e-18, events=turn)
        places = [(abs(w[0]), t) for t, w in zip(turns.t_events[0], turns.y_events[0])] + [(abs(at / R0), 0), (abs(run.y[0, -1]), np.pi * cycles)]
        most, when = max(places)
        answer["largest_" + name] = [most * R0 * 1e3, when / np.pi / F * 1e6]
        both = [solve_ivp(rhs, (0, np.pi), start, method="DOP853", rtol=3e-14, atol=1e-18, dense_output=True) for start in ([1, 0], [0, 1])]
        (c, dc_), (sn, ds) = both[0].y[:, -1], both[1].y[:, -1]
        half = (c + ds) / 2
        sine = np.sqrt(1 - half**2) * np.sign(sn)
        beta, alpha = sn / sine, (c - ds) / (2 * sine)
        gamma = (1 + alpha**2) / beta
        w, dw = at / R0, v / speed
        area = gamma * w * w + 2 * alpha * w * dw + beta * dw * dw
        there = lambda t: both[0].sol(t)[0] ** 2 * beta - 2 * both[0].sol(t)[0] * both[1].sol(t)[0] * alpha + both[1].sol(t)[0] ** 2 * gamma
        start = max(np.linspace(0, np.pi, 200), key=there)
        best = minimize_scalar(lambda t: -there(t), bounds=(start - 0.03, start + 0.03), method="bounded", options={"xatol": 1e-9})
        answer["ever_" + name] = float(np.sqrt(-best.fun * area) * R0 * 1e3)
    share = np.arccos(dc / rf) / np.pi
    answer["rods"] = {"x": [dc, 1 - share, dc + rf], "y": [-dc, share, dc + rf]}
    per_square = (dc - rf * np.cos(np.pi)) / R0**2
    answer["fieldAt"] = [per_square * ((1e-3) ** 2 - (2e-3) ** 2), -2 * per_square * 1e-3, 2 * per_square * 2e-3, -2 * per_square * 1e-3 * E, 2 * per_square * 2e-3 * E]
    return answer


def calibration_example():
    set_mz, offset = [69, 219, 414, 614, 1066], [0.02, 0.04, 0.05, 0.08, 0.13]
    width = [0.68, 0.69, 0.71, 0.7, 0.74]
    observed = [s + o for s, o in zip(set_mz, offset)]
    out = {}
    for name, values in (("position", [o - s for o, s in zip(observed, set_mz)]), ("width", width)):
        beta, errors, dof, scatter, influence, predict = straight(set_mz, values, 0.95)
        out[name] = {"coefficients": list(zip(beta.tolist(), errors.tolist())), "dof": dof, "scatter": scatter, "influences": influence,
                     "predictions": {m: predict(m) for m in (500, 1500)}}
    ratio, volts = 139.42457479 / 831.55739482, 831.55739482
    lo, hi = window_of(ratio)
    out["fieldRadius_mm"] = 1e3 * np.sqrt(E / U_KG * volts / (np.pi**2 * F**2 * 414.05 * 2 * lo * hi / (lo + hi)))
    out["observed"] = observed
    return out


print(json.dumps({"drift": drift_example(), "scan": scan_example(), "trajectory": trajectory_example(), "calibration": calibration_example()}, indent=1, default=float))
