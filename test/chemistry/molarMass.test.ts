import assert from "node:assert/strict";
import { molarMass } from "../../src/chemistry/molarMass.js";
import { readFormula } from "../../src/chemistry/readFormula.js";
import { fromSI } from "../../src/quantity/conversion.js";
import { combined } from "../../src/quantity/quantity.js";
import { quantityText } from "../../src/quantity/quantityText.js";
import { valid } from "../quantity/faultOf.js";

const mass = (text: string) => {
  const found = molarMass(valid(readFormula(text)).formula);
  assert.ok(found !== null, text);
  return found;
};

describe("molarMass", () => {
  // g/mol, sums of the abridged weights 2021 (Pure Appl. Chem. 94 (2022) 573), each to be checked by hand.
  const sums: [formula: string, sum: number][] = [
    ["H2O", 18.015], // 2 × 1.0080 + 15.999
    ["CO2", 44.009], // 12.011 + 2 × 15.999
    ["CaCO3", 100.086],
    ["HCl", 36.458],
    ["NaOH", 39.997],
    ["KMnO4", 158.032],
    ["Na2S2O3.5H2O", 248.172],
    ["CuSO4.5H2O", 249.677],
    ["CuSO4·5H2O", 249.677],
    ["C12H22O11", 342.297],
    ["K2S2O8", 270.308],
    ["Mg", 24.305],
  ];
  for (const [formula, sum] of sums) {
    it(`${formula} is ${sum} g/mol`, () => {
      const { value, unit } = mass(formula);
      assert.ok(Math.abs(fromSI(value, unit) - sum) < 1e-9, `${fromSI(value, unit)}`);
      assert.equal(unit.text, "g mol^-1");
    });
  }

  // g/mol as printed on bottles and in handbooks, from memory; abridged weights agree to 0.03.
  const handbook: [formula: string, value: number][] = [
    ["NaCl", 58.44],
    ["KI", 166.0],
    ["KBr", 119.0],
    ["AgNO3", 169.87],
    ["CaCl2", 110.98],
    ["MgSO4", 120.37],
    ["Na2CO3", 105.99],
    ["NaHCO3", 84.01],
    ["H2SO4", 98.08],
    ["HNO3", 63.01],
    ["H3PO4", 98.0],
    ["NH3", 17.03],
    ["NH4Cl", 53.49],
    ["C6H12O6", 180.16],
    ["C2H5OH", 46.07],
    ["CH3COOH", 60.05],
    ["K2Cr2O7", 294.18],
    ["FeSO4.7H2O", 278.01],
    ["H2C2O4.2H2O", 126.07],
    ["CO(NH2)2", 60.06],
    ["Ca(OH)2", 74.09],
    ["Fe2O3", 159.69],
    ["(NH4)2Fe(SO4)2.6H2O", 392.13],
    ["K4[Fe(CN)6].3H2O", 422.39],
    ["KHC8H4O4", 204.22],
    ["D2O", 20.03],
    ["[Co(NH3)5Br]^2+", 223.99],
  ];
  for (const [formula, value] of handbook) {
    it(`${formula} is near ${value} g/mol`, () => {
      const found = fromSI(mass(formula).value, mass(formula).unit);
      assert.ok(Math.abs(found - value) <= 0.03, `${found}`);
    });
  }

  it("has one common source an element, the tolerance a as a/√3, the same for all its atoms", () => {
    const { sources } = mass("H2O");
    assert.deepEqual(
      sources.map(({ name, kind }) => `${name}, ${kind}`),
      ["atomic weight of hydrogen, common", "atomic weight of oxygen, common"],
    );
    // 2 × 0.0002/√3 and 0.001/√3 g/mol
    const expected = Math.sqrt((0.0004 ** 2 + 0.001 ** 2) / 3) / 1000;
    assert.ok(Math.abs((combined(sources) ?? 0) / expected - 1) < 1e-12);
    assert.equal(quantityText(mass("H2O")), "18.01500(62) g mol^-1");
  });

  it("is not known where an element has no standard atomic weight, or nothing has a mass", () => {
    assert.equal(molarMass(valid(readFormula("TcO4^-")).formula), null);
    assert.equal(molarMass(valid(readFormula("e-")).formula), null);
  });
});
