import { type CodeExamples, unshown } from "../codeExample.js";

const why = "It is about the record beside a description, not about the description.";

export const recordExamples: CodeExamples = {
  "record-cut-off": unshown("record-cut-off", why, {}),
  "record-unmerged": unshown("record-unmerged", why, {}),
  "record-broken": unshown("record-broken", why, {}),
  "record-foreign": unshown("record-foreign", why, { why: "it lacks raterecord" }),
  "record-newer": unshown("record-newer", why, { form: 2, known: 1 }),
};
