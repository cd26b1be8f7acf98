import { type Fault, fault, type Problem, placed, replacement } from "../contract/problem.js";
import { nearest } from "../quantity/nearest.js";
import { describeHeads } from "./describeHeads.js";
import { type LineIndex, lineIndex } from "./lineIndex.js";
import { parseLine, parseLineAs } from "./parseLine.js";
import type { Part } from "./shape.js";
import { headsBelow, type Owner, type StatementRow, statementByHead } from "./statements.js";
import type { LineStatement, Statement } from "./syntax.js";

/** A description as it is written: its lines, each below the header it belongs to, and what is wrong with them. */
export interface Parsed {
  readonly uri: string;
  readonly text: string;
  readonly index: LineIndex;
  /** lines directly in the file, in order; what stands above the first run holds for every run */
  readonly statements: readonly Statement[];
  readonly problems: readonly Problem[];
  /** where lines begin whose first word is not known and near to none: what they are meant to say is lost */
  readonly lost: readonly number[];
  /** what could come next at the end of the text */
  readonly wantedAtEnd: readonly Part[];
}

interface Open {
  readonly owner: Owner;
  readonly children: Statement[];
}

interface State {
  readonly uri: string;
  readonly problems: Problem[];
  readonly open: Open[];
  readonly lost: number[];
  /** the last line was lost: it may be the header of those that follow */
  headerLost: boolean;
  runSeen: boolean;
  /** kinds of line that were said to stand wrong below the present run: once is enough */
  readonly misplaced: Set<StatementRow>;
}

/** Parses a whole text. Never fails: it returns a tree and problems. Spans are UTF-16 units from the text's start. */
export function parse(uri: string, text: string): Parsed {
  const index = lineIndex(text);
  const file: Open = { owner: "file", children: [] };
  const state: State = {
    uri,
    problems: [],
    open: [file],
    lost: [],
    headerLost: false,
    runSeen: false,
    misplaced: new Set(),
  };
  let wantedAtEnd: readonly Part[] = [];
  index.starts.forEach((offset, number) => {
    const next = index.starts[number + 1] ?? text.length;
    const line = withoutBreak(text, offset, next);
    const parsed = parseLine(line);
    wantedAtEnd = parsed.wanted;
    if (parsed.fault !== null) state.problems.push(placed(parsed.fault, uri, offset));
    for (const statement of parsed.statements) attach(state, statement, line, offset);
  });
  return { uri, text, index, statements: file.children, problems: state.problems, lost: state.lost, wantedAtEnd };
}

function withoutBreak(text: string, start: number, next: number): string {
  let end = next;
  while (end > start && (text.charCodeAt(end - 1) === 0x0a || text.charCodeAt(end - 1) === 0x0d)) end--;
  return text.slice(start, end);
}

/** Puts a statement below the nearest open header that lists it. */
function attach(state: State, line: LineStatement, text: string, offset: number): void {
  const known = line.row === null ? guess(state, line, text, offset) : line;
  if (known === null || known.row === null) {
    state.lost.push(offset);
    state.headerLost = true;
    return;
  }
  const { row } = known;
  const depth = state.open.findLastIndex((candidate) => takes(state, candidate.owner, row));
  const owner = state.open[depth];
  if (owner === undefined) {
    if (known.fault === null && !state.headerLost && !state.misplaced.has(row)) {
      state.misplaced.add(row);
      state.problems.push(placed(misplaced(row, known), state.uri, offset));
    }
    return;
  }
  const statement: Statement = { line: known, offset, owner: owner.owner, children: [] };
  owner.children.push(statement);
  state.headerLost = false;
  state.open.length = depth + 1;
  if (depth === 0) state.misplaced.clear();
  if (row.opens !== undefined) state.open.push({ owner: row.opens, children: statement.children });
  if (row.opens === "run") state.runSeen = true;
}

/** A run's lines stand directly in the file only above the first run: there they hold for every run. */
function takes(state: State, owner: Owner, row: StatementRow): boolean {
  if (!row.owners.includes(owner)) return false;
  return owner !== "file" || !state.runSeen || !row.owners.includes("run");
}

function misplaced(row: StatementRow, line: LineStatement): Fault {
  const owners = row.owners.filter((owner) => owner !== "file");
  return fault("line-misplaced", { head: row.head, owner: owners.join(" or ") }, line.head);
}

/**
 * A first word that is not known: says so, offers the nearest one allowed here, and takes the line for that one so
 * that the lines below it do not slide below a wrong header.
 */
function guess(state: State, line: LineStatement, text: string, offset: number): LineStatement | null {
  const allowed = [...new Set(state.open.toReversed().flatMap((open) => headsBelow(open.owner)))].filter((head) => {
    const row = statementByHead.get(head);
    return row !== undefined && state.open.some((open) => takes(state, open.owner, row));
  });
  const near = nearestHead(line, text, allowed) ?? begunHeader(line, allowed) ?? begunWord(line, allowed);
  const behind = near === null ? behindSign(line, text, allowed) : null;
  if (behind !== null) {
    const words = { word: line.head.text, allowed: describeHeads(allowed) };
    const without = { text: behind.head.text, edits: [{ start: line.head.start, end: behind.head.start, text: "" }] };
    const stray = fault("word-unknown", words, line.head, [without]);
    state.problems.push(placed(stray, state.uri, offset));
    return { ...behind, fault: stray };
  }
  const mend = near === null ? [] : [replacement(line.head, near)];
  const nearFirst = near === null ? allowed : [near, ...allowed.filter((word) => word !== near)];
  const unknown = fault("word-unknown", { word: line.head.text, allowed: describeHeads(nearFirst) }, line.head, mend);
  state.problems.push(placed(unknown, state.uri, offset));
  const row = near === null ? undefined : statementByHead.get(near);
  const meant = row === undefined ? undefined : parseLineAs(text, row).statements[0];
  return meant === undefined ? null : { ...meant, fault: unknown };
}

/** Of the first words that are near, one with which the whole line is sound: `dat "a.csv"` is no date. */
function nearestHead({ head }: LineStatement, text: string, allowed: readonly string[]): string | null {
  const near = nearest(head.text, allowed, 4);
  const sound = near.find((word) => {
    const row = statementByHead.get(word);
    return row !== undefined && parseLineAs(text, row).fault === null;
  });
  return sound ?? near[0] ?? null;
}

/** The line behind a sign that people put in front of it: `- volume 50 mL`, `* volume 50 mL`. */
function behindSign({ head }: LineStatement, text: string, allowed: readonly string[]): LineStatement | null {
  if (/[\p{L}\p{N}]/u.test(head.text)) return null;
  const rest = parseLine(" ".repeat(head.end) + text.slice(head.end)).statements[0];
  return rest !== undefined && allowed.includes(rest.row?.head ?? "") ? rest : null;
}

/** A first word cut short, as `temp`, where only one begins so. */
function begunWord({ head }: LineStatement, allowed: readonly string[]): string | null {
  if (head.text.length < 3) return null;
  const begun = allowed.filter((word) => word.startsWith(head.text));
  return begun.length === 1 ? (begun[0] ?? null) : null;
}

/** A header that is being typed at the margin: the lines below it are not those of the run above. */
function begunHeader({ head }: LineStatement, allowed: readonly string[]): string | null {
  if (head.start > 0) return null;
  const headers = allowed.filter((word) => statementByHead.get(word)?.opens === "run");
  return headers.find((word) => word.startsWith(head.text)) ?? null;
}
