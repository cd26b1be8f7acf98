import assert from "node:assert/strict";
import { readdirSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { messageOf } from "../../src/contract/words.js";
import {
  type FormatNotation,
  type FormatOptions,
  formatEdits,
  formatText,
} from "../../src/language/format/formatText.js";
import { layOut } from "../../src/language/format/layOut.js";
import { refusal } from "../../src/language/format/refusal.js";
import { essenceOf, hasEssence } from "../../src/language/format/sameMeaning.js";
import { meaningOf } from "../../src/language/meaning.js";
import { parse } from "../../src/language/parse.js";
import { boundText, uri } from "../support/checkText.js";

const samples = readdirSync("samples").filter((name) => name.endsWith(".raterun"));
const notations: readonly FormatNotation[] = ["unicode", "ascii"];

function formatted(text: string, notation: FormatNotation = "ascii", lines?: FormatOptions["lines"]): string {
  const result = formatText(uri, text, lines === undefined ? { notation } : { notation, lines });
  assert.ok(result.ok, result.ok ? "" : messageOf(result.problem));
  return result.value;
}

/** A run with one line in it, formatted; that line. */
function oneLine(line: string, notation: FormatNotation, above = ""): string {
  const before = `${above}reaction 2 H2O2 -> 2 H2O + O2\nrun A\n`;
  return formatted(`${before}${line}\n`, notation).trimEnd().split("\n").at(-1)?.trim().replace(/ {2,}/g, "  ") ?? "";
}

describe("the layout", () => {
  // The sample of the language, as far as its layout goes; figures invented.
  const laidOut = `ratewright 1
# Iodide-catalysed decomposition of hydrogen peroxide
reaction  2 H2O2(aq) -> 2 H2O(l) + O2(g)

run A "0.050 M iodide, 25 °C"
  date         2026-11-03
  volume       50.00 mL within 0.05 mL
  temperature  25.0(1) degC
  taken        H2O2  0.100(2) mol/L
  taken        KI    0.0500 +/- 0.0005 mol/L  as catalyst
  data         "data/a.csv"
    column     t     "time / s"   s
      random   0.1 s
    column     left  "c / mol/L"  mol/L
  follow       H2O2 as concentration from left
  rate         from 0 s to 60 s
  rate         at 20 s
  rate         initial
  fit          order 1 in H2O2
    window     5 s to 600 s
    infinity   free

run B like A "0.025 M iodide"
  taken        KI  0.0250 +/- 0.0005 mol/L  as catalyst
  data         "data/b.csv"
`;

  it("sets a text without any: two spaces a level, values of a section in one column, cells below each other", () => {
    const flat = laidOut.replace(/^ +/gm, "").replace(/ {2,}/g, " ");
    assert.equal(formatted(flat), laidOut);
    assert.equal(formatted(laidOut), laidOut);
  });

  it("sets a text with wrong indentation, tabs and stray spaces alike", () => {
    const wild = laidOut
      .split("\n")
      .map((line, at) => (line === "" || line.startsWith("#") ? line : `${"\t ".repeat(at % 4)}${line.trim()}  \t`))
      .join("\n")
      .replace(/ {2}(?=")/g, "\t\t");
    assert.equal(formatted(wild), laidOut);
  });

  it("lines of two words, lists, tables of runs, series and mechanisms", () => {
    // Invented, as every figure here.
    const text = `calibration tri of I2
  standard     10.0 umol/L reads 0.213, 0.215
  standard     5 umol/L reads 0.1, 0.11
results in mmol/L, min

run A
  ionic strength      0.10 mol/L
  taken               HCl  5.0 mL of 30 % by mass density 1.11 g/mL giving H^+, Cl^- as inert
  data                "data/a.csv"
    column            gas  "V / mL"  mL
    exclude           line 17 because "bubble"
  follow              O2 as gas volume from gas
    level difference  35 mm
  observed            "blue" at 31.2 s, 30.8 s
    after             S2O3^2- used up
  fit                 order 1 in H2O2, then order 1 in OH^-

rows of "t.csv" like A
  taken        KI  from "c(KI) / mol L^-1"
  temperature  from "T / °C"

series iodide
  across       A, "more/*.raterun"
  order        in KI by initial rate
  salt effect

mechanism m
  step         one is H2O2 + I^- -> H2O + IO^-
    forward    2.0e-3 s^-1
    reverse    free in common
`;
    const flat = text
      .replace(/^ +/gm, "")
      .replace(/ {2,}/g, " ")
      .replace(/, (?=\D)/g, " ,  ");
    assert.equal(formatted(flat), text);
    const unicode = formatted(flat, "unicode");
    for (const signs of ["5 µmol/L", "giving H⁺, Cl⁻", "S2O3²⁻ used", "in OH⁻", "H2O2 + I⁻ → H2O + IO⁻", "s⁻¹"]) {
      assert.ok(unicode.includes(signs), signs);
    }
    assert.equal(formatted(unicode), text);
  });

  it("a head longer than usual widens its own section only", () => {
    assert.equal(
      formatted(
        "volume 5 mL\ndate 2026-11-03\n\nrun A\nactivation energy 52 kJ/mol\nvolume 5 mL\nrun B\nvolume 6 mL\n",
      ),
      [
        "volume  5 mL",
        "date    2026-11-03",
        "",
        "run A",
        "  activation energy  52 kJ/mol",
        "  volume             5 mL",
        "run B",
        "  volume       6 mL",
        "",
      ].join("\n"),
    );
  });

  it("lines at the margin share a column up to a blank line; the version and headers stand by themselves", () => {
    const text = "ratewright 1\nspecies A\nreaction A -> B\nspecies B\n\nreaction H^+ + OH^- -> H2O\nrun A\n";
    assert.equal(
      formatted(text),
      "ratewright 1\nspecies   A\nreaction  A -> B\nspecies   B\n\nreaction  H^+ + OH^- -> H2O\nrun A\n",
    );
  });

  it("one blank line of several stays; at the beginning and the end of the file none", () => {
    assert.equal(formatted("\n\t\n\nrun A\n\n  \n\n volume 5 mL\n\n\n"), "run A\n\n  volume       5 mL\n");
    assert.equal(formatted("\n \n"), "");
    assert.equal(formatted(""), "");
  });

  it("quotes become straight, what stands between them stays letter by letter", () => {
    assert.equal(
      oneLine("note  “ two  spaces,\ttab, 5 µL -> ± # none „", "ascii"),
      'note  " two  spaces,\ttab, 5 µL -> ± # none "'.replace(/ {2,}/g, "  "),
    );
    assert.ok(formatted('run A\nnote "a  b\tc"').endsWith('note         "a  b\tc"\n'));
  });

  it("letters of two units and combining marks count as the places they take", () => {
    const text = formatted('run A\ndata "a.csv"\ncolumn ee "e\u0301𝒌" s\ncolumn lmno "abcd" mL\n');
    assert.match(text, / {2}ee {4}"e\u0301𝒌" {4}s\n/);
    assert.match(text, / {2}lmno {2}"abcd" {2}mL\n/);
  });
});

describe("comments", () => {
  it("stay with what they stand above, or behind", () => {
    assert.equal(
      formatted("#a\nrun A#b\n      #  c  \n#d\nvolume 5 mL # e\t\n    # f\n\n#g\n\nrun B\n  # h"),
      "#a\nrun A  #b\n  #  c\n  #d\n  volume       5 mL  # e\n  # f\n\n#g\n\nrun B\n  # h\n",
    );
  });

  it("a line taken out by # at the end of a run stays in the run, at the margin if it stands there", () => {
    const text = "run A\n  volume       5 mL\n  # rate       initial\n# at the margin\n\nrun B\n";
    assert.equal(formatted(text), text);
  });
});

describe("line ends", () => {
  it("LF, CRLF and both in one file stay; the last line gets one; a lone CR becomes the one the file has", () => {
    assert.equal(formatted("run A\r\n volume 5 mL\r\n\r\n\r\nrun B"), "run A\r\n  volume       5 mL\r\n\r\nrun B\r\n");
    assert.equal(formatted("run A\r\nvolume 5 mL\n"), "run A\r\n  volume       5 mL\n");
    assert.equal(formatted("run A\rvolume 5 mL\r\n"), "run A\r\n  volume       5 mL\r\n");
    assert.equal(formatted("run A"), "run A\n");
  });

  it("a byte order mark stays", () => {
    assert.equal(formatted("\ufeff run A\n"), "\ufeffrun A\n");
    assert.equal(formatted("\ufeffrun A\n"), "\ufeffrun A\n");
  });
});

describe("either notation", () => {
  const pairs: readonly (readonly [written: string, unicode: string, ascii: string])[] = [
    ["volume 50.00 mL +/- 0.05 mL", "volume  50.00 mL ± 0.05 mL", "volume  50.00 mL +/- 0.05 mL"],
    ["volume 5.0±0.1 mL", "volume  5.0 ± 0.1 mL", "volume  5.0 +/- 0.1 mL"],
    ["volume 12uL", "volume  12 µL", "volume  12 uL"],
    ["volume 12 μL", "volume  12 µL", "volume  12 uL"],
    ["volume 5 cm3", "volume  5 cm³", "volume  5 cm3"],
    ["volume 5 cm^3", "volume  5 cm³", "volume  5 cm^3"],
    ["volume 5e-2 dm³", "volume  5e-2 dm³", "volume  5e-2 dm^3"],
    ["volume 5.0(1)e-2 L", "volume  5.0(1)e-2 L", "volume  5.0(1)e-2 L"],
    ["volume 5.0×10^-2 L", "volume  5.0×10⁻² L", "volume  5.0e-2 L"],
    ["volume 5.0x10^-2L", "volume  5.0×10⁻² L", "volume  5.0x10^-2 L"],
    ["temperature 25degC", "temperature  25 °C", "temperature  25 degC"],
    ["temperature 25 ℃", "temperature  25 °C", "temperature  25 degC"],
    ["temperature −5 °C", "temperature  −5 °C", "temperature  -5 degC"],
    ["taken H2O2 1 mol L^-1", "taken  H2O2  1 mol L⁻¹", "taken  H2O2  1 mol L^-1"],
    ["taken H2O2 1 mol*L-1", "taken  H2O2  1 mol·L⁻¹", "taken  H2O2  1 mol*L-1"],
    ["taken H2O2 1 mol·dm⁻³", "taken  H2O2  1 mol·dm⁻³", "taken  H2O2  1 mol*dm^-3"],
    ["taken H₂O₂ 1\u00a0mol/L", "taken  H₂O₂  1 mol/L", "taken  H2O2  1 mol/L"],
    ["taken SO4^2- 1 mM as inert", "taken  SO4²⁻  1 mM  as inert", "taken  SO4^2-  1 mM  as inert"],
    ["taken OH⁻ 1 mM as inert", "taken  OH⁻  1 mM  as inert", "taken  OH^-  1 mM  as inert"],
    ["taken CuSO4·5H2O 1 g as inert", "taken  CuSO4·5H2O  1 g  as inert", "taken  CuSO4.5H2O  1 g  as inert"],
    ["rate from 0 s to 1\u202f200 s", "rate  from 0 s to 1\u202f200 s", "rate  from 0 s to 1200 s"],
    ["rate at 1min 30s", "rate  at 1 min 30 s", "rate  at 1 min 30 s"],
    ["rate at 00:01:30", "rate  at 00:01:30", "rate  at 00:01:30"],
  ];

  it("signs are written one way or the other, units keep their style", () => {
    for (const [written, unicode, ascii] of pairs) {
      assert.deepEqual([oneLine(written, "unicode"), oneLine(written, "ascii")], [unicode, ascii], written);
    }
  });

  it("what is formatted is formatted; one notation leads to the other, and both mean what was written", () => {
    for (const [written] of pairs) {
      const text = `reaction 2 H2O2 -> 2 H2O + O2\nrun A\n${written}\n`;
      const { meaning, codes } = essenceOf(boundText(text));
      for (const notation of notations) {
        const once = formatted(text, notation);
        assert.equal(formatted(once, notation), once, written);
        assert.equal(meaningOf(boundText(formatted(formatted(once, "ascii"), "unicode")).study), meaning);
        const after = essenceOf(boundText(once));
        assert.deepEqual([after.meaning, after.codes], [meaning, codes], written);
      }
    }
  });

  it("equations: arrows, spaces, charges, fractions; what cannot be read stays letter by letter", () => {
    const equations = [
      ["2H2O2(aq)->2H2O(l)+O2(g)", "2 H2O2(aq) → 2 H2O(l) + O2(g)", "2 H2O2(aq) -> 2 H2O(l) + O2(g)"],
      ["H^+  +  OH^-  ⇌ H2O", "H⁺ + OH⁻ ⇌ H2O", "H^+ + OH^- <=> H2O"],
      ["H2O2 → H2O + ½ O2", "H2O2 → H2O + ½ O2", "H2O2 -> H2O + 1/2 O2"],
      ["H2O2 -> H2O + +  O2", "H2O2 -> H2O + +  O2", "H2O2 -> H2O + +  O2"],
    ] as const;
    for (const [written, unicode, ascii] of equations) {
      assert.equal(formatted(`reaction ${written}`, "unicode"), `reaction  ${unicode}\n`);
      assert.equal(formatted(`reaction ${written}`, "ascii"), `reaction  ${ascii}\n`);
    }
  });

  it("declared names are never respelled, though they look like formulas", () => {
    const text = "species   I₂\nreaction  I₂ -> B\nspecies   B\n";
    assert.equal(formatted(text, "ascii"), text);
    assert.equal(oneLine("taken I₂ 1 mM as inert", "ascii", "species I₂\n"), "taken  I₂  1 mM  as inert");
  });

  it("names of columns and runs are never respelled", () => {
    assert.equal(oneLine('data "a.csv"\ncolumn c₂ "c"', "ascii"), 'column  c₂  "c"');
  });
});

describe("what is left alone", () => {
  it("lines with a fault, and lines that nothing takes, letter by letter", () => {
    const broken = ' volum\t5 mL\n   temperature 25 C\n\tnote "open  \n rate  from 0 s  to\n';
    const text = `reaction  2 H2O2 -> 2 H2O + O2\nrun A\n${broken}  taken H2O2 1 mM\n`;
    assert.equal(formatted(text), `reaction  2 H2O2 -> 2 H2O + O2\nrun A\n${broken}  taken        H2O2  1 mM\n`);
    const orphan = "   window   5 s to 600 s\nreaction  2 H2O2 -> 2 H2O + O2\n";
    assert.equal(formatted(orphan), orphan);
  });

  it("two facts on one line", () => {
    const text = "run A\nvolume  5 mL  temperature  25 degC\n";
    assert.equal(formatted(text), text);
  });

  it("a broken line moves no value of the lines around it when it is mended", () => {
    const text = formatted("run A\n  volume 5 mL\n  temperature 25 C\n");
    assert.equal(text, "run A\n  volume       5 mL\n  temperature 25 C\n");
  });
});

describe("safety", () => {
  it("tells a text that means something else, says something else, or lost a comment", () => {
    const text = "reaction 2 H2O2 -> 2 H2O + O2\nrun A # first\n  volume 5 mL\n  taken H2O2 1 mM\n";
    const essence = essenceOf(boundText(text));
    assert.ok(hasEssence(uri, text.replaceAll("  ", "\t"), essence));
    assert.ok(!hasEssence(uri, text.replace("5 mL", "6 mL"), essence));
    assert.ok(!hasEssence(uri, text.replace("# first", ""), essence));
    assert.ok(!hasEssence(uri, text.replace("# first", "# fist"), essence));
    assert.ok(!hasEssence(uri, text.replace("volume", "volum"), essence));
    assert.ok(!hasEssence(uri, `${text}  volume 5 mL\n`, essence));
  });

  it("a refusal names the line: format-refused", () => {
    const parsed = parse(uri, "run A\n  volume 5 mL\n  temperature 25 degC\n");
    const wrong = layOut(parsed, "ascii").map(({ line, text }) => ({ line, text: text?.replace("25", "26") ?? null }));
    const found = refusal(uri, wrong);
    assert.equal(found.code, "format-refused");
    assert.match(messageOf(found), /meaning of line 3\b.*nothing was changed/);
    assert.deepEqual([found.origin.start, found.origin.end], [20, 41]);
  });
});

describe("the samples", () => {
  for (const name of samples) {
    for (const notation of notations) {
      it(`${name} in ${notation}: formats to itself, means the same, keeps problems and comments`, () => {
        const text = readFileSync(join("samples", name), "utf8");
        const once = formatted(text, notation);
        assert.equal(formatted(once, notation), once);
        assert.equal(meaningOf(boundText(once).study), meaningOf(boundText(text).study));
        const codes = (of: string): string[] => boundText(of).problems.map(({ code }) => code);
        assert.deepEqual(codes(once), codes(text));
        const comments = (of: string): string[] => of.match(/#.*$/gm) ?? [];
        assert.deepEqual(comments(once), comments(text));
        const outside = once.replace(/"[^"\n]*"|#.*$/gm, "");
        if (notation === "ascii" && !name.includes("planted")) assert.match(outside, /^[\n -~]*$/);
        if (notation === "unicode") assert.doesNotMatch(outside, /->|\+\/-|\bdeg|\^\d*-/);
      });
    }
  }
});

describe("a selection", () => {
  const text = "run A\nvolume 5 mL\n\n\ntemperature 25 degC\nnote   'x'\nrate   initial\n";

  it("changes only the lines it touches, as formatting the whole would", () => {
    assert.equal(
      formatted(text, "ascii", { first: 4, last: 5 }),
      "run A\nvolume 5 mL\n\n\n  temperature  25 degC\nnote   'x'\nrate   initial\n",
    );
    assert.equal(formatted(text, "ascii", { first: 2, last: 3 }), text.replace("\n\n\n", "\n\n"));
  });

  it("edits are in order, apart, and inside whole lines", () => {
    const edits = formatEdits(uri, text, { notation: "ascii" });
    assert.ok(edits.ok);
    let at = 0;
    for (const { start, end } of edits.value) {
      assert.ok(start >= at && end >= start && end <= text.length);
      assert.ok(start === 0 || text[start - 1] === "\n");
      at = end;
    }
    assert.equal(edits.value.length, 4);
    const again = formatEdits(uri, formatted(text), { notation: "ascii" });
    assert.deepEqual(again.ok && again.value, []);
  });
});
