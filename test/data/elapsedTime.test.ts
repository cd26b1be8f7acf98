import assert from "node:assert/strict";
import type { Problem } from "../../src/contract/problem.js";
import { messageOf } from "../../src/contract/words.js";
import { cellProblems, timeProblems } from "../../src/data/columnProblems.js";
import { codesOf, describeText, onlyRun } from "../support/describeText.js";
import { columnsOf } from "./reading.js";

const origin = { uri: "file:///a.raterun", start: 0, end: 4 };
const inWords = (problems: readonly Problem[]): string[] =>
  problems.map((one) => `${one.code}: ${one.severity}: ${messageOf(one)}`);

/** A file of times and the numbers 1, 2, 3 …, its first column as read. */
function timesOf(times: readonly string[], header = "t", delimiter = ";"): (number | null)[] {
  const file = [`${header}${delimiter}V / mL`, ...times.map((time, index) => `${time}${delimiter}${index + 1}`)];
  const [column] = columnsOf(file.join("\n")).columns;
  return Array.from(column?.values ?? [], (value) => (Number.isNaN(value) ? null : value));
}

/** What is said of such a column. */
function said(times: readonly string[], header = "t"): string[] {
  const columns = columnsOf([`${header};V / mL`, ...times.map((time, index) => `${time};${index + 1}`)].join("\n"));
  return inWords([...cellProblems(columns, 0, "run.csv", origin), ...timeProblems(columns, 0, "run.csv", origin)]);
}

describe("columns of dates and clock times", () => {
  // elapsed times by hand: differences of clock times
  const read: Record<string, [times: string[], elapsed: number[]]> = {
    "dates with clock times (ISO 8601 with a blank for T)": [
      ["2026-11-03 10:15:30", "2026-11-03 10:16:00"],
      [0, 30],
    ],
    "with T, decimals and Z": [
      ["2026-11-03T10:15:30.25Z", "2026-11-03T10:15:30.5Z"],
      [0, 0.25],
    ],
    "with decimal commas": [
      ["2026-11-03T10:15:30,1", "2026-11-03T10:15:30,3"],
      [0, 0.2],
    ],
    "with offsets that change": [
      ["2026-10-25T02:59:58+02:00", "2026-10-25T02:00:01+01:00"],
      [0, 3],
    ],
    "with offsets in short": [
      ["2026-11-03 10:00:00 +0530", "2026-11-03 10:00:00 +05"],
      [0, 1800],
    ],
    "hours and minutes after a date": [
      ["2026/11/03 10:15", "2026/11/03 11:16"],
      [0, 3660],
    ],
    "dates alone, over the end of a leap year's February": [
      ["2028-02-28", "2028-03-01"],
      [0, 172_800],
    ],
    "over midnight and the end of the year": [
      ["2026-12-31 23:59:59", "2027-01-01 00:00:01"],
      [0, 2],
    ],
    "clock times": [
      ["10:15:30", "10:15:30.5", "10:16:00"],
      [0, 0.5, 30],
    ],
    "a clock that was started": [
      ["00:01:30.5", "00:02:00", "24:00:00", "100:00:00"],
      [0, 29.5, 86_309.5, 359_909.5],
    ],
    "clock times over two midnights": [
      ["23:59:58", "00:00:02", "23:59:58", "00:00:02"],
      [0, 4, 86_400, 86_404],
    ],
    "before and after noon": [
      ["11:59:59 AM", "12:00:01 PM", "1:00 pm"],
      [0, 2, 3601],
    ],
    "just after midnight": [
      ["12:00:00 am", "12:00:01 a.m."],
      [0, 1],
    ],
    "minutes and seconds with decimals": [
      ["1:30.5", "61:31.0"],
      [0, 3600.5],
    ],
    "one day written day or month first": [
      ["03/11/2026 10:00:00", "3/11/2026 10:00:01"],
      [0, 1],
    ],
    "days whose order a number above 12 shows": [
      ["12.11.2026 23:59:59", "13.11.2026 00:00:01"],
      [0, 2],
    ],
    "months in front, shown by the first": [
      ["11/30/2026 23:59:59", "12/01/2026 00:00:01"],
      [0, 2],
    ],
  };
  for (const [what, [times, elapsed]] of Object.entries(read)) {
    it(what, () => {
      assert.deepEqual(timesOf(times), elapsed);
      assert.deepEqual(
        said(times).filter((words) => !words.startsWith("data-midnight-passed")),
        [],
      );
    });
  }

  it("say in the header what a time of two numbers is", () => {
    for (const header of ["t (mm:ss)", "t [m:ss]", "t / min:s"])
      assert.deepEqual(timesOf(["1:30", "75:31"], header), [0, 4441]);
    for (const header of ["t (hh:mm)", "t [h:min]"]) assert.deepEqual(timesOf(["1:30", "2:31"], header), [0, 3660]);
    assert.deepEqual(timesOf(["1:30", "2:31"], "t (hh:mm:ss)"), [null, null]);
  });

  it("are in seconds whatever the header says, and say what they count from", () => {
    const [time, gas] = columnsOf("time (hh:mm:ss),gas\n10:15:30.5,1\n10:15:31,2\n").columns;
    assert.deepEqual([time?.kind, time?.unit?.text, time?.unreadUnit], ["clock", "s", null]);
    assert.deepEqual(time?.time, {
      start: "10:15:30.5",
      day: null,
      seconds: 36_930.5,
      midnights: 0,
      midnightRow: null,
    });
    assert.deepEqual([gas?.kind, gas?.unit, gas?.time], ["number", null, null]);
    // 2026-11-03 is day 20760 from 1970-01-01: date -u -d 2026-11-03 +%s gives 1793664000
    assert.deepEqual(columnsOf("a,b\n2026-11-03 01:00:00Z,1\n").columns[0]?.time?.day, 1_793_664_000 / 86_400);
  });

  it("take a row of units with hh:mm:ss in it", () => {
    const { columns } = columnsOf("time,gas\nhh:mm:ss,mL\n00:00:00,1\n00:00:10,2\n");
    assert.deepEqual(
      columns.map(({ header, unit }) => [header, unit?.text]),
      [
        ["time", "s"],
        ["gas", "mL"],
      ],
    );
  });

  it("stand between any separators, and apart as date and time", () => {
    const expected = [0, 10.5];
    for (const delimiter of [",", ";", "\t"]) {
      assert.deepEqual(timesOf(["2026-11-03 10:15:30", "2026-11-03 10:15:40.5"], "t", delimiter), expected, delimiter);
    }
    const { columns } = columnsOf("Date Time V\n2026-11-03 10:15:30 1.5\n2026-11-03 10:15:40.5 2.5\n");
    assert.deepEqual(
      columns.map(({ kind }) => kind),
      ["date-time", "clock", "number"],
    );
    assert.deepEqual(Array.from(columns[1]?.values ?? []), expected);
  });

  it("do not decide the decimal mark by the points of a date", () => {
    const { decimalComma } = columnsOf("t;V\n13.11.2026 10:00;0\n13.11.2026 10:01;1,5\n");
    assert.equal(decimalComma, true);
  });
});

describe("dates and clock times that are not guessed", () => {
  const cases: Record<string, [times: string[], words: string[]]> = {
    "day or month first": [
      ["03/11/2026 23:59:59", "04/11/2026 00:00:01", "04/11/2026 00:00:02"],
      [
        "data-date-order: error: run.csv, line 3: “04/11/2026 00:00:01” under t is another day than the first, and nothing shows whether day or month stands in front. Write dates with the year first, as 2026-11-03; until then 2 points are left out.",
      ],
    ],
    "a year of two digits": [
      ["13.11.26 23:59:59", "14.11.26 00:00:01"],
      [
        "data-date-order: error: run.csv, line 3: “14.11.26 00:00:01” under t is another day than the first, and nothing shows whether day or month stands in front. Write dates with the year first, as 2026-11-03; until then the point is left out.",
      ],
    ],
    "hours or minutes first": [
      ["1:30", "1:31"],
      [
        "data-clock-parts: error: run.csv, line 2: “1:30” under t can be hours and minutes or minutes and seconds. Write (mm:ss) or (hh:mm) in the header, or all three numbers, as 00:01:30.",
      ],
    ],
    "a day that does not exist, and a word": [
      ["2026-02-27 10:00:00", "2026-02-30 10:00:00", "bubble", "2026-03-01 10:61:00"],
      [
        "data-cell-time: warning: run.csv, line 3: “2026-02-30 10:00:00” under t is not a time written like 2026-02-27 10:00:00, nor are 2 others. These points are left out.",
      ],
    ],
    "a number among clock times": [
      ["00:00:00", "10", "00:00:20"],
      [
        "data-cell-time: warning: run.csv, line 3: “10” under t is not a time written like 00:00:00. The point is left out.",
      ],
    ],
    "an offset from UTC on some": [
      ["2026-11-03 10:00:00", "2026-11-03 10:00:10Z", "2026-11-03 10:00:20"],
      [
        "data-time-offset: warning: run.csv, line 3: “2026-11-03 10:00:10Z” under t cannot be compared with the first time, “2026-11-03 10:00:00”: only one of them states its offset from UTC. Write all with it or all without; until then the point is left out.",
      ],
    ],
    "the end of summer time": [
      ["2026-10-25 02:59:58", "2026-10-25 02:00:00.5"],
      [
        "data-time-backwards: error: run.csv, line 3: t runs backwards, from 2026-10-25 02:59:58 to 2026-10-25 02:00:00.5. Put the rows in order, or keep two runs in two files.",
      ],
    ],
    "a clock that falls by less than twelve hours": [
      ["14:00:00", "02:00:01"],
      [
        "data-time-backwards: error: run.csv, line 3: t runs backwards, from 14:00:00 to 02:00:01. Put the rows in order, or keep two runs in two files.",
      ],
    ],
    "midnight, with a word": [
      ["23:59:58", "00:00:02"],
      [
        "data-midnight-passed: information: run.csv, line 3: t falls to 00:00:02, which is taken for the next day. If it is not, keep the two runs in two files.",
      ],
    ],
    "the same time twice": [
      ["10:00:00", "10:00:00"],
      ["data-time-twice: information: run.csv, line 3: t is 10:00:00 as in the row before. Both readings are used."],
    ],
    "an empty cell": [
      ["10:00:00", "", "10:00:02"],
      ["data-cell-empty: warning: run.csv, line 3: the cell of t is empty. The point is left out."],
    ],
  };
  for (const [what, [times, words]] of Object.entries(cases)) it(what, () => assert.deepEqual(said(times), words));

  it("stays silent about clock times that go on", () =>
    assert.deepEqual(said(["10:00:00", "10:00:01", "10:00:02"]), []));
});

describe("clock times and dates as the time of a run", () => {
  const description = (header: string): string => `reaction 2 H2O2 -> 2 H2O + O2
run X
  temperature 25 °C
  taken H2O2 0.1 mol/L
  data "x.csv"
    column t "${header}"
    column c "c / mol/L"
  follow H2O2 as concentration from c
  fit order 1 in H2O2
`;
  // c = 0.1 mol/L × e^(−0.02 t/s), invented
  const concentrations = Array.from({ length: 12 }, (_, i) => (0.1 * Math.exp(-0.2 * i)).toFixed(7));
  const fileOf = (header: string, time: (second: number) => string): string =>
    [`${header},c / mol/L`, ...concentrations.map((c, i) => `${time(10 * i)},${c}`)].join("\n");
  const at = (second: number): string => new Date(Date.UTC(2026, 10, 3, 23, 59, 10) + second * 1000).toISOString();

  it("give the same rate constant as seconds do", async () => {
    const ways: [header: string, time: (second: number) => string, said: string[]][] = [
      ["t / s", String, []],
      ["when", (second) => at(second).replace("T", " ").slice(0, 19), []],
      ["stamp", at, []],
      ["time (hh:mm:ss)", (second) => at(second).slice(11, 19), ["data-midnight-passed@6"]],
    ];
    const found: string[] = [];
    for (const [header, time, expected] of ways) {
      const described = await describeText(description(header), { "x.csv": fileOf(header, time) });
      assert.deepEqual(
        codesOf(described).filter((code) => code.startsWith("data-")),
        expected,
        header,
      );
      const [fit] = onlyRun(described).fits;
      assert.ok(fit?.parameters["k"]?.value !== undefined, header);
      found.push(JSON.stringify(fit.parameters));
    }
    assert.deepEqual(found.slice(1), [found[0], found[0], found[0]]);
  });
});
