import { chemistryMessages } from "./messages/chemistry.js";
import { dataMessages } from "./messages/data.js";
import { fitMessages } from "./messages/fit.js";
import { languageMessages } from "./messages/language.js";
import { quantityMessages } from "./messages/quantity.js";
import type { Mend, Problem } from "./problem.js";

/** Every problem there is: its severity, its words, and the line that explains it. Nobody else writes messages. */
export const catalogue = {
  ...languageMessages,
  ...quantityMessages,
  ...chemistryMessages,
  ...dataMessages,
  ...fitMessages,
} as const;

export type ProblemCode = keyof typeof catalogue;

/** What the text of this code asks for. */
export type MessageArguments<Code extends ProblemCode> = Parameters<(typeof catalogue)[Code]["text"]>[0];

/** The problem in words: what is wrong and what to do. */
export function messageOf(problem: Problem): string {
  const write = catalogue[problem.code].text as (args: Problem["args"]) => string;
  return write(problem.args);
}

/** The title of a mend in the editor's list of quick fixes. */
export function mendTitle(mend: Mend): string {
  return mend.text === "" ? "Remove it" : `Write “${mend.text}”`;
}
