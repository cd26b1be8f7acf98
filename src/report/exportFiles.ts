import type { Description, Run } from "../contract/findings.js";
import { curvesCsv } from "./curvesCsv.js";
import { fileName } from "./fileName.js";
import { standalonePicture } from "./standalonePicture.js";

/** Forms in which each followed signal makes a file of its own: how the file ends and begins, what it is. */
export const exportKinds = {
  svg: { ending: ".svg", begins: "<svg ", words: "the pictures" },
  // Not plainly `.csv`: on many file systems run A's curves would be written over the data file that run a is read from.
  csv: { ending: ".curves.csv", begins: "what,t / ", words: "the curves" },
} as const;
export type ExportKind = keyof typeof exportKinds;

/** A file by its name, ready to be written. */
export interface ExportedFile {
  readonly name: string;
  readonly text: string;
}

/** One file for each followed signal of the runs that has readings; no two names differ by case alone. */
export function exportFiles(
  kind: ExportKind,
  descriptions: readonly Description[],
  only: (run: Run) => boolean = () => true,
): ExportedFile[] {
  const taken = new Set<string>();
  return descriptions.flatMap(({ path, runs }) =>
    runs.filter(only).flatMap((run) =>
      run.follow.flatMap((follow): ExportedFile[] => {
        const text = kind === "svg" ? standalonePicture(run, follow) : curvesCsv(run, follow);
        if (text === null) return [];
        const column = run.follow.length > 1 ? `-${follow.column}` : "";
        const stem = fileName(`${fileName(path)}-${run.name}${column}`);
        return [{ name: `${freeName(stem, taken)}${exportKinds[kind].ending}`, text }];
      }),
    ),
  );
}

function freeName(stem: string, taken: Set<string>): string {
  let name = stem;
  for (let count = 2; taken.has(name.toLowerCase()); count++) name = `${stem}-${count}`;
  taken.add(name.toLowerCase());
  return name;
}
