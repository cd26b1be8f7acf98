import { type Problem, problem, replacement } from "../../contract/problem.js";
import { nearest } from "../../quantity/nearest.js";
import type { Reaction, Species } from "../../study/reaction.js";
import type { RunSource, Study } from "../../study/study.js";
import { isBroken, numberOf, originOf, textOf } from "../fields.js";
import { lexLine } from "../lexer.js";
import type { Parsed } from "../parse.js";
import type { Statement } from "../syntax.js";
import { bindCalibrations } from "./bindCalibrations.js";
import { type Binding, type NameUse, report, thereAre } from "./binding.js";
import { bindReactions } from "./bindReaction.js";
import { bindResultsIn } from "./bindResultsIn.js";
import { bindRun } from "./bindRun.js";
import { bindMechanism, bindSeries } from "./bindSeries.js";
import { bindTable } from "./bindTable.js";
import { withBlankJoined } from "./blankLine.js";
import { checkMasses, checkRun } from "./checkRun.js";
import { declareSpecies } from "./declareSpecies.js";
import { checkRepeats, type KeyOf, mergeLines } from "./effectiveLines.js";
import { sayHeadersOutside, sayKept } from "./keptLines.js";
import { withOrderInNumbers } from "./orderInNumbers.js";
import { speciesKey } from "./resolveSpecies.js";

/** What a description means, and everything the text alone can tell is wrong with it, in the order of the text. */
export interface Bound {
  readonly parsed: Parsed;
  readonly study: Study;
  readonly problems: readonly Problem[];
  readonly uses: readonly NameUse[];
}

/** Gives a parsed description its meaning. Never fails: what means nothing is left out and said. */
export function bind(parsed: Parsed): Bound {
  const { uri, statements } = parsed;
  const withHead = (head: string): Statement[] => statements.filter(({ line }) => line.row?.head === head);
  const problems = new Map<string, Problem>();
  const uses: NameUse[] = [];
  const declared = declareSpecies(uri, problems, uses, withHead("species"));
  const calibrations = new Set(withHead("calibration").flatMap((line) => textOf(line, "calibration") ?? []));
  const gathering: Binding = {
    uri,
    text: parsed.text,
    problems,
    uses,
    declared,
    calibrations,
    salvaged: new Set<string>(),
    halfDeclared: halfDeclared(declared, withHead("species")),
  };
  const { reactions, salvaged } = bindReactions(gathering, withHead("reaction"));
  const onLostLines = lostLines(parsed);
  const binding: Binding = { ...gathering, salvaged: new Set([...salvaged, ...onLostLines.words]) };
  const keyOf = speciesKeys(binding);
  checkVersion(binding, parsed);
  checkRepeats(binding, parsed.index, statements, keyOf);
  const runs = bindRuns(binding, parsed, reactions, keyOf, onLostLines.arrow);
  const names = new Set(withHead("run").flatMap((line) => textOf(line, "run") ?? []));
  const together = { binding, reactions, runs: names, tables: runs.some(({ kind }) => kind === "table") };
  const study: Study = {
    uri,
    reactions,
    species: [...declared.values()],
    calibrations: bindCalibrations(binding, withHead("calibration")),
    runs,
    series: withHead("series").flatMap((line) => bindSeries(together, line) ?? []),
    mechanisms: withHead("mechanism").flatMap((line) => bindMechanism(together, line) ?? []),
  };
  sayKept(binding, parsed, statements);
  sayHeadersOutside(binding, statements);
  const fromLines = parsed.problems.map((found) => withOrderInNumbers(found, parsed.text, reactions));
  const all = [...fromLines, ...problems.values()];
  all.sort((a, b) => a.origin.start - b.origin.start || a.origin.end - b.origin.end);
  return { parsed, study, problems: all, uses };
}

/** Names whose species line is broken, or holds a formula that cannot be read. */
function halfDeclared(declared: ReadonlyMap<string, Species>, lines: readonly Statement[]): ReadonlySet<string> {
  const half = lines.filter((line) => {
    const formula = declared.get(textOf(line, "species") ?? "")?.formula ?? null;
    return isBroken(line) || (formula === null && textOf(line, "formula") !== null);
  });
  return new Set(half.flatMap((line) => textOf(line, "species") ?? []));
}

/** What stands on lines that were lost: words that may be names declared there, and whether one looks like a reaction. */
function lostLines({ lost, text }: Parsed): { words: readonly string[]; arrow: boolean } {
  const tokens = lost.flatMap((at) => lexLine(/^[^\r\n]*/.exec(text.slice(at, at + longestLost))?.[0] ?? ""));
  return {
    words: tokens.flatMap((token) => (token.kind === "word" ? [token.text] : [])),
    arrow: tokens.some(({ kind, text: sign }) => kind === "operator" && sign !== "," && sign !== "±"),
  };
}

/** As much of a lost line is looked through, in letters. */
const longestLost = 400;

function bindRuns(
  binding: Binding,
  parsed: Parsed,
  reactions: readonly Reaction[],
  keyOf: KeyOf,
  reactionLost: boolean,
): RunSource[] {
  const defaults: Statement[] = [];
  const effective = new Map<string, readonly Statement[]>();
  const unsure = new Set<string>();
  const runs: RunSource[] = [];
  const { statements } = parsed;
  const headers = statements.filter(({ line }) => line.row?.head === "run");
  const reactionWritten = reactionLost || statements.some(({ line }) => line.row?.head === "reaction");
  const resultsIn = bindResultsIn(binding, statements);
  for (const statement of statements) {
    const { row } = statement.line;
    if (row?.opens !== "run" && row?.opens !== "rows") {
      if (row?.owners.includes("run")) defaults.push(statement);
      continue;
    }
    const name = row.opens === "run" ? textOf(statement, "run") : "";
    if (name !== null && row.opens === "run") declareRun(binding, statement, name);
    const base = inheritedLines(binding, statement, headers, effective) ?? defaults;
    const lines = mergeLines(base, withBlankJoined(binding, base, statement.children), keyOf);
    if (name === null || isBroken(statement) || effective.has(name)) continue;
    const run = bindRun(binding, statement, name, lines, reactions, resultsIn);
    if (row.opens === "rows") {
      runs.push({ kind: "table", ...bindTable(binding, statement, run, keyOf) });
      continue;
    }
    effective.set(name, lines);
    if (isUnsure(parsed, statement, headers[0]) || unsure.has(textOf(statement, "like") ?? "")) unsure.add(name);
    else checkRun(binding, statement, run, lines, reactionWritten);
    checkMasses(binding, run);
    runs.push({ kind: "run", run });
  }
  return runs;
}

/** Whether a line was lost that may hold for a run, its own or one above the first: it may be what the run seems to lack. */
function isUnsure({ lost, statements }: Parsed, header: Statement, first: Statement | undefined): boolean {
  if (lost.length === 0) return false;
  const next = statements.find(({ line, offset }) => offset > header.offset && line.row?.opens !== undefined);
  const end = next?.offset ?? Number.POSITIVE_INFINITY;
  return lost.some((at) => at < (first?.offset ?? 0) || (at > header.offset && at < end));
}

function declareRun(binding: Binding, statement: Statement, name: string): void {
  const origin = originOf(binding.uri, statement, "run");
  binding.uses.push({ kind: "run", name, run: null, declares: true, origin });
}

/** The lines of the run a header starts from; null where it names none, or none that stands above it. */
function inheritedLines(
  binding: Binding,
  header: Statement,
  headers: readonly Statement[],
  effective: ReadonlyMap<string, readonly Statement[]>,
): readonly Statement[] | null {
  const like = textOf(header, "like");
  if (like === null || isBroken(header)) return null;
  const origin = originOf(binding.uri, header, "like");
  binding.uses.push({ kind: "run", name: like, run: null, declares: false, origin });
  const lines = effective.get(like);
  if (lines !== undefined) return lines;
  const run = textOf(header, "run") ?? "";
  const names = headers.flatMap((candidate) => textOf(candidate, "run") ?? []);
  if (like === run) report(binding, problem("like-itself", { run }, origin));
  else if (headers.some((other) => textOf(other, "run") === like && other.offset > header.offset)) {
    report(binding, problem("like-later", { run, like }, origin));
  } else if (!names.includes(like) && !binding.salvaged.has(like)) {
    const others = names.filter((name) => name !== run);
    const known = others.length === 0 ? "; no other run stands above" : thereAre(others);
    const mend = nearest(like, others).map((near) => replacement(origin, near));
    report(binding, problem("name-unknown", { what: "run", name: like, known }, origin, mend));
  }
  return null;
}

function checkVersion(binding: Binding, parsed: Parsed): void {
  const first = parsed.statements[0];
  for (const statement of parsed.statements) {
    if (statement.line.row?.head !== "ratewright" || isBroken(statement)) continue;
    const version = numberOf(statement, "version");
    const origin = originOf(binding.uri, statement, "version");
    if (version !== 1) {
      report(binding, problem("version-unknown", { version: String(version) }, origin, [replacement(origin, "1")]));
    }
    if (statement !== first) report(binding, problem("version-not-first", {}, originOf(binding.uri, statement)));
  }
}

/** Keys by which lines are told apart: species by what they are, everything else by its text. */
function speciesKeys(binding: Binding): KeyOf {
  const known = new Map<string, string>();
  return (statement, field) => {
    const text = textOf(statement, field);
    if (text === null || field !== "species") return text;
    const before = known.get(text);
    if (before !== undefined) return before;
    const key = speciesKey(binding, text);
    known.set(text, key);
    return key;
  };
}
