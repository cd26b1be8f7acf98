import type { Span } from "../../contract/problem.js";
import { lexLine, type Token } from "../lexer.js";
import type { NameKind, Part } from "../shape.js";
import type { Field, LineStatement } from "../syntax.js";
import { partOfField } from "./partOfField.js";

/** What a word on a line is. */
export type WordRole = "head" | "keyword" | NameKind | "number" | "unit" | "string" | "operator" | "comment";

/** A word with its place, in UTF-16 units from the start of its line. */
export interface LineWord extends Span {
  readonly text: string;
  readonly role: WordRole;
  /** whether it gives a name to something */
  readonly declares: boolean;
}

/** The words of one statement from left to right, as far as they were understood. `text` is the whole line. */
export function lineWords(text: string, line: LineStatement): LineWord[] {
  const fields = [...line.fields].flatMap(([label, field]) => leaves(line, label, field));
  return lexLine(text).flatMap((token): LineWord[] => {
    if (token.kind === "comment" || token.start < line.span.start || token.end > line.span.end) return [];
    const role = token.start === line.head.start ? "head" : roleOf(token, line, fields);
    if (role === null) return [];
    const leaf = fields.find(({ span }) => covers(span, token));
    return [{ ...word(token, role), declares: leaf?.part?.part === "name" && leaf.part.declares }];
  });
}

/** The comment of a line, or null. */
export function commentOf(text: string): LineWord | null {
  const token = text.includes("#") ? lexLine(text).find(({ kind }) => kind === "comment") : undefined;
  return token === undefined ? null : word(token, "comment");
}

function word({ text, start, end }: Token, role: WordRole): LineWord {
  return { text, start, end, role, declares: false };
}

interface Leaf {
  readonly part: Part | null;
  readonly span: Span;
}

function leaves(line: LineStatement, label: string, field: Field): Leaf[] {
  const part = line.row === null ? null : partOfField(line.row, label);
  return field.kind === "list" ? field.items.map(({ span }) => ({ part, span })) : [{ part, span: field.span }];
}

function covers(span: Span, token: Token): boolean {
  return span.start <= token.start && token.end <= span.end;
}

/** Null for a word of a broken line that nothing was made of. */
function roleOf(token: Token, line: LineStatement, fields: readonly Leaf[]): WordRole | null {
  if (token.kind === "string") return "string";
  const leaf = fields.find(({ span }) => covers(span, token));
  if (leaf === undefined) {
    if (token.kind === "operator") return "operator";
    return line.fault === null || token.end <= line.fault.span.start ? "keyword" : null;
  }
  const { part } = leaf;
  if (part?.part === "equation") return inEquation(token);
  if (part?.part === "orders") return inOrders(token);
  if (part?.part === "quantity") return inQuantity(token);
  if (token.kind === "operator") return "operator";
  return part === null ? null : roleOfPart(part);
}

function roleOfPart(part: Part): WordRole {
  switch (part.part) {
    case "name":
      return part.of;
    case "species":
    case "formula":
      return "species";
    case "run reference":
      return "run";
    case "unit":
      return "unit";
    case "charge":
    case "date":
    case "integer":
    case "number":
      return "number";
    default:
      return "keyword";
  }
}

function inEquation({ kind, text }: Token): WordRole {
  if (kind === "operator" || text === "+" || /^[=→⇌⇄]|^->/.test(text)) return "operator";
  return /^\d+(\/\d+)?$/.test(text) ? "number" : "species";
}

function inOrders({ kind, text }: Token): WordRole {
  if (kind === "operator") return "operator";
  if (/^[\d.,]+$/.test(text)) return "number";
  return /^(order|in|then|beside|free)$/.test(text) ? "keyword" : "species";
}

function inQuantity({ kind, text }: Token): WordRole {
  if (kind === "operator") return "operator";
  if (/^(within|by|from|mass|amount|volume)$/.test(text)) return "keyword";
  return /^\(?[+\-−]?[\d.,]|^\+\/[-−]$/.test(text) ? "number" : "unit";
}
