import type { Run } from "../study/run.js";
import type { Study } from "../study/study.js";

/**
 * The runs of a study. Tables of runs and runs of other files stand unexpanded in the study: here is the one place that
 * makes runs of them. No table is read yet, which its line says.
 */
export function runsOf(study: Study): Run[] {
  return study.runs.flatMap((source) => (source.kind === "run" ? [source.run] : []));
}
