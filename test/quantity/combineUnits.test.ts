import assert from "node:assert/strict";
import fc from "fast-check";
import { combineUnits } from "../../src/quantity/combineUnits.js";
import { readUnit } from "../../src/quantity/readUnit.js";
import type { Unit } from "../../src/quantity/unit.js";
import { valid } from "./faultOf.js";

const unit = (text: string): Unit => valid(readUnit(text)).unit;

describe("combineUnits", () => {
  it("makes units of rates and rate constants", () => {
    const rows: [[string, number][], string, number][] = [
      [
        [
          ["mol/L", 1],
          ["s", -1],
        ],
        "mol L^-1 s^-1",
        1000,
      ],
      [
        [
          ["mol/L", 0],
          ["s", -1],
        ],
        "s^-1",
        1,
      ],
      [
        [
          ["mol/L", -1],
          ["s", -1],
        ],
        "L mol^-1 s^-1",
        0.001,
      ],
      [
        [
          ["mol/L", -2],
          ["s", -1],
        ],
        "L^2 mol^-2 s^-1",
        1e-6,
      ],
      [
        [
          ["mmol/L", 1],
          ["min", -1],
        ],
        "mmol L^-1 min^-1",
        1 / 60,
      ],
      [
        [
          ["M", -1],
          ["s", -1],
        ],
        "M^-1 s^-1",
        0.001,
      ],
      [
        [
          ["s", -1],
          ["mol/L", 1],
        ],
        "mol s^-1 L^-1",
        1000,
      ],
      [
        [
          ["g", 1],
          ["s", -1],
        ],
        "g s^-1",
        0.001,
      ],
      [
        [
          ["mol/L", 1],
          ["L", 1],
        ],
        "mol",
        1,
      ],
    ];
    for (const [parts, text, factor] of rows) {
      const made = combineUnits(parts.map(([written, exponent]) => ({ unit: unit(written), exponent })));
      assert.equal(made.text, text);
      assert.equal(made.factor, factor, text);
    }
  });

  it("prints halves and other fractional orders", () => {
    const half = combineUnits([
      { unit: unit("mol/L"), exponent: -0.5 },
      { unit: unit("s"), exponent: -1 },
    ]);
    assert.equal(half.text, "L^0.5 mol^-0.5 s^-1");
    assert.ok(Math.abs(half.factor * Math.sqrt(1000) - 1) < 1e-15);
    assert.deepEqual(half.dimension, [1.5, 0, -1, 0, 0, -0.5, 0]);
    // 1000^(-3/10): ten equal factors make 1e-9.
    const third = combineUnits([{ unit: unit("mol/L"), exponent: -0.3 }]).factor;
    const tenfold = Array.from({ length: 10 }, () => third).reduce((all, value) => all * value, 1);
    assert.ok(Math.abs(tenfold / 1e-9 - 1) < 1e-14);
  });

  it("counts °C in a product as a difference, alone as it is", () => {
    const slope = combineUnits([
      { unit: unit("kJ"), exponent: 1 },
      { unit: unit("degC"), exponent: -1 },
    ]);
    assert.equal(slope.offset, 0);
    assert.equal(slope.text, "kJ degC^-1");
    assert.equal(combineUnits([{ unit: unit("degC"), exponent: 1 }]).offset, 273.15);
  });

  it("undoes itself: u^n times u^-n is a plain number", () => {
    const some = fc.constantFrom("mol/L", "mL", "s", "kPa", "mS/cm", "degC", "%", "g/mol");
    fc.assert(
      fc.property(some, fc.integer({ min: -6, max: 6 }), (text, twice) => {
        const made = combineUnits([
          { unit: unit(text), exponent: twice / 2 },
          { unit: unit(text), exponent: -twice / 2 },
        ]);
        assert.equal(made.text, "");
        assert.equal(made.factor, 1);
      }),
      { seed: 1, numRuns: 200 },
    );
  });

  it("is read back as the same unit", () => {
    const part = fc.record({
      unit: fc.constantFrom("mol/L", "mL", "s", "min", "kPa", "J", "g").map(unit),
      exponent: fc.integer({ min: -6, max: 6 }).map((twice) => twice / 2),
    });
    fc.assert(
      fc.property(fc.array(part, { minLength: 1, maxLength: 3 }), (parts) => {
        const made = combineUnits(parts);
        if (made.text !== "") assert.deepEqual(unit(made.text), made);
      }),
      { seed: 2, numRuns: 300 },
    );
  });
});
