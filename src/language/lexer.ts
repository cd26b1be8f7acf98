/**
 * Outer tokens of one line. There are no keyword, number or unit tokens: what a word means comes from its place, so
 * a column may be called `min` or `K`.
 */
export interface Token {
  readonly kind: "word" | "string" | "operator" | "comment";
  /** as written; of a string what stands between its quotes */
  readonly text: string;
  /** UTF-16 units from the start of the line; of a string with its quotes */
  readonly start: number;
  readonly end: number;
  /** a string whose closing quote is missing */
  readonly open: boolean;
}

const operators = ["<=>", "->", "⇌", "→", "±"];

/** Splits a line (without its line break) into tokens. Never fails. */
export function lexLine(line: string): Token[] {
  const tokens: Token[] = [];
  let at = 0;
  while (at < line.length) {
    const code = line.charCodeAt(at);
    if (isSpace(code)) {
      at++;
    } else if (code === hash) {
      tokens.push({ kind: "comment", text: line.slice(at), start: at, end: line.length, open: false });
      at = line.length;
    } else if (isQuote(code)) {
      const token = lexString(line, at);
      tokens.push(token);
      at = token.end;
    } else {
      const end = operatorEnd(line, at);
      if (end > at) {
        tokens.push({ kind: "operator", text: line.slice(at, end), start: at, end, open: false });
        at = end;
      } else {
        const stop = wordEnd(line, at);
        tokens.push({ kind: "word", text: line.slice(at, stop), start: at, end: stop, open: false });
        at = stop;
      }
    }
  }
  return tokens;
}

function lexString(line: string, start: number): Token {
  let end = start + 1;
  while (end < line.length && !isQuote(line.charCodeAt(end))) end++;
  const open = end >= line.length;
  const text = line.slice(start + 1, end);
  return { kind: "string", text, start, end: open ? end : end + 1, open };
}

function wordEnd(line: string, start: number): number {
  let at = start + 1;
  while (at < line.length) {
    const code = line.charCodeAt(at);
    if (isSpace(code) || isQuote(code) || code === hash || operatorEnd(line, at) > at) return at;
    at++;
  }
  return at;
}

/** Where the operator that begins at `at` ends; `at` itself where none begins. */
function operatorEnd(line: string, at: number): number {
  const code = line.charCodeAt(at);
  if (code === comma) return isDecimalComma(line, at) ? at : at + 1;
  if (code !== less && code !== minus && code < 0x80) return at;
  if (code > 0x7f && code !== plusMinus && code < 0x2000) return at;
  const found = operators.find((operator) => line.startsWith(operator, at));
  return found === undefined ? at : at + found.length;
}

/** A comma between two digits is not a separator of a list: it is taken for a decimal comma, and said so later. */
function isDecimalComma(line: string, at: number): boolean {
  return at > 0 && isDigit(line.charCodeAt(at - 1)) && isDigit(line.charCodeAt(at + 1));
}

const hash = 0x23;
const comma = 0x2c;
const minus = 0x2d;
const less = 0x3c;
const plusMinus = 0xb1;

function isDigit(code: number): boolean {
  return code >= 0x30 && code <= 0x39;
}

/** Space, tab, no-break space, the thin and wide spaces of U+2000 to U+200A, narrow no-break space, byte order mark. */
export function isSpace(code: number): boolean {
  if (code === 0x20 || code === 0x09) return true;
  if (code < 0xa0) return code === 0x0d || code === 0x0b || code === 0x0c;
  return code === 0xa0 || (code >= 0x2000 && code <= 0x200a) || code === 0x202f || code === 0x3000 || code === 0xfeff;
}

/** The straight double quote and the typographic ones word processors put in its place. */
function isQuote(code: number): boolean {
  return code === 0x22 || code === 0x201c || code === 0x201d || code === 0x201e;
}
