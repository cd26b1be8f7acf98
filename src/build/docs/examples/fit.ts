import type { CodeExamples } from "../codeExample.js";
import { fileWith, runWith, soundFile, soundFiles, soundRun } from "./soundRun.js";

/** Only the first rows of the sound file: its header and `count` readings. */
const firstReadings = (count: number) => ({
  "data/a.csv": `${soundFile
    .split("\n")
    .slice(0, count + 1)
    .join("\n")}\n`,
});
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
      .replaceAll("H2O2", "dye"),
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
    write: ["random 1 %", "random 0.0005 mol/L"],
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
    files: firstReadings(5),
    write: ["infinity free", "infinity fixed 0 mol/L"],
  },
  "fit-infinity-at-bound": {
    otherReadings: true,
    text: `${soundRun}    infinity free\n`,
    files: {
      "data/a.csv":
        "t / s,c / mol/L\n0,0.1000\n20,0.0700\n40,0.0450\n60,0.0280\n80,0.0150\n100,0.0060\n120,0.0010\n140,0.0002\n",
    },
    rightFiles: soundFiles,
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
  "not-computed-yet": { text: "reaction 2 H2O2 -> 2 H2O + O2\n  enthalpy -196.4 kJ/mol\n" },
};

/** Twenty readings of a first-order decay with some scatter and a drift, mol/L in a second. */
function bent(drift: number): string {
  const scatter = [3, -2, 1, -3, 2, -1, 2, -3, 1, -2, 3, -1, -2, 2, -1, 3, -3, 1, 2, -2];
  const rows = scatter.map((step, index) => {
    let c = 0.1;
    for (let n = 0; n < index; n++) c *= 0.8;
    const t = 15 * index;
    return `${t},${(c + 0.0001 * step + drift * Math.max(0, t - 90)).toFixed(4)}`;
  });
  return `t / s,c / mol/L\n${rows.join("\n")}\n`;
}
