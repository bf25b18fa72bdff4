import type { Kind } from './kind';
import { length, ofQuantity } from './kind';

export const species: Kind = {
  word: 'species',
  title: 'a species',
  meaning: 'a molecule that is not built in',
  role: 'substance',
  heads: [],
  keys: [
    ofQuantity('molar_mass', 'molar_mass', 'mass per amount of substance', '100 g/mol', { symbol: 'M' }),
    length('diameter', 'the hard-sphere diameter', '4 Å', { symbol: 'd' }),
    length('lj_sigma', 'the length of the Lennard-Jones potential', '4 Å', { symbol: 'σ' }),
    ofQuantity('lj_epsilon', 'temperature', 'the depth of the Lennard-Jones potential over k', '200 K', {
      symbol: 'ε/k',
    }),
    table('viscosity', 'viscosity', 'the viscosity, or a table of it over temperature', '15 µPa·s'),
    table(
      'heat_capacity',
      'molar_heat_capacity',
      'at constant pressure, or a table of it over temperature',
      '50 J/(mol·K)',
    ),
    table('vapour_pressure', 'pressure', 'the saturation pressure, or a table of it over temperature', '1 mbar'),
    ofQuantity('dipole', 'electric_dipole', 'the electric dipole moment', '1 D', { bound: 'not-negative' }),
    ofQuantity('critical_temperature', 'temperature', 'the critical temperature', '400 K'),
    ofQuantity('critical_pressure', 'pressure', 'the critical pressure', '40 bar'),
    ofQuantity('acentric_factor', 'number', 'the acentric factor', '0.1', { bound: 'any' }),
    {
      name: 'hazards',
      meaning: 'its hazards, as a text',
      example: '"flammable gas"',
      type: { kind: 'words', meaning: 'hazards' },
    },
  ],
  needs: [{ count: 1, of: ['molar_mass'] }],
  hint: ['molar_mass'],
  later: [],
  snippet: 'species ${1:name} {\n  molar_mass = ${2:100 g/mol}\n  diameter   = ${3:4 Å}\n}',
};

/** A material property may be constant or a table over temperature. */
function table(name: string, quantity: string, meaning: string, example: string): Kind['keys'][number] {
  return {
    name,
    meaning,
    example,
    type: { kind: 'quantity', quantity, bound: 'positive', orTableOver: 'temperature' },
  };
}
