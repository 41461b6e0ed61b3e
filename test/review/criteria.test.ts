import { describe, expect, it } from "vitest";
import { CHECKS } from "../../services/review/checks.ts";
import type { Criteria } from "../../services/review/criteria.ts";
import { SignOffRequest } from "../../services/review/sign-off-schema.ts";
import { finding, method, oneFilter, request, selectedIon, signedOff, transition } from "./laboratory.ts";

const sound = (checks?: Criteria["checks"]) => request(checks === undefined ? {} : { checks });
/** Product at 0.97 of the cutoff. */
const belowCutoff = (checks?: Criteria["checks"]) =>
  request({ method: method([transition("A", 500, 58.2)]), ...(checks === undefined ? {} : { checks }) });
/** The same request under other criteria. */
const under = (of: SignOffRequest, checks?: Criteria["checks"]): SignOffRequest =>
  checks === undefined ? of : { ...of, criteria: request({ checks }).criteria! };
const WAIVER = { reason: "The product is confined all the same, as measured.", reference: "DEV-17" };

describe("criteria", () => {
  it("take the place of the default limits, each by itself", () => {
    const offset = oneFilter({}, selectedIon("A", 500, { setMz: 500.15 }));
    const set = (checks?: Criteria["checks"]) => finding(under(offset, checks), "set-mz");
    expect(set()).toMatchObject({ outcome: "caution", pass: { min: null } });
    expect(set({ "set-mz": { pass: { max: 0.2 } } })).toMatchObject({
      outcome: "pass",
      pass: { min: null, max: 0.2 },
    });
    expect(set({ "set-mz": { pass: { maxOfWidth: 0.05 }, caution: { maxOfWidth: 0.1 } } }).outcome).toBe(
      "fail",
    );
  });

  it("have a caution that is never stricter than their pass", () => {
    const eased = finding(
      belowCutoff({ "product-above-cutoff": { pass: { min: 0.9 } } }),
      "product-above-cutoff",
    );
    expect(eased).toMatchObject({ outcome: "pass", pass: { min: 0.9 }, caution: { min: 0.9 } });
  });

  it("judge the time where they limit only the time, whatever the count rate", () => {
    const counted = oneFilter({}, selectedIon("A", 500, { dwell_ms: 8, countRate_perS: 10 }));
    expect(finding(counted, "dwell-time", "counts").outcome).toBe("fail");
    const byTime = under(counted, { "dwell-time": { pass: { min: 10 } } });
    expect(finding(byTime, "dwell-time", "dwell")).toMatchObject({ outcome: "caution", value: 8 });
  });

  it("are named in the answer, or said to be the defaults", () => {
    expect(signedOff(sound()).criteria).toBeNull();
    expect(signedOff(sound({})).criteria).toEqual({ id: "house-limits", revision: "2" });
  });

  it("have one member for each check of the catalogue and take no other", () => {
    for (const { id } of CHECKS) {
      expect(SignOffRequest.safeParse(sound({ [id]: { required: true } })).success, id).toBe(true);
    }
    const misspelt = { ...sound(), criteria: { id: "x", revision: "1", checks: { "edge-margins": {} } } };
    expect(SignOffRequest.safeParse(misspelt).success).toBe(false);
  });
});

describe("required checks", () => {
  it("count by default as far as the data make them computable", () => {
    const answer = signedOff(sound());
    expect(answer.verdict).toBe("pass");
    const lacking = answer.findings.filter(({ outcome }) => outcome === "indeterminate");
    expect(lacking.length).toBeGreaterThan(0);
    expect(lacking.every(({ required }) => !required)).toBe(true);
  });

  it("make the verdict indeterminate where they lack an input, and then are not listed as not shown", () => {
    const answer = signedOff(sound({ "rf-cycles": { required: true } }));
    expect(answer.verdict).toBe("indeterminate");
    expect(answer.notShown.map(({ check }) => check)).not.toContain("rf-cycles");
    expect(answer.verdictStatement).toMatch(/^At least one required check lacks an input/);
  });

  it("let a failing check stand outside the verdict, which then names it", () => {
    const answer = signedOff(belowCutoff({ "product-above-cutoff": { required: false } }));
    expect(answer.verdict).toBe("pass");
    expect(answer.outcomeCounts.fail).toBe(1);
    expect(answer.verdictStatement).toContain("failing but not counted: product-above-cutoff");
  });

  it("leave out what is not required by default", () => {
    const optional = CHECKS.filter(({ requiredByDefault }) => !requiredByDefault).map(({ id }) => id);
    expect(optional).toEqual(["scan-shift", "cell-well-depth", "peak-tails"]);
  });
});

describe("the verdict", () => {
  const caution = request({ method: method([transition("A", 500, 64)]) });

  it("is the worst of fail, indeterminate, caution and pass", () => {
    const verdict = (of: SignOffRequest, checks?: Criteria["checks"]) => signedOff(under(of, checks)).verdict;
    expect(verdict(sound())).toBe("pass");
    expect(verdict(caution)).toBe("caution");
    expect(verdict(caution, { "rf-cycles": { required: true } })).toBe("indeterminate");
    expect(verdict(belowCutoff(), { "rf-cycles": { required: true } })).toBe("fail");
  });

  it("is indeterminate where nothing counts", () => {
    const nothing = Object.fromEntries(CHECKS.map(({ id }) => [id, { required: false }]));
    expect(signedOff(sound(nothing)).verdict).toBe("indeterminate");
  });

  it("says what a pass means and what it does not show", () => {
    expect(signedOff(sound()).verdictStatement).toBe(
      "Every required check met its limit; not shown: supply-headroom, rf-cycles, cell-well-depth, pause-time, points-across-peak and peak-tails.",
    );
  });
});

describe("a waiver", () => {
  const answer = signedOff(belowCutoff({ "product-above-cutoff": { required: true, waiver: WAIVER } }));

  it("takes the check out of the verdict and never hides the outcome", () => {
    expect(answer.verdict).toBe("pass");
    const waived = answer.findings.find(({ check }) => check === "product-above-cutoff")!;
    expect(waived).toMatchObject({ outcome: "fail", required: false });
    expect(answer.outcomeCounts.fail).toBe(1);
  });

  it("is listed with its reason, its reference and the worst outcome", () => {
    expect(answer.waivers).toEqual([{ check: "product-above-cutoff", worstOutcome: "fail", ...WAIVER }]);
    expect(answer.verdictStatement).toContain("waived: product-above-cutoff");
  });

  it("is listed where there was nothing to waive", () => {
    const idle = signedOff(sound({ "peak-tails": { waiver: WAIVER } }));
    expect(idle.waivers).toEqual([{ check: "peak-tails", worstOutcome: null, ...WAIVER }]);
  });
});
