import assert from "node:assert/strict";
import { parseHeaderUnit } from "../../src/quantity/headerUnit.js";

describe("parseHeaderUnit", () => {
  const rows: [header: string, name: string, unit: string | null, unread: string | null][] = [
    ["time / s", "time", "s", null],
    ["V / mL", "V", "mL", null],
    ["V (mL)", "V", "mL", null],
    ["V(mL)", "V", "mL", null],
    ["t [s]", "t", "s", null],
    ["t[s]", "t", "s", null],
    ["c(H2O2) / mol L^-1", "c(H2O2)", "mol L^-1", null],
    ["c(H₂O₂) / mol·L⁻¹", "c(H₂O₂)", "mol L^-1", null],
    ["c(H2O2) (mol/L)", "c(H2O2)", "mol L^-1", null],
    ["κ / (mS/cm)", "κ", "mS cm^-1", null],
    ["κ / mS/cm", "κ", "mS cm^-1", null],
    ["T / °C", "T", "degC", null],
    ["T / K", "T", "K", null],
    ["V / µL", "V", "uL", null],
    ["t/s", "t", "s", null],
    ["V/mL", "V", "mL", null],
    ["A", "A", null, null],
    ["absorbance / 1", "absorbance", "", null],
    ["ln(c) (1)", "ln(c)", "", null],
    ["c(H2O2)", "c(H2O2)", null, null],
    ["n/n0", "n/n0", null, null],
    ["n/V", "n/V", null, null],
    ["n / n0", "n", null, "n0"],
    ["T (probe)", "T", null, "probe"],
    ["run [2]", "run", null, "2"],
    ["", "", null, null],
    ["/ s", "/ s", null, null],
    ["(s)", "(s)", null, null],
    ["  time / s  ", "time", "s", null],
  ];
  for (const [header, name, unit, unread] of rows) {
    it(`takes “${header}” apart`, () => {
      const found = parseHeaderUnit(header);
      assert.deepEqual({ ...found, unit: found.unit?.text ?? null }, { name, unit, unread });
    });
  }
});
