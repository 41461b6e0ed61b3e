import {
  type Client,
  createClient,
  type RequestOf,
  RodsetConnectionError,
  RodsetError,
  RodsetProblem,
} from "@rodset/sdk";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { type Deviation, expectWithin, relativeError } from "../measured-bound.ts";
import { PASSBANDS, STABILITY_POINTS } from "../reference/tables.ts";
import { type RunningService, startService } from "../running-service.ts";

let service: RunningService;
let client: Client;

beforeAll(async () => {
  service = await startService();
  client = createClient({ baseUrl: service.address });
});
afterAll(() => service.stop());

const askedIn = (form: {
  as: "zero-to-peak" | "peak-to-peak";
  between: "pole-and-ground" | "pole-and-pole";
}) => {
  const factor = (form.as === "peak-to-peak" ? 2 : 1) * (form.between === "pole-and-pole" ? 2 : 1);
  const dcFactor = form.between === "pole-and-pole" ? 2 : 1;
  return ([r0, f, U, V]: (typeof PASSBANDS.settings)[number]): RequestOf<"passband"> => ({
    rodSet: { fieldRadius_mm: r0 * 1e3, frequency_MHz: f / 1e6 },
    drive: { rf: { volts: V * factor, ...form }, dc: { volts: U * dcFactor, between: form.between } },
  });
};

describe("the service, asked through the SDK", () => {
  it.each([
    { as: "zero-to-peak", between: "pole-and-ground" },
    { as: "peak-to-peak", between: "pole-and-pole" },
  ] as const)("gives the reference passbands for volts $as, $between", async (form) => {
    const deviations: Deviation[] = [];
    for (const row of PASSBANDS.settings) {
      const { passbands } = await client.passband(askedIn(form)(row));
      const [passband] = passbands;
      const at = `U ${row[2]}, V ${row[3]}`;
      deviations.push({ at, error: relativeError(passband!.mzLow, row[7]) });
      deviations.push({ at, error: relativeError(passband!.mzHigh!, row[8]) });
    }
    expectWithin(2e-15, deviations);
  });

  it("finds every reference point (a, q) in one request stable or not as the table says", async () => {
    const { results } = await client.stability({
      given: "points",
      points: STABILITY_POINTS.map(([a, q]) => ({ a, q })),
    });
    expect(results.map(({ x, y }) => [x.stable, y.stable])).toEqual(
      STABILITY_POINTS.map(([, , , , stableX, stableY]) => [stableX === 1, stableY === 1]),
    );
  });

  it("answers a question that takes nothing, with options as the only argument", async () => {
    const { version } = await client.about({ timeout_ms: 5_000 });
    expect(version).toMatch(/^\d+\.\d+\.\d+$/);
  });

  it("puts a request into the query where the operation takes one, also for another form", async () => {
    const { regions, box } = await client.stabilityRegions({ aMin: 0, aMax: 0.25, qMax: 1 });
    expect(box).toEqual({ aMin: 0, aMax: 0.25, qMin: 0, qMax: 1 });
    expect(regions.map(({ region }) => region.name)).toEqual(["first"]);
    expect((await client.stabilityRegions({}, { timeout_ms: 5_000 })).regions).toHaveLength(6);
    const diagram = await client.form("stabilityRegions", "image/svg+xml", { qMax: 1 });
    expect(diagram).toMatch(/^<svg .*viewBox/);
  });

  it("answers as text where an operation has another form", async () => {
    const page = await client.form("signOffChecks", "text/markdown");
    const { checks } = await client.signOffChecks();
    for (const { id } of checks) expect(page).toContain(id);
  });

  it("throws a problem that names every wrong member by its pointer", async () => {
    const asked = client.passband({
      rodSet: { fieldRadius_mm: -4, frequncy_MHz: 1.2 },
      drive: { rf: { volts: 1, as: "zero-to-peak" } },
    } as unknown as RequestOf<"passband">);
    const problem = await asked.then(
      () => expect.unreachable(),
      (error: unknown) => error as RodsetProblem,
    );
    expect(problem).toBeInstanceOf(RodsetProblem);
    expect(problem).toBeInstanceOf(RodsetError);
    expect(problem).toMatchObject({
      name: "RodsetProblem",
      status: 422,
      code: "invalid-request",
      retryAfter_s: null,
    });
    expect(problem.errors.map(({ pointer, code }) => `${pointer} ${code}`).sort()).toEqual([
      "/drive/rf/between missing-member",
      "/rodSet/fieldRadius_mm out-of-range",
      "/rodSet/frequency_MHz missing-member",
      "/rodSet/frequncy_MHz unknown-member",
    ]);
    for (const { pointer, detail } of problem.errors)
      expect(problem.message).toContain(`${pointer}: ${detail}`);
    await expect.poll(() => service.log.some((line) => line.requestId === problem.requestId)).toBe(true);
  });

  it("shows how many errors were left out", async () => {
    const points = Array.from({ length: 30 }, () => ({ a: 0 })) as { a: number; q: number }[];
    await expect(client.stability({ given: "points", points })).rejects.toMatchObject({
      errors: { length: 20 },
      errorsOmitted: 10,
      message: expect.stringMatching(/and 10 more$/),
    });
  });

  it("throws a problem for a body over the limit", async () => {
    const points = Array.from({ length: 60_000 }, () => ({ a: 0.1, q: 0.7 }));
    await expect(client.stability({ given: "points", points })).rejects.toMatchObject({
      name: "RodsetProblem",
      status: 413,
      code: "body-too-large",
    });
  });

  it("keeps a path in the address of the service, as behind a proxy", async () => {
    const behind = createClient({ baseUrl: `${service.address}/no-such-place/` });
    await expect(behind.about()).rejects.toMatchObject({
      name: "RodsetProblem",
      status: 404,
      code: "not-found",
    });
    expect((await createClient({ baseUrl: new URL(service.address) }).about()).version).toBeDefined();
  });

  it("is stopped by SIGTERM with exit status 0, and cannot be reached afterwards", async () => {
    const other = await startService();
    const asking = createClient({ baseUrl: other.address });
    await asking.about();
    expect(await other.stop()).toBe(0);
    const failure = await asking.about().catch((error: unknown) => error);
    expect(failure).toBeInstanceOf(RodsetConnectionError);
    expect(failure).toMatchObject({ reason: "unreachable" });
  });
});
