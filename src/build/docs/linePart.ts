import { headsBelow, type Owner, type StatementRow, statementByHead } from "../../language/statements.js";
import { anchor, code, fenced, prose } from "./prose.js";
import { filledIn, syntaxLine } from "./syntaxLine.js";

/** The words a line begins with whatever else it holds: `molar mass`, `results in`. */
export function lineName({ head, parts }: StatementRow): string {
  const [first] = parts;
  return first?.part === "keyword" ? `${head} ${first.word}` : head;
}

/** A link to the part of a line on the same page. */
export function lineLink(row: StatementRow): string {
  const name = lineName(row);
  return `[${code(name)}](#${anchor(name)})`;
}

/** One line of the language, as a part of the reference page. */
export function linePart(row: StatementRow): string[] {
  const { head, parts, help, example, opens } = row;
  const below = opens === undefined ? [] : headsBelow(opens).flatMap((one) => statementByHead.get(one) ?? []);
  const filled = filledIn(parts).map(({ word, words }) => `- ${code(word)}: ${prose(words)}`);
  return [
    `### ${lineName(row)}`,
    fenced("text", syntaxLine(head, parts)),
    prose(help),
    filled.join("\n"),
    `Where: ${row.owners.map(ownerWords).join("; ")}. ${repeatWords(row)}`,
    below.length === 0 ? "" : `Its own lines: ${below.map(lineLink).join(", ")}.`,
    "kept" in row && row.kept === true ? "It is read, checked and kept; nothing is computed with it yet." : "",
    fenced("raterun", example),
  ];
}

function ownerWords(owner: Owner): string {
  return owner === "file" ? "directly in the file" : `below ${code(owner)}`;
}

function repeatWords({ repeats, owners }: StatementRow): string {
  const forAll =
    owners.includes("file") && owners.includes("run") ? " Above the first run it holds for every run below." : "";
  switch (repeats.repeat) {
    case "once":
      return `Once in each place.${forAll}`;
    case "many":
      return `As often as needed.${forAll}`;
    case "set":
      return `As often as needed; a run that is like another takes over all of them, or none once it has its own.${forAll}`;
    case "key": {
      const each = `Once for each ${repeats.field}`;
      const inRun = owners.some((owner) => owner !== "file" && owner !== "species" && owner !== "series");
      return inRun
        ? `${each}; a run that is like another replaces the one with the same ${repeats.field}.${forAll}`
        : `${each}.`;
    }
  }
}
