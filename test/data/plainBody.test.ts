import assert from "node:assert/strict";
import type { DataOptions } from "../../src/data/dataOptions.js";
import { readAnyTable, readPlainTable } from "../../src/data/readTable.js";
import { parseHeaderUnit } from "../../src/quantity/headerUnit.js";
import { bytesOf, columnsOf } from "./reading.js";

/** Whole numbers below `below`, the same in every run (multiplicative, 48271 modulo 2^31 − 1). */
function seeded(seed: number): (below: number) => number {
  let state = seed;
  return (below) => {
    state = (state * 48271) % 2147483647;
    return state % below;
  };
}

type Pick = <T>(choices: readonly T[]) => T;

/** A number as instruments write it, now and then longer than a double is exact. */
function numberText(below: (limit: number) => number, pick: Pick, mark: string): string {
  const digits = (count: number): string => Array.from({ length: count }, () => below(10)).join("");
  const sign = pick(["", "", "", "-", "+"]);
  const whole = digits(1 + below(pick([2, 4, 17, 25])));
  const fraction = pick(["", mark, mark + digits(1 + below(pick([3, 6, 22])))]);
  const exponent = pick(["", "", "", `e${below(30)}`, `E-${below(30)}`, `e+0${below(9)}`, `e-${300 + below(40)}`]);
  return sign + (fraction.length > 1 && below(9) === 0 ? fraction : whole + fraction) + exponent;
}

/** `10:15:30` and `2026-11-03T10:15:30Z` of a time, s. */
const clockText = (seconds: number): string => new Date((seconds % 86_400) * 1000).toISOString().slice(11, 19);
const dateText = (seconds: number): string =>
  new Date(Date.UTC(2026, 10, 3) + seconds * 1000).toISOString().replace(".000", "");

/** A file of numbers with everything that the byte loop takes, and in one of `rare` files something it does not. */
function randomFile(seed: number, rare: number): string {
  const below = seeded(seed);
  const pick: Pick = (choices) => choices[below(choices.length)]!;
  const mark = pick([".", ".", ","]);
  const delimiter = mark === "," ? pick([";", "\t", "  "]) : pick([",", ";", "\t", " ", "   "]);
  const end = pick(["\n", "\r\n", "\r"]);
  const width = 2 + below(4);
  const pad = (): string => (below(6) === 0 ? pick([" ", "  "]) : "");
  const quotes = below(5) === 0;
  const time = below(3) === 0 ? pick([clockText, dateText]) : null;
  const words = below(8) === 0 ? pick(["ok", '"a b"', "°", '""']) : null;
  const start = below(80_000);
  const tail = delimiter.trim() !== "" && below(4) === 0 ? delimiter : "";
  const spoils = below(rare) === 0;
  const oddities = [
    "",
    "x",
    '"1"',
    "NaN",
    "1e999",
    "\u22121",
    "1 2",
    "1,2",
    "1.2",
    "#",
    `1${delimiter}2`,
    "°",
    '5"',
    "- 1",
    '""',
    '"1,5"',
    '"1.5"',
    ' "-2e1" ',
    '"3" ',
    '" 4"',
    '"a ""b"" c"',
    '"1"2',
    '"x\ny"',
    "10:15:30",
    "2026-11-03",
  ];
  const rows = Array.from({ length: 1 + below(40) }, (_, row) => {
    const cells = Array.from({ length: width }, (_, column) => {
      const bare = column === 0 && time !== null ? time(start + row * 37) : numberText(below, pick, mark);
      if (column === width - 1 && words !== null) return pad() + words + pad();
      return pad() + (quotes && below(3) > 0 ? `"${bare}"` : bare) + pad();
    });
    if (spoils && below(8) === 0) cells[below(width)] = pick(oddities);
    if (spoils && row > 2 && below(12) === 0)
      return pick(["# stirrer off", delimiter, cells[0] ?? "", "stirrer off", "° ±"]);
    return cells.join(delimiter) + tail + (below(15) === 0 ? end + pad() : "");
  });
  const header = Array.from({ length: width }, (_, column) => `c${column} / ${pick(["s", "mL", "°C"])}`);
  const preamble = pick([[], [], ["Device of today", ""], ["# dried"]]);
  const above = below(5) === 0 ? [] : [...preamble, header.join(delimiter)];
  return pick(["", "\ufeff"]) + [...above, ...rows].join(end) + pick(["", end, end + end]);
}

/** Reads by both ways; true where the byte loop took the file. */
function sameByBothWays(file: string, options: DataOptions = {}): boolean {
  const plain = readPlainTable(bytesOf(file), options, parseHeaderUnit);
  if (plain === null) return false;
  assert.deepEqual(plain, readAnyTable(bytesOf(file), options, parseHeaderUnit), JSON.stringify(file));
  return true;
}

describe("the byte loop equals csv-parse", function () {
  this.timeout(20_000);

  it("on 1,000 files of numbers, times and numbers in quotes", () => {
    let taken = 0;
    for (let seed = 1; seed <= 1000; seed++) if (sameByBothWays(randomFile(seed * 7919, 1_000_000))) taken++;
    assert.ok(taken > 600, `the byte loop took ${taken} of 1,000`);
  });

  it("on 1,000 files with spoilt cells and rows, or leaves them to csv-parse", () => {
    let taken = 0;
    for (let seed = 1; seed <= 1000; seed++) if (sameByBothWays(randomFile(seed * 104729, 1))) taken++;
    assert.ok(taken > 400 && taken < 950, `the byte loop took ${taken} of 1,000`);
  });

  it("on a file longer than the part that shows the layout", () => {
    const below = seeded(5);
    const rows = Array.from({ length: 20_000 }, (_, row) => `${row},5;${below(1000)},${below(1000)}`);
    assert.ok(sameByBothWays(`Preamble\nt / s;V / mL\n${rows.join("\r\n")}\r\n`));
    assert.ok(sameByBothWays(`t / s;V / mL\n${rows.join("\n")}\n1;"2"\n"3";"a ""b"""\n`));
    assert.ok(!sameByBothWays(`t / s;V / mL\n${rows.join("\n")}\n1;"2\n3"\n`));
    assert.ok(sameByBothWays(`t / s;V / mL\n${rows.join("\n")}\n1;bubble\n# ° end\n2\n`));
  });

  it("where the decimal comma shows up late", () => {
    const whole = Array.from({ length: 30_000 }, (_, row) => `${row};0`).join("\n");
    assert.ok(!sameByBothWays(`t;V\n${whole}\n30000;0,5\n`));
    assert.equal(columnsOf(`t;V\n${whole}\n30000;0,5\n`).columns[1]?.values[30_000], 0.5);
  });

  it("reads each number as JavaScript does", () => {
    const numbers = [
      "0.1",
      "-0",
      "123456789012345678",
      "0.30000000000000004",
      "9007199254740993",
      "1e22",
      "1e23",
      "4.35e-5",
      "2.2250738585072011e-308",
      "5e-324",
      "1e-400",
      "1.7976931348623157e308",
      "00012.500",
      ".5",
      "5.",
      "+7",
      "8.41e21",
      "9.5367431640625e-7",
      "6.02214076e23",
      "0.000000000000000000000000000000000001",
    ];
    const table = columnsOf(`a,b\n${numbers.map((number) => `1,${number}`).join("\n")}\n`);
    assert.ok(sameByBothWays(`a,b\n${numbers.map((number) => `1,${number}`).join("\n")}\n`));
    assert.deepEqual(Array.from(table.columns[1]?.values ?? []), numbers.map(Number));
  });
});

describe("a million rows", () => {
  it("are read, one number of each kind in its place, with their lines", () => {
    const table = columnsOf(`t / s,V / mL\n${"1.5,2.25\n".repeat(999_999)}3,4\n`);
    assert.equal(table.rows, 1_000_000);
    assert.deepEqual([table.lines[0], table.lines[999_999]], [2, 1_000_001]);
    assert.deepEqual([table.columns[0]?.values[999_999], table.columns[1]?.values[500_000]], [3, 2.25]);
    assert.equal(table.faultCount, 0);
  }).timeout(20_000);

  it("are given up when somebody says stop", () => {
    let asked = 0;
    const file = bytesOf(`t,V\n${"1.5,2.25\n".repeat(100_000)}`);
    const reading = readPlainTable(file, { stopped: () => ++asked > 2 }, parseHeaderUnit);
    assert.deepEqual(reading, { kind: "stopped" });
    asked = 0;
    assert.deepEqual(readAnyTable(file, { stopped: () => ++asked > 2 }, parseHeaderUnit), { kind: "stopped" });
  }).timeout(20_000);
});
