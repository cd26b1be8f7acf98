import { type Fault, fault, replacement, type Span } from "../contract/problem.js";
import { type Basis, basisAtEnd, basisFault, basisMisplaced } from "./basis.js";
import { readClockTime } from "./clockTime.js";
import { intervalToSI, toSI } from "./conversion.js";
import { formatNumber } from "./formatNumber.js";
import { plainText } from "./plainText.js";
import type { Quantity, Source } from "./quantity.js";
import { readNumber } from "./readNumber.js";
import { readUnit } from "./readUnit.js";
import { isFault, shifted } from "./shifted.js";
import type { Unit } from "./unit.js";
import { noUnit } from "./unitOf.js";

/** A quantity as written, and where its pieces stand in the text. */
export interface ReadQuantity {
  readonly quantity: Quantity;
  readonly number: Span;
  /** null where no unit is written */
  readonly unit: Span | null;
  /** what a share of a mixture is a share of: `30 % by mass`; null where that is not said */
  readonly basis: Basis | null;
}

const sign = /±|\+ ?\/ ?-|\+-(?=[ .\d])|(?<![A-Za-z])within(?![A-Za-z])/;

/**
 * The quantity that the whole of `text` writes: `0.0500 +/- 0.0005 mol/L`, `(25.0 ± 0.1) °C`, `0.100 mol/L ± 2 %`,
 * `50.00 mL within 0.05 mL`, `1 min 30 s`, `00:01:30`, `30 % by mass`. Value and uncertainty are SI; each stated
 * uncertainty is one common source called `sourceName`. A tolerance ±a counts as a/√3 (JCGM 100:2008, 4.3.7); a per
 * cent one is relative, unless the value is itself in per cent. A missing unit is allowed here: `checkDimension` asks
 * for it.
 */
export function readQuantity(text: string, sourceName = ""): ReadQuantity | Fault {
  const key = `${sourceName}\n${text}`;
  const found = remembered.get(key);
  if (found !== undefined) return found;
  const answer = readWhole(text, sourceName);
  if (remembered.size > 4000) remembered.clear();
  remembered.set(key, answer);
  return answer;
}

/** Answers by source and text: a description is read again at every keystroke, and most of its lines are as before. */
const remembered = new Map<string, ReadQuantity | Fault>();

function readWhole(text: string, sourceName: string): ReadQuantity | Fault {
  const plain = plainText(text);
  const lead = /^ *\((?=[^()]*(?:±|\+ ?\/ ?-))/.exec(plain)?.[0].length ?? 0;
  if (lead > 0) return bracketed(plain, lead, sourceName);
  const clock = readClockTime(plain);
  if (clock !== null) return isFault(clock) ? clock : fromClock(plain, clock.seconds, clock.u, clock.end, sourceName);
  const number = readNumber(text);
  if (isFault(number)) return number;
  const start = text.length - plain.trimStart().length;
  const span = { start, end: number.end };
  return withUnit(
    plain,
    { value: number.value, us: number.u === null ? [] : [number.u], span },
    number.end,
    sourceName,
  );
}

/** What is known once the number, and an uncertainty that stands before the unit, are read. */
interface Head {
  readonly value: number;
  readonly us: readonly number[];
  readonly span: Span;
}

function withUnit(text: string, head: Head, from: number, sourceName: string): ReadQuantity | Fault {
  const plusMinus = /^ *(±|\+ ?\/ ?-|\+-(?=[ .\d]))/.exec(text.slice(from));
  let begin = from;
  const us = [...head.us];
  if (plusMinus !== null) {
    const share = shareFault(text, head, from + plusMinus[0].length, plusMinus[1] ?? "");
    if (share !== null) return share;
    const stated = uncertainty(text, from + plusMinus[0].length, plusMinus[1] ?? "");
    if (isFault(stated)) return stated;
    if (us.length > 0) return fault("uncertainty-twice", {}, { start: head.span.start, end: stated.end });
    us.push(stated.value);
    begin = stated.end;
  }
  const rest = text.slice(begin);
  const next = sign.exec(rest);
  const by = basisAtEnd(next === null ? rest : rest.slice(0, next.index));
  const unitEnd = begin + (by?.start ?? next?.index ?? rest.length);
  const unitText = text.slice(begin, unitEnd);
  const read = unitText.trim() === "" ? { unit: noUnit } : readUnit(unitText);
  if (isFault(read)) return shifted(basisFault(unitText) ?? read, begin);
  const unitStart = begin + unitText.length - unitText.trimStart().length;
  const unit = unitText.trim() === "" ? null : { start: unitStart, end: begin + unitText.trimEnd().length };
  if (by !== null) {
    const span = { start: begin + by.start, end: begin + (next?.index ?? rest.length) };
    const from = span.start + (text.charAt(span.start) === " " ? 1 : 0);
    const written = { start: from, end: span.start + text.slice(span.start, span.end).trimEnd().length };
    const misplaced = basisMisplaced(read.unit, by.basis, unit?.end ?? begin, written);
    if (misplaced !== null) return misplaced;
  }
  const tails = next === null ? [] : tailsOf(text, begin + next.index, head.value, read.unit);
  if (isFault(tails)) return tails;
  if (us.length > 0 && tails.some(({ kind }) => kind === "stated")) {
    return fault("uncertainty-twice", {}, { start: head.span.start, end: text.trimEnd().length });
  }
  const all = [...us.map((u) => intervalToSI(u, read.unit)), ...tails.map(({ u }) => u)];
  const value = toSI(head.value, read.unit);
  if (![value, ...all].every(Number.isFinite)) return fault("number-range", { text: text.trim() }, head.span);
  const sources: Source[] = all.map((u) => ({ name: sourceName, kind: "common", u }));
  return { quantity: { value, unit: read.unit, sources }, number: head.span, unit, basis: by?.basis ?? null };
}

/** `98 ± 2 %` may mean (98 ± 2) % or 98 with 2 % of it: both are offered. Null where the text says which. */
function shareFault(text: string, { value, us, span }: Head, from: number, word: string): Fault | null {
  const found = /^ *(\d+(?:\.\d+)?|\.\d+) *%(?= *$| *within)/.exec(text.slice(from));
  if (found === null || us.length > 0) return null;
  const [all, size = ""] = found;
  const number = text.slice(span.start, span.end);
  const inner = number.replace(/^\((.*)\)$/, "$1");
  const share = formatNumber(Math.abs(value) * (Number(size) / 100), null);
  const whole = { start: span.start, end: from + all.length };
  const readings = [`(${inner} ${word} ${size}) %`, `${inner} ${word} ${share}`];
  const [first = "", second = ""] = readings;
  const written = text.slice(whole.start, whole.end);
  const mends = readings.map((reading) => replacement(whole, reading));
  return fault("uncertainty-of-what", { text: written, first, second }, whole, mends);
}

/** An uncertainty after the unit, SI. */
interface Tail {
  readonly kind: "stated" | "tolerance";
  readonly u: number;
}

/** `± 2 %`, `± 0.002 mol/L`, `within 0.05 mL`, one of each at most, from `at` to the end of the text. */
function tailsOf(text: string, at: number, value: number, unit: Unit): Tail[] | Fault {
  const tails: Tail[] = [];
  let from = at;
  while (text.slice(from).trim() !== "") {
    const word = sign.exec(text.slice(from));
    if (word === null) return tails;
    const start = from + word.index;
    const begin = start + word[0].length;
    const next = sign.exec(text.slice(begin));
    const end = next === null ? text.length : begin + next.index;
    const tail = tailOf(text, { start: begin, end }, word[0], value, unit);
    if (isFault(tail)) return tail;
    if (tails.some(({ kind }) => kind === tail.kind)) return fault("uncertainty-twice", {}, { start, end });
    tails.push(tail);
    from = end;
  }
  return tails;
}

function tailOf(text: string, { start, end }: Span, word: string, value: number, unit: Unit): Tail | Fault {
  const kind = word === "within" ? "tolerance" : "stated";
  const number = uncertainty(text.slice(0, end), start, kind === "tolerance" ? "within" : "±");
  if (isFault(number)) return number;
  const own = text.slice(number.end, end);
  const divisor = kind === "tolerance" ? Math.sqrt(3) : 1;
  if (own.trim() === "") {
    if (kind === "stated" || unit.parts.length === 0) return { kind, u: intervalToSI(number.value, unit) / divisor };
    const span = { start: number.start, end: number.end };
    const written = text.slice(span.start, span.end);
    return fault("tolerance-unit", { number: written }, span, [replacement(span, `${written} ${unit.text}`)]);
  }
  const read = readUnit(own);
  if (isFault(read)) return shifted(read, number.end);
  const share = read.unit.text === "%" && unit.text !== "%";
  if (share) return { kind, u: (intervalToSI(Math.abs(value), unit) * number.value) / 100 / divisor };
  if (read.unit.dimension.some((exponent, index) => exponent !== unit.dimension[index])) {
    const span = { start: end - own.trimStart().length, end: number.end + own.trimEnd().length };
    const mend = unit.text === "" ? [] : [replacement(span, unit.text)];
    return fault("uncertainty-unit", { given: own.trim(), unit: unit.text || "a plain number" }, span, mend);
  }
  return { kind, u: intervalToSI(number.value, read.unit) / divisor };
}

/** The number after a sign; not negative. */
function uncertainty(text: string, from: number, word: string): { value: number; start: number; end: number } | Fault {
  const number = readNumber(text.slice(from));
  const start = from + text.slice(from).length - text.slice(from).trimStart().length;
  if (isFault(number)) {
    if (number.code === "number-comma" || number.code === "number-range") return shifted(number, from);
    return fault("uncertainty-unreadable", { sign: word }, { start: from, end: Math.max(start, from) });
  }
  const end = from + number.end;
  if (number.value < 0 || number.u !== null) return fault("uncertainty-unreadable", { sign: word }, { start, end });
  return { value: number.value, start, end };
}

/** `(25.0 ± 0.1) °C`. */
function bracketed(text: string, lead: number, sourceName: string): ReadQuantity | Fault {
  const close = text.indexOf(")", lead);
  const open = { start: lead - 1, end: lead };
  if (close < 0) return fault("unit-bracket", {}, open);
  const number = readNumber(text.slice(lead, close));
  if (isFault(number)) return shifted(number, lead);
  const pm = /^ *(?:±|\+ ?\/ ?-)/.exec(text.slice(lead + number.end, close));
  const wrong = { start: lead + number.end, end: close };
  if (pm === null || number.u !== null) return fault("uncertainty-unreadable", { sign: "±" }, wrong);
  const stated = uncertainty(text.slice(0, close), lead + number.end + pm[0].length, "±");
  if (isFault(stated)) return stated;
  if (text.slice(stated.end, close).trim() !== "") return fault("uncertainty-unreadable", { sign: "±" }, wrong);
  return withUnit(
    text,
    { value: number.value, us: [stated.value], span: { start: open.start, end: close + 1 } },
    close + 1,
    sourceName,
  );
}

function fromClock(
  text: string,
  value: number,
  u: number | null,
  end: number,
  sourceName: string,
): ReadQuantity | Fault {
  const read = readUnit("s");
  if (isFault(read)) return read;
  const start = text.length - text.trimStart().length;
  const rest = text.slice(end);
  const word = /^ *(?=±|\+ ?\/ ?-|within)/.exec(rest);
  if (rest.trim() !== "" && word === null) {
    const span = { start, end: text.trimEnd().length };
    return fault("time-parts", { text: text.trim() }, span);
  }
  const tails = tailsOf(text, end, value, read.unit);
  if (isFault(tails)) return tails;
  const us = [...(u === null ? [] : [u]), ...tails.map((tail) => tail.u)];
  const sources: Source[] = us.map((size) => ({ name: sourceName, kind: "common", u: size }));
  const span = { start, end };
  return { quantity: { value, unit: read.unit, sources }, number: span, unit: span, basis: null };
}
