import type { RodSet } from "../../contract/rod-set.ts";
import type { Acquisition, Polarity } from "../acquisition.ts";
import type { Evidence } from "../finding.ts";
import type { CellRf, Instrument, MassFilterStage, Stage } from "../instrument.ts";
import type { Lever } from "../lever.ts";
import type { Method } from "../method.ts";
import type { Claim } from "./operating-point.ts";
import type { Schedule } from "./schedule.ts";
import type { Window } from "./window.ts";

/** A stage with the place where it stands in the request. */
export interface Placed<S extends Stage> {
  readonly stage: S;
  readonly pointer: string;
}

/** One ion, or one end of a scan, set at one mass filter. */
export interface Filtering {
  readonly acquisition: Acquisition;
  readonly filter: Placed<MassFilterStage>;
  /** A scan has no ion: its two ends stand for it. */
  readonly target: "ion" | "scan-end";
  readonly pointer: string;
  readonly ion: string;
  readonly mz: number;
  readonly setMz: number;
  readonly setMzStated: boolean;
  readonly setMzPointer: string;
  /** Window that the method claims. */
  readonly claim: Claim | null;
  readonly window: Window;
  /** The set m/z as a lever: its own member, or the end of a scan that it follows. */
  readonly setMzLever: Lever;
  /** The window at another set m/z, all else unchanged. */
  readonly windowIfSetTo: (setMz: number) => Window;
}

/** An RF-only stage as one acquisition sets it. */
export interface Guiding {
  readonly acquisition: Acquisition;
  readonly placed: Placed<Stage>;
  readonly rodSet: RodSet | null;
  readonly polePairs: number;
  /** How the RF is set and where that stands, null where nothing is stated. */
  readonly setting: { readonly rf: CellRf; readonly pointer: string } | null;
  /** Zero-to-peak, pole-to-ground; null where it does not follow from what is stated. */
  readonly rfVolts: number | null;
  readonly rfMissing: readonly string[];
  readonly voltsLever: Lever | null;
  /** Low-mass cutoff in m/z; null where it does not follow, or is not defined (more than two pole pairs). */
  readonly cutoffMz: number | null;
  readonly cutoffMissing: readonly string[];
  readonly cutoffLever: Lever | null;
  readonly evidence: Evidence;
  /** The ion that enters a cell; a guide has only the one that must get through. */
  readonly precursor: GuidedIon | null;
  readonly product: GuidedIon;
}

export interface GuidedIon {
  readonly pointer: string;
  readonly ion: string;
  readonly mz: number;
  readonly setMz: number;
}

export interface ResolvedAcquisition {
  readonly acquisition: Acquisition;
  readonly index: number;
  readonly pointer: string;
  readonly polarity: Polarity;
  readonly filterings: readonly Filtering[];
  /**
   * The collision cell for each pair of a precursor and a product: one in a transition, two in a scan. What a single
   * filter selects passes the cell whole: the same ion is both.
   */
  readonly cells: readonly Guiding[];
}

/** Instrument and method brought together once; every check reads it and none computes it again. */
export interface ResolvedMethod {
  readonly instrument: Instrument;
  readonly method: Method;
  readonly stages: readonly Placed<Stage>[];
  readonly filters: readonly Placed<MassFilterStage>[];
  readonly acquisitions: readonly ResolvedAcquisition[];
  /** All that the method sets at a filter, by the filter's pointer; a filter at which nothing is set has none. */
  readonly settings: ReadonlyMap<string, readonly Filtering[]>;
  /** Rod sets that only pass ions, each with the lightest ion it must pass. */
  readonly guides: readonly Guiding[];
  readonly schedule: Schedule;
}
