import type { z } from "zod";
import { beamMomentsOf } from "../../contract/beam.ts";
import { driveToCanonical } from "../../contract/drive.ts";
import { residenceErrors, rfCyclesOf } from "../../contract/residence.ts";
import { fieldOf, sinusoidalQuadrupole } from "../../contract/rod-set.ts";
import type { ErrorItem } from "../../contract/rule.ts";
import { type Passband, passbandOf } from "../../physics/passband.ts";
import { type Flanks, peakProfileOf } from "../../physics/transmission/peak-profile.ts";
import { type Transmission, transmissionOf } from "../../physics/transmission/transmission.ts";
import { defineEndpoint } from "../endpoint.ts";
import { PEAK_PROFILE_EXAMPLES } from "../examples/peak-profile.ts";
import {
  type PeakFlanks,
  PeakProfileAnswer,
  PeakProfileRequest,
  type ProfilePoint,
} from "../shapes/peak-profile.ts";

type Request = z.output<typeof PeakProfileRequest>;
type Answer = z.input<typeof PeakProfileAnswer>;

/** Some quarter of a second of one core: an RF cycle of an ion that is not lost costs about 10 us. */
const MOST_CYCLES = 25_000;
/** A peak takes 40 to 50 values, of which those on the flanks cost less. */
const VALUES_OF_PEAK = 36;
/** A field that grows has to be followed cycle by cycle. */
const SCAN_WORK = 2.5;
/** Start phases and polygons cost 1/√accuracy cycles, and several times that where a flight is so short that most rows matter. */
const FEW_CYCLES = 40;
const FEWEST_CYCLES = 6;

/** Twice what a value took in any case that converged: per root of the inverse accuracy, and per RF cycle. */
const STEPS_OF_PHASES = 600;
const STEPS_OF_CYCLE = 300;

export const peakProfile = defineEndpoint({
  operationId: "peakProfile",
  method: "post",
  path: "/v1/peak-profile",
  tag: "Mass filter",
  summary: "The share of a beam that passes against m/z, and position, height and widths of the peak",
  description: `Transmission of an ideal quadrupole field with a hard aperture at r0, for a centred Gaussian beam and a residence. Deterministic: for each start phase of the RF the states that survive form polygons, whose measure is computed, and the mean over the phase is taken; the answer states the error bound that was reached. Widths at half and at a tenth of the height are those of this peak and differ from the distance of the stability edges. Not modelled: fringe fields, round rods, collisions, space charge, the exit and a beam off the axis, so that real peaks have tails that this one lacks. One request may ask for ${MOST_CYCLES} RF cycles of work: (number of points, and ${VALUES_OF_PEAK} more for the peak) times (RF cycles, ${SCAN_WORK}-fold with a scan rate, plus 1/√accuracy, several times that for flights of a few cycles).`,
  request: PeakProfileRequest,
  rules: [
    ({ rodSet }) => sinusoidalQuadrupole(rodSet, "/rodSet"),
    ({ residence, rodSet }) => residenceErrors(residence, rodSet, "/rodSet"),
    rangeRises,
  ],
  work: { unit: "RF cycles of work", of: cyclesOfWork, most: MOST_CYCLES },
  answer: PeakProfileAnswer,
  examples: PEAK_PROFILE_EXAMPLES,
  handler(request) {
    const edges = edgesOf(request);
    return { ...pointsOf(request, edges), ...peakOf(request, edges) };
  },
});

function rangeRises({ mz }: Request): ErrorItem[] {
  if ("values" in mz || mz.to > mz.from) return [];
  return [
    { pointer: "/mz/to", code: "not-above", detail: `to is ${mz.to}; it must be above from, ${mz.from}.` },
  ];
}

/** null where the drive opens no window with two edges in the first region. */
function edgesOf({ drive, rodSet }: Request): Passband | null {
  const { dcVolts, rfVolts } = driveToCanonical(drive);
  const found = passbandOf(dcVolts, rfVolts, fieldOf(rodSet));
  return found.kind === "window" ? found.passband : null;
}

/** The rule on the rod length has made sure that the cycles are known. */
function cyclesAt(mz: number, { residence, rodSet }: Request): number {
  return rfCyclesOf(residence, rodSet, mz)!;
}

function mzValuesOf({ mz }: Request): readonly number[] {
  if ("values" in mz) return mz.values;
  const { from, to, points } = mz;
  return Array.from({ length: points }, (_, index) =>
    index === points - 1 ? to : from + (index * (to - from)) / (points - 1),
  );
}

/** A step budget for one value. */
function stepsOf(mz: number, request: Request): number {
  return STEPS_OF_PHASES / Math.sqrt(accuracyOf(request)) + STEPS_OF_CYCLE * cyclesAt(mz, request);
}

const accuracyOf = ({ accuracy = 1e-3 }: Request): number => accuracy;
const scanRateOf = ({ scanRate_mzPerS = 0 }: Request): number => scanRate_mzPerS;

function cyclesOfWork(request: Request): number {
  const perCycle = scanRateOf(request) === 0 ? 1 : SCAN_WORK;
  const phases = 1 / Math.sqrt(accuracyOf(request));
  const of = (mz: number) => {
    const cycles = cyclesAt(mz, request);
    return cycles * perCycle + phases * (1 + FEW_CYCLES / Math.max(cycles, FEWEST_CYCLES));
  };
  let work = 0;
  for (const mz of mzValuesOf(request)) work += of(mz);
  const mzCentre = edgesOf(request)?.mzCentre ?? null;
  if (request.findPeak !== false && mzCentre !== null) work += VALUES_OF_PEAK * of(mzCentre);
  return Math.ceil(work);
}

function pointsOf(request: Request, edges: Passband | null): Pick<Answer, "points" | "method"> {
  const scanRate = scanRateOf(request);
  const mzCentre = edges?.mzCentre ?? null;
  const common = {
    ...driveToCanonical(request.drive),
    field: fieldOf(request.rodSet),
    driveGrowth: mzCentre === null ? 0 : scanRate / mzCentre,
    accuracy: accuracyOf(request),
  };
  let method: Answer["method"] = null;
  const points = mzValuesOf(request).map((mz): ProfilePoint => {
    const none = (reason: ProfilePoint["reason"]) => ({ mz, transmission: null, reason });
    if (!(common.dcVolts < common.rfVolts)) return none("dc-not-below-rf");
    if (scanRate !== 0 && mzCentre === null) return none("no-window-to-scan");
    const beam = beamMomentsOf(request.beam, mz);
    const flight = { ...common, mz, rfCycles: cyclesAt(mz, request), beam };
    const found = transmissionOf(flight, stepsOf(mz, request));
    if (found.kind !== "transmission") return none(found.kind);
    method = worseOf(method, found);
    return { mz, transmission: found.transmission, reason: null };
  });
  return { points, method };
}

function worseOf(worst: Answer["method"], found: Transmission): NonNullable<Answer["method"]> {
  const { phases, samplesPerCycle, errorBound } = found;
  return {
    phases: Math.max(phases, worst?.phases ?? 0),
    samplesPerCycle: Math.max(samplesPerCycle, worst?.samplesPerCycle ?? 0),
    errorBound: Math.max(errorBound, worst?.errorBound ?? 0),
  };
}

function peakOf(request: Request, edges: Passband | null): Pick<Answer, "peak" | "peakReason"> {
  if (request.findPeak === false) return { peak: null, peakReason: "not-asked-for" };
  const found = peakProfileOf(
    {
      ...driveToCanonical(request.drive),
      field: fieldOf(request.rodSet),
      residence: (mz) => cyclesAt(mz, request),
      beam: (mz) => beamMomentsOf(request.beam, mz),
      accuracy: accuracyOf(request),
      scanRate: scanRateOf(request),
    },
    edges === null ? undefined : VALUES_OF_PEAK * stepsOf(edges.mzCentre!, request),
  );
  if (found.kind === "none") return { peak: null, peakReason: found.reason };
  if (found.kind !== "peak") return { peak: null, peakReason: found.kind };
  // A peak is found between two edges only.
  const { mzLow, mzHigh, mzCentre, mzWidth } = edges!;
  const flanks = (at: Flanks | null): PeakFlanks | null =>
    at && { mzLow: at.low, mzHigh: at.high, shiftFromCentre: 0.5 * (at.low + at.high) - mzCentre! };
  return {
    peak: {
      mz: found.mz,
      transmission: found.height,
      widthHalfHeight: found.halfHeight?.width ?? null,
      widthTenthHeight: found.tenthHeight?.width ?? null,
      halfHeight: flanks(found.halfHeight),
      tenthHeight: flanks(found.tenthHeight),
      edges: { mzLow, mzHigh: mzHigh!, mzCentre: mzCentre!, width: mzWidth! },
      shiftFromCentre: found.shiftFromCentre,
      errorBound: found.errorBound,
    },
    peakReason: null,
  };
}
