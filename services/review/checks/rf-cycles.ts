import { rfCyclesOf } from "../../contract/residence.ts";
import { defineCheck } from "../check.ts";
import type { PassesIf } from "../finding.ts";
import type { MassFilterStage } from "../instrument.ts";
import { boundsOf, LowerLimit } from "../limit.ts";
import type { Observation } from "../observation.ts";
import type { Filtering, Placed, ResolvedMethod } from "../resolve/resolved-method.ts";
import { centreOf, heightNote, standsForEdges, widthOf } from "../resolve/window.ts";
import { digits } from "../statement.ts";

export const rfCycles = defineCheck({
  id: "rf-cycles",
  computes:
    "RF cycles N in the field, squared, over the resolution R of the window: the fewest that the method meets in a stage.",
  needs: ["stages/residence", "stages/rodSet", "stages/operatingPoint"],
  quantities: [
    { quantity: "cycles-squared-over-resolution", unit: "1", meaning: "N^2/R, the worst of a stage" },
  ],
  requiredByDefault: true,
  limit: LowerLimit,
  defaults: { pass: { min: 20 }, caution: { min: 12.25 } },
  basis:
    "N^2 = hR with h = 20 (Austin, Holme and Leck in Dawson 1976, from memory) and h = 12.25 (Paul, Reinhard and von Zahn 1958, from memory); default limits, common practice.",
  examine: (method, limits) =>
    method.filters.map((filter) =>
      worstOfStage(method, filter, boundsOf(limits.pass), boundsOf(limits.caution)),
    ),
});

type Bounds = ReturnType<typeof boundsOf>;

function worstOfStage(
  method: ResolvedMethod,
  filter: Placed<MassFilterStage>,
  pass: Bounds,
  caution: Bounds,
): Observation {
  const { stage, pointer } = filter;
  const about = {
    quantity: "cycles-squared-over-resolution",
    unit: "1",
    subject: { pointer, stage: stage.name },
  };
  const settings = method.acquisitions.flatMap(({ filterings }) =>
    filterings.filter((each) => each.filter === filter),
  );
  if (settings.length === 0) {
    return { ...about, kind: "not-applicable", statement: `The method selects nothing in ${stage.name}.` };
  }
  const missing = new Set<string>();
  let worst: { readonly value: number; readonly cycles: number; readonly at: Filtering } | null = null;
  for (const setting of settings) {
    const cycles = cyclesOf(filter, setting.mz, missing);
    const resolution = resolutionOf(setting, missing);
    if (cycles === null || resolution === null) continue;
    const value = (cycles * cycles) / resolution;
    if (worst === null || value < worst.value) worst = { value, cycles, at: setting };
  }
  if (worst === null || missing.size > 0) {
    return {
      ...about,
      kind: "indeterminate",
      missing: [...missing],
      statement: `RF cycles of ${stage.name} against its resolution cannot be judged without ${[...missing].join(", ")}.`,
    };
  }
  const { window } = worst.at;
  return {
    ...about,
    kind: "value",
    subject: { ...about.subject, acquisition: worst.at.acquisition.id, ion: worst.at.ion },
    value: worst.value,
    evidence: window.kind === "window" && window.evidence === "stated" ? "stated" : "computed",
    pass,
    caution,
    passesIf: passesIfLonger(filter, worst.value, pass.min),
    statement:
      `${stage.name}: ${digits(worst.cycles, 4)} RF cycles at m/z ${worst.at.setMz} give N^2/R ${digits(worst.value, 3)}, the lowest of the method.` +
      (window.kind === "window" ? heightNote(window) : ""),
  };
}

function cyclesOf(filter: Placed<MassFilterStage>, mz: number, missing: Set<string>): number | null {
  const { residence, rodSet } = filter.stage;
  if (residence === undefined) missing.add(`${filter.pointer}/residence`);
  if (residence !== undefined && "rfCycles" in residence) return residence.rfCycles;
  if (rodSet === undefined) missing.add(`${filter.pointer}/rodSet`);
  if (residence === undefined || rodSet === undefined) return null;
  const cycles = rfCyclesOf(residence, rodSet, mz);
  if (cycles === null) missing.add(`${filter.pointer}/rodSet/rodLength_mm`);
  return cycles;
}

function resolutionOf({ window }: Filtering, missing: Set<string>): number | null {
  if (window.kind === "unknown") for (const input of window.missing) missing.add(input);
  if (window.kind !== "window") return null;
  if (!standsForEdges(window, "narrow")) {
    missing.add(window.widthPointer);
    return null;
  }
  return centreOf(window) / widthOf(window);
}

function passesIfLonger(filter: Placed<MassFilterStage>, value: number, min: number | null): PassesIf | null {
  const { residence } = filter.stage;
  if (residence === undefined || min === null || value <= 0) return null;
  const input = `${filter.pointer}/residence`;
  const longer = Math.sqrt(min / value);
  if ("rfCycles" in residence) {
    return { input: `${input}/rfCycles`, min: residence.rfCycles * longer, max: null, unit: "1" };
  }
  if ("flightTime_us" in residence) {
    return { input: `${input}/flightTime_us`, min: residence.flightTime_us * longer, max: null, unit: "us" };
  }
  return {
    input: `${input}/axialEnergy_eVPerCharge`,
    min: null,
    max: (residence.axialEnergy_eVPerCharge * value) / min,
    unit: "eV",
  };
}
