import type { z } from "zod";
import { dcToCanonical, driveToCanonical } from "../../contract/drive.ts";
import { chargeNumberOf, type Ion, ionErrors, mzOfIon } from "../../contract/ion.ts";
import { residenceErrors, rfCyclesOf } from "../../contract/residence.ts";
import { fieldOf, sinusoidalQuadrupole } from "../../contract/rod-set.ts";
import { metresFromMm, microsecondsFromSeconds, mmFromMetres } from "../../contract/si.ts";
import { aOf, qOf } from "../../physics/mathieu-parameters.ts";
import { fieldAt, peakVolts, positiveShare } from "../../physics/rod-potential.ts";
import { DOMAIN_LIMIT } from "../../physics/stability.ts";
import { type Entry, type Flight, flightThrough } from "../../physics/trajectory/flight.ts";
import { largestEver } from "../../physics/trajectory/motion-bound.ts";
import { defineEndpoint } from "../endpoint.ts";
import { TRAJECTORY_EXAMPLES } from "../examples/trajectory.ts";
import { TrajectoryAnswer, TrajectoryRequest } from "../shapes/trajectory.ts";

/** Samples of one flight: some half a megabyte of JSON. */
const MOST_SAMPLES = 20_000;
/** The steps of a cycle cost as much as so many samples, however few are asked for. */
const SAMPLES_PER_CYCLE_AT_LEAST = 10;

type Request = z.output<typeof TrajectoryRequest>;
type Answer = z.input<typeof TrajectoryAnswer>;

export const trajectory = defineEndpoint({
  operationId: "trajectory",
  method: "post",
  path: "/v1/trajectory",
  tag: "Ion motion",
  summary: "The path of one ion, where and when it is lost, and what stands on the rods",
  description: `x(t) and y(t) of an ion in the ideal field, by exact propagators of the linear equation; the envelope; where and when it first reaches r0; the share of a cycle in which the rods are positive, their largest voltage against ground; on request field and force at a point. At most ${MOST_SAMPLES} samples, a cycle counting as ${SAMPLES_PER_CYCLE_AT_LEAST} at least. Nothing is computed beyond |a| or q of ${DOMAIN_LIMIT}. An ion that is unstable is not lost at once, and a stable one can still be too large for the rods. x are the rods whose DC has the sign of the ion.`,
  request: TrajectoryRequest,
  rules: [
    ({ rodSet }) => sinusoidalQuadrupole(rodSet, "/rodSet"),
    ({ residence, rodSet }) => residenceErrors(residence, rodSet, "/rodSet"),
    ({ ion }) => ionErrors(ion, "/ion"),
  ],
  work: {
    unit: "samples",
    of: (request) => {
      const perCycle = Math.max(SAMPLES_PER_CYCLE_AT_LEAST, request.samplesPerCycle);
      return Math.ceil(cyclesOf(request) * perCycle) + 1;
    },
    most: MOST_SAMPLES,
  },
  answer: TrajectoryAnswer,
  examples: TRAJECTORY_EXAMPLES,
  handler(request): Answer {
    const { rodSet, drive, ion } = request;
    const mz = mzOfIon(ion);
    const { dcVolts, rfVolts } = driveToCanonical(drive);
    const field = fieldOf(rodSet);
    const a = aOf(mz, dcVolts, field);
    const q = qOf(mz, rfVolts, field);
    const flight = flightOf(a, q, request);
    return {
      mz,
      a,
      q,
      flight,
      reason: flight === null ? "outside-computed-domain" : null,
      rods: rodsOf(request, dcVolts, rfVolts),
      fieldAt: fieldThere(request, dcVolts, rfVolts),
    };
  },
});

/** The rule on the rod length has made sure that the cycles are known; an ion by formula is refused before. */
function cyclesOf({ residence, rodSet, ion }: Request): number {
  return rfCyclesOf(residence, rodSet, mzOfIon(ion))!;
}

const radians = (degrees: number) => (degrees * Math.PI) / 180;

function flightOf(a: number, q: number, request: Request): Answer["flight"] {
  const { rodSet, start, samplesPerCycle } = request;
  const { fieldRadius, frequency } = fieldOf(rodSet);
  // ξ = π f t, so that a velocity over π f r0 is a slope in units of r0.
  const speed = Math.PI * frequency * fieldRadius;
  const entry: Entry = {
    phase: radians(start.phase_deg),
    x: metresFromMm(start.x_mm) / fieldRadius,
    y: metresFromMm(start.y_mm) / fieldRadius,
    slopeX: start.vx_mPerS / speed,
    slopeY: start.vy_mPerS / speed,
  };
  const rfCycles = cyclesOf(request);
  const flight = flightThrough(a, q, entry, rfCycles, samplesPerCycle);
  if (flight === null) return null;
  const time_us = (cycle: number) => microsecondsFromSeconds(cycle / frequency);
  const mm = (ofRadius: number) => mmFromMetres(ofRadius * fieldRadius);
  const { lost, endCycle } = flight;
  return {
    rfCycles,
    samples: {
      time_us: Array.from(flight.cycles, time_us),
      x_mm: Array.from(flight.x, mm),
      y_mm: Array.from(flight.y, mm),
    },
    envelope: envelopesOf(a, q, entry, flight, mm, time_us),
    lost: lost && {
      to: lost.to,
      at_us: time_us(lost.atCycle),
      atCycle: lost.atCycle,
      x_mm: mm(lost.x),
      y_mm: mm(lost.y),
    },
    end: {
      time_us: time_us(endCycle),
      x_mm: mm(flight.x.at(-1)!),
      y_mm: mm(flight.y.at(-1)!),
      vx_mPerS: flight.slopeX * speed,
      vy_mPerS: flight.slopeY * speed,
    },
  };
}

function envelopesOf(
  a: number,
  q: number,
  { phase, x, y, slopeX, slopeY }: Entry,
  { excursionX, excursionY }: Flight,
  mm: (ofRadius: number) => number,
  time_us: (cycle: number) => number,
): NonNullable<Answer["flight"]>["envelope"] {
  const inMm = (largest: number | null) => (largest === null ? null : mm(largest));
  return {
    x: {
      largest_mm: mm(excursionX.most),
      at_us: time_us(excursionX.atCycle),
      largestEver_mm: inMm(largestEver(a, q, phase, { value: x, slope: slopeX })),
    },
    y: {
      largest_mm: mm(excursionY.most),
      at_us: time_us(excursionY.atCycle),
      largestEver_mm: inMm(largestEver(-a, -q, phase, { value: y, slope: slopeY })),
    },
  };
}

/** The charge number with its sign; positive where none is stated. */
function signedCharge(ion: Ion): number {
  const negative = "mz" in ion && ion.charge !== undefined && ion.charge < 0;
  return negative ? -chargeNumberOf(ion) : chargeNumberOf(ion);
}

function rodsOf({ drive, ion }: Request, dcVolts: number, rfVolts: number): Answer["rods"] {
  const { rodOffset_V } = dcToCanonical(drive.dc);
  const ofX = Math.sign(signedCharge(ion)) * dcVolts;
  const rods = (dc: number) => ({
    dcToGround_V: dc,
    positiveShare: positiveShare(dc, rfVolts),
    peakToGround_V: peakVolts(dc, rfVolts),
  });
  return { x: rods((rodOffset_V ?? 0) + ofX), y: rods((rodOffset_V ?? 0) - ofX), rodOffset_V };
}

function fieldThere(request: Request, dcVolts: number, rfVolts: number): Answer["fieldAt"] {
  const { rodSet, ion, fieldAt: point } = request;
  if (point === undefined) return null;
  const charge = signedCharge(ion);
  // The x pair has the sign of the ion, so both voltages turn round with it.
  const sign = Math.sign(charge);
  const there = fieldAt(
    metresFromMm(point.x_mm),
    metresFromMm(point.y_mm),
    radians(point.phase_deg),
    sign * dcVolts,
    sign * rfVolts,
    fieldOf(rodSet).fieldRadius,
    charge,
  );
  return {
    potential_V: there.potential,
    fieldX_VPerM: there.fieldX,
    fieldY_VPerM: there.fieldY,
    forceX_N: there.forceX,
    forceY_N: there.forceY,
  };
}
