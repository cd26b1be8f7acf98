import { changedWhileRead } from "../../../contract/messages/data.js";
import { type CodeExamples, unshown } from "../codeExample.js";
import { clockText, fileWith, runWith, soundFile, soundFiles, soundRun, timedFile } from "./soundRun.js";

const bytes = (...values: number[]) => ({ kind: "bytes", bytes: Uint8Array.from(values) }) as const;
const latin = (text: string) => bytes(...Array.from(text, (letter) => letter.charCodeAt(0)));
const withPath = (path: string): string => runWith("data/a.csv", path);

/** The sound file with semicolons between the cells and decimal commas. */
const semicolons = soundFile.replaceAll(",", ";").replaceAll(".", ",");
/** What is not known is taken out, not made up. */
const withoutRow = fileWith("60,0.0404\n", "");

/** Time as a column of dates or clock times. */
const clocked = runWith('"t / s"', '"clock"');

export const dataExamples: CodeExamples = {
  "data-missing": { text: withPath("data/b.csv"), files: soundFiles, write: ["data/b.csv", "data/a.csv"] },
  "data-folder": {
    text: withPath("data"),
    files: { data: { words: "a folder", gives: { kind: "folder" } }, ...soundFiles },
    write: ['"data"', '"data/a.csv"'],
  },
  "data-too-large": {
    text: soundRun,
    files: { "data/a.csv": { words: "a file of 800 MB", gives: { kind: "too large", size: 8e8 } } },
    rightFiles: soundFiles,
  },
  "data-unreadable": {
    text: soundRun,
    files: {
      "data/a.csv": {
        words: "a file that only its owner may read",
        gives: { kind: "unreadable", reason: "permission is denied" },
      },
    },
    rightFiles: soundFiles,
  },
  "data-changed-while-read": {
    text: soundRun,
    files: {
      "data/a.csv": {
        words: "a file that the instrument still writes to",
        gives: { kind: "unreadable", reason: changedWhileRead },
      },
    },
    rightFiles: soundFiles,
  },
  "data-path-absolute": {
    text: withPath("/measurements/a.csv"),
    files: soundFiles,
    write: ["/measurements/a.csv", "data/a.csv"],
  },
  "data-path-backslash": { text: withPath("data\\a.csv"), files: soundFiles },
  "data-path-leaves": { text: withPath("../../../a.csv"), files: soundFiles, write: ["../../../a.csv", "data/a.csv"] },
  "data-path-unsaved": {
    text: soundRun,
    files: soundFiles,
    unsaved: true,
    write: ["", ""],
  },
  "data-path-empty": { text: withPath(""), files: soundFiles, write: ['""', '"data/a.csv"'] },
  "data-not-text": {
    text: soundRun,
    files: { "data/a.csv": { words: "a workbook", gives: bytes(0x50, 0x4b, 3, 4, 20, 0, 6, 0, 8, 0, 0, 0) } },
    rightFiles: soundFiles,
  },
  "data-encoding-unknown": {
    text: runWith('"data/a.csv"\n', '"data/a.csv"\n    encoding "latin-99"\n'),
    files: soundFiles,
    write: ["latin-99", "utf-8"],
  },
  "data-encoding-wrong": {
    text: runWith('"data/a.csv"\n', '"data/a.csv"\n    encoding "utf-8"\n'),
    files: {
      "data/a.csv": {
        words: "a file in Windows-1252 whose first line is “# 25 °C”, then the readings",
        gives: latin(`# 25 °C\n${soundFile}`),
      },
    },
    write: ["utf-8", "windows-1252"],
  },
  "data-empty": { text: soundRun, files: { "data/a.csv": "" }, rightFiles: soundFiles },
  "data-no-rows": { text: soundRun, files: { "data/a.csv": "t / s,c / mol/L\n" }, rightFiles: soundFiles },
  "data-no-header": {
    text: soundRun,
    files: fileWith("t / s,c / mol/L\n", ""),
    write: ['column t "t / s"\n    column c "c / mol/L"', "column t 1 s\n    column c 2 mol/L"],
  },
  "data-column-missing": { text: runWith('"c / mol/L"', '"conc / mol/L"'), files: soundFiles, write: ['"conc', '"c'] },
  "data-column-twice": {
    text: soundRun,
    files: { "data/a.csv": soundFile.replace("L\n", "L,c / mol/L\n").replace(/(\d)\n/g, "$1,0.1\n") },
    write: ['column c "c / mol/L"', "column c 2 mol/L"],
  },
  "data-column-number": {
    text: runWith('column c "c / mol/L"', "column c 3 mol/L"),
    files: soundFiles,
    write: ["column c 3", "column c 2"],
  },
  "data-cell-empty": { text: soundRun, files: fileWith("60,0.0404", "60,"), rightFiles: withoutRow },
  "data-cell-word": { text: soundRun, files: fileWith("0.0404", "bubble"), rightFiles: withoutRow },
  "data-thousands-mark": {
    text: runWith('mol/L"', 'mmol/L"').replace("0.100 mol/L", "1300 mmol/L"),
    files: {
      "data/a.csv": thousands('"1,303.0"'),
    },
    rightFiles: { "data/a.csv": thousands("1303") },
  },
  "data-row-short": { text: soundRun, files: fileWith("60,0.0404", "60"), rightFiles: withoutRow },
  "data-row-long": { text: soundRun, files: fileWith("60,0.0404", "60,0.0404,7"), rightFiles: soundFiles },
  "data-time-backwards": {
    text: soundRun,
    files: fileWith("60,0.0404\n80,0.0303", "80,0.0303\n60,0.0404"),
    rightFiles: soundFiles,
  },
  "data-time-twice": { text: soundRun, files: fileWith("80,", "60,"), rightFiles: soundFiles },
  "data-date-order": {
    text: clocked,
    files: { "data/a.csv": timedFile("clock", (clock, index) => `0${index < 4 ? 3 : 4}/11/2026 ${clock}`) },
    rightFiles: { "data/a.csv": timedFile("clock", (clock) => `2026-11-03 ${clock}`) },
  },
  "data-clock-parts": {
    beside: "column-not-numbers",
    text: clocked,
    files: { "data/a.csv": timedFile("clock", (clock) => clock.slice(3)) },
    rightFiles: { "data/a.csv": timedFile("clock", (clock) => clock) },
  },
  "data-cell-time": {
    text: clocked,
    files: { "data/a.csv": timedFile("clock", (clock, index) => (index === 3 ? "late" : clock)) },
    rightFiles: { "data/a.csv": timedFile("clock", (clock) => clock).replace(/^00:01:00.*\n/m, "") },
  },
  "data-time-offset": {
    text: clocked,
    files: { "data/a.csv": timedFile("clock", (clock, index) => `2026-11-03 ${clock}${index === 3 ? "Z" : ""}`) },
    rightFiles: { "data/a.csv": timedFile("clock", (clock) => `2026-11-03 ${clock}`) },
  },
  "data-midnight-passed": {
    text: clocked,
    files: {
      "data/a.csv": timedFile("clock", (clock, index) =>
        index < 3 ? clock.replace("00:00", "23:59") : clockText(20 * (index - 3)),
      ),
    },
    rightFiles: { "data/a.csv": timedFile("clock", (clock) => `2026-11-03 ${clock}`) },
  },
  "data-unit-differs": {
    text: runWith('"c / mol/L"', '"c / mol/L" mmol/L'),
    files: soundFiles,
  },
  "data-unit-unread": {
    text: runWith("    column c", '    column b "stirring / blobs"\n    column c'),
    files: { "data/a.csv": soundFile.replace("s,", "s,stirring / blobs,").replace(/^(\d+),/gm, "$1,300,") },
    write: ['"stirring / blobs"', '"stirring / blobs" min^-1'],
  },
  "data-decimal-comma": { text: soundRun, files: fileWith("0.0404", '"0,0404"'), rightFiles: soundFiles },
  "data-decimal-point": {
    text: soundRun,
    files: { "data/a.csv": semicolons.replace("0,0404", "0.0404") },
    rightFiles: { "data/a.csv": semicolons },
  },
  "data-quote-open": { text: soundRun, files: fileWith("0.0404", '"0.0404'), rightFiles: soundFiles },
  "data-quote-stray": { text: soundRun, files: fileWith("0.0404", '"0.0404"x'), rightFiles: soundFiles },
  "data-line-too-long": unshown("data-line-too-long", "It takes a line of more than a million characters.", {
    file: "data/a.csv",
    line: 1,
    limit: 1_048_576,
  }),
  "data-too-many-rows": unshown("data-too-many-rows", "It takes a file of many million rows.", {
    file: "data/a.csv",
    limit: 10_000_000,
  }),
  "data-too-many-columns": unshown("data-too-many-columns", "It takes a row of very many cells.", {
    file: "data/a.csv",
    line: 1,
    limit: 10_000,
  }),
};

/** Concentrations in mmol/L, the first of them as given. */
function thousands(first: string): string {
  const rows = [749, 551, 404, 303, 221, 167, 120].map((c, index) => `${20 * (index + 1)},${Math.round(1.3 * c)}`);
  return `t / s,c / mmol/L\n0,${first}\n${rows.join("\n")}\n`;
}
