import type { ErrorItem } from "../contract/rule.ts";
import { CHECKS } from "./checks.ts";
import type { Criteria } from "./criteria.ts";
import type { Limit } from "./limit.ts";
import { instrumentErrors } from "./rules/instrument-rules.ts";
import { methodErrors } from "./rules/method-rules.ts";
import type { SignOffRequest } from "./sign-off-schema.ts";

/** What a schema cannot say of a sign-off request. */
export function signOffErrors({ instrument, method, criteria }: SignOffRequest): ErrorItem[] {
  return [
    ...instrumentErrors(instrument),
    ...methodErrors(instrument, method),
    ...(criteria === undefined ? [] : criteriaErrors(criteria)),
  ];
}

function criteriaErrors(criteria: Criteria): ErrorItem[] {
  return CHECKS.flatMap(({ id }) => {
    const criterion = criteria.checks[id];
    if (criterion?.pass === undefined) return [];
    const pointer = `/criteria/checks/${id}`;
    const crossed =
      criterion.caution !== undefined && narrower(criterion.caution, criterion.pass)
        ? [
            {
              pointer: `${pointer}/caution`,
              code: "limits-crossed",
              detail: "caution is stricter than pass; it must be the wider of both.",
            },
          ]
        : [];
    const { min, max } = criterion.pass;
    const empty =
      min !== undefined && max !== undefined && min > max
        ? [
            {
              pointer: `${pointer}/pass/max`,
              code: "not-above",
              detail: `max is ${max}; it must not be below min, ${min}.`,
            },
          ]
        : [];
    return [...crossed, ...empty];
  });
}

function narrower(caution: Limit, pass: Limit): boolean {
  const above = (one: number | undefined, other: number | undefined) =>
    one !== undefined && other !== undefined && one > other;
  return (
    above(caution.min, pass.min) ||
    above(pass.max, caution.max) ||
    above(caution.minOfWidth, pass.minOfWidth) ||
    above(pass.maxOfWidth, caution.maxOfWidth)
  );
}
