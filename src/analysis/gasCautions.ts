import type { GasRow } from "../chemistry/handbook/gases.js";
import type { Run as RunFinding } from "../contract/findings.js";
import { formatNumber } from "../quantity/formatNumber.js";
import type { Run } from "../study/run.js";
import { isUnbalanced } from "./runFormulas.js";
import type { Stoichiometry } from "./stoichiometry.js";
import type { RunSubstance } from "./substancesOf.js";

type Caution = RunFinding["cautions"][number];

/** Volume of a mole of ideal gas at 298.15 K and 101.325 kPa, m³/mol: RT/p with the exact R of the SI (CODATA 2018). */
const molarVolume = (8.31446261815324 * 298.15) / 101_325;

/** Whether a species is there as a gas: (g) is written, or no state is and the table has it as one that comes off. */
export function isGas({ state, gas }: RunSubstance): boolean {
  return state === "g" || (state === null && gas?.unmarked === true);
}

/**
 * `gas-given-off` for each product that comes off as a gas: how much at most, mol, by ν·ξ·V with the greatest extent ξ,
 * mol m⁻³, and the volume V of the run, m³; and its volume as an ideal gas. What cannot be computed is said to be so.
 */
export function givenOff(run: Run, amounts: Stoichiometry, all: readonly RunSubstance[]): Caution[] {
  const gaseous = all.filter(isGas);
  // A reactant without a state may be dissolved: it takes no gas away.
  const counted = gaseous.filter(({ product, state }) => product || state === "g");
  const net = counted.reduce((sum, { number }) => sum + (number ?? 0), 0);
  return gaseous
    .filter(({ product, number }) => product && number !== null && number > 0)
    .map(({ key, number }) => {
      const text = `${key} comes off as a gas. ${howMuch(run, amounts, number ?? 0)} ${pressure(net)}`;
      return { code: "gas-given-off", text, species: [key] };
    });
}

function howMuch(run: Run, { greatestExtent, missing }: Stoichiometry, number: number): string {
  if (isUnbalanced(run)) return "How much cannot be said: the equation does not balance.";
  if (greatestExtent === null) {
    const unknown =
      missing.length > 0 ? `the amount of ${missing.join(", ")} is not known` : "what was taken does not tell";
    const why = run.volume === null ? "no volume is stated" : unknown;
    return `How much cannot be said: ${why}.`;
  }
  const each = number * greatestExtent.value;
  const volume = run.volume?.value.value ?? null;
  const amount = volume === null ? each / 1000 : each * volume;
  if (!(amount > 0) || !Number.isFinite(amount)) return "How much cannot be said from what was taken.";
  const of = volume === null ? " for each litre of the mixture (no volume is stated)" : "";
  const room = inUnits(amount * molarVolume, [
    [1, "m³"],
    [1e-3, "L"],
    [1e-6, "mL"],
  ]);
  const moles = inUnits(amount, [
    [1, "mol"],
    [1e-3, "mmol"],
    [1e-6, "µmol"],
  ]);
  return `At most ${moles}${of}, as an ideal gas about ${room} at 25 °C and 101.325 kPa.`;
}

/** Three digits in the greatest unit that the value reaches, else in the smallest. */
function inUnits(value: number, units: readonly (readonly [size: number, name: string])[]): string {
  const [size, name] = units.find(([least]) => value >= least) ?? units.at(-1) ?? [1, ""];
  return `${formatNumber(Number((value / size).toPrecision(3)), null)} ${name}`;
}

function pressure(net: number): string {
  if (net > 0) return "A closed vessel builds up pressure; how high depends on its head space, which is not stated.";
  return "At least as much gas is used up, so the gas by itself does not raise the pressure of a closed vessel; heat can.";
}

const properties = { toxic: "toxic", flammable: "flammable", oxidising: "feeds fire", corrosive: "corrosive" } as const;
const densities = { heavier: "heavier than air", lighter: "lighter than air", same: "about as heavy as air" } as const;

/**
 * One caution for each dangerous gas of the run, under the gravest of `toxic-gas`, `flammable-gas`, `oxidising-gas`,
 * `asphyxiant-gas`. A toxic gas that is dissolved and has no row as a reagent counts too: it can leave the solution.
 */
export function gasDangers(all: readonly RunSubstance[]): Caution[] {
  return all.flatMap((substance): Caution[] => {
    const { key, gas, reagent } = substance;
    if (gas === null) return [];
    const there = isGas(substance);
    if (!there && (reagent !== null || !gas.flags.includes("toxic"))) return [];
    const code = codeOf(gas);
    const dissolved = there ? "" : " Dissolved, it can leave the solution.";
    return code === null ? [] : [{ code, text: `${describe(key, gas)}.${dissolved}`, species: [key] }];
  });
}

function codeOf({ flags, asphyxiant }: GasRow): string | null {
  if (flags.includes("toxic") || asphyxiant === "chemical") return "toxic-gas";
  if (flags.includes("flammable")) return "flammable-gas";
  if (flags.includes("oxidising")) return "oxidising-gas";
  return asphyxiant === "simple" ? "asphyxiant-gas" : null;
}

function describe(key: string, { name, flags, asphyxiant, thanAir, burns, note }: GasRow): string {
  const words: string[] = flags.map((flag) => (flag === "unstable" ? "may explode by itself" : properties[flag]));
  if (asphyxiant === "simple") words.push("displaces the oxygen of the air");
  if (asphyxiant === "chemical") words.push("stops the use of oxygen in the body");
  const parts = [words.join(", "), densities[thanAir]];
  if (burns !== undefined) parts.push(`burns in air from about ${percent(burns[0])} to ${percent(burns[1])} by volume`);
  if (note !== undefined) parts.push(note);
  return `${key} (${name}): ${parts.join("; ")}`;
}

function percent(share: number): string {
  return `${formatNumber(Number((share * 100).toPrecision(3)), null)} %`;
}
