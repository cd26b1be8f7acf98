import { problem } from "../../contract/problem.js";
import type { Reaction } from "../../study/reaction.js";
import type { EndPoint, FitWish, RateWish } from "../../study/run.js";
import { blockOf, isBroken, numberOf, originOf, quantityOf, textOf } from "../fields.js";
import type { Statement } from "../syntax.js";
import { type Binding, report } from "./binding.js";
import { describeSpecies, usedUp } from "./reactionSpecies.js";
import { resolveSpecies } from "./resolveSpecies.js";

/** The `rate` lines of a run, numbered in the order of the text. Broken lines keep their number. */
export function bindRates(binding: Binding, run: string, lines: readonly Statement[]): RateWish[] {
  return lines.flatMap((statement, index): RateWish[] => {
    if (isBroken(statement)) return [];
    const { uri } = binding;
    const item = {
      id: `run ${run}/rate ${index + 1}`,
      origin: originOf(uri, statement),
      block: blockOf(uri, statement),
    };
    const at = quantityOf(statement, "at");
    const from = quantityOf(statement, "from");
    const to = quantityOf(statement, "to");
    if (at !== null) return [{ ...item, kind: "instantaneous", at }];
    if (from === null || to === null) return [{ ...item, kind: "initial" }];
    if (from.value >= to.value) {
      reportEmptySpan(binding, statement);
      return [];
    }
    return [{ ...item, kind: "average", from, to }];
  });
}

/** The `fit` lines of a run, numbered in the order of the text. */
export function bindFits(
  binding: Binding,
  run: string,
  lines: readonly Statement[],
  reaction: Reaction | null,
): FitWish[] {
  return lines.flatMap((statement, index): FitWish[] => {
    if (isBroken(statement)) return [];
    const { uri } = binding;
    const species = resolveSpecies(binding, statement, "species", reaction === null ? [] : [reaction]);
    const order = numberOf(statement, "order");
    if (species === null || order === null) return [];
    if (reaction?.whole === true && (reaction.numbers.get(species.key) ?? 0) >= 0) {
      const there = describeSpecies(usedUp(reaction));
      report(
        binding,
        problem("fit-not-in-reaction", { species: species.key, there }, originOf(uri, statement, "species")),
      );
      return [];
    }
    if (order !== 1) {
      const law = `order ${textOf(statement, "order")} in ${textOf(statement, "species")}`;
      report(binding, problem("fit-not-computed", { law }, originOf(uri, statement)));
    }
    return [
      {
        id: `run ${run}/fit ${index + 1}`,
        origin: originOf(uri, statement),
        block: blockOf(uri, statement),
        order,
        species,
        window: bindWindow(binding, statement),
        start: bindEndPoint(binding, statement, "start"),
        infinity: bindEndPoint(binding, statement, "infinity"),
      },
    ];
  });
}

function childOf(statement: Statement, head: string): Statement | undefined {
  return statement.children.find((child) => child.line.row?.head === head && !isBroken(child));
}

function bindWindow(binding: Binding, fit: Statement): FitWish["window"] {
  const statement = childOf(fit, "window");
  if (statement === undefined) return null;
  const from = quantityOf(statement, "from");
  const to = quantityOf(statement, "to");
  if (from === null || to === null) return null;
  if (from.value >= to.value) {
    reportEmptySpan(binding, statement);
    return null;
  }
  return { from, to, origin: originOf(binding.uri, statement) };
}

function reportEmptySpan(binding: Binding, statement: Statement): void {
  const args = { from: textOf(statement, "from") ?? "", to: textOf(statement, "to") ?? "" };
  report(binding, problem("span-empty", args, originOf(binding.uri, statement)));
}

function bindEndPoint(binding: Binding, fit: Statement, head: "start" | "infinity"): EndPoint {
  const statement = childOf(fit, head);
  if (statement === undefined) return { kind: "default" };
  if (textOf(statement, "kind") === "free") return { kind: "free" };
  return { kind: "fixed", value: quantityOf(statement, "value"), origin: originOf(binding.uri, statement) };
}
