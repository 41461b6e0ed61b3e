import { expect, it } from "vitest";
import { z } from "zod";
import { defineEndpoint } from "../../services/http/endpoint.ts";

const parts = {
  operationId: "twice",
  method: "post",
  path: "/twice",
  tag: "Service",
  summary: "Twice a number",
  description: "For the compiler.",
  request: z.strictObject({ number: z.number() }),
  work: null,
  answer: z.strictObject({ twice: z.number() }),
} as const;
const right = { summary: "Two", request: { number: 1 }, answer: { twice: 2 } };

it("accepts an endpoint whose parts fit", () => {
  const twice = defineEndpoint({
    ...parts,
    rules: [({ number }) => (number > 0 ? [] : [{ pointer: "/number", code: "out-of-range", detail: "" }])],
    forms: { "text/plain": ({ twice }) => String(twice) },
    examples: { right },
    handler: ({ number }, { maxSteps }) => ({ twice: number * 2 + 0 * maxSteps }),
  });
  expect(twice.handler(right.request, { maxSteps: 1, bodyLimit_kB: 1 })).toEqual(right.answer);
});

it("refuses to compile an endpoint whose parts do not fit", () => {
  const handler = ({ number }: { number: number }) => ({ twice: number * 2 });
  // @ts-expect-error: the request of the example breaks the request schema
  defineEndpoint({ ...parts, examples: { wrong: { ...right, request: { number: "1" } } }, handler });
  // @ts-expect-error: the answer of the example lacks a member
  defineEndpoint({ ...parts, examples: { wrong: { ...right, answer: {} } }, handler });
  // @ts-expect-error: the example has no answer
  defineEndpoint({ ...parts, examples: { wrong: { summary: "", request: { number: 1 } } }, handler });
  // @ts-expect-error: the handler answers something else
  defineEndpoint({ ...parts, examples: { right }, handler: () => ({ twice: "2" }) });
  // @ts-expect-error: the handler reads a member that the request has not
  defineEndpoint({ ...parts, examples: { right }, handler: ({ count }) => ({ twice: count }) });
  // @ts-expect-error: the problem is not in the registry
  defineEndpoint({ ...parts, examples: { right }, handler, problems: ["no-such-problem"] });
  const rules = [(_request: { count: number }) => []];
  // @ts-expect-error: the rule is about another request
  defineEndpoint({ ...parts, examples: { right }, handler, rules });
});
