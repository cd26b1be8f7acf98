import type { Run } from "../contract/findings.js";
import { type Html, html } from "./html.js";
import { type Cell, factTable, lineCell } from "./htmlTable.js";
import { printedEquation, printedSpecies } from "./printedSpecies.js";
import { printedQuantity, printedSentence } from "./printedText.js";

/** What was done: the equation, what was taken, the conditions. */
export function runDone(run: Run): { gist: string; body: Html } {
  const rows: Cell[][] = [];
  if (run.equation !== "") {
    const { equationPlace } = run;
    const line = equationPlace === undefined ? null : lineCell({ place: equationPlace });
    rows.push(["reaction", printedEquation(run.equation), line]);
  }
  for (const { species, given, stock, concentration, limiting, place } of run.taken) {
    const converted =
      concentration === null || concentration.text === given.text ? "" : `, that is ${printedQuantity(concentration)}`;
    rows.push([
      `taken of ${printedSpecies(species)}`,
      `${printedQuantity(given)}${stock === null ? "" : ` of ${printedSentence(stock)}`}${converted}${limiting ? "; runs out first" : ""}`,
      place === undefined ? null : lineCell({ place }),
    ]);
  }
  for (const [name, value] of Object.entries(run.conditions)) {
    const place = run.conditionPlaces?.[name];
    rows.push([name, printedQuantity(value), place === undefined ? null : lineCell({ place })]);
  }
  if (run.conditions["temperature"] === undefined) rows.push(["temperature", "not stated"]);
  const gist = [printedEquation(run.equation), conditionWords(run)].filter((words) => words !== "").join(", ");
  return { gist, body: html`${factTable(`What was done in run ${run.name}`, rows)}` };
}

function conditionWords({ conditions }: Run): string {
  const temperature = conditions["temperature"];
  return temperature === undefined ? "" : printedQuantity(temperature);
}
