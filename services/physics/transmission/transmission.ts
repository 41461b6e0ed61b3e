/*
 * Transmission of an ideal quadrupole field with a hard aperture for one m/z.
 *
 * x and y move independently, so for one start phase the share that survives is the product of two planes, and in a plane
 * the states that survive form a convex, centrally symmetric polygon whose Gaussian measure is a sum over its sides
 * (demands.ts, polygon-mass.ts). T is the mean of the product over the start phase; the two factors are not independent after
 * averaging. Nothing is random: the linear maps are those of Dawson (ed.), Quadrupole Mass Spectrometry and its Applications
 * (1976), chapter II, the measure is Owen's (sector-mass.ts), the mean is the trapezoidal rule (phase-mean.ts).
 *
 * Not modelled: fringe fields, round rods, collisions, space charge, axial acceptance at the exit, a beam off the axis.
 */

import { aOf, type Field, qOf } from "../mathieu-parameters.ts";
import { type Demands, demandsOf } from "./demands.ts";
import { type FlightRows, flightRows } from "./flight-rows.ts";
import { MOST_PHASES, phaseMean } from "./phase-mean.ts";
import { planeTransmission, sidesOfLastPolygon } from "./plane-transmission.ts";

/** Standard deviations of a centred Gaussian beam at the entrance: positions in m, velocities in m/s, 0 allowed. */
export interface BeamMoments {
  readonly sigmaX: number;
  readonly sigmaY: number;
  readonly sigmaVx: number;
  readonly sigmaVy: number;
}

/** m/z in u per charge, volts pole-to-ground with V zero-to-peak. */
export interface Flight {
  readonly mz: number;
  /** Of either sign: reversing it exchanges the planes. */
  readonly dcVolts: number;
  readonly rfVolts: number;
  readonly field: Field;
  /** RF cycles in the field, any number > 0. */
  readonly rfCycles: number;
  readonly beam: BeamMoments;
  /**
   * Growth of U and V during the flight, relative, in 1/s, of a field that is being scanned; volts are then those at
   * entry. The ramp is counted from the middle of the RF cycle of entry, so a single start phase is off by at most half a cycle
   * of ramp and the mean is not. The motion in the growing field is solved as it is, without an average over cycles.
   */
  readonly driveGrowth?: number;
}

export interface Transmission {
  readonly kind: "transmission";
  /** Share of the beam, 0..1. */
  readonly transmission: number;
  readonly phases: number;
  /** Spacing of the rows where it was finest. */
  readonly samplesPerCycle: number;
  /** Absolute; the sum of what phases, spans between samples, quadrature and an early end may contribute. */
  readonly errorBound: number;
  /** Rows, tests and sides of polygons. */
  readonly steps: number;
}

export type TransmissionAnswer =
  | Transmission
  | { readonly kind: "not-converged"; readonly steps: number }
  | { readonly kind: "outside-computed-domain"; readonly reason: "motion-too-violent" };

export const DEFAULT_TRANSMISSION_STEPS = 20_000_000;

/** |a| + 2|q| up to which the series are sound; and growth within one RF cycle, whose square costs digits. */
const LARGEST_PARAMETERS = 1000;
const LARGEST_GROWTH = 1e5;

/** Quadrature of both planes, relative, and rounding, absolute; measured in the tests of the parts. */
const QUADRATURE_ERROR = 1e-6;
const ROUNDING_ERROR = 1e-8;

/** Share of a tolerance that the phases may use; the spans between samples use a quarter. */
const PHASE_SHARE = 0.7;
/** A start phase whose x plane lets less than this share of the tolerance through counts nothing. */
const NEGLIGIBLE_SHARE = 0.01;
/** Four factors 1 + ε (two planes, two directions each) make up a quarter of the tolerance. */
const SLACK_SHARE = 1 / 16;

/**
 * Row length from which a strip of that row alone leaves less than a twentieth of the tolerance of any start phase: its mass is
 * below sqrt(2/π) over the spread of row · u, and that spread is at least the length times the smallest singular value of
 * the beam's matrix, which is above det/norm.
 */
function enoughLength(
  rows: FlightRows,
  sigmaPosition: number,
  sigmaVelocity: number,
  tolerance: number,
): number {
  const norm = Math.SQRT2 * rows.growthWithinCycle * Math.hypot(sigmaPosition, sigmaVelocity);
  return (20 * norm) / (tolerance * sigmaPosition * sigmaVelocity);
}

/** Tolerances of one value: absolute for the phases, relative for the gaps between samples. */
export interface Tolerances {
  readonly phases: number;
  readonly slack: number;
}

export function tolerancesOf(accuracy: number): Tolerances {
  return { phases: PHASE_SHARE * accuracy, slack: SLACK_SHARE * accuracy };
}

function demandsOfPlane(
  flight: Flight,
  sign: 1 | -1,
  sigmaPosition: number,
  sigmaVelocity: number,
  tolerances: Tolerances,
  maxSteps: number,
): Demands | null {
  const { mz, field, rfCycles } = flight;
  const a = sign * aOf(mz, flight.dcVolts, field);
  const q = sign * qOf(mz, flight.rfVolts, field);
  const growthPerCycle = (flight.driveGrowth ?? 0) / field.frequency;
  const growth = 1 + Math.abs(growthPerCycle) * (rfCycles + 2);
  if (!((Math.abs(a) + 2 * Math.abs(q)) * growth <= LARGEST_PARAMETERS)) return null;
  const rows = flightRows({ a, q, growthPerCycle }, rfCycles);
  if (!(rows.growthWithinCycle <= LARGEST_GROWTH)) return null;
  const enough = enoughLength(rows, sigmaPosition, sigmaVelocity, tolerances.phases);
  return demandsOf(rows, rfCycles, tolerances.slack, enough, maxSteps);
}

/** As transmissionOf, with the tolerances apart: a peak profile knows how high the peak is. */
export function transmissionWithin(
  flight: Flight,
  tolerances: Tolerances,
  maxSteps: number = DEFAULT_TRANSMISSION_STEPS,
): TransmissionAnswer {
  const { field, beam, rfCycles } = flight;
  // One row and one cycle of powers each: known beforehand to be too much, so that nothing is allocated for it.
  if (!(rfCycles * 4 <= maxSteps)) return { kind: "not-converged", steps: 0 };
  const perRadian = 1 / (field.fieldRadius * Math.PI * field.frequency);
  const sigmaX = beam.sigmaX / field.fieldRadius;
  const sigmaY = beam.sigmaY / field.fieldRadius;
  const sigmaVx = beam.sigmaVx * perRadian;
  const sigmaVy = beam.sigmaVy * perRadian;
  const x = demandsOfPlane(flight, 1, sigmaX, sigmaVx, tolerances, maxSteps);
  const y = demandsOfPlane(flight, -1, sigmaY, sigmaVy, tolerances, maxSteps);
  if (x === null || y === null) return { kind: "outside-computed-domain", reason: "motion-too-violent" };
  const growing = x.rows.motion.growthPerCycle !== 0;
  let steps = x.steps + y.steps;
  const negligible = NEGLIGIBLE_SHARE * tolerances.phases;
  const product = (turn: number): number => {
    if (steps > maxSteps) return 0;
    const throughX = planeTransmission(x, turn, sigmaX, sigmaVx);
    steps += sidesOfLastPolygon();
    if (throughX < negligible) return 0;
    const throughY = planeTransmission(y, turn, sigmaY, sigmaVy);
    steps += sidesOfLastPolygon();
    return throughX * throughY;
  };
  const { mean, phases, errorBound } = phaseMean(product, tolerances.phases, MOST_PHASES, !growing);
  const gaps = 4 * tolerances.slack * mean;
  const unfinished = x.cutShort || y.cutShort ? mean : 0;
  if (steps > maxSteps || Math.max(errorBound, unfinished) > tolerances.phases) {
    return { kind: "not-converged", steps };
  }
  return {
    kind: "transmission",
    transmission: Math.min(1, mean),
    phases,
    samplesPerCycle: Math.round(1 / Math.min(x.finestSpan, y.finestSpan)),
    errorBound: errorBound + negligible + gaps + QUADRATURE_ERROR * mean + ROUNDING_ERROR + unfinished,
    steps,
  };
}

/**
 * Share of the beam that passes |x| <= r0 and |y| <= r0 at all times, start phase uniform. `accuracy` 1e-2..1e-5, absolute; the
 * bound that was reached is part of the answer, and lies below `accuracy` or the answer is "not-converged". Cost about in
 * proportion to rfCycles; at most `maxSteps` rows, tests and polygon sides.
 */
export function transmissionOf(
  flight: Flight & { readonly accuracy: number },
  maxSteps: number = DEFAULT_TRANSMISSION_STEPS,
): TransmissionAnswer {
  return transmissionWithin(flight, tolerancesOf(flight.accuracy), maxSteps);
}
