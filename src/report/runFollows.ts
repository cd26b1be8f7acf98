import type { P, Q, Run } from "../contract/findings.js";
import { formatNumber } from "../quantity/formatNumber.js";
import { toSuperscript } from "../quantity/plainText.js";
import { type Html, html } from "./html.js";
import { type Cell, headedTable, lineCell } from "./htmlTable.js";
import { printedLaw, printedSpecies } from "./printedSpecies.js";
import { printedNumber, printedQuantity, printedSentence } from "./printedText.js";
import { rateName } from "./rateName.js";

type Fit = Run["fits"][number];

/** What follows: rates, parameters of each fit, the comparison as a sentence. */
export function runFollows(run: Run): { gist: string | Html; body: Html } {
  const ks = run.fits.flatMap(({ parameters }) => (parameters["k"] === undefined ? [] : [parameters["k"]]));
  return {
    gist:
      ks.length > 0
        ? html`${ks.map((k, i) => html`${i === 0 ? "" : "; "}<i>k</i> = ${printedQuantity(k)}`)}`
        : run.fits.length > 0
          ? "no rate constant"
          : "",
    body: html`${rateTable(run)}${run.fits.map(fitPart)}${run.comparisons.map(({ text }) => html`<p>${text}</p>`)}`,
  };
}

function rateTable(run: Run): Html {
  const rows = run.rates.map((rate, index): Cell[] => [
    String(index + 1),
    html`${rateName(rate, printedQuantity)} ${lineCell(rate)}`,
    rate.rate === null ? "no rate" : wrapping(rate.rate),
    rate.species === null ? null : wrapping(rate.species.rate),
    rate.signal === null || rate.signal.text === rate.species?.rate.text ? null : wrapping(rate.signal),
  ]);
  const species = run.rates.find((rate) => rate.species !== null)?.species?.name ?? "";
  const heads = [
    "",
    "which",
    html`<i>v</i>`,
    html`d<i>c</i>(${printedSpecies(species)})/d<i>t</i>`,
    "slope of the signal",
  ];
  return headedTable("Rates of reaction", heads, rows);
}

/** A quantity that may break between number and unit, for a narrow column. */
function wrapping(quantity: Q): string {
  const printed = printedQuantity(quantity);
  const last = printed.lastIndexOf("\u00a0");
  return quantity.unit === "" || last < 0 ? printed : `${printed.slice(0, last)} ${printed.slice(last + 1)}`;
}

function fitPart(fit: Fit, index: number): Html {
  return html`<h5>Fit ${index + 1}: ${printedLaw(fit)} ${lineCell(fit)}</h5>${rateLaw(fit)}${parameterTable(fit, index + 1)}${verdictPart(fit.verdict)}`;
}

/** The verdict as a sentence, its k slanted where it begins with one. */
export function verdictPart(verdict: string): Html {
  if (verdict === "") return html``;
  const printed = printedSentence(verdict);
  const body = printed.startsWith("k = ") ? html`<i>k</i>${printed.slice(1)}` : html`${printed}`;
  return html`<p class="verdict">${body}</p>`;
}

/** v = k c(A)ⁿ, symbols slanted. */
function rateLaw({ orders, parameters }: Fit): Html {
  if (parameters["k"] === undefined || orders.length === 0) return html``;
  const factors = orders.map(({ species, value }) => {
    const power = value === 1 ? "" : Number.isInteger(value) ? toSuperscript(String(value)) : `^${value}`;
    return value === 0 ? html`` : html` <i>c</i>(${printedSpecies(species)})${power}`;
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
    if (halfLife !== null)
      rows.push([html`half-life of ${printedSpecies(halfLife.species)}`, printedQuantity(halfLife), null, null]);
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
