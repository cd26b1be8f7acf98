import assert from "node:assert/strict";
import type { ProblemCode } from "../../src/contract/catalogue.js";
import type { Problem } from "../../src/contract/problem.js";
import { messageOf } from "../../src/contract/words.js";
import { lexLine } from "../../src/language/lexer.js";
import { statements } from "../../src/language/statements.js";
import { type Random, seededRandom } from "../../src/numerics/random.js";
import { boundText } from "../support/checkText.js";
import { descriptions } from "./wholeDescriptions.js";

/**
 * What is said of a description as a whole, at a line that another line below can make right or wrong. Nothing that
 * is wrong with the writing of a line by itself is among them.
 */
const aboutTheWhole: Readonly<Partial<Record<ProblemCode, string>>> = {
  "run-lacks-data": "what a run lacks is said on its run line: here its data line, which stood below",
  "run-lacks-follow": "its follow line",
  "run-lacks-temperature": "its temperature",
  "run-lacks-volume": "its volume",
  "run-wants-nothing": "its last rate or fit",
  "run-lacks-reaction": "the reaction, which may stand below the runs",
  "name-unknown": "a name may be declared below the line that uses it: a run of a series, a calibration, a species",
  "species-unknown": "so may a species",
  "taken-needs-formula": "and its formula",
  "balance-unchecked": "with the formula goes the balance of a reaction above",
  "no-balance": "and a name declared below can be one that stands as a formula above",
  "taken-takes-no-part": "another reaction below has other species",
  "follow-not-in-reaction": "so it has",
};
const pieces = [
  ...' |\n|\r\n|\t|"|“|#|,|->|<=>|±|(|)|^|-|·|µ|²|₂|⁻¹|%|°C|🧪|\ud83e|\u0000|\ufeff|\u00a0|\u2212|…|1e999|0|1,5'.split(
    "|",
  ),
  ..."run|run A\n|run Z like A\n|fit|in|like|as|of|by|from|species|reaction|series s\n|within|none".split("|"),
];

/** One random change of letters: a piece put in, a stretch taken out or doubled, the rest cut off, a letter changed. */
function lettersChanged(text: string, random: Random): string {
  const at = random.integer(text.length + 1);
  const length = 1 + random.integer(12);
  switch (random.integer(6)) {
    case 0:
      return text.slice(0, at) + text.slice(at + length);
    case 1:
      return text.slice(0, at) + text.slice(at, at + length) + text.slice(at);
    case 2:
      return random.integer(8) === 0 ? text.slice(0, at) : text.slice(0, at) + text.slice(at + 1);
    case 3:
      return text.slice(0, at) + String.fromCharCode(random.integer(0x3000)) + text.slice(at + 1);
    default:
      return text.slice(0, at) + (pieces[random.integer(pieces.length)] ?? "") + text.slice(at);
  }
}

/** Tokens of a text with their places. */
function tokensOf(text: string): { start: number; end: number }[] {
  let offset = 0;
  return text.split("\n").flatMap((line) => {
    const begin = offset;
    offset += line.length + 1;
    return lexLine(line).map(({ start, end }) => ({ start: begin + start, end: begin + end }));
  });
}

/** One token swapped with the next, left out, doubled, or replaced by one of another place. */
function tokensChanged(text: string, vocabulary: readonly string[], random: Random): string {
  const tokens = tokensOf(text);
  const at = random.integer(tokens.length);
  const [token, next] = [tokens[at], tokens[at + 1]];
  if (token === undefined) return text;
  const words = text.slice(token.start, token.end);
  const put = (instead: string): string => text.slice(0, token.start) + instead + text.slice(token.end);
  switch (random.integer(4)) {
    case 0:
      if (next === undefined) return put("");
      return `${text.slice(0, token.start)}${text.slice(next.start, next.end)}${text.slice(token.end, next.start)}${words}${text.slice(next.end)}`;
    case 1:
      return put("");
    case 2:
      return put(`${words} ${words}`);
    default:
      return put(vocabulary[random.integer(vocabulary.length)] ?? "");
  }
}

/** What is said above the line that a change touches first, told apart by code and place. */
function saidAbove(problems: readonly Problem[], line: number): Map<string, Problem> {
  const above = problems.filter(({ origin, code }) => origin.end <= line && !(code in aboutTheWhole));
  return new Map(above.map((one) => [`${one.code} ${one.origin.start} ${one.origin.end}`, one]));
}

/** Where the line begins in which two texts differ first. */
function firstChangedLine(before: string, after: string): number {
  const shorter = Math.min(before.length, after.length);
  let at = 0;
  while (at < shorter && before.charCodeAt(at) === after.charCodeAt(at)) at++;
  return Math.max(before.lastIndexOf("\n", at - 1), before.lastIndexOf("\r", at - 1)) + 1;
}

/** A parse and bind that took longer is done once more: the first may have waited for the memory to be tidied. */
const mostMilliseconds = 50;

function problemsInTime(text: string): readonly Problem[] {
  for (const last of [false, true]) {
    const begun = performance.now();
    const { problems } = boundText(text);
    const taken = performance.now() - begun;
    if (taken <= mostMilliseconds) return problems;
    assert.ok(!last, `${taken} ms: ${JSON.stringify(text)}`);
  }
  return [];
}

function check(base: string, baseProblems: readonly Problem[], text: string): void {
  const problems = problemsInTime(text);
  for (const problem of problems) {
    const { start, end } = problem.origin;
    assert.ok(
      start >= 0 && start <= end && end <= text.length,
      `${problem.code} ${start} ${end}: ${JSON.stringify(text)}`,
    );
    const words = messageOf(problem);
    assert.ok(words.length > 10 && !/undefined|NaN|\[object/.test(words), `${words}: ${JSON.stringify(text)}`);
    for (const edit of problem.mend?.flatMap(({ edits }) => edits) ?? []) {
      assert.ok(edit.start >= 0 && edit.start <= edit.end && edit.end <= text.length, problem.code);
    }
  }
  const line = firstChangedLine(base, text);
  const known = saidAbove(baseProblems, line);
  for (const [place, problem] of saidAbove(problems, line)) {
    assert.ok(known.has(place), `said above a change: ${messageOf(problem)}\n${text}`);
  }
}

describe("mutations of all samples and of every example of the language", function () {
  this.timeout(180_000);
  const bases = descriptions.map((text) => ({ text, problems: boundText(text).problems }));
  const vocabulary = [
    ...new Set(descriptions.flatMap((text) => tokensOf(text).map(({ start, end }) => text.slice(start, end)))),
  ];

  it("the descriptions are sound and hold every example", () => {
    for (const { text, problems } of bases.filter(({ text: words }) => !words.includes("Mistakes are planted"))) {
      assert.deepEqual(problems.filter(({ severity }) => severity === "error").map(messageOf), [], text);
    }
    for (const { example } of statements)
      assert.ok(
        descriptions.some((text) => text.includes(example)),
        example,
      );
  });

  it("100,000 changes of letters: nothing throws or hangs, problems lie in the text, nothing is said above the change", () => {
    const random = seededRandom(20_261_202);
    for (let round = 0; round < 100_000; round++) {
      const { text, problems } = bases[round % bases.length] ?? { text: "", problems: [] };
      check(text, problems, lettersChanged(text, random));
    }
  });

  it("10,000 changes of tokens: the same", () => {
    const random = seededRandom(20_261_204);
    for (let round = 0; round < 10_000; round++) {
      const { text, problems } = bases[round % bases.length] ?? { text: "", problems: [] };
      check(text, problems, tokensChanged(text, vocabulary, random));
    }
  });
});
