import { type Fault, fault, replacement } from "../contract/problem.js";
import { plainText } from "../quantity/plainText.js";
import { isFault } from "../quantity/shifted.js";
import type { Formula } from "./formula.js";
import { readFormula } from "./readFormula.js";

export type State = "s" | "l" | "g" | "aq";

/** One species as written. */
export interface Species {
  /** what it is known by: the declared name, or the normal form of its formula; without the state */
  readonly key: string;
  /** null for a declared name */
  readonly formula: Formula | null;
  readonly state: State | null;
  /** where the species ends, without its state */
  readonly nameEnd: number;
  readonly end: number;
}

/**
 * The species at the start of `text`: a declared name, which wins over a formula, or a formula; then its state where
 * one follows. Refuses what is neither, and a state that is none.
 */
export function readSpecies(text: string, isDeclared: (name: string) => boolean = () => false): Species | Fault {
  const name = declaredName(text, isDeclared);
  const capital = name === null ? /^[A-Za-z0-9()[\]₀-₉]*?[A-Za-z0-9)\]₀-₉](\((?:L|G|AQ|Aq|aQ)\))/.exec(text) : null;
  if (capital !== null) return notAState(capital[1] ?? "", capital[0].length);
  const formula = name === null ? readFormula(text) : null;
  if (formula !== null && isFault(formula)) return formula;
  const nameEnd = name?.length ?? formula?.end ?? 0;
  const found = /^ ?\((s|l|g|aq)\)/.exec(plainText(text).slice(nameEnd));
  if (found === null) {
    const other = /^\([a-z]{1,10}\.?\)/.exec(text.slice(nameEnd))?.[0];
    if (other !== undefined) return notAState(other, nameEnd + other.length);
  }
  return {
    key: name ?? formula?.formula.text ?? "",
    formula: formula?.formula ?? null,
    state: (found?.[1] ?? null) as State | null,
    nameEnd,
    end: nameEnd + (found?.[0].length ?? 0),
  };
}

const meant: Readonly<Record<string, State>> = {
  solid: "s",
  cr: "s",
  sol: "s",
  liq: "l",
  liquid: "l",
  gas: "g",
  vap: "g",
  aqu: "aq",
  aqueous: "aq",
  sln: "aq",
};

/** The fault of `(liq)` or `(L)`, which ends at `end`, with the state that was meant where that is plain. */
function notAState(written: string, end: number): Fault {
  const span = { start: end - written.length, end };
  const state = written.slice(1, -1);
  const small = state.toLowerCase().replace(".", "");
  const plain = (["s", "l", "g", "aq"] as const).find((one) => one === small) ?? meant[small];
  const mends = plain === undefined ? [] : [replacement(span, `(${plain})`)];
  return fault("state-unknown", { state }, span, mends);
}

/** The longest declared name that `text` begins with and that ends at the end of a word. */
function declaredName(text: string, isDeclared: (name: string) => boolean): string | null {
  const run = /^\p{L}[\p{L}\p{N}_′'-]*/u.exec(text)?.[0] ?? "";
  for (let end = Math.min(run.length, 100); end > 0; end--) {
    const next = run.charAt(end);
    const whole = next === "" || next === "-";
    if (whole && !/^[\^⁺⁻]/.test(text.slice(end)) && isDeclared(run.slice(0, end))) return run.slice(0, end);
  }
  return null;
}
