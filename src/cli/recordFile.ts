import { nodeReader } from "../host/node/nodeReader.js";
import type { WriteRefusal } from "../host/node/writeText.js";

/** Greatest size of a record that is read, bytes. */
const recordLimit = 256e6;

/** The text of a record; null where none is there; "unreadable" where something is that cannot be read. */
export async function readRecordFile(uri: string): Promise<{ readonly text: string | null } | "unreadable"> {
  const outcome = await nodeReader().read(uri, recordLimit);
  if (outcome.kind === "missing") return { text: null };
  if (outcome.kind !== "bytes") return "unreadable";
  return { text: new TextDecoder("utf-8").decode(outcome.bytes) };
}

/** Why a record cannot be written. */
export const recordRefusals: Readonly<Record<WriteRefusal, string>> = {
  "a folder": "is a folder; a record of that name cannot stand there",
  "no folder": "has no folder to stand in",
  "not allowed": "may not be written; change its permissions, or those of its folder",
  "no room": "cannot be written: the disk is full",
  unwritable: "cannot be written",
};
