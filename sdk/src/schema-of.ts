import type { components } from "./generated/schema.ts";

/** A shape of the service's contract by the name it has there: `Schema<"RodSet">`, `Schema<"Finding">`. */
export type Schema<Name extends keyof components["schemas"]> = components["schemas"][Name];
