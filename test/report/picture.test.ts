import assert from "node:assert/strict";
import type { Run } from "../../src/contract/findings.js";
import { pagePalette, paletteOf, type Theme } from "../../src/report/palette.js";
import { hoverStyle, reportStyle, runPicture } from "../../src/report/picture.js";
import { hostileTexts, inventedRun, quantity } from "./invented.js";
import { attributesOf, elementsOf } from "./wellFormed.js";

function pictureOf(run: Run, theme: Theme = "light"): string {
  return runPicture(run, run.follow[0] as Run["follow"][number], hoverStyle(paletteOf(theme))) ?? "";
}

/** Relative luminance and contrast of sRGB colours as WCAG 2.2 defines them (section "contrast ratio"). */
function contrast(a: string, b: string): number {
  const luminance = (colour: string): number => {
    const channels = [1, 3, 5].map((at) => Number.parseInt(colour.slice(at, at + 2), 16) / 255);
    const [r = 0, g = 0, bl = 0] = channels.map((c) => (c <= 0.04045 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4));
    return 0.2126 * r + 0.7152 * g + 0.0722 * bl;
  };
  const [dark = 0, bright = 0] = [luminance(a), luminance(b)].sort((x, y) => x - y);
  return (bright + 0.05) / (dark + 0.05);
}

describe("picture of a run", () => {
  it("holds every reading, the curve, its band, and the chord with its number", () => {
    const svg = pictureOf(inventedRun());
    assert.equal(svg.match(/h0(?=M|")/g)?.length, 21);
    assert.equal(svg.match(/fill-opacity="0.16"/g)?.length, 1);
    assert.match(svg, /stroke-dasharray="5 3"/);
    assert.match(svg, />1<\/text>/);
  });

  it("names its axes as quantity over unit, symbols slanted", () => {
    const svg = pictureOf(inventedRun());
    assert.ok(svg.includes('<tspan font-style="italic">c</tspan>(H₂O₂) / mmol·L⁻¹</text>'));
    assert.ok(svg.includes('<tspan font-style="italic">t</tspan> / s</text>'));
  });

  it("says in words what it shows", () => {
    const svg = pictureOf(inventedRun());
    assert.match(svg, /role="img"/);
    assert.match(svg, /<title>Run A: c\(H₂O₂\) \/ mmol·L⁻¹ against t \/ s<\/title>/);
    const words = /<desc>(.*?)<\/desc>/.exec(svg)?.[1] ?? "";
    assert.match(
      words,
      /^21 readings of column c, falling from 10.1 mmol L\^-1 to 0.597871 mmol L\^-1, between 0 s and 100 s\./,
    );
    assert.match(words, /Curve of fit 1, order 1 in H2O2: k = 5.502\(73\)e-4 s\^-1, with its 95 % band\./);
    assert.match(words, /Chord 1, average from 0 s to 50 s: 0.0780\(20\) mmol L\^-1 s\^-1\./);
  });

  it("is the same text each time, well formed, without script or reference", () => {
    for (const theme of ["light", "dark", "highContrast", "highContrastLight", "neutral"] as const) {
      const svg = pictureOf(inventedRun(), theme);
      assert.equal(svg, pictureOf(inventedRun(), theme));
      assert.deepEqual(
        [...new Set(elementsOf(svg))].sort(),
        ["desc", "path", "svg", "text", "title", "tspan"].concat(theme === "neutral" ? ["rect"] : []).sort(),
      );
      assert.ok([...attributesOf(svg)].every((name) => !/^on|href|src/.test(name)));
      assert.doesNotMatch(svg, /NaN|Infinity|undefined|url\(/);
    }
  });

  it("stays small however many readings there are", () => {
    const svg = pictureOf(inventedRun(50_000));
    const ribbon = /<path d="M([^"]*)" fill="none" stroke="[^"]*" stroke-opacity="0.45"/.exec(svg)?.[1] ?? "";
    const corners = ribbon.split("L").length;
    assert.ok(corners > 500 && corners <= 600, String(corners));
    assert.equal(ribbon.split("M").length, 1, "unbroken where readings follow each other");
    // The editor cuts hover text at 100 000 signs (its own limit, from memory); base64 makes three signs four.
    assert.ok(svg.length < 70_000, String(svg.length));
  });

  it("breaks the ribbon of many readings where none were made", () => {
    const run = inventedRun(5_000);
    const follow = run.follow.map((one) => ({
      ...one,
      signal: {
        unit: "V",
        values: (one.signal?.values ?? []).map((value, i) => (i > 2000 && i < 3000 ? null : value)),
      },
    }));
    const svg = pictureOf({ ...run, follow });
    assert.equal(
      /<path d="M([^"]*)" fill="none" stroke="[^"]*" stroke-opacity="0.45"/.exec(svg)?.[1]?.split("M").length,
      2,
    );
  });

  it("draws readings that no fit uses hollow", () => {
    const run = inventedRun();
    const fits = run.fits.map((fit) => ({
      ...fit,
      window: [quantity(0, "s"), quantity(50, "s")] as [ReturnType<typeof quantity>, ReturnType<typeof quantity>],
    }));
    const svg = pictureOf({ ...run, fits });
    assert.equal(svg.match(/h0(?=M|")/g)?.length, 11);
    assert.equal(svg.match(/a2\.5 2\.5 0 1 0 5 0/g)?.length, 10);
    assert.match(svg, /Readings outside the window of the fit are hollow\./);
  });

  it("has a strip of residuals in the report, where they belong to the readings", () => {
    const run = inventedRun();
    const follow = run.follow[0] as Run["follow"][number];
    const style = reportStyle(pagePalette);
    assert.match(runPicture(run, follow, style) ?? "", /reading − curve \/ mmol·L⁻¹/);
    const short = run.fits.map((fit) => ({ ...fit, residuals: { unit: "mmol L^-1", values: [0.1] } }));
    assert.doesNotMatch(runPicture({ ...run, fits: short }, follow, style) ?? "", /reading − curve/);
  });

  it("is none without readings, and bears a single reading, equal readings and cells without a number", () => {
    const run = inventedRun();
    const follow = run.follow[0] as Run["follow"][number];
    const { time: _time, ...bare } = follow;
    const style = hoverStyle(paletteOf("light"));
    assert.equal(runPicture(run, bare, style), null);
    const drawn = (time: (number | null)[], signal: (number | null)[]): string | null => {
      const one = { ...follow, time: { unit: "s", values: time }, signal: { unit: "V", values: signal } };
      return runPicture(inventedRun(21, { follow: [one], fits: [], rates: [] }), one, style);
    };
    assert.equal(drawn([], []), null);
    assert.equal(drawn([null], [1]), null);
    for (const svg of [
      drawn([0], [0]),
      drawn([5], [7]),
      drawn([0, 1, 2], [4, 4, 4]),
      drawn([0, 1, 2], [1e300, null, -1e300]),
    ]) {
      assert.doesNotMatch(svg ?? "NaN", /NaN|Infinity|undefined/);
    }
  });

  it("lets no text of the user out of its place", () => {
    for (const text of hostileTexts) {
      const run = inventedRun(5, { name: text });
      const follow = { ...(run.follow[0] as Run["follow"][number]), species: text, column: text, monitor: text };
      const svg = pictureOf({ ...run, follow: [follow] });
      assert.deepEqual([...new Set(elementsOf(svg))].sort(), ["desc", "path", "svg", "text", "title", "tspan"]);
    }
  });

  it("has colours that stand out from the grounds of their themes", () => {
    // Grounds of the hover in the themes that come with VS Code 1.99 (read from the editor); 4.5 is level AA of WCAG 2.2, 1.4.3.
    const grounds = {
      light: "#f8f8f8",
      dark: "#202020",
      highContrast: "#000000",
      highContrastLight: "#ffffff",
      neutral: "#fbfbf9",
    } as const;
    for (const [theme, ground] of Object.entries(grounds) as [Theme, string][]) {
      const { ink, faint, curves, mark } = paletteOf(theme);
      for (const colour of [ink, faint, mark, ...curves]) {
        assert.ok(contrast(colour, ground) >= 4.5, `${theme} ${colour} ${contrast(colour, ground).toFixed(2)}`);
      }
    }
  });
});
