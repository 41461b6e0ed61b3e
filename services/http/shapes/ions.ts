import { z } from "zod";
import { Ion, ionErrors } from "../../contract/ion.ts";
import type { ErrorItem } from "../../contract/rule.ts";
import { MOST_ITEMS } from "../limits.ts";

export const Ions = z
  .array(Ion)
  .min(1)
  .max(MOST_ITEMS)
  .meta({ description: `1 to ${MOST_ITEMS} ions; the results come back in the same order.` });

/** The rules of each ion in the request's `ions`. */
export function ionsErrors({ ions }: { readonly ions: readonly Ion[] }): ErrorItem[] {
  return ions.flatMap((ion, index) => ionErrors(ion, `/ions/${index}`));
}

/** The rules of the ion inside each item of an array of points or targets. */
export function ionsInsideErrors(items: readonly { readonly ion: Ion }[], pointer: string): ErrorItem[] {
  return items.flatMap(({ ion }, index) => ionErrors(ion, `${pointer}/${index}/ion`));
}
