import assert from "node:assert/strict";
import { UcumLhcUtils } from "@lhncbc/ucum-lhc";
import fc from "fast-check";
import { fromSI, toSI } from "../../src/quantity/conversion.js";
import { readUnit } from "../../src/quantity/readUnit.js";
import type { Unit } from "../../src/quantity/unit.js";
import { unitRows } from "../../src/quantity/unitTable.js";
import { valid } from "./faultOf.js";
import { apart, type CodedUnit, groups } from "./ucumCodes.js";

const ucum = UcumLhcUtils.getInstance();
const unit = (text: string): Unit => valid(readUnit(text)).unit;

function convertedThere(from: string, value: number, to: string): number {
  const { toVal, msg } = ucum.convertUnitTo(from, value, to);
  assert.ok(toVal !== null, `${from} to ${to}: ${msg.join(" ")}`);
  return toVal;
}

function agree(from: string, to: string, codes: readonly [string, string], value: number): void {
  const here = fromSI(toSI(value, unit(from)), unit(to));
  const there = convertedThere(codes[0], value, codes[1]);
  assert.ok(Math.abs(here / there - 1) < 1e-12, `${value} ${from} in ${to}: ${here} here, ${there} there`);
}

/** A unit with a prefix and an exponent, as it is written here and in UCUM. */
interface Written {
  readonly here: string;
  readonly there: string;
}

function written({ symbol, codes }: CodedUnit, prefix: string, exponent: number): Written {
  const power = (size: number): string => (size === 1 ? "" : `${size}`);
  const [first = ["", 1], ...rest] = codes;
  const all: (readonly [string, number])[] = [[prefix + first[0], first[1]], ...rest];
  return {
    here: `${prefix}${symbol}${exponent === 1 ? "" : `^${exponent}`}`,
    there: all.map(([code, own]) => code + power(own * exponent)).join("."),
  };
}

const chosen = (group: readonly CodedUnit[]): fc.Arbitrary<readonly [CodedUnit, string]> =>
  fc.constantFrom(...group).chain((one) => fc.constantFrom(...one.prefixes).map((prefix) => [one, prefix] as const));

/** Two units of one kind in the same power. */
const factor = fc
  .tuple(fc.constantFrom(...groups), fc.constantFrom(1, 1, 1, -1, -1, 2, -2, 3))
  .chain(([group, exponent]) =>
    fc
      .tuple(chosen(group), chosen(group))
      .map(([a, b]) => [written(a[0], a[1], exponent), written(b[0], b[1], exponent)] as const),
  );

describe("units against the UCUM library", () => {
  it("500 pairs of products, powers and prefixes agree to 12 digits", () => {
    const pairs = fc.sample(
      fc.tuple(fc.array(factor, { minLength: 1, maxLength: 3 }), fc.double({ min: 0.1, max: 1000, noNaN: true })),
      { seed: 41, numRuns: 900 },
    );
    const seen = new Set<string>();
    for (const [factors, value] of pairs) {
      const join = (side: 0 | 1, way: keyof Written): string =>
        factors.map((one) => one[side][way]).join(way === "here" ? " " : ".");
      const name = `${join(0, "here")} in ${join(1, "here")}`;
      if (seen.has(name) || join(0, "here") === join(1, "here")) continue;
      seen.add(name);
      agree(join(0, "here"), join(1, "here"), [join(0, "there"), join(1, "there")], value);
    }
    assert.ok(seen.size >= 500, `${seen.size}`);
  });

  it("each unit of the table, with each prefix of the groups, agrees with the first of its group", () => {
    for (const group of groups) {
      const [first] = group;
      assert.ok(first !== undefined);
      const base = written(first, "", 1);
      for (const one of group) {
        for (const prefix of one.prefixes) {
          const { here, there } = written(one, prefix, 1);
          agree(here, base.here, [there, base.there], 1.25);
        }
      }
    }
  });

  it("temperatures with a zero point agree", () => {
    const scales = [
      ["degC", "Cel"],
      ["degF", "[degF]"],
      ["K", "K"],
    ] as const;
    for (const [from, fromCode] of scales) {
      for (const [to, toCode] of scales) {
        for (const value of [-40, 0, 25, 98.6, 1000]) {
          const here = fromSI(toSI(value, unit(from)), unit(to));
          assert.ok(Math.abs(here - convertedThere(fromCode, value, toCode)) < 1e-10, `${value} ${from} in ${to}`);
        }
      }
    }
  });

  it("what is kept apart is so for the reason given, and nothing else is left out", () => {
    const compared = groups.flat().map(({ symbol }) => symbol);
    const left = unitRows.map(({ symbol }) => symbol).filter((symbol) => symbol !== "M" && !compared.includes(symbol));
    assert.deepEqual(left.sort(), Object.keys(apart).sort());
    for (const code of ["Da", "QHz"]) assert.equal(ucum.convertUnitTo(code, 1, code).toVal, null);
    assert.equal(convertedThere("AU", 1, "m"), 149597870691);
    const differs = (symbol: string, si: string, code: string, by: number): void => {
      const ratio = convertedThere(code, 1, si) / unit(symbol).factor - 1;
      assert.ok(Math.abs(ratio / by - 1) < 0.02, `${symbol}: ${ratio}`);
    };
    differs("mmHg", "Pa", "mm[Hg]", -2.9e-6); // unit notes of the same sources: 2.9e-6 below the conventional value
    differs("Torr", "Pa", "Torr", -2.76e-6); // 133.322 Pa against 101325/760 Pa
    differs("inHg", "Pa", "[in_i'Hg]", -2.9e-6);
    differs("u", "kg", "u", 6.81e-7); // 1.6605402e-27 kg, CODATA 1986
    differs("eV", "J", "eV", 4.35e-7); // 1.60217733e-19 J, CODATA 1986
  });
});
