import { codeIndex, codesInOrder } from "./codeIndex.js";
import { codePage } from "./codePage.js";
import { languagePage } from "./languagePage.js";

/** All generated pages, by their path below `media/docs`, and why a page could not be made. */
export async function docsPages(): Promise<{
  readonly pages: ReadonlyMap<string, string>;
  readonly faults: readonly string[];
}> {
  const pages = new Map<string, string>([
    ["language.md", languagePage()],
    ["codes/README.md", codeIndex()],
  ]);
  const faults: string[] = [];
  for (const code of codesInOrder()) {
    try {
      pages.set(`codes/${code}.md`, await codePage(code));
    } catch (error) {
      faults.push(`${code}: ${error instanceof Error ? error.message : String(error)}`);
    }
  }
  return { pages, faults };
}
