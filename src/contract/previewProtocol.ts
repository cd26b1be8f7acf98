/**
 * What the preview's parts say to each other. Three walls: editor and language server (requests), editor and the page in
 * the panel (messages by `postMessage`, one union each way). Plain data; markup is made by the report room alone.
 */

/** Request: the page of a run. Answered with null where the description is not open, or the work was stopped. */
export const previewPage = "ratewright/previewPage";
export interface PreviewQuestion {
  readonly uri: string;
  /** line of the cursor, from 1; null: the first run, or `run` */
  readonly line: number | null;
  /** id of a run that is wanted whatever the cursor says */
  readonly run: string | null;
}

export interface PreviewPage {
  readonly uri: string;
  /** version of the text it belongs to */
  readonly version: number;
  /** all runs of the description, in the order of the text */
  readonly runs: readonly PreviewRun[];
  /** id of the run shown; null where the description has none */
  readonly run: string | null;
  /** errors that touch this run, first words of each, in the order of the text */
  readonly errors: readonly { readonly line: number; readonly words: string }[];
  /** the page as markup, escaped */
  readonly markup: string;
  /** one for each element `[data-plot="ID"]` of the markup */
  readonly plots: readonly Plot[];
}

export interface PreviewRun {
  readonly id: string;
  readonly name: string;
  /** from 1 */
  readonly line: number;
}

/** Everything a plot of one followed signal draws. Times and signals are in the axes' units, powers of ten taken out. */
export interface Plot {
  readonly id: string;
  /** unit of times as the description writes it, and what a time on the axis is multiplied by for it */
  readonly timeUnit: string;
  readonly timeFactor: number;
  /** URI of the data file; null where it may not be opened */
  readonly file: string | null;
  readonly readings: readonly PlotReading[];
  readonly curves: readonly PlotCurvePoint[];
  readonly marks: readonly PlotMark[];
  readonly residuals: readonly PlotResidual[];
  /** what the axis of the residuals shows */
  readonly residualTitle: string;
  /** ids of the fits of this signal, to which a window may be written */
  readonly fits: readonly string[];
}

export interface PlotReading {
  readonly t: number;
  readonly y: number;
  /** used by a fit; outside every window; left out by the description; the same of many of which the outline is drawn */
  readonly kind: "used" | "outside" | "left out" | "outline" | "outline outside";
  /** which piece of an outline it belongs to: where none was made for a while the outline is broken */
  readonly piece: number;
  /** line of the data file, from 1 */
  readonly line: number | null;
  /** the reading in words */
  readonly words: string;
}

/** A point of a fitted curve with its 95 % band; `fit` "fit 1" counts all fits of the run, `order` those drawn, from 0. */
export interface PlotCurvePoint {
  readonly t: number;
  readonly y: number;
  readonly low: number;
  readonly high: number;
  readonly fit: string;
  readonly order: number;
}

/** A chord or a tangent with the number of its rate. */
export interface PlotMark {
  readonly t: number;
  readonly y: number;
  readonly t2: number;
  readonly y2: number;
  readonly kind: "chord" | "tangent";
  readonly label: string;
  /** where a tangent touches; null for a chord */
  readonly at: { readonly t: number; readonly y: number } | null;
  /** where its number stands, and how far aside, px */
  readonly number: { readonly t: number; readonly y: number; readonly dx: number; readonly dy: number };
}

export interface PlotResidual {
  readonly t: number;
  readonly r: number;
  readonly order: number;
}

/** Notification from the editor: no preview shows this description any more. */
export const previewLeft = "ratewright/previewLeft";
export interface PreviewLeft {
  readonly uri: string;
}

/** Request: the edit that gives fits of a run a window. */
export const windowEdit = "ratewright/windowEdit";
export interface WindowQuestion {
  readonly uri: string;
  /** the version the question is about: an answer about another text would edit the wrong place */
  readonly version: number;
  readonly fits: readonly string[];
  readonly run: string;
  readonly from: number;
  readonly to: number;
  readonly unit: string;
}
/** Places from 0, as the protocol has them; null where the text has changed or has no such fit. */
export type WindowAnswer =
  | readonly {
      readonly line: number;
      readonly character: number;
      readonly endLine: number;
      readonly endCharacter: number;
      readonly text: string;
    }[]
  | null;

/** What can be taken out of the panel; PNG is drawn by the page from the SVG. */
export type ExportFormat = "svg" | "png" | "csv" | "markdown" | "html";

/** Request: a run, or its description, in another form. */
export const previewExport = "ratewright/previewExport";
export interface ExportQuestion {
  readonly uri: string;
  readonly run: string | null;
  readonly format: Exclude<ExportFormat, "png">;
}
/** One text a file, with a name for it; null where there is nothing to export. */
export type ExportAnswer = readonly { readonly name: string; readonly text: string }[] | null;

/** From the page to the editor. */
export type FromPage =
  | { readonly kind: "ready" }
  | { readonly kind: "choose run"; readonly run: string }
  | { readonly kind: "go to line"; readonly line: number }
  | { readonly kind: "open reading"; readonly file: string; readonly line: number }
  | {
      readonly kind: "write window";
      readonly plot: string;
      readonly from: number;
      readonly to: number;
    }
  | { readonly kind: "export"; readonly format: ExportFormat }
  | { readonly kind: "png drawn"; readonly name: string; readonly base64: string }
  | { readonly kind: "violation"; readonly words: string };

/** From the editor to the page. */
export type ToPage =
  | { readonly kind: "show"; readonly page: PreviewPage; readonly name: string }
  | { readonly kind: "sign"; readonly words: string }
  | { readonly kind: "cursor"; readonly line: number }
  | { readonly kind: "say"; readonly words: string }
  | { readonly kind: "draw png"; readonly name: string; readonly svg: string };

/** What the page keeps over a reload of the window. */
export interface PageState {
  readonly uri: string;
  readonly run: string | null;
  /** parts that were opened or folded by hand, by their names; true where open */
  readonly folds: Readonly<Record<string, boolean>>;
  /** px */
  readonly scroll: number;
}
