import { describe, expect, it } from "vitest";
import { signOffErrors } from "../../services/review/sign-off-rules.ts";
import { SignOffRequest } from "../../services/review/sign-off-schema.ts";
import {
  collisionCell,
  instrument,
  massFilter,
  method,
  RODS,
  request,
  rf,
  scan,
  selectedIon,
  transition,
  tripleQuadrupole,
} from "./laboratory.ts";
import { withInput } from "./with-input.ts";

const GOOD = request({
  instrument: tripleQuadrupole({
    q1: { rated: { mzLow: 5, mzHigh: 1000 }, rodSet: RODS },
    q2: { rodSet: RODS },
  }),
  method: method(
    [
      transition("A", 500, 200, {
        retention: { start_min: 1, end_min: 2 },
        compound: "c",
        neighbours: [{ ion: { mz: 501 }, fractionOfTarget: 1 }],
      }),
      scan(100, 400),
      { id: "loss", kind: "neutral-loss-scan", lossMz: 18, mzFrom: 200, mzTo: 600, rate_mzPerS: 1000 },
    ],
    {
      compounds: [{ id: "c" }, { id: "d" }],
      timing: { mode: "cycle", cycle_ms: 500, dwellMin_ms: 5, dwellMax_ms: 50 },
    },
  ),
  checks: { "edge-margin": { pass: { min: 0.2 }, caution: { min: 0.1 } } },
});

const codes = (request: SignOffRequest) => signOffErrors(request).map(({ code, pointer }) => [code, pointer]);

describe("rules between members of a sign-off", () => {
  it("have nothing against a sound request", () => {
    expect(codes(SignOffRequest.parse(GOOD))).toEqual([]);
  });

  it.each<{ code: string; pointer: string; change?: string; value: unknown }>([
    { code: "not-unique", pointer: "/instrument/stages/2/name", value: "Q1" },
    { code: "not-unique", pointer: "/method/acquisition/1/id", value: "A" },
    { code: "not-unique", pointer: "/method/compounds/1/id", value: "c" },
    { code: "not-found", pointer: "/method/acquisition/0/compound", value: "unknown" },
    { code: "not-found", pointer: "/method/acquisition/1/stage", value: "q2" },
    { code: "not-above", pointer: "/method/timing/dwellMax_ms", value: 4 },
    { code: "not-above", pointer: "/method/acquisition/0/retention/end_min", value: 1 },
    { code: "not-above", pointer: "/method/acquisition/1/mzTo", value: 100 },
    { code: "not-below", pointer: "/method/acquisition/2/lossMz", value: 200 },
    { code: "not-above", pointer: "/instrument/stages/0/rated/mzHigh", value: 5 },
    { code: "missing-member", pointer: "/instrument/stages/0/operatingPoint", value: undefined },
    {
      code: "ion-trap-not-computed",
      pointer: "/instrument/stages/2/role",
      change: "/instrument/stages/2",
      value: { name: "trap", role: "ion-trap", z0_mm: 7.83 },
    },
    {
      code: "charge-is-zero",
      pointer: "/method/acquisition/0/product/charge",
      change: "/method/acquisition/0/product",
      value: { mz: 200, charge: 0 },
    },
    {
      code: "charge-against-polarity",
      pointer: "/method/acquisition/0/precursor/charge",
      change: "/method/acquisition/0/precursor",
      value: { mz: 500, charge: -1 },
    },
    {
      code: "charge-against-polarity",
      pointer: "/method/acquisition/0/neighbours/0/ion/charge",
      change: "/method/acquisition/0/neighbours/0/ion",
      value: { mz: 501, charge: -2 },
    },
    {
      code: "formula-not-computed",
      pointer: "/method/acquisition/0/precursor/formula",
      change: "/method/acquisition/0/precursor",
      value: { formula: "C33H40N2O9", adduct: "[M+H]+" },
    },
    {
      code: "formula-not-computed",
      pointer: "/method/acquisition/0/product/neutralLoss",
      change: "/method/acquisition/0/product",
      value: { neutralLoss: "H2O" },
    },
    { code: "needs-two-pole-pairs", pointer: "/instrument/stages/0/rodSet/polePairs", value: 3 },
    {
      code: "waveform-not-computed",
      pointer: "/instrument/stages/0/rodSet/waveform",
      value: { shape: "rectangular", dutyCycle: 0.6, coupling: "dc" },
    },
    {
      code: "waveform-not-computed",
      pointer: "/instrument/stages/1/rodSet/waveform",
      value: { shape: "rectangular", dutyCycle: 0.5, coupling: "ac" },
    },
    {
      code: "limits-crossed",
      pointer: "/criteria/checks/edge-margin/caution",
      change: "/criteria/checks/edge-margin/caution/min",
      value: 0.3,
    },
  ])("$code at $pointer", ({ code, pointer, change = pointer, value }) => {
    const changed = withInput(GOOD, change, value);
    expect(codes(SignOffRequest.parse(JSON.parse(JSON.stringify(changed))))).toContainEqual([code, pointer]);
  });

  it("take an RF-only mass filter without an operating point", () => {
    const guide = massFilter("Q3", { mode: "rf-only", rf: rf(100) });
    const { operatingPoint: _, ...bare } = guide;
    const passed = request({
      instrument: instrument(massFilter("Q1"), bare),
      method: method([selectedIon("A", 500)]),
    });
    expect(codes(passed)).toEqual([]);
  });

  it.each([
    { stages: [massFilter("Q1"), massFilter("Q3")], lacks: "a collision cell" },
    { stages: [collisionCell(), massFilter("Q3")], lacks: "a mass filter before it" },
    {
      stages: [massFilter("Q1"), collisionCell(), massFilter("Q3", { mode: "rf-only" })],
      lacks: "a mass filter behind it",
    },
  ])("want the stages of a transition: $lacks", ({ stages, lacks }) => {
    const errors = signOffErrors(request({ instrument: instrument(...stages) }));
    expect(errors.map(({ code, pointer }) => [code, pointer])).toEqual([
      ["stages-do-not-fit", "/method/acquisition/0/kind"],
    ]);
    expect(errors[0]!.detail).toContain(lacks);
  });

  it("judge a charge by the acquisition's own polarity", () => {
    const negative = (polarity: "positive" | "negative", charge: number) =>
      codes(
        request({
          method: method([transition("A", 500, 200, { polarity, precursor: { mz: 500, charge } })]),
        }),
      );
    expect(negative("negative", -1)).toEqual([]);
    expect(negative("negative", 1)).toEqual([
      ["charge-against-polarity", "/method/acquisition/0/precursor/charge"],
    ]);
    expect(codes(request({ method: method([transition("A", 500, 200)], { polarity: "negative" }) }))).toEqual(
      [],
    );
  });

  it("refuse limits of criteria that no value can meet", () => {
    const checks = { "voltage-convention": { pass: { min: 1.1, max: 0.9 } } };
    expect(codes(request({ checks }))).toEqual([
      ["not-above", "/criteria/checks/voltage-convention/pass/max"],
    ]);
  });

  it.each([
    { check: "apex-margin", pass: { min: 50, minOfTolerance: 2 }, caution: { min: 50, minOfTolerance: 3 } },
    { check: "dwell-time", pass: { min: 5, minCounts: 10 }, caution: { min: 5, minCounts: 20 } },
    { check: "set-mz", pass: { maxOfWidth: 0.3 }, caution: { maxOfWidth: 0.2 } },
  ])("see each part of a limit: $check", ({ check, pass, caution }) => {
    expect(codes(request({ checks: { [check]: { pass, caution } } }))).toEqual([
      ["limits-crossed", `/criteria/checks/${check}/caution`],
    ]);
  });
});
