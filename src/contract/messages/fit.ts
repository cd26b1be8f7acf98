import { message } from "../message.js";

/** Problems that only the readings can show: signals, rates and fits. */
export const fitMessages = {
  "run-lacks-time": message<{ run: string; file: string }>(
    "error",
    "No column of a run is a time.",
    ({ run, file }) =>
      `Run ${run} has no column of time in ${file}. Declare it with its unit, for example: column t "time / s" s`,
  ),
  "run-times": message<{ run: string; column: string; others: string }>(
    "information",
    "Several columns of a run are times; the first counts.",
    ({ run, column, others }) => `Run ${run} counts time by column ${column}; ${others} is a time too and is not used.`,
  ),
  "column-lacks-unit": message<{ column: string; kind: string; samples: string }>(
    "error",
    "A column has no unit, neither in the header nor on its line.",
    ({ column, kind, samples }) =>
      `Column ${column} states no unit, neither in the header nor here; ${kind} needs one (${samples}).`,
  ),
  "signal-wrong-unit": message<{ column: string; unit: string; unitKind: string; monitor: string; samples: string }>(
    "error",
    "The column that is followed is of another kind than the signal it stands for.",
    ({ column, unit, unitKind, monitor, samples }) =>
      `Column ${column} is in ${unit}, ${unitKind}; ${monitor} needs another (${samples}). Follow another column, or correct its unit.`,
  ),
  "signal-needs-formula": message<{ column: string; unit: string; species: string }>(
    "error",
    "A mass concentration stands for an amount concentration, but the molar mass is not known.",
    ({ column, unit, species }) =>
      `Column ${column} is in ${unit}, mass per volume; without the formula of ${species} no concentration follows. Declare it: species ${species} is C4H8O2 (say).`,
  ),
  "uncertainty-wrong-unit": message<{ unit: string; column: string; columnUnit: string }>(
    "error",
    "The uncertainty of a column is in a unit of another kind than the column.",
    ({ unit, column, columnUnit }) =>
      `The uncertainty is in ${unit}, the readings of column ${column} are in ${columnUnit}. Give it in ${columnUnit}, or in %.`,
  ),
  "column-not-numbers": message<{ file: string; column: string; bad: number; rows: number }>(
    "error",
    "Most cells of a used column are not numbers, so nothing of it is used.",
    ({ file, column, bad, rows }) =>
      `${bad} of ${rows} cells of column ${column} in ${file} are not numbers, so none of it is used. Name the right column, or mend the file.`,
  ),
  "uncertainty-of-zero": message<{ column: string }>(
    "warning",
    "A relative uncertainty gives a reading of zero no uncertainty, so readings cannot be weighed by it.",
    ({ column }) =>
      `In per cent, a reading of zero in column ${column} would be exact, so the readings are weighed alike. State the uncertainty in the unit of the column.`,
  ),
  "rate-outside-readings": message<{ time: string; from: string; to: string }>(
    "error",
    "A rate is wanted at a time at which nothing was read.",
    ({ time, from, to }) =>
      `There is no reading at ${time}: the readings go from ${from} to ${to}. Choose a time between.`,
  ),
  "rate-few-readings": message<{ count: number; need: number }>(
    "warning",
    "Too few readings for a slope.",
    ({ count, need }) =>
      `${count} usable readings are too few for this rate; it takes ${need} at different times. Read more often.`,
  ),
  "rate-initial-late": message<{ share: string }>(
    "warning",
    "The readings that an initial rate has to use cover so much of the reaction that the rate comes out low.",
    ({ share }) =>
      `The first readings cover ${share} of the reaction, so the initial rate may be low by several per cent. Read more often at the beginning.`,
  ),
  "fit-refused": message<{ fit: string; reason: string; remedy: string }>(
    "warning",
    "The readings cannot give what a fit asks for; no number comes out that looks as if they could.",
    ({ fit, reason, remedy }) => `${fit} gives no rate constant: ${reason}. ${remedy}`,
  ),
  "fit-few-half-lives": message<{ halfLives: string; percent: string }>(
    "warning",
    "With a free infinity the readings must follow the reaction for some three half-lives.",
    ({ halfLives, percent }) =>
      `The readings follow the reaction for ${halfLives} half-lives only, so k and the free infinity can hardly be told apart (u(k) is ${percent}). Follow it longer, or state the infinity.`,
  ),
  "fit-very-few-half-lives": message<{ halfLives: string; percent: string }>(
    "warning",
    "With a free infinity and under two half-lives, the rate constant is hardly determined.",
    ({ halfLives, percent }) =>
      `Do not rely on this k alone: the readings follow the reaction for ${halfLives} half-lives, under two, and the infinity is free (u(k) is ${percent}). Follow it to three half-lives or more, or state the infinity.`,
  ),
  "fit-infinity-at-bound": message<{ limit: string }>(
    "warning",
    "A free infinity ran into what stoichiometry allows.",
    ({ limit }) =>
      `The free infinity ran to ${limit}, the furthest that what was taken allows, and was held there. Check what was taken, the unit of the column and the window.`,
  ),
  "fit-order-not-limiting": message<{ species: string; limiting: string }>(
    "warning",
    "The order is in a reactant that does not run out first, so the law cannot hold to the end.",
    ({ species, limiting }) =>
      `${limiting} runs out before ${species}, so order 1 in ${species} can hold only until then. End the window before that, or fit the order in ${limiting}.`,
  ),
  "fit-scatter-large": message<{ chiSquare: string }>(
    "warning",
    "The readings lie further off the curve than their stated random uncertainty allows.",
    ({ chiSquare }) =>
      `The readings lie further off the curve than their stated uncertainty allows (reduced χ² = ${chiSquare}), so u(k) is too small. Correct the random line, or look for a law that fits.`,
  ),
  "fit-scatter-small": message<{ chiSquare: string }>(
    "warning",
    "The readings lie nearer to the curve than their stated random uncertainty lets one expect.",
    ({ chiSquare }) =>
      `The readings lie nearer to the curve than their stated uncertainty lets one expect (reduced χ² = ${chiSquare}), so u(k) is too large. Correct the random line; what all readings share belongs in a common line.`,
  ),
  "exclude-nothing": message<{ file: string; what: string }>(
    "warning",
    "A line leaves readings out that are not there.",
    ({ file, what }) =>
      `No reading of ${file} stands in ${what}, so nothing is left out. Count lines as an editor does, and times as the file gives them.`,
  ),
  "time-zero-late": message<Record<string, never>>(
    "error",
    "Time zero lies behind all readings.",
    () => "Time zero lies behind the last reading, so no reading is left. It is a time of the file: correct it.",
  ),
  "readings-before-zero": message<{ count: number }>(
    "information",
    "Readings before time zero are not used.",
    ({ count }) =>
      count === 1
        ? "One reading stands before time zero and is not used."
        : `${count} readings stand before time zero and are not used.`,
  ),
  "time-zero-far": message<{ first: string }>(
    "warning",
    "The readings begin longer after time zero than they last.",
    ({ first }) =>
      `The readings begin at ${first}, longer after time zero than they last; the start and the conversion are carried far back. If the reaction began later, say so below the data line: time zero, with that time of the file.`,
  ),
  "fit-end-differs": message<{ end: string; found: string; expected: string }>(
    "warning",
    "A start or infinity is not what was taken gives.",
    ({ end, found, expected }) =>
      `The ${end} is ${found}, but what was taken gives ${expected}. Check the units of the column and of what was taken, the blank and the volume.`,
  ),
  "fit-residuals-run": message<{ p: string }>(
    "warning",
    "The residuals keep their sign for too long: the curve does not follow the readings.",
    ({ p }) =>
      `The residuals change sign too seldom for chance (runs test, p = ${p}): the law does not follow the readings, or they drift. The stated uncertainty of k is then too small. Look at the residuals; another law or another window may fit.`,
  ),
  "fit-end-unknown": message<{ end: string; species: string; missing: string }>(
    "error",
    "A start or infinity is fixed by what was taken, but that does not follow.",
    ({ end, species, missing }) =>
      `The ${end} of ${species} does not follow from what was taken: ${missing}. State its value, or write: ${end} free`,
  ),
  "fit-end-wrong-unit": message<{ end: string; unit: string; column: string; columnUnit: string }>(
    "error",
    "A fixed start or infinity is in a unit of another kind than the signal.",
    ({ end, unit, column, columnUnit }) =>
      `The ${end} is in ${unit === "" ? "no unit" : unit}, the readings of column ${column} are in ${columnUnit}. Give it in ${columnUnit}.`,
  ),
  "gas-lacks-collected": message<Record<string, never>>(
    "error",
    "The amount of a collected gas needs the temperature of the burette and whether the gas is wet.",
    () =>
      "How was the gas collected, and at what temperature of the burette? Add below the follow line: collected wet at 22.0 °C, or: collected dried at 22.0 °C",
  ),
  "gas-lacks-barometer": message<Record<string, never>>(
    "error",
    "The amount of a collected gas needs the barometric pressure.",
    () => "The amount of gas needs the pressure of the day. Add below the follow line: barometer 101.3 kPa",
  ),
  "gas-lacks-volume": message<{ run: string }>(
    "error",
    "A rate per volume needs the volume of the mixture the gas comes from.",
    ({ run }) =>
      `The rate is counted per volume of mixture, and run ${run} does not state it. Add a line: volume 50.00 mL`,
  ),
  "gas-no-pressure": message<Record<string, never>>(
    "error",
    "At this pressure and temperature of the burette nothing is left for the gas beside water vapour.",
    () =>
      "Beside water vapour no pressure is left for the gas at this temperature of the burette. Check barometer, temperature and level difference.",
  ),
  "gas-dissolves": message<{ gas: string; percent: string }>(
    "warning",
    "A part of the gas stays dissolved in the mixture and is not collected.",
    ({ gas, percent }) =>
      `About ${percent} of what is collected of ${gas} may stay dissolved in the mixture (Henry's law): rates and amounts come out low by as much. Stir well, use less liquid, or saturate it with the gas first.`,
  ),
  "not-computed-yet": message<{ what: string }>(
    "information",
    "A part of a description that is read and kept but that nothing computes yet.",
    ({ what }) => `${what} is understood and kept; not computed yet.`,
  ),
} as const;
