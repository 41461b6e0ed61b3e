import { listed } from "../statement.ts";
import { TOLERANCE } from "./agreement.ts";
import { integrityOf } from "./integrity.ts";
import { type KeptRecord, membersOf } from "./kept-record.ts";
import type { Engine } from "./record-schema.ts";
import { type Reproduction, reproductionOf } from "./reproduction.ts";
import { type SealFinding, sealFindingOf } from "./seal.ts";
import type { PublicSealKey } from "./seal-keys.ts";
import {
  MOST_DIFFERENCES,
  type VerificationAnswer,
  type VerificationRequest,
} from "./verification-schema.ts";

type Unsealed = Omit<VerificationAnswer, keyof SealFinding | "statement">;

/** Everything a verification finds out without a key. */
export function verifyContent({ record, criteria }: VerificationRequest, engine: Engine): Unsealed {
  const { altered, recordDigest } = integrityOf(record);
  const { because, differences, checksAdded, verdict, verdictByCriteria } = reproductionOf(
    record,
    criteria,
    engine,
  );
  return {
    intact: altered.length === 0,
    altered: [...altered],
    recordDigest,
    reproduced: because === null,
    notReproducedBecause: because,
    differences: differences.slice(0, MOST_DIFFERENCES).map((difference) => ({ ...difference })),
    differencesOmitted: Math.max(0, differences.length - MOST_DIFFERENCES),
    checksAdded: [...checksAdded],
    tolerance: TOLERANCE,
    verdict,
    verdictByCriteria,
    stillMeetsCriteria: meets(verdictByCriteria ?? verdict),
    engine: { ...engine },
  };
}

function meets(verdict: Reproduction["verdict"]): boolean | null {
  return verdict === null ? null : verdict === "pass" || verdict === "caution";
}

export const NO_SEAL: SealFinding = { seal: "absent", sealedAt: null, keyId: null };

/** Whether the seal of a record is one of these keys', made for the content with this digest. */
export function verifySeal(
  { seal }: KeptRecord,
  recordDigest: string,
  keys: readonly PublicSealKey[],
): Promise<SealFinding> {
  const absent = seal === null || seal === undefined;
  // A seal that is something else than an object with a JWS in it was a seal once, or wants to be taken for one.
  const jws = absent ? null : (membersOf(seal).jws ?? "");
  return sealFindingOf(jws, recordDigest, "rodset-record-seal", keys);
}

/** The answer with a sentence that says what it comes to, in the order in which a reader must know it. */
export function inWords(content: Unsealed, seal: SealFinding): VerificationAnswer {
  const sentences = [
    content.intact
      ? "The digests fit the content of the record."
      : `The record was altered: ${content.altered.slice(0, 5).join(", ") || "its members"} does not fit the rest.`,
    {
      valid: `Sealed at ${seal.sealedAt} with a key that this service knows.`,
      invalid: "The seal does not belong to this content.",
      "unknown-key": "The seal names a key that this service does not know, so it shows nothing here.",
      absent: "The record bears no seal.",
    }[seal.seal],
    reproductionInWords(content),
  ];
  return { statement: sentences.join(" "), ...content, ...seal };
}

function reproductionInWords({
  notReproducedBecause,
  differences,
  differencesOmitted,
  checksAdded,
}: Unsealed): string {
  switch (notReproducedBecause) {
    case null:
      return checksAdded.length === 0
        ? "This version finds the same from the same input."
        : `This version finds the same from the same input; it has checks that the record's did not: ${listed(checksAdded)}.`;
    case "unknown-format":
      return "This version does not know the layout of the record, so nothing was recomputed.";
    case "input-refused":
      return "The input on record is no valid request to this version, so nothing was recomputed.";
    case "result-differs": {
      const places = differences.length + differencesOmitted;
      return `This version finds otherwise in ${places === 1 ? "one place" : `${places} places`}.`;
    }
  }
}
