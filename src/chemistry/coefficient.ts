import { type Fault, fault, replacement } from "../contract/problem.js";
import { decimal } from "../quantity/fraction.js";
import type { Coefficient } from "./equation.js";

/**
 * The coefficient at the start of a term (in plain signs), 1 where none stands, and where the species begins: `2`,
 * `1/2`, `½`, `2 *`. Refuses zero, decimals (with the fraction as mend) and more than six digits.
 */
export function readCoefficient(text: string): { coefficient: Coefficient; end: number } | Fault {
  const sign = { "½": [1, 2], "¼": [1, 4], "¾": [3, 4] }[text.charAt(0)];
  if (sign !== undefined) return { coefficient: { num: sign[0] ?? 1, den: sign[1] ?? 1 }, end: pastTimes(text, 1) };
  const decimals = /^\d+[.,]\d+/.exec(text)?.[0];
  if (decimals !== undefined) return notWhole(decimals);
  const found = /^(\d+)(?: ?\/ ?(\d+))?/.exec(text);
  if (found === null) return { coefficient: { num: 1, den: 1 }, end: 0 };
  const [all, num = "1", den = "1"] = found;
  const large = num.length > 6 || den.length > 6;
  if (large || Number(num) === 0 || Number(den) === 0) {
    return fault("coefficient-not-whole", { text: all, mend: "" }, { start: 0, end: all.length });
  }
  return { coefficient: lowestTerms(Number(num), Number(den)), end: pastTimes(text, all.length) };
}

function pastTimes(text: string, from: number): number {
  return from + (/^ *[*·×]? */.exec(text.slice(from))?.[0].length ?? 0);
}

function notWhole(text: string): Fault {
  const span = { start: 0, end: text.length };
  const short = text.length <= 8 ? decimal(text.replace(",", ".")) : null;
  if (short === null || short.num === 0n) return fault("coefficient-not-whole", { text, mend: "" }, span);
  const mend = short.den === 1n ? `${short.num}` : `${short.num}/${short.den}`;
  return fault("coefficient-not-whole", { text, mend }, span, [replacement(span, mend)]);
}

function lowestTerms(num: number, den: number): Coefficient {
  let [a, b] = [num, den];
  while (b !== 0) [a, b] = [b, a % b];
  return { num: num / a, den: den / a };
}
