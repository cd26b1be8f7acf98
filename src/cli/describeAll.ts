import type { Description } from "../contract/findings.js";
import { expandPaths, type UnusedPath } from "../host/node/expandPaths.js";
import { nodeReader } from "../host/node/nodeReader.js";
import { inlineComputer } from "../workspace/computer.js";
import { createWorkspace } from "../workspace/workspace.js";
import type { Io } from "./io.js";

/** A description with its text, which messages quote. */
export interface Described {
  readonly description: Description;
  readonly text: string;
}

/** Greatest size of a data file, and of a description, bytes. */
const dataLimit = 512e6;
export const textLimit = 16e6;

const unusedWords = {
  missing: "there is no such file or folder",
  "not a description": "is not a run description; those end in .raterun",
  "no descriptions in it": "no .raterun file is in it",
  unreadable: "cannot be read",
} as const;

/**
 * Works out every description that the arguments mean. Null when an argument means none or a file cannot be read:
 * that is said, and is misuse.
 */
export async function describeAll(paths: readonly string[], io: Io, curves: boolean): Promise<Described[] | null> {
  const { found, unused } = await expandPaths(paths, io.cwd);
  if (sayUnused(unused, io)) return null;
  const reader = nodeReader();
  const access = { reader, sizeLimit: dataLimit, within: () => null };
  const workspace = createWorkspace(
    access,
    inlineComputer(async () => {}),
  );
  const described: Described[] = [];
  const { signal } = new AbortController();
  for (const { uri, shown } of found) {
    const outcome = await reader.read(uri, textLimit);
    if (outcome.kind !== "bytes") {
      io.err(`ratewright: ${shown}: cannot be read.\n`);
      return null;
    }
    const text = new TextDecoder("utf-8").decode(outcome.bytes);
    const description = await workspace.describe({ uri, text, path: shown }, { curves, signal });
    if (description !== null) described.push({ description, text });
    workspace.close(uri);
  }
  return described;
}

/** Says of each argument that leads to no description why; whether there was one. */
export function sayUnused(unused: readonly UnusedPath[], io: Io): boolean {
  for (const { argument, reason } of unused) io.err(`ratewright: ${argument}: ${unusedWords[reason]}.\n`);
  return unused.length > 0;
}

export function hasError(described: readonly Described[]): boolean {
  return described.some(({ description }) => description.diagnostics.some(({ severity }) => severity === "error"));
}
