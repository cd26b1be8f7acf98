import { CompletionItemKind, InsertTextFormat, MarkupKind } from "vscode-languageserver";
import { lineSnippet } from "../../language/navigate/lineSnippet.js";
import { headsAt } from "../../language/navigate/openAt.js";
import type { Part } from "../../language/shape.js";
import type { CompletionContext } from "./completionContext.js";
import type { OfferedItem } from "./offeredItem.js";
import { keywordWords } from "./wordHover.js";

/**
 * Lines that may stand here, those of the innermost header first, each with its example to fill in. `atMargin`: nothing
 * stands before the word, where headers are begun, so they come first. `bare`: only the first word is wanted.
 */
export function headCompletions(
  context: CompletionContext,
  offset: number,
  { atMargin, bare }: { readonly atMargin: boolean; readonly bare: boolean },
): OfferedItem[] {
  const deepest = context.open.length - 1;
  return headsAt(context.bound.parsed, offset).map(({ row, depth }, index) => {
    const { label, text } = lineSnippet(row, (part, example) => suggested(context, part, example));
    const far = atMargin && row.owners.includes("file") && row.opens !== undefined ? 0 : deepest - depth + 1;
    const whole = row.parts.length === 0;
    return {
      label,
      kind: row.opens === undefined ? CompletionItemKind.Keyword : CompletionItemKind.Module,
      detail: row.example,
      documentation: { kind: MarkupKind.Markdown, value: keywordWords(row) },
      sortText: `${far}${String(index).padStart(3, "0")}`,
      ...(bare || whole ? { newText: label } : { newText: text, insertTextFormat: InsertTextFormat.Snippet }),
      keepWhenTyped: !bare && !whole,
    };
  });
}

/** What stands in the description in place of the example's species and columns. */
function suggested({ bound, run }: CompletionContext, part: Part, example: string): string | null {
  const reaction = run?.reaction ?? bound.study.reactions[0] ?? null;
  if (part.part === "species") {
    const known = reaction === null ? [] : [...reaction.reactants, ...reaction.products];
    return known.includes(example) ? example : (known[0] ?? null);
  }
  if (part.part === "name" && part.of === "column" && !part.declares) {
    const columns = run?.data?.columns ?? [];
    return (columns[1] ?? columns[0])?.name ?? null;
  }
  return null;
}
