import assert from "node:assert/strict";
import { exampleDiagnostics, workedExample } from "../../src/build/docs/exampleFindings.js";
import type { ProblemCode } from "../../src/contract/catalogue.js";

/** A description without fault, and its readings; the figures are invented. */
const sound = `reaction 2 H2O2 -> 2 H2O + O2
run A "0.050 M iodide"
  date 2026-11-03
  volume 50.00 mL
  temperature 25.0 °C
  taken H2O2 0.100 mol/L
  taken KI 0.050 mol/L as catalyst
  data "data/a.csv"
    column t "t / s"
    column c "c / mol/L"
  follow H2O2 as concentration from c
  rate from 0 s to 60 s
  fit order 1 in H2O2
`;

const files = {
  "data/a.csv": `t / s,c / mol/L
0,0.1003
20,0.0749
40,0.0551
60,0.0404
80,0.0303
100,0.0221
120,0.0167
140,0.0120
`,
};

interface Mistake {
  readonly what: string;
  /** a stretch of the sound text, and what a newcomer writes there */
  readonly put: readonly [right: string, wrong: string];
  readonly code: ProblemCode;
  /** the words it is said on */
  readonly on: string;
  /** what stands there after the only sensible mend; several: the choice is the writer's; none: only the writer knows */
  readonly mends: readonly string[];
}

/**
 * First mistakes of people who come from a notebook, a spreadsheet or a handbook; which ones are typical is from
 * memory of such texts, not from a count.
 */
const mistakes: readonly Mistake[] = [
  {
    what: "a decimal comma",
    put: ["0.100 mol/L", "0,100 mol/L"],
    code: "number-comma",
    on: "0,100",
    mends: ["0.100 mol/L"],
  },
  {
    what: "a comma that could be a decimal comma or a thousands mark",
    put: ["50.00 mL", "50,000 µL"],
    code: "number-comma",
    on: "50,000",
    mends: ["50.000 µL", "50000 µL"],
  },
  { what: "C for °C", put: ["25.0 °C", "25.0 C"], code: "coulomb-for-celsius", on: "C", mends: ["25.0 °C"] },
  { what: "a bare degree", put: ["25.0 °C", "25.0°"], code: "wrong-dimension", on: "°", mends: ["25.0°C"] },
  {
    what: "= for an arrow",
    put: ["->", "="],
    code: "equation-equals",
    on: "=",
    mends: ["->", "<=>"],
  },
  { what: "=> for an arrow", put: ["->", "=>"], code: "equation-arrow", on: "=>", mends: ["->"] },
  {
    what: "an equation that does not balance",
    put: ["2 H2O2 -> 2 H2O + O2", "H2O2 -> H2O + O2"],
    code: "unbalanced",
    on: "H2O2 -> H2O + O2",
    mends: ["2 H2O2 -> 2 H2O + O2"],
  },
  {
    what: "a nought for the letter O",
    put: ["2 H2O +", "2 H20 +"],
    code: "unbalanced",
    on: "2 H2O2 -> 2 H20 + O2",
    mends: ["2 H2O +", "10 H2O2 -> H20 + 10 O2"],
  },
  {
    what: "a capital keyword",
    put: ["temperature", "Temperature"],
    code: "keyword-capitals",
    on: "Temperature",
    mends: ["temperature"],
  },
  {
    what: "a keyword cut short",
    put: ["temperature", "temp"],
    code: "word-unknown",
    on: "temp",
    mends: ["temperature"],
  },
  {
    what: "a colon behind the keyword",
    put: ["temperature", "temperature:"],
    code: "word-unknown",
    on: "temperature:",
    mends: ["temperature"],
  },
  {
    what: "an equals sign",
    put: ["temperature 25", "temperature = 25"],
    code: "line-unexpected",
    on: "=",
    mends: ["temperature 25"],
  },
  { what: "no unit", put: ["50.00 mL", "50.00"], code: "missing-unit", on: "50.00", mends: ["50.00 mL"] },
  {
    what: "a unit written out",
    put: ["50.00 mL", "50.00 millilitres"],
    code: "unit-unknown",
    on: "millilitres",
    mends: ["50.00 mL"],
  },
  {
    what: "the unit before the number",
    put: ["50.00 mL", "mL 50.00"],
    code: "line-unexpected",
    on: "mL",
    mends: ["50.00 mL"],
  },
  {
    what: "the species behind the quantity",
    put: ["H2O2 0.100 mol/L", "0.100 mol/L H2O2"],
    code: "line-unexpected",
    on: "0.100",
    mends: ["H2O2 0.100 mol/L"],
  },
  {
    what: "a path without quotes",
    put: ['"data/a.csv"', "data/a.csv"],
    code: "line-unexpected",
    on: "data/a.csv",
    mends: ['"data/a.csv"'],
  },
  {
    what: "a title without quotes",
    put: ['"0.050 M iodide"', "0.050 M iodide"],
    code: "line-left-over",
    on: "0.050 M iodide",
    mends: ['"0.050 M iodide"'],
  },
  {
    what: "a forgotten closing quote",
    put: ['iodide"', "iodide"],
    code: "string-open",
    on: '"0.050 M iodide',
    mends: ['iodide"'],
  },
  {
    what: "an unknown word",
    put: ["  rate", '  stirring "300 per minute"\n  rate'],
    code: "word-unknown",
    on: "stirring",
    mends: [],
  },
  {
    what: "a word misspelt",
    put: ["as concentration", "as concentraton"],
    code: "line-unexpected",
    on: "concentraton",
    mends: ["as concentration"],
  },
  {
    what: "the order in words",
    put: ["order 1 in H2O2", "first order"],
    code: "order-in-words",
    on: "first order",
    mends: ["order 1 in H2O2"],
  },
  {
    what: "the order as a word",
    put: ["order 1", "order one"],
    code: "line-unexpected",
    on: "one",
    mends: ["order 1"],
  },
  { what: "of for in", put: ["1 in H2O2", "1 of H2O2"], code: "line-unexpected", on: "of", mends: ["1 in H2O2"] },
  { what: "a column's name misspelt", put: ["from c", "from C"], code: "name-unknown", on: "C", mends: ["from c"] },
  {
    what: "a header misspelt",
    put: ['"c / mol/L"', '"c / mmol/L"'],
    code: "data-column-missing",
    on: '"c / mmol/L"',
    mends: ['"c / mol/L"'],
  },
  {
    what: "another unit than the header's",
    put: ['"c / mol/L"', '"c / mol/L" mL'],
    code: "data-unit-differs",
    on: "mL",
    mends: ['"c / mol/L" mol L^-1'],
  },
  {
    what: "a file that is not there",
    put: ["data/a.csv", "data/b.csv"],
    code: "data-missing",
    on: 'data "data/b.csv"',
    mends: [],
  },
  {
    what: "a run without a name",
    put: ['run A "', 'run "'],
    code: "line-unexpected",
    on: '"0.050 M iodide"',
    mends: [],
  },
  {
    what: "a colon behind the run's name",
    put: ["run A", "run A:"],
    code: "name-malformed",
    on: "A:",
    mends: ["run A"],
  },
  {
    what: "two facts on a line",
    put: ["mL\n  temperature", "mL temperature"],
    code: "line-break-missing",
    on: "temperature",
    mends: ["mL\ntemperature"],
  },
  {
    what: "two facts on a line, with a comma",
    put: ["mL\n  temperature", "mL, temperature"],
    code: "line-break-missing",
    on: "temperature",
    mends: ["mL\ntemperature"],
  },
  {
    what: "a date with the day first",
    put: ["2026-11-03", "3.11.2026"],
    code: "date-malformed",
    on: "3.11.2026",
    mends: ["2026-11-03"],
  },
  {
    what: "a date that could begin with day or month",
    put: ["2026-11-03", "03/11/2026"],
    code: "date-malformed",
    on: "03/11/2026",
    mends: ["2026-11-03", "2026-03-11"],
  },
  {
    what: "a followed species mistyped",
    put: ["follow H2O2", "follow H202"],
    code: "follow-not-in-reaction",
    on: "H202",
    mends: ["follow H2O2"],
  },
  {
    what: "a species in small letters",
    put: ["follow H2O2", "follow h2o2"],
    code: "name-unknown",
    on: "h2o2",
    mends: ["follow H2O2"],
  },
  {
    what: "a share of who knows what",
    put: ["0.100 mol/L", "0.3 %"],
    code: "share-of-what",
    on: "%",
    mends: ["0.3 % by mass", "0.3 % by amount", "0.3 % by volume"],
  },
  {
    what: "a stock of who knows what",
    put: ["0.100 mol/L", "0.512 mL of 30 % density 1.11 g/mL"],
    code: "share-of-what",
    on: "%",
    mends: [
      "0.512 mL of 30 % by mass density 1.11 g/mL",
      "0.512 mL of 30 % by amount density 1.11 g/mL",
      "0.512 mL of 30 % by volume density 1.11 g/mL",
    ],
  },
  {
    what: "a rate for a concentration",
    put: ["0.100 mol/L", "0.100 M/s"],
    code: "wrong-dimension",
    on: "M/s",
    mends: [],
  },
  {
    what: "Fe3+",
    put: ["KI 0.050", "Fe3+ 0.050"],
    code: "charge-ambiguous",
    on: "Fe3+",
    mends: ["Fe^3+ 0.050", "Fe3^+ 0.050"],
  },
  {
    what: "no at before a time",
    put: ["rate from 0 s to 60 s", "rate 60 s"],
    code: "line-unexpected",
    on: "60",
    mends: ["rate at 60 s"],
  },
  {
    what: "an event without quotes",
    put: ["  rate", "  observed blue at 31 s\n  rate"],
    code: "line-unexpected",
    on: "blue",
    mends: ['  observed "blue" at 31 s\n  rate'],
  },
  {
    what: "and between the items of a list",
    put: ["  rate", '  observed "blue" at 31 s and 30 s\n  rate'],
    code: "line-left-over",
    on: "and 30 s",
    mends: ['  observed "blue" at 31 s, 30 s\n  rate'],
  },
  {
    what: "a purity without %",
    put: ["0.100 mol/L", "0.174 g purity 98"],
    code: "share-beyond-whole",
    on: "98",
    mends: ["0.174 g purity 98 %"],
  },
  {
    what: "a density without its unit",
    put: ["0.100 mol/L", "0.512 mL of 30 % by mass density 1.11"],
    code: "missing-unit",
    on: "1.11",
    mends: ["0.512 mL of 30 % by mass density 1.11 g/mL"],
  },
  {
    what: "a dash before each fact",
    put: ["  volume", "- volume"],
    code: "word-unknown",
    on: "-",
    mends: ["volume"],
  },
  {
    what: "a symbol for a keyword",
    put: ["temperature 25.0 °C", "T 25.0 °C"],
    code: "word-unknown",
    on: "T",
    mends: [],
  },
  { what: "one unit for two times", put: ["from 0 s", "from 0"], code: "missing-unit", on: "0", mends: ["from 0 s"] },
];

describe("typical first mistakes of a newcomer", () => {
  it("the text without a mistake earns nothing", async () => {
    assert.deepEqual(await exampleDiagnostics(sound, files, false), []);
  });

  it("mL and ml, u and µ, M and mol/L, ASCII and Unicode are no mistakes", async () => {
    for (const [right, other] of [
      ["50.00 mL", "50.00 ml"],
      ["50.00 mL", "50.00mL"],
      ["0.050 mol/L", "50 mM"],
      ["0.050 mol/L", "50e3 uM"],
      ["25.0 °C", "25.0 degC"],
      ["->", "→"],
      ["H2O2 0.100", "H₂O₂ 0.100"],
    ] as const) {
      assert.ok(sound.includes(right));
      assert.deepEqual(await exampleDiagnostics(sound.replace(right, other), files, false), [], other);
    }
  });

  for (const { what, put, code, on, mends } of mistakes) {
    it(`${what}: ${code} on ${on}, ${mends.length === 0 ? "no mend" : mends.join(" or ")}`, async () => {
      const [right, wrong] = put;
      assert.ok(sound.includes(right));
      const text = sound.replace(right, () => wrong);
      const found = await workedExample(code, { text, files });
      const [first, ...others] = found.diagnostics;
      assert.deepEqual(others, []);
      assert.ok(first !== undefined, "nothing is said");
      assert.equal(first.code, code, first.message);
      assert.equal(wordsAt(text, first), on);
      const texts = first.mends.map(({ edits }) => edited(text, edits));
      assert.deepEqual(
        texts,
        mends.map((mend) =>
          mend.includes("->") && right !== "->" ? sound.replace(/2 H2O2.*/, mend) : sound.replace(right, () => mend),
        ),
      );
      if (texts.length !== 1) return;
      const after = await exampleDiagnostics(texts[0] ?? "", files, false);
      // That an event is kept and not computed yet is no mistake of the writer's.
      assert.deepEqual(
        after.filter(({ code: left }) => left !== "not-computed-yet"),
        [],
      );
    });
  }
});

interface Place {
  readonly line: number;
  readonly column: number;
  readonly endLine: number;
  readonly endColumn: number;
}

function offsets(text: string, place: Place): [start: number, end: number] {
  const starts = [0, ...[...text.matchAll(/\n/g)].map(({ index }) => index + 1)];
  const offset = (line: number, column: number): number => (starts[line - 1] ?? text.length) + column - 1;
  return [offset(place.line, place.column), offset(place.endLine, place.endColumn)];
}

function wordsAt(text: string, place: Place): string {
  return text.slice(...offsets(text, place));
}

function edited(text: string, edits: readonly (Place & { readonly text: string })[]): string {
  return edits
    .map((edit) => ({ words: edit.text, at: offsets(text, edit) }))
    .sort((a, b) => b.at[0] - a.at[0])
    .reduce((now, { words, at: [start, end] }) => now.slice(0, start) + words + now.slice(end), text);
}
