import assert from "node:assert/strict";
import { htmlReport } from "../../src/report/htmlReport.js";
import { diagnostic, findingsWith, hostileTexts, inventedRun, refusedFit } from "./invented.js";
import { attributesOf, elementsOf } from "./wellFormed.js";

describe("HTML report", () => {
  const run = inventedRun();
  const page = htmlReport(
    findingsWith(
      [{ ...run, fits: [...run.fits, refusedFit(run)] }],
      [diagnostic("Follow it longer.", "run A/fit 1"), diagnostic("No formula is known.", null, "information")],
    ),
  );

  it("is one well-formed page in English that allows nothing from outside", () => {
    const elements = new Set(elementsOf(page));
    for (const name of ["script", "link", "iframe", "object", "img", "base", "form"])
      assert.ok(!elements.has(name), name);
    assert.match(page, /^<!DOCTYPE html>\n<html lang="en">/);
    assert.ok(
      page.includes(
        `<meta http-equiv="Content-Security-Policy" content="default-src 'none'; style-src 'unsafe-inline'; img-src data:">`,
      ),
    );
    const names = [...attributesOf(page)];
    assert.deepEqual(
      names.filter((name) => /^on|^src$|xlink/.test(name)),
      [],
    );
    assert.doesNotMatch(page, /NaN|Infinity|undefined|\[object/);
  });

  it("reads downwards as the result is defended", () => {
    const heads = [...page.matchAll(/<h4>(.*?)<\/h4>/g)].map(([, head]) => head);
    assert.deepEqual(heads, ["What was done", "What was seen", "What follows", "How sure", "What to watch"]);
    const levels = [...page.matchAll(/<h(\d)>/g)].map(([, level]) => Number(level));
    assert.equal(levels[0], 1);
    assert.ok(
      levels.every((level, i) => i === 0 || level <= (levels[i - 1] ?? 0) + 1),
      `no level is skipped: ${levels}`,
    );
  });

  it("holds the figures of the findings in signs of print, each with its line", () => {
    for (const text of [
      "2 H₂O₂ → 2 H₂O + O₂",
      "<i>k</i></th><td>5.502(73)\u00a0×\u00a010⁻⁴\u00a0s⁻¹</td>",
      "1260(17)\u00a0s",
      "0.0780(20) mmol·L⁻¹·s⁻¹",
      "\u22120.1560(40) mmol·L⁻¹·s⁻¹",
      "scatter of the readings (random): 70 %",
      "scale of c (common): 30 %",
      "No rate constant: all readings are the same",
      "Follow it longer.",
      "No formula is known.",
      '<span class="line" data-line="7">line 7</span>',
      "0".repeat(64),
      "f".repeat(64),
    ]) {
      assert.ok(page.includes(text), text);
    }
  });

  it("has a picture with its words, and says where there is none", () => {
    assert.match(page, /<figure><svg [^>]*role="img"/);
    assert.match(page, /<figcaption>Dots: readings\. Unbroken curve: fit 1, order 1 in H₂O₂\. Shaded: its 95 % band\./);
    const follow = run.follow.map(({ time: _time, ...rest }) => rest);
    const bare = htmlReport(findingsWith([{ ...run, follow, fits: [], rates: [] }]));
    assert.match(bare, /There are no readings to draw\./);
    assert.match(bare, /No fit gave a rate constant/);
    elementsOf(bare);
  });

  it("serves light, dark and paper", () => {
    assert.match(page, /@media \(prefers-color-scheme: dark\)/);
    assert.match(page, /@media print/);
  });

  it("lists several descriptions at its top, and stands without any", () => {
    const two = findingsWith([run]);
    const both = htmlReport({
      ...two,
      descriptions: [...two.descriptions, ...findingsWith([run], [], "b.raterun").descriptions],
    });
    assert.match(
      both,
      /<nav aria-label="Descriptions"><ul><li><a href="#d1">runs\/peroxide\.raterun<\/a><\/li><li><a href="#d2">b\.raterun/,
    );
    elementsOf(htmlReport({ ...two, descriptions: [] }));
  });

  it("never leaves out a caution", () => {
    const cautions = [{ code: "gas", text: "Oxygen comes off.", species: ["O2"] }];
    assert.match(
      htmlReport(findingsWith([inventedRun(9, { cautions })])),
      /<strong>Caution\.<\/strong> Oxygen comes off\./,
    );
  });

  it("lets no text of the user out of its place", () => {
    const plain = new Set(elementsOf(page));
    for (const text of hostileTexts) {
      const hostile = inventedRun(5, {
        name: text,
        title: text,
        equation: text,
        cautions: [{ code: text, text, species: [text] }],
      });
      const follow = hostile.follow.map((one) => ({ ...one, species: text, column: text, sources: [] }));
      const fits = hostile.fits.map((fit) => ({
        ...fit,
        law: text,
        verdict: text,
        tests: [{ name: text, statistic: 0, p: null, text }],
      }));
      const rest = htmlReport(
        findingsWith([{ ...hostile, follow, fits }], [diagnostic(text, null), diagnostic(text, "run A")], text),
      );
      assert.deepEqual(
        elementsOf(rest).filter((name) => !plain.has(name)),
        [],
      );
      assert.deepEqual(
        [...attributesOf(rest)].filter((name) => !attributesOf(page).has(name)),
        [],
      );
    }
  });
});
