import assert from "node:assert/strict";
import { readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { type FormatNotation, formatText } from "../../src/language/format/formatText.js";
import { essenceOf } from "../../src/language/format/sameMeaning.js";
import { sheetOf } from "../../src/language/format/sheet.js";
import { parse } from "../../src/language/parse.js";
import { type Owner, statements } from "../../src/language/statements.js";
import { type Random, seededRandom } from "../../src/numerics/random.js";
import { boundText, uri } from "../support/checkText.js";

const samples = readdirSync("samples")
  .filter((name) => name.endsWith(".raterun"))
  .map((name) => readFileSync(join("samples", name), "utf8"));
/** Every example of the language below a header that owns it. */
const whole = linesBelow("file").join("\n");
const texts = [...samples, `${whole}\n`];
const examples = statements.map(({ example }) => example);
const pieces = [
  ...' |  |\t|\n|\n\n|\r\n|\r|\u00a0|\u2009|\u202f|\ufeff|“|”|"|#|# c|,|, |->|→|⇌|<=>|±|+/-|+-|^|^-|⁻|²|₂|·|*|µ|u|°|deg|×10⁻³|e-3|\u2212'.split(
    "|",
  ),
  ..."1|(2)|0.5|10|mL|mol L-1|dm3| as inert| within 1 mL|species I₂ is I2\n|run B like A\n|window 1 s to 2 s\n".split(
    "|",
  ),
];

/** One random change: a piece put in, a stretch taken out or doubled, a line moved, an example of the language put in. */
function mutated(text: string, random: Random): string {
  const at = random.integer(text.length + 1);
  const length = 1 + random.integer(10);
  const lines = text.split("\n");
  switch (random.integer(7)) {
    case 0:
      return text.slice(0, at) + text.slice(at + length);
    case 1:
      return text.slice(0, at) + text.slice(at, at + length) + text.slice(at);
    case 2: {
      const [taken = ""] = lines.splice(random.integer(lines.length), 1);
      lines.splice(random.integer(lines.length + 1), 0, taken);
      return lines.join("\n");
    }
    case 3:
      lines.splice(random.integer(lines.length + 1), 0, examples[random.integer(examples.length)] ?? "");
      return lines.join("\n");
    default:
      return text.slice(0, at) + (pieces[random.integer(pieces.length)] ?? "") + text.slice(at);
  }
}

function linesBelow(owner: Owner): string[] {
  const rows = statements.filter(
    ({ owners }) => (owner === "file" ? owners.length === 1 : true) && owners.includes(owner),
  );
  return rows.flatMap(({ example, opens }) => [example, ...(opens === undefined ? [] : linesBelow(opens))]);
}

describe("3,000 random mutations of the samples and of a text with every line of the language", () => {
  it("format to what formats to itself, means the same, and has the same problems and comments", () => {
    const random = seededRandom(20_261_203);
    for (let round = 0; round < 3_000; round++) {
      let text = texts[round % texts.length] ?? "";
      for (let change = 1 + random.integer(5); change > 0; change--) text = mutated(text, random);
      const notation: FormatNotation = round % 2 === 0 ? "unicode" : "ascii";
      const once = formatText(uri, text, { notation });
      assert.ok(once.ok, `refused:\n${text}`);
      const twice = formatText(uri, once.value, { notation });
      assert.equal(twice.ok && twice.value, once.value, `not idempotent in ${notation}:\n${JSON.stringify(text)}`);
      assert.deepEqual(essenceOf(boundText(once.value)), essenceOf(boundText(text)), JSON.stringify(text));
    }
  }).timeout(60_000);
});

describe("the text with every line of the language", () => {
  it("has the layout of the table: each line two spaces below its header", () => {
    const result = formatText(uri, whole, { notation: "ascii" });
    assert.ok(result.ok);
    const sheet = sheetOf(parse(uri, result.value));
    const sound = sheet.filter(({ place }) => place !== null && place.line !== null);
    assert.ok(sound.length > statements.length * 0.9, `${sound.length} of ${statements.length}`);
    for (const { text, place } of sound) assert.equal(text.search(/\S/), 2 * (place?.depth ?? 0), text);
    assert.ok(sound.some(({ place }) => place?.depth === 3));
  });
});

describe("every example of the statement table", () => {
  for (const notation of ["unicode", "ascii"] as const) {
    it(`formats to itself in ${notation}`, () => {
      for (const { head, example, owners } of statements) {
        const text = owners.includes("file") ? `${example}\n` : textWith(head, example);
        const once = formatText(uri, text, { notation });
        assert.ok(once.ok, example);
        const twice = formatText(uri, once.value, { notation });
        assert.equal(twice.ok && twice.value, once.value, example);
        assert.deepEqual(essenceOf(boundText(once.value)), essenceOf(boundText(text)), example);
      }
    });
  }
});

/** An example below the headers it needs, found by way of the table. */
function textWith(head: string, example: string): string {
  let text = `${example}\n`;
  let row = statements.find((candidate) => candidate.head === head);
  while (row !== undefined && !row.owners.includes("file")) {
    const owner: string | undefined = row.owners[0];
    row = statements.find(({ opens }) => opens === owner);
    if (row !== undefined) text = `${row.example}\n${text}`;
  }
  return text;
}
