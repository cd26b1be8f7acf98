import { contentHash } from "../data/contentHash.js";
import type { DataOptions, DataReading } from "../data/dataOptions.js";
import { readColumns } from "../data/readColumns.js";
import type { DataFile } from "../study/run.js";

/** A data file read into columns, or why it is not. */
export interface StoredFile {
  readonly sha256: string;
  readonly reading: DataReading;
}

/** Keeps data files that were read, by what is in them and how they are to be read. */
export interface ColumnStore {
  read(bytes: Uint8Array, key: string, file: DataFile, stopped: () => boolean): StoredFile;
}

/** A store that keeps the `most` files used last. */
export function columnStore(most = 32): ColumnStore {
  const hashes = new Map<string, string>();
  const readings = new Map<string, DataReading>();
  return {
    read(bytes, key, file, stopped) {
      const sha256 = hashes.get(key) ?? contentHash(bytes);
      remember(hashes, key, sha256, 8 * most);
      const options = optionsOf(file);
      const name = `${sha256} ${JSON.stringify(options)}`;
      const reading = readings.get(name) ?? readColumns(bytes, { ...options, stopped });
      if (reading.kind !== "stopped") remember(readings, name, reading, most);
      return { sha256, reading };
    },
  };
}

function remember<T>(store: Map<string, T>, key: string, value: T, most: number): void {
  store.delete(key);
  store.set(key, value);
  const oldest = store.keys().next();
  if (store.size > most && oldest.done !== true) store.delete(oldest.value);
}

/** How a data file is to be read where its lines say so. */
export function optionsOf(file: Pick<DataFile, "delimiter" | "decimalComma" | "skip" | "encoding">): DataOptions {
  return {
    ...(file.delimiter === null ? {} : { delimiter: file.delimiter }),
    ...(file.decimalComma === null ? {} : { decimalComma: file.decimalComma }),
    ...(file.skip === null ? {} : { skip: file.skip }),
    ...(file.encoding === null ? {} : { encoding: file.encoding }),
  };
}
