/** The accuracy that a property is to reach against published values: the largest median, and the largest deviation at all. */
export interface Aim {
  /** In the measure of the property: a share, or in its unit. */
  readonly median: number;
  readonly worst?: number;
  readonly words: string;
}

export const aims: ReadonlyMap<string, Aim> = new Map([
  ['viscosity', { median: 0.01, words: 'median 1 %' }],
  ['thermal_conductivity', { median: 0.03, words: 'median 3 %' }],
  ['diffusivity', { median: 0.04, worst: 0.1, words: 'median 4 %, worst 10 %' }],
  ['molar_heat_capacity_cp', { median: 0.003, words: '0.3 %' }],
  ['saturation_pressure', { median: 0.005, words: '0.5 % of reference equations, else 3 %' }],
  ['second_virial', { median: 5, words: '5 cm³/mol near room temperature' }],
]);
