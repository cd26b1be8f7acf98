import { problem } from "../../contract/problem.js";
import type { Reaction } from "../../study/reaction.js";
import type { Conditions, ResultsIn, Run } from "../../study/run.js";
import { blockOf, isBroken, originOf, textOf } from "../fields.js";
import type { Statement } from "../syntax.js";
import { bindData } from "./bindData.js";
import { bindEvents, bindExpected, bindGiven } from "./bindElsewhere.js";
import { bindFollow, useColumn } from "./bindFollow.js";
import { type Binding, report } from "./binding.js";
import { bindTaken } from "./bindTaken.js";
import { bindFits, bindRates, type WishContext } from "./bindWishes.js";
import { linesWith, lineWith, quantityFact, textFact } from "./facts.js";
import { resolveSpecies, speciesKey } from "./resolveSpecies.js";

/** Makes a run of its header and its effective lines: its own and those it starts from. */
export function bindRun(
  binding: Binding,
  header: Statement,
  name: string,
  lines: readonly Statement[],
  reactions: readonly Reaction[],
  resultsIn: ResultsIn | null,
): Run {
  const { uri } = binding;
  const withHead = (head: string): Statement[] => lines.filter((statement) => statement.line.row?.head === head);
  const follows = withHead("follow");
  const reaction = reactionOf(binding, follows, reactions);
  const own = reaction === null ? [] : [reaction];
  const dataLine = withHead("data")[0] ?? null;
  const data = dataLine === null ? null : bindData(binding, name, dataLine);
  const context: WishContext = { binding, run: name, reaction, data, dataLine };
  const text = (head: string, label = "text") => textFact(uri, lines, head, label);
  return {
    id: `run ${name}`,
    name,
    title: textOf(header, "title"),
    origin: originOf(uri, header, "run"),
    block: blockOf(uri, header),
    date: text("date", "date"),
    operator: text("operator"),
    instrument: text("instrument"),
    solvent: text("solvent"),
    notes: linesWith(lines, "note").flatMap((statement) => textFact(uri, [statement], "note", "text") ?? []),
    resultsIn,
    reaction,
    ...conditionsOf(context, lines, own),
    taken: bindTaken(binding, withHead("taken"), reaction),
    data,
    follow: follows.flatMap((statement) => bindFollow(binding, name, statement, reaction, data, dataLine)),
    events: bindEvents(binding, name, lines, own),
    rates: bindRates(context, withHead("rate")),
    fits: bindFits(context, withHead("fit")),
    given: bindGiven(binding, lines, own),
    expected: bindExpected(binding, lines),
    background: backgroundOf(binding, lines),
  };
}

function conditionsOf(context: WishContext, lines: readonly Statement[], reactions: readonly Reaction[]): Conditions {
  const { binding, run, data, dataLine } = context;
  const { uri } = binding;
  const temperatureColumn = textFact(uri, lines, "temperature", "column");
  const line = lineWith(lines, "temperature");
  if (temperatureColumn !== null && line !== null) {
    useColumn(binding, run, line, "column", temperatureColumn.value, data, dataLine);
    const what = `temperature from ${temperatureColumn.value}`;
    report(binding, problem("not-computed-yet", { what: `“${what}”` }, originOf(uri, line)));
  }
  const purged = lineWith(lines, "purged");
  const gas = purged === null ? null : resolveSpecies(binding, purged, "species", reactions);
  return {
    volume: quantityFact(uri, lines, "volume"),
    temperature: quantityFact(uri, lines, "temperature"),
    temperatureColumn,
    pressure: quantityFact(uri, lines, "pressure"),
    ionicStrength: quantityFact(uri, lines, "ionic", "ionicStrength"),
    headSpace: quantityFact(uri, lines, "head", "headSpace"),
    purgedWith: purged === null || gas === null ? null : { value: gas, origin: originOf(uri, purged) },
    activationEnergy: quantityFact(uri, lines, "activation", "energy"),
  };
}

/** The reaction of a run: the one in which what it follows takes part, else the first. */
function reactionOf(binding: Binding, follows: readonly Statement[], reactions: readonly Reaction[]): Reaction | null {
  for (const statement of follows) {
    if (isBroken(statement)) continue;
    const text = textOf(statement, "species") ?? "";
    const key = speciesKey(binding, text);
    const found = reactions.find(({ numbers }) => numbers.has(key));
    if (found !== undefined) return found;
  }
  return reactions[0] ?? null;
}

function backgroundOf(binding: Binding, lines: readonly Statement[]): Run["background"] {
  const fact = textFact(binding.uri, lines, "background", "run");
  if (fact === null) return null;
  binding.uses.push({ kind: "run", name: fact.value, run: null, declares: false, origin: fact.origin });
  return fact;
}
