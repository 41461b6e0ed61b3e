import fc from "fast-check";

/** The part of JSON Schema that the document uses. */
export interface Schema {
  readonly $ref?: string;
  readonly oneOf?: readonly Schema[];
  readonly anyOf?: readonly Schema[];
  readonly const?: unknown;
  readonly enum?: readonly unknown[];
  readonly type?: string | readonly string[];
  readonly properties?: Readonly<Record<string, Schema>>;
  readonly required?: readonly string[];
  readonly additionalProperties?: boolean | Schema;
  readonly items?: Schema;
  readonly minItems?: number;
  readonly maxItems?: number;
  readonly minLength?: number;
  readonly maxLength?: number;
  readonly pattern?: string;
  readonly minimum?: number;
  readonly maximum?: number;
}

export type Schemas = Readonly<Record<string, Schema>>;

/** Documents that a schema accepts. */
export function documentsOf(schema: Schema, schemas: Schemas): fc.Arbitrary<unknown> {
  const of = (part: Schema) => documentsOf(part, schemas);
  if (schema.$ref !== undefined) return of(schemas[schema.$ref.split("/").at(-1)!]!);
  const arms = schema.oneOf ?? schema.anyOf;
  if (arms !== undefined) return fc.oneof(...arms.map(of));
  if (schema.const !== undefined) return fc.constant(schema.const);
  if (schema.enum !== undefined) return fc.constantFrom(...schema.enum);
  if (Array.isArray(schema.type))
    return fc.oneof(...schema.type.map((type: string) => of({ ...schema, type })));
  switch (schema.type) {
    case "null":
      return fc.constant(null);
    case "boolean":
      return fc.boolean();
    case "integer":
      return fc.integer({
        min: Math.max(schema.minimum ?? -1e9, -1e9),
        max: Math.min(schema.maximum ?? 1e9, 1e9),
      });
    case "number":
      return numbers(schema.minimum ?? -1e9, schema.maximum ?? 1e9);
    case "string":
      return texts(schema);
    case "array": {
      const { items = {}, minItems = 0, maxItems = Number.POSITIVE_INFINITY } = schema;
      return fc.array(of(items), { minLength: minItems, maxLength: Math.min(maxItems, minItems + 2) });
    }
    case "object":
      return objects(schema, of);
    case undefined:
      return fc.jsonValue({ maxDepth: 2 });
    default:
      throw new Error(`No documents are made for ${JSON.stringify(schema)}.`);
  }
}

function numbers(minimum: number, maximum: number): fc.Arbitrary<number> {
  return fc.oneof(fc.double({ min: minimum, max: maximum, noNaN: true }), fc.constantFrom(minimum, maximum));
}

function texts({ minLength = 0, maxLength = 30, pattern }: Schema): fc.Arbitrary<string> {
  const expression = pattern === undefined ? null : new RegExp(pattern, "u");
  const unit = fc.constantFrom(
    ...["a", "Z", "0", "é", "質", "[", "-", " "].filter((each) => expression?.test(each) ?? true),
  );
  if (expression !== null && !expression.test("aaaa")) return fc.stringMatching(expression);
  return fc.string({ unit, minLength, maxLength: Math.min(maxLength, minLength + 8) });
}

function objects(schema: Schema, of: (part: Schema) => fc.Arbitrary<unknown>): fc.Arbitrary<unknown> {
  const { properties = {}, required = [], additionalProperties } = schema;
  const members = Object.fromEntries(Object.entries(properties).map(([name, part]) => [name, of(part)]));
  const stated = fc.record(members, { requiredKeys: [...required] });
  if (typeof additionalProperties !== "object") return stated;
  return fc
    .tuple(
      stated,
      fc.dictionary(fc.constantFrom("a", "b"), of(additionalProperties), { noNullPrototype: true }),
    )
    .map(([one, other]) => ({ ...other, ...one }));
}

const INTRUDERS: readonly unknown[] = [
  null,
  true,
  0,
  -1,
  0.5,
  1e9,
  -1e300,
  "",
  "x",
  "x".repeat(3000),
  "a\u0000b",
  "\u007f",
  "\ud800",
  "😀",
  [],
  [null],
  {},
  { a: 1 },
];

/** Documents that are wrong in one place, or by chance not wrong after all. */
export function mutationsOf(documents: fc.Arbitrary<unknown>): fc.Arbitrary<unknown> {
  return fc
    .tuple(documents, fc.array(fc.nat(), { minLength: 12, maxLength: 12 }), fc.constantFrom(...INTRUDERS))
    .map(([document, choices, intruder]) => mutated(document, [...choices], intruder));
}

function mutated(node: unknown, choices: number[], intruder: unknown): unknown {
  const choice = choices.pop() ?? 0;
  if (typeof node !== "object" || node === null || choice % 5 === 0) return intruder;
  if (Array.isArray(node)) {
    if (node.length === 0 || choice % 5 === 1) return [...node, intruder];
    const at = choice % node.length;
    return node.map((item, index) => (index === at ? mutated(item, choices, intruder) : item));
  }
  const names = Object.keys(node);
  const name = names[choice % Math.max(names.length, 1)];
  if (name === undefined || choice % 5 === 1) return { ...node, unknown: intruder };
  const { [name]: value, ...others } = node as Record<string, unknown>;
  return choice % 5 === 2 ? others : { ...others, [name]: mutated(value, choices, intruder) };
}
