import assert from "node:assert/strict";
import { problem } from "../../src/contract/problem.js";
import { messageOf } from "../../src/contract/words.js";
import { refusalProblem } from "../../src/data/dataOptions.js";
import { readColumns } from "../../src/data/readColumns.js";
import { checkDimension } from "../../src/quantity/checkDimension.js";
import { kinds } from "../../src/quantity/kinds.js";
import { readUnit } from "../../src/quantity/readUnit.js";
import { isFault } from "../../src/quantity/shifted.js";

const origin = { uri: "file:///a.raterun", start: 0, end: 4 };

describe("problems that no line of a description reaches in a test of ordinary size", () => {
  it("data-too-many-rows: beyond the limit nothing is used", () => {
    const bytes = new TextEncoder().encode(`t,c\n${"1,2\n".repeat(50)}`);
    const reading = readColumns(bytes, { maximumRows: 20 });
    assert.equal(reading.kind, "refused");
    if (reading.kind !== "refused") return;
    const found = refusalProblem(reading, "x.csv", origin);
    assert.equal(found.code, "data-too-many-rows");
    assert.equal(messageOf(found), "x.csv has more than 20 rows. Keep fewer readings, for example every tenth.");
    assert.equal(readColumns(bytes, { maximumRows: 50 }).kind, "columns");
  });

  it("unit-for-plain-number: a number that has no unit", () => {
    const reading = readUnit("mL");
    assert.ok(!isFault(reading));
    const expected = { name: "The order", dimensions: [kinds.number.dimension] };
    const found = checkDimension(reading.unit, expected, { start: 0, end: 2 });
    assert.equal(found?.code, "unit-for-plain-number");
    assert.equal(
      messageOf(
        problem("unit-for-plain-number", { name: "The order", given: "mL", givenKind: "a unit of volume" }, origin),
      ),
      "The order is a plain number; mL is a unit of volume.",
    );
    assert.equal(checkDimension(null, expected, { start: 0, end: 2 }), null);
  });
});
