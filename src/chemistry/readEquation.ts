import { type Fault, fault, replacement, type Span } from "../contract/problem.js";
import { plainText } from "../quantity/plainText.js";
import { isFault, shifted } from "../quantity/shifted.js";
import { type FoundArrow, findArrows } from "./arrow.js";
import { readCoefficient } from "./coefficient.js";
import type { Equation, Term } from "./equation.js";
import { readSpecies } from "./readSpecies.js";

/** What could be read of an equation: all of it, or the species that were recognised and the one fault. */
export interface ReadEquation {
  readonly equation: Equation | null;
  /** keys of all species recognised, also where the equation is broken */
  readonly species: readonly string[];
  /** none, or the first one: what follows a fault is not judged */
  readonly faults: readonly Fault[];
}

/**
 * The equation that the whole of `text` writes: `Side Arrow Side`, terms joined by `+` with or without spaces, whole
 * or fractional coefficients, ions next to plus signs. `isDeclared` names win over formulas. Never throws; spans count
 * from the start of `text`.
 */
export function readEquation(text: string, isDeclared: (name: string) => boolean = () => false): ReadEquation {
  const plain = plainText(text);
  const arrows = findArrows(plain);
  const [arrow] = arrows;
  const end = plain.trimEnd().length;
  const span = { start: Math.min(text.length - plain.trimStart().length, end), end };
  const left = readSide(text, plain, { start: 0, end: arrow?.span.start ?? text.length }, isDeclared);
  const right =
    arrow === undefined
      ? null
      : readSide(text, plain, { start: arrow.span.end, end: arrows[1]?.span.start ?? text.length }, isDeclared);
  const terms = [...left.terms, ...(right?.terms ?? [])];
  const species = [...new Set(terms.map((term) => term.species))];
  const aboutArrow = arrowFaults(arrows, left, right, span);
  // Without an arrow everything is the left side: then only the arrow is worth a word.
  const first = arrow === undefined ? aboutArrow : [...left.faults, ...aboutArrow, ...(right?.faults ?? [])];
  const faults = first.slice(0, 1);
  if (faults.length > 0 || arrow === undefined || right === null || arrow.meant === null)
    return { equation: null, species, faults };
  const equation: Equation = { left: left.terms, right: right.terms, arrow: arrow.meant, arrowSpan: arrow.span, span };
  return { equation, species, faults };
}

interface Side {
  readonly terms: Term[];
  readonly faults: Fault[];
}

function arrowFaults(arrows: readonly FoundArrow[], left: Side, right: Side | null, span: Span): Fault[] {
  const [arrow, second] = arrows;
  if (arrow === undefined) return [fault("equation-no-arrow", {}, span)];
  if (second !== undefined) return [fault("equation-two-arrows", {}, second.span)];
  if (arrow.fault !== null) return [arrow.fault];
  const empty = (side: Side | null): boolean => side?.terms.length === 0 && side.faults.length === 0;
  const example = "2 H2O2 -> 2 H2O + O2";
  if (empty(left)) return [fault("equation-side", { side: "left", example }, arrow.span)];
  return empty(right) ? [fault("equation-side", { side: "right", example }, arrow.span)] : [];
}

/** Terms of one side; after a fault reading goes on behind the next plus that stands free, to know the species. */
function readSide(text: string, plain: string, side: Span, isDeclared: (name: string) => boolean): Side {
  const terms: Term[] = [];
  const faults: Fault[] = [];
  let at = pastSpaces(plain, side.start, side.end);
  if (at >= side.end) return { terms, faults };
  for (;;) {
    const term = readTerm(text, plain, at, side.end, isDeclared);
    let next: number;
    if (isFault(term)) {
      faults.push(term);
      next = plain.charAt(at) === "+" ? at : afterFault(plain, Math.max(at, term.span.end), side.end);
    } else {
      terms.push(term);
      next = pastSpaces(plain, term.span.end, side.end);
      if (next < side.end && plain.charAt(next) !== "+") {
        faults.push(missingPlus(plain, term.span.end, next, side.end));
        if (!/^[A-Za-z0-9[(]/.test(plain.slice(next))) next = afterFault(plain, next, side.end);
        else if (next === term.span.end) next = afterFault(plain, next, side.end);
        else next -= 1;
      }
    }
    if (next >= side.end) return { terms, faults };
    const plus = next;
    at = pastSpaces(plain, next + 1, side.end);
    if (at >= side.end) {
      faults.push(fault("equation-term", {}, { start: plus, end: plus + 1 }));
      return { terms, faults };
    }
  }
}

function readTerm(
  text: string,
  plain: string,
  at: number,
  end: number,
  isDeclared: (name: string) => boolean,
): Term | Fault {
  if (plain.charAt(at) === "+") return fault("equation-term", {}, { start: at, end: at + 1 });
  const coefficient = readCoefficient(plain.slice(at, end));
  if (isFault(coefficient)) return shifted(coefficient, at);
  const start = at + coefficient.end;
  const species = readSpecies(text.slice(start, end), isDeclared);
  if (isFault(species)) return shifted(species, start);
  return {
    coefficient: coefficient.coefficient,
    species: species.key,
    formula: species.formula,
    state: species.state,
    span: { start: at, end: start + species.end },
    speciesSpan: { start, end: start + species.nameEnd },
  };
}

function missingPlus(plain: string, from: number, at: number, end: number): Fault {
  const word = /^\S+/.exec(plain.slice(at, end))?.[0] ?? "";
  const span = { start: at, end: at + word.length };
  const joins = at > from && /^[A-Z0-9[]/.test(word);
  return fault("equation-plus", { text: word }, span, joins ? [replacement(span, `+ ${word}`)] : []);
}

/** Where reading goes on behind a fault: at a plus with space before it, or one right before a new word. */
function afterFault(plain: string, from: number, end: number): number {
  const found = /\s\+(?!\s*\+)|\+(?=[A-Z[])/.exec(plain.slice(from, end));
  if (found === null) return end;
  return from + found.index + found[0].indexOf("+");
}

function pastSpaces(text: string, from: number, end: number): number {
  let at = from;
  while (at < end && /\s/.test(text.charAt(at))) at += 1;
  return at;
}
