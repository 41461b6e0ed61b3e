import type { Ion } from "../../contract/ion.ts";
import { mzOfIon } from "../../contract/ion.ts";
import type { Width } from "../../contract/width.ts";
import type { Acquisition } from "../acquisition.ts";
import type { Instrument, MassFilterStage, Stage } from "../instrument.ts";
import type { Method } from "../method.ts";
import { guidesOf } from "./guides.ts";
import { guidingOf } from "./guiding.ts";
import { windowAt } from "./operating-point.ts";
import { cellOf, filterAfterCell, filterBeforeCell, filterNamed, filtersOf, placedStages } from "./path.ts";
import type {
  Filtering,
  GuidedIon,
  Guiding,
  Placed,
  ResolvedAcquisition,
  ResolvedMethod,
} from "./resolved-method.ts";
import { scheduleOf } from "./schedule.ts";

/**
 * Brings instrument and method together once: ions to m/z, set points to windows, cell settings to volts and cutoffs.
 * The request has passed its schema and rules; what is not known stays unknown with the name of what is missing.
 */
export function resolveMethod(instrument: Instrument, method: Method): ResolvedMethod {
  const stages = placedStages(instrument);
  const path: Path = {
    stages,
    before: filterBeforeCell(stages),
    after: filterAfterCell(stages),
    cell: cellOf(stages),
  };
  const acquisitions = method.acquisition.map((acquisition, index) =>
    resolveAcquisition(acquisition, `/method/acquisition/${index}`, path, method),
  );
  return {
    instrument,
    method,
    stages,
    filters: filtersOf(stages),
    acquisitions,
    guides: guidesOf(stages, acquisitions),
    schedule: scheduleOf(method),
  };
}

interface Path {
  readonly stages: readonly Placed<Stage>[];
  readonly before: Placed<MassFilterStage> | null;
  readonly after: Placed<MassFilterStage> | null;
  readonly cell: Placed<Extract<Stage, { role: "collision-cell" }>> | null;
}

/** One set point of one filter, as the method states it. */
interface Setting {
  readonly target: Filtering["target"];
  readonly pointer: string;
  readonly ion: string;
  readonly mz: number;
  readonly setMz: number | undefined;
  readonly setMzPointer: string;
  readonly width: Width | undefined;
  readonly widthPointer: string;
}

function resolveAcquisition(
  acquisition: Acquisition,
  pointer: string,
  path: Path,
  method: Method,
): ResolvedAcquisition {
  const resolved: ResolvedAcquisition = {
    acquisition,
    pointer,
    polarity: acquisition.polarity ?? method.polarity,
    filterings: [],
    cells: [],
  };
  switch (acquisition.kind) {
    case "selected-ion":
      return {
        ...resolved,
        filterings: at(acquisition, filterNamed(path.stages, acquisition.stage), [
          ionSetting(pointer, "ion", acquisition.ion, "setMz", acquisition.setMz, "width", acquisition.width),
        ]),
      };
    case "scan":
      return {
        ...resolved,
        filterings: at(
          acquisition,
          filterNamed(path.stages, acquisition.stage),
          scanEnds(pointer, acquisition, 0, "width", acquisition.width),
        ),
      };
    default: {
      const precursors = precursorSettings(acquisition, pointer);
      const products = productSettings(acquisition, pointer);
      return {
        ...resolved,
        filterings: [...at(acquisition, path.before, precursors), ...at(acquisition, path.after, products)],
        cells: cellGuidings(acquisition, pointer, path.cell, precursors, products),
      };
    }
  }
}

type CellAcquisition = Exclude<Acquisition, { kind: "scan" | "selected-ion" }>;

function precursorSettings(acquisition: CellAcquisition, pointer: string): Setting[] {
  const { precursorWidth } = acquisition;
  if (acquisition.kind === "transition" || acquisition.kind === "product-scan") {
    return [
      ionSetting(
        pointer,
        "precursor",
        acquisition.precursor,
        "setPrecursorMz",
        acquisition.setPrecursorMz,
        "precursorWidth",
        precursorWidth,
      ),
    ];
  }
  return scanEnds(pointer, acquisition, 0, "precursorWidth", precursorWidth);
}

function productSettings(acquisition: CellAcquisition, pointer: string): Setting[] {
  const { productWidth } = acquisition;
  if (acquisition.kind === "transition" || acquisition.kind === "precursor-scan") {
    return [
      ionSetting(
        pointer,
        "product",
        acquisition.product as Ion,
        "setProductMz",
        acquisition.setProductMz,
        "productWidth",
        productWidth,
      ),
    ];
  }
  const shift = acquisition.kind === "neutral-loss-scan" ? -acquisition.lossMz : 0;
  return scanEnds(pointer, acquisition, shift, "productWidth", productWidth);
}

function ionSetting(
  pointer: string,
  member: string,
  ion: Ion,
  setMember: string,
  setMz: number | undefined,
  widthMember: string,
  width: Width | undefined,
): Setting {
  const mz = mzOfIon(ion);
  return {
    target: "ion",
    pointer: `${pointer}/${member}`,
    ion: ion.label ?? `m/z ${mz}`,
    mz,
    setMz,
    setMzPointer: `${pointer}/${setMember}`,
    width,
    widthPointer: `${pointer}/${widthMember}`,
  };
}

function scanEnds(
  pointer: string,
  scan: { readonly mzFrom: number; readonly mzTo: number },
  shift: number,
  widthMember: string,
  width: Width | undefined,
): Setting[] {
  return (["mzFrom", "mzTo"] as const).map((end) => ({
    target: "scan-end",
    pointer: `${pointer}/${end}`,
    ion: `m/z ${scan[end] + shift}`,
    mz: scan[end] + shift,
    setMz: scan[end] + shift,
    setMzPointer: `${pointer}/${end}`,
    width,
    widthPointer: `${pointer}/${widthMember}`,
  }));
}

function at(
  acquisition: Acquisition,
  filter: Placed<MassFilterStage> | null,
  settings: Setting[],
): Filtering[] {
  if (filter === null) return [];
  return settings.map((setting) => {
    const setMz = setting.setMz ?? setting.mz;
    const claim =
      setting.width === undefined ? null : { width: setting.width, pointer: setting.widthPointer };
    return {
      acquisition,
      filter,
      target: setting.target,
      pointer: setting.pointer,
      ion: setting.ion,
      mz: setting.mz,
      setMz,
      setMzStated: setting.setMz !== undefined,
      setMzPointer: setting.setMzPointer,
      claim,
      window: windowAt(filter, setMz, claim),
    };
  });
}

/**
 * The cell as this acquisition sets it, once for each pair of a precursor and a product: one pair in a transition, and
 * both ends of a scan, because the end at which the cell is worst depends on what its RF follows.
 */
function cellGuidings(
  acquisition: CellAcquisition,
  pointer: string,
  cell: Path["cell"],
  precursors: readonly Setting[],
  products: readonly Setting[],
): Guiding[] {
  if (cell === null) return [];
  const own = acquisition.cell?.rf;
  const setting =
    own === undefined
      ? { rf: cell.stage.rf, pointer: `${cell.pointer}/rf` }
      : { rf: own, pointer: `${pointer}/cell/rf` };
  return Array.from({ length: Math.max(precursors.length, products.length) }, (_, index) =>
    guidingOf(acquisition, cell, cell.stage.rodSet, setting, {
      precursor: guidedIon(precursors[index] ?? precursors[0]!),
      product: guidedIon(products[index] ?? products[0]!),
    }),
  );
}

function guidedIon({ pointer, ion, mz, setMz }: Setting): GuidedIon {
  return { pointer, ion, mz, setMz: setMz ?? mz };
}
