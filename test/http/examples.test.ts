import request from "supertest";
import { describe, expect, it } from "vitest";
import type { Example } from "../../services/http/endpoint.ts";
import { ENDPOINTS } from "../../services/http/endpoints.ts";
import { expectClose } from "./close-to.ts";
import { testApp } from "./test-app.ts";

/**
 * Numbers of a source stand in the examples as the source prints them, one of them to 9 digits (the handbook's
 * constants). The worst deviation measured is 4.8e-10, of that one.
 */
const RELATIVE = 1e-9;

const { app } = testApp({ level: "silent" });

describe.each(ENDPOINTS.map((endpoint) => ({ ...endpoint, name: endpoint.operationId })))(
  "the examples of $name",
  (endpoint) => {
    const examples = Object.entries<Example<unknown, unknown>>(endpoint.examples);

    it.each(examples)("answers %s as documented", async (_name, example) => {
      const asked =
        endpoint.method === "get"
          ? request(app)
              .get(endpoint.path)
              .query(example.request as object)
          : request(app)
              .post(endpoint.path)
              .send(example.request as object);
      const response = await asked;
      expect(response.status, response.text).toBe(200);
      expectClose(response.body, JSON.parse(JSON.stringify(example.answer)), RELATIVE);
    });

    it("take at least one answer from somewhere else", () => {
      if (endpoint.request === null) return;
      expect(examples.some(([, { source }]) => source !== undefined)).toBe(true);
    });
  },
);
