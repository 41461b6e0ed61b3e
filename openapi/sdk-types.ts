import openapiTS, { astToString, type OpenAPI3 } from "openapi-typescript";

const NOTICE = "// Generated from openapi/openapi.json; `npm run generate` writes it anew.\n";

/** The types of every request and answer. Members with a default stay optional in requests. */
export async function sdkSchema(document: unknown): Promise<string> {
  return NOTICE + astToString(await openapiTS(document as OpenAPI3, { defaultNonNullable: false }));
}

interface Operation {
  readonly operationId?: string;
  readonly summary?: string;
  readonly requestBody?: unknown;
  readonly parameters?: readonly unknown[];
}

/** What the client needs of each operation at run time: method, path, and how it takes its request. */
export function sdkOperations(document: unknown): string {
  const { paths } = document as { paths: Record<string, Record<string, Operation>> };
  const entries = Object.entries(paths).flatMap(([path, methods]) =>
    Object.entries(methods).flatMap(([method, { operationId, summary, requestBody, parameters = [] }]) =>
      operationId === undefined
        ? []
        : [
            // An editor shows this sentence at the client's method.
            `  /** ${summary}: \`${method.toUpperCase()} ${path}\` */`,
            `  ${operationId}: { method: ${JSON.stringify(method.toUpperCase())}, path: ${JSON.stringify(path)}, takes: ${JSON.stringify(takes(requestBody, parameters))} },`,
          ],
    ),
  );
  return `${NOTICE}export const OPERATIONS = {\n${entries.join("\n")}\n} as const;\n`;
}

function takes(requestBody: unknown, parameters: readonly unknown[]): "body" | "query" | "nothing" {
  if (requestBody !== undefined) return "body";
  return parameters.length > 0 ? "query" : "nothing";
}
