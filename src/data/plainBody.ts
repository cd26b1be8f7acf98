import type { Polling } from "../contract/polling.js";
import type { Limits } from "./dataOptions.js";
import { addOddRow, type OddRowLayout } from "./oddRow.js";
import { makeRoom, type RowStore, rowStore } from "./rowStore.js";
import type { TableLayout } from "./tableLayout.js";
import { timeReaders } from "./timeColumns.js";

/** What the byte loop needs to know of the layout. */
export interface PlainLayout extends OddRowLayout, Pick<TableLayout, "times" | "headerWords"> {
  readonly width: number;
  /** the line the body begins on, from 1 */
  readonly bodyLine: number;
}

export type PlainReading =
  | { readonly kind: "rows"; readonly store: RowStore }
  /** quotes inside cells or over several lines, another encoding, beyond a limit: the body is for csv-parse */
  | { readonly kind: "irregular" }
  | { readonly kind: "stopped" };

const tab = 9;
const lineFeed = 10;
const carriageReturn = 13;
const blank = 32;
const quote = 34;
const plus = 43;
const minus = 45;
const point = 46;
const comma = 44;
const zero = 48;
const nine = 57;

/** Powers of ten that a double holds exactly. */
const exactPowers = [
  1, 1e1, 1e2, 1e3, 1e4, 1e5, 1e6, 1e7, 1e8, 1e9, 1e10, 1e11, 1e12, 1e13, 1e14, 1e15, 1e16, 1e17, 1e18, 1e19, 1e20,
  1e21, 1e22,
];
/** A mantissa up to here takes one more digit and stays below 2^53. */
const roomForDigit = 900_719_925_474_098;

/**
 * The rows of a body of numbers, `width` in every row, read byte by byte; blank lines and blanks around cells are
 * allowed, quotes right around numbers, and one separator at the end of a row. A line of another kind, and each line with
 * dates or clock times, is taken by itself as long as its quotes are plain (see `addOddRow`). Anything else makes the body "irregular", and so does one beyond the limits: csv-parse then reads
 * it from the start and says what it is. A test keeps the two equal.
 *
 * A number of at most 53 bits times or over a power of ten that a double holds exactly is one operation, which IEEE 754
 * (5.4.1) rounds correctly: hence the double that JavaScript reads from the same digits. Any other is given to
 * JavaScript as text.
 */
export function plainBody(
  bytes: Uint8Array,
  start: number,
  layout: PlainLayout,
  limits: Limits,
  polling: Polling,
): PlainReading {
  const { width } = layout;
  const size = bytes.length;
  const separator = layout.delimiter.charCodeAt(0);
  const byBlanks = separator === blank;
  const decimal = layout.decimalComma ? comma : point;
  // between cells that commas separate, a decimal comma stands in quotes alone
  const bareDecimal = separator === decimal ? -1 : decimal;
  if (layout.delimiter.length !== 1 || separator > 126) return irregular;
  const times = timeReaders(layout.times, layout.headerWords);
  const timed = times !== null;
  const store = rowStore(width, expectedRows(bytes, start), times);
  let { values, lines } = store;
  let line = layout.bodyLine;
  let at = start;
  while (at < size) {
    const rowStart = at;
    let byte = bytes[at]!;
    while (byte === blank || (byte === tab && separator !== tab)) byte = bytes[++at] ?? lineFeed;
    if (byte === lineFeed || byte === carriageReturn) {
      at += byte === carriageReturn && bytes[at + 1] === lineFeed ? 2 : 1;
      line++;
      continue;
    }
    const row = store.rows;
    if (row === lines.length) {
      makeRoom(store);
      values = store.values;
      lines = store.lines;
    }
    let regular = !timed;
    for (let column = timed ? width : 0; column < width; column++) {
      const quoted = byte === quote;
      if (quoted) byte = bytes[++at] ?? lineFeed;
      const cellStart = at;
      const negative = byte === minus;
      if (negative || byte === plus) byte = bytes[++at] ?? lineFeed;
      let mantissa = 0;
      let digits = 0;
      let exponent = 0;
      let exact = true;
      while (byte >= zero && byte <= nine) {
        if (mantissa > roomForDigit) exact = false;
        mantissa = mantissa * 10 + (byte - zero);
        digits++;
        byte = bytes[++at] ?? lineFeed;
      }
      if (byte === (quoted ? decimal : bareDecimal)) {
        byte = bytes[++at] ?? lineFeed;
        while (byte >= zero && byte <= nine) {
          if (mantissa > roomForDigit) exact = false;
          mantissa = mantissa * 10 + (byte - zero);
          digits++;
          exponent--;
          byte = bytes[++at] ?? lineFeed;
        }
      }
      if (digits === 0) {
        regular = false;
        break;
      }
      if (byte === 101 || byte === 69) {
        byte = bytes[++at] ?? lineFeed;
        const shrinks = byte === minus;
        if (shrinks || byte === plus) byte = bytes[++at] ?? lineFeed;
        if (byte < zero || byte > nine) {
          regular = false;
          break;
        }
        let power = 0;
        while (byte >= zero && byte <= nine) {
          power = power > 99_999 ? power : power * 10 + (byte - zero);
          byte = bytes[++at] ?? lineFeed;
        }
        exponent += shrinks ? -power : power;
      }
      let value = mantissa;
      if (!exact || exponent > 22 || exponent < -22) value = spelledOut(bytes, cellStart, at, layout.decimalComma);
      else {
        if (exponent > 0) value *= exactPowers[exponent]!;
        else if (exponent < 0) value /= exactPowers[-exponent]!;
        if (negative) value = -value;
      }
      if (value === Number.POSITIVE_INFINITY || value === Number.NEGATIVE_INFINITY) {
        regular = false;
        break;
      }
      values[column]![row] = value;
      if (quoted) {
        if (byte !== quote || byBlanks) {
          regular = false;
          break;
        }
        byte = bytes[++at] ?? lineFeed;
      }
      const cellEnd = at;
      while (byte === blank || (byte === tab && separator !== tab)) byte = bytes[++at] ?? lineFeed;
      if (column < width - 1) {
        if (byBlanks) {
          if (at === cellEnd) {
            regular = false;
            break;
          }
        } else {
          if (byte !== separator) {
            regular = false;
            break;
          }
          byte = bytes[++at] ?? lineFeed;
          while (byte === blank || (byte === tab && separator !== tab)) byte = bytes[++at] ?? lineFeed;
        }
      }
    }
    if (regular && byte === separator && !byBlanks) {
      byte = bytes[++at] ?? lineFeed;
      while (byte === blank || (byte === tab && separator !== tab)) byte = bytes[++at] ?? lineFeed;
    }
    if (regular && (byte === lineFeed || byte === carriageReturn)) {
      lines[row] = line;
      store.rows = row + 1;
    } else {
      at = lineEnd(bytes, rowStart);
      if (!addOddRow(store, bytes.subarray(rowStart, at), layout, line)) return irregular;
      byte = bytes[at] ?? lineFeed;
    }
    if (at - rowStart > limits.lineLength || store.rows > limits.rows) return irregular;
    at += byte === carriageReturn && bytes[at + 1] === lineFeed ? 2 : 1;
    line++;
    if (line % 16_384 === 0 && polling.stopped?.()) return { kind: "stopped" };
  }
  return { kind: "rows", store };
}

const irregular = { kind: "irregular" } as const;

function lineEnd(bytes: Uint8Array, start: number): number {
  let at = start;
  while (at < bytes.length && bytes[at] !== lineFeed && bytes[at] !== carriageReturn) at++;
  return at;
}

/** The number as JavaScript reads its text. */
function spelledOut(bytes: Uint8Array, start: number, end: number, decimalComma: boolean): number {
  const text = String.fromCharCode(...bytes.subarray(start, end));
  return Number(decimalComma ? text.replace(",", ".") : text);
}

/** Rows to make room for, from the mean length of the first lines, and a twentieth more. */
function expectedRows(bytes: Uint8Array, start: number): number {
  const sample = bytes.subarray(start, start + 65_536);
  let ends = 0;
  for (const byte of sample) if (byte === lineFeed || byte === carriageReturn) ends++;
  if (sample.length < 65_536) return ends + 1;
  return ((bytes.length - start) / sample.length) * ends * 1.05;
}
