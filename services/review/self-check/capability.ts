/** One recomputed value: where, what it should be, and what this machine makes of it. */
export interface CheckedValue {
  readonly at: string;
  readonly reference: number;
  /** null where nothing comes out, which no limit forgives. */
  readonly computed: number | null;
}

/** Something the service can do, as far as it can be held against values from elsewhere. */
export interface Capability {
  readonly capability: string;
  /** Where the reference values come from. */
  readonly source: string;
  /** How a deviation is measured: against the reference, in the unit of the value, or against 1 where the value is small. */
  readonly kind: "relative" | "absolute" | "relative-above-1";
  readonly limit: number;
  values(): CheckedValue[];
}

/** Deviation of one value in the way of its capability; infinite where there is no value. */
export function deviationOf(kind: Capability["kind"], { reference, computed }: CheckedValue): number {
  if (computed === null || !Number.isFinite(computed)) return Number.POSITIVE_INFINITY;
  const difference = Math.abs(computed - reference);
  switch (kind) {
    case "absolute":
      return difference;
    case "relative":
      return difference / Math.abs(reference);
    case "relative-above-1":
      return difference / Math.max(1, Math.abs(reference));
  }
}
