import { R } from '../constants';
import { solveDominant } from '../numerics/solveDominant';
import type { Pairs } from './pairs';

/** What a mixture conducts with: per species, and for every pair. */
export interface ConductingMixture {
  /** Mole fractions. */
  readonly x: readonly number[];
  /** kg/mol. */
  readonly molarMass: readonly number[];
  /** The species' own viscosities, Pa s, and conductivities, W/(m K). */
  readonly viscosity: readonly number[];
  readonly conductivity: readonly number[];
  readonly pairs: Pairs;
  /** n Dᵢⱼ row by row, in any unit; on the diagonal the species in itself. */
  readonly diffusion: readonly (readonly number[])[];
}

/**
 * Thermal conductivity of a mixture, W/(m K): what translation carries, as in a mixture of single atoms (Muckenfuss & Curtiss
 * 1958), and what the molecules carry inside them as they diffuse (Hirschfelder 1957). A pure gas keeps its own value.
 */
export function mixtureConductivity(mixture: ConductingMixture): number {
  return translational(mixture) + internal(mixture);
}

/** λ′ᵢ = 15/4 R/Mᵢ ηᵢ, which translation alone conducts in the species by itself. */
export function translationalConductivity(viscosity: number, molarMass: number): number {
  return (3.75 * R * viscosity) / molarMass;
}

/**
 * The first-order system of Muckenfuss & Curtiss 1958 with the correction of Mason & Saxena 1958 (its elements from memory, and
 * tested against the closed form for two gases). As for the viscosity, xᵢ is divided out of its rows, so that the system
 * stays regular where a fraction is zero; it is diagonally dominant.
 */
function translational({ x, molarMass, viscosity, pairs }: ConductingMixture): number {
  const n = x.length;
  const width = n + 1;
  const rows = new Float64Array(n * width);
  for (let i = 0; i < n; i++) {
    const mi = at(molarMass, i);
    let diagonal = at(x, i) / translationalConductivity(at(viscosity, i), mi);
    for (let j = 0; j < n; j++) {
      if (j === i) continue;
      const mj = at(molarMass, j);
      const cell = i * n + j;
      const aStar = at(pairs.aStar, cell);
      const bStar = at(pairs.bStar, cell);
      const pair = translationalConductivity(at(pairs.viscosity, cell), (2 * mi * mj) / (mi + mj));
      const scale = at(x, j) / (2 * pair * aStar * (mi + mj) * (mi + mj));
      diagonal += scale * (7.5 * mi * mi + (6.25 - 3 * bStar) * mj * mj + 4 * aStar * mi * mj);
      rows[i * width + j] = -scale * mi * mj * (13.75 - 3 * bStar - 4 * aStar);
    }
    rows[i * width + i] = diagonal;
    rows[i * width + n] = 1;
  }
  solveDominant(rows, n);
  let sum = 0;
  for (let i = 0; i < n; i++) sum += at(x, i) * at(rows, i * width + n);
  return sum;
}

/** Σᵢ xᵢ λ″ᵢ / Σⱼ xⱼ Dᵢᵢ/Dᵢⱼ, where λ″ᵢ is what the species' own conductivity exceeds that of translation by. */
function internal({ x, molarMass, viscosity, conductivity, diffusion }: ConductingMixture): number {
  let sum = 0;
  for (let i = 0; i < x.length; i++) {
    const row = diffusion[i] ?? [];
    const own = at(conductivity, i) - translationalConductivity(at(viscosity, i), at(molarMass, i));
    let hindrance = 0;
    for (let j = 0; j < x.length; j++) hindrance += (at(x, j) * at(row, i)) / at(row, j);
    sum += (at(x, i) * own) / hindrance;
  }
  return sum;
}

function at(values: ArrayLike<number>, index: number): number {
  return values[index] ?? 0;
}
