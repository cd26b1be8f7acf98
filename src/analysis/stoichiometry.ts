import { ionsOf } from "../chemistry/handbook/dissociation.js";
import { molarMassOf } from "../monitor/molarMassOf.js";
import { isKind } from "../quantity/kinds.js";
import { combined } from "../quantity/quantity.js";
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
  const name = `${species.key} taken`;
  const stated = combined(given.sources);
  const own: Uncertain = { value: given.value, causes: stated === null ? new Map() : new Map([[name, stated]]) };
  if (isKind(given.unit, "concentration")) return own;
  if (run.volume === null) return null;
  const amount = isKind(given.unit, "amount") ? own : amountOfMass(own, taken);
  if (amount === null) return null;
  const volume = run.volume.value;
  const uVolume = combined(volume.sources);
  const value = amount.value / volume.value;
  const causes = new Map([...amount.causes].map(([cause, shift]) => [cause, shift / volume.value] as const));
  if (uVolume !== null) causes.set("volume", (-value * uVolume) / volume.value);
  return { value, causes };
}

function amountOfMass(mass: Uncertain, { species }: Taken): Uncertain | null {
  const molar = molarMassOf(species);
  if (molar === null) return null;
  const value = mass.value / molar.value;
  const causes = new Map([...mass.causes].map(([cause, shift]) => [cause, shift / molar.value] as const));
  const u = combined(molar.sources);
  if (u !== null) causes.set(`molar mass of ${species.key}`, (-value * u) / molar.value);
  return { value, causes };
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
    const ions = formula === null || reaction.numbers.has(key) ? null : ionsOf(formula.text);
    for (const ion of ions ?? []) {
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
