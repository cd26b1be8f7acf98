import assert from "node:assert/strict";
import { boundText, mended, saidOf } from "../support/checkText.js";

const codes = (text: string): string[] => saidOf(text).map((said) => said.split(" ")[0] ?? "");

describe("one broken line never hides the lines around it", () => {
  const base = `species A
species P
reaction A -> P
run X
  temperature 25 °C
  data "x.csv"
    column t "t / s"
    column c "c / mol/L"
  follow A as concentration from c
  fit order 1 in A
    window 5 s to 60 s
    infinity free
run Y like X
  data "y.csv"
`;

  it("every line cut off anywhere gives at most one error, on itself or of what it no longer declares", () => {
    const lines = base.split("\n");
    lines.forEach((line, number) => {
      for (let cut = line.search(/\S/) + 1; cut < line.length; cut++) {
        const text = lines.with(number, line.slice(0, cut)).join("\n");
        const problems = boundText(text).problems.filter(({ severity }) => severity === "error");
        const start = lines.slice(0, number).join("\n").length;
        const elsewhere = problems.filter(({ origin }) => origin.start < start || origin.end > start + cut + 1);
        const allowed = new Set([
          "name-unknown",
          "species-unknown",
          "line-misplaced",
          "follow-not-in-reaction",
          "fit-not-in-reaction",
          "run-lacks-data",
          "run-lacks-follow",
          "like-later",
          "run-lacks-reaction",
        ]);
        assert.ok(problems.length - elsewhere.length <= 1, `${text}\n${problems.map(({ code }) => code).join(" ")}`);
        for (const { code } of elsewhere) assert.ok(allowed.has(code), `${line.slice(0, cut)}: ${code}`);
        if (cut > 12)
          assert.ok(elsewhere.length <= 1, `${line.slice(0, cut)}: ${elsewhere.map(({ code }) => code).join(" ")}`);
      }
    });
  });

  it("a run whose header is misspelt keeps its lines", () => {
    assert.deepEqual(codes(base.replace("run Y", "rum Y")), ["balance-unchecked", "word-unknown"]);
  });

  it("species of a broken reaction are not unknown", () => {
    const text = base
      .replace("species A\nspecies P\n", "")
      .replace("A -> P", "H2O2 = H2O + O2")
      .replaceAll("follow A", "follow H2O2")
      .replaceAll("in A", "in H2O2");
    assert.deepEqual(codes(text), ["equation-equals"]);
  });

  it("a line that is not known yet is an error on that line only", () => {
    const text = base.replace("  temperature 25 °C\n", "  temperature 25 °C\n  stirring 300 rpm\n");
    assert.deepEqual(codes(text), ["balance-unchecked", "word-unknown"]);
    const bound = boundText(text);
    assert.deepEqual(
      bound.study.runs.map((source) => (source.kind === "run" ? source.run.fits.length : 0)),
      [1, 1],
    );
  });
});

describe("runs like others", () => {
  const run = (text: string, name: string) => {
    for (const source of boundText(text).study.runs)
      if (source.kind === "run" && source.run.name === name) return source.run;
    throw new Error(`no run ${name}`);
  };
  const text = `species A
species P
reaction A -> P
temperature 20 °C
run X
  temperature 25 °C
  taken A 0.1 mol/L
  taken P 0.01 mol/L
  data "x.csv"
    column t "t / s"
    column c "c / mol/L"
  follow A as concentration from c
  rate initial
  rate at 5 s
  fit order 1 in A
run Y like X
  taken A 0.2 mol/L
  data "y.csv"
    column c "other / mol/L"
  rate at 9 s
run Z
  note "alone"
`;

  it("keyed lines replace by key, sets as a whole, a new data line keeps the columns", () => {
    const y = run(text, "Y");
    assert.deepEqual(
      y.taken.map(({ species, given }) => [species.key, given.value]),
      [
        ["A", 200],
        ["P", 10],
      ],
    );
    assert.equal(y.data?.path, "y.csv");
    assert.deepEqual(
      y.data?.columns.map(({ name, by }) => [name, by.value]),
      [
        ["t", { header: "t / s" }],
        ["c", { header: "other / mol/L" }],
      ],
    );
    assert.deepEqual(
      y.rates.map(({ kind, id }) => [kind, id]),
      [["instantaneous", "run Y/rate 1"]],
    );
    assert.equal(y.fits.length, 1);
    assert.equal(y.temperature?.value.value, 298.15);
  });

  it("what is said of a file is not said of the next one: excluded lines, time zero, how it is read", () => {
    const more = text.replace(
      'data "x.csv"\n',
      'data "x.csv"\n    exclude line 9 because "bubble"\n    time zero 3 s\n    skip 2 lines\n',
    );
    const { data } = run(more, "Y");
    assert.deepEqual([data?.exclusions, data?.timeZero, data?.skip, data?.columns.length], [[], null, null, 2]);
    assert.equal(run(more, "X").data?.exclusions.length, 1);
  });

  it("what stands above the first run holds for every run", () => {
    assert.equal(run(text, "Z").temperature?.value.value, 293.15);
    assert.equal(run(text, "X").temperature?.value.value, 298.15);
  });

  it("every fact of the study knows where it is written", () => {
    const y = run(text, "Y");
    const words = (origin: { start: number; end: number } | undefined): string =>
      text.slice(origin?.start, origin?.end);
    assert.equal(words(y.origin), "Y");
    assert.equal(words(y.data?.origin), 'data "y.csv"');
    assert.equal(words(y.taken[0]?.origin), "taken A 0.2 mol/L");
    assert.equal(words(y.taken[1]?.origin), "taken P 0.01 mol/L");
    assert.equal(words(y.fits[0]?.origin), "fit order 1 in A");
    assert.equal(words(y.temperature?.origin), "25 °C");
    assert.equal(words(y.data?.columns[1]?.by.origin), '"other / mol/L"');
  });

  it("names are known with every place that uses them", () => {
    const uses = boundText(text).uses.filter(({ kind, name }) => kind === "column" && name === "c");
    assert.deepEqual(
      uses.map(({ run: owner, declares, origin }) => [owner, declares, text.slice(0, origin.start).split("\n").length]),
      [
        ["X", true, 11],
        ["X", false, 12],
        ["Y", true, 19],
        ["Y", false, 12],
      ],
    );
  });

  it("a run cannot start like one below it", () => {
    assert.deepEqual(codes("run A like B\nrun B\n"), ["like-later"]);
  });
});

describe("what a broken or lost line may have said is not said to be missing", () => {
  /** That a series is not computed yet is beside the point. */
  const said = (text: string): string[] => saidOf(text).filter((words) => !words.startsWith("not-computed-yet"));
  const saidCodes = (text: string): string[] => said(text).map((words) => words.split(" ")[0] ?? "");
  const sound = `reaction 2 H2O2 -> 2 H2O + O2
run A
  temperature 25 °C
  data "x.csv"
    column t "t / s"
    column c "c / mol/L"
  follow H2O2 as concentration from c
  fit order 1 in H2O2
run B like A
series s
  across A, B
`;

  it("nothing is said of the sound text", () => assert.deepEqual(saidCodes(sound), []));

  for (const [what, words, instead] of [
    ["a data line by another name", 'data "x.csv"', 'file "x.csv"'],
    ["a follow line by another name", "follow", "watched"],
    ["a temperature by its symbol", "temperature", "T"],
    ["a column by another name", "column c", "spalte c"],
    ["a run by another name", "run B", "Versuch B"],
    ["a reaction by another name", "reaction", "equation"],
  ] as const) {
    it(`${what}: word-unknown alone, on that word`, () => {
      const text = sound.replace(words, instead);
      const [first, ...others] = said(text);
      assert.ok(first?.startsWith(`word-unknown “${instead.split(" ")[0]}”`), first);
      assert.deepEqual(others, []);
    });
  }

  it("a broken run line still names its run", () => {
    assert.deepEqual(saidCodes(sound.replace("run B like A", "run B lik A")), ["line-unexpected"]);
  });

  it("a broken species line, or a formula that cannot be read, does not leave a mass without its molar mass", () => {
    const text = "species ester is C4H8O2\nrun A\n  volume 50 mL\n  taken ester 1.0 g\n";
    assert.deepEqual(saidCodes(text), []);
    assert.deepEqual(saidCodes(text.replace(" is C4H8O2", "")), ["taken-needs-formula"]);
    assert.equal(saidCodes(text.replace("is", "ist")).length, 1);
    assert.equal(saidCodes(text.replace("C4H8O2", "4H8O2")).length, 1);
  });

  it("a sign in front of a line is taken out", () => {
    const text = sound.replace("  temperature", "- temperature");
    assert.deepEqual(saidCodes(text), ["word-unknown"]);
    assert.deepEqual(saidCodes(mended(text)), []);
  });
});
