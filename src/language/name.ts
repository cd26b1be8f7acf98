/** Words that connect the parts of a line and can name nothing. */
const connectives = new Set(
  "in from as at to of is by like using and with after within reads purity density giving".split(" "),
);

/** Whether a word can name a run, a column, a species and the like. */
export function isName(text: string): boolean {
  return !connectives.has(text) && /^[\p{L}\p{N}_\-′']+$/u.test(text);
}
