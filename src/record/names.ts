/** Gives each line of a record words of its own: what would stand twice gets a number. */
export type Name = (item: string, words: string) => string;

export function createName(): Name {
  const given = new Map<string, number>();
  return (item, words) => {
    const what = `${itemWords(item)}: ${words}`;
    const times = (given.get(what) ?? 0) + 1;
    given.set(what, times);
    return times === 1 ? what : `${what} (${times})`;
  };
}

/** `run A/fit 1` as a sentence has it: run A, fit 1. */
export function itemWords(id: string): string {
  return id.replace("/", ", ");
}
