import { type Fault, fault, type Mend, replacement, type Span } from "../contract/problem.js";
import { type Basis, bases, isShare } from "../quantity/basis.js";
import { checkDimension } from "../quantity/checkDimension.js";
import type { Quantity } from "../quantity/quantity.js";
import { type KindOfQuantity, type QuantityKind, quantityKinds } from "./quantityKinds.js";

/** A quantity as it was read, with where its number and its unit stand in the text. */
export interface WrittenQuantity {
  readonly quantity: Quantity;
  readonly number: Span;
  readonly unit: Span | null;
  readonly basis: "mass" | "amount" | "volume" | null;
}

/** Units that say a share of a mixture, but not of what. */
const sharesOfMixture = new Set(["%", "ppm"]);

function shareBy(basis: Basis, shown: string, span: Span): Mend {
  return replacement(span, `${shown} by ${basis}`);
}

/** Null where a quantity is what its line wants, else the fault: dimension first, then sign. */
export function checkQuantity(written: WrittenQuantity, text: string, kind: QuantityKind): Fault | null {
  const { name, dimensions, atLeast, units, ofWhole }: KindOfQuantity = quantityKinds[kind];
  const { quantity } = written;
  if (dimensions !== null) {
    const span = written.unit ?? written.number;
    const shown = written.unit === null ? undefined : text.slice(written.unit.start, written.unit.end);
    if (
      (kind === "taken" || kind === "stock") &&
      written.basis === null &&
      shown !== undefined &&
      sharesOfMixture.has(quantity.unit.text)
    ) {
      const mends = bases.map((basis) => shareBy(basis, shown, span));
      const share = `${text.slice(written.number.start, written.number.end)} ${shown}`;
      return fault("share-of-what", { share }, span, mends);
    }
    // A share of the mixture itself, with what it is a share of.
    if (kind === "taken" && written.basis !== null && isShare(quantity.unit)) return beyondWhole(written, text);
    const wrong = checkDimension(written.unit === null ? null : quantity.unit, { name, dimensions }, span, shown);
    if (wrong !== null) return units === undefined ? wrong : inOwnUnits(wrong, units, written);
  }
  const span = { start: 0, end: text.length };
  if (atLeast === "zero" && quantity.value < 0) {
    const limit = kind === "temperature" ? "above absolute zero" : "zero or more";
    return fault("number-below-zero", { what: name, limit }, span);
  }
  if (atLeast === "above zero" && quantity.value <= 0) {
    return fault("number-below-zero", { what: name, limit: "more than zero" }, span);
  }
  return ofWhole === true ? beyondWhole(written, text) : null;
}

/** A share of more than the whole; a bare number up to 100 was meant in per cent. */
function beyondWhole({ quantity, unit }: WrittenQuantity, text: string): Fault | null {
  if (quantity.value <= 1) return null;
  const bare = unit === null && quantity.value <= 100;
  const mends = bare ? [{ text: `${text} %`, edits: [{ start: text.length, end: text.length, text: " %" }] }] : [];
  return fault("share-beyond-whole", { share: text }, { start: 0, end: text.length }, mends);
}

/** A fault of the dimension in the words of the trade. */
function inOwnUnits(
  wrong: Fault,
  units: NonNullable<KindOfQuantity["units"]>,
  { number, unit }: WrittenQuantity,
): Fault {
  const { kind, samples, usual } = units;
  const { end } = number;
  const mend = unit === null ? [{ text: usual, edits: [{ start: end, end, text: ` ${usual}` }] }] : [];
  const args = { ...wrong.args, kind, samples };
  return { ...wrong, args, mend };
}
