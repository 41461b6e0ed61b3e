import type { Ion } from "../../contract/ion.ts";
import { mzOfIon } from "../../contract/ion.ts";
import { Mz } from "../../contract/quantity.ts";
import type { Width } from "../../contract/width.ts";
import type { Acquisition } from "../acquisition.ts";
import type { Instrument, MassFilterStage, Stage } from "../instrument.ts";
import { leverOn } from "../lever.ts";
import type { Method } from "../method.ts";
import { guidesOf } from "./guides.ts";
import { guidingOf } from "./guiding.ts";
import { type WindowSource, windowsOf } from "./operating-point.ts";
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
  const filters = filtersOf(stages);
  const path: Path = {
    stages,
    windows: new Map(filters.map((filter) => [filter.pointer, windowsOf(filter)])),
    before: filterBeforeCell(stages),
    after: filterAfterCell(stages),
    cell: cellOf(stages),
  };
  const acquisitions = method.acquisition.map((acquisition, index) =>
    resolveAcquisition(acquisition, index, path, method),
  );
  return {
    instrument,
    method,
    stages,
    filters,
    acquisitions,
    settings: byFilter(acquisitions),
    guides: guidesOf(stages, acquisitions),
    schedule: scheduleOf(method),
  };
}

function byFilter(acquisitions: readonly ResolvedAcquisition[]): Map<string, Filtering[]> {
  const settings = new Map<string, Filtering[]>();
  for (const { filterings } of acquisitions) {
    for (const filtering of filterings) {
      const known = settings.get(filtering.filter.pointer);
      if (known === undefined) settings.set(filtering.filter.pointer, [filtering]);
      else known.push(filtering);
    }
  }
  return settings;
}

interface Path {
  readonly stages: readonly Placed<Stage>[];
  /** By the pointer of the filter. */
  readonly windows: ReadonlyMap<string, WindowSource>;
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
  /** What is added to the member at `setMzPointer`. */
  readonly shift: number;
}

function resolveAcquisition(
  acquisition: Acquisition,
  index: number,
  path: Path,
  method: Method,
): ResolvedAcquisition {
  const pointer = `/method/acquisition/${index}`;
  const polarity = acquisition.polarity ?? method.polarity;
  const common = { acquisition, index, pointer, polarity };
  if (acquisition.kind === "scan" || acquisition.kind === "selected-ion") {
    const settings = singleSettings(acquisition, pointer);
    return {
      ...common,
      filterings: at(acquisition, filterNamed(path.stages, acquisition.stage), path, settings),
      cells: cellGuidings(acquisition, pointer, path.cell, settings, settings),
    };
  }
  const precursors = precursorSettings(acquisition, pointer);
  const products = productSettings(acquisition, pointer);
  return {
    ...common,
    filterings: [
      ...at(acquisition, path.before, path, precursors),
      ...at(acquisition, path.after, path, products),
    ],
    cells: cellGuidings(acquisition, pointer, path.cell, precursors, products),
  };
}

type SingleAcquisition = Extract<Acquisition, { kind: "scan" | "selected-ion" }>;

function singleSettings(acquisition: SingleAcquisition, pointer: string): Setting[] {
  const { width } = acquisition;
  return acquisition.kind === "scan"
    ? scanEnds(pointer, acquisition, 0, "width", width)
    : [ionSetting(pointer, "ion", acquisition.ion, "setMz", acquisition.setMz, "width", width)];
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
    shift: 0,
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
    shift,
  }));
}

function at(
  acquisition: Acquisition,
  filter: Placed<MassFilterStage> | null,
  { windows }: Path,
  settings: readonly Setting[],
): Filtering[] {
  if (filter === null) return [];
  const windowAt = windows.get(filter.pointer)!;
  return settings.map((setting) => {
    const { target, pointer, ion, mz, setMzPointer, shift } = setting;
    const setMz = setting.setMz ?? mz;
    const claim =
      setting.width === undefined ? null : { width: setting.width, pointer: setting.widthPointer };
    return {
      acquisition,
      filter,
      target,
      pointer,
      ion,
      mz,
      setMz,
      setMzStated: setting.setMz !== undefined,
      setMzPointer,
      claim,
      window: windowAt(setMz, claim),
      setMzLever: { ...leverOn(setMzPointer, "1", Mz), inputFor: (set) => set - shift },
      windowIfSetTo: (set) => windowAt(set, claim),
    };
  });
}

/**
 * The cell as this acquisition sets it, once for each pair of a precursor and a product: one pair in a transition, and
 * both ends of a scan, because the end at which the cell is worst depends on what its RF follows.
 */
function cellGuidings(
  acquisition: Acquisition,
  pointer: string,
  cell: Path["cell"],
  precursors: readonly Setting[],
  products: readonly Setting[],
): Guiding[] {
  if (cell === null) return [];
  const own = "cell" in acquisition ? acquisition.cell?.rf : undefined;
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
