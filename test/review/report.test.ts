import { describe, expect, it } from "vitest";
import { CAUTIONS } from "../../services/contract/cautions.ts";
import { recordedSignOff } from "../../services/review/record/record.ts";
import { reportHtml } from "../../services/review/report/report.ts";
import type { SignOffRequest } from "../../services/review/sign-off-schema.ts";

const ENGINE = { version: "0.0.0", constants: "CODATA 2022" };
const unitMass = { value: 0.7, as: "mz", at: "edges" } as const;

/** One product below the cutoff of the cell, and names that would be markup if nobody escaped them. */
const request: SignOffRequest = {
  instrument: {
    id: "<b>bench</b>",
    revision: "1",
    stages: [
      { name: "Q1", role: "mass-filter", operatingPoint: { by: "stated", width: unitMass } },
      { name: "q2", role: "collision-cell", rf: { mode: "cutoff", mz: 70 } },
      { name: "Q3", role: "mass-filter", operatingPoint: { by: "stated", width: unitMass } },
    ],
  },
  method: {
    id: "\"quoted\" & 'named'",
    revision: "2",
    polarity: "positive",
    timing: { mode: "dwell" },
    acquisition: [
      {
        id: "<img src=x onerror=alert(1)>",
        kind: "transition",
        precursor: { mz: 251.0597, label: "<script>alert(1)</script>" },
        product: { mz: 65.0386 },
        dwell_ms: 20,
        pause_ms: 5,
      },
    ],
  },
  criteria: {
    id: "house",
    revision: "3",
    checks: { "dwell-time": { waiver: { reason: "<u>because</u>", reference: "CC-17" } } },
  },
};

const answer = recordedSignOff(request, ENGINE);
const report = reportHtml(answer);

describe("the report of a sign-off", () => {
  it("turns no name of the request into markup", () => {
    for (const markup of ["<b>", "<img", "<script", "<u>", '"quoted"']) expect(report).not.toContain(markup);
    expect(report).toContain("&lt;script&gt;alert(1)&lt;/script&gt;");
    expect(report).toContain("&quot;quoted&quot; &amp; &#39;named&#39;");
  });

  it("states every finding that fails with what would make it pass", () => {
    const failing = answer.findings.filter(({ outcome }) => outcome === "fail");
    expect(failing.map(({ check }) => check)).toEqual(["product-above-cutoff"]);
    expect(report).toContain("below the cutoff");
    // Every digit, so that whoever types it in passes: rounded, it might not.
    expect(report).toContain(`/instrument/stages/1/rf/mz is at most ${failing[0]!.passesIf!.max}`);
  });

  it("says what was not shown, what is waived and by which criteria", () => {
    for (const { missing } of answer.notShown) expect(report).toContain(missing[0]);
    expect(answer.notShown.length).toBeGreaterThan(0);
    expect(report).toContain("house, revision 3");
    expect(report).toContain("CC-17");
  });

  it("carries the digest of the record, every caution and room for a signature", () => {
    expect(report).toContain(answer.record.digests.record);
    for (const caution of CAUTIONS) expect(report).toContain(caution.replaceAll("'", "&#39;"));
    for (const line of ["Printed name", "Meaning", "Date and time", "Signature"])
      expect(report).toContain(line);
    expect(report).toContain("not a person&#39;s electronic signature".replace("&#39;", "'"));
  });

  it("is one page that loads nothing", () => {
    expect(report.match(/<html/g)).toHaveLength(1);
    expect(report).not.toMatch(/<[a-z][^>]*\b(src|href)=/);
  });
});
