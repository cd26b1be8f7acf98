import { type Fact, factsOf } from "./facts.js";
import type { RunRecord } from "./recordShape.js";

/**
 * Why something is otherwise than a record has it: the data files, what the description means, the way numbers are
 * computed, none of these; or it is a result that moved, beyond the digits the record states.
 */
export type Cause = "data" | "description" | "method" | "record" | "result";

/** One thing that moved, in words. */
export interface Moved {
  readonly cause: Cause;
  /** what it is about: a data file, “the description”, “run A, fit 1: k” */
  readonly what: string;
  /** a whole sentence */
  readonly text: string;
}

/**
 * What moved from one record to another of the same description, causes first: data files, the description with every
 * stated fact that differs, the method; then results. Nothing where they say the same; a number within its last digit
 * has not moved, and neither has anything because of another program version alone.
 */
export function compare(before: RunRecord, now: RunRecord): Moved[] {
  const facts = movedFacts(factsOf(before), factsOf(now));
  const data = movedData(before, now);
  const method = movedMethod(before, now);
  const units = facts.some(({ otherUnit, stated }) => otherUnit && (stated || data.length === 0));
  const mistakes = data.length + method.length === 0 && onlyDiagnostics(before, now, facts);
  const description =
    before.meaning !== now.meaning
      ? [movedMeaning(before, now)]
      : units
        ? [otherUnits]
        : mistakes
          ? [otherMistakes]
          : [];
  const explained = data.length + method.length + description.length > 0 || facts.length === 0;
  // A stated fact that moved though the description did not, a unit found in a header say, is a result like others.
  const stated = description.length > 0 ? facts.filter((fact) => fact.stated) : [];
  return [
    ...data,
    ...description,
    ...stated.map(moved("description")),
    ...method,
    ...(explained ? [] : [unexplained]),
    ...facts.filter((fact) => !stated.includes(fact)).map(moved("result")),
  ];
}

/** The meaning is in SI: it does not see in which units a description is written, but results come out in them. */
const otherUnits: Moved = {
  cause: "description",
  what: "the description",
  text: "The description means the same but is written in other units, and results come out in those.",
};

/** A line that says nothing, a word misspelt, is no part of the meaning; what is said of it stands in the record. */
const otherMistakes: Moved = {
  cause: "description",
  what: "the description",
  text: "The description means the same, but other mistakes stand in it.",
};

function onlyDiagnostics(before: RunRecord, now: RunRecord, facts: readonly MovedFact[]): boolean {
  const said = new Set([...before.diagnostics, ...now.diagnostics].map(({ what }) => what));
  return facts.length > 0 && facts.every(({ what }) => said.has(what));
}

/** What stands in the record cannot follow from the same data, description and method. */
const unexplained: Moved = {
  cause: "record",
  what: "the record",
  text: "Neither data, description nor method changed: the record was changed by hand, or this machine computes otherwise.",
};

function movedData(before: RunRecord, now: RunRecord): Moved[] {
  const earlier = new Map(before.data.map((file) => [file.path, file]));
  const later = new Map(now.data.map((file) => [file.path, file]));
  const say = (path: string, words: string): Moved => ({ cause: "data", what: path, text: `${path} ${words}.` });
  const changed = before.data.flatMap((file) => {
    const found = later.get(file.path);
    if (found === undefined)
      return [say(file.path, "is no longer read: it is not there, or the description names another file")];
    if (found.sha256 === file.sha256) return [];
    const rows =
      found.rows === file.rows ? `${file.rows} rows as before` : `${file.rows} rows before, ${found.rows} now`;
    const hashes = `SHA-256 ${file.sha256.slice(0, 8)}… before, ${found.sha256.slice(0, 8)}… now`;
    return [say(file.path, `changed: ${rows}, ${hashes}`)];
  });
  const added = now.data
    .filter(({ path }) => !earlier.has(path))
    .map(({ path }) => say(path, "is read now and was not"));
  return [...changed, ...added];
}

function movedMeaning(before: RunRecord, now: RunRecord): Moved {
  const versions =
    before.ratewright === now.ratewright
      ? ""
      : ` Or it is the same and version ${now.ratewright} takes it otherwise than version ${before.ratewright} did.`;
  return { cause: "description", what: "the description", text: `What the description means changed.${versions}` };
}

function movedMethod(before: RunRecord, now: RunRecord): Moved[] {
  const found: Moved[] = [];
  const say = (what: string, from: string | number, to: string | number): void => {
    found.push({ cause: "method", what, text: `The ${what} changed: version ${from} before, ${to} now.` });
  };
  if (before.method !== now.method) say("way numbers are computed", before.method, now.method);
  if (before.language !== now.language) say("language", before.language, now.language);
  return found;
}

interface MovedFact {
  readonly what: string;
  readonly stated: boolean;
  readonly text: string;
  /** whether its unit is another one */
  readonly otherUnit: boolean;
}

const moved =
  (cause: Cause) =>
  ({ what, text }: MovedFact): Moved => ({ cause, what, text });

function movedFacts(before: readonly Fact[], now: readonly Fact[]): MovedFact[] {
  const earlier = new Map(before.map((fact) => [fact.what, fact]));
  const later = new Map(now.map((fact) => [fact.what, fact]));
  const changed = before.flatMap((fact): MovedFact[] => {
    const { what, stated } = fact;
    const found = later.get(what);
    if (found === undefined) {
      return [
        {
          what,
          stated,
          otherUnit: false,
          text: `${what} is no longer there${fact.text === "" ? "" : `; it was ${fact.text}`}.`,
        },
      ];
    }
    const words = differences(fact, found);
    const otherUnit = fact.words.get("unit") !== found.words.get("unit");
    return words === null ? [] : [{ what, stated, otherUnit, text: `${what} moved${words}.` }];
  });
  const added = now
    .filter(({ what }) => !earlier.has(what))
    .map(({ what, stated, text }) => ({
      what,
      stated,
      otherUnit: false,
      text: `${what} is new${text === "" ? "" : `: ${text}`}.`,
    }));
  return [...changed, ...added];
}

/** “ from … to …”, to be said behind “moved”; null where the two say the same. */
function differences(before: Fact, now: Fact): string | null {
  const parts: string[] = [];
  for (const key of new Set([...before.numbers.keys(), ...now.numbers.keys()])) {
    const [from, to] = [before.numbers.get(key), now.numbers.get(key)];
    if (from !== undefined && to !== undefined) {
      if (Math.abs(from.value - to.value) <= Math.max(from.within, to.within)) continue;
    }
    parts.push(`${key} from ${from?.value ?? "none"} to ${to?.value ?? "none"}`);
  }
  for (const key of new Set([...before.words.keys(), ...now.words.keys()])) {
    const [from, to] = [before.words.get(key), now.words.get(key)];
    // What is a number on the other side stands above.
    if (from === to || before.numbers.has(key) || now.numbers.has(key)) continue;
    parts.push(`${key} from ${from ?? "none"} to ${to ?? "none"}`);
  }
  if (parts.length === 0) return null;
  if (before.text !== now.text && before.numbers.has("value")) return ` from ${before.text} to ${now.text}`;
  if (before.words.size === 1 && before.numbers.size === 0) return ` from ${before.text} to ${now.text}`;
  return `${before.numbers.has("value") ? " in its digits" : ""}: ${parts.join(", ")}`;
}
