import { FileType, Uri, workspace } from "vscode";
import type { ListFolder, ListFolderAnswer } from "../contract/editorProtocol.js";

/** Lists a folder for a server that has no files of its own. Never rejects; a folder that cannot be seen is empty. */
export async function listForServer({ uri }: ListFolder): Promise<ListFolderAnswer> {
  try {
    const entries = await workspace.fs.readDirectory(Uri.parse(uri, true));
    return entries.map(([name, type]) => ({ name, kind: (type & FileType.Directory) !== 0 ? "folder" : "file" }));
  } catch {
    return [];
  }
}
