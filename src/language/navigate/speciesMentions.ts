import { readEquation } from "../../chemistry/readEquation.js";
import type { Origin } from "../../contract/problem.js";
import type { Bound } from "../bind/bind.js";
import { speciesKey } from "../bind/resolveSpecies.js";
import type { Field } from "../syntax.js";
import { everyStatement } from "./everyStatement.js";
import { partOfField } from "./partOfField.js";

/** A place where a species is named, by its declared name or its formula; the state behind it is no part of it. */
export interface SpeciesMention {
  /** declared name, or normal form of the formula */
  readonly key: string;
  readonly origin: Origin;
  /** `species NAME` */
  readonly declares: boolean;
  /** stands in the equation of a `reaction` line */
  readonly inReaction: boolean;
}

/** Every mention of a species in a description, broken lines as far as they were read, in the order of the text. */
export function speciesMentions({ parsed, study }: Bound): SpeciesMention[] {
  const declared = new Map(study.species.map((species) => [species.key, species]));
  const mentions: SpeciesMention[] = [];
  for (const statement of everyStatement(parsed.statements)) {
    const { row, fields } = statement.line;
    if (row === null) continue;
    const inReaction = row.head === "reaction";
    const add = (key: string, start: number, length: number, declares = false): void => {
      const from = statement.offset + start;
      mentions.push({ key, origin: { uri: parsed.uri, start: from, end: from + length }, declares, inReaction });
    };
    const addText = (text: string, start: number, declares = false): void => {
      const bare = text.replace(/\((s|l|g|aq)\)$/, "");
      add(speciesKey({ declared }, bare), start, bare.length, declares);
    };
    for (const [label, field] of fields) {
      const part = partOfField(row, label);
      if (part?.part === "species") for (const { text, span } of itemsIn(field)) addText(text, span.start);
      else if (part?.part === "name" && part.of === "species") addText(field.text, field.span.start, part.declares);
      else if (field.kind === "orders")
        for (const { species } of field.items) addText(species.text, species.span.start);
      else if (part?.part === "equation") {
        for (const { key, start, end } of inEquation(field, (name) => declared.has(name))) {
          add(key, field.span.start + start, end - start);
        }
      }
    }
  }
  return mentions.sort((a, b) => a.origin.start - b.origin.start);
}

function itemsIn(field: Field): readonly Field[] {
  return field.kind === "list" ? field.items : field.kind === "text" ? [field] : [];
}

function inEquation({ text }: Field, isDeclared: (name: string) => boolean) {
  const { equation } = readEquation(text, isDeclared);
  const terms = equation === null ? [] : [...equation.left, ...equation.right];
  return terms.map(({ species, speciesSpan }) => ({ key: species, ...speciesSpan }));
}
