import fc from "fast-check";
import { describe, expect, it } from "vitest";
import type { Method } from "../../services/review/method.ts";
import { scheduleOf } from "../../services/review/resolve/schedule.ts";
import {
  finding,
  findings,
  method,
  request,
  scan,
  type Transition,
  transition,
  tripleQuadrupole,
} from "./laboratory.ts";

const peak = { chromatographicPeakWidth: { value_s: 6, at: "base" as const } };
const window = (start_min: number, end_min: number) => ({ retention: { start_min, end_min } });
const cycle = (cycle_ms: number, dwellMin_ms: number, dwellMax_ms: number): Method["timing"] => ({
  mode: "cycle",
  cycle_ms,
  dwellMin_ms,
  dwellMax_ms,
});
const untimed = ({ dwell_ms: _, ...rest }: Transition): Transition => rest;

describe("a schedule", () => {
  it("has one moment where nothing has a retention window", () => {
    const { moments } = scheduleOf(method([transition("A", 500, 200), transition("B", 600, 200)]));
    expect(moments).toEqual([
      { start_min: null, end_min: null, active: [0, 1], cycle_ms: 30, sharedDwell_ms: null },
    ]);
  });

  it("changes where a window starts or ends; what has no window always runs", () => {
    const { moments } = scheduleOf(
      method([
        transition("A", 500, 200, window(1, 3)),
        transition("B", 600, 200, window(2, 4)),
        transition("always", 700, 200),
        transition("C", 800, 200, window(6, 7)),
      ]),
    );
    expect(moments.map(({ start_min, end_min, active }) => [start_min, end_min, active])).toEqual([
      [1, 2, [0, 2]],
      [2, 3, [0, 1, 2]],
      [3, 4, [1, 2]],
      [4, 6, [2]],
      [6, 7, [2, 3]],
    ]);
  });

  it("does not count acquisitions together whose windows only touch", () => {
    const { moments } = scheduleOf(
      method([transition("A", 500, 200, window(1, 2)), transition("B", 600, 200, window(2, 3))]),
    );
    expect(moments.map(({ active }) => active)).toEqual([[0], [1]]);
  });

  it("has the concurrency of a count at random instants", () => {
    const windows = fc.array(fc.tuple(fc.integer({ min: 0, max: 40 }), fc.integer({ min: 1, max: 10 })), {
      minLength: 1,
      maxLength: 12,
    });
    fc.assert(
      fc.property(windows, fc.double({ min: 0, max: 50, noNaN: true }), (spans, instant) => {
        const scheduled = method(
          spans.map(([start, length], index) =>
            transition(`T${index}`, 500, 200, window(start / 2, (start + length) / 2)),
          ),
        );
        const active = spans.flatMap(([start, length], index) =>
          start / 2 < instant && instant < (start + length) / 2 ? [index] : [],
        );
        const moment = scheduleOf(scheduled).moments.find(
          ({ start_min, end_min }) => start_min! < instant && instant < end_min!,
        );
        if (!spans.some(([start, length]) => [start / 2, (start + length) / 2].includes(instant))) {
          expect(moment?.active ?? []).toEqual(active);
        }
      }),
    );
  });
});

describe("points across a peak", () => {
  const crowded = [
    transition("A", 500, 200, window(1, 3)),
    transition("B", 600, 210, window(2, 4)),
    transition("C", 700, 220, window(2.5, 2.8)),
  ];

  it("are counted at the worst moment, which is named", () => {
    const found = finding(request({ method: method(crowded, peak) }), "points-across-peak");
    // Three acquisitions of 10 + 5 ms from 2.5 to 2.8 min.
    expect(found.value).toBeCloseTo(6000 / 45, 10);
    expect(found.statement).toContain("3 acquisitions taking turns from 2.5 to 2.8 min");
  });

  it("lack every dwell time and pause that is not stated, by pointer", () => {
    const { pause_ms: _, ...noPause } = crowded[1]!;
    const bare = request({ method: method([untimed(crowded[0]!), noPause, crowded[2]!]) });
    expect(finding(bare, "points-across-peak").missing).toEqual([
      "/method/chromatographicPeakWidth",
      "/method/acquisition/0/dwell_ms",
      "/method/acquisition/1/pause_ms",
    ]);
  });

  it("count the time of a scan in the round", () => {
    const survey = method([transition("A", 500, 200), scan(100, 300, { rate_mzPerS: 1000 })], peak);
    // 10 + 5 ms, 200 ms of scan and its pause of 5 ms.
    expect(finding(request({ method: survey }), "points-across-peak").value).toBeCloseTo(6000 / 220, 10);
  });

  it("follow a wanted cycle as long as the dwell times allow it", () => {
    const points = (timing: Method["timing"]) =>
      finding(request({ method: method(crowded.map(untimed), { ...peak, timing }) }), "points-across-peak");
    expect(points(cycle(500, 1, 500)).value).toBeCloseTo(12, 10);
    // Three dwell times of at least 300 ms and three pauses of 5.
    expect(points(cycle(500, 300, 500)).value).toBeCloseTo(6000 / 915, 10);
    expect(points(cycle(900, 1, 500)).passesIf).toEqual({
      input: "/method/timing/cycle_ms",
      min: null,
      max: expect.closeTo(600, 6) as number,
      unit: "ms",
    });
    expect(points(cycle(500, 300, 500)).passesIf!.input).toBe("/method/timing/dwellMin_ms");
  });

  it("ask for a wider peak where only the acquisitions' own times could change", () => {
    const slow = method([transition("A", 500, 200, { dwell_ms: 995 })], peak);
    expect(finding(request({ method: slow }), "points-across-peak").passesIf).toMatchObject({
      input: "/method/chromatographicPeakWidth/value_s",
      min: expect.closeTo(10, 6) as number,
    });
  });
});

describe("a dwell time shared by a cycle", () => {
  const shared = (timing: Method["timing"], over: Partial<Transition> = {}) =>
    findings(
      request({
        method: method(
          [
            untimed(transition("A", 500, 200, window(1, 3))),
            { ...untimed(transition("B", 600, 210, window(2, 4))), ...over },
          ],
          { timing },
        ),
      }),
      "dwell-time",
    );

  it("is the least that any moment leaves, and names the moment", () => {
    // Two in 30 ms with pauses of 5: 10 ms each; alone it would be 25.
    const [first] = shared(cycle(30, 1, 100));
    expect(first!.value).toBeCloseTo(10, 12);
    expect(first!.statement).toContain("2 acquisitions taking turns from 2 to 3 min");
  });

  it("keeps within the shortest and the longest dwell time", () => {
    expect(shared(cycle(1, 7, 100))[0]!.value).toBe(7);
    expect(shared(cycle(1000, 1, 50))[0]!.value).toBe(50);
  });

  it("leaves an acquisition the dwell time that it states itself", () => {
    const [first, second] = shared(cycle(40, 1, 100), { dwell_ms: 20 });
    expect(second!.value).toBe(20);
    expect(first!.value).toBeCloseTo(10, 12);
  });
});

describe("consecutive acquisitions", () => {
  const settled = { settle_ms: 1, residence: { flightTime_us: 500 } };
  const crossTalk = (...acquisition: Transition[]) =>
    findings(
      request({
        instrument: tripleQuadrupole({
          q1: settled,
          q2: { clearing_ms: 10, residence: { flightTime_us: 500 } },
          q3: settled,
        }),
        method: method(acquisition),
      }),
      "pause-time",
    ).map(({ outcome }) => outcome);

  it("wrap: the last of a round comes before the first of the next", () => {
    expect(
      crossTalk(transition("A", 500, 200), transition("B", 700, 300), transition("C", 600, 200)),
    ).toEqual(["fail", "pass", "pass"]);
  });

  it("follow the schedule: what never runs at the same time does not disturb", () => {
    const apart = [transition("A", 500, 200, window(1, 2)), transition("B", 600, 200, window(3, 4))];
    expect(crossTalk(...apart)).toEqual(["pass", "pass"]);
    expect(crossTalk(transition("A", 500, 200, window(1, 3)), apart[1]!)).toEqual(["pass", "pass"]);
    expect(crossTalk(transition("A", 500, 200, window(1, 3.5)), apart[1]!)).toEqual(["fail", "fail"]);
  });

  it("become neighbours when the one between them is not running", () => {
    const between = transition("B", 700, 300, window(1, 2));
    expect(
      crossTalk(transition("A", 500, 200, window(1, 5)), between, transition("C", 600, 200, window(1, 5))),
    ).toEqual(["fail", "pass", "fail"]);
  });

  it("do not disturb where both have one precursor, or one runs alone", () => {
    expect(crossTalk(transition("A", 500, 200), transition("B", 500.1, 200))).toEqual(["pass", "pass"]);
    expect(crossTalk(transition("A", 500, 200))).toEqual(["pass"]);
  });

  it("lack the cell's clearing time only where it matters", () => {
    const lacking = (product: number) =>
      findings(
        request({
          instrument: tripleQuadrupole({
            q1: settled,
            q2: { residence: { flightTime_us: 500 } },
            q3: settled,
          }),
          method: method([transition("A", 500, 200), transition("B", 600, product)]),
        }),
        "pause-time",
      ).map(({ missing }) => missing);
    expect(lacking(200)).toEqual([
      ["/instrument/stages/1/clearing_ms"],
      ["/instrument/stages/1/clearing_ms"],
    ]);
    expect(lacking(300)).toEqual([[], []]);
  });

  it("need the flight through every stage, of the heaviest ion", () => {
    const filter = {
      settle_ms: 1,
      rodSet: { fieldRadius_mm: 4.17, frequency_MHz: 1, rodLength_mm: 200 },
      residence: { axialEnergy_eVPerCharge: 2 },
    };
    const found = finding(
      request({
        instrument: tripleQuadrupole({ q1: filter, q2: { residence: { flightTime_us: 500 } }, q3: filter }),
        method: method([transition("A", 500, 125)]),
      }),
      "pause-time",
    );
    // m/z 500 takes 227.6 us for 0.2 m at 2 eV (recomputed), m/z 125 half of it; settling 1 ms, the cell 0.5 ms.
    expect(5 / found.value!).toBeCloseTo(1 + 0.2276 + 0.5 + 0.1138, 3);
  });
});
