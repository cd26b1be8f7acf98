import type { DataFile } from "../../study/dataFile.js";
import type { StudyItem } from "../../study/fact.js";
import type { Reaction } from "../../study/reaction.js";
import type { EndPoint, FitWish, RateWish } from "../../study/wish.js";
import { blockOf, isBroken, originOf, quantityOf, textOf } from "../fields.js";
import type { Statement } from "../syntax.js";
import { useColumn } from "./bindFollow.js";
import type { Binding } from "./binding.js";
import { bindLaw } from "./bindLaw.js";
import { reportEmptySpan } from "./emptySpan.js";
import { hasLine, linesWith, lineWith, numberFact, textFact } from "./facts.js";
import { resolveSpecies } from "./resolveSpecies.js";

/** What the wishes of a run are bound with. */
export interface WishContext {
  readonly binding: Binding;
  readonly run: string;
  readonly reaction: Reaction | null;
  readonly data: DataFile | null;
  readonly dataLine: Statement | null;
}

/** The `rate` lines of a run, numbered in the order of the text. Broken lines keep their number. */
export function bindRates(context: WishContext, lines: readonly Statement[]): RateWish[] {
  return lines.flatMap((statement, index): RateWish[] => {
    if (isBroken(statement)) return [];
    const item = { ...itemOf(context, statement, "rate", index), using: usingOf(context, statement) };
    const at = quantityOf(statement, "at");
    const from = quantityOf(statement, "from");
    const to = quantityOf(statement, "to");
    if (at !== null) return [{ ...item, kind: "instantaneous", at }];
    if (from === null || to === null)
      return textOf(statement, "kind") === "initial" ? [{ ...item, kind: "initial" }] : [];
    if (from.value >= to.value) {
      reportEmptySpan(context.binding, statement);
      return [];
    }
    return [{ ...item, kind: "average", from, to }];
  });
}

/** The `fit` lines of a run, numbered in the order of the text. */
export function bindFits(context: WishContext, lines: readonly Statement[]): FitWish[] {
  return lines.flatMap((statement, index): FitWish[] => {
    if (isBroken(statement)) return [];
    const { binding, reaction } = context;
    const bound = bindLaw(binding, statement, reaction);
    const using = usingOf(context, statement);
    if (bound === null) return [];
    const { children } = statement;
    const reversible = lineWith(children, "reversible");
    return [
      {
        ...itemOf(context, statement, "fit", index),
        ...bound,
        using,
        window: bindWindow(binding, statement),
        start: bindEndPoint(binding, statement, "start"),
        infinity: bindEndPoint(binding, statement, "infinity"),
        excess: linesWith(children, "excess").flatMap((line) => {
          const value = resolveSpecies(binding, line, "species", reaction === null ? [] : [reaction]);
          return value === null ? [] : [{ value, origin: originOf(binding.uri, line) }];
        }),
        reversible:
          reversible === null
            ? null
            : {
                value: numberFact([reversible], "reversible", "K") ?? ("free" as const),
                origin: originOf(binding.uri, reversible),
              },
        weights: textFact(binding.uri, children, "weights", "kind"),
        errors: textFact(binding.uri, children, "errors", "kind"),
        robust: hasLine(children, "robust"),
      },
    ];
  });
}

function itemOf({ binding, run }: WishContext, statement: Statement, kind: string, index: number): StudyItem {
  return {
    id: `run ${run}/${kind} ${index + 1}`,
    origin: originOf(binding.uri, statement),
    block: blockOf(binding.uri, statement),
  };
}

function usingOf({ binding, run, data, dataLine }: WishContext, statement: Statement): string | null {
  const using = textOf(statement, "using");
  if (using !== null) useColumn(binding, run, statement, "using", using, data, dataLine);
  return using;
}

function bindWindow(binding: Binding, fit: Statement): FitWish["window"] {
  const statement = lineWith(fit.children, "window");
  if (statement === null) return null;
  const from = quantityOf(statement, "from");
  const to = quantityOf(statement, "to");
  if (from === null || to === null) return null;
  if (from.value >= to.value) {
    reportEmptySpan(binding, statement);
    return null;
  }
  return { from, to, origin: originOf(binding.uri, statement) };
}

function bindEndPoint(binding: Binding, fit: Statement, head: "start" | "infinity"): EndPoint {
  const statement = lineWith(fit.children, head);
  if (statement === null) return { kind: "default" };
  const origin = originOf(binding.uri, statement);
  const kind = textOf(statement, "kind");
  if (kind === "free") return { kind: "free" };
  if (kind === "measured") return { kind: "measured", origin };
  return { kind: "fixed", value: quantityOf(statement, "value"), origin };
}
