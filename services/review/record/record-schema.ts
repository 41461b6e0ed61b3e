import { z } from "zod";
import { SignOffRequest, SignOffResult } from "../sign-off-schema.ts";

/** The number of this layout of a record. A later layout takes the next one, and this one stays verifiable. */
export const RECORD_FORMAT = 1;

export const Engine = z
  .strictObject({
    version: z.string().meta({ description: "Version of the service that computed." }),
    constants: z.string().meta({ description: "Edition of the physical constants." }),
  })
  .meta({ id: "Engine", description: "What computed a result: the same engine gives the same numbers." });
export type Engine = z.output<typeof Engine>;

export const Seal = z
  .strictObject({
    jws: z.string().meta({
      description:
        "JWS in compact form (RFC 7515), alg Ed25519 (RFC 9864), kid the RFC 7638 thumbprint of the key. Its payload is the canonical JSON of the digest that is sealed, in recordDigest, and of the time of sealing, in sealedAt (ISO 8601, UTC).",
    }),
  })
  .meta({
    id: "Seal",
    description: "Shows that nothing was altered since; no person's electronic signature.",
  });
export type Seal = z.output<typeof Seal>;

const digest = (of: string) => z.string().meta({ description: `SHA-256 of ${of}, in hexadecimal digits.` });

export const SealedRecord = z
  .strictObject({
    format: z.literal(RECORD_FORMAT).meta({ description: "Layout of the record." }),
    engine: Engine,
    input: SignOffRequest,
    result: SignOffResult,
    digests: z
      .strictObject({
        input: digest("the canonical JSON (RFC 8785) of input"),
        result: digest("the canonical JSON of result"),
        record: digest("the canonical JSON of format, engine and digests with only the two above in it"),
      })
      .meta({ id: "RecordDigests" }),
    seal: Seal.nullable().meta({ description: "null where the service holds no key." }),
  })
  .meta({
    id: "SealedRecord",
    description:
      "A sign-off that can be verified years later. It holds no clock but the one in the seal: the same request and version give the same record.",
  });
export type SealedRecord = z.output<typeof SealedRecord>;
