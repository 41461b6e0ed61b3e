import { dcToCanonical, rfToCanonical } from "../../contract/drive.ts";
import { fieldOf } from "../../contract/rod-set.ts";
import { setPointOf } from "../../physics/set-point.ts";
import { defineCheck } from "../check.ts";
import type { Bounds, Evidence } from "../finding.ts";
import type { MassFilterStage, Stage, Supply } from "../instrument.ts";
import { boundsOf, LowerLimit } from "../limit.ts";
import type { Observation } from "../observation.ts";
import type { Filtering, Guiding, Placed, ResolvedMethod } from "../resolve/resolved-method.ts";
import { centreOf, standsForEdges, widthOf } from "../resolve/window.ts";
import { digits } from "../statement.ts";
import { ratedRange } from "./rated-range.ts";

export const supplyHeadroom = defineCheck({
  id: "supply-headroom",
  computes:
    "What is left of the supply's largest voltage at the heaviest demand of the method, or of the rated m/z range.",
  needs: ["stages/supply", "stages/rated", "stages/operatingPoint", "stages/rodSet", "stages/rf"],
  quantities: [
    { quantity: "rf-headroom", unit: "%", meaning: "(largest RF - needed RF) / largest RF" },
    { quantity: "dc-headroom", unit: "%", meaning: "(largest DC - needed DC) / largest DC" },
    {
      quantity: "rated-range",
      unit: "1",
      meaning: "m/z from the nearer end of the rated range, negative outside; guaranteed, so 0 passes",
    },
  ],
  requiredByDefault: true,
  limit: LowerLimit,
  defaults: { pass: { min: 10 }, caution: { min: 5 } },
  basis:
    "10 % for detuning and temperature, 5 % at least: common practice, no source. A rated range is what the maker guarantees.",
  examine: (method, limits) => {
    const pass = boundsOf(limits.pass);
    const caution = boundsOf(limits.caution);
    return [
      ...method.filters.flatMap((filter) => [
        ...filterHeadroom(method, filter, pass, caution),
        ...ratedRange(method, filter),
      ]),
      ...cellHeadroom(method, pass, caution),
    ];
  },
});

type Axis = "rf" | "dc";

/** A demand on a supply: how many canonical volts, for which ion, known how. */
interface Demand {
  readonly volts: number;
  readonly evidence: Evidence;
  readonly acquisition: string;
  readonly ion: string;
}

function filterHeadroom(
  method: ResolvedMethod,
  filter: Placed<MassFilterStage>,
  pass: Bounds,
  caution: Bounds,
): Observation[] {
  const { supply, rated } = filter.stage;
  // A rated range answers the same question where the amplifier's limits are not known.
  if (supply === undefined && rated !== undefined) return [];
  const settings = method.acquisitions.flatMap(({ filterings }) =>
    filterings.filter((each) => each.filter === filter),
  );
  return (["rf", "dc"] as const).map((axis) => {
    const missing = new Set<string>();
    const demands = settings.flatMap((setting) => filterDemand(setting, axis, missing) ?? []);
    return headroom(filter, supply, axis, demands, missing, pass, caution);
  });
}

function filterDemand(setting: Filtering, axis: Axis, missing: Set<string>): Demand | null {
  const { window, filter, acquisition, ion } = setting;
  const demand = (volts: number, evidence: Evidence): Demand => ({
    volts,
    evidence,
    acquisition: acquisition.id,
    ion,
  });
  if (window.kind === "unknown") {
    for (const input of window.missing) missing.add(input);
    return null;
  }
  if (window.drive !== null) {
    const { rfVolts, dcVolts } = window.drive.volts;
    return demand(axis === "rf" ? rfVolts : dcVolts, "computed");
  }
  if (window.kind === "empty") return null;
  if (filter.stage.rodSet === undefined) {
    missing.add(`${filter.pointer}/rodSet`);
    return null;
  }
  // A narrower window needs the higher DC, so only a width that is not the wider one may stand in.
  if (!standsForEdges(window, "narrow")) {
    missing.add(window.widthPointer);
    return null;
  }
  const solved = setPointOf(centreOf(window), widthOf(window), fieldOf(filter.stage.rodSet));
  if (solved.kind !== "set-point") {
    missing.add(window.widthPointer);
    return null;
  }
  return demand(
    axis === "rf" ? solved.rfVolts : solved.dcVolts,
    window.evidence === "stated" ? "stated" : "computed",
  );
}

function cellHeadroom(method: ResolvedMethod, pass: Bounds, caution: Bounds): Observation[] {
  const cells = method.acquisitions.flatMap(({ cells }) => cells);
  const first = cells[0];
  if (first === undefined || !("supply" in first.placed.stage) || first.placed.stage.supply === undefined)
    return [];
  const missing = new Set<string>();
  const demands = cells.flatMap((cell) => cellDemand(cell, missing) ?? []);
  return [headroom(first.placed, first.placed.stage.supply as Supply, "rf", demands, missing, pass, caution)];
}

function cellDemand(cell: Guiding, missing: Set<string>): Demand | null {
  if (cell.rfVolts === null) {
    for (const input of cell.rfMissing) missing.add(input);
    return null;
  }
  const ion = (cell.product ?? cell.precursor)?.ion ?? "";
  return { volts: cell.rfVolts, evidence: cell.evidence, acquisition: cell.acquisition.id, ion };
}

function headroom(
  placed: Placed<Stage>,
  supply: Supply | undefined,
  axis: Axis,
  demands: readonly Demand[],
  missing: ReadonlySet<string>,
  pass: Bounds,
  caution: Bounds,
): Observation {
  const member = axis === "rf" ? "rfMax" : "dcMax";
  const pointer = `${placed.pointer}/supply/${member}`;
  const about = {
    quantity: `${axis}-headroom`,
    unit: "%",
    subject: { pointer: placed.pointer, stage: placed.stage.name },
  };
  const largest = largestVolts(supply, axis);
  const lacking = [
    ...(largest === null ? [supply === undefined ? `${placed.pointer}/supply` : pointer] : []),
    ...missing,
  ];
  if (demands.length === 0 && lacking.length === 0) {
    return {
      ...about,
      kind: "not-applicable",
      statement: `The method asks no ${axis.toUpperCase()} of ${placed.stage.name}.`,
    };
  }
  if (largest === null || lacking.length > 0) {
    return {
      ...about,
      kind: "indeterminate",
      missing: lacking,
      statement: `The ${axis.toUpperCase()} headroom of ${placed.stage.name} does not follow without ${lacking.join(", ")}.`,
    };
  }
  const worst = demands.reduce((best, demand) => (demand.volts > best.volts ? demand : best));
  const subject = { ...about.subject, acquisition: worst.acquisition, ion: worst.ion };
  if (largest === 0) {
    return {
      ...about,
      kind: "impossible",
      subject,
      evidence: worst.evidence,
      pass,
      caution,
      passesIf: null,
      statement: `The supply of ${placed.stage.name} is stated to reach 0 V.`,
    };
  }
  const value = (100 * (largest - worst.volts)) / largest;
  const stated = statedLargest(supply, axis);
  return {
    ...about,
    kind: "value",
    subject,
    value,
    evidence: worst.evidence,
    pass,
    caution,
    passesIf:
      pass.min === null || pass.min >= 100
        ? null
        : {
            input: `${pointer}/volts`,
            min: ((worst.volts / largest) * stated) / (1 - pass.min / 100),
            max: null,
            unit: "V",
          },
    statement:
      `${placed.stage.name} needs ${digits((worst.volts / largest) * stated, 5)} V ${axis.toUpperCase()} for ${worst.ion} of ` +
      `${worst.acquisition}; the supply reaches ${digits(stated, 5)} V in the same reading.`,
  };
}

function largestVolts(supply: Supply | undefined, axis: Axis): number | null {
  if (axis === "rf") return supply?.rfMax === undefined ? null : rfToCanonical(supply.rfMax);
  return supply?.dcMax === undefined ? null : dcToCanonical(supply.dcMax).dcVolts;
}

function statedLargest(supply: Supply | undefined, axis: Axis): number {
  if (axis === "rf") return supply!.rfMax!.volts;
  const largest = supply!.dcMax!;
  return "volts" in largest ? Math.abs(largest.volts) : Math.abs(largest.pairX_V - largest.pairY_V) / 2;
}
