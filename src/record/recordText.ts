import type { Description } from "../contract/findings.js";
import { layOut } from "./layOut.js";
import { recordOf, type Versions } from "./recordOf.js";

/** The record of a description as the text of its file: the same bytes wherever and whenever it is written. */
export function recordText(description: Description, versions: Versions): string {
  return layOut(recordOf(description, versions));
}
