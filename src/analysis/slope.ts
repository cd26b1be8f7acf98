/** A slope of the signal, and what it rests on; SI. */
export interface Slope {
  /** weights of the readings: slope = Σ weight · reading, from index `from` on, s⁻¹ */
  readonly weights: Float64Array;
  readonly from: number;
  /** weights by which the scatter of the readings counts, and where they begin */
  readonly scatterWeights: Float64Array;
  readonly scatterFrom: number;
  /** what a straight or parabolic piece may miss of the bend of the signal; unit of the slope */
  readonly bend: number;
  /** the chord or tangent: two times and the signal there */
  readonly mark: { readonly time: [number, number]; readonly signal: [number, number] };
}
