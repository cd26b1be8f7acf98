import type { Position, Range } from "vscode-languageserver";
import type { Place } from "../contract/findings.js";

/** A place of the findings (from 1) as the protocol's range (from 0); both count columns in UTF-16 units. */
export function rangeOf(place: Place): Range {
  return {
    start: { line: place.line - 1, character: place.column - 1 },
    end: { line: place.endLine - 1, character: place.endColumn - 1 },
  };
}

/** Whether two ranges have a position in common; ranges that only touch have. */
export function touches(a: Range, b: Range): boolean {
  return !isBefore(a.end, b.start) && !isBefore(b.end, a.start);
}

function isBefore(a: Position, b: Position): boolean {
  return a.line < b.line || (a.line === b.line && a.character < b.character);
}
