import { z } from "zod";
import { Identifier, Sentence } from "../contract/text.ts";
import type { Check, Limits } from "./check.ts";
import { CHECKS, type CheckId } from "./checks.ts";
import type { Limit } from "./limit.ts";

const Waiver = z
  .strictObject({
    reason: Sentence,
    reference: Identifier.meta({ description: "Where the laboratory's decision is kept." }),
  })
  .meta({
    id: "Waiver",
    description:
      "The check no longer counts in the verdict; its findings keep their outcome and the waiver is listed.",
  });
export type Waiver = z.output<typeof Waiver>;

export interface Criterion {
  readonly required?: boolean | undefined;
  readonly pass?: Limit | undefined;
  readonly caution?: Limit | undefined;
  readonly waiver?: Waiver | undefined;
}

function criterionOf(check: Check<CheckId, Limit>): z.ZodType<Criterion> {
  const members = {
    required: z
      .boolean()
      .optional()
      .meta({ description: "Whether the check counts in the verdict, also where it is indeterminate." }),
    waiver: Waiver.optional(),
  };
  const id = `${check.id.replace(/(^|-)(.)/g, (_, _dash, letter: string) => letter.toUpperCase())}Criterion`;
  const description = `The laboratory's limits of ${check.id}. ${check.computes}`;
  if (check.limit === null) return z.strictObject(members).meta({ id, description });
  return z
    .strictObject({ ...members, pass: check.limit.optional(), caution: check.limit.optional() })
    .meta({ id, description });
}

type CriterionMembers = { [Id in CheckId]: z.ZodOptional<z.ZodType<Criterion>> };

export const Criteria = z
  .strictObject({
    id: Identifier,
    revision: Identifier,
    checks: z
      .strictObject(
        Object.fromEntries(
          CHECKS.map((check) => [check.id, criterionOf(check).optional()]),
        ) as CriterionMembers,
      )
      .meta({ id: "CriteriaChecks" }),
  })
  .meta({ id: "Criteria", description: "The laboratory's own limits, in place of the defaults." });
export type Criteria = z.output<typeof Criteria>;

/** The default limits with the laboratory's in their place. */
export function limitsOf(check: Check<CheckId, Limit>, criterion: Criterion | undefined): Limits<Limit> {
  const none: Limits<Limit> = { pass: {}, caution: {} };
  const defaults = check.defaults ?? none;
  return { pass: criterion?.pass ?? defaults.pass, caution: criterion?.caution ?? defaults.caution };
}
