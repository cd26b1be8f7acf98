import type { Problem } from "../../contract/problem.js";
import { type Bound, bind } from "../bind/bind.js";
import { lexLine } from "../lexer.js";
import { meaningOf } from "../meaning.js";
import { parse } from "../parse.js";

/** What formatting must leave as it is: the meaning, what is said to be wrong, and the comments. */
export interface Essence {
  readonly meaning: string;
  /** codes of the problems, in the order of the text */
  readonly codes: string;
  /** texts of the comments, sorted */
  readonly comments: string;
}

/** Codes of what is said about spacing alone: setting a text right takes them away. */
const aboutSpacing = /^indent/;

/** The essence of a text as it is bound. */
export function essenceOf(bound: Bound): Essence {
  const { parsed, study, problems } = bound;
  const codes = problems.filter(({ code }: Problem) => !aboutSpacing.test(code)).map(({ code }) => code);
  const comments = parsed.text.split(/\r\n|\r|\n/).flatMap(commentOf);
  return { meaning: meaningOf(study), codes: codes.join(" "), comments: comments.sort().join("\n") };
}

/** Whether a text has the essence of another. */
export function hasEssence(uri: string, text: string, { meaning, codes, comments }: Essence): boolean {
  const found = essenceOf(bind(parse(uri, text)));
  return found.meaning === meaning && found.codes === codes && found.comments === comments;
}

function commentOf(line: string): string[] {
  if (!line.includes("#")) return [];
  const comment = lexLine(line).find(({ kind }) => kind === "comment");
  return comment === undefined ? [] : [comment.text.trimEnd()];
}
