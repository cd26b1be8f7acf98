import { problem, replacement } from "../../contract/problem.js";
import { nearest } from "../../quantity/nearest.js";
import type { Quantity } from "../../quantity/quantity.js";
import type { Fact } from "../../study/fact.js";
import type { Reaction } from "../../study/reaction.js";
import type { DataFile, Follow, Run } from "../../study/run.js";
import { blockOf, isBroken, originOf, quantityOf, textOf } from "../fields.js";
import type { Statement } from "../syntax.js";
import { bindData } from "./bindData.js";
import { bindFits, bindRates } from "./bindFit.js";
import { type Binding, report } from "./binding.js";
import { bindTaken } from "./bindTaken.js";
import { changed, describeSpecies } from "./reactionSpecies.js";
import { resolveSpecies } from "./resolveSpecies.js";

/** Makes a run of its header and its effective lines: its own and those it starts from. */
export function bindRun(
  binding: Binding,
  header: Statement,
  lines: readonly Statement[],
  reactions: readonly Reaction[],
): Run {
  const { uri } = binding;
  const name = textOf(header, "run") ?? "";
  const withHead = (head: string): Statement[] => lines.filter((statement) => statement.line.row?.head === head);
  const follows = withHead("follow");
  const reaction = reactionOf(binding, follows, reactions);
  const dataLine = withHead("data")[0];
  const data = dataLine === undefined ? null : bindData(binding, name, dataLine);
  return {
    id: `run ${name}`,
    name,
    title: textOf(header, "title"),
    origin: originOf(uri, header, "run"),
    block: blockOf(uri, header),
    date: textFact(uri, withHead("date")[0], "date"),
    notes: withHead("note").flatMap((statement) => textFact(uri, statement, "text") ?? []),
    reaction,
    volume: quantityFact(uri, withHead("volume")[0], "volume"),
    temperature: quantityFact(uri, withHead("temperature")[0], "temperature"),
    taken: bindTaken(binding, withHead("taken"), reaction),
    data,
    follow: follows.flatMap((statement) => bindFollow(binding, name, statement, reaction, data, dataLine)),
    rates: bindRates(binding, name, withHead("rate")),
    fits: bindFits(binding, name, withHead("fit"), reaction),
  };
}

/** The reaction of a run: the one in which what it follows takes part, else the first. */
function reactionOf(binding: Binding, follows: readonly Statement[], reactions: readonly Reaction[]): Reaction | null {
  for (const statement of follows) {
    const text = textOf(statement, "species") ?? "";
    const key = binding.declared.get(text)?.key ?? text;
    const found = reactions.find(({ numbers }) => numbers.has(key));
    if (found !== undefined) return found;
  }
  return reactions[0] ?? null;
}

function bindFollow(
  binding: Binding,
  run: string,
  statement: Statement,
  reaction: Reaction | null,
  data: DataFile | null,
  dataLine: Statement | undefined,
): Follow[] {
  const { uri } = binding;
  if (isBroken(statement)) return [];
  const column = textOf(statement, "column");
  const monitor = textOf(statement, "monitor");
  const species = resolveSpecies(binding, statement, "species", reaction === null ? [] : [reaction]);
  if (column !== null) {
    const origin = originOf(uri, statement, "column");
    binding.uses.push({ kind: "column", name: column, run, declares: false, origin });
    if (dataLine !== undefined && !declaredIn(dataLine, column)) {
      const names = [...new Set((data?.columns ?? []).map((candidate) => candidate.name))];
      const known =
        names.length === 0
          ? ". Declare it below the data line"
          : `; there ${names.length === 1 ? "is" : "are"} ${names.join(", ")}`;
      const mend = nearest(column, names).map((near) => replacement(origin, near));
      report(binding, problem("name-unknown", { what: "column", name: column, known }, origin, mend));
    }
  }
  if (species === null || column === null || monitor === null) return [];
  if (reaction?.whole === true) {
    const number = reaction.numbers.get(species.key);
    const origin = originOf(uri, statement, "species");
    const there = changed(reaction);
    if (number === undefined) {
      const mend = nearest(species.key, there).map((near) => replacement(origin, near));
      const args = { species: species.key, there: describeSpecies(there) };
      report(binding, problem("follow-not-in-reaction", args, origin, mend));
    } else if (number === 0) {
      report(binding, problem("follow-blind", { species: species.key }, origin));
    }
  }
  const id = `run ${run}/follow ${column}`;
  return [{ id, origin: originOf(uri, statement), block: blockOf(uri, statement), species, monitor, column }];
}

/** Whether a data line declares a column, or may: a line so broken that it lost its name could be the one. */
function declaredIn(dataLine: Statement, column: string): boolean {
  const lines = dataLine.children.filter((child) => child.line.row?.head === "column");
  return lines.some((child) => textOf(child, "column") === column || textOf(child, "column") === null);
}

function textFact(uri: string, statement: Statement | undefined, label: string): Fact<string> | null {
  if (statement === undefined || isBroken(statement)) return null;
  const value = textOf(statement, label);
  return value === null ? null : { value, origin: originOf(uri, statement, label) };
}

function quantityFact(uri: string, statement: Statement | undefined, label: string): Fact<Quantity> | null {
  if (statement === undefined || isBroken(statement)) return null;
  const value = quantityOf(statement, label);
  return value === null ? null : { value, origin: originOf(uri, statement, label) };
}
