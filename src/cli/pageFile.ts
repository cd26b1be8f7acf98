import { stat } from "node:fs/promises";
import { extname, resolve } from "node:path";
import { type WriteRefusal, writeText } from "../host/node/writeText.js";
import type { Io } from "./io.js";

/** Where an HTML page goes: the path, and as the user wrote it. */
export interface PageFile {
  readonly path: string;
  readonly shown: string;
}

const refusalWords: Readonly<Record<WriteRefusal, string>> = {
  "a folder": "is a folder; name a file in it, report.html say",
  "no folder": "has no folder to stand in; make the folder first",
  "not allowed": "may not be written; choose another place, or change its permissions",
  "no room": "cannot be written: the disk is full",
  unwritable: "cannot be written",
};

/**
 * The file that an option names, looked at before any work is done. Null, with words, where it is a folder, or where it
 * holds something other than a page already: a description or a data file named by mistake is not written over.
 */
export async function pageFile(shown: string, io: Io): Promise<PageFile | null> {
  const path = resolve(io.cwd, shown);
  const found = await stat(path).catch(() => null);
  if (found?.isDirectory() === true) return refused(shown, refusalWords["a folder"], io);
  if (found?.isFile() === true && ![".html", ".htm"].includes(extname(path).toLowerCase())) {
    return refused(shown, "is there already and is no HTML page; it is left as it is, choose a name in .html", io);
  }
  return { path, shown };
}

/** Writes the page; false, with words, where that fails. */
export async function writePage({ path, shown }: PageFile, text: string, io: Io): Promise<boolean> {
  const refusal = await writeText(path, text);
  if (refusal !== null) refused(shown, refusalWords[refusal], io);
  return refusal === null;
}

function refused(shown: string, words: string, io: Io): null {
  io.err(`ratewright: ${shown}: ${words}.\n`);
  return null;
}
