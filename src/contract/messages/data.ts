import { message } from "../message.js";

/** The reason a reader gives when a file was written to during each attempt to read it. */
export const changedWhileRead = "changed while being read";

/**
 * What can be wrong with a data file. Each says what, where (file, line as an editor counts, column by its header) and
 * how to mend it. What leaves points out is a warning; what stops the use of the file is an error.
 */
export const dataMessages = {
  "data-missing": message<{ file: string }>(
    "error",
    "The data file that the description names is not there. Paths count from the folder of the description.",
    ({ file }) =>
      `There is no file ${file}. The path counts from the folder of this description: correct it, or put the file there.`,
  ),
  "data-folder": message<{ file: string }>(
    "error",
    "The path of a data line leads to a folder, not to a file.",
    ({ file }) => `${file} is a folder. Name the data file in it.`,
  ),
  "data-too-large": message<{ file: string; size: string; limit: string }>(
    "error",
    "The data file is larger than the limit that the settings give; it is not read at all.",
    ({ file, size, limit }) =>
      `${file} has ${size}, more than the ${limit} allowed. Keep fewer readings in it, or raise the limit in the settings.`,
  ),
  "data-unreadable": message<{ file: string; reason: string }>(
    "error",
    "The data file is there but the system does not let it be read.",
    ({ file, reason }) =>
      `${file} cannot be read: ${reason}. Check who may read it, and whether another program holds it.`,
  ),
  "data-changed-while-read": message<{ file: string }>(
    "error",
    "The data file was written to while it was being read, twice in a row; nothing of it is used.",
    ({ file }) =>
      `${file} changed while it was being read. Wait until the instrument has finished writing, then try again.`,
  ),
  "data-path-absolute": message<{ path: string }>(
    "error",
    "A data path is written relative to the description, so that it holds on another machine.",
    ({ path }) =>
      `${path} is a path of one machine. Write it as seen from the folder of this description, for example data/a.csv.`,
  ),
  "data-path-backslash": message<{ path: string; mended: string }>(
    "error",
    "Data paths are written with / on every system.",
    ({ path, mended }) => `Paths are written with /: ${mended} in place of ${path}.`,
  ),
  "data-path-leaves": message<{ path: string }>(
    "error",
    "A data path climbs out of the opened folder, which is refused.",
    ({ path }) => `${path} leads out of the opened folder. Keep the data file inside it.`,
  ),
  "data-path-unsaved": message<{ path: string }>(
    "error",
    "A description that was never saved has no folder that a data path could count from.",
    ({ path }) => `${path} counts from the folder of this description, which is not saved yet. Save it first.`,
  ),
  "data-path-empty": message<Record<string, never>>(
    "error",
    "A data line without a path.",
    () => "The path is empty. Name the data file, for example data/a.csv.",
  ),
  "data-not-text": message<{ file: string; line: number }>(
    "error",
    "The data file holds bytes that no text has: it is a workbook, a picture, a damaged file or in an unknown encoding.",
    ({ file, line }) =>
      `${file} is not a text file (line ${line} holds bytes that no text has). Save the readings as text, for example as CSV in UTF-8.`,
  ),
  "data-encoding-unknown": message<{ file: string; encoding: string }>(
    "error",
    "The encoding line names an encoding that is not known.",
    ({ file, encoding }) =>
      `No encoding is called ${encoding}, so ${file} is not read. Usual ones are utf-8, utf-16le and windows-1252.`,
  ),
  "data-encoding-wrong": message<{ file: string; encoding: string }>(
    "error",
    "The data file holds bytes that the stated encoding does not have.",
    ({ file, encoding }) => `${file} is not written in ${encoding}. Leave the encoding out, or state the right one.`,
  ),
  "data-empty": message<{ file: string }>(
    "error",
    "The data file has no line with anything in it.",
    ({ file }) => `${file} is empty. Check that the instrument saved its readings.`,
  ),
  "data-no-rows": message<{ file: string; line: number }>(
    "error",
    "The data file has a header row and nothing under it.",
    ({ file, line }) =>
      `${file} has headers in line ${line} but no readings under them. Check that the instrument saved its readings.`,
  ),
  "data-no-header": message<{ file: string; header: string }>(
    "error",
    "A column is named by its header, but the file has no header row.",
    ({ file, header }) =>
      `${file} has no header row, so no column is called “${header}”. Give the column by its number, counted from 1.`,
  ),
  "data-column-missing": message<{ file: string; header: string; headers: string; line: number }>(
    "error",
    "No column of the data file has the header that the description names.",
    ({ file, header, headers, line }) =>
      `${file} has no column “${header}”. Its headers, in line ${line}, are ${headers}.`,
  ),
  "data-column-twice": message<{ file: string; header: string; line: number; numbers: string }>(
    "error",
    "More than one column of the data file has the header that the description names.",
    ({ file, header, line, numbers }) =>
      `${file} has the header “${header}” more than once in line ${line}. Give the column by its number: ${numbers}.`,
  ),
  "data-column-number": message<{ file: string; number: number; columns: number }>(
    "error",
    "The description asks for a column number that the data file does not have.",
    ({ file, number, columns }) =>
      `${file} has no column ${number}: it has ${columns === 1 ? "one column" : `${columns} columns`}, counted from 1.`,
  ),
  "data-cell-empty": message<{ file: string; line: number; header: string; count: number }>(
    "warning",
    "Cells of a used column are empty; their points are left out.",
    ({ file, line, header, count }) =>
      count === 1
        ? `${file}, line ${line}: the cell of ${header} is empty. The point is left out.`
        : `${file}, line ${line}: the cell of ${header} is empty, and so ${others(count)}. These points are left out.`,
  ),
  "data-cell-word": message<{ file: string; line: number; header: string; text: string; count: number }>(
    "warning",
    "Cells of a used column hold something that is not a number; their points are left out.",
    ({ file, line, header, text, count }) =>
      count === 1
        ? `${file}, line ${line}: “${text}” under ${header} is not a number. The point is left out.`
        : `${file}, line ${line}: “${text}” under ${header} is not a number, nor ${others(count)}. These points are left out.`,
  ),
  "data-thousands-mark": message<{ file: string; line: number; header: string; text: string; count: number }>(
    "warning",
    "A number is written with a mark between its thousands. Such a mark is never guessed away; the point is left out.",
    ({ file, line, header, text, count }) =>
      count === 1
        ? `${file}, line ${line}: “${text}” under ${header} has a mark between its thousands. Write it without one; until then the point is left out.`
        : `${file}, line ${line}: “${text}” under ${header} has a mark between its thousands, and so ${have(count)}. Write them without one; until then these points are left out.`,
  ),
  "data-date-order": message<{ file: string; line: number; header: string; text: string; count: number }>(
    "error",
    "Dates that begin with the day or the month, of which it is not certain which. They are used only where all are the same day, or where a number above 12 shows the order.",
    ({ file, line, header, text, count }) =>
      `${file}, line ${line}: “${text}” under ${header} is another day than the first, and nothing shows whether day or month stands in front. Write dates with the year first, as 2026-11-03; until then ${count === 1 ? "the point is" : `${count} points are`} left out.`,
  ),
  "data-clock-parts": message<{ file: string; line: number; header: string; text: string }>(
    "error",
    "A time of two numbers such as 1:30 can be hours and minutes or minutes and seconds; it is not guessed.",
    ({ file, line, header, text }) =>
      `${file}, line ${line}: “${text}” under ${header} can be hours and minutes or minutes and seconds. Write (mm:ss) or (hh:mm) in the header, or all three numbers, as 00:01:30.`,
  ),
  "data-cell-time": message<{
    file: string;
    line: number;
    header: string;
    text: string;
    count: number;
    start: string;
  }>(
    "warning",
    "Cells of a column of dates or clock times hold no such time; their points are left out.",
    ({ file, line, header, text, count, start }) =>
      `${file}, line ${line}: “${text}” under ${header} is not a time written like ${start}${count === 1 ? ". The point is left out." : `, nor ${others(count)}. These points are left out.`}`,
  ),
  "data-time-offset": message<{
    file: string;
    line: number;
    header: string;
    text: string;
    count: number;
    start: string;
  }>(
    "warning",
    "Some times of a column state their offset from UTC (Z, +01:00) and others do not, so that they cannot be compared.",
    ({ file, line, header, text, count, start }) =>
      `${file}, line ${line}: “${text}” under ${header} cannot be compared with the first time, “${start}”: only one of them states its offset from UTC. Write all with it or all without; until then ${count === 1 ? "the point is" : `${count} points are`} left out.`,
  ),
  "data-midnight-passed": message<{ file: string; line: number; header: string; after: string; count: number }>(
    "information",
    "A clock time is more than twelve hours lower than the one before; this is taken for midnight.",
    ({ file, line, header, after, count }) =>
      `${file}, line ${line}: ${header} falls to ${after}, which is taken for the next day${count === 1 ? "" : `; this happens ${count} times`}. If it is not, keep the two runs in two files.`,
  ),
  "data-row-short": message<{ file: string; line: number; header: string; count: number }>(
    "warning",
    "Rows end before a used column; their points are left out.",
    ({ file, line, header, count }) =>
      count === 1
        ? `${file}, line ${line}: the row ends before ${header}. The point is left out.`
        : `${file}, line ${line}: the row ends before ${header}, and so ${count === 2 ? "does one other" : `do ${count - 1} others`}. These points are left out.`,
  ),
  "data-row-long": message<{ file: string; line: number; text: string; columns: number; count: number }>(
    "warning",
    "Rows have more cells than the file has columns: a comma inside a number or a text without quotes is the usual cause.",
    ({ file, line, text, columns, count }) =>
      `${file}, line ${line}: the row has more cells than the ${columns} columns${count === 1 ? "" : `, and so ${have(count)}`}; the first too many is “${text}”. Look for a separator inside a number or a text.`,
  ),
  "data-time-backwards": message<{ file: string; line: number; header: string; before: string; after: string }>(
    "error",
    "Time must not run backwards from one row to the next.",
    ({ file, line, header, before, after }) =>
      `${file}, line ${line}: ${header} runs backwards, from ${before} to ${after}. Put the rows in order, or keep two runs in two files.`,
  ),
  "data-time-twice": message<{ file: string; line: number; header: string; time: string; count: number }>(
    "information",
    "Several readings stand at the same time; all of them are used.",
    ({ file, line, header, time, count }) =>
      count === 1
        ? `${file}, line ${line}: ${header} is ${time} as in the row before. Both readings are used.`
        : `${file}, line ${line}: ${header} is ${time} as in the row before; this happens in ${count} rows. All readings are used.`,
  ),
  "data-unit-differs": message<{ file: string; line: number; header: string; there: string; here: string }>(
    "error",
    "The header of the data file states another unit than the column line of the description.",
    ({ file, line, header, there, here }) =>
      `The header “${header}” (${file}, line ${line}) says ${there}, this line says ${here}. Write ${there} here, or correct the file.`,
  ),
  "data-unit-unread": message<{ file: string; line: number; header: string; unit: string }>(
    "warning",
    "What stands beside the name in a header could not be read as a unit.",
    ({ file, line, header, unit }) =>
      `The header “${header}” (${file}, line ${line}) ends in “${unit}”, which is not a known unit. State the unit on this line.`,
  ),
  "data-decimal-comma": message<{ file: string; line: number; header: string; text: string }>(
    "error",
    "Numbers with a decimal comma in a file that is read with a decimal point.",
    ({ file, line, header, text }) =>
      `${file}, line ${line}: “${text}” under ${header} has a comma where this file is read with a decimal point. If it is a decimal comma, write “decimal comma” under the data line.`,
  ),
  "data-decimal-point": message<{ file: string; line: number; header: string; text: string }>(
    "error",
    "Numbers with a decimal point in a file that is read with a decimal comma.",
    ({ file, line, header, text }) =>
      `${file}, line ${line}: “${text}” under ${header} has a point where this file is read with a decimal comma. Write all numbers of the file with the same mark.`,
  ),
  "data-quote-open": message<{ file: string; line: number }>(
    "error",
    "A quote is opened and never closed, so the rest of the file would be one cell.",
    ({ file, line }) => `${file}, line ${line}: a quote (") opens here and is never closed. Close it or take it out.`,
  ),
  "data-quote-stray": message<{ file: string; line: number }>(
    "error",
    "Something follows a closing quote where the separator should stand.",
    ({ file, line }) =>
      `${file}, line ${line}: something stands between a closing quote (") and the next separator. Take it out, or write quotes inside a text twice ("").`,
  ),
  "data-line-too-long": message<{ file: string; line: number; limit: number }>(
    "error",
    "A line of the data file is longer than the limit.",
    ({ file, line, limit }) =>
      `${file}, line ${line} has more than ${limit} characters. Check that the file has line ends and is a table of readings.`,
  ),
  "data-too-many-rows": message<{ file: string; limit: number }>(
    "error",
    "The data file has more rows than the limit.",
    ({ file, limit }) => `${file} has more than ${limit} rows. Keep fewer readings, for example every tenth.`,
  ),
  "data-too-many-columns": message<{ file: string; line: number; limit: number }>(
    "error",
    "The data file has more columns than the limit.",
    ({ file, line, limit }) =>
      `${file}, line ${line} has more than ${limit} columns. Keep the columns that are used, with time running down the rows.`,
  ),
} as const;

function have(count: number): string {
  return count === 2 ? "has one other" : `have ${count - 1} others`;
}

function others(count: number): string {
  return count === 2 ? "is one other" : `are ${count - 1} others`;
}
