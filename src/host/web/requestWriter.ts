import type { Writer } from "../../contract/writer.js";

/**
 * A writer for the web worker, which has no files of its own: the client, asked by `request`, writes through the
 * editor's file system, and it too keeps to the opened folders. Never rejects.
 */
export function requestWriter(request: (uri: string, text: string) => Promise<string | null>): Writer {
  return {
    async write(uri, text, folders) {
      if (!folders.some((folder) => uri.startsWith(`${folder.replace(/\/+$/, "")}/`))) {
        return "it would lie outside the opened folder";
      }
      try {
        return await request(uri, text);
      } catch (error) {
        return error instanceof Error ? error.message : "the editor gave no answer";
      }
    },
  };
}
