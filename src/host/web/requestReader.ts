import type { Reader, ReadOutcome } from "../../contract/reader.js";

/**
 * A reader for the web worker, which has no files of its own: the client, asked by `request`, reads through the
 * editor's file system. The answer is not trusted to keep the limit; a request that fails is "unreadable". Never rejects.
 */
export function requestReader(request: (uri: string, limit: number) => Promise<ReadOutcome>): Reader {
  return {
    async read(uri, limit) {
      try {
        const outcome = await request(uri, limit);
        if (outcome.kind === "bytes" && outcome.bytes.length > limit) {
          return { kind: "too large", size: outcome.bytes.length };
        }
        return outcome;
      } catch (error) {
        return { kind: "unreadable", reason: error instanceof Error ? error.message : "the editor gave no answer" };
      }
    },
  };
}
