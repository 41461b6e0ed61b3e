import { formulaNotComputed, type Ion, ionErrors } from "../../contract/ion.ts";
import type { ErrorItem } from "../../contract/rule.ts";
import type { Acquisition } from "../acquisition.ts";
import type { Instrument } from "../instrument.ts";
import type { Method } from "../method.ts";
import { cellOf, filterAfterCell, filterBeforeCell, filterNamed, placedStages } from "../resolve/path.ts";
import { duplicates } from "./duplicates.ts";

/** The rules between the members of a method, and between a method and its instrument. */
export function methodErrors(instrument: Instrument, method: Method): ErrorItem[] {
  const { timing, acquisition, compounds = [] } = method;
  const errors = duplicates(acquisition, "id", (index) => `/method/acquisition/${index}/id`);
  errors.push(...duplicates(compounds, "id", (index) => `/method/compounds/${index}/id`));
  if (timing.mode === "cycle" && timing.dwellMin_ms > timing.dwellMax_ms) {
    errors.push({
      pointer: "/method/timing/dwellMax_ms",
      code: "not-above",
      detail: `dwellMax_ms is ${timing.dwellMax_ms}; it must not be below dwellMin_ms, ${timing.dwellMin_ms}.`,
    });
  }
  const known = method.compounds === undefined ? null : new Set(compounds.map(({ id }) => id));
  acquisition.forEach((each, index) => {
    const pointer = `/method/acquisition/${index}`;
    errors.push(...ionsOf(each, pointer, each.polarity ?? method.polarity));
    errors.push(...placeErrors(instrument, each, pointer));
    errors.push(...orderErrors(each, pointer));
    if (each.compound !== undefined && known !== null && !known.has(each.compound)) {
      errors.push({
        pointer: `${pointer}/compound`,
        code: "not-found",
        detail: "compound names no id in /method/compounds.",
      });
    }
  });
  return errors;
}

function ionsOf(acquisition: Acquisition, pointer: string, polarity: Method["polarity"]): ErrorItem[] {
  const errors: ErrorItem[] = [];
  const visit = (ion: Ion, at: string) => {
    errors.push(...ionErrors(ion, at));
    if ("mz" in ion && ion.charge !== undefined && ion.charge * (polarity === "positive" ? 1 : -1) < 0) {
      errors.push({
        pointer: `${at}/charge`,
        code: "charge-against-polarity",
        detail: `charge is ${ion.charge}, but the polarity is ${polarity}.`,
      });
    }
  };
  if ("ion" in acquisition) visit(acquisition.ion, `${pointer}/ion`);
  if ("precursor" in acquisition) visit(acquisition.precursor, `${pointer}/precursor`);
  if ("product" in acquisition) {
    if ("neutralLoss" in acquisition.product)
      errors.push(formulaNotComputed(`${pointer}/product/neutralLoss`));
    else visit(acquisition.product, `${pointer}/product`);
  }
  if ("neighbours" in acquisition) {
    acquisition.neighbours?.forEach(({ ion }, index) => {
      visit(ion, `${pointer}/neighbours/${index}/ion`);
    });
  }
  return errors;
}

/** Whether the instrument has the stages that this kind of acquisition runs through. */
function placeErrors(instrument: Instrument, acquisition: Acquisition, pointer: string): ErrorItem[] {
  const stages = placedStages(instrument);
  if (acquisition.kind === "scan" || acquisition.kind === "selected-ion") {
    if (filterNamed(stages, acquisition.stage) !== null) return [];
    return [
      {
        pointer: `${pointer}/stage`,
        code: "not-found",
        detail: "stage names no mass filter of the instrument that filters.",
      },
    ];
  }
  const missing = [
    ...(cellOf(stages) === null ? ["a collision cell"] : []),
    ...(filterBeforeCell(stages) === null ? ["a mass filter before it that filters"] : []),
    ...(filterAfterCell(stages) === null ? ["a mass filter behind it that filters"] : []),
  ];
  if (missing.length === 0) return [];
  return [
    {
      pointer: `${pointer}/kind`,
      code: "stages-do-not-fit",
      detail: `kind is ${acquisition.kind}; the instrument lacks ${missing.join(", ")}.`,
    },
  ];
}

function orderErrors(acquisition: Acquisition, pointer: string): ErrorItem[] {
  const errors: ErrorItem[] = [];
  const { retention } = acquisition;
  if (retention !== undefined && retention.end_min <= retention.start_min) {
    errors.push({
      pointer: `${pointer}/retention/end_min`,
      code: "not-above",
      detail: `end_min is ${retention.end_min}; it must be above start_min, ${retention.start_min}.`,
    });
  }
  if ("mzFrom" in acquisition && acquisition.mzTo <= acquisition.mzFrom) {
    errors.push({
      pointer: `${pointer}/mzTo`,
      code: "not-above",
      detail: `mzTo is ${acquisition.mzTo}; it must be above mzFrom, ${acquisition.mzFrom}.`,
    });
  }
  if (acquisition.kind === "neutral-loss-scan" && acquisition.lossMz >= acquisition.mzFrom) {
    errors.push({
      pointer: `${pointer}/lossMz`,
      code: "not-below",
      detail: `lossMz is ${acquisition.lossMz}; it must be below mzFrom, ${acquisition.mzFrom}.`,
    });
  }
  return errors;
}
