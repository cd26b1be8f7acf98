import assert from "node:assert/strict";
import { waterVapour } from "../../src/monitor/waterVapour.js";

const at = (celsius: number): number => waterVapour(celsius + 273.15)?.pressure ?? assert.fail(`${celsius}`);

describe("vapour pressure of water", () => {
  // Triple point and boiling point at 1 atm as IAPWS publishes them (from memory), critical point by construction.
  const checks: [kelvin: number, pascal: number, relative: number][] = [
    [273.16, 611.657, 3e-7],
    [373.1243, 101325, 5e-7],
    [647.096, 22064000, 0],
  ];
  for (const [kelvin, pascal, relative] of checks) {
    it(`at ${kelvin} K is ${pascal} Pa`, () => {
      const { pressure } = waterVapour(kelvin) ?? assert.fail();
      assert.ok(Math.abs(pressure / pascal - 1) <= relative, `${pressure}`);
    });
  }

  /** °C, Pa: the equation of Wagner and Pruss (1993) computed in Python from coefficients that ten sources agree on. */
  const rows: [celsius: number, pascal: number][] = [
    [0, 611.213],
    [5, 872.53],
    [10, 1228.11],
    [15, 1705.68],
    [20, 2339.19],
    [25, 3169.82],
    [30, 4246.92],
    [35, 5629.06],
    [40, 7385.11],
    [45, 9595.34],
    [50, 12352.5],
    [55, 15762.8],
    [60, 19947.4],
    [65, 25042.7],
    [70, 31202.2],
    [75, 38596.7],
    [80, 47415.8],
    [85, 57868.1],
    [90, 70182.7],
    [95, 84609.0],
    [100, 101418.0],
  ];
  it("agrees with each row of the table to its six digits", () => {
    for (const [celsius, pascal] of rows) assert.equal(Number(at(celsius).toPrecision(6)), pascal, `${celsius} °C`);
  });

  /** °C, Pa: CRC Handbook of Chemistry and Physics, vapour pressure of water (from memory). */
  const handbook: [celsius: number, pascal: number][] = [
    [0, 611.3],
    [10, 1228.2],
    [20, 2339.3],
    [25, 3169.9],
    [30, 4246.9],
    [40, 7384.9],
    [60, 19946],
    [80, 47414],
    [100, 101420],
  ];
  it("agrees with the handbook to 2 in 10 000", () => {
    for (const [celsius, pascal] of handbook) assert.ok(Math.abs(at(celsius) / pascal - 1) < 2e-4, `${celsius} °C`);
  });

  it("its derivative is that of the pressure", () => {
    for (let kelvin = 274; kelvin < 640; kelvin += 7) {
      const step = kelvin * 1e-5;
      const [low, high] = [waterVapour(kelvin - step), waterVapour(kelvin + step)];
      const { slope } = waterVapour(kelvin) ?? assert.fail();
      assert.ok(low !== null && high !== null);
      const chord = (high.pressure - low.pressure) / (2 * step);
      assert.ok(Math.abs(slope / chord - 1) < 1e-7, `${kelvin} K: ${slope}, ${chord}`);
    }
  });

  it("25.0 mL over water at 22.0 °C and 100.8 kPa hold 0.99994 mmol of dry gas", () => {
    // p(H2O) = 2645.2 Pa; (100800 − 2645.2) Pa × 25.0e-6 m³ / (8.314462618 J/(mol K) × 295.15 K)
    const amount = ((100800 - at(22)) * 25e-6) / (8.314462618 * 295.15);
    assert.equal(amount.toPrecision(5), "0.00099994");
  });

  it("is null where the equation does not hold", () => {
    for (const kelvin of [0, 273.14, 647.1, 1000, Number.NaN, -5]) assert.equal(waterVapour(kelvin), null);
    assert.ok(waterVapour(273.15) !== null);
  });
});
