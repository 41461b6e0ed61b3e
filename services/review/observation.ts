import type { Bounds, Evidence, Finding, Outcome, PassesIf, Subject } from "./finding.ts";

/**
 * What a check has found out about one quantity of one subject, before anybody judges it:
 * a value with its bounds; a physical impossibility, which fails without a value; inputs that are missing; or the
 * reason why the question does not arise.
 */
export type Observation = {
  readonly quantity: string;
  readonly unit: string;
  readonly subject: Subject;
  readonly statement: string;
} & (
  | {
      readonly kind: "value";
      readonly value: number;
      readonly evidence: Evidence;
      readonly pass: Bounds;
      readonly caution: Bounds;
      readonly passesIf: PassesIf | null;
    }
  | {
      readonly kind: "impossible";
      readonly evidence: Evidence;
      readonly pass: Bounds;
      readonly caution: Bounds;
      readonly passesIf: PassesIf | null;
    }
  | { readonly kind: "indeterminate"; readonly missing: readonly string[] }
  | { readonly kind: "not-applicable" }
);

const UNBOUNDED: Bounds = { min: null, max: null };

function within(value: number, bounds: Bounds): boolean {
  return (bounds.min === null || value >= bounds.min) && (bounds.max === null || value <= bounds.max);
}

function marginOf(value: number, pass: Bounds): number | null {
  const above = pass.min === null ? Number.POSITIVE_INFINITY : value - pass.min;
  const below = pass.max === null ? Number.POSITIVE_INFINITY : pass.max - value;
  const margin = Math.min(above, below);
  return Number.isFinite(margin) ? margin : null;
}

function outcomeOf(observation: Observation): Outcome {
  switch (observation.kind) {
    case "value":
      if (within(observation.value, observation.pass)) return "pass";
      return within(observation.value, observation.caution) ? "caution" : "fail";
    case "impossible":
      return "fail";
    default:
      return observation.kind;
  }
}

/**
 * Judges an observation. `required` is what criteria say of the check; where they say nothing, a check that is required
 * by default counts as far as the given data make it computable.
 */
export function judge(
  observation: Observation,
  check: { readonly id: string; readonly basis: string; readonly requiredByDefault: boolean },
  required: boolean | undefined,
): Finding {
  const outcome = outcomeOf(observation);
  const judged = observation.kind === "value" || observation.kind === "impossible" ? observation : null;
  const value = observation.kind === "value" ? observation.value : null;
  return {
    check: check.id,
    quantity: observation.quantity,
    subject: observation.subject,
    outcome,
    required:
      outcome !== "not-applicable" && (required ?? (check.requiredByDefault && outcome !== "indeterminate")),
    evidence: judged?.evidence ?? "stated",
    value,
    unit: observation.unit,
    pass: judged?.pass ?? UNBOUNDED,
    caution: judged?.caution ?? UNBOUNDED,
    margin: value === null || judged === null ? null : marginOf(value, judged.pass),
    passesIf: outcome === "pass" ? null : (judged?.passesIf ?? null),
    missing: observation.kind === "indeterminate" ? [...observation.missing] : [],
    statement: observation.statement,
    basis: check.basis,
  };
}
