import { solveDominant } from '../numerics/solveDominant';
import type { Pairs } from './pairs';

/**
 * First-order Chapman–Enskog viscosity of a mixture, Pa s (Hirschfelder, Curtiss & Bird 1954, eqs. 8.2-22 to 8.2-24),
 * from mole fractions, molar masses in kg/mol, the species' own viscosities ηᵢ in Pa s, and pair viscosities ηᵢⱼ and Aᵢⱼ*.
 * Here and beside it, the numbers of the book's equations are from memory.
 * With xᵢ divided out of its rows, the system stays regular where a fraction is zero, and is diagonally dominant.
 */
export function mixtureViscosity(
  x: readonly number[],
  molarMass: readonly number[],
  own: readonly number[],
  pairs: Pairs,
): number {
  const n = x.length;
  const width = n + 1;
  const rows = new Float64Array(n * width);
  for (let i = 0; i < n; i++) {
    let diagonal = at(x, i) / at(own, i);
    for (let j = 0; j < n; j++) {
      if (j === i) continue;
      const mi = at(molarMass, i);
      const mj = at(molarMass, j);
      const scale = ((2 * at(x, j)) / at(pairs.viscosity, i * n + j)) * ((mi * mj) / ((mi + mj) * (mi + mj)));
      const exchange = 5 / (3 * at(pairs.aStar, i * n + j));
      diagonal += scale * (exchange + mj / mi);
      rows[i * width + j] = -scale * (exchange - 1);
    }
    rows[i * width + i] = diagonal;
    rows[i * width + n] = 1;
  }
  solveDominant(rows, n);
  let viscosity = 0;
  for (let i = 0; i < n; i++) viscosity += at(x, i) * at(rows, i * width + n);
  return viscosity;
}

function at(values: ArrayLike<number>, index: number): number {
  return values[index] ?? 0;
}
