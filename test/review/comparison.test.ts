import { describe, expect, test } from "vitest";
import { TRANSFER_EXAMPLE } from "../../services/http/examples/transfer.ts";
import { comparisonErrors, comparisonOf } from "../../services/review/comparison.ts";
import { ComparisonAnswer, type ComparisonRequest } from "../../services/review/comparison-schema.ts";
import type { SignOffRequest } from "../../services/review/sign-off-schema.ts";
import { ION_GUIDE } from "../reference/worked-examples.ts";
import { ENGINE, requestOf, throughJson } from "./record/recorded-method.ts";

const other = (base: SignOffRequest, changed: SignOffRequest, more: Partial<ComparisonRequest> = {}) => {
  const cases = [
    { label: "base", ...base },
    { label: "other", ...changed },
  ];
  return ComparisonAnswer.parse(comparisonOf({ cases, ...more }, ENGINE)).others[0]!;
};
const altered = (request: SignOffRequest, change: (copy: SignOffRequest) => void): SignOffRequest => {
  const copy = throughJson(request);
  change(copy);
  return copy;
};

/** A single mass filter of a tune report with one peak, and one ion in its middle. */
function filterWith(observedMz: number, at: "edges" | "half-height" = "edges"): SignOffRequest {
  return {
    instrument: {
      id: "bench",
      revision: "1",
      stages: [
        {
          name: "MF",
          role: "mass-filter",
          operatingPoint: {
            by: "measured-peaks",
            peaks: [{ setMz: 500, observedMz, width: { value: 0.7, as: "mz", at } }],
          },
        },
      ],
    },
    method: {
      id: "one-ion",
      revision: "1",
      polarity: "positive",
      timing: { mode: "dwell" },
      acquisition: [
        { id: "A", kind: "selected-ion", stage: "MF", ion: { mz: 500 }, dwell_ms: 20, pause_ms: 5 },
      ],
    },
  };
}

test("the same twice differs in nothing, and every setting that is known carries over", () => {
  const same = other(filterWith(500), filterWith(500));
  expect(same).toMatchObject({ inputChanged: [], findings: [], settings: [], settingsCarriedOver: 1 });
  expect(same.findingsUnchanged).toBeGreaterThan(5);
});

describe("a transfer to another instrument", () => {
  test("moves the cutoff of a cell to the values of the worked example, across other names of the stages", () => {
    const [transferred] = comparisonOf(TRANSFER_EXAMPLE, ENGINE).others;
    expect(transferred).toMatchObject({
      verdict: "fail",
      inputChanged: ["instrument"],
      settingsCarriedOver: 2,
    });
    const [setting] = transferred!.settings;
    expect(setting).toMatchObject({ carriesOver: false, reason: "cutoff-moved" });
    // Gerlich, Adv. Chem. Phys. 82 (1992) 1, for the formula; cutoffs recomputed to one decimal.
    expect(setting!.base!.cutoffMz!.toFixed(1)).toBe(String(ION_GUIDE[0].cutoff));
    expect(setting!.other!.cutoffMz!.toFixed(1)).toBe(String(ION_GUIDE[1].cutoff));
    expect(transferred!.findings.filter(({ direction }) => direction === "worse")).toMatchObject([
      {
        check: "product-above-cutoff",
        changed: ["outcome", "value"],
        base: { stage: "q2", outcome: "caution" },
        other: { stage: "cell", outcome: "fail" },
      },
    ]);
    expect(transferred!.statement).toContain("The verdict goes from caution to fail against north bench.");
  });

  test("tells by how much of its width a window moved, and lets it carry over within the stated fraction", () => {
    // The peak is observed 0.14 higher: a fifth of the width of 0.7.
    const strict = other(filterWith(500), filterWith(500.14));
    expect(strict.settings).toHaveLength(1);
    expect(strict.settings[0]).toMatchObject({ carriesOver: false, reason: "window-moved" });
    expect(strict.settings[0]!.shiftOfWidth).toBeCloseTo(0.2, 9);
    expect(other(filterWith(500), filterWith(500.14), { withinOfWidth: 0.21 })).toMatchObject({
      settings: [],
      settingsCarriedOver: 1,
    });
    // 0.09 of the width is within the tenth that holds when the request states none.
    expect(other(filterWith(500), filterWith(500.063)).settingsCarriedOver).toBe(1);
  });

  test("does not compare a width between the edges with one at half height", () => {
    expect(other(filterWith(500), filterWith(500, "half-height")).settings).toMatchObject([
      { carriesOver: null, reason: "other-height", shiftOfWidth: null },
    ]);
  });
});

describe("a change under control", () => {
  const base = requestOf(3);

  test("of the criteria shows the findings whose limits or outcomes are others, and none else", () => {
    const changed = altered(base, ({ criteria }) => {
      criteria!.revision = "5";
      criteria!.checks["dwell-time"] = { pass: { min: 11.5 }, caution: { min: 1 } };
    });
    const { inputChanged, findings, settings } = other(base, changed);
    expect(inputChanged).toEqual(["criteria"]);
    expect(settings.filter(({ carriesOver }) => carriesOver === false)).toEqual([]);
    // Dwell times of 10, 11 and 12 ms against a limit that went from 5 to 11.5 ms.
    expect(
      findings.map(({ check, acquisition, changed, direction }) => [check, acquisition, changed, direction]),
    ).toEqual([
      ["dwell-time", "T-0", ["outcome", "limits"], "worse"],
      ["dwell-time", "T-1", ["outcome", "limits"], "worse"],
      ["dwell-time", "T-2", ["limits"], "same"],
    ]);
    expect(findings[0]).toMatchObject({
      base: { outcome: "pass", value: 10, pass: { min: 5, max: null } },
      other: { outcome: "caution", value: 10, pass: { min: 11.5, max: null } },
    });
  });

  test("of the method shows what came and what went", () => {
    const changed = altered(base, ({ method }) => {
      method.acquisition[2]!.id = "T-new";
    });
    const { inputChanged, findings, settings } = other(base, changed);
    expect(inputChanged).toEqual(["method"]);
    const of = (change: string) => findings.filter(({ changed }) => changed.includes(change as "added"));
    expect(new Set(of("removed").map(({ acquisition }) => acquisition))).toEqual(new Set(["T-2"]));
    expect(new Set(of("added").map(({ acquisition }) => acquisition))).toEqual(new Set(["T-new"]));
    expect(of("removed").length).toBe(of("added").length);
    expect(settings.map(({ acquisition, reason }) => `${acquisition} ${reason}`)).toContain(
      "T-2 only-in-base",
    );
    expect(settings.map(({ acquisition, reason }) => `${acquisition} ${reason}`)).toContain(
      "T-new only-in-other",
    );
  });

  test("of an ion's m/z compares its findings instead of taking them for others", () => {
    const changed = altered(base, ({ method }) => {
      Object.assign(method.acquisition[0]!, { product: { mz: 59.5 } });
    });
    const { findings } = other(base, changed);
    expect(findings.flatMap(({ changed }) => changed)).not.toContain("added");
    expect(findings.find(({ check }) => check === "product-above-cutoff")).toMatchObject({
      acquisition: "T-0",
      direction: "same",
      changed: ["value"],
    });
  });

  test("that makes it better says so", () => {
    const worse = altered(base, ({ method }) => {
      Object.assign(method.acquisition[0]!, { dwell_ms: 0.5 });
    });
    expect(other(worse, base).findings.filter(({ direction }) => direction === "better")).toMatchObject([
      { check: "dwell-time", base: { outcome: "fail" }, other: { outcome: "pass" } },
    ]);
  });
});

test("every case obeys the rules of a sign-off, and has a name of its own", () => {
  const broken = altered(requestOf(2), ({ method }) => {
    method.acquisition[1]!.id = method.acquisition[0]!.id;
  });
  const cases = [
    { label: "same", ...requestOf(1) },
    { label: "same", ...broken },
  ];
  expect(comparisonErrors({ cases }).map(({ pointer, code }) => [pointer, code])).toEqual([
    ["/cases/1/label", "not-unique"],
    ["/cases/1/method/acquisition/1/id", "not-unique"],
  ]);
});
