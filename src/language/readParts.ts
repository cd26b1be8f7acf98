import { type Fault, fault, type Mend, replacement, type Span } from "../contract/problem.js";
import { nearest } from "../quantity/nearest.js";
import { readNumber } from "../quantity/readNumber.js";
import { readQuantity } from "../quantity/readQuantity.js";
import { readUnit } from "../quantity/readUnit.js";
import { isFault, shifted } from "../quantity/shifted.js";
import { checkQuantity } from "./checkQuantity.js";
import { type Cursor, keep, slice, spanOf, textOf } from "./cursor.js";
import { describeParts, firstWords } from "./describePart.js";
import type { Token } from "./lexer.js";
import { isName } from "./name.js";
import type { Part } from "./shape.js";
import { type StatementRow, statementByHead } from "./statements.js";
import type { Field, OrderTerm } from "./syntax.js";
import { endOfWords } from "./unitWords.js";
import { isDate, otherDates } from "./writtenDate.js";

/** Reads the parts one after the other; stops at the first that does not fit and leaves the fault in the cursor. */
export function readParts(cursor: Cursor, parts: readonly Part[], row: StatementRow): void {
  for (const part of parts) {
    if (cursor.fault !== null) return;
    readPart(cursor, part, row);
  }
}

function readPart(cursor: Cursor, part: Part, row: StatementRow): void {
  if (part.part === "optional") {
    if (begins(cursor, part.parts)) readParts(cursor, part.parts, row);
    else if (part.parts[0] !== undefined) cursor.wanted.push(part.parts[0]);
    return;
  }
  if (part.part === "any") {
    readAny(cursor, part.options, row);
    return;
  }
  if (part.part === "list") {
    readList(cursor, part.label, part.of, row);
    return;
  }
  if (part.part === "either") {
    const option = part.options.find((candidate) => begins(cursor, candidate));
    if (option !== undefined) readParts(cursor, option, row);
    else wantedButFound(cursor, part.options.map((candidate) => candidate[0]).filter(isPart), row);
    return;
  }
  if (!begins(cursor, [part])) {
    wantedButFound(cursor, [part], row);
    return;
  }
  cursor.wanted = [];
  const from = cursor.at;
  readLeaf(cursor, part);
  if (cursor.at > from) cursor.before = textOf(cursor, from, cursor.at);
}

/** Options in any order; what is left of them could still come. */
function readAny(cursor: Cursor, options: readonly (readonly Part[])[], row: StatementRow): void {
  let left = [...options];
  for (;;) {
    const option = left.find((candidate) => begins(cursor, candidate));
    if (option === undefined || cursor.fault !== null) break;
    left = left.filter((candidate) => candidate !== option);
    readParts(cursor, option, row);
  }
  if (cursor.fault === null) cursor.wanted.push(...left.map((candidate) => candidate[0]).filter(isPart));
}

/** Items with commas between; each is read as the part says and kept in order. */
function readList(cursor: Cursor, label: string, of: Part, row: StatementRow): void {
  const first = cursor.tokens[cursor.at];
  const items: Field[] = [];
  const own = "label" in of ? of.label : label;
  do {
    readPart(cursor, of, row);
    if (cursor.fault !== null) return;
    const item = cursor.fields.get(own);
    if (item !== undefined) items.push(item);
    cursor.fields.delete(own);
  } while (skipComma(cursor));
  if (first !== undefined) keep(cursor, label, { kind: "list", items, ...slice(cursor, first, cursor.at) });
}

function skipComma(cursor: Cursor): boolean {
  const token = cursor.tokens[cursor.at];
  if (token?.kind !== "operator" || token.text !== ",") return false;
  cursor.at++;
  return true;
}

function isPart(part: Part | undefined): part is Part {
  return part !== undefined;
}

/** Whether what stands at the cursor can be the beginning of these parts. Looks one word ahead, two for `NAME is`. */
function begins(cursor: Cursor, parts: readonly Part[]): boolean {
  const [first, second] = parts;
  if (first === undefined || !fits(cursor, first, cursor.at)) return false;
  if (first.part === "name" && second?.part === "keyword") return fits(cursor, second, cursor.at + 1);
  return true;
}

function fits(cursor: Cursor, part: Part, at: number): boolean {
  const token = cursor.tokens[at];
  if (token === undefined) return false;
  switch (part.part) {
    case "keyword":
      return token.kind === "word" && token.text === part.word;
    case "words":
      return part.phrase.split(" ").every((word, index) => cursor.tokens[at + index]?.text === word);
    case "string":
      return token.kind === "string";
    case "equation":
      return token.kind !== "string";
    case "integer":
      return token.kind === "word" && /^\d+$/.test(token.text);
    case "number":
      return beginsNumber(token);
    case "quantity":
      return beginsNumber(token) || (token.text === "from" && cursor.tokens[at + 1]?.kind === "string");
    case "optional":
      return begins(cursor, part.parts);
    case "either":
    case "any":
      return part.options.some((option) => begins(cursor, option));
    case "list":
      return fits(cursor, part.of, at);
    case "orders":
      return token.kind === "word" && token.text === "order";
    case "run reference":
      return token.kind === "word" || token.kind === "string";
    case "species":
      return token.kind === "word" && !/^[\d.,]+$/.test(token.text);
    default:
      return token.kind === "word";
  }
}

function beginsNumber(token: Token): boolean {
  return token.kind === "word" && /^\(?[\d.,+−-]/.test(token.text);
}

function readLeaf(cursor: Cursor, part: Part): void {
  const token = cursor.tokens[cursor.at] as Token;
  switch (part.part) {
    case "keyword":
      cursor.at++;
      return;
    case "words":
      cursor.at += part.phrase.split(" ").length;
      keep(cursor, part.label, { kind: "text", text: part.phrase, span: spanOf(cursor, token) });
      return;
    case "name":
      cursor.at++;
      readName(cursor, part.label, part.of, token);
      return;
    case "string":
      cursor.at++;
      if (token.open) cursor.fault = fault("string-open", {}, token, [closeQuote(token)]);
      keep(cursor, part.label, { kind: "text", text: token.text, span: token });
      return;
    case "date":
      cursor.at++;
      if (!isDate(token.text)) cursor.fault = dateFault(token);
      keep(cursor, part.label, { kind: "text", text: token.text, span: token });
      return;
    case "integer":
      cursor.at++;
      keep(cursor, part.label, { kind: "number", value: Number(token.text), text: token.text, span: token });
      return;
    case "number":
      cursor.at++;
      readPlainNumber(cursor, part.label, token, part);
      return;
    case "equation":
      cursor.at = cursor.tokens.length;
      keep(cursor, part.label, { kind: "text", ...slice(cursor, token, cursor.at) });
      return;
    case "unit":
      readUnitWords(cursor, part.label, token);
      return;
    case "quantity":
      if (token.text === "from" && cursor.tokens[cursor.at + 1]?.kind === "string") readFromHeader(cursor, part.label);
      else readQuantityWords(cursor, part, token);
      return;
    case "orders":
      readOrders(cursor, part.label);
      return;
    case "charge":
      cursor.at++;
      if (!/^\d*[+\-−]$/.test(token.text)) cursor.fault = chargeFault(cursor, part, token);
      keep(cursor, part.label, { kind: "text", text: token.text, span: token });
      return;
    case "run reference":
      cursor.at++;
      if (token.open) cursor.fault = fault("string-open", {}, token, [closeQuote(token)]);
      keep(cursor, part.label, { kind: "text", text: token.text, span: token });
      return;
    default:
      cursor.at++;
      keep(cursor, (part as { label: string }).label, { kind: "text", text: token.text, span: token });
  }
}

/** `from "header"` in place of a quantity. */
function readFromHeader(cursor: Cursor, label: string): void {
  const first = cursor.tokens[cursor.at] as Token;
  const header = cursor.tokens[cursor.at + 1] as Token;
  cursor.at += 2;
  if (header.open) cursor.fault = fault("string-open", {}, header, [closeQuote(header)]);
  keep(cursor, label, { kind: "header", header: header.text, ...slice(cursor, first, cursor.at) });
}

/** A charge written `+2` is one with its sign in front. */
function chargeFault(cursor: Cursor, part: Part, token: Token): Fault | null {
  wantedButFound(cursor, [part], null, token);
  const turned = /^([+\-−])(\d+)$/.exec(token.text);
  if (turned === null || cursor.fault === null) return cursor.fault;
  return { ...cursor.fault, mend: [replacement(token, `${turned[2]}${turned[1]}`)] };
}

/** `order 1 in A`, then more of them behind a comma, `, then` or `beside`. */
function readOrders(cursor: Cursor, label: string): void {
  const first = cursor.tokens[cursor.at] as Token;
  const items: OrderTerm[] = [];
  let joined: OrderTerm["joined"] | null = "first";
  while (joined !== null) {
    const before = cursor.fields.size;
    readParts(cursor, orderParts, fitRow);
    if (cursor.fault !== null) return;
    const order = cursor.fields.get("order");
    const species = cursor.fields.get("orderSpecies");
    cursor.fields.delete("order");
    cursor.fields.delete("orderSpecies");
    if (cursor.fields.size !== before || order === undefined || species === undefined) return;
    items.push({ joined, order: order.kind === "number" ? order.value : "free", species });
    joined = readJoin(cursor);
  }
  keep(cursor, label, { kind: "orders", items, ...slice(cursor, first, cursor.at) });
}

const orderParts: readonly Part[] = [
  { part: "keyword", word: "order" },
  {
    part: "either",
    options: [
      [{ part: "words", label: "order", phrase: "free" }],
      [{ part: "number", label: "order", what: "the order as a number" }],
    ],
  },
  { part: "keyword", word: "in" },
  { part: "species", label: "orderSpecies" },
];

/** Only its example is used, where the line ends too early. */
const fitRow = { example: "fit order 1 in H2O2" } as StatementRow;

function readJoin(cursor: Cursor): OrderTerm["joined"] | null {
  const token = cursor.tokens[cursor.at];
  if (token?.kind === "word" && token.text === "beside") {
    cursor.at++;
    return "beside";
  }
  if (!skipComma(cursor)) {
    cursor.wanted.push({ part: "keyword", word: "beside" });
    return null;
  }
  if (cursor.tokens[cursor.at]?.text !== "then") return "and";
  cursor.at++;
  return "then";
}

function readName(cursor: Cursor, label: string, what: string, token: Token): void {
  if (!isName(token.text)) {
    const bare = token.text.replace(/[:;.]+$/, "");
    const mend = isName(bare) ? [replacement(token, bare)] : [];
    cursor.fault = fault("name-malformed", { name: token.text, what }, token, mend);
  }
  keep(cursor, label, { kind: "text", text: token.text, span: token });
}

function readPlainNumber(cursor: Cursor, label: string, token: Token, part: Part): void {
  const number = readNumber(token.text);
  if (isFault(number)) {
    cursor.fault = shifted(number, token.start);
  } else if (number.end < token.text.length) {
    wantedButFound(cursor, [part], null, token);
  } else {
    if (number.u !== null) {
      const bare = token.text.replace(/\(.*\)/, "");
      const args = { text: token.text, number: bare };
      cursor.fault = fault("number-with-uncertainty", args, token, [replacement(token, bare)]);
    }
    keep(cursor, label, { kind: "number", value: number.value, text: token.text, span: token });
  }
}

function readUnitWords(cursor: Cursor, label: string, token: Token): void {
  const end = endOfWords(cursor.tokens, cursor.at);
  const written = slice(cursor, token, end);
  const reading = readUnit(written.text);
  cursor.at = end;
  if (isFault(reading)) cursor.fault = shifted(reading, token.start);
  else keep(cursor, label, { kind: "unit", unit: reading.unit, ...written });
}

function readQuantityWords(cursor: Cursor, part: Part & { part: "quantity" }, token: Token): void {
  const end = endOfWords(cursor.tokens, cursor.at);
  const written = slice(cursor, token, end);
  const reading = readQuantity(written.text, part.label);
  cursor.at = end;
  if (isFault(reading)) {
    cursor.fault = shifted(reading, token.start);
    return;
  }
  const wrong = checkQuantity(reading, written.text, part.kind);
  if (wrong !== null) cursor.fault = shifted(wrong, token.start);
  const unitSpan = reading.unit === null ? null : moved(reading.unit, token.start);
  const { quantity, basis } = reading;
  keep(cursor, part.label, { kind: "quantity", quantity, unitSpan, basis, ...written });
}

function wantedButFound(cursor: Cursor, parts: readonly Part[], row: StatementRow | null, found?: Token): void {
  const token = found ?? cursor.tokens[cursor.at];
  const all = found === undefined ? [...cursor.wanted, ...parts] : parts;
  cursor.wanted = [...all];
  const wanted = describeParts(all);
  if (token === undefined) {
    const last = cursor.tokens[cursor.tokens.length - 1] as Token;
    const example = row?.example ?? statementByHead.get(cursor.tokens[0]?.text ?? "")?.example ?? "";
    cursor.fault = fault("line-incomplete", { before: cursor.before, wanted, example }, last);
    return;
  }
  const mend = mendsOf(cursor, all, token);
  cursor.fault = fault("line-unexpected", { found: token.text, before: cursor.before, wanted }, token, mend);
}

/** A fixed word that is near; a text put in quotes where one is wanted; a name taken out of its quotes. */
function mendsOf(cursor: Cursor, wanted: readonly Part[], token: Token): Mend[] {
  if (token.kind === "word") {
    const phrases = firstWords(wanted);
    for (const count of [2, 1]) {
      const words = cursor.tokens.slice(cursor.at, cursor.at + count);
      const end = words[count - 1];
      if (words[0] !== token || end === undefined) continue;
      const said = words.map(({ text }) => text).join(" ");
      const [near] = nearest(
        said,
        phrases.filter((phrase) => phrase.split(" ").length === count),
      );
      if (near !== undefined) return [replacement({ start: token.start, end: end.end }, near)];
    }
  }
  const digits = numberWords.indexOf(token.text.toLowerCase());
  if (digits >= 0 && wanted.some(({ part }) => part === "number" || part === "integer"))
    return [replacement(token, String(digits))];
  const only = wanted.length === 1 ? wanted[0]?.part : undefined;
  if (only === "string" && token.kind === "word") {
    const last = cursor.tokens[cursor.tokens.length - 1] ?? token;
    const span = { start: token.start, end: last.end };
    return [replacement(span, `"${cursor.text.slice(span.start, span.end)}"`)];
  }
  const alone = token === cursor.tokens[cursor.tokens.length - 1];
  if (only === "name" && token.kind === "string" && alone && isName(token.text))
    return [replacement(token, token.text)];
  return [];
}

const numberWords = ["zero", "one", "two", "three", "four", "five", "six", "seven", "eight", "nine", "ten"];

/** Says of a word that is left over what could have stood in its place. */
export function fail(cursor: Cursor, next: Token, row: StatementRow): void {
  if (nearest(next.text, firstWords(cursor.wanted)).length > 0) wantedButFound(cursor, [], row, undefined);
}

function moved(span: Span, offset: number): Span {
  return { start: span.start + offset, end: span.end + offset };
}

function closeQuote(token: Token) {
  const end = token.start + 1 + token.text.trimEnd().length;
  return { text: `"${token.text.trimEnd()}"`, edits: [{ start: end, end: token.end, text: '"' }] };
}

function dateFault(token: Token): Fault {
  const mends = otherDates(token.text).map((date) => replacement(token, date));
  return fault("date-malformed", { found: token.text }, token, mends);
}
