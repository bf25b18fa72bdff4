import { N_A } from '../constants';
import type { Species } from '../species/species';
import { aStar } from './collisionIntegrals';
import type { Pairs } from './pairs';
import { reducedMass } from './pairs';

/** A* where no potential is known: its value for most gases near room temperature, within 3 %. */
const usualAStar = 1.1;

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
  const potential = species.lennardJones?.value;
  const ratio = potential === undefined ? usualAStar : aStar(temperature / potential.wellDepth);
  return (1.2 * ratio * viscosity) / (numberDensity * (species.molarMass.value / N_A));
}

/**
 * Diffusivity of species i in the mixture, m²/s: Dᵢ = (1 − xᵢ) / Σⱼ≠ᵢ xⱼ/Dᵢⱼ, which for two species is D₁₂.
 * A species that is alone although others are named diffuses through itself.
 */
export function diffusivityInMixture(
  i: number,
  species: readonly Species[],
  x: readonly number[],
  pairs: Pairs,
  numberDensity: number,
): number {
  if (species.length === 2) return pairDiffusivity(0, 1, species, pairs, numberDensity);
  let others = 0;
  let resistance = 0;
  for (let j = 0; j < x.length; j++) {
    if (j === i) continue;
    others += x[j] ?? 0;
    resistance += (x[j] ?? 0) / pairDiffusivity(i, j, species, pairs, numberDensity);
  }
  return others === 0 ? pairDiffusivity(i, i, species, pairs, numberDensity) : others / resistance;
}

/**
 * First-order Chapman–Enskog, m²/s (Hirschfelder, Curtiss & Bird 1954, eq. 8.2-44), written with the pair viscosity:
 * Dᵢⱼ = 3/5 Aᵢⱼ* ηᵢⱼ / (n μ), where μ is the reduced mass. For like molecules it is the self-diffusivity.
 */
function pairDiffusivity(
  i: number,
  j: number,
  species: readonly Species[],
  pairs: Pairs,
  numberDensity: number,
): number {
  const one = species[i];
  const other = species[j];
  if (one === undefined || other === undefined) return 0;
  const cell = i * species.length + j;
  const mass = reducedMass(one, other) / N_A;
  return (0.6 * (pairs.aStar[cell] ?? 0) * (pairs.viscosity[cell] ?? 0)) / (numberDensity * mass);
}
