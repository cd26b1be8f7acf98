import assert from "node:assert/strict";
import { balance } from "../../src/chemistry/balance.js";
import { balanceFault } from "../../src/chemistry/balanceFault.js";
import { readEquation } from "../../src/chemistry/readEquation.js";
import { mended, words } from "../quantity/faultOf.js";
import { balances } from "./balances.js";

function judged(text: string) {
  const { equation, faults } = readEquation(text, () => false);
  assert.ok(equation !== null, faults.map(words).join());
  const result = balance(equation, () => null);
  return { result, fault: balanceFault(equation, result, text) };
}

describe("equations of the textbooks", () => {
  for (const [group, rows] of balances) {
    for (const [skeleton, answer] of rows) {
      it(`${group}: ${answer}`, () => {
        const { result, fault } = judged(skeleton);
        if (skeleton === answer) assert.equal(result.kind, "balanced");
        else {
          assert.equal(result.kind, "unbalanced");
          assert.ok(fault !== null);
          assert.deepEqual(
            fault.mend?.map(({ text }) => text),
            [answer],
          );
          assert.equal(mended(skeleton, fault), answer);
        }
        assert.deepEqual(judged(answer), { result: { kind: "balanced" }, fault: null });
      });
    }
  }

  it("an answer with one coefficient raised no longer balances, and is mended back", () => {
    for (const [, answer] of balances.flatMap(([, rows]) => rows)) {
      const { equation } = readEquation(answer, () => false);
      const [first] = equation?.left ?? [];
      assert.ok(first !== undefined);
      const species = answer.slice(first.speciesSpan.start);
      const raised = `${first.coefficient.num + 1} ${species}`;
      const { result, fault } = judged(raised);
      assert.equal(result.kind, "unbalanced", raised);
      assert.equal(fault?.mend?.[0]?.text, answer);
    }
  });

  it("the two ways that one skeleton balances are both accepted, and neither is offered", () => {
    // Chlorate in hydrochloric acid (common practice): to chlorine alone, or to chlorine and its dioxide.
    const both = ["KClO3 + 6 HCl -> KCl + 3 Cl2 + 3 H2O", "2 KClO3 + 4 HCl -> 2 KCl + Cl2 + 2 ClO2 + 2 H2O"];
    for (const text of both) assert.equal(judged(text).result.kind, "balanced", text);
    const { result, fault } = judged("KClO3 + HCl -> KCl + Cl2 + ClO2 + H2O");
    assert.equal(result.kind, "many");
    assert.equal(fault?.mend, undefined);
  });
});
