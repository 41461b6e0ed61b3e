import { describe, expect, it } from "vitest";
import { PASSBANDS } from "../reference/tables.ts";
import {
  dc,
  edges,
  finding,
  halfHeight,
  oneFilter,
  RODS,
  rf,
  selectedIon,
  signedOff,
  stated,
  tenthHeight,
} from "./laboratory.ts";

const windowOf = (request: ReturnType<typeof oneFilter>) => signedOff(request).settings[0]!.window;

describe("an operating point by measured peaks", () => {
  const tuned = (mz: number) =>
    oneFilter(
      {
        operatingPoint: {
          by: "measured-peaks",
          // Out of order on purpose.
          peaks: [
            { setMz: 300, observedMz: 300.2, width: halfHeight(0.9) },
            { setMz: 100, observedMz: 100, width: halfHeight(0.7) },
          ],
        },
      },
      selectedIon("A", mz),
    );

  it("runs on straight lines between the peaks, in offset and in width", () => {
    const window = windowOf(tuned(200))!;
    expect(window.mzLow).toBeCloseTo(200.1 - 0.4, 12);
    expect(window.mzHigh).toBeCloseTo(200.1 + 0.4, 12);
    expect(window).toMatchObject({ at: "half-height", evidence: "measured" });
  });

  it("holds the outermost peak beyond them, and says so", () => {
    const window = windowOf(tuned(500))!;
    expect(window.mzLow).toBeCloseTo(500.2 - 0.45, 12);
    expect(finding(tuned(500), "edge-margin").statement).toContain("outside the measured peaks (100 to 300)");
  });

  it("takes a width stated as resolution at the observed m/z", () => {
    const width = { value: 500, as: "resolution", at: "edges" } as const;
    const peak = { setMz: 500, observedMz: 501, width };
    const window = windowOf(oneFilter({ operatingPoint: { by: "measured-peaks", peaks: [peak] } }))!;
    expect(window.mzHigh - window.mzLow).toBeCloseTo(501 / 500, 12);
  });

  it("is unknown where the peaks' widths are taken at different heights", () => {
    const peaks = [
      { setMz: 100, observedMz: 100, width: halfHeight(0.7) },
      { setMz: 300, observedMz: 300, width: edges(0.7) },
    ];
    const found = finding(oneFilter({ operatingPoint: { by: "measured-peaks", peaks } }), "edge-margin");
    expect(found).toMatchObject({
      outcome: "indeterminate",
      missing: ["/instrument/stages/0/operatingPoint/peaks"],
    });
  });

  it("lets a width at half height stand for the wider one between the edges, and says so", () => {
    const at = (width: ReturnType<typeof halfHeight> | ReturnType<typeof tenthHeight>) =>
      finding(
        oneFilter({
          operatingPoint: { by: "measured-peaks", peaks: [{ setMz: 500, observedMz: 500, width }] },
        }),
        "edge-margin",
      );
    expect(at(halfHeight(0.7))).toMatchObject({ outcome: "pass", evidence: "measured" });
    expect(at(halfHeight(0.7)).value).toBeCloseTo(0.35, 12);
    expect(at(halfHeight(0.7)).statement).toContain("stands for the wider one between the edges");
    expect(at(tenthHeight(0.7))).toMatchObject({
      outcome: "indeterminate",
      missing: ["/instrument/stages/0/operatingPoint/peaks/0/width/value"],
    });
  });
});

describe("an operating point by drives", () => {
  const driven = (points: { mz: number; rfVolts: number; dcVolts: number }[], mz: number, rods = RODS) =>
    oneFilter(
      {
        rodSet: rods,
        operatingPoint: {
          by: "drives",
          points: points.map((each) => ({
            mz: each.mz,
            drive: { rf: rf(each.rfVolts), dc: dc(each.dcVolts) },
          })),
        },
      },
      selectedIon("A", mz),
    );

  it("has the passband of an independent computation (see the header of the table)", () => {
    const settings = PASSBANDS.settings.filter(([, , , , , , , , , , , resolution]) => resolution < 2000);
    expect(settings.length).toBeGreaterThan(15);
    for (const [r0, f, dcVolts, rfVolts, , , , mzLow, mzHigh, centre] of settings) {
      const rods = { ...RODS, fieldRadius_mm: r0 * 1e3, frequency_MHz: f / 1e6 };
      const window = windowOf(driven([{ mz: centre, rfVolts, dcVolts }], centre, rods))!;
      expect(Math.abs(window.mzLow / mzLow - 1)).toBeLessThan(1e-10);
      expect(Math.abs(window.mzHigh / mzHigh - 1)).toBeLessThan(1e-10);
    }
  });

  const line = [
    { mz: 100, rfVolts: 125.52, dcVolts: 20.8 },
    { mz: 500, rfVolts: 627.6, dcVolts: 105.2 },
  ];

  it("runs on straight lines between the points and answers in their convention", () => {
    const { drive } = signedOff(driven(line, 300)).settings[0]!;
    expect(drive!.rf).toMatchObject({ as: "zero-to-peak", between: "pole-and-ground" });
    expect(drive!.rf.volts).toBeCloseTo(376.56, 9);
    expect((drive!.dc as { volts: number }).volts).toBeCloseTo(63, 9);
  });

  it("extends its outermost line, and says so", () => {
    expect(finding(driven(line, 700), "edge-margin").statement).toContain(
      "outside the drive points (100 to 500)",
    );
  });

  it("does not carry a single point to another m/z", () => {
    expect(finding(driven(line.slice(1), 300), "edge-margin")).toMatchObject({
      outcome: "indeterminate",
      missing: ["/instrument/stages/0/operatingPoint/points/1"],
    });
  });

  it("does not extend a line below 0 V", () => {
    const steep = [
      { mz: 100, rfVolts: 10, dcVolts: 1 },
      { mz: 500, rfVolts: 627.6, dcVolts: 105.2 },
    ];
    expect(finding(driven(steep, 50), "edge-margin").missing).toEqual([
      "/instrument/stages/0/operatingPoint/points/2",
    ]);
  });

  it("lacks the DC where none is stated, and the rods where they are not known", () => {
    const points = [{ mz: 500, drive: { rf: rf(600) } }];
    expect(
      finding(oneFilter({ rodSet: RODS, operatingPoint: { by: "drives", points } }), "edge-margin").missing,
    ).toEqual(["/instrument/stages/0/operatingPoint/points/0/drive/dc"]);
    const rodless = oneFilter({
      operatingPoint: { by: "drives", points: [{ mz: 500, drive: { rf: rf(600), dc: dc(90) } }] },
    });
    expect(finding(rodless, "edge-margin").missing).toEqual(["/instrument/stages/0/rodSet"]);
  });

  it.each([
    { dcVolts: 0, says: "none is selected" },
    { dcVolts: 120, says: "above the apex" },
  ])(
    "selects nothing with $dcVolts V DC: the ion fails, and the DC that would do is named",
    ({ dcVolts, says }) => {
      const found = finding(driven([{ mz: 500, rfVolts: 627.6, dcVolts }], 500), "edge-margin");
      expect(found).toMatchObject({ outcome: "fail", value: null, margin: null, evidence: "computed" });
      expect(found.statement).toContain(says);
      expect(found.passesIf!.min).toBeGreaterThan(90);
      expect(found.passesIf!.max).toBeLessThan(105.34);
    },
  );
});

describe("an operating point by a drive law", () => {
  it("is the straight line U = slope V - offset between the points that the RF names", () => {
    const between = { volts: 2.512, as: "zero-to-peak", between: "pole-and-pole" } as const;
    const law = oneFilter({
      rodSet: RODS,
      operatingPoint: { by: "drive-law", rfPerMz: between, dcSlope: 0.168, dcOffset_V: 0.5 },
    });
    const { drive } = signedOff(law).settings[0]!;
    // 1256 V between the poles at m/z 500; 0.168 x 1256 - 0.5 = 210.508.
    expect(drive!.rf).toMatchObject({ as: "zero-to-peak", between: "pole-and-pole" });
    expect(drive!.rf.volts).toBeCloseTo(1256, 9);
    expect(drive!.dc).toMatchObject({ between: "pole-and-pole" });
    expect((drive!.dc as { volts: number }).volts).toBeCloseTo(210.508, 9);
  });
});

describe("an operating point that is only stated", () => {
  it("is centred on the set m/z, and everything that follows from it is marked as stated", () => {
    const claimed = oneFilter(
      {
        rodSet: RODS,
        operatingPoint: stated(edges(1)),
        residence: { rfCycles: 200 },
        supply: { rfMax: rf(900), dcMax: dc(150) },
      },
      selectedIon("A", 500, { setMz: 500.1 }),
    );
    expect(windowOf(claimed)).toEqual({ mzLow: 499.6, mzHigh: 500.6, at: "edges", evidence: "stated" });
    for (const check of ["edge-margin", "apex-margin", "rf-cycles"]) {
      expect(finding(claimed, check).evidence).toBe("stated");
    }
    expect(finding(claimed, "supply-headroom", "rf-headroom").evidence).toBe("stated");
    expect(finding(claimed, "edge-margin").statement).toContain("only claimed");
  });

  it("takes the method's claim in its place where there is one, and judges no width by itself", () => {
    const claimed = oneFilter(
      { operatingPoint: stated(edges(1)) },
      selectedIon("A", 500, { width: edges(2) }),
    );
    expect(windowOf(claimed)).toMatchObject({ mzLow: 499, mzHigh: 501 });
    expect(finding(claimed, "window-width").outcome).toBe("not-applicable");
  });
});
