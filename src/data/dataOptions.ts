import type { MessageArguments } from "../contract/catalogue.js";
import type { Polling } from "../contract/polling.js";
import { type Origin, type Problem, problem } from "../contract/problem.js";
import type { Columns } from "./columns.js";

/** What a description says about a data file where detection is not enough, and the limits. */
export interface DataOptions extends Polling {
  /** what stands between cells; a blank means any run of blanks */
  readonly delimiter?: string;
  readonly decimalComma?: boolean;
  /** a name of the Encoding Standard, such as `windows-1252` */
  readonly encoding?: string;
  /** lines that stand before the header row */
  readonly skip?: number;
  /** default 5,000,000 */
  readonly maximumRows?: number;
  /** default 1,000 */
  readonly maximumColumns?: number;
  /** UTF-16 units, default 1,048,576 */
  readonly maximumLineLength?: number;
}

/** The limits, all given. */
export interface Limits {
  readonly rows: number;
  readonly columns: number;
  readonly lineLength: number;
}

export function limitsOf(options: DataOptions): Limits {
  return {
    rows: options.maximumRows ?? 5_000_000,
    columns: options.maximumColumns ?? 1_000,
    lineLength: options.maximumLineLength ?? 1_048_576,
  };
}

type RefusalCode =
  | "data-not-text"
  | "data-encoding-unknown"
  | "data-encoding-wrong"
  | "data-empty"
  | "data-quote-open"
  | "data-quote-stray"
  | "data-line-too-long"
  | "data-too-many-rows"
  | "data-too-many-columns";

/** Why a file is not used at all. The name of the file is the caller's to add, see `refusalProblem`. */
export type DataRefusal = {
  [Code in RefusalCode]: {
    readonly kind: "refused";
    readonly code: Code;
    readonly args: Omit<MessageArguments<Code>, "file">;
  };
}[RefusalCode];

export type DataReading =
  | { readonly kind: "columns"; readonly columns: Columns }
  | DataRefusal
  | { readonly kind: "stopped" };

export function refused<Code extends RefusalCode>(code: Code, args: Omit<MessageArguments<Code>, "file">) {
  return { kind: "refused", code, args } as const;
}

/** The refusal as a problem of the description: `file` as the description writes it, `origin` its data line. */
export function refusalProblem(refusal: DataRefusal, file: string, origin: Origin): Problem {
  switch (refusal.code) {
    case "data-not-text":
      return problem(refusal.code, { ...refusal.args, file }, origin);
    case "data-encoding-unknown":
    case "data-encoding-wrong":
      return problem(refusal.code, { ...refusal.args, file }, origin);
    case "data-empty":
      return problem(refusal.code, { ...refusal.args, file }, origin);
    case "data-quote-open":
    case "data-quote-stray":
      return problem(refusal.code, { ...refusal.args, file }, origin);
    case "data-line-too-long":
    case "data-too-many-columns":
      return problem(refusal.code, { ...refusal.args, file }, origin);
    case "data-too-many-rows":
      return problem(refusal.code, { ...refusal.args, file }, origin);
  }
}
