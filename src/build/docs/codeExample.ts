import type { MessageArguments, ProblemCode } from "../../contract/catalogue.js";
import type { ReadOutcome } from "../../contract/reader.js";

/** A data file beside an example: its text, or what a reader gives where there is no text, with words for the page. */
export type ExampleFile = string | { readonly words: string; readonly gives: ReadOutcome };

export type ExampleFiles = Readonly<Record<string, ExampleFile>>;

/** A text that earns one code and no other, and how it is put right. */
export interface ShownExample {
  readonly text: string;
  /** data files by path, as seen from the description */
  readonly files?: ExampleFiles;
  /** The right text by hand, where the program offers no mend: words of the text, and what stands there instead. */
  readonly write?: readonly [words: string, instead: string];
  /** The right files, where the fault lies in them. */
  readonly rightFiles?: ExampleFiles;
  /** The right files are readings of another run: nobody changes readings until nothing is said of them. */
  readonly otherReadings?: true;
  /** a code that never comes without this one does: what else the example earns */
  readonly beside?: ProblemCode;
  /** the description was never saved */
  readonly unsaved?: true;
}

/** A code that no text of ordinary size earns: its words with arguments made up, and why. */
export interface UnshownExample {
  readonly why: string;
  readonly args: Readonly<Record<string, string | number>>;
}

export type CodeExample = ShownExample | UnshownExample;

export type CodeExamples = Partial<Readonly<Record<ProblemCode, CodeExample>>>;

/** Ties the made-up arguments to the code whose words need them. */
export function unshown<Code extends ProblemCode>(
  _code: Code,
  why: string,
  args: MessageArguments<Code>,
): UnshownExample {
  return { why, args };
}
