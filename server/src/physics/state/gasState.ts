import type { Composition } from '../composition';
import { meanMolarMass } from '../composition';
import { k, N_A, R } from '../constants';
import type { Note, Outcome } from '../outcome';
import { failure, success } from '../outcome';
import type { LennardJones, Species } from '../species/species';
import { heatCapacityRange, molarHeatCapacity } from '../thermo/heatCapacity';
import {
  conductionMethod,
  correlatedConductivity,
  kineticConductivity,
  mixtureConductivity,
} from '../transport/conductivity';
import { diffusionInMixture, isMeasured, pairDiffusion, selfDiffusivity } from '../transport/diffusion';
import { mixtureViscosity } from '../transport/mixtureViscosity';
import type { Pairs } from '../transport/pairs';
import { pairsOf } from '../transport/pairs';
import { diameterOfViscosity, viscosity } from '../transport/viscosity';
import type { StatePoint } from './closure';

/** What a state is evaluated from. */
export interface StateRequest {
  readonly composition: Composition;
  readonly point: StatePoint;
  /** Adsorption sites per area that make a monolayer, 1/m². */
  readonly siteDensity: number;
  /** The hard-sphere diameter, m, if the file states one; else it follows from the viscosity. */
  readonly collisionDiameter?: number;
}

/** Factors on the correlations and methods named by the keys, by which their errors are propagated. */
export interface Trial {
  readonly factors: ReadonlyMap<string, number>;
}

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
  /** Pa s. */
  readonly viscosity: Outcome<number>;
  /** W/(m K). */
  readonly conductivity: Outcome<number>;
  readonly species: readonly SpeciesState[];
}

/** One species within it. */
export interface SpeciesState {
  readonly species: Species;
  readonly moleFraction: number;
  /** 1/m³. */
  readonly numberDensity: number;
  /** Mass of a molecule, kg. */
  readonly mass: number;
  /** Mean speed, m/s. */
  readonly meanSpeed: number;
  /** Of the species alone: J/(mol K), Pa s, W/(m K). */
  readonly cp: Outcome<number>;
  readonly viscosity: Outcome<number>;
  readonly conductivity: Outcome<number>;
  /** Hard-sphere diameter, m. */
  readonly diameter: Outcome<number>;
  /** Hard-sphere mean free path within the mixture, m. */
  readonly freePath: Outcome<number>;
  /** Within the mixture, or of itself where it is the only one, m²/s. */
  readonly diffusivity: Outcome<number>;
}

export function gasState(request: StateRequest, trial: Trial): GasState {
  const { composition, point } = request;
  const x = composition.moleFractions;
  const alone = composition.species.map((species, i) => aloneState(species, x[i] ?? 0, request, trial));
  const molarMasses = composition.species.map((species) => species.molarMass.value);
  const viscosities = allOf(alone.map((one) => one.viscosity));
  const conductivities = allOf(alone.map((one) => one.conductivity));
  const heats = allOf(alone.map((one) => one.cp));
  const pairs = pairsIn(composition, viscosities, point.temperature);
  const diameters = allOf(alone.map((one) => one.diameter));
  const molarMass = meanMolarMass(composition);
  return {
    request,
    point,
    molarMass,
    density: point.numberDensity * (molarMass / N_A),
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

/** Applies a formula to the value if there is one; notes and reasons pass through. */
export function map<A, B>(outcome: Outcome<A>, formula: (value: A) => B): Outcome<B> {
  return outcome.ok ? success(formula(outcome.value), outcome.notes) : outcome;
}

/** Applies a formula to two values if there are both. */
export function map2<A, B, C>(a: Outcome<A>, b: Outcome<B>, formula: (a: A, b: B) => C): Outcome<C> {
  if (!a.ok) return a;
  if (!b.ok) return b;
  return success(formula(a.value, b.value), joinedNotes(a.notes, b.notes));
}

type AloneState = Omit<SpeciesState, 'freePath' | 'diffusivity'>;

function aloneState(species: Species, moleFraction: number, request: StateRequest, trial: Trial): AloneState {
  const { temperature: T, numberDensity } = request.point;
  const mass = species.molarMass.value / N_A;
  const eta = map(viscosity(species, T), (value) => value * factor(trial, `viscosity:${species.formula}`));
  const cp = heatCapacity(species, T, trial);
  return {
    species,
    moleFraction,
    numberDensity: moleFraction * numberDensity,
    mass,
    meanSpeed: Math.sqrt((8 * k * T) / (Math.PI * mass)),
    cp,
    viscosity: eta,
    conductivity: conductivity(species, eta, cp, T, trial),
    diameter: diameter(species, eta, request),
  };
}

function heatCapacity(species: Species, T: number, trial: Trial): Outcome<number> {
  const data = species.heatCapacity?.value;
  if (data === undefined) return failure({ kind: 'no-data', species: species.formula, property: 'heat_capacity' });
  const value = molarHeatCapacity(data, T) * factor(trial, `heat_capacity:${species.formula}`);
  const { low, high } = heatCapacityRange(data);
  if (low <= T && T <= high) return success(value);
  const range = { quantity: 'temperature', value: T, low, high } as const;
  return success(value, [{ kind: 'outside-range', ...range, property: 'heat_capacity', species: species.formula }]);
}

function conductivity(
  species: Species,
  eta: Outcome<number>,
  cp: Outcome<number>,
  T: number,
  trial: Trial,
): Outcome<number> {
  const method = conductionMethod(species);
  if (method === 'correlation') {
    const scale = factor(trial, `conductivity:${species.formula}`);
    return map(correlatedConductivity(species, T), (value) => value * scale);
  }
  const scale = factor(trial, method === 'eucken' ? 'eucken' : 'monatomic_conductivity');
  return map2(eta, cp, (value, heat) => scale * kineticConductivity(species, value, heat - R));
}

function diameter(species: Species, eta: Outcome<number>, request: StateRequest): Outcome<number> {
  const stated = request.collisionDiameter;
  if (stated === undefined) {
    return map(eta, (value) => diameterOfViscosity(value, species.molarMass.value, request.point.temperature));
  }
  if (0 < stated) return success(stated);
  return failure({ kind: 'not-positive', quantity: 'collisionDiameter', value: stated });
}

/** λᵢ = 1 / Σⱼ nⱼ π dᵢⱼ² √(1 + mᵢ/mⱼ), with dᵢⱼ the mean of the two diameters (Chapman & Cowling 1970, section 5.21). */
function freePath(i: number, species: readonly AloneState[], diameters: readonly number[]): number {
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
  alone: readonly AloneState[],
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

function allOf(outcomes: readonly Outcome<number>[]): Outcome<readonly number[]> {
  const values: number[] = [];
  let notes: readonly Note[] = [];
  for (const outcome of outcomes) {
    if (!outcome.ok) return outcome;
    values.push(outcome.value);
    notes = joinedNotes(notes, outcome.notes);
  }
  return success(values, notes);
}

function joinedNotes(a: readonly Note[], b: readonly Note[]): readonly Note[] {
  if (a.length === 0) return b;
  const fresh = b.filter((note) => !a.includes(note));
  return fresh.length === 0 ? a : [...a, ...fresh];
}

function weighted(x: readonly number[], values: readonly number[]): number {
  return values.reduce((sum, value, i) => sum + (x[i] ?? 0) * value, 0);
}

function factor(trial: Trial, key: string): number {
  return trial.factors.get(key) ?? 1;
}
