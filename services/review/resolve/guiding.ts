import { rfToCanonical } from "../../contract/drive.ts";
import { fieldOf, polePairsOf, type RodSet } from "../../contract/rod-set.ts";
import { RF_ONLY_LIMIT_Q } from "../../physics/first-region.ts";
import { rfVoltsOf } from "../../physics/mathieu-parameters.ts";
import { lowMassCutoff } from "../../physics/rf-only.ts";
import type { Acquisition } from "../acquisition.ts";
import type { Evidence } from "../finding.ts";
import type { CellRf, Stage } from "../instrument.ts";
import { interpolate } from "./interpolate.ts";
import type { GuidedIon, Guiding, Placed } from "./resolved-method.ts";

interface Volts {
  readonly rfVolts: number | null;
  readonly cutoffMz: number | null;
  readonly evidence: Evidence;
  readonly missing: readonly string[];
}

/** An RF-only stage as one acquisition sets it: volts and low-mass cutoff, each as far as it follows. */
export function guidingOf(
  acquisition: Acquisition,
  placed: Placed<Stage>,
  rodSet: RodSet | undefined,
  setting: Guiding["setting"],
  ions: { readonly precursor: GuidedIon | null; readonly product: GuidedIon | null },
): Guiding {
  const rodSetPointer = `${placed.pointer}/rodSet`;
  const polePairs = rodSet === undefined ? 2 : polePairsOf(rodSet);
  const known =
    setting === null ? missingSetting(placed) : settingVolts(setting, rodSet, rodSetPointer, ions);
  const cutoffDefined = polePairs === 2;
  return {
    acquisition,
    placed,
    rodSet: rodSet ?? null,
    polePairs,
    setting,
    rfVolts: known.rfVolts,
    rfMissing: known.rfVolts === null ? (known.missing.length > 0 ? known.missing : [rodSetPointer]) : [],
    cutoffMz: cutoffDefined ? known.cutoffMz : null,
    cutoffMissing: cutoffDefined && known.cutoffMz === null ? known.missing : [],
    evidence: known.evidence,
    ...ions,
  };
}

function missingSetting(placed: Placed<Stage>): Volts {
  return { rfVolts: null, cutoffMz: null, evidence: "stated", missing: [`${placed.pointer}/rf`] };
}

function settingVolts(
  setting: { readonly rf: CellRf; readonly pointer: string },
  rodSet: RodSet | undefined,
  rodSetPointer: string,
  ions: { readonly precursor: GuidedIon | null; readonly product: GuidedIon | null },
): Volts {
  const { rf, pointer } = setting;
  if (rf.mode === "fixed") {
    const rfVolts = rfToCanonical(rf.rf);
    if (rodSet === undefined)
      return { rfVolts, cutoffMz: null, evidence: "computed", missing: [rodSetPointer] };
    return { rfVolts, cutoffMz: lowMassCutoff(rfVolts, fieldOf(rodSet)), evidence: "computed", missing: [] };
  }
  const fromCutoff = (cutoffMz: number, evidence: Evidence): Volts => ({
    rfVolts: rodSet === undefined ? null : rfVoltsOf(cutoffMz, RF_ONLY_LIMIT_Q, fieldOf(rodSet)),
    cutoffMz,
    evidence,
    missing: rodSet === undefined ? [rodSetPointer] : [],
  });
  if (rf.mode === "cutoff") return fromCutoff(rf.mz, "stated");
  if (rf.mode === "product-q") {
    if (ions.product === null)
      return { rfVolts: null, cutoffMz: null, evidence: "stated", missing: [pointer] };
    return fromCutoff((ions.product.setMz * rf.q) / RF_ONLY_LIMIT_Q, "computed");
  }
  if (ions.precursor === null)
    return { rfVolts: null, cutoffMz: null, evidence: "stated", missing: [pointer] };
  if (rf.mode === "precursor-q")
    return fromCutoff((ions.precursor.setMz * rf.q) / RF_ONLY_LIMIT_Q, "computed");
  const points = rf.points
    .map(({ mz, cutoffMz }) => ({ x: mz, y: cutoffMz }))
    .sort((one, other) => one.x - other.x);
  const cutoff = interpolate(points, ions.precursor.setMz, "hold");
  // A table says nothing beyond its ends: holding the last value could hide a cutoff that goes on rising.
  if (cutoff.outside)
    return { rfVolts: null, cutoffMz: null, evidence: "stated", missing: [`${pointer}/points`] };
  return fromCutoff(cutoff.value, "stated");
}
