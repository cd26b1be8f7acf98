import assert from "node:assert/strict";
import { henryConstants } from "../../src/chemistry/handbook/henry.js";
import { readFormula } from "../../src/chemistry/readFormula.js";
import { henryConstant } from "../../src/monitor/henryConstant.js";
import { valid } from "../quantity/faultOf.js";

describe("Henry constants", () => {
  // mol/(L atm) at 298.15 K: R. Sander, Atmos. Chem. Phys. 23 (2023) 10901 and 15 (2015) 4399, as printed.
  const printed: [gas: string, molPerLitreAtmosphere: number][] = [
    ["O2", 0.0013],
    ["N2", 0.00065],
    ["H2", 0.00079],
    ["CO2", 0.033],
    ["CO", 0.00098],
    ["NO", 0.0019],
    ["N2O", 0.024],
    ["CH4", 0.0014],
    ["Cl2", 0.093],
    ["SO2", 1.3],
    ["H2S", 0.1],
    ["NH3", 60],
  ];
  it("in mol/(L atm) are those printed, to two digits", () => {
    assert.equal(printed.length, henryConstants.length);
    for (const [gas, value] of printed) {
      const found = (henryConstant(gas, 298.15) ?? 0) * 101.325;
      assert.ok(Math.abs(found / value - 1) < 0.04, `${gas}: ${found}`);
    }
  });

  it("the share of a gas that stays dissolved, H R T, is the known one at equal volumes and 25 °C", () => {
    // CO2 0.82, O2 0.03, H2 0.02: hand calculation from the rows above with R T = 2479.0 J/mol
    const share = (gas: string): number => (henryConstant(gas, 298.15) ?? 0) * 8.314462618 * 298.15;
    assert.equal(share("CO2").toFixed(2), "0.82");
    assert.equal(share("O2").toFixed(2), "0.03");
    assert.equal(share("H2").toFixed(2), "0.02");
  });

  it("fall with temperature as exp(b (1/T − 1/298.15 K))", () => {
    // CO2 at 283.15 K: 3.3e-4 × exp(2400 × (1/283.15 − 1/298.15)) = 3.3e-4 × e^0.426433
    const found = henryConstant("CO2", 283.15) ?? 0;
    assert.ok(Math.abs(found / (3.3e-4 * 1.531784) - 1) < 1e-6, `${found}`);
    for (const { gas } of henryConstants) {
      assert.ok((henryConstant(gas, 313.15) ?? 1) < (henryConstant(gas, 293.15) ?? 0), gas);
    }
  });

  it("are null for other gases and temperatures, and the names are formulas", () => {
    for (const gas of ["HCl", "Ar", "", "constructor"]) assert.equal(henryConstant(gas, 298.15), null);
    for (const kelvin of [200, 400, Number.NaN]) assert.equal(henryConstant("O2", kelvin), null);
    for (const { gas } of henryConstants) assert.equal(valid(readFormula(gas)).formula.text, gas);
  });
});
