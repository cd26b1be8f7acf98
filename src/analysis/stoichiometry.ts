import { ionsOf } from "../chemistry/handbook/dissociation.js";
import { stockConcentration } from "../chemistry/stock.js";
import { molarMassOf } from "../monitor/molarMassOf.js";
import { isKind } from "../quantity/kinds.js";
import { combined, type Quantity } from "../quantity/quantity.js";
import { isFault } from "../quantity/shifted.js";
import type { Run, Taken } from "../study/run.js";
import { rootOfSquares } from "./parameter.js";

/** A number with the named common causes it is uncertain by, all SI. */
export interface Uncertain {
  readonly value: number;
  /** shift of the value when the cause is off by one standard uncertainty */
  readonly causes: ReadonlyMap<string, number>;
}

export const exact = (value: number): Uncertain => ({ value, causes: new Map() });

/** a + factor · b, causes of one name taken together. */
export function plusTimes(a: Uncertain, factor: number, b: Uncertain): Uncertain {
  const causes = new Map(a.causes);
  for (const [name, shift] of b.causes) causes.set(name, (causes.get(name) ?? 0) + factor * shift);
  return { value: a.value + factor * b.value, causes };
}

/** Standard uncertainty of independent causes; null where there is none. */
export function standardUncertainty({ causes }: Uncertain): number | null {
  return causes.size === 0 ? null : rootOfSquares(causes.values());
}

/** Concentration in the mixture of what a `taken` line states, mol m⁻³; null where the volume or the formula lacks. */
export function takenConcentration(run: Run, taken: Taken): Uncertain | null {
  const { given, species } = taken;
  if (isKind(given.unit, "concentration")) return stated(taken, given);
  if (isKind(given.unit, "massConcentration")) {
    const molar = molarMassOf(species);
    return molar === null ? null : quotient(stated(taken, given), named(`molar mass of ${species.key}`, molar));
  }
  // A share of the mixture itself.
  if (isKind(given.unit, "number")) return stockOf(taken);
  if (run.volume === null) return null;
  const amount = amountTaken(taken);
  return amount === null ? null : quotient(amount, named("volume", run.volume.value));
}

/** Amount that a `taken` line states: itself, of a mass by purity and molar mass, of a volume by the stock; mol. */
function amountTaken(taken: Taken): Uncertain | null {
  const { given, species, purity } = taken;
  if (isKind(given.unit, "amount")) return stated(taken, given);
  if (isKind(given.unit, "volume")) {
    const stock = stockOf(taken);
    return stock === null ? null : product(stated(taken, given), stock);
  }
  const molar = molarMassOf(species);
  if (molar === null) return null;
  const mass = quotient(stated(taken, given), named(`molar mass of ${species.key}`, molar));
  return purity === null ? mass : product(mass, named(`purity of ${species.key}`, purity));
}

/** Concentration of the stock a volume was taken of; null where it does not follow, which its line has been told. */
function stockOf({ species, stock, density }: Taken): Uncertain | null {
  if (stock === null) return null;
  const facts = {
    species: species.key,
    molarMass: molarMassOf(species),
    density,
    pureDensity: stock.kind === "share" && stock.basis === "volume" ? density : null,
    solventMolarMass: null,
  };
  const found = stockConcentration(stock, facts, { start: 0, end: 0 });
  return isFault(found) ? null : named(`stock of ${species.key}`, found);
}

function stated({ species }: Taken, given: Quantity): Uncertain {
  return named(`${species.key} taken`, given);
}

/** A quantity as one cause. */
export function named(name: string, { value, sources }: Quantity): Uncertain {
  const u = combined(sources);
  return { value, causes: u === null || u === 0 ? new Map() : new Map([[name, u]]) };
}

/** a · b, to first order (JCGM 100:2008, 5.1.2). */
function product(a: Uncertain, b: Uncertain): Uncertain {
  const scaledA = plusTimes(exact(0), b.value, a);
  const withB = plusTimes(scaledA, a.value, { value: 0, causes: b.causes });
  return { value: a.value * b.value, causes: withB.causes };
}

/** a / b, to first order; b is not 0. */
function quotient(a: Uncertain, b: Uncertain): Uncertain {
  const inverse = plusTimes(exact(0), -1 / (b.value * b.value), { value: 0, causes: b.causes });
  return product(a, { value: 1 / b.value, causes: inverse.causes });
}

/** What was taken against the equation of a run: who runs out first, and how far the reaction can go. */
export interface Stoichiometry {
  /** concentration at the beginning by species, mol m⁻³; what was not taken stands at 0 once anything was */
  readonly initial: ReadonlyMap<string, Uncertain>;
  /** the reactant that runs out first; null where that cannot be told */
  readonly limiting: string | null;
  /** greatest extent, mol m⁻³; null where it cannot be told */
  readonly greatestExtent: Uncertain | null;
  /** reactants of which nothing is stated */
  readonly missing: readonly string[];
}

/** The stoichiometry of a run. A reaction of one reactant has it limiting even where nothing is stated of it. */
export function stoichiometry(run: Run): Stoichiometry {
  const initial = new Map<string, Uncertain>();
  const { reaction } = run;
  if (reaction === null || !reaction.whole) return { initial, limiting: null, greatestExtent: null, missing: [] };
  for (const taken of run.taken) {
    const concentration = takenConcentration(run, taken);
    if (concentration === null) continue;
    initial.set(taken.species.key, concentration);
    // A salt, strong acid or strong base counts as its ions, where the equation names those and not itself.
    const { key, formula } = taken.species;
    if (reaction.numbers.has(key)) continue;
    for (const ion of taken.ions?.map((stated) => ({ key: stated.key, count: 1 })) ??
      ionsOf(formula?.text ?? "") ??
      []) {
      initial.set(ion.key, plusTimes(initial.get(ion.key) ?? exact(0), ion.count, concentration));
    }
  }
  const reactants = [...reaction.numbers].filter(([, number]) => number < 0);
  const missing = reactants.map(([key]) => key).filter((key) => !initial.has(key));
  const [only] = reactants;
  if (missing.length > 0) {
    const limiting = reactants.length === 1 && only !== undefined ? only[0] : null;
    return { initial, limiting, greatestExtent: null, missing };
  }
  let limiting: string | null = null;
  let greatestExtent: Uncertain | null = null;
  for (const [key, number] of reactants) {
    const extent = plusTimes(exact(0), -1 / number, initial.get(key) ?? exact(0));
    if (greatestExtent === null || extent.value < greatestExtent.value) {
      greatestExtent = extent;
      limiting = key;
    }
  }
  for (const key of reaction.numbers.keys()) if (!initial.has(key)) initial.set(key, exact(0));
  return { initial, limiting, greatestExtent, missing };
}
