import assert from "node:assert/strict";
import type { Description, Run } from "../../src/contract/findings.js";
import { inlineComputer } from "../../src/workspace/computer.js";
import { createWorkspace } from "../../src/workspace/workspace.js";
import { memoryReader } from "./memoryReader.js";

const folder = "file:///lab/";

/** The findings of a description with its data files by path, worked out the one way through the house. */
export async function describeText(
  text: string,
  files: Readonly<Record<string, string | Uint8Array>> = {},
  curves = false,
): Promise<Description> {
  const byUri = new Map(Object.entries(files).map(([path, content]) => [`${folder}${path}`, content]));
  const access = { reader: memoryReader(byUri), sizeLimit: 1e8, within: () => null };
  const workspace = createWorkspace(
    access,
    inlineComputer(async () => {}),
  );
  const document = { uri: `${folder}a.raterun`, text, path: "a.raterun" };
  const description = await workspace.describe(document, { curves, signal: new AbortController().signal });
  assert.ok(description !== null);
  return description;
}

/** The only run of a description. */
export function onlyRun(description: Description): Run {
  const [run] = description.runs;
  assert.ok(run !== undefined && description.runs.length === 1, "one run expected");
  return run;
}

/** Codes of a description's diagnostics with their lines, `code@line`, in order. */
export function codesOf(description: Description): string[] {
  return description.diagnostics.map(({ code, line }) => `${code}@${line}`);
}
