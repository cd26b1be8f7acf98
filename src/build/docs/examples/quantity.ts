import { type CodeExamples, unshown } from "../codeExample.js";
import { runWith, soundFiles } from "./soundRun.js";

const run = (line: string): string => `run A\n  ${line}\n`;

export const quantityExamples: CodeExamples = {
  "number-expected": { text: run("volume .mL"), write: [".mL", "50 mL"] },
  "number-comma": { text: run("volume 0,5 L") },
  "number-range": { text: run("volume 1e400 L"), write: ["1e400", "1.0"] },
  "uncertainty-unreadable": { text: run("volume 50.00 +/- mL"), write: ["+/- mL", "+/- 0.05 mL"] },
  "uncertainty-twice": { text: run("volume 50.00(5) +/- 0.05 mL"), write: ["50.00(5)", "50.00"] },
  "uncertainty-of-what": { text: run("volume 50.00 ± 2 %"), write: ["50.00 ±", "50.00 mL ±"] },
  "uncertainty-unit": { text: run("temperature 298.2 K +/- 1 mL") },
  "tolerance-unit": { text: run("volume 50.00 mL within 0.05") },
  "time-parts": {
    text: runWith("fit order 1 in H2O2", "rate at 30 s 1 min"),
    files: soundFiles,
    write: ["30 s 1 min", "1 min 30 s"],
  },
  "unit-expected": { text: run("volume 50.00 mL/"), write: ["mL/", "mL"] },
  "unit-unreadable": { text: run("volume 50.00 )"), write: [")", "mL"] },
  "unit-bracket": { text: run("volume 50.00 (mL") },
  "unit-unknown": { text: run("volume 50.00 milliliter"), write: ["milliliter", "mL"] },
  "unit-prefix": { text: runWith("fit order 1 in H2O2", "rate at 2 kmin"), files: soundFiles },
  "unit-ambiguous": {
    text: 'run A\n  data "data/a.csv"\n    column v "v" mol/L/s\n',
    files: { "data/a.csv": "t / s,v\n0,0.0015\n" },
  },
  "share-basis": { text: run("taken H2O2 30 % w/w"), write: ["30 % w/w", "0.100 mol/L"] },
  "share-basis-alone": { text: run("volume 50.00 mL\n  taken H2O2 0.50 g by mass") },
  "wrong-dimension": { text: run("volume 50 s"), write: ["50 s", "50 mL"] },
  "missing-unit": { text: run("volume 50.00") },
  "unit-for-plain-number": unshown(
    "unit-for-plain-number",
    "No line takes a quantity that must be a plain number yet.",
    { name: "The order", given: "mL", givenKind: "a unit of volume" },
  ),
  "coulomb-for-celsius": { text: run("temperature 25 C") },
};
