import assert from "node:assert/strict";
import { headerCellOf, headerCells } from "../../src/data/headerCells.js";
import { readColumns } from "../../src/data/readColumns.js";

const cellsOf = (text: string, options = {}) => headerCells(new TextEncoder().encode(text), options);

/** Header, unit and the words at the place that was found. */
function shown(text: string): string[] {
  const lines = text.split(/\r\n|\n|\r/);
  return (cellsOf(text) ?? []).map(({ header, unit, line, span }) => {
    const there = span === null ? "nowhere" : (lines[line - 1] ?? "").slice(span.start, span.end);
    return `${header} | ${unit?.text ?? "-"} | ${line} | ${there}`;
  });
}

describe("the header cells of a data file", () => {
  it("stand where the file has them, whatever separates them", () => {
    assert.deepEqual(shown("t / s,V / mL\n0,1\n1,2\n"), ["t / s | s | 1 | t / s", "V / mL | mL | 1 | V / mL"]);
    assert.deepEqual(shown('"t / s";"µ₂ 𝒌 (mL)"\r\n0;1\r\n1;2\r\n'), [
      "t / s | s | 1 | t / s",
      "µ₂ 𝒌 (mL) | mL | 1 | µ₂ 𝒌 (mL)",
    ]);
    assert.deepEqual(shown("instrument 7\nt / s\ts\n0\t1\n1\t2\n"), ["t / s | s | 2 | t / s", "s | - | 2 | s"]);
  });

  it("take their unit from the row of units below", () => {
    assert.deepEqual(shown("t,V\ns,mL\n0,1\n1,2\n"), ["t | s | 1 | t", "V | mL | 1 | V"]);
  });

  it("are those that reading the file finds, from its first lines alone", () => {
    const long = `t / s,c / mol L^-1\n${Array.from({ length: 40_000 }, (_, row) => `${row},0.1`).join("\n")}\n`;
    const bytes = new TextEncoder().encode(long);
    const read = readColumns(bytes);
    assert.ok(read.kind === "columns");
    assert.deepEqual(
      headerCells(bytes)?.map(({ header }) => header),
      read.columns.columns.map(({ header }) => header),
    );
  });

  it("are nowhere where a cell is written otherwise than it reads, and none where there is no header", () => {
    assert.deepEqual(shown('"a ""b""",c\n0,1\n1,2\n'), ['a "b" | - | 1 | nowhere', "c | - | 1 | nowhere"]);
    assert.equal(cellsOf("0,1\n1,2\n"), null);
    assert.equal(cellsOf(""), null);
    assert.equal(headerCells(new Uint8Array([0, 1, 2, 0, 0, 5])), null);
  });

  it("are found by number, by their words, and by their words with blanks and case apart", () => {
    const cells = cellsOf("t / s,V / mL\n0,1\n1,2\n") ?? [];
    assert.equal(headerCellOf(cells, { number: 2 })?.header, "V / mL");
    assert.equal(headerCellOf(cells, { header: "v /  ML" })?.header, "V / mL");
    assert.equal(headerCellOf(cells, { header: "p" }), null);
    assert.equal(headerCellOf(cells, { number: 3 }), null);
  });
});
