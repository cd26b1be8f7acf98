import type { StatementRow } from "../statements.js";

/** Headers of whole sections: their value follows one space behind the word, as in `run A "first"`. */
const sections: ReadonlySet<string> = new Set(["run", "rows", "series", "mechanism", "calibration"]);

export function opensSection({ opens }: StatementRow): boolean {
  return opens !== undefined && sections.has(opens);
}

/** A section header, or a line that the file has once and nothing else has: `ratewright 1`. */
export function standsAlone(row: StatementRow): boolean {
  if (row.opens !== undefined) return opensSection(row);
  return row.repeats.repeat === "once" && row.owners.length === 1 && row.owners[0] === "file";
}
