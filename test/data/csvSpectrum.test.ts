import assert from "node:assert/strict";
import { readdirSync, readFileSync } from "node:fs";
import { createRequire } from "node:module";
import { dirname, join } from "node:path";
import { columnsOf } from "./reading.js";

/** The files of the npm package csv-spectrum 2.0.0, a public collection for testing readers of CSV (BSD-2-Clause). */
const folder = dirname(createRequire(import.meta.url).resolve("csv-spectrum"));
const names = readdirSync(join(folder, "csvs")).map((name) => name.replace(/\.csv$/, ""));

/** The cells of a row by their headers. */
type Row = Readonly<Record<string, string>>;

function answerOf(name: string): readonly Row[] {
  const parsed: unknown = JSON.parse(readFileSync(join(folder, "json", `${name}.json`), "utf8"));
  return (Array.isArray(parsed) ? parsed : [parsed]) as readonly Row[];
}

/** Rows of the file as texts: numbers by their value, every other cell by the fault that keeps its words. */
function readOf(name: string): Row[] {
  const { columns, rows, faults } = columnsOf(readFileSync(join(folder, "csvs", `${name}.csv`)));
  return Array.from({ length: rows }, (_, row) =>
    Object.fromEntries(
      columns.map(({ header, values }, column) => {
        const fault = faults.find((one) => one.row === row && one.column === column);
        return [header, fault === undefined ? String(values[row]) : fault.text];
      }),
    ),
  );
}

/** As a table of readings sees it: a number by its value, words cut to 40 characters, with the line ends of any system. */
function asReadings(row: Row): Row {
  return Object.fromEntries(
    Object.entries(row).map(([header, cell]) => [
      header,
      /^\d+$/.test(cell) ? String(Number(cell)) : cell.replaceAll("\r\n", "\n").slice(0, 40),
    ]),
  );
}

describe("the collection csv-spectrum", () => {
  it("is whole", () => assert.equal(names.length, 12));

  for (const name of names.filter((one) => one !== "location_coordinates")) {
    it(`${name} is read as it says`, () => assert.deepEqual(readOf(name), answerOf(name).map(asReadings)));
  }

  it("location_coordinates: its answer names another number than its file; the cells are read", () => {
    const [answer] = answerOf("location_coordinates");
    const [row, ...others] = readOf("location_coordinates");
    assert.deepEqual(others, []);
    assert.equal(answer?.["Contact Phone Number"], "1234567890");
    assert.deepEqual(row, {
      ...answer,
      "Contact Phone Number": "2095257564",
    });
  });
});
