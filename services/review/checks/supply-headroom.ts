import { dcToCanonical, rfToCanonical } from "../../contract/drive.ts";
import { fieldOf } from "../../contract/rod-set.ts";
import { setPointOf } from "../../physics/set-point.ts";
import { defineCheck } from "../check.ts";
import type { Bounds, Evidence } from "../finding.ts";
import type { MassFilterStage, Stage, Supply } from "../instrument.ts";
import { passesIfWithin } from "../lever.ts";
import { boundsOf, LowerLimit } from "../limit.ts";
import { lacking, notApplicable, type Observation, type Reading } from "../observation.ts";
import { NO_VOLTS } from "../resolve/negligible.ts";
import type { Filtering, Guiding, Placed, ResolvedMethod } from "../resolve/resolved-method.ts";
import { dcLever, rfLever } from "../resolve/volts-lever.ts";
import { centreOf, standsForEdges, widthOf } from "../resolve/window.ts";
import { digits } from "../statement.ts";
import { ratedRange } from "./rated-range.ts";
import { type InStage, settingsAt, worstOfStage } from "./worst-of-stage.ts";

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
      ...guidingHeadroom(method, pass, caution),
    ];
  },
});

type Axis = "rf" | "dc";

/** Canonical volts that a setting needs, and how they are known. */
type Demand =
  | { readonly kind: "volts"; readonly volts: number; readonly evidence: Evidence }
  | { readonly kind: "unknown"; readonly missing: readonly string[] }
  | { readonly kind: "none" };

function filterHeadroom(
  method: ResolvedMethod,
  filter: Placed<MassFilterStage>,
  pass: Bounds,
  caution: Bounds,
): Observation[] {
  const { supply, rated } = filter.stage;
  // A rated range answers the same question where the amplifier's limits are not known.
  if (supply === undefined && rated !== undefined) return [];
  const settings = settingsAt(method, filter).map((setting) => ({
    acquisition: setting.acquisition,
    ion: setting.ion,
    demand: filterDemand(setting),
  }));
  return (["rf", "dc"] as const).map((axis) =>
    headroom(filter, supply, axis, settings, ({ demand }) => demandOn(axis, demand), pass, caution),
  );
}

/** What a set point asks of both axes, or why it is not known. */
type SetPointDemand =
  | {
      readonly kind: "drive";
      readonly rfVolts: number;
      readonly dcVolts: number;
      readonly evidence: Evidence;
    }
  | Exclude<Demand, { kind: "volts" }>;

function demandOn(axis: Axis, demand: SetPointDemand): Demand {
  if (demand.kind !== "drive") return demand;
  const { rfVolts, dcVolts, evidence } = demand;
  return { kind: "volts", volts: axis === "rf" ? rfVolts : dcVolts, evidence };
}

function filterDemand({ window, filter }: Filtering): SetPointDemand {
  if (window.kind === "unknown") return { kind: "unknown", missing: window.missing };
  if (window.drive !== null) {
    const { rfVolts, dcVolts } = window.drive.volts;
    return { kind: "drive", rfVolts, dcVolts: Math.max(dcVolts, 0), evidence: "computed" };
  }
  if (window.kind === "no-window") return { kind: "none" };
  const { rodSet } = filter.stage;
  const missing = [
    ...(rodSet === undefined ? [`${filter.pointer}/rodSet`] : []),
    // A narrower window needs the higher DC, so only a width that is not the wider one may stand in.
    ...(standsForEdges(window, "narrow") ? [] : [window.widthPointer]),
  ];
  if (rodSet === undefined || missing.length > 0) return { kind: "unknown", missing };
  const solved = setPointOf(centreOf(window), widthOf(window), fieldOf(rodSet));
  if (solved.kind !== "set-point") return { kind: "unknown", missing: [window.widthPointer] };
  const evidence = window.evidence === "stated" ? "stated" : "computed";
  return { kind: "drive", rfVolts: solved.rfVolts, dcVolts: solved.dcVolts, evidence };
}

/** Cells and guides whose supply is stated: RF alone. */
function guidingHeadroom(method: ResolvedMethod, pass: Bounds, caution: Bounds): Observation[] {
  const guidings = [...method.guides, ...method.acquisitions.flatMap(({ cells }) => cells)];
  return method.stages.flatMap((placed) => {
    const { stage, pointer } = placed;
    const here = guidings.filter((guiding) => guiding.placed.pointer === pointer);
    if (here.length === 0 || stage.role === "ion-trap" || stage.supply === undefined) return [];
    const settings = here.map((guiding) => ({
      acquisition: guiding.acquisition,
      ion: guiding.product.ion,
      guiding,
    }));
    return [
      headroom(placed, stage.supply, "rf", settings, ({ guiding }) => guidingDemand(guiding), pass, caution),
    ];
  });
}

function guidingDemand({ rfVolts, rfMissing, evidence }: Guiding): Demand {
  if (rfVolts === null) return { kind: "unknown", missing: rfMissing };
  return { kind: "volts", volts: rfVolts, evidence };
}

function headroom<Setting extends InStage>(
  placed: Placed<Stage>,
  supply: Supply | undefined,
  axis: Axis,
  settings: readonly Setting[],
  demandOf: (setting: Setting) => Demand,
  pass: Bounds,
  caution: Bounds,
): Observation {
  const { name } = placed.stage;
  const label = axis.toUpperCase();
  const largest = largestOf(supply, axis, `${placed.pointer}/supply`);
  const read = (setting: Setting): Reading => {
    const demand = demandOf(setting);
    if (demand.kind === "none") return notApplicable(`Nothing passes ${name}.`);
    const missing = [
      ...("missing" in largest ? largest.missing : []),
      ...(demand.kind === "unknown" ? demand.missing : []),
    ];
    if ("missing" in largest || demand.kind === "unknown")
      return lacking(`The ${label} headroom of ${name}`, missing);
    return headroomOver(
      demand,
      largest,
      pass,
      caution,
      (needed, reached) =>
        `${name} needs ${needed} V ${label} for ${setting.ion} of ${setting.acquisition.id}; the supply reaches ${reached} V in the same reading.`,
    );
  };
  return worstOfStage(
    { quantity: `${axis}-headroom`, unit: "%", subject: { pointer: placed.pointer, stage: name } },
    settings,
    `The method asks no ${label} of ${name}.`,
    read,
  );
}

function headroomOver(
  { volts, evidence }: Extract<Demand, { kind: "volts" }>,
  { largest, lever, statedFor }: Largest,
  pass: Bounds,
  caution: Bounds,
  sentence: (needed: string, reached: string) => string,
): Reading {
  const judged = {
    evidence,
    pass,
    caution,
    passesIf: () =>
      pass.min === null || pass.min >= 100
        ? null
        : passesIfWithin(lever, { min: volts / (1 - pass.min / 100), max: null }),
    statement: () => sentence(digits(statedFor(volts), 5), digits(statedFor(largest), 5)),
  };
  if (volts < NO_VOLTS && largest < NO_VOLTS) return notApplicable("No voltage is needed and none is there.");
  if (largest < NO_VOLTS) return { kind: "impossible", ...judged };
  return { kind: "value", value: (100 * (largest - volts)) / largest, ...judged };
}

interface Largest {
  readonly largest: number;
  readonly lever: ReturnType<typeof rfLever>;
  /** Canonical volts in the reading of the supply's statement, without its sign. */
  readonly statedFor: (volts: number) => number;
}

function largestOf(
  supply: Supply | undefined,
  axis: Axis,
  pointer: string,
): Largest | { readonly missing: readonly string[] } {
  if (supply === undefined) return { missing: [pointer] };
  if (axis === "rf") {
    const { rfMax } = supply;
    if (rfMax === undefined) return { missing: [`${pointer}/rfMax`] };
    const lever = rfLever(rfMax, `${pointer}/rfMax`);
    return { largest: rfToCanonical(rfMax), lever, statedFor: lever.inputFor };
  }
  const { dcMax } = supply;
  if (dcMax === undefined) return { missing: [`${pointer}/dcMax`] };
  const factor = "volts" in dcMax && dcMax.between === "pole-and-pole" ? 2 : 1;
  return {
    largest: dcToCanonical(dcMax).dcVolts,
    lever: dcLever(dcMax, `${pointer}/dcMax`),
    statedFor: (volts) => volts * factor,
  };
}
