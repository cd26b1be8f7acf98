import type { Feature } from "../context.js";
import { clientChanges } from "./clientChanges.js";
import { codeActions } from "./codeActions.js";
import { diagnostics } from "./diagnostics.js";
import { formatting } from "./formatting.js";
import { hover } from "./hover.js";
import { preview } from "./preview.js";
import { status } from "./status.js";
import { watchedFiles } from "./watchedFiles.js";

/** Everything the editor offers. A new feature is one file beside this one and one line here. */
export const features: readonly Feature[] = [
  clientChanges,
  diagnostics,
  codeActions,
  formatting,
  hover,
  watchedFiles,
  status,
  preview,
];
