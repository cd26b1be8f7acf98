import assert from "node:assert/strict";
import type { Run } from "../../src/contract/findings.js";
import { exp } from "../../src/numerics/elementary.js";
import { seededRandom } from "../../src/numerics/random.js";
import { describeText, onlyRun } from "../support/describeText.js";

const text = (wishes: string, taken = "  taken H2O2 0.1 mol/L\n"): string => `reaction 2 H2O2 -> 2 H2O + O2
run X
  temperature 25 °C
${taken}  data "x.csv"
    column t "t / s"
    column c "c / mol/L"
  follow H2O2 as concentration from c
${wishes}
`;

async function ratesOf(
  wishes: string,
  readings: readonly (readonly [number, number])[],
  taken?: string,
): Promise<{ run: Run; said: string[] }> {
  const file = `t / s,c / mol/L\n${readings.map((row) => row.join(",")).join("\n")}\n`;
  const description = await describeText(text(wishes, taken), { "x.csv": file });
  return { run: onlyRun(description), said: description.diagnostics.map(({ code, message }) => `${code}: ${message}`) };
}

const rate = 0.004;
const times = Array.from({ length: 61 }, (_, i) => 5 * i);
const decay = (t: number): number => 0.1 * exp(-rate * t);

describe("rates", () => {
  it("a chord on readings and between them; v is half the loss of peroxide, with its sign", async () => {
    const { run, said } = await ratesOf(
      "  rate from 0 s to 50 s\n  rate from 2 s to 50 s",
      times.map((t) => [t, decay(t)]),
    );
    assert.deepEqual(said, []);
    const [on, between] = run.rates;
    const loss = (decay(0) - decay(50)) / 50;
    assert.ok(Math.abs((on?.rate?.value ?? 0) / (loss / 2) - 1) < 1e-9);
    assert.ok(Math.abs((on?.species?.rate.value ?? 0) / -loss - 1) < 1e-9);
    assert.ok(Math.abs((on?.signal?.value ?? 0) / -loss - 1) < 1e-9);
    assert.deepEqual(on?.mark?.time, [0, 50]);
    const at2 = 0.6 * decay(0) + 0.4 * decay(5);
    assert.ok(Math.abs((between?.rate?.value ?? 0) / ((at2 - decay(50)) / 48 / 2) - 1) < 1e-9);
    assert.equal(on?.rate?.unit, "mol L^-1 s^-1");
  });

  it("a tangent agrees with the derivative within three of its standard uncertainties, over 20 seeds", async () => {
    let outside = 0;
    for (let seed = 1; seed <= 20; seed++) {
      const random = seededRandom(seed);
      const { run } = await ratesOf(
        "  rate at 100 s",
        times.map((t) => [t, decay(t) + 2e-4 * random.normal()]),
      );
      const found = run.rates[0]?.rate;
      assert.ok(found !== undefined && found !== null && found.u !== null);
      if (Math.abs(found.value - (rate * decay(100)) / 2) > 3 * found.u) outside++;
    }
    assert.ok(outside <= 2, `${outside} of 20`);
  });

  it("many readings: neighbours are averaged first, and two standard uncertainties still hold the true rate", async () => {
    const n = 20_001;
    let inside = 0;
    for (let seed = 1; seed <= 20; seed++) {
      const random = seededRandom(seed);
      const many = Array.from({ length: n }, (_, i): [number, number] => [
        (300 * i) / (n - 1),
        decay((300 * i) / (n - 1)) + 1e-3 * random.normal(),
      ]);
      const { run } = await ratesOf("  rate at 100 s", many);
      const found = run.rates[0]?.rate;
      assert.ok(found !== undefined && found !== null && found.u !== null);
      const truth = (rate * decay(100)) / 2;
      if (Math.abs(found.value - truth) <= 2 * found.u) inside++;
      assert.ok(found.u < 0.05 * truth, `u is ${found.u}`);
    }
    assert.ok(inside >= 16, `${inside} of 20`);
  }).timeout(60_000);

  it("an initial rate from the first fifth of the reaction is within 1 % of the true one", async () => {
    const { run, said } = await ratesOf(
      "  rate initial",
      times.map((t) => [t, decay(t)]),
    );
    assert.deepEqual(said, []);
    assert.ok(Math.abs((run.rates[0]?.rate?.value ?? 0) / ((rate * 0.1) / 2) - 1) < 0.01);
    assert.equal(run.rates[0]?.at?.value, 0);
  });

  it("rate-initial-late: five readings over 45 % of the reaction", async () => {
    const few = [0, 40, 80, 120, 150, 400, 700].map((t): [number, number] => [t, decay(t)]);
    const { said } = await ratesOf("  rate initial", few);
    assert.deepEqual(said, [
      "rate-initial-late: The first readings cover 45 % of the reaction, so the initial rate may be low by several per cent. Read more often at the beginning.",
    ]);
  });

  it("rate-outside-readings: nothing is computed where nothing was read", async () => {
    const { run, said } = await ratesOf(
      "  rate at 500 s\n  rate from 0 s to 301 s\n  rate at 300 s",
      times.map((t) => [t, decay(t)]),
    );
    assert.equal(run.rates[0]?.rate, null);
    assert.equal(run.rates[1]?.rate, null);
    assert.ok(run.rates[2]?.rate !== null);
    assert.deepEqual(said, [
      "rate-outside-readings: There is no reading at 500 s: the readings go from 0 s to 300 s. Choose a time between.",
      "rate-outside-readings: There is no reading at 301 s: the readings go from 0 s to 300 s. Choose a time between.",
    ]);
    assert.deepEqual(run.rates[0]?.problems, ["rate-outside-readings"]);
  });

  it("rate-few-readings: two readings give a chord, but no tangent and no initial rate", async () => {
    const two = [0, 50].map((t): [number, number] => [t, decay(t)]);
    const { run, said } = await ratesOf("  rate from 0 s to 50 s\n  rate at 20 s\n  rate initial", two);
    assert.ok(run.rates[0]?.rate !== null && run.rates[0]?.rate.u === null);
    assert.equal(run.rates[1]?.rate, null);
    assert.equal(run.rates[2]?.rate, null);
    assert.deepEqual(
      said.map((words) => words.split(":")[0]),
      ["rate-few-readings", "rate-few-readings"],
    );
  });
});

describe("what is said of a fit that came out", () => {
  const fitOf = async (lines: string, readings: readonly (readonly [number, number])[], taken?: string) => {
    const { run, said } = await ratesOf(`  fit order 1 in H2O2\n${lines}`, readings, taken);
    return { fit: run.fits[0], said };
  };
  const random = seededRandom(5);
  const noisy = (last: number, n = 40): [number, number][] =>
    Array.from({ length: n }, (_, i) => [(last * i) / (n - 1), decay((last * i) / (n - 1)) + 1e-4 * random.normal()]);

  it("fit-few-half-lives and fit-very-few-half-lives: only where the infinity is free", async () => {
    const halfLife = Math.LN2 / rate;
    const bluntly = await fitOf("    infinity free", noisy(1.5 * halfLife));
    assert.equal(bluntly.fit?.stop, "converged");
    assert.match(
      bluntly.said.join("\n"),
      /^fit-very-few-half-lives: Do not rely on this k alone: the readings follow the reaction for 1\.[456]/,
    );
    const few = await fitOf("    infinity free", noisy(2.5 * halfLife));
    assert.match(
      few.said.join("\n"),
      /^fit-few-half-lives: The readings follow the reaction for 2\.[456] half-lives only/,
    );
    assert.deepEqual((await fitOf("    infinity free", noisy(4 * halfLife))).said, []);
    assert.deepEqual((await fitOf("", noisy(1.5 * halfLife))).said, []);
  });

  it("fit-infinity-at-bound: a free infinity stays within what was taken while the readings do not speak against it", async () => {
    // Followed for half a half-life, a decay looks almost straight: the readings alone would allow a negative end.
    let held = 0;
    for (let seed = 1; seed <= 30 && held === 0; seed++) {
      const source = seededRandom(seed);
      const readings = Array.from({ length: 30 }, (_, i): [number, number] => [
        3 * i,
        decay(3 * i) + 6e-4 * source.normal(),
      ]);
      const { fit, said } = await fitOf("    infinity free", readings);
      if (fit?.stop !== "bound" || fit.parameters["k"] === undefined) continue;
      held++;
      assert.equal(fit.parameters["infinity"]?.bound, "low");
      assert.ok(
        said.some((words) => words.startsWith("fit-infinity-at-bound: The free infinity ran to -")),
        said.join("\n"),
      );
    }
    assert.equal(held, 1);
  });

  it("fit-residuals-run: readings of a second-order decay do not follow first order", async () => {
    const readings = times.map((t): [number, number] => [t, 0.1 / (1 + 0.02 * t) + 1e-5 * random.normal()]);
    const { said, fit } = await fitOf("", readings);
    assert.ok(
      said.some((words) => words.startsWith("fit-residuals-run: The residuals change sign too seldom for chance")),
      said.join("\n"),
    );
    assert.ok((fit?.tests.find(({ name }) => name === "runs test")?.p ?? 1) < 0.01);
    assert.ok((fit?.correlation ?? 0) > 0.5);
  });

  it("curves carry the readings, the fit with its band and the residuals, and only when asked for", async () => {
    const file = `t / s,c / mol/L\n${noisy(500)
      .map((row) => row.join(","))
      .join("\n")}\n`;
    const wishes = "  fit order 1 in H2O2";
    const bare = onlyRun(await describeText(text(wishes), { "x.csv": file }));
    assert.equal(bare.fits[0]?.curve, undefined);
    assert.equal(bare.follow[0]?.signal, undefined);
    const run = onlyRun(await describeText(text(wishes), { "x.csv": file }, true));
    const [fit] = run.fits;
    assert.equal(run.follow[0]?.time?.values.length, 40);
    assert.equal(run.follow[0]?.time?.unit, "s");
    assert.equal(fit?.residuals?.values.length, fit?.points);
    const { curve } = fit ?? {};
    assert.ok(curve !== undefined);
    curve.signal.values.forEach((value, i) => {
      const [low, high] = [curve.low.values[i], curve.high.values[i]];
      assert.ok(
        typeof value === "number" && typeof low === "number" && typeof high === "number" && low < value && value < high,
      );
    });
    assert.ok(Math.abs((curve.signal.values[0] ?? 0) - (fit?.parameters["start"]?.value ?? 1)) < 1e-12);
  });
});
