import { epsilon0, k, N_A } from '../constants';
import type { LennardJones } from '../species/species';
import { omega11, omega22 } from './collisionIntegrals';
import type { Correlation } from './correlation';

/**
 * The viscosity that follows from a pair potential, to stand where no measured correlation is known (Chapman–Enskog).
 * `molarMass` in kg/mol. `polarity` is δ = µ²/(8πε₀ ε σ³), nought for the 12-6 potential.
 */
export function viscosityOfPotential(
  { diameter, wellDepth }: LennardJones,
  molarMass: number,
  range: { readonly low: number; readonly high: number },
  polarity = 0,
): Correlation {
  const prefactor = (0.3125 * Math.sqrt((molarMass / N_A) * k)) / (Math.sqrt(Math.PI) * diameter * diameter);
  return { kind: 'potential', prefactor, theta: wellDepth, polarity, ...range };
}

/** δ = µ²/(8πε₀ ε σ³) of a potential with a dipole moment, C m. */
export function polarityOf({ diameter, wellDepth }: LennardJones, dipoleMoment: number): number {
  return (dipoleMoment * dipoleMoment) / (8 * Math.PI * epsilon0 * k * wellDepth * diameter ** 3);
}

/**
 * Ω(2,2)* of Stockmayer's 12-6-3 potential by Brokaw's fit to the tables of Monchick & Mason 1961 (Brokaw 1969):
 * the integral of the 12-6 potential and 0.2 δ²/T*, within 3 % or so for δ < 2.5.
 */
export function polarOmega22(reduced: number, polarity: number): number {
  return omega22(reduced) + (0.2 * polarity * polarity) / reduced;
}

/** Ω(1,1)* likewise, with 0.19 δ²/T*. */
export function polarOmega11(reduced: number, polarity: number): number {
  return omega11(reduced) + (0.19 * polarity * polarity) / reduced;
}

/**
 * The reciprocal of Ω(2,2)*, raised by the second-order factor 1 + 3/196 (8E* − 7)² (Hirschfelder, Curtiss & Bird 1954,
 * eq. 8.2-23). E*, the ratio of Ω(2,3)* to Ω(2,2)*, follows
 * from the slope: 8E* − 7 = 1 + 2 d ln Ω/d ln T*.
 */
export function fluidity(reduced: number, polarity: number): number {
  const omega = polarOmega22(reduced, polarity);
  const slope = Math.log(polarOmega22(reduced * step, polarity) / polarOmega22(reduced / step, polarity));
  const excess = 1 + slope / Math.log(step);
  return (1 + (3 / 196) * excess * excess) / omega;
}

const step = 1.001;
