import type { Q, Run } from "../contract/findings.js";

/** Which rate it is, in words: "average from 0 s to 60 s", "at 30 s", "initial, at 0 s". */
export function rateName(
  { kind, from, to, at }: Run["rates"][number],
  print: (quantity: Q) => string = ({ text }) => text,
): string {
  const name = { average: "average", initial: "initial", event: "by the event", instantaneous: "instantaneous" }[kind];
  if (kind === "average") {
    return `${name} from ${from === null ? "the start" : print(from)} to ${to === null ? "the end" : print(to)}`;
  }
  if (at === null) return name;
  return kind === "instantaneous" ? `at ${print(at)}` : `${name}, at ${print(at)}`;
}
