/** A date, a clock time or both, as a cell writes them; the parts are within their ranges. */
export interface TimeText {
  /** null for a clock time alone */
  readonly date: DateText | null;
  /** s since midnight, or since the clock was started; whole */
  readonly seconds: number;
  /** what goes beyond the whole second, ns; whole */
  readonly nanoseconds: number;
  /** from UTC, s; null where none is written */
  readonly offset: number | null;
  /** whether it is two numbers such as `1:30`, of which nothing says whether they are hours or minutes first */
  readonly twoParts: boolean;
}

/** The three numbers of a date in the order they stand. */
export interface DateText {
  readonly yearFirst: boolean;
  readonly fields: readonly [number, number, number];
}

/** What the two numbers of `1:30` are: hours and minutes or minutes and seconds; null where nothing says so. */
export type TwoParts = "hours" | "minutes" | null;

const shape =
  /^(?:(\d{1,4})([-/.])(\d{1,2})\2(\d{1,4})(?:T|,? |$))?(?:(\d{1,3}):(\d\d)(?::(\d\d))?(?:[.,](\d{1,9}))?(?: ?([ap])\.?m\.?)?(?: ?(z|[+-]\d\d(?::?\d\d)?))?)?$/i;

/** Whether a cell is written as a date, as a clock time, or as neither; whether there is such a day is not looked at. */
export function timeShape(cell: string): "date-time" | "clock" | null {
  if (!mayBeTime.test(cell)) return null;
  const found = shape.exec(cell);
  if (found === null) return null;
  return found[1] === undefined ? "clock" : "date-time";
}

const mayBeTime = /^\d{1,4}[-/.:]/;

/**
 * Takes a cell apart: dates with `-`, `/` or `.` between their numbers, then `T` or a blank, a clock time of two or three
 * numbers with decimals after a point or a comma, AM or PM, and an offset from UTC (ISO 8601-1:2019, 5.3 and 5.4, and
 * what instruments write beside it). `1:30.5` is minutes and seconds, since nothing else has decimals; after a date
 * `10:15` is hours and minutes; `1:30` alone is what `twoParts` says. Null where it is none of these; "no such time" for
 * minutes or seconds from 60 on and hours a day does not have.
 */
export function readTimeText(cell: string, twoParts: TwoParts): TimeText | "no such time" | null {
  const found = mayBeTime.test(cell) ? shape.exec(cell) : null;
  if (found === null) return null;
  const [, first, , second, third, one, two, three, decimals, half, zone] = found;
  const date = first === undefined ? null : dateText(first, second ?? "", third ?? "");
  if (one === undefined) return { date, seconds: 0, nanoseconds: 0, offset: null, twoParts: false };
  const open = three === undefined && decimals === undefined && date === null && half === undefined;
  const minutesFirst = three === undefined && (decimals !== undefined || (open && twoParts === "minutes"));
  if (minutesFirst && (date !== null || half !== undefined)) return "no such time";
  const hours = minutesFirst ? 0 : hoursOf(Number(one), half, date !== null);
  const minutes = Number(minutesFirst ? one : two);
  const seconds = Number(minutesFirst ? two : (three ?? 0));
  const offset = zone === undefined ? null : offsetOf(zone);
  if (hours === null || (minutes >= 60 && !minutesFirst) || seconds >= 60) return "no such time";
  return {
    date,
    seconds: hours * 3600 + minutes * 60 + seconds,
    nanoseconds: decimals === undefined ? 0 : Number(decimals.padEnd(9, "0")),
    offset,
    twoParts: open && twoParts === null,
  };
}

function dateText(first: string, second: string, third: string): DateText {
  return { yearFirst: first.length === 4, fields: [Number(first), Number(second), Number(third)] };
}

/** Hours of the day or, alone, of a clock that was started; after noon with PM. */
function hoursOf(hours: number, half: string | undefined, ofDay: boolean): number | null {
  if (half !== undefined) {
    if (hours < 1 || hours > 12) return null;
    return (hours % 12) + (half.toLowerCase() === "p" ? 12 : 0);
  }
  return ofDay && hours > 23 ? null : hours;
}

function offsetOf(zone: string): number {
  if (zone.toLowerCase() === "z") return 0;
  const size = Number(zone.slice(1, 3)) * 3600 + Number(zone.slice(-2)) * (zone.length > 3 ? 60 : 0);
  return zone.startsWith("-") ? -size : size;
}
