import { catalogue } from "./catalogue.js";
import type { Mend, Problem } from "./problem.js";

/** The problem in words: what is wrong and what to do. */
export function messageOf(problem: Problem): string {
  const write = catalogue[problem.code].text as (args: Problem["args"]) => string;
  return write(problem.args);
}

/** The title of a mend in the editor's list of quick fixes. */
export function mendTitle(mend: Mend): string {
  return mend.text === "" ? "Remove it" : `Write “${mend.text}”`;
}
