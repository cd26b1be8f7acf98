import { dataOrigin } from "../analysis/findColumns.js";
import { changedWhileRead } from "../contract/messages/data.js";
import { type Problem, problem, replacement } from "../contract/problem.js";
import type { ReadOutcome } from "../contract/reader.js";
import { type DataRefusal, refusalProblem } from "../data/dataOptions.js";
import type { DataFile, Run } from "../study/run.js";
import type { PathRefusal } from "./fileContent.js";

/** Why a path leads nowhere, on the data line. */
export function pathProblem(run: Run, file: DataFile, refusal: PathRefusal): Problem {
  const origin = dataOrigin(run, null);
  const { path } = file;
  switch (refusal.kind) {
    case "empty":
      return problem("data-path-empty", {}, origin);
    case "absolute":
      return problem("data-path-absolute", { path }, origin);
    case "unsaved":
      return problem("data-path-unsaved", { path }, origin);
    case "leaves":
      return problem("data-path-leaves", { path }, origin);
    case "backslash": {
      const { mended } = refusal;
      const mend = origin === file.origin ? [replacement(file.pathOrigin, `"${mended}"`)] : [];
      return problem("data-path-backslash", { path, mended }, origin, mend);
    }
  }
}

/** Why a file could not be read, on the data line; null where it could. */
export function readProblem(run: Run, file: DataFile, outcome: ReadOutcome, limit: number): Problem | null {
  const origin = dataOrigin(run, null);
  switch (outcome.kind) {
    case "bytes":
      return null;
    case "missing":
      return problem("data-missing", { file: file.path }, origin);
    case "folder":
      return problem("data-folder", { file: file.path }, origin);
    case "too large": {
      const args = { file: file.path, size: megabytes(outcome.size), limit: megabytes(limit) };
      return problem("data-too-large", args, origin);
    }
    case "unreadable":
      if (outcome.reason === changedWhileRead) return problem("data-changed-while-read", { file: file.path }, origin);
      return problem("data-unreadable", { file: file.path, reason: outcome.reason }, origin);
  }
}

export function contentProblem(run: Run, file: DataFile, refusal: DataRefusal): Problem {
  return refusalProblem(refusal, file.path, dataOrigin(run, null));
}

function megabytes(bytes: number): string {
  return `${(bytes / 1e6).toPrecision(3)} MB`;
}
