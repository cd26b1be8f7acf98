/** Every kind of space a text may hold between a number and its unit. */
const spaces = /[\u00a0\u2000-\u200a\u202f\u205f\u3000\t]/g;

/**
 * The same text, of the same length, in the plain signs the readers know: micro sign and Greek mu as `u`, every
 * minus and dash as `-`, every space as a plain one, every raised dot as `·`. Positions stay those of the original.
 */
export function plainText(text: string): string {
  if (/^[\x20-\x7e]*$/.test(text)) return text;
  return text
    .replace(spaces, " ")
    .replace(/[\u00b5\u03bc]/g, "u")
    .replace(/[\u2212\u2010-\u2014\ufe63\uff0d]/g, "-")
    .replace(/[\u22c5\u2219\u2022]/g, "\u00b7");
}

const raised = "⁰¹²³⁴⁵⁶⁷⁸⁹";
const lowered = "₀₁₂₃₄₅₆₇₈₉";

/** The superscript digits and signs of `text` as plain ones. */
export function fromSuperscript(text: string): string {
  return [...text].map((sign) => (sign === "⁻" ? "-" : sign === "⁺" ? "+" : digit(raised, sign))).join("");
}

/** The subscript digits of `text` as plain ones; the same length. */
export function fromSubscript(text: string): string {
  return text.replace(/[₀-₉]/g, (sign) => digit(lowered, sign));
}

/** A plain number's digits and sign raised: `-1` to `⁻¹`. */
export function toSuperscript(text: string): string {
  return [...text].map((sign) => (sign === "-" ? "⁻" : sign === "+" ? "⁺" : (raised[Number(sign)] ?? sign))).join("");
}

function digit(row: string, sign: string): string {
  const place = row.indexOf(sign);
  return place < 0 ? sign : String(place);
}
