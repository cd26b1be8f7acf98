import { type Owner, type StatementRow, statements } from "../../language/statements.js";
import { lineLink, linePart } from "./linePart.js";
import { anchor, generated, page } from "./prose.js";
import { quantitiesPart, unitTables } from "./unitsPart.js";
import { namesPart, numbersPart, speciesPart } from "./writingPart.js";

interface Group {
  readonly title: string;
  readonly rows: readonly StatementRow[];
}

/** Headers in the order of the table, each with the lines whose home it is; a line of several homes stands once. */
function groups(): Group[] {
  const owners: Owner[] = ["file", ...statements.flatMap(({ opens }) => (opens === undefined ? [] : [opens]))];
  return owners
    .map((owner) => ({
      title: owner === "file" ? "Directly in the file" : `Below ${owner}`,
      rows: statements.filter((row) => homeOf(row) === owner),
    }))
    .filter(({ rows }) => rows.length > 0);
}

/** Where a line is explained: what may also stand in the file, as a default, is explained with the run. */
function homeOf({ owners }: StatementRow): Owner | undefined {
  return owners.find((owner) => owner !== "file") ?? owners[0];
}

/** The reference page of the language. */
export function languagePage(): string {
  const parts = groups();
  const writing = [numbersPart(), unitTables(), quantitiesPart(), namesPart(), speciesPart()];
  return page(
    "# The language of run descriptions",
    generated,
    "A description (`.raterun`) states one fact a line: a keyword first, in small letters, then what it says. Free text and paths stand in quotes, nothing else does. `#` begins a comment. A line belongs to the nearest open header above it that takes it; how far it is indented does not matter. Files are UTF-8; `µ ° · ⁻¹ ± ⇌ →` and `u deg * ^-1 +/- <=> ->` are the same on reading.",
    "In the boxes, small words are written as they stand, words in capitals are filled in, square brackets hold what may be left out, `|` parts what may stand in the same place, and `…` stands for more of the same.",
    contents([
      ...parts.map(({ title, rows }) => ({ title, inner: rows.map(lineLink) })),
      ...writing.map(([title]) => ({ title: (title ?? "").replace(/^## /, ""), inner: [] })),
    ]),
    ...parts.map(({ title, rows }) => [`## ${title}`, ...rows.flatMap(linePart)]),
    ...writing,
    "What can be wrong with a description: [all codes](codes/README.md).",
  );
}

function contents(entries: readonly { title: string; inner: readonly string[] }[]): string {
  return entries
    .map(({ title, inner }) => {
      const links = inner.length === 0 ? "" : `: ${inner.join(" ")}`;
      return `- [${title}](#${anchor(title)})${links}`;
    })
    .join("\n");
}
