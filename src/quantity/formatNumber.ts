/** From this power of ten on, and below the lower one, a number is written with an exponent. */
const lowest = -3;
const highest = 5;

/**
 * A number as a person reads it. With `u` (one standard uncertainty, same unit) it is rounded to two significant digits
 * of it and written concisely: `5.502(73)e-4`, `0.1000(20)`, `1.30(12)e3`. Without, up to six significant digits,
 * trailing zeros dropped. The exponent form is taken below 1e-3, from 1e5 on, and where the digits of `u` would have to
 * be padded with zeros. Where `u` is smaller than the twentieth digit it is written out, `1 +/- 1.0e-30`; what is not
 * finite is "not computed". Reads back, through `readQuantity`, to the digits shown.
 */
export function formatNumber(value: number, u: number | null): string {
  if (!Number.isFinite(value) || (u !== null && !Number.isFinite(u))) return "not computed";
  if (u === null) return sixDigits(value);
  if (u === 0) return withBracket(sixDigits(value), "0");
  const size = Math.abs(u);
  const [uDigits, uExponent] = taken(size, 1);
  const place = uExponent - 1;
  if (exponentOf(value) - place > 20) return `${sixDigits(value)} +/- ${sixDigits(Number(size.toPrecision(2)))}`;
  const digits = roundedAt(Math.abs(value), place);
  const exponent = Math.max(digits.length, uDigits.length) - 1 + place;
  const sign = value < 0 && /[1-9]/.test(digits) ? "-" : "";
  const fixed = exponent >= lowest && exponent < highest && place <= 0;
  const decimals = fixed ? -place : exponent - place;
  const number = `${sign}${pointed(digits, decimals)}(${uDigits})`;
  return fixed ? number : `${number}e${exponent}`;
}

/** `formatNumber` with its unit after a space; value and u in that unit. A plain number has the text "". */
export function formatQuantity(value: number, u: number | null, unitText: string): string {
  const number = formatNumber(value, u);
  if (unitText === "" || number === "not computed") return number;
  return `${number} ${unitText}`;
}

function sixDigits(value: number): string {
  if (value === 0) return "0";
  const [digits, exponent] = taken(Math.abs(value), 5);
  const short = digits.replace(/0+$/, "");
  const sign = value < 0 ? "-" : "";
  if (exponent < lowest || exponent >= highest) return `${sign}${pointed(short, short.length - 1)}e${exponent}`;
  const padded = exponent >= short.length ? short.padEnd(exponent + 1, "0") : short;
  return `${sign}${pointed(padded, padded.length - 1 - exponent)}`;
}

/** `1.5e7` and `(0)` make `1.5(0)e7`. */
function withBracket(number: string, digits: string): string {
  return number.replace(/(e.*)?$/, (tail) => `(${digits})${tail}`);
}

/** Leading digit and `more` after it, and the power of ten of the first. */
function taken(value: number, more: number): [digits: string, exponent: number] {
  const [mantissa = "0", exponent = "0"] = value.toExponential(more).split("e");
  return [mantissa.replace(".", ""), Number(exponent)];
}

function exponentOf(value: number): number {
  return value === 0 ? Number.NEGATIVE_INFINITY : taken(Math.abs(value), 20)[1];
}

/** The digits of value/10^place, rounded to a whole number. */
function roundedAt(value: number, place: number): string {
  const more = exponentOf(value) - place;
  if (more < -1) return "0";
  if (more === -1) return Number(taken(value, 0)[0]) >= 5 || taken(value, 20)[0] >= "5" ? "1" : "0";
  const [digits, exponent] = taken(value, more);
  return exponent - place > more ? `${digits}0` : digits;
}

/** `digits` with the last `decimals` of them after the point. */
export function pointed(digits: string, decimals: number): string {
  if (decimals <= 0) return digits;
  const padded = digits.padStart(decimals + 1, "0");
  return `${padded.slice(0, -decimals)}.${padded.slice(-decimals)}`;
}
