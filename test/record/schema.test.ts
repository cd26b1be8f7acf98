import assert from "node:assert/strict";
import { readFileSync } from "node:fs";
import { Ajv } from "ajv";
import { readRecord } from "../../src/record/readRecord.js";
import { schemaText } from "../../src/record/schema.js";
import { readBack, sampleRecord } from "./sampleRecord.js";

describe("the schema of records", () => {
  const validate = new Ajv({ strict: true, allErrors: true }).compile(JSON.parse(schemaText()) as object);

  it("is current: the file is what the form of records makes of it (node src/build/records.mjs writes it)", () => {
    assert.equal(readFileSync("media/schema/raterecord.schema.json", "utf8"), schemaText());
  });

  it("holds for the record of every sample", async () => {
    for (const name of ["dye", "ester", "gas", "peroxide", "planted"]) {
      assert.ok(validate(JSON.parse(await sampleRecord(name))), `${name}: ${JSON.stringify(validate.errors)}`);
    }
  });

  it("and the reader judge alike: each key left out, each value of another kind", async () => {
    const record = readBack(await sampleRecord("gas"));
    let refused = 0;
    let passed = 0;
    for (const path of paths(record)) {
      for (const by of [undefined, { something: "else" }]) {
        const other = changed(record, path, by);
        const read = readRecord(JSON.stringify(other), "file:///a.raterecord").ok;
        assert.equal(validate(other), read, `${path.join(".")} as ${JSON.stringify(by)}`);
        if (read) passed++;
        else refused++;
      }
    }
    // What may be left out: parts of a parameter and of a taken amount, measures of a fit.
    assert.ok(refused > 250 && passed > 5 && passed < 20, `${refused} refused, ${passed} passed`);
  });
});

/** Where each value with a key stands in the first entries of all lists. */
function paths(value: unknown): (string | number)[][] {
  if (Array.isArray(value)) return value.length === 0 ? [] : paths(value[0]).map((path) => [0, ...path]);
  if (typeof value !== "object" || value === null) return [];
  return Object.entries(value).flatMap(([key, entry]) => [[key], ...paths(entry).map((path) => [key, ...path])]);
}

/** A copy with another value at a place; without it where that is undefined. */
function changed(record: unknown, path: readonly (string | number)[], by: unknown): unknown {
  const copy: unknown = structuredClone(record);
  let at = copy as Record<string | number, unknown>;
  for (const key of path.slice(0, -1)) at = at[key] as Record<string | number, unknown>;
  const last = path.at(-1) ?? "";
  if (by === undefined) delete at[last];
  else at[last] = by;
  return copy;
}
