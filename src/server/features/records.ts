import {
  type RecordDifferenceAnswer,
  type RecordQuestion,
  recordDifference,
  type WriteRecordAnswer,
  writeRecord,
} from "../../contract/recordProtocol.js";
import { countWords } from "../../report/diagnosticText.js";
import { wrappedText } from "../../report/wrappedText.js";
import { verdictLines } from "../../workspace/verdictText.js";
import { reasonToKeep, recordBeside, recordNow } from "../../workspace/verify.js";
import { abortSignalOf } from "../abortSignal.js";
import type { Feature, ServerContext } from "../context.js";
import { readRecordFile, recordVerdict, writeRefusal } from "../recordFiles.js";

/** Writes records beside descriptions, and says in words how a description differs from its record. */
export const records: Feature = {
  capabilities: {},
  start(context) {
    context.connection.onRequest(writeRecord, async ({ uri }: RecordQuestion, token): Promise<WriteRecordAnswer> => {
      const answer = await write(context, uri, abortSignalOf(token));
      if (answer.done) context.loop.refresh(uri);
      return answer;
    });
    context.connection.onRequest(
      recordDifference,
      async ({ uri }: RecordQuestion, token): Promise<RecordDifferenceAnswer> => ({
        record: nameOf(recordBeside(uri)),
        text: await difference(context, uri, abortSignalOf(token)),
      }),
    );
  },
};

async function write(context: ServerContext, uri: string, signal: AbortSignal): Promise<WriteRecordAnswer> {
  const refuse = (words: string): WriteRecordAnswer => ({ done: false, words });
  const refusal = writeRefusal(context, uri);
  if (refusal !== null) return refuse(refusal);
  const open = context.documents.get(uri);
  if (open === undefined) return refuse("The description is not open.");
  const before = await readRecordFile(context, uri);
  const record = recordBeside(uri);
  const name = nameOf(record);
  const keep =
    "reason" in before
      ? `It cannot be read: ${before.reason}.`
      : before.text === null
        ? null
        : reasonToKeep(before.text);
  if (keep !== null) return refuse(`${name}: ${keep} It is left as it is.`);
  const description = await context.workspace().describe(context.document(open), { curves: false, signal });
  if (description === null) return refuse("The record is not written: the work on it was stopped.");
  const text = recordNow(description);
  const errors = description.diagnostics.filter(({ severity }) => severity === "error");
  const holding = errors.length === 0 ? "" : ` It holds ${countWords(errors)} of the description.`;
  if ("text" in before && before.text === text)
    return { done: true, words: `${name} is up to date already.${holding}` };
  const failed = await context.writer.write(record, text, context.client.folders);
  return failed === null
    ? { done: true, words: `${name} is written.${holding}` }
    : refuse(`${name} cannot be written: ${failed}.`);
}

async function difference(context: ServerContext, uri: string, signal: AbortSignal): Promise<string> {
  const open = context.documents.get(uri);
  const description =
    open === undefined ? null : await context.workspace().describe(context.document(open), { curves: false, signal });
  if (description === null) return "The description could not be worked out.\n";
  const verdict = await recordVerdict(context, uri, description);
  const names = [nameOf(uri), nameOf(recordBeside(uri))] as const;
  if (typeof verdict === "string") return `${names[1]} cannot be read: ${verdict}.\n`;
  const lines = verdictLines(verdict, ...names, "the command “Ratewright: Write Record”");
  return lines.length === 0
    ? `${names[0]}: nothing moved since ${names[1]} was written.\n`
    : `${lines.flatMap(wrapped).join("\n")}\n`;
}

/** A line of a difference as a text to read has it: a long one goes on below its words. */
function wrapped(line: string): string[] {
  return line.startsWith("  ") ? wrappedText(line.trim(), "  ") : [line];
}

function nameOf(uri: string): string {
  return decodeURIComponent(uri.slice(uri.lastIndexOf("/") + 1));
}
