import { k, N_A } from '../constants';
import type { Outcome } from '../outcome';
import { failure, success } from '../outcome';
import type { Species } from '../species/species';
import { combined, omega11 } from './collisionIntegrals';
import { fullerDiffusion } from './fullerDiffusion';
import type { MeasuredPair } from './measuredDiffusion';
import { measuredDiffusion, measuredPair, measuredRange } from './measuredDiffusion';
import type { Pairs } from './pairs';
import { ownAStar, reducedMass } from './pairs';

/**
 * Self-diffusivity, m²/s: D = 6/5 A* η/ρ (Hirschfelder, Curtiss & Bird 1954, eq. 8.2-46 with 8.2-18).
 * Viscosity in Pa s, number density in 1/m³.
 */
export function selfDiffusivity(
  species: Species,
  viscosity: number,
  numberDensity: number,
  temperature: number,
): number {
  return (1.2 * ownAStar(species, temperature) * viscosity) / (numberDensity * (species.molarMass.value / N_A));
}

/** How the diffusion of a pair is found; the names are those of its errors. */
export type DiffusionMethod = 'measured_diffusion' | 'pair_diffusion' | 'fuller_diffusion';

/** Measured, or estimated from the potentials, or where these are unknown from the volumes of the atoms, else as hard spheres. */
export function diffusionMethod(one: Species, other: Species, temperature: number): DiffusionMethod {
  const { low, high } = measuredRange;
  const row = one === other ? undefined : measuredPair(one, other);
  if (row !== undefined) return low <= temperature && temperature <= high ? 'measured_diffusion' : 'pair_diffusion';
  if (hasPotential(one) && hasPotential(other)) return 'pair_diffusion';
  return fullerDiffusion(one, other, temperature) === undefined ? 'pair_diffusion' : 'fuller_diffusion';
}

/**
 * n Dᵢⱼ of two species, 1/(m s), which does not depend on pressure. `i` and `j` are their places among the pairs.
 * Measured if it has been; beyond the measured range continued in proportion to the 12-6 potential; else estimated.
 */
export function pairDiffusion(
  i: number,
  j: number,
  species: readonly Species[],
  pairs: Pairs,
  T: number,
): Outcome<number> {
  const one = species[i];
  const other = species[j];
  if (one === undefined || other === undefined) return failure({ kind: 'empty-composition' });
  const row = i === j ? undefined : measuredPair(one, other);
  if (row !== undefined) return success(measured(row, one, other, T));
  const fromVolumes = hasPotential(one) && hasPotential(other) ? undefined : fullerDiffusion(one, other, T);
  if (fromVolumes !== undefined) return success(fromVolumes);
  const estimate = estimated(i * species.length + j, one, other, pairs);
  if (Number.isFinite(estimate)) return success(estimate);
  const lacking = one.viscosity === undefined ? one : other;
  return failure({ kind: 'no-data', species: lacking.formula, property: 'pair_potential' });
}

/**
 * Dᵢ = (1 − xᵢ) / Σⱼ≠ᵢ xⱼ/Dᵢⱼ, which for two species is D₁₂, from a row of pair diffusivities in any unit.
 * A species that is alone although others are named diffuses through itself.
 */
export function diffusionInMixture(i: number, x: readonly number[], row: readonly number[]): number {
  if (x.length === 2) return row[1 - i] ?? 0;
  let others = 0;
  let resistance = 0;
  for (let j = 0; j < x.length; j++) {
    if (j === i) continue;
    others += x[j] ?? 0;
    resistance += (x[j] ?? 0) / (row[j] ?? 0);
  }
  return others === 0 ? (row[i] ?? 0) : others / resistance;
}

/**
 * First-order Chapman–Enskog (Hirschfelder, Curtiss & Bird 1954, eq. 8.2-44), written with the pair viscosity:
 * n Dᵢⱼ = 3/5 Aᵢⱼ* ηᵢⱼ / μ, where μ is the reduced mass. For like molecules it is the self-diffusivity.
 */
function estimated(cell: number, one: Species, other: Species, pairs: Pairs): number {
  return (0.6 * (pairs.aStar[cell] ?? 0) * (pairs.viscosity[cell] ?? 0) * N_A) / reducedMass(one, other);
}

function measured(row: MeasuredPair, one: Species, other: Species, T: number): number {
  const end = Math.min(Math.max(T, measuredRange.low), measuredRange.high);
  const atEnd = measuredDiffusion(row, end) / (k * end);
  return end === T ? atEnd : atEnd * (potentialDiffusion(one, other, T) / potentialDiffusion(one, other, end));
}

/** A pair needs the potentials of both, and their viscosities to scale them by. */
function hasPotential({ lennardJones, viscosity }: Species): boolean {
  return lennardJones !== undefined && viscosity !== undefined;
}

/** How n D of the 12-6 potential grows with temperature: √T / Ω(1,1)*. Without potentials, √T. */
function potentialDiffusion(one: Species, other: Species, T: number): number {
  if (one.lennardJones === undefined || other.lennardJones === undefined) return Math.sqrt(T);
  return Math.sqrt(T) / omega11(T / combined(one.lennardJones.value, other.lennardJones.value).wellDepth);
}
