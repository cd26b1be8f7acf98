import { timeShape } from "./timeText.js";

/**
 * A cell as a number, exactly as JavaScript reads the same digits with a decimal point; null where it is none. Taken:
 * a sign (`+`, `-`, U+2212), digits with the file's decimal mark, an exponent. Not taken: thousands marks, the other
 * decimal mark, `NaN`, `inf`, `n/a`, a number with its unit, and what is too large for a double.
 */
export function numberOf(cell: string, decimalComma: boolean): number | null {
  const text = plainSigns(cell);
  if (!(decimalComma ? commaNumber : pointNumber).test(text)) return null;
  const value = Number(decimalComma ? text.replace(",", ".") : text);
  return Number.isFinite(value) ? value : null;
}

const pointNumber = /^[+-]?(?:\d+(?:\.\d*)?|\.\d+)(?:[eE][+-]?\d+)?$/;
const commaNumber = /^[+-]?(?:\d+(?:,\d*)?|,\d+)(?:[eE][+-]?\d+)?$/;

function plainSigns(cell: string): string {
  const trimmed = cell.trim();
  return trimmed.includes("\u2212") ? trimmed.replaceAll("\u2212", "-") : trimmed;
}

/**
 * What a cell looks like while the layout of the file is still unknown; `mark` is the decimal mark it shows. A gap is an
 * empty cell or one of the words instruments write for a missing reading.
 */
export interface CellLook {
  readonly kind: "number" | "gap" | "time" | "word";
  readonly mark: "." | "," | null;
}

export function lookOf(cell: string): CellLook {
  const text = plainSigns(cell);
  if (pointNumber.test(text)) return text.includes(".") ? pointed : whole;
  if (commaNumber.test(text)) return commaed;
  if (gapWord.test(text)) return gap;
  return timeShape(text) === null ? word : time;
}

const whole: CellLook = { kind: "number", mark: null };
const pointed: CellLook = { kind: "number", mark: "." };
const commaed: CellLook = { kind: "number", mark: "," };
const gap: CellLook = { kind: "gap", mark: null };
const time: CellLook = { kind: "time", mark: null };
const word: CellLook = { kind: "word", mark: null };

const gapWord = /^(?:|[-+]?(?:nan|inf|infinity)|n\/?a|null|none|over(?:flow|range)?|[-–—]{1,3}|\?+|\*+|#n\/a)$/i;

/** How a cell that is no number went wrong, as far as it shows; thousands marks are told from a decimal mark by place. */
export function wordKind(cell: string, decimalComma: boolean): "thousands" | "other mark" | "word" {
  const text = plainSigns(cell);
  if (thousands.test(text)) return "thousands";
  return (decimalComma ? pointNumber : commaNumber).test(text) ? "other mark" : "word";
}

/** Two marks of one kind, or one followed by the other, or blanks and apostrophes between groups of three. */
const thousands =
  /^[+-]?\d{1,3}(?:(?:,\d{3})+\.\d*|(?:\.\d{3})+,\d*|(?:,\d{3}){2,}|(?:\.\d{3}){2,}|(?:[ \u00a0\u202f\u2009'’]\d{3})+(?:[.,]\d*)?)$/;
