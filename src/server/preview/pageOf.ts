import type { TextDocument } from "vscode-languageserver-textdocument";
import type { Description } from "../../contract/findings.js";
import type { PreviewPage, PreviewQuestion } from "../../contract/previewProtocol.js";
import type { Bound } from "../../language/bind/bind.js";
import { firstSentence } from "../../report/firstSentence.js";
import { runPage } from "../../report/runPage.js";
import { belongsTo } from "../../report/runWatch.js";
import { dataLocations, type FileAccess } from "../../workspace/loadFiles.js";

/** What a page is made from: a text, its meaning, its findings with curves. */
export interface PageInput {
  readonly document: TextDocument;
  readonly bound: Bound;
  readonly description: Description;
  readonly access: FileAccess;
}

/** The preview's page of the run that is asked for, else of the one under the cursor, else of the first. */
export function pageOf({ document, bound, description, access }: PageInput, question: PreviewQuestion): PreviewPage {
  const { runs, diagnostics } = description;
  const asked = runs.find(({ id }) => id === question.run);
  const run = asked ?? runUnder(description, bound, document, question.line) ?? runs[0];
  const errors = diagnostics.filter(
    (diagnostic) =>
      diagnostic.severity === "error" &&
      (run === undefined || belongsTo(run, diagnostic) || !runs.some((one) => belongsTo(one, diagnostic))),
  );
  const { markup, plots } = runPage(description, run?.id ?? null, dataFileOf(bound, access, run?.id ?? null));
  return {
    uri: document.uri,
    version: document.version,
    runs: runs.map(({ id, name, place }) => ({ id, name, line: place.line })),
    run: run?.id ?? null,
    errors: errors.map(({ line, message }) => ({ line, words: firstSentence(message) })),
    markup,
    plots,
  };
}

/** The run in whose lines the cursor stands, or the last that begins above it. */
function runUnder(
  { runs }: Description,
  { study }: Bound,
  document: TextDocument,
  line: number | null,
): Description["runs"][number] | undefined {
  if (line === null) return undefined;
  const start = document.offsetAt({ line: line - 1, character: 0 });
  const end = document.offsetAt({ line, character: 0 });
  const source = study.runs.find(
    (one) => one.kind === "run" && one.run.block.start < Math.max(end, start + 1) && one.run.block.end >= start,
  );
  const id = source?.kind === "run" ? source.run.id : null;
  return runs.find((run) => run.id === id) ?? runs.findLast(({ place }) => place.line <= line);
}

/** Where the data file of a run is; null where it may not be read, or the run has none. */
function dataFileOf({ study }: Bound, access: FileAccess, id: string | null): string | null {
  const source = study.runs.find((one) => one.kind === "run" && one.run.id === id);
  const path = source?.kind === "run" ? source.run.data?.path : undefined;
  const place = path === undefined ? undefined : dataLocations(study, access).get(path);
  return place !== undefined && "uri" in place ? place.uri : null;
}
