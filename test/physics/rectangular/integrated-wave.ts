import type { RectangularWave } from "../../../services/physics/rectangular/rectangular-wave.ts";

/** K of x'' + K x = 0 on either level, from the definition of the wave's voltage alone. */
function levels(a: number, q: number, { dutyCycle, coupling }: RectangularWave): readonly [number, number] {
  const mean = coupling === "dc" ? 0 : 2 * dutyCycle - 1;
  return [a + 2 * q * (1 - mean), a + 2 * q * (-1 - mean)];
}

/** Classical Runge–Kutta (fourth order) on one level; returns position, velocity and the sign changes of x. */
function integrate(x: number, v: number, k: number, time: number, steps: number): [number, number, number] {
  const h = time / steps;
  let crossings = 0;
  for (let i = 0; i < steps; i++) {
    const l1 = -k * x;
    const k2 = v + (h / 2) * l1;
    const l2 = -k * (x + (h / 2) * v);
    const k3 = v + (h / 2) * l2;
    const l3 = -k * (x + (h / 2) * k2);
    const k4 = v + h * l3;
    const l4 = -k * (x + h * k3);
    const before = x;
    x += (h / 6) * (v + 2 * k2 + 2 * k3 + k4);
    v += (h / 6) * (l1 + 2 * l2 + 2 * l3 + l4);
    if (x > 0 !== before > 0) crossings++;
  }
  return [x, v, crossings];
}

/** Half the trace over a period that starts with the rising edge of the wave, by direct integration. */
export function integratedHalfTrace(a: number, q: number, wave: RectangularWave, steps: number): number {
  const [high, low] = levels(a, q, wave);
  const d = wave.dutyCycle;
  let trace = 0;
  for (const [x0, v0] of [
    [1, 0],
    [0, 1],
  ] as const) {
    const [x1, v1] = integrate(x0, v0, high, Math.PI * d, steps);
    const [x2, v2] = integrate(x1, v1, low, Math.PI * (1 - d), steps);
    trace += x0 === 1 ? x2 : v2;
  }
  return trace / 2;
}

/** Sign changes of an ion's position per period: in the long run the total characteristic exponent. */
export function oscillationsPerPeriod(a: number, q: number, wave: RectangularWave, periods: number): number {
  const [high, low] = levels(a, q, wave);
  const d = wave.dutyCycle;
  let [x, v] = [0.6, 0.3];
  let crossings = 0;
  for (let period = 0; period < periods; period++) {
    for (const [k, time] of [
      [high, Math.PI * d],
      [low, Math.PI * (1 - d)],
    ] as const) {
      const [x1, v1, crossed] = integrate(x, v, k, time, 60);
      [x, v] = [x1, v1];
      crossings += crossed;
    }
  }
  return crossings / periods;
}
