import { changedWhileRead } from "../contract/messages/data.js";
import { type Origin, type Problem, problem } from "../contract/problem.js";
import type { ReadOutcome } from "../contract/reader.js";

/**
 * Why a reader gave no bytes, as a problem of the description: `file` as the description writes it, `origin` its data
 * line, `limit` the size in bytes that was allowed.
 */
export function outcomeProblem(
  outcome: Exclude<ReadOutcome, { kind: "bytes" }>,
  file: string,
  limit: number,
  origin: Origin,
): Problem {
  switch (outcome.kind) {
    case "missing":
      return problem("data-missing", { file }, origin);
    case "folder":
      return problem("data-folder", { file }, origin);
    case "too large":
      return problem("data-too-large", { file, size: sizeText(outcome.size), limit: sizeText(limit) }, origin);
    case "unreadable":
      return outcome.reason === changedWhileRead
        ? problem("data-changed-while-read", { file }, origin)
        : problem("data-unreadable", { file, reason: outcome.reason }, origin);
  }
}

/** Bytes in decimal multiples, as file managers show them. */
function sizeText(bytes: number): string {
  if (bytes < 1e3) return `${bytes} B`;
  if (bytes < 1e6) return `${(bytes / 1e3).toFixed(1)} kB`;
  return bytes < 1e9 ? `${(bytes / 1e6).toFixed(1)} MB` : `${(bytes / 1e9).toFixed(1)} GB`;
}
