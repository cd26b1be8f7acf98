/** Invented readings of a first-order decay, c = 0.1 exp(-0.002 t), four decimals; one line a reading. */
export function decayCsv(readings = 40, step = 30): string {
  const rows = Array.from({ length: readings }, (_, index) => {
    const time = index * step;
    return `${time},${(0.1 * Math.exp(-0.002 * time)).toFixed(4)}`;
  });
  return `time / s,c / mol L^-1\n${rows.join("\n")}\n`;
}

/** A whole description of them, with characters before the ranges that take more bytes than UTF-16 units or two of these. */
export const decayRun = `ratewright 1
reaction H2O2(aq) -> H2O(l) + O2(g)
run A "µ · ₂ 𝒌 run"
  temperature 25.0 °C
  taken H2O2 0.1000(5) mol/L
  data "data/a.csv"
    column t "time / s"
    column c "c / mol L^-1"
  follow H2O2 as concentration from c
  rate from 0 s to 300 s
  fit order 1 in H2O2
`;
