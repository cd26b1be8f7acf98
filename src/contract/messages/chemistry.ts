import { message } from "../message.js";

/** Problems of formulas, species and equations. */
export const chemistryMessages = {
  "formula-expected": message(
    "error",
    "A formula or the name of a declared species stands here.",
    ({ text }: { text: string }) =>
      `A species is expected here, such as H2O2 or SO4^2-${text === "" ? "" : `; ${text} is not one`}.`,
  ),
  "species-unknown": message(
    "error",
    "A formula is made of the symbols of the elements; a species that goes by a name is declared with a species line.",
    ({ word, symbol, near }: { word: string; symbol: string; near: string }) => {
      const said = word === symbol ? `${word} is no formula` : `${word} is no formula, since ${symbol} is no element`;
      return near === "" ? `${said}; a name is declared first: species ${word}.` : `${said}; write ${near}.`;
    },
  ),
  "formula-bracket": message(
    "error",
    "Every bracket of a formula is closed by one of its own kind and holds something.",
    ({ bracket }: { bracket: string }) =>
      `The bracket ${bracket} of this formula is not closed by its partner, or holds nothing. Close it, or take it out.`,
  ),
  "formula-count": message(
    "error",
    "Counts in a formula are whole numbers from 1 to 99999.",
    ({ count }: { count: string }) =>
      `A formula cannot count ${count} atoms; counts are whole numbers from 1 to 99999.`,
  ),
  "hydrate-not-whole": message(
    "error",
    "Counts in a formula are whole: a hemihydrate is written as two formula units with one water.",
    ({ text, mend }: { text: string; mend: string }) =>
      `Counts in a formula are whole numbers: write ${mend === "" ? "a multiple of it" : mend} for ${text}.`,
  ),
  "formula-too-deep": message(
    "error",
    "Brackets of a formula stand at most ten deep.",
    () => "The brackets of this formula stand more than ten deep. Write it with fewer, or give it a name: species dye.",
  ),
  "charge-unreadable": message(
    "error",
    "A charge is written ^2-, ^+ or with raised signs.",
    ({ body }: { body: string }) => `After ^ a charge is expected, as in ${body}^2- or ${body}^+.`,
  ),
  "charge-ambiguous": message(
    "error",
    "A digit before a bare sign could be the size of the charge or a count; ^ tells them apart.",
    ({ text, first, second }: { text: string; first: string; second: string }) =>
      `${text} could be ${first}, or ${second}.`,
  ),
  "state-unknown": message(
    "error",
    "States are (s), (l), (g) and (aq).",
    ({ state }: { state: string }) => `(${state}) is not a state; states are (s), (l), (g) and (aq).`,
  ),
  "coefficient-not-whole": message(
    "error",
    "Coefficients are whole numbers or fractions such as 1/2.",
    ({ text, mend }: { text: string; mend: string }) =>
      mend === ""
        ? `${text} cannot be a coefficient; write a whole number or a fraction, as 1/2.`
        : `Coefficients are whole numbers or fractions: write ${mend} for ${text}.`,
  ),
  "equation-no-arrow": message(
    "error",
    "An equation has an arrow between its sides.",
    () => "An equation needs an arrow: -> for a reaction that goes one way, <=> for one that goes back.",
  ),
  "equation-equals": message(
    "error",
    "The arrow says whether the reaction goes back; an equals sign does not.",
    () => "= does not say whether the reaction goes back.",
  ),
  "equation-arrow": message(
    "error",
    "The arrows are -> and <=>.",
    ({ arrow, mend }: { arrow: string; mend: string }) => `${arrow} is not an arrow of equations; write ${mend}.`,
  ),
  "equation-two-arrows": message(
    "error",
    "An equation has one arrow.",
    () => "This equation has more than one arrow; give each reaction a line of its own.",
  ),
  "equation-side": message(
    "error",
    "Species stand on both sides of the arrow.",
    ({ side, example }: { side: string; example: string }) =>
      `Nothing stands on the ${side} of the arrow; an equation reads as ${example}.`,
  ),
  "equation-term": message(
    "error",
    "A species stands on each side of a plus.",
    () => "A species is expected beside this +.",
  ),
  "equation-plus": message(
    "error",
    "Species of one side are joined by +.",
    ({ text }: { text: string }) => `Between species stands a +; “${text}” cannot follow here.`,
  ),
  unbalanced: message(
    "error",
    "Each element and the charge must be the same on both sides.",
    ({ facts }: { facts: string }) => facts,
  ),
  "no-balance": message(
    "error",
    "No positive coefficients balance this equation: something is missing, or a formula is wrong.",
    ({ facts }: { facts: string }) =>
      `${facts} No coefficients balance these species; one is missing, or a formula is wrong.`,
  ),
  "many-balances": message(
    "error",
    "Several sets of coefficients balance this equation; the one that happens must be written out.",
    ({ facts }: { facts: string }) =>
      `${facts} More than one set of coefficients would do, so this is a sum of reactions: write the coefficients you mean.`,
  ),
  "share-beyond-whole": message(
    "error",
    "A share of a mixture lies between 0 and 100 %.",
    ({ share }: { share: string }) => `A share lies between 0 and 100 %; ${share} cannot be one.`,
  ),
  "stock-needs-molar-mass": message(
    "error",
    "To turn a mass into an amount the molar mass is needed: of a formula, or stated under the species.",
    ({ what, species }: { what: string; species: string }) =>
      `${what} needs the molar mass of ${species}: declare species ${species} with its formula or its molar mass.`,
  ),
  "stock-needs-density": message(
    "error",
    "To turn a share by mass or by amount into a concentration the density of the solution is needed.",
    ({ what, species }: { what: string; species: string }) =>
      `A solution of ${species}, ${what}, needs its density: add it to the line, as in density 1.11 g/mL.`,
  ),
  "stock-needs-pure-density": message(
    "error",
    "A share by volume is the volume of the pure substance in that of the solution; its density is not known here.",
    ({ what, species }: { what: string; species: string }) =>
      `${what} needs the density of pure ${species}, which is not known here: give the share by mass with the density of the solution, or its concentration.`,
  ),
  "stock-needs-solvent": message(
    "error",
    "A share by amount becomes a concentration only where it is known what the rest of the solution is.",
    ({ what, species }: { what: string; species: string }) =>
      `${what} of ${species} needs the molar mass of what it is dissolved in: give the share by mass with the density of the solution, or its concentration.`,
  ),
} as const;
