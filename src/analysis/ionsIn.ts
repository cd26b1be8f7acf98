import type { Formula } from "../chemistry/formula.js";
import { ionsOf } from "../chemistry/handbook/dissociation.js";
import { type IonGroupRow, ionGroups } from "../chemistry/handbook/ionGroups.js";
import { anions, cations, otherIons } from "../chemistry/handbook/ions.js";

/** The ions of a species that the table of ion groups has, and whether they are free in water. */
export interface IonsIn {
  readonly rows: readonly IonGroupRow[];
  /** the species is an ion itself, or a salt that dissolves; an acid is none of these */
  readonly free: boolean;
}

const none: IonsIn = { rows: [], free: false };

/** Longer formulas first, so that NaHCO3 is a hydrogencarbonate and not a carbonate. */
const byLength = (a: string, b: string): number => b.length - a.length || (a < b ? -1 : 1);
const negative = bodies([...anions, ...otherIons].filter(({ charge }) => charge < 0));
/** Complex cyanides are written with or without square brackets. */
const anionEndings = [...new Set(["[Fe(CN)6]", "Fe(CN)6", "S2O5", "S2O4", ...negative])].sort(byLength);
const positive = bodies([...cations, ...otherIons].filter(({ charge }) => charge > 0));
const cationRun = new RegExp(`^(?:\\(?(?:${positive.join("|")})\\)?\\d*)+$`);
const oneCation = new RegExp(positive.join("|"), "g");
const alkaliOnly = /^(?:\(?(?:Li|Na|K|Rb|Cs|NH4)\)?\d*)+$/;

function bodies(rows: readonly { readonly body: string }[]): string[] {
  return [...new Set(rows.map(({ body }) => body))].sort(byLength);
}

/** Formula without its water of crystallisation: `CuSO4.5H2O` to `CuSO4`. */
export function anhydrous(text: string): string {
  return text.replace(/\.\d*H2O$/, "");
}

/**
 * The ions that a formula, by its normal text, is or holds. An acid counts only where it is a strong one, and a hydroxide
 * where it is a strong base: HCN is no cyanide to warn of twice, Mg(OH)2 no strong alkali.
 */
export function ionsIn(formula: Formula): IonsIn {
  const [body = "", charge] = formula.text.split("^");
  if (charge !== undefined) return { rows: rowsOf(body, charge.endsWith("+") ? "+" : "-"), free: true };
  const text = anhydrous(formula.text);
  for (const ending of anionEndings) {
    const before = cationsBefore(text, ending);
    if (before === null || !cationRun.test(before)) continue;
    const found: readonly string[] = before.match(oneCation) ?? [];
    const dissociates = ionsOf(text) !== null;
    const acid = found.includes("H");
    if ((acid || ending === "OH") && !dissociates) return none;
    const anion = ending === "Fe(CN)6" ? "[Fe(CN)6]" : ending;
    const rows = [...found.flatMap((cation) => rowsOf(cation, "+")), ...rowsOf(anion, "-")];
    return { rows, free: !acid && (dissociates || alkaliOnly.test(before)) };
  }
  return none;
}

function cationsBefore(text: string, ending: string): string | null {
  if (text.endsWith(ending)) return text.slice(0, -ending.length);
  const several = /\)\d+$/.exec(text);
  const open = several === null ? -1 : several.index - ending.length - 1;
  return open > 0 && text.slice(open, several?.index) === `(${ending}` ? text.slice(0, open) : null;
}

function rowsOf(body: string, sign: "+" | "-"): IonGroupRow[] {
  return ionGroups.filter((row) => row.body === body && row.sign === sign);
}
