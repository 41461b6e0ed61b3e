import { describe, expect, it } from "vitest";
import {
  dc,
  edges,
  finding,
  findings,
  halfHeight,
  line,
  method,
  oneFilter,
  RODS,
  request,
  rf,
  scan,
  selectedIon,
  signedOff,
  stated,
  TUNE_REPORT,
  transition,
  tripleQuadrupole,
} from "./laboratory.ts";

/* What goes wrong in real laboratories (common practice, no source), each with the checks that catch it. */

const missed = (of: ReturnType<typeof request>) =>
  signedOff(of)
    .findings.filter(({ outcome }) => outcome === "fail" || outcome === "caution")
    .map(line);

describe("a sign-off catches", () => {
  it("a product below the cell's cutoff", () => {
    expect(missed(request({ method: method([transition("A", 500, 58)]) }))).toEqual([
      "product-above-cutoff product-over-cutoff A q2: fail",
    ]);
  });

  it("a cell RF tied to the precursor, so that the cutoff moves with it", () => {
    const tied = request({
      instrument: tripleQuadrupole({ q2: { rf: { mode: "precursor-q", q: 0.25 } } }),
      method: method([transition("light", 250, 84), transition("heavy", 900, 84)]),
    });
    expect(missed(tied)).toEqual(["product-above-cutoff product-over-cutoff heavy q2: fail"]);
    // 900 x 0.25 / 0.908 lies at 247.8; the light precursor leaves a cutoff of 68.8.
    expect(84 / findings(tied, "product-above-cutoff")[1]!.value!).toBeCloseTo(247.8, 1);
  });

  it("a window so narrow that drift empties it", () => {
    const narrow = { operatingPoint: stated(edges(0.2)), tolerances: { mzDriftBetweenTunes: 0.12 } };
    expect(missed(oneFilter(narrow))).toEqual(["edge-margin distance-to-edge A Q1: fail"]);
    expect(finding(oneFilter(narrow), "edge-margin").passesIf).toMatchObject({
      input: "/instrument/stages/0/operatingPoint/width/value",
    });
  });

  it("an average mass typed in", () => {
    // Reserpine [M+H]+: 609.28066 monoisotopic, average mass 609.69 (recomputed from IUPAC atomic masses).
    const typed = oneFilter({}, selectedIon("A", 609.28066, { setMz: 609.69 }));
    expect(missed(typed)).toEqual([
      "set-mz set-against-ion A Q1: fail",
      "edge-margin distance-to-edge A Q1: fail",
    ]);
  });

  it("a wrong adduct typed in", () => {
    // [M+Na]+ lies 21.98194 above [M+H]+ (recomputed).
    const typed = oneFilter({}, selectedIon("A", 609.28066, { setMz: 609.28066 + 21.98194 }));
    expect(missed(typed)).toEqual([
      "set-mz set-against-ion A Q1: fail",
      "edge-margin distance-to-edge A Q1: fail",
    ]);
  });

  it("a window in Da where m/z was meant: two charges halve it", () => {
    const doublyCharged = oneFilter(
      {
        operatingPoint: {
          by: "measured-peaks",
          peaks: [{ setMz: 500, observedMz: 500, width: halfHeight(0.35) }],
        },
      },
      { ...selectedIon("A", 500, { width: halfHeight(0.7) }), ion: { mz: 500, charge: 2 } },
    );
    expect(missed(doublyCharged)).toEqual(["window-width width-against-claim A Q1: fail"]);
  });

  it("a rod offset entered as U: pairs against ground tell U and offset apart", () => {
    const on = (drive: { pairX_V: number; pairY_V: number } | ReturnType<typeof dc>) =>
      oneFilter({
        rodSet: RODS,
        operatingPoint: { by: "drives", points: [{ mz: 500, drive: { rf: rf(627.6), dc: drive } }] },
      });
    // U 105.2 V on an offset of 20 V; the sum of both, 125.2 V, closes the window.
    expect(missed(on({ pairX_V: 125.2, pairY_V: -85.2 }))).toEqual([]);
    expect(missed(on(dc(125.2)))).toEqual([
      "edge-margin distance-to-edge A Q1: fail",
      "apex-margin margin-to-apex A Q1: fail",
    ]);
  });

  it("volts of another reading", () => {
    const doubled = oneFilter({
      rodSet: RODS,
      operatingPoint: {
        by: "drives",
        points: [{ mz: 500, drive: { rf: rf(2 * 627.9), dc: dc(2 * 104.9) } }],
      },
    });
    expect(missed(doubled)).toEqual([
      "edge-margin distance-to-edge A Q1: fail",
      "voltage-convention apex-over-target Q1: fail",
    ]);
  });

  it("cross-talk of consecutive transitions with one product", () => {
    const filter = { settle_ms: 1, residence: { flightTime_us: 100 } };
    const timed = (second: number) =>
      request({
        instrument: tripleQuadrupole({
          q1: filter,
          q2: { clearing_ms: 10, residence: { flightTime_us: 500 } },
          q3: filter,
        }),
        method: method([transition("A", 500, 200), transition("B", second, 200), transition("C", 700, 300)]),
      });
    expect(missed(timed(600))).toEqual(["pause-time pause-over-needed B: fail"]);
    expect(missed(timed(500.2))).toEqual([]);
  });

  it("too few points across a peak", () => {
    const many = Array.from({ length: 50 }, (_, index) => transition(`T${index}`, 300 + index, 150 + index));
    const fast = method(many, { chromatographicPeakWidth: { value_s: 3, at: "base" } });
    expect(missed(request({ method: fast }))).toEqual(["points-across-peak points: fail"]);
  });

  it("a scan that is faster than the flight", () => {
    const slowIons = { rodSet: RODS, residence: { axialEnergy_eVPerCharge: 1 }, operatingPoint: TUNE_REPORT };
    expect(missed(oneFilter(slowIons, scan(50, 500, { rate_mzPerS: 10_000 })))).toEqual([
      "scan-shift shift-over-width scan Q1: fail",
    ]);
  });

  it("a supply limit that is met only at the internal standard's m/z", () => {
    const supplied = oneFilter(
      { rodSet: RODS, operatingPoint: stated(edges(0.7)), supply: { rfMax: rf(800), dcMax: dc(140) } },
      selectedIon("analyte", 500),
      selectedIon("internal-standard", 630),
    );
    expect(missed(supplied)).toEqual([
      "supply-headroom rf-headroom internal-standard Q1: fail",
      "supply-headroom dc-headroom internal-standard Q1: caution",
    ]);
  });

  it("a window so closed that nothing passes, and says which DC would open it", () => {
    const closed = oneFilter({
      rodSet: RODS,
      operatingPoint: {
        by: "drives",
        points: [{ mz: 500, drive: { rf: rf(627.6), dc: { volts: -212, between: "pole-and-pole" } } }],
      },
    });
    expect(finding(closed, "edge-margin").statement).toContain("opens below 210.6774 V DC, pole-and-pole");
    for (const { passesIf } of [finding(closed, "edge-margin"), finding(closed, "apex-margin")]) {
      expect(passesIf).toMatchObject({
        input: "/instrument/stages/0/operatingPoint/points/0/drive/dc/volts",
        unit: "V",
      });
      // In the reading and with the sign of the request; the window opens at -2 x 0.1678437 x 627.6 V = -210.68 V.
      expect(passesIf!.min).toBeGreaterThan(-210.68);
      expect(passesIf!.max).toBeLessThan(0);
    }
  });
});
