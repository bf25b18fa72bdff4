import { lookUp } from '../numerics/chebyshevTable';
import type { Outcome } from '../outcome';
import { success } from '../outcome';
import { tubeTable } from '../tables/tubeTable';
import { unlessKnown } from './accommodation';
import { meanOverFlights } from './partlySpecular';
import type { Transmission } from './transmission';
import { transmissionSources } from './transmission';

export interface Tube {
  /** m */
  readonly bore: number;
  readonly length: number;
  /** The share of molecules that the wall reflects diffusely, the rest like a mirror (Maxwell). */
  readonly accommodation: number;
}

/**
 * The solution of Clausing’s integral equation for a round tube, from a table of its ratio to 1/(1 + 3L/(8r)), which is exact
 * for an opening and for a long tube (W = 4d/(3L)).
 */
export function tubeTransmission({ bore, length, accommodation }: Tube): Outcome<Transmission> {
  const unknown = unlessKnown(accommodation);
  if (unknown) return unknown;
  const diffuse = accommodation === 1;
  return success({
    value: tubeChance((2 * length) / bore, accommodation),
    method: `Clausing’s integral equation for ${diffuse ? 'diffuse' : 'partly specular (Maxwell)'} walls, solved by its variational principle`,
    sources: transmissionSources.integralEquation,
    error: { key: 'transmission:tube', relative: diffuse ? 1e-4 : 4e-4 },
  });
}

/** Of a tube that is l radii long. */
export function tubeChance(l: number, accommodation: number): number {
  if (l === 0 || accommodation === 0) return 1;
  return tubeReference(l, accommodation) * lookUp(tubeTable, ...tubeCoordinates(l, accommodation));
}

/** 1/(1 + 3l/8), or its mean over the flights between diffuse reflections. */
export function tubeReference(l: number, accommodation: number): number {
  const diffuse = (length: number): number => 1 / (1 + (3 * length) / 8);
  return accommodation === 1 ? diffuse(l) : meanOverFlights(accommodation, (flights) => diffuse(l / flights));
}

export function tubeCoordinates(l: number, accommodation: number): readonly [number, number] {
  return [Math.log1p(l), Math.log(accommodation)];
}
