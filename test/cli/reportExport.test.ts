import assert from "node:assert/strict";
import { mkdir, mkdtemp, readdir, readFile, rm, writeFile } from "node:fs/promises";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { elementsOf } from "../report/wellFormed.js";
import { commandLineIn } from "./commandLineIn.js";

/** An invented run: a signal that falls by 5 % a second, 12 readings, one left out. */
const description = `ratewright 1
species A
species P
reaction A -> P

run one "first | second"
  temperature 25 °C
  data "one.csv"
    column t "t / s" s
    column c "c / mmol/L" mmol/L
    exclude line 6 because "bubble"
  follow A as concentration from c
  rate from 0 s to 20 s
  fit order 1 in A
`;
const table = `t / s,c / mmol/L\n${Array.from({ length: 12 }, (_, i) => `${10 * i},${(10 * 0.606 ** i + (i % 2 === 0 ? 0.02 : -0.02)).toFixed(3)}`).join("\n")}\n`;

describe("ratewright report --markdown, --svg, --csv", () => {
  let folder = "";
  beforeEach(async () => {
    folder = await mkdtemp(join(tmpdir(), "ratewright-"));
    await writeFile(join(folder, "one.raterun"), description);
    await writeFile(join(folder, "one.csv"), table);
  });
  afterEach(() => rm(folder, { recursive: true, force: true }));

  const ratewright = (...words: string[]) => commandLineIn(folder, words);

  it("prints the report as Markdown: tables in order, nothing of the title is markup", async () => {
    const { status, out } = await ratewright("report", "--markdown", "one.raterun");
    assert.equal(status, 0);
    assert.match(out, /^# Rates of reaction\n\n## one\.raterun\n\n### Run one: first \\\| second\n/);
    const heads = [...out.matchAll(/^#### (.*)$/gm)].map(([, head]) => head);
    assert.deepEqual(heads, ["What was done", "What was seen", "What follows", "What to watch"]);
    // Every row of a table has as many bars as the one above it.
    for (const block of out.split("\n\n").filter((one) => one.startsWith("| "))) {
      const bars = block.split("\n").map((row) => row.replaceAll("\\|", "").split("|").length);
      assert.equal(new Set(bars).size, 1, block);
    }
    const json = JSON.parse((await ratewright("report", "--json", "one.raterun")).out);
    const digits = /^[\d.]+\(\d+\)/.exec(json.descriptions[0].runs[0].fits[0].parameters.k.text)?.[0];
    assert.ok(digits !== undefined && out.includes(digits), digits);
  });

  it("writes a picture and the curves of each signal into folders, made where they are not there", async () => {
    const { status, out, err } = await ratewright(
      "report",
      "--json",
      "--svg",
      "pictures",
      "--csv",
      "curves",
      "one.raterun",
    );
    assert.equal(status, 0);
    assert.equal(JSON.parse(out).descriptions.length, 1);
    assert.match(err, /^pictures holds the pictures: 1 file\.\ncurves holds the curves: 1 file\.\n/);
    assert.deepEqual(await readdir(join(folder, "pictures")), ["one-one.svg"]);
    const svg = await readFile(join(folder, "pictures", "one-one.svg"), "utf8");
    assert.ok(elementsOf(svg).includes("path"));
    const csv = (await readFile(join(folder, "curves", "one-one.curves.csv"), "utf8")).trim().split("\n");
    assert.equal(csv[0], "what,t / s,c / mmol L^-1,low / mmol L^-1,high / mmol L^-1,line of the data file");
    const kinds = csv.slice(1).map((line) => line.split(",")[0]);
    const count = (kind: string): number => kinds.filter((one) => one === kind).length;
    assert.deepEqual([count("reading"), count("left out"), count("residual of fit 1")], [11, 1, 11]);
    assert.ok(count("fit 1") > 50);
    assert.match(csv.find((line) => line.startsWith("left out")) ?? "", /^left out,40,[\d.]+,,,6$/);
    assert.equal((await ratewright("report", "--svg", "pictures", "--csv", "curves", "one.raterun")).status, 0);
  });

  it("leaves what is something else as it is, and refuses a file for a folder", async () => {
    await mkdir(join(folder, "curves"));
    await writeFile(join(folder, "curves", "one-one.curves.csv"), "t,c\n1,2\n");
    const kept = await ratewright("report", "--csv", "curves", "one.raterun");
    assert.equal(kept.status, 2);
    assert.match(kept.err, /one-one\.curves\.csv: is there already and is something else/);
    assert.equal(await readFile(join(folder, "curves", "one-one.curves.csv"), "utf8"), "t,c\n1,2\n");
    const file = await ratewright("report", "--svg", "one.csv", "one.raterun");
    assert.deepEqual([file.status, file.err], [2, "ratewright: one.csv: is no folder.\n"]);
    assert.equal(await readFile(join(folder, "one.csv"), "utf8"), table);
  });
});
