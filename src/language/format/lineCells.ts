import { lexLine, type Token } from "../lexer.js";
import type { LineStatement } from "../syntax.js";
import { equationSigns } from "./equationSigns.js";
import { headWords } from "./headWords.js";
import { type Leaf, leafFields } from "./leafFields.js";
import { quantitySigns, type Signs } from "./quantitySigns.js";
import { type IsDeclared, speciesSigns } from "./speciesSigns.js";

/** A line taken apart: what it is, its values that stand in columns, and the comment behind them. */
export interface LineCells {
  /** `taken`, `molar mass` */
  readonly head: string;
  /** values with single spaces inside; each may be aligned with those of the line below */
  readonly cells: readonly string[];
  /** "" where there is none */
  readonly comment: string;
}

/** A stretch of a line that is written as one: a token, or all tokens of one value. */
interface Piece {
  readonly text: string;
  /** the value it belongs to; null for a connecting word or a comma */
  readonly leaf: Leaf | null;
  readonly comma: boolean;
}

/** Takes a sound line apart and writes its pieces in the signs that are asked for. */
export function lineCells(text: string, line: LineStatement, signs: Signs, isDeclared: IsDeclared): LineCells {
  const tokens = lexLine(text);
  const comment = tokens.find(({ kind }) => kind === "comment")?.text.trimEnd() ?? "";
  const words = tokens.filter(({ kind }) => kind !== "comment");
  const count = headWords(line.row, words.length);
  const head = words
    .slice(0, count)
    .map((word) => word.text)
    .join(" ");
  const pieces = piecesOf(text, words.slice(count), leafFields(line), signs, isDeclared);
  return { head, cells: cellsOf(pieces), comment };
}

function piecesOf(
  text: string,
  tokens: readonly Token[],
  leaves: readonly Leaf[],
  signs: Signs,
  isDeclared: IsDeclared,
): Piece[] {
  const pieces: Piece[] = [];
  let at = 0;
  let next = 0;
  while (at < tokens.length) {
    const token = tokens[at] as Token;
    while (next < leaves.length && (leaves[next]?.end ?? 0) <= token.start) next++;
    const leaf = leaves[next] ?? null;
    const here = leaf !== null && leaf.start <= token.start ? leaf : null;
    if (here === null || !respelled(here, token)) {
      pieces.push({ text: tokenText(token), leaf: here, comma: token.kind === "operator" && token.text === "," });
      at++;
      continue;
    }
    pieces.push({
      text: leafText(text.slice(here.start, here.end), here, signs, isDeclared),
      leaf: here,
      comma: false,
    });
    while (at < tokens.length && (tokens[at]?.start ?? 0) < here.end) at++;
  }
  return pieces;
}

/** Quotes become straight; what stands between them is never touched. */
function tokenText(token: Token): string {
  return token.kind === "string" ? `"${token.text}"` : token.text;
}

/** Whether a value is written anew as a whole; a species is so only where it is one word. */
function respelled({ role, start, end }: Leaf, token: Token): boolean {
  if (role === "species") return token.kind === "word" && token.start === start && token.end === end;
  return (role === "quantity" || role === "equation") && token.start === start;
}

function leafText(written: string, { role }: Leaf, signs: Signs, isDeclared: IsDeclared): string {
  if (role === "equation") return equationSigns(written, signs, isDeclared);
  return role === "species" ? speciesSigns(written, signs, isDeclared) : quantitySigns(written, signs);
}

/**
 * A new cell begins where one value follows another without a word between them, and at the role behind a quantity
 * (`… mol/L  as catalyst`). Fixed phrases (`at 20 s`) open none.
 */
function cellsOf(pieces: readonly Piece[]): string[] {
  const cells: string[] = [];
  pieces.forEach((piece, index) => {
    const before = pieces[index - 1];
    if (before === undefined || beginsCell(before, piece)) cells.push(piece.text);
    else cells.push(`${cells.pop() ?? ""}${piece.comma ? "" : " "}${piece.text}`);
  });
  return cells;
}

function beginsCell(before: Piece, piece: Piece): boolean {
  if (piece.leaf === null) return piece.text === "as" && before.leaf?.role === "quantity";
  if (before.leaf === null || before.leaf === piece.leaf) return false;
  return before.leaf.role !== "phrase" && piece.leaf.role !== "phrase";
}
