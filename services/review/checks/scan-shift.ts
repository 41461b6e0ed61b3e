import { flightTimeOf } from "../../contract/residence.ts";
import { scanLossOf } from "../../physics/transit.ts";
import { defineCheck } from "../check.ts";
import type { Bounds } from "../finding.ts";
import { boundsOf, UpperLimit } from "../limit.ts";
import type { Observation } from "../observation.ts";
import type { Filtering, ResolvedAcquisition } from "../resolve/resolved-method.ts";
import { heightNote, standsForEdges, widthOf } from "../resolve/window.ts";
import { digits } from "../statement.ts";

export const scanShift = defineCheck({
  id: "scan-shift",
  computes: "How far the window of a scan moves while an ion is in the field, over the window's width.",
  needs: ["acquisition/rate_mzPerS", "stages/residence", "stages/rodSet", "stages/operatingPoint"],
  quantities: [
    { quantity: "shift-over-width", unit: "1", meaning: "scan rate times flight time, over the width" },
  ],
  requiredByDefault: false,
  limit: UpperLimit,
  defaults: { pass: { max: 0.35 }, caution: { max: 1 } },
  basis:
    "A shift of 0.33 of the width costs about 11 % of the peak height, one of 1.0 about 40 to 47 % (computed for 228 RF cycles); the limits are common practice, no source.",
  examine: (method, limits) => {
    const observations = method.acquisitions.flatMap((each) =>
      scanEnds(each).map((setting) =>
        shiftOverWidth(setting, boundsOf(limits.pass), boundsOf(limits.caution)),
      ),
    );
    if (observations.length > 0) return observations;
    return [
      {
        kind: "not-applicable",
        quantity: "shift-over-width",
        unit: "1",
        subject: { pointer: "/method/acquisition" },
        statement: "The method does not scan.",
      },
    ];
  },
});

/** The heaviest ion of a scan flies longest, so the scan is judged at its upper end; width and rate are the scan's. */
function scanEnds({ filterings }: ResolvedAcquisition): Filtering[] {
  const heaviest = new Map<unknown, Filtering>();
  for (const setting of filterings) {
    if (setting.target !== "scan-end") continue;
    const known = heaviest.get(setting.filter);
    if (known === undefined || setting.mz > known.mz) heaviest.set(setting.filter, setting);
  }
  return [...heaviest.values()];
}

function shiftOverWidth(setting: Filtering, pass: Bounds, caution: Bounds): Observation {
  const { acquisition, filter, window } = setting;
  const { stage } = filter;
  const about = {
    quantity: "shift-over-width",
    unit: "1",
    subject: { pointer: setting.pointer, acquisition: acquisition.id, stage: stage.name, ion: setting.ion },
  };
  const rate = "rate_mzPerS" in acquisition ? acquisition.rate_mzPerS : 0;
  const flight = flightOf(setting);
  const missing = [
    ...flight.missing,
    ...(window.kind === "unknown" ? window.missing : []),
    ...(window.kind === "window" && !standsForEdges(window, "narrow") ? [window.widthPointer] : []),
  ];
  if (window.kind === "empty") {
    return {
      ...about,
      kind: "impossible",
      evidence: window.evidence,
      pass,
      caution,
      passesIf: null,
      statement: window.reason,
    };
  }
  if (window.kind === "unknown" || flight.time === null || missing.length > 0) {
    return {
      ...about,
      kind: "indeterminate",
      missing,
      statement: `The shift during the flight through ${stage.name} does not follow without ${missing.join(", ")}.`,
    };
  }
  const value = (rate * flight.time) / widthOf(window);
  const loss = scanLossOf(value);
  return {
    ...about,
    kind: "value",
    value,
    evidence: window.evidence === "stated" ? "stated" : "computed",
    pass,
    caution,
    passesIf:
      pass.max === null || value === 0
        ? null
        : {
            input: `/method/acquisition/${setting.pointer.split("/")[3]}/rate_mzPerS`,
            min: null,
            max: (rate * pass.max) / value,
            unit: "s-1",
          },
    statement:
      `At ${rate} m/z per s the window of ${stage.name} moves by ${digits(value, 3)} of its width while m/z ${setting.mz} flies through in ${digits(flight.time * 1e6, 4)} us.` +
      (loss === null ? "" : ` A shift like this lowers the peak by about ${digits(100 * loss, 2)} %.`) +
      " The position holds only where m/z was calibrated at this rate." +
      heightNote(window),
  };
}

function flightOf({ filter, mz }: Filtering): {
  readonly time: number | null;
  readonly missing: readonly string[];
} {
  const { residence, rodSet } = filter.stage;
  if (residence === undefined) return { time: null, missing: [`${filter.pointer}/residence`] };
  if ("flightTime_us" in residence) return { time: residence.flightTime_us * 1e-6, missing: [] };
  if (rodSet === undefined) return { time: null, missing: [`${filter.pointer}/rodSet`] };
  const time = flightTimeOf(residence, rodSet, mz);
  return { time, missing: time === null ? [`${filter.pointer}/rodSet/rodLength_mm`] : [] };
}
