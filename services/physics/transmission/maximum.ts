/** The highest point of three, by the parabola through them: x, value. The middle one must be the highest. */
function vertex(
  x0: number,
  f0: number,
  x1: number,
  f1: number,
  x2: number,
  f2: number,
): { readonly x: number; readonly value: number } {
  const left = (f1 - f0) / (x1 - x0);
  const right = (f2 - f1) / (x2 - x1);
  const curvature = (right - left) / (x2 - x0);
  if (!(curvature < 0)) return { x: x1, value: f1 };
  const slope = (left * (x2 - x1) + right * (x1 - x0)) / (x2 - x0);
  const shift = -slope / (2 * curvature);
  if (x1 + shift <= x0 || x1 + shift >= x2) return { x: x1, value: f1 };
  return { x: x1 + shift, value: f1 + slope * shift + curvature * shift * shift };
}

/** Share of the wider side at which a bracket is divided. */
const GOLDEN = 0.3819660112501051;

export type Maximum =
  | { readonly kind: "maximum"; readonly x: number; readonly value: number }
  | { readonly kind: "at-an-end" };

/**
 * The maximum of a function with one hump in [low, high]: the best of `first` equal steps, then golden sections (Kiefer,
 * Proc. Amer. Math. Soc. 4 (1953) 502) until the bracket is shorter than `width`, then the vertex of a parabola.
 */
export function maximumIn(
  value: (x: number) => number,
  low: number,
  high: number,
  first: number,
  width: number,
): Maximum {
  const step = (high - low) / first;
  const values = Array.from({ length: first + 1 }, (_, i) => value(low + i * step));
  let best = 0;
  for (let i = 1; i <= first; i++) if (values[i]! > values[best]!) best = i;
  if (best === 0 || best === first) return { kind: "at-an-end" };
  let [x0, x1, x2] = [low + (best - 1) * step, low + best * step, low + (best + 1) * step];
  let [f0, f1, f2] = [values[best - 1]!, values[best]!, values[best + 1]!];
  while (x2 - x0 > width) {
    const leftIsWider = x1 - x0 > x2 - x1;
    const x = leftIsWider ? x1 - GOLDEN * (x1 - x0) : x1 + GOLDEN * (x2 - x1);
    const f = value(x);
    if (f > f1) {
      if (leftIsWider) [x2, f2] = [x1, f1];
      else [x0, f0] = [x1, f1];
      [x1, f1] = [x, f];
    } else if (leftIsWider) [x0, f0] = [x, f];
    else [x2, f2] = [x, f];
  }
  return { kind: "maximum", ...vertex(x0, f0, x1, f1, x2, f2) };
}
