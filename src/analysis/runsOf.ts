import { problem } from "../contract/problem.js";
import type { Run } from "../study/run.js";
import type { Study } from "../study/study.js";
import { type Notes, note } from "./notes.js";

/**
 * The runs of a study. Tables of runs and runs of other files stand unexpanded in the study: here is the one place that
 * makes runs of them.
 */
export function runsOf(study: Study, notes: Notes): Run[] {
  return study.runs.flatMap((source): Run[] => {
    if (source.kind === "run") return [source.run];
    const what = source.kind === "table" ? `The table of runs ${source.path}` : `The runs of ${source.pattern}`;
    note(notes, null, problem("not-computed-yet", { what }, source.origin));
    return [];
  });
}
