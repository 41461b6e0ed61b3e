import { recordedSignOff } from "../../review/record/record.ts";
import type { SealedRecord } from "../../review/record/record-schema.ts";
import { inWords, NO_SEAL, verifyContent, verifySeal } from "../../review/record/verification.ts";
import { verificationErrors } from "../../review/record/verification-rules.ts";
import { VerificationAnswer, VerificationRequest } from "../../review/record/verification-schema.ts";
import { defineEndpoint } from "../endpoint.ts";
import { ENGINE } from "../engine.ts";
import { SIGN_OFF_EXAMPLE } from "../examples/sign-off.ts";
import { RECORD_BODY_LIMIT_KB } from "../limits.ts";

const { record } = recordedSignOff(SIGN_OFF_EXAMPLE, ENGINE);

/** The same record in the hands of somebody who wants another verdict. */
const altered: SealedRecord = { ...record, result: { ...record.result, verdict: "pass" } };

const answerTo = (kept: SealedRecord): VerificationAnswer =>
  inWords(verifyContent({ record: kept }, ENGINE), NO_SEAL);

const SOURCE =
  "digests: SHA-256 (FIPS 180-4) of canonical JSON (RFC 8785), which any other tool for both finds too; the numbers are those of the sign-off";

export const signOffVerification = defineEndpoint({
  operationId: "signOffVerification",
  method: "post",
  path: "/v1/sign-off/verification",
  tag: "Sign-off",
  summary: "Whether a record still holds: unaltered, sealed, and the same found from the same input today",
  description:
    "Answers four questions apart. Intact: whether the digests fit the content. Seal: whether a key that this service knows sealed this very content. Reproduced: whether this version finds the same from the input on record, every number within the stated tolerance; digests of two computations are never compared. Criteria: whether the method still meets the criteria on record, or those of the request. A record that was tampered with gets an answer, not a refusal. " +
    "The public keys stand at /.well-known/jwks.json, so digests and seal can be checked without this service. If the private key is lost, old seals stay valid and new records are sealed with a new key, with the old public key among the trusted ones. If it has leaked, its public key is taken out of the trusted ones: its seals then answer unknown-key, and only copies that the laboratory kept under its own control since before the leak are evidence. " +
    "A JSON object that names a member twice is refused; bodies may be larger than elsewhere, so that a record of 2,000 acquisitions fits.",
  request: VerificationRequest,
  bodyLimit_kB: RECORD_BODY_LIMIT_KB,
  refusesDuplicateMembers: true,
  rules: [verificationErrors],
  work: null,
  answer: VerificationAnswer,
  examples: {
    "kept-as-it-was": {
      summary: "A record without a seal, from a service without a key",
      source: SOURCE,
      request: { record: { ...record } },
      answer: answerTo(record),
    },
    "verdict-altered": {
      summary: "The same with another verdict written into it",
      source: SOURCE,
      request: { record: { ...altered } },
      answer: answerTo(altered),
    },
  },
  handler: (request) => inWords(verifyContent(request, ENGINE), NO_SEAL),
  withSeal: async (answer, { record: kept }, { known }) =>
    inWords(answer, await verifySeal(kept, answer.recordDigest, known)),
});
