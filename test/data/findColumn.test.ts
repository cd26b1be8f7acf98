import assert from "node:assert/strict";
import { messageOf } from "../../src/contract/words.js";
import { findColumn } from "../../src/data/findColumn.js";
import { columnsOf } from "./reading.js";

const origin = { uri: "file:///a.raterun", start: 20, end: 27 };

/** The column's index, or the words and the mends of the refusal. */
function found(file: string, wanted: string | number): number | string | [string, string[]] {
  const result = findColumn(columnsOf(file), wanted, "run.csv", origin);
  if (result.ok) return result.value;
  const mends = (result.problem.mend ?? []).map((mend) => mend.text);
  return mends.length > 0 ? [messageOf(result.problem), mends] : messageOf(result.problem);
}

describe("finding the column of a data file", () => {
  const file = "t / s,V / mL,V / mL\n0,1,2\n";

  it("by header and by number", () => {
    assert.equal(found(file, "t / s"), 0);
    assert.equal(found(file, "T  / s"), 0);
    assert.equal(found("V,v\n0,1\n", "v"), 1);
    assert.equal(found(file, 3), 2);
  });

  it("says which headers there are, and offers the likely ones", () => {
    assert.deepEqual(found("t / s,V / mL\n0,1\n", "V / mK"), [
      "run.csv has no column “V / mK”. Its headers, in line 1, are “t / s” and “V / mL”.",
      ['"V / mL"'],
    ]);
    assert.deepEqual(found("t / s,V / mL\n0,1\n", "t"), [
      "run.csv has no column “t”. Its headers, in line 1, are “t / s” and “V / mL”.",
      ['"t / s"'],
    ]);
    assert.equal(
      found("t / s,V / mL\n0,1\n", "absorbance"),
      "run.csv has no column “absorbance”. Its headers, in line 1, are “t / s” and “V / mL”.",
    );
  });

  it("says when a header is there twice", () => {
    assert.deepEqual(found(file, "V / mL"), [
      "run.csv has the header “V / mL” more than once in line 1. Give the column by its number: 2 and 3.",
      ["2", "3"],
    ]);
  });

  it("says when there is no header row, no such number, no row", () => {
    assert.equal(
      found("0,1\n1,2\n", "t"),
      "run.csv has no header row, so no column is called “t”. Give the column by its number, counted from 1.",
    );
    assert.equal(found("0,1\n1,2\n", 3), "run.csv has no column 3: it has 2 columns, counted from 1.");
    assert.equal(
      found("t,V\n", "t"),
      "run.csv has headers in line 1 but no readings under them. Check that the instrument saved its readings.",
    );
  });
});
