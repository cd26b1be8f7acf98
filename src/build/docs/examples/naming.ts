import { type CodeExamples, unshown } from "../codeExample.js";

/** Renaming refuses in the editor; no text earns these codes by itself. */
const why = "It is said when something is renamed in the editor, never of a text as it stands.";

export const namingExamples: CodeExamples = {
  "rename-formula": unshown("rename-formula", why, { formula: "H2O2" }),
  "rename-unsure": unshown("rename-unsure", why, { name: "gas", line: 12 }),
  "rename-changes": unshown("rename-changes", why, {
    name: "dye",
    why: "One place of the name would not be read as it any more.",
  }),
};
