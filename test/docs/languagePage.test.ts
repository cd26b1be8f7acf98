import assert from "node:assert/strict";
import { languagePage } from "../../src/build/docs/languagePage.js";
import { lineName } from "../../src/build/docs/linePart.js";
import { syntaxLine } from "../../src/build/docs/syntaxLine.js";
import { connectives, numberWritings, speciesWritings } from "../../src/build/docs/writingPart.js";
import { readSpecies } from "../../src/chemistry/readSpecies.js";
import { statements } from "../../src/language/statements.js";
import { readQuantity } from "../../src/quantity/readQuantity.js";
import { isFault } from "../../src/quantity/shifted.js";
import { unitRows } from "../../src/quantity/unitTable.js";
import { saidOf } from "../support/checkText.js";

describe("the reference page of the language", () => {
  const page = languagePage();

  for (const row of statements) {
    it(`${row.head}: its line, what it is for and its example stand there once`, () => {
      const [, own = "", ...more] = page.split(`\n### ${lineName(row)}\n`);
      assert.deepEqual(more, []);
      const part = own.split(/\n##/)[0] ?? "";
      assert.ok(part.includes(syntaxLine(row.head, row.parts)));
      assert.ok(part.includes(`\n${row.example}\n`));
      assert.match(part, /\nWhere: .+\. (Once|As often)/);
    });
  }

  it("a syntax line shows what is fixed, filled in, left out and chosen", () => {
    const line = (head: string): string => {
      const row = statements.find((one) => one.head === head);
      assert.ok(row !== undefined);
      return syntaxLine(row.head, row.parts);
    };
    assert.equal(line("run"), 'run NAME [like RUN] ["title"]');
    assert.equal(line("window"), "window TIME to TIME");
    assert.equal(line("decimal"), "decimal (comma | point)");
    assert.equal(line("start"), "start (free | fixed [READING])");
  });

  for (const { write } of numberWritings) {
    it(`the number ${write} is read`, () => {
      const reading = readQuantity(write);
      assert.ok(!isFault(reading), JSON.stringify(reading));
    });
  }

  for (const { write } of speciesWritings) {
    it(`the species ${write} is read`, () => {
      const reading = readSpecies(write);
      assert.ok(!isFault(reading), JSON.stringify(reading));
    });
  }

  it("the words that cannot be names are these, and others can", () => {
    for (const word of connectives) assert.match(saidOf(`run ${word}\n`).join("\n"), /^name-malformed/, word);
    for (const word of ["min", "K", "rate", "blank-2", "A′"]) assert.deepEqual(saidOf(`run ${word}\n`), [], word);
  });

  it("every unit stands in its table", () => {
    for (const { symbol } of unitRows) assert.ok(page.includes(`| \`${symbol}\``), symbol);
  });
});
