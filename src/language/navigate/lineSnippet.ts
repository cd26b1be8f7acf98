import type { Span } from "../../contract/problem.js";
import { parseLine } from "../parseLine.js";
import type { Part } from "../shape.js";
import type { StatementRow } from "../statements.js";
import type { Field } from "../syntax.js";
import { partOfField } from "./partOfField.js";

/** A line as an editor writes it with places to fill in. */
export interface LineSnippet {
  /** the fixed words the line begins with: `molar mass` */
  readonly label: string;
  /** TextMate snippet syntax, as editors read it */
  readonly text: string;
}

/** The example of a kind of line with each value a place to fill in; `suggest` may put a better value there. */
export function lineSnippet(
  row: StatementRow,
  suggest: (part: Part, example: string) => string | null = () => null,
): LineSnippet {
  const { head, example, parts } = row;
  const [second] = parts;
  const label = second?.part === "keyword" ? `${head} ${second.word}` : head;
  const choices = choicesOf(parts);
  const places = [...(parseLine(example).statements[0]?.fields ?? [])].flatMap(([name, field]) =>
    placesOf(row, name, field),
  );
  places.sort((a, b) => a.start - b.start);
  let text = "";
  let from = 0;
  places.forEach(({ start, end, name, part }, index) => {
    const value = example.slice(start, end);
    const options = choices.get(name);
    text += escaped(example.slice(from, start));
    text +=
      options === undefined
        ? `\${${index + 1}:${escaped((part === null ? null : suggest(part, value)) ?? value)}}`
        : `\${${index + 1}|${[value, ...options.filter((option) => option !== value)].map(choice).join(",")}|}`;
    from = end;
  });
  return { label, text: text + escaped(example.slice(from)) };
}

interface FillIn extends Span {
  readonly name: string;
  readonly part: Part | null;
}

/** Fixed words are no place to fill in, unless one of several stands there; of a text only what its quotes hold is. */
function placesOf(row: StatementRow, name: string, field: Field): FillIn[] {
  const { span } = field;
  const part = partOfField(row, name);
  if (field.kind === "orders") {
    return field.items.map(({ species }) => ({ ...species.span, name, part: { part: "species", label: name } }));
  }
  if (field.kind === "header") return [];
  if (part?.part === "words" && !choicesOf(row.parts).has(name)) return [];
  if (part?.part === "string") return [{ start: span.start + 1, end: span.end - 1, name, part }];
  return [{ ...span, name, part }];
}

/** Phrases of which just one stands in a place and nothing else depends on which. */
function choicesOf(parts: readonly Part[]): Map<string, string[]> {
  const found = new Map<string, string[]>();
  for (const part of parts) {
    if (part.part === "optional") for (const [label, phrases] of choicesOf(part.parts)) found.set(label, phrases);
    if (part.part !== "either" && part.part !== "any") continue;
    const phrases = part.options.flatMap(([first, ...rest]) =>
      first?.part === "words" && rest.length === 0 ? [first] : [],
    );
    const [label] = phrases.map((phrase) => phrase.label);
    if (part.part === "either" && label !== undefined && phrases.length === part.options.length) {
      found.set(
        label,
        phrases.map(({ phrase }) => phrase),
      );
    }
  }
  return found;
}

function escaped(text: string): string {
  return text.replace(/[\\$}]/g, "\\$&");
}

function choice(text: string): string {
  return text.replace(/[\\$},|]/g, "\\$&");
}
