import type { Run } from "../contract/findings.js";
import { type Html, html, nothing, readyMarkup } from "./html.js";
import { type Cell, factTable, headedTable, lineCell } from "./htmlTable.js";
import { pagePalette } from "./palette.js";
import { reportStyle, runPicture } from "./picture.js";
import { type PictureContent, pictureContent, residualsOf } from "./pictureContent.js";
import { printedLaw, printedSpecies } from "./printedSpecies.js";
import { printedQuantity } from "./printedText.js";
import { readingsUsed } from "./readingsUsed.js";

type Follow = Run["follow"][number];

/** What was seen: each followed signal with its picture and what its uncertainty is made of. */
export function runSeen(run: Run): { gist: string; body: Html } {
  const gist = run.follow
    .map((follow) => `${printedSpecies(follow.species)}, readings: ${readingsUsed(follow)}`)
    .join("; ");
  return {
    gist: gist === "" ? "nothing was followed" : gist,
    body: html`${run.follow.map((follow) => followed(run, follow))}${suitability(run)}`,
  };
}

function followed(run: Run, follow: Follow): Html {
  const rows: Cell[][] = [
    [
      "followed",
      `${printedSpecies(follow.species)} as ${follow.monitor}, from column ${follow.column}`,
      lineCell(follow),
    ],
    ["readings", readingsUsed(follow), null],
  ];
  for (const { name, kind, u } of follow.sources) {
    rows.push(["uncertainty", `${name}: ${printedQuantity(u)} (${kind})`, null]);
  }
  return html`${factTable(`What was followed in column ${follow.column}`, rows)}${figure(run, follow)}`;
}

function figure(run: Run, follow: Follow): Html {
  const content = pictureContent(run, follow);
  const picture = runPicture(run, follow, reportStyle(pagePalette));
  if (content === null || picture === null) return html`<p>There are no readings to draw.</p>`;
  return html`<figure>${readyMarkup(picture)}<figcaption>${key(content)}</figcaption></figure>`;
}

const dashWords = ["unbroken", "broken", "dotted", "dash-dotted"];

/** What the signs of the picture stand for, told by their shape. */
function key(content: PictureContent): string {
  const { readings, thinned, fits, rates, follow } = content;
  const words = [thinned ? "Ribbon: the readings, from lowest to highest at each time." : "Dots: readings."];
  if (readings.some(({ used }) => !used)) {
    words.push(`${thinned ? "Paler" : "Hollow"}: outside the window, used by no fit.`);
  }
  for (const [order, { number, fit }] of fits.entries()) {
    const dash = dashWords[order % dashWords.length] ?? "";
    words.push(`${dash[0]?.toUpperCase()}${dash.slice(1)} curve: fit ${number}, ${printedLaw(fit)}.`);
  }
  if (fits.length > 0) words.push(`Shaded: ${fits.length === 1 ? "its 95 % band" : "their 95 % bands"}.`);
  const numbers = (average: boolean) =>
    rates.filter(({ rate }) => (rate.kind === "average") === average).map(({ number }) => number);
  const [chords, tangents] = [numbers(true), numbers(false)];
  if (chords.length > 0) words.push(`Dashed between bars: ${ofRates("chord", chords)}.`);
  if (tangents.length > 0) words.push(`Through a diamond: ${ofRates("tangent", tangents)}.`);
  if (fits.some(({ fit }) => residualsOf(follow, fit).length > 0)) words.push("Below: reading minus curve.");
  return words.join(" ");
}

/** "the tangent of rate 2", "the tangents of rates 2, 3". */
function ofRates(line: string, numbers: readonly number[]): string {
  const s = numbers.length > 1 ? "s" : "";
  return `the ${line}${s} of rate${s} ${numbers.join(", ")}`;
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
