import { type Fault, fault, replacement } from "../contract/problem.js";
import { elementName, elementOf } from "./element.js";
import { chargeText } from "./formula.js";
import { anions, cations, otherIons } from "./handbook/ions.js";

/**
 * The question about a digit before a bare sign: `Fe3+` is Fe^3+ or Fe3^+. `body` is the formula before the sign,
 * `digits` its last digits, `signs` the bare signs, `end` where they end. The likelier reading stands first: the one
 * that is a known ion; else the digit is the charge of a single element and the last of several digits.
 */
export function chargeAsked(body: string, digits: string, signs: string, end: number): Fault {
  const stem = body.slice(0, body.length - digits.length);
  const direction = signs.startsWith("-") ? -1 : 1;
  const asCharge = reading(stem + digits.slice(0, -1), direction * Number(digits.slice(-1)));
  const asCount = reading(body, direction * signs.length);
  const both = chargeFirst(asCharge, asCount, stem, digits) ? [asCharge, asCount] : [asCount, asCharge];
  const [first, second] = both.map(({ words }) => words);
  const span = { start: 0, end };
  const mends = both.map(({ form }) => replacement(span, form));
  return fault("charge-ambiguous", { text: body + signs, first: first ?? "", second: second ?? "" }, span, mends);
}

interface Reading {
  readonly form: string;
  readonly words: string;
  /** place in the tables of known ions; -1 where it is in none */
  readonly known: number;
}

const ions = [...cations, ...anions, ...otherIons];
const forms = ions.map(({ body, charge }) => body + chargeText(charge));

function reading(body: string, charge: number): Reading {
  const form = body + chargeText(charge);
  const known = forms.indexOf(form);
  const name = ions[known]?.name ?? inWords(body, charge);
  return { form, known, words: name === null ? form : `${name}, ${form}` };
}

function chargeFirst(asCharge: Reading, asCount: Reading, stem: string, digits: string): boolean {
  if (asCharge.known >= 0 && asCount.known >= 0) return asCharge.known < asCount.known;
  if (asCharge.known >= 0 || asCount.known >= 0) return asCharge.known >= 0;
  return elementOf(stem) !== null || digits.length > 1;
}

const roman = ["", "I", "II", "III", "IV", "V", "VI", "VII", "VIII", "IX"];
const numbers = ["", "one", "two", "three", "four", "five", "six", "seven", "eight", "nine"];

/** `iron(III)` and `three irons`; null for what has no such words. */
function inWords(body: string, charge: number): string | null {
  const [, symbol = "", count = ""] = /^([A-Z][a-z]?)(\d*)$/.exec(body) ?? [];
  if (elementOf(symbol) === null) return null;
  const element = elementName(symbol);
  if (count === "") return charge > 0 ? `${element}(${roman[charge] ?? charge})` : null;
  const many = /[ys]$|ese$/.test(element) ? `${element} atoms` : `${element}s`;
  return `${numbers[Number(count)] ?? count} ${many}`;
}
