import { type Fault, fault, type Mend, replacement, type Span } from "../contract/problem.js";
import { nearest } from "./nearest.js";
import { fromSuperscript, plainText } from "./plainText.js";
import { prefixRefused, symbolOf } from "./symbols.js";
import type { Unit, UnitPart } from "./unit.js";
import { unitOf } from "./unitOf.js";
import { meantSymbols, proposable } from "./unitTable.js";

const remembered = new Map<string, { unit: Unit } | Fault>();

/**
 * The unit that the whole of `text` writes: products by space, `·`, `*` or `.`, one solidus with brackets where more
 * than one factor stands below it, exponents as `^-1`, `⁻¹` or `-1`, `1/s`. Refuses words that are not units, prefixes
 * where none is taken, and `a/b c`, which has two readings (SI Brochure, 9th edition, 5.2). Spans count from the start
 * of `text`.
 */
export function readUnit(text: string): { unit: Unit } | Fault {
  const found = remembered.get(text);
  if (found !== undefined) return found;
  const answer = read(text);
  if (remembered.size > 4000) remembered.clear();
  remembered.set(text, answer);
  return answer;
}

/** One place in the text being read; moved along by the functions below. */
interface Cursor {
  readonly text: string;
  at: number;
  depth: number;
}

type Factors = { readonly parts: UnitPart[] } | Fault;

const longest = 200;
const symbolAt =
  /[°º˚] ?[CF](?![A-Za-z])|℃|℉|deg ?[CF](?![A-Za-z])|mm ?Hg(?![A-Za-z])|[mc]mH2O|[km]?cal_15|[%‰°º˚]|[A-Za-zΩ\u2126Å\u212b]+(?:_[A-Za-z]+)?/y;
const exponentAt = /\^ ?\( ?([-+]?\d+(?:\.\d+|\/\d+)?) ?\)|\^ ?([-+]?\d+(?:\.\d+)?)|([⁺⁻]?[⁰¹²³⁴-⁹]+)|([-+]?\d+)/y;
const productAt = / *[·*] *|\.(?=[A-Za-z°Ω(])| +/y;

function read(text: string): { unit: Unit } | Fault {
  const plain = plainText(text);
  const whole = { start: text.length - plain.trimStart().length, end: plain.trimEnd().length };
  if (whole.start >= whole.end) return fault("unit-expected", {}, { start: 0, end: text.length });
  if (text.length > longest) return fault("unit-unreadable", { text: "this" }, whole);
  const cursor: Cursor = { text: plain.slice(0, whole.end), at: whole.start, depth: 0 };
  const factors = expression(cursor, whole);
  if (!("parts" in factors)) return factors;
  if (cursor.at < whole.end) return unreadable(cursor, { start: cursor.at, end: cursor.at + 1 });
  const unit = factors.parts.some(({ exponent }) => Math.abs(exponent) > 20) ? null : unitOf(factors.parts);
  if (unit === null || unit.parts.some(({ exponent }) => Math.abs(exponent) > 20)) return unreadable(cursor, whole);
  return { unit };
}

/** Product [ "/" Factor ]. */
function expression(cursor: Cursor, whole: Span): Factors {
  const start = cursor.at;
  const above = /\/|1 *\//y;
  above.lastIndex = cursor.at;
  const bare = above.exec(cursor.text);
  let parts: UnitPart[] = [];
  if (bare !== null) {
    cursor.at += bare[0].length - 1;
  } else if (cursor.text.slice(start, whole.end) === "1") {
    cursor.at += 1;
    return { parts };
  } else {
    const numerator = productOf(cursor, whole);
    if (!("parts" in numerator)) return numerator;
    parts = numerator.parts;
  }
  skipSpaces(cursor);
  if (cursor.text.charAt(cursor.at) !== "/") return { parts };
  const solidus = cursor.at;
  cursor.at += 1;
  skipSpaces(cursor);
  const from = cursor.at;
  const below = factor(cursor, whole);
  if (!("parts" in below)) return below;
  const to = cursor.at;
  const rest = /^ *[·*./]? *(?=[^)])/.exec(cursor.text.slice(to, whole.end));
  if (rest !== null && rest[0] !== "") {
    return ambiguous(cursor, { start, end: whole.end }, [start, solidus, from, to, to + rest[0].length]);
  }
  return { parts: [...parts, ...below.parts.map(({ symbol, exponent }) => ({ symbol, exponent: -exponent }))] };
}

function productOf(cursor: Cursor, whole: Span): Factors {
  const parts: UnitPart[] = [];
  for (;;) {
    const next = factor(cursor, whole);
    if (!("parts" in next)) return next;
    parts.push(...next.parts);
    productAt.lastIndex = cursor.at;
    const join = productAt.exec(cursor.text)?.[0];
    if (join === undefined || "/)".includes(cursor.text.charAt(cursor.at + join.length))) return { parts };
    cursor.at += join.length;
  }
}

function factor(cursor: Cursor, whole: Span): Factors {
  const start = cursor.at;
  let parts: UnitPart[];
  if (cursor.text.charAt(start) === "(") {
    if (cursor.depth >= 8) return unreadable(cursor, { start, end: start + 1 });
    cursor.at += 1;
    cursor.depth += 1;
    skipSpaces(cursor);
    const inner = expression(cursor, whole);
    if (!("parts" in inner)) return inner;
    skipSpaces(cursor);
    if (cursor.text.charAt(cursor.at) !== ")") {
      const mend = { text: ")", edits: [{ start: whole.end, end: whole.end, text: ")" }] };
      return fault("unit-bracket", {}, { start, end: start + 1 }, cursor.at >= whole.end ? [mend] : []);
    }
    cursor.at += 1;
    cursor.depth -= 1;
    parts = inner.parts;
  } else {
    symbolAt.lastIndex = start;
    const written = symbolAt.exec(cursor.text)?.[0];
    if (written === undefined) return unreadable(cursor, { start, end: Math.min(start + 1, cursor.text.length) });
    const span = { start, end: start + written.length };
    const known = symbolOf(spelling(written));
    if (known === null) return unknown(written, span);
    cursor.at = span.end;
    parts = [{ symbol: known.symbol, exponent: 1 }];
  }
  const power = exponent(cursor);
  return { parts: parts.map((part) => ({ symbol: part.symbol, exponent: part.exponent * power })) };
}

function exponent(cursor: Cursor): number {
  exponentAt.lastIndex = cursor.at;
  const found = exponentAt.exec(cursor.text);
  if (found === null) return 1;
  cursor.at += found[0].length;
  const [, bracketed, caret, raised, bare] = found;
  const [num = "1", den = "1"] = (bracketed ?? caret ?? bare ?? fromSuperscript(raised ?? "1")).split("/");
  return Number(den) === 0 ? 99 : Number(num) / Number(den);
}

/** One spelling for the signs that have several: `°C`, `℃`, `deg C` and `degC`. */
function spelling(written: string): string {
  if (written === "℃") return "degC";
  if (written === "℉") return "degF";
  return written.replace(/^[°º˚]/, "deg").replace(/ /g, "");
}

function skipSpaces(cursor: Cursor): void {
  while (cursor.text.charAt(cursor.at) === " ") cursor.at += 1;
}

function unreadable(cursor: Cursor, span: Span): Fault {
  const text = cursor.text.slice(span.start, span.end);
  return text.trim() === "" ? fault("unit-expected", {}, span) : fault("unit-unreadable", { text: `“${text}”` }, span);
}

function unknown(written: string, span: Span): Fault {
  const refused = prefixRefused(written);
  if (refused !== null)
    return fault("unit-prefix", { text: written, unit: refused }, span, [replacement(span, refused)]);
  const meant = meantSymbols[written.toLowerCase()];
  const near = meant === undefined ? [...new Set(nearest(written, proposable))] : [meant];
  const mends = near.map((symbol) => replacement(span, symbol === "degC" ? "°C" : symbol));
  return fault("unit-unknown", { text: written, near: mends.map(({ text }) => text).join(" or ") }, span, mends);
}

/** `a/b c`: both readings as mends, the one below the line first unless what follows is already a reciprocal. */
function ambiguous(
  cursor: Cursor,
  span: Span,
  [start, solidus, from, to, next]: [number, number, number, number, number],
): Fault {
  const a = cursor.text.slice(start, solidus).trim();
  const b = cursor.text.slice(from, to).trim();
  const c = cursor.text.slice(next, span.end).trim();
  const below = `${a}/(${b} ${c.replace(/ *\/ */g, " ").replace(/[()]/g, "")})`;
  const above = a === "" || a === "1" ? `${c}/${b}` : `${a} ${c}/${b}`;
  const both = /^[A-Za-z]+(\^?-|⁻)/.test(c) ? [above, below] : [below, above];
  const clear = both.filter((reading) => reading.indexOf("/") === reading.lastIndexOf("/"));
  const mends: Mend[] = clear.map((reading) => replacement(span, reading));
  const text = cursor.text.slice(span.start, span.end);
  return fault("unit-ambiguous", { text, first: both[0] ?? "", second: both[1] ?? "" }, span, mends);
}
