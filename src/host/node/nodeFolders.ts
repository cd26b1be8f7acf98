import { readdir } from "node:fs/promises";
import type { FolderEntry, FolderReader } from "../../contract/folderReader.js";
import { leadsOut } from "./fencedReader.js";
import { filePath } from "./fileUri.js";

/**
 * Lists `file:` folders in Node. `fence` are the folders (URIs) that what is listed must lie in, links followed; null lets
 * everything through. A symbolic link in the folder is passed over: what it leads to is not known without following it.
 */
export function nodeFolders(fence: () => readonly string[] | null = () => null): FolderReader {
  return {
    async list(uri) {
      const path = filePath(uri);
      const folders = fence();
      if (path === null || (folders !== null && (await leadsOut(uri, folders)))) return [];
      try {
        const entries = await readdir(path, { withFileTypes: true });
        return entries.flatMap((entry): FolderEntry[] => {
          if (entry.isDirectory()) return [{ name: entry.name, kind: "folder" }];
          return entry.isFile() ? [{ name: entry.name, kind: "file" }] : [];
        });
      } catch {
        return [];
      }
    },
  };
}
