/**
 * The cells of one line in which each quote opens or closes a whole cell, or is written twice inside one; blanks around
 * cells are taken off, those inside quotes stay. Null where a quote stands elsewhere or is not closed on this line, and
 * for cells between runs of blanks: only csv-parse tells then what the text means.
 */
export function quotedCells(line: string, delimiter: string): string[] | null {
  if (delimiter === " ") return null;
  const cells: string[] = [];
  for (let at = 0; at <= line.length; ) {
    let open = at;
    while (isBlank(line, open, delimiter)) open++;
    if (line.charCodeAt(open) === quote) {
      const close = closingQuote(line, open + 1);
      if (close < 0) return null;
      let end = close + 1;
      while (isBlank(line, end, delimiter)) end++;
      if (end < line.length && !line.startsWith(delimiter, end)) return null;
      cells.push(line.slice(open + 1, close).replaceAll('""', '"'));
      at = end + delimiter.length;
    } else {
      const stop = line.indexOf(delimiter, at);
      const end = stop < 0 ? line.length : stop;
      const cell = line.slice(at, end);
      if (cell.includes('"')) return null;
      cells.push(cell.trim());
      at = end + delimiter.length;
    }
  }
  return cells;
}

const quote = 0x22;

/** A blank, or a tab where that does not stand between cells. */
function isBlank(line: string, at: number, delimiter: string): boolean {
  const unit = line.charCodeAt(at);
  return unit === 0x20 || (unit === 0x09 && delimiter !== "\t");
}

/** Where the quote is that is not followed by another; −1 where there is none. */
function closingQuote(line: string, start: number): number {
  let close = line.indexOf('"', start);
  while (close >= 0 && line.charCodeAt(close + 1) === quote) close = line.indexOf('"', close + 2);
  return close;
}
