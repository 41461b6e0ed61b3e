import { createPublicKey, verify } from "node:crypto";

/** RFC 8037, appendix A.1 and A.2: a key that everybody knows, and so seals nothing. */
export const RFC_8037_KEY = {
  kty: "OKP",
  crv: "Ed25519",
  d: "nWGxne_9WmC6hEr0kuwsxERJxWl7MmkZcDusAxyuf2A",
  x: "11qYAYKxCrfVS_7TyWQHOg7hcvPapiMlrwIaaPcHURo",
} as const;

/** RFC 8037, appendix A.3. */
export const RFC_8037_THUMBPRINT = "kPrK_qmxVWaYVA9wwBF6Iuo3vVzz7TxHCTwXBygrS4k";

/** RFC 8037, appendix A.4, in compact form. */
export const RFC_8037_JWS =
  "eyJhbGciOiJFZERTQSJ9.RXhhbXBsZSBvZiBFZDI1NTE5IHNpZ25pbmc.hgyY0il_MGCjP0JzlnLWG1PPOt7-09PGcvMg3AIbQR6dWbhijcNR4ki4iylGjg5BhVsPt9g7sVvpAr_MuM0KAg";

/** Verifies a JWS in compact form with nothing but the runtime's own Ed25519; null where it does not verify. */
export function payloadByRuntime(jws: string, x: string): string | null {
  const [header, payload, signature] = jws.split(".") as [string, string, string];
  const key = createPublicKey({ key: { kty: "OKP", crv: "Ed25519", x }, format: "jwk" });
  const signed = Buffer.from(`${header}.${payload}`, "ascii");
  if (!verify(null, signed, key, Buffer.from(signature, "base64url"))) return null;
  return Buffer.from(payload, "base64url").toString("utf8");
}
