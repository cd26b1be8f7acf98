import { printedFormula } from "../../chemistry/formula.js";
import { ionHint, ionName } from "../../chemistry/ionHint.js";
import { molarMass } from "../../chemistry/molarMass.js";
import { readSpecies } from "../../chemistry/readSpecies.js";
import type { Span } from "../../contract/problem.js";
import type { Bound } from "../../language/bind/bind.js";
import { speciesMentions } from "../../language/navigate/speciesMentions.js";
import type { StatementRow } from "../../language/statements.js";
import { fromSI, intervalFromSI } from "../../quantity/conversion.js";
import { formatQuantity } from "../../quantity/formatNumber.js";
import { combined, type Quantity } from "../../quantity/quantity.js";
import { quantityText } from "../../quantity/quantityText.js";
import { isFault } from "../../quantity/shifted.js";
import type { Unit } from "../../quantity/unit.js";
import { printedUnit } from "../../quantity/unitText.js";
import { usualUnits } from "../../quantity/usualUnits.js";
import { escapeMarkdown } from "../../report/escape.js";
import { quantityAt, wordAt } from "./wordAt.js";

/** What resting on a word tells, as Markdown, and the words it is about. */
export interface WordHover {
  readonly text: string;
  readonly span: Span;
}

/** Of a fixed word what its line does, of a formula its molar mass and ions, of a quantity its value in other units. */
export function wordHover(bound: Bound, offset: number): WordHover | null {
  const at = wordAt(bound.parsed, offset);
  if (at === null) return null;
  const { word, statement, span } = at;
  const quantity = quantityAt(statement, offset);
  if (quantity !== null) {
    const text = quantityWords(quantity.field.quantity);
    return text === null ? null : { text, span: quantity.span };
  }
  const { row } = statement.line;
  if ((word.role === "head" || word.role === "keyword") && row !== null) return { text: keywordWords(row), span };
  if (word.role !== "species") return null;
  const mention = speciesMentions(bound).find(({ origin }) => origin.start <= offset && offset <= origin.end);
  const text = mention === undefined ? null : speciesWords(bound, mention.key);
  return mention === undefined || text === null ? null : { text, span: mention.origin };
}

/** What a kind of line does, and its example. */
export function keywordWords({ head, help, example, kept }: StatementRow): string {
  const waits = kept === true ? " It is read and kept; nothing is computed with it yet." : "";
  return `**${head}** · ${escapeMarkdown(help + waits)}\n\n\`\`\`raterun\n${example}\n\`\`\``;
}

/** Null where nothing is known of it but its name. */
export function speciesWords({ study }: Bound, key: string): string | null {
  const declared = study.species.find((species) => species.key === key);
  const reading = declared === undefined ? readSpecies(key) : null;
  const formula = declared?.formula ?? (reading === null || isFault(reading) ? null : reading.formula);
  if (declared === undefined && formula === null) return null;
  const shown = formula === null ? null : printedFormula(formula.text);
  const name = declared === undefined ? `**${escapeMarkdown(shown ?? key)}**` : `**${escapeMarkdown(key)}**`;
  const alias = declared === undefined || shown === null ? "" : ` is ${escapeMarkdown(shown)}`;
  const common = formula === null ? null : ionName(formula.text);
  const stated = declared?.molarMass?.value ?? null;
  const mass = stated ?? (formula === null ? null : molarMass(formula));
  const facts = [
    common === null ? null : escapeMarkdown(common),
    mass === null ? "molar mass not known" : `molar mass ${massText(mass)}${stated === null ? "" : ", as stated"}`,
    formula === null ? null : escapeMarkdown(ionHint(formula.text, "unicode") ?? ""),
  ];
  return `${name}${alias} · ${facts.filter((fact) => fact !== null && fact !== "").join(" · ")}`;
}

function massText(mass: Quantity): string {
  return escapeMarkdown(quantityText(mass, "unicode"));
}

/** Units of one size, as mL and cm³, say the same number twice. */
function sizeOf({ factor, offset }: Unit): string {
  return `${factor} ${offset}`;
}

/** Other units shown at most. */
const most = 4;

/** The quantity as it was read and in other units of its kind; null where there are none. */
export function quantityWords({ value, unit, sources }: Quantity): string | null {
  const u = combined(sources);
  const sizes = new Set([sizeOf(unit)]);
  const others = usualUnits(unit.dimension).filter(({ unit: other }) => {
    return sizes.size < sizes.add(sizeOf(other)).size;
  });
  if (unit.text === "" || others.length === 0) return null;
  const values = others.slice(0, most).map(({ unit: other }) => {
    const interval = u === null ? null : intervalFromSI(u, other);
    return formatQuantity(fromSI(value, other), interval, printedUnit(other.text));
  });
  const own = quantityText({ value, unit, sources }, "unicode");
  return `**${escapeMarkdown(own)}** = ${values.map(escapeMarkdown).join(" = ")}`;
}
