import { R } from '../constants';
import type { Outcome } from '../outcome';
import { map, map2 } from '../outcome';
import type { Species } from '../species/species';
import { conductionMethod } from '../transport/conductivity';
import type { GasState } from './gasState';
import type { Method, StateProperty } from './property';
import { ofSpecies } from './property';

/* Heat capacities, sound, viscosity and conduction. Symbols: cp, cv molar heat capacities, M molar mass, ρ density. */

const heat = { sources: [], restsOn: ['heat_capacity'] } as const;
const idealGas = 'ideal gas, fitted heat capacity';
const blended = { method: 'ideal gas, mean over molecules', sources: [] } as const;

/** How a file's own molecule has its viscosity. */
function viscosityMethod({ viscosity, dipoleMoment }: Species): Method {
  if (viscosity?.source !== 'the file') return correlation;
  switch (viscosity.value.kind) {
    case 'potential':
      return dipoleMoment === undefined ? ofPotential : ofPolarPotential;
    case 'root-ratio':
      return { method: 'hard spheres of the diameter that the file states', sources: ['Chapman & Cowling 1970'] };
    default:
      return asStated;
  }
}

const asStated: Method = { method: 'as the file states it', sources: [] };
const ofPotential: Method = {
  method: 'second-order Chapman–Enskog with the 12-6 potential that the file states',
  sources: ['Hirschfelder 1954', 'Neufeld 1972'],
};
const ofPolarPotential: Method = {
  method: 'second-order Chapman–Enskog with the potential and the dipole that the file states, by Stockmayer',
  sources: ['Hirschfelder 1954', 'Neufeld 1972', 'Brokaw 1969'],
};

const heatMethod = ({ heatCapacity }: Species): Method =>
  heatCapacity?.source === 'the file'
    ? { method: 'ideal gas, heat capacity as the file states it', sources: [] }
    : { method: idealGas, sources: [] };

const ratio = (cp: number) => cp / (cp - R);
const soundSpeed = (cp: number, M: number, T: number) => Math.sqrt((ratio(cp) * R * T) / M);

const thermalDiffusivity = ({ conductivity, cp, density, molarMass }: GasState): Outcome<number> =>
  map2(conductivity, cp, (lambda, heat) => (lambda * molarMass) / (density * heat));

const eucken: Method = { method: 'modified Eucken', sources: ['Poling 2001'] };
const monatomic: Method = {
  method: 'first-order Chapman–Enskog, 15/4 R/M η, higher orders left out',
  sources: ['Chapman & Cowling 1970'],
};
const conductingMixture: Method = {
  method:
    'first-order mixture by Muckenfuss & Curtiss, internal part by Hirschfelder, joined to the species’ own values',
  sources: ['Muckenfuss & Curtiss 1958', 'Mason & Saxena 1958', 'Hirschfelder 1957', 'Neufeld 1972', 'Svehla 1962'],
};
const correlation: Method = { method: 'dilute-gas correlation', sources: [] };
const conductionMethods = { correlation, monatomic, eucken } as const;
const conduction = (species: Species): Method => conductionMethods[conductionMethod(species)];

/** A ratio with the conductivity in it has the conductivity's sources. */
function throughConduction(method: string): Pick<StateProperty, 'method' | 'sources' | 'methodFor' | 'mixed'> {
  return {
    method,
    sources: eucken.sources,
    methodFor: (species) => ({ method, sources: conduction(species).sources }),
    mixed: { method, sources: conductingMixture.sources },
  };
}

export const thermalProperties: readonly StateProperty[] = [
  {
    name: 'heat_capacity_cp',
    symbol: 'c_p',
    quantityKind: 'heat_capacity',
    perSpecies: true,
    method: idealGas,
    methodFor: heatMethod,
    mixed: blended,
    ...heat,
    compute: ({ cp, molarMass }) => map(cp, (value) => value / molarMass),
    computeFor: (one) => map(one.cp, (value) => value / one.species.molarMass.value),
  },
  {
    name: 'heat_capacity_cv',
    symbol: 'c_v',
    quantityKind: 'heat_capacity',
    perSpecies: true,
    method: idealGas,
    methodFor: heatMethod,
    mixed: blended,
    ...heat,
    compute: ({ cp, molarMass }) => map(cp, (value) => (value - R) / molarMass),
    computeFor: (one) => map(one.cp, (value) => (value - R) / one.species.molarMass.value),
  },
  {
    name: 'molar_heat_capacity_cp',
    symbol: 'C_p',
    quantityKind: 'molar_heat_capacity',
    perSpecies: true,
    method: idealGas,
    methodFor: heatMethod,
    mixed: blended,
    ...heat,
    compute: ({ cp }) => cp,
    computeFor: ({ cp }) => cp,
  },
  {
    name: 'molar_heat_capacity_cv',
    symbol: 'C_v',
    quantityKind: 'molar_heat_capacity',
    perSpecies: true,
    method: idealGas,
    methodFor: heatMethod,
    mixed: blended,
    ...heat,
    compute: ({ cp }) => map(cp, (value) => value - R),
    computeFor: ({ cp }) => map(cp, (value) => value - R),
  },
  {
    name: 'heat_capacity_ratio',
    symbol: 'γ',
    quantityKind: 'number',
    perSpecies: true,
    method: 'C_p/C_v of the ideal gas',
    ...heat,
    compute: ({ cp }) => map(cp, ratio),
    computeFor: ({ cp }) => map(cp, ratio),
  },
  {
    name: 'sound_speed',
    symbol: 'a',
    quantityKind: 'speed',
    perSpecies: true,
    method: 'ideal gas, √(γRT/M)',
    ...heat,
    compute: ({ cp, molarMass, point }) => map(cp, (value) => soundSpeed(value, molarMass, point.temperature)),
    computeFor: (one, { point }) =>
      map(one.cp, (value) => soundSpeed(value, one.species.molarMass.value, point.temperature)),
  },
  {
    name: 'viscosity',
    symbol: 'η',
    quantityKind: 'viscosity',
    perSpecies: true,
    method: 'dilute-gas correlation',
    methodFor: viscosityMethod,
    mixed: {
      method: 'first-order Chapman–Enskog mixture, joined to the species’ own viscosities',
      sources: ['Hirschfelder 1954', 'Neufeld 1972', 'Svehla 1962'],
    },
    sources: [],
    restsOn: ['viscosity'],
    compute: ({ viscosity }) => viscosity,
    computeFor: ({ viscosity }) => viscosity,
  },
  {
    name: 'kinematic_viscosity',
    symbol: 'ν',
    quantityKind: 'kinematic_viscosity',
    perSpecies: false,
    method: 'η/ρ',
    sources: [],
    restsOn: ['viscosity'],
    compute: ({ viscosity, density }) => map(viscosity, (eta) => eta / density),
  },
  {
    name: 'thermal_conductivity',
    symbol: 'λ_T',
    quantityKind: 'thermal_conductivity',
    perSpecies: true,
    ...eucken,
    methodFor: conduction,
    mixed: conductingMixture,
    restsOn: ['viscosity', 'conductivity', 'heat_capacity'],
    compute: ({ conductivity }) => conductivity,
    computeFor: ({ conductivity }) => conductivity,
  },
  {
    name: 'thermal_diffusivity',
    symbol: 'α',
    quantityKind: 'diffusivity',
    perSpecies: false,
    ...throughConduction('λ/(ρ c_p)'),
    restsOn: ['viscosity', 'conductivity', 'heat_capacity'],
    compute: thermalDiffusivity,
  },
  {
    name: 'prandtl',
    symbol: 'Pr',
    quantityKind: 'number',
    perSpecies: false,
    ...throughConduction('η c_p/λ'),
    restsOn: ['viscosity', 'conductivity', 'heat_capacity'],
    compute: ({ viscosity, conductivity, cp, molarMass }) =>
      map2(
        map2(viscosity, cp, (eta, heat) => (eta * heat) / molarMass),
        conductivity,
        (product, lambda) => product / lambda,
      ),
  },
  {
    ...ofSpecies('lewis', (one, state) => map2(thermalDiffusivity(state), one.diffusivity, (alpha, D) => alpha / D)),
    symbol: 'Le',
    quantityKind: 'number',
    ...throughConduction('α/D'),
    restsOn: ['viscosity', 'conductivity', 'heat_capacity', 'pair_potential'],
  },
];
