import { catalogue, type ProblemCode } from "../../contract/catalogue.js";
import { chemistryMessages } from "../../contract/messages/chemistry.js";
import { dataMessages } from "../../contract/messages/data.js";
import { fitMessages } from "../../contract/messages/fit.js";
import { languageMessages } from "../../contract/messages/language.js";
import { namingMessages } from "../../contract/messages/naming.js";
import { quantityMessages } from "../../contract/messages/quantity.js";
import { recordMessages } from "../../contract/messages/record.js";
import { codeTitle } from "./codePage.js";
import { generated, page } from "./prose.js";

const groups: readonly (readonly [title: string, messages: object])[] = [
  ["Lines, names and runs", languageMessages],
  ["Numbers and units", quantityMessages],
  ["Formulas and equations", chemistryMessages],
  ["Data files", dataMessages],
  ["Signals, rates and fits", fitMessages],
  ["Names", namingMessages],
  ["Records", recordMessages],
];

/** Every code of the catalogue by name, in the order of the groups. */
export function codesInOrder(): ProblemCode[] {
  return groupedCodes().flatMap(({ codes }) => codes);
}

/** The page that lists all codes. */
export function codeIndex(): string {
  const tables = groupedCodes().map(({ title, codes }) => [
    `## ${title}`,
    [
      "| code | | |",
      "| --- | --- | --- |",
      ...codes.map((code) => `| [${code}](${code}.md) | ${catalogue[code].severity} | ${codeTitle(code)} |`),
    ].join("\n"),
  ]);
  return page(
    "# What Ratewright can say of a description",
    generated,
    "An **error** stops the line, the run or the file it belongs to; what does not depend on it is worked out all the same. A **warning** leaves something out, or tells how far a number may be relied on. An **information** asks for nothing.",
    ...tables,
    "[The language](../language.md)",
  );
}

function groupedCodes(): { title: string; codes: ProblemCode[] }[] {
  const all = Object.keys(catalogue) as ProblemCode[];
  const known = groups.map(([title, messages]) => ({ title, codes: all.filter((code) => code in messages) }));
  const others = all.filter((code) => !known.some(({ codes }) => codes.includes(code)));
  return others.length === 0 ? known : [...known, { title: "Others", codes: others }];
}
