/** First words of lines as a list in a sentence; a long list is cut. */
export function describeHeads(heads: readonly string[]): string {
  const shown = heads.slice(0, 8);
  if (heads.length > shown.length) return `${shown.join(", ")} …`;
  const last = shown.pop() ?? "";
  return shown.length === 0 ? last : `${shown.join(", ")} or ${last}`;
}
