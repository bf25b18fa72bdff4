/** A physical constant, with the place where its value is published. */
export interface Constant {
  /** As written after `const.` */
  readonly name: string;
  readonly symbol: string;
  readonly title: string;
  readonly value: number;
  readonly unit: string;
  readonly source: string;
  /** One standard uncertainty, in the same unit; absent where the value is exact. */
  readonly uncertainty?: number;
}

const exact = 'SI Brochure, 9th edition (2019), table 1; exact';
const codata = 'CODATA 2018: Tiesinga, Mohr, Newell & Taylor, Rev. Mod. Phys. 93, 025010 (2021)';

export const constants = [
  { name: 'k', symbol: 'k', title: 'Boltzmann constant', value: 1.380649e-23, unit: 'J/K', source: exact },
  { name: 'N_A', symbol: 'N_A', title: 'Avogadro constant', value: 6.02214076e23, unit: '1/mol', source: exact },
  {
    name: 'R',
    symbol: 'R',
    title: 'molar gas constant',
    value: 8.31446261815324,
    unit: 'J/(mol·K)',
    source: `${codata}; exact, N_A k`,
  },
  { name: 'h', symbol: 'h', title: 'Planck constant', value: 6.62607015e-34, unit: 'J·s', source: exact },
  { name: 'e', symbol: 'e', title: 'elementary charge', value: 1.602176634e-19, unit: 'C', source: exact },
  { name: 'c', symbol: 'c', title: 'speed of light in vacuum', value: 299792458, unit: 'm/s', source: exact },
  {
    name: 'u',
    symbol: 'u',
    title: 'atomic mass constant',
    value: 1.6605390666e-27,
    unit: 'kg',
    source: codata,
    uncertainty: 5.0e-37,
  },
  {
    name: 'eps_0',
    symbol: 'ε₀',
    title: 'vacuum electric permittivity',
    value: 8.8541878128e-12,
    unit: 'F/m',
    source: codata,
    uncertainty: 1.3e-21,
  },
  {
    name: 'sigma',
    symbol: 'σ',
    title: 'Stefan–Boltzmann constant',
    value: 5.6703744191844294e-8,
    unit: 'W/(m²·K⁴)',
    source: `${codata}; exact, 2 π⁵ k⁴ / (15 h³ c²)`,
  },
  {
    name: 'g_n',
    symbol: 'g_n',
    title: 'standard acceleration of gravity',
    value: 9.80665,
    unit: 'm/s²',
    source: '3rd CGPM (1901), declaration; exact',
  },
  {
    name: 'n_0',
    symbol: 'n₀',
    title: 'Loschmidt constant at 273.15 K and 101.325 kPa',
    value: 2.686780111798444e25,
    unit: '1/m³',
    source: `${codata}; exact, p / (k T)`,
  },
] as const satisfies readonly Constant[];

export type ConstantName = (typeof constants)[number]['name'];

const byName = new Map<string, Constant>(constants.map((constant) => [constant.name, constant]));

export function constantNamed(name: ConstantName): Constant;
export function constantNamed(name: string): Constant | undefined;
export function constantNamed(name: string): Constant | undefined {
  return byName.get(name);
}
