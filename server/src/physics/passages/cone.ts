import { lookUp } from '../numerics/chebyshevTable';
import type { Outcome } from '../outcome';
import { success } from '../outcome';
import { coneTable } from '../tables/coneTable';
import { unlessDiffuse } from './accommodation';
import type { Transmission } from './transmission';
import { transmissionSources } from './transmission';
import { tubeTransmission } from './tube';

export interface Cone {
  /** Diameters, m. */
  readonly inletBore: number;
  readonly outletBore: number;
  readonly length: number;
  readonly accommodation: number;
}

/** The solution of the integral equation for a conical tube, from a table of its ratio to a blend of the two limits. */
export function coneTransmission({ inletBore, outletBore, length, accommodation }: Cone): Outcome<Transmission> {
  if (inletBore === outletBore) return tubeTransmission({ bore: inletBore, length, accommodation });
  const unknown = unlessDiffuse(accommodation, 'cone');
  if (unknown) return unknown;
  const smaller = Math.min(inletBore, outletBore);
  const ratio = Math.max(inletBore, outletBore) / smaller;
  const l = (2 * length) / smaller;
  const exchange = Math.min(1, coneReference(ratio, l) * lookUp(coneTable, ...coneCoordinates(ratio, l)));
  return success({
    value: exchange * (smaller / inletBore) ** 2,
    method: 'the integral equation for a diffuse conical wall (as Clausing’s), solved by its variational principle',
    sources: transmissionSources.integralEquation,
    error: { key: 'transmission:cone', relative: 3e-4 },
  });
}

/**
 * The exchange of the two ends in areas of the smaller one, to the first order: as an opening, and as a long cone, in series;
 * a steep wall holds back less, by the square of the cosine of its angle. Lengths count in radii of the smaller end.
 */
export function coneReference(ratio: number, l: number): number {
  const slope = (ratio - 1) / l;
  return 1 / (1 + (3 * l * (1 + ratio)) / (16 * ratio * ratio * (1 + slope * slope)));
}

/** The half angle, stretched near zero, and the length. */
export function coneCoordinates(ratio: number, l: number): readonly [number, number] {
  return [stretched(Math.atan((ratio - 1) / l)), Math.log1p(l)];
}

export function stretched(halfAngle: number): number {
  return Math.log1p(STRETCH * halfAngle);
}

export function halfAngleOf(coordinate: number): number {
  return Math.expm1(coordinate) / STRETCH;
}

const STRETCH = 20;
