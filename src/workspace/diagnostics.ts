import type { Note } from "../analysis/notes.js";
import type { Diagnostic, Run } from "../contract/findings.js";
import type { Problem, Span } from "../contract/problem.js";
import { mendTitle, messageOf } from "../contract/words.js";
import type { Bound } from "../language/bind/bind.js";
import { placeOf } from "../language/lineIndex.js";

/** A problem with the item it belongs to and its words, as it is shown. */
export interface ShownProblem {
  readonly problem: Problem;
  readonly item: string | null;
}

/** Everything that is wrong with a description, in the order of the text, each once. */
export function shownProblems(bound: Bound, notes: readonly Note[]): ShownProblem[] {
  const items = itemSpans(bound);
  const fromText = bound.problems.map((problem) => ({ problem, item: itemAt(items, problem.origin) }));
  const seen = new Set<string>();
  const all = [...fromText, ...notes].filter(({ problem, item }) => {
    const key = `${problem.code} ${problem.origin.start} ${problem.origin.end} ${messageOf(problem)} ${item ?? ""}`;
    if (seen.has(key)) return false;
    seen.add(key);
    return true;
  });
  return all.sort((a, b) => a.problem.origin.start - b.problem.origin.start);
}

export function diagnosticsOf(bound: Bound, notes: readonly Note[]): Diagnostic[] {
  return shownProblems(bound, notes).map(({ problem, item }) => ({
    ...placeOf(bound.parsed.index, problem.origin),
    code: problem.code,
    severity: problem.severity,
    message: messageOf(problem),
    item,
    mends: (problem.mend ?? []).map((mend) => ({
      title: mendTitle(mend),
      edits: mend.edits.map((edit) => ({ ...placeOf(bound.parsed.index, edit), text: edit.text })),
    })),
  }));
}

/** A run's findings with the codes of the diagnostics that belong to it and to its items. */
export function withProblems(run: Run, diagnostics: readonly Diagnostic[]): Run {
  const codes = (id: string): string[] => [
    ...new Set(diagnostics.filter(({ item }) => item === id).map(({ code }) => code)),
  ];
  const marked = <T extends { id: string; problems: string[] }>(item: T): T => ({ ...item, problems: codes(item.id) });
  return { ...marked(run), follow: run.follow.map(marked), rates: run.rates.map(marked), fits: run.fits.map(marked) };
}

interface ItemSpan extends Span {
  readonly id: string;
}

/** Runs and their items with the stretch of text they stand for, the inner ones last. */
function itemSpans({ study }: Bound): ItemSpan[] {
  return study.runs.flatMap((source) => {
    if (source.kind !== "run") return [];
    const { run } = source;
    const within = (span: Span): boolean => span.start >= run.block.start && span.end <= run.block.end;
    const inner = [...run.follow, ...run.rates, ...run.fits].filter(({ block }) => within(block));
    return [run, ...inner].map(({ id, block }) => ({ id, start: block.start, end: block.end }));
  });
}

function itemAt(items: readonly ItemSpan[], { start, end }: Span): string | null {
  return items.findLast((item) => start >= item.start && end <= item.end)?.id ?? null;
}
