// Shows the tool at work on the samples: node src/build/start.mjs [--editor]
// At a terminal, or with --editor, it ends by serving the editor until Ctrl-C.
import { mkdirSync } from "node:fs";
import { join } from "node:path";
import { parseArgs } from "node:util";
import { installPackages, root } from "./install.mjs";
import { runStep } from "./runStep.mjs";

/** Longest time of building, or of one command, ms. */
const limit = 120_000;

/** Runs a script of Node at the top of the project; throws where its status is none of those allowed. */
async function node(args, allowed) {
  const { status, why } = await runStep(process.execPath, args, { cwd: root, limit });
  if (!allowed.includes(status)) throw new Error(`${args.join(" ")}: ${why}`);
}

/** Serves the editor with the built extension on the samples until Ctrl-C. */
async function serveEditor() {
  const { bundleTests } = await import("./bundleTests.mjs");
  const folder = await bundleTests("serve", [join(root, "test", "editor", "serveEditor.ts")], "esm");
  const { serveEditor: serve } = await import(join(folder, "test", "editor", "serveEditor.mjs"));
  await serve(join(root, "samples"));
}

const { values } = parseArgs({ options: { editor: { type: "boolean", default: false } } });
try {
  installPackages();
  await node([join("src", "build", "build.mjs")], [0]);
  const command = join("dist", "ratewright.cjs");
  // Status 1 is expected: one of the samples has planted mistakes, and the command says so.
  for (const verb of ["check", "report"]) {
    console.log(`\nratewright ${verb} samples\n`);
    await node([command, verb, "samples"], [0, 1]);
  }
  mkdirSync(join(root, "artefacts"), { recursive: true });
  console.log("");
  await node([command, "report", "--html", join("artefacts", "report.html"), "samples"], [0, 1]);
  if (values.editor || (process.stdin.isTTY && process.stdout.isTTY)) await serveEditor();
} catch (error) {
  console.error(error.message);
  process.exitCode = 1;
}
