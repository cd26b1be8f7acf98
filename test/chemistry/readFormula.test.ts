import assert from "node:assert/strict";
import fc from "fast-check";
import { chargeText, printedFormula } from "../../src/chemistry/formula.js";
import { anions, cations, otherIons } from "../../src/chemistry/handbook/ions.js";
import { readFormula } from "../../src/chemistry/readFormula.js";
import { readSpecies } from "../../src/chemistry/readSpecies.js";
import { isFault } from "../../src/quantity/shifted.js";
import { faultOf, mended, valid, words } from "../quantity/faultOf.js";

describe("readFormula", () => {
  const rows: [written: string, text: string, parts: Record<string, number>, charge: number][] = [
    ["H2O2", "H2O2", { H: 2, O: 2 }, 0],
    ["H₂O₂", "H2O2", { H: 2, O: 2 }, 0],
    ["SO4^2-", "SO4^2-", { S: 1, O: 4 }, -2],
    ["SO₄²⁻", "SO4^2-", { S: 1, O: 4 }, -2],
    ["SO4^(2-)", "SO4^2-", { S: 1, O: 4 }, -2],
    ["SO4^-2", "SO4^2-", { S: 1, O: 4 }, -2],
    ["SO4^2−", "SO4^2-", { S: 1, O: 4 }, -2],
    ["Fe^3+", "Fe^3+", { Fe: 1 }, 3],
    ["Fe³⁺", "Fe^3+", { Fe: 1 }, 3],
    ["H+", "H^+", { H: 1 }, 1],
    ["OH-", "OH^-", { O: 1, H: 1 }, -1],
    ["Ca++", "Ca^2+", { Ca: 1 }, 2],
    ["[Co(NH3)5Br]^2+", "[Co(NH3)5Br]^2+", { Co: 1, N: 5, H: 15, Br: 1 }, 2],
    ["CuSO4·5H2O", "CuSO4.5H2O", { Cu: 1, S: 1, O: 9, H: 10 }, 0],
    ["CuSO4.5H2O", "CuSO4.5H2O", { Cu: 1, S: 1, O: 9, H: 10 }, 0],
    ["CuSO4 · 5 H2O", "CuSO4.5H2O", { Cu: 1, S: 1, O: 9, H: 10 }, 0],
    ["CuSO4 · 5H2O", "CuSO4.5H2O", { Cu: 1, S: 1, O: 9, H: 10 }, 0],
    ["Al2(SO4)3", "Al2(SO4)3", { Al: 2, S: 3, O: 12 }, 0],
    ["K4[Fe(CN)6].3H2O", "K4[Fe(CN)6].3H2O", { K: 4, Fe: 1, C: 6, N: 6, H: 6, O: 3 }, 0],
    ["Co", "Co", { Co: 1 }, 0],
    ["CO", "CO", { C: 1, O: 1 }, 0],
    ["D2O", "D2O", { D: 2, O: 1 }, 0],
    ["HTO", "HTO", { H: 1, T: 1, O: 1 }, 0],
    ["e-", "e^-", {}, -1],
    ["e⁻", "e^-", {}, -1],
    ["C60-", "C60^-", { C: 60 }, -1],
  ];
  for (const [written, text, parts, charge] of rows) {
    it(`reads ${written}`, () => {
      const { formula, end } = valid(readFormula(written));
      assert.deepEqual(
        { text: formula.text, parts: Object.fromEntries(formula.parts), charge: formula.charge, end },
        { text, parts, charge, end: written.length },
      );
    });
  }

  it("stops where a plus joins the next species", () => {
    for (const [written, end] of [
      ["Na+H2O", 2],
      ["H2+O2", 2],
      ["H2+ O2", 3],
      ["OH->", 2],
      ["OH-->", 3],
      ["Na(s)+", 2],
    ] as const) {
      const found = readFormula(written);
      if (written === "H2+ O2") assert.equal(faultOf(found).code, "charge-ambiguous");
      else assert.equal(valid(found).end, end, written);
    }
  });

  const refused: [written: string, words: string, mends: string[]][] = [
    ["Fe3+", "Fe3+ could be iron(III), Fe^3+, or three irons, Fe3^+.", ["Fe^3+", "Fe3^+"]],
    ["SO42-", "SO42- could be sulfate, SO4^2-, or SO42^-.", ["SO4^2-", "SO42^-"]],
    ["I3-", "I3- could be triiodide, I3^-, or I^3-.", ["I3^-", "I^3-"]],
    ["NH4+", "NH4+ could be ammonium, NH4^+, or NH^4+.", ["NH4^+", "NH^4+"]],
    ["MnO4-", "MnO4- could be permanganate, MnO4^-, or MnO^4-.", ["MnO4^-", "MnO^4-"]],
    ["Cr2O72-", "Cr2O72- could be dichromate, Cr2O7^2-, or Cr2O72^-.", ["Cr2O7^2-", "Cr2O72^-"]],
    ["Cr3+", "Cr3+ could be chromium(III), Cr^3+, or three chromiums, Cr3^+.", ["Cr^3+", "Cr3^+"]],
    ["Ga3+", "Ga3+ could be gallium(III), Ga^3+, or three galliums, Ga3^+.", ["Ga^3+", "Ga3^+"]],
    ["Hg22+", "Hg22+ could be mercury(I), Hg2^2+, or 22 mercury atoms, Hg22^+.", ["Hg2^2+", "Hg22^+"]],
    ["O2-", "O2- could be oxide, O^2-, or superoxide, O2^-.", ["O^2-", "O2^-"]],
    ["Nacl", "Nacl is no formula, since cl is no element; write NaCl.", ["NaCl"]],
    ["co2", "co2 is no formula, since co is no element; write Co2 or CO2.", ["Co2", "CO2"]],
    ["EtOAc", "EtOAc is no formula, since Et is no element; a name is declared first: species EtOAc.", []],
    ["A", "A is no formula; a name is declared first: species A.", []],
    ["dye", "dye is no formula; a name is declared first: species dye.", []],
    [
      "Fe(OH",
      "The bracket ( of this formula is not closed by its partner, or holds nothing. Close it, or take it out.",
      [],
    ],
    [
      "Fe(OH]",
      "The bracket ( of this formula is not closed by its partner, or holds nothing. Close it, or take it out.",
      [],
    ],
    [
      "Fe()2",
      "The bracket ( of this formula is not closed by its partner, or holds nothing. Close it, or take it out.",
      [],
    ],
    ["H0", "A formula cannot count 0 atoms; counts are whole numbers from 1 to 99999.", []],
    ["H123456", "A formula cannot count 123456 atoms; counts are whole numbers from 1 to 99999.", []],
    // hydrate-not-whole
    ["CaSO4·½H2O", "Counts in a formula are whole numbers: write (CaSO4)2·H2O for CaSO4·½H2O.", ["(CaSO4)2·H2O"]],
    ["CaSO4.0.5H2O", "Counts in a formula are whole numbers: write (CaSO4)2·H2O for CaSO4.0.5H2O.", ["(CaSO4)2·H2O"]],
    [
      "Na2CO3·1.5H2O",
      "Counts in a formula are whole numbers: write (Na2CO3)2·3H2O for Na2CO3·1.5H2O.",
      ["(Na2CO3)2·3H2O"],
    ],
    ["CoCl2·0.17H2O", "Counts in a formula are whole numbers: write a multiple of it for CoCl2·0.17H2O.", []],
    ["Fe^", "After ^ a charge is expected, as in Fe^2- or Fe^+.", []],
    ["Fe^2", "After ^ a charge is expected, as in Fe^2- or Fe^+.", ["^2+", "^2-"]],
    ["Fe²", "After ^ a charge is expected, as in Fe^2- or Fe^+.", ["^2+", "^2-"]],
    ["", "A species is expected here, such as H2O2 or SO4^2-.", []],
    ["?", "A species is expected here, such as H2O2 or SO4^2-; “?” is not one.", []],
  ];
  for (const [written, message, mends] of refused) {
    it(`refuses “${written}” in words`, () => {
      const found = faultOf(readFormula(written));
      assert.equal(words(found), message);
      assert.deepEqual(found.mend?.map(({ text }) => text) ?? [], mends);
      mends.forEach((_, index) => {
        const after = mended(written, found, index);
        assert.equal(valid(readFormula(after)).end, after.length);
      });
    });
  }

  it("offers every listed ion first where its charge is written bare", () => {
    const bare = new Map<string, string>();
    for (const { body, charge } of [...cations, ...anions, ...otherIons]) {
      const written = `${body}${Math.abs(charge) === 1 ? "" : Math.abs(charge)}${charge > 0 ? "+" : "-"}`;
      if (!bare.has(written)) bare.set(written, body + chargeText(charge));
    }
    assert.ok(bare.size > 80);
    for (const [written, ion] of bare) {
      const found = readFormula(written);
      const first = isFault(found) ? found.mend?.[0]?.text : found.formula.text;
      assert.equal(first, ion, written);
    }
  });

  it("reads its own normal form as the same formula", () => {
    const symbol = fc.constantFrom("H", "C", "Co", "O", "Na", "Cl", "D", "Fe");
    const count = fc.integer({ min: 2, max: 12 }).map(String);
    const atom = fc.tuple(symbol, fc.option(count, { nil: "" })).map(([name, size]) => name + size);
    const run = fc.array(atom, { minLength: 1, maxLength: 4 }).map((atoms) => atoms.join(""));
    const group = fc
      .tuple(run, run, fc.constantFrom("()", "[]", "{}"), count)
      .map(([a, b, pair, size]) => `${a}${pair[0]}${b}${pair[1]}${size}`);
    const charge = fc.constantFrom("", "^+", "^-", "^2-", "^3+", "²⁻");
    const water = fc.constantFrom("", "·5H2O", ".H2O");
    fc.assert(
      fc.property(fc.oneof(run, group), water, charge, (body, hydrate, sign) => {
        const first = valid(readFormula(body + hydrate + sign));
        const again = valid(readFormula(first.formula.text));
        assert.deepEqual(again.formula, first.formula);
        assert.equal(again.end, first.formula.text.length);
        assert.deepEqual(valid(readFormula(printedFormula(first.formula.text))).formula, first.formula);
      }),
      { seed: 11, numRuns: 1000 },
    );
  });
});

describe("readSpecies", () => {
  it("takes states, which are no part of the key", () => {
    for (const state of ["s", "l", "g", "aq"]) {
      const found = valid(readSpecies(`H2O(${state})`));
      assert.deepEqual([found.key, found.state, found.nameEnd, found.end], ["H2O", state, 3, 5 + state.length]);
    }
    assert.equal(valid(readSpecies("H2O (l)")).state, "l");
    assert.equal(valid(readSpecies("Na+(aq)")).key, "Na^+");
    assert.equal(words(faultOf(readSpecies("H2O(sol)"))), "(sol) is not a state; states are (s), (l), (g) and (aq).");
    // state-unknown: what was meant is offered, where that is plain
    const meant: [written: string, mend: string | null][] = [
      ["H2O(L)", "H2O(l)"],
      ["H2O(liq)", "H2O(l)"],
      ["NaCl(aq.)", "NaCl(aq)"],
      ["CO2(gas)", "CO2(g)"],
      ["Ca(OH)2(AQ)", "Ca(OH)2(aq)"],
      ["Mg(foo)", null],
    ];
    for (const [written, mend] of meant) {
      const found = faultOf(readSpecies(written));
      assert.equal(found.code, "state-unknown");
      if (mend === null) assert.equal(found.mend, undefined);
      else assert.equal(mended(written, found), mend);
    }
    assert.equal(valid(readSpecies("Ca(OH)2")).state, null);
    assert.equal(valid(readSpecies("dye(l)", (name) => name === "dye")).state, "l");
  });

  it("lets a declared name win over a formula", () => {
    const declared = (name: string): boolean => ["A", "dye", "EtOAc", "CO", "A-1"].includes(name);
    assert.deepEqual(valid(readSpecies("dye(aq)", declared)), {
      key: "dye",
      formula: null,
      state: "aq",
      nameEnd: 3,
      end: 7,
    });
    assert.equal(valid(readSpecies("CO", declared)).formula, null);
    assert.equal(valid(readSpecies("CO2", declared)).key, "CO2");
    assert.equal(valid(readSpecies("A-1", declared)).key, "A-1");
    assert.equal(valid(readSpecies("A->", declared)).key, "A");
  });
});
