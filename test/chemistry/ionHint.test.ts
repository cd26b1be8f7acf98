import assert from "node:assert/strict";
import { ionHint, ionName } from "../../src/chemistry/ionHint.js";

describe("hints of ions (common practice)", () => {
  const hints: [formula: string, unicode: string, ascii: string][] = [
    ["KI", "gives K⁺ and I⁻", "gives K^+ and I^-"],
    ["Na2S2O3.5H2O", "gives 2 Na⁺ and S₂O₃²⁻", "gives 2 Na^+ and S2O3^2-"],
    ["Al2(SO4)3", "gives 2 Al³⁺ and 3 SO₄²⁻", "gives 2 Al^3+ and 3 SO4^2-"],
    ["H2SO4", "gives H⁺ and HSO₄⁻", "gives H^+ and HSO4^-"],
    ["K3[Fe(CN)6]", "gives 3 K⁺ and [Fe(CN)₆]³⁻", "gives 3 K^+ and [Fe(CN)6]^3-"],
  ];
  for (const [formula, unicode, ascii] of hints) {
    it(`${formula} ${ascii}`, () => {
      assert.equal(ionHint(formula, "unicode"), unicode);
      assert.equal(ionHint(formula, "ascii"), ascii);
    });
  }

  it("nothing is said of molecules, weak acids and what does not dissolve", () => {
    for (const text of ["H2O2", "CH3COOH", "NH3", "AgCl", "C12H22O11", "", "K^+"])
      assert.equal(ionHint(text, "ascii"), null);
  });

  it("ions have names", () => {
    assert.equal(ionName("S2O8^2-"), "peroxodisulfate");
    assert.equal(ionName("Fe^3+"), "iron(III)");
    assert.equal(ionName("[Fe(CN)6]^4-"), "hexacyanidoferrate(II)");
    assert.equal(ionName("H2O"), null);
  });
});
