import assert from "node:assert/strict";
import { fromSI, intervalToSI, toSI } from "../../src/quantity/conversion.js";
import { readUnit } from "../../src/quantity/readUnit.js";
import { faultOf, valid } from "./faultOf.js";

/**
 * SI units in one unit. Source: UCUM (ucum-essence.xml) and NIST Special Publication 811 (2008), appendix B; Torr,
 * psi and eV from CODATA and the definitions as scipy prints them; rows marked "memory" are from memory.
 */
const factors: readonly (readonly [unit: string, factor: number, relative: number])[] = [
  ["atm", 101325, 0],
  ["bar", 1e5, 0],
  ["Torr", 133.322368421053, 1e-14],
  ["mmHg", 133.322387415, 0], // memory: 13.5951 × 9.80665 exactly
  ["inHg", 3386.388640341, 1e-15],
  ["psi", 6894.75729316836, 1e-14],
  ["kgf/cm2", 98066.5, 0],
  ["cal", 4.184, 0],
  ["cal_th", 4.184, 0],
  ["cal_IT", 4.1868, 0],
  ["cal_15", 4.1858, 0],
  ["eV", 1.602176634e-19, 0],
  ["erg", 1e-7, 0],
  ["L atm", 101.325, 0],
  ["u", 1.66053906892e-27, 0],
  ["Da", 1.66053906892e-27, 0],
  ["lb", 0.45359237, 0], // memory
  ["oz", 0.028349523125, 0], // memory
  ["gr", 6.479891e-5, 0], // memory
  ["in", 0.0254, 0],
  ["ft", 0.3048, 0], // memory
  ["angstrom", 1e-10, 0], // memory
  ["Å", 1e-10, 0],
  ["L", 0.001, 0],
  ["gal_US", 0.003785411784, 0], // memory
  ["floz_US", 2.95735295625e-5, 0], // memory
  ["min", 60, 0],
  ["h", 3600, 0],
  ["d", 86400, 0],
  ["wk", 604800, 0],
  ["mho", 1, 0],
  ["mS/cm", 0.1, 0],
  ["P", 0.1, 0],
  ["St", 0.0001, 0],
  ["dyn", 1e-5, 0],
  ["M", 1000, 0],
  ["kat", 1, 0], // memory
  ["U", 1.66666666666667e-8, 1e-14],
  ["g_n", 9.80665, 0],
];

describe("unit factors", () => {
  for (const [text, factor, relative] of factors) {
    it(`${text} is ${factor}`, () => {
      const { unit } = valid(readUnit(text));
      if (relative === 0) assert.equal(unit.factor, factor);
      else assert.ok(Math.abs(unit.factor / factor - 1) <= relative, `${unit.factor}`);
    });
  }

  // Not units of this language: UCUM's own millimetre of mercury, energies per particle standing for molar ones, and a
  // wavenumber standing for one (it is read as what it says, a reciprocal length).
  it("refuses the rows of the table that are not units here", () => {
    for (const text of ["mm[Hg]", "eV per particle", "hartree"]) faultOf(readUnit(text));
    assert.deepEqual(valid(readUnit("cm-1")).unit.dimension, [-1, 0, 0, 0, 0, 0, 0]);
  });

  // SI Brochure, 9th edition, table 7: prefixes are powers of ten; exact arithmetic leaves no rounding noise.
  it("carries no rounding noise", () => {
    const exact: [string, number][] = [
      ["mL", 1e-6],
      ["uL", 1e-9],
      ["µmol/L", 1e-3],
      ["mol/L", 1000],
      ["mmol/L", 1],
      ["L/(mol s)", 1e-3],
      ["kJ/mol", 1000],
      ["g/mol", 1e-3],
      ["S cm2/mol", 1e-4],
      ["L/(mol cm)", 0.1],
      ["g/cm3", 1000],
      ["nm", 1e-9],
      ["mmol/(L min)", 1 / 60],
      ["mol/(L h)", 1000 / 3600],
    ];
    for (const [text, factor] of exact) assert.equal(valid(readUnit(text)).unit.factor, factor, text);
    assert.equal(toSI(50, valid(readUnit("mL")).unit), 5e-5);
    assert.equal(toSI(0.3, valid(readUnit("mL")).unit), 3e-7);
    assert.equal(fromSI(5e-5, valid(readUnit("mL")).unit), 50);
  });

  // T = t + 273.15, T = (t + 459.67) × 5/9: NIST SP 811, B.8.
  it("converts temperatures as points, their differences as differences", () => {
    const celsius = valid(readUnit("°C")).unit;
    const fahrenheit = valid(readUnit("°F")).unit;
    assert.equal(toSI(25, celsius), 298.15);
    assert.equal(intervalToSI(0.1, celsius), 0.1);
    assert.ok(Math.abs(toSI(77, fahrenheit) - 298.15) < 1e-12);
    assert.ok(Math.abs(fromSI(298.15, fahrenheit) - 77) < 1e-12);
    assert.equal(valid(readUnit("J/(mol °C)")).unit.offset, 0);
    assert.equal(valid(readUnit("J/(mol °C)")).unit.factor, 1);
  });
});
