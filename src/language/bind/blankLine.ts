import { problem } from "../../contract/problem.js";
import { isBroken, originOf } from "../fields.js";
import type { Statement } from "../syntax.js";
import { type Binding, report } from "./binding.js";

/**
 * The own lines of a run, with a bare `blank` joined to the one follow line that the run starts from or has: it goes
 * below a copy of it. Where several are followed it belongs to none, and that is said.
 */
export function withBlankJoined(
  binding: Binding,
  inherited: readonly Statement[],
  own: readonly Statement[],
): readonly Statement[] {
  const blank = own.find(({ line }) => line.row?.head === "blank");
  if (blank === undefined) return own;
  const rest = own.filter((statement) => statement !== blank);
  if (isBroken(blank)) return rest;
  const isFollow = ({ line }: Statement): boolean => line.row?.head === "follow";
  const mine = rest.filter(isFollow);
  const follows = mine.length > 0 ? mine : inherited.filter(isFollow);
  const [follow] = follows;
  if (follow === undefined || follows.length > 1) {
    report(binding, problem("blank-ambiguous", { count: follows.length }, originOf(binding.uri, blank)));
    return rest;
  }
  const others = follow.children.filter(({ line }) => line.row?.head !== "blank");
  return [...rest.filter((statement) => statement !== follow), { ...follow, children: [...others, blank] }];
}
