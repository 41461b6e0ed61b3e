import { ENDPOINTS } from "../services/http/endpoints.ts";
import { openApiDocument } from "./document.ts";
import { sdkOperations, sdkSchema } from "./sdk-types.ts";

/** Every generated file with its text, by its path in the repository; a test holds the committed ones to it. */
export async function generatedFiles(): Promise<readonly (readonly [path: string, text: string])[]> {
  const document = openApiDocument(ENDPOINTS);
  return [
    ["openapi/openapi.json", `${JSON.stringify(document, null, 2)}\n`],
    ["sdk/src/generated/schema.ts", await sdkSchema(document)],
    ["sdk/src/generated/operations.ts", sdkOperations(document)],
  ];
}
