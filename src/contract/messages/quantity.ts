import { message } from "../message.js";

/** Problems of numbers, units and quantities. */
export const quantityMessages = {
  "number-expected": message(
    "error",
    "A number stands here: digits with a decimal point, an exponent and an uncertainty where there are any.",
    ({ text }: { text: string }) =>
      `A number is expected here, such as 0.100 or 1.2e-3${text === "" ? "" : `; ${text} is not one`}.`,
  ),
  "number-comma": message(
    "error",
    "Decimals are written with a point; a comma between digits could be a decimal sign or a thousands mark.",
    ({ text, mend }: { text: string; mend: string }) =>
      mend === ""
        ? `A comma between digits has no sure meaning: write ${text} with a point for decimals and no mark between thousands.`
        : `A comma between digits has no sure meaning: write ${mend} for ${text}; decimals take a point, thousands no mark.`,
  ),
  "number-range": message(
    "error",
    "Numbers lie between about 1e-300 and 1e300.",
    ({ text }: { text: string }) =>
      `${text} is beyond the numbers that can be computed with, about 1e-300 to 1e300; correct it, or choose another unit.`,
  ),
  "uncertainty-unreadable": message(
    "error",
    "An uncertainty is a number that is not negative: 0.100(2), 0.100 +/- 0.002 mol/L, 0.100 mol/L +/- 2 %.",
    ({ sign }: { sign: string }) =>
      `After ${sign} a number that is not negative is expected, as in 0.100 ± 0.002 mol/L or 0.100 mol/L ± 2 %.`,
  ),
  "uncertainty-twice": message(
    "error",
    "One standard uncertainty is stated for a quantity, in brackets or after ±, not both.",
    () => "The uncertainty is stated twice; keep one of the two.",
  ),
  "uncertainty-of-what": message(
    "error",
    "In 98 ± 2 % the per cent sign could belong to both numbers or make the second a share of the first.",
    ({ text, first, second }: { text: string; first: string; second: string }) =>
      `${text} could be ${first} or ${second}; write the one you mean.`,
  ),
  "uncertainty-unit": message(
    "error",
    "An uncertainty has the unit of its value, or per cent.",
    ({ given, unit }: { given: string; unit: string }) =>
      `The uncertainty is in ${given}, the value in ${unit}; give both in the same kind of unit, or the uncertainty in %.`,
  ),
  "tolerance-unit": message(
    "error",
    "A tolerance states its unit: 50.00 mL within 0.05 mL.",
    ({ number }: { number: string }) => `within ${number} needs its unit, as in 50.00 mL within 0.05 mL.`,
  ),
  "share-basis": message(
    "error",
    "A share of a mixture says what it is of: by mass, by amount or by volume.",
    ({ text }: { text: string }) =>
      `What a share is of is written by mass, by amount or by volume; “${text}” is not one of them.`,
  ),
  "share-basis-alone": message(
    "error",
    "By mass, by amount and by volume stand behind a share: %, ppm.",
    ({ basis, given }: { basis: string; given: string }) =>
      `by ${basis} stands behind a share, as in 30 % by ${basis}; ${given}.`,
  ),
  "time-parts": message(
    "error",
    "A time of several parts goes from the larger unit to the smaller, as 1 min 30 s; minutes and seconds stay under 60 in 00:01:30.",
    ({ text }: { text: string }) =>
      `${text} is not a time; write it as 1 min 30 s or as 00:01:30, minutes and seconds under 60.`,
  ),
  "unit-expected": message("error", "A unit stands here.", () => "A unit is expected here, such as mL or mol/L."),
  "unit-unreadable": message(
    "error",
    "Units are written as in mol L^-1 s^-1, mol·L⁻¹·s⁻¹ or mol/(L s).",
    ({ text }: { text: string }) => `A unit cannot hold ${text}; units are written as mol L^-1 s^-1 or mol/(L s).`,
  ),
  "unit-bracket": message(
    "error",
    "A bracket in a unit is closed.",
    () => "This bracket is not closed; write the unit as in mol/(L s).",
  ),
  "unit-unknown": message(
    "error",
    "The symbol is not one of the units known: SI units with their prefixes and the trade's own (M, min, h, d, bar, atm, Torr, mmHg, °C, cal).",
    ({ text, near }: { text: string; near: string }) =>
      near === ""
        ? `${text} is not a known unit; units go by their symbols, such as mL, mol/L or s^-1.`
        : `${text} is not a known unit; write ${near}.`,
  ),
  "unit-prefix": message(
    "error",
    "Some units take no prefix: min, h, d, atm, mmHg, °C.",
    ({ text, unit }: { text: string; unit: string }) =>
      `${text} is not a known unit: ${unit} takes no such prefix. Write ${unit}, with the number that belongs to it.`,
  ),
  "unit-ambiguous": message(
    "error",
    "After a solidus stands one factor or a bracket, since a/b c could be a/(b c) or a c/b.",
    ({ text, first, second }: { text: string; first: string; second: string }) =>
      `${text} could be ${first} or ${second}; write the one you mean.`,
  ),
  "wrong-dimension": message(
    "error",
    "The unit is of another kind of quantity than this line states.",
    ({ name, kind, samples, given, givenKind }: Record<"name" | "kind" | "samples" | "given" | "givenKind", string>) =>
      `${name} needs ${kind} (${samples}); ${given} is ${givenKind}.`,
  ),
  "missing-unit": message(
    "error",
    "The number needs its unit, a zero too.",
    ({ name, kind, samples }: { name: string; kind: string; samples: string }) =>
      `${name} needs ${kind} (${samples}); a bare number has none.`,
  ),
  "unit-for-plain-number": message(
    "error",
    "This is a plain number without a unit.",
    ({ name, given, givenKind }: { name: string; given: string; givenKind: string }) =>
      `${name} is a plain number; ${given} is ${givenKind}.`,
  ),
  "coulomb-for-celsius": message(
    "error",
    "C alone is the coulomb; degrees Celsius are written °C or degC.",
    ({ name }: { name: string }) => `C is coulomb, a unit of charge; ${name} needs °C or K.`,
  ),
} as const;
