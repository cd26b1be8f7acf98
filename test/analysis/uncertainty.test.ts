import assert from "node:assert/strict";
import type { Run } from "../../src/contract/findings.js";
import { exp } from "../../src/numerics/elementary.js";
import { seededRandom } from "../../src/numerics/random.js";
import { describeText, onlyRun } from "../support/describeText.js";

const random = seededRandom(20);
const rows = Array.from({ length: 25 }, (_, i) => [8 * i, 0.1 * exp(-0.02 * 8 * i) + 0.0005 * random.normal()]);
const csv = `t / s,c / mol/L\n${rows.map((row) => row.join(",")).join("\n")}\n`;

async function runWith(columnLines: string, rest: string, taken = "taken A 0.1 mol/L"): Promise<Run> {
  const text = `species A
species P
reaction A -> P
run X
  temperature 25 °C
  ${taken}
  data "x.csv"
    column t "t / s"
    column c "c / mol/L"
${columnLines}
  follow A as concentration from c
${rest}`;
  return onlyRun(await describeText(text, { "x.csv": csv }));
}

async function fitWith(columnLines: string, fitLines = "", taken?: string): Promise<Run["fits"][number]> {
  const fit = (await runWith(columnLines, `  fit order 1 in A\n${fitLines}`, taken)).fits[0];
  assert.ok(fit !== undefined);
  return fit;
}

const close = (a: number | null | undefined, b: number, relative = 1e-9): void => {
  assert.ok(typeof a === "number" && Math.abs(a - b) <= relative * Math.abs(b), `${a} against ${b}`);
};

describe("random and common uncertainty of a fit", () => {
  it("none stated: constant weights, covariance scaled by the residual variance", async () => {
    const fit = await fitWith("");
    assert.equal(fit.uKind, "scaled");
    assert.equal(fit.reducedChiSquare, null);
    assert.deepEqual(
      fit.budget.map(({ kind }) => kind),
      ["random"],
    );
    const k = fit.parameters["k"];
    assert.ok(k !== undefined && k.uCommon === null && k.u === k.uRandom);
  });

  it("stated: absolute, and twice the stated uncertainty is twice u(k) and the same k", async () => {
    const one = await fitWith("      random 0.0005 mol/L");
    const two = await fitWith("      random 1 mmol/L");
    assert.equal(one.uKind, "absolute");
    assert.equal(one.weights, "stated");
    close(two.parameters["k"]?.value, one.parameters["k"]?.value ?? 0);
    close(two.parameters["k"]?.u, 2 * (one.parameters["k"]?.u ?? 0));
    close(two.reducedChiSquare, (one.reducedChiSquare ?? 0) / 4);
    assert.ok((one.reducedChiSquare ?? 0) > 0.4 && (one.reducedChiSquare ?? 0) < 2);
  });

  it("a scale cancels in a first-order k and stays in the start", async () => {
    const fit = await fitWith("      random 0.0005 mol/L\n      common 3 %");
    const k = fit.parameters["k"];
    const start = fit.parameters["start"];
    assert.ok(k !== undefined && start !== undefined && k.uCommon !== null);
    assert.ok(k.uCommon < 1e-9 * k.value, "the scale cancels");
    close(start.uCommon, 0.03 * start.value, 1e-6);
    assert.deepEqual(
      fit.budget.map(({ source }) => source),
      ["random uncertainty of the readings"],
    );
  });

  it("an offset does not cancel where the infinity is fixed, and does where it is free", async () => {
    const fixed = await fitWith("      random 0.0005 mol/L\n      common 0.002 mol/L");
    const free = await fitWith("      random 0.0005 mol/L\n      common 0.002 mol/L", "    infinity free\n");
    const k = fixed.parameters["k"];
    assert.ok(k !== undefined && k.uCommon !== null && k.uRandom !== null && k.u !== null);
    assert.ok(k.uCommon > 0.5 * k.uRandom);
    close(k.u, Math.sqrt(k.uCommon ** 2 + k.uRandom ** 2));
    close(
      fixed.budget.reduce((sum, { share }) => sum + share, 0),
      1,
    );
    assert.ok((free.parameters["k"]?.uCommon ?? 1) < 1e-9 * k.value);
    close(free.parameters["infinity"]?.uCommon, 0.002, 1e-6);
  });

  it("a first-order answer to an offset agrees with a refit of shifted readings", async () => {
    const fit = await fitWith("      random 0.0005 mol/L\n      common 0.00001 mol/L");
    const shifted = csv.replace(/,(-?[\d.e-]+)$/gm, (_, c) => `,${Number(c) + 0.00001}`);
    const text = `species A
species P
reaction A -> P
run X
  taken A 0.1 mol/L
  data "x.csv"
    column t "t / s"
    column c "c / mol/L"
      random 0.0005 mol/L
  follow A as concentration from c
  fit order 1 in A
`;
    const moved = onlyRun(await describeText(text, { "x.csv": shifted })).fits[0];
    const change = Math.abs((moved?.parameters["k"]?.value ?? 0) - (fit.parameters["k"]?.value ?? 0));
    close(fit.parameters["k"]?.uCommon, change, 0.02);
  });

  it("what was taken counts where it fixes the start, and is named", async () => {
    const fit = await fitWith("", "    start fixed\n", "taken A 0.100(2) mol/L");
    assert.equal(fit.parameters["start"]?.fixed, true);
    close(fit.parameters["start"]?.u, 0.002);
    assert.deepEqual(
      fit.budget.map(({ source, kind }) => [source, kind]),
      [
        ["scatter of the readings", "random"],
        ["A taken", "common"],
      ],
    );
    assert.ok((fit.parameters["k"]?.uCommon ?? 0) > 0);
    assert.equal(fit.covariance?.names.join(" "), "k");
    close(fit.covariance?.matrix[0]?.[0], (fit.parameters["k"]?.u ?? 0) ** 2);
  });

  it("an amount or a mass brings the volume and its uncertainty", async () => {
    const amount = await runWith(
      "",
      "  fit order 1 in A\n    start fixed\n  volume 50.00 mL within 0.1 mL",
      "taken A 5.00(5) mmol",
    );
    const [taken] = amount.taken;
    close(taken?.concentration?.value, 0.1);
    // relative: 1 % of the amount, and (0.1/√3)/50 of the volume (JCGM 100:2008, 4.3.7 and 5.1.2)
    close(taken?.concentration?.u, 0.1 * Math.sqrt(0.01 ** 2 + (0.1 / Math.sqrt(3) / 50) ** 2), 1e-9);
    assert.equal(taken?.limiting, true);
  });

  it("half-widths of the interval: t times the random part and 1.96 times the common part", async () => {
    const fit = await fitWith("", "    start fixed\n", "taken A 0.100(2) mol/L");
    const k = fit.parameters["k"];
    assert.ok(k?.interval95 !== null && k !== undefined && k.uRandom !== null && k.uCommon !== null);
    assert.equal(k.by, "t");
    // t(0.975; 24) = 2.0639 (from memory: any table of Student's t)
    const half = Math.sqrt((2.0639 * k.uRandom) ** 2 + (1.96 * k.uCommon) ** 2);
    close(k.interval95[1] - k.value, half, 1e-4);
    close(k.value - k.interval95[0], half, 1e-4);
  });

  it("a chord: the offset cancels, the scale does not, the random part is √2 u / Δt", async () => {
    const chord = "  rate from 0 s to 80 s\n";
    const offset = (await runWith("      random 0.0005 mol/L\n      common 0.01 mol/L", chord)).rates[0];
    close(offset?.rate?.u, (Math.SQRT2 * 0.0005) / 80, 1e-9);
    const scale = (await runWith("      random 0.0005 mol/L\n      common 10 %", chord)).rates[0];
    const v = scale?.rate?.value ?? 0;
    close(scale?.rate?.u, Math.sqrt(((Math.SQRT2 * 0.0005) / 80) ** 2 + (0.1 * v) ** 2), 1e-9);
    close(offset?.rate?.value, (rows[0]?.[1] ?? 0) / 80 - (rows[10]?.[1] ?? 0) / 80, 1e-9);
    assert.equal(offset?.species?.name, "A");
    close(offset?.species?.rate.value, -v, 1e-9);
  });
});
