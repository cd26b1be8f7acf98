import { spawnSync } from "node:child_process";
import { extensions, languages, type TextDocument, Uri, window, workspace } from "vscode";
import type { Description, Findings } from "../../src/contract/findings.js";
import { until } from "../editor/until.js";

/** The opened folder: a copy of the samples. */
export function folder(): Uri {
  const found = workspace.workspaceFolders?.[0];
  if (found === undefined) throw new Error("no folder is open");
  return found.uri;
}

/** Opens a description of the folder in the editor. */
export async function openDescription(name: string): Promise<TextDocument> {
  const document = await workspace.openTextDocument(Uri.joinPath(folder(), name));
  await window.showTextDocument(document);
  return document;
}

/** Opens a copy of a sample beside it, changed as told, so that no test stands in another one's way. */
export async function openCopy(sample: string, name: string, change = (text: string) => text): Promise<TextDocument> {
  const text = new TextDecoder().decode(await workspace.fs.readFile(Uri.joinPath(folder(), sample)));
  await workspace.fs.writeFile(Uri.joinPath(folder(), name), new TextEncoder().encode(change(text)));
  return openDescription(name);
}

/** What the editor shows of a description, `CODE LINE`, lines from 1, in the order of the text. */
export function shownCodes({ uri }: TextDocument): string[] {
  const all = languages.getDiagnostics(uri).toSorted((a, b) => a.range.start.compareTo(b.range.start));
  return all.map(({ code, range }) => `${codeText(code)} ${range.start.line + 1}`);
}

function codeText(code: string | number | { value: string | number } | undefined): string {
  return String(typeof code === "object" ? code.value : code);
}

/** Waits until exactly these are shown. */
export async function untilShown(document: TextDocument, codes: readonly string[]): Promise<void> {
  const wanted = [...codes].sort().join(", ");
  await until(`diagnostics ${wanted || "none"}`, () => shownCodes(document).sort().join(", ") === wanted).catch(
    (error) => {
      throw new Error(`${error.message}; shown are ${shownCodes(document).join(", ")}`);
    },
  );
}

/** What the command line of the same build says of a file of the folder. */
export function commandLine(verb: "check" | "report", name: string): Description {
  const extension = extensions.getExtension("ratewright.ratewright");
  if (extension === undefined) throw new Error("the extension is not there");
  const script = Uri.joinPath(extension.extensionUri, "dist", "ratewright.cjs").fsPath;
  const run = spawnSync(process.execPath, [script, verb, "--json", Uri.joinPath(folder(), name).fsPath], {
    encoding: "utf8",
    // In the desktop editor this program is the editor itself, unless told otherwise.
    env: { ...process.env, ELECTRON_RUN_AS_NODE: "1" },
  });
  const findings: Findings = JSON.parse(run.stdout);
  const [description] = findings.descriptions;
  if (description === undefined) throw new Error(`${verb} says nothing of ${name}: ${run.stderr}`);
  return description;
}
