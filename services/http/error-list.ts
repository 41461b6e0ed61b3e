import type { ErrorItem } from "../contract/rule.ts";

export const MOST_ERRORS_SHOWN = 20;

/** The first errors of a request, and how many more there are. */
export interface ErrorList {
  readonly shown: readonly ErrorItem[];
  readonly omitted: number;
}

/** Words only the errors that are shown: a long array can be wrong in thousands of places. */
export function errorList<Fault>(faults: Iterable<Fault>, inWords: (fault: Fault) => ErrorItem): ErrorList {
  const shown: ErrorItem[] = [];
  let omitted = 0;
  for (const fault of faults) {
    if (shown.length < MOST_ERRORS_SHOWN) shown.push(inWords(fault));
    else omitted++;
  }
  return { shown, omitted };
}
