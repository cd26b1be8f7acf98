import type { Run } from "../contract/findings.js";

/** Which rate it is, in words: "average from 0 s to 60 s", "at 30 s", "initial, at 0 s". */
export function rateName({ kind, from, to, at }: Run["rates"][number]): string {
  if (kind === "average") return `average from ${from?.text ?? "the start"} to ${to?.text ?? "the end"}`;
  if (kind === "initial") return at === null ? "initial" : `initial, at ${at.text}`;
  if (kind === "event") return at === null ? "by the event" : `by the event at ${at.text}`;
  return at === null ? "instantaneous" : `at ${at.text}`;
}
