import assert from "node:assert/strict";
import fc from "fast-check";
import { balance } from "../../src/chemistry/balance.js";
import { balanceFault } from "../../src/chemistry/balanceFault.js";
import { readEquation } from "../../src/chemistry/readEquation.js";
import { readFormula } from "../../src/chemistry/readFormula.js";
import { readSpecies } from "../../src/chemistry/readSpecies.js";
import type { Fault } from "../../src/contract/problem.js";
import { isFault } from "../../src/quantity/shifted.js";
import { words } from "../quantity/faultOf.js";

function insideText(text: string, fault: Fault): void {
  for (const { start, end } of [fault.span, ...(fault.mend ?? []).flatMap(({ edits }) => edits)]) {
    assert.ok(0 <= start && start <= end && end <= text.length, `${JSON.stringify(text)} ${start}–${end}`);
  }
  assert.doesNotMatch(words(fault), /undefined|\bNaN\b|null/);
}

const pieces =
  "H O C Na Fe Cl e S2O3 SO4 ( ) [ ] { } 2 3 10 0 ½ 1/2 . · * ^ ^2- ²⁻ + - + - -> <=> → ⇌ = (aq) (s) (l) A dye ₂ − 🧪".split(
    " ",
  );
const broken = fc.array(fc.constantFrom(...pieces, " ", " "), { maxLength: 16 }).map((parts) => parts.join(""));
const texts = fc.oneof(broken, broken, fc.string({ unit: "binary", maxLength: 40 }), fc.string({ maxLength: 40 }));
const declared = (name: string): boolean => name === "A" || name === "dye";

describe("the readers of chemistry, on any text", () => {
  it("never throw, and keep faults and spans inside the text", () => {
    fc.assert(
      fc.property(texts, (text) => {
        const formula = readFormula(text);
        if (isFault(formula)) insideText(text, formula);
        else assert.ok(0 < formula.end && formula.end <= text.length);
        const species = readSpecies(text, declared);
        if (isFault(species)) insideText(text, species);
        else assert.ok(0 < species.end && species.end <= text.length && species.nameEnd <= species.end);
        const { equation, faults } = readEquation(text, declared);
        for (const found of faults) insideText(text, found);
        assert.equal(equation === null, faults.length === 1);
        if (equation === null) return;
        const found = balanceFault(
          equation,
          balance(equation, () => null),
          text,
        );
        if (found !== null) insideText(text, found);
        for (const { text: mend } of found?.mend ?? []) {
          const again = readEquation(mend, declared).equation;
          assert.ok(again !== null, mend);
          assert.equal(balance(again, () => null).kind, "balanced", mend);
        }
      }),
      { seed: 12, numRuns: 100_000 },
    );
  }).timeout(30_000);

  it("take no long time over long and deep texts", () => {
    const long = [
      "(".repeat(20000),
      "H2O + ".repeat(3000),
      "H".repeat(20000),
      "+".repeat(20000),
      "-> ".repeat(5000),
      "1/".repeat(5000),
      "a".repeat(20000),
      "(a".repeat(9000),
      "H)".repeat(9000),
    ];
    const begun = process.hrtime.bigint();
    for (const text of long) {
      readFormula(text);
      readSpecies(text, declared);
      readEquation(text, declared);
    }
    assert.ok(process.hrtime.bigint() - begun < 3_000_000_000n);
  });
});
