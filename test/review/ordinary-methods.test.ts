import { describe, expect, it } from "vitest";
import { edges, finding, halfHeight, notPassing, signedOff, tenthHeight } from "./laboratory.ts";
import { chromatographicMethod, residualGasMethod, scheduledTransitions } from "./ordinary-methods.ts";

const ids = scheduledTransitions().map(({ id }) => id);

/** What a tune report and a cutoff cannot show, in an otherwise clean method of 60 transitions. */
const NOT_SHOWN_BY_A_TUNE_REPORT = [
  "voltage-convention apex-over-target Q1: not-applicable",
  "voltage-convention apex-over-target Q3: not-applicable",
  "rf-cycles cycles-squared-over-resolution Q1: indeterminate",
  "rf-cycles cycles-squared-over-resolution Q3: indeterminate",
  "scan-shift shift-over-width: not-applicable",
  "peak-tails abundance-sensitivity: not-applicable",
  ...ids.flatMap((id) => [
    `cell-well-depth precursor-depth-over-energy ${id} q2: indeterminate`,
    `cell-well-depth product-depth-over-energy ${id} q2: indeterminate`,
    `pause-time pause-over-needed ${id}: indeterminate`,
  ]),
];
/** What does not arise in a scan, and what a scan without a chromatogram leaves open. */
const NOT_SHOWN_BY_A_SCAN = [
  "set-mz set-against-ion filter: not-applicable",
  "window-width width-against-claim filter: not-applicable",
  "voltage-convention apex-over-target filter: not-applicable",
  "dwell-time dwell: not-applicable",
  "points-across-peak points: indeterminate",
  "peak-tails abundance-sensitivity: not-applicable",
];

const sorted = (...lines: (string | string[])[]) => lines.flat().sort();

describe("60 scheduled transitions on a triple quadrupole known only by its tune report", () => {
  it("come out clean", () => {
    const answer = signedOff(chromatographicMethod());
    expect(answer.verdict).toBe("pass");
    expect(notPassing(chromatographicMethod())).toEqual(sorted(NOT_SHOWN_BY_A_TUNE_REPORT));
    expect(answer.notShown.map(({ check, findings }) => [check, findings])).toEqual([
      ["rf-cycles", 1],
      ["rf-cycles", 1],
      ["cell-well-depth", 60],
      ["cell-well-depth", 60],
      ["pause-time", 60],
    ]);
    expect(answer.verdictStatement).toBe(
      "Every required check met its limit; not shown: rf-cycles, cell-well-depth, pause-time and peak-tails.",
    );
  });

  it("do not when one product lies below the cutoff and one average mass was typed in", () => {
    const defective = chromatographicMethod((transitions) =>
      transitions.map((each) => {
        if (each.id === "C1-2") return { ...each, product: { mz: 55.05 }, setProductMz: 55.05 };
        // 0.42 above the monoisotopic m/z, as an average mass lies at about m/z 600 (reserpine: 609.69 and 609.28).
        if (each.id === "C30-1") return { ...each, setPrecursorMz: 578.22 };
        return each;
      }),
    );
    expect(signedOff(defective).verdict).toBe("fail");
    expect(notPassing(defective)).toEqual(
      sorted(
        NOT_SHOWN_BY_A_TUNE_REPORT,
        "product-above-cutoff product-over-cutoff C1-2 q2: fail",
        "set-mz set-against-ion C30-1 Q1: fail",
        "edge-margin distance-to-edge C30-1 Q1: fail",
      ),
    );
  });

  it("do not when all run at once and one window is claimed wider than the filter's", () => {
    const defective = chromatographicMethod((transitions) =>
      transitions.map(({ retention: _, ...each }) =>
        each.id === "C7-1" ? { ...each, productWidth: halfHeight(1.2), dwell_ms: 0.5 } : each,
      ),
    );
    expect(signedOff(defective).verdict).toBe("fail");
    expect(notPassing(defective)).toEqual(
      sorted(
        NOT_SHOWN_BY_A_TUNE_REPORT,
        // 59 dwell times of 25 ms, one of 0.5 and 60 pauses of 3: a round of 1655.5 ms, 3.6 points across 6 s.
        "points-across-peak points: fail",
        "window-width width-against-claim C7-1 Q3: fail",
        "dwell-time dwell C7-1: fail",
      ),
    );
    expect(finding(defective, "points-across-peak").value).toBeCloseTo(6000 / 1655.5, 12);
  });
});

describe("a residual-gas scan m/z 1 to 100 at width 1.0 with a rated range", () => {
  it("comes out clean", () => {
    const answer = signedOff(residualGasMethod());
    expect(answer.verdict).toBe("pass");
    expect(notPassing(residualGasMethod())).toEqual(sorted(NOT_SHOWN_BY_A_SCAN));
  });

  it("does not when it goes beyond the rated range with ions that are too fast", () => {
    const defective = residualGasMethod({ residence: { axialEnergy_eVPerCharge: 80 } }, { mzTo: 150 });
    expect(signedOff(defective).verdict).toBe("fail");
    expect(notPassing(defective)).toEqual(
      sorted(
        NOT_SHOWN_BY_A_SCAN,
        "supply-headroom rated-range survey filter: fail",
        "rf-cycles cycles-squared-over-resolution survey filter: fail",
      ),
    );
  });

  it("does not when its claim is wider than the width of the tune and the pause is too short", () => {
    const defective = residualGasMethod(
      {
        operatingPoint: { by: "measured-peaks", peaks: [{ setMz: 28, observedMz: 28, width: edges(0.7) }] },
        settle_ms: 6,
      },
      { width: edges(1) },
    );
    expect(signedOff(defective).verdict).toBe("fail");
    expect(notPassing(defective)).toEqual(
      sorted(
        NOT_SHOWN_BY_A_SCAN.filter((each) => !each.startsWith("window-width")),
        "window-width width-against-claim survey filter: fail",
        "window-width width-against-claim survey filter: fail",
        "pause-time pause-over-needed survey: fail",
      ),
    );
  });

  it("is not judged by a width at a tenth of the height where the narrower one would be the careful side", () => {
    const widths = {
      operatingPoint: {
        by: "measured-peaks" as const,
        peaks: [{ setMz: 28, observedMz: 28, width: tenthHeight(1) }],
      },
    };
    const found = finding(residualGasMethod(widths), "apex-margin");
    expect(found.outcome).toBe("indeterminate");
    expect(found.missing).toEqual(["/instrument/stages/0/operatingPoint/peaks/0/width/value"]);
  });
});
