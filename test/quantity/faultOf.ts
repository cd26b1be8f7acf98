import assert from "node:assert/strict";
import type { Fault } from "../../src/contract/problem.js";
import { messageOf } from "../../src/contract/words.js";
import { isFault } from "../../src/quantity/shifted.js";

/** The fault that an answer must be. */
export function faultOf(answer: object | null): Fault {
  assert.ok(answer !== null && isFault(answer), `a fault was expected, not ${JSON.stringify(answer)}`);
  return answer;
}

/** A fault in words. */
export function words(fault: Fault): string {
  return messageOf({ ...fault, origin: { uri: "", ...fault.span } });
}

/** `text` with one mend of a fault applied. */
export function mended(text: string, fault: Fault, index = 0): string {
  const edits = [...(fault.mend?.[index]?.edits ?? [])].sort((a, b) => b.start - a.start);
  return edits.reduce((now, { start, end, text: put }) => now.slice(0, start) + put + now.slice(end), text);
}

/** The answer, which must not be a fault. */
export function valid<T extends object>(answer: T | Fault): T {
  if (isFault(answer)) assert.fail(words(answer));
  return answer;
}
