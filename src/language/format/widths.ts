/** Places a text takes in a fixed-width font: one a character, none for the marks that combine with the one before. */
export function widthOf(text: string): number {
  if (/^[ -~]*$/.test(text)) return text.length;
  return [...text.replace(/\p{M}/gu, "")].length;
}

/** The text with spaces behind it up to a width. */
export function padded(text: string, width: number): string {
  return text + " ".repeat(Math.max(0, width - widthOf(text)));
}

/** The widths of the columns of each group of lines; the last cell of a line needs no column. */
export function columnWidths(
  lines: readonly { readonly group: number; readonly cells: readonly string[] }[],
): Map<number, number[]> {
  const groups = new Map<number, number[]>();
  for (const { group, cells } of lines) {
    const widths = groups.get(group) ?? [];
    groups.set(group, widths);
    for (let at = 0; at < cells.length - 1; at++) widths[at] = Math.max(widths[at] ?? 0, widthOf(cells[at] ?? ""));
  }
  return groups;
}
