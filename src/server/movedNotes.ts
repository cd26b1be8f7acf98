import type { Diagnostic, Place } from "../contract/findings.js";
import { type LineIndex, lineIndex, placeOf } from "../language/lineIndex.js";

/**
 * What was found in an earlier text, as far as it still stands in the present one: a note whose own words lie before or
 * behind everything that changed keeps its words and moves with them; one that the change touches is dropped, and so
 * is a mend that would edit there.
 */
export function movedNotes(notes: readonly Diagnostic[], before: string, now: string): readonly Diagnostic[] {
  if (before === now || notes.length === 0) return notes;
  const same = sharedEnds(before, now);
  const from = lineIndex(before);
  const to = lineIndex(now);
  const move = <T extends Place>(thing: T): T | null => {
    const start = offsetOf(from, thing.line, thing.column);
    const end = offsetOf(from, thing.endLine, thing.endColumn);
    if (end <= same.head) return thing;
    if (start < before.length - same.tail) return null;
    const shift = now.length - before.length;
    return { ...thing, ...placeOf(to, { start: start + shift, end: end + shift }) };
  };
  return notes.flatMap((note): Diagnostic[] => {
    const moved = move(note);
    if (moved === null) return [];
    const mends = note.mends.flatMap(({ title, edits }) => {
      const kept = edits.flatMap((edit) => move(edit) ?? []);
      return kept.length === edits.length ? [{ title, edits: kept }] : [];
    });
    return [{ ...moved, mends }];
  });
}

/** Lengths of what two texts have in common at their beginning and at their end, without overlap. */
function sharedEnds(before: string, now: string): { head: number; tail: number } {
  const most = Math.min(before.length, now.length);
  let head = 0;
  while (head < most && before.charCodeAt(head) === now.charCodeAt(head)) head++;
  let tail = 0;
  while (tail < most - head && before.charCodeAt(before.length - 1 - tail) === now.charCodeAt(now.length - 1 - tail)) {
    tail++;
  }
  return { head, tail };
}

/** Line and column count from 1. */
function offsetOf(index: LineIndex, line: number, column: number): number {
  return Math.min((index.starts[line - 1] ?? index.length) + column - 1, index.length);
}
