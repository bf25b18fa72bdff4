/** The conditions that a standard flow refers to. */
export interface StandardReference {
  /** K */
  readonly temperature: number;
  /** Pa */
  readonly pressure: number;
}

/** 0 °C and 101 325 Pa, the usual reference of mass flow controllers (SEMI E12). */
export const standardReference: StandardReference = { temperature: 273.15, pressure: 101325 };

/** J/(mol·K), exact since 2019 (CODATA 2018): the product of the Boltzmann and the Avogadro constant. */
const molarGasConstant = 8.31446261815324;

/** Moles in a cubic metre of ideal gas at the reference, n = p / (R T). */
export function standardAmountPerVolume({ temperature, pressure }: StandardReference): number {
  return pressure / (molarGasConstant * temperature);
}
