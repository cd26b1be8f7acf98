import { readSpecies } from "../../chemistry/readSpecies.js";
import { problem, replacement } from "../../contract/problem.js";
import { nearest } from "../../quantity/nearest.js";
import { isFault } from "../../quantity/shifted.js";
import type { Reaction, Species } from "../../study/reaction.js";
import { originOf, textOf } from "../fields.js";
import type { Statement } from "../syntax.js";
import { type Binding, report, reportIn } from "./binding.js";

/**
 * The species a field names: a declared name wins over a formula. Null where it is neither, which is reported
 * unless a broken reaction line names it too.
 */
export function resolveSpecies(
  binding: Binding,
  statement: Statement,
  field: string,
  reactions: readonly Reaction[],
): Species | null {
  const text = textOf(statement, field);
  if (text === null) return null;
  const origin = originOf(binding.uri, statement, field);
  const declared = binding.declared.get(withoutState(text));
  if (declared !== undefined) {
    binding.uses.push({ kind: "species", name: declared.key, run: null, declares: false, origin });
    return declared;
  }
  const reading = readSpecies(text);
  if (!isFault(reading) && reading.end === text.length) return { key: reading.key, formula: reading.formula };
  if (binding.salvaged.has(withoutState(text))) return null;
  const known = [...binding.declared.keys(), ...reactions.flatMap(({ numbers }) => [...numbers.keys()])];
  const near = nearest(text, [...new Set(known)]);
  if (isFault(reading)) {
    // A name of the study that is near is a likelier mend than an element.
    const mend = near.map((name) => replacement(origin, name));
    if (near.length === 0) reportIn(binding, statement, origin.start - statement.offset, reading);
    else
      report(
        binding,
        problem(
          "name-unknown",
          { what: "species", name: text, known: `; there is ${near.join(" or ")}` },
          origin,
          mend,
        ),
      );
    return null;
  }
  const rest = { start: origin.start + reading.end, end: origin.end };
  report(
    binding,
    problem(
      "formula-left-over",
      { formula: reading.key, rest: text.slice(reading.end) },
      { uri: binding.uri, ...rest },
    ),
  );
  return null;
}

function withoutState(text: string): string {
  return text.replace(/\((s|l|g|aq)\)$/, "");
}
