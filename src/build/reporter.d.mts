/** What came of one layer of tests. */
export interface Tally {
  layer: string;
  passed: number;
  failed: number;
  failures: { title: string; words: string }[];
}

/** Listens to a mocha run and keeps its tally; failed hooks and pending tests count as failures. */
export function tallyOf(runner: Mocha.Runner, layer: string): Tally;

/** Prints the failures in full and a line of the layer's counts. */
export function printTally(tally: Tally, say: (line: string) => void): void;

/** Writes a tally where the runner of all layers reads it. */
export function writeTally(tally: Tally, file: string): void;
