import assert from "node:assert/strict";
import { equationText, stoichiometricNumbers } from "../../src/chemistry/equation.js";
import { readEquation } from "../../src/chemistry/readEquation.js";
import { mended, words } from "../quantity/faultOf.js";

const declared = (name: string): boolean => ["A", "B", "C", "dye", "EtOAc"].includes(name);

describe("readEquation", () => {
  const rows: [written: string, normal: string][] = [
    ["2 H2O2(aq) -> 2 H2O(l) + O2(g)", "2 H2O2(aq) -> 2 H2O(l) + O2(g)"],
    ["Na(s)+H2O(l) → NaOH(aq)+H2(g)", "Na(s) + H2O(l) -> NaOH(aq) + H2(g)"],
    ["H+ + OH- -> H2O", "H^+ + OH^- -> H2O"],
    ["H++OH-->H2O", "H^+ + OH^- -> H2O"],
    ["2 H^+ + CO3^2- ⇌ H2O + CO2", "2 H^+ + CO3^2- <=> H2O + CO2"],
    ["2H2+O2->2H2O", "2 H2 + O2 -> 2 H2O"],
    ["H2 + 1/2 O2 -> H2O", "H2 + 1/2 O2 -> H2O"],
    ["H2 + ½O2 -> H2O", "H2 + 1/2 O2 -> H2O"],
    ["A -> B", "A -> B"],
    ["A->B", "A -> B"],
    ["2 A + dye <=> C", "2 A + dye <=> C"],
    ["EtOAc + OH⁻ → CH3COO⁻ + C2H5OH", "EtOAc + OH^- -> CH3COO^- + C2H5OH"],
    ["Fe^3+ + e- -> Fe^2+", "Fe^3+ + e^- -> Fe^2+"],
    ["A --> B", "A -> B"],
    ["2 S2O8²⁻ + 2 H₂O → 4 HSO4⁻ + O₂", "2 S2O8^2- + 2 H2O -> 4 HSO4^- + O2"],
  ];
  for (const [written, normal] of rows) {
    it(`reads ${written}`, () => {
      const { equation, faults, species } = readEquation(written, declared);
      assert.deepEqual(faults, []);
      assert.ok(equation !== null);
      assert.equal(equationText(equation), normal);
      for (const { speciesSpan, span } of [...equation.left, ...equation.right]) {
        assert.ok(span.start <= speciesSpan.start && speciesSpan.end <= span.end && span.end <= written.length);
      }
      assert.ok(species.length >= 2);
      const again = readEquation(normal, declared).equation;
      assert.ok(again !== null);
      assert.equal(equationText(again), normal);
    });
  }

  it("nets the stoichiometric numbers", () => {
    const { equation } = readEquation("2 A + B + C -> 3 B + 1/2 dye + C", declared);
    assert.ok(equation !== null);
    assert.deepEqual(
      [...stoichiometricNumbers(equation)],
      [
        ["A", -2],
        ["B", 2],
        ["C", 0],
        ["dye", 0.5],
      ],
    );
  });

  it("says where the species stand", () => {
    const { equation } = readEquation("2 H₂O₂(aq) ⇌ H2O", declared);
    assert.deepEqual(equation?.left[0]?.speciesSpan, { start: 2, end: 6 });
    assert.deepEqual(equation?.left[0]?.span, { start: 0, end: 10 });
    assert.deepEqual(equation?.arrowSpan, { start: 11, end: 12 });
  });

  const refused: [written: string, words: string, mends: string[], species: string[]][] = [
    [
      "2 H2O2 = 2 H2O + O2",
      "= does not say whether the reaction goes back.",
      ["2 H2O2 -> 2 H2O + O2", "2 H2O2 <=> 2 H2O + O2"],
      ["H2O2", "H2O", "O2"],
    ],
    ["A => B", "=> is not an arrow of equations; write ->.", ["A -> B"], ["A", "B"]],
    ["A <-> B", "<-> is not an arrow of equations; write <=>.", ["A <=> B"], ["A", "B"]],
    ["A <- B", "<- is not an arrow of equations; write the reactants on the left of ->.", [], ["A", "B"]],
    [
      "A + B",
      "An equation needs an arrow: -> for a reaction that goes one way, <=> for one that goes back.",
      [],
      ["A", "B"],
    ],
    ["", "An equation needs an arrow: -> for a reaction that goes one way, <=> for one that goes back.", [], []],
    ["A ->", "Nothing stands on the right of the arrow; an equation reads as 2 H2O2 -> 2 H2O + O2.", [], ["A"]],
    ["-> B", "Nothing stands on the left of the arrow; an equation reads as 2 H2O2 -> 2 H2O + O2.", [], ["B"]],
    ["A + -> B", "A species is expected beside this +.", [], ["A", "B"]],
    ["+ A -> B", "A species is expected beside this +.", [], ["A", "B"]],
    ["A B -> C", "Between species stands a +; “B” cannot follow here.", ["A + B -> C"], ["A", "B", "C"]],
    ["A -> B -> C", "This equation has more than one arrow; give each reaction a line of its own.", [], ["A", "B"]],
    [
      "H2 + 0.5 O2 -> H2O",
      "Coefficients are whole numbers or fractions: write 1/2 for 0.5.",
      ["H2 + 1/2 O2 -> H2O"],
      ["H2", "H2O"],
    ],
    ["0 A -> B", "0 cannot be a coefficient; write a whole number or a fraction, as 1/2.", [], ["B"]],
    [
      "Fe3+ + I- -> Fe^2+ + I2",
      "Fe3+ could be iron(III), Fe^3+, or three irons, Fe3^+.",
      ["Fe^3+ + I- -> Fe^2+ + I2", "Fe3^+ + I- -> Fe^2+ + I2"],
      ["I^-", "Fe^2+", "I2"],
    ],
    ["X -> B", "X is no formula; a name is declared first: species X.", [], ["B"]],
    ["A -> H2O + Xyz", "Xyz is no formula; a name is declared first: species Xyz.", [], ["A", "H2O"]],
  ];
  for (const [written, message, mends, species] of refused) {
    it(`refuses “${written}” with one fault, and keeps its species`, () => {
      const found = readEquation(written, declared);
      assert.equal(found.equation, null);
      assert.equal(found.faults.length, 1);
      const [first] = found.faults;
      assert.ok(first !== undefined);
      assert.equal(words(first), message);
      assert.deepEqual(
        (first.mend ?? []).map((_, index) => mended(written, first, index)),
        mends,
      );
      assert.deepEqual(found.species, species);
    });
  }
});
