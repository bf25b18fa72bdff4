import { lookUp } from '../numerics/chebyshevTable';
import type { Outcome } from '../outcome';
import { success } from '../outcome';
import { ductTable } from '../tables/ductTable';
import { unlessDiffuse } from './accommodation';
import { ductExchange } from './ductWalls';
import { straightLineTransmission } from './straightPassage';
import type { Transmission } from './transmission';
import { transmissionSources } from './transmission';

export interface Duct {
  /** m */
  readonly width: number;
  readonly height: number;
  readonly length: number;
  readonly accommodation: number;
}

/** The solution of the integral equations for the four walls of a rectangular duct, from a table of its ratio to the straight line. */
export function ductTransmission({ width, height, length, accommodation }: Duct): Outcome<Transmission> {
  const unknown = unlessDiffuse(accommodation, 'duct');
  if (unknown) return unknown;
  const smaller = Math.min(width, height);
  const ratio = Math.max(width, height) / smaller;
  const l = length / smaller;
  return success({
    value: l === 0 ? 1 : ductReference(ratio, l) * lookUp(ductTable, ...ductCoordinates(ratio, l)),
    method: 'the coupled integral equations for the four diffuse walls, solved by their variational principle',
    sources: transmissionSources.duct,
    error: { key: 'transmission:duct', relative: 3e-4 },
  });
}

/** What wall densities that are straight lines give. */
export function ductReference(ratio: number, l: number): number {
  return straightLineTransmission((z) => ductExchange(ratio, z), l);
}

export function ductCoordinates(ratio: number, l: number): readonly [number, number] {
  return [Math.log(ratio), Math.log1p(l)];
}
