import assert from "node:assert/strict";
import { rowOfLine } from "../../src/data/rowOfLine.js";
import { columnsOf, tableOf } from "./reading.js";

const expected = { "t / s": [0, 10, 20], "V / mL": [0, 1.5, -2.25] };

describe("reading a delimited file: the dialect", () => {
  const files: Record<string, string> = {
    "comma and point": "t / s,V / mL\n0,0\n10,1.5\n20,-2.25\n",
    "semicolon and decimal comma": "t / s;V / mL\n0;0\n10;1,5\n20;-2,25\n",
    "semicolon and point": "t / s;V / mL\n0;0\n10;1.5\n20;-2.25\n",
    "tab and decimal comma": "t / s\tV / mL\n0\t0\n10\t1,5\n20\t-2,25\n",
    "runs of blanks": "  t / s   V / mL\n  0      0\n 10      1.5\n 20     -2.25\n",
    "single blanks and decimal comma": "t / s V / mL\n0 0\n10 1,5\n20 -2,25\n",
    "quotes around everything": '"t / s","V / mL"\n"0","0"\n"10","1.5"\n"20","-2.25"\n',
    "quoted decimal commas between commas": 't / s,V / mL\n0,"0"\n10,"1,5"\n20,"-2,25"\n',
    "blanks around the cells": "t / s , V / mL\n 0 , 0 \n10 ,  1.5\n20, -2.25\n",
    CRLF: "t / s,V / mL\r\n0,0\r\n10,1.5\r\n20,-2.25\r\n",
    "CR alone": "t / s,V / mL\r0,0\r10,1.5\r20,-2.25\r",
    "no line end at the end": "t / s,V / mL\n0,0\n10,1.5\n20,-2.25",
    "a separator at the end of each row": "t / s,V / mL,\n0,0,\n10,1.5,\n20,-2.25,\n",
    "a separator at the end of the body's rows only": "t / s,V / mL\n0,0,\n10,1.5,\n20,-2.25,\n",
    "the minus sign U+2212": "t / s,V / mL\n0,0\n10,1.5\n20,\u22122.25\n",
    exponents: "t / s,V / mL\n0,0\n1e1,15E-1\n+20.,-.225e+1\n",
    "rows of separators and blank lines": "t / s,V / mL\n\n0,0\n,\n10,1.5\n  \n20,-2.25\n,\n",
    comments: '# dried over night\nt / s,V / mL\n# start\n0,0\n10,1.5\n # shaken "well\n20,-2.25\n',
    "the end mark of old files": "t / s,V / mL\r\n0,0\r\n10,1.5\r\n20,-2.25\r\n\u001a",
    "an instrument's preamble":
      'Device;"5" cell"\nOperator;none\nChannels;2\nStarted;2026-11-03 10:00\n12345\n\nt / s;V / mL\n0;0\n10;1,5\n20;-2,25\n',
    "a preamble of another delimiter":
      "Method, kinetics\nMode, 405 nm, slow\nt / s\tV / mL\n0\t0\n10\t1.5\n20\t-2.25\n",
  };
  for (const [name, file] of Object.entries(files)) {
    it(name, () => assert.deepEqual(tableOf(file), expected));
  }

  it("says what it found", () => {
    const { delimiter, decimalComma, headerLine, lines, rows } = columnsOf("Device 5\n\nt;V\n# begin\n0;0,5\n\n1;1\n");
    assert.deepEqual(
      { delimiter, decimalComma, headerLine, lines: [...lines], rows },
      { delimiter: ";", decimalComma: true, headerLine: 3, lines: [5, 7], rows: 2 },
    );
  });

  it("finds the decimal comma behind a hundred whole numbers", () => {
    const whole = Array.from({ length: 200 }, (_, index) => `${index};0`).join("\n");
    assert.equal(columnsOf(`t;V\n${whole}\n200;0,5\n`).columns[1]?.values[200], 0.5);
  });

  it("takes what the description states before what it would find", () => {
    assert.deepEqual(tableOf("a;b\n1,5;2\n", { delimiter: ",", skip: 0 }), { "a;b": [1] });
    assert.deepEqual(tableOf("a;b\n1,5;2,5\n", { decimalComma: false }), { a: [null], b: [null] });
    assert.deepEqual(tableOf("1,2\n3,4\nt,V\n0,5\n1,6\n2,7\n", { skip: 2 }), { t: [0, 1, 2], V: [5, 6, 7] });
    assert.deepEqual(tableOf("x,y\nt\tV\n0\t5\n", { delimiter: "tab" }), { t: [0], V: [5] });
  });
});

describe("reading a delimited file: headers", () => {
  it("reads units in three styles", () => {
    const { columns } = columnsOf("t / s,V (mL),p [kPa],n,c / nonsense\n0,1,2,3,4\n");
    assert.deepEqual(
      columns.map((column) => [column.header, column.unit?.text ?? null, column.unreadUnit]),
      [
        ["t / s", "s", null],
        ["V (mL)", "mL", null],
        ["p [kPa]", "kPa", null],
        ["n", null, null],
        ["c / nonsense", null, "nonsense"],
      ],
    );
  });

  it("takes a row of units under the names", () => {
    for (const units of ["s,mL,-", "(s),(mL),", "[s],[mL],–"]) {
      const { columns, headerLine } = columnsOf(`Device,X\ntime,gas,count\n${units}\n0,1,2\n1,2,3\n`);
      assert.deepEqual(
        columns.map((column) => [column.header, column.unit?.text ?? null]),
        [
          ["time", "s"],
          ["gas", "mL"],
          ["count", null],
        ],
      );
      assert.equal(headerLine, 2);
    }
  });

  it("does not take a header for units where names do not stand above it", () => {
    assert.deepEqual(Object.keys(tableOf("Started,2026-11-03\ns,g\n0,1\n1,2\n")), ["s", "g"]);
    assert.deepEqual(Object.keys(tableOf("Run of today\ns,g\n0,1\n1,2\n")), ["s", "g"]);
  });

  it("has empty headers where the file has no header row", () => {
    const table = columnsOf("0,1.5\n1,2.5\n");
    assert.deepEqual([table.headerLine, table.rows, table.columns.map((column) => column.header)], [null, 2, ["", ""]]);
    const titled = columnsOf("Kinetics of today\n0,1.5\n1,2.5\n");
    assert.deepEqual([titled.headerLine, titled.rows], [null, 2]);
  });

  it("keeps duplicated headers", () => {
    assert.deepEqual(
      columnsOf("t,V,V\n0,1,2\n").columns.map((column) => column.header),
      ["t", "V", "V"],
    );
  });

  it("reads a header cell over two lines and keeps the lines of the rows", () => {
    const table = columnsOf('Device\n"time\n(s)","gas\n(mL)"\n0,1\n1,2\n');
    assert.deepEqual(
      table.columns.map((column) => [column.header, column.unit?.text]),
      [
        ["time\n(s)", "s"],
        ["gas\n(mL)", "mL"],
      ],
    );
    assert.deepEqual([table.headerLine, [...table.lines]], [2, [5, 6]]);
  });

  it("finds the header under a preamble of any length", () => {
    for (const length of [1, 63, 64, 65, 1000, 20_000]) {
      const preamble = Array.from({ length }, (_, index) => `Setting ${index};value ${index}`).join("\r\n");
      const table = columnsOf(`${preamble}\r\nt / s;V / mL\r\n0;1,5\r\n1;2,5\r\n`);
      assert.deepEqual(
        [table.headerLine, table.columns.map(({ header }) => header), [...table.lines]],
        [length + 1, ["t / s", "V / mL"], [length + 2, length + 3]],
      );
    }
  });

  it("keeps hostile headers as they are: escaping is for those who show them", () => {
    const hostile = "<img src=x onerror=alert(1)>,[a](javascript:b)\n0,1\n1,2\n";
    assert.deepEqual(Object.keys(tableOf(hostile)), ["<img src=x onerror=alert(1)>", "[a](javascript:b)"]);
  });

  it("takes the readings' own header though a line of words stands among them", () => {
    const rows = Array.from({ length: 9 }, (_, index) => `${index + 2},5`).join("\n");
    const table = columnsOf(`t,V\n0,1\n1,2\nstirrer off\n${rows}\n`);
    assert.deepEqual([table.headerLine, table.rows, table.faults[0]?.kind], [1, 12, "word"]);
  });
});

describe("reading a delimited file: cells that are no number", () => {
  it("leaves a hole and a fault", () => {
    const table = columnsOf("t,V\n0,\nn/a,2\n2\n3,NaN\n4,inf\n5,1 234\n6,-\n7,1,5\n8,9\n");
    assert.deepEqual(Array.from(table.columns[1]?.values ?? []), [NaN, 2, NaN, NaN, NaN, NaN, NaN, 1, 9]);
    assert.deepEqual(table.faults, [
      { kind: "empty", row: 0, column: 1, text: "" },
      { kind: "word", row: 1, column: 0, text: "n/a" },
      { kind: "short", row: 2, column: 1, text: "" },
      { kind: "word", row: 3, column: 1, text: "NaN" },
      { kind: "word", row: 4, column: 1, text: "inf" },
      { kind: "thousands", row: 5, column: 1, text: "1 234" },
      { kind: "word", row: 6, column: 1, text: "-" },
      { kind: "long", row: 7, column: 2, text: "5" },
    ]);
    assert.equal(table.faultCount, 8);
  });

  it("does not guess thousands marks", () => {
    assert.deepEqual(tableOf('t,V\n0,"1,234.5"\n1,2.5\n'), { t: [0, 1], V: [null, 2.5] });
    assert.deepEqual(tableOf("t;V\n0;1.234,5\n1;2,5\n"), { t: [0, 1], V: [null, 2.5] });
  });

  it("keeps the first thousand faults and counts them all", () => {
    const table = columnsOf(`t,V\n0,1\n${"1,bubble\n".repeat(5000)}`);
    assert.deepEqual([table.rows, table.faults.length, table.faultCount], [5001, 1000, 5000]);
  });

  it("cuts the text of a cell to 40 characters", () => {
    assert.equal(columnsOf(`t,V\n0,1\n1,${"x".repeat(900)}\n`).faults[0]?.text.length, 40);
  });

  it("refuses what is too large for a number", () => {
    assert.deepEqual(tableOf("t,V\n0,1e999\n1,2\n"), { t: [0, 1], V: [null, 2] });
  });

  it("gives rows 0 for a header with nothing under it", () => {
    const table = columnsOf("t / s,V / mL\n");
    assert.deepEqual([table.rows, table.headerLine, table.columns.length], [0, 1, 2]);
  });

  it("reads cells over several lines, and the header above rows that begin with a number", () => {
    const table = columnsOf('a,b\n1,"ha \n""ha"" \nha"\n3,4\n');
    assert.deepEqual(
      [table.columns.map((column) => column.header), [...table.lines], table.faults],
      [["a", "b"], [2, 5], [{ kind: "word", row: 0, column: 1, text: 'ha \n"ha" \nha' }]],
    );
    assert.deepEqual(tableOf("t,V\n0,bubble\n1,\n2,3\n"), { t: [0, 1, 2], V: [null, null, 3] });
  });

  it("reads rows that begin with a name, below a title", () => {
    assert.deepEqual(tableOf("Rinse water\nrun;t / s;V / mL\nA1;0;1,5\nA2;10;2,5\n"), {
      run: [null, null],
      "t / s": [0, 10],
      "V / mL": [1.5, 2.5],
    });
    assert.deepEqual(tableOf("run;t\nA1;1,5\nA2;2,5\n", { skip: 0 }), { run: [null, null], t: [1.5, 2.5] });
  });

  it("reads a table of words as words", () => {
    const table = columnsOf("run,salt\nA,KI\nB,NaI\n");
    assert.deepEqual(Object.keys(tableOf("run,salt\nA,KI\nB,NaI\n")), ["run", "salt"]);
    assert.equal(table.faultCount, 4);
  });
});

describe("the row of a line", () => {
  it("is the one that begins there, and none elsewhere", () => {
    const table = columnsOf('Device\nt,V\n0,1\n\n# off\n1,"a\nb"\n2,3\n');
    const rows = Array.from({ length: 11 }, (_, line) => rowOfLine(table, line));
    assert.deepEqual(rows, [null, null, null, 0, null, null, 1, null, 2, null, null]);
    assert.equal(rowOfLine(columnsOf("t,V\n"), 1), null);
  });
});
