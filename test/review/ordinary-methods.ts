import type { SignOffRequest } from "../../services/review/sign-off-schema.ts";
import {
  collisionCell,
  edges,
  halfHeight,
  instrument,
  massFilter,
  method,
  request,
  scan,
  stated,
  type Transition,
  transition,
} from "./laboratory.ts";

/* Invented scenarios of ours: no compound, instrument or laboratory of anybody's. */

/** A triple quadrupole of which the laboratory knows the tune report, the rated range and the cell's cutoff. */
const TUNED = instrument(
  massFilter("Q1", { rated: { mzLow: 5, mzHigh: 1250 }, tolerances: { mzDriftBetweenTunes: 0.05 } }),
  collisionCell({ rf: { mode: "cutoff", mz: 60 } }),
  massFilter("Q3", { rated: { mzLow: 5, mzHigh: 1250 }, tolerances: { mzDriftBetweenTunes: 0.05 } }),
);

/** Thirty compounds with two transitions each, in windows of two minutes that follow each other by half a minute. */
export function scheduledTransitions(): Transition[] {
  return Array.from({ length: 60 }, (_, index) => {
    const compound = index >> 1;
    const precursor = 250.1 + compound * 11.3;
    const product = precursor * (index % 2 === 0 ? 0.63 : 0.37) + 0.02;
    const start_min = 1 + compound * 0.5;
    return transition(`C${compound + 1}-${(index % 2) + 1}`, round(precursor), round(product), {
      setPrecursorMz: round(precursor + 0.02),
      setProductMz: round(product - 0.02),
      precursorWidth: halfHeight(0.7),
      productWidth: halfHeight(0.7),
      dwell_ms: 25,
      pause_ms: 3,
      retention: { start_min, end_min: start_min + 2 },
    });
  });
}

const round = (value: number) => Number(value.toFixed(4));

export function chromatographicMethod(
  change: (transitions: Transition[]) => Transition[] = (same) => same,
): SignOffRequest {
  return request({
    instrument: TUNED,
    method: method(change(scheduledTransitions()), { chromatographicPeakWidth: { value_s: 6, at: "base" } }),
  });
}

/** A residual-gas analyser: one filter, rated to m/z 100, that scans with a width of 1.0 which the maker states. */
export function residualGasMethod(
  filter: Parameters<typeof massFilter>[1] = {},
  scanned: Parameters<typeof scan>[2] = {},
): SignOffRequest {
  return request({
    instrument: instrument(
      massFilter("filter", {
        operatingPoint: stated(edges(1)),
        rated: { mzLow: 1, mzHigh: 100 },
        rodSet: { fieldRadius_mm: 3.175, frequency_MHz: 2, rodLength_mm: 100 },
        residence: { axialEnergy_eVPerCharge: 5 },
        settle_ms: 1,
        ...filter,
      }),
    ),
    method: method([
      scan(1, 100, { id: "survey", stage: "filter", rate_mzPerS: 100, pause_ms: 5, ...scanned }),
    ]),
  });
}
