import type { Span } from "../../contract/problem.js";
import { lexLine, type Token } from "../lexer.js";
import { positionAt } from "../lineIndex.js";
import type { Parsed } from "../parse.js";
import { parseLine } from "../parseLine.js";
import type { QuantityKind } from "../quantityKinds.js";
import type { Part } from "../shape.js";
import { type StatementRow, statementByHead } from "../statements.js";
import { partOfField } from "./partOfField.js";

/** What could be written at a place: what completion asks the parser for. Spans are those of the text. */
export interface WantedAt {
  /** what is being typed there and would be replaced: a word, or a text without its quotes */
  readonly span: Span;
  /** as much of it as stands before the place */
  readonly typed: string;
  /** the kind of line; null where its first word is being typed */
  readonly row: StatementRow | null;
  /** what may stand here */
  readonly parts: readonly Part[];
  /** the kind of quantity whose unit may stand here; null where none may */
  readonly unitOf: QuantityKind | null;
  /** inside a text in quotes; `open` where the closing one is missing */
  readonly inString: "no" | "closed" | "open";
  /** whether anything but a comment follows on the line */
  readonly restEmpty: boolean;
}

/** Null where nothing is wanted: in a comment. The line is read up to the place as if it ended there. */
export function wantedAt({ text, index }: Parsed, offset: number): WantedAt | null {
  const lineNumber = positionAt(index, offset).line;
  const start = index.starts[lineNumber] ?? 0;
  const line = text.slice(start, index.starts[lineNumber + 1] ?? text.length).replace(/[\r\n]+$/, "");
  const at = Math.min(offset - start, line.length);
  const tokens = lexLine(line);
  const token = tokens.find((one) => one.start < at && at <= one.end && !isBehindString(one, at));
  if (token?.kind === "comment") return null;
  const inString = token?.kind !== "string" ? "no" : token.open ? "open" : "closed";
  const word = token?.kind === "word" ? token : null;
  const from = inString !== "no" && token !== undefined ? token.start : (word?.start ?? at);
  const end = word?.end ?? at;
  const inner =
    inString !== "no" && token !== undefined
      ? { start: token.start + 1, end: token.open ? token.end : token.end - 1 }
      : { start: from, end };
  const before = line.slice(0, from);
  const row = statementByHead.get(lexLine(before)[0]?.text ?? "") ?? null;
  const isHead = before.trim() === "";
  const parts = isHead ? [] : flat(parseLine(before).wanted);
  return {
    span: { start: start + inner.start, end: start + inner.end },
    typed: line.slice(inner.start, at),
    row: isHead ? null : row,
    parts: row !== null && isInEquation(before, row) ? [...parts, { part: "species", label: "species" }] : parts,
    unitOf: inString === "no" && !isHead ? unitWanted(before) : null,
    inString,
    restEmpty: !tokens.some((one) => one.kind !== "comment" && one.start >= Math.max(end, at)),
  };
}

/** Behind the closing quote one is not in the text any more. */
function isBehindString({ kind, open, end }: Token, at: number): boolean {
  return kind === "string" && !open && at === end;
}

/** The parts that could begin here, one by one. */
function flat(parts: readonly Part[]): Part[] {
  return parts.flatMap((part): Part[] => {
    if (part.part === "optional") return flat(part.parts.slice(0, 1));
    if (part.part === "either" || part.part === "any")
      return flat(part.options.flatMap((option) => option.slice(0, 1)));
    return part.part === "list" ? flat([part.of]) : [part];
  });
}

/** An equation takes whatever follows: a species may stand behind an arrow or a plus sign. */
function isInEquation(before: string, row: StatementRow): boolean {
  if (partOfField(row, "equation") === null) return false;
  return /(?:->|<=>|[→⇌]|\s\+|^\s*(?:reaction|by|is))\s*(?:\d+(?:\/\d+)?\s+)?$/.test(before);
}

/** The kind of quantity of which only the unit is still to be written: numbers and nothing else stand before the place. */
function unitWanted(before: string): QuantityKind | null {
  if (!/\s$/.test(before)) return null;
  const tokens = lexLine(before);
  let kind: QuantityKind | null = null;
  for (let at = tokens.length - 1; at > 0; at--) {
    const token = tokens[at] as Token;
    const isNumber = token.kind === "word" && /^\(?[+\-−]?[\d.,]/.test(token.text);
    if (!isNumber && !/^(±|\+\/[-−])$/.test(token.text)) break;
    const wanted = flat(parseLine(before.slice(0, token.start)).wanted);
    for (const part of wanted) if (isNumber && part.part === "quantity") kind = part.kind;
  }
  return kind;
}
