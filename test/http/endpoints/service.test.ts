import request from "supertest";
import { expect, it } from "vitest";
import { CAUTIONS } from "../../../services/contract/cautions.ts";
import { ERROR_CODES } from "../../../services/http/error-codes.ts";
import { PROBLEMS } from "../../../services/http/problems.ts";
import { CHECKS } from "../../../services/review/checks.ts";
import { testApp } from "../test-app.ts";

const { app } = testApp({ level: "silent", bodyLimit_kB: 77 });

it("GET /v1/about shows the limits that the service was started with, and the cautions", async () => {
  const { body } = await request(app).get("/v1/about");
  expect(body).toMatchObject({
    service: "rodset",
    constants: "CODATA 2022",
    limits: { body_kB: 77, itemsPerRequest: 1000 },
  });
  expect(body.cautions).toEqual(CAUTIONS);
});

it("GET /problems describes every problem and every error, as JSON and as a page with an anchor for each type", async () => {
  const { body } = await request(app).get("/problems");
  expect(body.problems.map(({ code }: { code: string }) => code)).toEqual(Object.keys(PROBLEMS));
  expect(body.errorsOfMembers.map(({ code }: { code: string }) => code)).toEqual(Object.keys(ERROR_CODES));
  const { text } = await request(app).get("/problems").set("Accept", "text/markdown");
  for (const code of Object.keys(PROBLEMS)) expect(text).toContain(`\n## ${code}\n`);
});

it("GET /v1/sign-off/checks lists the checks, as JSON and as a page", async () => {
  const { body } = await request(app).get("/v1/sign-off/checks");
  expect(body.checks.map(({ id }: { id: string }) => id)).toEqual(CHECKS.map(({ id }) => id));
  const { text } = await request(app).get("/v1/sign-off/checks").set("Accept", "text/markdown");
  for (const { id } of CHECKS) expect(text).toContain(`## ${id}\n`);
});
