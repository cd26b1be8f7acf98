import { spawnSync } from "node:child_process";
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { parse as csvParse } from "csv-parse/sync";
import { readColumns } from "../../src/data/readColumns.js";
import { median, ms, times } from "./sampling.js";

const rows = 1_000_000;
const megabyte = 1e6;

/** A million rows: `row` makes each, `header` the first line. */
function fileOf(header: string, row: (index: number) => string): Uint8Array {
  const lines = [header];
  for (let index = 0; index < rows; index++) lines.push(row(index));
  return new TextEncoder().encode(`${lines.join("\n")}\n`);
}

const concentration = (index: number): string => (0.1 / (1 + index * 1e-5)).toFixed(6);
const plain = (): Uint8Array => fileOf("time / s,c / mol L^-1", (index) => `${index / 10},${concentration(index)}`);

/** Bodies that are not two columns of bare numbers. */
const others: readonly [name: string, file: () => Uint8Array][] = [
  ["numbers in quotes", () => fileOf('"t / s","c"', (index) => `"${index / 10}","${concentration(index)}"`)],
  ["a word in quotes in each row", () => fileOf("t,c,state", (index) => `${index / 10},${concentration(index)},"ok"`)],
  [
    "dates and times",
    () => fileOf("when,c", (index) => `${new Date(1.79e12 + index * 100).toISOString()},${concentration(index)}`),
  ],
  ["cells over two lines (csv-parse)", () => fileOf("t,c,note", (index) => `${index / 10},1,"a\nb"`)],
];

function read(bytes: Uint8Array): void {
  const reading = readColumns(bytes);
  if (reading.kind !== "columns" || reading.columns.rows !== rows) throw new Error("rows");
}

/** A million rows of two columns: our reading, csv-parse alone, and a loop that only looks at each byte. */
export async function bench(): Promise<string[]> {
  const bytes = plain();
  const floor = median(
    times(5, 1, () => {
      let lines = 0;
      for (const byte of bytes) if (byte === 10) lines++;
      if (lines !== rows + 1) throw new Error("rows");
    }),
  );
  const ours = median(times(5, 1, () => read(bytes)));
  const text = new TextDecoder().decode(bytes);
  const theirs = median(times(3, 0, () => void csvParse(text)));
  const folder = mkdtempSync(join(tmpdir(), "ratewright-bench-"));
  const path = join(folder, "a.csv");
  writeFileSync(path, bytes);
  const [memory, peer, alone] = [grown(path, "ours"), grown(path, "csv-parse"), grown(path, "nothing")];
  rmSync(folder, { recursive: true });
  const rest = others.map(([name, file]) => {
    const made = file();
    return `1,000,000 rows with ${name}: ${ms(median(times(3, 0, () => read(made))))}`;
  });
  return [
    `1,000,000 rows: ${ms(ours)}; csv-parse alone ${ms(theirs)}, ratio 1/${(theirs / ours).toFixed(1)} (goal 1/8); a loop over the bytes ${ms(floor)}`,
    `memory over the base: ${memory} (goal 130 MB); csv-parse alone ${peer}; the file's bytes alone ${alone}`,
    ...rest,
  ];
}

/**
 * How far the greatest resident size of a process of its own rises, from before it takes the file from the disk until
 * the file is read.
 */
function grown(path: string, by: Reader): string {
  const script = `import(${JSON.stringify(import.meta.url)}).then(({ rise }) => console.log(rise(...process.argv.slice(1))))`;
  const run = spawnSync(process.execPath, ["--eval", script, path, by], { encoding: "utf8" });
  const said = run.stdout.trim();
  return run.status === 0 && said !== "" ? `${said} MB` : `not measured: ${run.stderr.trim()}`;
}

type Reader = "ours" | "csv-parse" | "nothing";

/** What `grown` runs: megabytes by which the greatest resident size rises. */
export function rise(path: string, by: Reader): string {
  const before = process.memoryUsage.rss();
  const bytes = readFileSync(path);
  if (by === "ours") read(bytes);
  else if (by === "csv-parse" && csvParse(bytes).length !== rows + 1) throw new Error("rows");
  return ((process.resourceUsage().maxRSS * 1024 - before) / megabyte).toFixed(0);
}
