import assert from "node:assert/strict";
import { mended, saidOf } from "../support/checkText.js";

const base = `reaction 2 H2O2 -> 2 H2O + O2
run A
  volume 50 mL
  temperature 25 °C
  taken H2O2 0.1 mol/L
  data "a.csv"
    column t "t / s" s
    column c "c" mol/L
  follow H2O2 as concentration from c
  rate initial
  fit order 1 in H2O2
`;

interface Case {
  /** a stretch of the sound text and what stands there instead */
  readonly put: readonly [string, string];
  /** what is said, `code “marked words”: message`; only the beginnings are compared */
  readonly said: readonly string[];
  /** what stands there after the first mend; a pair: what it puts in place of what in the broken text; null: none */
  readonly mend: string | null | readonly [string, string];
}

const cases: readonly Case[] = [
  {
    put: ["50 mL", "50 s"],
    said: ["wrong-dimension “s”: Volume needs a unit of volume (L, mL, m³ …); s is a unit of time."],
    mend: null,
  },
  { put: ["50 mL", "50"], said: ["missing-unit “50”: Volume needs a unit of volume"], mend: "50 mL" },
  { put: ["volume 50 mL", "volume"], said: ["line-incomplete “volume”: After “volume” a volume"], mend: null },
  { put: ["50 mL", "-50 mL"], said: ["number-below-zero “-50 mL”: Volume must be more than zero."], mend: null },
  { put: ["50 mL", "0,5 L"], said: ["number-comma “0,5”: A comma between digits"], mend: "0.5 L" },
  {
    put: ["volume 50 mL\n  temperature", "volume 50 mL temperature"],
    said: ["line-break-missing “temperature”: Start a new line before “temperature”."],
    mend: "volume 50 mL\ntemperature",
  },
  {
    put: ["volume 50", "Volume 50"],
    said: ["keyword-capitals “Volume”: Keywords are written small: volume."],
    mend: "volume 50",
  },
  { put: ["volume", "volum"], said: ["word-unknown “volum”: “volum” begins no line here."], mend: "volume" },
  { put: ["run A", "rnu A"], said: ["word-unknown “rnu”: “rnu” begins no line here."], mend: "run A" },
  {
    put: ["  volume 50 mL\n", "  volume 50 mL\n  volume 60 mL\n"],
    said: ["line-twice “volume 60 mL”: volume is stated twice here; it already stands on line 3."],
    mend: null,
  },
  {
    put: ["25 °C", "25 C"],
    said: ["coulomb-for-celsius “C”: C is coulomb, a unit of charge; temperature needs °C or K."],
    mend: "25 °C",
  },
  {
    put: ["25 °C", "-300 °C"],
    said: ["number-below-zero “-300 °C”: Temperature must be above absolute zero."],
    mend: null,
  },
  {
    put: ["2 H2O2 -> 2 H2O + O2", "H2O2 -> H2O + O2"],
    said: ["unbalanced “H2O2 -> H2O + O2”: Oxygen does not balance: 2 on the left, 3 on the right."],
    mend: "2 H2O2 -> 2 H2O + O2",
  },
  {
    put: ["->", "="],
    said: ["equation-equals “=”: = does not say whether the reaction goes back."],
    mend: "->",
  },
  { put: ["->", ""], said: ["equation-no-arrow “2 H2O2  2 H2O + O2”: An equation needs an arrow"], mend: null },
  { put: ["run A", "run"], said: ["line-incomplete “run”: After “run” a name for the run is missing."], mend: null },
  { put: ["run A", 'run "A"'], said: ["line-unexpected “"], mend: "run A" },
  {
    put: ["run A", 'run A "title'],
    said: ['string-open “"title”: The quotation mark is not closed.'],
    mend: 'run A "title"',
  },
  { put: ["run A", "run from"], said: ["name-malformed “from”: “from” cannot be the name of a run."], mend: null },
  { put: ["run A", "run A like A"], said: ["like-itself “A”: Run A cannot start like itself."], mend: null },
  {
    put: ["run A", "run A like B"],
    said: ["name-unknown “B”: There is no run B here; no other run stands above."],
    mend: null,
  },
  {
    put: ["H2O2 0.1 mol/L", "H2O2 30 %"],
    said: ["share-of-what “%”: 30 % of what: by mass, by amount or by volume?"],
    mend: "H2O2 30 % by mass",
  },
  {
    put: ["H2O2 0.1 mol/L", "Fe3+ 0.1 mol/L as inert"],
    said: ["charge-ambiguous “Fe3+”: Fe3+ could be iron(III), Fe^3+, or three irons, Fe3^+."],
    mend: "Fe^3+ 0.1 mol/L as inert",
  },
  {
    put: ["H2O2 0.1 mol/L", "Xx 0.1 mol/L"],
    said: ["species-unknown “Xx”: Xx is no formula"],
    mend: ["reaction", "species Xx\nreaction"],
  },
  {
    put: ["H2O2 0.1 mol/L", "KI 0.1 mol/L"],
    said: ["taken-takes-no-part “KI”: KI takes no part in the reaction as it is written."],
    mend: "KI 0.1 mol/L as catalyst",
  },
  {
    put: ["H2O2 0.1 mol/L", "H2O2 0.1 mol/L as catalist"],
    said: ["line-unexpected “catalist”: “catalist” is not understood after “as”;"],
    mend: "H2O2 0.1 mol/L as catalyst",
  },
  {
    put: ["H2O2 0.1 mol/L", "H2O2 0.1 mol/L/s"],
    said: ["unit-ambiguous “mol/L/s”: mol/L/s could be mol/(L s) or mol s/L;"],
    mend: "H2O2 0.1 mol/(L s)",
  },
  {
    put: ["  taken H2O2 0.1 mol/L\n", "  taken H2O2 0.1 mol/L\n  taken H2O2(aq) 0.2 M\n"],
    said: ["line-twice “H2O2(aq)”: taken H2O2(aq) is stated twice here;"],
    mend: null,
  },
  {
    put: ['data "a.csv"', "data a.csv"],
    said: ["line-unexpected “a.csv”: “a.csv” is not understood after “data”;"],
    mend: 'data "a.csv"',
  },
  {
    put: ['column c "c"', 'column "c"'],
    said: ['line-unexpected “"c"”: “c” is not understood after “column”;'],
    mend: null,
  },
  { put: ["column c", "colum c"], said: ["word-unknown “colum”: “colum” begins no line here."], mend: "column c" },
  {
    put: ["from c", "from d"],
    said: ["name-unknown “d”: There is no column d here; there are t, c."],
    mend: null,
  },
  {
    put: ["follow H2O2", "follow KI"],
    said: [
      "follow-not-in-reaction “KI”: KI takes no part in the reaction, so its concentration tells nothing about it.",
    ],
    mend: null,
  },
  {
    put: ["as concentration", "as concentraton"],
    said: ["line-unexpected “concentraton”: “concentraton” is not understood after “as”;"],
    mend: "as concentration",
  },
  { put: ["rate initial", "rate initail"], said: ["line-unexpected “initail”"], mend: "rate initial" },
  { put: ["rate initial", "rate at 5"], said: ["missing-unit “5”: Time needs a unit of time"], mend: "rate at 5 s" },
  {
    put: ["rate initial", "rate from 5 s to 2 s"],
    said: ["span-empty “rate from 5 s to 2 s”: The span from 5 s to 2 s is empty"],
    mend: null,
  },
  {
    put: ["order 1 in H2O2", "first order"],
    said: ["order-in-words “first order”: Give the order as a number and say in what: order 1 in H2O2."],
    mend: "order 1 in H2O2",
  },
  {
    put: ["order 1 in H2O2", "order 2 in H2O2"],
    said: ["fit-not-computed “fit order 2 in H2O2”: “order 2 in H2O2” is understood and kept; not computed yet."],
    mend: null,
  },
  {
    put: ["order 1 in H2O2", "order 1 in O2"],
    said: ["fit-not-in-reaction “O2”: The reaction does not use up O2"],
    mend: null,
  },
  {
    put: ["  fit order 1 in H2O2\n", "  window 5 s to 9 s\n"],
    said: ["line-misplaced “window”: “window” belongs below a fit line"],
    mend: null,
  },
  {
    put: ["  follow H2O2 as concentration from c\n", ""],
    said: ["run-lacks-follow “A”: Run A does not say what was followed"],
    mend: ["run A\n", "run A\n  follow H2O2 as concentration from c\n"],
  },
  { put: ["reaction 2 H2O2 -> 2 H2O + O2\n", ""], said: ["run-lacks-reaction “A”: Run A has no reaction"], mend: null },
  {
    put: ["  temperature 25 °C\n", ""],
    said: ["run-lacks-temperature “A”: Run A states no temperature"],
    mend: ["run A\n", "run A\n  temperature 25.0 °C\n"],
  },
  {
    put: ["  volume 50 mL\n  temperature 25 °C\n  taken H2O2 0.1 mol/L", "  temperature 25 °C\n  taken H2O2 5 mmol"],
    said: ["run-lacks-volume “A”: Run A gives H2O2 as an amount or a mass"],
    mend: ["run A\n", "run A\n  volume 50.00 mL\n"],
  },
  {
    put: ["  rate initial\n  fit order 1 in H2O2\n", ""],
    said: ["run-wants-nothing “A”: Nothing is wanted of run A yet."],
    mend: ["run A\n", "run A\n  rate initial\n"],
  },
  {
    put: ["run A", "sries x\nrun A"],
    said: ["word-unknown “sries”: “sries” begins no line here."],
    mend: "series x\nrun A",
  },
  { put: ["  volume 50 mL", "  date 3.11.2026"], said: ["date-malformed “3.11.2026”"], mend: "  date 2026-11-03" },
  { put: ["  volume 50 mL", "  date 2026-02-30"], said: ["date-malformed “2026-02-30”"], mend: null },
  {
    put: ["reaction 2", "ratewright 2\nreaction 2"],
    said: ["version-unknown “2”: This program reads version 1"],
    mend: "ratewright 1\nreaction 2",
  },
  {
    put: ["  fit order 1 in H2O2\n", "  fit order 1 in H2O2\nratewright 1\n"],
    said: ["version-not-first “ratewright 1”"],
    mend: null,
  },
];

describe("what is said of a text, and how it is mended", () => {
  it("the sound text earns nothing", () => {
    assert.deepEqual(saidOf(base), []);
  });

  for (const { put, said, mend } of cases) {
    it(`${JSON.stringify(put[1])}: ${said[0]?.split(" ")[0]}`, () => {
      assert.ok(base.includes(put[0]));
      const text = base.replace(put[0], put[1]);
      const found = saidOf(text);
      assert.equal(found.length, said.length, found.join("\n"));
      for (const [index, words] of said.entries()) assert.ok(found[index]?.startsWith(words), found[index]);
      const after = mended(text);
      const expected =
        mend === null ? text : typeof mend === "string" ? base.replace(put[0], mend) : text.replace(mend[0], mend[1]);
      assert.equal(after, expected);
    });
  }

  it("near misses stay silent", () => {
    const near: readonly (readonly [string, string])[] = [
      ["50 mL", "50mL"],
      ["50 mL", "50.00 mL within 0.05 mL"],
      ["50 mL", "0.05 dm3"],
      ["25 °C", "298.15 K"],
      ["25 °C", "25.0(1) degC"],
      ["0.1 mol/L", "0.1 mol·L⁻¹ ± 2 %"],
      ["0.1 mol/L", "0.1000 +/- 0.0005 mol L^-1"],
      ["->", "→"],
      ["2 H2O2 -> 2 H2O + O2", "H2O2 -> H2O + 1/2 O2"],
      ["2 H2O2 -> 2 H2O + O2", "2H2O2(aq)->2H2O(l)+O2(g)"],
      ["run A", "run A “title with smart quotes”"],
      ["run A", "run A # a comment"],
      ["rate initial", "rate from 0 s to 1 min 30 s"],
      ["rate initial", "rate at 00:01:30"],
      ["column c", "column min"],
      ["  volume 50 mL", "\tvolume\u00a050\u2009mL"],
      ["reaction 2", "ratewright 1\nreaction 2"],
      ["H2O2 0.1 mol/L\n", "H2O2 0.1 mol/L\n  taken KI 0.05 M as catalyst\n"],
    ];
    for (const [from, to] of near) {
      const text = base.replace(from, to).replace(to === "column min" ? "from c" : "\u0000", "from min");
      assert.deepEqual(saidOf(text), [], text);
    }
  });

  it("CRLF, CR and no line break at the end change nothing", () => {
    const broken = base.replace("50 mL", "50 s");
    for (const line of ["\r\n", "\r"]) assert.deepEqual(saidOf(broken.replaceAll("\n", line)), saidOf(broken));
    assert.deepEqual(saidOf(broken.trimEnd()), saidOf(broken));
  });

  it("places count UTF-16 units: µ, ·, ₂ and letters beyond the first plane stand before the marked words", () => {
    const text = base.replace("run A", 'run A "µ · ₂ 🧪"').replace("50 mL", "50 s # 🧪");
    assert.deepEqual(saidOf(text), [
      "wrong-dimension “s”: Volume needs a unit of volume (L, mL, m³ …); s is a unit of time.",
    ]);
  });
});
