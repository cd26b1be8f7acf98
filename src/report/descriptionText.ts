import type { Description } from "../contract/findings.js";
import { countWords } from "./diagnosticText.js";
import { runText } from "./runText.js";
import { wrappedText } from "./wrappedText.js";

/** The findings of a description in plain text, what to watch at the end: a page that says less would be relied on. */
export function descriptionText(description: Description): string {
  const { path, runs, diagnostics } = description;
  const heads = [path, "=".repeat(path.length)];
  const said = diagnostics.flatMap(({ severity, line, message }) =>
    wrappedText(`${severity}, line ${line}: ${message}`, "  - "),
  );
  const found = diagnostics.length === 0 ? [] : ["", `what to watch: ${countWords(diagnostics)}`, ...said];
  return [...heads, ...runs.flatMap((run) => ["", ...runText(run)]), ...found, ""].join("\n");
}
