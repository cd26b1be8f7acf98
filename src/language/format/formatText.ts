import type { Edit } from "../../contract/problem.js";
import { failure, type Result, success } from "../../contract/result.js";
import { bind } from "../bind/bind.js";
import { parse } from "../parse.js";
import { type LaidOutLine, layOut } from "./layOut.js";
import type { Signs } from "./quantitySigns.js";
import { refusal } from "./refusal.js";
import { type Essence, essenceOf, hasEssence } from "./sameMeaning.js";

/** Which of the two notations the formatter writes: `° µ · ± → ⇌ ⁻¹`, or `deg u * +/- -> <=> ^-1`. */
export type FormatNotation = "unicode" | "ascii";

export interface FormatOptions {
  readonly notation: FormatNotation;
  /** only these lines are changed, from 0, both included; the whole text where they are not given */
  readonly lines?: { readonly first: number; readonly last: number };
}

/** The text formatted; a problem where that would change what it says. */
export function formatText(uri: string, text: string, options: FormatOptions): Result<string> {
  const edits = formatEdits(uri, text, options);
  return edits.ok ? success(edited(text, edits.value)) : edits;
}

/**
 * What formatting changes in a text: edits of whole lines, in order, none where it is formatted already. The result is
 * read again before it is given: it means the same, the same problems are said of it in the same order, it holds the
 * same comments. Where the notation stands against that, signs stay as written; where even the spacing does, the whole
 * is refused.
 */
export function formatEdits(uri: string, text: string, options: FormatOptions): Result<readonly Edit[]> {
  const mark = text.startsWith("\ufeff") ? 1 : 0;
  const bare = text.slice(mark);
  const parsed = parse(uri, bare);
  let essence: Essence | null = null;
  let refused: readonly LaidOutLine[] = [];
  for (const signs of [options.notation, "as written"] satisfies Signs[]) {
    refused = layOut(parsed, signs);
    const edits = editsOf(bare, refused, options.lines);
    essence ??= edits.length === 0 ? null : essenceOf(bind(parsed));
    if (essence === null || hasEssence(uri, edited(bare, edits), essence)) {
      return success(edits.map((edit) => ({ ...edit, start: edit.start + mark, end: edit.end + mark })));
    }
  }
  return failure(refusal(uri, refused, mark));
}

/** Every line keeps its own line break; one is added at the end of the file. */
function editsOf(text: string, lines: readonly LaidOutLine[], only: FormatOptions["lines"]): Edit[] {
  const usual = /\r\n|\n/.exec(text)?.[0] ?? "\n";
  return lines.flatMap(({ line, text: after }, number): Edit[] => {
    if (only !== undefined && (number < only.first || number > only.last)) return [];
    const end = line.start + line.text.length;
    const { ending } = line;
    if (after === null) return [{ start: line.start, end: end + ending.length, text: "" }];
    if (ending === "\r\n" || ending === "\n")
      return after === line.text ? [] : [{ start: line.start, end, text: after }];
    return [{ start: line.start, end: end + ending.length, text: after + usual }];
  });
}

function edited(text: string, edits: readonly Edit[]): string {
  let result = "";
  let at = 0;
  for (const edit of edits) {
    result += text.slice(at, edit.start) + edit.text;
    at = edit.end;
  }
  return result + text.slice(at);
}
