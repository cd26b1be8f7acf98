import assert from "node:assert/strict";
import { headsBelow, statements } from "../../src/language/statements.js";
import { boundText } from "../support/checkText.js";

describe("the statement table", () => {
  for (const { head, owners, example, opens } of statements) {
    it(`${head}: its example parses where it belongs`, () => {
      const above = {
        file: "",
        run: "run X\n",
        data: 'run X\ndata "x.csv"\n',
        column: 'run X\ndata "x.csv"\ncolumn y "y" mol/L\n',
        follow: "",
        fit: "run X\nfit order 1 in H2O2\n",
      };
      for (const owner of owners) {
        const text = `${above[owner]}${example}\n`;
        const start = text.length - example.length - 1;
        const own = boundText(text).parsed.problems.filter(({ origin }) => origin.start >= start);
        assert.deepEqual(own, [], text);
      }
      assert.ok(example.startsWith(head));
      if (opens !== undefined) assert.ok(opens === "follow" || headsBelow(opens).length > 0);
    });
  }

  it("no line shares its first word with another", () => {
    assert.equal(new Set(statements.map(({ head }) => head)).size, statements.length);
  });
});
