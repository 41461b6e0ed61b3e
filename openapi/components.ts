import { z } from "zod";

type JsonSchema = z.core.JSONSchema.BaseSchema;
export type Components = ReadonlyMap<string, JsonSchema>;
/** Requests are described as a caller writes them, answers as the service gives them. */
export type Side = "input" | "output";

const IN_ZOD = "#/$defs/";
const IN_DOCUMENT = "#/components/schemas/";

export function referenceTo(schema: z.ZodType): { $ref: string } {
  return { $ref: `${IN_DOCUMENT}${idOf(schema)}` };
}

/** The JSON Schema of one named shape. */
export function componentOf(root: z.ZodType, side: Side): JsonSchema {
  return componentsOf([[root, side]]).get(idOf(root))!;
}

/**
 * The JSON Schemas of all named shapes reachable from `roots`, by name. Two shapes under one name, or one shape that
 * requests and answers would describe differently, are an error: a reader could not tell which one is meant.
 */
export function componentsOf(roots: readonly (readonly [z.ZodType, Side])[]): Components {
  const components = new Map<string, JsonSchema>();
  for (const [root, side] of roots) {
    // A root with an id stands among the definitions too, so they hold every named shape.
    const { $defs = {} } = z.toJSONSchema(root, {
      io: side,
      override: ({ zodSchema, jsonSchema }) => addDiscriminator(zodSchema, jsonSchema),
    });
    if (!Object.hasOwn($defs, idOf(root))) throw new Error(`${idOf(root)} is not among its own definitions.`);
    for (const [name, schema] of Object.entries($defs)) addComponent(components, name, schema);
  }
  return new Map([...components].sort(([one], [other]) => (one < other ? -1 : 1)));
}

function addComponent(components: Map<string, JsonSchema>, name: string, schema: JsonSchema): void {
  const { id: _, ...described } = JSON.parse(
    JSON.stringify(schema).replaceAll(`"${IN_ZOD}`, `"${IN_DOCUMENT}`),
  );
  const known = components.get(name);
  if (known !== undefined && JSON.stringify(known) !== JSON.stringify(described)) {
    throw new Error(
      `The component ${name} comes out in two different ways: rename one, or make them the same.`,
    );
  }
  components.set(name, described);
}

/** zod writes oneOf without saying which member tells the arms apart; without a mapping the tags' values would be lost. */
function addDiscriminator(schema: z.core.$ZodTypes, jsonSchema: JsonSchema): void {
  if (!(schema instanceof z.ZodDiscriminatedUnion)) return;
  const { discriminator, options } = schema.def;
  const mapping: Record<string, string> = {};
  for (const arm of options as z.ZodType[]) {
    for (const tag of arm._zod.propValues?.[discriminator] ?? []) {
      mapping[String(tag)] = referenceTo(arm).$ref;
    }
  }
  jsonSchema.discriminator = { propertyName: discriminator, mapping };
}

function idOf(schema: z.ZodType): string {
  const id = schema.meta()?.id;
  if (id === undefined) {
    throw new Error(`A shape that the document refers to has no id: ${schema.description ?? schema.type}.`);
  }
  return id;
}
