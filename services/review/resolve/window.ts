import type { CanonicalVolts, VoltageConvention } from "../../contract/drive.ts";
import type { WidthHeight } from "../../contract/width.ts";
import type { Evidence } from "../finding.ts";
import type { Lever } from "../lever.ts";

/** Volts with the convention in which the laboratory states them. */
export interface WindowDrive {
  readonly volts: CanonicalVolts;
  readonly convention: VoltageConvention;
  /** The row of the operating point that sets the DC here more than the others do. */
  readonly row: number;
  /** The DC of a row, or the slope of the line, as the lever of U here; null where it does not act on it. */
  readonly dcLever: (row: number) => Lever | null;
}

/** What a mass filter lets through at one set m/z, as far as it is known. */
export type Window =
  | {
      readonly kind: "window";
      readonly mzLow: number;
      readonly mzHigh: number;
      /** The height at which low and high were taken. */
      readonly height: WidthHeight;
      readonly evidence: Evidence;
      /** Volts behind the window, null where it was measured or claimed. */
      readonly drive: WindowDrive | null;
      /** Said in every statement that uses the window: an extrapolation, for instance. */
      readonly note: string | null;
      /** Pointer of the input that sets the width. */
      readonly widthPointer: string;
      /** That input as the lever of the width in m/z; null where volts set it. */
      readonly widthLever: Lever | null;
    }
  | {
      /** Volts that pass nothing, or select nothing. */
      readonly kind: "no-window";
      readonly reason: string;
      readonly evidence: Evidence;
      readonly drive: WindowDrive;
    }
  | { readonly kind: "unknown"; readonly missing: readonly string[]; readonly reason: string };

export type KnownWindow = Extract<Window, { kind: "window" }>;

export function widthOf(window: Pick<KnownWindow, "mzLow" | "mzHigh">): number {
  return window.mzHigh - window.mzLow;
}

export function centreOf(window: Pick<KnownWindow, "mzLow" | "mzHigh">): number {
  return (window.mzLow + window.mzHigh) / 2;
}

/**
 * Whether a window taken at its height may stand for the one between the stability edges. It may where that is the
 * careful side: a peak is narrower at half height and wider at a tenth than between its edges.
 */
export function standsForEdges(window: KnownWindow, careful: "narrow" | "wide"): boolean {
  if (window.height === "edges") return true;
  return window.height === (careful === "narrow" ? "half-height" : "tenth-height");
}

/** The sentence that says for what the window was taken, empty where it was taken between the edges. */
export function heightNote(window: KnownWindow): string {
  const taken =
    window.height === "half-height"
      ? " The width at half height stands for the wider one between the edges, which is the careful side."
      : window.height === "tenth-height"
        ? " The width at a tenth of the height stands for the narrower one between the edges, which is the careful side."
        : "";
  return taken + (window.note === null ? "" : ` ${window.note}`);
}
