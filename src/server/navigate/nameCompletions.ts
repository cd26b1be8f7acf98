import { CompletionItemKind } from "vscode-languageserver";
import { speciesMentions } from "../../language/navigate/speciesMentions.js";
import type { Part } from "../../language/shape.js";
import type { CompletionContext } from "./completionContext.js";
import type { OfferedItem } from "./offeredItem.js";

/** Names and fixed words that a part may be; nothing for what only the writer knows. */
export function partCompletions(context: CompletionContext, part: Part): OfferedItem[] {
  switch (part.part) {
    case "keyword":
      return [fixed(part.word)];
    case "words":
      return [fixed(part.phrase)];
    case "orders":
      return [fixed("order")];
    case "species":
    case "formula":
      return species(context);
    case "name":
      return part.declares ? [] : names(context, part.of);
    case "run reference":
      return names(context, "run");
    default:
      return [];
  }
}

function fixed(text: string): OfferedItem {
  return { label: text, newText: text, kind: CompletionItemKind.Keyword, sortText: `1${text}` };
}

function names(context: CompletionContext, kind: string): OfferedItem[] {
  if (kind === "column") return columns(context);
  const declared = context.bound.uses.filter((use) => use.kind === kind && use.declares && use.name !== "");
  // A run can start from any other, not from itself.
  const others = declared.map(({ name }) => name).filter((name) => kind !== "run" || name !== context.own);
  return [...new Set(others)].map((name, index) => ({
    label: name,
    newText: name,
    kind: CompletionItemKind.Class,
    detail: kind === "run" ? titleOf(context, name) : kind,
    sortText: `0${order(index)}`,
  }));
}

function titleOf({ bound }: CompletionContext, name: string): string {
  const source = bound.study.runs.find((one) => one.kind === "run" && one.run.name === name);
  const title = source?.kind === "run" ? source.run.title : null;
  return title === null ? "run" : `run “${title}”`;
}

/** Columns of the run; of the whole description where it has none yet. */
function columns({ bound, run }: CompletionContext): OfferedItem[] {
  const own = run?.data?.columns ?? [];
  const others = bound.uses.filter(({ kind, declares }) => kind === "column" && declares).map(({ name }) => name);
  const found = own.length > 0 ? own.map(({ name }) => name) : [...new Set(others)];
  return found.map((name, index) => {
    const by = own.find((column) => column.name === name)?.by.value;
    const detail = by === undefined ? "column" : "header" in by ? `column “${by.header}”` : `column ${by.number}`;
    return { label: name, newText: name, kind: CompletionItemKind.Variable, detail, sortText: `0${order(index)}` };
  });
}

/** Declared species and those of the reaction first, then what is named elsewhere. */
function species({ bound, run, offset }: CompletionContext): OfferedItem[] {
  const details = new Map<string, string>();
  const add = (key: string, detail: string): void => {
    if (!details.has(key)) details.set(key, detail);
  };
  const reactions = [...(run?.reaction ? [run.reaction] : []), ...bound.study.reactions];
  for (const { reactants, products } of reactions) {
    for (const key of reactants) add(key, "used up by the reaction");
    for (const key of products) add(key, "formed by the reaction");
  }
  for (const { key, formula } of bound.study.species) add(key, formula === null ? "declared" : `is ${formula.text}`);
  for (const { key, origin } of speciesMentions(bound)) {
    const isTyped = origin.start <= offset && offset <= origin.end;
    if (!isTyped) add(key, "named in this description");
  }
  return [...details].map(([key, detail], index) => ({
    label: key,
    newText: key,
    kind: CompletionItemKind.Constant,
    detail,
    sortText: `0${order(index)}`,
  }));
}

export function order(index: number): string {
  return String(index).padStart(3, "0");
}
