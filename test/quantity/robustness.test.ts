import assert from "node:assert/strict";
import fc from "fast-check";
import type { Fault } from "../../src/contract/problem.js";
import { parseHeaderUnit } from "../../src/quantity/headerUnit.js";
import { readNumber } from "../../src/quantity/readNumber.js";
import { readQuantity } from "../../src/quantity/readQuantity.js";
import { readUnit } from "../../src/quantity/readUnit.js";
import { isFault } from "../../src/quantity/shifted.js";
import { words } from "./faultOf.js";

function insideText(text: string, fault: Fault): void {
  for (const { start, end } of [fault.span, ...(fault.mend ?? []).flatMap(({ edits }) => edits)]) {
    assert.ok(0 <= start && start <= end && end <= text.length, `${JSON.stringify(text)} ${start}–${end}`);
  }
  assert.doesNotMatch(words(fault), /undefined|\bNaN\b|null/);
}

const pieces =
  "0 1 2.5 12 , . e-3 ×10 ⁻³ ^ ( ) (2) ± +/- +- within % by mass mol L mL s min h d °C C K µ / · * - − 00:01:30 : \u00a0 \u2009 🧪 ′ [ ]".split(
    " ",
  );
const broken = fc.array(fc.constantFrom(...pieces, " ", " "), { maxLength: 14 }).map((parts) => parts.join(""));
const texts = fc.oneof(broken, broken, fc.string({ unit: "binary", maxLength: 40 }), fc.string({ maxLength: 40 }));

describe("the readers of quantities, on any text", () => {
  it("never throw, and keep faults and spans inside the text", () => {
    fc.assert(
      fc.property(texts, (text) => {
        const number = readNumber(text);
        if (isFault(number)) insideText(text, number);
        else assert.ok(Number.isFinite(number.value) && number.end <= text.length);
        const unit = readUnit(text);
        if (isFault(unit)) insideText(text, unit);
        else assert.ok(Number.isFinite(unit.unit.factor) && unit.unit.factor > 0);
        const quantity = readQuantity(text);
        if (isFault(quantity)) insideText(text, quantity);
        else {
          assert.ok(Number.isFinite(quantity.quantity.value));
          for (const { u } of quantity.quantity.sources) assert.ok(Number.isFinite(u) && u >= 0);
          for (const span of [quantity.number, quantity.unit ?? quantity.number]) {
            assert.ok(0 <= span.start && span.start < span.end && span.end <= text.length);
          }
        }
        parseHeaderUnit(text);
      }),
      { seed: 6, numRuns: 100_000 },
    );
  }).timeout(30_000);

  it("take no long time over long and deep texts", () => {
    const long = [
      "(".repeat(20000),
      "mol ".repeat(20000),
      "1".repeat(20000),
      "m^9".repeat(5000),
      "a / ".repeat(5000),
      " ".repeat(50000),
    ];
    const begun = process.hrtime.bigint();
    for (const text of long) {
      readUnit(text);
      readQuantity(text);
      readQuantity(`1 ${text}`);
      parseHeaderUnit(text);
    }
    assert.ok(process.hrtime.bigint() - begun < 2_000_000_000n);
  });
});
