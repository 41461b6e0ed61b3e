import request, { type Response } from "supertest";
import { describe, expect, it } from "vitest";
import { pointStability } from "../../../services/physics/stability.ts";
import { STABILITY_REGIONS } from "../../reference/tables.ts";
import { SECOND_REGION, THIRD_REGION_CORNERS } from "../../reference/worked-examples.ts";
import { expectClose } from "../close-to.ts";
import { problemIn, testApp } from "../test-app.ts";

const PATH = "/v1/stability-regions";
const SVG = "image/svg+xml";
const FIRST = { aMin: 0, aMax: 0.25, qMin: 0, qMax: 1 };

const { app } = testApp({ level: "silent" });

async function ask(query: object | string = {}, accept = "application/json"): Promise<Response> {
  return request(app).get(PATH).query(query).set("Accept", accept);
}

// biome-ignore lint/suspicious/noExplicitAny: tests read answers as a caller without types does.
async function regionsIn(query: object = {}): Promise<any> {
  const response = await ask(query);
  expect(response.status, response.text).toBe(200);
  return response.body;
}

async function diagram(query: object = {}): Promise<string> {
  const response = await ask(query, SVG);
  expect(response.headers["content-type"]).toBe("image/svg+xml; charset=utf-8");
  return (response.body as Buffer).toString("utf8");
}

async function errorsOf(query: object | string): Promise<[pointer: string, code: string][]> {
  const problem = problemIn(await ask(query));
  expect(problem).toMatchObject({ status: 422, code: "invalid-request" });
  return problem.errors!.map(({ pointer, code }) => [pointer, code]);
}

describe("GET /v1/stability-regions", () => {
  it("lists every region that is computed, each with the corners of an independent computation", async () => {
    // Corners at 50 digits (test/reference, stability regions); (2,1) and (3,0) lie beyond a = 12.
    const { regions, box, reason } = await regionsIn();
    expect(box).toEqual({ aMin: -12, aMax: 12, qMin: 0, qMax: 12 });
    expect(reason).toBeNull();
    const names = regions.map(({ region: { x, y, name } }: { region: Record<string, unknown> }) => [
      x,
      y,
      name,
    ]);
    expect(names).toEqual([
      [0, 0, "first"],
      [1, 0, "third"],
      [0, 1, null],
      [2, 0, null],
      [0, 2, null],
      [1, 1, "second"],
    ]);
    let compared = 0;
    for (const reference of STABILITY_REGIONS.regions) {
      const found = regions.find(
        ({ region: { x, y } }: { region: { x: number; y: number } }) =>
          x === reference.n_x && y === reference.n_y,
      );
      if (found === undefined) continue;
      const corner = (x_curve: string, y_curve: string) => {
        const { q, a } = reference.corners_all_real_a.find(
          (one) => one.x_curve === x_curve && one.y_curve === y_curve,
        )!;
        return { q, a };
      };
      const { inner, highTip, outer, lowTip } = found.corners;
      const { n_x: x, n_y: y } = reference;
      for (const [{ q, a }, expected] of [
        [inner, corner(`a=a_${x}(q)`, `a=-a_${y}(q)`)],
        [highTip, corner(`a=b_${x + 1}(q)`, `a=-a_${y}(q)`)],
        [outer, corner(`a=b_${x + 1}(q)`, `a=-b_${y + 1}(q)`)],
        [lowTip, corner(`a=a_${x}(q)`, `a=-b_${y + 1}(q)`)],
      ] as const) {
        expectClose({ q, a }, expected, 1e-14);
        compared++;
      }
    }
    expect(compared).toBe(16);
  });

  it("prints the corners of the handbooks", async () => {
    // Dawson and Bingqi 1984; Du, Olney and Douglas 1997; recomputed to five digits.
    const { regions } = await regionsIn({ qMin: 2, aMin: 0 });
    const corners = (name: string) =>
      regions.find(({ region }: { region: { name: string } }) => region.name === name).corners;
    expect(corners("second").highTip.q).toBeCloseTo(SECOND_REGION.apexQ, 5);
    expect(corners("second").highTip.a).toBeCloseTo(SECOND_REGION.apexA, 5);
    expect(corners("third").highTip).toMatchObject({
      a: expect.closeTo(THIRD_REGION_CORNERS[0].a, 4),
      q: expect.closeTo(THIRD_REGION_CORNERS[0].q, 5),
    });
    expect(corners("third").lowTip).toMatchObject({
      a: expect.closeTo(THIRD_REGION_CORNERS[1].a, 4),
      q: expect.closeTo(THIRD_REGION_CORNERS[1].q, 4),
    });
  });

  it("draws four sides around each region, on which the plane named is at the edge of stability", async () => {
    const { regions } = await regionsIn({ pointsPerArc: 9 });
    for (const { arcs } of regions) {
      expect(arcs.map(({ lostTo }: { lostTo: string }) => lostTo)).toEqual(["y", "x", "y", "x"]);
      for (const [index, { points, lostTo, curve, characteristicExponent, chordError }] of arcs.entries()) {
        expect(points).toHaveLength(9);
        expect(points.at(-1)).toEqual(arcs[(index + 1) % 4].points[0]);
        expect(curve).toMatch(
          new RegExp(`^a = ${lostTo === "y" ? "−" : ""}[ab]_${characteristicExponent}\\(q\\)$`),
        );
        expect(chordError).toBeGreaterThan(0);
        for (const { q, a } of points.slice(1, -1)) {
          expect(Math.abs(pointStability(a, q)![lostTo as "x" | "y"].margin)).toBeLessThan(2e-12);
        }
      }
    }
  });

  it("says where a box reaches further than the list", async () => {
    expect(await regionsIn({ qMax: 20 })).toMatchObject({ reason: "outside-computed-domain" });
    expect((await regionsIn({ qMax: 20 })).regions).toHaveLength(6);
    expect(await regionsIn({ aMin: 5, aMax: 6, qMax: 1 })).toMatchObject({ regions: [], reason: null });
  });

  it.each([
    ["an unknown parameter", { aLow: 1 }, [["/aLow", "unknown-member"]]],
    ["a text", { aMin: "low" }, [["/aMin", "wrong-type"]]],
    ["an empty value", "aMin=", [["/aMin", "wrong-type"]]],
    ["a number that JSON does not write", "aMin=0x1", [["/aMin", "wrong-type"]]],
    ["a number out of range", { qMin: -1 }, [["/qMin", "out-of-range"]]],
    ["a number too large for a double", "qMax=1e999", [["/qMax", "out-of-range"]]],
    ["a box without height", { aMin: 1, aMax: 1 }, [["/aMax", "not-above"]]],
    ["a box against the default", { qMin: 13 }, [["/qMax", "not-above"]]],
    ["more points than are drawn", { pointsPerArc: 66 }, [["/pointsPerArc", "out-of-range"]]],
    ["half a point", { pointsPerArc: 2.5 }, [["/pointsPerArc", "not-whole"]]],
    ["a parameter twice", "aMin=0&aMin=1", [["/aMin", "duplicate-member"]]],
  ])("refuses %s", async (_case, query, expected) => {
    expect(await errorsOf(query)).toEqual(expected);
  });

  it("answers each query by itself, although answers without a request are kept", async () => {
    const wide = await regionsIn();
    const narrow = await regionsIn(FIRST);
    expect(narrow.regions).toHaveLength(1);
    expect(await regionsIn()).toEqual(wide);
  });
});

describe("the diagram", () => {
  it("names title, regions and axes, and tells its corners in words", async () => {
    const svg = await diagram(FIRST);
    expect(svg).toContain('role="img" aria-labelledby="title description"');
    expect(svg).toContain("Region first (0,0) has its corners (q, a) at (0, 0), (0.705996, 0.236994)");
    const texts = [...svg.matchAll(/<text[^>]*>([^<]*)<\/text>/g)].map(([, text]) => text);
    for (const text of ["q", "a", "0.25", "1.0", "first (0,0)", "0.70600, 0.23699"])
      expect(texts).toContain(text);
  });

  it("draws the apex where the axes say it is", async () => {
    const svg = await diagram(FIRST);
    const [, x, y] = svg.match(/<circle cx="([\d.]+)" cy="([\d.]+)"/)!.map(Number);
    const tick = (text: string) => {
      const [, at] = svg.match(
        new RegExp(`<text x="([\\d.]+)"[^>]*text-anchor="middle"[^>]*>${text}</text>`),
      )!;
      return Number(at);
    };
    const q = (x! - tick("0\\.0")) / (tick("1\\.0") - tick("0\\.0"));
    expect(q).toBeCloseTo(0.706, 4);
    const [, top, bottom] = svg.match(/<path d="M92 (\d+)H764V(\d+)H92Z"\/>\n/)!.map(Number);
    expect((0.25 * (bottom! - y!)) / (bottom! - top!)).toBeCloseTo(0.23699, 4);
  });

  it("is well-formed, without colour, style and script, and labels no two regions in one place", async () => {
    for (const query of [
      {},
      FIRST,
      { aMin: -4, aMax: 4, qMax: 4 },
      { aMin: 5, aMax: 6, qMax: 1 },
      { qMax: 90 },
    ]) {
      const svg = await diagram(query);
      const open = [...svg.matchAll(/<([a-zA-Z]+)[^>]*[^/]>/g)].length;
      expect([...svg.matchAll(/<\/[a-zA-Z]+>/g)]).toHaveLength(open);
      expect(
        /style=|<style|<script|NaN|Infinity|undefined|href/.test(svg.replaceAll("font-style=", "")),
      ).toBe(false);
      for (const [, colour] of svg.matchAll(/(?:fill|stroke)="([^"]+)"/g)) {
        expect(colour).toMatch(/^(?:none|black|white|#(..)\1\1)$/);
      }
      const labels = [...svg.matchAll(/<text x="([\d.]+)" y="([\d.]+)"[^>]*paint-order/g)].map(
        ([, x, y]) => `${x} ${y}`,
      );
      expect(new Set(labels).size).toBe(labels.length);
    }
    expect(await diagram({ aMin: 5, aMax: 6, qMax: 1 })).toContain("No region in this box");
  });
});
