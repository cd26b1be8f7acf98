/** How a gas dissolves in water. */
export interface HenryRow {
  readonly gas: string;
  /** concentration in water over pressure of the gas at 298.15 K, mol/(m³ Pa) */
  readonly constant: number;
  /** d ln H/d(1/T), K */
  readonly slope: number;
  /** the entry of the compilation */
  readonly entry: string;
}

function row(gas: string, constant: number, slope: number, entry: string): HenryRow {
  return { gas, constant, slope, entry };
}

/**
 * Henry's law solubility constants in water. Source: R. Sander, Atmos. Chem. Phys. 23 (2023) 10901-12440, version 5.0.0,
 * doi 10.5194/acp-23-10901-2023; rows marked 4.0: Atmos. Chem. Phys. 15 (2015) 4399-4981. Two digits, as printed there.
 * Those of Cl2, SO2, CO2, NH3 and H2S are of the gas itself, without what it becomes in water. HCl has no usable one.
 */
export const henryConstants: readonly HenryRow[] = [
  row("O2", 1.3e-5, 1500, "4.0, Sander et al. (2011)"),
  row("N2", 6.4e-6, 1300, "5.0.0, Burkholder et al. (2019)"),
  row("H2", 7.8e-6, 530, "5.0.0, Fernandez-Prini et al. (2003)"),
  row("CO2", 3.3e-4, 2400, "5.0.0, Sander et al. (2011)"),
  row("CO", 9.7e-6, 1300, "5.0.0, Burkholder et al. (2019)"),
  row("NO", 1.9e-5, 1600, "5.0.0, Sander et al. (2011)"),
  row("N2O", 2.4e-4, 2600, "5.0.0, Burkholder et al. (2019)"),
  row("CH4", 1.4e-5, 1600, "4.0, Sander et al. (2011)"),
  row("Cl2", 9.2e-4, 2000, "4.0, Sander et al. (2011)"),
  row("SO2", 0.013, 2900, "5.0.0, Burkholder et al. (2019)"),
  row("H2S", 0.001, 2100, "5.0.0, Burkholder et al. (2019)"),
  row("NH3", 0.59, 4200, "5.0.0, Burkholder et al. (2019)"),
];
