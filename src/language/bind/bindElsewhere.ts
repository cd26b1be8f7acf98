import type { Reaction } from "../../study/reaction.js";
import type { Expected, Given, TimedEvent } from "../../study/run.js";
import { blockOf, itemsOf, originOf, quantityOf, textOf } from "../fields.js";
import type { Statement } from "../syntax.js";
import type { Binding } from "./binding.js";
import { linesWith, lineWith } from "./facts.js";
import { resolveSpecies } from "./resolveSpecies.js";

/** The timed events of a run. */
export function bindEvents(
  binding: Binding,
  run: string,
  lines: readonly Statement[],
  reactions: readonly Reaction[],
): TimedEvent[] {
  const { uri } = binding;
  return linesWith(lines, "observed").map((statement, index) => ({
    id: `run ${run}/event ${index + 1}`,
    origin: originOf(uri, statement),
    block: blockOf(uri, statement),
    what: textOf(statement, "what") ?? "",
    times: itemsOf(statement, "times").flatMap((item) => (item.kind === "quantity" ? [item.quantity] : [])),
    after: bindAfter(binding, statement, reactions),
  }));
}

function bindAfter(binding: Binding, event: Statement, reactions: readonly Reaction[]): TimedEvent["after"] {
  const statement = lineWith(event.children, "after");
  const species = statement === null ? null : resolveSpecies(binding, statement, "species", reactions);
  if (statement === null || species === null) return null;
  const amount = quantityOf(statement, "amount");
  const how = textOf(statement, "how");
  if (amount === null) return { kind: "used up", species };
  return { kind: how === "collected" || how === "consumed" ? how : "formed", species, amount };
}

/** Rates and rate constants known from elsewhere. */
export function bindGiven(binding: Binding, lines: readonly Statement[], reactions: readonly Reaction[]): Given[] {
  return linesWith(lines, "given").flatMap((statement): Given[] => {
    const value = quantityOf(statement, "value");
    if (value === null) return [];
    const what = textOf(statement, "what") === "k" ? "k" : "rate";
    const species = resolveSpecies(binding, statement, "species", reactions);
    return [{ value: { what, value, species }, origin: originOf(binding.uri, statement) }];
  });
}

/** What is expected before any data exist. */
export function bindExpected(binding: Binding, lines: readonly Statement[]): Expected[] {
  return linesWith(lines, "expect").flatMap((statement): Expected[] => {
    const origin = originOf(binding.uri, statement);
    const value = quantityOf(statement, "value");
    const every = quantityOf(statement, "every");
    const to = quantityOf(statement, "to");
    if (every !== null && to !== null) return [{ value: { what: "readings", every, to }, origin }];
    const what = textOf(statement, "what") === "k" ? "k" : "half-life";
    return value === null ? [] : [{ value: { what, value }, origin }];
  });
}
