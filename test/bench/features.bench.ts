import { bind } from "../../src/language/bind/bind.js";
import { nameAt } from "../../src/language/navigate/names.js";
import { wantedAt } from "../../src/language/navigate/wantedAt.js";
import { parse } from "../../src/language/parse.js";
import { outlineOf } from "../../src/server/features/documentSymbols.js";
import { tokensOf } from "../../src/server/features/semanticTokens.js";
import { median, ms, quantile, times } from "./sampling.js";

/** A description of about so many lines, each run like the one before it. */
function description(lines: number): string {
  const run = (i: number): string =>
    `run R${i}${i > 0 ? ` like R${i - 1}` : ""}\n  volume ${50 + i}.00 mL\n  taken H2O2 0.1 mol/L\n  data "${i}.csv"\n    column t "time / s" s\n    column c "c / mol L^-1"\n  follow H2O2 as concentration from c\n  rate initial\n  fit order 1 in H2O2\n`;
  let text = "reaction 2 H2O2(aq) -> 2 H2O(l) + O2(g)\n";
  for (let i = 0; text.length < lines * 22; i++) text += run(i);
  return text;
}

/** What the editor asks for after a keystroke, on a text that is bound already. */
export async function bench(): Promise<string[]> {
  return [1_000, 10_000].flatMap((size) => {
    const text = description(size);
    const bound = bind(parse("file:///bench/a.raterun", text));
    const last = text.lastIndexOf("from c") + 5;
    const work: readonly (readonly [string, () => unknown])[] = [
      ["colours of the whole text", () => tokensOf(bound, 0, Number.POSITIVE_INFINITY)],
      ["colours of 60 lines", () => tokensOf(bound, size - 200, size - 140)],
      ["outline", () => outlineOf(bound, bound.parsed.statements)],
      ["name at a place", () => nameAt(bound, last)],
      ["what is wanted at a place", () => wantedAt(bound.parsed, last)],
    ];
    return work.map(([name, what]) => {
      const found = times(40, 10, () => void what());
      return `${text.split("\n").length} lines, ${name}: median ${ms(median(found))}, p95 ${ms(quantile(found, 0.95))}`;
    });
  });
}
