import fc from "fast-check";
import { APEX_RATIO } from "../../services/physics/first-region.ts";
import type { Acquisition } from "../../services/review/acquisition.ts";
import type { CellRf, MassFilterStage, OperatingPoint } from "../../services/review/instrument.ts";
import type { Method } from "../../services/review/method.ts";
import type { SignOffRequest } from "../../services/review/sign-off-schema.ts";

/*
 * Legal requests of every shape: some as a laboratory has them, some far from any; every optional member may be missing.
 */

const number = (min: number, max: number) => fc.double({ min, max, noNaN: true, noDefaultInfinity: true });
/** Numbers as people write them: few digits, over decades. */
const decimal = (min: number, max: number) =>
  number(Math.log(min), Math.log(max)).map((log) => {
    const value = Number(Math.exp(log).toPrecision(4));
    return Math.min(Math.max(value, min), max);
  });

const mz = decimal(2, 1500);
const height = fc.constantFrom("edges", "half-height", "tenth-height");
const width = fc.oneof(
  fc.record({ value: decimal(0.2, 6), as: fc.constant("mz" as const), at: height }),
  fc.record({ value: decimal(1, 3000), as: fc.constant("resolution" as const), at: height }),
);
const reading = {
  as: fc.constantFrom("zero-to-peak", "peak-to-peak", "rms"),
  between: fc.constantFrom("pole-and-ground", "pole-and-pole"),
};
const rf = fc.record({ volts: fc.oneof(decimal(0.1, 5000), fc.constant(0)), ...reading });
const dc = fc.oneof(
  fc.record({ volts: number(-600, 600), between: reading.between }),
  fc.record({ pairX_V: number(-300, 300), pairY_V: number(-300, 300) }),
);
const rodSet = fc.record(
  {
    fieldRadius_mm: decimal(2, 9),
    frequency_MHz: decimal(0.5, 4),
    rodLength_mm: decimal(50, 250),
  },
  { requiredKeys: ["fieldRadius_mm", "frequency_MHz"] },
);

/** Points near the apex, as a tuned instrument has them, and points anywhere. */
const drivePoint = fc.oneof(
  fc.record({ mz, drive: fc.record({ rf, dc }, { requiredKeys: ["rf"] }) }),
  fc.tuple(mz, number(-0.003, 0.02), number(1, 1.5)).map(([at, margin, perMz]) => ({
    mz: at,
    drive: {
      rf: { volts: perMz * at, as: "zero-to-peak" as const, between: "pole-and-ground" as const },
      dc: { volts: APEX_RATIO * (1 - margin) * perMz * at, between: "pole-and-ground" as const },
    },
  })),
);

const peak = fc
  .record({ setMz: mz, shift: number(-0.6, 0.6), width })
  .map(({ setMz, shift, width }) => ({ setMz, observedMz: setMz + shift, width }));
const sameHeight = fc
  .tuple(fc.array(peak, { minLength: 1, maxLength: 5 }), height)
  .map(([peaks, at]) => peaks.map((each) => ({ ...each, width: { ...each.width, at } })));

const operatingPoint: fc.Arbitrary<OperatingPoint> = fc.oneof(
  fc.record({
    by: fc.constant("measured-peaks" as const),
    peaks: fc.oneof(sameHeight, fc.array(peak, { minLength: 1, maxLength: 4 })),
  }),
  fc.record({
    by: fc.constant("drives" as const),
    points: fc.array(drivePoint, { minLength: 1, maxLength: 4 }),
  }),
  fc.record({
    by: fc.constant("drive-law" as const),
    rfPerMz: fc.record({ volts: fc.oneof(decimal(0.2, 5), fc.constant(0)), ...reading }),
    dcSlope: fc.oneof(number(0.16, 0.168), number(0, 0.3)),
    dcOffset_V: number(-3, 3),
  }),
  fc.record({ by: fc.constant("stated" as const), width }),
) as fc.Arbitrary<OperatingPoint>;

const residence = fc.oneof(
  fc.record({ axialEnergy_eVPerCharge: decimal(0.5, 30) }),
  fc.record({ flightTime_us: decimal(5, 500) }),
  fc.record({ rfCycles: decimal(10, 500) }),
);
const supply = fc.record({ rfMax: rf, dcMax: dc }, { requiredKeys: [] });
const tolerances = fc.record(
  {
    fieldRadius_ppm: decimal(1, 300),
    frequency_ppm: decimal(1, 100),
    amplitude_ppm: decimal(1, 300),
    ratio_ppm: decimal(1, 300),
    mzDriftBetweenTunes: decimal(0.01, 0.3),
    mzCalibration: decimal(0.01, 0.1),
  },
  { requiredKeys: [] },
);
const filterMembers = {
  operatingPoint,
  rodSet,
  residence,
  supply,
  rated: fc.tuple(decimal(1, 100), decimal(200, 2000)).map(([mzLow, mzHigh]) => ({ mzLow, mzHigh })),
  tolerances,
  settle_ms: decimal(0.1, 10),
};
const massFilter = (name: string) =>
  fc.record(
    { name: fc.constant(name), role: fc.constant("mass-filter" as const), ...filterMembers },
    { requiredKeys: ["name", "role", "operatingPoint"] },
  ) as fc.Arbitrary<MassFilterStage>;

const cellRf = fc.oneof(
  fc.record({ mode: fc.constant("fixed" as const), rf }),
  fc.record({ mode: fc.constant("cutoff" as const), mz: decimal(5, 300) }),
  fc.record({ mode: fc.constantFrom("precursor-q" as const, "product-q" as const), q: number(0, 1) }),
  fc.record({
    mode: fc.constant("table" as const),
    points: fc.array(fc.record({ mz, cutoffMz: decimal(5, 300) }), { minLength: 1, maxLength: 4 }),
  }),
) as fc.Arbitrary<CellRf>;
const polePairs = fc.constantFrom(2, 2, 2, 3, 4, 11);
const guidedRods = fc.tuple(rodSet, polePairs).map(([rods, pairs]) => ({ ...rods, polePairs: pairs }));
const collisionCell = fc.record(
  {
    name: fc.constant("q2"),
    role: fc.constant("collision-cell" as const),
    rf: cellRf,
    rodSet: guidedRods,
    residence,
    supply,
    maxRadialEnergy_eVPerCharge: decimal(0.01, 10),
    clearing_ms: decimal(1, 20),
  },
  { requiredKeys: ["name", "role", "rf"] },
);
const guide = fc.record(
  { name: fc.constant("guide"), role: fc.constant("ion-guide" as const), rf, rodSet: guidedRods, residence },
  { requiredKeys: ["name", "role"] },
);

const ion = fc.record({ mz });
const near = (of: number) => number(-0.7, 0.7).map((offset) => Math.max(of + offset, 0.5));
const retention = fc.tuple(number(0, 20), number(0.2, 5)).map(([start_min, length]) => ({
  start_min,
  end_min: start_min + length,
}));
const times = {
  dwell_ms: decimal(0.2, 200),
  pause_ms: decimal(0.1, 20),
  retention,
  countRate_perS: decimal(1, 1e6),
};
const scanned = { mzFrom: decimal(2, 500), mzTo: decimal(501, 1500), rate_mzPerS: decimal(10, 20_000) };

const transition = fc.tuple(ion, ion).chain(([precursor, product]) =>
  fc.record(
    {
      kind: fc.constant("transition" as const),
      precursor: fc.constant(precursor),
      product: fc.constant(product),
      setPrecursorMz: near(precursor.mz),
      setProductMz: near(product.mz),
      precursorWidth: width,
      productWidth: width,
      cell: fc.record({ rf: cellRf }),
      ...times,
    },
    { requiredKeys: ["kind", "precursor", "product"] },
  ),
);
const selectedIon = ion.chain((selected) =>
  fc.record(
    {
      kind: fc.constant("selected-ion" as const),
      stage: fc.constant("Q1"),
      ion: fc.constant(selected),
      setMz: near(selected.mz),
      width,
      ...times,
    },
    { requiredKeys: ["kind", "stage", "ion"] },
  ),
);
const scan = fc.record(
  {
    kind: fc.constant("scan" as const),
    stage: fc.constant("Q1"),
    ...scanned,
    width,
    pause_ms: times.pause_ms,
  },
  { requiredKeys: ["kind", "stage", "mzFrom", "mzTo", "rate_mzPerS"] },
);
const scanInTwo = fc.oneof(
  fc.record({ kind: fc.constant("product-scan" as const), precursor: ion, ...scanned, productWidth: width }),
  fc.record({
    kind: fc.constant("precursor-scan" as const),
    product: ion,
    ...scanned,
    precursorWidth: width,
  }),
  fc.record({
    kind: fc.constant("neutral-loss-scan" as const),
    ...scanned,
    mzFrom: fc.constant(100),
    lossMz: decimal(1, 90),
    pause_ms: times.pause_ms,
  }),
);

const timing: fc.Arbitrary<Method["timing"]> = fc.oneof(
  fc.constant({ mode: "dwell" as const }),
  fc.record({
    mode: fc.constant("cycle" as const),
    cycle_ms: decimal(50, 3000),
    dwellMin_ms: decimal(0.5, 20),
    dwellMax_ms: decimal(20, 200),
  }),
);

const methodOf = (acquisition: fc.Arbitrary<unknown>) =>
  fc
    .tuple(
      fc.array(acquisition, { minLength: 1, maxLength: 6 }),
      timing,
      fc.option(fc.record({ value_s: decimal(0.5, 60), at: fc.constantFrom("base", "half-height") }), {
        nil: undefined,
      }),
    )
    .map(([acquisitions, timing, chromatographicPeakWidth]) => ({
      id: "random",
      revision: "1",
      polarity: "positive" as const,
      timing,
      ...(chromatographicPeakWidth === undefined ? {} : { chromatographicPeakWidth }),
      acquisition: acquisitions.map((each, index) => ({ ...(each as Acquisition), id: `A${index}` })),
    }));

const instrumentOf = (...stages: fc.Arbitrary<unknown>[]) =>
  fc.tuple(...stages).map((placed) => ({ id: "random", revision: "1", stages: placed }));

/** A filter alone, a guide before a filter, or a triple quadrupole, with methods that fit. */
export const arbitraryRequest = fc.oneof(
  fc.record({ instrument: instrumentOf(massFilter("Q1")), method: methodOf(fc.oneof(selectedIon, scan)) }),
  fc.record({
    instrument: instrumentOf(guide, massFilter("Q1")),
    method: methodOf(fc.oneof(selectedIon, scan)),
  }),
  fc.record({
    instrument: instrumentOf(massFilter("Q1"), collisionCell, massFilter("Q3")),
    method: methodOf(fc.oneof(transition, transition, transition, scanInTwo, selectedIon)),
  }),
) as fc.Arbitrary<SignOffRequest>;
