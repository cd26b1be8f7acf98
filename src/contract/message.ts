/**
 * One entry of the catalogue: how grave it is, its words (what, why, what to do), and one line for the page of the
 * code. `Args` are the facts the words need, already in the form a person reads.
 */
export interface Message<Args extends Record<string, string | number>> {
  readonly severity: "error" | "warning" | "information";
  readonly text: (args: Args) => string;
  readonly help: string;
}

type Grade = Message<Record<string, never>>["severity"];

/** Declares an entry; the type of its arguments is that of the function's parameter. */
export function message<Args extends Record<string, string | number>>(
  severity: Grade,
  help: string,
  text: (args: Args) => string,
): Message<Args> {
  return { severity, text, help };
}
