/** A copy of a document in which the value at a JSON Pointer is another; the member may be new, its parent not. */
export function withInput<Document>(document: Document, pointer: string, value: unknown): Document {
  const copy = structuredClone(document);
  const path = pointer.split("/").slice(1);
  const last = path.pop()!;
  let parent = copy as Record<string, unknown>;
  for (const step of path) {
    const next = parent[step];
    if (typeof next !== "object" || next === null) throw new Error(`nothing at ${pointer}`);
    parent = next as Record<string, unknown>;
  }
  parent[last] = value;
  return copy;
}
