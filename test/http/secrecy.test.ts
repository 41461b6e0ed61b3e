import request from "supertest";
import { describe, expect, it } from "vitest";
import { ENDPOINTS } from "../../services/http/endpoints.ts";
import { testApp } from "./test-app.ts";

const MARKER = "Sulfamarker-4711";

/** The request with the marker in place of one text, as the name of one member, or beside the members of one object. */
function* marked(node: unknown): Generator<unknown> {
  if (typeof node === "string") yield MARKER;
  if (typeof node !== "object" || node === null) return;
  if (!Array.isArray(node)) yield { ...node, [MARKER]: MARKER };
  for (const [name, value] of Object.entries(node)) {
    for (const other of marked(value)) {
      yield Array.isArray(node)
        ? node.map((item, at) => (String(at) === name ? other : item))
        : { ...node, [name]: other };
    }
    if (!Array.isArray(node)) yield { ...node, [name]: MARKER };
  }
}

const questions = ENDPOINTS.filter(({ method }) => method === "post");

describe("what a laboratory sends", () => {
  it.each(questions.map((endpoint) => [endpoint.operationId, endpoint] as const))(
    "never reaches the log of %s, whatever member it stands in",
    async (_name, { path, examples }) => {
      const { app, log } = testApp({ level: "debug" });
      let sent = 0;
      for (const example of Object.values(examples)) {
        for (const body of marked((example as { request: unknown }).request)) {
          const response = await request(app)
            .post(path)
            .send(body as object);
          expect(response.status, response.text).toBeLessThan(500);
          // A text of the payload may come back as the name of an unknown member and, accepted, in the answer itself.
          if (response.status === 422)
            expect(response.text.replaceAll(`/${MARKER}`, "").replaceAll(`"${MARKER} is`, "")).not.toContain(
              MARKER,
            );
          sent++;
        }
      }
      expect(log).toHaveLength(sent);
      expect(log.join("")).not.toContain(MARKER);
    },
  );

  it("never reaches the log from broken JSON, a wrong media type, a query, a path or a header", async () => {
    const { app, log } = testApp({ level: "debug", bodyLimit_kB: 1 });
    const json = () => request(app).post("/v1/stability").set("Content-Type", "application/json");
    await json().send(`{"given": ${MARKER}`);
    await json().send(`"${MARKER}"`);
    await json().send(`{"${MARKER}": "${"x".repeat(2000)}"}`);
    await request(app).post("/v1/stability").set("Content-Type", `text/${MARKER}`).send(MARKER);
    await request(app).get(`/v1/about?compound=${MARKER}`);
    await request(app).get(`/v1/${MARKER}`);
    await request(app)
      .get("/v1/about")
      .set("Accept", MARKER)
      .set("User-Agent", MARKER)
      .set("X-Request-Id", `${MARKER} `.repeat(9));
    expect(log).toHaveLength(7);
    expect(log.join("")).not.toContain(MARKER);
  });

  it("never reaches the log when the service fails over it", async () => {
    const first = questions[0]!;
    const failing = {
      ...first,
      handler: () => {
        throw new RangeError(`cannot compute ${MARKER}\n    ${MARKER}`);
      },
    };
    const { app, log } = testApp({ endpoints: [failing] });
    const response = await request(app).post(failing.path).send(Object.values(first.examples)[0]!.request);
    expect(response.status).toBe(500);
    expect(response.text).not.toContain(MARKER);
    const [defect, line] = log.map((each) => JSON.parse(each));
    expect(defect).toMatchObject({
      level: "error",
      msg: "defect",
      error: "RangeError",
      requestId: response.headers["x-request-id"],
    });
    expect(defect.at.length).toBeGreaterThan(2);
    expect(line).toMatchObject({ msg: "request", status: 500 });
    expect(log.join("")).not.toContain(MARKER);
  });
});

describe("the line of a request", () => {
  it("says which operation was reached, and how it went", async () => {
    const { app, log } = testApp();
    const response = await request(app).get("/v1/about").set("X-Request-Id", "LIMS-0815");
    expect(log.map((line) => JSON.parse(line))).toEqual([
      {
        level: "info",
        time: expect.stringMatching(/^\d{4}-\d\d-\d\dT/),
        operationId: "about",
        method: "GET",
        status: 200,
        duration_ms: expect.any(Number),
        bytes: Number(response.headers["content-length"]),
        requestId: "LIMS-0815",
        msg: "request",
      },
    ]);
  });
});
