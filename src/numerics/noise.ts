/**
 * Standard deviation of the scatter of y about any smooth curve, from how far each point lies off the straight line
 * through its neighbours; x ascending and unevenly spaced as it may be. Null for fewer than 5 points. Source: T. Gasser,
 * L. Sroka and C. Jennen-Steinmetz, Biometrika 73 (1986) 625-633.
 */
export function scatter(x: Float64Array, y: Float64Array): number | null {
  let sum = 0;
  let count = 0;
  for (let i = 1; i + 1 < x.length; i++) {
    const before = x[i - 1] as number;
    const here = x[i] as number;
    const after = x[i + 1] as number;
    const width = after - before;
    const a = width > 0 ? (after - here) / width : 0.5;
    const b = 1 - a;
    const off = a * (y[i - 1] as number) + b * (y[i + 1] as number) - (y[i] as number);
    sum += (off * off) / (a * a + b * b + 1);
    count++;
  }
  return count < 3 ? null : Math.sqrt(sum / count);
}
