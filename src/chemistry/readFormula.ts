import { type Fault, fault, replacement, type Span } from "../contract/problem.js";
import { fromSubscript, fromSuperscript, plainText } from "../quantity/plainText.js";
import { isFault } from "../quantity/shifted.js";
import { chargeAsked } from "./chargeAsked.js";
import { elementOf } from "./element.js";
import { chargeText, type Formula } from "./formula.js";
import { recased } from "./recased.js";

const partner: Readonly<Record<string, string>> = { "(": ")", "[": "]", "{": "}" };

/**
 * The formula at the start of `text`, and where it ends: nested brackets, hydrates (`·`, `.`, `*`; spaces around `·`), subscripts, charges
 * `^2-`, `²⁻`, `+`, `-`, `++`, isotopes D and T, the electron `e-`. A bare `+` with something right behind it is left
 * to the caller, who joins species by it. Refuses unknown symbols, and a digit before a bare sign, which has two
 * readings, and a share of a water (`·½H2O`). States are not part of it (`readSpecies`).
 */
export function readFormula(text: string): { formula: Formula; end: number } | Fault {
  const plain = fromSubscript(plainText(text));
  if (/^e(?:\^-|-(?!>)|⁻)(?![A-Za-z0-9])/.test(plain)) {
    return { formula: { parts: new Map(), charge: -1, text: "e^-" }, end: plain.startsWith("e^") ? 3 : 2 };
  }
  const body = bodyOf(plain);
  if (isFault(body)) return body;
  const written = plain.slice(0, body.end).replace(/ /g, "").replace(/[·*]/g, ".");
  const charge = chargeOf(plain, body.end, written);
  if (isFault(charge)) return charge;
  const formula = { parts: body.parts, charge: charge.charge, text: written + chargeText(charge.charge) };
  return { formula, end: charge.end };
}

interface Counted {
  readonly parts: Map<string, number>;
  readonly end: number;
}

/** Groups joined by hydrate dots. */
function bodyOf(text: string): Counted | Fault {
  const parts = new Map<string, number>();
  let at = 0;
  for (;;) {
    const count = at === 0 ? "" : (/^\d*/.exec(text.slice(at))?.[0] ?? "");
    const multiple = count === "" ? 1 : whole(count);
    if (multiple === null) return fault("formula-count", { count }, { start: at, end: at + count.length });
    const space = count !== "" && text.charAt(at + count.length) === " " ? 1 : 0;
    const group = groupOf(text, at + count.length + space, 0);
    if (isFault(group)) return group;
    add(parts, group.parts, multiple);
    at = group.end;
    const half = hydrateShare(text, at);
    if (half !== null) return half;
    const dot = /^(?:[·.*]| ?· ?)(?=\d* ?[A-Z([{])/.exec(text.slice(at))?.[0];
    if (dot === undefined) return { parts, end: at };
    at += dot.length;
  }
}

const shares: Readonly<Record<string, string>> = { "½": "1/2", "¼": "1/4", "¾": "3/4" };

/** The fault of a hydrate with a share of a water: twice (four times …) the formula has whole counts. */
function hydrateShare(text: string, at: number): Fault | null {
  const found = /^[·.*](½|¼|¾|\d{1,2}[./]\d{1,2})([A-Z][A-Za-z0-9]*)/.exec(text.slice(at));
  if (found === null) return null;
  const [all, share = "", water = ""] = found;
  const span = { start: 0, end: at + all.length };
  const [num = 0, den = 1] = (shares[share] ?? share).split("/").map(Number);
  const times = [2, 3, 4].find((factor) => Number.isInteger((num / den) * factor)) ?? 0;
  const body = text.slice(0, at);
  const count = (num / den) * times;
  if (times === 0 || count < 1 || /[·.*]/.test(body)) {
    return fault("hydrate-not-whole", { text: text.slice(0, span.end), mend: "" }, span);
  }
  const mend = `(${body})${times}·${count === 1 ? "" : count}${water}`;
  return fault("hydrate-not-whole", { text: text.slice(0, span.end), mend }, span, [replacement(span, mend)]);
}

/** Symbols and brackets, each with its count, from `from` up to what is neither. */
function groupOf(text: string, from: number, depth: number): Counted | Fault {
  const parts = new Map<string, number>();
  let at = from;
  for (;;) {
    const piece = depth > 10 ? fault("formula-too-deep", {}, { start: from - 1, end: from }) : pieceOf(text, at, depth);
    if (piece === null) break;
    if (isFault(piece)) return piece;
    const count = /^\d+/.exec(text.slice(piece.end))?.[0] ?? "";
    const multiple = count === "" ? 1 : whole(count);
    if (multiple === null)
      return fault("formula-count", { count }, { start: piece.end, end: piece.end + count.length });
    add(parts, piece.parts, multiple);
    at = piece.end + count.length;
  }
  return at === from ? nothing(text, from, depth) : { parts, end: at };
}

function pieceOf(text: string, at: number, depth: number): Counted | Fault | null {
  const sign = text.charAt(at);
  const close = partner[sign];
  if (close !== undefined) {
    if (/^\([a-z]/.test(text.slice(at))) return null;
    const inner = groupOf(text, at + 1, depth + 1);
    if (isFault(inner)) return inner;
    const bracket = { start: at, end: at + 1 };
    if (text.charAt(inner.end) !== close) return fault("formula-bracket", { bracket: sign }, bracket);
    return { parts: inner.parts, end: inner.end + 1 };
  }
  if (!/^[A-Za-z]/.test(sign)) return null;
  const two = /^[A-Z][a-z]/.exec(text.slice(at))?.[0];
  const symbol = two !== undefined && elementOf(two) !== null ? two : sign;
  const follows = text.charAt(at + symbol.length);
  if (elementOf(symbol) !== null && (symbol === two || !/[a-z]/.test(follows))) {
    return { parts: new Map([[symbol, 1]]), end: at + symbol.length };
  }
  return unknown(text, at);
}

/** The whole word is at fault: it may be a name that is not declared, or a formula in the wrong case. */
function unknown(text: string, at: number): Fault {
  const symbol = /^[A-Z]?[a-z]*/.exec(text.slice(at))?.[0] || text.charAt(at);
  const word = /^(?:[A-Za-z0-9[\]{}_′.·]|\((?![a-z])|(?<!\([a-z]*)\)|-(?=[A-Za-z0-9]))*/.exec(text)?.[0] ?? symbol;
  const span = { start: 0, end: Math.max(word.length, at + symbol.length) };
  const mends = recased(word).map((found) => replacement(span, found));
  const near = mends.map((mend) => mend.text).join(" or ");
  return fault("species-unknown", { word: text.slice(0, span.end), symbol, near }, span, mends);
}

function nothing(text: string, at: number, depth: number): Fault {
  if (depth > 0) return fault("formula-bracket", { bracket: text.charAt(at - 1) }, { start: at - 1, end: at });
  const word = /^[^\s+]*/.exec(text.slice(at))?.[0] ?? "";
  const end = at + word.length;
  return fault("formula-expected", { text: word === "" ? "" : `“${word.slice(0, 30)}”` }, { start: at, end });
}

/** The charge that stands at `at`, 0 where none does. */
function chargeOf(text: string, at: number, body: string): { charge: number; end: number } | Fault {
  const rest = text.slice(at);
  const caret = /^\^ ?\(?(?:([-+])(\d+)|(\d*)([-+]))\)?/.exec(rest);
  if (caret !== null)
    return sized(caret[1] ?? caret[4] ?? "+", caret[2] ?? caret[3] ?? "", { start: at, end: at + caret[0].length });
  const raised = /^[⁰¹²³⁴-⁹]*[⁺⁻]|^[⁺⁻][⁰¹²³⁴-⁹]+/.exec(rest);
  if (raised !== null) {
    const written = fromSuperscript(raised[0]);
    return sized(written.includes("-") ? "-" : "+", written.replace(/[-+]/, ""), {
      start: at,
      end: at + raised[0].length,
    });
  }
  const lost = /^\^\S{0,3}|^[⁰¹²³⁴-⁹]+/.exec(rest);
  if (lost !== null) {
    const span = { start: at, end: at + lost[0].length };
    const size = /^\^?(\d)$/.exec(fromSuperscript(lost[0]))?.[1];
    const mends = size === undefined ? [] : [replacement(span, `^${size}+`), replacement(span, `^${size}-`)];
    return fault("charge-unreadable", { body }, span, mends);
  }
  const bare = /^(?:\+{1,4}(?![A-Z0-9[{½a-z]|\((?![a-z]))|-{1,4}(?![A-Za-z0-9>])|-(?=->))/.exec(rest)?.[0] ?? "";
  if (bare === "") return { charge: 0, end: at };
  const digits = /\d+$/.exec(body)?.[0] ?? "";
  if (digits !== "" && !digits.endsWith("0")) return chargeAsked(body, digits, bare, at + bare.length);
  return { charge: bare.startsWith("-") ? -bare.length : bare.length, end: at + bare.length };
}

function sized(sign: string, digits: string, span: Span): { charge: number; end: number } | Fault {
  const size = digits === "" ? 1 : Number(digits);
  if (size > 99) return fault("formula-count", { count: digits }, span);
  return { charge: size === 0 ? 0 : sign === "-" ? -size : size, end: span.end };
}

function whole(digits: string): number | null {
  const count = Number(digits);
  return count >= 1 && digits.length <= 5 ? count : null;
}

function add(parts: Map<string, number>, more: ReadonlyMap<string, number>, multiple: number): void {
  for (const [symbol, count] of more) parts.set(symbol, (parts.get(symbol) ?? 0) + count * multiple);
}
