import { type Balance, balance } from "../../chemistry/balance.js";
import { balanceFault } from "../../chemistry/balanceFault.js";
import { type Equation, equationText, stoichiometricNumbers } from "../../chemistry/equation.js";
import type { Formula } from "../../chemistry/formula.js";
import { oxygenForZero } from "../../chemistry/oxygenForZero.js";
import { readEquation } from "../../chemistry/readEquation.js";
import { placed, problem } from "../../contract/problem.js";
import type { Reaction } from "../../study/reaction.js";
import { fieldOf, isBroken, originOf, textOf } from "../fields.js";
import type { Statement } from "../syntax.js";
import { type Binding, report, reportIn } from "./binding.js";
import { hasLine, quantityFact } from "./facts.js";
import { withDeclaration } from "./resolveSpecies.js";

/** The reactions of a file, and the species on their lines that could be read though the line is broken. */
export function bindReactions(
  binding: Binding,
  lines: readonly Statement[],
): { reactions: Reaction[]; salvaged: ReadonlySet<string> } {
  const salvaged = new Set<string>();
  const reactions = lines.flatMap((statement): Reaction[] => {
    const found = bindEquation(binding, statement, textOf(statement, "reaction"), salvaged);
    return found === null ? [] : [found];
  });
  return { reactions, salvaged };
}

/** The reaction that a line states; null where the line is broken. What could be read of it goes into `salvaged`. */
export function bindEquation(
  binding: Binding,
  statement: Statement,
  name: string | null,
  salvaged: Set<string>,
): Reaction | null {
  const field = fieldOf(statement, "equation");
  if (field === null || isBroken(statement)) return null;
  const reading = readEquation(field.text, (name) => binding.declared.has(name));
  const origin = originOf(binding.uri, statement, "equation");
  if (reading.equation === null) {
    for (const fault of reading.faults) {
      const found = placed(fault, binding.uri, statement.offset + field.span.start);
      report(binding, withDeclaration(binding, found, String(fault.args["word"] ?? "")));
    }
    for (const key of reading.species) salvaged.add(key);
    return { ...nothing, name, text: field.text, origin };
  }
  useNames(binding, statement, field.span.start, reading.equation);
  const result = checkBalance(binding, statement, field.text, field.span.start, reading.equation);
  return {
    ...reactionOf(reading.equation, name, result, origin),
    fast: hasLine(statement.children, "fast"),
    enthalpy: quantityFact(binding.uri, statement.children, "enthalpy"),
  };
}

/** A reaction of which nothing is known. */
const nothing = {
  reactants: [],
  products: [],
  numbers: new Map(),
  states: new Map(),
  reversible: false,
  balance: "unchecked",
  whole: false,
  fast: false,
  enthalpy: null,
} as const;

function reactionOf(
  equation: Equation,
  name: string | null,
  result: Reaction["balance"],
  origin: Reaction["origin"],
): Reaction {
  const keys = (terms: Equation["left"]): string[] => [...new Set(terms.map(({ species }) => species))];
  return {
    name,
    text: equationText(equation),
    reactants: keys(equation.left),
    products: keys(equation.right),
    numbers: stoichiometricNumbers(equation),
    states: new Map(
      [...equation.left, ...equation.right].flatMap(({ species, state }) => (state === null ? [] : [[species, state]])),
    ),
    balance: result,
    reversible: equation.arrow === "<=>",
    whole: true,
    fast: false,
    enthalpy: null,
    origin,
  };
}

function useNames(binding: Binding, statement: Statement, at: number, equation: Equation): void {
  for (const { species, speciesSpan } of [...equation.left, ...equation.right]) {
    if (!binding.declared.has(species)) continue;
    const start = statement.offset + at + speciesSpan.start;
    const origin = { uri: binding.uri, start, end: statement.offset + at + speciesSpan.end };
    binding.uses.push({ kind: "species", name: species, run: null, declares: false, origin });
  }
}

/** Balances looked up before, by the equation's text and the formulas behind its names: they are not cheap. */
const balanced = new Map<string, Balance>();

function checkBalance(
  binding: Binding,
  statement: Statement,
  text: string,
  at: number,
  equation: Equation,
): Reaction["balance"] {
  const formulaOf = (key: string): Formula | null => binding.declared.get(key)?.formula ?? null;
  const names = [...equation.left, ...equation.right].map(({ species }) => formulaOf(species)?.text ?? "");
  const key = `${text} | ${names.join(" ")}`;
  const result = balanced.get(key) ?? balance(equation, formulaOf);
  if (balanced.size > 1_000) balanced.clear();
  balanced.set(key, result);
  if (result.kind === "unchecked") {
    const species = result.species.join(", ");
    report(binding, problem("balance-unchecked", { species }, originOf(binding.uri, statement, "equation")));
    return "unchecked";
  }
  const found = balanceFault(equation, result, text);
  if (found === null) return "balanced";
  const letter = oxygenForZero(text, (name) => binding.declared.has(name), formulaOf);
  reportIn(binding, statement, at, letter === null ? found : { ...found, mend: [letter, ...(found.mend ?? [])] });
  return "unbalanced";
}
