import type { Description, Diagnostic, Findings, P, Q, Run } from "../contract/findings.js";
import { causeName } from "./causeName.js";
import { escapeMarkdown } from "./escape.js";
import { percentText } from "./percentText.js";
import { pictureContent } from "./pictureContent.js";
import { pictureWords } from "./pictureWords.js";
import { printedEquation, printedLaw, printedSpecies } from "./printedSpecies.js";
import { printedQuantity, printedSentence } from "./printedText.js";
import { rateName } from "./rateName.js";
import { readingsUsed } from "./readingsUsed.js";
import { intervalText } from "./runFollows.js";
import { belongsTo } from "./runWatch.js";

type Fit = Run["fits"][number];

/** Findings as one Markdown text, in the order of the HTML report; pictures stand in words, if the findings hold curves. */
export function markdownReport({ descriptions, ratewright, language, method }: Findings): string {
  const foot = `Ratewright ${ratewright}, language ${language}, method ${method}. Every ± and every bracket is one standard uncertainty. This report is no risk assessment: local rules and licensed practice decide what may be done.`;
  return [...["# Rates of reaction"], ...descriptions.flatMap(descriptionPart), "---", foot].join("\n\n").concat("\n");
}

function descriptionPart(description: Description): string[] {
  const { path, runs, diagnostics, data, meaning } = description;
  const others = diagnostics.filter((diagnostic) => !runs.some((run) => belongsTo(run, diagnostic)));
  return [
    `## ${escapeMarkdown(path)}`,
    ...runs.flatMap((run) => runPart(run, diagnostics)),
    ...(others.length === 0 ? [] : ["### On the description as a whole", list(others.map(diagnosticItem))]),
    "### What it rests on",
    ...table(
      ["file", "rows", "SHA-256"],
      data.map((file) => [file.path, String(file.rows), file.sha256]),
    ),
    `Meaning of the description, SHA-256: ${escapeMarkdown(meaning)}`,
  ];
}

function runPart(run: Run, diagnostics: readonly Diagnostic[]): string[] {
  const title = run.title === null ? "" : `: ${run.title}`;
  const own = diagnostics.filter((diagnostic) => belongsTo(run, diagnostic));
  const watch = [...run.cautions.map(({ text }) => `**Caution.** ${escapeMarkdown(text)}`), ...own.map(diagnosticItem)];
  return [
    `### ${escapeMarkdown(`Run ${run.name}${title}`)}`,
    "#### What was done",
    ...table(["", "", "line"], doneRows(run)),
    "#### What was seen",
    ...run.follow.flatMap((follow) => seenPart(run, follow)),
    "#### What follows",
    ...table(
      ["rate", "v", "line"],
      run.rates.map((rate) => [rateName(rate, printedQuantity), printed(rate.rate, "no rate"), `${rate.place.line}`]),
    ),
    ...run.fits.flatMap((fit, index) => fitPart(fit, index + 1)),
    ...run.comparisons.map(({ text }) => escapeMarkdown(text)),
    "#### What to watch",
    watch.length === 0 ? "Nothing was found to be wrong or missing in this run." : list(watch),
  ];
}

function doneRows(run: Run): string[][] {
  const rows =
    run.equation === "" ? [] : [["reaction", printedEquation(run.equation), `${run.equationPlace?.line ?? ""}`]];
  for (const { species, given, stock, concentration, limiting, place } of run.taken) {
    const of = stock === null ? "" : ` of ${printedSentence(stock)}`;
    const that =
      concentration === null || concentration.text === given.text ? "" : `, that is ${printedQuantity(concentration)}`;
    const words = `${printedQuantity(given)}${of}${that}${limiting ? "; runs out first" : ""}`;
    rows.push([`taken of ${printedSpecies(species)}`, words, place === undefined ? "" : `${place.line}`]);
  }
  for (const [name, value] of Object.entries(run.conditions)) {
    const place = run.conditionPlaces?.[name];
    rows.push([name, printedQuantity(value), place === undefined ? "" : `${place.line}`]);
  }
  return rows;
}

function seenPart(run: Run, follow: Run["follow"][number]): string[] {
  const { species, monitor, column, sources, place } = follow;
  const content = pictureContent(run, follow);
  const causes = sources.map(({ name, kind, u, place: from }) => [
    "uncertainty",
    `${name}: ${printedQuantity(u)} (${kind})`,
    from === undefined ? "" : `${from.line}`,
  ]);
  return [
    ...table(
      ["", "", "line"],
      [
        ["followed", `${printedSpecies(species)} as ${monitor}, from column ${column}`, `${place.line}`],
        ["readings", readingsUsed(follow), ""],
        ...causes,
      ],
    ),
    ...(content === null ? [] : [escapeMarkdown(pictureWords(content))]),
  ];
}

function fitPart(fit: Fit, number: number): string[] {
  const { kPrime, halfLife, parameters, budget, verdict, place } = fit;
  const rows = Object.entries(parameters).map(([name, parameter]) => parameterRow(name, parameter));
  if (kPrime !== null && kPrime.value !== parameters["k"]?.value) rows.push(parameterRow("k′", kPrime));
  if (halfLife !== null) rows.push([`half-life of ${printedSpecies(halfLife.species)}`, printedQuantity(halfLife), ""]);
  const shares = [...budget]
    .sort((a, b) => b.share - a.share)
    .map(({ source, kind, share }) => [causeName(source, kind), percentText(share)]);
  return [
    `##### ${escapeMarkdown(`Fit ${number}: ${printedLaw(fit)} (line ${place.line})`)}`,
    ...table(["parameter", "value", "95 % interval"], rows),
    ...table(["variance of k from", "share"], shares),
    ...(verdict === "" ? [] : [escapeMarkdown(printedSentence(verdict))]),
  ];
}

function parameterRow(name: string, parameter: P): string[] {
  return [name, printedQuantity(parameter), parameter.fixed ? "fixed" : intervalText(parameter)];
}

function printed(quantity: Q | null, otherwise: string): string {
  return quantity === null ? otherwise : printedQuantity(quantity);
}

function diagnosticItem({ severity, message, code, line }: Diagnostic): string {
  const gravity = { error: "Error", warning: "Warning", information: "To know" }[severity];
  return `**${gravity}.** ${escapeMarkdown(`${message} (${code}, line ${line})`)}`;
}

function list(items: readonly string[]): string {
  return items.map((item) => `- ${item}`).join("\n");
}

/** A table with its heads; none where there are no rows. */
function table(heads: readonly string[], rows: readonly (readonly string[])[]): string[] {
  if (rows.length === 0) return [];
  const line = (cells: readonly string[]): string => `| ${cells.map((cell) => escapeMarkdown(cell)).join(" | ")} |`;
  return [[line(heads), `|${heads.map(() => " --- |").join("")}`, ...rows.map(line)].join("\n")];
}
