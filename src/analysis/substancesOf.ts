import type { Formula } from "../chemistry/formula.js";
import { type GasRow, gases } from "../chemistry/handbook/gases.js";
import { type SubstanceRow, substances } from "../chemistry/handbook/substances.js";
import { readFormula } from "../chemistry/readFormula.js";
import type { State } from "../chemistry/readSpecies.js";
import { isFault } from "../quantity/shifted.js";
import type { Reaction } from "../study/reaction.js";
import type { Run } from "../study/run.js";
import { anhydrous, ionsIn } from "./ionsIn.js";
import { formulasOf } from "./runFormulas.js";

/** A substance of a run with what the handbook has of it. */
export interface RunSubstance {
  /** how the study calls it */
  readonly key: string;
  /** null where it goes by a name only */
  readonly formula: Formula | null;
  readonly state: State | null;
  /** net stoichiometric number; null where it does not stand in the equation */
  readonly number: number | null;
  /** stands on the right of the equation */
  readonly product: boolean;
  readonly gas: GasRow | null;
  readonly reagent: SubstanceRow | null;
  /** reagents that hold the same ion, where it has no row of its own */
  readonly like: readonly SubstanceRow[];
  /** groups of the table of pairs */
  readonly groups: ReadonlySet<string>;
}

/**
 * What was taken, in order, then what stands in the equation, left to right, each once. An ion of the equation is left
 * out where a salt, acid or base of the run gives it: KI and I^- are one substance to warn of.
 *
 * A formula is known by its composition where that says which substance it is, else by a structural formula or a name
 * of the table: CH3COOC2H5 and EtOAc are ethyl acetate, C4H8O2 is nothing, for it is butanoic acid as well. A name
 * without a formula, declared elsewhere and only met in the equation, is known by the name alone.
 */
export function substancesOf(run: Run): RunSubstance[] {
  const { reaction } = run;
  const formulas = formulasOf(run);
  const inEquation = reaction === null ? [] : [...reaction.reactants, ...reaction.products];
  const keys = new Set([...run.taken.map(({ species }) => species.key), ...inEquation]);
  const all = [...keys].map((key) => known(key, formulas.get(key) ?? null, reaction));
  const given = new Set(all.flatMap(({ formula }) => (formula?.charge === 0 ? ionNames(formula) : [])));
  return all.filter(({ formula }) => formula === null || formula.charge === 0 || !covered(formula, given));
}

function known(key: string, formula: Formula | null, reaction: Reaction | null): RunSubstance {
  const gas = formula === null ? null : gasOf(formula);
  const reagent = reagentOf(key, formula);
  const ions = formula === null ? { rows: [], free: false } : ionsIn(formula);
  const names = new Set(ions.rows.map(({ like }) => like));
  const like = reagent === null && ions.free ? substances.filter(({ name }) => names.has(name)) : [];
  const groups = [reagent?.groups ?? [], gas?.groups ?? [], ...ions.rows.map((row) => row.groups)];
  return {
    key,
    formula,
    state: reaction?.states.get(key) ?? null,
    number: reaction?.numbers.get(key) ?? null,
    product: reaction?.products.includes(key) ?? false,
    gas,
    reagent,
    like,
    groups: new Set(groups.flat()),
  };
}

/** The ions a neutral species gives, as `body` and sign; oxonium counts as H. */
function ionNames(formula: Formula): string[] {
  const names = ionsIn(formula).rows.map(({ body, sign }) => `${body} ${sign}`);
  const acid = reagentOf("", formula)?.groups.includes("strong acid") === true;
  return acid ? [...names, "H +", "H3O +"] : names;
}

function covered(ion: Formula, given: ReadonlySet<string>): boolean {
  const { rows } = ionsIn(ion);
  return rows.length > 0 && rows.every(({ body, sign }) => given.has(`${body} ${sign}`));
}

function gasOf(formula: Formula): GasRow | null {
  if (formula.charge !== 0) return null;
  return gasByText.get(formula.text) ?? gasByComposition.get(composition(formula.parts)) ?? null;
}

function reagentOf(key: string, formula: Formula | null): SubstanceRow | null {
  if (formula === null) return reagentByName.get(spoken(key)) ?? null;
  const named = reagentByName.get(spoken(key)) ?? null;
  const parts = composition(formula.parts);
  if (named !== null && compositionOfText(named.formula) === parts && formula.charge === 0) return named;
  const written = reagentByText.get(formula.text) ?? reagentByText.get(anhydrous(formula.text));
  if (written !== undefined) return written;
  if (formula.charge !== 0) return null;
  return (
    reagentByComposition.get(parts) ?? reagentByComposition.get(compositionOfText(anhydrous(formula.text))) ?? null
  );
}

/** Elements in alphabetical order with their counts; "" for what holds nothing. */
function composition(parts: ReadonlyMap<string, number>): string {
  const sorted = [...parts].sort(([a], [b]) => (a < b ? -1 : 1));
  return sorted.map(([symbol, count]) => `${symbol}${count}`).join(" ");
}

function compositionOfText(text: string): string {
  const reading = readFormula(text);
  return isFault(reading) ? "" : composition(reading.formula.parts);
}

/** A name without the differences that do not matter: `Ethyl_acetate` and `ethyl acetate` are one. */
function spoken(name: string): string {
  return name.toLowerCase().replace(/[\s_-]+/g, " ");
}

const gasByText = new Map(gases.map((row) => [row.formula, row]));
/** Amines of several carbons share their composition with others; they are known by their text only. */
const gasByComposition = new Map(
  gases.filter(({ formula }) => !formula.includes("(")).map((row) => [compositionOfText(row.formula), row]),
);
const reagentByName = new Map(substances.flatMap((row) => row.known.map((name) => [spoken(name), row] as const)));
const reagentByText = new Map(substances.flatMap((row) => (row.written ?? []).map((text) => [text, row] as const)));
const reagentByComposition = new Map(
  substances.filter((row) => row.composition).map((row) => [compositionOfText(anhydrous(row.formula)), row] as const),
);
