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

export function criteriaErrors(criteria: Criteria): ErrorItem[] {
  return CHECKS.flatMap(({ id }) => {
    const criterion = criteria.checks[id];
    if (criterion === undefined) return [];
    const pointer = `/criteria/checks/${id}`;
    const { pass, caution } = criterion;
    return [
      ...emptyLimit(pass, `${pointer}/pass`),
      ...emptyLimit(caution, `${pointer}/caution`),
      ...(pass !== undefined && caution !== undefined && isStricter(caution, pass)
        ? [
            {
              pointer: `${pointer}/caution`,
              code: "limits-crossed",
              detail: "caution is stricter than pass; it must be the wider of both.",
            },
          ]
        : []),
    ];
  });
}

function emptyLimit(limit: Limit | undefined, pointer: string): ErrorItem[] {
  if (limit?.min === undefined || limit.max === undefined || limit.min <= limit.max) return [];
  return [
    {
      pointer: `${pointer}/max`,
      code: "not-above",
      detail: `max is ${limit.max}; it must not be below min, ${limit.min}.`,
    },
  ];
}

const LOWER_PARTS = ["min", "minOfWidth", "minOfTolerance", "minCounts"] as const;
const UPPER_PARTS = ["max", "maxOfWidth"] as const;

function isStricter(one: Limit, other: Limit): boolean {
  const above = (larger: number | undefined, smaller: number | undefined) =>
    larger !== undefined && smaller !== undefined && larger > smaller;
  return (
    LOWER_PARTS.some((part) => above(one[part], other[part])) ||
    UPPER_PARTS.some((part) => above(other[part], one[part]))
  );
}
