import assert from "node:assert/strict";
import type { Run } from "../../src/contract/findings.js";
import { exp } from "../../src/numerics/elementary.js";
import { seededRandom } from "../../src/numerics/random.js";
import { codesOf, describeText, onlyRun } from "../support/describeText.js";

type Fit = Run["fits"][number];

/** The fit of order 1 in A to readings of `follow` at the given times, s and mol/L. */
async function fitOf(
  readings: readonly (readonly [number, number])[],
  { follow = "A", lines = "" }: { follow?: string; lines?: string } = {},
): Promise<{ fit: Fit; codes: string[]; messages: string[] }> {
  const text = `species A
species P
reaction A -> P
run X
  temperature 25 °C
  data "x.csv"
    column t "t / s"
    column c "c / mol/L"
  follow ${follow} as concentration from c
  fit order 1 in A
${lines}`;
  const rows = readings.map(([t, c]) => `${t},${c}`).join("\n");
  const description = await describeText(text, { "x.csv": `t / s,c / mol/L\n${rows}\n` });
  const fit = onlyRun(description).fits[0];
  assert.ok(fit !== undefined);
  const own = description.diagnostics.filter(({ item }) => item === "run X/fit 1");
  return { fit, codes: own.map(({ code }) => code), messages: own.map(({ message }) => message) };
}

function assertRefused(fit: Fit, codes: readonly string[]): void {
  assert.deepEqual(fit.parameters, {});
  assert.equal(fit.kPrime, null);
  assert.equal(fit.halfLife, null);
  assert.equal(fit.covariance, null);
  assert.notEqual(fit.stop, "converged");
  assert.match(fit.verdict, /^No rate constant: /);
  assert.ok(codes.includes("fit-refused"), codes.join(" "));
  assert.ok(fit.problems.includes("fit-refused"));
}

const times = Array.from({ length: 20 }, (_, i) => 10 * i);

describe("fits that the readings cannot carry", () => {
  it("constant readings", async () => {
    const { fit, codes, messages } = await fitOf(times.map((t) => [t, 0.1]));
    assertRefused(fit, codes);
    assert.match(messages.join(" "), /all readings are the same, so nothing is seen to react/);
  });

  it("two readings", async () => {
    const { fit, codes, messages } = await fitOf([
      [0, 0.1],
      [10, 0.05],
    ]);
    assertRefused(fit, codes);
    assert.match(messages.join(" "), /2 readings at 2 different times cannot determine 2 parameters and their scatter/);
  });

  it("no reading inside the window", async () => {
    const lines = "    window 500 s to 600 s\n";
    const { fit, codes } = await fitOf(
      times.map((t) => [t, exp(-0.01 * t)]),
      { lines },
    );
    assertRefused(fit, codes);
    assert.equal(fit.points, 0);
    assert.equal(fit.window, null);
  });

  it("the wrong direction, with a free and with a fixed infinity", async () => {
    const rising = times.map((t): [number, number] => [t, 0.1 - 0.09 * exp(-0.02 * t)]);
    const free = await fitOf(rising, { lines: "    infinity free\n" });
    assertRefused(free.fit, free.codes);
    assert.match(free.messages.join(" "), /the signal rises, but the reaction uses up A/);
    assertRefused((await fitOf(rising)).fit, (await fitOf(rising)).codes);
    const falling = times.map((t): [number, number] => [t, exp(-0.02 * t)]);
    const product = await fitOf(falling, { follow: "P" });
    assertRefused(product.fit, product.codes);
    assert.match(product.messages.join(" "), /the signal falls, but the reaction forms P/);
  });

  it("scatter about a constant, from 40 seeds: at most 2 get through", async () => {
    let through = 0;
    for (let seed = 1; seed <= 40; seed++) {
      const random = seededRandom(seed);
      const { fit } = await fitOf(
        times.map((t) => [t, 0.1 + 0.001 * random.normal()]),
        { lines: "    infinity free\n" },
      );
      if (fit.stop === "converged" || Object.keys(fit.parameters).length > 0) through++;
    }
    assert.ok(through <= 2, `${through} of 40`);
  });

  it("a straight line with a free infinity", async () => {
    const { fit, codes } = await fitOf(
      times.map((t) => [t, 0.1 - 1e-4 * t]),
      { lines: "    infinity free\n" },
    );
    assertRefused(fit, codes);
  });

  it("a reaction that is over before the second reading", async () => {
    const { fit, codes } = await fitOf(times.map((t) => [t, t === 0 ? 0.1 : 0]));
    assertRefused(fit, codes);
  });

  it("a start that nothing states", async () => {
    const { fit, codes, messages } = await fitOf(
      times.map((t) => [t, exp(-0.01 * t)]),
      { lines: "    start fixed\n" },
    );
    assert.deepEqual(fit.parameters, {});
    assert.deepEqual(codes, ["fit-end-unknown"]);
    assert.match(messages[0] ?? "", /nothing is stated of A/);
  });

  it("an end in the unit of something else", async () => {
    const { fit, codes } = await fitOf(
      times.map((t) => [t, exp(-0.01 * t)]),
      { lines: "    infinity fixed 3 mL\n" },
    );
    assert.deepEqual(fit.parameters, {});
    assert.deepEqual(codes, ["fit-end-wrong-unit"]);
  });

  it("near misses come out: a slow decay of 4 %, a fast one, five readings, exact readings", async () => {
    const random = seededRandom(7);
    const slow = await fitOf(times.map((t) => [t, 0.1 * exp(-2e-4 * t) + 1e-5 * random.normal()]));
    assert.equal(slow.fit.stop, "converged");
    const k = slow.fit.parameters["k"];
    assert.ok(k !== undefined && k.u !== null && Math.abs(k.value - 2e-4) < 3 * k.u);
    const fast = await fitOf(times.map((t) => [t, 0.1 * exp(-0.2 * t) + 1e-5 * random.normal()]));
    assert.equal(fast.fit.stop, "converged");
    const few = await fitOf([0, 10, 20, 30, 40].map((t) => [t, 0.1 * exp(-0.03 * t)]));
    assert.equal(few.fit.stop, "converged");
    assert.ok(Math.abs((few.fit.parameters["k"]?.value ?? 0) - 0.03) < 1e-9);
    assert.deepEqual(few.codes, []);
  });

  it("nothing of a broken fit hides the fit beside it", async () => {
    const text = `species A
species P
reaction A -> P
run X
  temperature 25 °C
  data "x.csv"
    column t "t / s"
    column c "c / mol/L"
  follow A as concentration from c
  fit order 1 in A
    window 500 s to 600 s
  fit order 1 in A
`;
    const rows = times.map((t) => `${t},${0.1 * exp(-0.01 * t)}`).join("\n");
    const description = await describeText(text, { "x.csv": `t / s,c / mol/L\n${rows}\n` });
    assert.deepEqual(codesOf(description), ["balance-unchecked@3", "fit-refused@10"]);
    const [, second] = onlyRun(description).fits;
    assert.equal(second?.id, "run X/fit 2");
    assert.ok(Math.abs((second?.parameters["k"]?.value ?? 0) - 0.01) < 1e-9);
  });
});
