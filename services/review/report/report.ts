import type { Bounds, Finding, Outcome } from "../finding.ts";
import type { SignOffAnswer } from "../sign-off-answer.ts";
import { digits } from "../statement.ts";
import { html, type Markup } from "./html.ts";
import { STYLE } from "./style.ts";

/** The sign-off as one page that prints: what was found, what was not shown, and room for a person's signature. */
export function reportHtml(answer: SignOffAnswer): string {
  const { instrument, method, criteria } = answer.record.input;
  const { engine, digests } = answer.record;
  return html`<!doctype html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta name="viewport" content="width=device-width, initial-scale=1">
<title>Sign-off of ${method.id}, revision ${method.revision}</title>
<style>${{ markup: STYLE }}</style>
</head>
<body>
<header>
<h1>Sign-off of mass-filter settings</h1>
<dl>
<div><dt>Method</dt><dd>${method.id}, revision ${method.revision}</dd></div>
<div><dt>Instrument</dt><dd>${instrument.id}, revision ${instrument.revision}</dd></div>
<div><dt>Criteria</dt><dd>${criteria === undefined ? "default limits" : `${criteria.id}, revision ${criteria.revision}`}</dd></div>
<div><dt>Computed by</dt><dd>Rodset ${engine.version}, constants ${engine.constants}</dd></div>
<div><dt>Record</dt><dd><code>SHA-256 ${digests.record}</code></dd></div>
</dl>
<p class="verdict ${answer.verdict}"><strong>${answer.verdict}</strong> ${answer.verdictStatement}</p>
<p>${counted(answer)}</p>
</header>
${findingsWith("fail", "What fails", answer.findings)}
${findingsWith("caution", "What needs attention", answer.findings)}
${notShown(answer)}
${waivers(answer)}
${passes(answer.findings)}
${settings(answer)}
<section>
<h2>Cautions</h2>
<ul>${answer.cautions.map((caution) => html`<li>${caution}</li>`)}</ul>
</section>
<section class="signature">
<h2>Signature</h2>
<p>A seal of this service shows that the record was not altered. It is not a person's electronic signature.</p>
<div>${["Printed name", "Meaning (review, approval, responsibility)", "Date and time", "Signature"].map((line) => html`<p>${line}</p>`)}</div>
</section>
</body>
</html>
`.markup;
}

function counted({ outcomeCounts }: SignOffAnswer): string {
  return `Findings: ${Object.entries(outcomeCounts)
    .map(([outcome, count]) => `${count} ${outcome}`)
    .join(", ")}.`;
}

function findingsWith(outcome: Outcome, title: string, findings: readonly Finding[]): Markup | null {
  const found = findings.filter((finding) => finding.outcome === outcome);
  if (found.length === 0) return null;
  return html`<section>
<h2>${title}</h2>
${table(
  ["Subject", "Check", "Statement", "Value", "Pass", "Passes if"],
  found.map((finding) => [
    subjectText(finding),
    finding.check,
    finding.statement,
    valueText(finding.value, finding.unit),
    boundsText(finding.pass, finding.unit),
    finding.passesIf === null
      ? "no single input would do"
      : `${finding.passesIf.input} is ${boundsText(finding.passesIf, finding.passesIf.unit, String)}`,
  ]),
)}
</section>`;
}

function notShown({ notShown }: SignOffAnswer): Markup | null {
  if (notShown.length === 0) return null;
  return html`<section>
<h2>What is not shown</h2>
${table(
  ["Check", "Quantity", "Findings", "Lacks"],
  notShown.map(({ check, quantity, findings, missing }) => [
    check,
    quantity,
    String(findings),
    missing.join(", "),
  ]),
)}
</section>`;
}

function waivers({ waivers }: SignOffAnswer): Markup | null {
  if (waivers.length === 0) return null;
  return html`<section>
<h2>What the laboratory waives</h2>
${table(
  ["Check", "Worst outcome", "Reason", "Reference"],
  waivers.map(({ check, worstOutcome, reason, reference }) => [
    check,
    worstOutcome ?? "none",
    reason,
    reference,
  ]),
)}
</section>`;
}

function passes(findings: readonly Finding[]): Markup {
  const found = findings.filter(({ outcome }) => outcome === "pass");
  return html`<section>
<h2>What passes</h2>
${
  found.length === 0
    ? html`<p>Nothing.</p>`
    : table(
        ["Subject", "Check", "Value", "Pass", "Known by"],
        found.map((finding) => [
          subjectText(finding),
          finding.check,
          valueText(finding.value, finding.unit),
          boundsText(finding.pass, finding.unit),
          finding.evidence,
        ]),
      )
}
</section>`;
}

function settings({ settings }: SignOffAnswer): Markup {
  return html`<section>
<h2>Settings</h2>
<p>Calculated windows and cutoffs; not settings to apply.</p>
${table(
  ["Acquisition", "Stage", "Ion", "m/z", "Set m/z", "Window m/z", "Cutoff m/z"],
  settings.map(({ acquisition, stage, ion, mz, setMz, window, cutoffMz }) => [
    acquisition,
    stage,
    ion,
    String(mz),
    String(setMz),
    window === null
      ? ""
      : `${digits(window.mzLow, 7)} to ${digits(window.mzHigh, 7)} (${window.at}, ${window.evidence})`,
    cutoffMz === null ? "" : digits(cutoffMz, 6),
  ]),
)}
</section>`;
}

function table(heads: readonly string[], rows: readonly (readonly string[])[]): Markup {
  return html`<table>
<thead><tr>${heads.map((head) => html`<th scope="col">${head}</th>`)}</tr></thead>
<tbody>
${rows.map((row) => html`<tr>${row.map((cell) => html`<td>${cell}</td>`)}</tr>\n`)}</tbody>
</table>`;
}

function subjectText({ subject: { acquisition, stage, ion, pointer } }: Finding): string {
  const named = [acquisition, stage, ion].filter((part) => part !== undefined);
  return named.length === 0 ? pointer : named.join(", ");
}

function valueText(value: number | null, unit: string): string {
  return value === null ? "none" : fiveDigits(value) + unitText(unit);
}

function boundsText(
  { min, max }: Bounds,
  unit: string,
  write: (bound: number) => string = fiveDigits,
): string {
  if (min !== null && max !== null) return `${write(min)} to ${write(max)}${unitText(unit)}`;
  if (min !== null) return `at least ${write(min)}${unitText(unit)}`;
  return max === null ? "any" : `at most ${write(max)}${unitText(unit)}`;
}

function fiveDigits(value: number): string {
  return digits(value, 5);
}

/** UCUM writes a dimensionless unit as 1 and puts ppm in brackets; a person does neither. */
function unitText(unit: string): string {
  return unit === "1" ? "" : ` ${unit.replace(/[[\]]/g, "")}`;
}
