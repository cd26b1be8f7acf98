import { exp } from "../../../numerics/elementary.js";
import type { CodeExamples } from "../codeExample.js";
import { fileWith, runWith, soundFile, soundFiles, soundRun } from "./soundRun.js";

/** Only the first rows of the sound file: its header and `count` readings. */
const firstReadings = (count: number) => ({
  "data/a.csv": `${soundFile
    .split("\n")
    .slice(0, count + 1)
    .join("\n")}\n`,
});
const scatter = [3, -2, 1, -3, 2, -1, 2, -3, 1, -2, 3, -1, -2, 2, -1, 3, -3, 1, 2, -2];

const withRandom = (u: string): string => runWith('"c / mol/L"\n', `"c / mol/L"\n      random ${u}\n`);
const belowData = (line: string): string => runWith("    column t", `    ${line}\n    column t`);
const withRate = (line: string): string => runWith("  fit order 1 in H2O2\n", `  ${line}\n`);

export const fitExamples: CodeExamples = {
  "run-lacks-time": {
    text: runWith('    column t "t / s"\n', ""),
    files: soundFiles,
    write: ["    column c", '    column t "t / s"\n    column c'],
  },
  "run-times": {
    text: runWith('    column c "c', '    column w "w / min"\n    column c "c'),
    files: { "data/a.csv": soundFile.replace("s,c", "s,w / min,c").replace(/^(\d+),/gm, (_, t) => `${t},${t / 60},`) },
    write: ['    column w "w / min"\n', ""],
  },
  "column-lacks-unit": {
    text: runWith("c / mol/L", "c"),
    files: fileWith("c / mol/L", "c"),
    write: ['column c "c"', 'column c "c" mol/L'],
  },
  "signal-wrong-unit": {
    text: runWith("c / mol/L", "V / mL"),
    files: {
      "data/a.csv": soundFile.replace("t / s,c / mol/L", "t / s,V / mL,c / mol/L").replace(/^(\d+),/gm, "$1,50,"),
    },
    write: ['column c "V / mL"', 'column c "c / mol/L"'],
  },
  "signal-needs-formula": {
    beside: "balance-unchecked",
    text: runWith("c / mol/L", "c / g/L")
      .replace("reaction 2 H2O2 -> 2 H2O + O2", "species dye\nspecies leuco is C25H31N3\nreaction dye -> leuco")
      .replaceAll("H2O2", "dye")
      .replace("0.100 mol/L", "0.268 mmol/L"),
    files: fileWith("c / mol/L", "c / g/L"),
    write: ["species dye", "species dye is C25H31N3"],
  },
  "uncertainty-wrong-unit": {
    text: runWith('"c / mol/L"\n', '"c / mol/L"\n      random 0.5 mL\n'),
    files: soundFiles,
    write: ["0.5 mL", "0.0005 mol/L"],
  },
  "column-not-numbers": {
    beside: "data-cell-word",
    text: runWith('column c "c / mol/L"', 'column c "level" mol/L'),
    files: { "data/a.csv": soundFile.replace("s,", "s,level,").replace(/^(\d+),/gm, "$1,low,") },
    write: ['column c "level" mol/L', 'column c "c / mol/L"'],
  },
  "uncertainty-of-zero": {
    text: runWith('"c / mol/L"\n', '"c / mol/L"\n      random 1 %\n'),
    files: fileWith("0.0120", "0"),
    write: ["random 1 %", "random 0.005 mol/L"],
  },
  "rate-outside-readings": { text: withRate("rate at 300 s"), files: soundFiles, write: ["300 s", "60 s"] },
  "rate-few-readings": {
    otherReadings: true,
    text: withRate("rate at 20 s"),
    files: firstReadings(2),
    rightFiles: soundFiles,
  },
  "rate-initial-late": {
    otherReadings: true,
    text: withRate("rate initial"),
    files: {
      "data/a.csv": "t / s,c / mol/L\n0,0.1003\n60,0.0404\n120,0.0167\n180,0.0067\n240,0.0026\n300,0.0012\n",
    },
    rightFiles: {
      "data/a.csv":
        "t / s,c / mol/L\n0,0.1003\n2,0.0969\n4,0.0942\n6,0.0912\n8,0.0886\n10,0.0862\n12,0.0834\n14,0.0811\n16,0.0785\n18,0.0764\n20,0.0741\n",
    },
  },
  "fit-refused": {
    text: `${soundRun}    window 130 s to 600 s\n`,
    files: soundFiles,
    write: ["130 s", "0 s"],
  },
  "fit-few-half-lives": {
    text: `${soundRun}    infinity free\n`,
    files: firstReadings(7),
    write: ["infinity free", "infinity fixed 0 mol/L"],
  },
  "fit-very-few-half-lives": {
    text: `${soundRun}    infinity free\n`,
    files: { "data/a.csv": decay(7, 12, 0, 0.0001) },
    write: ["infinity free", "infinity fixed 0 mol/L"],
  },
  "fit-infinity-at-bound": {
    otherReadings: true,
    text: `${soundRun}    infinity free\n`,
    files: { "data/a.csv": decay(20, 14, -0.001, 0.0001) },
    rightFiles: { "data/a.csv": decay(20, 14, 0, 0.0001) },
  },
  "fit-residuals-run": {
    otherReadings: true,
    text: soundRun,
    files: { "data/a.csv": bent(0.00003) },
    rightFiles: { "data/a.csv": bent(0) },
  },
  "fit-end-unknown": {
    text: runWith("  taken H2O2 0.100 mol/L\n", "").concat("    start fixed\n"),
    files: soundFiles,
    write: ["start fixed", "start free"],
  },
  "fit-end-wrong-unit": {
    text: `${soundRun}    start fixed 5.0 mL\n`,
    files: soundFiles,
    write: ["5.0 mL", "0.100 mol/L"],
  },
  "fit-scatter-large": {
    text: withRandom("0.0001 mol/L"),
    files: { "data/a.csv": decay(20, 14, 0, 0.0003) },
    write: ["0.0001 mol/L", "0.0006 mol/L"],
  },
  "fit-scatter-small": {
    text: withRandom("0.005 mol/L"),
    files: { "data/a.csv": decay(20, 14, 0, 0.0003) },
    write: ["0.005 mol/L", "0.0006 mol/L"],
  },
  "fit-end-differs": {
    text: runWith("0.100 mol/L", "0.200 mol/L"),
    files: soundFiles,
    write: ["0.200 mol/L", "0.100 mol/L"],
  },
  "fit-order-not-limiting": {
    text: runWith("2 H2O2 -> 2 H2O + O2", "H2O2 + 2 I^- + 2 H^+ -> I2 + 2 H2O").replace(
      "  data",
      "  taken I^- 0.050 mol/L\n  taken H^+ 1.0 mol/L\n  data",
    ),
    files: soundFiles,
    write: ["I^- 0.050", "I^- 1.0"],
  },
  "exclude-nothing": {
    text: belowData('exclude line 40 because "bubble"'),
    files: soundFiles,
    write: ["line 40", "line 5"],
  },
  "time-zero-late": {
    beside: "fit-refused",
    text: belowData("time zero 300 s"),
    files: soundFiles,
    write: ["300 s", "0 s"],
  },
  "readings-before-zero": {
    text: belowData("time zero 20 s").replace("0.100 mol/L", "0.075 mol/L"),
    files: soundFiles,
  },
  "time-zero-far": {
    text: runWith("  taken H2O2 0.100 mol/L\n", ""),
    files: { "data/a.csv": soundFile.replace(/^(\d+),/gm, (_, t) => `${Number(t) + 1000},`) },
    write: ["    column t", "    time zero 1000 s\n    column t"],
  },
  "not-computed-yet": { text: "reaction 2 H2O2 -> 2 H2O + O2\n  enthalpy -196.4 kJ/mol\n" },
};

/** Readings of a first-order decay from 0.1 mol/L, every `step` s, that runs to `infinity` and scatters by some `spread`, mol/L. */
function decay(count: number, step: number, infinity: number, spread: number): string {
  const rows = scatter.slice(0, count).map((off, index) => {
    const c = infinity + (0.1 - infinity) * exp(-0.0151 * step * index) + spread * off;
    return `${step * index},${c.toFixed(4)}`;
  });
  return `t / s,c / mol/L\n${rows.join("\n")}\n`;
}

/** Twenty readings of a first-order decay with some scatter and a drift, mol/L in a second. */
function bent(drift: number): string {
  const rows = scatter.map((step, index) => {
    let c = 0.1;
    for (let n = 0; n < index; n++) c *= 0.8;
    const t = 15 * index;
    return `${t},${(c + 0.0001 * step + drift * Math.max(0, t - 90)).toFixed(4)}`;
  });
  return `t / s,c / mol/L\n${rows.join("\n")}\n`;
}
