"""Writes narrow-bands.ts: python3 generate-narrow-bands.py > narrow-bands.ts (mpmath 1.3, SciPy 1.17).

Half-traces from the Taylor series of the entire fundamental solutions in xi, summed at pi/2 with 150 digits, a variable
that the project's own series does not use; band numbers from the eigenvalues of Fourier matrices (LAPACK).
"""

import random

import numpy as np
from mpmath import atan2, mp, mpf, pi, sqrt
from scipy.linalg import eigvalsh_tridiagonal

mp.dps = 150
TERMS = 260
ORDER = 60


def solution(a, q, odd):
    """Value and slope at pi/2; coefficients of xi^(2k + odd), cosine series convolved."""
    x = (pi / 2) ** 2
    cosine = [mpf(1)]
    for j in range(1, TERMS):
        cosine.append(cosine[-1] * -4 * x / ((2 * j) * (2 * j - 1)))
    w = [mpf(1)]
    for k in range(TERMS - 1):
        drive = sum(cosine[j] * w[k - j] for j in range(k + 1))
        w.append(-x * (a * w[k] - 2 * q * drive) / ((2 * k + 2 + odd) * (2 * k + 1 + odd)))
        if k > 40 and abs(w[-1]) < mpf(10) ** -140:
            break
    value = sum(w)
    slope = sum((2 * k + odd) * c for k, c in enumerate(w)) / (pi / 2)
    return (value * pi / 2, slope * pi / 2) if odd else (value, slope)


def edges(q):
    k = np.arange(ORDER)
    beside = np.full(ORDER - 1, q)
    even = eigvalsh_tridiagonal(4.0 * k * k, np.r_[np.sqrt(2) * q, beside[1:]])
    diagonal = (2.0 * k + 1) ** 2
    corner = np.r_[q, np.zeros(ORDER - 1)]
    a_odd = eigvalsh_tridiagonal(diagonal + corner, beside)
    b_odd = eigvalsh_tridiagonal(diagonal - corner, beside)
    b_even = eigvalsh_tridiagonal(4.0 * (k + 1) ** 2, beside)
    lower, upper = [], []
    for i in range(ORDER // 2):
        lower += [even[i], a_odd[i]]
        upper += [b_odd[i], b_even[i]]
    return lower, upper


def row(a, q, lower):
    c, dc = solution(mpf(a), mpf(q), 0)
    s, ds = solution(mpf(a), mpf(q), 1)
    half_trace = c * ds + s * dc
    if abs(half_trace) >= 1:
        return float(half_trace), None
    band = max(i for i, edge in enumerate(lower) if edge <= a + 1e-13 * abs(a))
    fold = 2 / pi * atan2(sqrt(-s * dc), sqrt(c * ds))
    return float(half_trace), float(band + fold if band % 2 == 0 else band + 1 - fold)


random.seed(28)
print("""/*
 * Points deep in the (a, q) plane, most of them inside bands so narrow that a double barely resolves them. Half-trace and
 * characteristic exponent with 150 digits; generate-narrow-bands.py says how. a and q are the exact doubles printed, β is
 * null where the motion is unstable.
 */
export const NARROW_BANDS: readonly (readonly [a: number, q: number, halfTrace: number, beta: number | null])[] = [""")
for limit, count in ((12, 24), (24, 20), (50, 20), (100, 24)):
    done = 0
    while done < count:
        q = random.uniform(0 if limit == 12 else limit / 2, limit)
        lower, upper = edges(q)
        n = random.randrange(14)
        inside = random.random() < 0.75
        a = lower[n] + (upper[n] - lower[n]) * random.random() if inside else random.uniform(-limit, limit)
        a = float(a)
        if abs(a) > limit:
            continue
        half_trace, beta = row(a, q, lower)
        if abs(half_trace) > 1e12:
            continue
        print(f"  [{a!r}, {q!r}, {half_trace!r}, {'null' if beta is None else repr(beta)}],")
        done += 1
print("];")
