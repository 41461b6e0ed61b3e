import { readReference } from "./read-reference.ts";

interface Line {
  readonly slope: number;
  readonly offset: number;
  readonly worstError: number;
}
interface ScanAndDrift {
  readonly drift: readonly (readonly [
    mzCentre: number,
    mzWidth: number,
    ratio: number,
    qLow: number,
    qHigh: number,
    lowByRatio: number,
    highByRatio: number,
  ])[];
  readonly lines: readonly {
    readonly mzFrom: number;
    readonly mzTo: number;
    readonly width: number;
    readonly leastSquares: Line & { readonly worstMz: number };
    readonly leastWorst: Line;
  }[];
}
export const SCAN_AND_DRIFT = readReference<ScanAndDrift>("scan-and-drift");
