import { h, k, R } from '../constants';
import { map, map2, success } from '../outcome';
import { measuredDiffusionSource } from '../transport/measuredDiffusion';
import type { GasState, SpeciesState } from './gasState';
import type { Method, StateProperty } from './property';
import { ofSpecies, overMolecules, total } from './property';

/*
 * Figures of the kinetic theory (Chapman & Cowling 1970, chapters 2, 4 and 5). Symbols: T temperature, m mass of a molecule,
 * n number density, c̄ mean speed, d hard-sphere diameter, λ mean free path, η viscosity, p pressure.
 */

const maxwell = { sources: ['Chapman & Cowling 1970'], restsOn: [] } as const;
const spheres = { sources: ['Chapman & Cowling 1970'], restsOn: ['viscosity'] } as const;

const byViscosity: Method = {
  method: 'hard-sphere diameter that gives the viscosity at this temperature, first-order Chapman–Enskog',
  sources: spheres.sources,
};

const pairDiffusionSources = [measuredDiffusionSource, 'Hirschfelder 1954', 'Neufeld 1972', 'Fuller 1966'] as const;

const mostProbable = ({ mass }: SpeciesState, { point }: GasState) => Math.sqrt((2 * k * point.temperature) / mass);
const rms = ({ mass }: SpeciesState, { point }: GasState) => Math.sqrt((3 * k * point.temperature) / mass);
const impingement = (one: SpeciesState) => (one.numberDensity * one.meanSpeed) / 4;
const wavelength = ({ mass }: SpeciesState, { point }: GasState) =>
  h / Math.sqrt(2 * Math.PI * mass * k * point.temperature);
const frequency = (one: SpeciesState) => map(one.freePath, (lambda) => one.meanSpeed / lambda);

export const kineticProperties: readonly StateProperty[] = [
  {
    name: 'mean_speed',
    symbol: 'c̄',
    quantityKind: 'speed',
    perSpecies: true,
    method: 'Maxwell distribution, √(8kT/πm)',
    mixed: { method: 'Maxwell distribution, mean over molecules', sources: ['Chapman & Cowling 1970'] },
    ...maxwell,
    compute: (state) => overMolecules(state, (one) => success(one.meanSpeed)),
    computeFor: (one) => success(one.meanSpeed),
  },
  {
    name: 'rms_speed',
    symbol: 'c_rms',
    quantityKind: 'speed',
    perSpecies: true,
    method: 'Maxwell distribution, √(3kT/m)',
    mixed: {
      method: 'Maxwell distribution, root mean square over mass, √(3RT/M)',
      sources: ['Chapman & Cowling 1970'],
    },
    ...maxwell,
    compute: ({ molarMass, point }) => success(Math.sqrt((3 * R * point.temperature) / molarMass)),
    computeFor: (one, state) => success(rms(one, state)),
  },
  {
    name: 'most_probable_speed',
    symbol: 'c_mp',
    quantityKind: 'speed',
    perSpecies: true,
    method: 'Maxwell distribution, √(2kT/m)',
    mixed: { method: 'Maxwell distribution, mean over molecules', sources: ['Chapman & Cowling 1970'] },
    ...maxwell,
    compute: (state) => overMolecules(state, (one) => success(mostProbable(one, state))),
    computeFor: (one, state) => success(mostProbable(one, state)),
  },
  {
    name: 'mean_kinetic_energy',
    symbol: 'ε_k',
    quantityKind: 'energy',
    perSpecies: false,
    method: 'equipartition, 3/2 kT of translation per molecule',
    ...maxwell,
    compute: ({ point }) => success(1.5 * k * point.temperature),
  },
  {
    name: 'mean_free_path',
    symbol: 'λ',
    quantityKind: 'length',
    perSpecies: false,
    method: 'from the viscosity, λ = (η/p) √(πkT/2m)',
    mixed: {
      method: 'from the viscosity, λ = (η/p) √(πRT/2M) with the mean molar mass',
      sources: ['Chapman & Cowling 1970'],
    },
    ...spheres,
    compute: ({ viscosity, molarMass, point }) =>
      map(viscosity, (eta) => (eta / point.pressure) * Math.sqrt((Math.PI * R * point.temperature) / (2 * molarMass))),
  },
  {
    name: 'mean_free_path_hard_sphere',
    symbol: 'λ_hs',
    quantityKind: 'length',
    perSpecies: true,
    method: 'hard spheres, λ = 1/(√2 π d² n)',
    mixed: {
      method: 'hard spheres, λᵢ = 1/Σⱼ nⱼ π dᵢⱼ² √(1 + mᵢ/mⱼ), mean over molecules',
      sources: ['Chapman & Cowling 1970'],
    },
    ...spheres,
    compute: (state) => overMolecules(state, (one) => one.freePath),
    computeFor: (one) => one.freePath,
  },
  {
    ...ofSpecies('collision_diameter', (one) => one.diameter),
    symbol: 'd',
    quantityKind: 'length',
    ...byViscosity,
    restsOn: spheres.restsOn,
    methodFor: ({ hardSphere }) =>
      hardSphere === undefined ? byViscosity : { method: 'as the file states it', sources: ['the file'] },
  },
  {
    name: 'collision_frequency',
    symbol: 'ν_c',
    quantityKind: 'frequency',
    perSpecies: true,
    method: 'hard spheres, c̄/λ',
    mixed: { method: 'hard spheres, c̄ᵢ/λᵢ, mean over molecules', sources: ['Chapman & Cowling 1970'] },
    ...spheres,
    compute: (state) => overMolecules(state, frequency),
    computeFor: frequency,
  },
  {
    name: 'mean_spacing',
    symbol: 'δ',
    quantityKind: 'length',
    perSpecies: false,
    method: 'n^(−1/3)',
    ...maxwell,
    compute: ({ point }) => success(1 / Math.cbrt(point.numberDensity)),
  },
  {
    name: 'impingement_rate',
    symbol: 'J',
    quantityKind: 'impingement_rate',
    perSpecies: true,
    method: 'Hertz–Knudsen, n c̄/4',
    mixed: { method: 'Hertz–Knudsen, sum over species', sources: ['Chapman & Cowling 1970'] },
    ...maxwell,
    compute: (state) => total(state, impingement),
    computeFor: (one) => success(impingement(one)),
  },
  {
    name: 'mass_flux',
    symbol: 'G',
    quantityKind: 'mass_flux',
    perSpecies: true,
    method: 'Hertz–Knudsen, m n c̄/4',
    mixed: { method: 'Hertz–Knudsen, sum over species', sources: ['Chapman & Cowling 1970'] },
    ...maxwell,
    compute: (state) => total(state, (one) => one.mass * impingement(one)),
    computeFor: (one) => success(one.mass * impingement(one)),
  },
  {
    name: 'monolayer_time',
    symbol: 't_m',
    quantityKind: 'time',
    perSpecies: true,
    method: 'site density over impingement rate, every molecule sticking',
    ...maxwell,
    compute: (state) => map(total(state, impingement), (rate) => state.request.siteDensity / rate),
    computeFor: (one, state) => success(state.request.siteDensity / impingement(one)),
  },
  {
    ...ofSpecies('thermal_wavelength', (one, state) => success(wavelength(one, state))),
    symbol: 'Λ',
    quantityKind: 'length',
    method: 'thermal de Broglie wavelength, h/√(2πmkT)',
    ...maxwell,
  },
  {
    ...ofSpecies('diffusivity', (one) => one.diffusivity),
    symbol: 'D',
    quantityKind: 'diffusivity',
    method: 'self-diffusion from the viscosity, D = 6/5 A* η/ρ',
    mixed: {
      method:
        'pairs as measured, else first-order Chapman–Enskog, else Fuller–Schettler–Giddings; Dᵢ = (1 − xᵢ)/Σⱼ xⱼ/Dᵢⱼ',
      sources: pairDiffusionSources,
    },
    sources: ['Hirschfelder 1954', 'Neufeld 1972'],
    restsOn: ['viscosity', 'pair_potential'],
  },
  {
    ...ofSpecies('schmidt', (one, state) =>
      map2(state.viscosity, one.diffusivity, (eta, D) => eta / (state.density * D)),
    ),
    symbol: 'Sc',
    quantityKind: 'number',
    method: 'η/(ρD)',
    mixed: { method: 'η/(ρDᵢ)', sources: pairDiffusionSources },
    sources: ['Hirschfelder 1954', 'Neufeld 1972'],
    restsOn: ['viscosity', 'pair_potential'],
  },
];
