import type { UniformSpline } from '../rarefied/uniformSpline';
import { splineAt, uniformSpline } from '../rarefied/uniformSpline';
import { excessResistance } from './tables/excessResistance';
import { columnAt, highestLogarithm, logarithmRoots, resistanceColumns } from './tables/resistanceTable';

/**
 * Temperature jump coefficient ζ of diffuse walls: the temperature at the wall is off by ζ (η v₀/p) dT/dn, v₀ = √(2kT/m).
 * Of the model of Bhatnagar, Gross and Krook 1.302716 (Barichello & Siewert 2000, from memory; first by Welander 1954), times
 * 3/2 as its gas conducts 2/3 of what a gas of single atoms does.
 */
export const jumpCoefficient = 1.5 * 1.302716;

/**
 * What a rarefied gas between diffuse walls resists beyond the sum of its continuum and its free-molecular resistance, as a
 * share of the latter. It vanishes in free flight, and towards the continuum leaves just the jumps at the walls.
 *
 * `reduced` is the rarefaction that belongs to the ratio of those two resistances, (15√π/8) times the ratio, for plates
 * δ = p h/(η v₀); `logarithm` is that of the ratio of the radii, zero for plates. Within 0.001 of the kinetic equation.
 */
export function excessShare(reduced: number, logarithm: number): number {
  // Around a thin wire the gas near it decides: the rarefaction on its radius stays.
  const column = logarithm > highestLogarithm ? (reduced * highestLogarithm) / logarithm : reduced;
  return excess(column, Math.min(logarithm, highestLogarithm)) / Math.sqrt(Math.PI);
}

/** Of plates and of cylinders where the walls are far apart: the jumps less the free-molecular resistance. */
function excessOfJumps(logarithm: number): number {
  return (8 / 15) * jumpCoefficient * (1 + Math.exp(-logarithm)) - Math.sqrt(Math.PI);
}

const splines: readonly UniformSpline[] = excessResistance.map(uniformSpline);

function excess(reduced: number, logarithm: number): number {
  const last = resistanceColumns.count - 1;
  const place = Math.log10(reduced / columnAt(0)) * resistanceColumns.perDecade;
  if (place <= 0) return (acrossRows(Math.sqrt(logarithm), 0) * reduced) / columnAt(0);
  if (place <= last) return acrossRows(Math.sqrt(logarithm), place);
  const jumps = excessOfJumps(logarithm);
  return jumps + ((acrossRows(Math.sqrt(logarithm), last) - jumps) * columnAt(last)) / reduced;
}

/** The polynomial through Chebyshev's points, in the barycentric form of Salzer. */
function acrossRows(root: number, place: number): number {
  const last = logarithmRoots.length - 1;
  let above = 0;
  let below = 0;
  for (const [row, point] of logarithmRoots.entries()) {
    const spline = splines[row];
    const value = spline ? splineAt(spline, place).value : NaN;
    const distance = root - point;
    if (distance === 0) return value;
    const weight = ((row % 2 === 0 ? 1 : -1) * (row === 0 || row === last ? 0.5 : 1)) / distance;
    above += weight * value;
    below += weight;
  }
  return above / below;
}
