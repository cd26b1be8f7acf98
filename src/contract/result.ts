import type { Problem } from "./problem.js";

/** The outcome of anything that can fail: errors are values, nothing throws across a wall. */
export type Result<T> = { readonly ok: true; readonly value: T } | { readonly ok: false; readonly problem: Problem };

export function success<T>(value: T): Result<T> {
  return { ok: true, value };
}

export function failure(problem: Problem): { readonly ok: false; readonly problem: Problem } {
  return { ok: false, problem };
}
