import assert from "node:assert/strict";
import { dataMessages } from "../../src/contract/messages/data.js";
import type { Problem } from "../../src/contract/problem.js";
import type { ReadOutcome } from "../../src/contract/reader.js";
import { messageOf } from "../../src/contract/words.js";
import { outcomeProblem } from "../../src/data/outcomeProblem.js";
import { resolutionProblem } from "../../src/data/resolutionProblem.js";
import { resolveUri } from "../../src/data/resolve.js";

const origin = { uri: "file:///a.raterun", start: 10, end: 22 };
const words = (one: Problem): string => `${one.severity}: ${messageOf(one)}`;

describe("files that give no bytes", () => {
  const cases: [Exclude<ReadOutcome, { kind: "bytes" }>, string][] = [
    [
      { kind: "missing" },
      "error: There is no file data/a.csv. The path counts from the folder of this description: correct it, or put the file there.",
    ],
    [{ kind: "folder" }, "error: data/a.csv is a folder. Name the data file in it."],
    [
      { kind: "too large", size: 123_456_789 },
      "error: data/a.csv has 123.5 MB, more than the 64.0 MB allowed. Keep fewer readings in it, or raise the limit in the settings.",
    ],
    [
      { kind: "unreadable", reason: "permission is denied" },
      "error: data/a.csv cannot be read: permission is denied. Check who may read it, and whether another program holds it.",
    ],
    [
      { kind: "unreadable", reason: "changed while being read" },
      "error: data/a.csv changed while it was being read. Wait until the instrument has finished writing, then try again.",
    ],
  ];
  for (const [outcome, expected] of cases) {
    it("reason" in outcome ? outcome.reason : outcome.kind, () => {
      assert.equal(words(outcomeProblem(outcome, "data/a.csv", 64_000_000, origin)), expected);
    });
  }
});

describe("paths that lead nowhere", () => {
  const cases: [path: string, expected: string, mends: string[]][] = [
    [
      "C:\\lab\\a.csv",
      "error: C:\\lab\\a.csv is a path of one machine. Write it as seen from the folder of this description, for example data/a.csv.",
      [],
    ],
    ["data\\a.csv", "error: Paths are written with /: data/a.csv in place of data\\a.csv.", ['"data/a.csv"']],
    ["../../a.csv", "error: ../../a.csv leads out of the opened folder. Keep the data file inside it.", []],
    ["", "error: The path is empty. Name the data file, for example data/a.csv.", []],
  ];
  for (const [path, expected, mends] of cases) {
    it(path === "" ? "nothing" : path, () => {
      const resolution = resolveUri("file:///lab/a.raterun", path);
      assert.notEqual(resolution.kind, "uri");
      if (resolution.kind === "uri") return;
      const shown = resolutionProblem(resolution, path, origin);
      assert.equal(words(shown), expected);
      assert.deepEqual(
        (shown.mend ?? []).map((mend) => mend.text),
        mends,
      );
    });
  }
});

describe("the words about data", () => {
  it("have a line of help that ends as a sentence, for every code", () => {
    for (const [code, { help }] of Object.entries(dataMessages)) assert.match(help, /^[A-Z][^\n]{20,}\.$/, code);
  });
});
