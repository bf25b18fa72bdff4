import type { LennardJones } from '../species/species';

/**
 * Reduced collision integrals of the 12-6 potential by the fits of Neufeld, Janzen & Aziz 1972 (eq. 2, table I),
 * without their small sine terms: within 0.2 % for 0.3 ≤ T* ≤ 100. T* = kT/ε.
 */

/** Ω(2,2)*, which governs viscosity. */
export function omega22(reduced: number): number {
  return (
    1.16145 * Math.pow(reduced, -0.14874) +
    0.52487 * Math.exp(-0.7732 * reduced) +
    2.16178 * Math.exp(-2.43787 * reduced)
  );
}

/** Ω(1,1)*, which governs diffusion. */
export function omega11(reduced: number): number {
  return (
    1.06036 * Math.pow(reduced, -0.1561) +
    0.193 * Math.exp(-0.47635 * reduced) +
    1.03587 * Math.exp(-1.52996 * reduced) +
    1.76474 * Math.exp(-3.89411 * reduced)
  );
}

/** The ratio A* of Ω(2,2)* to Ω(1,1)*, which ties diffusion to viscosity. */
export function aStar(reduced: number): number {
  return omega22(reduced) / omega11(reduced);
}

/** The potential between unlike molecules by Lorentz and Berthelot: mean diameter, geometric mean depth. */
export function combined(a: LennardJones, b: LennardJones): LennardJones {
  return { diameter: (a.diameter + b.diameter) / 2, wellDepth: Math.sqrt(a.wellDepth * b.wellDepth) };
}
