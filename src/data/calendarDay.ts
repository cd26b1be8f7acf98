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
  if (month < 1 || month > 12 || day < 1 || day > daysBefore(year, month + 1) - daysBefore(year, month)) return null;
  return daysBefore(year, month) + day - 1;
}

/** A day counted from 1970-01-01 as `2026-11-03`. */
export function dayText(days: number): string {
  // no year is longer than 366 days nor shorter than 365, so this is the year or one before it
  let year = 1970 + Math.floor(days / (days < 0 ? 365 : 366));
  while (daysBefore(year + 1, 1) <= days) year++;
  let month = 1;
  while (daysBefore(year, month + 1) <= days) month++;
  const two = (part: number): string => String(part).padStart(2, "0");
  return `${year}-${two(month)}-${two(days - daysBefore(year, month) + 1)}`;
}

/** Days from 1970-01-01 to the first of a month, from 1; month 13 is the next January. Own code: Date is a clock. */
function daysBefore(year: number, month: number): number {
  const leap = year % 4 === 0 && (year % 100 !== 0 || year % 400 === 0) && month > 2 ? 1 : 0;
  const past = year - 1;
  const leapYears = Math.floor(past / 4) - Math.floor(past / 100) + Math.floor(past / 400);
  return past * 365 + leapYears + (beforeMonth[month - 1] ?? 0) + leap - daysTo1970;
}

/** Days of an ordinary year before each month, and the days from 0001-01-01 to 1970-01-01. */
const beforeMonth = [0, 31, 59, 90, 120, 151, 181, 212, 243, 273, 304, 334, 365];
const daysTo1970 = 719_162;
