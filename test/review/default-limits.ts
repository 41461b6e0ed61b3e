import { APEX_Q, APEX_RATIO } from "../../services/physics/first-region.ts";
import { mzTimesQPerVolt } from "../../services/physics/mathieu-parameters.ts";
import type { Outcome } from "../../services/review/finding.ts";
import type { SignOffRequest } from "../../services/review/sign-off-schema.ts";
import {
  type CollisionCell,
  dc,
  edges,
  instrument,
  massFilter,
  method,
  oneFilter,
  RODS,
  request,
  rf,
  scan,
  selectedIon,
  stated,
  transition,
  tripleQuadrupole,
} from "./laboratory.ts";

/** A default limit: the outcome on its good side, limit included, and one step beyond; and a request for any value. */
export interface DefaultLimit {
  readonly check: string;
  readonly quantity: string;
  readonly limit: number;
  readonly better: "above" | "below";
  readonly outcomes: readonly [atLimit: Outcome, beyond: Outcome];
  readonly withValue: (value: number) => SignOffRequest;
  /** Whether a request can hit the limit to the last bit; else both sides are tried a billionth away. */
  readonly exact: boolean;
  readonly step?: number;
}

const FIELD = { fieldRadius: RODS.fieldRadius_mm / 1e3, frequency: RODS.frequency_MHz * 1e6 };
const RF_PER_MZ = APEX_Q / mzTimesQPerVolt(FIELD);

/** Both limits of a quantity that must be large, or small. */
function pair(
  check: string,
  quantity: string,
  better: DefaultLimit["better"],
  [pass, caution]: readonly [number, number],
  exact: boolean,
  withValue: DefaultLimit["withValue"],
): DefaultLimit[] {
  const common = { check, quantity, better, exact, withValue };
  return [
    { ...common, limit: pass, outcomes: ["pass", "caution"] },
    { ...common, limit: caution, outcomes: ["caution", "fail"] },
  ];
}

/** Width 10 between the edges at m/z 500: 495 to 505. */
const wide = (mz: number, set = 500) =>
  oneFilter({ operatingPoint: stated(edges(10)) }, selectedIon("A", mz, { setMz: set }));

const drivenAt = (rfVolts: number, dcVolts: number, over: Parameters<typeof oneFilter>[0] = {}) =>
  oneFilter({
    rodSet: RODS,
    operatingPoint: { by: "drives", points: [{ mz: 500, drive: { rf: rf(rfVolts), dc: dc(dcVolts) } }] },
    ...over,
  });

const slope = (margin_ppm: number, ratio_ppm?: number) =>
  oneFilter({
    rodSet: RODS,
    operatingPoint: {
      by: "drive-law",
      rfPerMz: rf(RF_PER_MZ),
      dcSlope: APEX_RATIO * (1 - margin_ppm * 1e-6),
      dcOffset_V: 0,
    },
    ...(ratio_ppm === undefined ? {} : { tolerances: { ratio_ppm } }),
  });

const cell = (over: Partial<CollisionCell>, precursor = 500, product = 120) =>
  request({
    instrument: tripleQuadrupole({ q2: over }),
    method: method([transition("A", precursor, product)]),
  });

/** Volts that give m/z 500 a well of this depth in eV per charge at 0.8 r0: D = 0.64 q V / 4, q = 0.2249 at 200 V. */
const depthVolts = (depth: number) => Math.sqrt((depth * 4 * 500) / (0.64 * mzTimesQPerVolt(FIELD)));

const guided = (cutoffOver: number) =>
  request({
    instrument: instrument(
      { name: "guide", role: "ion-guide", rodSet: RODS, rf: rf(voltsForCutoff(500 / cutoffOver)) },
      massFilter("Q1"),
    ),
    method: method([selectedIon("A", 500)]),
  });
/** The RF-only limit of stability (Dawson 1976), to the digits of the computed table of regions. */
const CUTOFF_Q = 0.908046333734578;
const voltsForCutoff = (mz: number) => (mz * CUTOFF_Q) / mzTimesQPerVolt(FIELD);

const withinPeak = (points: number) =>
  request({
    method: method([transition("A", 500, 200, { dwell_ms: 95 })], {
      chromatographicPeakWidth: { value_s: points / 10, at: "base" },
    }),
  });

/** Every default limit of the catalogue. The figures are the laboratory's common practice that the catalogue states. */
export const DEFAULT_LIMITS: readonly DefaultLimit[] = [
  // 0.15 and 0.30 of a window that is 20 wide.
  ...pair("set-mz", "set-against-ion", "below", [3, 6], true, (value) =>
    oneFilter({ operatingPoint: stated(edges(20)) }, selectedIon("A", 500, { setMz: 500 + value })),
  ),
  // 0.2 of a window that is 10 wide, and its edge.
  ...pair("edge-margin", "distance-to-edge", "above", [2, 0], true, (value) => wide(495 + value)),
  {
    check: "edge-margin",
    quantity: "distance-to-edge",
    limit: 0.1,
    better: "above",
    outcomes: ["pass", "caution"],
    exact: false,
    withValue: (value) =>
      oneFilter({ operatingPoint: stated(edges(0.4)) }, selectedIon("A", 499.8 + value, { setMz: 500 })),
  },
  ...pair("window-width", "width-against-claim", "below", [0.1, 0.2], false, (value) =>
    oneFilter(
      {
        operatingPoint: {
          by: "measured-peaks",
          peaks: [{ setMz: 4, observedMz: 4, width: edges(1 + value) }],
        },
      },
      selectedIon("A", 4, { width: edges(1) }),
    ),
  ),
  {
    check: "apex-margin",
    quantity: "margin-to-apex",
    limit: 50,
    better: "above",
    outcomes: ["pass", "fail"],
    exact: false,
    step: 1e-6,
    withValue: (value) => slope(value),
  },
  {
    check: "apex-margin",
    quantity: "margin-to-apex",
    // Three times a tolerance of 100 ppm.
    limit: 300,
    better: "above",
    outcomes: ["pass", "caution"],
    exact: false,
    step: 1e-6,
    withValue: (value) => slope(value, 100),
  },
  ...pair("supply-headroom", "rf-headroom", "above", [10, 5], true, (value) =>
    drivenAt(1000 - 10 * value, 100, { supply: { rfMax: rf(1000), dcMax: dc(500) } }),
  ),
  ...pair("supply-headroom", "dc-headroom", "above", [10, 5], true, (value) =>
    drivenAt(1200, 200 - 2 * value, { supply: { rfMax: rf(5000), dcMax: dc(200) } }),
  ),
  {
    check: "supply-headroom",
    quantity: "rated-range",
    limit: 0,
    better: "above",
    outcomes: ["pass", "fail"],
    exact: true,
    withValue: (value) => oneFilter({ rated: { mzLow: 5, mzHigh: 500 + value } }),
  },
  ...pair("voltage-convention", "apex-over-target", "above", [0.95, 0.9], false, (value) =>
    drivenAt(RF_PER_MZ * 500 * value, 100),
  ),
  ...pair("voltage-convention", "apex-over-target", "below", [1.05, 1.1], false, (value) =>
    drivenAt(RF_PER_MZ * 500 * value, 100),
  ),
  // R 500 at m/z 500 and width 1.
  ...pair("rf-cycles", "cycles-squared-over-resolution", "above", [20, 12.25], false, (value) =>
    oneFilter({ operatingPoint: stated(edges(1)), residence: { rfCycles: Math.sqrt(500 * value) } }),
  ),
  ...pair("scan-shift", "shift-over-width", "below", [0.35, 1], false, (value) =>
    oneFilter(
      { operatingPoint: stated(edges(1)), residence: { flightTime_us: 100 } },
      scan(1, 100, { rate_mzPerS: value * 1e4 }),
    ),
  ),
  ...pair("product-above-cutoff", "product-over-cutoff", "above", [1.2, 1.05], false, (value) =>
    cell({ rf: { mode: "cutoff", mz: 120 / value } }),
  ),
  ...pair("product-above-cutoff", "ion-over-cutoff", "above", [1.2, 1.05], false, guided),
  ...pair("precursor-q-in-cell", "precursor-q", "below", [0.7, 0.85], false, (value) =>
    cell({ rf: { mode: "precursor-q", q: value } }, 500, 490),
  ),
  {
    check: "precursor-q-in-cell",
    quantity: "precursor-q",
    limit: 0.02,
    better: "above",
    outcomes: ["pass", "caution"],
    exact: false,
    withValue: (value) => cell({ rf: { mode: "precursor-q", q: value } }),
  },
  ...(["precursor", "product"] as const).flatMap((which) =>
    pair("cell-well-depth", `${which}-depth-over-energy`, "above", [3, 1], false, (value) =>
      cell(
        { rodSet: RODS, rf: { mode: "fixed", rf: rf(depthVolts(value)) }, maxRadialEnergy_eVPerCharge: 1 },
        500,
        500,
      ),
    ),
  ),
  ...pair("dwell-time", "dwell", "above", [5, 1], true, (value) =>
    oneFilter({}, selectedIon("A", 500, { dwell_ms: value })),
  ),
  ...pair("dwell-time", "counts", "above", [100, 25], true, (value) =>
    oneFilter({}, selectedIon("A", 500, { dwell_ms: value, countRate_perS: 1000 })),
  ),
  {
    check: "pause-time",
    quantity: "pause-over-needed",
    limit: 1,
    better: "above",
    outcomes: ["pass", "fail"],
    exact: true,
    withValue: (value) =>
      oneFilter(
        { settle_ms: 3, residence: { flightTime_us: 1000 } },
        selectedIon("A", 500, { pause_ms: 4 * value }),
      ),
  },
  ...pair("points-across-peak", "points", "above", [10, 7], true, withinPeak),
];
