import { z } from "zod";

/** What a schema takes, as the end of a sentence that begins "it must be": with range where it has one. */
export function expectationOf(schema: unknown): string {
  if (schema instanceof z.ZodNumber) {
    const kind = schema.isInt ? "a whole number" : "a number";
    return `${kind}${range(schema.minValue, schema.maxValue)}`;
  }
  if (schema instanceof z.ZodString) {
    const { minLength, maxLength } = z.toJSONSchema(schema);
    return `a text${range(minLength, maxLength, " characters")}`;
  }
  if (schema instanceof z.ZodArray) {
    const { minItems, maxItems } = z.toJSONSchema(schema);
    return `an array${range(minItems, maxItems, " items")}`;
  }
  if (schema instanceof z.ZodEnum) return oneOf(schema.options);
  if (schema instanceof z.ZodLiteral) return oneOf([...schema.values]);
  if (schema instanceof z.ZodBoolean) return "true or false";
  if (schema instanceof z.ZodObject) return `an object with ${membersOf(schema).join(", ")}`;
  return "an object";
}

/** The names of the members that an object may have. */
export function membersOf(schema: unknown): string[] {
  return schema instanceof z.ZodObject ? Object.keys(schema.shape) : [];
}

/** "a", "b" or "c". */
export function oneOf(values: readonly unknown[]): string {
  const texts = values.map((value) => JSON.stringify(value));
  const last = texts.pop();
  return texts.length === 0 ? `${last}` : `${texts.join(", ")} or ${last}`;
}

function range(minimum: number | null | undefined, maximum: number | null | undefined, unit = ""): string {
  const low = finite(minimum);
  const high = finite(maximum);
  if (low === null && high === null) return "";
  if (low === null) return ` of at most ${high}${unit}`;
  if (high === null) return ` of at least ${low}${unit}`;
  return unit === "" ? ` from ${low} to ${high}` : ` of ${low} to ${high}${unit}`;
}

function finite(bound: number | null | undefined): number | null {
  return typeof bound === "number" && Number.isFinite(bound) ? bound : null;
}
