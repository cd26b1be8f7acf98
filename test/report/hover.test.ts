import assert from "node:assert/strict";
import { columnHover } from "../../src/report/hover.js";
import { diagnostic, hostileTexts, inventedRun, refusedFit } from "./invented.js";

const picture = /!\[[^\n]*\]\(data:image\/svg\+xml;base64,[A-Za-z0-9+/=]+\|width=360\)/;

describe("hover of a column", () => {
  it("is six lines: what is followed, fit, picture, rates, readings, what to watch", () => {
    const message = "Only 0.6 half-lives are followed (u(k) is 1.3 %). Follow it longer.";
    const lines = columnHover(inventedRun(), "c", "light", [diagnostic(message, "run A/fit 1")]).split("\n\n");
    assert.equal(lines.length, 6);
    assert.equal(lines[0], "**c** · H2O2 followed as concentration, run A");
    assert.equal(lines[1], "**order 1 in H2O2**: *k* = 5.502(73)e-4 s^-1, half-life of H2O2 1260(17) s");
    assert.match(lines[2] ?? "", picture);
    assert.deepEqual(lines.slice(3), [
      "Rate of reaction: (1) average from 0 s to 50 s 0.0780(20) mmol L^-1 s^-1",
      "Readings: all 21 used",
      "What to watch: Only 0.6 half-lives are followed (u(k) is 1.3 %).",
    ]);
  });

  it("is found by the id of the follow line too", () => {
    assert.equal(columnHover(inventedRun(), "run A/follow c", "dark"), columnHover(inventedRun(), "c", "dark"));
  });

  it("differs by theme in the picture only", () => {
    const [light, dark] = (["light", "dark"] as const).map((theme) => columnHover(inventedRun(), "c", theme));
    assert.notEqual(light, dark);
    assert.equal(light?.replace(picture, ""), dark?.replace(picture, ""));
  });

  it("shows all fits in the order of the text, a refused one with its verdict", () => {
    const run = inventedRun();
    const text = columnHover({ ...run, fits: [refusedFit(run), ...run.fits] }, "c", "light");
    const refused = text.indexOf("**order 1 in H2O2**: No rate constant: all readings are the same");
    assert.ok(refused > 0);
    assert.ok(text.indexOf("*k* = 5.502(73)e-4 s^-1") > refused);
  });

  it("says so where there are no readings, without a picture", () => {
    const run = inventedRun();
    const follow = run.follow.map(({ time: _time, signal: _signal, ...rest }) => ({ ...rest, points: 0, used: 0 }));
    const text = columnHover({ ...run, follow, fits: [refusedFit(run)], rates: [] }, "c", "light");
    assert.doesNotMatch(text, /!\[/);
    assert.match(text, /^Readings: none$/m);
  });

  it("of a column that nothing follows tells the span of the readings beside it", () => {
    const text = columnHover(inventedRun(), "t", "light");
    assert.equal(text, "**t** · time, run A\n\nReadings of c: all 21 used, time from 0 s to 100 s");
  });

  it("leaves out what belongs to another run, and what is only to know", () => {
    const found = [
      diagnostic("Of run AB.", "run AB/fit 1"),
      diagnostic("Of the file.", null),
      diagnostic("To know.", "run A", "information"),
    ];
    assert.doesNotMatch(columnHover(inventedRun(), "c", "light", found), /What to watch/);
  });

  it("lets no text of the user become markup", () => {
    for (const text of hostileTexts) {
      const run = inventedRun(5, { name: text });
      const follow = run.follow.map((one) => ({ ...one, species: text, column: text, monitor: text }));
      const fits = run.fits.map((fit) => ({ ...fit, law: text, parameters: {}, verdict: text }));
      const markdown = columnHover({ ...run, follow, fits }, text, "light", [diagnostic(text, "run A")]);
      const rest = markdown.replace(picture, "").replace(/\\./g, "");
      assert.doesNotMatch(rest, /[<>`[\]|$@]|:\/\/|www\./);
      assert.doesNotMatch(
        rest,
        /^(?!\*\*|Readings: |Rate of reaction: |What to watch: |$)/m,
        "each line begins with our words",
      );
    }
  });
});
