import { Residence, rfCyclesOf } from "../../contract/residence.ts";
import { defineCheck } from "../check.ts";
import type { Bounds } from "../finding.ts";
import { type Lever, leverOn, passesIfWithin } from "../lever.ts";
import { boundsOf, LowerLimit } from "../limit.ts";
import { lacking, notApplicable, type Reading } from "../observation.ts";
import type { Filtering } from "../resolve/resolved-method.ts";
import { centreOf, heightNote, standsForEdges, widthOf } from "../resolve/window.ts";
import { digits } from "../statement.ts";
import { settingsAt, worstOfStage } from "./worst-of-stage.ts";

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
  examine: (method, limits) => {
    const pass = boundsOf(limits.pass);
    const caution = boundsOf(limits.caution);
    return method.filters.map((filter) =>
      worstOfStage(
        {
          quantity: "cycles-squared-over-resolution",
          unit: "1",
          subject: { pointer: filter.pointer, stage: filter.stage.name },
        },
        settingsAt(method, filter),
        `The method selects nothing in ${filter.stage.name}.`,
        (setting) => cyclesSquaredOverResolution(setting, pass, caution),
      ),
    );
  },
});

function cyclesSquaredOverResolution(setting: Filtering, pass: Bounds, caution: Bounds): Reading {
  const { window, filter, mz, setMz } = setting;
  if (window.kind === "no-window") return notApplicable(window.reason);
  const cycles = cyclesOf(setting);
  const missing = [
    ...cycles.missing,
    ...(window.kind === "unknown" ? window.missing : []),
    ...(window.kind === "window" && !standsForEdges(window, "narrow") ? [window.widthPointer] : []),
  ];
  if (window.kind === "unknown" || cycles.value === null || missing.length > 0) {
    return lacking(`What the RF cycles in ${filter.stage.name} can resolve`, missing);
  }
  const resolution = centreOf(window) / widthOf(window);
  const value = (cycles.value * cycles.value) / resolution;
  const seen = cycles.value;
  return {
    kind: "value",
    value,
    evidence: window.evidence === "stated" ? "stated" : "computed",
    pass,
    caution,
    passesIf: () =>
      pass.min === null
        ? null
        : passesIfWithin(cyclesLever(setting), { min: Math.sqrt(pass.min * resolution), max: null }),
    statement: () =>
      `${filter.stage.name}: ${digits(seen, 4)} RF cycles of m/z ${mz} give N^2/R ${digits(value, 3)} at set m/z ${setMz}, the lowest of the method.` +
      heightNote(window),
  };
}

interface Cycles {
  readonly value: number | null;
  readonly missing: readonly string[];
}

function cyclesOf({ filter: { stage, pointer }, mz }: Filtering): Cycles {
  const { residence, rodSet } = stage;
  if (residence !== undefined && "rfCycles" in residence) return { value: residence.rfCycles, missing: [] };
  if (residence === undefined || rodSet === undefined) {
    const missing = [
      ...(residence === undefined ? [`${pointer}/residence`] : []),
      ...(rodSet === undefined ? [`${pointer}/rodSet`] : []),
    ];
    return { value: null, missing };
  }
  const value = rfCyclesOf(residence, rodSet, mz);
  return { value, missing: value === null ? [`${pointer}/rodSet/rodLength_mm`] : [] };
}

const [ByEnergy, ByTime, ByCycles] = Residence.options;

/** The stated residence as the lever of the number of cycles; a slower ion stays for more of them. */
function cyclesLever(setting: Filtering): Lever | null {
  const { stage, pointer } = setting.filter;
  const { residence } = stage;
  const cycles = cyclesOf(setting).value;
  if (residence === undefined || cycles === null || cycles === 0) return null;
  const input = `${pointer}/residence`;
  if ("rfCycles" in residence) return leverOn(`${input}/rfCycles`, "1", ByCycles.shape.rfCycles);
  if ("flightTime_us" in residence) {
    const lever = leverOn(`${input}/flightTime_us`, "us", ByTime.shape.flightTime_us);
    return { ...lever, inputFor: (wanted) => (residence.flightTime_us * wanted) / cycles };
  }
  const energy = residence.axialEnergy_eVPerCharge;
  return {
    ...leverOn(`${input}/axialEnergy_eVPerCharge`, "eV", ByEnergy.shape.axialEnergy_eVPerCharge),
    falling: true,
    inputFor: (wanted) => (energy * cycles * cycles) / (wanted * wanted),
  };
}
