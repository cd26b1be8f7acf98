import { method } from "../analysis/analyse.js";
import type { Description } from "../contract/findings.js";
import type { Problem } from "../contract/problem.js";
import { version } from "../contract/version.js";
import { messageOf } from "../contract/words.js";
import { compare, type Moved } from "../record/compare.js";
import { readRecord } from "../record/readRecord.js";
import { recordOf, type Versions } from "../record/recordOf.js";
import { recordText } from "../record/recordText.js";

/** What makes findings now. */
export const versions: Versions = { ratewright: version, language: 1, method };

/** Where a description stands with its record. */
export type Verdict =
  | { readonly kind: "none" }
  | { readonly kind: "unreadable"; readonly problem: Problem }
  | { readonly kind: "same" }
  | { readonly kind: "moved"; readonly moved: readonly Moved[] };

/** The text of the record of a description as it stands now. */
export function recordNow(description: Description): string {
  return recordText(description, versions);
}

/** Compares a description, worked out anew, with the text of its record at `uri`; null where there is none. */
export function verify(description: Description, text: string | null, uri: string): Verdict {
  if (text === null) return { kind: "none" };
  const read = readRecord(text, uri);
  if (!read.ok) return { kind: "unreadable", problem: read.problem };
  const moved = compare(read.value, recordOf(description, versions));
  return moved.length === 0 ? { kind: "same" } : { kind: "moved", moved };
}

/** Where the record of a description stands: beside it, `.raterecord` in place of `.raterun`. Path or URI. */
export function recordBeside(description: string): string {
  return description.replace(/(\.raterun)?$/, ".raterecord");
}

/**
 * Why a text that stands where the record belongs is not written over: it is something else, or a later record. Null
 * where it may be; a broken record may.
 */
export function reasonToKeep(text: string): string | null {
  const read = readRecord(text, "");
  if (read.ok || !["record-foreign", "record-newer"].includes(read.problem.code)) return null;
  return messageOf(read.problem);
}
