/*
 * What everyone at a bench knows. Common practice, no source, unless a line says otherwise; the numbers in the titles are
 * the trade's, the checks are ours.
 */
import { expect, test } from "vitest";
import { APEX_RATIO, RF_ONLY_LIMIT_Q } from "../../services/physics/first-region.ts";
import { aOf, mzOf, qOf } from "../../services/physics/mathieu-parameters.ts";
import { passbandOf, scanLineEdges } from "../../services/physics/passband.ts";
import { lowMassCutoff, secondWindow } from "../../services/physics/rf-only.ts";
import { setPointOf } from "../../services/physics/set-point.ts";
import { planeStability, pointStability } from "../../services/physics/stability.ts";

const field = { fieldRadius: 0.004, frequency: 1.2e6 };

function unitMassAt(mz: number) {
  const point = setPointOf(mz, 1, field);
  if (point.kind !== "set-point") throw new Error(point.kind);
  return point;
}

const at = (mz: number, dc: number, rf: number) => pointStability(aOf(mz, dc, field), qOf(mz, rf, field))!;

function windowOf(dc: number, rf: number, rods = field) {
  const answer = passbandOf(dc, rf, rods);
  if (answer.kind !== "window") throw new Error(answer.kind);
  return answer.passband;
}

test("a unit-mass window reaches half a unit to either side of the ion", () => {
  for (const mz of [28, 69, 502, 1066]) {
    const { dcVolts, rfVolts } = unitMassAt(mz);
    expect(at(mz - 0.49, dcVolts, rfVolts).stable).toBe(true);
    expect(at(mz + 0.49, dcVolts, rfVolts).stable).toBe(true);
    expect(at(mz - 0.51, dcVolts, rfVolts).stable).toBe(false);
    expect(at(mz + 0.51, dcVolts, rfVolts).stable).toBe(false);
  }
});

test("light ions are lost to the rods whose DC has the ion's sign, heavy ones to the other pair", () => {
  const { dcVolts, rfVolts } = unitMassAt(300);
  expect(at(298, dcVolts, rfVolts).lostTo).toBe("x");
  expect(at(302, dcVolts, rfVolts).lostTo).toBe("y");
  expect(at(298, -dcVolts, rfVolts).lostTo).toBe("y");
  expect(at(302, -dcVolts, rfVolts).lostTo).toBe("x");
});

test("the x plane alone is a high-pass in m/z, the y plane alone a low-pass", () => {
  const { dcVolts, rfVolts } = unitMassAt(300);
  for (const mz of [310, 400, 1000, 5000]) {
    expect(planeStability(aOf(mz, dcVolts, field), qOf(mz, rfVolts, field))!.stable).toBe(true);
    expect(planeStability(-aOf(mz, dcVolts, field), -qOf(mz, rfVolts, field))!.stable).toBe(false);
  }
  for (const mz of [290, 270, 250, 240]) {
    expect(planeStability(aOf(mz, dcVolts, field), qOf(mz, rfVolts, field))!.stable).toBe(false);
    expect(planeStability(-aOf(mz, dcVolts, field), -qOf(mz, rfVolts, field))!.stable).toBe(true);
  }
});

test("U and V raised together move the window up and keep R; U raised against V narrows it", () => {
  const before = windowOf(139, 831);
  const together = windowOf(139 * 1.1, 831 * 1.1);
  expect(together.mzCentre! / before.mzCentre!).toBeCloseTo(1.1, 12);
  expect(together.resolution! / before.resolution!).toBeCloseTo(1, 10);
  expect(windowOf(139.2, 831).mzWidth!).toBeLessThan(before.mzWidth!);
  expect(windowOf(138.8, 831).mzWidth!).toBeGreaterThan(before.mzWidth!);
});

test("a and q fall as 1/m along the scan line", () => {
  const [a, q] = [aOf(100, 50, field), qOf(100, 300, field)];
  expect(aOf(400, 50, field)).toBeCloseTo(a / 4, 14);
  expect(qOf(400, 300, field)).toBeCloseTo(q / 4, 14);
  expect(aOf(400, 50, field) / qOf(400, 300, field)).toBeCloseTo(2 * (50 / 300), 14);
});

test("doubling the frequency quarters the m/z", () => {
  const slow = windowOf(139, 831);
  const fast = windowOf(139, 831, { ...field, frequency: 2 * field.frequency });
  expect(fast.mzCentre! * 4).toBeCloseTo(slow.mzCentre!, 9);
});

test("with U = 0 the rod set is a high-pass guide, as a collision cell is run", () => {
  const cutoff = lowMassCutoff(300, field);
  for (const mz of [cutoff * 1.001, 2 * cutoff, 10 * cutoff, 100 * cutoff]) {
    expect(at(mz, 0, 300).region).toEqual({ x: 0, y: 0 });
  }
  expect(at(cutoff * 0.999, 0, 300)).toMatchObject({ stable: false, lostTo: "both" });
});

/** Largest amplitude of the RF ripple over the mean path of x'' + (a − 2q cos 2ξ) x = 0: Runge–Kutta over half an RF period from a turning point. */
function relativeRipple(q: number): number {
  const step = Math.PI / 400;
  let [x, v] = [1, 0];
  const path: number[] = [];
  const pull = (xi: number, position: number) => 2 * q * Math.cos(2 * xi) * position;
  for (let i = 0; i <= 200; i++) {
    const xi = i * step;
    path.push(x);
    const [k1, l1] = [v, pull(xi, x)];
    const [k2, l2] = [v + (step / 2) * l1, pull(xi + step / 2, x + (step / 2) * k1)];
    const [k3, l3] = [v + (step / 2) * l2, pull(xi + step / 2, x + (step / 2) * k2)];
    const [k4, l4] = [v + step * l3, pull(xi + step, x + step * k3)];
    x += (step / 6) * (k1 + 2 * k2 + 2 * k3 + k4);
    v += (step / 6) * (l1 + 2 * l2 + 2 * l3 + l4);
  }
  const [least, most] = [Math.min(...path), Math.max(...path)];
  return (most - least) / (most + least);
}

test("light ions swing more: the micromotion is q/2 of the displacement", () => {
  // The ripple swings between 1 − q/2 and 1 + q/2 of the mean; the mean's own fall adds less than the share q to it.
  for (const q of [0.005, 0.01, 0.02, 0.05, 0.1]) {
    expect(Math.abs(relativeRipple(q) / (q / 2) - 1)).toBeLessThan(q);
  }
  expect(relativeRipple(0.2)).toBeGreaterThan(1.8 * relativeRipple(0.1));
});

/** Share of an RF cycle in which U − V cos Ωt is positive. */
const positiveShare = (ratio: number) => 1 - Math.acos(Math.min(1, ratio)) / Math.PI;

test("false: a rod of the x pair is positive for three quarters of the time", () => {
  expect((positiveShare(APEX_RATIO) * 100).toFixed(1)).toBe("55.4");
  // Three quarters would need U/V = cos 45°, and there nothing passes.
  expect(positiveShare(Math.SQRT1_2)).toBeCloseTo(0.75, 12);
  expect(scanLineEdges(Math.SQRT1_2)).toEqual({ kind: "empty", reason: "above-apex" });
});

test("false: a rod set with RF alone passes every ion", () => {
  const rf = 300;
  const cutoff = mzOf(RF_ONLY_LIMIT_Q, rf, field);
  const { mzLow, mzHigh } = secondWindow(rf, field);
  expect(((mzLow + mzHigh) / 2 / cutoff).toFixed(2)).toBe("0.12");
  for (let mz = cutoff / 11; mz < cutoff; mz *= 1.002) {
    const expected = mz > mzLow && mz < mzHigh;
    expect(at(mz, 0, rf).stable, `m/z ${mz} of cutoff ${cutoff}`).toBe(expected);
  }
});
