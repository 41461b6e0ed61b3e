import { passbandOf } from "../../physics/passband.ts";
import { setPointOf } from "../../physics/set-point.ts";
import type { Capability } from "./capability.ts";
import { COMPUTED_AT_50_DIGITS } from "./sources.ts";

/** Resolutions from 1.6 to 1500. */
const WINDOWS: readonly (readonly [
  fieldRadius: number,
  frequency: number,
  dcVolts: number,
  rfVolts: number,
  mzLow: number,
  mzHigh: number,
  mzCentre: number,
  mzWidth: number,
])[] = [
  [
    0.007, 1500000.0, 16.7200906, 167.200906, 19.09609319241332, 36.41735648941388, 27.756724840913602,
    17.321263297000563,
  ],
  [
    0.005, 3000000.0, 63.6955831, 454.968451, 26.955353424127516, 34.09344368221075, 30.52439855316913,
    7.138090258083231,
  ],
  [
    0.002, 2500000.0, 511.298781, 3298.70181, 1795.626316913147, 1993.4453835342763, 1894.5358502237118,
    197.81906662112922,
  ],
  [
    0.002, 650000.0, 12.9055809, 80.1971445, 650.9986965970003, 688.1986211128398, 669.59865885492,
    37.1999245158394,
  ],
  [
    0.004, 650000.0, 36.8263159, 223.590273, 456.07050505904846, 467.61659298601495, 461.8435490225317,
    11.546087926966488,
  ],
  [
    0.002, 650000.0, 27.5667685, 165.483653, 1353.605792682864, 1367.2098687303862, 1360.407830706625,
    13.604076047522309,
  ],
  [
    0.007, 500000.0, 4.82240021, 28.8399446, 32.572382505213305, 32.735652580586574, 32.65401754289994,
    0.1632700753732696,
  ],
  [
    0.007, 500000.0, 45.9140294, 274.06794, 309.6686853869916, 310.4438256059784, 310.05625549648505,
    0.7751402189867667,
  ],
  [
    0.0025, 800000.0, 86.8204171, 517.826315, 1792.1656861612407, 1794.7277521010465, 1793.4467191311437,
    2.5620659398056524,
  ],
  [
    0.005, 3000000.0, 16.3554125, 97.4932395, 5.999321465660742, 6.003322349000529, 6.001321907330635,
    0.004000883339786304,
  ],
];

export const MASS_FILTER_CHECKS: readonly Capability[] = [
  {
    capability: "edges of the passband of a drive",
    source: COMPUTED_AT_50_DIGITS,
    kind: "relative",
    limit: 1e-12,
    values: () =>
      WINDOWS.flatMap(([fieldRadius, frequency, dcVolts, rfVolts, mzLow, mzHigh]) => {
        const found = passbandOf(dcVolts, rfVolts, { fieldRadius, frequency });
        const passband = found.kind === "window" ? found.passband : null;
        const at = `U ${dcVolts} V, V ${rfVolts} V, ${frequency} Hz, ${fieldRadius} m`;
        return [
          { at: `low m/z at ${at}`, reference: mzLow, computed: passband?.mzLow ?? null },
          { at: `high m/z at ${at}`, reference: mzHigh, computed: passband?.mzHigh ?? null },
        ];
      }),
  },
  {
    capability: "width of the passband of a drive",
    source: COMPUTED_AT_50_DIGITS,
    kind: "relative",
    limit: 1e-10,
    values: () =>
      WINDOWS.map(([fieldRadius, frequency, dcVolts, rfVolts, , , , mzWidth]) => {
        const found = passbandOf(dcVolts, rfVolts, { fieldRadius, frequency });
        return {
          at: `U ${dcVolts} V, V ${rfVolts} V`,
          reference: mzWidth,
          computed: found.kind === "window" ? found.passband.mzWidth : null,
        };
      }),
  },
  {
    capability: "voltages that centre a window of a wanted width",
    source: COMPUTED_AT_50_DIGITS,
    kind: "relative",
    limit: 1e-12,
    values: () =>
      WINDOWS.flatMap(([fieldRadius, frequency, dcVolts, rfVolts, , , mzCentre, mzWidth]) => {
        const found = setPointOf(mzCentre, mzWidth, { fieldRadius, frequency });
        const drive = found.kind === "set-point" ? found : null;
        return [
          { at: `U for m/z ${mzCentre}`, reference: dcVolts, computed: drive?.dcVolts ?? null },
          { at: `V for m/z ${mzCentre}`, reference: rfVolts, computed: drive?.rfVolts ?? null },
        ];
      }),
  },
];
