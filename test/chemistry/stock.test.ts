import assert from "node:assert/strict";
import { molarMass } from "../../src/chemistry/molarMass.js";
import { readFormula } from "../../src/chemistry/readFormula.js";
import {
  amountFractionToConcentration,
  amountInMass,
  amountInVolume,
  concentrationOf,
  massFractionToConcentration,
  type StockFacts,
  type Strength,
  stockConcentration,
} from "../../src/chemistry/stock.js";
import { fromSI } from "../../src/quantity/conversion.js";
import { combined, type Quantity } from "../../src/quantity/quantity.js";
import { quantityText } from "../../src/quantity/quantityText.js";
import { readQuantity } from "../../src/quantity/readQuantity.js";
import { faultOf, valid, words } from "../quantity/faultOf.js";

const q = (text: string, name = text): Quantity => valid(readQuantity(text, name)).quantity;
const mass = (formula: string): Quantity => molarMass(valid(readFormula(formula)).formula) ?? assert.fail(formula);
const span = { start: 3, end: 9 };
const nothing: StockFacts = {
  species: "H2O2",
  molarMass: null,
  density: null,
  pureDensity: null,
  solventMolarMass: null,
};

function strength(text: string): Strength {
  const { quantity, basis } = valid(readQuantity(text, "strength"));
  return basis === null ? { kind: "concentration", value: quantity } : { kind: "share", value: quantity, basis };
}

const near = (found: number, wanted: number, relative: number): void =>
  assert.ok(Math.abs(found / wanted - 1) <= relative, `${found}, not ${wanted}`);
const molar = (found: Quantity): number => fromSI(found.value, q("1 mol/L").unit);

describe("stock solutions", () => {
  // Strengths of commercial reagents as tables of laboratory handbooks print them, mol/L (common practice, from memory).
  const reagents: [formula: string, share: string, density: string, printed: number][] = [
    ["HCl", "37 % by mass", "1.19 g/mL", 12.1],
    ["H2SO4", "96 % by mass", "1.84 g/mL", 18.0],
    ["HNO3", "70 % by mass", "1.42 g/mL", 15.8],
    ["NH3", "28 % by mass", "0.90 g/mL", 14.8],
    ["CH3COOH", "99.7 % by mass", "1.05 g/mL", 17.4],
    ["NaOH", "50 % by mass", "1.53 g/mL", 19.1],
    ["H2O2", "30 % by mass", "1.11 g/mL", 9.79],
  ];
  for (const [formula, share, density, printed] of reagents) {
    it(`${share} ${formula} of ${density} is ${printed} mol/L`, () => {
      const facts = { ...nothing, species: formula, molarMass: mass(formula), density: q(density) };
      near(molar(valid(stockConcentration(strength(share), facts, span))), printed, 0.005);
    });
  }

  it("taken H2O2 5.0 mL of 30 % by mass density 1.11 g/mL, by hand", () => {
    // 0.30 × 1110 kg/m³ / 0.034014 kg/mol = 9790.086 mol/m³; × 5.0e-6 m³ = 0.04895043 mol; in 50 mL 0.9790086 mol/L
    const facts = { ...nothing, molarMass: mass("H2O2"), density: q("1.11 g/mL") };
    const c = valid(stockConcentration(strength("30 % by mass"), facts, span));
    near(c.value, 9790.086, 1e-7);
    const n = amountInVolume(q("5.0 mL"), c);
    near(n.value, 0.04895043, 1e-7);
    near(concentrationOf(n, q("50.00 mL"))?.value ?? 0, 979.0086, 1e-7);
  });

  it("taken KI 10.0 mL of 0.500 mol/L", () => {
    const c = valid(stockConcentration(strength("0.500 mol/L"), nothing, span));
    const n = amountInVolume(q("10.0 mL"), c);
    near(n.value, 0.005, 1e-15);
    assert.equal(quantityText(n), "0.005 mol");
    assert.equal(quantityText(concentrationOf(n, q("0.1 L")) ?? n), "0.05 mol L^-1");
  });

  it("a mass concentration takes the molar mass: 20.0 g/L NaOH is 0.500 mol/L", () => {
    const facts = { ...nothing, species: "NaOH", molarMass: mass("NaOH") };
    near(molar(valid(stockConcentration(strength("20.0 g/L"), facts, span))), 20 / 39.997, 1e-14);
  });

  it("by volume takes the density of the pure substance", () => {
    // 0.95 × 789.3 kg/m³ (ethanol at 20 °C, from memory) / 0.046069 kg/mol = 16276.3 mol/m³
    const facts = { ...nothing, molarMass: mass("C2H5OH"), pureDensity: q("0.7893 g/mL"), density: q("0.81 g/mL") };
    near(valid(stockConcentration(strength("95 % by volume"), facts, span)).value, 16276.3, 1e-5);
  });

  it("by amount takes the density and the solvent", () => {
    // x = 0.1 of HCl in water: mean M = 0.1 × 36.458 + 0.9 × 18.015 = 19.8593 g/mol; 0.1 × 1090 / 0.0198593 mol/m³
    const facts = {
      ...nothing,
      molarMass: mass("HCl"),
      density: q("1.09 g/mL"),
      solventMolarMass: mass("H2O"),
    };
    near(valid(stockConcentration(strength("10 % by amount"), facts, span)).value, 109 / 0.0198593, 1e-12);
    near(valid(stockConcentration(strength("100 % by amount"), facts, span)).value, 1090 / 0.036458, 1e-12);
  });

  it("purity is by mass: 1.000(1) g KHC8H4O4 of 99.5(2) %", () => {
    const n = amountInMass(q("1.000(1) g", "mass"), q("99.5(2) %", "purity"), mass("KHC8H4O4"));
    assert.ok(n !== null);
    // 0.995 g / 204.222 g/mol (sum of abridged weights 2021)
    near(n.value, 0.995 / 204.222, 1e-12);
    const by = (name: string): number => n.sources.find((source) => source.name === name)?.u ?? 0;
    near(by("mass"), n.value * 0.001, 1e-12);
    near(by("purity"), (n.value * 0.2) / 99.5, 1e-12);
    near(amountInMass(q("1 g"), null, mass("Mg"))?.value ?? 0, 1 / 24.305, 1e-14);
  });

  it("keeps each source by its name, the relative parts adding in squares", () => {
    const c = massFractionToConcentration(q("30.0(3) % by mass", "share"), q("1.110(2) g/mL", "density"), mass("H2O2"));
    assert.ok(c !== null);
    const names = c.sources.map(({ name, kind }) => `${name}, ${kind}`);
    assert.deepEqual(names, [
      "share, common",
      "density, common",
      "atomic weight of hydrogen, common",
      "atomic weight of oxygen, common",
    ]);
    const relative = Math.sqrt(
      (0.3 / 30) ** 2 + (0.002 / 1.11) ** 2 + ((combined(mass("H2O2").sources) ?? 0) / 0.034014) ** 2,
    );
    near((combined(c.sources) ?? 0) / c.value, relative, 1e-9);
  });

  it("slopes by amount agree with small changes of each input", () => {
    const inputs = ["30 % by amount", "1.1 g/mL", "34 g/mol", "18 g/mol"].map((text) => q(text));
    const at = (changed: readonly Quantity[]): Quantity => {
      const [x = q("0 %"), rho = q("0 g/mL"), m = q("0 g/mol"), s = q("0 g/mol")] = changed;
      return amountFractionToConcentration(x, rho, m, s) ?? assert.fail();
    };
    inputs.forEach((input, index) => {
      const u = input.value * 1e-6;
      const sources = [{ name: "one", kind: "common" as const, u }];
      const stated = at(inputs.map((one, place) => (place === index ? { ...one, sources } : one)));
      const shifted = (by: number): number =>
        at(inputs.map((one, place) => (place === index ? { ...one, value: one.value + by } : one))).value;
      near(combined(stated.sources) ?? 0, Math.abs(shifted(u) - shifted(-u)) / 2, 1e-6);
    });
  });

  const refused: [text: string, facts: Partial<StockFacts>, code: string, words: string][] = [
    [
      "30 % by mass",
      { molarMass: mass("H2O2") },
      "stock-needs-density",
      "A solution of H2O2, 30 % by mass, needs its density: add it to the line, as in density 1.11 g/mL.",
    ],
    [
      "30 % by mass",
      { species: "dye", density: q("1 g/mL") },
      "stock-needs-molar-mass",
      "30 % by mass needs the molar mass of dye: declare species dye with its formula or its molar mass.",
    ],
    [
      "20 g/L",
      { species: "dye" },
      "stock-needs-molar-mass",
      "20 g L^-1 needs the molar mass of dye: declare species dye with its formula or its molar mass.",
    ],
    [
      "96 % by volume",
      { species: "C2H5OH", molarMass: mass("C2H5OH"), density: q("0.81 g/mL") },
      "stock-needs-pure-density",
      "96 % by volume needs the density of pure C2H5OH, which is not known here: give the share by mass with the density of the solution, or its concentration.",
    ],
    [
      "10 % by amount",
      { molarMass: mass("H2O2"), density: q("1.1 g/mL") },
      "stock-needs-solvent",
      "10 % by amount of H2O2 needs the molar mass of what it is dissolved in: give the share by mass with the density of the solution, or its concentration.",
    ],
    [
      "130 % by mass",
      { molarMass: mass("H2O2"), density: q("1.1 g/mL") },
      "share-beyond-whole",
      "A share lies between 0 and 100 %; 130 % cannot be one.",
    ],
    [
      "5 s",
      {},
      "wrong-dimension",
      "A stock needs a unit of concentration or mass concentration (mol/L, g/L); s is a unit of time.",
    ],
  ];
  for (const [text, facts, code, message] of refused) {
    it(`says what ${text} lacks: ${message}`, () => {
      const found = faultOf(stockConcentration(strength(text), { ...nothing, ...facts }, span));
      assert.equal(found.code, code);
      assert.equal(words(found), message);
      assert.deepEqual(found.span, span);
    });
  }

  it("is null where the divisor is zero", () => {
    assert.equal(concentrationOf(q("1 mol"), q("0 mL")), null);
    assert.equal(amountFractionToConcentration(q("0 %"), q("1 g/mL"), q("18 g/mol"), q("0 g/mol")), null);
  });
});
