import type { CodeExamples } from "./codeExample.js";
import { chemistryExamples } from "./examples/chemistry.js";
import { dataExamples } from "./examples/data.js";
import { fitExamples } from "./examples/fit.js";
import { gasExamples } from "./examples/gas.js";
import { languageExamples } from "./examples/language.js";
import { namingExamples } from "./examples/naming.js";
import { quantityExamples } from "./examples/quantity.js";
import { recordExamples } from "./examples/record.js";

/** For each code of the catalogue a text that earns it. All figures are invented. */
export const codeExamples: CodeExamples = {
  ...languageExamples,
  ...quantityExamples,
  ...chemistryExamples,
  ...dataExamples,
  ...fitExamples,
  ...recordExamples,
  ...gasExamples,
  ...namingExamples,
};
