import assert from "node:assert/strict";
import { combined } from "../../src/quantity/quantity.js";
import { readQuantity } from "../../src/quantity/readQuantity.js";
import { faultOf, mended, valid, words } from "./faultOf.js";

describe("readQuantity", () => {
  // A tolerance ±a counts as u = a/√3: JCGM 100:2008, 4.3.7.
  const rows: [text: string, value: number, u: number | null, unit: string][] = [
    ["50.00 mL within 0.05 mL", 5e-5, 5e-8 / Math.sqrt(3), "mL"],
    ["50.00 mL within 0.00005 L", 5e-5, 5e-8 / Math.sqrt(3), "mL"],
    ["50.00 mL within 1 %", 5e-5, 5e-7 / Math.sqrt(3), "mL"],
    ["25.0(1) °C", 298.15, 0.1, "degC"],
    ["0.100(2) mol/L", 100, 2, "mol L^-1"],
    ["0.0500 +/- 0.0005 mol/L", 50, 0.5, "mol L^-1"],
    ["0.0500 ± 0.0005 mol/L", 50, 0.5, "mol L^-1"],
    ["(0.0500 ± 0.0005) mol/L", 50, 0.5, "mol L^-1"],
    ["(25.0 ± 0.1) °C", 298.15, 0.1, "degC"],
    ["0.0500 mol/L ± 0.5 mmol/L", 50, 0.5, "mol L^-1"],
    ["0.100 mol/L ± 2 %", 100, 2, "mol L^-1"],
    ["0.100 mol/L +/- 2%", 100, 2, "mol L^-1"],
    ["98.0 % ± 0.5 %", 0.98, 0.005, "%"],
    ["(98.0 ± 0.5) %", 0.98, 0.005, "%"],
    ["500 ± 5 ppm", 5e-4, 5e-6, "ppm"],
    ["4.2 within 5 %", 4.2, 0.21 / Math.sqrt(3), ""],
    ["-98.2(5) kJ/mol", -98200, 500, "kJ mol^-1"],
    ["-98.2 kJ/mol ± 1 %", -98200, 982, "kJ mol^-1"],
    ["1.0(1)e-3 s^-1", 1e-3, 1e-4, "s^-1"],
    ["12.5×10⁻³ mol·L⁻¹", 12.5, null, "mol L^-1"],
    ["1 min 30 s", 90, null, "s"],
    ["1 min 30(1) s", 90, 1, "s"],
    ["2 h 5 min", 7500, null, "s"],
    ["1 d 2 h", 93600, null, "s"],
    ["00:01:30", 90, null, "s"],
    ["01:00:00.5", 3600.5, null, "s"],
    ["00:01:30 ± 2 s", 90, 2, "s"],
    ["1 min", 60, null, "min"],
    ["0 s", 0, null, "s"],
    ["7.4", 7.4, null, ""],
    ["4.76(2)", 4.76, 0.02, ""],
    ["4.76 ± 0.02", 4.76, 0.02, ""],
    ["25°C", 298.15, null, "degC"],
    ["50mL", 5e-5, null, "mL"],
    ["1.84e4 L/(mol cm)", 1840, null, "L mol^-1 cm^-1"],
    ["100.8(1) kPa", 100800, 100, "kPa"],
  ];
  for (const [text, value, u, unit] of rows) {
    it(`reads ${text}`, () => {
      const { quantity } = valid(readQuantity(text, "given"));
      const close = (a: number, b: number): boolean => Math.abs(a - b) <= 1e-15 * Math.abs(b);
      assert.ok(close(quantity.value, value), `${quantity.value}`);
      const found = combined(quantity.sources);
      assert.ok(u === null ? found === null : found !== null && close(found, u), `${found}`);
      assert.equal(quantity.unit.text, unit);
      for (const source of quantity.sources) assert.deepEqual([source.name, source.kind], ["given", "common"]);
    });
  }

  it("keeps a stated uncertainty and a tolerance apart", () => {
    const { quantity } = valid(readQuantity("50.00(2) mL within 0.05 mL"));
    assert.equal(quantity.sources.length, 2);
  });

  it("says where number and unit stand, in UTF-16 units", () => {
    const read = valid(readQuantity(" 0.0500 ± 0.0005 µmol/L"));
    assert.deepEqual(read.number, { start: 1, end: 7 });
    assert.deepEqual(read.unit, { start: 17, end: 23 });
    assert.equal(valid(readQuantity("5")).unit, null);
    assert.deepEqual(valid(readQuantity("25.0(1) °C")).unit, { start: 8, end: 10 });
  });

  it("says what a per cent is a share of", () => {
    const share = valid(readQuantity("30 ± 1 % by mass"));
    assert.equal(share.basis, "mass");
    assert.equal(share.quantity.value, 0.3);
    assert.equal(combined(share.quantity.sources), 0.01);
    assert.deepEqual(share.unit, { start: 7, end: 8 });
    assert.equal(valid(readQuantity("30 %by volume")).basis, "volume");
    const later = valid(readQuantity("30 % by mass ± 1 %"));
    assert.equal(later.basis, "mass");
    assert.equal(combined(later.quantity.sources), 0.01);
    const ppm = valid(readQuantity("500 ppm by volume ± 2 %"));
    assert.equal(ppm.basis, "volume");
    assert.equal(combined(ppm.quantity.sources), 1e-5);
    assert.equal(valid(readQuantity("30 percent by mass".replace("percent", "‰"))).basis, "mass");
    assert.equal(valid(readQuantity("30 % by mass")).basis, "mass");
    assert.equal(valid(readQuantity("30 % by volume")).basis, "volume");
    assert.equal(valid(readQuantity("500 ppm by amount")).basis, "amount");
    assert.equal(valid(readQuantity("30 %")).basis, null);
  });

  const refused: [text: string, words: string, span: [number, number], mend: string | null][] = [
    ["", "A number is expected here, such as 0.100 or 1.2e-3.", [0, 0], null],
    ["fast", "A number is expected here, such as 0.100 or 1.2e-3; “fast” is not one.", [0, 4], null],
    [
      "0.100 ± mol/L",
      "After ± a number that is not negative is expected, as in 0.100 ± 0.002 mol/L or 0.100 mol/L ± 2 %.",
      [7, 8],
      null,
    ],
    [
      "0.1 ± -2 s",
      "After ± a number that is not negative is expected, as in 0.100 ± 0.002 mol/L or 0.100 mol/L ± 2 %.",
      [6, 8],
      null,
    ],
    ["0.1(2) ± 3 s", "The uncertainty is stated twice; keep one of the two.", [0, 10], null],
    ["0.1(2) s ± 3 s", "The uncertainty is stated twice; keep one of the two.", [0, 14], null],
    // share-basis
    [
      "30 % by weight",
      "What a share is of is written by mass, by amount or by volume; “by weight” is not one of them.",
      [5, 14],
      "30 % by mass",
    ],
    [
      "30 % w/w",
      "What a share is of is written by mass, by amount or by volume; “w/w” is not one of them.",
      [5, 8],
      "30 % by mass",
    ],
    [
      "30% (v/v)",
      "What a share is of is written by mass, by amount or by volume; “(v/v)” is not one of them.",
      [4, 9],
      "30% by volume",
    ],
    [
      "30 % of mass",
      "What a share is of is written by mass, by amount or by volume; “of mass” is not one of them.",
      [5, 12],
      "30 % by mass",
    ],
    [
      "500 ppm by moles",
      "What a share is of is written by mass, by amount or by volume; “by moles” is not one of them.",
      [8, 16],
      "500 ppm by amount",
    ],
    [
      "30 % by",
      "What a share is of is written by mass, by amount or by volume; “by” is not one of them.",
      [5, 7],
      "30 % by mass",
    ],
    // share-basis-alone
    ["30 mL by mass", "by mass stands behind a share, as in 30 % by mass; mL is a unit of volume.", [6, 13], "30 mL"],
    [
      "30 by volume ± 1 %",
      "by volume stands behind a share, as in 30 % by volume; a bare number is none.",
      [3, 12],
      "30 % by volume ± 1 %",
    ],
    // uncertainty-of-what
    [
      "98.0 ± 0.5 %",
      "98.0 ± 0.5 % could be (98.0 ± 0.5) % or 98.0 ± 0.49; write the one you mean.",
      [0, 12],
      "(98.0 ± 0.5) %",
    ],
    [
      "4.2 +/- 5%",
      "4.2 +/- 5% could be (4.2 +/- 5) % or 4.2 +/- 0.21; write the one you mean.",
      [0, 10],
      "(4.2 +/- 5) %",
    ],
    [
      "50 mL within 0.05",
      "within 0.05 needs its unit, as in 50.00 mL within 0.05 mL.",
      [13, 17],
      "50 mL within 0.05 mL",
    ],
    [
      "50 mL within 0.05 s",
      "The uncertainty is in s, the value in mL; give both in the same kind of unit, or the uncertainty in %.",
      [18, 19],
      "50 mL within 0.05 mL",
    ],
    [
      "30 s 1 min",
      "30 s 1 min is not a time; write it as 1 min 30 s or as 00:01:30, minutes and seconds under 60.",
      [0, 10],
      null,
    ],
    [
      "00:61:30",
      "00:61:30 is not a time; write it as 1 min 30 s or as 00:01:30, minutes and seconds under 60.",
      [0, 8],
      null,
    ],
    ["1:30", "1:30 is not a time; write it as 1 min 30 s or as 00:01:30, minutes and seconds under 60.", [0, 4], null],
    [
      "0,05 mol/L",
      "A comma between digits has no sure meaning: write 0.05 for 0,05; decimals take a point, thousands no mark.",
      [0, 4],
      "0.05 mol/L",
    ],
    ["5 s foo", "foo is not a known unit; units go by their symbols, such as mL, mol/L or s^-1.", [4, 7], null],
    ["50 mol/L s", "mol/L s could be mol/(L s) or mol s/L; write the one you mean.", [3, 10], "50 mol/(L s)"],
    [
      "1e999 s",
      "1e999 is beyond the numbers that can be computed with, about 1e-300 to 1e300; correct it, or choose another unit.",
      [0, 5],
      null,
    ],
  ];
  for (const [text, message, [start, end], mend] of refused) {
    it(`refuses “${text}” in words`, () => {
      const found = faultOf(readQuantity(text));
      assert.equal(words(found), message);
      assert.deepEqual(found.span, { start, end });
      if (mend === null) assert.equal(found.mend, undefined);
      else {
        assert.equal(mended(text, found), mend);
        valid(readQuantity(mend));
      }
    });
  }
});
