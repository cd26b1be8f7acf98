import assert from "node:assert/strict";
import fc from "fast-check";
import type { Problem } from "../../src/contract/problem.js";
import { messageOf } from "../../src/contract/words.js";
import { cellProblems, rowProblems, timeProblems } from "../../src/data/columnProblems.js";
import type { DataOptions } from "../../src/data/dataOptions.js";
import { readColumns } from "../../src/data/readColumns.js";
import { readAnyTable, readPlainTable } from "../../src/data/readTable.js";
import { parseHeaderUnit } from "../../src/quantity/headerUnit.js";
import { columnsOf, refusalOf, tableOf } from "./reading.js";

const origin = { uri: "file:///a.raterun", start: 0, end: 4 };
const latin = (text: string): Uint8Array => Uint8Array.from(text, (character) => character.charCodeAt(0));
const utf16 = (text: string, little: boolean): Uint8Array => {
  const bytes = Uint8Array.from(Buffer.from(`\ufeff${text}`, "utf16le"));
  return little ? bytes : Uint8Array.from(Buffer.from(bytes).swap16());
};
const inWords = (problems: readonly Problem[]): string[] => problems.map((one) => `${one.severity}: ${messageOf(one)}`);

/** The words about column 2, and about the rows, of a file called `run.csv`. */
function said(file: string, options: DataOptions = {}): string[] {
  const columns = columnsOf(file, options);
  return inWords([...cellProblems(columns, 1, "run.csv", origin), ...rowProblems(columns, "run.csv", origin)]);
}

describe("bad data files: encodings", () => {
  const text = "t / s;T / °C\n0;25,5\n1;25,25\n";
  const table = { "t / s": [0, 1], "T / °C": [25.5, 25.25] };

  it("reads UTF-8 and UTF-16 with a mark, and Windows-1252 without", () => {
    assert.deepEqual(tableOf(`\ufeff${text}`), table);
    assert.deepEqual(tableOf(utf16(text, true)), table);
    assert.deepEqual(tableOf(utf16(text, false)), table);
    assert.deepEqual(tableOf(latin(text)), table);
    assert.deepEqual(Object.keys(tableOf(latin("t,\x80 \x93x\x94\n0,1\n"))), ["t", "€ “x”"]);
  });

  it("reads a decimal comma in UTF-16 of either order as in UTF-8, with a preamble and comments", () => {
    const long = `Instrument;"x; y"\n# °C\n\n${text}`;
    for (const file of [utf16(long, true), utf16(long, false), latin(long), `\ufeff${long}`]) {
      const { decimalComma, headerLine } = columnsOf(file);
      assert.deepEqual([tableOf(file), decimalComma, headerLine], [table, true, 4]);
    }
  });

  it("says that half a character is missing at the end of UTF-16", () => {
    const bytes = utf16(text, true);
    assert.equal(
      refusalOf(bytes.subarray(0, bytes.length - 1)),
      "error: run.csv is not written in utf-16le. Leave the encoding out, or state the right one.",
    );
  });

  it("takes the stated encoding, but a mark goes before it", () => {
    // ISO 8859-5 puts the Cyrillic letter te at 0xE2 (ECMA-113)
    assert.deepEqual(Object.keys(tableOf(latin("\xe2,V\n0,1\n"), { encoding: "iso-8859-5" })), ["т", "V"]);
    assert.deepEqual(tableOf(utf16(text, true), { encoding: "windows-1252" }), table);
  });

  it("says that an encoding is unknown, or is another", () => {
    assert.equal(
      refusalOf(text, { encoding: "windows-1525" }),
      "error: No encoding is called windows-1525, so run.csv is not read. Usual ones are utf-8, utf-16le and windows-1252.",
    );
    assert.equal(
      refusalOf(latin(text), { encoding: "utf-8" }),
      "error: run.csv is not written in utf-8. Leave the encoding out, or state the right one.",
    );
  });

  it("refuses what is no text", () => {
    const words = (line: number): string =>
      `error: run.csv is not a text file (line ${line} holds bytes that no text has). Save the readings as text, for example as CSV in UTF-8.`;
    assert.equal(refusalOf("t,V\n0,1\n1,\u0000\n"), words(3));
    assert.equal(refusalOf("\u0000\u0000\u0000"), words(1));
    // NUL bytes as a system leaves them at the end of a file when power fails, beyond the part that shows the layout too
    assert.equal(refusalOf(`t,V\n${"0,1\n".repeat(50_000)}${"\u0000".repeat(4096)}`), words(50_002));
    // the first bytes of a ZIP archive, which a workbook is (APPNOTE 4.3.7)
    assert.equal(refusalOf(Uint8Array.from([0x50, 0x4b, 3, 4, 20, 0, 6, 0, 8, 0, 0, 0])), words(1));
    // the signature of a PNG file (PNG specification, 5.2)
    assert.equal(refusalOf(Uint8Array.from([0x89, 0x50, 0x4e, 0x47, 13, 10, 26, 10, 0, 0, 0, 13])), words(2));
    assert.equal(refusalOf(utf16(text, true).subarray(2)), words(1));
  });
});

describe("bad data files: what is refused", () => {
  it("an empty file, blank lines, comments alone", () => {
    const words = "error: run.csv is empty. Check that the instrument saved its readings.";
    for (const file of ["", "\ufeff", "\n\n", "  \r\n", "# nothing yet\n", "\u001a"]) {
      assert.equal(refusalOf(file), words, JSON.stringify(file));
    }
  });

  it("a quote that is never closed, with its line", () => {
    const words = (line: number): string =>
      `error: run.csv, line ${line}: a quote (") opens here and is never closed. Close it or take it out.`;
    assert.equal(refusalOf('t,V\n0,1\n\n1,"2\n3,4\n5,6\n'), words(4));
    assert.equal(refusalOf('t,V\n0,1\n"1\n",2\n3,"4'), words(5));
    assert.equal(refusalOf('t,V\r\n0,1\r\n# "quote" here\r\n1,"2\r\n'), words(4));
  });

  it("something after a closing quote, with its line", () => {
    const words =
      'error: run.csv, line 3: something stands between a closing quote (") and the next separator. Take it out, or write quotes inside a text twice ("").';
    assert.equal(refusalOf('t,V\n0,1\n1,"2" mL\n'), words);
  });

  it("a line without an end", () => {
    const words =
      "error: run.csv, line 2 has more than 1048576 characters. Check that the file has line ends and is a table of readings.";
    assert.equal(refusalOf(`t,V\n${"1".repeat(1_048_577)}\n`), words);
    assert.equal(
      refusalOf(`t,V\n0,1\n1,2\n3,${"x".repeat(300)}`, { maximumLineLength: 100 }),
      words.replace("line 2", "line 4").replace("1048576", "100"),
    );
  });

  it("one line of 64 MiB", () => {
    const started = performance.now();
    const words = refusalOf(new Uint8Array(64 * 1024 * 1024).fill(0x31));
    assert.match(words, /^error: run\.csv, line 1 has more than 1048576 characters\./);
    assert.ok(performance.now() - started < 5_000);
  }).timeout(20_000);

  it("too many rows and too many columns", () => {
    const words = "error: run.csv has more than 3 rows. Keep fewer readings, for example every tenth.";
    assert.equal(refusalOf("t,V\n0,1\n1,2\n2,3\n3,4\n", { maximumRows: 3 }), words);
    assert.equal(refusalOf("t,V\n0,1\n1,x\n2,3\n3,4\n", { maximumRows: 3 }), words);
    assert.deepEqual(tableOf("t,V\n0,1\n1,2\n2,3\n", { maximumRows: 3 }), { t: [0, 1, 2], V: [1, 2, 3] });
    assert.equal(
      refusalOf("a,b,c,d\n0,1,2,3\n", { maximumColumns: 3 }),
      "error: run.csv, line 1 has more than 3 columns. Keep the columns that are used, with time running down the rows.",
    );
  });
});

describe("bad data files: what is said of cells and rows", () => {
  it("an empty cell", () => {
    assert.deepEqual(said("t,V / mL\n0,1\n1,\n2,3\n"), [
      "warning: run.csv, line 3: the cell of V / mL is empty. The point is left out.",
    ]);
    assert.deepEqual(said("t,V / mL\n0,1\n1,\n2,\n3,\n"), [
      "warning: run.csv, line 3: the cell of V / mL is empty, and so are 2 others. These points are left out.",
    ]);
  });

  it("words, NaN and infinities", () => {
    assert.deepEqual(said("t,V\n0,1\n1,bubble\n"), [
      "warning: run.csv, line 3: “bubble” under V is not a number. The point is left out.",
    ]);
    assert.deepEqual(said("t,V\n0,NaN\n1,2\n2,-inf\n"), [
      "warning: run.csv, line 2: “NaN” under V is not a number, nor is one other. These points are left out.",
    ]);
  });

  it("a short row, also when cut off in the middle of the file's writing", () => {
    assert.deepEqual(said("t,V\n0,1\n1,2\n2\n"), [
      "warning: run.csv, line 4: the row ends before V. The point is left out.",
    ]);
    assert.deepEqual(said("t,V\n0,1\n1,2\n2,"), [
      "warning: run.csv, line 4: the cell of V is empty. The point is left out.",
    ]);
  });

  it("a long row", () => {
    assert.deepEqual(said("t,V\n0,1\n1,2,5\n2,3\n"), [
      "warning: run.csv, line 3: the row has more cells than the 2 columns; the first too many is “5”. Look for a separator inside a number or a text.",
    ]);
  });

  it("thousands marks and the other decimal mark", () => {
    assert.deepEqual(said('t,V\n0,"1,234.5"\n1,2.5\n'), [
      "warning: run.csv, line 2: “1,234.5” under V has a mark between its thousands. Write it without one; until then the point is left out.",
    ]);
    assert.deepEqual(said("t;V\n0;1 234\n1;2.5\n2;3.5\n"), [
      "warning: run.csv, line 2: “1 234” under V has a mark between its thousands. Write it without one; until then the point is left out.",
    ]);
    assert.deepEqual(said("t;V\n0;1.5\n1;2,5\n2;3.5\n"), [
      "error: run.csv, line 3: “2,5” under V has a comma where this file is read with a decimal point. If it is a decimal comma, write “decimal comma” under the data line.",
    ]);
    assert.deepEqual(said("t;V\n0;1,5\n1;2,5\n2;3.5\n"), [
      "error: run.csv, line 4: “3.5” under V has a point where this file is read with a decimal comma. Write all numbers of the file with the same mark.",
    ]);
  });

  it("thousands marks of every kind, in a number column and at its end", () => {
    const words = (text: string): string =>
      `warning: run.csv, line 3: “${text}” under V has a mark between its thousands. Write it without one; until then the point is left out.`;
    for (const text of [
      "1,234.5",
      "1 234",
      "1'234",
      "1’234.5",
      "1\u00a0234",
      "1\u202f234",
      "-12,345,678",
      "1.234.567",
    ]) {
      assert.deepEqual(said(`t;V\n0;1.5\n1;${text}\n2;3.5\n`), [words(text)], text);
    }
    for (const text of ["1.234,5", "1 234,5", "1'234,5", "1.234.567"]) {
      assert.deepEqual(said(`t;V\n0;1,5\n1;${text}\n2;3,5\n`), [words(text)], text);
    }
    assert.deepEqual(said("t;V\n0;1.5\n1;1 234\n2;2 234\n3;3 234\n4;1\n"), [
      "warning: run.csv, line 3: “1 234” under V has a mark between its thousands, and so have 2 others. Write them without one; until then these points are left out.",
    ]);
    assert.deepEqual(said("t;V\n0;1.5\n1;1.234\n2;1 23\n"), [
      "warning: run.csv, line 4: “1 23” under V is not a number. The point is left out.",
    ]);
  });

  it("counts beyond the thousand faults that are kept, of every column and kind", () => {
    const rows = "1,bubble\n".repeat(3000);
    assert.deepEqual(said(`t,V\n0,1\n${rows}2,\n3\n4\n5,6,7\n${rows}`), [
      "warning: run.csv, line 3: “bubble” under V is not a number, nor are 5999 others. These points are left out.",
      "warning: run.csv, line 3003: the cell of V is empty. The point is left out.",
      "warning: run.csv, line 3004: the row ends before V, and so does one other. These points are left out.",
      "warning: run.csv, line 3006: the row has more cells than the 2 columns; the first too many is “7”. Look for a separator inside a number or a text.",
    ]);
    const columns = columnsOf(`t,V\nx,1\n${rows}x,\n0,1\n`);
    const counts = columns.tallies.map(({ first: { kind, column }, count }) => [kind, column, count]);
    assert.deepEqual(counts, [
      ["word", 0, 2],
      ["word", 1, 3000],
      ["empty", 1, 1],
    ]);
    assert.equal(columns.faultCount, 3003);
  });

  it("stays silent about a sound file, and about other columns", () => {
    assert.deepEqual(said("t,V\n0,1\n1,2\n"), []);
    assert.deepEqual(said("t,V,n\n0,1,\n1,2,x\n"), []);
  });

  it("time that runs backwards or stands still", () => {
    const about = (file: string): string[] => inWords(timeProblems(columnsOf(file), 0, "run.csv", origin));
    assert.deepEqual(about("t / s,V\n0,1\n10,2\n5,3\n"), [
      "error: run.csv, line 4: t / s runs backwards, from 10 to 5. Put the rows in order, or keep two runs in two files.",
    ]);
    assert.deepEqual(about("0,1\n10,2\n10,3\n10,4\n"), [
      "information: run.csv, line 3: column 1 is 10 as in the row before; this happens in 2 rows. All readings are used.",
    ]);
    assert.deepEqual(about("t,V\n0,1\nx,2\n1,3\n"), []);
  });
});

describe("hostile data files", () => {
  it("a hundred thousand quotes", () => {
    const started = performance.now();
    assert.match(refusalOf(`t,V\n0,1\n1,${'"'.repeat(100_001)}\n`), /^error: run\.csv, line 3: a quote/);
    assert.deepEqual(tableOf(`t,V\n0,1\n1,${'"'.repeat(100_000)}\n`), { t: [0, 1], V: [1, null] });
    assert.match(refusalOf(`${'"\n'.repeat(50_001)}`), /^error: run\.csv, line \d+: /);
    assert.ok(performance.now() - started < 10_000);
  }).timeout(30_000);

  it("never throws, whatever the bytes are, and never gives an infinity", () => {
    const alphabet = [
      ...'0123456789.,;:-+eETZ \t\n\r"#NaNx/s',
      "10:15:30",
      "2026-11-03",
      "03/11/2026 9:00",
      " pm",
      "\u2212",
      "°",
      "\u0000",
    ];
    const bytes = fc.oneof(
      fc.uint8Array({ maxLength: 200 }),
      fc
        .array(fc.constantFrom(...alphabet), { maxLength: 120 })
        .map((letters) => new TextEncoder().encode(letters.join(""))),
    );
    const options = fc.record(
      {
        delimiter: fc.constantFrom(",", ";", "tab", "space", "||", "é", ""),
        decimalComma: fc.boolean(),
        encoding: fc.constantFrom("utf-8", "utf-16le", "windows-1252", "nonsense"),
        skip: fc.nat(5),
      },
      { requiredKeys: [] },
    );
    fc.assert(
      fc.property(bytes, options, (file, stated) => {
        const reading = readColumns(file, stated);
        if (reading.kind !== "columns") return;
        const { columns, rows, lines } = reading.columns;
        assert.equal(lines.length, rows);
        for (const { values } of columns) {
          assert.equal(values.length, rows);
          assert.ok(values.every((value) => Math.abs(value) !== Number.POSITIVE_INFINITY));
        }
        const plain = readPlainTable(file, stated, parseHeaderUnit);
        if (plain !== null) assert.deepEqual(plain, readAnyTable(file, stated, parseHeaderUnit));
      }),
      { seed: 20261103, numRuns: 3000 },
    );
  }).timeout(30_000);
});
