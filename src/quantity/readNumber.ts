import { type Fault, fault, replacement } from "../contract/problem.js";
import { fromSuperscript, plainText } from "./plainText.js";

/** A number as written at the start of a text. */
export interface ReadNumber {
  readonly value: number;
  /** one standard uncertainty of the concise notation, in the unit of the value; null where none is stated */
  readonly u: number | null;
  /** where the number ends in the text */
  readonly end: number;
}

const leading = /^ *([-+]?)(\d+(?:[\u2009\u202f]\d{3})+(?!\d)|\d+|(?=\.\d))(?:\.(\d+))?/;
const brackets = /^ ?\((\d+(?:\.\d+)?)\)/;
const exponentPart = /^[eE]([-+]?\d+)|^ ?(?:[×xX*·]) ?10(?:\^ ?\(?([-+]?\d+)\)?|([⁺⁻]?[⁰¹²³⁴-⁹]+))/;
const tenAlone = /^ *([-+]?)10(?:\^ ?\(?([-+]?\d+)\)?|([⁺⁻]?[⁰¹²³⁴-⁹]+))/;

/**
 * The longest number at the start of `text` (spaces before it are passed over): `0.100(2)`, `12.5e-3`, `12.5×10^-3`,
 * `12.5×10⁻³`, `1.0(1)e-3`, `10^-3`. Digits in brackets count in the last places of the number (JCGM 100:2008, 7.2.2);
 * with a decimal point they are the uncertainty itself. Refuses a comma between digits and what overflows.
 */
export function readNumber(text: string): ReadNumber | Fault {
  const sameLength = plainText(text.replace(/[\u2009\u202f]/g, "_")).replace(/_/g, "\u2009");
  const ten = tenAlone.exec(sameLength);
  if (ten !== null) {
    const exponent = ten[2] ?? fromSuperscript(ten[3] ?? "0");
    return finished(text, `${ten[1]}1e${exponent}`, null, ten[0].length);
  }
  const start = leading.exec(sameLength);
  if (start === null) return notANumber(text);
  const [all, sign = "", whole = "", digits = ""] = start;
  const comma = commaFault(sameLength, all.length);
  if (comma !== null) return comma;
  let end = all.length;
  const bracket = brackets.exec(sameLength.slice(end));
  if (bracket !== null) end += bracket[0].length;
  const raised = exponentPart.exec(sameLength.slice(end));
  if (raised !== null) end += raised[0].length;
  const exponent = raised === null ? 0 : Number(raised[1] ?? raised[2] ?? fromSuperscript(raised[3] ?? "0"));
  const uncertain = bracket?.[1];
  const places = uncertain?.includes(".") ? 0 : digits.length;
  const u = uncertain === undefined ? null : `${uncertain}e${exponent - places}`;
  const value = `${sign}${whole.replace(/\D/g, "") || "0"}.${digits || "0"}e${exponent}`;
  return finished(text, value, u, end);
}

function finished(text: string, written: string, uncertain: string | null, end: number): ReadNumber | Fault {
  const value = Number(written);
  const u = uncertain === null ? null : Number(uncertain);
  const lost = (number: number, from: string): boolean =>
    !Number.isFinite(number) || (Math.abs(number) < 1e-300 && /[1-9]/.test(from.replace(/e.*/, "")));
  if (lost(value, written) || (u !== null && lost(u, uncertain ?? ""))) {
    const start = text.length - text.trimStart().length;
    return fault("number-range", { text: text.slice(start, end) }, { start, end });
  }
  return { value: value === 0 ? 0 : value, u, end };
}

function notANumber(text: string): Fault {
  const start = text.length - text.trimStart().length;
  const word = /^\S*/.exec(text.slice(start))?.[0] ?? "";
  const shown = word === "" ? "" : `“${word.length > 30 ? `${word.slice(0, 30)}…` : word}”`;
  return fault("number-expected", { text: shown }, { start, end: start + word.length });
}

/** `0,100` has one sensible mend; `1,000` two. */
function commaFault(text: string, end: number): Fault | null {
  const tail = /^(?:,\d+)+(?:\.\d+)?/.exec(text.slice(end));
  if (tail === null) return null;
  const start = text.length - text.trimStart().length;
  const span = { start, end: end + tail[0].length };
  const written = text.slice(start, span.end);
  const groups = /^[-+]?[1-9]\d{0,2}(,\d{3})+(\.\d+)?$/.test(written);
  const commas = written.split(",").length - 1;
  const point = commas === 1 && !written.includes(".") ? [written.replace(",", ".")] : [];
  const joined = groups ? [written.replaceAll(",", "")] : [];
  const dotted = /^[-+]?[1-9]\d{0,2}(\.\d{3})+,\d+$/.test(written) ? [pointForComma(written)] : [];
  const readings = [...point, ...joined, ...dotted];
  const mend = readings.join(" or ");
  return fault(
    "number-comma",
    { text: written, mend },
    span,
    readings.map((reading) => replacement(span, reading)),
  );
}

/** `1.000,5` with its thousands joined: 1000.5. */
function pointForComma(text: string): string {
  return text.replaceAll(".", "").replace(",", ".");
}
