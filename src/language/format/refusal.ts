import { type Problem, problem } from "../../contract/problem.js";
import type { LaidOutLine } from "./layOut.js";
import { sameLine } from "./lineMeaning.js";

/** Names the first line whose words would say something else; the first that changes where none does by itself. */
export function refusal(uri: string, lines: readonly LaidOutLine[], offset = 0): Problem {
  const changed = lines.filter(({ line, text }) => text !== line.text);
  const wrong = changed.find(({ line, text }) => !sameLine(line.text, text ?? "", () => false)) ?? changed[0];
  const line = wrong?.line;
  const start = (line?.start ?? 0) + offset;
  const number = line === undefined ? 1 : lines.findIndex((candidate) => candidate.line === line) + 1;
  return problem("format-refused", { line: number }, { uri, start, end: start + (line?.text.length ?? 0) });
}
