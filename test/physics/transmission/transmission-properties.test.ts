import fc from "fast-check";
import { expect, test } from "vitest";
import { setPointOf } from "../../../services/physics/set-point.ts";
import { stripMass } from "../../../services/physics/transmission/strip-mass.ts";
import { type Flight, transmissionOf } from "../../../services/physics/transmission/transmission.ts";
import { logUniform } from "../settings.ts";
import { FIELD, passing, roundBeam, setPoint } from "./settings.ts";

/** A flight near a window of R 1 to 1000, inside or just beside it. */
const anyFlight: fc.Arbitrary<Flight> = fc
  .record({
    resolution: logUniform(1, 1000),
    offset: fc.double({ min: -0.7, max: 0.7, noNaN: true }),
    rfCycles: logUniform(2, 100),
    sigma: logUniform(0.02, 2),
    energy: logUniform(1e-3, 3),
    aspect: logUniform(0.5, 2),
  })
  .map(({ resolution, offset, rfCycles, sigma, energy, aspect }) => {
    const set = setPointOf(500, 500 / resolution, FIELD);
    if (set.kind !== "set-point") throw new Error(set.kind);
    const beam = roundBeam(sigma, energy, 500, FIELD);
    const { dcVolts, rfVolts } = set;
    const mz = 500 * (1 + offset / resolution / 2);
    return { mz, dcVolts, rfVolts, field: FIELD, rfCycles, beam: { ...beam, sigmaY: aspect * beam.sigmaY } };
  });

const accuracy = 1e-4;
const runs = { numRuns: 40 };

test("a share lies between 0 and 1, and its bound below the accuracy that was asked for", () => {
  fc.assert(
    fc.property(anyFlight, (flight) => {
      const { transmission, errorBound } = passing({ ...flight, accuracy });
      expect(transmission).toBeGreaterThanOrEqual(0);
      expect(transmission).toBeLessThanOrEqual(1);
      expect(errorBound).toBeLessThanOrEqual(accuracy);
    }),
    runs,
  );
});

test("answers of different accuracy differ by no more than their bounds", () => {
  fc.assert(
    fc.property(anyFlight, (flight) => {
      const fine = passing({ ...flight, accuracy: 1e-4 });
      for (const coarser of [1e-2, 1e-3]) {
        const coarse = passing({ ...flight, accuracy: coarser });
        expect(Math.abs(coarse.transmission - fine.transmission)).toBeLessThanOrEqual(
          coarse.errorBound + fine.errorBound,
        );
      }
    }),
    runs,
  );
});

test("reversing the DC, and the RF with it, exchanges x and y", () => {
  fc.assert(
    fc.property(anyFlight, (flight) => {
      const { sigmaX, sigmaY, sigmaVx, sigmaVy } = flight.beam;
      const exchanged = {
        ...flight,
        dcVolts: -flight.dcVolts,
        rfVolts: -flight.rfVolts,
        beam: { sigmaX: sigmaY, sigmaY: sigmaX, sigmaVx: sigmaVy, sigmaVy: sigmaVx },
      };
      const there = passing({ ...flight, accuracy });
      const back = passing({ ...exchanged, accuracy });
      expect(Math.abs(there.transmission - back.transmission)).toBeLessThanOrEqual(1e-12);
    }),
    runs,
  );
});

test("reversing the DC alone exchanges x and y too: half a cycle of start phase is averaged away", () => {
  fc.assert(
    fc.property(anyFlight, (flight) => {
      const { sigmaX, sigmaY, sigmaVx, sigmaVy } = flight.beam;
      const there = passing({ ...flight, accuracy });
      const back = passing({
        ...flight,
        dcVolts: -flight.dcVolts,
        beam: { sigmaX: sigmaY, sigmaY: sigmaX, sigmaVx: sigmaVy, sigmaVy: sigmaVx },
        accuracy,
      });
      expect(Math.abs(there.transmission - back.transmission)).toBeLessThanOrEqual(
        there.errorBound + back.errorBound,
      );
    }),
    runs,
  );
});

test("lengths, frequency and mass scale out while a, q and the beam's shape stay", () => {
  fc.assert(
    fc.property(
      anyFlight,
      logUniform(0.0125, 12.5),
      logUniform(1e-3, 80),
      logUniform(0.001, 2000),
      (flight, length, rate, mass) => {
        const { beam, field } = flight;
        const volts = mass * length * length * rate * rate;
        const scaled: Flight = {
          mz: flight.mz * mass,
          dcVolts: flight.dcVolts * volts,
          rfVolts: flight.rfVolts * volts,
          field: { fieldRadius: field.fieldRadius * length, frequency: field.frequency * rate },
          rfCycles: flight.rfCycles,
          beam: {
            sigmaX: beam.sigmaX * length,
            sigmaY: beam.sigmaY * length,
            sigmaVx: beam.sigmaVx * length * rate,
            sigmaVy: beam.sigmaVy * length * rate,
          },
        };
        const one = passing({ ...flight, accuracy });
        const other = passing({ ...scaled, accuracy });
        // Rounding of a and q may turn a decision of the refinement, which has a quarter of the accuracy to itself.
        expect(Math.abs(one.transmission - other.transmission)).toBeLessThanOrEqual(0.25 * accuracy);
      },
    ),
    runs,
  );
});

test("a longer flight, a smaller aperture or a beam that starts wider lets less through", () => {
  fc.assert(
    fc.property(anyFlight, fc.double({ min: 1.05, max: 3, noNaN: true }), (flight, factor) => {
      const one = passing({ ...flight, accuracy });
      const longer = passing({ ...flight, rfCycles: flight.rfCycles * factor, accuracy });
      expect(longer.transmission).toBeLessThanOrEqual(one.transmission + one.errorBound + longer.errorBound);
      const { sigmaX, sigmaY, sigmaVx, sigmaVy } = flight.beam;
      const beam = {
        sigmaX: factor * sigmaX,
        sigmaY: factor * sigmaY,
        sigmaVx: factor * sigmaVx,
        sigmaVy: factor * sigmaVy,
      };
      const wider = passing({ ...flight, beam, accuracy });
      expect(wider.transmission).toBeLessThanOrEqual(one.transmission + one.errorBound + wider.errorBound);
    }),
    runs,
  );
});

test("a stable ion passes a wide aperture whatever the residence, and no aperture lets an unstable one through", () => {
  const { dcVolts, rfVolts } = setPoint(500, 1, FIELD);
  const thin = roundBeam(1e-4, 1e-9, 500, FIELD);
  const flight = { dcVolts, rfVolts, field: FIELD, beam: thin, accuracy: 1e-5 };
  expect(passing({ ...flight, mz: 500, rfCycles: 400 }).transmission).toBeGreaterThan(1 - 1e-5);
  expect(passing({ ...flight, mz: 480, rfCycles: 400 }).transmission).toBeLessThan(1e-5);
  expect(passing({ ...flight, mz: 520, rfCycles: 400 }).transmission).toBeLessThan(1e-5);
});

test("without field and velocity, what passes is what enters: two strips", () => {
  for (const sigma of [0.2, 1, 4]) {
    const beam = { ...roundBeam(sigma, 0, 500, FIELD), sigmaY: 2e-3 };
    const flight = { mz: 500, dcVolts: 0, rfVolts: 0, field: FIELD, rfCycles: 10.3, beam, accuracy: 1e-5 };
    expect(passing(flight).transmission).toBeCloseTo(stripMass(1 / sigma) * stripMass(2), 12);
  }
});

test("without field, a point source of given velocity spread passes while |v| t <= r0", () => {
  const beam = { sigmaX: 0, sigmaY: 0, sigmaVx: 300, sigmaVy: 120 };
  const time = 15.7 / FIELD.frequency;
  const flight = { mz: 500, dcVolts: 0, rfVolts: 0, field: FIELD, rfCycles: 15.7, beam, accuracy: 1e-5 };
  const reach = FIELD.fieldRadius / time;
  expect(passing(flight).transmission).toBeCloseTo(stripMass(reach / 300) * stripMass(reach / 120), 10);
});

test("too many cycles for the budget, and motion too violent for the series, are answers", () => {
  const { dcVolts, rfVolts } = setPoint(500, 1, FIELD);
  const flight = {
    mz: 500,
    dcVolts,
    rfVolts,
    field: FIELD,
    rfCycles: 1e7,
    beam: roundBeam(0.1, 0.1, 500, FIELD),
  };
  expect(transmissionOf({ ...flight, accuracy: 1e-3 })).toMatchObject({ kind: "not-converged" });
  expect(transmissionOf({ ...flight, rfCycles: 100, accuracy: 1e-3 }, 3000)).toMatchObject({
    kind: "not-converged",
  });
  expect(transmissionOf({ ...flight, mz: 0.5, rfCycles: 100, accuracy: 1e-3 })).toEqual({
    kind: "outside-computed-domain",
    reason: "motion-too-violent",
  });
});
