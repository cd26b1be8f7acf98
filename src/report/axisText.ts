import { toSuperscript } from "../quantity/plainText.js";
import { printedUnit } from "../quantity/quantityText.js";
import { escapeHtml } from "./escape.js";
import { type Html, html } from "./html.js";
import { printedSpecies } from "./printedSpecies.js";

/** What an axis shows: symbol (slanted where it is one), of what, unit, and the power of ten taken out of its numbers. */
export interface AxisName {
  readonly symbol: string;
  /** the species behind the symbol, upright; "" where there is none */
  readonly of: string;
  /** ASCII text */
  readonly unit: string;
  readonly power: number;
}

/** The name of the signal axis of a follow line. */
export function signalName(follow: { monitor: string; species: string; column: string }, unit: string): AxisName {
  if (follow.monitor === "concentration") return { symbol: "c", of: printedSpecies(follow.species), unit, power: 0 };
  return { symbol: follow.column, of: "", unit, power: 0 };
}

/** Quantity over unit, as SVG text content: `t / min`, `c(P) / (10⁻⁴ mol·L⁻¹)`; symbols slanted, units upright. */
export function axisMarkup({ symbol, of, unit, power }: AxisName): string {
  const slanted =
    [...symbol].length === 1 ? `<tspan font-style="italic">${escapeHtml(symbol)}</tspan>` : escapeHtml(symbol);
  return `${slanted}${escapeHtml(of === "" ? "" : `(${of})`)}${escapeHtml(divisor(unit, power))}`;
}

/** The same as HTML. */
export function axisHtml({ symbol, of, unit, power }: AxisName): Html {
  const slanted = [...symbol].length === 1 ? html`<i>${symbol}</i>` : html`${symbol}`;
  return html`${slanted}${of === "" ? "" : `(${of})`}${divisor(unit, power)}`;
}

/** The same without markup. */
export function axisWords({ symbol, of, unit, power }: AxisName): string {
  return `${symbol}${of === "" ? "" : `(${of})`}${divisor(unit, power)}`;
}

function divisor(unit: string, power: number): string {
  const printed = printedUnit(unit);
  if (power === 0) return unit === "" ? "" : ` / ${printed}`;
  const ten = `10${toSuperscript(String(power))}`;
  return unit === "" ? ` / ${ten}` : ` / (${ten}\u00a0${printed})`;
}
