/** Rows as lines of text, columns aligned at their left; widths count characters as people see them. */
export function alignedTable(rows: readonly (readonly string[])[], indent: string): string[] {
  const columns = Math.max(0, ...rows.map((row) => row.length));
  const widths = Array.from({ length: columns }, (_, column) =>
    Math.max(...rows.map((row) => width(row[column] ?? ""))),
  );
  return rows.map((row) =>
    `${indent}${row.map((cell, column) => cell + " ".repeat((widths[column] ?? 0) - width(cell))).join("  ")}`.trimEnd(),
  );
}

/** Combining marks take no room. */
function width(text: string): number {
  return [...text].filter((letter) => !/\p{M}/u.test(letter)).length;
}
