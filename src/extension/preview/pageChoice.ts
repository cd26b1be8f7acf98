import type { PreviewPage } from "../../contract/previewProtocol.js";

/** What the panel shows: a page, and the quiet sign above it ("" for none). */
export interface Shown {
  readonly page: PreviewPage;
  readonly sign: string;
}

/** Keeps the last good page of each run, and says what to show of a new one. */
export interface PageChoice {
  /** `run`: the run shown so far, whose header may be what is broken. */
  take(page: PreviewPage, run: string | null): Shown;
}

/** Pages kept. */
const most = 12;

/** A page without errors is shown and kept. While the text has errors the last good page stays, with a sign that says so. */
export function createPageChoice(): PageChoice {
  const good = new Map<string, PreviewPage>();
  return {
    take(page, run) {
      const key = (id: string | null): string => `${page.uri} ${id ?? ""}`;
      const [first] = page.errors;
      if (first === undefined) {
        good.delete(key(page.run));
        good.set(key(page.run), page);
        const oldest = good.keys().next().value;
        if (good.size > most && oldest !== undefined) good.delete(oldest);
        return { page, sign: "" };
      }
      const more = page.errors.length > 1 ? ` And ${page.errors.length - 1} more.` : "";
      const words = `Line ${first.line}: ${first.words}${more}`;
      const lost = run !== null && !page.runs.some(({ id }) => id === run);
      const before = good.get(key(lost ? run : page.run));
      // Places of the text as it is now are not those of the page before.
      if (before !== undefined) return { page: before, sign: `The last good picture; the text has errors. ${words}` };
      return { page, sign: `The text has errors. ${words}` };
    },
  };
}
