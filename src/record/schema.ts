import { recordShape } from "./recordShape.js";

/** The JSON Schema of records as the text of its file. */
export function schemaText(): string {
  const schema = { $schema: "http://json-schema.org/draft-07/schema#", ...recordShape.schema };
  return `${JSON.stringify(schema, null, 2)}\n`;
}
