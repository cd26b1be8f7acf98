import assert from "node:assert/strict";
import { compare } from "../../src/record/compare.js";
import type { RunRecord } from "../../src/record/recordShape.js";
import { readBack, type SampleChange, sampleRecord } from "./sampleRecord.js";

const moves = async (name: string, change: SampleChange) =>
  compare(readBack(await sampleRecord(name)), readBack(await sampleRecord(name, change)));

describe("comparing records", () => {
  it("finds nothing moved where only comments, spaces and the order of free lines changed", async () => {
    const change = (text: string): string =>
      text
        .replace(/volume +50\.00 mL within 0\.05 mL/, "volume 50.00 mL within 0.05 mL # as marked")
        .replace("run A", "# a comment\n\nrun A");
    assert.deepEqual(await moves("gas", { text: change }), []);
  });

  it("one digit of the data: the file first, then every result that moved, no stated fact", async () => {
    const found = await moves("ester", { data: (csv) => csv.replace("\n4;34,48\n", "\n4;34,98\n") });
    assert.deepEqual([found[0]?.cause, found[0]?.what], ["data", "data/ester.csv"]);
    assert.match(
      found[0]?.text ?? "",
      /^data\/ester\.csv changed: (\d+) rows as before, SHA-256 [0-9a-f]{8}… before, [0-9a-f]{8}… now\.$/,
    );
    assert.ok(found.slice(1).every(({ cause }) => cause === "result"));
    const k = found.find(({ what }) => what === "run A, fit 1: k");
    assert.match(k?.text ?? "", /^run A, fit 1: k moved (from .* to .* min\^-1|in its digits: value from .*)\.$/);
  });

  it("a row added: its number of rows before and now", async () => {
    const found = await moves("ester", { data: (csv) => `${csv.trimEnd()}\n61;1,0\n` });
    assert.match(found[0]?.text ?? "", /^data\/ester\.csv changed: (\d+) rows before, (\d+) now, SHA-256/);
    assert.ok(found.some(({ text }) => /^run A, follow left: readings moved: points from/.test(text)));
  });

  it("an amount taken: the description, that amount with its words, then what follows from it", async () => {
    const found = await moves("gas", { text: (text) => text.replace("H2O2  10.0 mL", "H2O2  11.0 mL") });
    assert.deepEqual(
      found.slice(0, 2).map(({ cause, text }) => [cause, text]),
      [
        ["description", "What the description means changed."],
        ["description", "run A: H2O2 taken moved from 10 mL to 11 mL."],
      ],
    );
    assert.ok(found.some(({ text }) => text.startsWith("run A, fit 2: infinity moved from 62.50(63) mL to ")));
    assert.ok(!found.some(({ cause }) => cause === "data" || cause === "method"));
  });

  it("a title or a note: the description alone", async () => {
    const found = await moves("peroxide", { text: (text) => text.replace("open beaker", "closed beaker") });
    assert.deepEqual(
      found.map(({ cause, text }) => [cause, text]),
      [["description", "What the description means changed."]],
    );
  });

  it("another unit for the same amount: said as that, not as a record changed by hand", async () => {
    const found = await moves("gas", {
      text: (text) => text.replace("50.00 mL within 0.05 mL", "50.00e-3 L within 0.05e-3 L"),
    });
    assert.deepEqual(
      found.map(({ cause, text }) => [cause, text]),
      [
        ["description", "The description means the same but is written in other units, and results come out in those."],
        ["description", "run A: volume moved from 50.000(29) mL to 0.050000(29) L."],
      ],
    );
  });

  it("a line that nobody knows: said as a mistake in the description, not as a record changed by hand", async () => {
    const found = await moves("ester", { text: (text) => `${text}nosuchword 1\n` });
    assert.deepEqual(
      found.map(({ cause, text }) => [cause, text]),
      [
        ["description", "The description means the same, but other mistakes stand in it."],
        ["result", "description: error word-unknown is new."],
      ],
    );
  });

  it("the method: said, with both versions", async () => {
    const record = readBack(await sampleRecord("ester"));
    assert.deepEqual(compare({ ...record, method: "0" }, record), [
      {
        cause: "method",
        what: "way numbers are computed",
        text: "The way numbers are computed changed: version 0 before, 1 now.",
      },
    ]);
  });

  it("another version of the program alone moves nothing; with another meaning both readings are said", async () => {
    const record = readBack(await sampleRecord("ester"));
    assert.deepEqual(compare({ ...record, ratewright: "0.0.9" }, record), []);
    const meaning = record.meaning.replace(/./, (digit) => (digit === "0" ? "1" : "0"));
    assert.match(
      compare({ ...record, ratewright: "0.0.9", meaning }, record)[0]?.text ?? "",
      /^What the description means changed\. Or it is the same and version .* takes it otherwise than version 0\.0\.9 did\.$/,
    );
  });

  it("a number changed by hand: no cause is found, and that is said", async () => {
    const text = await sampleRecord("ester");
    const record = readBack(text);
    const k = record.runs[0]?.fits[0]?.parameters[0];
    assert.ok(k !== undefined && k.u !== null);
    const edited = withK(record, k.value + 3 * k.u);
    const found = compare(edited, record);
    assert.match(found[0]?.text ?? "", /^Neither data, description nor method changed: the record was changed by hand/);
    assert.deepEqual(
      found.slice(1).map(({ what }) => what),
      ["run A, fit 1: k"],
    );
  });

  it("the last digit of a number is let pass, two of them are not", async () => {
    const record = readBack(await sampleRecord("peroxide"));
    assert.equal(record.runs[0]?.fits[0]?.parameters[0]?.u, 2.29e-6);
    assert.deepEqual(compare(withK(record, 0.000621791 + 1e-9), record), []);
    assert.ok(compare(withK(record, 0.000621791 + 2e-9), record).length > 0);
  });

  it("a fit that came or went is said as a whole", async () => {
    const found = await moves("ester", { text: (text) => text.replace("  rate         initial\n", "") });
    assert.ok(found.some(({ text }) => /^run A, rate 2: v is no longer there; it was /.test(text)));
  });
});

/** The record with another k of the first fit. */
function withK(record: RunRecord, value: number): RunRecord {
  const copy = structuredClone<unknown>(record) as { runs: { fits: { parameters: { value: number }[] }[] }[] };
  const k = copy.runs[0]?.fits[0]?.parameters[0];
  assert.ok(k !== undefined);
  k.value = value;
  return copy as unknown as RunRecord;
}
