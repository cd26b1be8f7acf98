import { realpath } from "node:fs/promises";
import { relative, sep } from "node:path";
import type { Reader } from "../../contract/reader.js";
import { filePath } from "./fileUri.js";

/**
 * A reader that keeps to some folders (URIs) even where a symbolic link inside them leads out: what lies elsewhere is
 * "unreadable". `fence` is asked at each reading; null lets everything through. Never rejects, if `reader` does not.
 */
export function fencedReader(reader: Reader, fence: () => readonly string[] | null): Reader {
  return {
    async read(uri, limit) {
      const folders = fence();
      if (folders !== null && (await leadsOut(uri, folders))) {
        return { kind: "unreadable", reason: "it is a link that leads out of the opened folder" };
      }
      return reader.read(uri, limit);
    },
  };
}

/** Whether a file or folder lies outside all of `folders`, links followed. What is not there leads nowhere. */
export async function leadsOut(uri: string, folders: readonly string[]): Promise<boolean> {
  const target = await realOf(uri);
  if (target === null) return false;
  const real = await Promise.all(folders.map(realOf));
  return !real.some((folder) => folder !== null && (folder === target || isBelow(folder, target)));
}

async function realOf(uri: string): Promise<string | null> {
  const path = filePath(uri);
  return path === null ? null : realPath(path);
}

/** A path with every link in it followed; null where nothing is there. */
export async function realPath(path: string): Promise<string | null> {
  try {
    return await realpath(path);
  } catch {
    return null;
  }
}

/** Whether a path lies in a folder; both absolute, links followed. */
export function isBelow(folder: string, path: string): boolean {
  const way = relative(folder, path);
  return way !== "" && way !== ".." && !way.startsWith(`..${sep}`) && !/^([A-Za-z]:|\\\\)/.test(way);
}
