import assert from "node:assert/strict";
import { describeText, onlyRun } from "../support/describeText.js";
import { assertDigits } from "../support/digits.js";
import { certifiedFits, classicDecays } from "./publishedFits.js";

const csv = (header: string, x: readonly number[], y: readonly number[]): string =>
  `${header}\n${x.map((value, index) => `${value},${y[index]}`).join("\n")}\n`;

describe("published fits, through the whole way", () => {
  for (const { name, source, unit, t, y, k, infinity, residual, degreesOfFreedom } of certifiedFits) {
    it(`${name}: k and infinity to 8 certified digits, their standard errors to 6 (${source.slice(0, 50)} …)`, async () => {
      const text = `species A
species P
reaction A -> P
run ${name}
  data "${name}.csv"
    column t "t / ${unit}" ${unit}
    column y "y / mmol/L" mmol/L
  follow P as concentration from y
  fit order 1 in A
    start fixed 0 mmol/L
    infinity free
`;
      const description = await describeText(text, { [`${name}.csv`]: csv(`t / ${unit},y / mmol/L`, t, y) });
      const fit = onlyRun(description).fits[0];
      assert.ok(fit !== undefined);
      assert.equal(fit.stop, "converged");
      assertDigits("k", fit.parameters["k"]?.value, k[0], 8);
      assertDigits("u(k)", fit.parameters["k"]?.u, k[1], 6);
      assertDigits("infinity", fit.parameters["infinity"]?.value, infinity[0], 8);
      assertDigits("u(infinity)", fit.parameters["infinity"]?.u, infinity[1], 6);
      assertDigits("residual standard deviation", fit.residual?.value, residual, 6);
      assert.equal(fit.degreesOfFreedom, degreesOfFreedom);
      assert.equal(fit.parameters["k"]?.unit, `${unit}^-1`);
      assert.equal(fit.uKind, "scaled");
      assert.equal(fit.weights, "constant");
    });
  }

  for (const { name, source, reaction, species, number, t, c, kPrime, start, residual, halfLife } of classicDecays) {
    it(`${name}: k′, its u and the factor to k (${source.slice(0, 40)} …)`, async () => {
      const text = `reaction ${reaction}
run A
  temperature 318 K
  taken ${species} ${c[0]} mol/L
  data "c.csv"
    column t "t / s" s
    column c "c / mol L^-1" mol/L
  follow ${species} as concentration from c
  fit order 1 in ${species}
`;
      const description = await describeText(text, { "c.csv": csv("t / s,c / mol L^-1", t, c) });
      const fit = onlyRun(description).fits[0];
      assert.ok(fit !== undefined && fit.kPrime !== null);
      assertDigits("k′", fit.kPrime.value, kPrime[0], 9);
      assertDigits("u(k′)", fit.kPrime.u, kPrime[1], 8);
      assertDigits("k", fit.parameters["k"]?.value, kPrime[0] / number, 9);
      assertDigits("u(k)", fit.parameters["k"]?.u, kPrime[1] / number, 8);
      assertDigits("start", fit.parameters["start"]?.value, start[0], 9);
      assertDigits("u(start)", fit.parameters["start"]?.u, start[1], 8);
      assertDigits("residual standard deviation", fit.residual?.value, residual, 8);
      assertDigits("half-life", fit.halfLife?.value, halfLife, 8);
      assert.equal(fit.halfLife?.species, species);
      assert.equal(fit.parameters["infinity"]?.fixed, true);
      assert.equal(fit.parameters["infinity"]?.value, 0);
      assert.equal(fit.parameters["k"]?.by, "t");
    });
  }
});
