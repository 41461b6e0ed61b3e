import {
  type Case,
  dc,
  edges,
  halfHeight,
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
  tenthHeight,
} from "./laboratory.ts";
import type { QuantityOutcomes } from "./quantity-outcomes.ts";

const driven = (rfVolts: number, dcVolts: number, over: Parameters<typeof oneFilter>[0] = {}) =>
  oneFilter({
    rodSet: RODS,
    operatingPoint: { by: "drives", points: [{ mz: 500, drive: { rf: rf(rfVolts), dc: dc(dcVolts) } }] },
    ...over,
  });
/** 628 V and 105 V hold m/z 500 near the apex at r0 4.17 mm and 1 MHz (the handbooks' 1255.8 V and 210.8 V at 1000). */
const ON_TARGET = [627.9, 104.9] as const;
const single = (over: Parameters<typeof selectedIon>[2], stage: Parameters<typeof oneFilter>[0] = {}) =>
  oneFilter(stage, selectedIon("A", 500, over));
const scanned: Case = { instrument: instrument(massFilter("Q1")), method: method([scan(10, 100)]) };
const scannedAt = (rate_mzPerS: number) =>
  oneFilter(
    { operatingPoint: stated(edges(1)), residence: { flightTime_us: 100 } },
    scan(10, 100, { rate_mzPerS }),
  );
const peak = (width: ReturnType<typeof edges> | ReturnType<typeof tenthHeight>) => ({
  operatingPoint: { by: "measured-peaks" as const, peaks: [{ setMz: 500, observedMz: 500, width }] },
});
const noOperatingVolts = {
  operatingPoint: { by: "drives" as const, points: [{ mz: 500, drive: { rf: rf(600) } }] },
};
const rated = (mzHigh: number) => oneFilter({ rated: { mzLow: 5, mzHigh } });
const residence = (rfCycles: number) => ({ operatingPoint: stated(edges(1)), residence: { rfCycles } });

export const OUTCOMES_IN_FILTERS: readonly QuantityOutcomes[] = [
  {
    check: "set-mz",
    quantity: "set-against-ion",
    requests: {
      pass: single({ setMz: 500.1 }),
      caution: single({ setMz: 500.15 }),
      fail: single({ setMz: 500.6 }),
      indeterminate: single({ setMz: 500.1 }, peak(tenthHeight(0.9))),
      "not-applicable": single({}),
    },
  },
  {
    check: "edge-margin",
    quantity: "distance-to-edge",
    requests: {
      pass: single({}),
      caution: single({ setMz: 500.3 }),
      fail: single({ setMz: 500.6 }),
      indeterminate: single({}, noOperatingVolts),
    },
    never: { "not-applicable": "a method that scans has no ion to judge, and then there is no finding" },
  },
  {
    check: "window-width",
    quantity: "width-against-claim",
    requests: {
      pass: single({ width: halfHeight(0.7) }),
      caution: single({ width: halfHeight(0.85) }),
      fail: single({ width: halfHeight(1) }),
      indeterminate: single({ width: edges(0.7) }),
      "not-applicable": single({}),
    },
  },
  {
    check: "apex-margin",
    quantity: "margin-to-apex",
    requests: {
      pass: single({}),
      caution: single({}, { tolerances: { ratio_ppm: 1000 } }),
      fail: driven(600, 110),
      indeterminate: single({}, noOperatingVolts),
      "not-applicable": driven(0, 0),
    },
  },
  {
    check: "supply-headroom",
    quantity: "rf-headroom",
    requests: {
      pass: driven(...ON_TARGET, { supply: { rfMax: rf(1000), dcMax: dc(200) } }),
      caution: driven(...ON_TARGET, { supply: { rfMax: rf(680), dcMax: dc(200) } }),
      fail: driven(...ON_TARGET, { supply: { rfMax: rf(600), dcMax: dc(200) } }),
      indeterminate: single({}),
      "not-applicable": request({
        instrument: instrument(massFilter("Q1"), massFilter("Q3")),
        method: method([selectedIon("A", 500)]),
      }),
    },
  },
  {
    check: "supply-headroom",
    quantity: "dc-headroom",
    requests: {
      pass: driven(...ON_TARGET, { supply: { rfMax: rf(1000), dcMax: dc(200) } }),
      caution: driven(...ON_TARGET, { supply: { rfMax: rf(1000), dcMax: dc(113) } }),
      fail: driven(...ON_TARGET, { supply: { rfMax: rf(1000), dcMax: dc(100) } }),
      indeterminate: driven(...ON_TARGET, { supply: { rfMax: rf(1000) } }),
      "not-applicable": request({
        instrument: instrument(massFilter("Q1"), massFilter("Q3")),
        method: method([selectedIon("A", 500)]),
      }),
    },
  },
  {
    check: "supply-headroom",
    quantity: "rated-range",
    requests: {
      pass: rated(1000),
      fail: rated(400),
      "not-applicable": request({
        instrument: instrument(massFilter("Q1"), massFilter("Q3", { rated: { mzLow: 5, mzHigh: 1000 } })),
        method: method([selectedIon("A", 500)]),
      }),
    },
    never: {
      caution: "a guaranteed range has no caution",
      indeterminate: "set m/z and range are always known where a range is rated",
    },
  },
  {
    check: "voltage-convention",
    quantity: "apex-over-target",
    requests: {
      pass: driven(...ON_TARGET),
      caution: driven(627.9 * 1.08, 104.9),
      fail: driven(2 * 627.9, 209.8),
      indeterminate: single(
        {},
        {
          operatingPoint: { by: "drive-law", rfPerMz: rf(1.25), dcSlope: 0.167, dcOffset_V: 0 },
        },
      ),
      "not-applicable": single({}),
    },
  },
  {
    check: "rf-cycles",
    quantity: "cycles-squared-over-resolution",
    requests: {
      pass: single({}, residence(110)),
      caution: single({}, residence(90)),
      fail: single({}, residence(70)),
      indeterminate: single({}),
      "not-applicable": driven(600, 110, { residence: { rfCycles: 100 } }),
    },
  },
  {
    check: "scan-shift",
    quantity: "shift-over-width",
    requests: {
      pass: scannedAt(1000),
      caution: scannedAt(5000),
      fail: scannedAt(20_000),
      indeterminate: request(scanned),
      "not-applicable": single({}),
    },
  },
];
