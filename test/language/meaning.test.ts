import assert from "node:assert/strict";
import { readFileSync } from "node:fs";
import { meaningOf } from "../../src/language/meaning.js";
import { boundText } from "../support/checkText.js";

const meaning = (text: string): string => meaningOf(boundText(text).study);
const sample = readFileSync("samples/peroxide.raterun", "utf8");

describe("the meaning of a description", () => {
  it("does not change with comments, spaces, spelling of units and signs, or the order of keyed lines", () => {
    const same = [
      sample.replace("run A", "# a comment\n\n  run   A"),
      sample.replaceAll("\n", "\r\n"),
      sample.replace("25.0(1) °C", "298.15(10) K"),
      sample.replace("0.1000(5) mol/L", "100.0 ± 0.5 mmol·L⁻¹"),
      sample.replace("250.0 mL within 0.5 mL", "0.2500 dm3 within 0.5 mL"),
      sample.replace("->", "→"),
      sample.replace("2 H2O(l) + O2(g)", "O2(g) + 2 H2O(l)"),
      sample.replace(/( {2}taken {8}H2O2.*\n)( {2}taken {8}KI.*\n)/, "$2$1"),
    ];
    for (const text of same) {
      assert.notEqual(text, sample);
      assert.ok(meaning(text) === meaning(sample), text);
    }
  });

  it("changes with every figure and with the order of fits and rates", () => {
    const other = [
      sample.replace("25.0(1)", "25.1(1)"),
      sample.replace("25.0(1)", "25.0(2)"),
      sample.replace("0.1000(5)", "0.1001(5)"),
      sample.replace("as catalyst", "as inert"),
      sample.replace("peroxide-a.csv", "peroxide-b.csv"),
      sample.replace("rate         at 600 s", "rate         at 601 s"),
      sample.replace(/( {2}rate {9}at 600 s\n)( {2}rate {9}initial\n)/, "$2$1"),
      sample.replace("common   0.4 %", "common   0.4 mmol/L"),
      sample.replace("run B like A", "run B"),
      sample.replace("(aq) ->", "(l) ->"),
    ];
    const all = [sample, ...other].map(meaning);
    assert.equal(new Set(all).size, all.length);
  });
});
