import { type DataRefusal, refused } from "./dataOptions.js";
import { fromWindows1252 } from "./windows1252.js";

/** The text of a file, without its byte order mark. */
export interface DecodedText {
  readonly kind: "text";
  readonly text: string;
  /** where the text begins in the bytes when they are UTF-8; null when they had to be put into another encoding */
  readonly utf8Start: number | null;
}

/**
 * Bytes to text. A byte order mark decides (UTF-8, UTF-16 of either order); then the encoding stated; then UTF-8 where
 * the bytes are valid UTF-8; then Windows-1252, the usual encoding of instruments that know no other. Refuses an
 * unknown encoding, bytes the stated encoding does not have, and what is no text in the end (see `notTextAt`).
 */
export function decodeText(bytes: Uint8Array, encoding: string | undefined): DecodedText | DataRefusal {
  const marked = markOf(bytes);
  const label = marked?.encoding ?? encoding;
  const start = marked?.length ?? 0;
  if (label === undefined) return decodedUnmarked(bytes);
  if (isWindows1252(label)) return { kind: "text", text: fromWindows1252(bytes), utf8Start: null };
  const decoder = decoderOf(label);
  if (decoder === null) return refused("data-encoding-unknown", { encoding: label });
  const text = decoded(decoder, bytes.subarray(start));
  if (text === null) return refused("data-encoding-wrong", { encoding: label });
  return { kind: "text", text, utf8Start: decoder.encoding === "utf-8" ? start : null };
}

function decodedUnmarked(bytes: Uint8Array): DecodedText {
  const text = decoded(new TextDecoder("utf-8", strict), bytes);
  if (text !== null) return { kind: "text", text, utf8Start: 0 };
  return { kind: "text", text: fromWindows1252(bytes), utf8Start: null };
}

const strict = { fatal: true, ignoreBOM: true };

function markOf(bytes: Uint8Array): { encoding: string; length: number } | null {
  const [a, b, c] = bytes;
  if (a === 0xef && b === 0xbb && c === 0xbf) return { encoding: "utf-8", length: 3 };
  if (a === 0xff && b === 0xfe) return { encoding: "utf-16le", length: 2 };
  if (a === 0xfe && b === 0xff) return { encoding: "utf-16be", length: 2 };
  return null;
}

function isWindows1252(label: string): boolean {
  return /^(windows-1252|cp-?1252|latin-?1|iso-8859-1|ansi)$/i.test(label.trim());
}

function decoderOf(label: string): TextDecoder | null {
  try {
    return new TextDecoder(label, strict);
  } catch {
    return null;
  }
}

function decoded(decoder: TextDecoder, bytes: Uint8Array): string | null {
  try {
    return decoder.decode(bytes);
  } catch {
    return null;
  }
}

/** The text without the end mark U+001A that old systems put after it. */
export function withoutEndMark(text: string): string {
  const last = text.trimEnd();
  return last.charCodeAt(last.length - 1) === 0x1a ? last.slice(0, -1) : text;
}

/**
 * The first character of `text` between `start` and `end` that no text of readings has, or −1: NUL and the other
 * controls except tab, line ends, vertical tab, form feed and escape.
 */
export function notTextAt(text: string, start: number, end: number): number {
  for (let at = start; at < end; at++) {
    const unit = text.charCodeAt(at);
    if (unit < 0x20 && !(unit >= 0x09 && unit <= 0x0d) && unit !== 0x1b) return at;
    if (unit >= 0x7f && unit < 0xa0 && unit !== 0x85) return at;
  }
  return -1;
}
