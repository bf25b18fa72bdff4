import { meanMolarMass } from '../composition';
import { N_A } from '../constants';
import type { Outcome } from '../outcome';
import { all, failure, map } from '../outcome';
import { secondVirial } from '../thermo/virial';
import type { StatePoint } from './closure';
import type { StateRequest, Trial } from './request';
import type { SpeciesAlone } from './speciesAlone';
import { speciesAlone, virialOnTrial } from './speciesAlone';
import { transportOf } from './transport';

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
  const molarMass = meanMolarMass(composition);
  const diameters = all(alone.map((one) => one.diameter));
  const transport = transportOf(alone, composition, point, trial);
  return {
    request,
    point,
    molarMass,
    density: point.numberDensity * (molarMass / N_A),
    cp: map(all(alone.map((one) => one.cp)), (values) => weighted(x, values)),
    virial: virialOnTrial(secondVirial(composition, point.temperature), trial),
    viscosity: transport.viscosity,
    conductivity: transport.conductivity,
    species: alone.map((one, i) => ({
      ...one,
      freePath: map(diameters, (values) => freePath(i, alone, values)),
      diffusivity: transport.diffusivities[i] ?? failure({ kind: 'empty-composition' }),
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

function weighted(x: readonly number[], values: readonly number[]): number {
  return values.reduce((sum, value, i) => sum + (x[i] ?? 0) * value, 0);
}
