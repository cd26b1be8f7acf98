/**
 * Bytes 0x80 to 0x9F of Windows-1252 as the Encoding Standard (index windows-1252) has them; all others stand for
 * themselves. The five bytes without a meaning become the controls of the same number, which no text has.
 */
const upper =
  "\u20ac\u0081\u201a\u0192\u201e\u2026\u2020\u2021\u02c6\u2030\u0160\u2039\u0152\u008d\u017d\u008f" +
  "\u0090\u2018\u2019\u201c\u201d\u2022\u2013\u2014\u02dc\u2122\u0161\u203a\u0153\u009d\u017e\u0178";

/**
 * Windows-1252 to text. Own code: some Node versions decode this label as ISO 8859-1 and lose exactly these bytes.
 */
export function fromWindows1252(bytes: Uint8Array): string {
  const pieces: string[] = [];
  const units = new Uint16Array(8192);
  for (let start = 0; start < bytes.length; start += units.length) {
    const piece = bytes.subarray(start, start + units.length);
    for (let at = 0; at < piece.length; at++) {
      const byte = piece[at]!;
      units[at] = byte >= 0x80 && byte < 0xa0 ? upper.charCodeAt(byte - 0x80) : byte;
    }
    pieces.push(String.fromCharCode(...units.subarray(0, piece.length)));
  }
  return pieces.join("");
}
