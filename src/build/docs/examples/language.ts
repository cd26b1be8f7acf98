import { type CodeExamples, unshown } from "../codeExample.js";
import { runWith, soundFiles, soundRun } from "./soundRun.js";

const peroxide = "reaction 2 H2O2 -> 2 H2O + O2\n";

export const languageExamples: CodeExamples = {
  "word-unknown": { text: "run A\n  volum 50.00 mL\n" },
  "keyword-capitals": { text: "Run A\n  volume 50.00 mL\n" },
  "line-incomplete": { text: "run A\n  volume\n", write: ["volume", "volume 50.00 mL"] },
  "line-unexpected": { text: "run A\n  note stirred at 300 per minute\n" },
  "line-left-over": { text: "run A\n  date 2026-11-03 noon\n" },
  "line-break-missing": { text: "run A\n  volume 50.00 mL temperature 25.0 °C\n" },
  "line-misplaced": {
    text: 'run A\n  skip 1 lines\n  data "data/a.csv"\n',
    files: { "data/a.csv": `made by hand\n${soundFiles["data/a.csv"]}` },
    write: ['  skip 1 lines\n  data "data/a.csv"\n', '  data "data/a.csv"\n    skip 1 lines\n'],
  },
  "line-twice": { text: "run A\n  volume 50.00 mL\n  volume 60.00 mL\n", write: ["  volume 60.00 mL\n", ""] },
  "string-open": { text: 'run A "0.050 M iodide\n' },
  "name-malformed": { text: "run from\n", write: ["from", "A"] },
  "name-twice": { text: "run A\nrun A\n", write: ["A\nrun A", "A\nrun B"] },
  "name-unknown": { text: "run A\nrun B like C\n", write: ["like C", "like A"] },
  "date-malformed": { text: "run A\n  date 3.11.2026\n", write: ["3.11.2026", "2026-11-03"] },
  "version-unknown": { text: "ratewright 2\n" },
  "version-not-first": { text: "run A\nratewright 1\n", write: ["run A\nratewright 1", "ratewright 1\nrun A"] },
  "number-below-zero": { text: "run A\n  volume -50.00 mL\n", write: ["-50", "50"] },
  "share-of-what": { text: `${peroxide}run A\n  taken H2O2 30 %\n`, write: ["30 %", "0.100 mol/L"] },
  "taken-volume-of-what": {
    text: "run A\n  volume 50.00 mL\n  taken KI 10.0 mL\n",
    write: ["10.0 mL\n", "10.0 mL of 0.500 mol/L\n"],
  },
  "stock-without-volume": {
    text: "run A\n  volume 50.00 mL\n  taken KI 0.83 g of 0.500 mol/L\n",
    write: ["0.83 g", "10.0 mL"],
  },
  "results-units": { text: "results in mmol/L, mL\n", write: ["mL", "min"] },
  "header-outside-table": { text: 'run A\n  volume from "V / mL"\n', write: ['from "V / mL"', "50.00 mL"] },
  "blank-ambiguous": { text: "run A\n  blank 1.2 mL\n", write: ["  blank 1.2 mL\n", ""] },
  "format-refused": unshown("format-refused", "No text is known that earns it.", { line: 3 }),
  "order-in-words": { text: runWith("order 1 in H2O2", "first order"), files: soundFiles },
  "like-itself": { text: "run A\nrun B like B\n", write: ["like B", "like A"] },
  "like-later": { text: "run B like A\nrun A\n", write: ["run B like A\nrun A", "run A\nrun B like A"] },
  "run-lacks-data": {
    text: `${peroxide}run A\n  temperature 25.0 °C\n  follow H2O2 as concentration from c\n  rate from 0 s to 60 s\n`,
    files: soundFiles,
    write: ["  follow", '  data "data/a.csv"\n    column t "t / s"\n    column c "c / mol/L"\n  follow'],
  },
  "run-lacks-follow": {
    text: runWith("  follow H2O2 as concentration from c\n", ""),
    files: soundFiles,
    write: ["  fit", "  follow H2O2 as concentration from c\n  fit"],
  },
  "run-lacks-reaction": {
    text: runWith(peroxide, ""),
    files: soundFiles,
    write: ["run A", `${peroxide}run A`],
  },
  "run-lacks-volume": {
    text: `${peroxide}run A\n  taken H2O2 5.00 mmol\n`,
    write: ["  taken", "  volume 50.00 mL\n  taken"],
  },
  "run-lacks-temperature": {
    text: runWith("  temperature 25.0 °C\n", ""),
    files: soundFiles,
    write: ["  taken", "  temperature 25.0 °C\n  taken"],
  },
  "run-wants-nothing": {
    text: runWith("  fit order 1 in H2O2\n", ""),
    files: soundFiles,
    write: ["from c\n", "from c\n  fit order 1 in H2O2\n"],
  },
  "taken-needs-formula": {
    text: "species ester\nrun A\n  volume 50.00 mL\n  taken ester 0.44 g\n",
    write: ["species ester", "species ester is C4H8O2"],
  },
  "taken-part-unused": {
    text: `${peroxide}run A\n  volume 50.00 mL\n  taken H2O2 0.100 mol/L purity 98 %\n`,
    write: ["0.100 mol/L", "0.17 g"],
  },
  "number-with-uncertainty": { text: runWith("order 1 in", "order 1.0(1) in"), files: soundFiles },
  "taken-takes-no-part": { text: `${peroxide}run A\n  taken KI 0.050 mol/L\n` },
  "formula-left-over": { text: `${peroxide}run A\n  taken H2O2; 0.100 mol/L\n`, write: [";", ""] },
  "balance-unchecked": {
    text: "species dye\nreaction dye -> CO + H2O\n",
    write: ["species dye", "species dye is CH2O2"],
  },
  "follow-not-in-reaction": {
    text: runWith("follow H2O2", "follow KI"),
    files: soundFiles,
    write: ["follow KI", "follow H2O2"],
  },
  "follow-blind": {
    text: runWith("2 H2O2 -> 2 H2O + O2", "2 H2O2 + I^- -> 2 H2O + O2 + I^-").replace("follow H2O2", "follow I^-"),
    files: soundFiles,
    write: ["follow I^-", "follow H2O2"],
  },
  "fit-not-in-reaction": {
    text: runWith("order 1 in H2O2", "order 1 in O2"),
    files: soundFiles,
    write: ["order 1 in O2", "order 1 in H2O2"],
  },
  "fit-not-computed": {
    text: runWith("order 1 in H2O2", "order 2 in H2O2"),
    files: soundFiles,
    write: ["order 2", "order 1"],
  },
  "span-empty": {
    text: `${soundRun}    window 120 s to 0 s\n`,
    files: soundFiles,
    write: ["120 s to 0 s", "0 s to 120 s"],
  },
};
