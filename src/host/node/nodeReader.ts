import { open, stat } from "node:fs/promises";
import { changedWhileRead } from "../../contract/messages/data.js";
import type { Reader, ReadOutcome } from "../../contract/reader.js";
import { filePath } from "./fileUri.js";

/** What the reader needs of the file system; tests put one in its place that writes while it reads. */
export interface FileSystem {
  stat(path: string, options: { bigint: true }): Promise<FileState>;
  open(path: string, flags: "r"): Promise<OpenFile>;
}

export interface FileState {
  readonly size: bigint;
  readonly mtimeNs: bigint;
  isFile(): boolean;
  isDirectory(): boolean;
}

export interface OpenFile {
  stat(options: { bigint: true }): Promise<FileState>;
  read(buffer: Uint8Array, offset: number, length: number, position: number): Promise<{ readonly bytesRead: number }>;
  close(): Promise<void>;
}

/**
 * Reads `file:` URIs in Node. A symbolic link is followed. Nothing is read of a folder, of what is no regular file (a
 * pipe would never end), or of more than `limit` bytes. A file whose size or time changes during the reading is read
 * once more, then given up as "unreadable". Never rejects.
 */
export function nodeReader(files: FileSystem = { stat, open }): Reader {
  return {
    async read(uri, limit) {
      const path = filePath(uri);
      if (path === null) return { kind: "unreadable", reason: "only files on this machine can be read" };
      try {
        return (
          (await attempt(files, path, limit)) ??
          (await attempt(files, path, limit)) ?? { kind: "unreadable", reason: changedWhileRead }
        );
      } catch (error) {
        return outcomeOf(error);
      }
    },
  };
}

/** One reading; null when the file changed meanwhile. */
async function attempt(files: FileSystem, path: string, limit: number): Promise<ReadOutcome | null> {
  const found = await files.stat(path, { bigint: true });
  if (found.isDirectory()) return { kind: "folder" };
  if (!found.isFile()) return { kind: "unreadable", reason: "it is not a regular file" };
  if (found.size > BigInt(limit)) return { kind: "too large", size: Number(found.size) };
  const file = await files.open(path, "r");
  try {
    const before = await file.stat({ bigint: true });
    if (before.size > BigInt(limit)) return { kind: "too large", size: Number(before.size) };
    const bytes = new Uint8Array(Number(before.size));
    const read = await fill(file, bytes);
    const after = await file.stat({ bigint: true });
    const steady = read === bytes.length && after.size === before.size && after.mtimeNs === before.mtimeNs;
    return steady ? { kind: "bytes", bytes } : null;
  } finally {
    await file.close();
  }
}

/** Reads until the buffer is full or the file ends; the count of bytes read. */
async function fill(file: OpenFile, bytes: Uint8Array): Promise<number> {
  let filled = 0;
  while (filled < bytes.length) {
    const { bytesRead } = await file.read(bytes, filled, bytes.length - filled, filled);
    if (bytesRead === 0) break;
    filled += bytesRead;
  }
  return filled;
}

function outcomeOf(error: unknown): ReadOutcome {
  const code = error instanceof Error && "code" in error ? String(error.code) : "";
  if (code === "ENOENT" || code === "ENOTDIR") return { kind: "missing" };
  if (code === "EISDIR") return { kind: "folder" };
  return { kind: "unreadable", reason: reasons[code] ?? `the system says ${code || "nothing more"}` };
}

const reasons: Readonly<Record<string, string>> = {
  EACCES: "permission is denied",
  EPERM: "permission is denied",
  ELOOP: "its symbolic links go round in a circle",
  EMFILE: "too many files are open",
  ENAMETOOLONG: "its name is too long",
  ERR_INVALID_ARG_VALUE: "its name holds a character that no file name has",
};
