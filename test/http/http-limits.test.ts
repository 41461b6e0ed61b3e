import { once } from "node:events";
import { createServer } from "node:http";
import { type AddressInfo, connect } from "node:net";
import request from "supertest";
import { describe, expect, it } from "vitest";
import { z } from "zod";
import { defineEndpoint, problemsOf } from "../../services/http/endpoint.ts";
import { stability } from "../../services/http/endpoints/stability.ts";
import { ENDPOINTS } from "../../services/http/endpoints.ts";
import { PROBLEMS } from "../../services/http/problems.ts";
import { problemIn, testApp } from "./test-app.ts";

const BODY = JSON.stringify(stability.examples["unit-mass-window"]!.request);

/** Endpoints that fail in ways which those of the service must not. */
const Answer = z.strictObject({ number: z.number() });
const probe = (path: `/${string}`, handler: () => z.input<typeof Answer>) =>
  defineEndpoint({
    operationId: path.slice(1),
    method: "post",
    path,
    tag: "Service",
    summary: "",
    description: "",
    request: z.strictObject({ items: z.array(z.number()).max(10) }),
    work: { unit: "items", of: ({ items }) => items.length, most: 3 },
    answer: Answer,
    examples: {},
    handler,
  });
const { app } = testApp({
  bodyLimit_kB: 20,
  endpoints: [
    ...ENDPOINTS,
    probe("/infinite", () => ({ number: 1 / 0 })),
    probe("/not-a-number", () => ({ number: Number.NaN })),
    probe("/more-than-agreed", () => ({ number: 1, secret: 2 }) as { number: number }),
    probe("/throws", () => {
      throw new TypeError("SMX-marker");
    }),
  ],
});

function post(path = "/v1/stability") {
  return request(app).post(path);
}

describe("the body of a request", () => {
  it.each([
    "application/json",
    "application/json; charset=utf-8",
    "Application/JSON;charset=UTF-8",
    'application/json; charset="utf-8"',
  ])("is taken as %s", async (mediaType) => {
    const response = await post().set("Content-Type", mediaType).send(BODY);
    expect(response.status, response.text).toBe(200);
  });

  it.each([
    "text/plain",
    "application/x-www-form-urlencoded",
    "application/json; charset=latin1",
    "application/json; profile=x",
    "application/problem+json",
    "application/jsonx",
  ])("is refused as %s", async (mediaType) => {
    expect(problemIn(await post().set("Content-Type", mediaType).send(BODY)).code).toBe(
      "unsupported-media-type",
    );
  });

  it("is refused without a media type", async () => {
    expect(problemIn(await post()).code).toBe("unsupported-media-type");
  });

  it.each(["gzip", "br", "x"])("is refused when it calls itself compressed with %s", async (encoding) => {
    const response = await post()
      .set("Content-Type", "application/json")
      .set("Content-Encoding", encoding)
      .send(BODY);
    expect(problemIn(response).code).toBe("unsupported-media-type");
  });

  it.each([
    ["cut off", BODY.slice(0, -1)],
    ["a text", '"text"'],
    ["a number", "5"],
    ["two documents", `${BODY}${BODY}`],
    ["with a comment", `// x\n${BODY}`],
    ["only a space", " "],
  ])("is no JSON object when it is %s", async (_case, body) => {
    const response = await post().set("Content-Type", "application/json").send(body);
    expect(problemIn(response)).toMatchObject({ status: 400, code: "malformed-json" });
  });

  it.each([{ "Content-Length": "0" }, { "Transfer-Encoding": "chunked" }])(
    "is no JSON object when it is empty: %o",
    async (framing) => {
      const problem = problemIn(
        await post()
          .set({ "Content-Type": "application/json", ...framing })
          .send(""),
      );
      expect(problem).toMatchObject({ status: 400, code: "malformed-json", detail: "The body is empty." });
    },
  );

  it("may be as large as the limit and not a byte larger", async () => {
    const filled = (bytes: number) => BODY.padEnd(bytes, " ");
    const send = (body: string) => post().set("Content-Type", "application/json").send(body);
    expect((await send(filled(20_000))).status).toBe(200);
    expect(problemIn(await send(filled(20_001)))).toMatchObject({ status: 413, code: "body-too-large" });
  });

  it("that never arrives whole is an interrupted-body, if anyone is left to hear it", async () => {
    const server = createServer(app).listen(0, "127.0.0.1");
    await once(server, "listening");
    const socket = connect((server.address() as AddressInfo).port, "127.0.0.1");
    socket.write(
      "POST /v1/stability HTTP/1.1\r\nHost: x\r\nContent-Type: application/json\r\nContent-Length: 99\r\n\r\n{",
    );
    socket.end();
    const chunks = await socket.toArray();
    server.close();
    // Node itself answers a request that breaks off: it never becomes a request of the application.
    expect(Buffer.concat(chunks).toString()).toMatch(/^(HTTP\/1\.1 400 Bad Request|)/);
  });
});

describe("paths and methods", () => {
  it.each(["/v1/nothing", "/v1/stability/", "/V1/stability", "/v1", "/livez", "/metrics", "/v1/%zz", "//"])(
    "answers 404 at %s",
    async (path) => {
      expect(problemIn(await request(app).get(path)).code).toBe("not-found");
    },
  );

  it.each(["get", "put", "delete", "patch"] as const)(
    "answers 405 with Allow to %s of a question",
    async (method) => {
      const response = await request(app)[method]("/v1/stability");
      expect(problemIn(response)).toMatchObject({ status: 405, code: "method-not-allowed" });
      expect(response.headers.allow).toBe("POST, OPTIONS");
    },
  );

  it.each(["/v1/about", "/openapi.json"])("answers 405 with Allow to a POST of %s", async (path) => {
    const response = await request(app).post(path).send({});
    expect(problemIn(response).code).toBe("method-not-allowed");
    expect(response.headers.allow).toBe("GET, HEAD, OPTIONS");
  });

  it.each([
    ["/v1/stability", "POST, OPTIONS"],
    ["/v1/about", "GET, HEAD, OPTIONS"],
  ])("answers OPTIONS of %s without a body", async (path, allow) => {
    const response = await request(app).options(path);
    expect(response.status).toBe(204);
    expect(response.headers.allow).toBe(allow);
    expect(response.text).toBe("");
  });

  it("answers HEAD like GET, without the body", async () => {
    const [head, get] = [await request(app).head("/v1/about"), await request(app).get("/v1/about")];
    expect(head.status).toBe(200);
    expect(head.text).toBeUndefined();
    expect(head.headers["content-length"]).toBe(get.headers["content-length"]);
    expect(head.headers["content-type"]).toBe("application/json");
  });
});

describe("the form of an answer", () => {
  it.each([
    [undefined, "application/json"],
    ["*/*", "application/json"],
    ["application/*", "application/json"],
    ["text/markdown", "text/markdown; charset=utf-8"],
    ["text/html, text/markdown;q=0.5, application/json;q=0.4", "text/markdown; charset=utf-8"],
    ["application/json;q=0.9, text/markdown;q=0.1", "application/json"],
  ])("for Accept: %s is %s", async (accept, expected) => {
    const asked = request(app).get("/v1/sign-off/checks");
    const response = await (accept === undefined ? asked : asked.set("Accept", accept));
    expect(response.headers["content-type"]).toBe(expected);
    expect(response.headers.vary).toBe("Accept");
  });

  it("is refused when the endpoint has none that is accepted", async () => {
    const response = await request(app).get("/v1/about").set("Accept", "text/csv");
    expect(problemIn(response)).toMatchObject({ status: 406, code: "not-acceptable" });
  });
});

describe("every answer", () => {
  it.each(["/v1/about", "/openapi.json", "/v1/nothing"])(
    "has the security headers and names no software: %s",
    async (path) => {
      const { headers } = await request(app).get(path);
      expect(headers).toMatchObject({
        "x-content-type-options": "nosniff",
        "content-security-policy": "default-src 'none'; frame-ancestors 'none'",
        "cache-control": "no-store",
        "referrer-policy": "no-referrer",
      });
      expect(headers["x-powered-by"]).toBeUndefined();
      expect(headers.etag).toBeUndefined();
    },
  );

  it("carries a plain request id of the caller, and else one of its own", async () => {
    const idFor = async (given: string) =>
      (await request(app).get("/v1/about").set("X-Request-Id", given)).headers["x-request-id"];
    expect(await idFor("LIMS-2026-000417")).toBe("LIMS-2026-000417");
    for (const unfit of ["short", "x".repeat(65), "name of a method", "a;b=c-d-e-f"]) {
      expect(await idFor(unfit)).toMatch(/^[0-9a-f-]{36}$/);
    }
  });

  it("is byte for byte the same for the same request", async () => {
    for (const { method, path, examples } of ENDPOINTS) {
      const { request: body } = Object.values(examples)[0]!;
      const once = () => (method === "get" ? request(app).get(path) : post(path).send(body as object));
      expect((await once()).text).toBe((await once()).text);
    }
  });
});

describe("a defect of the service", () => {
  it.each(["/infinite", "/not-a-number", "/more-than-agreed", "/throws"])(
    "at %s shows nothing of the inside",
    async (path) => {
      const response = await post(path).send({ items: [] });
      const problem = problemIn(response);
      expect(problem).toEqual({
        type: "/problems#internal-error",
        title: PROBLEMS["internal-error"].title,
        status: 500,
        detail: PROBLEMS["internal-error"].when,
        code: "internal-error",
        requestId: response.headers["x-request-id"],
      });
    },
  );
});

it("refuses more work than the endpoint admits, and says how much that is", async () => {
  const problem = problemIn(await post("/infinite").send({ items: [1, 2, 3, 4] }));
  expect(problem).toMatchObject({
    status: 422,
    code: "too-much-work",
    detail: "The request asks for 4 items; one request may ask for 3.",
  });
});

it("names every problem of the registry in some test or as the problem of some endpoint", () => {
  const outsideEndpoints = ["not-found", "method-not-allowed"];
  const known = new Set([...ENDPOINTS.flatMap(problemsOf), ...outsideEndpoints]);
  expect([...known].sort()).toEqual(Object.keys(PROBLEMS).sort());
});
