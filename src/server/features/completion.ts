import { type CompletionItem, CompletionItemKind, type CompletionList, InsertTextFormat } from "vscode-languageserver";
import type { Span } from "../../contract/problem.js";
import { headerCellOf } from "../../data/headerCells.js";
import { fieldOf } from "../../language/fields.js";
import { everyStatement } from "../../language/navigate/everyStatement.js";
import { type WantedAt, wantedAt } from "../../language/navigate/wantedAt.js";
import type { Part } from "../../language/shape.js";
import type { Feature, ServerContext } from "../context.js";
import { type CompletionContext, completionContext } from "../navigate/completionContext.js";
import { headCompletions } from "../navigate/headCompletions.js";
import { partCompletions } from "../navigate/nameCompletions.js";
import type { OfferedItem } from "../navigate/offeredItem.js";
import { headersOf, textCompletions } from "../navigate/textCompletions.js";
import { columnUnits, resultUnits, unitCompletions } from "../navigate/unitCompletions.js";
import { type OpenBound, openBoundAt } from "../openBound.js";

/** What may be written at the place: lines, fixed words, names, species, units, headers of the data file, paths. */
export const completion: Feature = {
  capabilities: { completionProvider: { triggerCharacters: [" ", '"', "/"], resolveProvider: false } },
  start(context) {
    context.connection.onCompletion(async (params): Promise<CompletionList> => {
      const here = openBoundAt(context, params);
      const wanted = here === null ? null : wantedAt(here.bound.parsed, here.offset);
      const items = here === null || wanted === null ? [] : await itemsAt(context, here, here.offset, wanted);
      // Complete: the editor narrows the list down itself. Asked again at each letter it would show the list of the letter
      // before for a moment, and Enter would take something that does not fit.
      return { isIncomplete: false, items };
    });
  },
};

async function itemsAt(
  server: ServerContext,
  { open, bound }: OpenBound,
  offset: number,
  wanted: WantedAt,
): Promise<CompletionItem[]> {
  const context = completionContext(bound, offset);
  const { span, typed, row } = wanted;
  if (wanted.inString !== "no") {
    if (row === null) return [];
    const part = wanted.parts.find(({ part }) => part === "string" || part === "run reference" || part === "quantity");
    if (part === undefined) return [];
    const { items, kept } = await textCompletions(server, context, row, part, typed);
    const close = wanted.inString === "open" ? '"' : "";
    const place = { start: span.start + kept, end: wanted.inString === "open" ? offset : span.end };
    return placed(open, items, place, typed.slice(kept), (item) => {
      return item.kind === CompletionItemKind.Folder ? item.newText : item.newText + close;
    });
  }
  const items =
    row === null
      ? headCompletions(context, offset, {
          atMargin:
            bound.parsed.text.charAt(span.start - 1) !== " " && bound.parsed.text.charAt(span.start - 1) !== "\t",
          bare: !wanted.restEmpty || !server.client.abilities.snippets,
        })
      : await behindHead(server, context, offset, wanted);
  return placed(open, items, span, typed, ({ newText }) => newText);
}

async function behindHead(
  server: ServerContext,
  context: CompletionContext,
  offset: number,
  { parts, row, unitOf, typed }: WantedAt,
): Promise<OfferedItem[]> {
  const found: OfferedItem[] = unitOf === null ? [] : unitCompletions(context, unitOf);
  for (const part of parts) {
    found.push(...partCompletions(context, part));
    if (part.part === "unit") {
      found.push(...(row?.head === "column" ? columnUnits(await statedUnit(server, context, offset)) : resultUnits()));
    }
    if (part.part === "date") found.push(today());
    if (row !== null && typed === "" && isText(part)) {
      const { items } = await textCompletions(server, context, row, part, "");
      found.push(
        ...items.map((item) => ({ ...item, newText: `"${item.newText}"`, sortText: `2${item.sortText ?? ""}` })),
      );
    }
    if (part.part === "quantity" && context.open.some(({ owner }) => owner === "rows")) {
      found.push({ label: "from", newText: "from", kind: CompletionItemKind.Keyword, detail: "a column of the table" });
    }
  }
  const seen = new Set<string>();
  return found.filter(({ label }) => seen.size < seen.add(label).size);
}

function isText(part: Part): boolean {
  return part.part === "string" || part.part === "run reference";
}

/** The unit that the header of the column being written states. */
async function statedUnit(server: ServerContext, context: CompletionContext, offset: number) {
  const cells = await headersOf(server, context);
  for (const statement of everyStatement(context.bound.parsed.statements)) {
    const header = fieldOf(statement, "header");
    const end = statement.offset + statement.line.span.end;
    if (statement.line.row?.head !== "column" || header === null || statement.offset > offset || end < offset - 2)
      continue;
    return headerCellOf(cells, { header: header.text })?.unit ?? null;
  }
  return null;
}

function today(): OfferedItem {
  const now = new Date();
  const parts = [now.getFullYear(), now.getMonth() + 1, now.getDate()].map((part) => String(part).padStart(2, "0"));
  const text = parts.join("-");
  return { label: text, newText: text, kind: CompletionItemKind.Value, detail: "today" };
}

/** The items with what they replace; none where what is typed is one of them already. */
function placed(
  open: OpenBound["open"],
  items: readonly OfferedItem[],
  span: Span,
  typed: string,
  textOf: (item: OfferedItem) => string,
): CompletionItem[] {
  if (items.some(({ label, keepWhenTyped }) => label === typed && keepWhenTyped !== true)) return [];
  const range = { start: open.positionAt(span.start), end: open.positionAt(span.end) };
  return items.map((item) => {
    const { newText: _, keepWhenTyped: __, ...rest } = item;
    const plain = { insertTextFormat: InsertTextFormat.PlainText };
    return { ...plain, ...rest, filterText: item.label, textEdit: { range, newText: textOf(item) } };
  });
}
