/** What client and server say to each other about records. */

/** Request of the client: work the description out as it stands and write its record beside it. */
export const writeRecord = "ratewright/writeRecord";
/** Request of the client: in words, what is otherwise than the record has it. */
export const recordDifference = "ratewright/recordDifference";

export interface RecordQuestion {
  /** URI of an open description */
  readonly uri: string;
}

export interface WriteRecordAnswer {
  readonly done: boolean;
  /** what was done, or why nothing was; for the person */
  readonly words: string;
}

export interface RecordDifferenceAnswer {
  /** file name of the record */
  readonly record: string;
  readonly text: string;
}

/** Request of a server without files of its own: the client writes a text by the editor's file system. */
export const writeFile = "ratewright/writeFile";
export interface WriteFile {
  readonly uri: string;
  readonly text: string;
}
export interface WriteFileAnswer {
  /** why it could not be written; null where it is */
  readonly refusal: string | null;
}
