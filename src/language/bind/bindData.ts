import type { Quantity } from "../../quantity/quantity.js";
import type { ColumnFact, DataFile, Exclusion } from "../../study/dataFile.js";
import type { Fact } from "../../study/fact.js";
import { isBroken, numberOf, originOf, quantityOf, textOf, unitOf } from "../fields.js";
import type { Statement } from "../syntax.js";
import type { Binding } from "./binding.js";
import { reportEmptySpan } from "./emptySpan.js";
import { linesWith, lineWith, quantityFact } from "./facts.js";

/** The `data` line of a run with its columns. */
export function bindData(binding: Binding, run: string, statement: Statement): DataFile | null {
  const path = textOf(statement, "path");
  if (path === null || isBroken(statement)) return null;
  const columns = statement.children.filter((child) => child.line.row?.head === "column");
  const skip = statement.children.find((child) => child.line.row?.head === "skip" && !isBroken(child));
  return {
    path,
    exclusions: linesWith(statement.children, "exclude").flatMap((line) => bindExclusion(binding, line)),
    timeZero: bindTimeZero(binding.uri, statement),
    pathOrigin: originOf(binding.uri, statement, "path"),
    columns: columns.flatMap((column) => bindColumn(binding, run, column)),
    delimiter: childText(statement, "delimiter", "delimiter"),
    decimalComma: decimalComma(childText(statement, "decimal", "mark")),
    skip: skip === undefined ? null : numberOf(skip, "lines"),
    encoding: childText(statement, "encoding", "encoding"),
    origin: originOf(binding.uri, statement),
  };
}

function bindTimeZero(uri: string, data: Statement): DataFile["timeZero"] {
  const fact = quantityFact(uri, data.children, "time");
  const line = lineWith(data.children, "time");
  return fact === null || line === null ? null : { ...fact, clock: isClock(textOf(line, "time")) };
}

/** Whether a time is written as a clock shows it. */
function isClock(text: string | null): boolean {
  return /^\s*\d{1,2}:\d{2}:\d{2}/.test(text ?? "");
}

function bindExclusion(binding: Binding, statement: Statement): Exclusion[] {
  const { uri } = binding;
  const reason = textOf(statement, "reason") ?? "";
  const origin = originOf(uri, statement);
  const line = numberOf(statement, "line");
  if (line !== null) return [{ value: { reason, line }, origin }];
  const from = quantityOf(statement, "from");
  const to = quantityOf(statement, "to");
  if (from === null || to === null) return [];
  if (from.value >= to.value) {
    reportEmptySpan(binding, statement);
    return [];
  }
  return [{ value: { reason, from, to, clock: isClock(textOf(statement, "from")) }, origin }];
}

function childText(statement: Statement, head: string, label: string): string | null {
  const child = statement.children.find((candidate) => candidate.line.row?.head === head && !isBroken(candidate));
  return child === undefined ? null : textOf(child, label);
}

function decimalComma(mark: string | null): boolean | null {
  return mark === null ? null : mark === "comma";
}

function bindColumn(binding: Binding, run: string, statement: Statement): ColumnFact[] {
  const { uri } = binding;
  const name = textOf(statement, "column");
  if (name === null) return [];
  binding.uses.push({ kind: "column", name, run, declares: true, origin: originOf(uri, statement, "column") });
  const number = numberOf(statement, "number");
  const header = textOf(statement, "header");
  if (isBroken(statement) || (number === null && header === null)) return [];
  const unit = unitOf(statement, "unit");
  return [
    {
      name,
      by: {
        value: number === null ? { header: header ?? "" } : { number },
        origin: originOf(uri, statement, number === null ? "header" : "number"),
      },
      unit: unit === null ? null : { value: unit, origin: originOf(uri, statement, "unit") },
      random: uncertainty(uri, statement, "random"),
      common: uncertainty(uri, statement, "common"),
      origin: originOf(uri, statement),
    },
  ];
}

function uncertainty(uri: string, column: Statement, head: "random" | "common"): Fact<Quantity> | null {
  const statement = column.children.find((child) => child.line.row?.head === head && !isBroken(child));
  const value = statement === undefined ? null : quantityOf(statement, "uncertainty");
  return statement === undefined || value === null ? null : { value, origin: originOf(uri, statement) };
}
