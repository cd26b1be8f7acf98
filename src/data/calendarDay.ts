import type { DateText } from "./timeText.js";

/** Which number of a date stands for what. */
export type DateOrder = "year first" | "day first" | "month first";

/**
 * The order in which a date is certainly written: the year in front decides it, or a number above 12, which is no month.
 * Null where day and month could stand either way, or the year has fewer than four digits.
 */
export function certainOrder({ yearFirst, fields }: DateText): DateOrder | null {
  if (yearFirst) return "year first";
  const [first, second, year] = fields;
  if (year < 1000) return null;
  if (first > 12 && second <= 12) return "day first";
  return second > 12 && first <= 12 ? "month first" : null;
}

/** Days from 1970-01-01 in the Gregorian calendar; null where there is no such day. */
export function calendarDay({ yearFirst, fields }: DateText, order: DateOrder): number | null {
  if (yearFirst !== (order === "year first")) return null;
  const [a, b, c] = fields;
  const [year, month, day] = order === "year first" ? [a, b, c] : order === "day first" ? [c, b, a] : [c, a, b];
  if (year < 1000) return null;
  const found = new Date(Date.UTC(year, month - 1, day));
  // a day or month beyond the last runs over into the next
  if (found.getUTCMonth() !== month - 1 || found.getUTCDate() !== day) return null;
  return found.getTime() / 86_400_000;
}
