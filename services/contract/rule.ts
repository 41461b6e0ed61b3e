/** One thing that is wrong with a request: where (RFC 6901 JSON Pointer), which kind, and a sentence for a person. */
export interface ErrorItem {
  readonly pointer: string;
  readonly code: string;
  readonly detail: string;
}

/** A rule between members, which a JSON Schema cannot state. Pure; it runs after the schema has accepted the request. */
export type Rule<Request> = (request: Request) => readonly ErrorItem[];
