import assert from "node:assert/strict";
import fc from "fast-check";
import { stoichiometricNumbers } from "../../src/chemistry/equation.js";
import { extentBounds } from "../../src/chemistry/extent.js";
import { readEquation } from "../../src/chemistry/readEquation.js";

function bounds(text: string, amounts: Record<string, number>) {
  const { equation } = readEquation(text);
  assert.ok(equation !== null);
  return extentBounds(stoichiometricNumbers(equation), new Map(Object.entries(amounts)));
}

describe("extentBounds", () => {
  it("finds the limiting reactant by amount over stoichiometric number", () => {
    assert.deepEqual(bounds("Mg + 2 HCl -> MgCl2 + H2", { Mg: 0.02, HCl: 0.03 }), {
      least: 0,
      greatest: 0.015,
      limiting: ["HCl"],
    });
    assert.deepEqual(bounds("N2 + 3 H2 <=> 2 NH3", { N2: 1, H2: 3, NH3: 0.5 }), {
      least: -0.25,
      greatest: 1,
      limiting: ["N2", "H2"],
    });
  });

  it("does not count a catalyst that is written out, and takes what is not named as absent", () => {
    const found = bounds("2 H2O2 + I^- -> 2 H2O + O2 + I^-", { H2O2: 0.01, "I^-": 1e-6 });
    assert.deepEqual(found, { least: 0, greatest: 0.005, limiting: ["H2O2"] });
    assert.deepEqual(bounds("H2 + I2 -> 2 HI", { H2: 1 }), { least: 0, greatest: 0, limiting: ["I2"] });
  });

  // By hand: amount over stoichiometric number of each, the smallest on either side.
  const byHand: [text: string, amounts: Record<string, number>, least: number, greatest: number, limiting: string[]][] =
    [
      // 0.050 L of 0.100 mol/L: 5 mmol, in pairs
      ["2 H2O2 -> 2 H2O + O2", { H2O2: 0.005 }, 0, 0.0025, ["H2O2"]],
      // 5/5 = 1, 2/2 = 1, 17/16 = 1.0625 mmol
      [
        "2 MnO4^- + 5 C2O4^2- + 16 H^+ -> 2 Mn^2+ + 10 CO2 + 8 H2O",
        { "MnO4^-": 0.002, "C2O4^2-": 0.005, "H^+": 0.017 },
        0,
        0.001,
        ["MnO4^-", "C2O4^2-"],
      ],
      // 1.00 g of CaCO3 is 9.99 mmol; 10.0 mL of 1.00 mol/L acid only 5 mmol of pairs
      ["CaCO3 + 2 H^+ -> Ca^2+ + CO2 + H2O", { CaCO3: 0.00999, "H^+": 0.01 }, 0, 0.005, ["H^+"]],
      // half coefficients: 0.3/0.5 = 0.6 of oxygen, 1 of hydrogen; going back 0.2
      ["H2 + 1/2 O2 <=> H2O", { H2: 1, O2: 0.3, H2O: 0.2 }, -0.2, 0.6, ["O2"]],
      // one product is absent: nothing to go back from
      [
        "CH3COOC2H5 + OH^- <=> CH3COO^- + C2H5OH",
        { CH3COOC2H5: 1e-3, "OH^-": 2e-3, C2H5OH: 5 },
        0,
        1e-3,
        ["CH3COOC2H5"],
      ],
    ];
  for (const [text, amounts, least, greatest, limiting] of byHand) {
    it(`from ${greatest} mol forward to ${least} mol back: ${text}`, () => {
      assert.deepEqual(bounds(text, amounts), { least, greatest, limiting });
    });
  }

  it("where nothing is consumed there is no bound", () => {
    assert.deepEqual(extentBounds(new Map([["CO2", 1]]), new Map()), { least: 0, greatest: null, limiting: [] });
    assert.deepEqual(extentBounds(new Map(), new Map()), { least: null, greatest: null, limiting: [] });
  });

  it("no amount falls below zero anywhere between the bounds, and one is used up at the greatest", () => {
    const numbers = fc.dictionary(fc.constantFrom("A", "B", "C", "D", "E"), fc.integer({ min: -6, max: 6 }), {
      minKeys: 1,
    });
    const amounts = fc.dictionary(fc.constantFrom("A", "B", "C", "D"), fc.double({ min: 0, max: 10, noNaN: true }));
    fc.assert(
      fc.property(numbers, amounts, fc.double({ min: 0, max: 1, noNaN: true }), (nu, taken, share) => {
        const found = extentBounds(new Map(Object.entries(nu)), new Map(Object.entries(taken)));
        if (found.least === null || found.greatest === null) return;
        assert.ok(found.least <= 0 && found.greatest >= 0);
        const extent = found.least + share * (found.greatest - found.least);
        for (const [species, number] of Object.entries(nu)) {
          assert.ok((taken[species] ?? 0) + number * extent >= -1e-12);
        }
        for (const species of found.limiting) {
          assert.ok(Math.abs((taken[species] ?? 0) + (nu[species] ?? 0) * found.greatest) < 1e-10);
        }
        assert.ok(found.limiting.length > 0);
      }),
      { seed: 51, numRuns: 3000 },
    );
  });
});
