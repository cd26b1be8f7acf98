import { panelStyle } from "./panelStyle.js";
import { randomBytes } from "./randomBytes.js";

/** What the page is made with: the address of its script. */
export interface PanelPage {
  readonly script: string;
}

const exports = [
  ["svg", "SVG"],
  ["png", "PNG"],
  ["csv", "CSV of curves"],
  ["markdown", "Markdown"],
  ["html", "HTML report"],
] as const;

/**
 * The page of the preview, empty. Nothing but its own script and style may run or load, by a nonce of this page alone; a
 * picture may come from memory, for the PNG. What is shown comes by messages.
 */
export function panelPage({ script }: PanelPage): string {
  const nonce = randomBytes();
  const policy = `default-src 'none'; script-src 'nonce-${nonce}'; style-src 'nonce-${nonce}'; img-src data:; base-uri 'none'; form-action 'none'`;
  const buttons = exports.map(([format, name]) => `<button type="button" data-format="${format}">${name}</button>`);
  return `<!DOCTYPE html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta http-equiv="Content-Security-Policy" content="${policy}">
<meta name="viewport" content="width=device-width, initial-scale=1">
<title>Rates of reaction</title>
<style nonce="${nonce}">${panelStyle}</style>
</head>
<body>
<header><h1 class="unseen">Rates of reaction</h1><h2 id="name"></h2><p id="sign" role="status"></p><label id="runs" hidden><span class="unseen">Run shown</span> <select></select></label><p id="said" role="status"></p></header>
<main id="page"></main>
<footer><div id="exports" role="group" aria-label="Export"><span>Export:</span> ${buttons.join(" ")}</div></footer>
<script nonce="${nonce}" src="${script}"></script>
</body>
</html>`;
}
