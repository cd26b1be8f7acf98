import assert from "node:assert/strict";
import { messageOf } from "../../src/contract/words.js";
import { boundText, mended } from "../support/checkText.js";

/** A line of a run, what is said of it, the words it stands on, and the line after the first mend (null: none offered). */
const lines: readonly (readonly [line: string, code: string, marked: string, mend: string | null])[] = [
  ["volume 50 +/- mL", "uncertainty-unreadable", " ", null],
  ["volume 50(1) +/- 1 mL", "uncertainty-twice", "50(1) +/- 1", null],
  ["volume 50 mL within 0.05", "tolerance-unit", "0.05", "volume 50 mL within 0.05 mL"],
  ["temperature 300 K +/- 1 mL", "uncertainty-unit", "mL", "temperature 300 K +/- 1 K"],
  ["volume 50 mL/(s", "unit-bracket", "(", "volume 50 mL/(s)"],
  ["volume 50 kmin", "unit-prefix", "kmin", "volume 50 min"],
  ["volume 50 blob", "unit-unknown", "blob", null],
  ["volume 50 mL/", "unit-expected", "", null],
  ["volume 50 )", "unit-unreadable", ")", null],
  ["note 3 times", "line-unexpected", "3", 'note "3 times"'],
  ["taken 3H 1 M", "formula-expected", "3H", null],
  ["taken H3[O 1 M", "formula-bracket", "[", null],
  ["taken CH0 1 M", "formula-count", "0", null],
  [`taken ${"(".repeat(40)}H 1 M`, "formula-too-deep", "(", null],
  ["taken H^ 1 M", "charge-unreadable", "^", null],
  ["taken H^3 1 M", "charge-unreadable", "^3", "taken H^3+ 1 M"],
  ["taken H2O(x) 1 M", "state-unknown", "(x)", null],
  ["taken H2Q2 1 M", "name-unknown", "H2Q2", "taken H2O2 1 M"],
  ["taken KI; 1 M", "formula-left-over", ";", null],
  ["date 2026-11-03 noon", "line-left-over", "noon", "date 2026-11-03"],
  ['data "x.csv"\ncolumn t 1 s\ncolumn t 2 s', "name-twice", "t", null],
];

/** The equation of a reaction, what is said of it, on which words, and the equation after the mend. */
const equations: readonly (readonly [equation: string, code: string, marked: string, mend: string | null])[] = [
  ["1.5 H2O2 -> H2O", "coefficient-not-whole", "1.5", "3/2 H2O2 -> H2O"],
  ["H2O2 => H2O + O2", "equation-arrow", "=>", "H2O2 -> H2O + O2"],
  ["H2O2 -> H2O -> O2", "equation-two-arrows", "->", null],
  ["-> H2O", "equation-side", "->", null],
  ["H2O2 ->", "equation-side", "->", null],
  ["H2O2 + -> H2O", "equation-term", "+", null],
  ["H2O2 H2O -> O2", "equation-plus", "H2O", "H2O2 + H2O -> O2"],
  ["H2O2 -> CO2", "no-balance", "H2O2 -> CO2", null],
  ["CO + H2 -> CH4 + H2O + CO2", "many-balances", "CO + H2 -> CH4 + H2O + CO2", null],
];

describe("what is wrong inside a line", () => {
  for (const [line, code, marked, mend] of lines) {
    it(`${line.slice(0, 40).replaceAll("\n", " ")}: ${code}`, () => {
      const text = `reaction 2 H2O2 -> 2 H2O + O2\nrun A\n${line}\n`;
      const found = boundText(text).problems.filter(({ severity }) => severity === "error");
      assert.deepEqual(
        found.map((problem) => [problem.code, text.slice(problem.origin.start, problem.origin.end)]),
        [[code, marked]],
        found.map(messageOf).join("\n"),
      );
      assert.equal(mended(text, found[0]?.code), mend === null ? text : text.replace(line, mend));
    });
  }

  for (const [equation, code, marked, mend] of equations) {
    it(`${equation}: ${code}`, () => {
      const text = `reaction ${equation}\n`;
      const [problem, ...more] = boundText(text).problems;
      assert.deepEqual(more, []);
      assert.equal(problem?.code, code);
      assert.equal(text.slice(problem?.origin.start, problem?.origin.end), marked);
      assert.equal(mended(text), `reaction ${mend ?? equation}\n`);
    });
  }

  it("a time of several parts, told wrongly: time-parts", () => {
    for (const time of ["1 s 30 min", "00:61:00"]) {
      const found = boundText(`run A\nrate at ${time}\n`).problems.find(({ code }) => code === "time-parts");
      assert.ok(found !== undefined && messageOf(found).startsWith(`${time} is not a time`));
    }
  });

  it("a mass of what has no formula: taken-needs-formula; with one it is silent", () => {
    const text = "species dye\nreaction dye -> H2O\nrun A\nvolume 1 L\ntaken dye 2 g\n";
    const codes = (of: string) => boundText(of).problems.map(({ code }) => code);
    assert.deepEqual(codes(text), ["balance-unchecked", "taken-needs-formula"]);
    assert.deepEqual(codes(text.replace("species dye", "species dye is H2O")), []);
  });

  it("a species that comes out as it went in: follow-blind", () => {
    const text =
      'reaction I^- + 2 H2O2 -> 2 H2O + O2 + I^-\nrun A\ndata "x.csv"\ncolumn c 1 M\nfollow I^- as concentration from c\nrate initial\n';
    assert.deepEqual(
      boundText(text).problems.map(({ code }) => code),
      ["follow-blind"],
    );
  });
});
