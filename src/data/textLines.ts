/** One line of a text; offsets in UTF-16 units. */
export interface TextLine {
  /** from 1, as an editor counts: LF, CRLF and a lone CR each end a line */
  readonly number: number;
  readonly start: number;
  /** the line end, exclusive of it */
  readonly end: number;
  /** where the next line starts */
  readonly next: number;
}

/** The lines of `text` from `start`, which is where line `number` begins. A line end at the very end begins no line. */
export function* linesFrom(text: string, start: number, number: number): Generator<TextLine> {
  const nowhere = text.length;
  let feed = -1;
  let carriage = -1;
  for (let at = start, line = number; at < nowhere; line++) {
    // each of the two is searched again only when passed, so that a file without one of them is not searched for every line
    if (feed < at) feed = found(text.indexOf("\n", at), nowhere);
    if (carriage < at) carriage = found(text.indexOf("\r", at), nowhere);
    const end = Math.min(feed, carriage);
    const next = end === nowhere ? nowhere : carriage + 1 === feed ? feed + 1 : end + 1;
    yield { number: line, start: at, end, next };
    at = next;
  }
}

function found(index: number, otherwise: number): number {
  return index < 0 ? otherwise : index;
}

/** The line, from 1, on which the character at `offset` stands. */
export function lineOf(text: string, offset: number): number {
  let last = 1;
  for (const line of linesFrom(text, 0, 1)) {
    if (line.start > offset) break;
    last = line.number;
  }
  return last;
}
