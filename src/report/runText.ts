import type { Run } from "../contract/findings.js";
import { fitText } from "./fitText.js";
import { rateName } from "./rateName.js";
import { readingsUsed } from "./readingsUsed.js";
import { alignedTable } from "./table.js";
import { wrappedText } from "./wrappedText.js";

/** One run in plain text: what was done, what was seen, what follows, how sure, what to watch. */
export function runText(run: Run): string[] {
  const title = run.title === null ? "" : ` — ${run.title}`;
  return [
    `run ${run.name}${title}`,
    ...alignedTable(whatWasDone(run), "  "),
    ...block("rates", alignedTable(rateRows(run), "    ")),
    ...run.fits.flatMap(fitText),
    ...block(
      "cautions",
      run.cautions.flatMap(({ text }) => wrappedText(text, "    - ")),
    ),
  ];
}

function block(head: string, lines: readonly string[]): string[] {
  return lines.length === 0 ? [] : ["", `  ${head}`, ...lines];
}

function whatWasDone(run: Run): string[][] {
  const rows: string[][] = [];
  if (run.equation !== "") rows.push(["reaction", run.equation]);
  for (const [name, value] of Object.entries(run.conditions)) rows.push([name, value.text]);
  for (const { species, given, stock, concentration, limiting } of run.taken) {
    const converted = concentration === null || concentration.text === given.text ? "" : ` = ${concentration.text}`;
    const of = stock === null ? "" : ` of ${stock}`;
    rows.push(["taken", `${species} ${given.text}${of}${converted}${limiting ? ", runs out first" : ""}`]);
  }
  for (const follow of run.follow) {
    const { species, monitor, column, sources } = follow;
    rows.push(["followed", `${species} as ${monitor} from column ${column}; readings: ${readingsUsed(follow)}`]);
    for (const { name, text } of follow.details) rows.push([name, text]);
    for (const { name, kind, u } of sources) rows.push(["uncertainty", `${name}: ${u.text} (${kind})`]);
  }
  return rows;
}

function rateRows(run: Run): string[][] {
  const rows = run.rates.map((rate) => {
    const v = rate.rate?.text ?? "no rate";
    const ofSpecies = rate.species?.rate.text ?? "";
    const ofSignal = rate.signal?.text ?? "";
    return [rateName(rate), v, ofSpecies, ofSignal === ofSpecies ? "" : ofSignal];
  });
  if (rows.length === 0) return [];
  const species = run.rates.find((rate) => rate.species !== null)?.species?.name;
  const heads = ["", "v", species === undefined ? "" : `dc(${species})/dt`, "slope of the signal"];
  // The slope of a signal that is the concentration itself says nothing new.
  return [heads, ...rows].map((row) => row.filter((_, column) => column < 3 || rows.some((one) => one[column] !== "")));
}
