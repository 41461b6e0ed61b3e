import { expect, test } from "vitest";
import { type Deviation, expectWithin } from "../../measured-bound.ts";
import { beamOf, REFERENCE_PEAKS } from "./reference-peaks.ts";
import { passing } from "./settings.ts";

/*
 * 90 points of six peaks, R 100 to 714, 40 to 150 cycles: test/reference/transmission_public.json. Its polygon integral
 * was written apart from this project (other language, other integrator, other hull), its Monte Carlo shares no method at all.
 */
function answersAt(accuracy: number) {
  return REFERENCE_PEAKS.flatMap((setting) =>
    setting.points.map(([mz, , , monteCarlo, standardError, integral]) => ({
      at: `${setting.id}, m/z ${mz}`,
      monteCarlo: monteCarlo!,
      standardError: standardError!,
      integral: integral!,
      answer: passing({
        mz: mz!,
        dcVolts: setting.U_V,
        rfVolts: setting.V_V,
        field: { fieldRadius: setting.r0_m, frequency: setting.f_Hz },
        rfCycles: setting.rf_cycles,
        beam: beamOf(setting),
        accuracy,
      }),
    })),
  );
}

test.each([
  [1e-2, 1.5e-3],
  [1e-3, 3e-5],
  [1e-4, 1.5e-6],
  [1e-5, 1.5e-6],
])(
  "all ninety reference points at accuracy %s lie within their bound, and within what was measured",
  (accuracy, measured) => {
    const deviations: Deviation[] = answersAt(accuracy).map(({ at, integral, answer }) => {
      const error = Math.abs(answer.transmission - integral);
      expect(error, at).toBeLessThanOrEqual(answer.errorBound);
      expect(answer.errorBound, at).toBeLessThanOrEqual(accuracy);
      return { at, error };
    });
    expect(deviations).toHaveLength(90);
    expectWithin(measured, deviations);
  },
);

test("eight million random ions a point agree within their standard error", () => {
  const scores = answersAt(1e-5).map(
    ({ monteCarlo, standardError, answer }) => (answer.transmission - monteCarlo) / standardError,
  );
  const rms = Math.sqrt(scores.reduce((sum, z) => sum + z * z, 0) / scores.length);
  // 90 scores of mean square 1: the root lies in 0.78..1.22 (three standard deviations of chi-square/90).
  expect(rms).toBeGreaterThan(0.78);
  expect(rms).toBeLessThan(1.22);
  for (const z of scores) expect(Math.abs(z)).toBeLessThan(4);
});
