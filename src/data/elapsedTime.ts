import { calendarDay, certainOrder, type DateOrder } from "./calendarDay.js";
import type { ColumnTime, FaultKind } from "./columns.js";
import { type DateText, readTimeText, type TimeText, type TwoParts } from "./timeText.js";

/** A column of dates or clock times while it is read, from the first row on. */
export interface ElapsedTime {
  readonly kind: "date-time" | "clock";
  readonly twoParts: TwoParts;
  /** the first reading; null before it */
  first: First | null;
  /** how the dates are written; null while that is not certain */
  order: DateOrder | null;
  /** clock time of the reading before, s since midnight */
  before: number;
  /** midnights passed so far by a clock, and the row after the first of them */
  midnights: number;
  midnightRow: number;
  /** whether a clock showed 24 hours or more, so that it counts on at midnight */
  countsOn: boolean;
}

interface First {
  readonly text: string;
  readonly time: TimeText;
  /** days from 1970-01-01; null for a clock, and while the order of the date is not certain */
  day: number | null;
}

export function elapsedTime(kind: ElapsedTime["kind"], twoParts: TwoParts): ElapsedTime {
  const begin = { first: null, order: null, before: 0, midnights: 0, midnightRow: -1, countsOn: false };
  return { kind, twoParts, ...begin };
}

/**
 * The time of a cell, that is not empty, from the first reading of its column on, s; or why it is none. Civil time
 * without an offset runs evenly here: a change to or from summer time is never guessed. Dates that begin with the day
 * or the month are compared only where they are the same day, or where one of them shows which comes first. A clock that
 * falls by more than twelve hours has passed midnight.
 */
export function elapsed(column: ElapsedTime, cell: string, row: number): number | FaultKind {
  const time = readTimeText(cell, column.twoParts);
  if (time === null || time === "no such time" || (time.date === null) !== (column.kind === "clock")) return "time";
  if (time.twoParts) return "clock parts";
  if (column.first === null) return begin(column, cell, time);
  const { first } = column;
  if ((time.offset === null) !== (first.time.offset === null)) return "offset";
  const days = time.date === null ? midnightsAt(column, time, row) : daysFrom(column, first, time.date);
  if (typeof days === "string") return days;
  const shift = (first.time.offset ?? 0) - (time.offset ?? 0);
  const whole = days * 86_400 + time.seconds - first.time.seconds + shift;
  const part = time.nanoseconds - first.time.nanoseconds;
  // whole nanoseconds below 2^53 are exact, so that 0.3 s − 0.1 s is the number 0.2
  return Math.abs(whole) < 9e6 ? (whole * 1e9 + part) / 1e9 : whole + part / 1e9;
}

function begin(column: ElapsedTime, text: string, time: TimeText): number | FaultKind {
  let day: number | null = null;
  if (time.date !== null) {
    column.order = certainOrder(time.date);
    day = column.order === null ? null : calendarDay(time.date, column.order);
    if (column.order !== null ? day === null : !mayBeDay(time.date)) {
      column.order = null;
      return "time";
    }
  }
  column.first = { text, time, day };
  column.before = time.seconds;
  column.countsOn = time.seconds >= 86_400;
  return 0;
}

/** Whether a date of uncertain order has a day and a month at all. */
function mayBeDay({ fields: [first, second] }: DateText): boolean {
  return first >= 1 && second >= 1 && Math.min(first, second) <= 12 && Math.max(first, second) <= 31;
}

function midnightsAt(column: ElapsedTime, time: TimeText, row: number): number {
  if (time.seconds >= 86_400) column.countsOn = true;
  if (!column.countsOn && time.seconds < column.before - 43_200) {
    if (column.midnights++ === 0) column.midnightRow = row;
  }
  column.before = time.seconds;
  return column.midnights;
}

function daysFrom(column: ElapsedTime, first: First, date: DateText): number | FaultKind {
  const start = first.time.date;
  if (start !== null && same(start, date)) return 0;
  if (column.order === null && start !== null) {
    const order = certainOrder(date);
    const day = order === null ? null : calendarDay(start, order);
    if (day === null) return "date order";
    column.order = order;
    first.day = day;
  }
  if (column.order === null || first.day === null) return "date order";
  const day = calendarDay(date, column.order);
  return day === null ? "time" : day - first.day;
}

function same(a: DateText, b: DateText): boolean {
  return a.fields[0] === b.fields[0] && a.fields[1] === b.fields[1] && a.fields[2] === b.fields[2];
}

/** What remains known of the times when all rows are read; null where the column has none. */
export function columnTime({ first, midnights, midnightRow }: ElapsedTime): ColumnTime | null {
  if (first === null) return null;
  const seconds = first.time.seconds + first.time.nanoseconds / 1e9;
  return { start: first.text, day: first.day, seconds, midnights, midnightRow: midnights > 0 ? midnightRow : null };
}
