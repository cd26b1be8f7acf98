import assert from "node:assert/strict";
import { prefixes } from "../../src/quantity/prefixes.js";
import { readUnit } from "../../src/quantity/readUnit.js";
import { faultOf, mended, valid, words } from "./faultOf.js";

const text = (written: string): string => valid(readUnit(written)).unit.text;

describe("readUnit", () => {
  it("reads the styles alike", () => {
    const alike = [
      "mol L^-1 s^-1",
      "mol·L⁻¹·s⁻¹",
      "mol⋅L−1⋅s−1",
      "mol L-1 s-1",
      "mol/(L s)",
      "mol*L^-1*s^-1",
      "mol.L-1.s-1",
      "mol/(l·s)",
      " mol\u00a0L⁻¹\u2009s⁻¹ ",
    ];
    for (const written of alike) assert.equal(text(written), "mol L^-1 s^-1", written);
  });

  it("takes the signs that stand for one letter", () => {
    assert.equal(text("µL"), "uL");
    assert.equal(text("μL"), "uL");
    assert.equal(text("uL"), "uL");
    for (const written of ["°C", "degC", "deg C", "° C", "ºC", "℃"]) assert.equal(text(written), "degC", written);
    for (const written of ["Ω", "\u2126", "ohm", "Ohm"]) assert.equal(text(written), "Ohm", written);
    assert.equal(text("mm Hg"), "mmHg");
    assert.equal(text("°"), "deg");
  });

  it("keeps what is written, in order, and merges what is the same", () => {
    assert.equal(text("dm3 mol-1 s-1"), "dm^3 mol^-1 s^-1");
    assert.equal(text("1/s"), "s^-1");
    assert.equal(text("m m"), "m^2");
    assert.equal(text("mL/mL"), "");
    assert.equal(text("g/kg"), "g kg^-1");
    assert.equal(text("L^0.5 mol^-0.5 s^-1"), "L^0.5 mol^-0.5 s^-1");
    assert.equal(text("(mol/L)^-1 s^-1"), "mol^-1 L s^-1");
    assert.equal(text("%"), "%");
    assert.equal(text("1"), "");
  });

  it("tells whole symbols from prefixed ones", () => {
    const dimensions: [string, string][] = [
      ["min", "time"],
      ["cd", "light"],
      ["Pa", "pressure"],
      ["mmol", "amount"],
      ["ft", "length"],
      ["h", "time"],
      ["d", "time"],
      ["M", "concentration"],
      ["mM", "concentration"],
      ["Mm", "length"],
      ["kcal", "energy"],
      ["T", "field"],
      ["t", "mass"],
    ];
    const at: Record<string, number[]> = {
      time: [0, 0, 1, 0, 0, 0, 0],
      light: [0, 0, 0, 0, 0, 0, 1],
      pressure: [-1, 1, -2, 0, 0, 0, 0],
      amount: [0, 0, 0, 0, 0, 1, 0],
      length: [1, 0, 0, 0, 0, 0, 0],
      concentration: [-3, 0, 0, 0, 0, 1, 0],
      energy: [2, 1, -2, 0, 0, 0, 0],
      field: [0, 1, -2, -1, 0, 0, 0],
      mass: [0, 1, 0, 0, 0, 0, 0],
    };
    for (const [written, kind] of dimensions)
      assert.deepEqual(valid(readUnit(written)).unit.dimension, at[kind], written);
  });

  it("takes every SI prefix on the metre (SI Brochure, table 7)", () => {
    for (const [prefix, power] of prefixes) {
      assert.equal(valid(readUnit(`${prefix}m`)).unit.factor, Number(`1e${power}`), prefix);
    }
  });

  const refused: [written: string, words: string, mend: string | null][] = [
    ["mol/L s", "mol/L s could be mol/(L s) or mol s/L; write the one you mean.", "mol/(L s)"],
    ["mol/L s^-1", "mol/L s^-1 could be mol s^-1/L or mol/(L s^-1); write the one you mean.", "mol s^-1/L"],
    ["J/mol/K", "J/mol/K could be J/(mol K) or J K/mol; write the one you mean.", "J/(mol K)"],
    ["1/mol s", "1/mol s could be 1/(mol s) or s/mol; write the one you mean.", "1/(mol s)"],
    [
      "kmin",
      "kmin is not a known unit: min takes no such prefix. Write min, with the number that belongs to it.",
      "min",
    ],
    ["mh", "mh is not a known unit: h takes no such prefix. Write h, with the number that belongs to it.", "h"],
    ["sec", "sec is not a known unit; write s.", "s"],
    ["hours", "hours is not a known unit; write h.", "h"],
    ["mol/sec", "sec is not a known unit; write s.", "mol/s"],
    ["cc", "cc is not a known unit; write mL.", "mL"],
    ["KPa", "KPa is not a known unit; write kPa.", "kPa"],
    ["celsius", "celsius is not a known unit; write °C.", "°C"],
    ["frobs", "frobs is not a known unit; units go by their symbols, such as mL, mol/L or s^-1.", null],
    ["mol/(L s", "This bracket is not closed; write the unit as in mol/(L s).", "mol/(L s)"],
    ["", "A unit is expected here, such as mL or mol/L.", null],
    ["mol/", "A unit is expected here, such as mL or mol/L.", null],
    ["mL?", "A unit cannot hold “?”; units are written as mol L^-1 s^-1 or mol/(L s).", null],
    ["m^99", "A unit cannot hold “m^99”; units are written as mol L^-1 s^-1 or mol/(L s).", null],
  ];
  for (const [written, message, mend] of refused) {
    it(`refuses “${written}” in words`, () => {
      const found = faultOf(readUnit(written));
      assert.equal(words(found), message);
      if (mend === null) assert.equal(found.mend, undefined);
      else {
        assert.equal(mended(written, found), mend);
        valid(readUnit(mend));
      }
    });
  }
});
