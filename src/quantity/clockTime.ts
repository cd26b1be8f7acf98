import { type Fault, fault, type Span } from "../contract/problem.js";
import { plainText } from "./plainText.js";
import { readNumber } from "./readNumber.js";
import { isFault } from "./shifted.js";

/** A time of several parts, in seconds. */
export interface ClockTime {
  /** s */
  readonly seconds: number;
  /** one standard uncertainty of the last part, s; null where none is stated */
  readonly u: number | null;
  readonly end: number;
}

const seconds = { d: 86400, h: 3600, min: 60, s: 1 } as const;
type Part = keyof typeof seconds;

/**
 * A time at the start of `text` written as `00:01:30` (hours, minutes, seconds) or in parts, `1 min 30 s`, `2 h 5 min`;
 * null where neither stands there. Refuses minutes and seconds from 60 on in the first form, and parts that do not go
 * from the larger unit to the smaller.
 */
export function readClockTime(text: string): ClockTime | Fault | null {
  const plain = plainText(text);
  return digits(plain) ?? parts(plain);
}

function digits(text: string): ClockTime | Fault | null {
  const found = /^ *(\d+):(\d+)(?::(\d+(?:\.\d+)?))?(?![\d:])/.exec(text);
  if (found === null) return null;
  const [all, hours = "", minutes = "", rest] = found;
  const refused = rest === undefined || minutes.length !== 2 || Number(minutes) >= 60 || Number(rest) >= 60;
  if (refused || hours.length > 6 || !/^\d\d(\.|$)/.test(rest)) return notATime(text, all.length);
  return { seconds: Number(hours) * 3600 + Number(minutes) * 60 + Number(rest), u: null, end: all.length };
}

function parts(text: string): ClockTime | Fault | null {
  const pattern = /^ *(\d[\d.()]*) ?(d|h|min|s)(?![A-Za-z^/⁻·*])/;
  let total = 0;
  let at = 0;
  let count = 0;
  let smallest = Number.MAX_VALUE;
  let u: number | null = null;
  let orderly = true;
  for (;;) {
    const found = pattern.exec(text.slice(at));
    if (found === null) break;
    const number = readNumber(found[1] ?? "");
    if (isFault(number) || number.end !== found[1]?.length) break;
    const size = seconds[found[2] as Part];
    orderly &&= size < smallest && u === null;
    smallest = size;
    total += number.value * size;
    u = number.u === null ? null : number.u * size;
    at += found[0].length;
    count += 1;
  }
  if (count < 2) return null;
  return orderly ? { seconds: total, u, end: at } : notATime(text, at);
}

function notATime(text: string, end: number): Fault {
  const span: Span = { start: text.length - text.trimStart().length, end };
  return fault("time-parts", { text: text.slice(span.start, span.end) }, span);
}
