import type { P, Run } from "../contract/findings.js";
import { formatNumber } from "../quantity/formatNumber.js";
import { alignedTable } from "./table.js";

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
      run.cautions.map(({ text }) => `    ${text}`),
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
  for (const { species, given, concentration, limiting } of run.taken) {
    const converted = concentration === null || concentration.text === given.text ? "" : ` = ${concentration.text}`;
    rows.push(["taken", `${species} ${given.text}${converted}${limiting ? ", runs out first" : ""}`]);
  }
  for (const { species, monitor, column, used, points, sources } of run.follow) {
    const counted = used === points ? `all ${points} readings used` : `${used} of ${points} readings used`;
    rows.push(["followed", `${species} as ${monitor} from column ${column}, ${counted}`]);
    for (const { name, kind, u } of sources) rows.push(["uncertainty", `${name}: ${u.text} (${kind})`]);
  }
  return rows;
}

function rateRows(run: Run): string[][] {
  const rows = run.rates.map(({ kind, from, to, at, rate, species, signal }) => {
    const when =
      kind === "average"
        ? `average from ${from?.text ?? ""} to ${to?.text ?? ""}`
        : kind === "initial"
          ? `initial${at === null ? "" : `, at ${at.text}`}`
          : `at ${at?.text ?? ""}`;
    const ofSpecies = species === null ? "" : `${species.name}: ${species.rate.text}`;
    return [when, rate === null ? "no rate" : rate.text, ofSpecies, signal?.text ?? ""];
  });
  return rows.length === 0 ? [] : [["", "v", "d c/d t", "d signal/d t"], ...rows];
}

function fitText(fit: Run["fits"][number], index: number): string[] {
  const { k, start, infinity } = fit.parameters;
  const rows: string[][] = [];
  if (k !== undefined) rows.push(parameterRow("k", k));
  if (fit.kPrime !== null && k !== undefined && fit.kPrime.value !== k.value) rows.push(parameterRow("k′", fit.kPrime));
  if (fit.halfLife !== null) rows.push(["half-life", fit.halfLife.text, `of ${fit.halfLife.species}`]);
  if (start !== undefined) rows.push(parameterRow("start", start));
  if (infinity !== undefined) rows.push(parameterRow("infinity", infinity));
  if (fit.conversion !== null && k !== undefined)
    rows.push(["conversion", `${(100 * fit.conversion).toPrecision(3)} %`]);
  if (fit.residual !== null) rows.push(["residual SD", fit.residual.text]);
  for (const { name, text } of fit.tests) rows.push([name, text]);
  if (fit.budget.length > 0) rows.push(["budget of k", budgetWords(fit)]);
  return [
    "",
    `  fit ${index + 1}: ${fit.law}`,
    ...alignedTable(rows, "    "),
    ...(fit.verdict === "" ? [] : [`    ${fit.verdict}`]),
  ];
}

function parameterRow(name: string, parameter: P): string[] {
  const interval =
    parameter.interval95 === null
      ? ""
      : `95 %: ${parameter.interval95.map((end) => formatNumber(Number(end.toPrecision(5)), null)).join(" to ")}`;
  return [name, parameter.text, parameter.fixed ? "fixed" : interval];
}

function budgetWords({ budget, uKind }: Run["fits"][number]): string {
  const shares = budget.map(({ source, kind, share }) => `${source} ${(100 * share).toPrecision(2)} % (${kind})`);
  return `${shares.join(", ")}; covariance ${uKind === "scaled" ? "scaled by the residual variance" : "from the stated uncertainty"}`;
}
