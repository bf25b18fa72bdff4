import { R } from '../../physics/constants';
import { reportGasRemarks } from '../gasRemarks';
import { quantityInput } from '../inputs';
import { statedGas } from '../mixture';
import { entryEdit } from '../needs';
import { contradictoryInput } from '../problems/contradictoryInput';
import { missingInput } from '../problems/missingInput';
import { quantity, show } from '../quantity';
import type { Scope } from '../scope';
import type { Quantity } from '../values';
import type { Given, Kind } from './kind';
import { length, ofQuantity } from './kind';

export const species: Kind = {
  word: 'species',
  title: 'a species',
  meaning: 'a molecule that is not built in: a gas by what the file states of it',
  role: 'substance',
  heads: [],
  keys: [
    ofQuantity('molar_mass', 'molar_mass', 'mass per amount of substance', '100 g/mol', { symbol: 'M' }),
    length('diameter', 'the hard-sphere diameter; the viscosity follows from it where nothing better is given', '4 Å', {
      symbol: 'd',
    }),
    length(
      'lj_sigma',
      'the length of the Lennard-Jones potential, from which the viscosity follows unless it is given',
      '4 Å',
      { symbol: 'σ' },
    ),
    ofQuantity('lj_epsilon', 'temperature', 'the depth of the Lennard-Jones potential over k', '200 K', {
      symbol: 'ε/k',
    }),
    table('viscosity', 'viscosity', 'the viscosity, or a table of it over temperature', '15 µPa·s'),
    table(
      'heat_capacity',
      'molar_heat_capacity',
      'per amount at constant pressure, or a table of it over temperature',
      '50 J/(mol·K)',
    ),
    table(
      'vapour_pressure',
      'pressure',
      'the saturation pressure, or a table of it over temperature, between whose rows ln p is straight over 1/T',
      '1 mbar',
    ),
    ofQuantity(
      'dipole',
      'electric_dipole',
      'the electric dipole moment, which makes the potential that of Stockmayer',
      '1 D',
      { bound: 'not-negative' },
    ),
    ofQuantity('critical_temperature', 'temperature', 'the critical temperature', '400 K'),
    ofQuantity('critical_pressure', 'pressure', 'the critical pressure', '40 bar'),
    ofQuantity('acentric_factor', 'number', 'the acentric factor', '0.1', { bound: 'any' }),
    {
      name: 'hazards',
      meaning: 'its hazards, as a text; GHS classes by name, with semicolons between them, count in mixtures',
      example: '"flammable gas"',
      type: { kind: 'words', meaning: 'hazards' },
    },
  ],
  needs: [{ count: 1, of: ['molar_mass'] }],
  hint: ['molar_mass'],
  later: [],
  snippet: 'species ${1:name} {\n  molar_mass = ${2:100 g/mol}\n  diameter   = ${3:4 Å}\n}',
  compute: (given, scope) => {
    const { node, inputs } = given;
    if (node.name.kind !== 'name') return undefined;
    const whole = together.map((keys) => isWhole(keys, given, scope)).every(Boolean);
    if (!whole || !heatCapacityFits(given, scope) || !vapourPressureRises(given, scope)) return undefined;
    const gas = statedGas({ name: node.name.text, inputs });
    reportGasRemarks(gas, node.name.span, scope);
    return gas;
  },
};

/** What says nothing without the others. */
const together = [
  ['lj_sigma', 'lj_epsilon'],
  ['critical_temperature', 'critical_pressure', 'acentric_factor'],
] as const;

function isWhole(keys: readonly string[], { node, inputs }: Given, scope: Scope): boolean {
  const missing = keys.filter((key) => !inputs.has(key));
  const [first] = keys.filter((key) => inputs.has(key));
  if (missing.length === 0 || first === undefined) return true;
  for (const name of missing) {
    const text = `${name} = ${species.keys.find((key) => key.name === name)?.example ?? ''}`;
    const fixes = [{ title: `Add ${text}`, edits: [entryEdit(node, text)] }];
    scope.report(
      missingInput.at(node.name.span, { what: `a species with ${first}`, count: 1, of: [name], given: [], fixes }),
    );
  }
  return false;
}

/** Moving alone takes 5/2 R at constant pressure; the rounding of a printed value is let pass. */
function heatCapacityFits({ inputs, place }: Given, scope: Scope): boolean {
  const least = 2.5 * R;
  const low = valuesOf('heat_capacity', inputs).find(({ si }) => si < least * (1 - 1e-3));
  if (!low) return true;
  const bound = show({ ...quantity(least, low.dimension), ...(low.unit ? { unit: low.unit } : {}) });
  const why = `a heat capacity of ${show(low)} is less than 5/2 R, ${bound}, which every gas takes by the motion of its molecules`;
  scope.report(contradictoryInput.at(place('heat_capacity'), { why }));
  return false;
}

function vapourPressureRises({ inputs, place }: Given, scope: Scope): boolean {
  const values = valuesOf('vapour_pressure', inputs);
  const fall = values.findIndex((value, index) => index > 0 && value.si <= (values[index - 1]?.si ?? 0));
  const [before, after] = [values[fall - 1], values[fall]];
  if (!before || !after) return true;
  const why = `a vapour pressure rises with the temperature, but here ${show(after)} comes after ${show(before)}`;
  scope.report(contradictoryInput.at(place('vapour_pressure'), { why }));
  return false;
}

/** The value of a key, or those of its table in order of temperature. */
function valuesOf(key: string, inputs: Given['inputs']): readonly Quantity[] {
  const value = inputs.get(key);
  if (value?.kind === 'table') return value.rows.map((row) => row.value);
  const constant = quantityInput(inputs, key);
  return constant ? [constant] : [];
}

/** A material property may be constant or a table over temperature. */
function table(name: string, quantity: string, meaning: string, example: string): Kind['keys'][number] {
  return {
    name,
    meaning,
    example,
    type: { kind: 'quantity', quantity, bound: 'positive', orTableOver: 'temperature' },
  };
}
