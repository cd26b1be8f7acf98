import assert from "node:assert/strict";
import { chargeText, type Formula } from "../../src/chemistry/formula.js";
import { ionsOf } from "../../src/chemistry/handbook/dissociation.js";
import { anions, cations, otherIons } from "../../src/chemistry/handbook/ions.js";
import { readFormula } from "../../src/chemistry/readFormula.js";
import { valid } from "../quantity/faultOf.js";

const formula = (text: string): Formula => valid(readFormula(text)).formula;

describe("ions of common electrolytes (common practice)", () => {
  const rows: [salt: string, ions: string][] = [
    ["KI", "K^+ I^-"],
    ["NaOH", "Na^+ OH^-"],
    ["HCl", "H^+ Cl^-"],
    ["HNO3", "H^+ NO3^-"],
    ["H2SO4", "H^+ HSO4^-"],
    ["NaHSO4", "Na^+ HSO4^-"],
    ["(NH4)2SO4", "2 NH4^+ SO4^2-"],
    ["CuSO4.5H2O", "Cu^2+ SO4^2-"],
    ["Ca(NO3)2", "Ca^2+ 2 NO3^-"],
    ["Al2(SO4)3", "2 Al^3+ 3 SO4^2-"],
    ["Na2S2O3.5H2O", "2 Na^+ S2O3^2-"],
    ["K2S2O8", "2 K^+ S2O8^2-"],
    ["(NH4)2S2O8", "2 NH4^+ S2O8^2-"],
    ["KMnO4", "K^+ MnO4^-"],
    ["K2Cr2O7", "2 K^+ Cr2O7^2-"],
    ["CH3COONa", "Na^+ CH3COO^-"],
    ["NaCH3COO", "Na^+ CH3COO^-"],
    ["K3[Fe(CN)6]", "3 K^+ [Fe(CN)6]^3-"],
    ["K3Fe(CN)6", "3 K^+ [Fe(CN)6]^3-"],
    ["FeCl3", "Fe^3+ 3 Cl^-"],
    ["Ba(OH)2", "Ba^2+ 2 OH^-"],
    ["KBrO3", "K^+ BrO3^-"],
  ];
  for (const [salt, ions] of rows) {
    it(`${salt} gives ${ions}`, () => {
      const found = ionsOf(salt) ?? [];
      assert.equal(found.map(({ key, count }) => (count === 1 ? key : `${count} ${key}`)).join(" "), ions);
    });
  }

  it("atoms and charge of the ions add up to the salt", () => {
    for (const [salt] of rows) {
      const sums = new Map<string, number>();
      let charge = 0;
      for (const { key, count } of ionsOf(salt) ?? []) {
        charge += count * formula(key).charge;
        for (const [symbol, atoms] of formula(key).parts) sums.set(symbol, (sums.get(symbol) ?? 0) + atoms * count);
      }
      assert.equal(charge, 0, salt);
      const dry = formula(salt.replace(/\.\d*H2O$/, "")).parts;
      assert.deepEqual(Object.fromEntries([...sums].sort()), Object.fromEntries([...dry].sort()), salt);
    }
  });

  it("knows nothing of what does not dissolve, of weak acids and of molecules", () => {
    for (const text of [
      "AgCl",
      "BaSO4",
      "CaCO3",
      "CH3COOH",
      "H2O",
      "H2O2",
      "NH3",
      "CO(NH2)2",
      "Fe(OH)3",
      "PbI2",
      "HF",
    ]) {
      assert.equal(ionsOf(text), null, text);
    }
  });

  it("names ions by formulas that read as they are written", () => {
    for (const { body, charge } of [...cations, ...anions, ...otherIons]) {
      assert.equal(formula(body + chargeText(charge)).charge, charge);
    }
  });
});
