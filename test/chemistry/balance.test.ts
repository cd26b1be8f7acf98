import assert from "node:assert/strict";
import { balance } from "../../src/chemistry/balance.js";
import { balanceFault } from "../../src/chemistry/balanceFault.js";
import { readEquation } from "../../src/chemistry/readEquation.js";
import { faultOf, mended, words } from "../quantity/faultOf.js";

function judged(text: string) {
  const { equation, faults } = readEquation(text, (name) => name === "dye");
  assert.ok(equation !== null, faults.map(words).join());
  const result = balance(equation, () => null);
  return { result, fault: balanceFault(equation, result, text) };
}

describe("balance", () => {
  /**
   * Equations of any general chemistry textbook (common practice); each answer can be checked by counting, and is
   * read again below and found balanced.
   */
  const balanced: [skeleton: string, answer: string][] = [
    ["H2O2 -> H2O + O2", "2 H2O2 -> 2 H2O + O2"],
    ["H2 + O2 -> H2O", "2 H2 + O2 -> 2 H2O"],
    ["N2 + H2 <=> NH3", "N2 + 3 H2 <=> 2 NH3"],
    ["CH4 + O2 -> CO2 + H2O", "CH4 + 2 O2 -> CO2 + 2 H2O"],
    ["C3H8 + O2 -> CO2 + H2O", "C3H8 + 5 O2 -> 3 CO2 + 4 H2O"],
    ["C8H18 + O2 -> CO2 + H2O", "2 C8H18 + 25 O2 -> 16 CO2 + 18 H2O"],
    ["Fe + O2 -> Fe2O3", "4 Fe + 3 O2 -> 2 Fe2O3"],
    ["Na(s)+H2O(l) -> NaOH(aq)+H2(g)", "2 Na(s) + 2 H2O(l) -> 2 NaOH(aq) + H2(g)"],
    ["Mg(s) + HCl(aq) → MgCl2(aq) + H2(g)", "Mg(s) + 2 HCl(aq) → MgCl2(aq) + H2(g)"],
    ["CaCO3 + H^+ -> Ca^2+ + CO2 + H2O", "CaCO3 + 2 H^+ -> Ca^2+ + CO2 + H2O"],
    ["KClO3 -> KCl + O2", "2 KClO3 -> 2 KCl + 3 O2"],
    ["N2O5 -> NO2 + O2", "2 N2O5 -> 4 NO2 + O2"],
    ["Al + CuSO4 -> Al2(SO4)3 + Cu", "2 Al + 3 CuSO4 -> Al2(SO4)3 + 3 Cu"],
    ["(NH4)2Cr2O7 -> N2 + Cr2O3 + H2O", "(NH4)2Cr2O7 -> N2 + Cr2O3 + 4 H2O"],
    ["CuSO4·5H2O -> CuSO4 + H2O", "CuSO4·5H2O -> CuSO4 + 5 H2O"],
    ["S2O3^2- + I3^- -> S4O6^2- + I^-", "2 S2O3^2- + I3^- -> S4O6^2- + 3 I^-"],
    ["S2O8²⁻ + I⁻ → SO4²⁻ + I2", "S2O8²⁻ + 2 I⁻ → 2 SO4²⁻ + I2"],
    ["H2O2 + I^- + H^+ -> I2 + H2O", "H2O2 + 2 I^- + 2 H^+ -> I2 + 2 H2O"],
    ["BrO3^- + Br^- + H^+ -> Br2 + H2O", "BrO3^- + 5 Br^- + 6 H^+ -> 3 Br2 + 3 H2O"],
    ["IO3^- + HSO3^- -> I^- + SO4^2- + H^+", "IO3^- + 3 HSO3^- -> I^- + 3 SO4^2- + 3 H^+"],
    ["MnO4^- + Fe^2+ + H^+ -> Mn^2+ + Fe^3+ + H2O", "MnO4^- + 5 Fe^2+ + 8 H^+ -> Mn^2+ + 5 Fe^3+ + 4 H2O"],
    ["MnO4^- + C2O4^2- + H^+ -> Mn^2+ + CO2 + H2O", "2 MnO4^- + 5 C2O4^2- + 16 H^+ -> 2 Mn^2+ + 10 CO2 + 8 H2O"],
    ["MnO4^- + I^- + H2O -> MnO2 + I2 + OH^-", "2 MnO4^- + 6 I^- + 4 H2O -> 2 MnO2 + 3 I2 + 8 OH^-"],
    [
      "Cr2O7^2- + C2H5OH + H^+ -> Cr^3+ + CH3COOH + H2O",
      "2 Cr2O7^2- + 3 C2H5OH + 16 H^+ -> 4 Cr^3+ + 3 CH3COOH + 11 H2O",
    ],
    ["Cl2 + OH^- -> Cl^- + ClO3^- + H2O", "3 Cl2 + 6 OH^- -> 5 Cl^- + ClO3^- + 3 H2O"],
    ["Cu + NO3^- + H^+ -> Cu^2+ + NO + H2O", "3 Cu + 2 NO3^- + 8 H^+ -> 3 Cu^2+ + 2 NO + 4 H2O"],
    ["Al + OH^- + H2O -> [Al(OH)4]^- + H2", "2 Al + 2 OH^- + 6 H2O -> 2 [Al(OH)4]^- + 3 H2"],
    ["MnO4^- + e^- + H^+ -> Mn^2+ + H2O", "MnO4^- + 5 e^- + 8 H^+ -> Mn^2+ + 4 H2O"],
    ["D2O + H2O -> HDO", "D2O + H2O -> 2 HDO"],
    ["3 H2 + 1/2 O2 -> H2O", "2 H2 + O2 -> 2 H2O"],
  ];
  for (const [skeleton, answer] of balanced) {
    it(`balances ${answer}`, () => {
      const { result, fault } = judged(skeleton);
      assert.equal(result.kind, "unbalanced");
      const found = faultOf(fault);
      assert.deepEqual(
        found.mend?.map(({ text }) => text),
        [answer],
      );
      assert.equal(mended(skeleton, found), answer);
      assert.deepEqual(judged(answer), { result: { kind: "balanced" }, fault: null });
    });
  }

  const said: [text: string, kind: string, words: string][] = [
    ["H2O2 -> H2O + O2", "unbalanced", "Oxygen does not balance: 2 on the left, 3 on the right."],
    [
      "H2 + 1/2 O2 -> 2 H2O",
      "unbalanced",
      "Hydrogen does not balance: 2 on the left, 4 on the right. Nor does oxygen: 1 and 2.",
    ],
    [
      "H2O2 -> H2O + H2",
      "none",
      "Hydrogen does not balance: 2 on the left, 4 on the right. Nor does oxygen: 2 and 1. No coefficients balance these species; one is missing, or a formula is wrong.",
    ],
    [
      "H2 -> O2",
      "none",
      "Hydrogen does not balance: 2 on the left, 0 on the right. Nor does oxygen: 0 and 2. No coefficients balance these species; one is missing, or a formula is wrong.",
    ],
    [
      "Fe^2+ -> Fe^3+",
      "none",
      "Charge does not balance: +2 on the left, +3 on the right. No coefficients balance these species; one is missing, or a formula is wrong.",
    ],
    [
      "KClO3 + HCl -> KCl + Cl2 + ClO2 + H2O",
      "many",
      "Chlorine does not balance: 2 on the left, 4 on the right. Nor does hydrogen: 1 and 2. More than one set of coefficients would do, so this is a sum of reactions: write the coefficients you mean.",
    ],
    [
      "MnO4^- + H2O2 + H^+ -> Mn^2+ + O2 + H2O",
      "many",
      "Oxygen does not balance: 6 on the left, 3 on the right. Nor does hydrogen: 3 and 2. Nor does charge: 0 and +2. More than one set of coefficients would do, so this is a sum of reactions: write the coefficients you mean.",
    ],
  ];
  for (const [text, kind, message] of said) {
    it(`says of ${text}: ${kind}`, () => {
      const { result, fault } = judged(text);
      assert.equal(result.kind, kind);
      assert.equal(words(faultOf(fault)), message);
      if (kind !== "unbalanced") assert.equal(fault?.mend, undefined);
    });
  }

  it("is silent where it balances, with fractions, catalysts and one of many", () => {
    for (const text of [
      "H2 + 1/2 O2 -> H2O",
      "2 H2O2 + I^- -> 2 H2O + O2 + I^-",
      "2 MnO4^- + 5 H2O2 + 6 H^+ -> 2 Mn^2+ + 5 O2 + 8 H2O",
      "A3+ -> A3+".replaceAll("A3+", "Fe^3+"),
    ]) {
      assert.deepEqual(judged(text), { result: { kind: "balanced" }, fault: null }, text);
    }
  });

  it("judges nothing where a species has no formula", () => {
    assert.deepEqual(judged("dye + OH^- -> H2O"), { result: { kind: "unchecked", species: ["dye"] }, fault: null });
  });
});
