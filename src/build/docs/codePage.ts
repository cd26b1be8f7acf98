import { catalogue, type ProblemCode } from "../../contract/catalogue.js";
import type { Diagnostic } from "../../contract/findings.js";
import { firstSentence } from "../../report/firstSentence.js";
import type { ExampleFiles, ShownExample, UnshownExample } from "./codeExample.js";
import { codeExamples } from "./codeExamples.js";
import { workedExample } from "./exampleFindings.js";
import { capital, fenced, generated, page, prose, code as words } from "./prose.js";

/** What a code is about, as the title of its page: the first sentence of its help, without the full stop. */
export function codeTitle(code: ProblemCode): string {
  return prose(firstSentence(catalogue[code].help).replace(/\.$/, ""));
}

/** The page of one code: what it means, the words it gives, a text that earns it, and that text put right. */
export async function codePage(code: ProblemCode): Promise<string> {
  const { severity, help } = catalogue[code];
  const more = help.slice(firstSentence(help).length).trim();
  const example = codeExamples[code];
  const body =
    example === undefined ? [] : "why" in example ? unshownBlocks(code, example) : await shownBlocks(code, example);
  return page(
    `# ${codeTitle(code)}`,
    generated,
    `**${capital(severity)}** · ${words(code)}`,
    prose(more),
    body,
    "[All codes](README.md) · [The language](../language.md)",
  );
}

function unshownBlocks(code: ProblemCode, { why, args }: UnshownExample): string[] {
  const write = catalogue[code].text as (args: UnshownExample["args"]) => string;
  return ["## What it says, for example", fenced("text", write(args)), `It cannot be shown in a text. ${prose(why)}`];
}

async function shownBlocks(code: ProblemCode, example: ShownExample): Promise<string[]> {
  const { diagnostics, offered, right } = await workedExample(code, example);
  const found = diagnostics.filter((one) => one.code === code);
  const [first] = found;
  if (first === undefined) throw new Error("its example does not earn it");
  const messages = [...new Set(found.map(({ message }) => message))].join("\n");
  const { files = {}, beside } = example;
  return [
    "## What it says, for example",
    fenced("text", messages),
    `It stands on ${placeWords(example.text, first)} of this text${filesWords(files)}:`,
    fenced("raterun", example.text),
    ...fileBlocks(files),
    beside === undefined ? "" : `[${beside}](${beside}.md) comes with it.`,
    ...(right === null ? [] : [example.otherReadings === true ? "## Other readings" : "## Put right"]),
    offered.length === 0 ? "" : `The editor offers: ${offered.map(prose).join(" · ")}.`,
    ...(right === null ? [] : rightBlocks(example, files, right)),
    "The figures are invented.",
  ];
}

function rightBlocks(
  { text, unsaved, otherReadings }: ShownExample,
  files: ExampleFiles,
  right: { readonly text: string; readonly files: ExampleFiles },
): string[] {
  if (unsaved === true) return ["The same text, once it is saved beside the folder `data`."];
  const changed = Object.entries(right.files).filter(([path, file]) => files[path] !== file);
  if (otherReadings === true) {
    return [
      "Readings are not changed until nothing is said of them. Of these, of another run, nothing is said:",
      ...fileBlocks(right.files),
    ];
  }
  return [
    right.text === text ? "The text stays as it is; the file is put right." : fenced("raterun", right.text),
    ...fileBlocks(Object.fromEntries(changed)),
  ];
}

function filesWords(files: ExampleFiles): string {
  const paths = Object.keys(files);
  return paths.length === 0 ? "" : ` with ${paths.map(words).join(" and ")} beside it`;
}

function fileBlocks(files: ExampleFiles): string[] {
  return Object.entries(files).flatMap(([path, file]) => {
    if (typeof file !== "string") return [`${words(path)} is ${prose(file.words)}.`];
    return file === "" ? [`${words(path)} has nothing in it.`] : [`${words(path)}:`, fenced("csv", file)];
  });
}

/** The words a diagnostic stands on and their line; of several lines the first. */
function placeWords(text: string, { line, column, endLine, endColumn }: Diagnostic): string {
  const written = text.split("\n")[line - 1] ?? "";
  const marked = written.slice(column - 1, endLine === line ? endColumn - 1 : undefined).trim();
  return marked === "" ? `line ${line}` : `${words(marked)} in line ${line}`;
}
