import { stat } from "node:fs/promises";
import writeFileAtomic from "write-file-atomic";

/** Why a file cannot be written. */
export type WriteRefusal = "a folder" | "no folder" | "not allowed" | "no room" | "unwritable";

const refusals: Readonly<Record<string, WriteRefusal>> = {
  EISDIR: "a folder",
  ENOENT: "no folder",
  ENOTDIR: "no folder",
  EACCES: "not allowed",
  EPERM: "not allowed",
  EROFS: "not allowed",
  ENOSPC: "no room",
  EDQUOT: "no room",
};

/**
 * Writes a text as UTF-8, whole or not at all: into a new file beside `path`, which then takes its place. Answers null
 * when it is written.
 */
export async function writeText(path: string, text: string): Promise<WriteRefusal | null> {
  try {
    // Renaming a file onto a folder is refused under different names on different systems.
    if (await isFolder(path)) return "a folder";
    await writeFileAtomic(path, text, { encoding: "utf8" });
    return null;
  } catch (error) {
    const code = error instanceof Error && "code" in error && typeof error.code === "string" ? error.code : "";
    return refusals[code] ?? "unwritable";
  }
}

async function isFolder(path: string): Promise<boolean> {
  return stat(path).then(
    (found) => found.isDirectory(),
    () => false,
  );
}
