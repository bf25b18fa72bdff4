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
  const [power, a, b, c] = omega11Terms;
  return (
    power.scale * Math.pow(reduced, -power.rate) +
    a.scale * Math.exp(-a.rate * reduced) +
    b.scale * Math.exp(-b.rate * reduced) +
    c.scale * Math.exp(-c.rate * reduced)
  );
}

/** The ratio A* of Ω(2,2)* to Ω(1,1)*, which ties diffusion to viscosity. */
export function aStar(reduced: number): number {
  return omega22(reduced) / omega11(reduced);
}

/**
 * The ratio B* of 5 Ω(1,2)* − 4 Ω(1,3)* to Ω(1,1)*, which the conductivity of mixtures needs. Each integral follows from the
 * one before by its slope in ln T*: Ω(1,s+1)* = Ω(1,s)* [1 + (d ln Ω(1,s)* : d ln T*)/(s + 2)] (Hirschfelder, Curtiss & Bird 1954,
 * eq. 8.2-7). With C* = Ω(1,2)* : Ω(1,1)*, whose slope is C′, that makes B* = 4C* − 3C*² − C′.
 */
export function bStar(reduced: number): number {
  const [power, ...decays] = omega11Terms;
  let value = power.scale * Math.pow(reduced, -power.rate);
  let first = -power.rate * value;
  let second = power.rate * power.rate * value;
  for (const { scale, rate } of decays) {
    const x = rate * reduced;
    const term = scale * Math.exp(-x);
    value += term;
    first -= x * term;
    second += (x * x - x) * term;
  }
  const slope = first / value;
  const cStar = 1 + slope / 3;
  return 4 * cStar - 3 * cStar * cStar - (second / value - slope * slope) / 3;
}

/** The potential between unlike molecules by Lorentz and Berthelot: mean diameter, geometric mean depth. */
export function combined(a: LennardJones, b: LennardJones): LennardJones {
  return { diameter: (a.diameter + b.diameter) / 2, wellDepth: Math.sqrt(a.wellDepth * b.wellDepth) };
}

/** The first term is a power of T*, the others decay exponentially. */
const omega11Terms = [
  { scale: 1.06036, rate: 0.1561 },
  { scale: 0.193, rate: 0.47635 },
  { scale: 1.03587, rate: 1.52996 },
  { scale: 1.76474, rate: 3.89411 },
] as const;
