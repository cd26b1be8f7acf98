import type { Diagnostic, Run } from "../contract/findings.js";
import { countWords } from "./diagnosticText.js";
import { type Html, html, nothing } from "./html.js";
import { lineCell } from "./htmlTable.js";

/** Whether a diagnostic belongs to a run or to one of its items. */
export function belongsTo(run: Run, { item }: Diagnostic): boolean {
  return item !== null && (item === run.id || item.startsWith(`${run.id}/`));
}

/** What to watch: cautions first, then what was found wrong or doubtful. */
export function runWatch(run: Run, diagnostics: readonly Diagnostic[]): { gist: string; body: Html } {
  const cautions = run.cautions.map(({ text }) => html`<li><strong>Caution.</strong> ${text}</li>`);
  const count = cautions.length === 0 ? [] : [cautions.length === 1 ? "1 caution" : `${cautions.length} cautions`];
  const found = diagnostics.length === 0 ? [] : [countWords(diagnostics)];
  const gist = [...count, ...found].join(", ");
  return {
    gist,
    body:
      gist === ""
        ? html`<p>Nothing was found to be wrong or missing in this run.</p>`
        : html`${cautions.length === 0 ? nothing : html`<ul>${cautions}</ul>`}${diagnosticList(diagnostics)}`,
  };
}

/** Diagnostics as a list: how grave in words, what is wrong, its code and its line. */
export function diagnosticList(diagnostics: readonly Diagnostic[]): Html {
  if (diagnostics.length === 0) return nothing;
  const items = diagnostics.map(
    (diagnostic) =>
      html`<li><strong>${gravity[diagnostic.severity]}.</strong> ${diagnostic.message} <span class="line">${diagnostic.code}, </span>${lineCell({ place: diagnostic })}</li>`,
  );
  return html`<ul>${items}</ul>`;
}

const gravity = { error: "Error", warning: "Warning", information: "To know" } as const;
