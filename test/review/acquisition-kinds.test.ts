import { describe, expect, it } from "vitest";
import type { Acquisition } from "../../services/review/acquisition.ts";
import {
  edges,
  findings,
  halfHeight,
  method,
  request,
  scan,
  selectedIon,
  signedOff,
  stated,
  transition,
  tripleQuadrupole,
} from "./laboratory.ts";

const FILTER = { operatingPoint: stated(edges(1)), residence: { flightTime_us: 100 } };
const bench = tripleQuadrupole({ q1: FILTER, q3: FILTER });
const signedOffWith = (...acquisition: Acquisition[]) =>
  signedOff(request({ instrument: bench, method: method(acquisition) }));
const settings = (acquisition: Acquisition) =>
  signedOffWith(acquisition).settings.map(({ stage, ion, setMz, pointer }) => [
    stage,
    ion,
    setMz,
    pointer.replace("/method/acquisition/0/", ""),
  ]);

const RATE = { rate_mzPerS: 1000, pause_ms: 5 };

describe("settings of each kind of acquisition", () => {
  it("transition: the precursor before the cell, the product in it and behind it", () => {
    expect(settings(transition("A", 500, 200, { setProductMz: 200.1 }))).toEqual([
      ["Q1", "m/z 500", 500, "precursor"],
      ["Q3", "m/z 200", 200.1, "product"],
      ["q2", "m/z 200", 200.1, "product"],
    ]);
  });

  it("selected ion and scan: one filter, the cell passes the ion whole", () => {
    expect(settings(selectedIon("A", 300, { stage: "Q3" }))).toEqual([
      ["Q3", "m/z 300", 300, "ion"],
      ["q2", "m/z 300", 300, "ion"],
    ]);
    expect(settings(scan(100, 400))).toEqual([
      ["Q1", "m/z 100", 100, "mzFrom"],
      ["Q1", "m/z 400", 400, "mzTo"],
      ["q2", "m/z 100", 100, "mzFrom"],
      ["q2", "m/z 400", 400, "mzTo"],
    ]);
  });

  it("product scan: the precursor is held, the filter behind the cell scans", () => {
    const products: Acquisition = {
      id: "A",
      kind: "product-scan",
      precursor: { mz: 500 },
      mzFrom: 70,
      mzTo: 510,
      ...RATE,
    };
    expect(settings(products)).toEqual([
      ["Q1", "m/z 500", 500, "precursor"],
      ["Q3", "m/z 70", 70, "mzFrom"],
      ["Q3", "m/z 510", 510, "mzTo"],
      ["q2", "m/z 70", 70, "mzFrom"],
      ["q2", "m/z 510", 510, "mzTo"],
    ]);
  });

  it("precursor scan: the filter before the cell scans, the product is held", () => {
    const precursors: Acquisition = {
      id: "A",
      kind: "precursor-scan",
      product: { mz: 85 },
      mzFrom: 200,
      mzTo: 600,
      ...RATE,
    };
    expect(settings(precursors).slice(0, 3)).toEqual([
      ["Q1", "m/z 200", 200, "mzFrom"],
      ["Q1", "m/z 600", 600, "mzTo"],
      ["Q3", "m/z 85", 85, "product"],
    ]);
  });

  it("neutral-loss scan: both filters scan, the second lower by the loss", () => {
    const loss: Acquisition = {
      id: "A",
      kind: "neutral-loss-scan",
      lossMz: 18,
      mzFrom: 200,
      mzTo: 600,
      ...RATE,
    };
    expect(settings(loss).slice(0, 4)).toEqual([
      ["Q1", "m/z 200", 200, "mzFrom"],
      ["Q1", "m/z 600", 600, "mzTo"],
      ["Q3", "m/z 182", 182, "mzFrom"],
      ["Q3", "m/z 582", 582, "mzTo"],
    ]);
  });
});

describe("a scan", () => {
  const scans: Acquisition[] = [
    { id: "products", kind: "product-scan", precursor: { mz: 500 }, mzFrom: 55, mzTo: 510, ...RATE },
    { id: "precursors", kind: "precursor-scan", product: { mz: 85 }, mzFrom: 200, mzTo: 600, ...RATE },
    { id: "losses", kind: "neutral-loss-scan", lossMz: 18, mzFrom: 200, mzTo: 600, ...RATE },
    scan(55, 400),
  ];
  const answer = signedOffWith(...scans);
  const of = (check: string) =>
    answer.findings
      .filter((each) => each.check === check)
      .map(({ subject }) => [subject.acquisition, subject.stage, subject.ion]);

  it("is judged for its shift at the upper end of each filter that scans, where ions are slowest", () => {
    expect(of("scan-shift")).toEqual([
      ["products", "Q3", "m/z 510"],
      ["precursors", "Q1", "m/z 600"],
      ["losses", "Q1", "m/z 600"],
      ["losses", "Q3", "m/z 582"],
      ["scan", "Q1", "m/z 400"],
    ]);
  });

  it("has no ion whose distance from an edge could be judged, but those that it holds have", () => {
    expect(of("edge-margin")).toEqual([
      ["products", "Q1", "m/z 500"],
      ["precursors", "Q3", "m/z 85"],
    ]);
  });

  it("meets the cell's cutoff at its lower end", () => {
    const low = answer.findings.filter(
      ({ check, outcome }) => check === "product-above-cutoff" && outcome === "fail",
    );
    expect(low.map(({ subject }) => [subject.acquisition, subject.ion])).toEqual([
      ["products", "m/z 55"],
      ["scan", "m/z 55"],
    ]);
  });
});

describe("what an acquisition says of its ions", () => {
  it("names them by label where there is one", () => {
    const labelled = transition("A", 500, 200, { precursor: { mz: 500, label: "ostmoorin [M+H]+" } });
    const [found] = findings(request({ method: method([labelled]) }), "edge-margin");
    expect(found!.subject).toEqual({
      pointer: "/method/acquisition/0/precursor",
      acquisition: "A",
      stage: "Q1",
      ion: "ostmoorin [M+H]+",
    });
  });

  it("holds claims against both filters", () => {
    const claimed = transition("A", 500, 200, {
      precursorWidth: halfHeight(0.7),
      productWidth: halfHeight(1),
    });
    expect(
      findings(request({ method: method([claimed]) }), "window-width").map(({ subject, outcome }) => [
        subject.stage,
        outcome,
      ]),
    ).toEqual([
      ["Q1", "pass"],
      ["Q3", "fail"],
    ]);
  });
});
