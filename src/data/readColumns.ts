import { parseHeaderUnit } from "../quantity/headerUnit.js";
import type { DataOptions, DataReading } from "./dataOptions.js";
import { readTable } from "./readTable.js";

/**
 * Reads a delimited text file: encoding, delimiter, decimal mark, header row and units are found out where the options
 * do not state them. Pure and synchronous; polls `options.stopped`. Values stay in the unit the file states, one typed
 * array a column; NaN stands for a cell without a number, and each such cell is a fault. Refuses what is no text, what
 * is empty, quotes that do not match and what is beyond the limits. Never throws.
 */
export function readColumns(bytes: Uint8Array, options: DataOptions = {}): DataReading {
  return readTable(bytes, options, parseHeaderUnit);
}
