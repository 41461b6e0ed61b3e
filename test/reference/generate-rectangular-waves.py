"""Half-traces, exponents and edges of the Meissner equation at 60 digits, for rectangular-waves.json.

Python with mpmath. The monodromy matrix is multiplied level by level from the rising edge of the wave, so that neither
the symmetry about the middle of a level nor any product formula of the half-trace is used; edges are roots of
trace/2 = +1 or -1 by bisection and secant between two q that enclose one. Prints the JSON on standard output.

x'' + K x = 0 with K = a + 2 q s1 for the fraction d of the period pi, a - 2 q s2 for the rest; s1 = s2 = 1 with DC
coupling, s1 = 2 (1 - d) and s2 = 2 d with AC coupling.
"""
import json
import random

import mpmath as mp

mp.mp.dps = 60


def matrix(k, t):
    root = mp.sqrt(mp.mpc(k))
    c = mp.re(mp.cos(root * t))
    s = mp.re(mp.sin(root * t) / root) if k != 0 else t
    return mp.matrix([[c, s], [-k * s, c]])


def half_trace(a, q, d, coupling):
    a, q, d = mp.mpf(a), mp.mpf(q), mp.mpf(d)
    s1, s2 = (1, 1) if coupling == "dc" else (2 * (1 - d), 2 * d)
    m = matrix(a - 2 * q * s2, mp.pi * (1 - d)) * matrix(a + 2 * q * s1, mp.pi * d)
    return (m[0, 0] + m[1, 1]) / 2


def points():
    chosen = random.Random(20250607)
    rows = []
    while len(rows) < 120:
        a = chosen.uniform(-12, 12)
        q = chosen.uniform(-12, 12)
        d = chosen.uniform(0.03, 0.97)
        coupling = chosen.choice(["dc", "ac"])
        trace = half_trace(a, q, d, coupling)
        # A third of the rows may be unstable.
        if abs(trace) > 1 and len(rows) % 3:
            continue
        beta = mp.acos(trace) / mp.pi if abs(trace) < 1 else None
        row = [a, q, d, coupling, float(trace), float(1 - abs(trace)), None if beta is None else float(beta)]
        rows.append(row)
    return rows


def root(function, low, high):
    assert function(low) * function(high) < 0
    for _ in range(80):
        middle = (low + high) / 2
        if function(low) * function(middle) <= 0:
            high = middle
        else:
            low = middle
    return mp.findroot(function, (low, high), solver="secant", tol=mp.mpf(10) ** -80)


def windows(ratio, d, coupling, q_max=3.0, step=0.0005):
    """Stretches of q where both planes are stable, from a walk in small steps and roots between them."""
    ratio = mp.mpf(ratio)

    def traces(q):
        return half_trace(2 * ratio * q, q, d, coupling), half_trace(-2 * ratio * q, -q, d, coupling)

    def margin(q):
        return 1 - max(abs(t) for t in traces(q))

    found, before = [], margin(mp.mpf(step))
    start = mp.mpf(0) if before > 0 else None
    for i in range(2, int(q_max / step)):
        q = i * mp.mpf(step)
        now = margin(q)
        if (now > 0) != (before > 0):
            edge = root(margin, q - step, q)
            if now > 0:
                start = edge
            else:
                found.append([float(start), float(edge)])
        before = now
    return found


def main():
    lines = []
    for ratio, d, coupling in [
        (0.2, 0.5, "dc"), (0.215, 0.5, "dc"), (0.0, 0.61, "ac"), (0.21, 0.61, "ac"), (-0.15, 0.7, "ac"),
        (0.05, 0.57, "dc"), (-0.1, 0.6, "dc"), (0.5, 0.35, "dc"), (0.1, 0.3, "ac"), (0.0, 0.45, "dc"),
    ]:
        lines.append([ratio, d, coupling, windows(ratio, d, coupling)])
    header = {
        "origin": "Computed for this project, outside its code and in another language, by generate-rectangular-waves.py.",
        "columns_points": ["a", "q", "duty", "coupling", "half_trace", "one_minus_abs_half_trace", "acos_half_trace_over_pi"],
        "columns_lines": ["U_over_V", "duty", "coupling", "windows_q_low_q_high_below_q_3"],
    }
    print(json.dumps({"header": header, "points": points(), "lines": lines}))


main()
