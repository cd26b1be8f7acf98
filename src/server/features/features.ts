import type { Feature } from "../context.js";
import { clientChanges } from "./clientChanges.js";
import { codeActions } from "./codeActions.js";
import { codeLens } from "./codeLens.js";
import { completion } from "./completion.js";
import { dataFileHover } from "./dataFileHover.js";
import { definition } from "./definition.js";
import { diagnostics } from "./diagnostics.js";
import { documentLinks } from "./documentLinks.js";
import { documentSymbols } from "./documentSymbols.js";
import { foldingRanges } from "./foldingRanges.js";
import { formatting } from "./formatting.js";
import { hover } from "./hover.js";
import { inlayHints } from "./inlayHints.js";
import { preview } from "./preview.js";
import { records } from "./records.js";
import { references } from "./references.js";
import { renaming } from "./renaming.js";
import { semanticTokens } from "./semanticTokens.js";
import { status } from "./status.js";
import { watchedFiles } from "./watchedFiles.js";
import { workspaceSymbols } from "./workspaceSymbols.js";

/** Everything the editor offers. A new feature is one file beside this one and one line here. */
export const features: readonly Feature[] = [
  clientChanges,
  diagnostics,
  codeActions,
  formatting,
  hover,
  documentLinks,
  documentSymbols,
  foldingRanges,
  inlayHints,
  references,
  renaming,
  semanticTokens,
  workspaceSymbols,
  definition,
  completion,
  dataFileHover,
  watchedFiles,
  status,
  preview,
  codeLens,
  records,
];
