import { describe, expect, test } from "vitest";
import { recordOf, throughJson } from "./recorded-method.ts";
import { record, resealed, verified } from "./verified-records.ts";

describe("a planted change of engine is not reproduced and named", () => {
  const position = record.result.findings.findIndex(({ check }) => check === "product-above-cutoff");

  test("in the value of a finding", async () => {
    const planted = throughJson(record);
    planted.engine.version = "0.0.9";
    const finding = planted.result.findings[position]!;
    const right = finding.value!;
    finding.value = right * (1 + 1e-7);
    const answer = await verified(await resealed(planted));
    expect(answer).toMatchObject({
      intact: true,
      seal: "valid",
      reproduced: false,
      notReproducedBecause: "result-differs",
      differences: [
        { pointer: `/result/findings/${position}/value`, recorded: finding.value, recomputed: right },
      ],
    });
    expect(answer.statement).toContain("This version finds otherwise in one place.");
  });

  test("in a window, a bound, an outcome, a verdict and a count", async () => {
    const planted = throughJson(record);
    planted.result.settings[0]!.window!.mzHigh += 1e-5;
    planted.result.findings[position]!.pass.min! += 0.01;
    planted.result.findings[0]!.outcome = "not-applicable";
    planted.result.verdict = "caution";
    planted.result.outcomeCounts.pass++;
    const { differences } = await verified(await resealed(planted));
    expect(differences.map(({ pointer }) => pointer).sort()).toEqual([
      "/result/findings/0/outcome",
      `/result/findings/${position}/pass/min`,
      "/result/outcomeCounts/pass",
      "/result/settings/0/window/mzHigh",
      "/result/verdict",
    ]);
  });

  test("where it found less, or more, than this version does", async () => {
    const planted = throughJson(record);
    const [first] = planted.result.findings.splice(0, 1);
    const invented = { ...first!, check: "rod-polish" };
    planted.result.findings.push(invented);
    const { differences } = await verified(await resealed(planted));
    expect(differences).toHaveLength(2);
    expect(differences[0]).toMatchObject({
      pointer: `/result/findings/${planted.result.findings.length - 1}`,
    });
    expect(differences[0]!.recorded).toContain("rod-polish");
    expect(differences[0]).not.toHaveProperty("recomputed");
    expect(differences[1]).toMatchObject({ pointer: "/result/findings/-" });
    expect(differences[1]).not.toHaveProperty("recorded");
  });

  test("up to a hundred times, and the rest is counted", async () => {
    const planted = throughJson(recordOf(60));
    for (const finding of planted.result.findings) finding.unit = "furlong";
    const answer = await verified(await resealed(planted));
    expect(answer.differences).toHaveLength(100);
    expect(answer.differencesOmitted).toBe(planted.result.findings.length - 100);
  });
});

describe("what may differ between two machines or two wordings is reproduced", () => {
  test("sentences", async () => {
    const worded = throughJson(record);
    worded.result.verdictStatement = "In other words.";
    for (const finding of worded.result.findings) {
      finding.statement = "In other words.";
      finding.basis = "In other words.";
    }
    for (const group of worded.result.notShown) group.statement = "In other words.";
    expect(await verified(await resealed(worded))).toMatchObject({ intact: true, reproduced: true });
  });

  test("the last digits of every number, on the scale of what was subtracted", async () => {
    const rounded = throughJson(record);
    for (const finding of rounded.result.findings) {
      if (finding.value !== null) finding.value *= 1 + 1e-14;
      // A margin of bound and value has their rounding, however small it is.
      if (finding.margin !== null) finding.margin += 1e-14 * Math.abs(finding.value!);
    }
    expect(await verified(await resealed(rounded))).toMatchObject({ reproduced: true });
  });

  test("but no number by more than the tolerance that the answer states", async () => {
    const { tolerance } = await verified(record);
    expect(tolerance).toBe(1e-9);
    for (const [factor, reproduced] of [
      [1 + 0.5 * tolerance, true],
      [1 + 2 * tolerance, false],
    ] as const) {
      const changed = throughJson(record);
      changed.result.settings[0]!.window!.mzLow *= factor;
      expect((await verified(await resealed(changed))).reproduced, String(factor)).toBe(reproduced);
    }
  });
});

describe("a record of an earlier version, from before a check was added", () => {
  const added = "precursor-q-in-cell";
  const earlier = (version: string) => {
    const kept = throughJson(record);
    kept.engine.version = version;
    const without = kept.result.findings.filter(({ check }) => check !== added);
    for (const { check, outcome } of kept.result.findings)
      if (check === added) kept.result.outcomeCounts[outcome]--;
    kept.result.findings = without;
    kept.result.notShown = kept.result.notShown.filter(({ check }) => check !== added);
    return kept;
  };

  test("is reproduced, and the check is named as one it had not", async () => {
    const answer = await verified(await resealed(earlier("0.0.9")));
    expect(answer).toMatchObject({ reproduced: true, differences: [], checksAdded: [added] });
    expect(answer.statement).toContain(`it has checks that the record's did not: ${added}.`);
  });

  test("is not reproduced where it claims to be of this version", async () => {
    const { reproduced, checksAdded, differences } = await verified(
      await resealed(earlier(record.engine.version)),
    );
    expect({ reproduced, checksAdded }).toEqual({ reproduced: false, checksAdded: [] });
    expect(differences.some(({ recomputed }) => String(recomputed).includes(added))).toBe(true);
  });

  test("is held to every check that it has", async () => {
    const kept = earlier("0.0.9");
    const place = kept.result.findings.findIndex(({ check }) => check === "product-above-cutoff");
    kept.result.findings.splice(place, 1);
    expect((await verified(await resealed(kept))).reproduced).toBe(false);
  });

  test("is held to the members that it has, and not to new ones", async () => {
    const kept = throughJson(record);
    kept.engine.version = "0.0.9";
    for (const finding of kept.result.findings as { basis?: string; unit?: string }[]) delete finding.unit;
    expect(await verified(await resealed(kept))).toMatchObject({ reproduced: true, checksAdded: [] });
    kept.engine.version = record.engine.version;
    expect((await verified(await resealed(kept))).reproduced).toBe(false);
  });
});
