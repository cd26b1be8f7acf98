import type { Run } from "../contract/findings.js";

/** How many of a file's rows serve as readings: "all 14 used", "12 of 14 used", "none". */
export function readingsUsed({ points, used }: Run["follow"][number]): string {
  if (points === 0) return "none";
  if (used === points) return points === 1 ? "the only one used" : `all ${points} used`;
  return `${used} of ${points} used`;
}
