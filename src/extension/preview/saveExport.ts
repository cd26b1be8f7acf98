import { Uri, window, workspace } from "vscode";

/** A file to be saved where the person says. */
export interface ExportFile {
  readonly name: string;
  readonly content: string | Uint8Array;
}

/** Asks where a file goes, beside its description unless told, and writes it. Where it went; null where the person thought better of it. */
export async function saveExport(description: string, { name, content }: ExportFile): Promise<string | null> {
  const address = Uri.parse(description, true);
  // A text that was never saved lies nowhere.
  const [folder] = workspace.workspaceFolders ?? [];
  const unsaved = folder === undefined ? Uri.file(name) : Uri.joinPath(folder.uri, name);
  const beside = address.scheme === "untitled" ? unsaved : Uri.joinPath(address, "..", name);
  const chosen = await window.showSaveDialog({ defaultUri: beside, title: `Export ${name}` });
  if (chosen === undefined) return null;
  const bytes = typeof content === "string" ? new TextEncoder().encode(content) : content;
  await workspace.fs.writeFile(chosen, bytes);
  return workspace.asRelativePath(chosen);
}

/** The bytes of base64 text. */
export function bytesOf(base64: string): Uint8Array {
  return Uint8Array.from(atob(base64), (sign) => sign.charCodeAt(0));
}
