import { isObject } from "./shape.js";

/**
 * A value as JSON, one fact a line: an object that says what it is about stands on one line; all else has a line for
 * each of its parts, an empty list too, so that a first entry adds a line and changes none. Keys keep their order;
 * lines end in LF, the last one too.
 */
export function layOut(value: unknown): string {
  return `${laidOut(value, "")}\n`;
}

function laidOut(value: unknown, indent: string): string {
  const inner = `${indent}  `;
  if (Array.isArray(value)) {
    return block(
      "[",
      value.map((entry) => laidOut(entry, inner)),
      "]",
      indent,
    );
  }
  if (!isObject(value) || "what" in value) return oneLine(value);
  return block(
    "{",
    Object.entries(value).map(([key, entry]) => `${JSON.stringify(key)}: ${laidOut(entry, inner)}`),
    "}",
    indent,
  );
}

function block(begin: string, parts: readonly string[], end: string, indent: string): string {
  return [
    begin,
    ...parts.map((part, at) => `${indent}  ${part}${at < parts.length - 1 ? "," : ""}`),
    indent + end,
  ].join("\n");
}

function oneLine(value: unknown): string {
  if (Array.isArray(value)) return `[${value.map(oneLine).join(", ")}]`;
  if (!isObject(value)) return JSON.stringify(value);
  const parts = Object.entries(value).map(([key, entry]) => `${JSON.stringify(key)}: ${oneLine(entry)}`);
  return `{ ${parts.join(", ")} }`;
}
