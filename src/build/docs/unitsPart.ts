import { quantityKinds } from "../../language/quantityKinds.js";
import { sameDimension } from "../../quantity/dimension.js";
import { type Kind, kinds } from "../../quantity/kinds.js";
import { prefixes } from "../../quantity/prefixes.js";
import { type UnitRow, unitRows } from "../../quantity/unitTable.js";
import { code, prose } from "./prose.js";

/** Units, each with what it is in the SI, and prefixes. */
export function unitTables(): string[] {
  const rows = unitRows.map((row) => {
    const spellings = [row.symbol, ...(row.aliases ?? [])].map(code).join(", ");
    return `| ${spellings} | ${kindName(row)} | ${inSI(row)} | ${prefixWords(row)} |`;
  });
  const prefixWordsAll = [...prefixes].map(([symbol, power]) => `${code(symbol)} 10^${power}`).join(", ");
  return [
    "## Units",
    "Units are written as in the SI Brochure (`mol L^-1 s^-1`, `mol·L⁻¹·s⁻¹`) or with a solidus (`mol/(L s)`, `mS/cm`); behind a solidus stands one unit or a bracket. `M` alone is mol/L, `C` alone is coulomb, `cal` is 4.184 J. A zero needs its unit too.",
    ["| unit | of | in SI units | prefixes |", "| --- | --- | --- | --- |", ...rows].join("\n"),
    `Prefixes: ${prefixWordsAll}. \`µ\` is read as \`u\`.`,
  ];
}

function kindName({ dimension }: UnitRow): string {
  const all = Object.values<Kind>(kinds);
  return all.find((kind) => sameDimension(kind.dimension, dimension))?.name ?? "–";
}

function inSI({ factor, offset }: UnitRow): string {
  const times = prose(factor);
  return offset === undefined ? times : `${times}, zero at ${prose(offset)} K`;
}

function prefixWords({ prefixes: taken }: UnitRow): string {
  if (taken === "all") return "all";
  return taken === "none" ? "none" : taken.map(code).join(", ");
}

/** What quantities of lines may be. */
export function quantitiesPart(): string[] {
  const rows = Object.values<(typeof quantityKinds)[keyof typeof quantityKinds]>(quantityKinds).map((kind) => {
    const { name, dimensions } = kind;
    const atLeast = "atLeast" in kind ? kind.atLeast : undefined;
    const units = (dimensions ?? []).map((dimension) => {
      const found = Object.values<Kind>(kinds).find((one) => one.dimension === dimension);
      return found === undefined ? "" : `${found.name} (${prose(found.samples)})`;
    });
    const limit = atLeast === undefined ? "any" : atLeast === "zero" ? "zero or more" : "more than zero";
    return `| ${prose(name)} | ${units.length === 0 ? "as the line it belongs to" : units.join("; ")} | ${limit} |`;
  });
  return [
    "## Quantities",
    "What a message calls by the first name takes a unit of these kinds. A temperature is zero or more in kelvin.",
    ["| | unit of | value |", "| --- | --- | --- |", ...rows].join("\n"),
  ];
}
