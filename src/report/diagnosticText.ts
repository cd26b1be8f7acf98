import type { Diagnostic } from "../contract/findings.js";

/** `file:line:column: severity: message [code]`, as editors and CI read it. */
export function diagnosticLine(path: string, { line, column, severity, message, code }: Diagnostic): string {
  return `${path}:${line}:${column}: ${severity}: ${message} [${code}]`;
}

/** A diagnostic with the line it stands on, marked, and its mends. */
export function diagnosticText(path: string, diagnostic: Diagnostic, lines: readonly string[]): string {
  const { line, column, endLine, endColumn, mends } = diagnostic;
  const source = lines[line - 1] ?? "";
  const number = String(line);
  const end = endLine === line ? endColumn : source.length + 1;
  const before = source.slice(0, column - 1).replace(/[^\t]/g, " ");
  const marks = "^".repeat(Math.max(1, [...source.slice(column - 1, end - 1)].length));
  const margin = " ".repeat(number.length);
  return [
    diagnosticLine(path, diagnostic),
    `  ${number} | ${source}`,
    `  ${margin} | ${before}${marks}`,
    ...mends.map(({ title }) => `  ${margin} = ${title}`),
  ].join("\n");
}

/** "1 error, 2 warnings" and so on; "nothing to mend" where there is none. */
export function countWords(diagnostics: readonly Diagnostic[]): string {
  const count = (severity: Diagnostic["severity"], one: string, many: string): string[] => {
    const found = diagnostics.filter((diagnostic) => diagnostic.severity === severity).length;
    return found === 0 ? [] : [`${found} ${found === 1 ? one : many}`];
  };
  const words = [
    ...count("error", "error", "errors"),
    ...count("warning", "warning", "warnings"),
    ...count("information", "piece of information", "pieces of information"),
  ];
  return words.length === 0 ? "nothing to mend" : words.join(", ");
}
