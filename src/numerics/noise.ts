/**
 * Standard deviation of the scatter of y about any smooth curve; x ascending and unevenly spaced as it may be. From how
 * far the points lie off the parabola through their neighbours (divided differences of third order, which no parabola
 * leaves anything of), or where four different x are not to be had, off the straight line. Null for fewer than 5 points.
 * Source: difference-based estimation, T. Gasser, L. Sroka and C. Jennen-Steinmetz, Biometrika 73 (1986) 625-633; higher
 * orders: P. Hall, J. W. Kay and D. M. Titterington, Biometrika 77 (1990) 521-528 (from memory).
 */
export function scatter(x: Float64Array, y: Float64Array): number | null {
  if (x.length < 5) return null;
  return byDifferences(x, y, 4) ?? byDifferences(x, y, 3);
}

/** Root mean square of normalised divided differences over `points` neighbours; null for fewer than two of them. */
function byDifferences(x: Float64Array, y: Float64Array, points: number): number | null {
  let sum = 0;
  let count = 0;
  for (let first = 0; first + points <= x.length; first++) {
    let difference = 0;
    let squares = 0;
    for (let i = first; i < first + points; i++) {
      let product = 1;
      for (let j = first; j < first + points; j++) if (j !== i) product *= (x[i] as number) - (x[j] as number);
      const weight = 1 / product;
      difference += weight * (y[i] as number);
      squares += weight * weight;
    }
    if (!Number.isFinite(squares) || squares === 0) continue;
    sum += (difference * difference) / squares;
    count++;
  }
  return count < 2 ? null : Math.sqrt(sum / count);
}
