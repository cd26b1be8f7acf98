/** How far a reaction can go in either direction from what was taken. */
export interface ExtentBounds {
  /** mol; not positive; null where no product is consumed by going back */
  readonly least: number | null;
  /** mol; not negative; null where nothing is consumed */
  readonly greatest: number | null;
  /** the species that run out first going forward; several where they run out together */
  readonly limiting: readonly string[];
}

/**
 * Bounds of the extent of reaction ξ, mol, from n = n₀ + νξ ≥ 0 for every species. `numbers` are net stoichiometric
 * numbers (products positive), `amounts` in mol; a species that is not named there counts as absent.
 */
export function extentBounds(numbers: ReadonlyMap<string, number>, amounts: ReadonlyMap<string, number>): ExtentBounds {
  const limits = [...numbers].map(([species, number]) => ({
    species,
    number,
    at: (amounts.get(species) ?? 0) / Math.abs(number),
  }));
  const forward = limits.filter(({ number }) => number < 0);
  const back = limits.filter(({ number }) => number > 0);
  const smallest = (entries: typeof limits): number | null =>
    entries.length === 0 ? null : Math.max(0, Math.min(...entries.map(({ at }) => at)));
  const greatest = smallest(forward);
  const least = smallest(back);
  const limiting = forward
    .filter(({ at }) => greatest !== null && at <= greatest * (1 + 1e-12))
    .map(({ species }) => species);
  return { least: least === null ? null : 0 - least, greatest, limiting };
}
