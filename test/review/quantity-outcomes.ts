import type { Outcome } from "../../services/review/finding.ts";
import type { SignOffRequest } from "../../services/review/sign-off-schema.ts";

/** A quantity with a request for each outcome it can have; `never` says why one of them cannot come about. */
export interface QuantityOutcomes {
  readonly check: string;
  readonly quantity: string;
  readonly requests: Partial<Record<Outcome, SignOffRequest>>;
  readonly never?: Partial<Record<Outcome, string>>;
}
