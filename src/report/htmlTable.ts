import { type Html, html, nothing } from "./html.js";

/** A cell: text, or markup; `null` where a row has nothing in that column. */
export type Cell = string | Html | null;

/** A table with a caption and heads; the first cell of each row is its head. Columns that are empty throughout are left out. */
export function headedTable(
  caption: string,
  heads: readonly (string | Html)[],
  rows: readonly (readonly Cell[])[],
): Html {
  if (rows.length === 0) return nothing;
  const shown = heads.map((_, column) => column === 0 || rows.some((row) => !isEmpty(row[column])));
  const kept = <T>(cells: readonly T[]): T[] => cells.filter((_, column) => shown[column]);
  const head = kept(heads).map((text) => (text === "" ? html`<td></td>` : html`<th scope="col">${text}</th>`));
  return html`<div class="wide" tabindex="0" role="group" aria-label="${caption}"><table><caption>${caption}</caption><thead><tr>${head}</tr></thead><tbody>${rows.map((row) => tableRow(kept(row)))}</tbody></table></div>`;
}

/** Facts one below the other: name, value, and the line of the description it came from. */
export function factTable(caption: string, rows: readonly (readonly Cell[])[]): Html {
  if (rows.length === 0) return nothing;
  return html`<table class="facts"><caption class="unseen">${caption}</caption><tbody>${rows.map(tableRow)}</tbody></table>`;
}

function tableRow([first, ...rest]: readonly Cell[]): Html {
  return html`<tr><th scope="row">${first ?? ""}</th>${rest.map((cell) => html`<td>${cell ?? ""}</td>`)}</tr>`;
}

function isEmpty(cell: Cell | undefined): boolean {
  return cell === null || cell === undefined || cell === "" || (typeof cell === "object" && cell.markup === "");
}

/** Where in the description something stands: "line 12". */
export function lineCell({ place }: { place: { line: number } }): Html {
  return html`<span class="line" data-line="${place.line}">line ${place.line}</span>`;
}
