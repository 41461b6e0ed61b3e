import { expect, test } from "vitest";
import { beamMomentsOf } from "../../services/contract/beam.ts";

test("a beam stated axis by axis keeps its axes, in metres", () => {
  const beam = { sigmaX_mm: 0.4, sigmaY_mm: 0.25, sigmaVx_mPerS: 139, sigmaVy_mPerS: 0 };
  expect(beamMomentsOf(beam, 500)).toEqual({ sigmaX: 4e-4, sigmaY: 2.5e-4, sigmaVx: 139, sigmaVy: 0 });
});

// The settings of test/reference/transmission_public.json were computed elsewhere for 0.1 eV at m/z 500 and print
// 138.914 m/s, six digits.
test("a mean radial energy of 0.1 eV per charge is 138.914 m/s in each axis at m/z 500", () => {
  const { sigmaX, sigmaY, sigmaVx, sigmaVy } = beamMomentsOf(
    { sigma_mm: 0.4, meanRadialEnergy_eVPerCharge: 0.1 },
    500,
  );
  expect([sigmaX, sigmaY]).toEqual([4e-4, 4e-4]);
  expect(Math.abs(sigmaVx - 138.914)).toBeLessThan(5e-4);
  expect(sigmaVy).toBe(sigmaVx);
});

// Kinetic energy, from the definition of the electronvolt (SI Brochure, 9th edition, table 8) and CODATA 2022.
test("both axes together carry the mean radial energy, whatever the mass", () => {
  const [electronvolt, massUnit] = [1.602176634e-19, 1.66053906892e-27];
  for (const mz of [0.5, 4.0021, 28, 1e6]) {
    const { sigmaVx, sigmaVy } = beamMomentsOf({ sigma_mm: 1, meanRadialEnergy_eVPerCharge: 0.7 }, mz);
    const energy = (0.5 * mz * massUnit * (sigmaVx * sigmaVx + sigmaVy * sigmaVy)) / electronvolt;
    expect(Math.abs(energy / 0.7 - 1)).toBeLessThan(1e-15 * 4);
  }
});

test("a beam without radial energy has no velocities", () => {
  const { sigmaVx, sigmaVy } = beamMomentsOf({ sigma_mm: 0.1, meanRadialEnergy_eVPerCharge: 0 }, 28);
  expect([sigmaVx, sigmaVy]).toEqual([0, 0]);
});
