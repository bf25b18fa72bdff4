import type { Composition } from '../composition';
import { meanMolarMass } from '../composition';
import { N_A } from '../constants';
import type { Outcome } from '../outcome';
import { all, failure, map, map2 } from '../outcome';
import type { LennardJones } from '../species/species';
import { secondVirial } from '../thermo/virial';
import { mixtureConductivity } from '../transport/conductivity';
import { diffusionInMixture, isMeasured, pairDiffusion, selfDiffusivity } from '../transport/diffusion';
import { mixtureViscosity } from '../transport/mixtureViscosity';
import type { Pairs } from '../transport/pairs';
import { pairsOf } from '../transport/pairs';
import type { StatePoint } from './closure';
import type { StateRequest, Trial } from './request';
import { factor } from './request';
import type { SpeciesAlone } from './speciesAlone';
import { speciesAlone, virialOnTrial } from './speciesAlone';

/** The material data of a gas at one state, each worked out once, from which every figure follows. */
export interface GasState {
  readonly request: StateRequest;
  readonly point: StatePoint;
  /** kg/mol. */
  readonly molarMass: number;
  /** Mass density, kg/m³. */
  readonly density: number;
  /** J/(mol K). */
  readonly cp: Outcome<number>;
  /** Second virial coefficient, m³/mol. */
  readonly virial: Outcome<number>;
  /** Pa s. */
  readonly viscosity: Outcome<number>;
  /** W/(m K). */
  readonly conductivity: Outcome<number>;
  readonly species: readonly SpeciesState[];
}

/** One species within it. */
export interface SpeciesState extends SpeciesAlone {
  /** Hard-sphere mean free path within the mixture, m. */
  readonly freePath: Outcome<number>;
  /** Within the mixture, or of itself where it is the only one, m²/s. */
  readonly diffusivity: Outcome<number>;
}

export function gasState(request: StateRequest, trial: Trial): GasState {
  const { composition, point } = request;
  const x = composition.moleFractions;
  const alone = composition.species.map((species, i) => speciesAlone(species, x[i] ?? 0, request, trial));
  const molarMasses = composition.species.map((species) => species.molarMass.value);
  const viscosities = all(alone.map((one) => one.viscosity));
  const conductivities = all(alone.map((one) => one.conductivity));
  const heats = all(alone.map((one) => one.cp));
  const pairs = pairsIn(composition, viscosities, point.temperature);
  const diameters = all(alone.map((one) => one.diameter));
  const molarMass = meanMolarMass(composition);
  return {
    request,
    point,
    molarMass,
    density: point.numberDensity * (molarMass / N_A),
    virial: virialOnTrial(secondVirial(composition, point.temperature), trial),
    cp: map(heats, (values) => weighted(x, values)),
    viscosity: ofMixture(viscosities, () =>
      map2(viscosities, pairs, (own, pair) => {
        return factor(trial, 'mixture_viscosity') * mixtureViscosity(x, molarMasses, own, pair);
      }),
    ),
    conductivity: ofMixture(conductivities, () =>
      map2(conductivities, viscosities, (own, etas) => {
        return factor(trial, 'mixture_conductivity') * mixtureConductivity(x, molarMasses, etas, own);
      }),
    ),
    species: alone.map((one, i) => ({
      ...one,
      freePath: map(diameters, (values) => freePath(i, alone, values)),
      diffusivity: diffusivity(i, alone, composition, pairs, point, trial),
    })),
  };
}

/** λᵢ = 1 / Σⱼ nⱼ π dᵢⱼ² √(1 + mᵢ/mⱼ), with dᵢⱼ the mean of the two diameters (Chapman & Cowling 1970, section 5.21). */
function freePath(i: number, species: readonly SpeciesAlone[], diameters: readonly number[]): number {
  const own = diameters[i] ?? 0;
  const mass = species[i]?.mass ?? 0;
  let collisions = 0;
  species.forEach((other, j) => {
    const d = (own + (diameters[j] ?? 0)) / 2;
    collisions += other.numberDensity * Math.PI * d * d * Math.sqrt(1 + mass / other.mass);
  });
  return 1 / collisions;
}

function diffusivity(
  i: number,
  alone: readonly SpeciesAlone[],
  composition: Composition,
  pairs: Outcome<Pairs>,
  point: StatePoint,
  trial: Trial,
): Outcome<number> {
  const T = point.temperature;
  const one = alone[i];
  if (one === undefined) return failure({ kind: 'empty-composition' });
  if (alone.length === 1) {
    return map(one.viscosity, (eta) => {
      const value = selfDiffusivity(one.species, eta, point.numberDensity, T);
      return factor(trial, 'self_diffusion') * value;
    });
  }
  const { species, moleFractions } = composition;
  return map(pairs, (pair) => {
    const row = species.map((other, j) => {
      const method = i === j || !isMeasured(one.species, other, T) ? 'pair_diffusion' : 'measured_diffusion';
      return factor(trial, method) * pairDiffusion(i, j, species, pair, T);
    });
    return diffusionInMixture(i, moleFractions, row) / point.numberDensity;
  });
}

/** Pair data are worked out only where there are pairs. */
function pairsIn({ species }: Composition, viscosities: Outcome<readonly number[]>, T: number): Outcome<Pairs> {
  const potentials: LennardJones[] = [];
  for (const one of species) {
    if (one.lennardJones === undefined) {
      return failure({ kind: 'no-data', species: one.formula, property: 'pair_potential' });
    }
    potentials.push(one.lennardJones.value);
  }
  return map(viscosities, (own) => pairsOf(species, potentials, own, T));
}

/** One species keeps its own value; several need the rule for mixtures. */
function ofMixture(values: Outcome<readonly number[]>, mixed: () => Outcome<number>): Outcome<number> {
  return values.ok && values.value.length === 1 ? map(values, ([only = 0]) => only) : mixed();
}

function weighted(x: readonly number[], values: readonly number[]): number {
  return values.reduce((sum, value, i) => sum + (x[i] ?? 0) * value, 0);
}
