/** JSON Pointer (RFC 6901) to a member; the empty string points at the whole document. */
export function jsonPointer(path: readonly PropertyKey[]): string {
  return path.map((token) => `/${escapeToken(String(token))}`).join("");
}

function escapeToken(token: string): string {
  return token.replaceAll("~", "~0").replaceAll("/", "~1");
}
