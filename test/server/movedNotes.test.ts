import assert from "node:assert/strict";
import fc from "fast-check";
import type { Diagnostic } from "../../src/contract/findings.js";
import { lineIndex, placeOf } from "../../src/language/lineIndex.js";
import { movedNotes } from "../../src/server/movedNotes.js";

function noteAt(text: string, start: number, end: number): Diagnostic {
  const place = placeOf(lineIndex(text), { start, end });
  const mends = [{ title: "mend", edits: [{ ...place, text: "x" }] }];
  return { ...place, code: "data-missing", severity: "error", message: "m", item: null, mends };
}

/** The words a note stands on. */
function wordsOf(text: string, note: Diagnostic): string {
  const { starts } = lineIndex(text);
  const start = (starts[note.line - 1] ?? 0) + note.column - 1;
  return text.slice(start, (starts[note.endLine - 1] ?? 0) + note.endColumn - 1);
}

describe("notes of an earlier text", () => {
  const text = "one\ntwo three\nfour\n";

  it("stay before a change and move behind it, their mends with them", () => {
    const note = noteAt(text, 8, 13);
    const [after] = movedNotes([note], text, `zero\n${text}`);
    assert.deepEqual([after?.line, after?.column, after?.mends[0]?.edits[0]?.line], [3, 5, 3]);
    assert.deepEqual(movedNotes([note], text, `${text}five`), [note]);
  });

  it("go when the change touches their words", () => {
    assert.deepEqual(movedNotes([noteAt(text, 8, 13)], text, text.replace("three", "thr33")), []);
  });

  it("lose a mend that would edit what changed, not themselves", () => {
    const note = noteAt(text, 8, 13);
    const elsewhere = placeOf(lineIndex(text), { start: 0, end: 3 });
    const far = { ...note, mends: [{ title: "mend", edits: [{ ...elsewhere, text: "x" }] }] };
    assert.deepEqual(movedNotes([far], text, text.replace("one", "0"))[0]?.mends, []);
  });

  it("stand on the same words after any edit, or are gone", () => {
    const letters = fc.string({ unit: fc.constantFrom("a", "b", "µ", "𝒌", "\n", "\r\n", " "), maxLength: 30 });
    fc.assert(
      fc.property(letters, letters, letters, letters, fc.nat(), fc.nat(), (head, gone, come, tail, a, b) => {
        const before = head + gone + tail;
        const now = head + come + tail;
        const [start, end] = [a % (before.length + 1), b % (before.length + 1)].sort((x, y) => x - y) as [
          number,
          number,
        ];
        const note = noteAt(before, start, end);
        for (const moved of movedNotes([note], before, now)) assert.equal(wordsOf(now, moved), wordsOf(before, note));
        const outside = end <= head.length || start >= head.length + gone.length;
        if (outside) assert.equal(movedNotes([note], before, now).length, 1);
      }),
      { seed: 7, numRuns: 500 },
    );
  });
});
