import { FileSystemError, FileType, Uri, workspace } from "vscode";
import type { ReadFile, ReadFileAnswer } from "../contract/editorProtocol.js";

/** Reads a data file for a server that has no files of its own. Nothing larger than the limit is read. Never rejects. */
export async function readForServer({ uri, limit }: ReadFile): Promise<ReadFileAnswer> {
  try {
    const address = Uri.parse(uri, true);
    const { type, size } = await workspace.fs.stat(address);
    if ((type & FileType.Directory) !== 0) return { kind: "folder" };
    if (size > limit) return { kind: "too large", size };
    return { kind: "bytes", bytes: await workspace.fs.readFile(address) };
  } catch (error) {
    if (error instanceof FileSystemError && error.code === "FileNotFound") return { kind: "missing" };
    return { kind: "unreadable", reason: error instanceof Error ? error.message : String(error) };
  }
}
