/** Greatest length of a line of running text, characters. */
const width = 110;

/** A text in lines of at most 110 characters, broken between words; the first begins with `lead`, the others below its end. */
export function wrappedText(text: string, lead: string): string[] {
  const lines: string[] = [];
  let line = lead;
  let empty = true;
  for (const word of text.split(/\s+/)) {
    if (!empty && line.length + 1 + word.length > width) {
      lines.push(line);
      line = " ".repeat(lead.length);
      empty = true;
    }
    line += empty ? word : ` ${word}`;
    empty = false;
  }
  return [...lines, line];
}
