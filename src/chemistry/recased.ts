import { commonElements } from "./element.js";

/**
 * The ways to read a word, whose capitals are wrong, as a formula of common elements: `nacl` gives NaCl, `co2` both
 * Co2 and CO2, `KCL` KCl. None where there is no way, or more than two, so that names of substances are left alone.
 */
export function recased(word: string): string[] {
  if (word.length > 16) return [];
  const found: string[] = [];
  split(word, 0, "", found);
  return found.length > 2 ? [] : found.filter((text) => text !== word);
}

function split(word: string, at: number, before: string, found: string[]): void {
  if (found.length > 2) return;
  if (at === word.length) {
    found.push(before);
    return;
  }
  const sign = word.charAt(at);
  if (!/[A-Za-z]/.test(sign)) {
    split(word, at + 1, before + sign, found);
    return;
  }
  for (const size of [2, 1]) {
    const letters = word.slice(at, at + size);
    const symbol = letters.charAt(0).toUpperCase() + letters.slice(1).toLowerCase();
    if (letters.length === size && commonElements.includes(symbol)) split(word, at + size, before + symbol, found);
  }
}
