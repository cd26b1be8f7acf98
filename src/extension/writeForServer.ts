import { Uri, workspace } from "vscode";
import type { WriteFile, WriteFileAnswer } from "../contract/recordProtocol.js";

/**
 * Writes a record for a server that has no files of its own: whole or not at all, into a new file that then takes its
 * place. Only records, only inside the opened folders, only where these are trusted. Never rejects.
 */
export async function writeForServer({ uri, text }: WriteFile): Promise<WriteFileAnswer> {
  try {
    const address = Uri.parse(uri, true);
    const allowed = workspace.isTrusted && workspace.getWorkspaceFolder(address) !== undefined;
    if (!allowed || !address.path.endsWith(".raterecord")) return { refusal: "it would lie outside the opened folder" };
    const beside = address.with({ path: `${address.path}.new` });
    await workspace.fs.writeFile(beside, new TextEncoder().encode(text));
    await workspace.fs.rename(beside, address, { overwrite: true });
    return { refusal: null };
  } catch (error) {
    return { refusal: error instanceof Error ? error.message : String(error) };
  }
}
