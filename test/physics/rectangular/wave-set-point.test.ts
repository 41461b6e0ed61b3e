import fc from "fast-check";
import { expect, test } from "vitest";
import { wavePassbandsOf } from "../../../services/physics/rectangular/wave-passbands.ts";
import type { WaveTuning } from "../../../services/physics/rectangular/wave-resolution.ts";
import {
  waveSetPointByFrequency,
  waveSetPointByVolts,
} from "../../../services/physics/rectangular/wave-set-point.ts";
import { type Deviation, expectWithin, relativeError } from "../../measured-bound.ts";
import { anyField, anyMz, anyVolts, logUniform } from "../settings.ts";
import { SQUARE } from "./waves.ts";

const BY_RATIO: WaveTuning = { vary: "ratio", wave: SQUARE, towards: "high" };
const BY_DUTY: WaveTuning = { vary: "duty-cycle", ratio: 0, towards: "high" };

test("volts at a fixed frequency, and the frequency at fixed volts, open the window asked for at any scale", () => {
  const deviations: Deviation[] = [];
  fc.assert(
    fc.property(
      anyMz,
      logUniform(0.6, 1e4),
      anyField,
      anyVolts,
      fc.constantFrom(BY_RATIO, BY_DUTY),
      (mz, resolution, field, volts, tuning) => {
        for (const set of [
          waveSetPointByVolts(mz, mz / resolution, field, tuning),
          waveSetPointByFrequency(mz, mz / resolution, volts, field.fieldRadius, tuning),
        ]) {
          if (set.kind !== "set-point") throw new Error(set.kind);
          const actual = { fieldRadius: field.fieldRadius, frequency: set.frequency };
          const answer = wavePassbandsOf(set.dcVolts, set.rfVolts, set.wave, actual, "first");
          if (answer.kind !== "passbands") throw new Error(answer.kind);
          const { passband } = answer.passbands[0]!;
          const at = `m/z ${mz}, R ${resolution}, ${tuning.vary}`;
          deviations.push({ at, error: relativeError(passband.mzCentre!, mz) });
          const scale = Math.max(1, resolution);
          deviations.push({ at, error: relativeError(passband.mzWidth!, mz / resolution) / scale });
        }
      },
    ),
  );
  expectWithin(5e-15, deviations);
});

test("at fixed volts a quarter of the m/z needs twice the frequency, and nothing else changes", () => {
  const heavy = waveSetPointByFrequency(4000, 40, 500, 0.004, BY_DUTY);
  const light = waveSetPointByFrequency(1000, 10, 500, 0.004, BY_DUTY);
  if (heavy.kind !== "set-point" || light.kind !== "set-point") throw new Error("no set point");
  expect(light.frequency / heavy.frequency).toBeCloseTo(2, 14);
  expect(light.wave).toEqual(heavy.wave);
  expect(light.dcVolts).toBe(0);
});

test("the duty cycle needs no DC supply, and the square wave no uneven duty cycle", () => {
  const field = { fieldRadius: 0.004, frequency: 1e6 };
  const byDuty = waveSetPointByVolts(500, 1, field, BY_DUTY);
  const byRatio = waveSetPointByVolts(500, 1, field, BY_RATIO);
  if (byDuty.kind !== "set-point" || byRatio.kind !== "set-point") throw new Error("no set point");
  expect(byDuty.dcVolts).toBe(0);
  expect(byDuty.wave.dutyCycle).toBeGreaterThan(0.61);
  expect(byRatio.wave).toEqual(SQUARE);
  expect(byRatio.dcVolts / byRatio.rfVolts).toBe(byRatio.ratio);
  expect(byRatio.a).toBe(2 * byRatio.ratio * byRatio.q);
});

test("a width that no wave reaches keeps its reason", () => {
  expect(waveSetPointByVolts(500, 1000, { fieldRadius: 0.004, frequency: 1e6 }, BY_RATIO)).toMatchObject({
    reason: "resolution-not-reachable",
  });
});
