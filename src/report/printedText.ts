import type { Q } from "../contract/findings.js";
import { toSuperscript } from "../quantity/plainText.js";
import { printedUnit } from "../quantity/quantityText.js";

/** A number's ASCII text with the signs of print: `-5.502(73)e-4` to `−5.502(73) × 10⁻⁴`; `+/-` to `±`. */
export function printedNumber(text: string): string {
  return text
    .replace("+/-", "±")
    .replace(/-(?=\d)/g, "\u2212")
    .replace(/e([\u2212+]?)(\d+)/g, (_, sign: string, digits: string) => {
      const exponent = `${sign === "\u2212" ? "-" : ""}${digits}`;
      return ` × 10${toSuperscript(exponent)}`;
    });
}

/** A quantity's `text` as it is printed: signs of print, number and unit kept together. Its digits are those of `text`. */
export function printedQuantity({ text, unit }: Pick<Q, "text" | "unit">): string {
  const tail = ` ${unit}`;
  if (unit === "" || !text.endsWith(tail)) return printedNumber(text);
  return `${printedNumber(text.slice(0, -tail.length))} ${printedUnit(unit)}`.replaceAll(" ", "\u00a0");
}

/** A sentence with numbers and units in it, with the signs of print: `k = 5.5(1)e-4 min^-1` and the like. */
export function printedSentence(text: string): string {
  return text
    .replace(/(?<=[\d)])e([+-]?)(\d+)\b/g, (_, sign: string, digits: string) => {
      return `\u00a0×\u00a010${toSuperscript(`${sign === "-" ? "-" : ""}${digits}`)}`;
    })
    .replace(/(?<=[A-Za-z])\^(-?\d+)(?![\d.+])/g, (_, exponent: string) => toSuperscript(exponent))
    .replace(/(?<![\w)⁻])-(?=\d)/g, "\u2212")
    .replace(/\bdegC\b/g, "°C");
}
