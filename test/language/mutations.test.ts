import assert from "node:assert/strict";
import { readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { messageOf } from "../../src/contract/words.js";
import { type Random, seededRandom } from "../../src/numerics/random.js";
import { boundText } from "../support/checkText.js";

const samples = readdirSync("samples")
  .filter((name) => name.endsWith(".raterun"))
  .map((name) => readFileSync(join("samples", name), "utf8"));

const pieces = [
  " ",
  "\n",
  '"',
  "#",
  ",",
  "->",
  "±",
  "(",
  ")",
  "^",
  "-",
  "µ",
  "🧪",
  "\ud83e",
  "₂",
  "1e999",
  "0",
  "run",
  "fit",
  "in",
  "\r\n",
  "\t",
  "%",
  "like",
  "°C",
  "\u0000",
  "…",
];

/** One random change: a piece put in, taken out, doubled, swapped, or a line moved. */
function mutated(text: string, random: Random): string {
  const at = random.integer(text.length + 1);
  const length = 1 + random.integer(12);
  switch (random.integer(6)) {
    case 0:
      return text.slice(0, at) + text.slice(at + length);
    case 1:
      return text.slice(0, at) + (pieces[random.integer(pieces.length)] ?? "") + text.slice(at);
    case 2:
      return text.slice(0, at) + text.slice(at, at + length) + text.slice(at);
    case 3:
      return text.slice(0, at);
    case 4: {
      const lines = text.split("\n");
      const [taken = ""] = lines.splice(random.integer(lines.length), 1);
      lines.splice(random.integer(lines.length + 1), 0, taken);
      return lines.join("\n");
    }
    default:
      return text.slice(0, at) + String.fromCharCode(random.integer(0x3000)) + text.slice(at + 1);
  }
}

describe("10,000 random mutations of the samples", function () {
  this.timeout(60_000);
  it("nothing throws, nothing hangs, every problem lies inside the text and has words", () => {
    const random = seededRandom(20_261_201);
    let slowest = 0;
    for (let round = 0; round < 10_000; round++) {
      let text = samples[round % samples.length] ?? "";
      for (let change = 1 + random.integer(4); change > 0; change--) text = mutated(text, random);
      const begun = performance.now();
      const { problems } = boundText(text);
      slowest = Math.max(slowest, performance.now() - begun);
      for (const problem of problems) {
        const { start, end } = problem.origin;
        assert.ok(start >= 0 && start <= end && end <= text.length, `${problem.code} ${start} ${end} in\n${text}`);
        assert.ok(
          messageOf(problem).length > 10 && !/undefined|NaN|\[object/.test(messageOf(problem)),
          messageOf(problem),
        );
        for (const edit of problem.mend?.flatMap(({ edits }) => edits) ?? []) {
          assert.ok(edit.start >= 0 && edit.start <= edit.end && edit.end <= text.length, problem.code);
        }
      }
    }
    // Not a measure of speed: whatever takes a second on a text of 30 lines hangs on a longer one.
    assert.ok(slowest < 1000, `${slowest} ms`);
  });
});
