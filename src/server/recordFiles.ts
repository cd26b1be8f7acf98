import type { Description } from "../contract/findings.js";
import { recordBeside, type Verdict, verify } from "../workspace/verify.js";
import type { ServerContext } from "./context.js";
import { folderOf } from "./folders.js";

/** Greatest size of a record that is read, bytes. */
const recordLimit = 64e6;

/** What stands where a description's record belongs: its text; null where nothing does; else why it is not read. */
export type RecordFile = { readonly text: string | null } | { readonly reason: string };

export async function readRecordFile({ access }: ServerContext, description: string): Promise<RecordFile> {
  const outcome = await access().reader.read(recordBeside(description), recordLimit);
  if (outcome.kind === "missing") return { text: null };
  if (outcome.kind === "bytes") return { text: new TextDecoder("utf-8").decode(outcome.bytes) };
  if (outcome.kind === "unreadable") return { reason: outcome.reason };
  return { reason: outcome.kind === "folder" ? "a folder of that name is there" : "it is too large" };
}

/** Where a description, worked out as it stands, is with its record; words where that cannot be read at all. */
export async function recordVerdict(
  context: ServerContext,
  uri: string,
  description: Description,
): Promise<Verdict | string> {
  const file = await readRecordFile(context, uri);
  return "reason" in file ? file.reason : verify(description, file.text, recordBeside(uri));
}

/** Why no record is written beside a description, in words; null where one may be. */
export function writeRefusal({ client }: ServerContext, uri: string): string | null {
  if (uri.startsWith("untitled:")) return "The description is not saved yet. Save it first.";
  if (!client.trusted) return "Records are written only in a trusted folder. Trust this one first.";
  if (folderOf(uri, client.folders) === null)
    return "The description lies outside the opened folder. Open its folder first.";
  return null;
}
