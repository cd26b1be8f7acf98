import assert from "node:assert/strict";
import { codeExamples } from "../../src/build/docs/codeExamples.js";
import { exampleDiagnostics, workedExample } from "../../src/build/docs/exampleFindings.js";
import { catalogue, type ProblemCode } from "../../src/contract/catalogue.js";

const brief = (all: readonly { code: string; line: number; message: string }[]): string[] =>
  all.map(({ code, line, message }) => `${code}@${line}: ${message}`);

describe("the example of each code", () => {
  it("there is one for every code, and none for another", () => {
    assert.deepEqual(Object.keys(codeExamples).sort(), Object.keys(catalogue).sort());
  });

  for (const [code, example] of Object.entries(codeExamples)) {
    if ("why" in example) {
      it(`${code}: cannot be shown in a text, and its words stand all the same`, () => {
        assert.match(example.why, /^[A-Z].{15,}\.$/);
        assert.ok(code in catalogue);
      });
      continue;
    }
    it(`${code}: the example earns it and nothing else, and put right it earns nothing`, async () => {
      const { diagnostics, right } = await workedExample(code, example);
      assert.ok(diagnostics.length > 0, "it earns nothing");
      const codes = [...new Set(diagnostics.map((found) => found.code))].sort();
      const besides = example.beside === undefined ? [] : [example.beside];
      assert.deepEqual(codes, [code, ...besides].sort(), brief(diagnostics).join("\n"));
      if (right === null) {
        assert.equal(catalogue[code as ProblemCode].severity, "information", "nothing puts it right");
        return;
      }
      const after = await exampleDiagnostics(right.text, right.files, false);
      assert.deepEqual(brief(after), [], right.text);
    });
  }
});
