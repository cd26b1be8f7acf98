import { exp } from "../numerics/elementary.js";
import { seededRandom } from "../numerics/random.js";

/** The data files of the samples by their path in samples/: first-order decays with scatter, invented from fixed seeds. */
export function sampleData(): ReadonlyMap<string, string> {
  return new Map([
    ["data/peroxide-a.csv", peroxide(101, 1.24e-3)],
    ["data/peroxide-b.csv", peroxide(102, 6.2e-4)],
    ["data/ester.csv", ester(103)],
    ["data/planted.csv", planted(104)],
    ["data/gas.csv", gas(105)],
    ["data/dye.csv", dye(106, 14 * 3600 + 2 * 60 + 20, 0.196, 12)],
    ["data/dye-b.csv", dye(107, 15 * 3600 + 20 * 60 + 50, 0.098, null)],
  ]);
}

const mark = "# invented figures, made by src/build/samples.mjs";

/** Titrated peroxide, mol/L against s; `rate` is k′ in s⁻¹. */
function peroxide(seed: number, rate: number): string {
  const random = seededRandom(seed);
  const rows = Array.from({ length: 36 }, (_, i) => {
    const t = i <= 12 ? 25 * i : 300 + 120 * (i - 12);
    const c = 0.1 * exp(-rate * t) + 0.0004 * random.normal();
    return `${t},${c.toFixed(4)}`;
  });
  return lines([mark, "time / s,c(H2O2) / mol L^-1", ...rows]);
}

/** Ester left, mmol/L against min, as a program with a decimal comma writes it. */
function ester(seed: number): string {
  const random = seededRandom(seed);
  const rows = Array.from({ length: 41 }, (_, i) => {
    const c = 44 * exp(-0.0583 * i) + 0.25 * random.normal();
    return `${i};${c.toFixed(2).replace(".", ",")}`;
  });
  return lines([mark, "t / min;c(ester) / mmol/L", ...rows]);
}

/** Peroxide with an empty cell and a word among the readings. */
function planted(seed: number): string {
  const random = seededRandom(seed);
  const rows = Array.from({ length: 21 }, (_, i) => {
    const t = 120 * i;
    const c = (0.05 * exp(-9e-4 * t) + 0.0003 * random.normal()).toFixed(4);
    return `${t},${i === 6 ? "" : i === 11 ? "spilt" : c}`;
  });
  return lines([mark, "time / s,c(H2O2) / mol L^-1", ...rows]);
}

/** Oxygen in a burette, mL against s, as an instrument with a preamble writes it; a bubble hangs in the tube for a while. */
function gas(seed: number): string {
  const random = seededRandom(seed);
  const rows = Array.from({ length: 61 }, (_, i) => {
    const t = i <= 20 ? 15 * i : 300 + 45 * (i - 20);
    const hung = t >= 45 && t <= 60 ? -1.8 : 0;
    const volume = 1.2 + 62.4 * (1 - exp(-2.5e-3 * t)) + hung + 0.2 * random.normal();
    return `${t}\t${volume.toFixed(1)}`;
  });
  return lines([mark, "gas burette 2", "", "time / s\tV / mL", ...rows]);
}

/** Dye, µmol/L, with the clock: first reading `first` s after midnight, twenty seconds after mixing; `rate` is k′ in min⁻¹. */
function dye(seed: number, first: number, rate: number, stray: number | null): string {
  const random = seededRandom(seed);
  const rows = Array.from({ length: 46 }, (_, i) => {
    const minutes = (20 + 40 * i) / 60;
    const c = 0.35 + 19.65 * exp(-rate * minutes) + 0.06 * random.normal() + (i === stray ? 3.1 : 0);
    return `${clock(first + 40 * i)},${c.toFixed(2)}`;
  });
  return lines([mark, "photometer 1", "time,c(dye) / µmol/L", ...rows]);
}

function clock(seconds: number): string {
  const two = (n: number): string => String(Math.floor(n) % 60).padStart(2, "0");
  return `${two(seconds / 3600)}:${two(seconds / 60)}:${two(seconds)}`;
}

function lines(all: readonly string[]): string {
  return `${all.join("\n")}\n`;
}
