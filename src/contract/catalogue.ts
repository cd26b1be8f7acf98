import { chemistryMessages } from "./messages/chemistry.js";
import { dataMessages } from "./messages/data.js";
import { fitMessages } from "./messages/fit.js";
import { languageMessages } from "./messages/language.js";
import { namingMessages } from "./messages/naming.js";
import { quantityMessages } from "./messages/quantity.js";
import { recordMessages } from "./messages/record.js";

/** Every problem there is: its severity, its words, and the line that explains it. Nobody else writes messages. */
export const catalogue = {
  ...languageMessages,
  ...quantityMessages,
  ...chemistryMessages,
  ...dataMessages,
  ...fitMessages,
  ...recordMessages,
  ...namingMessages,
} as const;

export type ProblemCode = keyof typeof catalogue;

/** What the text of this code asks for. */
export type MessageArguments<Code extends ProblemCode> = Parameters<(typeof catalogue)[Code]["text"]>[0];
