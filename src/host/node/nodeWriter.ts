import { basename, dirname, join } from "node:path";
import type { Writer } from "../../contract/writer.js";
import { isBelow, realPath } from "./fencedReader.js";
import { filePath } from "./fileUri.js";
import { type WriteRefusal, writeText } from "./writeText.js";

const refusals: Readonly<Record<WriteRefusal, string>> = {
  "a folder": "a folder of that name is there",
  "no folder": "its folder is not there",
  "not allowed": "it may not be written",
  "no room": "the disk is full",
  unwritable: "the system refuses it",
};

/** Writes files of this machine, each whole or not at all. */
export function nodeWriter(): Writer {
  return {
    async write(uri, text, folders) {
      const path = filePath(uri);
      if (path === null) return "it is no file of this machine";
      if (!(await isInside(path, folders))) return "it would lie outside the opened folder";
      const refusal = await writeText(path, text);
      return refusal === null ? null : refusals[refusal];
    },
  };
}

/** A file that is there counts by where it really is, one that is not by where its folder is. */
async function isInside(path: string, folders: readonly string[]): Promise<boolean> {
  const folder = await realPath(dirname(path));
  if (folder === null) return false;
  const target = (await realPath(path)) ?? join(folder, basename(path));
  for (const uri of folders) {
    const open = filePath(uri);
    const real = open === null ? null : await realPath(open);
    if (real !== null && isBelow(real, target)) return true;
  }
  return false;
}
