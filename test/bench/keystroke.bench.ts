import { bind } from "../../src/language/bind/bind.js";
import { parse } from "../../src/language/parse.js";
import { median, ms, quantile, times } from "./sampling.js";

/** A description of about so many lines: runs that start like one another, with their own figures. */
function description(lines: number): string {
  const head = "reaction 2 H2O2(aq) -> 2 H2O(l) + O2(g)\ntemperature 25.0(1) °C\n";
  const run = (i: number): string => `
run R${i} "run number ${i}"
  date         2026-11-03
  volume       ${50 + i}.00 mL within 0.05 mL
  taken        H2O2  0.${100 + i}(2) mol/L
  taken        KI    0.0${500 + i} +/- 0.0005 mol/L  as catalyst
  data         "data/${i}.csv"
    column     t    "time / s"   s
    column     c    "c / mol L^-1"
      random   0.00${i + 1} mol/L
  follow       H2O2 as concentration from c
  rate         from ${i} s to ${60 + i} s
  rate         initial
  fit          order 1 in H2O2
    window     ${i} s to ${600 + i} s
    infinity   free
`;
  let text = head;
  for (let i = 0; text.split("\n").length < lines; i++) text += run(i);
  return text;
}

/** Edits one figure after the other, as a person types, and parses, binds and checks the whole text each time. */
export async function bench(): Promise<string[]> {
  return [1_000, 10_000].flatMap((size) => {
    const text = description(size);
    const lines = text.split("\n");
    const numbered = lines.flatMap((line, index) => (line.includes("taken        H2O2") ? [index] : []));
    const edited = (round: number): string => {
      const at = numbered[(round * 7) % numbered.length] ?? 0;
      return lines.with(at, `  taken        H2O2  0.${1000 + round}(2) mol/L`).join("\n");
    };
    const texts = Array.from({ length: 260 }, (_, round) => edited(round));
    let problems = 0;
    const found = times(200, 60, (round) => {
      problems += bind(parse("file:///bench/a.raterun", texts[round] ?? text)).problems.length;
    });
    const goal = size === 1_000 ? 5 : 60;
    return [
      `${lines.length} lines, edit to diagnostics (parse, bind, fast checks): median ${ms(median(found))}, p95 ${ms(quantile(found, 0.95))}; goal ${goal} ms; ${problems} problems`,
    ];
  });
}
