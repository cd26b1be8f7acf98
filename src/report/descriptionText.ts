import type { Description } from "../contract/findings.js";
import { countWords } from "./diagnosticText.js";
import { runText } from "./runText.js";

/** The findings of a description in plain text. */
export function descriptionText(description: Description): string {
  const heads = [description.path, "=".repeat(description.path.length)];
  const runs = description.runs.flatMap((run) => ["", ...runText(run)]);
  const found = description.diagnostics.length === 0 ? [] : ["", countWords(description.diagnostics)];
  return [...heads, ...runs, ...found, ""].join("\n");
}
