import type { Calibration } from "../../study/reaction.js";
import { isBroken, itemsOf, originOf, quantityOf, textOf } from "../fields.js";
import type { Statement } from "../syntax.js";
import type { Binding } from "./binding.js";
import { hasLine, linesWith, quantityFact } from "./facts.js";
import { resolveSpecies } from "./resolveSpecies.js";

/** The calibrations of a file. */
export function bindCalibrations(binding: Binding, lines: readonly Statement[]): Calibration[] {
  return lines.flatMap((statement): Calibration[] => {
    const name = textOf(statement, "calibration");
    if (name === null || isBroken(statement)) return [];
    const { uri } = binding;
    binding.uses.push({
      kind: "calibration",
      name,
      run: null,
      declares: true,
      origin: originOf(uri, statement, "calibration"),
    });
    const species = resolveSpecies(binding, statement, "species", []);
    if (species === null) return [];
    const { children } = statement;
    return [
      {
        name,
        species,
        standards: linesWith(children, "standard").flatMap((line) => {
          const concentration = quantityOf(line, "concentration");
          const readings = itemsOf(line, "readings").flatMap((item) =>
            item.kind === "quantity" ? [item.quantity] : [],
          );
          return concentration === null ? [] : [{ concentration, readings }];
        }),
        quadratic: hasLine(children, "quadratic"),
        slope: quantityFact(uri, children, "slope"),
        intercept: quantityFact(uri, children, "intercept"),
        origin: originOf(uri, statement),
      },
    ];
  });
}
