import { waterVapourPressure } from "../chemistry/handbook/waterVapourPressure.js";
import { exp } from "../numerics/elementary.js";

/** Vapour pressure of water over the liquid. */
export interface WaterVapour {
  /** Pa */
  readonly pressure: number;
  /** dp/dT, Pa/K */
  readonly slope: number;
}

/**
 * Vapour pressure of pure liquid water at `temperature` (K) and its derivative, by the equation of Wagner and Pruss
 * (1993). Null outside 0 °C … 373.946 °C, where it does not hold. Powers are products and square roots, so that the
 * result is the same to the last bit everywhere.
 */
export function waterVapour(temperature: number): WaterVapour | null {
  const { criticalTemperature, criticalPressure, coefficients, lowest } = waterVapourPressure;
  if (!(temperature >= lowest && temperature <= criticalTemperature)) return null;
  const [a1, a2, a3, a4, a5, a6] = coefficients;
  const theta = 1 - temperature / criticalTemperature;
  const root = Math.sqrt(theta);
  const square = theta * theta;
  const cube = square * theta;
  const seventh = cube * cube * theta;
  const sum =
    a1 * theta + a2 * theta * root + a3 * cube + a4 * cube * root + a5 * square * square + a6 * seventh * root;
  const bySum =
    a1 + 1.5 * a2 * root + 3 * a3 * square + 3.5 * a4 * square * root + 4 * a5 * cube + 7.5 * a6 * cube * cube * root;
  const exponent = (criticalTemperature / temperature) * sum;
  const pressure = criticalPressure * exp(exponent);
  return { pressure, slope: (-pressure / temperature) * (exponent + bySum) };
}
