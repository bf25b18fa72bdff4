import { lookUp } from '../numerics/chebyshevTable';
import type { Outcome } from '../outcome';
import { success } from '../outcome';
import { annulusTable } from '../tables/annulusTable';
import { unlessDiffuse } from './accommodation';
import { annulusChords } from './annulusWalls';
import { straightLineTransmission } from './straightPassage';
import type { Transmission } from './transmission';
import { transmissionSources } from './transmission';

export interface Annulus {
  /** Diameters, m. */
  readonly inner: number;
  readonly outer: number;
  readonly length: number;
  readonly accommodation: number;
}

/** The solution of the integral equations for both walls of a ring gap, from a table of its ratio to the straight line. */
export function annulusTransmission({ inner, outer, length, accommodation }: Annulus): Outcome<Transmission> {
  const unknown = unlessDiffuse(accommodation, 'annulus');
  if (unknown) return unknown;
  const k = inner / outer;
  const l = (2 * length) / (outer - inner);
  return success({
    value: l === 0 ? 1 : annulusReference(k, l) * lookUp(annulusTable, ...annulusCoordinates(k, l)),
    method:
      'the coupled integral equations for both diffuse walls (as Clausing’s), solved by their variational principle',
    sources: transmissionSources.integralEquation,
    error: { key: 'transmission:annulus', relative: 1e-4 },
  });
}

/** What wall densities that are straight lines give. */
export function annulusReference(k: number, l: number): number {
  const chords = annulusChords(k);
  const exchange = (z: number): number => {
    let sum = 0;
    // From the inner wall to the outer one, and back.
    for (const { kind, square, weight } of chords)
      sum += ((kind === 'across' ? 2 : 1) * weight) / (square + z * z) ** 2;
    return sum;
  };
  return straightLineTransmission(exchange, l);
}

export function annulusCoordinates(k: number, l: number): readonly [number, number] {
  return [-Math.log1p(-k), Math.log1p(l)];
}
