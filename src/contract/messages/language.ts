import { message } from "../message.js";

export const languageMessages = {
  "word-unknown": message(
    "error",
    "A line begins with a word the language does not have there.",
    ({ word, allowed }: { word: string; allowed: string }) =>
      `“${word}” begins no line here. A line here begins with ${allowed}.`,
  ),
  "keyword-capitals": message(
    "error",
    "Keywords of the language are written in small letters.",
    ({ word }: { word: string }) => `Keywords are written small: ${word}.`,
  ),
  "line-incomplete": message(
    "error",
    "A line ends before everything it needs is there.",
    ({ before, wanted, example }: { before: string; wanted: string; example: string }) =>
      `After “${before}” ${wanted} is missing. For example: ${example}`,
  ),
  "line-unexpected": message(
    "error",
    "Something stands on a line where something else was expected.",
    ({ found, before, wanted }: { found: string; before: string; wanted: string }) =>
      `“${found}” is not understood after “${before}”; ${wanted} is expected there.`,
  ),
  "line-left-over": message(
    "error",
    "A line goes on where it should end.",
    ({ found, example }: { found: string; example: string }) =>
      `The line should end before “${found}”. One line holds one fact, for example: ${example}`,
  ),
  "line-break-missing": message(
    "error",
    "Two facts stand on one line.",
    ({ word }: { word: string }) => `Start a new line before “${word}”.`,
  ),
  "line-misplaced": message(
    "error",
    "A line stands where nothing takes it.",
    ({ head, owner }: { head: string; owner: string }) =>
      `“${head}” belongs below ${/^[aeiou]/.test(owner) ? "an" : "a"} ${owner} line, and there is none above it that could take it. Move it below one.`,
  ),
  "line-twice": message(
    "error",
    "A fact is stated twice in one place.",
    ({ what, line }: { what: string; line: number }) =>
      `${what} is stated twice here; it already stands on line ${line}. Keep one of the two.`,
  ),
  "string-open": message(
    "error",
    "A quotation mark is not closed on its line.",
    (_: Record<string, never>) => "The quotation mark is not closed. Text in quotes ends on the line where it begins.",
  ),
  "format-refused": message(
    "error",
    "A description was not formatted, because that would have changed what it says.",
    ({ line }: { line: number }) =>
      `Formatting would change the meaning of line ${line}, so nothing was changed. The text can stay as it is.`,
  ),
  "name-malformed": message(
    "error",
    "A name holds a character that names cannot have, or is one of the language's connecting words.",
    ({ name, what }: { name: string; what: string }) =>
      `“${name}” cannot be the name of a ${what}. Names are made of letters, digits, _, - and ′, and are none of the words in, from, as, at, to, of, is, by, like, using, and, with, after, within, reads, purity, density, giving.`,
  ),
  "name-twice": message(
    "error",
    "A name is declared twice.",
    ({ what, name, line }: { what: string; name: string; line: number }) =>
      `There is already a ${what} ${name}, on line ${line}. Give this one another name.`,
  ),
  "name-unknown": message(
    "error",
    "A line refers to a name that nothing declares.",
    ({ what, name, known }: { what: string; name: string; known: string }) =>
      `There is no ${what} ${name} here${known}.`,
  ),
  "date-malformed": message(
    "error",
    "Dates are written year first.",
    ({ found }: { found: string }) => `“${found}” is not a date. Dates are written year-month-day, as in 2026-11-03.`,
  ),
  "version-unknown": message(
    "error",
    "The description asks for a version of the language that this program does not know.",
    ({ version }: { version: string }) =>
      `This program reads version 1 of the language, not ${version}. Write: ratewright 1`,
  ),
  "version-not-first": message(
    "error",
    "The version of the language stands on the first line or nowhere.",
    (_: Record<string, never>) => "“ratewright 1” is the first line of a description. Move it to the top.",
  ),
  "number-below-zero": message(
    "error",
    "A quantity is negative, or zero, that cannot be.",
    ({ what, limit }: { what: string; limit: string }) => `${what} must be ${limit}.`,
  ),
  "share-of-what": message(
    "error",
    "A share of a mixture could be by mass, by amount or by volume.",
    ({ share }: { share: string }) =>
      `${share} of what: by mass, by amount or by volume? Say it, with the density where it is needed, as in 30 % by mass density 1.11 g/mL.`,
  ),
  "order-in-words": message(
    "error",
    "The order of a reaction is given as a number, and in one species.",
    ({ example }: { example: string }) => `Give the order as a number and say in what: ${example}.`,
  ),
  "like-itself": message(
    "error",
    "A run starts like itself.",
    ({ run }: { run: string }) => `Run ${run} cannot start like itself. Name a run above it.`,
  ),
  "like-later": message(
    "error",
    "A run starts like one that stands below it.",
    ({ run, like }: { run: string; like: string }) =>
      `Run ${like} stands below run ${run}; a run can only start like one above it. Move run ${like} up.`,
  ),
  "run-lacks-data": message(
    "error",
    "A run follows a column but names no data file.",
    ({ run }: { run: string }) =>
      `Run ${run} has no data line, so there is no column to follow. Add: data "data/${run}.csv"`,
  ),
  "run-lacks-follow": message(
    "error",
    "A rate or a fit is wanted of a run that follows nothing.",
    ({ run, example }: { run: string; example: string }) =>
      `Run ${run} does not say what was followed, so no rate can come out. Add: ${example}`,
  ),
  "run-lacks-reaction": message(
    "error",
    "A run follows a species but no reaction is given.",
    ({ run }: { run: string }) =>
      `Run ${run} has no reaction to follow. Write one above the first run, for example: reaction 2 H2O2 -> 2 H2O + O2`,
  ),
  "run-lacks-volume": message(
    "error",
    "An amount or a mass was taken, but without the volume no concentration follows from it.",
    ({ run, species }: { run: string; species: string }) =>
      `Run ${run} gives ${species} as an amount or a mass, but not the volume it was made up to. Add a line: volume 50.00 mL`,
  ),
  "run-lacks-temperature": message(
    "information",
    "A rate constant is wanted of a run whose temperature is not stated.",
    ({ run }: { run: string }) =>
      `Run ${run} states no temperature; a rate constant belongs to one. Add a line: temperature 25.0 °C`,
  ),
  "run-wants-nothing": message(
    "information",
    "A run follows a signal but asks for no rate and no fit.",
    ({ run }: { run: string }) =>
      `Nothing is wanted of run ${run} yet. Add a line such as: rate initial, or: fit order 1 in A`,
  ),
  "taken-needs-formula": message(
    "error",
    "A mass stands for an amount, but the molar mass is not known.",
    ({ species }: { species: string }) =>
      `The amount of ${species} does not follow from its mass without its formula. Declare it (species ${species} is C4H8O2, say), or give an amount or a concentration.`,
  ),
  "taken-volume-of-what": message(
    "error",
    "A volume was taken, but not of what strength.",
    ({ species, volume }: { species: string; volume: string }) =>
      `${volume} of ${species} of what strength? Add it, for example: ${volume} of 0.500 mol/L, or: ${volume} of 30 % by mass density 1.11 g/mL`,
  ),
  "taken-part-unused": message(
    "warning",
    "A purity or a density stands where nothing follows from it.",
    ({ part, belongs }: { part: string; belongs: string }) =>
      `“${part}” changes nothing here: it belongs to ${belongs}. Take it out, or give what was taken that way.`,
  ),
  "number-with-uncertainty": message(
    "error",
    "A plain number of a law carries no uncertainty.",
    ({ text, number }: { text: string; number: string }) =>
      `${text} carries an uncertainty that counts nowhere. Write ${number}.`,
  ),
  "stock-without-volume": message(
    "error",
    "The strength of a stock stands behind something that is no volume.",
    ({ stock }: { stock: string }) =>
      `“of ${stock}” says the strength of a stock, so a volume stands before it: 10.0 mL of ${stock}.`,
  ),
  "taken-takes-no-part": message(
    "information",
    "Something was put in that does not stand in the reaction and has no role.",
    ({ species }: { species: string }) =>
      `${species} takes no part in the reaction as it is written. Say what it is there for: as catalyst, as inert or as buffer.`,
  ),
  "formula-left-over": message(
    "error",
    "Something follows a species without a space.",
    ({ formula, rest }: { formula: string; rest: string }) =>
      `“${rest}” behind ${formula} is not part of a formula. Put a space between, or correct the formula.`,
  ),
  "balance-unchecked": message(
    "information",
    "The balance of a reaction is checked only where every species has a formula.",
    ({ species }: { species: string }) =>
      `The balance is not checked, since no formula is known of ${species}. Give it on its species line: species dye is C25H30N3Cl, say.`,
  ),
  "follow-not-in-reaction": message(
    "error",
    "The species that is followed does not stand in the reaction.",
    ({ species, there }: { species: string; there: string }) =>
      `${species} takes no part in the reaction, so its concentration tells nothing about it. Follow one of ${there}.`,
  ),
  "follow-blind": message(
    "error",
    "The species that is followed comes out of the reaction as it went in.",
    ({ species }: { species: string }) =>
      `The reaction neither uses up nor forms ${species} on balance: its concentration cannot show the reaction. Follow another species.`,
  ),
  "fit-not-in-reaction": message(
    "error",
    "A rate law is wanted in a species that the reaction does not use up.",
    ({ species, there }: { species: string; there: string }) =>
      `The reaction does not use up ${species}, so no order in it can be fitted to this run. Fit the order in ${there}.`,
  ),
  "fit-not-computed": message(
    "information",
    "A rate law is written that is not computed yet.",
    ({ law }: { law: string }) => `“${law}” is understood and kept; not computed yet. Order 1 is.`,
  ),
  "results-units": message(
    "error",
    "The units of the results are one of concentration and one of time.",
    (_: Record<string, never>) => "Results come out in a unit of concentration and one of time: results in mmol/L, min",
  ),
  "header-outside-table": message(
    "error",
    "A value is taken from a column of a table of runs, but the line stands in none.",
    ({ header }: { header: string }) =>
      `from “${header}” takes a value from a table of runs, so it stands below a line rows of "…" like A. Write the value itself here.`,
  ),
  "blank-ambiguous": message(
    "error",
    "A bare blank line belongs to the one signal that is followed, but several are.",
    ({ count }: { count: number }) =>
      count === 0
        ? "No signal is followed here that the blank could belong to. Write it below a follow line."
        : `${count} signals are followed here, and the blank could belong to each. Write it below the follow line it belongs to.`,
  ),
  "span-empty": message(
    "error",
    "A time span ends before it begins.",
    ({ from, to }: { from: string; to: string }) =>
      `The span from ${from} to ${to} is empty: the later time comes second.`,
  ),
} as const;
