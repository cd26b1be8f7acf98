import type { Description, P } from "../contract/findings.js";
import { type Html, html, nothing } from "./html.js";
import { type Cell, headedTable, lineCell } from "./htmlTable.js";
import { printedQuantity } from "./printedText.js";
import { intervalText, verdictPart } from "./runFollows.js";

/** What runs say together: orders, temperature dependence, replicates. */
export function seriesPart(series: Description["series"][number]): Html {
  const { name, orders, temperature, replicates, verdict } = series;
  const orderRows = orders.map(({ species, order, from, runs, rateConstant }): Cell[] => [
    species,
    printedQuantity(order),
    intervalText(order),
    rateConstant === null ? null : printedQuantity(rateConstant),
    `${from}; runs ${runs.join(", ")}`,
  ]);
  const temperatureRows: Cell[][] =
    temperature === null
      ? []
      : (
          [
            ["activation energy", temperature.activationEnergy],
            ["pre-exponential factor", temperature.preExponential],
            ["enthalpy of activation", temperature.enthalpy],
            ["entropy of activation", temperature.entropy],
            ["Gibbs energy of activation", temperature.gibbs],
          ] satisfies [string, P][]
        ).map(([words, parameter]) => [words, printedQuantity(parameter), intervalText(parameter)]);
  const replicate =
    replicates === null ? nothing : html`<p>Replicates: <i>k</i> = ${printedQuantity(replicates.k)}.</p>`;
  return html`<section><h3>Series ${name} ${lineCell(series)}</h3>${headedTable("Orders", ["in", "order", "95 % interval", "k", "from"], orderRows)}${headedTable("Temperature dependence", ["", "value", "95 % interval"], temperatureRows)}${replicate}${verdictPart(verdict)}</section>`;
}

/** What a mechanism of elementary steps says. */
export function mechanismPart(mechanism: Description["mechanisms"][number]): Html {
  const { name, parameters, verdict } = mechanism;
  const rows = Object.entries(parameters).map(([parameter, value]): Cell[] => [
    parameter,
    printedQuantity(value),
    intervalText(value),
  ]);
  return html`<section><h3>Mechanism ${name} ${lineCell(mechanism)}</h3>${headedTable("Parameters", ["", "value", "95 % interval"], rows)}${verdictPart(verdict)}</section>`;
}
