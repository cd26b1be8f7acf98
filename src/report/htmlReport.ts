import type { Description, Findings } from "../contract/findings.js";
import { type Html, html, nothing, readyMarkup } from "./html.js";
import { factTable, headedTable } from "./htmlTable.js";
import { pageStyle } from "./pageStyle.js";
import { reportFigure } from "./reportFigure.js";
import { runPart } from "./runPart.js";
import { belongsTo, diagnosticList } from "./runWatch.js";
import { mechanismPart, seriesPart } from "./seriesPart.js";

/**
 * Findings as one HTML page that needs nothing else: no script, nothing from outside, pictures within. It reads
 * downwards as a result is defended, run by run, and folds. The findings should hold curves, or there are no pictures.
 */
export function htmlReport(findings: Findings): string {
  const { descriptions } = findings;
  const title = descriptions.length === 1 ? `Rates of reaction: ${descriptions[0]?.path}` : "Rates of reaction";
  const page = html`<!DOCTYPE html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta http-equiv="Content-Security-Policy" content="default-src 'none'; style-src 'unsafe-inline'; img-src data:">
<meta name="viewport" content="width=device-width, initial-scale=1">
<meta name="color-scheme" content="light dark">
<title>${title}</title>
<style>${readyMarkup(pageStyle)}</style>
</head>
<body>
<main>
<h1>Rates of reaction</h1>
${contents(descriptions)}
${descriptions.map(descriptionPart)}
</main>
<footer>Ratewright ${findings.ratewright}, language ${findings.language}, method ${findings.method}. Every ± and every bracket is one standard uncertainty. This report is no risk assessment: local rules and licensed practice decide what may be done.</footer>
</body>
</html>
`;
  return page.markup;
}

function contents(descriptions: readonly Description[]): Html {
  if (descriptions.length < 2) return nothing;
  const items = descriptions.map(({ path }, index) => html`<li><a href="#d${index + 1}">${path}</a></li>`);
  return html`<nav aria-label="Descriptions"><ul>${items}</ul></nav>`;
}

function descriptionPart(description: Description, index: number): Html {
  const { path, runs, series, mechanisms, diagnostics } = description;
  const others = diagnostics.filter((diagnostic) => !runs.some((run) => belongsTo(run, diagnostic)));
  const beside =
    others.length === 0
      ? nothing
      : html`<section><h3>On the description as a whole</h3>${diagnosticList(others)}</section>`;
  return html`<article id="d${index + 1}"><h2>${path}</h2>
${runs.map((run) => runPart(run, description, reportFigure))}
${series.map(seriesPart)}${mechanisms.map(mechanismPart)}${beside}${provenance(description)}</article>`;
}

/** Which bytes and which meaning the figures rest on. */
export function provenance({ meaning, data }: Description): Html {
  const rows = data.map(({ path, rows, sha256 }) => [path, String(rows), html`<code>${sha256}</code>`]);
  return html`<section class="provenance"><h3>What it rests on</h3>${headedTable("Data files", ["file", "rows", "SHA-256"], rows)}${factTable("The description", [["meaning of the description, SHA-256", html`<code>${meaning}</code>`]])}</section>`;
}
