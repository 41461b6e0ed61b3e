/** One side of a comparison: a batch of operations that returns a checksum of everything it computed. */
export interface Side {
  readonly label: string;
  /** Operations in one call of `run`. */
  readonly operations: number;
  readonly run: () => number | Promise<number>;
}

/** What the case is held to: a time of side a at most, or a speed of side a over that of b at least. */
type Target =
  | { readonly of: "time"; readonly most: number; readonly stretch?: number }
  | { readonly of: "speed"; readonly least: number };

/** A comparison whose two sides alternate in one process. */
export interface BenchCase {
  readonly name: string;
  readonly target: Target | null;
  /** Unit of the printed times per operation. */
  readonly unit: "ns" | "us" | "ms";
  readonly a: Side;
  readonly b: Side;
  /** Largest relative difference of the checksums per operation at which both sides did the same work; null: not comparable. */
  readonly checksumTolerance: number | null;
  /** What a reader must know to judge the comparison, such as the accuracy of either side. */
  readonly note?: string;
  readonly open?: () => Promise<void>;
  readonly close?: () => Promise<void>;
}
