import { isObject } from "./shape.js";

/**
 * A value as JSON, one fact a line: what holds only numbers, words and lists of them stands on one line; all else has
 * a line for each of its parts. Keys keep their order; lines end in LF, the last one too.
 */
export function layOut(value: unknown): string {
  return `${laidOut(value, "")}\n`;
}

function laidOut(value: unknown, indent: string): string {
  if (isFact(value)) return oneLine(value);
  const inner = `${indent}  `;
  if (Array.isArray(value))
    return block(
      "[",
      value.map((entry) => laidOut(entry, inner)),
      "]",
      indent,
    );
  if (!isObject(value)) return oneLine(value);
  return block(
    "{",
    Object.entries(value).map(([key, entry]) => `${JSON.stringify(key)}: ${laidOut(entry, inner)}`),
    "}",
    indent,
  );
}

function block(begin: string, parts: readonly string[], end: string, indent: string): string {
  return `${begin}\n${parts.map((part) => `${indent}  ${part}`).join(",\n")}\n${indent}${end}`;
}

/** Whether a value stands on one line: an object that says what it is about, a list without objects, anything plain. */
function isFact(value: unknown): boolean {
  if (Array.isArray(value)) return value.every((entry) => !Array.isArray(entry) && !isObject(entry));
  return !isObject(value) || "what" in value;
}

function oneLine(value: unknown): string {
  if (Array.isArray(value)) return `[${value.map(oneLine).join(", ")}]`;
  if (!isObject(value)) return JSON.stringify(value);
  const parts = Object.entries(value).map(([key, entry]) => `${JSON.stringify(key)}: ${oneLine(entry)}`);
  return `{ ${parts.join(", ")} }`;
}
