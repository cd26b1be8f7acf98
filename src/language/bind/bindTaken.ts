import { ionsOf } from "../../chemistry/handbook/dissociation.js";
import { problem } from "../../contract/problem.js";
import type { Reaction } from "../../study/reaction.js";
import type { Role, Taken } from "../../study/run.js";
import { isBroken, originOf, quantityOf, textOf } from "../fields.js";
import type { Statement } from "../syntax.js";
import { type Binding, report } from "./binding.js";
import { resolveSpecies } from "./resolveSpecies.js";

/** The `taken` lines of a run. */
export function bindTaken(binding: Binding, lines: readonly Statement[], reaction: Reaction | null): Taken[] {
  return lines.flatMap((statement): Taken[] => {
    if (isBroken(statement)) return [];
    const species = resolveSpecies(binding, statement, "species", reaction === null ? [] : [reaction]);
    const given = quantityOf(statement, "given");
    if (species === null || given === null) return [];
    const role = (textOf(statement, "role") as Role | null) ?? null;
    const taken: Taken = { species, given, role, origin: originOf(binding.uri, statement) };
    if (reaction?.whole === true && role === null && !takesPart(taken, reaction)) {
      const end = originOf(binding.uri, statement).end;
      const asRole = (word: Role) => ({ text: `as ${word}`, edits: [{ start: end, end, text: ` as ${word}` }] });
      report(
        binding,
        problem(
          "taken-takes-no-part",
          { species: species.key },
          originOf(binding.uri, statement, "species"),
          (["catalyst", "inert", "buffer"] as const).map(asRole),
        ),
      );
    }
    return [taken];
  });
}

/** Whether a species, or an ion it gives in water, stands in the reaction. */
function takesPart({ species }: Taken, reaction: Reaction): boolean {
  if (reaction.numbers.has(species.key)) return true;
  const ions = species.formula === null ? null : ionsOf(species.formula.text);
  return ions?.some(({ key }) => reaction.numbers.has(key)) ?? false;
}
