import assert from "node:assert/strict";
import { codesOf, describeText, onlyRun } from "../support/describeText.js";

const decay = Array.from({ length: 12 }, (_, i) => [10 * i, Number((0.1 * Math.exp(-0.02 * 10 * i)).toFixed(5))]);
const rows = (change: (row: string, index: number) => string | null = (row) => row): string =>
  decay
    .map((row, index) => change(row.join(","), index))
    .filter((row): row is string => row !== null)
    .join("\n");
const header = "t / s,c / mol/L";
const sound = `${header}\n${rows()}\n`;

const description = (data: string, more = ""): string => `reaction 2 H2O2 -> 2 H2O + O2
run X
  temperature 25 °C
  taken H2O2 0.1 mol/L
${data}
  follow H2O2 as concentration from c
  fit order 1 in H2O2
${more}`;
const usual = `  data "x.csv"
    column t "t / s"
    column c "c / mol/L"`;

interface Case {
  readonly what: string;
  readonly file?: string | Uint8Array | null;
  readonly data?: string;
  /** code@line: first words */
  readonly said: readonly string[];
  /** readings used; null: no signal at all */
  readonly used: number | null;
}

const bytes = (...values: number[]): Uint8Array => Uint8Array.from(values);

const cases: readonly Case[] = [
  { what: "sound file", said: [], used: 12 },
  { what: "no file", file: null, said: ["data-missing@5: There is no file x.csv."], used: null },
  { what: "empty file", file: "", said: ["data-empty@5: x.csv is empty."], used: null },
  {
    what: "header only",
    file: `${header}\n`,
    said: [
      "data-no-rows@6: x.csv has headers in line 1 but no readings",
      "data-no-rows@7: x.csv has headers in line 1",
    ],
    used: null,
  },
  {
    what: "bytes that no text has",
    file: bytes(0, 1, 2, 0, 255, 0, 7),
    said: ["data-not-text@5: x.csv is not a text file"],
    used: null,
  },
  {
    what: "empty cells",
    file: `${header}\n${rows((row, i) => (i === 3 || i === 5 ? row.replace(/,.*/, ",") : row))}\n`,
    said: ["data-cell-empty@7: x.csv, line 5: the cell of c / mol/L is empty, and so is one other."],
    used: 10,
  },
  {
    what: "a word among numbers",
    file: `${header}\n${rows((row, i) => (i === 3 ? row.replace(/,.*/, ",spilt") : row))}\n`,
    said: ["data-cell-word@7: x.csv, line 5: “spilt” under c / mol/L is not a number."],
    used: 11,
  },
  {
    what: "NaN and inf are words",
    file: `${header}\n${rows((row, i) => (i === 3 ? row.replace(/,.*/, ",NaN") : i === 4 ? row.replace(/,.*/, ",inf") : row))}\n`,
    said: ["data-cell-word@7: x.csv, line 5: “NaN” under c / mol/L is not a number, nor"],
    used: 10,
  },
  {
    what: "a short row",
    file: `${header}\n${rows((row, i) => (i === 4 ? row.replace(/,.*/, "") : row))}\n`,
    said: ["data-row-short@7: x.csv, line 6: the row ends before c / mol/L."],
    used: 11,
  },
  {
    what: "a long row",
    file: `${header}\n${rows((row, i) => (i === 4 ? `${row},9` : row))}\n`,
    said: ["data-row-long@5: x.csv, line 6: the row has more cells than the 2 columns; the first too many is “9”."],
    used: 12,
  },
  {
    what: "time that runs backwards",
    file: `${header}\n${rows((row, i) => (i === 8 ? "15,0.02" : row))}\n`,
    said: ["data-time-backwards@6: x.csv, line 10: t / s runs backwards, from 70 to 15."],
    used: 8,
  },
  {
    what: "a time twice",
    file: `${header}\n${rows((row, i) => (i === 8 ? "70,0.0245" : row))}\n`,
    said: ["data-time-twice@6: x.csv, line 10: t / s is 70 as in the row before. Both readings are used."],
    used: 12,
  },
  {
    what: "more words than numbers",
    file: `${header}\n${rows((row, i) => (i % 4 ? row.replace(/,.*/, ",low") : row))}\n`,
    said: [
      "data-cell-word@7: x.csv, line 3: “low”",
      "column-not-numbers@7: 9 of 12 cells of column c in x.csv are not numbers",
    ],
    used: 0,
  },
  {
    what: "a thousands mark",
    file: `${header}\n${rows((row, i) => (i === 3 ? '30,"1,234.5"' : row))}\n`,
    said: ["data-thousands-mark@7: x.csv, line 5: “1,234.5” under c / mol/L has a mark between its thousands."],
    used: 11,
  },
  {
    what: "a decimal comma in a file with points",
    file: `${header}\n${rows((row, i) => (i === 3 ? '30,"0,055"' : row))}\n`,
    said: ["data-decimal-comma@7: x.csv, line 5: “0,055” under c / mol/L has a comma"],
    used: 11,
  },
  {
    what: "a decimal point in a file with commas",
    file: sound.replaceAll(",", ";").replaceAll(".", ",").replace("0,05488", "0.05488"),
    said: ["data-decimal-point@7: x.csv, line 5: “0.05488” under c / mol/L has a point"],
    used: 11,
  },
  {
    what: "a quote that stays open",
    file: sound.replace("0.05488", '"0.05488'),
    said: ["data-quote-open@5: x.csv, line 5"],
    used: null,
  },
  {
    what: "something behind a quote",
    file: sound.replace("0.05488", '"0.05488"x'),
    said: ["data-quote-stray@5: x.csv, line 5"],
    used: null,
  },
  {
    what: "a header that is not there",
    data: usual.replace('"c / mol/L"', '"c / mol/l"').replace("mol/l", "mmol/L"),
    said: [
      "data-column-missing@7: x.csv has no column “c / mmol/L”. Its headers, in line 1, are “t / s” and “c / mol/L”.",
    ],
    used: null,
  },
  {
    what: "a header twice",
    file: sound.replace(header, "t / s,t / s"),
    said: [
      "data-column-twice@6: x.csv has the header “t / s” more than once in line 1. Give the column by its number: 1 and 2.",
      "data-column-missing@7",
    ],
    used: null,
  },
  {
    what: "no header row",
    file: rows(),
    said: ["data-no-header@6: x.csv has no header row", "data-no-header@7"],
    used: null,
  },
  {
    what: "columns by number",
    file: rows(),
    data: '  data "x.csv"\n    column t 1 s\n    column c 2 mol/L',
    said: [],
    used: 12,
  },
  {
    what: "a column number that is not there",
    data: '  data "x.csv"\n    column t 1\n    column c 5 mol/L',
    said: ["data-column-number@7: x.csv has no column 5: it has 2 columns, counted from 1."],
    used: null,
  },
  {
    what: "another unit in the header",
    data: `${usual} mmol/L`,
    said: ["data-unit-differs@7: The header “c / mol/L” (x.csv, line 1) says mol L^-1, this line says mmol L^-1."],
    used: null,
  },
  {
    what: "a header whose unit is none",
    file: sound.replace("c / mol/L", "c / blobs"),
    data: usual.replace("c / mol/L", "c / blobs"),
    said: [
      "data-unit-unread@7: The header “c / blobs” (x.csv, line 1) ends in “blobs”",
      "column-lacks-unit@7: Column c states no unit",
    ],
    used: null,
  },
  {
    what: "no unit anywhere",
    file: sound.replace("c / mol/L", "c"),
    data: usual.replace("c / mol/L", "c"),
    said: ["column-lacks-unit@7: Column c states no unit, neither in the header nor here; concentration needs one"],
    used: null,
  },
  {
    what: "a signal of another kind",
    file: sound.replace("c / mol/L", "c / mL"),
    data: usual.replace("c / mol/L", "c / mL"),
    said: ["signal-wrong-unit@8: Column c is in mL, a unit of volume; concentration needs another"],
    used: 0,
  },
  {
    what: "no time",
    file: sound.replace("t / s", "t / mL"),
    data: usual.replace("t / s", "t / mL"),
    said: ["run-lacks-time@2: Run X has no column of time in x.csv."],
    used: null,
  },
  {
    what: "two times",
    file: sound.replace(header, "t / s,c / mol/L,u / min").replace(/(\d)$/gm, "$1,1"),
    data: `${usual}\n    column u "u / min"`,
    said: ["run-times@8: Run X counts time by column t; u is a time too and is not used."],
    used: 12,
  },
  {
    what: "an uncertainty of another kind",
    data: `${usual}\n      random 1 mL`,
    said: ["uncertainty-wrong-unit@8: The uncertainty is in mL, the readings of column c are in mol L^-1."],
    used: 12,
  },
  {
    what: "a relative uncertainty and a reading of zero",
    file: `${header}\n${rows((row, i) => (i === 11 ? "110,0" : row))}\n`,
    data: `${usual}\n      random 1 %`,
    said: ["uncertainty-of-zero@8: In per cent, a reading of zero in column c would be exact"],
    used: 12,
  },
  {
    what: "an unknown encoding",
    data: `${usual}\n    encoding "latin-99"`,
    said: ["data-encoding-unknown@5: No encoding is called latin-99"],
    used: null,
  },
  {
    what: "a wrong encoding",
    file: bytes(...new TextEncoder().encode(header), 0xe9, 10, 49, 44, 50, 10),
    data: `${usual}\n    encoding "utf-8"`,
    said: ["data-encoding-wrong@5: x.csv is not written in utf-8."],
    used: null,
  },
  {
    what: "a path of one machine",
    data: usual.replace("x.csv", "/data/x.csv"),
    said: ["data-path-absolute@5: /data/x.csv is a path of one machine."],
    used: null,
  },
  {
    what: "a path with backslashes",
    data: usual.replace("x.csv", "d\\\\x.csv"),
    said: ["data-path-backslash@5: Paths are written with /: d/"],
    used: null,
  },
  {
    what: "an empty path",
    data: usual.replace("x.csv", ""),
    said: ["data-path-empty@5: The path is empty."],
    used: null,
  },
  {
    what: "a path above everything",
    data: usual.replace("x.csv", "../../../x.csv"),
    said: ["data-path-leaves@5: ../../../x.csv leads out"],
    used: null,
  },
];

describe("data files as they are, through the whole way", () => {
  for (const { what, file = sound, data = usual, said, used } of cases) {
    it(what, async () => {
      const text = description(data);
      const found = await describeText(text, file === null ? {} : { "x.csv": file });
      const shown = found.diagnostics
        .filter(({ code }) => !code.startsWith("fit-"))
        .map(({ code, line, message }) => `${code}@${line}: ${message}`);
      assert.equal(shown.length, said.length, shown.join("\n"));
      for (const [index, words] of said.entries()) assert.ok(shown[index]?.startsWith(words), shown[index]);
      const [follow] = onlyRun(found).follow;
      assert.equal(follow?.used, used ?? 0);
      const [fit] = onlyRun(found).fits;
      if (used === null || used === 0) assert.deepEqual(fit?.parameters, {});
      else assert.equal(fit?.points, used);
    });
  }

  it("separator, decimal comma, BOM and line ends change no number", async () => {
    const k = async (file: string): Promise<number | undefined> =>
      onlyRun(await describeText(description(usual), { "x.csv": file })).fits[0]?.parameters["k"]?.value;
    const plain = await k(sound);
    assert.ok(plain !== undefined && Math.abs(plain - 0.01) < 1e-4);
    for (const other of [
      sound.replaceAll(",", ";"),
      sound.replaceAll(",", "\t"),
      sound.replaceAll(",", ";").replaceAll(".", ","),
      `\ufeff${sound}`,
      sound.replaceAll("\n", "\r\n"),
      `# made by an instrument\nserial 12\n\n${sound}`,
      sound
        .replace(header, "t,c")
        .replace("\n", "\ns,mol/L\n")
        .replace("t,c", "t / s,c / mol/L")
        .replace("\ns,mol/L", ""),
    ]) {
      assert.equal(await k(other), plain);
    }
  });

  it("a mass concentration becomes an amount concentration by the molar mass, or says what it needs", async () => {
    const grams = sound.replace("c / mol/L", "c / g/L").replace(/,(0\.\d+)/g, (_, c) => `,${34.014 * Number(c)}`);
    const lines = usual.replace("c / mol/L", "c / g/L");
    const run = onlyRun(await describeText(description(lines, "  rate from 0 s to 10 s\n"), { "x.csv": grams }));
    const expected = ((decay[0]?.[1] ?? 0) - (decay[1]?.[1] ?? 0)) / 10 / 2;
    assert.ok(Math.abs((run.rates[0]?.rate?.value ?? 0) / expected - 1) < 1e-9);
    assert.equal(run.rates[0]?.rate?.unit, "mol L^-1 s^-1");
    const dye = `species dye\nreaction dye -> dye\n`
      .replace("-> dye", "-> bleached")
      .replace("reaction", "species bleached\nreaction");
    const text = description(lines)
      .replace(/^reaction.*\n/, dye)
      .replaceAll("H2O2", "dye");
    const found = codesOf(await describeText(text, { "x.csv": grams }));
    assert.ok(found.includes("signal-needs-formula@10"), found.join(" "));
  });

  it("a run that inherits its columns hears of its own file on its own data line", async () => {
    const text = `${description(usual)}run Y like X\n  data "y.csv"\n`;
    const found = await describeText(text, {
      "x.csv": sound,
      "y.csv": sound.replace("0.1\n", "\n").replace("c / mol", "d / mol"),
    });
    assert.deepEqual(
      found.diagnostics.map(({ code, line, item }) => `${code}@${line} ${item}`),
      ["data-column-missing@11 run Y"],
    );
    assert.deepEqual(found.diagnostics[0]?.mends, []);
  });
});
