import { driveFromCanonical } from "../contract/drive.ts";
import type { Filtering, Guiding, ResolvedMethod } from "./resolve/resolved-method.ts";
import type { Setting } from "./sign-off-schema.ts";

/** Every ion in every stage as the method sets it: what a LIMS stores beside the findings. */
export function settingsOf(resolved: ResolvedMethod): Setting[] {
  return resolved.acquisitions.flatMap(({ filterings, cells }) => [
    ...filterings.map(filterSetting),
    ...cells.map(cellSetting),
  ]);
}

function filterSetting({ window, filter, acquisition, pointer, ion, mz, setMz }: Filtering): Setting {
  const known = window.kind === "window" ? window : null;
  return {
    pointer,
    acquisition: acquisition.id,
    stage: filter.stage.name,
    ion,
    mz,
    setMz,
    window:
      known === null
        ? null
        : { mzLow: known.mzLow, mzHigh: known.mzHigh, at: known.height, evidence: known.evidence },
    drive:
      known === null || known.drive === null
        ? null
        : driveFromCanonical(known.drive.volts, known.drive.convention),
    cutoffMz: null,
  };
}

function cellSetting({ placed, acquisition, product, cutoffMz, setting }: Guiding): Setting {
  const stated = setting?.rf.mode === "fixed" ? { rf: setting.rf.rf } : null;
  return {
    pointer: product.pointer,
    acquisition: acquisition.id,
    stage: placed.stage.name,
    ion: product.ion,
    mz: product.mz,
    setMz: product.setMz,
    window: null,
    drive: stated,
    cutoffMz,
  };
}
