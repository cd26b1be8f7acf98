import type { Description } from "../contract/findings.js";
import type { DataOptions } from "../data/dataOptions.js";
import { type HeaderCell, headerCells } from "../data/headerCells.js";
import { type Bound, bind } from "../language/bind/bind.js";
import { parse } from "../language/parse.js";
import type { Computer, Curves, Job } from "./computer.js";
import type { DataFileState, FileContent } from "./fileContent.js";
import { dataLocations, type FileAccess } from "./loadFiles.js";

/** A description as it stands now, saved or not. */
export interface Document {
  readonly uri: string;
  readonly text: string;
  /** how findings call it */
  readonly path: string;
}

/** Descriptions and data files as one computation: what is known is kept by content, what is stale is forgotten. */
export interface Workspace {
  /** Meaning and problems that the text alone tells; at once. */
  bound(document: Document): Bound;
  /** Findings; null when told to stop. */
  describe(document: Document, options: { curves: Curves; signal: AbortSignal }): Promise<Description | null>;
  /** The header row of a data file by its URI, whatever its size; null where it has none or cannot be read. */
  headers(uri: string, options: DataOptions): Promise<readonly HeaderCell[] | null>;
  /** A file changed, came or went: what was read of it is forgotten. Gives the descriptions that use it. */
  changed(uri: string): string[];
  /** A description is closed. */
  close(uri: string): void;
}

interface Known {
  readonly bound: Bound;
  uses: ReadonlySet<string>;
  /** the last findings with and without curves, by what they follow from */
  readonly results: Map<string, Description>;
}

export function createWorkspace(access: FileAccess, computer: Computer): Workspace {
  const known = new Map<string, Known>();
  const files = new Map<string, Promise<FileContent>>();
  let readings = 0;

  const read = (uri: string): Promise<FileContent> => {
    const before = files.get(uri);
    if (before !== undefined) return before;
    const key = `reading ${++readings}`;
    const reading = access.reader.read(uri, access.sizeLimit).then((outcome) => ({ key, outcome }));
    files.set(uri, reading);
    return reading;
  };

  const boundOf = (document: Document): Known => {
    const before = known.get(document.uri);
    if (before !== undefined && before.bound.parsed.text === document.text) return before;
    const bound = bind(parse(document.uri, document.text));
    const uses = before?.uses ?? new Set<string>();
    const now: Known = { bound, uses, results: new Map() };
    known.set(document.uri, now);
    return now;
  };

  return {
    bound: (document) => boundOf(document).bound,
    async describe(document, { curves, signal }) {
      const entry = boundOf(document);
      const locations = dataLocations(entry.bound.study, access);
      const used = [...locations.values()].flatMap((place) => ("uri" in place ? [place.uri] : []));
      entry.uses = new Set(used);
      const states = await Promise.all(
        [...locations].map(
          async ([path, place]): Promise<[string, DataFileState]> => [
            path,
            "uri" in place ? await read(place.uri) : place,
          ],
        ),
      );
      if (signal.aborted) return null;
      const basis = `${document.path} ${states.map(([, state]) => ("key" in state ? state.key : "")).join(" ")}`;
      const key = `${curves} ${basis}`;
      // Findings that hold more than is asked for answer as well.
      const before = entry.results.get(key) ?? (curves === false ? entry.results.get(`thinned ${basis}`) : undefined);
      if (before !== undefined) return before;
      const { uri, text, path } = document;
      const job: Job = { uri, text, path, files: new Map(states), sizeLimit: access.sizeLimit, curves };
      const description = await computer.compute(job, signal);
      if (description !== null) entry.results.set(key, description);
      return description;
    },
    async headers(uri, options) {
      // A file that no description uses yet is read for this once.
      const reading = files.get(uri);
      const outcome = reading === undefined ? await access.reader.read(uri, access.sizeLimit) : (await reading).outcome;
      return outcome.kind === "bytes" ? headerCells(outcome.bytes, options) : null;
    },
    changed(uri) {
      files.delete(uri);
      return [...known].filter(([, entry]) => entry.uses.has(uri)).map(([description]) => description);
    },
    close(uri) {
      const entry = known.get(uri);
      known.delete(uri);
      for (const used of entry?.uses ?? []) {
        if (![...known.values()].some(({ uses }) => uses.has(used))) files.delete(used);
      }
    },
  };
}
