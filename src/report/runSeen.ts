import type { Run } from "../contract/findings.js";
import { type Html, html, nothing } from "./html.js";
import { type Cell, factTable, headedTable, lineCell } from "./htmlTable.js";
import { printedSpecies } from "./printedSpecies.js";
import { printedQuantity, printedSentence } from "./printedText.js";
import { readingsUsed } from "./readingsUsed.js";

type Follow = Run["follow"][number];

/** Draws what was seen of one follow line of a run. */
export type Figure = (run: Run, follow: Follow) => Html;

/** What was seen: each followed signal with its picture and what its uncertainty is made of. */
export function runSeen(run: Run, figure: Figure): { gist: string; body: Html } {
  const gist = run.follow
    .map((follow) => `${printedSpecies(follow.species)}, readings: ${readingsUsed(follow)}`)
    .join("; ");
  return {
    gist: gist === "" ? "nothing was followed" : gist,
    body: html`${run.follow.map((follow) => followed(run, follow, figure))}${suitability(run)}`,
  };
}

function followed(run: Run, follow: Follow, figure: Figure): Html {
  const rows: Cell[][] = [
    [
      "followed",
      `${printedSpecies(follow.species)} as ${follow.monitor}, from column ${follow.column}`,
      lineCell(follow),
    ],
    ["readings", readingsUsed(follow), null],
  ];
  for (const { name, text } of follow.details) rows.push([name, printedSentence(text), null]);
  for (const { name, kind, u, place } of follow.sources) {
    const line = place === undefined ? null : lineCell({ place });
    rows.push(["uncertainty", `${name}: ${printedQuantity(u)} (${kind})`, line]);
  }
  return html`${factTable(`What was followed in column ${follow.column}`, rows)}${figure(run, follow)}`;
}

function suitability({ suitability }: Run): Html {
  if (suitability.length === 0) return nothing;
  const printed = (q: (typeof suitability)[number]["change"]) => (q === null ? "not known" : printedQuantity(q));
  return headedTable(
    "Which signals can see this reaction",
    ["signal", "expected change", "readability", "verdict", "reason"],
    suitability.map(({ monitor, change, readability, verdict, reason }) => [
      monitor,
      printed(change),
      printed(readability),
      verdict,
      reason,
    ]),
  );
}
