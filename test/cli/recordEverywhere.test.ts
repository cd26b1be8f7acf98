import assert from "node:assert/strict";
import { spawnSync } from "node:child_process";
import { cpSync, readdirSync, readFileSync, rmSync } from "node:fs";
import { join } from "node:path";
import { build } from "esbuild";
import { temporaryFolder } from "../editor/temporaryFolder.js";
import { otherNodes, otherNodesThere } from "./otherNodes.js";

const names = readdirSync("samples").filter((name) => name.endsWith(".raterecord"));

describe("records on other machines", () => {
  if (!otherNodesThere) console.log("records under Node 22 and 24: not compared, npm has those for Linux on x64 only");
  else {
    it("are byte for byte the same on this Node, on Node 22 and on Node 24", async function () {
      this.timeout(300_000);
      const folder = temporaryFolder("nodes");
      try {
        const command = join(folder.path, "command.cjs");
        await build({
          entryPoints: ["src/cli/main.ts"],
          outfile: command,
          bundle: true,
          platform: "node",
          format: "cjs",
          target: "node20",
          logLevel: "error",
          define: { "import.meta.url": "bundleUrl" },
          banner: { js: 'const bundleUrl=require("node:url").pathToFileURL(__filename).href;' },
        });
        const nodes = [{ name: "this Node", path: process.execPath }, ...otherNodes()];
        const versions = new Set<string>();
        for (const { name, path } of nodes) {
          const runs = join(folder.path, "runs");
          cpSync("samples", runs, { recursive: true });
          for (const record of names) rmSync(join(runs, record));
          const { status, stdout, stderr } = spawnSync(path, [command, "record", "runs"], {
            cwd: folder.path,
            encoding: "utf8",
          });
          // Status 1: one sample has mistakes in it, on purpose.
          assert.equal(status, 1, `${name}: ${stdout}${stderr}`);
          for (const record of names) {
            assert.equal(
              readFileSync(join(runs, record), "utf8"),
              readFileSync(join("samples", record), "utf8"),
              `${record} on ${name}`,
            );
          }
          versions.add(spawnSync(path, ["--version"], { encoding: "utf8" }).stdout.split(".")[0] ?? "");
          rmSync(runs, { recursive: true });
        }
        assert.ok(versions.has("v22") && versions.has("v24"), [...versions].join(" "));
      } finally {
        folder.remove();
      }
    });
  }

  console.log("records in R: not read back; R reads JSON by a package only, which this machine need not have");
  const python = spawnSync("python3", ["--version"]).status === 0;
  if (!python) console.log("records in Python: not read back, there is no python3 here");
  else {
    it("read back in Python with the same numbers, to the last bit", () => {
      for (const name of names) {
        const path = join("samples", name);
        const { status, stdout, stderr } = spawnSync("python3", ["-c", numbersInPython, path], { encoding: "utf8" });
        assert.equal(status, 0, stderr);
        const expected = numbersOf(JSON.parse(readFileSync(path, "utf8")));
        assert.ok(expected.length > 30);
        assert.deepEqual(stdout.trim().split("\n").map(bitsOfHex), expected.map(Number), name);
      }
    });
  }
});

/** Prints every number of a file of JSON in order, in hexadecimal floating point, which loses no bit. */
const numbersInPython = `
import json, sys
def numbers(value):
    if isinstance(value, bool): return
    if isinstance(value, (int, float)): print(float(value).hex())
    elif isinstance(value, list):
        for entry in value: numbers(entry)
    elif isinstance(value, dict):
        for entry in value.values(): numbers(entry)
numbers(json.load(open(sys.argv[1], encoding="utf-8")))
`;

function numbersOf(value: unknown): number[] {
  if (typeof value === "number") return [value];
  if (typeof value !== "object" || value === null) return [];
  return Object.values(value).flatMap(numbersOf);
}

/** The number that Python writes as -0x1.8000000000000p+1. */
function bitsOfHex(text: string): number {
  const [, sign = "", whole = "", fraction = "", exponent = ""] =
    /^(-?)0x([01])(?:\.([0-9a-f]+))?p([+-]\d+)$/.exec(text.trim()) ?? [];
  assert.ok(exponent !== "", text);
  const digits = Number.parseInt(whole + fraction, 16);
  const scaled = digits * 2 ** (Number(exponent) - 4 * fraction.length);
  return sign === "-" ? -scaled : scaled;
}
