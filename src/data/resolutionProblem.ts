import { type Origin, type Problem, problem, replacement } from "../contract/problem.js";
import type { Resolution } from "./resolve.js";

/** Why a path leads nowhere, as a problem of the description; `origin` is the path there in its quotes. */
export function resolutionProblem(
  resolution: Exclude<Resolution, { kind: "uri" }>,
  path: string,
  origin: Origin,
): Problem {
  switch (resolution.kind) {
    case "empty":
      return problem("data-path-empty", {}, origin);
    case "absolute":
      return problem("data-path-absolute", { path }, origin);
    case "leaves":
      return problem("data-path-leaves", { path }, origin);
    case "unsaved":
      return problem("data-path-unsaved", { path }, origin);
    case "backslash": {
      const { mended } = resolution;
      return problem("data-path-backslash", { path, mended }, origin, [replacement(origin, `"${mended}"`)]);
    }
  }
}
