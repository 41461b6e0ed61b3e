import { describe, expect, it } from "vitest";
import type { CellRf } from "../../services/review/instrument.ts";
import {
  collisionCell,
  dc,
  edges,
  finding,
  findings,
  instrument,
  massFilter,
  method,
  RODS,
  request,
  rf,
  scan,
  selectedIon,
  signedOff,
  stated,
  transition,
  tripleQuadrupole,
} from "./laboratory.ts";

/** The RF-only limit of stability, q = 0.908046 (Dawson 1976; computed table of regions). */
const LIMIT_Q = 0.908046333734578;

const cutoffs = (
  cell: Parameters<typeof collisionCell>[0],
  ...transitions: ReturnType<typeof transition>[]
) =>
  signedOff(
    request({
      instrument: tripleQuadrupole(cell === undefined ? {} : { q2: cell }),
      method: method(transitions.length > 0 ? transitions : [transition("A", 500, 200)]),
    }),
  )
    .settings.filter(({ stage }) => stage === "q2")
    .map(({ cutoffMz }) => cutoffMz);

describe("the cell's low-mass cutoff", () => {
  it.each<{ name: string; rf: CellRf; cutoff: number; rodSet?: typeof RODS }>([
    // m_cut = 1.076597931e7 V/(f^2 r0^2) (Hz, m; recomputed).
    {
      name: "fixed volts",
      rf: { mode: "fixed", rf: rf(100) },
      rodSet: RODS,
      cutoff: (1.076597931e7 * 100) / (1e12 * 0.00417 * 0.00417),
    },
    { name: "a cutoff", rf: { mode: "cutoff", mz: 75 }, cutoff: 75 },
    { name: "q of the precursor", rf: { mode: "precursor-q", q: 0.25 }, cutoff: (500 * 0.25) / LIMIT_Q },
    { name: "q of the product", rf: { mode: "product-q", q: 0.4 }, cutoff: (200 * 0.4) / LIMIT_Q },
    {
      name: "a table",
      rf: {
        mode: "table",
        points: [
          { mz: 600, cutoffMz: 100 },
          { mz: 400, cutoffMz: 60 },
        ],
      },
      cutoff: 80,
    },
  ])("follows from $name", ({ rf, cutoff, rodSet }) => {
    const [value] = cutoffs({ rf, ...(rodSet === undefined ? {} : { rodSet }) });
    expect(Math.abs(value! / cutoff - 1)).toBeLessThan(1e-9);
  });

  it("follows the set m/z, not the ion's", () => {
    const set = transition("A", 500, 200, { setPrecursorMz: 499.8 });
    expect(cutoffs({ rf: { mode: "precursor-q", q: 0.25 } }, set)[0]).toBeCloseTo(
      (499.8 * 0.25) / LIMIT_Q,
      9,
    );
  });

  it("does not follow from a table beyond its ends", () => {
    const beyond = request({
      instrument: tripleQuadrupole({ q2: { rf: { mode: "table", points: [{ mz: 300, cutoffMz: 60 }] } } }),
    });
    expect(finding(beyond, "product-above-cutoff")).toMatchObject({
      outcome: "indeterminate",
      missing: ["/instrument/stages/1/rf/points"],
    });
  });

  it("is each acquisition's own where it sets the cell, and what would pass is named there", () => {
    const own = transition("own", 500, 84, { cell: { rf: { mode: "cutoff", mz: 90 } } });
    const both = request({ method: method([transition("common", 500, 84), own]) });
    const [common, set] = findings(both, "product-above-cutoff");
    expect(common!.outcome).toBe("pass");
    expect(set).toMatchObject({ outcome: "fail", passesIf: { input: "/method/acquisition/1/cell/rf/mz" } });
    expect(set!.passesIf!.max).toBeCloseTo(70, 7);
  });

  it("marks what it knows: stated, or computed from volts and q", () => {
    const evidence = (cell: CellRf) =>
      finding(
        request({ instrument: tripleQuadrupole({ q2: { rf: cell, rodSet: RODS } }) }),
        "product-above-cutoff",
      ).evidence;
    expect(evidence({ mode: "cutoff", mz: 60 })).toBe("stated");
    expect(evidence({ mode: "fixed", rf: rf(100) })).toBe("computed");
    expect(evidence({ mode: "precursor-q", q: 0.2 })).toBe("computed");
  });

  it("names the volts of the request's own reading that would pass", () => {
    const peakToPeak = { volts: 800, as: "peak-to-peak", between: "pole-and-ground" } as const;
    const found = finding(
      request({
        instrument: tripleQuadrupole({ q2: { rf: { mode: "fixed", rf: peakToPeak }, rodSet: RODS } }),
      }),
      "product-above-cutoff",
    );
    expect(found.passesIf).toMatchObject({ input: "/instrument/stages/1/rf/rf/volts", min: null, unit: "V" });
    // 200 / 1.2 = 166.7 wants 269.2 V zero-to-peak.
    expect(found.passesIf!.max!).toBeCloseTo(
      (2 * ((200 / 1.2) * 1e12 * 0.00417 * 0.00417)) / 1.076597931e7,
      4,
    );
  });
});

describe("a cell of more than two pole pairs", () => {
  const hexapole = (cell: CellRf) =>
    request({
      instrument: tripleQuadrupole({
        q2: { rf: cell, rodSet: { ...RODS, polePairs: 3 }, maxRadialEnergy_eVPerCharge: 0.5 },
      }),
    });

  it("has no cutoff and no q, but a depth", () => {
    const found = signedOff(hexapole({ mode: "fixed", rf: rf(100) })).findings;
    const outcomes = (check: string) =>
      found.filter((each) => each.check === check).map(({ outcome }) => outcome);
    expect(outcomes("product-above-cutoff")).toEqual(["not-applicable"]);
    expect(outcomes("precursor-q-in-cell")).toEqual(["not-applicable"]);
    // 9/16 e V^2/(m r0^2 W^2) 0.8^4 against q V/4 0.64: 9 x 0.64 / 4 = 1.44 times the quadrupole's 1.80 eV (Gerlich 1992).
    const depth = found.find(({ quantity }) => quantity === "precursor-depth-over-energy")!;
    expect(depth.value! * 0.5).toBeCloseTo(1.44 * 0.64 * 2.81, 1);
  });

  it("does not get volts from a cutoff or a q, which it has not", () => {
    for (const mode of [{ mode: "cutoff", mz: 60 } as const, { mode: "precursor-q", q: 0.2 } as const]) {
      expect(finding(hexapole(mode), "cell-well-depth", "product-depth-over-energy")).toMatchObject({
        outcome: "indeterminate",
        missing: ["/instrument/stages/1/rf"],
      });
    }
  });
});

describe("weak confinement", () => {
  it("is the depth's to judge where the depth is known", () => {
    const q = (over: Parameters<typeof collisionCell>[0]) =>
      finding(
        request({ instrument: tripleQuadrupole({ q2: { rf: { mode: "precursor-q", q: 0.01 }, ...over } }) }),
        "precursor-q-in-cell",
      );
    expect(q({})).toMatchObject({ outcome: "caution", pass: { min: 0.02, max: 0.7 } });
    expect(q({ rodSet: RODS, maxRadialEnergy_eVPerCharge: 0.1 })).toMatchObject({
      outcome: "pass",
      pass: { min: null, max: 0.7 },
    });
  });

  it("fails as impossible without any RF, and a little RF is what would do", () => {
    const off = request({
      instrument: tripleQuadrupole({ q2: { rf: { mode: "fixed", rf: rf(0) }, rodSet: RODS } }),
    });
    const found = finding(off, "product-above-cutoff");
    expect(found).toMatchObject({
      outcome: "fail",
      value: null,
      passesIf: { input: "/instrument/stages/1/rf/rf/volts" },
    });
    expect(found.passesIf!.min).toBeGreaterThan(0);
  });
});

describe("what a single filter selects in an instrument with a cell", () => {
  it("passes the cell whole, so that its own m/z is held against the cutoff", () => {
    const through = (mz: number) =>
      finding(request({ method: method([selectedIon("A", mz, { stage: "Q3" })]) }), "product-above-cutoff")
        .outcome;
    expect(through(100)).toBe("pass");
    expect(through(50)).toBe("fail");
  });
});

describe("rod sets that only pass ions", () => {
  const guide = { name: "guide", role: "ion-guide", rodSet: RODS, rf: rf(100) } as const;
  const rfOnly = massFilter("Q3", { mode: "rf-only", rodSet: RODS, rf: rf(100) });
  const over = (...stages: Parameters<typeof instrument>) =>
    findings(
      request({
        instrument: instrument(...stages),
        method: method([scan(80, 300, { id: "wide" }), selectedIon("light", 70)]),
      }),
      "product-above-cutoff",
      "ion-over-cutoff",
    );

  it("are judged by the lightest ion that the method sends through", () => {
    for (const stages of [
      [guide, massFilter("Q1")],
      [massFilter("Q1"), rfOnly],
    ] as const) {
      const [found, ...others] = over(...stages);
      expect(others).toEqual([]);
      // 100 V put the cutoff at 61.9 (recomputed): 70 / 61.9 = 1.13.
      expect(found).toMatchObject({ outcome: "caution", subject: { acquisition: "light" } });
      expect(found!.value).toBeCloseTo(70 / 61.9, 2);
    }
  });

  it("meet precursors before the cell and products behind it", () => {
    const stages = [guide, massFilter("Q1"), collisionCell(), { ...guide, name: "behind" }, massFilter("Q3")];
    const found = findings(
      request({ instrument: instrument(...stages), method: method([transition("A", 500, 90)]) }),
      "product-above-cutoff",
      "ion-over-cutoff",
    );
    expect(found.map(({ subject }) => [subject.stage, subject.ion])).toEqual([
      ["guide", "m/z 500"],
      ["behind", "m/z 90"],
    ]);
  });

  it("select nothing: a mass filter in mode rf-only has no other finding", () => {
    const { findings: all } = signedOff(
      request({ instrument: instrument(massFilter("Q1"), rfOnly), method: method([selectedIon("A", 500)]) }),
    );
    expect(all.filter(({ subject }) => subject.stage === "Q3").map(({ check }) => check)).toEqual([
      "product-above-cutoff",
    ]);
  });

  it("need their RF and a supply's headroom like any other stage", () => {
    const { rf: _, ...bare } = guide;
    expect(over(bare, massFilter("Q1"))[0]!.missing).toEqual(["/instrument/stages/0/rf"]);
    const supplied = request({
      instrument: instrument(
        { ...guide, supply: { rfMax: rf(105), dcMax: dc(1) } },
        massFilter("Q1", { operatingPoint: stated(edges(1)), rated: { mzLow: 5, mzHigh: 1000 } }),
      ),
      method: method([selectedIon("A", 500)]),
    });
    expect(finding(supplied, "supply-headroom", "rf-headroom")).toMatchObject({
      outcome: "fail",
      passesIf: { input: "/instrument/stages/0/supply/rfMax/volts" },
    });
  });
});
