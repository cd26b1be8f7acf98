import type { Reader } from "../contract/reader.js";
import { isInside, resolveUri } from "../data/resolve.js";
import type { Study } from "../study/study.js";
import type { DataFileState } from "./fileContent.js";

/** Where data files come from, and what may be read. */
export interface FileAccess {
  readonly reader: Reader;
  /** greatest size of a data file, bytes */
  readonly sizeLimit: number;
  /** folder that data files must stay in; null: anywhere */
  readonly within: (description: string) => string | null;
}

/** Where each data file of a study is, by its path as written. */
export function dataLocations(study: Study, access: FileAccess): Map<string, { uri: string } | DataFileState> {
  const found = new Map<string, { uri: string } | DataFileState>();
  for (const source of study.runs) {
    const path = source.kind === "run" ? source.run.data?.path : undefined;
    if (path === undefined || found.has(path)) continue;
    const resolution = resolveUri(study.uri, path);
    if (resolution.kind !== "uri") {
      found.set(path, { refusal: resolution });
      continue;
    }
    const folder = access.within(study.uri);
    const leaves = folder !== null && !isInside(folder, resolution.uri);
    found.set(path, leaves ? { refusal: { kind: "leaves" } } : { uri: resolution.uri });
  }
  return found;
}
