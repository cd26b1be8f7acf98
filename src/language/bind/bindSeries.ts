import { problem, replacement } from "../../contract/problem.js";
import { nearest } from "../../quantity/nearest.js";
import type { Reaction } from "../../study/reaction.js";
import type { Mechanism, RunReference, Series, StepConstant } from "../../study/study.js";
import { blockOf, fieldOf, isBroken, itemsOf, originIn, originOf, quantityOf, textOf } from "../fields.js";
import type { Field, Statement } from "../syntax.js";
import { type Binding, report, thereAre } from "./binding.js";
import { bindEquation } from "./bindReaction.js";
import { hasLine, linesWith, lineWith, textFact } from "./facts.js";
import { resolveSpecies } from "./resolveSpecies.js";

/** What series and mechanisms are bound with. */
export interface TogetherContext {
  readonly binding: Binding;
  readonly reactions: readonly Reaction[];
  /** names of the runs of this file, tables' rows apart */
  readonly runs: ReadonlySet<string>;
  /** whether a table of runs may bring names that are not known here */
  readonly tables: boolean;
}

export function bindSeries(context: TogetherContext, statement: Statement): Series | null {
  const name = textOf(statement, "series");
  if (name === null || isBroken(statement)) return null;
  const { binding, reactions } = context;
  const { children } = statement;
  const arrhenius = lineWith(children, "arrhenius");
  const control = textFact(binding.uri, children, "control", "run");
  if (control !== null) checkRun(context, control.value, control.origin);
  return {
    ...itemOf(binding, statement, `series ${name}`, "series"),
    name,
    title: textOf(statement, "title"),
    across: acrossOf(context, children),
    orders: linesWith(children, "order").flatMap((line) => {
      const species = resolveSpecies(binding, line, "species", reactions);
      const by = textOf(line, "by");
      const known = by === "k" || by === "events" ? by : "initial rate";
      return species === null ? [] : [{ species, by: known, origin: originOf(binding.uri, line) }];
    }),
    replicates: linesWith(children, "replicates").map((line) => referencesOf(context, line)),
    arrhenius:
      arrhenius === null
        ? null
        : { at: quantityOf(arrhenius, "temperature"), origin: originOf(binding.uri, arrhenius) },
    saltEffect: hasLine(children, "salt"),
    control: control?.value ?? null,
  };
}

export function bindMechanism(context: TogetherContext, statement: Statement): Mechanism | null {
  const name = textOf(statement, "mechanism");
  if (name === null || isBroken(statement)) return null;
  const { binding } = context;
  return {
    ...itemOf(binding, statement, `mechanism ${name}`, "mechanism"),
    name,
    title: textOf(statement, "title"),
    across: acrossOf(context, statement.children),
    steps: linesWith(statement.children, "step").flatMap((line) => {
      const step = textOf(line, "step") ?? "";
      const reaction = bindEquation(binding, line, step, new Set());
      if (reaction === null) return [];
      return [{ name: step, reaction, forward: constantOf(line, "forward"), reverse: constantOf(line, "reverse") }];
    }),
  };
}

function itemOf(binding: Binding, statement: Statement, id: string, label: "series" | "mechanism") {
  const name = textOf(statement, label) ?? "";
  const origin = originOf(binding.uri, statement, label);
  binding.uses.push({ kind: label, name, run: null, declares: true, origin });
  return { id, origin, block: blockOf(binding.uri, statement) };
}

function acrossOf(context: TogetherContext, lines: readonly Statement[]): RunReference[] {
  const line = lineWith(lines, "across");
  return line === null ? [] : referencesOf(context, line);
}

function referencesOf(context: TogetherContext, statement: Statement): RunReference[] {
  return itemsOf(statement, "runs").map((item) => referenceOf(context, statement, item));
}

/** A name is a run of this file; in quotes stands a pattern of files, or `path:NAME`. */
function referenceOf(context: TogetherContext, statement: Statement, { text, span }: Field): RunReference {
  const origin = originIn(context.binding.uri, statement, span);
  const ofFile = /^(.+\.raterun):([^:/\\]+)$/.exec(text);
  if (ofFile !== null) return { kind: "file", path: ofFile[1] ?? "", name: ofFile[2] ?? "", origin };
  if (/[*?/]|\.raterun$/.test(text)) return { kind: "files", pattern: text, origin };
  checkRun(context, text, origin);
  return { kind: "here", name: text, origin };
}

function checkRun({ binding, runs, tables }: TogetherContext, name: string, origin: RunReference["origin"]): void {
  binding.uses.push({ kind: "run", name, run: null, declares: false, origin });
  if (runs.has(name) || tables || binding.salvaged.has(name)) return;
  const known = runs.size === 0 ? "; the description has none" : thereAre([...runs]);
  const mend = nearest(name, [...runs]).map((near) => replacement(origin, near));
  report(binding, problem("name-unknown", { what: "run", name, known }, origin, mend));
}

function constantOf(step: Statement, head: "forward" | "reverse"): StepConstant | null {
  const line = lineWith(step.children, head);
  if (line === null) return null;
  const field = fieldOf(line, "value");
  if (field?.kind === "quantity") return { kind: "value", value: field.quantity };
  return { kind: "free", scope: textOf(line, "scope") === "per run" ? "per run" : "in common" };
}
