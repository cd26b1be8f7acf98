import assert from "node:assert/strict";
import { readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { catalogue } from "../../src/contract/catalogue.js";
import { chemistryMessages } from "../../src/contract/messages/chemistry.js";
import { dataMessages } from "../../src/contract/messages/data.js";
import { fitMessages } from "../../src/contract/messages/fit.js";
import { languageMessages } from "../../src/contract/messages/language.js";
import { namingMessages } from "../../src/contract/messages/naming.js";
import { quantityMessages } from "../../src/contract/messages/quantity.js";
import { recordMessages } from "../../src/contract/messages/record.js";

const groups = [
  chemistryMessages,
  dataMessages,
  fitMessages,
  languageMessages,
  namingMessages,
  quantityMessages,
  recordMessages,
];

const textsBelow = (folder: string, without = "-"): string =>
  readdirSync(folder, { recursive: true, encoding: "utf8" })
    .filter(
      (name) => name.endsWith(".ts") && !name.startsWith(join("contract", "messages")) && !name.startsWith(without),
    )
    .map((name) => readFileSync(join(folder, name), "utf8"))
    .join("\n");

describe("the catalogue of messages", () => {
  it("no code stands in two groups", () => {
    const codes = groups.flatMap((group) => Object.keys(group));
    assert.equal(new Set(codes).size, codes.length);
    assert.equal(codes.length, Object.keys(catalogue).length);
  });

  it("every code is raised somewhere, and named in a test", () => {
    // The examples of the pages name every code; to be raised takes more.
    const source = textsBelow("src", join("build", "docs"));
    const tests = textsBelow("test");
    const unraised = Object.keys(catalogue).filter((code) => !source.includes(`"${code}"`));
    assert.deepEqual(unraised, []);
    const untested = Object.keys(catalogue).filter((code) => !new RegExp(`\\b${code}\\b`).test(tests));
    assert.deepEqual(untested, []);
  });

  it("every entry has a line that explains it", () => {
    for (const [code, { help }] of Object.entries(catalogue)) assert.match(help, /^[A-Z“][^\n]{15,}[.)]$/, code);
  });
});
