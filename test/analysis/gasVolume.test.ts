import assert from "node:assert/strict";
import { gasDensity } from "../../src/monitor/gasVolume.js";
import { exp } from "../../src/numerics/elementary.js";
import { readQuantity } from "../../src/quantity/readQuantity.js";
import { isFault } from "../../src/quantity/shifted.js";
import { codesOf, describeText, onlyRun } from "../support/describeText.js";

const quantity = (text: string, name: string) => {
  const reading = readQuantity(text, name);
  assert.ok(!isFault(reading));
  return reading.quantity;
};

const description = (follow: string, more = ""): string => `reaction 2 H2O2(aq) -> 2 H2O(l) + O2(g)
run A
  temperature 25.0(1) °C
  volume 50.00 mL
  taken H2O2 0.100(2) mol/L
  data "a.csv"
    column t "t / s"
    column gas "V / mL"
  follow O2 as gas volume from gas
${follow}${more}  fit order 1 in H2O2
    infinity free
`;
const lines = `    collected wet at 22.0 °C
    barometer 100.8(1) kPa
    blank 1.2 mL
`;

/** Readings of V = 1.2 + end (1 − e^(−k′t)), mL. */
const file = (end: number, kPrime: number): string =>
  `t / s,V / mL\n${Array.from({ length: 41 }, (_, i) => `${30 * i},${1.2 + end * (1 - exp(-kPrime * 30 * i))}`).join("\n")}\n`;

describe("gas volume", () => {
  it("25.0 mL over water at 22.0 °C and 100.8 kPa: amount to 5 digits by hand", () => {
    // p(H2O, 22 °C) = 2645.22 Pa: ln(p/pc) = (Tc/T)(a1 θ + a2 θ^1.5 + a3 θ^3 + a4 θ^3.5 + a5 θ^4 + a6 θ^7.5) of Wagner and
    // Pruss, J. Phys. Chem. Ref. Data 22 (1993) 783, worked out apart from this program; R = 8.314462618 J/(mol K):
    // n = (100800 − 2645.22) Pa × 25.0e-6 m³ / (8.314462618 J/(mol K) × 295.15 K) = 9.99941e-4 mol
    const byHand = ((100_800 - 2645.22) * 25.0e-6) / (8.314462618 * 295.15);
    const density = gasDensity({
      barometer: quantity("100.8(1) kPa", "barometer"),
      temperature: quantity("22.0(2) °C", "temperature"),
      wet: true,
      levelDifference: null,
    });
    assert.ok(density !== null);
    const amount = 25.0e-6 * density.value;
    assert.ok(Math.abs(amount / byHand - 1) < 5e-6, `${amount} against ${byHand}`);
    assert.equal(amount.toPrecision(5), "0.00099994");
  });

  it("the budget names each source, and each agrees with a change of its input by one standard uncertainty", () => {
    const burette = {
      barometer: quantity("100.8(1) kPa", "barometer"),
      temperature: quantity("22.0(2) °C", "temperature"),
      wet: true,
      levelDifference: quantity("35(2) mm", "level"),
    };
    const density = gasDensity(burette);
    assert.ok(density !== null);
    assert.deepEqual([...density.causes.keys()], ["barometer", "temperature of the burette", "level difference"]);
    const moved = (change: Partial<typeof burette>): number =>
      (gasDensity({ ...burette, ...change })?.value ?? 0) / density.value - 1;
    const pairs = [
      ["barometer", moved({ barometer: quantity("100.9 kPa", "barometer") })],
      ["temperature of the burette", moved({ temperature: quantity("22.2 °C", "temperature") })],
      ["level difference", moved({ levelDifference: quantity("37 mm", "level") })],
    ] as const;
    for (const [name, change] of pairs) assert.ok(Math.abs((density.causes.get(name) ?? 0) / change - 1) < 0.01, name);
  });

  it("a run followed by its gas: v from the amount over the volume of the mixture, k from the signal alone", async () => {
    const kPrime = 0.004;
    const run = onlyRun(
      await describeText(description(lines, "  rate from 0 s to 30 s\n"), { "a.csv": file(61, kPrime) }),
    );
    const [fit] = run.fits;
    assert.ok(Math.abs((fit?.kPrime?.value ?? 0) / kPrime - 1) < 1e-9);
    assert.ok(Math.abs((fit?.parameters["k"]?.value ?? 0) / (kPrime / 2) - 1) < 1e-9);
    assert.equal(fit?.parameters["infinity"]?.unit, "mL");
    assert.ok(Math.abs((fit?.parameters["infinity"]?.value ?? 0) - 61) < 1e-6, "the blank is taken off");
    const perMillilitre = ((100_800 - 2645.22) * 1e-6) / (8.314462618 * 295.15);
    const loss = 61 * (1 - exp(-kPrime * 30)) * perMillilitre;
    const [rate] = run.rates;
    assert.ok(Math.abs((rate?.rate?.value ?? 0) / (loss / 0.05 / 30) - 1) < 1e-5, `${rate?.rate?.text}`);
    assert.equal(rate?.rate?.unit, "mol L^-1 s^-1");
    assert.equal(rate?.signal?.unit, "mL s^-1");
    assert.ok((rate?.rate?.u ?? 0) > 0.0009 * (rate?.rate?.value ?? 1), "the barometer counts in v");
    assert.match(fit?.verdict ?? "", /By stoichiometry the infinity is 6[12]\.\d+\(\d+\) mL/);
  });

  it("a stoichiometric infinity carries every cause by name", async () => {
    const text = description(lines.replace("22.0 °C", "22.0(2) °C")).replace("infinity free", "infinity fixed");
    const fit = onlyRun(await describeText(text, { "a.csv": file(61, 0.004) })).fits[0];
    // n(O2) = 0.100 mol/L × 50.00 mL / 2 = 2.50 mmol; V = n R T / (p − p(H2O)) = 62.50 mL at 22.0 °C and 100.8 kPa
    const expected = (2.5e-3 * 8.314462618 * 295.15) / (100_800 - 2645.22) / 1e-6;
    assert.ok(Math.abs((fit?.parameters["infinity"]?.value ?? 0) / expected - 1) < 1e-5);
    const sources = fit?.budget.map(({ source }) => source).sort();
    assert.deepEqual(sources, ["H2O2 taken", "barometer", "scatter of the readings", "temperature of the burette"]);
    assert.ok(Math.abs((fit?.budget.reduce((sum, { share }) => sum + share, 0) ?? 0) - 1) < 1e-12);
  });

  it("what the monitor needs and does not find: gas-lacks-collected, gas-lacks-barometer, gas-lacks-volume, gas-no-pressure", async () => {
    const codes = async (text: string): Promise<string[]> =>
      codesOf(await describeText(text, { "a.csv": file(61, 0.004) }));
    assert.deepEqual(await codes(description(lines)), []);
    assert.deepEqual(await codes(description(lines.replace(/.*collected.*\n/, ""))), ["gas-lacks-collected@9"]);
    assert.deepEqual(await codes(description(lines.replace(/.*barometer.*\n/, ""))), ["gas-lacks-barometer@9"]);
    assert.deepEqual(await codes(description(lines).replace(/.*volume 50.*\n/, "")), ["gas-lacks-volume@8"]);
    assert.deepEqual(await codes(description(lines.replace("100.8(1) kPa", "2 kPa"))), ["gas-no-pressure@10"]);
    const inMoles = description(lines.replace(/.*blank.*\n/, "")).replace("V / mL", "n / mmol");
    assert.deepEqual(codesOf(await describeText(inMoles, { "a.csv": file(61, 0.004).replace("V / mL", "n / mmol") })), [
      "signal-wrong-unit@9",
    ]);
  });

  it("gas-dissolves: carbon dioxide is said to stay dissolved, oxygen over little liquid is not", async () => {
    const text = `reaction CaCO3(s) + 2 HCl(aq) -> CaCl2(aq) + CO2(g) + H2O(l)
run A
  temperature 25 °C
  volume 50 mL
  taken CaCO3 0.25 g
  taken HCl 1.0 mol/L
  data "a.csv"
    column t "t / s"
    column gas "V / mL"
  follow CO2 as gas volume from gas
    collected dried at 22.0 °C
    barometer 100.8 kPa
  rate from 0 s to 60 s
`;
    const found = await describeText(text, { "a.csv": file(61, 0.004) });
    assert.deepEqual(codesOf(found), ["gas-dissolves@10"]);
    // H R T = 3.3e-4 mol/(m³ Pa) × 8.314 J/(mol K) × 298.15 K = 0.82 (reference facts: Sander); × 50 mL / 61.7 mL = 66 %
    assert.match(found.diagnostics[0]?.message ?? "", /^About 6[67] % of what is collected of CO2/);
  });

  it("missing lines have a mend that makes the description whole", async () => {
    const found = await describeText(description(lines.replace(/.*barometer.*\n/, "")), { "a.csv": file(61, 0.004) });
    assert.deepEqual(
      found.diagnostics[0]?.mends.map(({ title }) => title),
      ["Write “barometer 101.3 kPa”"],
    );
  });
});
