import assert from "node:assert/strict";
import { chmod, mkdir, mkdtemp, readdir, readFile, rm, writeFile } from "node:fs/promises";
import { tmpdir } from "node:os";
import { join } from "node:path";
import type { Description, Findings } from "../../src/contract/findings.js";
import { columnHover } from "../../src/report/hover.js";
import { elementsOf } from "../report/wellFormed.js";
import { commandLineIn } from "./commandLineIn.js";

/** An invented run: 6.0 mmol/L left of 10 after 10 s and so on. */
const description = `ratewright 1
species A
species P
reaction A -> P

run one "first"
  temperature 25 °C
  data "one.csv"
    column t "t / s" s
    column c "c / mmol/L" mmol/L
  follow A as concentration from c
  rate from 0 s to 20 s
  fit order 1 in A
`;
const table = `t / s,c / mmol/L\n${Array.from({ length: 12 }, (_, i) => `${10 * i},${(10 * Math.exp(-0.05 * 10 * i) + (i % 2 === 0 ? 0.02 : -0.02)).toFixed(3)}`).join("\n")}\n`;

describe("ratewright report --html", () => {
  let folder = "";
  beforeEach(async () => {
    folder = await mkdtemp(join(tmpdir(), "ratewright-"));
    await writeFile(join(folder, "one.raterun"), description);
    await writeFile(join(folder, "one.csv"), table);
  });
  afterEach(() => rm(folder, { recursive: true, force: true }));

  const ratewright = (...words: string[]) => commandLineIn(folder, words);

  it("writes one page with pictures and says where", async () => {
    const { status, out } = await ratewright("report", "--html", "page.html", "one.raterun");
    assert.deepEqual({ status, out }, { status: 0, out: "page.html holds the report.\n" });
    const page = await readFile(join(folder, "page.html"), "utf8");
    assert.ok(elementsOf(page).includes("svg"));
    assert.match(page, /Run one: first/);
    assert.deepEqual((await readdir(folder)).sort(), ["one.csv", "one.raterun", "page.html"], "nothing else is left");
  });

  it("writes the same bytes again, over the page that was there", async () => {
    await ratewright("report", "--html", "page.html", "one.raterun");
    const first = await readFile(join(folder, "page.html"));
    assert.equal((await ratewright("report", "--html=page.html", "one.raterun")).status, 0);
    assert.deepEqual(await readFile(join(folder, "page.html")), first);
  });

  it("shows the k that --json prints, and so does the hover", async () => {
    const { out } = await ratewright("report", "--json", "--curves", "--html", "page.html", "one.raterun");
    const [found] = (JSON.parse(out) as Findings).descriptions as [Description];
    const run = found.runs[0];
    const k = run?.fits[0]?.parameters["k"]?.text ?? "no k";
    assert.match(k, /^\d.*\(\d+\).* s\^-1$/);
    assert.ok(run !== undefined && columnHover(run, "c", "light", found.diagnostics).includes(`*k* = ${k},`));
    const digits = /^[\d.]+\(\d+\)/.exec(k)?.[0] ?? k;
    assert.ok((await readFile(join(folder, "page.html"), "utf8")).includes(digits));
  });

  it("refuses a folder, a missing folder and a file that is no page, and leaves them as they are", async () => {
    await mkdir(join(folder, "pages"));
    const refusals: [string, RegExp][] = [
      ["pages", /^ratewright: pages: is a folder; name a file in it, report\.html say\.\n$/],
      ["nowhere/page.html", /^ratewright: nowhere\/page\.html: has no folder to stand in; make the folder first\.\n$/],
      ["one.csv", /^ratewright: one\.csv: is there already and is no HTML page; it is left as it is/],
      ["one.csv/page.html", /has no folder to stand in/],
    ];
    for (const [file, words] of refusals) {
      const { status, out, err } = await ratewright("report", "--html", file, "one.raterun");
      assert.equal(status, 2, file);
      assert.equal(out, "");
      assert.match(err, words);
    }
    assert.equal(await readFile(join(folder, "one.csv"), "utf8"), table);
    assert.deepEqual((await readdir(folder)).sort(), ["one.csv", "one.raterun", "pages"]);
  });

  it("refuses a name that no file can bear", async () => {
    const { status, err } = await ratewright("report", "--html", `${"x".repeat(400)}.html`, "one.raterun");
    assert.equal(status, 2);
    assert.match(err, /^ratewright: x+\.html: cannot be written\.\n$/);
  });

  // The superuser may write everywhere, and Windows knows no such permission of folders.
  if (process.getuid !== undefined && process.getuid() !== 0) {
    it("refuses a place that may not be written", async () => {
      await mkdir(join(folder, "shut"));
      await chmod(join(folder, "shut"), 0o500);
      const { status, err } = await ratewright("report", "--html", "shut/page.html", "one.raterun");
      assert.equal(status, 2);
      assert.match(err, /^ratewright: shut\/page\.html: may not be written/);
    });
  }

  it("takes a file's name and a path, and says what is missing", async () => {
    const nameless = await ratewright("report", "one.raterun", "--html");
    assert.equal(nameless.status, 2);
    assert.match(nameless.err, /--html/);
    const pathless = await ratewright("report", "--html", "page.html");
    assert.equal(pathless.status, 2);
    assert.match(pathless.err, /report needs a path/);
    assert.match((await ratewright("report", "--help")).out, /\n {2}--html FILE {2}write the report as one HTML page/);
    assert.match((await ratewright("check", "--html", "page.html", "one.raterun")).err, /--html/);
  });

  it("is written where a description has errors too, with status 1", async () => {
    await writeFile(join(folder, "one.raterun"), description.replace("rate from", "raet from"));
    const { status, err } = await ratewright("report", "--html", "page.html", "one.raterun");
    assert.equal(status, 1);
    assert.match(err, /one\.raterun:12:\d+: error: /);
    assert.match(await readFile(join(folder, "page.html"), "utf8"), /<strong>Error\.<\/strong>/);
  });
});
