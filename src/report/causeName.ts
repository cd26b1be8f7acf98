/** A cause of uncertainty with its kind, unless its name says it: "scale of c (common)". */
export function causeName(source: string, kind: "common" | "random"): string {
  return source.includes(kind) ? source : `${source} (${kind})`;
}
