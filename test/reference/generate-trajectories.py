"""Writes trajectories.json: python3 generate-trajectories.py > trajectories.json (mpmath 1.3).

Mathieu's equation in both planes by mpmath's general integrator of ordinary differential equations with 30 digits. Where an
ion reaches 1 the place is bracketed on a grid of 200 points a cycle and solved with 25 digits (findroot squares its tolerance).
"""

import json

from mpmath import cos, findroot, mp, mpf, odefun, pi

mp.dps = 30


def plane(a, q, phase, start, slope):
    return odefun(
        lambda t, w: [w[1], -(a - 2 * q * cos(2 * t + phase)) * w[0]], 0, [mpf(start), mpf(slope)], tol=mpf(10) ** -26
    )


def first_loss(solution, cycles):
    """Time in cycles of the first place where |w| reaches 1, or None."""
    steps = int(cycles * 200)
    values = [solution(pi * k / 200)[0] for k in range(steps + 1)]
    for k in range(1, steps + 1):
        if abs(values[k]) >= 1:
            side = 1 if values[k] > 0 else -1
            at = findroot(lambda t: side * solution(t)[0] - 1, (pi * (k - 1) / 200, pi * k / 200), solver="anderson", tol=mpf(10) ** -50)
            return at / pi
    return None


rows = []
for a, q, phase, x, dx, y, dy, cycles in [
    ("0.2366", "0.7057", "0.3", "0.01", "0.001", "0.02", "-0.002", "10.37"),
    ("0.2366", "0.7057", "3.1", "-0.03", "0.02", "0.02", "0.004", "6.5"),
    ("0", "0.3", "1.2", "0.1", "0.01", "-0.2", "0.03", "12.25"),
    ("0", "0.92", "0.5", "0.01", "0", "0.002", "0.001", "12"),
    ("0.24", "0.69", "2", "0.05", "0.01", "0.04", "0.02", "12"),
    ("3.1530933", "3.246094", "0.7", "0.002", "0.001", "0.01", "-0.001", "5.2"),
    ("0.0064105", "7.558195", "4", "0.001", "0.002", "0.001", "0.001", "3.6"),
    ("0.237", "0", "0", "0.1", "0.05", "0.01", "0.01", "4"),
    ("0.15", "0.6", "2.5", "-0.45", "0.2", "0.3", "0.5", "9"),
]:
    args = mpf(a), mpf(q), mpf(phase)
    in_x = plane(args[0], args[1], args[2], x, dx)
    in_y = plane(-args[0], -args[1], args[2], y, dy)
    losses = [(at, name) for at, name in ((first_loss(in_x, mpf(cycles)), "x"), (first_loss(in_y, mpf(cycles)), "y")) if at]
    lost = min(losses) if losses else None
    end = lost[0] if lost else mpf(cycles)
    rows.append(
        {
            "a": float(a), "q": float(q), "phase": float(phase), "x": float(x), "slopeX": float(dx), "y": float(y),
            "slopeY": float(dy), "rfCycles": float(cycles),
            "lost": {"to": lost[1], "atCycle": float(lost[0])} if lost else None,
            "end": [float(in_x(pi * end)[0]), float(in_x(pi * end)[1]), float(in_y(pi * end)[0]), float(in_y(pi * end)[1])],
            "quarters": [[float(in_x(pi * k / 4)[0]), float(in_y(pi * k / 4)[0])] for k in range(int(end * 4) + 1)],
        }
    )
print(json.dumps({"header": {"origin": "generate-trajectories.py says how; positions in r0, slopes in r0 per rad of xi, phase in rad of the RF."}, "flights": rows}, indent=None, separators=(",", ":")).replace('{"a"', '\n{"a"'))
