import { expect, test } from "vitest";
import { aOf, qOf } from "../../../services/physics/mathieu-parameters.ts";
import { monteCarloTransmission } from "../../bench/transmission-monte-carlo.ts";
import { FIELD, passing, roundBeam, setPoint } from "./settings.ts";

/*
 * Ions flown one by one, one seed a flight, the m/z times 1000. Between 64 checks a cycle an ion may swing out unseen: on short
 * flights rows at that spacing left T up to 1.4e-4 too high, hence the allowance on that side.
 */
const IONS = 60_000;
const GAPS = 2e-4;

const flights = [
  { width: 0.7, mz: 500.1, rfCycles: 60, sigma: 0.1, energy: 0.1 },
  { width: 3, mz: 499, rfCycles: 33.25, sigma: 0.3, energy: 0.05 },
  { width: 50, mz: 480, rfCycles: 12.5, sigma: 0.15, energy: 1 },
  { width: 300, mz: 430, rfCycles: 7.75, sigma: 0.5, energy: 0.3 },
  { width: 20, mz: 515, rfCycles: 4.5, sigma: 0.05, energy: 2 },
  { width: 1, mz: 500, rfCycles: 0.5, sigma: 0.4, energy: 5 },
];

test.each(flights)(
  "random ions at m/z $mz, window $width, $rfCycles cycles, agree within four standard errors",
  (flight) => {
    const { width, mz, rfCycles, sigma, energy } = flight;
    const { dcVolts, rfVolts } = setPoint(500, width, FIELD);
    const beam = roundBeam(sigma, energy, mz, FIELD);
    const { transmission } = passing({ mz, dcVolts, rfVolts, field: FIELD, rfCycles, beam, accuracy: 1e-5 });
    const a = aOf(mz, dcVolts, FIELD);
    const q = qOf(mz, rfVolts, FIELD);
    const perRadian = 1 / (FIELD.fieldRadius * Math.PI * FIELD.frequency);
    const moments = { sigmaPosition: sigma, sigmaVelocity: beam.sigmaVx * perRadian };
    const share = monteCarloTransmission(
      { a, q, ...moments },
      { a: -a, q: -q, ...moments },
      rfCycles,
      64,
      IONS,
      Math.round(1000 * mz),
    );
    const standardError = Math.sqrt((transmission * (1 - transmission)) / IONS);
    expect(transmission).toBeGreaterThan(0.005);
    expect(share - transmission).toBeGreaterThan(-4 * standardError);
    expect(share - transmission).toBeLessThan(4 * standardError + GAPS);
  },
);
