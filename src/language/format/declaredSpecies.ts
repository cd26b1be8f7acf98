import type { Parsed } from "../parse.js";
import type { Part } from "../shape.js";
import type { IsDeclared } from "./speciesSigns.js";

/** Tells the names of species that a description declares; they look like formulas now and then, and are none. */
export function declaredSpecies({ statements }: Parsed): IsDeclared {
  const names = new Set<string>();
  for (const { line } of statements) {
    for (const part of line.row?.parts ?? []) {
      if (!declaresSpecies(part)) continue;
      const name = line.fields.get(part.label)?.text;
      if (name !== undefined) names.add(name);
    }
  }
  return (name) => names.has(name);
}

function declaresSpecies(part: Part): part is Part & { part: "name" } {
  return part.part === "name" && part.declares && part.of === "species";
}
