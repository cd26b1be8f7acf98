import { problem, replacement } from "../../contract/problem.js";
import { nearest } from "../../quantity/nearest.js";
import type { DataFile } from "../../study/dataFile.js";
import type { Fact } from "../../study/fact.js";
import type { Follow } from "../../study/follow.js";
import type { Reaction, Species } from "../../study/reaction.js";
import { blockOf, isBroken, originOf, quantityOf, textOf } from "../fields.js";
import type { Statement } from "../syntax.js";
import { type Binding, report, thereAre } from "./binding.js";
import { bindEquation } from "./bindReaction.js";
import { hasLine, linesWith, lineWith, quantityFact, textFact } from "./facts.js";
import { changed, describeSpecies } from "./reactionSpecies.js";
import { resolveSpecies } from "./resolveSpecies.js";

/** One `follow` line of a run with what its monitor needs. */
export function bindFollow(
  binding: Binding,
  run: string,
  statement: Statement,
  reaction: Reaction | null,
  data: DataFile | null,
  dataLine: Statement | null,
): Follow[] {
  if (isBroken(statement)) return [];
  const column = textOf(statement, "column");
  const monitor = textOf(statement, "monitor");
  const reactions = reaction === null ? [] : [reaction];
  const species = resolveSpecies(binding, statement, "species", reactions);
  if (column !== null) useColumn(binding, run, statement, "column", column, data, dataLine);
  if (species === null || column === null || monitor === null) return [];
  if (reaction?.whole === true) checkFollowed(binding, statement, species, reaction);
  const { uri } = binding;
  const { children } = statement;
  const quantity = (head: string, label?: string) => quantityFact(uri, children, head, label);
  return [
    {
      id: `run ${run}/follow ${column}`,
      origin: originOf(uri, statement),
      block: blockOf(uri, statement),
      species,
      monitor,
      column,
      readability: quantity("readability"),
      responseTime: quantity("response", "responseTime"),
      blank: quantity("blank"),
      readingAtStart: readingAt(uri, children, "start"),
      readingAtInfinity: readingAt(uri, children, "infinity"),
      calibratedBy: calibratedBy(binding, children),
      collected: collected(uri, children),
      barometer: quantity("barometer", "pressure"),
      levelDifference: quantity("level", "difference"),
      gauge: hasLine(children, "gauge"),
      cellConstant: quantity("cell", "cellConstant"),
      compensatedTo: quantity("compensated", "temperature"),
      uncompensated: hasLine(children, "uncompensated"),
      conductivities: linesWith(children, "conductivity").flatMap((line) => {
        const ion = resolveSpecies(binding, line, "species", reactions);
        const value = quantityOf(line, "value");
        return ion === null || value === null ? [] : [{ species: ion, value }];
      }),
      wavelength: quantity("wavelength"),
      pathLength: quantity("path", "pathLength"),
      strayLight: quantity("stray", "strayLight"),
      titrant: titrant(binding, children, reactions),
      aliquot: quantity("aliquot"),
      titratedBy: titratedBy(binding, children),
    },
  ];
}

/** A column that a line refers to: known to rename and hover, and an error where nothing declares it. */
export function useColumn(
  binding: Binding,
  run: string,
  statement: Statement,
  label: string,
  column: string,
  data: DataFile | null,
  dataLine: Statement | null,
): void {
  const origin = originOf(binding.uri, statement, label);
  binding.uses.push({ kind: "column", name: column, run, declares: false, origin });
  if (dataLine === null || isDeclared(dataLine, column) || binding.salvaged.has(column)) return;
  const names = [...new Set((data?.columns ?? []).map((candidate) => candidate.name))];
  const known = names.length === 0 ? ". Declare it below the data line" : thereAre(names);
  const mend = nearest(column, names).map((near) => replacement(origin, near));
  report(binding, problem("name-unknown", { what: "column", name: column, known }, origin, mend));
}

/** Whether a data line declares a column, or may: a line so broken that it lost its name could be the one. */
function isDeclared(dataLine: Statement, column: string): boolean {
  const lines = dataLine.children.filter((child) => child.line.row?.head === "column");
  return lines.some((child) => textOf(child, "column") === column || textOf(child, "column") === null);
}

function checkFollowed(binding: Binding, statement: Statement, species: Species, reaction: Reaction): void {
  const number = reaction.numbers.get(species.key);
  const origin = originOf(binding.uri, statement, "species");
  const there = changed(reaction);
  if (number === undefined) {
    const mend = nearest(species.key, there).map((near) => replacement(origin, near));
    const args = { species: species.key, there: describeSpecies(there) };
    report(binding, problem("follow-not-in-reaction", args, origin, mend));
  } else if (number === 0) {
    report(binding, problem("follow-blind", { species: species.key }, origin));
  }
}

function readingAt(uri: string, lines: readonly Statement[], end: "start" | "infinity"): Follow["readingAtStart"] {
  const statement = linesWith(lines, "reading").find((line) => textOf(line, "end") === end);
  const value = statement === undefined ? null : quantityOf(statement, "value");
  return statement === undefined || value === null ? null : { value, origin: originOf(uri, statement) };
}

function calibratedBy(binding: Binding, lines: readonly Statement[]): Fact<string> | null {
  const fact = textFact(binding.uri, lines, "calibrated", "calibration");
  if (fact === null) return null;
  const { value: name, origin } = fact;
  binding.uses.push({ kind: "calibration", name, run: null, declares: false, origin });
  if (!binding.calibrations.has(name) && !binding.salvaged.has(name)) {
    const names = [...binding.calibrations];
    const known = names.length === 0 ? `. Declare it: calibration ${name} of I2, say` : thereAre(names);
    const mend = nearest(name, names).map((near) => replacement(origin, near));
    report(binding, problem("name-unknown", { what: "calibration", name, known }, origin, mend));
  }
  return fact;
}

function collected(uri: string, lines: readonly Statement[]): Follow["collected"] {
  const statement = lineWith(lines, "collected");
  const temperature = statement === null ? null : quantityOf(statement, "temperature");
  if (statement === null || temperature === null) return null;
  const wet = textOf(statement, "how") === "wet";
  return { value: { wet, temperature }, origin: originOf(uri, statement) };
}

function titrant(binding: Binding, lines: readonly Statement[], reactions: readonly Reaction[]): Follow["titrant"] {
  const statement = lineWith(lines, "titrant");
  if (statement === null) return null;
  const species = resolveSpecies(binding, statement, "species", reactions);
  const concentration = quantityOf(statement, "concentration");
  if (species === null || concentration === null) return null;
  return { value: { species, concentration }, origin: originOf(binding.uri, statement) };
}

/** The equation of a titration in its one ASCII form. */
function titratedBy(binding: Binding, lines: readonly Statement[]): Fact<string> | null {
  const statement = lineWith(lines, "titrated");
  const reaction = statement === null ? null : bindEquation(binding, statement, null, new Set());
  return reaction === null ? null : { value: reaction.text, origin: reaction.origin };
}
