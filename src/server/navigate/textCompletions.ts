import { CompletionItemKind } from "vscode-languageserver";
import type { HeaderCell } from "../../data/headerCells.js";
import { isInside, resolveUri } from "../../data/resolve.js";
import type { Part } from "../../language/shape.js";
import type { StatementRow } from "../../language/statements.js";
import { optionsOf } from "../../workspace/columnStore.js";
import type { ServerContext } from "../context.js";
import type { CompletionContext } from "./completionContext.js";
import { order } from "./nameCompletions.js";
import type { OfferedItem } from "./offeredItem.js";

/** What a text in quotes may hold, and how much of what is typed it replaces. */
export interface TextOffer {
  readonly items: readonly OfferedItem[];
  /** length of what stands before the last name of a path, which stays */
  readonly kept: number;
}

const none: TextOffer = { items: [], kept: 0 };

/** Paths of files, headers of the data file, and the few other texts there is a choice of. */
export async function textCompletions(
  server: ServerContext,
  context: CompletionContext,
  row: StatementRow,
  part: Part,
  typed: string,
): Promise<TextOffer> {
  if (part.part === "run reference") return paths(server, context, typed, isDescription);
  if (part.part !== "string" && part.part !== "quantity") return none;
  const label = part.part === "quantity" ? "header" : part.label;
  if (label === "path") return paths(server, context, typed, isData);
  if (label === "header") return { items: await headers(server, context), kept: 0 };
  const texts = choices[row.head] ?? [];
  return { items: texts.map((text) => ({ label: text, newText: text, kind: CompletionItemKind.Value })), kept: 0 };
}

const choices: Readonly<Record<string, readonly string[]>> = {
  delimiter: [";", ",", "tab", "space"],
  encoding: ["utf-8", "windows-1252", "iso-8859-15", "utf-16le", "macintosh"],
};

function isDescription(name: string): boolean {
  return name.endsWith(".raterun");
}

function isData(name: string): boolean {
  return !/\.(raterun|raterecord)$/.test(name);
}

const usualEnding = /\.(csv|tsv|txt|dat|asc|prn)$/i;

/** Files and folders in the folder that is typed so far; nothing of one that may not be read. */
async function paths(
  server: ServerContext,
  { bound }: CompletionContext,
  typed: string,
  fits: (name: string) => boolean,
): Promise<TextOffer> {
  const kept = typed.lastIndexOf("/") + 1;
  const { uri } = bound.parsed;
  const folder = resolveUri(uri, `./${typed.slice(0, kept)}`);
  const fence = server.access().within(uri);
  if (folder.kind !== "uri" || (fence !== null && !isInside(fence, folder.uri))) return none;
  const entries = (await server.folders.list(folder.uri)).filter(({ name, kind }) => {
    return !name.startsWith(".") && (kind === "folder" ? name !== "node_modules" : fits(name));
  });
  const rank = (entry: (typeof entries)[number]): number => {
    return entry.kind === "folder" ? 1 : isDescription(entry.name) || usualEnding.test(entry.name) ? 0 : 2;
  };
  const sorted = entries.sort((a, b) => rank(a) - rank(b) || (a.name < b.name ? -1 : 1));
  const items = sorted.map(
    ({ name, kind }, index): OfferedItem => ({
      label: name,
      newText: name,
      kind: kind === "folder" ? CompletionItemKind.Folder : CompletionItemKind.File,
      sortText: `0${order(index)}`,
    }),
  );
  return { items, kept };
}

/** Headers of the data file as it is on disk; those that no column has yet come first. */
async function headers(server: ServerContext, context: CompletionContext): Promise<OfferedItem[]> {
  const cells = await headersOf(server, context);
  const taken = new Set(
    (context.run?.data?.columns ?? []).flatMap(({ by }) => ("header" in by.value ? [by.value.header] : [])),
  );
  const texts = new Map(
    cells.filter(({ header }) => header !== "" && !/["\n]/.test(header)).map((cell) => [cell.header, cell]),
  );
  return [...texts].map(([header, { unit }], index) => ({
    label: header,
    newText: header,
    kind: CompletionItemKind.Field,
    detail: unit === null ? "states no unit" : `in ${unit.text}`,
    sortText: `${taken.has(header) ? 1 : 0}${order(index)}`,
  }));
}

/** Header cells of the file that is spoken of; none where it cannot be read. */
export async function headersOf(
  server: ServerContext,
  { bound, run, path }: CompletionContext,
): Promise<readonly HeaderCell[]> {
  if (path === null) return [];
  const { uri } = bound.parsed;
  const place = resolveUri(uri, path);
  const fence = server.access().within(uri);
  if (place.kind !== "uri" || (fence !== null && !isInside(fence, place.uri))) return [];
  const options = run?.data?.path === path ? optionsOf(run.data) : {};
  return (await server.workspace().headers(place.uri, options)) ?? [];
}
