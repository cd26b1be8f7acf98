import type { P, Run } from "../contract/findings.js";
import { formatNumber } from "../quantity/formatNumber.js";
import { toSuperscript } from "../quantity/plainText.js";
import { type Html, html } from "./html.js";
import { type Cell, headedTable, lineCell } from "./htmlTable.js";
import { printedNumber, printedQuantity } from "./printedText.js";
import { rateName } from "./rateName.js";

type Fit = Run["fits"][number];

/** What follows: rates, parameters of each fit, the comparison as a sentence. */
export function runFollows(run: Run): { gist: string; body: Html } {
  const ks = run.fits.flatMap(({ parameters }) => (parameters["k"] === undefined ? [] : [parameters["k"]]));
  const gist = ks.map((k) => `k = ${printedQuantity(k)}`).join("; ");
  return {
    gist: gist !== "" ? gist : run.fits.length > 0 ? "no rate constant" : "",
    body: html`${rateTable(run)}${run.fits.map(fitPart)}${run.comparisons.map(({ text }) => html`<p>${text}</p>`)}`,
  };
}

function rateTable(run: Run): Html {
  const rows = run.rates.map((rate, index): Cell[] => [
    String(index + 1),
    printedNumber(rateName(rate)),
    rate.rate === null ? "no rate" : printedQuantity(rate.rate),
    rate.species === null ? null : `${rate.species.name}: ${printedQuantity(rate.species.rate)}`,
    rate.signal === null || rate.signal.text === rate.species?.rate.text ? null : printedQuantity(rate.signal),
    lineCell(rate),
  ]);
  return headedTable("Rates of reaction", ["", "which", "v", "dc/dt of", "of the signal", "from"], rows);
}

function fitPart(fit: Fit, index: number): Html {
  return html`<h5>Fit ${index + 1}: ${fit.law} ${lineCell(fit)}</h5>${rateLaw(fit)}${parameterTable(fit, index + 1)}${fit.verdict === "" ? html`` : html`<p class="verdict">${printedNumber(fit.verdict)}</p>`}`;
}

/** v = k c(A)ⁿ, symbols slanted. */
function rateLaw({ orders, parameters }: Fit): Html {
  if (parameters["k"] === undefined || orders.length === 0) return html``;
  const factors = orders.map(({ species, value }) => {
    const power = value === 1 ? "" : Number.isInteger(value) ? toSuperscript(String(value)) : `^${value}`;
    return value === 0 ? html`` : html` <i>c</i>(${species})${power}`;
  });
  return html`<p>Rate law: <i>v</i> = <i>k</i>${factors}, for the equation as it is written above.</p>`;
}

const symbols: Readonly<Record<string, Html>> = { k: html`<i>k</i>`, start: html`start`, infinity: html`infinity` };

function parameterTable(fit: Fit, number: number): Html {
  const rows: Cell[][] = [];
  for (const [name, parameter] of Object.entries(fit.parameters)) {
    rows.push(parameterRow(symbols[name] ?? html`${name}`, parameter));
    if (name !== "k") continue;
    const { kPrime, halfLife } = fit;
    if (kPrime !== null && kPrime.value !== parameter.value) rows.push(parameterRow(html`<i>k</i>′`, kPrime));
    if (halfLife !== null) rows.push([html`half-life of ${halfLife.species}`, printedQuantity(halfLife), null, null]);
  }
  return headedTable(`Parameters of fit ${number}`, ["", "value", "95 % interval", ""], rows);
}

function parameterRow(name: Html, parameter: P): Cell[] {
  const { fixed, by, bound } = parameter;
  const remark = fixed
    ? "fixed"
    : [
        bound === null ? "" : `held at its ${bound === "low" ? "lowest" : "highest"}`,
        by === "profile" ? "by profile" : "",
      ]
        .filter((words) => words !== "")
        .join(", ");
  return [name, printedQuantity(parameter), intervalText(parameter), remark];
}

/** An interval's ends to five digits, more than its own uncertainty warrants. */
export function intervalText({ interval95 }: P): string {
  if (interval95 === null) return "";
  return interval95.map((end) => printedNumber(formatNumber(Number(end.toPrecision(5)), null))).join(" to ");
}
