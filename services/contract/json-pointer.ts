/** JSON Pointer (RFC 6901) to a member; the empty string points at the whole document. */
export function jsonPointer(path: readonly PropertyKey[]): string {
  return path.reduce<string>((pointer, token) => memberPointer(pointer, String(token)), "");
}

/** The pointer to a member of what `pointer` points at. */
export function memberPointer(pointer: string, name: string): string {
  return `${pointer}/${name.replaceAll("~", "~0").replaceAll("/", "~1")}`;
}
