import assert from "node:assert/strict";
import { headsBelow, type Owner, statements } from "../../src/language/statements.js";
import { boundText } from "../support/checkText.js";

describe("the statement table", () => {
  for (const { head, owners, example, opens } of statements) {
    it(`${head}: its example parses where it belongs`, () => {
      const above: Readonly<Record<Owner, string>> = {
        file: "",
        reaction: "reaction H2O -> H2O\n",
        species: "species dye\n",
        calibration: "calibration iodine of I2\n",
        run: "run X\n",
        rows: 'run X\nrows of "runs.csv" like X\n',
        data: 'run X\ndata "x.csv"\n',
        column: 'run X\ndata "x.csv"\ncolumn y "y" mol/L\n',
        follow: "run X\nfollow H2O2 as concentration from c\n",
        observed: 'run X\nobserved "blue" at 30 s\n',
        fit: "run X\nfit order 1 in H2O2\n",
        series: "series s\n",
        mechanism: "mechanism m\n",
        step: "mechanism m\nstep one is H2O -> H2O\n",
      };
      for (const owner of owners) {
        const text = `${above[owner]}${example}\n`;
        const start = text.length - example.length - 1;
        const own = boundText(text).parsed.problems.filter(({ origin }) => origin.start >= start);
        assert.deepEqual(own, [], text);
      }
      assert.ok(example.startsWith(head));
      if (opens !== undefined) assert.ok(headsBelow(opens).length > 0);
    });
  }

  it("no line shares its first word with another", () => {
    assert.equal(new Set(statements.map(({ head }) => head)).size, statements.length);
  });
});
