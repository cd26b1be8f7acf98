import { fromSI, intervalFromSI, intervalToSI, toSI } from "./conversion.js";
import { pointed } from "./formatNumber.js";
import type { Unit } from "./unit.js";

/** An uncertainty of more digits than this stands behind `+/-`, where it is easier to read. */
const concise = 4;

/**
 * SI value and standard uncertainty (null: none) as a number of `unit` without rounding, the shortest that reads back
 * as the same: `0.100(2)`, `50 +/- 0.02886751345948129`, `1.5e-7`. Exponent form below 1e-3 and from 1e5 on.
 */
export function wholeNumberText(value: number, u: number | null, unit: Unit): string {
  if (!Number.isFinite(value) || (u !== null && !Number.isFinite(u))) return "not computed";
  const number = shortest(fromSI(value, unit), (one) => toSI(one, unit), value);
  if (u === null) return written(digitsOf(number), null);
  const size = shortest(intervalFromSI(u, unit), (one) => intervalToSI(one, unit), u);
  const [main, spread] = [digitsOf(number), digitsOf(size)];
  const place = Math.min(main.place, spread.place);
  const tooLong = spread.digits.length + spread.place - place > concise || main.digits.length + main.place - place > 25;
  return tooLong ? `${written(main, null)} +/- ${written(spread, null)}` : written(main, spread);
}

/** The number with fewest digits near `near` that `reads` as `target`; `near` itself where none does. */
function shortest(near: number, reads: (number: number) => number, target: number): number {
  for (let digits = 1; digits <= 17; digits++) {
    const candidate = Number(near.toPrecision(digits));
    if (reads(candidate) === target) return candidate;
  }
  const half = (Math.abs(near) * Number.EPSILON) / 2;
  return [1, -1, 2, -2].map((steps) => near + steps * half).find((candidate) => reads(candidate) === target) ?? near;
}

interface Digits {
  readonly sign: string;
  readonly digits: string;
  /** power of ten of the last digit */
  readonly place: number;
}

function digitsOf(number: number): Digits {
  if (number === 0) return { sign: "", digits: "0", place: 0 };
  const [mantissa = "0", exponent = "0"] = Math.abs(number).toExponential().split("e");
  const digits = mantissa.replace(".", "");
  return { sign: number < 0 ? "-" : "", digits, place: Number(exponent) - (digits.length - 1) };
}

/** The digits of both down to the same place, with the point or the exponent. */
function written(main: Digits, spread: Digits | null): string {
  const zero = main.digits === "0";
  const lowest = Math.min(
    zero ? (spread?.place ?? 0) : main.place,
    spread === null ? main.place : placeOf(spread, main),
  );
  const top = Math.max(topOf(main), spread === null ? lowest : topOf(spread), lowest);
  const fixed = top >= -3 && top < 5;
  const place = fixed ? Math.min(lowest, 0) : lowest;
  const number = main.sign + pointed(downTo(main, place), fixed ? -place : top - place);
  const bracket = spread === null ? "" : `(${downTo(spread, place)})`;
  return number + bracket + (fixed ? "" : `e${top}`);
}

function placeOf(spread: Digits, main: Digits): number {
  return spread.digits === "0" ? main.place : spread.place;
}

function topOf({ digits, place }: Digits): number {
  return digits === "0" ? Number.NEGATIVE_INFINITY : digits.length - 1 + place;
}

function downTo({ digits, place }: Digits, lowest: number): string {
  return digits === "0" ? "0" : digits + "0".repeat(place - lowest);
}
