import { addressOf, type CallOptions, type ClientOptions, exchange } from "./exchange.ts";
import { OPERATIONS } from "./generated/operations.ts";
import type { operations } from "./generated/schema.ts";

/** Name of a question the service answers. */
export type OperationId = keyof typeof OPERATIONS;

/** What an operation takes, as a body or as a query; never where it takes nothing. */
export type RequestOf<Id extends OperationId> = operations[Id] extends {
  requestBody: { content: { "application/json": infer Request } };
}
  ? Request
  : NonNullable<operations[Id]["parameters"]["query"]>;

/** What an operation answers. */
export type AnswerOf<Id extends OperationId> = operations[Id] extends {
  responses: { 200: { content: { "application/json": infer Answer } } };
}
  ? Answer
  : never;

/** Media types of an operation's answer beside JSON; never where there are none. */
export type FormOf<Id extends OperationId> = operations[Id] extends {
  responses: { 200: { content: infer Content } };
}
  ? Exclude<keyof Content, "application/json"> & string
  : never;

type Arguments<Id extends OperationId> = [RequestOf<Id>] extends [never]
  ? [options?: CallOptions]
  : [request: RequestOf<Id>, options?: CallOptions];

/** One method for each operation of the service, and `form` for answers in another media type than JSON. */
export type Client = {
  // Written over the object itself, so that each method keeps the sentence that stands above it there.
  readonly [Id in keyof typeof OPERATIONS]: (...args: Arguments<Id>) => Promise<AnswerOf<Id>>;
} & {
  /** The answer of an operation as text in another of its media types, a report for instance. */
  form<Id extends OperationId>(id: Id, mediaType: FormOf<Id>, ...args: Arguments<Id>): Promise<string>;
};

/**
 * A client of the service at `baseUrl`. It holds no connection and no state of its own.
 *
 * @throws {TypeError} where the address or the headers could never be sent.
 */
export function createClient(options: ClientOptions): Client {
  addressOf(options.baseUrl, "/");
  new Headers(options.headers);

  const call = (id: OperationId, mediaType: string, args: readonly unknown[]): Promise<string> => {
    const { method, path, takes } = OPERATIONS[id];
    const [request, callOptions] = takes === "nothing" ? [undefined, args[0]] : args;
    return exchange(options, {
      ...(callOptions as CallOptions | undefined),
      method,
      path: takes === "query" ? path + queryOf(request) : path,
      body: takes === "body" ? request : undefined,
      mediaType,
    });
  };
  const methods = (Object.keys(OPERATIONS) as OperationId[]).map((id) => [
    id,
    async (...args: unknown[]): Promise<unknown> => JSON.parse(await call(id, "application/json", args)),
  ]);
  const form: Client["form"] = (id, mediaType, ...args) => call(id, mediaType, args);
  return { ...Object.fromEntries(methods), form };
}

function queryOf(request: unknown): string {
  const stated = Object.entries(request ?? {}).filter(([, value]) => value !== undefined);
  const query = new URLSearchParams(stated.map(([name, value]): [string, string] => [name, String(value)]));
  return stated.length === 0 ? "" : `?${query}`;
}
