import type { z } from "zod";
import type { Criteria } from "../criteria.ts";
import { signOff } from "../sign-off.ts";
import { signOffErrors } from "../sign-off-rules.ts";
import { SignOffRequest, type Verdict } from "../sign-off-schema.ts";
import { asFarAsRecorded } from "./as-far-as-recorded.ts";
import { type Difference, differencesOf } from "./differences.ts";
import { type KeptRecord, membersOf } from "./kept-record.ts";
import { resultOf } from "./record.ts";
import { type Engine, RECORD_FORMAT } from "./record-schema.ts";
import type { NotReproduced } from "./verification-schema.ts";

export interface Reproduction {
  readonly because: z.output<typeof NotReproduced> | null;
  readonly differences: readonly Difference[];
  readonly checksAdded: readonly string[];
  readonly verdict: Verdict | null;
  readonly verdictByCriteria: Verdict | null;
}

const nothingComputed = (because: z.output<typeof NotReproduced>): Reproduction => ({
  because,
  differences: [],
  checksAdded: [],
  verdict: null,
  verdictByCriteria: null,
});

/**
 * Signs off the input on record once more and compares; digests of two machines are never compared. The version that
 * made a record must find exactly the same; another one may have added to it.
 */
export function reproductionOf(
  record: KeptRecord,
  criteria: Criteria | undefined,
  engine: Engine,
): Reproduction {
  if (record.format !== RECORD_FORMAT) return nothingComputed("unknown-format");
  const input = SignOffRequest.safeParse(record.input);
  if (!input.success || signOffErrors(input.data).length > 0) return nothingComputed("input-refused");
  const result = resultOf(signOff(input.data));
  const bySameVersion = membersOf(record.engine).version === engine.version;
  const held = bySameVersion ? { result, checksAdded: [] } : asFarAsRecorded(record.result, result);
  const differences = differencesOf(record.result, held.result, bySameVersion ? "count" : "do-not-count");
  return {
    because: differences.length > 0 ? "result-differs" : null,
    differences,
    checksAdded: held.checksAdded,
    verdict: result.verdict,
    verdictByCriteria: criteria === undefined ? null : signOff({ ...input.data, criteria }).verdict,
  };
}
