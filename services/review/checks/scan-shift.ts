import { microsecondsFromSeconds } from "../../contract/si.ts";
import { scanLossOf } from "../../physics/transit.ts";
import { ScanRate_mzPerS } from "../acquisition.ts";
import { defineCheck } from "../check.ts";
import type { Bounds } from "../finding.ts";
import { leverOn, passesIfWithin } from "../lever.ts";
import { boundsOf, UpperLimit } from "../limit.ts";
import { lacking, notApplicable, type Observation, type Reading } from "../observation.ts";
import { flightThrough } from "../resolve/flight.ts";
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
    const observations = method.acquisitions.flatMap((each) => {
      const { acquisition, pointer } = each;
      if (!("rate_mzPerS" in acquisition)) return [];
      const scan: ScanRate = { rate: acquisition.rate_mzPerS, pointer: `${pointer}/rate_mzPerS` };
      return upperEnds(each).map(
        (setting): Observation => ({
          quantity: "shift-over-width",
          unit: "1",
          subject: {
            pointer: setting.pointer,
            acquisition: acquisition.id,
            stage: setting.filter.stage.name,
            ion: setting.ion,
          },
          ...shiftOverWidth(setting, scan, boundsOf(limits.pass), boundsOf(limits.caution)),
        }),
      );
    });
    if (observations.length > 0) return observations;
    const subject = { pointer: "/method/acquisition" };
    return [
      { quantity: "shift-over-width", unit: "1", subject, ...notApplicable("The method does not scan.") },
    ];
  },
});

interface ScanRate {
  readonly rate: number;
  readonly pointer: string;
}

/** The heaviest ion of a scan flies longest, so a scan is judged at its upper end, in each filter that scans. */
function upperEnds({ filterings }: ResolvedAcquisition): Filtering[] {
  const heaviest = new Map<string, Filtering>();
  for (const setting of filterings) {
    if (setting.target !== "scan-end") continue;
    const known = heaviest.get(setting.filter.pointer);
    if (known === undefined || setting.mz > known.mz) heaviest.set(setting.filter.pointer, setting);
  }
  return [...heaviest.values()];
}

function shiftOverWidth(
  setting: Filtering,
  { rate, pointer }: ScanRate,
  pass: Bounds,
  caution: Bounds,
): Reading {
  const { filter, window, mz } = setting;
  const { name } = filter.stage;
  if (window.kind === "no-window")
    return notApplicable(`${name} has no window that could move: ${window.reason}`);
  const flight = flightThrough(filter.stage, filter.pointer, mz);
  const missing = [
    ...flight.missing,
    ...(window.kind === "unknown" ? window.missing : []),
    ...(window.kind === "window" && !standsForEdges(window, "narrow") ? [window.widthPointer] : []),
  ];
  if (window.kind === "unknown" || flight.time === null || missing.length > 0) {
    return lacking(`The shift during the flight through ${name}`, missing);
  }
  const { time } = flight;
  const value = (rate * time) / widthOf(window);
  const loss = scanLossOf(value);
  return {
    kind: "value",
    value,
    evidence: window.evidence === "stated" ? "stated" : "computed",
    pass,
    caution,
    passesIf: () =>
      pass.max === null
        ? null
        : passesIfWithin(leverOn(pointer, "s-1", ScanRate_mzPerS), {
            min: null,
            max: (pass.max * widthOf(window)) / time,
          }),
    statement:
      `At ${rate} m/z per s the window of ${name} moves by ${digits(value, 3)} of its width while m/z ${mz} flies through in ${digits(microsecondsFromSeconds(time), 4)} us.` +
      (loss === null ? "" : ` A shift like this lowers the peak by about ${digits(100 * loss, 2)} %.`) +
      " The position holds only where m/z was calibrated at this rate." +
      heightNote(window),
  };
}
