import assert from "node:assert/strict";
import { readNumber } from "../../src/quantity/readNumber.js";
import { isFault } from "../../src/quantity/shifted.js";
import { faultOf, words } from "./faultOf.js";

describe("readNumber", () => {
  // Concise notation: JCGM 100:2008, 7.2.2 (100.021 47(35) g: digits in brackets count in the last places).
  const written: [text: string, value: number, u: number | null][] = [
    ["0.100(2)", 0.1, 0.002],
    ["100.02147(35)", 100.02147, 0.00035],
    ["25.0(1)", 25, 0.1],
    ["25(1.5)", 25, 1.5],
    ["12.5e-3", 0.0125, null],
    ["12.5×10^-3", 0.0125, null],
    ["12.5×10⁻³", 0.0125, null],
    ["12.5 × 10^-3", 0.0125, null],
    ["12.5x10^(-3)", 0.0125, null],
    ["1.0(1)e-3", 1e-3, 1e-4],
    ["1.0(1)×10⁻³", 1e-3, 1e-4],
    ["10^-3", 1e-3, null],
    ["-98.2", -98.2, null],
    ["−98.2", -98.2, null],
    ["+5", 5, null],
    [".5", 0.5, null],
    ["10\u2009000", 10000, null],
    ["  7", 7, null],
    ["0", 0, null],
    ["-0", 0, null],
  ];
  for (const [text, value, u] of written) {
    it(`reads ${text}`, () => {
      assert.deepEqual(readNumber(text), { value, u, end: text.length });
    });
  }

  it("takes the longest number and says where it ends", () => {
    for (const [text, end] of [
      ["50.00 mL", 5],
      ["5 ± 1", 1],
      ["1eV", 1],
      ["3. Then", 1],
      ["2 s^-1", 1],
      ["1.5×2", 3],
    ] as const) {
      const read = readNumber(text);
      assert.ok(!isFault(read));
      assert.equal(read.end, end, text);
    }
  });

  it("never shows a negative zero", () => {
    const read = readNumber("-0.0");
    assert.ok(!isFault(read) && Object.is(read.value, 0));
  });

  it("offers the point for a comma between digits", () => {
    const found = faultOf(readNumber("0,100 mol/L"));
    assert.equal(
      words(found),
      "A comma between digits has no sure meaning: write 0.100 for 0,100; decimals take a point, thousands no mark.",
    );
    assert.deepEqual(found.span, { start: 0, end: 5 });
    assert.deepEqual(
      found.mend?.map(({ text }) => text),
      ["0.100"],
    );
  });

  it("offers both readings where the comma could mark thousands", () => {
    assert.deepEqual(
      faultOf(readNumber("1,000")).mend?.map(({ text }) => text),
      ["1.000", "1000"],
    );
    assert.deepEqual(
      faultOf(readNumber("1,000,000")).mend?.map(({ text }) => text),
      ["1000000"],
    );
    assert.deepEqual(
      faultOf(readNumber("1,000.5")).mend?.map(({ text }) => text),
      ["1000.5"],
    );
  });

  it("leaves a comma before a space alone: it separates a list", () => {
    assert.deepEqual(readNumber("10, 20"), { value: 10, u: null, end: 2 });
  });

  it("refuses what is no number and what is out of range", () => {
    for (const text of ["", "abc", "-", "(2)", "NaN", "Infinity", "e5"]) {
      assert.equal(faultOf(readNumber(text)).code, "number-expected", text);
    }
    for (const text of ["1e999", "-1e400", "1e-400", "1(1)e-320"]) {
      assert.equal(faultOf(readNumber(text)).code, "number-range", text);
    }
    assert.deepEqual(readNumber("0e-400"), { value: 0, u: null, end: 6 });
  });
});
