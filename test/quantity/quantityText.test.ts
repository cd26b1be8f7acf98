import assert from "node:assert/strict";
import fc from "fast-check";
import { intervalToSI, toSI } from "../../src/quantity/conversion.js";
import type { Notation } from "../../src/quantity/notation.js";
import { combined, type Quantity } from "../../src/quantity/quantity.js";
import { quantityText, wholeQuantityText } from "../../src/quantity/quantityText.js";
import { readQuantity } from "../../src/quantity/readQuantity.js";
import { readUnit } from "../../src/quantity/readUnit.js";
import type { Unit } from "../../src/quantity/unit.js";
import { unitRows } from "../../src/quantity/unitTable.js";
import { unitText } from "../../src/quantity/unitText.js";
import { valid } from "./faultOf.js";

const unit = (text: string): Unit =>
  text === "" ? valid(readQuantity("1")).quantity.unit : valid(readUnit(text)).unit;
const read = (text: string): Quantity => valid(readQuantity(text, "stated")).quantity;

describe("quantities printed in either notation", () => {
  // The signs are those of the SI Brochure, 9th edition, 5.2 to 5.4.
  const shown: [written: string, ascii: string, unicode: string][] = [
    ["0.100(2) mol/L", "0.1000(20) mol L^-1", "0.1000(20) mol·L⁻¹"],
    ["25.0(1) °C", "25.00(10) degC", "25.00(10) °C"],
    ["-98.2(5) kJ/mol", "-98.20(50) kJ mol^-1", "−98.20(50) kJ·mol⁻¹"],
    ["5.502(73)e-4 s-1", "5.502(73)e-4 s^-1", "5.502(73)×10⁻⁴ s⁻¹"],
    ["0.0023(1) dm3 mol-1 s-1", "0.00230(10) dm^3 mol^-1 s^-1", "0.00230(10) dm³·mol⁻¹·s⁻¹"],
    ["1.2e7 µL", "1.2e7 uL", "1.2×10⁷ µL"],
    ["12 kOhm", "12 kOhm", "12 kΩ"],
    ["589 angstrom", "589 angstrom", "589 Å"],
    ["7.4", "7.4", "7.4"],
    ["30 %", "30 %", "30 %"],
  ];
  for (const [written, ascii, unicode] of shown) {
    it(`${written} is ${ascii} or ${unicode}`, () => {
      assert.equal(quantityText(read(written)), ascii);
      assert.equal(quantityText(read(written), "ascii"), ascii);
      assert.equal(quantityText(read(written), "unicode"), unicode);
    });
  }

  const whole: [written: string, ascii: string][] = [
    ["0.100(2) mol/L", "0.100(2) mol L^-1"],
    ["0.0500 +/- 0.0005 mol/L", "0.0500(5) mol L^-1"],
    ["25.0(1) °C", "25.0(1) degC"],
    ["25 °C", "25 degC"],
    ["50(20) mL", "50(20) mL"],
    ["1.0(1)e-3 s^-1", "0.0010(1) s^-1"],
    ["1.0(1)e-7 s^-1", "1.0(1)e-7 s^-1"],
    ["0(3) mV", "0(3) mV"],
    ["0(3)e-7 V", "0(3)e-7 V"],
    ["3(0) s", "3(0) s"],
    ["0 s", "0 s"],
    ["0(0) s", "0(0) s"],
    ["-2.50(25) kPa", "-2.50(25) kPa"],
    ["123456.5 s", "1.234565e5 s"],
    ["98.0 % ± 0.12345 %", "(98 +/- 0.12345) %"],
    ["1 min 30 s", "90 s"],
    ["50.00 mL within 0.05 mL", "50 +/- 0.02886751345948129 mL"],
  ];
  for (const [written, ascii] of whole) {
    it(`${written} is ${ascii} with all its digits`, () => {
      assert.equal(wholeQuantityText(read(written)), ascii);
      assert.deepEqual(read(ascii), { ...read(written) });
    });
  }

  const symbols = unitRows.flatMap(({ symbol, prefixes }) =>
    prefixes === "none" ? [symbol] : [symbol, `${prefixes === "all" ? "m" : prefixes[0]}${symbol}`],
  );
  const part = fc.tuple(
    fc.constantFrom(...symbols),
    fc.oneof(
      fc.constant(1),
      fc.integer({ min: -4, max: 4 }).filter((exponent) => exponent !== 0),
      fc.constantFrom(0.5, -0.5, 1.5),
    ),
  );
  const units = fc
    .array(part, { maxLength: 3 })
    .map((parts) => parts.map(([symbol, exponent]) => (exponent === 1 ? symbol : `${symbol}^${exponent}`)).join(" "));
  const notations: readonly Notation[] = ["ascii", "unicode"];

  for (const notation of notations) {
    it(`${notation}: a unit reads back as the same unit`, () => {
      fc.assert(
        fc.property(units, (text) => {
          if (text === "") return;
          const one = unit(text);
          if (one.text !== "") assert.deepEqual(unit(unitText(one, notation)), one);
        }),
        { seed: 31, numRuns: 2000 },
      );
    });

    it(`${notation}: every digit printed, value, uncertainty and unit read back the same`, () => {
      const digits = fc.tuple(fc.integer({ min: -99999999, max: 99999999 }), fc.integer({ min: -12, max: 8 }));
      const spread = fc.tuple(fc.integer({ min: 0, max: 9999 }), fc.integer({ min: -14, max: 6 }));
      fc.assert(
        fc.property(digits, fc.option(spread, { freq: 4 }), units, ([number, power], stated, text) => {
          const own = unit(text);
          const value = toSI(Number(`${number}e${power}`), own);
          const u = stated === null ? null : intervalToSI(Number(`${stated[0]}e${stated[1]}`), own);
          const small = [value, u ?? 0].some((one) => one !== 0 && Math.abs(one) < 1e-290);
          if (small || Math.abs(value) > 1e290) return;
          const sources = u === null ? [] : [{ name: "stated", kind: "common" as const, u }];
          const quantity: Quantity = { value: value === 0 ? 0 : value, unit: own, sources };
          assert.deepEqual(read(wholeQuantityText(quantity, notation)), quantity);
        }),
        { seed: 32, numRuns: 3000 },
      );
    });

    it(`${notation}: any pair of doubles reads back to the last bit or the one beside it`, () => {
      const any = fc.double({ noNaN: true, noDefaultInfinity: true, min: -1e140, max: 1e140 });
      const usual = any.filter((value) => value === 0 || Math.abs(value) > 1e-140);
      fc.assert(
        fc.property(
          usual,
          usual.map(Math.abs),
          fc.constantFrom("s", "min", "mL", "%", "psi", "d"),
          (value, u, text) => {
            const sources = [
              { name: "a", kind: "common" as const, u: u / 2 },
              { name: "b", kind: "random" as const, u },
            ];
            const back = read(wholeQuantityText({ value, unit: unit(text), sources }, notation));
            const near = (a: number, b: number): boolean => Math.abs(a - b) <= Number.EPSILON * Math.abs(b);
            assert.ok(near(back.value, value));
            assert.ok(near(combined(back.sources) ?? -1, combined(sources) ?? -2));
          },
        ),
        { seed: 33, numRuns: 1500 },
      );
    });

    it(`${notation}: the shown form reads back to what it shows`, () => {
      fc.assert(
        fc.property(
          fc.double({ min: -1e6, max: 1e6, noNaN: true }),
          fc.double({ min: 1e-4, max: 1e3, noNaN: true }),
          fc.constantFrom("mol L^-1", "degC", "%", "", "dm^3 mol^-1 s^-1"),
          (value, u, text) => {
            const own = unit(text);
            const sources = [{ name: "", kind: "common" as const, u: intervalToSI(u, own) }];
            const printed = quantityText({ value: toSI(value, own), unit: own, sources }, notation);
            assert.equal(quantityText(read(printed), notation), printed);
          },
        ),
        { seed: 34, numRuns: 1000 },
      );
    });
  }

  it("what is not finite is not printed as a number", () => {
    const broken = { value: Number.NaN, unit: unit("s"), sources: [] };
    assert.equal(quantityText(broken), "not computed");
    assert.equal(wholeQuantityText(broken, "unicode"), "not computed");
  });
});
