import assert from "node:assert/strict";
import { readFileSync } from "node:fs";
import type { Description } from "../../src/contract/findings.js";
import { createName } from "../../src/record/names.js";
import { recordText } from "../../src/record/recordText.js";
import { versions } from "../../src/workspace/verify.js";
import { readBack, sampleFindings, sampleRecord } from "./sampleRecord.js";

const samples = ["dye", "ester", "gas", "peroxide", "planted"] as const;

describe("the text of a record", () => {
  it("is the same twice, whatever the path before the name, and ends its lines in LF", async () => {
    for (const name of samples) {
      const first = await sampleFindings(name);
      const second = await sampleFindings(name);
      const text = recordText(first, versions);
      assert.equal(recordText({ ...second, path: `lab/2026/${second.path}` }, versions), text);
      assert.ok(text.endsWith("}\n") && !text.includes("\r"));
    }
  });

  it("holds no line numbers, no words of messages, no mends and no path of a machine", async () => {
    const text = await sampleRecord("planted");
    assert.doesNotMatch(text, /"(line|column|endLine|place|message|mends|edits)": ?[[{\d]/);
    assert.doesNotMatch(text, /file:\/\/|samples|does not balance/);
    const record = readBack(text);
    assert.deepEqual(
      record.diagnostics.map(({ severity, code, item, times }) => [severity, code, item, times]),
      [
        ["error", "unbalanced", null, 1],
        ["error", "coulomb-for-celsius", "run A", 1],
        ["error", "word-unknown", "run A", 1],
        ["warning", "data-cell-empty", "run A/follow c", 1],
        ["warning", "data-cell-word", "run A/follow c", 1],
        ["error", "rate-outside-readings", "run A/rate 1", 1],
      ],
    );
  });

  it("has one fact a line, each under words of its own", async () => {
    for (const name of samples) {
      const text = await sampleRecord(name);
      const about = text.split("\n").flatMap((line) => /"what": ("(?:[^"\\]|\\.)*")/.exec(line)?.[1] ?? []);
      assert.ok(about.length > 20);
      assert.equal(new Set(about).size, about.length);
      for (const line of text.split("\n")) assert.ok((line.match(/"what":/g) ?? []).length <= 1, line);
    }
  });

  it("names two of a kind apart", () => {
    const name = createName();
    assert.deepEqual(
      [name("run A", "KI taken"), name("run A", "KI taken"), name("run A/fit 1", "k")],
      ["run A: KI taken", "run A: KI taken (2)", "run A, fit 1: k"],
    );
  });

  it("keeps of a value what its uncertainty carries: four digits, of a part that cancels nothing", async () => {
    const description = await sampleFindings("peroxide");
    const found = description.runs[0]?.fits[0]?.parameters["k"];
    const kept = readBack(recordText(description, versions)).runs[0]?.fits[0]?.parameters[0];
    assert.ok(found !== undefined && kept !== undefined);
    assert.deepEqual(
      [found.value, found.u, found.uCommon !== 0],
      [0.0006217908568253031, 0.000002289540954069382, true],
    );
    assert.deepEqual([kept.value, kept.u, kept.uCommon], [0.000621791, 0.00000229, 0]);
  });

  it("does not see the last bits of a number", async () => {
    for (const name of ["gas", "peroxide"]) {
      const description = await sampleFindings(name);
      const shaken = shake(description);
      assert.notDeepEqual(shaken, description);
      assert.equal(recordText(shaken, versions), recordText(description, versions), name);
    }
  });

  it("of the samples is what stands beside them (node src/build/records.mjs writes it)", async () => {
    for (const name of samples) {
      assert.equal(readFileSync(`samples/${name}.raterecord`, "utf8"), await sampleRecord(name), name);
    }
  });
});

/** The findings with every number that is not whole changed in its last bits. */
function shake(description: Description): Description {
  const walk = (value: unknown): unknown => {
    if (typeof value === "number") return Number.isInteger(value) ? value : value * (1 + 4e-16);
    if (Array.isArray(value)) return value.map(walk);
    if (typeof value !== "object" || value === null) return value;
    return Object.fromEntries(Object.entries(value).map(([key, entry]) => [key, walk(entry)]));
  };
  return walk(description) as Description;
}
