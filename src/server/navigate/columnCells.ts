import type { Location, Position } from "vscode-languageserver";
import type { TextDocument } from "vscode-languageserver-textdocument";
import { type HeaderCell, headerCellOf } from "../../data/headerCells.js";
import type { Bound } from "../../language/bind/bind.js";
import type { ColumnFact, DataFile } from "../../study/run.js";
import { optionsOf } from "../../workspace/columnStore.js";
import { dataLocations } from "../../workspace/loadFiles.js";
import type { ServerContext } from "../context.js";

/** A column of a run, and the header cell it is in its data file. */
export interface ColumnCell {
  readonly run: string;
  readonly column: ColumnFact;
  /** URI of the data file */
  readonly uri: string;
  readonly cell: HeaderCell;
}

/** The header cells of the columns that `wanted` lets through, run by run; runs of one file read it once. */
export async function columnCells(
  context: ServerContext,
  bound: Bound,
  wanted: (run: string, column: ColumnFact, uri: string) => boolean,
): Promise<ColumnCell[]> {
  const locations = dataLocations(bound.study, context.access());
  const found: ColumnCell[] = [];
  const read = new Map<string, readonly HeaderCell[] | null>();
  for (const source of bound.study.runs) {
    if (source.kind !== "run" || source.run.data === null) continue;
    const { name, data } = source.run;
    const place = locations.get(data.path);
    if (place === undefined || !("uri" in place)) continue;
    const { uri } = place;
    const columns = data.columns.filter((column) => wanted(name, column, uri));
    if (columns.length === 0) continue;
    const cells = await cellsOf(context, uri, data, read);
    for (const column of columns) {
      const cell = cells === null ? null : headerCellOf(cells, column.by.value);
      if (cell !== null) found.push({ run: name, column, uri, cell });
    }
  }
  return found;
}

async function cellsOf(
  context: ServerContext,
  uri: string,
  data: DataFile,
  read: Map<string, readonly HeaderCell[] | null>,
): Promise<readonly HeaderCell[] | null> {
  const key = `${uri} ${JSON.stringify(optionsOf(data))}`;
  const before = read.get(key);
  if (before !== undefined) return before;
  const cells = await context.workspace().headers(uri, optionsOf(data));
  read.set(key, cells);
  return cells;
}

/** Where a header cell stands in its file; its line where the cell itself was not found on it. */
export function locationOf({ uri, cell }: ColumnCell): Location {
  const line = cell.line - 1;
  const { start, end } = cell.span ?? { start: 0, end: 0 };
  return { uri, range: { start: { line, character: start }, end: { line, character: end } } };
}

/** Columns of open descriptions whose header cell stands at a place of a data file. */
export async function columnsAtCell(
  context: ServerContext,
  uri: string,
  { line, character }: Position,
): Promise<{ open: TextDocument; cells: ColumnCell[] }[]> {
  const found: { open: TextDocument; cells: ColumnCell[] }[] = [];
  for (const open of context.documents.all()) {
    const bound = context.workspace().bound(context.document(open));
    const all = await columnCells(context, bound, (_run, _column, file) => file === uri);
    const cells = all.filter(({ cell: { line: own, span } }) => {
      return own === line + 1 && span !== null && span.start <= character && character <= span.end;
    });
    if (cells.length > 0) found.push({ open, cells });
  }
  return found;
}
