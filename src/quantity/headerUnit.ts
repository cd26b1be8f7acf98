import { readUnit } from "./readUnit.js";
import { isFault } from "./shifted.js";
import type { Unit } from "./unit.js";

/** The header of a column taken apart. */
export interface HeaderUnit {
  readonly name: string;
  /** the unit the header states; null where it states none that can be read */
  readonly unit: Unit | null;
  /** what stands where a unit should and is none */
  readonly unread: string | null;
}

/**
 * Name and unit of a column's header in the three styles `t / s`, `t (s)`, `t [s]`; the brackets inside a name, as
 * in `c(H2O2) / mol L^-1`, stay with the name. `V/mL` without spaces counts where what follows is a unit of two
 * letters or more, or `s`, `g`, `L`, `K` (`n/V` is a quotient).
 */
export function parseHeaderUnit(header: string): HeaderUnit {
  const text = header.trim();
  if (text.length > 300) return { name: text, unit: null, unread: null };
  const spaced = /^(.*?\S)(?:\s+\/\s*|\s*\/\s+)(\S.*)$/.exec(text);
  if (spaced !== null) return stated(spaced[1] ?? "", inBrackets(spaced[2] ?? ""));
  const bracketed = /^(.*?\S)\s*(\((?:[^()]|\([^()]*\))*\)|\[[^[\]]*\])$/.exec(text);
  if (bracketed !== null) {
    const tail = bracketed[2] ?? "";
    const answer = stated(bracketed[1] ?? "", tail.slice(1, -1));
    const partOfName = answer.unit === null && !/\s\(|\s?\[/.test(text.slice(answer.name.length));
    return partOfName ? { name: text, unit: null, unread: null } : answer;
  }
  const close = /^([^/\s]+)\/([^/\s]{2,}|[sgLlK])$/.exec(text);
  if (close !== null) {
    const answer = stated(close[1] ?? "", close[2] ?? "");
    if (answer.unit !== null) return answer;
  }
  return { name: text, unit: null, unread: null };
}

function stated(name: string, tail: string): HeaderUnit {
  const answer = readUnit(tail.trim());
  if (isFault(answer)) return { name: name.trim(), unit: null, unread: tail.trim() };
  return { name: name.trim(), unit: answer.unit, unread: null };
}

/** `t / (s)` is `t / s`; `(mol/L)` loses its brackets, `(a)(b)` does not. */
function inBrackets(tail: string): string {
  return /^\([^()]*\)$/.test(tail) ? tail.slice(1, -1) : tail;
}
