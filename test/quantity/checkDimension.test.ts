import assert from "node:assert/strict";
import { checkDimension } from "../../src/quantity/checkDimension.js";
import { sameDimension } from "../../src/quantity/dimension.js";
import { type Kind, type KindName, kindOf, kinds } from "../../src/quantity/kinds.js";
import { readUnit } from "../../src/quantity/readUnit.js";
import { faultOf, mended, valid, words } from "./faultOf.js";

const span = { start: 3, end: 4 };

function check(text: string | null, name: string, ...expected: KindName[]) {
  const unit = text === null ? null : valid(readUnit(text)).unit;
  return checkDimension(unit, { name, dimensions: expected.map((kind) => kinds[kind].dimension) }, span);
}

describe("checkDimension", () => {
  it("is silent where the unit fits", () => {
    assert.equal(check("mL", "Volume", "volume"), null);
    assert.equal(check("m3", "Volume", "volume"), null);
    assert.equal(check("g", "Taken", "concentration", "amount", "mass"), null);
    assert.equal(check("K", "Temperature", "temperature"), null);
    assert.equal(check(null, "pKa", "number"), null);
    assert.equal(check("%", "Purity", "number"), null);
  });

  const said: [text: string | null, name: string, kinds: KindName[], words: string][] = [
    ["s", "Volume", ["volume"], "Volume needs a unit of volume (L, mL, m³ …); s is a unit of time."],
    ["C", "Temperature", ["temperature"], "C is coulomb, a unit of charge; temperature needs °C or K."],
    [null, "Volume", ["volume"], "Volume needs a unit of volume (L, mL, m³ …); a bare number has none."],
    ["%", "Volume", ["volume"], "Volume needs a unit of volume (L, mL, m³ …); % is a plain number."],
    [
      "mL",
      "Taken",
      ["concentration", "amount", "mass"],
      "Taken needs a unit of concentration, amount or mass (mol/L, mol, g); mL is a unit of volume.",
    ],
    ["s", "pKa", ["number"], "pKa is a plain number; s is a unit of time."],
    ["uL", "Temperature", ["temperature"], "Temperature needs a unit of temperature (°C, K); µL is a unit of volume."],
    ["m^7", "Volume", ["volume"], "Volume needs a unit of volume (L, mL, m³ …); m^7 is a unit of something else."],
  ];
  for (const [text, name, expected, message] of said) {
    it(message, () => assert.equal(words(faultOf(check(text, name, ...expected))), message));
  }

  it("mends the coulomb and other slips of case", () => {
    assert.equal(mended("25 C", faultOf(check("C", "Temperature", "temperature"))), "25 °C");
    assert.equal(mended("25 S", faultOf(check("S", "Time", "time"))), "25 s");
  });

  it("offers a unit where none is written", () => {
    const found = faultOf(
      checkDimension(null, { name: "Volume", dimensions: [kinds.volume.dimension] }, { start: 0, end: 2 }),
    );
    assert.equal(mended("50", found), "50 mL");
  });

  it("names each kind by its own sample unit", () => {
    for (const kind of Object.values<Kind>(kinds)) {
      if (kind.unit === "") continue;
      const { unit } = valid(readUnit(kind.unit));
      assert.ok(sameDimension(unit.dimension, kind.dimension), kind.name);
      assert.ok(kindOf(kind.dimension) !== null);
    }
  });
});

describe("kindOf", () => {
  it("calls a row's own dimension by the row, another equal one by the first", () => {
    assert.equal(kindOf(kinds.density.dimension)?.name, "density");
    assert.equal(kindOf([-3, 1, 0, 0, 0, 0, 0])?.name, "mass concentration");
    assert.equal(kindOf([9, 0, 0, 0, 0, 0, 0]), null);
  });
});
