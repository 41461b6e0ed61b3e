import type { Check } from "./check.ts";
import { edgeMargin } from "./checks/edge-margin.ts";
import { productAboveCutoff } from "./checks/product-above-cutoff.ts";
import { rfCycles } from "./checks/rf-cycles.ts";
import { voltageConvention } from "./checks/voltage-convention.ts";
import type { Limit } from "./limit.ts";

/** Every check, in the order in which findings, catalogue and criteria list them. A new check is one line here. */
const LIST = [edgeMargin, rfCycles, productAboveCutoff, voltageConvention] as const;

export type CheckId = (typeof LIST)[number]["id"];

/** The list without the type of each check's own limit: criteria are matched to checks by their schema. */
export const CHECKS: readonly Check<CheckId, Limit>[] = LIST as readonly unknown[] as readonly Check<
  CheckId,
  Limit
>[];
