// Writes what is made from the form of records: their JSON Schema, and the records of the samples:
// node src/build/records.mjs
import { mkdirSync, readdirSync, rmSync, writeFileSync } from "node:fs";
import { dirname, join } from "node:path";
import { pathToFileURL } from "node:url";
import { bundleTests } from "./bundleTests.mjs";
import { root } from "./install.mjs";

const folder = await bundleTests("records", [join(root, "src/record/schema.ts"), join(root, "src/cli/run.ts")], "esm");
const load = (path) => import(pathToFileURL(join(folder, path)).href);
const { schemaText } = await load("src/record/schema.mjs");
const schema = join(root, "media", "schema", "raterecord.schema.json");
mkdirSync(dirname(schema), { recursive: true });
writeFileSync(schema, schemaText());

// Records of an earlier form are not written over by the command.
const samples = join(root, "samples");
for (const name of readdirSync(samples)) if (name.endsWith(".raterecord")) rmSync(join(samples, name));
const { runCommandLine } = await load("src/cli/run.mjs");
const io = { cwd: root, out: (text) => process.stdout.write(text), err: (text) => process.stderr.write(text) };
// Status 1: a sample has mistakes in it, on purpose.
if ((await runCommandLine(["record", "samples"], io)) === 2) process.exitCode = 2;
