import { type Fault, fault, replacement, type Span } from "../contract/problem.js";
import type { Arrow } from "./equation.js";

/** An arrow, or what was written in place of one. */
export interface FoundArrow {
  readonly span: Span;
  readonly meant: Arrow | null;
  readonly fault: Fault | null;
}

const written: Readonly<Record<string, Arrow>> = {
  "->": "->",
  "→": "->",
  "⟶": "->",
  "<=>": "<=>",
  "⇌": "<=>",
  "⇋": "<=>",
  "⇄": "<=>",
  "⇆": "<=>",
};

/** All arrows of `text` (in plain signs), from the left; a minus that belongs to an ion before `->` stays with it. */
export function findArrows(text: string): FoundArrow[] {
  return [...text.matchAll(/<[=-]+>|(?<=\s|^)-+>|->|=+>|==?|→|⟶|⇌|⇋|⇄|⇆|↔|⇒|<-+|<=+/g)].map((found) => {
    const span = { start: found.index, end: found.index + found[0].length };
    const sign = found[0];
    const meant = written[sign] ?? (/^-+>$/.test(sign) ? "->" : null);
    return { span, meant, fault: meant === null ? notAnArrow(sign, span) : null };
  });
}

function notAnArrow(sign: string, span: Span): Fault {
  if (/^=+$/.test(sign)) return fault("equation-equals", {}, span, [replacement(span, "->"), replacement(span, "<=>")]);
  const both = sign.startsWith("<") && sign.endsWith(">");
  const mend = both || sign === "↔" ? "<=>" : "->";
  const backwards = sign.startsWith("<") && !both;
  if (backwards) return fault("equation-arrow", { arrow: sign, mend: "the reactants on the left of ->" }, span);
  return fault("equation-arrow", { arrow: sign, mend }, span, [replacement(span, mend)]);
}
