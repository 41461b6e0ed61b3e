import type { AnswerOf, RequestOf, Schema } from "@rodset/sdk";

const WIDTH = 100;
const INDENT = "    ";

/** What a sign-off found, for a terminal: what needs a person first, what passed as counts. */
export function findingsAsText(request: RequestOf<"signOff">, answer: AnswerOf<"signOff">): string {
  const { method, instrument } = request;
  const { verdict, verdictStatement, findings, notShown } = answer;
  const passed = findings.filter(({ outcome }) => outcome === "pass");
  return [
    `Method ${method.id}, revision ${method.revision}, on ${instrument.id}, revision ${instrument.revision}`,
    `${method.acquisition.length} acquisitions, ${findings.length} findings`,
    "",
    ...wrapped(`Verdict: ${verdict.toUpperCase()}. ${verdictStatement}`, ""),
    ...needingAttention("Fail", "fail", findings),
    ...needingAttention("Caution", "caution", findings),
    "",
    `Pass (${passed.length})`,
    ...wrapped([...countByCheck(passed)].map(([check, count]) => `${check} ${count}`).join(", "), "  "),
    "",
    "Not shown, and what it would take",
    ...[...missingByCheck(notShown)].flatMap(([check, missing]) => [
      `  ${check}`,
      ...[...missing].map((pointer) => INDENT + pointer),
    ]),
  ].join("\n");
}

function needingAttention(
  title: string,
  outcome: Schema<"Outcome">,
  findings: readonly Schema<"Finding">[],
): string[] {
  const found = findings.filter((finding) => finding.outcome === outcome);
  if (found.length === 0) return [];
  return [
    "",
    `${title} (${found.length})`,
    ...found.flatMap(({ check, subject, statement, passesIf }) => [
      `  ${[subject.acquisition, subject.stage].filter(Boolean).join(" in ")}: ${check}`,
      ...wrapped(statement, INDENT),
      ...(passesIf === null ? [] : wrapped(`Passes if ${passesIf.input} is ${interval(passesIf)}.`, INDENT)),
    ]),
  ];
}

function countByCheck(findings: readonly Schema<"Finding">[]): Map<string, number> {
  const counts = new Map<string, number>();
  for (const { check } of findings) counts.set(check, (counts.get(check) ?? 0) + 1);
  return counts;
}

function missingByCheck(notShown: AnswerOf<"signOff">["notShown"]): Map<string, Set<string>> {
  const inputs = new Map<string, Set<string>>();
  for (const { check, missing } of notShown) {
    inputs.set(check, new Set([...(inputs.get(check) ?? []), ...missing]));
  }
  return inputs;
}

function interval({ min, max, unit }: Schema<"PassesIf">): string {
  const of = unit === "1" ? "" : ` ${unit}`;
  if (min !== null && max !== null) return `from ${inside(min, "up")} to ${inside(max, "down")}${of}`;
  return min !== null ? `at least ${inside(min, "up")}${of}` : `at most ${inside(max!, "down")}${of}`;
}

/** Six digits, rounded into the interval: a bound that is typed in as printed must pass. */
function inside(bound: number, direction: "up" | "down"): string {
  if (bound === 0) return "0";
  const scale = 10 ** (5 - Math.floor(Math.log10(Math.abs(bound))));
  const rounded = (direction === "up" ? Math.ceil(bound * scale) : Math.floor(bound * scale)) / scale;
  return String(Number(rounded.toPrecision(6)));
}

function wrapped(text: string, indent: string): string[] {
  const lines: string[] = [];
  let line = indent;
  for (const word of text.split(" ")) {
    if (line.length > indent.length && line.length + 1 + word.length > WIDTH) {
      lines.push(line);
      line = indent;
    }
    line += line.length > indent.length ? ` ${word}` : word;
  }
  return [...lines, line];
}
