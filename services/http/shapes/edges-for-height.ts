import { beamMomentsOf } from "../../contract/beam.ts";
import { mzOfIon } from "../../contract/ion.ts";
import { rfCyclesOf } from "../../contract/residence.ts";
import { fieldOf, rectangularWaveOf } from "../../contract/rod-set.ts";
import { widthInMz } from "../../contract/width.ts";
import { edgesForHeight } from "../../physics/transmission/edge-width.ts";
import type { SetPoint, SetPointsRequest, Target } from "./set-points.ts";

export type EdgesForHeight =
  | { readonly kind: "edges"; readonly mzWidth: number }
  | { readonly kind: "unsolved"; readonly reason: NonNullable<SetPoint["reason"]> };

const DEFAULT_ACCURACY = 3e-3;
/** What a target costs for each RF cycle, in targets at the edges, of which 1,000 stand for a quarter of a second. */
const WORK_OF_PEAKS = 2.6;
/** A finer width takes a peak more. */
const FINE_ACCURACY = 2e-3;
const WORK_OF_FINE_PEAKS = 4;
/** In a short flight the search goes on to nearly closed edges, and peaks are wide. */
const LEAST_WORK = 600;

/** Residence and beam where a peak can be computed, null where the width stays without an answer. */
function peakGiven({ rodSet, region, solveFor, residence, beam }: SetPointsRequest) {
  const inFirstRegion = region === undefined || region === "first";
  const sinusoid = rectangularWaveOf(rodSet.waveform) === null;
  if (!sinusoid || !inFirstRegion || solveFor === "frequency") return null;
  return residence === undefined || beam === undefined ? null : { residence, beam };
}

/** The width between the edges, in m/z, of the window whose peak is as wide at its height as the target wants. */
export function edgesForTarget(target: Target, request: SetPointsRequest): EdgesForHeight {
  const { at } = target.width;
  const mzCentre = mzOfIon(target.ion);
  const width = widthInMz(target.width, mzCentre);
  if (at === "edges") return { kind: "edges", mzWidth: width };
  const given = peakGiven(request);
  if (given === null) return { kind: "unsolved", reason: "width-height-needs-peak-profile" };
  const { rodSet, accuracy = DEFAULT_ACCURACY } = request;
  const found = edgesForHeight({
    mzCentre,
    width,
    at,
    accuracy,
    field: fieldOf(rodSet),
    // The rule on the rod length has made sure that the cycles are known.
    residence: (mz) => rfCyclesOf(given.residence, rodSet, mz)!,
    beam: (mz) => beamMomentsOf(given.beam, mz),
  });
  switch (found.kind) {
    case "edges":
      return { kind: "edges", mzWidth: found.edgeWidth };
    case "none":
      return { kind: "unsolved", reason: reasonOf(found.reason) };
    default:
      return { kind: "unsolved", reason: found.kind };
  }
}

type NoEdges = Extract<ReturnType<typeof edgesForHeight>, { kind: "none" }>["reason"];

function reasonOf(reason: NoEdges): NonNullable<SetPoint["reason"]> {
  switch (reason) {
    case "residence-too-short":
    case "resolution-not-reachable":
      return reason;
    case "no-maximum-near-the-window":
      return "residence-too-short";
    default:
      // Nothing passes, or a flank stays up. A closed or open window cannot be among them: each was solved for.
      return "no-such-peak";
  }
}

/** As how many targets at the edges this one counts. */
export function edgesWorthOf(target: Target, request: SetPointsRequest): number {
  const given = peakGiven(request);
  if (target.width.at === "edges" || given === null) return 1;
  const { rodSet, accuracy = DEFAULT_ACCURACY } = request;
  const rfCycles = rfCyclesOf(given.residence, rodSet, mzOfIon(target.ion))!;
  const peaks = accuracy < FINE_ACCURACY ? WORK_OF_FINE_PEAKS : WORK_OF_PEAKS;
  return Math.ceil(Math.max(LEAST_WORK, peaks * (rfCycles + 1 / Math.sqrt(accuracy))));
}
