import { mkdir, readFile, stat } from "node:fs/promises";
import { join, resolve } from "node:path";
import { writeText } from "../host/node/writeText.js";
import { type ExportedFile, type ExportKind, exportKinds } from "../report/exportFiles.js";
import type { Io } from "./io.js";

/** Makes sure that an option names a folder, which is made where it is not there; false, with words, where that fails. */
export async function readyFolder(shown: string, io: Io): Promise<boolean> {
  const path = resolve(io.cwd, shown);
  const found = await stat(path).catch(() => null);
  if (found?.isDirectory() === true) return true;
  const made =
    found === null &&
    (await mkdir(path).then(
      () => true,
      () => false,
    ));
  const words = found === null ? "cannot be made; make the folder first" : "is no folder";
  if (!made) io.err(`ratewright: ${shown}: ${words}.\n`);
  return made;
}

/**
 * Writes the files into a folder that is there. A file of that name which is not of its kind, a data file say, is not written
 * over. False, with words, where one could not be written.
 */
export async function writeFiles(
  shown: string,
  kind: ExportKind,
  files: readonly ExportedFile[],
  io: Io,
): Promise<boolean> {
  for (const { name, text } of files) {
    const path = join(resolve(io.cwd, shown), name);
    const before = await readFile(path, "utf8").catch(() => null);
    if (before !== null && !before.startsWith(exportKinds[kind].begins)) {
      io.err(`ratewright: ${join(shown, name)}: is there already and is something else; it is left as it is.\n`);
      return false;
    }
    if ((await writeText(path, text)) !== null) {
      io.err(`ratewright: ${join(shown, name)}: cannot be written.\n`);
      return false;
    }
  }
  const count = files.length === 1 ? "1 file" : `${files.length} files`;
  // On standard output stands what was asked for alone: a document, where one was.
  io.err(`${shown} holds ${exportKinds[kind].words}: ${count}.\n`);
  return true;
}
