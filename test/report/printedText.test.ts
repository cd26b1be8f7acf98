import assert from "node:assert/strict";
import { percentText } from "../../src/report/percentText.js";
import { printedEquation, printedSpecies } from "../../src/report/printedSpecies.js";
import { printedNumber, printedQuantity, printedSentence } from "../../src/report/printedText.js";

describe("signs of print", () => {
  it("numbers: true minus, powers of ten raised", () => {
    assert.equal(printedNumber("-5.502(73)e-4"), "\u22125.502(73) × 10⁻⁴");
    assert.equal(printedNumber("1.30(12)e13"), "1.30(12) × 10¹³");
    assert.equal(printedNumber("1 +/- 1.0e-30"), "1 ± 1.0 × 10⁻³⁰");
  });

  it("quantities: unit raised, kept on one line", () => {
    const text = printedQuantity({ text: "0.105(17) mmol L^-1 min^-1", unit: "mmol L^-1 min^-1" });
    assert.equal(text, "0.105(17)\u00a0mmol·L⁻¹·min⁻¹");
    assert.equal(printedQuantity({ text: "25.00(20) degC", unit: "degC" }), "25.00(20)\u00a0°C");
    assert.equal(printedQuantity({ text: "0.5", unit: "" }), "0.5");
    assert.equal(printedQuantity({ text: "not computed", unit: "s" }), "not computed");
  });

  it("sentences: numbers and units within, words and ranges untouched", () => {
    assert.equal(
      printedSentence("k = 5.50(7)e-4 min^-1 (95 %: -1e-4 to 2), Durbin-Watson, run 2-3"),
      "k = 5.50(7)\u00a0×\u00a010⁻⁴ min⁻¹ (95 %: \u22121\u00a0×\u00a010⁻⁴ to 2), Durbin-Watson, run 2-3",
    );
  });

  it("a sentence has degrees as they are printed", () => {
    assert.equal(printedSentence("wet at 22.0(2) degC"), "wet at 22.0(2) °C");
    assert.equal(printedSentence("column degCelsius"), "column degCelsius");
  });

  it("species: formulas lowered and charges raised, names as they are", () => {
    assert.equal(printedSpecies("Fe(CN)6^3-"), "Fe(CN)₆³⁻");
    assert.equal(printedSpecies("CH3COO^-"), "CH₃COO⁻");
    assert.equal(printedSpecies("dye2"), "dye2");
    assert.equal(printedSpecies("Blue 2"), "Blue 2");
    assert.equal(printedEquation("2 H2O2(aq) -> 2 H2O(l) + O2(g)"), "2 H₂O₂(aq) → 2 H₂O(l) + O₂(g)");
    assert.equal(printedEquation("A <=> B"), "A ⇌ B");
  });

  it("percentages never have an exponent", () => {
    const written = [1, 0.9996, 0.976, 0.38, 0.3417, 0.0996, 0.012, 0.0042, 0.00009, 0, 1.2, 12].map(percentText);
    assert.deepEqual(written, [
      "100 %",
      "100 %",
      "97.6 %",
      "38 %",
      "34 %",
      "10 %",
      "1.2 %",
      "0.42 %",
      "under 0.01 %",
      "0 %",
      "120 %",
      "1200 %",
    ]);
  });
});
