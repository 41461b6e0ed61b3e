import type { ErrorItem } from "../../contract/rule.ts";
import { criteriaErrors } from "../sign-off-rules.ts";
import { keptRecordErrors } from "./kept-record.ts";
import type { VerificationRequest } from "./verification-schema.ts";

/** What a schema cannot say of a verification request. */
export function verificationErrors({ record, criteria }: VerificationRequest): ErrorItem[] {
  return [
    ...keptRecordErrors(record, "/record"),
    ...(criteria === undefined ? [] : criteriaErrors(criteria)),
  ];
}
