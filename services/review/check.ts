import type { z } from "zod";
import type { Limit } from "./limit.ts";
import type { Observation } from "./observation.ts";
import type { ResolvedMethod } from "./resolve/resolved-method.ts";

export interface Limits<L extends Limit> {
  readonly pass: L;
  readonly caution: L;
}

/**
 * A check is a value: what it computes, what it needs, its default limits with their basis, and a pure function from
 * the resolved method to observations. The catalogue, the criteria schema, the documentation and the tests read it.
 */
export interface Check<Id extends string, L extends Limit> {
  readonly id: Id;
  /** What is computed, in one sentence. */
  readonly computes: string;
  /** The members of instrument and method that it reads. */
  readonly needs: readonly string[];
  /** What is judged, with the UCUM unit of the value. */
  readonly quantities: readonly {
    readonly quantity: string;
    readonly unit: string;
    readonly meaning: string;
  }[];
  readonly requiredByDefault: boolean;
  /** Schema of a limit in the laboratory's criteria, null where there is nothing to limit. */
  readonly limit: z.ZodType<L> | null;
  readonly defaults: Limits<L> | null;
  /** Where the default limits come from. */
  readonly basis: string;
  readonly examine: (method: ResolvedMethod, limits: Limits<L>) => readonly Observation[];
}

export function defineCheck<const Id extends string, L extends Limit>(check: Check<Id, L>): Check<Id, L> {
  return check;
}
