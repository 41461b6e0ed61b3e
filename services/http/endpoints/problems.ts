import { z } from "zod";
import { defineEndpoint } from "../endpoint.ts";
import { ERROR_CODES } from "../error-codes.ts";
import { PROBLEMS } from "../problems.ts";

const ProblemKind = z
  .strictObject({
    code: z.string(),
    status: z.int(),
    title: z.string(),
    when: z.string(),
    remedy: z.string(),
  })
  .meta({ id: "ProblemKind" });

const ProblemCatalogue = z
  .strictObject({
    problems: z.array(ProblemKind),
    errorsOfMembers: z
      .array(z.strictObject({ code: z.string(), when: z.string() }))
      .meta({ description: "The codes in `errors` of an invalid-request problem." }),
  })
  .meta({ id: "ProblemCatalogue" });

const CATALOGUE: z.output<typeof ProblemCatalogue> = {
  problems: Object.entries(PROBLEMS).map(([code, problem]) => ({ code, ...problem })),
  errorsOfMembers: Object.entries(ERROR_CODES).map(([code, when]) => ({ code, when })),
};

/** The page that the `type` of every problem points into. */
export const problems = defineEndpoint({
  operationId: "problems",
  method: "get",
  path: "/problems",
  tag: "Service",
  summary: "Every problem the service answers with, and what to do about it",
  description: "The type of a problem document (RFC 9457) points to its entry here.",
  request: null,
  work: null,
  answer: ProblemCatalogue,
  forms: { "text/markdown": asMarkdown },
  examples: { catalogue: { summary: "All of them", request: null, answer: CATALOGUE } },
  handler: () => CATALOGUE,
});

function asMarkdown({ problems, errorsOfMembers }: z.output<typeof ProblemCatalogue>): string {
  return [
    "# Problems",
    ...problems.flatMap(({ code, status, title, when, remedy }) => [
      `## ${code}`,
      `${status}: ${title}.`,
      when,
      `*What to do:* ${remedy}`,
    ]),
    "# Errors of members",
    errorsOfMembers.map(({ code, when }) => `- \`${code}\`: ${when}`).join("\n"),
    "",
  ].join("\n\n");
}
