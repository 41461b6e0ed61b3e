import fc from "fast-check";
import { expect, test } from "vitest";
import { mzOf } from "../../../services/physics/mathieu-parameters.ts";
import { WAVE_EDGE_Q_MAX } from "../../../services/physics/rectangular/wave-edges.ts";
import { wavePassbandsOf } from "../../../services/physics/rectangular/wave-passbands.ts";
import { type Deviation, expectWithin, relativeError } from "../../measured-bound.ts";
import { DUTY_CYCLE_FILTERS } from "../../reference/rectangular-waves.ts";
import { anyField, anyVolts, logUniform } from "../settings.ts";
import { anyWave, dcCoupled, SQUARE } from "./waves.ts";

test("edges in m/z of the reference settings", () => {
  const deviations: Deviation[] = [];
  for (const row of DUTY_CYCLE_FILTERS) {
    const field = { fieldRadius: row.r0_m, frequency: row.f_Hz };
    const answer = wavePassbandsOf(0, row.V_V, dcCoupled(row.duty), field, "first");
    if (answer.kind !== "passbands") throw new Error(answer.kind);
    expect(answer.passbands).toHaveLength(row.stable ? 1 : 0);
    if (!row.stable) continue;
    const { passband, low, high } = answer.passbands[0]!;
    deviations.push({ at: `duty ${row.duty}`, error: relativeError(passband.mzLow, row.mz_low!) });
    expect(passband.mzHigh === null).toBe(row.mz_high === null);
    if (row.mz_high === null) continue;
    deviations.push({ at: `duty ${row.duty}`, error: relativeError(passband.mzHigh!, row.mz_high) });
    expect([low!.lostTo, high!.lostTo]).toEqual(["x", "y"]);
  }
  expectWithin(5e-15, deviations);
});

test("scaling volts, radius and frequency so that q stays changes nothing", () => {
  fc.assert(
    fc.property(anyVolts, anyField, anyWave, logUniform(0.1, 10), (volts, field, wave, scale) => {
      const ratio = 0.05;
      const plain = wavePassbandsOf(ratio * volts, volts, wave, field, "first");
      const scaled = wavePassbandsOf(
        ratio * volts * scale * scale,
        volts * scale * scale,
        wave,
        { fieldRadius: field.fieldRadius * scale, frequency: field.frequency },
        "first",
      );
      if (plain.kind !== "passbands" || scaled.kind !== "passbands") throw new Error("not converged");
      expect(scaled.passbands.length).toBe(plain.passbands.length);
      for (const [i, { passband }] of plain.passbands.entries()) {
        expect(relativeError(scaled.passbands[i]!.passband.mzLow, passband.mzLow)).toBeLessThan(1e-12);
      }
    }),
  );
});

test("without RF nothing passes, and a window beyond the end of the search is marked as cut off", () => {
  const field = { fieldRadius: 0.004, frequency: 1e6 };
  expect(wavePassbandsOf(1, 0, SQUARE, field, "any")).toMatchObject({ passbands: [], reason: "no-rf" });
  const answer = wavePassbandsOf(0, 500, { dutyCycle: 0.004, coupling: "ac" }, field, "first");
  expect(answer).toMatchObject({
    passbands: [
      { truncated: true, low: null, passband: { mzLow: mzOf(WAVE_EDGE_Q_MAX, 500, field), mzHigh: null } },
    ],
  });
});
