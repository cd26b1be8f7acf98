import { type Edit, type Origin, problem } from "../../contract/problem.js";
import { failure, type Result, success } from "../../contract/result.js";
import { messageOf } from "../../contract/words.js";
import { type Bound, bind } from "../bind/bind.js";
import { speciesKey } from "../bind/resolveSpecies.js";
import { positionAt } from "../lineIndex.js";
import { parse } from "../parse.js";
import { parseLine } from "../parseLine.js";
import type { NameKind, Part } from "../shape.js";
import type { StatementRow } from "../statements.js";
import { everyStatement } from "./everyStatement.js";
import { type FoundName, nameAt } from "./names.js";
import { speciesMentions } from "./speciesMentions.js";

/**
 * The edits that give a thing another name everywhere in its description. Refused where the thing is a formula, where
 * the new name is malformed, is a connecting word or is taken, where a line with a mistake may hold the name, and where
 * the description would say something else afterwards.
 */
export function rename(bound: Bound, found: FoundName, name: string): Result<readonly Edit[]> {
  const { origin, kind } = found;
  if (found.formula) return failure(problem("rename-formula", { formula: found.name }, origin));
  if (name === found.name) return success([]);
  if (!isName(name)) return failure(problem("name-malformed", { name, what: kind }, origin));
  const taken = placeOfTaken(bound, found, name);
  if (taken !== null) {
    const line = positionAt(bound.parsed.index, taken.start).line + 1;
    return failure(problem("name-twice", { what: kind, name, line }, origin));
  }
  const unsure = brokenLineWith(bound, found);
  if (unsure !== null) return failure(problem("rename-unsure", { name: found.name, line: unsure }, origin));
  const edits = found.occurrences.map(({ origin: { start, end } }) => ({ start, end, text: name }));
  const why = whatChanges(bound, found, edits, name);
  return why === null ? success(edits) : failure(problem("rename-changes", { name, why }, origin));
}

/** Whether a word can be a name: the parser's own word for it. */
function isName(name: string): boolean {
  const { statements, fault } = parseLine(`run ${name}`);
  return fault === null && statements.length === 1 && statements[0]?.fields.get("run")?.text === name;
}

/** Where the name stands already for another thing of its kind; of columns, in the same runs. */
function placeOfTaken(bound: Bound, found: FoundName, name: string): Origin | null {
  if (found.kind === "species") {
    const declared = new Map(bound.study.species.map((species) => [species.key, species]));
    const key = speciesKey({ declared }, name);
    return speciesMentions(bound).find((mention) => mention.key === key || mention.key === name)?.origin ?? null;
  }
  const runs = new Set(found.runs);
  const other = bound.uses.find(
    (use) => use.kind === found.kind && use.name === name && (use.run === null || runs.has(use.run)),
  );
  return other?.origin ?? null;
}

/** The line, from 1, of a broken statement that could mean the thing by a word of its; null where there is none. */
function brokenLineWith({ parsed }: Bound, { name, kind, occurrences }: FoundName): number | null {
  const letters = "[\\p{L}\\p{N}_′-]";
  const word = new RegExp(`(?<!${letters})${name}(?!${letters})`, "gu");
  const known = new Set(occurrences.map(({ origin }) => origin.start));
  for (const { line, offset } of everyStatement(parsed.statements)) {
    if (line.fault === null || (line.row !== null && !mayHold(line.row, kind))) continue;
    const text = parsed.text.slice(offset + line.head.end, offset + line.span.end);
    for (const { index } of text.matchAll(word)) {
      if (!known.has(offset + line.head.end + index)) return positionAt(parsed.index, offset).line + 1;
    }
  }
  return null;
}

/** Whether a kind of line can name a thing of this kind. */
function mayHold(row: StatementRow, kind: NameKind): boolean {
  const holds = (part: Part): boolean => {
    if (part.part === "optional") return part.parts.some(holds);
    if (part.part === "either" || part.part === "any") return part.options.some((option) => option.some(holds));
    if (part.part === "list") return holds(part.of);
    if (part.part === "name") return part.of === kind;
    if (part.part === "run reference") return kind === "run";
    return kind === "species" && ["species", "equation", "orders"].includes(part.part);
  };
  return row.parts.some(holds);
}

/** What the description would say otherwise with the edits, in words; null where nothing. */
function whatChanges(bound: Bound, found: FoundName, edits: readonly Edit[], name: string): string | null {
  const { uri, text } = bound.parsed;
  let changed = text;
  for (const edit of edits.toReversed()) changed = changed.slice(0, edit.start) + edit.text + changed.slice(edit.end);
  const after = bind(parse(uri, changed));
  const left = bound.problems.map(({ code }) => code);
  for (const one of after.problems) {
    const at = left.indexOf(one.code);
    if (at < 0) return messageOf(one);
    left.splice(at, 1);
  }
  const again = nameAt(after, edits[0]?.start ?? 0);
  const same = again?.name === name && again.kind === found.kind && again.occurrences.length === edits.length;
  return same ? null : "One place of the name would not be read as it any more.";
}
