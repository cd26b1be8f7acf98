import assert from "node:assert/strict";
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
});
