import { createPublicKey, verify } from "node:crypto";
import { canonicalJson, digestOf } from "../record/digest.ts";
import type { Capability } from "./capability.ts";

/** RFC 8785, section 3.2.2, parsed, and the UTF-8 bytes of section 3.2.4. */
const DOCUMENT = {
  numbers: [333333333.3333333, 1e30, 4.5, 2e-3, 1e-27],
  string: '\u20ac$\u000f\nA\'B"\\\\"/',
  literals: [null, true, false],
};
const BYTES =
  "7b226c69746572616c73223a5b6e756c6c2c747275652c66616c73655d2c226e756d62657273223a5b3333333333333333332e333333333333332c31652b33302c342e352c302e3030322c31652d32375d2c22737472696e67223a22e282ac245c75303030665c6e4127425c225c5c5c5c5c222f227d";

/** SHA-256 of the text "abc" in quotation marks, by sha256sum of GNU coreutils. */
const DIGEST = "6cc43f858fbb763301637b5af970e2a46b46f461f27e5a0f41e009c59b827b25";

/** RFC 8037, appendix A.2 and A.4. */
const PUBLIC_KEY = { kty: "OKP", crv: "Ed25519", x: "11qYAYKxCrfVS_7TyWQHOg7hcvPapiMlrwIaaPcHURo" };
const SIGNED = "eyJhbGciOiJFZERTQSJ9.RXhhbXBsZSBvZiBFZDI1NTE5IHNpZ25pbmc";
const SIGNATURE = "hgyY0il_MGCjP0JzlnLWG1PPOt7-09PGcvMg3AIbQR6dWbhijcNR4ki4iylGjg5BhVsPt9g7sVvpAr_MuM0KAg";

function verifies(signed: string): boolean {
  const key = createPublicKey({ key: PUBLIC_KEY, format: "jwk" });
  return verify(null, Buffer.from(signed), key, Buffer.from(SIGNATURE, "base64url"));
}

export const RECORD_CHECKS: readonly Capability[] = [
  {
    capability: "canonical JSON, digest and signature of records (1: as published)",
    source: "RFC 8785, sections 3.2.2 to 3.2.4; sha256sum of GNU coreutils; RFC 8037, appendix A",
    kind: "absolute",
    limit: 0,
    values: () => [
      {
        at: "RFC 8785, section 3.2.4",
        reference: 1,
        computed: Number(Buffer.from(canonicalJson(DOCUMENT)).toString("hex") === BYTES),
      },
      { at: "SHA-256", reference: 1, computed: Number(digestOf("abc") === DIGEST) },
      { at: "RFC 8037, appendix A.4", reference: 1, computed: Number(verifies(SIGNED)) },
      {
        at: "the same with one letter altered",
        reference: 0,
        computed: Number(verifies(SIGNED.replace("R", "S"))),
      },
    ],
  },
];
