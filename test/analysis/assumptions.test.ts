import assert from "node:assert/strict";
import type { Description, Run } from "../../src/contract/findings.js";
import { exp } from "../../src/numerics/elementary.js";
import { seededRandom } from "../../src/numerics/random.js";
import { codesOf, describeText, onlyRun } from "../support/describeText.js";

const kPrime = 0.003;
const times = Array.from({ length: 30 }, (_, i) => 40 * i);
const csv = (readings: readonly (readonly [number | string, number])[], header = "t / s,c / mol/L"): string =>
  `${header}\n${readings.map((row) => row.join(",")).join("\n")}\n`;
const decay = (t: number): number => 0.1 * exp(-kPrime * t);
const exact = csv(times.map((t) => [t, decay(t)]));

interface Parts {
  readonly reaction?: string;
  readonly taken?: string;
  readonly data?: string;
  readonly follow?: string;
  readonly wishes?: string;
}

const description = ({
  reaction = "species A\nspecies P\nreaction A -> P",
  taken = "  taken A 0.1 mol/L\n",
  data = "",
  follow = "  follow A as concentration from c\n",
  wishes = "  fit order 1 in A\n",
}: Parts = {}): string => `${reaction}
run X
  temperature 25 °C
  volume 50 mL
${taken}  data "x.csv"
    column t "t / s"
    column c "c / mol/L"
${data}${follow}${wishes}`;

const work = (parts: Parts, file = exact): Promise<Description> => describeText(description(parts), { "x.csv": file });
const run = async (parts: Parts, file?: string): Promise<Run> => onlyRun(await work(parts, file));
const grave = async (parts: Parts, file?: string): Promise<string[]> =>
  (await work(parts, file)).diagnostics.filter(({ severity }) => severity !== "information").map(({ code }) => code);
const near = (found: number | null | undefined, expected: number, relative: number): void => {
  assert.ok(typeof found === "number" && Math.abs(found / expected - 1) <= relative, `${found} against ${expected}`);
};

describe("what a fit assumes is said, or it gives no number", () => {
  it("a reaction that goes back has no k of its own", async () => {
    const parts = {
      reaction: "species A\nspecies P\nreaction A <=> P",
      wishes: "  fit order 1 in A\n    infinity free\n",
    };
    const { fits } = await run(parts, csv(times.map((t) => [t, 0.04 + 0.06 * exp(-0.005 * t)])));
    assert.deepEqual([fits[0]?.parameters, fits[0]?.stop], [{}, "refused"]);
    assert.match(fits[0]?.verdict ?? "", /sum of both rate constants/);
  });

  it("an order in a reactant that outlasts another: the law runs to the end of its own species, and that is said", async () => {
    // v = k c(RBr), k = 1.5e-4 s⁻¹, c(RBr) = 0.100, c(OH⁻) = 0.020 mol/L: OH⁻ falls towards 0.020 − 0.100, and is gone at 1488 s.
    const parts: Parts = {
      reaction: "reaction CH3Br + OH^- -> CH3OH + Br^-",
      taken: "  taken CH3Br 0.100 mol/L\n  taken NaOH 0.020 mol/L\n",
      follow: "  follow OH^- as concentration from c\n",
      wishes: "  fit order 1 in CH3Br\n    window 0 s to 1400 s\n    start fixed\n    infinity fixed\n",
    };
    const file = csv(times.map((t) => [t, 0.02 - 0.1 * (1 - exp(-1.5e-4 * t))]));
    const description = await work(parts, file);
    near(onlyRun(description).fits[0]?.parameters["k"]?.value, 1.5e-4, 1e-6);
    assert.ok(codesOf(description).some((code) => code.startsWith("fit-order-not-limiting")));
    assert.deepEqual(
      onlyRun(description).taken.map(({ species, limiting }) => [species, limiting]),
      [
        ["CH3Br", false],
        ["NaOH", true],
      ],
      "the salt of the limiting ion runs out first",
    );
    const own = await grave(
      { ...parts, taken: "  taken CH3Br 0.010 mol/L\n  taken NaOH 0.2 mol/L\n", wishes: "" },
      file,
    );
    assert.ok(!own.includes("fit-order-not-limiting"));
  });

  it("a measured infinity counts with its uncertainty: the 95 % interval of k holds in at least 88 % of 100 seeds", async () => {
    const sparse = [0, 200, 400, 700, 1100, 1600, 2300];
    const parts: Parts = {
      reaction: "species A\nspecies P\nreaction A -> P",
      taken: "",
      follow: "  follow P as concentration from c\n    reading at infinity 50.0(5) mmol/L\n",
    };
    for (const noise of [0.1, 0.02]) {
      let inside = 0;
      for (let seed = 1; seed <= 100; seed++) {
        const random = seededRandom(seed);
        const end = 50 + 0.5 * random.normal();
        const file = csv(sparse.map((t) => [t, (50 * (1 - exp(-0.0012 * t)) + noise * random.normal()) / 1000]));
        const text = { ...parts, follow: parts.follow?.replace("50.0(5)", `${end.toFixed(3)}(500)`) ?? "" };
        const interval = (await run(text, file)).fits[0]?.parameters["k"]?.interval95;
        if (interval && interval[0] <= 0.0012 && 0.0012 <= interval[1]) inside++;
      }
      assert.ok(inside >= 88, `${inside} of 100 at ${noise}`);
    }
  }).timeout(60_000);

  it("rates carry the causes of the conversion: a volume of 10 % makes v uncertain by 10 %", async () => {
    const text = `reaction 2 H2O2(aq) -> 2 H2O(l) + O2(g)
run X
  temperature 25 °C
  volume 50.0(50) mL
  data "x.csv"
    column t "t / s"
    column g "V / mL"
  follow O2 as gas volume from g
    collected wet at 22.0 °C
    barometer 100.8 kPa
  rate from 0 s to 200 s
`;
    const file = csv(
      times.map((t) => [t, 60 * (1 - exp(-kPrime * t))]),
      "t / s,V / mL",
    );
    const [rate] = onlyRun(await describeText(text, { "x.csv": file })).rates;
    near((rate?.rate?.u ?? 0) / (rate?.rate?.value ?? 1), 0.1, 0.01);
    assert.ok((rate?.signal?.u ?? 1) < 1e-3 * (rate?.signal?.value ?? 0), "the slope of the signal does not");
  });

  it("fit-scatter-large, fit-scatter-small: a stated uncertainty that the readings contradict", async () => {
    const random = seededRandom(3);
    const file = csv(times.map((t) => [t, decay(t) + 0.001 * random.normal()]));
    const withRandom = (u: string): Parts => ({ data: `      random ${u} mol/L\n` });
    assert.deepEqual(await grave(withRandom("0.0001"), file), ["fit-scatter-large"]);
    assert.deepEqual(await grave(withRandom("0.01"), file), ["fit-scatter-small"]);
    assert.deepEqual(await grave(withRandom("0.001"), file), []);
  });

  it("time-zero-far: half-lives count over the readings, and a clock far from zero is said", async () => {
    const random = seededRandom(4);
    const late = csv(times.map((t) => [1_000 + t / 5, decay(t / 5) + 2e-5 * random.normal()]));
    const codes = await grave({ taken: "", wishes: "  fit order 1 in A\n    infinity free\n" }, late);
    assert.ok(codes.includes("time-zero-far") && codes.includes("fit-very-few-half-lives"), codes.join(" "));
    const veryLate = csv(times.map((t) => [1.7e9 + t, decay(t)]));
    const { fits } = await run({ taken: "" }, veryLate);
    assert.match(fits[0]?.verdict ?? "", /^No rate constant: the readings begin so long after time zero/);
    assert.deepEqual(await grave({ taken: "", data: "    time zero 1000 s\n" }, late), []);
  });

  it("a clock beside a column of clock times is one of that day, for time zero and for what is left out", async () => {
    const clock = (s: number): string => {
      const all = 49_770 + s;
      const two = (n: number): string => String(Math.floor(n)).padStart(2, "0");
      return `${two(all / 3600)}:${two((all / 60) % 60)}:${two(all % 60)}`;
    };
    const file = csv(
      times.map((t) => [clock(t), t < 80 ? 0.1 : 0.1 * exp(-kPrime * (t - 80))]),
      "t,c / mol/L",
    );
    const text = description({
      data: `    time zero ${clock(80)}\n    exclude ${clock(400)} to ${clock(500)} because "bubble"\n`,
    });
    const description2 = await describeText(text.replace('"t / s"', '"t"'), { "x.csv": file });
    const only = onlyRun(description2);
    near(only.fits[0]?.parameters["k"]?.value, kPrime, 1e-9);
    near(only.fits[0]?.parameters["start"]?.value, 0.1, 1e-9);
    assert.equal(only.follow[0]?.used, 30 - 2 - 3);
    assert.deepEqual(
      codesOf(description2).filter((code) => !code.startsWith("balance")),
      ["readings-before-zero@11"],
    );
  });

  it("exclude-nothing, time-zero-late: lines that hit no reading", async () => {
    assert.deepEqual(await grave({ data: '    exclude line 9999 because "x"\n' }), ["exclude-nothing"]);
    assert.deepEqual(await grave({ data: '    exclude 90000 s to 90001 s because "x"\n' }), ["exclude-nothing"]);
    assert.deepEqual(await grave({ data: '    exclude 50 s to 10 s because "x"\n' }), ["span-empty"]);
    assert.ok((await grave({ data: "    time zero 5000 s\n" })).includes("time-zero-late"));
    assert.deepEqual(await grave({ data: '    exclude line 4 because "x"\n' }), []);
  });

  it("a share of the reading is one of what the instrument shows, the blank in it", async () => {
    const raw = csv(times.map((t) => [t, 5 + decay(t)]));
    const parts: Parts = {
      taken: "",
      data: "      random 1 %\n",
      follow: "  follow A as concentration from c\n    blank 5 mol/L\n",
      wishes: "  rate from 0 s to 1160 s\n",
    };
    const [rate] = (await run(parts, raw)).rates;
    near(rate?.signal?.u, (Math.SQRT2 * 0.05) / 1160, 0.02);
  });

  it("fit-end-differs: a unit or a factor that is wrong shows in the start or the infinity", async () => {
    assert.deepEqual(await grave({ taken: "  taken A 0.05 mol/L\n" }), ["fit-end-differs"]);
    const product: Parts = {
      follow: "  follow P as concentration from c\n",
      wishes: "  fit order 1 in A\n    infinity free\n",
    };
    const half = csv(times.map((t) => [2 * t, 0.05 * (1 - exp(-kPrime * 2 * t))]));
    assert.deepEqual(await grave(product, half), ["fit-end-differs"]);
    assert.deepEqual(await grave(product, csv(times.map((t) => [2 * t, 0.1 * (1 - exp(-kPrime * 2 * t))]))), []);
  });

  it("a scale cancels in k where the infinity is fixed at a reading of the same instrument", async () => {
    const parts = (end: string): Parts => ({
      taken: "",
      data: "      random 0.0005 mol/L\n      common 5 %\n",
      follow: `  follow P as concentration from c\n    reading at infinity 0.1 mol/L\n`,
      wishes: `  fit order 1 in A\n    start free\n    infinity ${end}\n`,
    });
    const rising = csv(times.map((t) => [t, 0.1 * (1 - exp(-kPrime * t))]));
    for (const end of ["fixed", "measured"]) {
      const k = (await run(parts(end), rising)).fits[0]?.parameters["k"];
      assert.ok((k?.uCommon ?? 1) < 1e-6 * (k?.value ?? 0), `${end}: ${k?.uCommon}`);
    }
    const byValue = (await run(parts("fixed 0.1 mol/L"), rising)).fits[0]?.parameters["k"];
    assert.ok((byValue?.uCommon ?? 0) > 0.01 * (byValue?.value ?? 1), "a stated value is none of its readings");
  });

  it("a plain rise where a fall is due is called that, whatever is fixed", async () => {
    const rising = csv(times.map((t) => [t, 0.02 + 0.05 * (1 - exp(-kPrime * t))]));
    assert.match((await run({}, rising)).fits[0]?.verdict ?? "", /the signal rises, but the reaction uses up A/);
  });

  it("masses per volume are taken by their molar mass; what changes nothing is said: taken-part-unused", async () => {
    const taken = (line: string): Parts => ({
      reaction: "reaction 2 H2O2 -> 2 H2O + O2",
      taken: `  taken H2O2 ${line}\n`,
      follow: "  follow H2O2 as concentration from c\n",
      wishes: "  fit order 1 in H2O2\n",
    });
    near((await run(taken("3.4014 g/L"))).taken[0]?.concentration?.value, 0.1, 1e-3);
    // 3 % by mass, 1.01 g/mL: 0.03 × 1010 g/L / 34.014 g/mol = 0.8908 mol/L
    const share = (await run(taken("3.0 % by mass density 1.01 g/mL"))).taken[0];
    near(share?.concentration?.value, 0.8908, 1e-4);
    assert.equal(share?.given.text, "3 % by mass");
    assert.ok((await grave(taken("3.0 % by mass"))).includes("stock-needs-density"));
    assert.deepEqual(await grave(taken("0.1 mol/L purity 50 %")), ["taken-part-unused"]);
    assert.deepEqual(await grave(taken("10 mL of 0.5 mol/L density 1.1 g/mL")), ["taken-part-unused"]);
    assert.deepEqual(await grave(taken("0.17 g purity 98 %")), []);
  });

  it("number-with-uncertainty: the order of a law is a plain number", async () => {
    assert.deepEqual(await grave({ wishes: "  fit order 1(0.1) in A\n" }), ["number-with-uncertainty"]);
  });

  it("what a reader needs to repeat the numbers stands beside the signal", async () => {
    const parts: Parts = {
      data: '    time zero 3.0(5) s\n    exclude line 4 because "bubble"\n',
      follow: "  follow A as concentration from c\n    blank 0.001(1) mol/L\n",
    };
    assert.deepEqual((await run(parts)).follow[0]?.details, [
      { name: "blank", text: "0.0010(10) mol L^-1" },
      { name: "time zero", text: "3.00(50) s" },
      { name: "left out", text: "line 4: bubble" },
    ]);
  });
});
