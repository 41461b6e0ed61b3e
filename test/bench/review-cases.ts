import type { Instrument } from "../../services/review/instrument.ts";
import { signOff } from "../../services/review/sign-off.ts";
import type { SignOffRequest } from "../../services/review/sign-off-schema.ts";
import {
  collisionCell,
  dc,
  massFilter,
  method,
  request,
  rf,
  TUNE_REPORT,
  transition,
} from "../review/laboratory.ts";
import type { BenchCase, Side } from "./bench-case.ts";

const TRANSITIONS = 100;

/** Every member that a check reads is stated, so that every check computes. */
const KNOWN = {
  rodSet: { fieldRadius_mm: 4.17, frequency_MHz: 1, rodLength_mm: 200 },
  residence: { axialEnergy_eVPerCharge: 2 },
  supply: { rfMax: rf(2000), dcMax: dc(400) },
  rated: { mzLow: 5, mzHigh: 1250 },
  tolerances: { amplitude_ppm: 50, ratio_ppm: 20 },
  settle_ms: 1,
} as const;

const cell = collisionCell({
  rodSet: KNOWN.rodSet,
  residence: { flightTime_us: 500 },
  maxRadialEnergy_eVPerCharge: 0.1,
  clearing_ms: 5,
});

/** Points near the apex at five m/z: 1.2552 V of RF and 0.2104 V of DC per m/z. */
const DRIVES = {
  by: "drives" as const,
  points: [50, 250, 500, 750, 1000].map((mz) => ({
    mz,
    drive: { rf: rf(1.2552 * mz), dc: dc(0.2104 * mz) },
  })),
};

const tuned: Instrument = {
  id: "bench",
  revision: "1",
  stages: [
    massFilter("Q1", { ...KNOWN, operatingPoint: TUNE_REPORT }),
    cell,
    massFilter("Q3", { ...KNOWN, operatingPoint: TUNE_REPORT }),
  ],
};
const driven: Instrument = {
  ...tuned,
  stages: [
    massFilter("Q1", { ...KNOWN, operatingPoint: DRIVES }),
    cell,
    massFilter("Q3", { ...KNOWN, operatingPoint: DRIVES }),
  ],
};

function scheduled(instrument: Instrument, transitions: number): SignOffRequest {
  const acquisition = Array.from({ length: transitions }, (_, index) => {
    const precursor = 200.05 + (index * 700) / transitions;
    const start_min = 0.5 + (index * 20) / transitions;
    return transition(`T${index}`, precursor, precursor * 0.55, {
      setPrecursorMz: precursor + 0.01,
      setProductMz: precursor * 0.55,
      retention: { start_min, end_min: start_min + 2 },
    });
  });
  const chromatographicPeakWidth = { value_s: 6, at: "base" as const };
  return request({ instrument, method: method(acquisition, { chromatographicPeakWidth }) });
}

const signed = (request: SignOffRequest): Side => ({
  label: "signOff",
  operations: 1,
  run: () => signOff(request).findings.reduce((sum, { value }) => sum + (value ?? 0), 0),
});

/** What nobody can avoid who takes a request and answers it. */
const copied = (request: SignOffRequest): Side => ({
  label: "JSON.parse(JSON.stringify(request))",
  operations: 1,
  run: () => (JSON.parse(JSON.stringify(request)) as SignOffRequest).method.acquisition.length,
});

function reviewCase(name: string, request: SignOffRequest): BenchCase {
  return {
    name,
    target: null,
    unit: "us",
    a: signed(request),
    b: copied(request),
    checksumTolerance: null,
    note: `${signOff(request).findings.length} findings; side b only copies the request`,
  };
}

export const REVIEW_CASES: readonly BenchCase[] = [
  reviewCase(`sign-off of ${TRANSITIONS} transitions, tune report`, scheduled(tuned, TRANSITIONS)),
  reviewCase(`sign-off of ${TRANSITIONS} transitions, drives`, scheduled(driven, TRANSITIONS)),
  reviewCase("sign-off of 2000 transitions, tune report", scheduled(tuned, 2000)),
];
