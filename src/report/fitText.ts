import type { P, Run } from "../contract/findings.js";
import { formatNumber } from "../quantity/formatNumber.js";
import { causeName } from "./causeName.js";
import { percentText } from "./percentText.js";
import { alignedTable } from "./table.js";
import { wrappedText } from "./wrappedText.js";

type Fit = Run["fits"][number];

/** One fit in plain text: its parameters as a table, what speaks for and against it as words, its verdict. */
export function fitText(fit: Fit, index: number): string[] {
  const parameters = alignedTable(parameterRows(fit), "    ");
  const words = alignedTable(wordRows(fit), "    ");
  return [
    "",
    `  fit ${index + 1}: ${fit.law}${windowWords(fit)}`,
    ...parameters,
    ...(words.length === 0 ? [] : ["", ...words]),
    ...(fit.verdict === "" ? [] : [...(parameters.length === 0 ? [] : [""]), ...wrappedText(fit.verdict, "    ")]),
  ];
}

/** The time span whose readings were used; two fits of one law differ by it. */
function windowWords({ window, points }: Fit): string {
  if (window === null) return "";
  return `, ${points} readings from ${window[0].text} to ${window[1].text}`;
}

function parameterRows({ parameters, kPrime, halfLife }: Fit): string[][] {
  const rows: string[][] = [];
  for (const [name, parameter] of Object.entries(parameters)) {
    rows.push(parameterRow(name, parameter));
    if (name !== "k") continue;
    if (kPrime !== null && kPrime.value !== parameter.value) rows.push(parameterRow("k\u2032", kPrime));
    if (halfLife !== null) rows.push(["half-life", halfLife.text, `of ${halfLife.species}`]);
  }
  return rows;
}

function parameterRow(name: string, parameter: P): string[] {
  const interval =
    parameter.interval95 === null
      ? ""
      : `95 %: ${parameter.interval95.map((end) => formatNumber(Number(end.toPrecision(5)), null)).join(" to ")}`;
  return [name, parameter.text, parameter.fixed ? "fixed" : interval];
}

function wordRows(fit: Fit): string[][] {
  const { conversion, residual, reducedChiSquare, tests, parameters } = fit;
  const rows: string[][] = [];
  if (conversion !== null && parameters["k"] !== undefined) rows.push(["conversion", percentText(conversion)]);
  if (residual !== null) rows.push(["residual SD", residual.text]);
  if (reducedChiSquare !== null) rows.push(["reduced chi\u00b2", reducedChiSquare.toPrecision(3)]);
  for (const { name, text } of tests) rows.push([name, text]);
  if (fit.budget.length > 0) rows.push(["variance of k", budgetWords(fit)], ["covariance", covarianceWords(fit)]);
  return rows;
}

function budgetWords({ budget }: Fit): string {
  return budget.map(({ source, kind, share }) => `${percentText(share)} ${causeName(source, kind)}`).join(", ");
}

function covarianceWords({ uKind }: Fit): string {
  return uKind === "scaled" ? "scaled by the variance of the residuals" : "from the stated uncertainty";
}
