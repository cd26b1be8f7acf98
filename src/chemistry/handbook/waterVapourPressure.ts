/**
 * Coefficients of the vapour pressure of liquid water, ln(p/p_c) = (T_c/T)(a1 θ + a2 θ^1.5 + a3 θ^3 + a4 θ^3.5 + a5 θ^4 +
 * a6 θ^7.5) with θ = 1 − T/T_c. Source: W. Wagner and A. Pruss, J. Phys. Chem. Ref. Data 22 (1993) 783-787 (IAPWS
 * SR1-86(1992)); the same as eq. 2.5 of J. Phys. Chem. Ref. Data 31 (2002) 387, doi 10.1063/1.1461829.
 */
export const waterVapourPressure = {
  /** critical temperature, K */
  criticalTemperature: 647.096,
  /** critical pressure, Pa */
  criticalPressure: 22064000,
  /** a1 … a6, without unit */
  coefficients: [-7.85951783, 1.84408259, -11.7866497, 22.6807411, -15.9618719, 1.80122502],
  /** K; the equation holds from the triple point at 273.16 K, and to 0 °C as a small extrapolation */
  lowest: 273.15,
} as const;
