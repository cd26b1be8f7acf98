import { message } from "../message.js";

/** What can be wrong with a record. */
export const recordMessages = {
  "record-cut-off": message<Record<string, never>>(
    "error",
    "The record ends too soon: its file was cut off while it was copied or written by another program.",
    () => "The record ends too soon. Bring it back from version control, or write it anew.",
  ),
  "record-unmerged": message<Record<string, never>>(
    "error",
    "The record holds the marks of a merge that nobody has finished.",
    () => "The record holds the marks of an unfinished merge. Merge the description, then write the record anew.",
  ),
  "record-broken": message<Record<string, never>>(
    "error",
    "The record is no JSON: something in it was changed by hand.",
    () => "The record is no JSON any more. Bring it back from version control, or write it anew.",
  ),
  "record-foreign": message<{ why: string }>(
    "error",
    "The file is JSON but no record of a run description, or a record that lacks something.",
    ({ why }) =>
      `This is no record as Ratewright writes it: ${why}. Give another name to what it is, or write the record anew.`,
  ),
  "record-newer": message<{ form: number; known: number }>(
    "error",
    "The record has a form that a later version of the program writes.",
    ({ form, known }) =>
      `The record has form ${form}; this version reads form ${known} only. Use the version that wrote it, or a later one.`,
  ),
};
