import type { Description, Diagnostic } from "../../contract/findings.js";
import type { Reader, ReadOutcome } from "../../contract/reader.js";
import { inlineComputer } from "../../workspace/computer.js";
import { createWorkspace } from "../../workspace/workspace.js";
import type { ExampleFile, ExampleFiles, ShownExample } from "./codeExample.js";

const folder = "file:///example/";
/** Limit of a data file's size in the examples, bytes; large enough for any that is printed on a page. */
const sizeLimit = 1e6;

/** What is wrong with a text and its data files, found the one way through the house. */
export async function exampleDiagnostics(
  text: string,
  files: ExampleFiles,
  unsaved: boolean,
): Promise<readonly Diagnostic[]> {
  const byUri = new Map(Object.entries(files).map(([path, file]) => [`${folder}${path}`, outcomeOf(file)]));
  const reader: Reader = { read: async (uri) => byUri.get(uri) ?? { kind: "missing" } };
  const workspace = createWorkspace(
    { reader, sizeLimit, within: () => null },
    inlineComputer(async () => {}),
  );
  const path = "example.raterun";
  const document = { uri: unsaved ? `untitled:${path}` : `${folder}${path}`, text, path };
  const options = { curves: false, signal: new AbortController().signal };
  const description: Description | null = await workspace.describe(document, options);
  if (description === null) throw new Error(`nothing was found out about:\n${text}`);
  return description.diagnostics;
}

function outcomeOf(file: ExampleFile): ReadOutcome {
  return typeof file === "string" ? { kind: "bytes", bytes: new TextEncoder().encode(file) } : file.gives;
}

/** An example as the program sees it, before and after it is put right. */
export interface WorkedExample {
  readonly diagnostics: readonly Diagnostic[];
  /** titles of the mends the program offers, the likeliest first */
  readonly offered: readonly string[];
  /** null where nothing is put right */
  readonly right: { readonly text: string; readonly files: ExampleFiles } | null;
}

/** Works an example of a code out. By hand where the example says how, else by the likeliest mend it comes with. */
export async function workedExample(code: string, example: ShownExample): Promise<WorkedExample> {
  const { text, files = {}, write, rightFiles, unsaved = false } = example;
  const diagnostics = await exampleDiagnostics(text, files, unsaved);
  const mends = diagnostics.find((found) => found.code === code)?.mends ?? [];
  const offered = mends.map(({ title }) => title);
  if (write !== undefined || rightFiles !== undefined) {
    const [words, instead] = write ?? ["", ""];
    if (!text.includes(words)) throw new Error(`“${words}” does not stand in:\n${text}`);
    return { diagnostics, offered, right: { text: text.replace(words, () => instead), files: rightFiles ?? files } };
  }
  const [mend] = mends;
  if (mend === undefined) return { diagnostics, offered, right: null };
  return { diagnostics, offered, right: { text: withEdits(text, mend.edits), files } };
}

type Edits = Diagnostic["mends"][number]["edits"];

/** The text with replacements made, whose places all speak of the text before. */
function withEdits(text: string, edits: Edits): string {
  const starts = [0];
  for (const { index } of text.matchAll(/\n/g)) starts.push(index + 1);
  const offset = (line: number, column: number): number => (starts[line - 1] ?? text.length) + column - 1;
  const placed = edits.map((edit) => ({
    start: offset(edit.line, edit.column),
    end: offset(edit.endLine, edit.endColumn),
    text: edit.text,
  }));
  return placed
    .sort((a, b) => b.start - a.start)
    .reduce((now, { start, end, text: words }) => now.slice(0, start) + words + now.slice(end), text);
}
