import type { ErrorItem } from "../contract/rule.ts";
import { comparedFinding } from "./compared-findings.ts";
import { comparedSetting } from "./compared-settings.ts";
import { type Key, pairsOf, placesOf } from "./comparison-pairs.ts";
import type { ComparisonAnswer, ComparisonRequest } from "./comparison-schema.ts";
import type { Finding } from "./finding.ts";
import { TOLERANCE } from "./record/agreement.ts";
import { canonicalJson } from "./record/digest.ts";
import { resultOf } from "./record/record.ts";
import type { Engine } from "./record/record-schema.ts";
import { duplicates } from "./rules/duplicates.ts";
import { signOff } from "./sign-off.ts";
import { signOffErrors } from "./sign-off-rules.ts";
import type { Setting, SignOffResult } from "./sign-off-schema.ts";

type Case = ComparisonRequest["cases"][number];
type Other = ComparisonAnswer["others"][number];

const WITHIN_OF_WIDTH = 0.1;

/** What a schema cannot say of a comparison: every case is a sign-off request of its own. */
export function comparisonErrors({ cases }: ComparisonRequest): ErrorItem[] {
  return [
    ...duplicates(cases, "label", (index) => `/cases/${index}/label`),
    ...cases.flatMap((each, index) =>
      signOffErrors(each).map((error) => ({ ...error, pointer: `/cases/${index}${error.pointer}` })),
    ),
  ];
}

/** Signs off every case and sets the others against the first: a method transfer, or what a change does. */
export function comparisonOf(request: ComparisonRequest, engine: Engine): ComparisonAnswer {
  const withinOfWidth = request.withinOfWidth ?? WITHIN_OF_WIDTH;
  const [base, ...others] = request.cases.map((each) => ({ each, result: resultOf(signOff(each)) }));
  return {
    base: foundIn(base!.each, base!.result),
    others: others.map((other) => compared(base!, other, withinOfWidth)),
    withinOfWidth,
    tolerance: TOLERANCE,
    engine: { ...engine },
  };
}

function foundIn({ label }: Case, { verdict, outcomeCounts }: SignOffResult): ComparisonAnswer["base"] {
  return { label, verdict, outcomeCounts };
}

interface Found {
  readonly each: Case;
  readonly result: SignOffResult;
}

function compared(base: Found, other: Found, withinOfWidth: number): Other {
  const [basePlace, otherPlace] = [placesOf(base.each.instrument), placesOf(other.each.instrument)];
  const keysBy = <Item>(keyOf: (item: Item, placeOf: PlaceOf, ion: boolean) => string): Key<Item>[] =>
    [true, false].map((ion) => ({
      inBase: (item) => keyOf(item, basePlace, ion),
      inOther: (item) => keyOf(item, otherPlace, ion),
    }));
  const findingPairs = pairsOf(base.result.findings, other.result.findings, keysBy(findingKey));
  const settingPairs = pairsOf(base.result.settings, other.result.settings, keysBy(settingKey));
  const findings = findingPairs.flatMap((pair) => comparedFinding(pair) ?? []);
  const settings = settingPairs.flatMap((pair) => comparedSetting(pair, withinOfWidth) ?? []);
  const found = {
    ...foundIn(other.each, other.result),
    inputChanged: (["instrument", "method", "criteria"] as const).filter(
      (part) => canonicalJson(base.each[part]) !== canonicalJson(other.each[part]),
    ),
    findings,
    findingsUnchanged: findingPairs.length - findings.length,
    settings,
    settingsCarriedOver: settingPairs.length - settings.length,
  };
  return { ...found, statement: statementOf(base, found) };
}

type PlaceOf = (stage: string) => string;

/**
 * Neither the pointer nor the name of a stage: both may be others on another instrument for the same thing. The ion
 * counts at first only: a corrected m/z, or another ion that is now the worst of its stage, has its findings compared.
 */
function findingKey({ check, quantity, subject }: Finding, placeOf: PlaceOf, ion: boolean): string {
  const place = subject.stage === undefined ? null : placeOf(subject.stage);
  return canonicalJson([check, quantity, subject.acquisition, place, ion ? subject.ion : null]);
}

function settingKey(setting: Setting, placeOf: PlaceOf, ion: boolean): string {
  return canonicalJson([setting.acquisition, placeOf(setting.stage), ion ? setting.ion : null]);
}

function statementOf({ each, result }: Found, other: Omit<Other, "statement">): string {
  const verdict =
    result.verdict === other.verdict
      ? `The verdict stays ${other.verdict}`
      : `The verdict goes from ${result.verdict} to ${other.verdict}`;
  const count = (direction: string) =>
    other.findings.filter((finding) => finding.direction === direction).length;
  const lost = other.settings.filter(({ carriesOver }) => carriesOver === false).length;
  return (
    `${verdict} against ${each.label}. Findings worse: ${count("worse")}, better: ${count("better")}. ` +
    `Settings that carry over: ${other.settingsCarriedOver}, that do not: ${lost}, of which it cannot be told: ${other.settings.length - lost}.`
  );
}
