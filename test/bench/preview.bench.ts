import { type PreviewPage, previewPage } from "../../src/contract/previewProtocol.js";
import { decayCsv, decayRun } from "../server/decay.js";
import { folder, startEditorClient } from "../server/editorClient.js";
import { median, ms, quantile } from "./sampling.js";

/**
 * Types in a description of 5,000 readings with its preview open: time from a keystroke until its diagnostics are there,
 * the server asked for the page after each pause as the panel asks. Pause 250 ms as the setting has it, a key each 60 ms.
 */
export async function bench(): Promise<string[]> {
  const client = await startEditorClient({ files: { "data/a.csv": decayCsv(5_000, 0.05) }, delay: 250 });
  const uri = `${folder}/a.raterun`;
  const ask = async (): Promise<number> => {
    const begin = performance.now();
    const page: PreviewPage | null = await client.connection.sendRequest(previewPage, { uri, line: 8, run: null });
    return page === null ? Number.NaN : performance.now() - begin;
  };
  try {
    await client.open("a.raterun", decayRun);
    await client.settled("a.raterun");
    const first = await ask();
    const asked: number[] = [];
    let up = client.statuses.length;
    const watch = setInterval(() => {
      for (; up < client.statuses.length; up++) {
        if (client.statuses[up]?.state === "up to date") void ask().then((time) => asked.push(time));
      }
    }, 5);
    const found: number[] = [];
    for (let round = 0; round < 160; round++) {
      // A word that begins no line comes and goes, so that each keystroke changes what is shown.
      const [words, by] = round % 2 === 0 ? ["run A", "nosuchword 1\nrun A"] : ["nosuchword 1\nrun A", "run A"];
      const from = client.sent.length;
      const begin = performance.now();
      await client.edit("a.raterun", words, by);
      while (client.sent.length === from) await new Promise((done) => setImmediate(done));
      // The first ones, in which the engine has not compiled yet, do not count.
      if (round >= 40) found.push(performance.now() - begin);
      // Every eighth time a pause, in which rates and fits are worked out and the page is asked for.
      await new Promise((done) => setTimeout(done, round % 8 === 7 ? 500 : 60));
    }
    clearInterval(watch);
    const pages = asked.filter((time) => Number.isFinite(time)).sort((a, b) => a - b);
    found.sort((a, b) => a - b);
    return [
      `5,000 readings, preview open, keystroke to diagnostics there and back: median ${ms(median(found))}, p95 ${ms(quantile(found, 0.95))}; goal 5 ms`,
      `the page at first ${ms(first)}; ${pages.length} times more, median ${ms(median(pages))}`,
    ];
  } finally {
    await client.end();
  }
}
