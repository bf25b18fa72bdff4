import type { LennardJones, Species } from '../species/species';
import { aStar, combined } from './collisionIntegrals';
import { potentialViscosity } from './viscosity';

/** What unlike molecules do to each other, row by row for every pair of species. */
export interface Pairs {
  /** Pair viscosities ηᵢⱼ, Pa s; on the diagonal the species' own. */
  readonly viscosity: Float64Array;
  /** The ratios Aᵢⱼ* of Ω(2,2)* to Ω(1,1)*. */
  readonly aStar: Float64Array;
}

/**
 * Pair viscosities by first-order Chapman–Enskog (Hirschfelder, Curtiss & Bird 1954, eq. 8.2-12) with the potential of
 * Lorentz and Berthelot. Each pair is scaled by the geometric mean of the two factors by which the species' own viscosities
 * differ from their potentials'. So two gases that are alike make a pair like either, and a gas mixed with itself stays as it is.
 */
export function pairsOf(
  species: readonly Species[],
  potentials: readonly LennardJones[],
  own: readonly number[],
  temperature: number,
): Pairs {
  const n = species.length;
  const viscosity = new Float64Array(n * n);
  const ratio = new Float64Array(n * n);
  species.forEach((one, i) => {
    const potential = potentials[i];
    const factor = own[i];
    if (potential === undefined || factor === undefined) return;
    viscosity[i * n + i] = factor;
    ratio[i * n + i] = aStar(temperature / potential.wellDepth);
    for (let j = 0; j < i; j++) {
      const other = species[j];
      const otherPotential = potentials[j];
      if (other === undefined || otherPotential === undefined) continue;
      const pair = combined(potential, otherPotential);
      const scale = Math.sqrt(
        (factor / potentialViscosity(potential, one.molarMass.value, temperature)) *
          ((own[j] ?? 0) / potentialViscosity(otherPotential, other.molarMass.value, temperature)),
      );
      const value = scale * potentialViscosity(pair, 2 * reducedMass(one, other), temperature);
      const star = aStar(temperature / pair.wellDepth);
      viscosity[i * n + j] = viscosity[j * n + i] = value;
      ratio[i * n + j] = ratio[j * n + i] = star;
    }
  });
  return { viscosity, aStar: ratio };
}

/** M₁M₂/(M₁ + M₂), kg/mol. */
export function reducedMass(a: Species, b: Species): number {
  return (a.molarMass.value * b.molarMass.value) / (a.molarMass.value + b.molarMass.value);
}
