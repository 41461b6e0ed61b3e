import {
  type Case,
  type CollisionCell,
  instrument,
  massFilter,
  method,
  oneFilter,
  RODS,
  request,
  rf,
  scan,
  selectedIon,
  transition,
  tripleQuadrupole,
} from "./laboratory.ts";
import type { QuantityOutcomes } from "./quantity-outcomes.ts";

const single = (over: Parameters<typeof selectedIon>[2], stage: Parameters<typeof oneFilter>[0] = {}) =>
  oneFilter(stage, selectedIon("A", 500, over));
const cell = (q2: Partial<CollisionCell>, precursor = 500, product = 200) =>
  request({
    instrument: tripleQuadrupole({ q2 }),
    method: method([transition("A", precursor, product)]),
  });
const guide = (volts: number | null, polePairs = 2, ion = 500) =>
  request({
    instrument: instrument(
      {
        name: "guide",
        role: "ion-guide",
        rodSet: { ...RODS, polePairs },
        ...(volts === null ? {} : { rf: rf(volts) }),
      },
      massFilter("Q1"),
    ),
    method: method([selectedIon("A", ion)]),
  });
const scanned: Case = { instrument: instrument(massFilter("Q1")), method: method([scan(10, 100)]) };
const deep = (volts: number, energy: number) =>
  cell({ rodSet: RODS, rf: { mode: "fixed", rf: rf(volts) }, maxRadialEnergy_eVPerCharge: energy }, 500, 400);
const timed = (over: Parameters<typeof selectedIon>[2], settle_ms = 1, flightTime_us = 1000) =>
  single(over, { settle_ms, residence: { flightTime_us } });
const pointsOf = (value_s: number | null, dwell_ms = 95) =>
  request({
    method: method(
      [transition("A", 500, 200, { dwell_ms, pause_ms: dwell_ms === 0 ? 0 : 5 })],
      value_s === null ? {} : { chromatographicPeakWidth: { value_s, at: "base" } },
    ),
  });

const depth = (quantity: string): QuantityOutcomes => ({
  check: "cell-well-depth",
  quantity,
  requests: {
    pass: deep(100, 0.1),
    caution: deep(100, 1),
    fail: deep(100, 3),
    indeterminate: cell({}),
    "not-applicable": deep(300, 1),
  },
});

export const OUTCOMES_IN_CELL_AND_TIME: readonly QuantityOutcomes[] = [
  {
    check: "product-above-cutoff",
    quantity: "product-over-cutoff",
    requests: {
      pass: cell({ rf: { mode: "cutoff", mz: 60 } }),
      caution: cell({ rf: { mode: "cutoff", mz: 180 } }),
      fail: cell({ rf: { mode: "cutoff", mz: 210 } }),
      indeterminate: cell({ rf: { mode: "fixed", rf: rf(100) } }),
      "not-applicable": cell({ rf: { mode: "fixed", rf: rf(100) }, rodSet: { ...RODS, polePairs: 3 } }),
    },
  },
  {
    check: "product-above-cutoff",
    quantity: "ion-over-cutoff",
    requests: {
      pass: guide(100),
      caution: guide(100, 2, 70),
      fail: guide(0),
      indeterminate: guide(null),
      "not-applicable": guide(100, 4),
    },
  },
  {
    check: "precursor-q-in-cell",
    quantity: "precursor-q",
    requests: {
      pass: cell({ rf: { mode: "precursor-q", q: 0.25 } }),
      caution: cell({ rf: { mode: "precursor-q", q: 0.8 } }),
      fail: cell({ rf: { mode: "precursor-q", q: 0.91 } }),
      indeterminate: cell({ rf: { mode: "table", points: [{ mz: 100, cutoffMz: 30 }] } }),
      "not-applicable": cell({ rf: { mode: "fixed", rf: rf(100) }, rodSet: { ...RODS, polePairs: 4 } }),
    },
  },
  depth("precursor-depth-over-energy"),
  depth("product-depth-over-energy"),
  {
    check: "dwell-time",
    quantity: "dwell",
    requests: {
      pass: single({}),
      caution: single({ dwell_ms: 2 }),
      fail: single({ dwell_ms: 0.5 }),
      indeterminate: oneFilter({}, { id: "A", kind: "selected-ion", stage: "Q1", ion: { mz: 500 } }),
      "not-applicable": request(scanned),
    },
  },
  {
    check: "dwell-time",
    quantity: "counts",
    requests: {
      pass: single({ countRate_perS: 1e5 }),
      caution: single({ countRate_perS: 5e3 }),
      fail: single({ countRate_perS: 0 }),
      indeterminate: oneFilter(
        {},
        {
          id: "A",
          kind: "selected-ion",
          stage: "Q1",
          ion: { mz: 500 },
          countRate_perS: 1e4,
        },
      ),
    },
    never: { "not-applicable": "where nothing is counted the finding is about the dwell time" },
  },
  {
    check: "pause-time",
    quantity: "pause-over-needed",
    requests: {
      pass: timed({}),
      fail: timed({ pause_ms: 1.5 }),
      indeterminate: single({}),
    },
    never: {
      caution: "cross-talk is there or not: the default limits of pass and caution are one",
      "not-applicable": "every acquisition is stepped to, and no flight takes no time",
    },
  },
  {
    check: "points-across-peak",
    quantity: "points",
    requests: {
      pass: pointsOf(1.2),
      caution: pointsOf(0.8),
      fail: pointsOf(0.5),
      indeterminate: pointsOf(null),
      "not-applicable": pointsOf(6, 0),
    },
  },
  {
    check: "peak-tails",
    quantity: "abundance-sensitivity",
    requests: { "not-applicable": single({}) },
    never: {
      pass: "a stability model has no tails",
      caution: "a stability model has no tails",
      fail: "a stability model has no tails",
      indeterminate: "no input would help",
    },
  },
];
