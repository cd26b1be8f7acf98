import { CompletionItemKind } from "vscode-languageserver";
import { fieldOf } from "../../language/fields.js";
import { type KindOfQuantity, type QuantityKind, quantityKinds } from "../../language/quantityKinds.js";
import type { Dimension } from "../../quantity/dimension.js";
import { type KindName, kindOf } from "../../quantity/kinds.js";
import type { Unit } from "../../quantity/unit.js";
import { unitsOfKind, usualUnits, type WrittenUnit } from "../../quantity/usualUnits.js";
import type { CompletionContext } from "./completionContext.js";
import { order } from "./nameCompletions.js";
import type { OfferedItem } from "./offeredItem.js";

/** Units for a quantity of a line: of the dimensions the line takes, or of the column it speaks of. */
export function unitCompletions(context: CompletionContext, kind: QuantityKind): OfferedItem[] {
  const { dimensions }: KindOfQuantity = quantityKinds[kind];
  const units = dimensions === null ? ofReading(context, kind) : dimensions.flatMap((one) => ofDimension(one, kind));
  return items(units);
}

/** A share of a mixture says what it is a share of. */
function ofDimension(dimension: Dimension, kind: QuantityKind): readonly WrittenUnit[] {
  const units = usualUnits(dimension);
  if (kind !== "stock" || kindOf(dimension)?.name !== "number") return units;
  return units.flatMap(({ text, unit }) =>
    ["mass", "volume", "amount"].map((of) => ({ text: `${text} by ${of}`, unit })),
  );
}

/** Units that a column may have: that of its header first, then those of readings people take. */
export function columnUnits(stated: Unit | null): OfferedItem[] {
  const own = stated === null ? [] : [{ text: stated.text, unit: stated }];
  const same = stated === null ? [] : usualUnits(stated.dimension);
  return items([...own, ...same, ...readings.flatMap((name) => unitsOfKind(name))]);
}

/** Units of concentration and of time, in which results come out. */
export function resultUnits(): OfferedItem[] {
  return items([...unitsOfKind("concentration"), ...unitsOfKind("time")]);
}

const readings: readonly KindName[] = [
  "time",
  "concentration",
  "volume",
  "mass",
  "pressure",
  "conductivity",
  "voltage",
  "temperature",
  "number",
];

/** What is not of one dimension: a rate constant, or what the column above the line, or the followed one, is read in. */
function ofReading({ open, run }: CompletionContext, kind: QuantityKind): readonly WrittenUnit[] {
  if (kind === "rateConstant") return [...unitsOfKind("frequency"), ...unitsOfKind("secondOrder")];
  if (kind === "slope") return unitsOfKind("perConcentration");
  const statements = open.flatMap(({ statement }) => statement ?? []);
  const nameIn = (label: string): string | null => {
    const holder = statements.findLast((one) => fieldOf(one, label) !== null && one.line.row?.head !== "series");
    return holder === undefined ? null : (fieldOf(holder, label)?.text ?? null);
  };
  const name = nameIn("column") ?? run?.follow[0]?.column ?? null;
  const column = run?.data?.columns.find((candidate) => candidate.name === name);
  const own = column?.unit?.value ?? null;
  const share = kind === "uncertainty" ? unitsOfKind("number").slice(0, 1) : [];
  if (own === null) return [...readings.slice(1, 6).flatMap((one) => unitsOfKind(one)), ...share];
  return [{ text: own.text, unit: own }, ...usualUnits(own.dimension), ...share];
}

function items(units: readonly WrittenUnit[]): OfferedItem[] {
  const texts = new Map(units.map((one) => [one.text, one.unit]));
  return [...texts].map(([text, unit], index) => ({
    label: text,
    newText: text,
    kind: CompletionItemKind.Unit,
    detail: kindOf(unit.dimension)?.name ?? "unit",
    sortText: `0${order(index)}`,
  }));
}
