import type { FolderEntry, FolderReader } from "../../contract/folderReader.js";

/** Lists folders for the web worker: the client, asked by `request`, looks through the editor's file system. Never rejects. */
export function requestFolders(request: (uri: string) => Promise<readonly FolderEntry[]>): FolderReader {
  return {
    async list(uri) {
      try {
        return await request(uri);
      } catch {
        return [];
      }
    },
  };
}
