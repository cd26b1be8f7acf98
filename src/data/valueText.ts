import { dayText } from "./calendarDay.js";
import type { Column } from "./columns.js";

/**
 * A value of a column as its file would write it, for messages: a number as it is; an elapsed time (s) as the date and
 * the clock time it was read from, `2026-11-03 10:15:30`, as seen in the offset of the first reading.
 */
export function valueText({ kind, time }: Pick<Column, "kind" | "time">, value: number): string {
  if (kind === "number" || time === null) return String(value);
  // whole nanoseconds, so that the sum shows no digits that nobody wrote
  const total = Math.round((time.seconds + value) * 1e9) / 1e9;
  const days = Math.floor(total / 86_400);
  const wraps = time.day !== null || time.midnights > 0 || total < 0;
  const clock = clockText(wraps ? total - days * 86_400 : total);
  return time.day === null ? clock : `${dayText(time.day + days)} ${clock}`;
}

function clockText(total: number): string {
  const whole = Math.floor(total);
  const two = (part: number): string => String(part).padStart(2, "0");
  const decimals = (total - whole).toFixed(6).replace(/0+$/, "").slice(1).replace(/^\.$/, "");
  return `${two(Math.floor(whole / 3600))}:${two(Math.floor(whole / 60) % 60)}:${two(whole % 60)}${decimals}`;
}
