import { rfToCanonical } from "../../contract/drive.ts";
import { MathieuQ, Mz } from "../../contract/quantity.ts";
import { fieldOf, polePairsOf, type RodSet } from "../../contract/rod-set.ts";
import { RF_ONLY_LIMIT_Q } from "../../physics/first-region.ts";
import { type Field, rfVoltsOf } from "../../physics/mathieu-parameters.ts";
import { lowMassCutoff } from "../../physics/rf-only.ts";
import type { Acquisition } from "../acquisition.ts";
import type { Evidence } from "../finding.ts";
import type { CellRf, Stage } from "../instrument.ts";
import { type Lever, leverOn, leverThrough } from "../lever.ts";
import { nearestRow, placeIn, rowFor, valueAt } from "./interpolate.ts";
import type { GuidedIon, Guiding, Placed } from "./resolved-method.ts";
import { rfLever } from "./volts-lever.ts";

interface Ions {
  readonly precursor: GuidedIon | null;
  readonly product: GuidedIon;
}

type Setting = NonNullable<Guiding["setting"]>;

/** What a setting says by itself: volts, or a cutoff, and the lever of it; or what it lacks. */
type Known =
  | { readonly kind: "volts"; readonly volts: number; readonly lever: Lever }
  | {
      readonly kind: "cutoff";
      readonly cutoffMz: number;
      readonly evidence: Evidence;
      readonly lever: Lever | null;
    }
  | { readonly kind: "unknown"; readonly missing: readonly string[] };

/** An RF-only stage as one acquisition sets it: volts and low-mass cutoff, each as far as it follows. */
export function guidingOf(
  acquisition: Acquisition,
  placed: Placed<Stage>,
  rodSet: RodSet | undefined,
  setting: Setting | null,
  ions: Ions,
): Guiding {
  const polePairs = rodSet === undefined ? 2 : polePairsOf(rodSet);
  const known: Known =
    setting === null ? { kind: "unknown", missing: [`${placed.pointer}/rf`] } : settingOf(setting, ions);
  return {
    acquisition,
    placed,
    rodSet: rodSet ?? null,
    polePairs,
    ...ions,
    ...strengthOf(known, rodSet, polePairs, placed, setting),
  };
}

type Strength = Pick<
  Guiding,
  | "rfVolts"
  | "rfMissing"
  | "voltsLever"
  | "cutoffMz"
  | "cutoffMissing"
  | "cutoffLever"
  | "evidence"
  | "setting"
>;

/** A cutoff and volts follow from each other through the rods, where there are two pole pairs. */
function strengthOf(
  known: Known,
  rodSet: RodSet | undefined,
  polePairs: number,
  placed: Placed<Stage>,
  setting: Setting | null,
): Strength {
  const field = rodSet === undefined ? null : fieldOf(rodSet);
  const nothing = { rfVolts: null, voltsLever: null, cutoffMz: null, cutoffLever: null, setting };
  const rods = [`${placed.pointer}/rodSet`];
  if (known.kind === "unknown") {
    return { ...nothing, rfMissing: known.missing, cutoffMissing: known.missing, evidence: "stated" };
  }
  if (known.kind === "volts") {
    const volts = { rfVolts: known.volts, voltsLever: known.lever, rfMissing: [] };
    if (field === null) return { ...nothing, ...volts, cutoffMissing: rods, evidence: "computed" };
    if (polePairs > 2) return { ...nothing, ...volts, cutoffMissing: [], evidence: "computed" };
    return {
      ...volts,
      setting,
      cutoffMz: lowMassCutoff(known.volts, field),
      cutoffLever: leverThrough(known.lever, (mz) => voltsAtCutoff(mz, field)),
      cutoffMissing: [],
      evidence: "computed",
    };
  }
  const { cutoffMz, lever, evidence } = known;
  // A cutoff, or a q, does not tell the volts of a rod set that has neither.
  if (polePairs > 2) {
    return { ...nothing, rfMissing: [setting!.pointer], cutoffMissing: [], evidence };
  }
  const cutoff = { setting, cutoffMz, cutoffLever: lever, cutoffMissing: [], evidence };
  if (field === null) return { ...cutoff, rfVolts: null, voltsLever: null, rfMissing: rods };
  return {
    ...cutoff,
    rfVolts: voltsAtCutoff(cutoffMz, field),
    voltsLever: leverThrough(lever, (volts) => lowMassCutoff(volts, field)),
    rfMissing: [],
  };
}

function voltsAtCutoff(cutoffMz: number, field: Field): number {
  return rfVoltsOf(cutoffMz, RF_ONLY_LIMIT_Q, field);
}

function settingOf({ rf, pointer }: Setting, { precursor, product }: Ions): Known {
  switch (rf.mode) {
    case "fixed":
      return { kind: "volts", volts: rfToCanonical(rf.rf), lever: rfLever(rf.rf, `${pointer}/rf`) };
    case "cutoff":
      return {
        kind: "cutoff",
        cutoffMz: rf.mz,
        evidence: "stated",
        lever: leverOn(`${pointer}/mz`, "1", Mz),
      };
    case "product-q":
      return cutoffByQ(rf.q, product, pointer);
    case "precursor-q":
      return cutoffByQ(rf.q, precursor ?? product, pointer);
    case "table":
      return cutoffByTable(rf, precursor ?? product, pointer);
  }
}

/** m/z times q is the same for the ion and for the cutoff, whose q is the limit of stability. */
function cutoffByQ(q: number, { setMz }: GuidedIon, pointer: string): Known {
  return {
    kind: "cutoff",
    cutoffMz: (setMz * q) / RF_ONLY_LIMIT_Q,
    evidence: "computed",
    lever: leverThrough(leverOn(`${pointer}/q`, "1", MathieuQ), (mz) => (mz * RF_ONLY_LIMIT_Q) / setMz),
  };
}

function cutoffByTable(
  { points }: Extract<CellRf, { mode: "table" }>,
  { setMz }: GuidedIon,
  pointer: string,
): Known {
  const rows = points.map((point, index) => ({ ...point, index })).sort((one, other) => one.mz - other.mz);
  const cutoffs = rows.map(({ cutoffMz }) => cutoffMz);
  const place = placeIn(
    rows.map(({ mz }) => mz),
    setMz,
    "hold",
  );
  // A table says nothing beyond its ends: holding the last value could hide a cutoff that goes on rising.
  if (place.outside) return { kind: "unknown", missing: [`${pointer}/points`] };
  const row = nearestRow(place);
  const lever = leverOn(`${pointer}/points/${rows[row]!.index}/cutoffMz`, "1", Mz);
  return {
    kind: "cutoff",
    cutoffMz: valueAt(cutoffs, place),
    evidence: "stated",
    lever: leverThrough(lever, (mz) => rowFor(mz, row, cutoffs, place)),
  };
}
