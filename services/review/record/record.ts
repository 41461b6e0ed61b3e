import { signOff } from "../sign-off.ts";
import type { Assessment, SignOffAnswer } from "../sign-off-answer.ts";
import type { SignOffRequest, SignOffResult } from "../sign-off-schema.ts";
import { digestOf } from "./digest.ts";
import { type Engine, RECORD_FORMAT, type SealedRecord } from "./record-schema.ts";

/** A sign-off with its record, which nobody has sealed yet. */
export function recordedSignOff(request: SignOffRequest, engine: Engine): SignOffAnswer {
  const assessment = signOff(request);
  const { cautions, ...found } = assessment;
  return { ...found, record: recordOf(request, resultOf(assessment), engine), cautions };
}

/** What of a sign-off goes on record. The criteria stand there in full, with the input. */
export function resultOf({ criteria: _criteria, cautions: _cautions, ...result }: Assessment): SignOffResult {
  return result;
}

function recordOf(input: SignOffRequest, result: SignOffResult, engine: Engine): SealedRecord {
  return {
    format: RECORD_FORMAT,
    engine: { ...engine },
    input,
    result,
    digests: digestsOf(RECORD_FORMAT, engine, input, result),
    seal: null,
  };
}

/**
 * The digests that belong to the parts of a record. The one of the record covers the others, so that one sealed
 * digest covers every member but the seal.
 */
export function digestsOf(
  format: unknown,
  engine: unknown,
  input: unknown,
  result: unknown,
): SealedRecord["digests"] {
  const digests = { input: digestOf(input), result: digestOf(result) };
  return { ...digests, record: digestOf({ format, engine, digests }) };
}
