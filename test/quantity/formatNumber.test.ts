import assert from "node:assert/strict";
import fc from "fast-check";
import { fromSI, intervalFromSI } from "../../src/quantity/conversion.js";
import { formatNumber, formatQuantity } from "../../src/quantity/formatNumber.js";
import { combined } from "../../src/quantity/quantity.js";
import { printedUnit, quantityText } from "../../src/quantity/quantityText.js";
import { readQuantity } from "../../src/quantity/readQuantity.js";
import { valid } from "./faultOf.js";

describe("formatNumber", () => {
  const rows: [value: number, u: number | null, text: string][] = [
    [5.502e-4, 7.3e-6, "5.502(73)e-4"],
    [0.1, 0.002, "0.1000(20)"],
    [100.02147, 0.00035, "100.02147(35)"], // JCGM 100:2008, 7.2.2
    [25.3, 1.2, "25.3(12)"],
    [1234, 12, "1234(12)"],
    [1234, 120, "1.23(12)e3"],
    [99.996, 0.996, "100.0(10)"],
    [0.99999, 0.0099, "1.0000(99)"],
    [101325, 10, "1.01325(10)e5"],
    [0.001, 0.0001, "0.00100(10)"],
    [0.0002, 0.005, "0.0002(50)"],
    [0, 3e-5, "0.0(30)e-5"],
    [0, 0.3, "0.00(30)"],
    [-0.001, 0.5, "0.00(50)"],
    [-5.5, 0.21, "-5.50(21)"],
    [4, 870, "0.0(87)e2"],
    [3, 0, "3(0)"],
    [1.5e7, 0, "1.5(0)e7"],
    [1, 1e-30, "1 +/- 1e-30"],
    [1e-5, null, "1e-5"],
    [123456.7, null, "1.23457e5"],
    [12345.67, null, "12345.7"],
    [1 / 3, null, "0.333333"],
    [9.9999999, null, "10"],
    [0.00099999999, null, "0.001"],
    [0, null, "0"],
    [-0, null, "0"],
    [-2.5, null, "-2.5"],
    [Number.NaN, 1, "not computed"],
    [1, Number.NaN, "not computed"],
    [Number.POSITIVE_INFINITY, null, "not computed"],
  ];
  for (const [value, u, text] of rows) {
    it(`prints ${value} with u ${u} as ${text}`, () => assert.equal(formatNumber(value, u), text));
  }

  it("puts the unit behind a space", () => {
    assert.equal(formatQuantity(5.502e-4, 7.3e-6, "s^-1"), "5.502(73)e-4 s^-1");
    assert.equal(formatQuantity(2, null, ""), "2");
    assert.equal(quantityText(valid(readQuantity("0.1000(20) mol/L")).quantity), "0.1000(20) mol L^-1");
    assert.equal(quantityText(valid(readQuantity("25.0(1) °C")).quantity), "25.00(10) degC");
  });

  it("prints units with the signs of print", () => {
    assert.equal(printedUnit("mol L^-1 s^-1"), "mol·L⁻¹·s⁻¹");
    assert.equal(printedUnit("degC"), "°C");
    assert.equal(printedUnit("uL"), "µL");
  });

  const magnitude = fc.tuple(
    fc.double({ min: 1, max: 9.999, noNaN: true }),
    fc.integer({ min: -25, max: 25 }),
    fc.boolean(),
  );
  const number = magnitude.map(([size, power, minus]) => Number(`${minus ? "-" : ""}${size}e${power}`));

  it("reads back to the digits shown, with its uncertainty to two digits", () => {
    fc.assert(
      fc.property(
        number,
        magnitude,
        fc.constantFrom("s^-1", "mol L^-1", "mL", "", "kJ mol^-1"),
        (value, [size, power], unit) => {
          const u = Number(`${size}e${power}`);
          const text = formatQuantity(value, u, unit);
          assert.doesNotMatch(text, /NaN|Infinity/);
          const { quantity } = valid(readQuantity(text));
          const back = intervalFromSI(combined(quantity.sources) ?? -1, quantity.unit);
          assert.ok(Math.abs(back / u - 1) < 0.051, `${text}: ${back} for ${u}`);
          const rounding =
            Math.abs(value) / u > 1e18 ? Math.abs(value) * 1e-5 : Math.max(u * 0.051, Math.abs(value) * 1e-14);
          assert.ok(Math.abs(fromSI(quantity.value, quantity.unit) - value) <= rounding, text);
        },
      ),
      { seed: 3, numRuns: 3000 },
    );
  });

  it("without uncertainty reads back to six digits", () => {
    fc.assert(
      fc.property(number, (value) => {
        const { quantity } = valid(readQuantity(formatNumber(value, null)));
        assert.ok(Math.abs(quantity.value / value - 1) < 5.1e-6);
      }),
      { seed: 4, numRuns: 2000 },
    );
  });

  it("prints any pair of doubles as text that reads back", () => {
    const any = fc.double({ noNaN: true, noDefaultInfinity: true, min: -1e290, max: 1e290 });
    const usual = any.filter((value) => value === 0 || Math.abs(value) > 1e-290);
    fc.assert(
      fc.property(usual, fc.option(usual.map(Math.abs)), (value, u) => {
        valid(readQuantity(formatNumber(value, u)));
      }),
      { seed: 5, numRuns: 2000 },
    );
  });
});
