import { type Origin, problem } from "../contract/problem.js";
import { failure, type Result, success } from "../contract/result.js";
import { type RunRecord, recordForm, recordShape } from "./recordShape.js";
import { isObject } from "./shape.js";

/**
 * Reads the text of a record. Refuses, with words for each: what ends too soon, what an unfinished merge left, what is
 * no JSON, what is something else or lacks something, and records of a later form.
 */
export function readRecord(text: string, uri: string): Result<RunRecord> {
  const origin: Origin = { uri, start: 0, end: text.length };
  const parsed = parsedJson(text);
  if (parsed === null) {
    if (/^(<{7}|={7}|>{7})( |\r?$)/m.test(text)) return failure(problem("record-unmerged", {}, origin));
    return failure(problem(isCutOff(text) ? "record-cut-off" : "record-broken", {}, origin));
  }
  const { value } = parsed;
  const form = isObject(value) ? value["raterecord"] : undefined;
  if (typeof form === "number" && form > recordForm) {
    return failure(problem("record-newer", { form, known: recordForm }, origin));
  }
  const why = recordShape.fault(value, "");
  if (why !== null) return failure(problem("record-foreign", { why: why.startsWith(" ") ? `it${why}` : why }, origin));
  return success(value as RunRecord);
}

function parsedJson(text: string): { readonly value: unknown } | null {
  try {
    return { value: JSON.parse(text) };
  } catch {
    return null;
  }
}

/** A whole record ends where its first bracket closes. */
function isCutOff(text: string): boolean {
  return text.trim() === "" || (text.startsWith("{") && !text.trimEnd().endsWith("\n}"));
}
