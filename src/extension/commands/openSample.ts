import { commands, type Disposable, Uri, window, workspace } from "vscode";

/** Name of the command. */
export const openSample = "ratewright.openSample";

/**
 * Opens one of the samples that come with the extension: the one it is called with by its file name, else the one
 * chosen from a list.
 */
export function registerOpenSample(extension: Uri): Disposable {
  const samples = Uri.joinPath(extension, "samples");
  return commands.registerCommand(openSample, async (argument: unknown) => {
    const names = (await workspace.fs.readDirectory(samples)).map(([name]) => name);
    const offered = names.filter((name) => name.endsWith(".raterun")).sort();
    const chosen = offered.find((name) => name === argument) ?? (await choose(offered, samples));
    if (chosen === undefined) return;
    await window.showTextDocument(Uri.joinPath(samples, chosen), { preview: false });
  });
}

/** Each sample with its first comment, which says what it is about. */
async function choose(names: readonly string[], samples: Uri): Promise<string | undefined> {
  const items = names.map(async (label) => {
    const text = new TextDecoder().decode(await workspace.fs.readFile(Uri.joinPath(samples, label)));
    return { label, detail: /^# (.+)$/m.exec(text)?.[1] ?? "" };
  });
  const title = "Samples (their figures are invented)";
  return (await window.showQuickPick(Promise.all(items), { title, matchOnDetail: true }))?.label;
}
