import type { CodeExamples } from "../codeExample.js";

const taken = (species: string): string => `run A\n  taken ${species} 0.10 mol/L\n`;

/** What is taken of a stock solution. */
const stock = (species: string, strength: string): string =>
  `run A\n  volume 50.00 mL\n  taken ${species} 5.00 mL of ${strength}\n`;

export const chemistryExamples: CodeExamples = {
  "formula-expected": { text: taken("3H"), write: ["3H", "H3O^+"] },
  "species-unknown": { text: taken("Xx2"), write: ["Xx2", "I2"] },
  "formula-bracket": { text: taken("Ca(OH2"), write: ["Ca(OH2", "Ca(OH)2"] },
  "formula-count": { text: taken("CH0"), write: ["CH0", "CH4"] },
  "hydrate-not-whole": { text: taken("CaSO4·0.5H2O"), write: ["CaSO4·0.5H2O", "(CaSO4)2·H2O"] },
  "formula-too-deep": {
    text: taken("((((((((((((NaCl))))))))))))"),
    write: ["((((((((((((NaCl))))))))))))", "NaCl"],
  },
  "charge-unreadable": { text: taken("SO4^"), write: ["SO4^", "SO4^2-"] },
  "charge-ambiguous": { text: taken("Fe3+") },
  "state-unknown": { text: taken("H2O2(x)"), write: ["(x)", "(aq)"] },
  "coefficient-not-whole": { text: "reaction H2O2 -> H2O + 0.5 O2\n" },
  "equation-no-arrow": { text: "reaction 2 H2O2 2 H2O + O2\n", write: ["H2O2 2", "H2O2 -> 2"] },
  "equation-equals": { text: "reaction 2 H2O2 = 2 H2O + O2\n" },
  "equation-arrow": { text: "reaction 2 H2O2 => 2 H2O + O2\n" },
  "equation-two-arrows": {
    text: "reaction 2 H2O2 -> 2 H2O -> O2\n",
    write: ["H2O -> O2", "H2O + O2"],
  },
  "equation-side": { text: "reaction 2 H2O2 ->\n", write: ["->", "-> 2 H2O + O2"] },
  "equation-term": { text: "reaction 2 H2O2 + -> 2 H2O + O2\n", write: ["+ ->", "->"] },
  "equation-plus": { text: "reaction 2 H2O2 -> 2 H2O O2\n" },
  unbalanced: { text: "reaction H2O2 -> H2O + O2\n" },
  "no-balance": { text: "reaction H2O2 -> CO2\n", write: ["H2O2 -> CO2", "2 H2O2 -> 2 H2O + O2"] },
  "share-beyond-whole": { text: stock("KI", "130 % by mass density 1.11 g/mL"), write: ["130 %", "13.0 %"] },
  "stock-needs-molar-mass": {
    text: `species dye\n${stock("dye", "1.0 % by mass density 1.00 g/mL")}`,
    write: ["species dye", "species dye\n  molar mass 408.0 g/mol"],
  },
  "stock-needs-density": { text: stock("H2O2", "30 % by mass"), write: ["by mass", "by mass density 1.11 g/mL"] },
  "stock-needs-pure-density": {
    text: stock("H2O2", "30 % by volume"),
    write: ["30 % by volume", "30 % by mass density 1.11 g/mL"],
  },
  "stock-needs-solvent": {
    text: stock("H2O2", "18 % by amount density 1.11 g/mL"),
    write: ["18 % by amount", "30 % by mass"],
  },
  "many-balances": {
    text: "reaction CO + H2 -> CH4 + H2O + CO2\n",
    write: ["CO + H2 -> CH4 + H2O + CO2", "4 CO + 8 H2 -> 3 CH4 + 2 H2O + CO2"],
  },
};
