// Counts and prints what mocha runs: one word per suite while it goes well, each failure in full.
import { writeFileSync } from "node:fs";

/**
 * Listens to a mocha run and keeps its tally. A failed hook counts as a failure of its own. A pending test counts as a
 * failure too: here no test is skipped.
 * @param {import("mocha").Runner} runner
 * @param {string} layer
 * @returns {import("./reporter.mjs").Tally}
 */
export function tallyOf(runner, layer) {
  const tally = { layer, passed: 0, failed: 0, failures: [] };
  const fail = (title, words) => {
    tally.failed++;
    tally.failures.push({ title, words });
  };
  runner.on("pass", () => tally.passed++);
  runner.on("fail", (test, error) => fail(test.fullTitle(), failureWords(error)));
  runner.on("pending", (test) => fail(test.fullTitle(), "This test did not run: it is marked as pending."));
  return tally;
}

/** Everything an error says: message, the two values where it compared some, stack, cause. */
function failureWords(error) {
  if (!(error instanceof Error)) return String(error);
  const parts = [error.stack ?? `${error.name}: ${error.message}`];
  if (!parts[0].includes(error.message)) parts.unshift(error.message);
  if (error.cause !== undefined) parts.push(`because of: ${failureWords(error.cause)}`);
  return parts.join("\n");
}

/**
 * Prints the failures in full and a line of the layer's counts.
 * @param {import("./reporter.mjs").Tally} tally
 * @param {(line: string) => void} say
 */
export function printTally(tally, say) {
  tally.failures.forEach(({ title, words }, index) => {
    say(`\n${tally.layer}: failure ${index + 1} of ${tally.failed}: ${title}\n${words.replace(/^/gm, "    ")}\n`);
  });
  say(`${tally.layer}: ${tally.passed} passed, ${tally.failed} failed`);
}

/**
 * Writes a tally where the runner of all layers reads it.
 * @param {import("./reporter.mjs").Tally} tally
 * @param {string} file
 */
export function writeTally(tally, file) {
  writeFileSync(file, JSON.stringify(tally));
}
