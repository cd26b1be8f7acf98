import type { Edit, Fault } from "../contract/problem.js";

/** The fault of a part that began at `offset` of the text, told in positions of that text. */
export function shifted(inner: Fault, offset: number): Fault {
  if (offset === 0) return inner;
  const span = { start: inner.span.start + offset, end: inner.span.end + offset };
  if (inner.mend === undefined) return { ...inner, span };
  const move = (edit: Edit): Edit => ({ ...edit, start: edit.start + offset, end: edit.end + offset });
  return { ...inner, span, mend: inner.mend.map(({ text, edits }) => ({ text, edits: edits.map(move) })) };
}

/** Whether a reader's answer is a fault. */
export function isFault<T extends object>(answer: T | Fault): answer is Fault {
  return "code" in answer && "span" in answer;
}
