import fc from "fast-check";
import { expect, test } from "vitest";
import { regionPassbandsOf } from "../../../services/physics/regions/region-passbands.ts";
import {
  REGION_RESOLUTION_MAXIMUM,
  regionRatioForResolution,
  regionSetPointOf,
  resolutionOf,
  shiftByRatio,
} from "../../../services/physics/regions/region-set-point.ts";
import { windowInRegion } from "../../../services/physics/regions/scan-line-windows.ts";
import { REGIONS, type StabilityRegion } from "../../../services/physics/regions/stability-regions.ts";
import { setPointOf } from "../../../services/physics/set-point.ts";
import { type Deviation, expectWithin, relativeError } from "../../measured-bound.ts";
import { anyField, anyMz, logUniform } from "../settings.ts";

const TIPS = ["high-ratio", "low-ratio"] as const;
const HIGHER = REGIONS.filter(({ name }) => name !== "first");
const [FIRST, THIRD] = REGIONS as readonly [StabilityRegion, StabilityRegion];
const SECOND = REGIONS.find(({ name }) => name === "second")!;

function windowAt(region: StabilityRegion, ratio: number) {
  const found = windowInRegion(region, ratio);
  if (found.kind !== "window") throw new Error(`${found.kind} at U/V ${ratio}`);
  return found.window;
}

test("the resolution asked for is that of the window found, in every region and towards both tips", () => {
  const deviations: Deviation[] = [];
  for (const region of HIGHER) {
    const least = resolutionOf(windowAt(region, region.inner.ratio));
    for (const tip of TIPS) {
      for (let i = 0; i <= 60; i++) {
        const resolution = least * Math.exp((i / 60) * Math.log(REGION_RESOLUTION_MAXIMUM / least) * 0.999);
        const solved = regionRatioForResolution(region, resolution, tip);
        if (solved.kind !== "ratio") throw new Error(`${solved.kind} at ${resolution}`);
        const at = `(${region.bands.x},${region.bands.y}) ${tip} R ${resolution}`;
        // The doubles of U/V and of q move a window by about 1e-16 of q, its width by R times as much.
        deviations.push({ at, error: relativeError(resolutionOf(solved.window), resolution) / resolution });
        const towardsTip = tip === "high-ratio" ? 1 : -1;
        expect((solved.ratio - region.inner.ratio) * towardsTip).toBeGreaterThanOrEqual(0);
        expect(solved.margin).toBeGreaterThan(0);
      }
    }
  }
  expect(deviations).toHaveLength(HIGHER.length * 2 * 61);
  expectWithin(2e-14, deviations);
});

test("a window is widest on the inner corner and narrows without a turn towards either tip", () => {
  for (const region of HIGHER) {
    for (const tip of [region.highTip, region.lowTip]) {
      let before = 0;
      for (let i = 0; i < 2000; i++) {
        const ratio = region.inner.ratio + (tip.ratio - region.inner.ratio) * (i / 2000);
        const resolution = resolutionOf(windowAt(region, ratio));
        expect(resolution).toBeGreaterThan(before);
        before = resolution;
      }
    }
  }
});

test("a resolution below the widest window, or beyond what doubles hold, is refused with the bounds", () => {
  expect(regionRatioForResolution(SECOND, 100)).toMatchObject({
    kind: "not-reachable",
    reason: "resolution-not-reachable",
    minimum: expect.closeTo(114.2046284706, 8),
    maximum: REGION_RESOLUTION_MAXIMUM,
  });
  expect(regionRatioForResolution(THIRD, 20)).toMatchObject({ minimum: expect.closeTo(24.376, 3) });
  expect(regionRatioForResolution(THIRD, 2e6).kind).toBe("not-reachable");
  expect(regionRatioForResolution(THIRD, 1000, "high-ratio", 1).kind).toBe("not-converged");
});

test("in the second region both tips give the same volts but for the sign of the DC", () => {
  fc.assert(
    fc.property(logUniform(115, 1e5), anyMz, anyField, (resolution, mz, field) => {
      const positive = regionSetPointOf(SECOND, mz, mz / resolution, field, "high-ratio");
      const negative = regionSetPointOf(SECOND, mz, mz / resolution, field, "low-ratio");
      if (positive.kind !== "set-point" || negative.kind !== "set-point") throw new Error("no set point");
      expect(negative.dcVolts).toBe(-positive.dcVolts);
      expect(negative.rfVolts).toBe(positive.rfVolts);
      expect(positive.dcVolts).toBeGreaterThan(0);
      expect(positive.window.low!.lostTo).toBe("y");
      expect(negative.window.low!.lostTo).toBe("x");
    }),
  );
});

test("the volts of a set point open the window asked for, at any scale of m/z, radius and frequency", () => {
  const deviations: Deviation[] = [];
  fc.assert(
    fc.property(
      logUniform(30, 3e4),
      anyMz,
      anyField,
      fc.constantFrom(...TIPS),
      (resolution, mz, field, tip) => {
        const set = regionSetPointOf(THIRD, mz, mz / resolution, field, tip);
        if (set.kind !== "set-point") throw new Error(set.kind);
        const answer = regionPassbandsOf(set.dcVolts, set.rfVolts, field, "third");
        if (answer.kind !== "passbands") throw new Error(answer.kind);
        const { passband } = answer.passbands[0]!;
        const at = `m/z ${mz}, R ${resolution}`;
        deviations.push({ at, error: relativeError(passband.mzCentre!, mz) });
        deviations.push({ at, error: relativeError(passband.mzWidth!, mz / resolution) / resolution });
      },
    ),
  );
  expectWithin(5e-15, deviations);
});

test("set points of the first region are those of its own solver", () => {
  const field = { fieldRadius: 0.004, frequency: 1.2e6 };
  const own = setPointOf(609.2807, 0.7, field);
  const answer = regionSetPointOf(FIRST, 609.2807, 0.7, field);
  if (own.kind !== "set-point" || answer.kind !== "set-point") throw new Error("no set point");
  expect(answer.rfVolts).toBe(own.rfVolts);
  expect(answer.dcVolts).toBe(own.dcVolts);
  const mirrored = regionSetPointOf(FIRST, 609.2807, 0.7, field, "low-ratio");
  expect(mirrored).toMatchObject({ dcVolts: -own.dcVolts, rfVolts: own.rfVolts });
});

test("near a tip the width falls in proportion to the distance of U/V, with the slopes of the two curves there", () => {
  const deviations: Deviation[] = [];
  for (const region of HIGHER) {
    const window = windowAt(region, region.highTip.ratio - 1e-9);
    const { low, high } = window;
    const constant = 1 / (shiftByRatio(low!) / low!.q - shiftByRatio(high) / high.q);
    const rule = constant / 1e-9;
    deviations.push({ at: `${region.bands.x}`, error: relativeError(resolutionOf(window), rule) });
  }
  expectWithin(1e-6, deviations);
});
