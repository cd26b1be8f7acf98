import assert from "node:assert/strict";
import { cautionsOf } from "../../src/analysis/cautions.js";
import { ionsIn } from "../../src/analysis/ionsIn.js";
import { stoichiometry } from "../../src/analysis/stoichiometry.js";
import { gases } from "../../src/chemistry/handbook/gases.js";
import { ionGroups } from "../../src/chemistry/handbook/ionGroups.js";
import { pairs } from "../../src/chemistry/handbook/pairs.js";
import { substances } from "../../src/chemistry/handbook/substances.js";
import { readFormula } from "../../src/chemistry/readFormula.js";
import type { Run as RunFinding } from "../../src/contract/findings.js";
import { bind } from "../../src/language/bind/bind.js";
import { parse } from "../../src/language/parse.js";
import { isFault } from "../../src/quantity/shifted.js";

type Cautions = RunFinding["cautions"];

/** Cautions of the one run of a description; the first argument stands above the run, the others are its lines. */
function cautions(above: string, ...lines: string[]): Cautions {
  const text = `ratewright 1\n${above}\nrun A\n${lines.map((line) => `  ${line}\n`).join("")}`;
  const [source] = bind(parse("file:///cautions.raterun", text)).study.runs;
  assert.ok(source?.kind === "run", text);
  return cautionsOf(source.run, stoichiometry(source.run));
}

/** Codes with their species, in order: `dangerous-pair H2O2 KI`. */
function outline(found: Cautions): string[] {
  return found.map(({ code, species }) => [code, ...species].join(" "));
}

/** The text of the one caution of this code and these species. */
function textOf(found: Cautions, code: string, ...species: string[]): string {
  const fitting = found.filter((caution) => outline([caution])[0] === [code, ...species].join(" "));
  assert.equal(fitting.length, 1, `${code} ${species.join(" ")}: ${outline(found).join("; ")}`);
  return fitting[0]?.text ?? "";
}

const peroxide = "reaction 2H2O2(aq) -> 2H2O(l) + O2(g)";

describe("cautions: gas given off", () => {
  it("peroxide over iodide: how much oxygen, that it feeds fire, and the pair", () => {
    const found = cautions(peroxide, "volume 50.0 mL", "taken H2O2 0.100 mol/L", "taken KI 20 mmol/L as catalyst");
    assert.deepEqual(outline(found), [
      "gas-given-off O2",
      "oxidising-gas O2",
      "dangerous-substance H2O2",
      "dangerous-substance KI",
      "dangerous-pair H2O2 KI",
      "local-rules",
    ]);
    // By hand: 0.100 mol/L · 0.0500 L / 2 = 2.50 mmol; a mole takes 8.314463 · 298.15 / 101325 m³ = 24.465 L; 61.2 mL.
    const text = textOf(found, "gas-given-off", "O2");
    assert.match(text, /At most 2\.5 mmol, as an ideal gas about 61\.2 mL at 25 °C and 101\.325 kPa\./);
    assert.match(text, /closed vessel builds up pressure; .* head space, which is not stated/);
    // A row of the table names nitrogen too, for hydrazine: peroxide and iodide hold none.
    const pair = textOf(found, "dangerous-pair", "H2O2", "KI");
    assert.match(pair, /may give off O2/);
    assert.doesNotMatch(pair, /N2/);
  });

  it("limestone in acid: the acid does not run out", () => {
    const found = cautions(
      "reaction CaCO3(s) + 2HCl(aq) -> CaCl2(aq) + CO2(g) + H2O(l)",
      "volume 100 mL",
      "taken CaCO3 0.50 g",
      "taken HCl 1.0 mol/L",
    );
    // By hand: 0.50 g / 100.09 g/mol = 4.996 mmol of CaCO3 against 100 mmol / 2 of HCl; 4.996 mmol · 24.465 L/mol = 122 mL.
    assert.match(textOf(found, "gas-given-off", "CO2"), /At most 5 mmol, as an ideal gas about 122 mL/);
    assert.match(textOf(found, "asphyxiant-gas", "CO2"), /displaces the oxygen of the air; heavier than air/);
    assert.match(textOf(found, "dangerous-pair", "CaCO3", "HCl"), /never close the vessel .* may give off CO2/);
  });

  it("zinc in acid: hydrogen burns", () => {
    const found = cautions(
      "reaction Zn(s) + H2SO4(aq) -> ZnSO4(aq) + H2(g)",
      "volume 2.0 L",
      "taken Zn 130.76 g",
      "taken H2SO4 3.0 mol/L",
    );
    // By hand: 130.76 g / 65.38 g/mol = 2.00 mol of Zn against 6.0 mol of acid; 2.00 mol · 24.465 L/mol = 48.9 L.
    assert.match(textOf(found, "gas-given-off", "H2"), /At most 2 mol, as an ideal gas about 48\.9 L/);
    // 4 to 77 %: IEC 60079-20-1:2010, the wider of the two standards in the table.
    assert.match(textOf(found, "flammable-gas", "H2"), /burns in air from about 4 % to 77 % by volume/);
    assert.match(textOf(found, "dangerous-pair", "Zn", "H2SO4"), /hydrogen: no flames/);
  });

  it("says for a litre what it can where no volume is stated", () => {
    const text = textOf(cautions(peroxide, "taken H2O2 0.100 mol/L"), "gas-given-off", "O2");
    // By hand: 0.100 mol/L / 2 = 50.0 mmol in a litre; · 24.465 L/mol = 1.22 L.
    assert.match(text, /At most 50 mmol for each litre of the mixture \(no volume is stated\), .* about 1\.22 L at/);
  });

  it("says what lacks where the amount cannot be known", () => {
    const zinc = "reaction Zn(s) + H2SO4(aq) -> ZnSO4(aq) + H2(g)";
    const withoutVolume = cautions(zinc, "taken Zn 1.0 g", "taken H2SO4 0.5 mol/L");
    assert.match(textOf(withoutVolume, "gas-given-off", "H2"), /cannot be said: no volume is stated\./);
    const withoutZinc = cautions(zinc, "volume 50 mL", "taken H2SO4 0.5 mol/L");
    assert.match(textOf(withoutZinc, "gas-given-off", "H2"), /cannot be said: the amount of Zn is not known\./);
    const unbalanced = cautions("reaction H2O2 -> H2O + O2(g)", "volume 50 mL", "taken H2O2 0.1 mol/L");
    assert.match(textOf(unbalanced, "gas-given-off", "O2"), /cannot be said: the equation does not balance\./);
    const halves = cautions("reaction H2O2 -> H2O + 1/2 O2(g)", "volume 50 mL", "taken H2O2 0.1 mol/L");
    assert.match(textOf(halves, "gas-given-off", "O2"), /At most 2\.5 mmol/);
    const nought = cautions(peroxide, "volume 50 mL", "taken H2O2 0 mol/L");
    assert.match(textOf(nought, "gas-given-off", "O2"), /cannot be said from what was taken\./);
  });

  it("takes a gas without a state for one, but not a solution or a liquid", () => {
    assert.ok(outline(cautions("reaction 2H2O2 -> 2H2O + O2")).includes("gas-given-off O2"));
    const solution = outline(cautions("reaction NaCl + H2SO4 -> NaHSO4 + HCl"));
    assert.ok(!solution.some((line) => line.startsWith("gas-given-off") || line.startsWith("toxic-gas")));
    assert.ok(solution.includes("dangerous-substance HCl"));
    const bromine = outline(cautions("reaction BrO3^- + 5Br^- + 6H^+ -> 3Br2(l) + 3H2O"));
    assert.ok(!bromine.includes("gas-given-off Br2") && bromine.includes("dangerous-substance Br2"));
    assert.ok(!outline(cautions("reaction CO3^2- + 2H^+ -> CO2(aq) + H2O")).includes("gas-given-off CO2"));
    assert.ok(outline(cautions("reaction NaCl + H2SO4 -> NaHSO4 + HCl(g)")).includes("toxic-gas HCl"));
  });

  it("claims no rising pressure where as much gas is used up", () => {
    const text = textOf(cautions("reaction H2(g) + I2(g) -> 2HI(g)"), "gas-given-off", "HI");
    assert.match(text, /does not raise the pressure/);
    assert.doesNotMatch(text, /builds up/);
  });

  it("warns once of a gas with several dangers, under the gravest", () => {
    const found = cautions("reaction Na2S + 2HCl -> 2NaCl + H2S(g)");
    const gas = found.filter(({ code, species }) => code.endsWith("-gas") && species.includes("H2S"));
    assert.deepEqual(outline(gas), ["toxic-gas H2S"]);
    assert.match(gas[0]?.text ?? "", /toxic, flammable/);
  });

  it("does not let a toxic gas pass because it is written as dissolved", () => {
    const text = textOf(cautions("reaction CN^- + H^+ -> HCN(aq)"), "toxic-gas", "HCN");
    assert.match(text, /Dissolved, it can leave the solution/);
  });
});

describe("cautions: substances", () => {
  it("says which strength the hazard is for", () => {
    const found = cautions(peroxide, "taken H2O2 0.1 mol/L", "taken NaOH 0.1 mol/L as inert");
    assert.match(
      textOf(found, "dangerous-substance", "H2O2"),
      /hydrogen peroxide solution, 8 to 35 % .*for that strength; other strengths are classed otherwise/,
    );
    assert.match(
      textOf(found, "dangerous-substance", "NaOH"),
      /substance as named; a solution is classed by its strength/,
    );
  });

  it("knows an isomer by its structure or its name only", () => {
    const ester = (name: string, declared = "") =>
      outline(cautions(declared, `taken ${name} 10 mmol/L`)).filter((line) => line !== "local-rules");
    assert.deepEqual(ester("CH3COOC2H5"), ["dangerous-substance CH3COOC2H5"]);
    assert.deepEqual(ester("EtOAc", "species EtOAc is C4H8O2"), ["dangerous-substance EtOAc"]);
    assert.deepEqual(ester("acetone", "species acetone"), ["dangerous-substance acetone"]);
    assert.deepEqual(ester("C4H8O2"), [], "butanoic acid is C4H8O2 too");
    assert.deepEqual(ester("acetone", "species acetone is C3H8O"), [], "the name and the formula do not agree");
  });

  it("takes hydrates, and salts of an ion that the table has in another salt", () => {
    assert.match(textOf(cautions("", "taken CuSO4 1 mmol/L"), "dangerous-substance", "CuSO4"), /pentahydrate/);
    const own = textOf(cautions("", "taken K2S2O8 1 mmol/L"), "dangerous-substance", "K2S2O8");
    assert.match(own, /K2S2O8: as potassium peroxodisulfate/);
    const other = textOf(cautions("", "taken Na2S2O8 1 mmol/L"), "dangerous-substance", "Na2S2O8");
    assert.match(other, /Na2S2O8 shares an ion with potassium peroxodisulfate/);
    const ion = textOf(cautions("reaction 2I^- + S2O8^2- -> I2 + 2SO4^2-"), "dangerous-substance", "S2O8^2-");
    assert.match(ion, /potassium peroxodisulfate/);
  });

  it("warns once of a salt and of its ion in the equation", () => {
    const found = outline(
      cautions("reaction H2O2 + 2I^- + 2H^+ -> I2 + 2H2O", "taken KI 1 mmol/L", "taken HCl 1 mmol/L"),
    );
    assert.ok(found.includes("dangerous-pair KI H2O2"));
    assert.ok(!found.some((line) => line.includes("I^-") || line.includes("H^+")), found.join("; "));
  });

  it("takes no declared name for the element of that symbol", () => {
    assert.deepEqual(cautions("species A\nspecies K\nreaction A -> K", "taken A 1 mol/L"), []);
    assert.ok(outline(cautions("reaction 2K + 2H2O -> 2KOH + H2")).includes("dangerous-pair K H2O"));
  });
});

describe("cautions: pairs", () => {
  it("hypochlorite and acid: chlorine, as salt and as ions", () => {
    const salt = cautions("reaction NaClO + 2HCl -> NaCl + Cl2 + H2O", "taken NaClO 10 mmol/L", "taken HCl 0.1 mol/L");
    assert.match(
      textOf(salt, "dangerous-pair", "NaClO", "HCl"),
      /^Danger, .*toxic gas; may give off Cl2.*as supplied\.$/,
    );
    assert.match(textOf(salt, "toxic-gas", "Cl2"), /toxic/);
    const ions = cautions("reaction ClO^- + Cl^- + 2H^+ -> Cl2 + H2O");
    assert.match(textOf(ions, "dangerous-pair", "ClO^-", "H^+"), /^Danger/);
  });

  it("says the condition of a pair", () => {
    const stated = cautions("", "taken K2Cr2O7 1 mmol/L", "taken HCl 1 mol/L");
    assert.match(textOf(stated, "dangerous-pair", "K2Cr2O7", "HCl"), /Condition: concentrated acid\./);
    const byGroup = cautions("", "taken H2SO4 1 mol/L", "taken KI 1 mmol/L");
    assert.match(textOf(byGroup, "dangerous-pair", "H2SO4", "KI"), /Condition: concentrated acid\./);
  });

  it("puts the gravest first where two substances meet in several rows", () => {
    const found = cautions("", "taken HNO3 1 mol/L", "taken C2H5OH 1 mol/L");
    assert.match(
      textOf(found, "dangerous-pair", "HNO3", "C2H5OH"),
      /^Danger, .*delayed and violent oxidation.* Also: /,
    );
  });

  it("does not pair a substance with itself, though it carries both groups", () => {
    const found = outline(cautions("", "taken NH4NO3 1 mol/L", "taken NaCl 1 mol/L"));
    assert.deepEqual(found, ["dangerous-substance NH4NO3", "local-rules"]);
    assert.deepEqual(outline(cautions("", "taken CH3COOH 1 mol/L", "taken CH3CO2H 1 mol/L")), [
      "dangerous-substance CH3COOH",
      "dangerous-substance CH3CO2H",
      "local-rules",
    ]);
  });

  it("knows insoluble salts, and takes no weak base or acid for a strong one", () => {
    const magnesite = cautions("reaction MgCO3 + 2HCl -> MgCl2 + CO2 + H2O");
    assert.match(textOf(magnesite, "dangerous-pair", "MgCO3", "HCl"), /foams/);
    const groups = (text: string) => {
      const reading = readFormula(text);
      return isFault(reading) ? [] : ionsIn(reading.formula).rows.map(({ body, sign }) => body + sign);
    };
    assert.deepEqual(groups("Ba(OH)2"), ["OH-"]);
    assert.deepEqual(groups("Mg(OH)2"), []);
    assert.deepEqual(groups("HCN"), []);
    assert.deepEqual(groups("NaHCO3"), ["HCO3-"]);
    assert.deepEqual(groups("(NH4)2S2O8"), ["NH4+", "S2O8-"]);
    assert.deepEqual(groups("K4[Fe(CN)6]"), ["[Fe(CN)6]-"]);
    assert.deepEqual(groups("Fe(NO3)3.9H2O"), ["Fe+", "NO3-"]);
    assert.deepEqual(groups("H2O"), []);
  });
});

describe("cautions: the list", () => {
  it("is empty where nothing is known", () => {
    assert.deepEqual(cautions("species A\nspecies P\nreaction A -> P", "taken A 1 mol/L"), []);
    assert.deepEqual(cautions("", "volume 1 L"), []);
  });

  it("ends with the one sentence that defers, and is the same every time", () => {
    const lines = ["volume 1 L", "taken HNO3 1 mol/L", "taken Zn 1 g", "taken KMnO4 1 mmol/L"] as const;
    const found = cautions("", ...lines);
    assert.deepEqual(cautions("", ...lines), found);
    assert.equal(found.filter(({ code }) => code === "local-rules").length, 1);
    const last = found.at(-1);
    assert.deepEqual(last?.species, []);
    assert.match(
      last?.text ?? "",
      /nothing listed never means safe.*[Ll]ocal rules.*label.*safety data sheet.*licensed/,
    );
  });

  it("stands a broken reaction", () => {
    const found = cautions("reaction 2H2O2(aq) -> Qq", "volume 1 L", "taken NaN3 1 mmol/L");
    assert.deepEqual(outline(found), ["dangerous-substance NaN3", "local-rules"]);
  });
});

describe("cautions: the tables", () => {
  it("hang together", () => {
    const carried = new Set([...substances, ...gases, ...ionGroups].flatMap(({ groups }) => groups ?? []));
    const known = new Set(gases.map(({ formula }) => formula));
    for (const { a, b, gives } of pairs) {
      for (const group of [...a, ...b]) assert.ok(carried.has(group), `no substance carries ${group}`);
      for (const gas of gives) assert.ok(known.has(gas), `no gas ${gas}`);
    }
    for (const { like, body } of ionGroups) {
      assert.ok(like === undefined || substances.some(({ name }) => name === like), `${body}: no reagent ${like}`);
    }
    const written = substances.flatMap((row) => row.written ?? []);
    assert.equal(new Set(written).size, written.length, "a structural formula means one reagent");
    const names = substances.flatMap((row) => row.known);
    assert.equal(new Set(names).size, names.length, "a name means one reagent");
  });

  it("find each reagent by its composition and its structural formulas", () => {
    for (const row of substances) {
      const formulas = [...(row.composition ? [row.formula] : []), ...(row.written ?? [])];
      for (const formula of formulas) {
        if (row.hazards.length === 0 && row.also === undefined) continue;
        const found = cautions("", `taken ${formula} 1 mmol/L`);
        assert.ok(textOf(found, "dangerous-substance", formula).includes(row.name), `${formula} is not ${row.name}`);
      }
    }
  });
});
