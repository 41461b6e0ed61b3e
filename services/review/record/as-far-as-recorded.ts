import type { SignOffResult } from "../sign-off-schema.ts";
import { countOutcomes, verdictOf } from "../verdict.ts";
import { membersOf } from "./kept-record.ts";

/**
 * What of a result an older record can be held to: a later version may have added checks, and a record cannot fail to
 * reproduce what it never stated. Counts and verdict are taken over the findings that remain.
 */
export function asFarAsRecorded(
  recorded: unknown,
  result: SignOffResult,
): { readonly result: SignOffResult; readonly checksAdded: readonly string[] } {
  const { findings } = membersOf(recorded);
  const known = new Set(Array.isArray(findings) ? findings.map((finding) => membersOf(finding).check) : []);
  const checksAdded = [...new Set(result.findings.map(({ check }) => check))].filter(
    (check) => !known.has(check),
  );
  if (checksAdded.length === 0) return { result, checksAdded };
  const remaining = result.findings.filter(({ check }) => known.has(check));
  return {
    checksAdded,
    result: {
      ...result,
      findings: remaining,
      outcomeCounts: countOutcomes(remaining),
      verdict: verdictOf(remaining),
      notShown: result.notShown.filter(({ check }) => known.has(check)),
      waivers: result.waivers.filter(({ check }) => known.has(check)),
    },
  };
}
