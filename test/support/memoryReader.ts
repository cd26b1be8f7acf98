import type { Reader } from "../../src/contract/reader.js";

/** A reader of files held in memory, by URI. */
export function memoryReader(files: ReadonlyMap<string, string | Uint8Array>): Reader {
  return {
    async read(uri, limit) {
      const file = files.get(uri);
      if (file === undefined) return { kind: "missing" };
      const bytes = typeof file === "string" ? new TextEncoder().encode(file) : file;
      return bytes.length > limit ? { kind: "too large", size: bytes.length } : { kind: "bytes", bytes };
    },
  };
}
