import type { Origin } from "../../contract/problem.js";
import type { Bound } from "../bind/bind.js";
import type { NameUse } from "../bind/binding.js";
import type { NameKind } from "../shape.js";
import { speciesMentions } from "./speciesMentions.js";

/** A place of a name. */
export interface Occurrence {
  readonly origin: Origin;
  readonly declares: boolean;
}

/** A name that stands at a place of the text, with all places of the same thing in this description. */
export interface FoundName {
  readonly kind: NameKind;
  readonly name: string;
  /** where it stands */
  readonly origin: Origin;
  /** in the order of the text, each once */
  readonly occurrences: readonly Occurrence[];
  /** a formula says itself what it is: nothing declares it, and it has no other name */
  readonly formula: boolean;
  /** runs whose column it is; none for names of the file */
  readonly runs: readonly string[];
}

/** The name at an offset, its end included; null where none stands. */
export function nameAt(bound: Bound, offset: number): FoundName | null {
  return declaredNameAt(bound, offset) ?? speciesAt(bound, offset);
}

function holds({ start, end }: Origin, offset: number): boolean {
  return start <= offset && offset <= end;
}

function declaredNameAt({ uses }: Bound, offset: number): FoundName | null {
  const here = uses.find(({ kind, name, origin }) => kind !== "species" && name !== "" && holds(origin, offset));
  if (here === undefined) return null;
  const together = sameThing(uses, here);
  const { kind, name, origin } = here;
  const runs = [...new Set(together.flatMap(({ run }) => run ?? []))];
  return { kind, name, origin, occurrences: occurrencesOf(together), formula: false, runs };
}

function speciesAt(bound: Bound, offset: number): FoundName | null {
  const mentions = speciesMentions(bound);
  const here = mentions.find(({ origin }) => holds(origin, offset));
  if (here === undefined) return null;
  const all = mentions.filter(({ key }) => key === here.key);
  const { key: name, origin } = here;
  const formula = !bound.study.species.some(({ key }) => key === name);
  return { kind: "species", name, origin, occurrences: occurrencesOf(all), formula, runs: [] };
}

/**
 * All uses of the same name. A column belongs to its run; runs that share one of its lines (by `like`, or because it
 * stands above the first run) share the column.
 */
function sameThing(uses: readonly NameUse[], one: NameUse): NameUse[] {
  const alike = uses.filter(({ kind, name }) => kind === one.kind && name === one.name);
  if (one.kind !== "column") return alike;
  const runs = new Set([one.run]);
  const starts = new Set<number>();
  for (let before = -1; before < runs.size + starts.size; ) {
    before = runs.size + starts.size;
    for (const { run, origin } of alike) {
      if (runs.has(run)) starts.add(origin.start);
      else if (starts.has(origin.start)) runs.add(run);
    }
  }
  return alike.filter(({ run }) => runs.has(run));
}

function occurrencesOf(all: readonly Occurrence[]): Occurrence[] {
  const found = new Map<number, Occurrence>();
  for (const { origin, declares } of all) {
    if (!found.has(origin.start)) found.set(origin.start, { origin, declares });
  }
  return [...found.values()].sort((a, b) => a.origin.start - b.origin.start);
}

/** Where a name is declared; of a formula where the reaction has it, else where it stands first. */
export function definitionsOf(bound: Bound, found: FoundName): readonly Origin[] {
  const declared = found.occurrences.filter(({ declares }) => declares).map(({ origin }) => origin);
  if (declared.length > 0 || found.kind !== "species") return declared;
  const mentions = speciesMentions(bound).filter(({ key }) => key === found.name);
  const first = mentions.find(({ inReaction }) => inReaction) ?? mentions[0];
  return first === undefined ? [] : [first.origin];
}
