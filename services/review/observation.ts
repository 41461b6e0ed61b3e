import type { Bounds, Evidence, Finding, Outcome, PassesIf, Subject } from "./finding.ts";

/** What an observation is about. */
export interface About {
  readonly quantity: string;
  readonly unit: string;
  readonly subject: Subject;
}

interface Judgeable {
  readonly evidence: Evidence;
  readonly pass: Bounds;
  readonly caution: Bounds;
  /** Asked only where the limit is missed; null where no single input would do. */
  readonly passesIf: () => PassesIf | null;
}

/** A sentence for a person; where many readings are taken to show one of them, it is written when it is shown. */
export type Statement = string | (() => string);

export function textOf(statement: Statement): string {
  return typeof statement === "string" ? statement : statement();
}

/**
 * What a check has found out, before anybody judges it: a value with its bounds; a physical impossibility, which fails
 * without a value; inputs that are missing; or the reason why the question does not arise.
 */
export type Reading = { readonly statement: Statement } & (
  | ({ readonly kind: "value"; readonly value: number } & Judgeable)
  | ({ readonly kind: "impossible" } & Judgeable)
  | { readonly kind: "indeterminate"; readonly missing: readonly string[] }
  | { readonly kind: "not-applicable" }
);

/** A reading of one quantity of one subject. */
export type Observation = About & Reading;

/** The reading where inputs are missing: the sentence names each. */
export function lacking(what: string, missing: readonly string[]): Reading {
  const named = [...new Set(missing)];
  return {
    kind: "indeterminate",
    missing: named,
    statement: `${what} does not follow without ${named.join(", ")}.`,
  };
}

export function notApplicable(statement: string): Reading {
  return { kind: "not-applicable", statement };
}

const UNBOUNDED: Bounds = { min: null, max: null };

function within(value: number, bounds: Bounds): boolean {
  return (bounds.min === null || value >= bounds.min) && (bounds.max === null || value <= bounds.max);
}

/** Signed distance of a value to the nearer bound, negative outside; null where there is no bound. */
export function marginOf(value: number, pass: Bounds): number | null {
  const above = pass.min === null ? Number.POSITIVE_INFINITY : value - pass.min;
  const below = pass.max === null ? Number.POSITIVE_INFINITY : pass.max - value;
  const margin = Math.min(above, below);
  return Number.isFinite(margin) ? margin : null;
}

/** The bounds of a caution never lie inside those of a pass: a laboratory that moves only the one moves the other along. */
function widened(caution: Bounds, pass: Bounds): Bounds {
  return {
    min: caution.min === null || pass.min === null ? null : Math.min(caution.min, pass.min),
    max: caution.max === null || pass.max === null ? null : Math.max(caution.max, pass.max),
  };
}

export function outcomeOf(reading: Reading): Outcome {
  switch (reading.kind) {
    case "value":
      if (within(reading.value, reading.pass)) return "pass";
      return within(reading.value, widened(reading.caution, reading.pass)) ? "caution" : "fail";
    case "impossible":
      return "fail";
    default:
      return reading.kind;
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
    caution: judged === null ? UNBOUNDED : widened(judged.caution, judged.pass),
    margin: value === null || judged === null ? null : marginOf(value, judged.pass),
    passesIf: outcome === "pass" || judged === null ? null : judged.passesIf(),
    missing: observation.kind === "indeterminate" ? [...new Set(observation.missing)] : [],
    statement: textOf(observation.statement),
    basis: check.basis,
  };
}
