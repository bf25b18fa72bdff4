import { success } from '../outcome';
import type { StateProperty } from './property';
import { ofSpecies } from './property';

/* How much there is: densities, pressures, fractions. */

const idealGas = { method: 'ideal-gas law, p = nkT', sources: [], restsOn: [] } as const;
const byComposition = { method: 'from the composition', sources: [], restsOn: [] } as const;

export const amountProperties: readonly StateProperty[] = [
  {
    name: 'pressure',
    symbol: 'p',
    quantityKind: 'pressure',
    perSpecies: false,
    ...idealGas,
    compute: ({ point }) => success(point.pressure),
  },
  {
    name: 'temperature',
    symbol: 'T',
    quantityKind: 'temperature',
    perSpecies: false,
    ...idealGas,
    compute: ({ point }) => success(point.temperature),
  },
  {
    name: 'number_density',
    symbol: 'n',
    quantityKind: 'number_density',
    perSpecies: true,
    ...idealGas,
    compute: ({ point }) => success(point.numberDensity),
    computeFor: (one) => success(one.numberDensity),
  },
  {
    name: 'density',
    symbol: 'ρ',
    quantityKind: 'density',
    perSpecies: true,
    ...idealGas,
    compute: ({ density }) => success(density),
    computeFor: (one) => success(one.numberDensity * one.mass),
  },
  {
    name: 'molar_mass',
    symbol: 'M',
    quantityKind: 'molar_mass',
    perSpecies: true,
    ...byComposition,
    compute: ({ molarMass }) => success(molarMass),
    computeFor: ({ species }) => success(species.molarMass.value),
  },
  {
    ...ofSpecies('partial_pressure', (one, { point }) => success(one.moleFraction * point.pressure)),
    symbol: 'pᵢ',
    quantityKind: 'pressure',
    ...byComposition,
  },
  {
    ...ofSpecies('mole_fraction', (one) => success(one.moleFraction)),
    symbol: 'x',
    quantityKind: 'fraction',
    ...byComposition,
  },
  {
    ...ofSpecies('mass_fraction', (one, { molarMass }) =>
      success((one.moleFraction * one.species.molarMass.value) / molarMass),
    ),
    symbol: 'w',
    quantityKind: 'fraction',
    ...byComposition,
  },
];
