import { type Finding, type Outcome, worstOutcome } from "./finding.ts";
import type { SignOffResult, Verdict } from "./sign-off-schema.ts";

/** The worst outcome of the findings that count; indeterminate where none does. */
export function verdictOf(findings: readonly Finding[]): Verdict {
  return (
    worstOutcome(findings.filter(({ required }) => required).map(({ outcome }) => outcome)) ?? "indeterminate"
  );
}

export function countOutcomes(findings: readonly Finding[]): SignOffResult["outcomeCounts"] {
  const counts: Record<Outcome, number> = {
    pass: 0,
    caution: 0,
    fail: 0,
    indeterminate: 0,
    "not-applicable": 0,
  };
  for (const { outcome } of findings) counts[outcome]++;
  return counts;
}
