import assert from "node:assert/strict";
import { readFileSync } from "node:fs";
import { join } from "node:path";
import { grammar, grammarText } from "../../src/build/grammar.js";
import { statements } from "../../src/language/statements.js";
import { projectFolder } from "../editor/projectFolder.js";

describe("the highlighting grammar", () => {
  it("is current: the file is what the statement table makes of it (npm run build writes it)", () => {
    const file = readFileSync(join(projectFolder(), "syntaxes", "raterun.tmLanguage.json"), "utf8");
    assert.equal(file, grammarText());
  });

  it("has a rule for every line of the language, and its words are those of that line", () => {
    const rules = grammar().patterns.slice(1);
    assert.equal(rules.length, statements.length);
    statements.forEach(({ head, example }, index) => {
      const rule = rules[index];
      // Names are the only part of a beginning that JavaScript reads with the flag u alone.
      const begins = new RegExp(rule?.begin ?? "", "u").exec(`  ${example}`);
      assert.equal(begins?.[1], head, example);
    });
    const follow = rules[statements.findIndex(({ head }) => head === "follow")];
    const words = follow?.patterns?.find(({ name }) => name === "keyword.other.raterun")?.match ?? "";
    assert.deepEqual("follow H2O2 as concentration from c".match(new RegExp(words, "gu")), [
      "as",
      "concentration",
      "from",
    ]);
  });

  it("takes no longer word for a shorter one, and a name from the line that declares it", () => {
    const rules = grammar().patterns.slice(1);
    const run = new RegExp(rules[statements.findIndex(({ head }) => head === "run")]?.begin ?? "", "u");
    assert.equal(run.exec("running A"), null);
    assert.equal(run.exec("run A′2 like B")?.[2], "A′2");
  });

  it("sees numbers with their uncertainty, dates and arrows", () => {
    const { repository } = grammar();
    const found = (name: string, text: string) => text.match(new RegExp(repository[name]?.match ?? "", "gu"));
    assert.deepEqual(found("number", "temperature 25.0(1) °C"), ["25.0(1)"]);
    assert.deepEqual(found("number", "taken H2O2 1.5e-3 mol/L"), ["1.5e-3"]);
    assert.deepEqual(found("date", "date 2026-11-03"), ["2026-11-03"]);
    const arrow = repository["equation"]?.patterns?.[0]?.match ?? "";
    assert.deepEqual("A -> B <=> C ⇌ D".match(new RegExp(arrow, "gu")), ["->", "<=>", "⇌"]);
  });
});
