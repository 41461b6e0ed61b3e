import { CAUTIONS } from "../contract/cautions.ts";
import { CHECKS } from "./checks.ts";
import { type Criteria, limitsOf } from "./criteria.ts";
import { type Finding, worstOutcome } from "./finding.ts";
import { judge } from "./observation.ts";
import { resolveMethod } from "./resolve/resolve.ts";
import { settingsOf } from "./settings.ts";
import type { Assessment } from "./sign-off-answer.ts";
import type { NotShown, SignOffRequest, WaivedCheck } from "./sign-off-schema.ts";
import { listed } from "./statement.ts";
import { countOutcomes, verdictOf } from "./verdict.ts";

/** Instrument, method and criteria in; findings and verdict out. Pure and deterministic. */
export function signOff({ instrument, method, criteria }: SignOffRequest): Assessment {
  const resolved = resolveMethod(instrument, method);
  const findings: Finding[] = [];
  const waivers: WaivedCheck[] = [];
  for (const check of CHECKS) {
    const criterion = criteria?.checks[check.id];
    const waiver = criterion?.waiver;
    const found = check
      .examine(resolved, limitsOf(check, criterion))
      .map((observation) => judge(observation, check, waiver === undefined ? criterion?.required : false));
    if (waiver !== undefined) {
      const worst = worstOutcome(found.map(({ outcome }) => outcome));
      waivers.push({ check: check.id, worstOutcome: worst, ...waiver });
    }
    findings.push(...found);
  }
  const verdict = verdictOf(findings);
  const notShown = notShownOf(findings);
  return {
    verdict,
    verdictStatement: verdictStatement(verdict, findings, notShown, waivers),
    outcomeCounts: countOutcomes(findings),
    findings,
    settings: settingsOf(resolved),
    notShown,
    waivers,
    criteria: criteriaNamed(criteria),
    cautions: [...CAUTIONS],
  };
}

function criteriaNamed(criteria: Criteria | undefined): Assessment["criteria"] {
  return criteria === undefined ? null : { id: criteria.id, revision: criteria.revision };
}

/** What no verdict covers: findings that lack an input and do not count, brought together where they lack the same. */
function notShownOf(findings: readonly Finding[]): NotShown[] {
  const groups = new Map<string, NotShown>();
  for (const { outcome, required, check, quantity, missing, statement } of findings) {
    if (outcome !== "indeterminate" || required) continue;
    const key = JSON.stringify([check, quantity, missing]);
    const group = groups.get(key);
    if (group === undefined)
      groups.set(key, { check, quantity, missing: [...missing], findings: 1, statement });
    else group.findings++;
  }
  return [...groups.values()];
}

/** Says what a verdict means, so that nobody reads more into a pass than was shown. */
function verdictStatement(
  verdict: Assessment["verdict"],
  findings: readonly Finding[],
  notShown: readonly NotShown[],
  waivers: readonly WaivedCheck[],
): string {
  const meaning = {
    pass: "Every required check met its limit",
    caution: "Every required check met its limit or the wider limit of a caution",
    fail: "At least one required check missed its limit",
    indeterminate: "At least one required check lacks an input, or nothing was judged",
  }[verdict];
  const unshown = new Set([...notShown.map(({ check }) => check), "peak-tails"]);
  const uncounted = new Set(
    findings.filter(({ outcome, required }) => outcome === "fail" && !required).map(({ check }) => check),
  );
  const failing = uncounted.size === 0 ? "" : `; failing but not counted: ${listed([...uncounted])}`;
  const waived = waivers.length === 0 ? "" : `; waived: ${listed(waivers.map(({ check }) => check))}`;
  return `${meaning}; not shown: ${listed([...unshown])}${failing}${waived}.`;
}
