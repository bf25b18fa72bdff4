import { lookUp } from '../numerics/chebyshevTable';
import type { Outcome } from '../outcome';
import { success } from '../outcome';
import { slitTable } from '../tables/slitTable';
import { unlessKnown } from './accommodation';
import { meanOverFlights } from './partlySpecular';
import type { Transmission } from './transmission';
import { transmissionSources } from './transmission';

export interface Slit {
  /** m */
  readonly height: number;
  readonly length: number;
  /** The share of molecules that the walls reflect diffusely, the rest like a mirror (Maxwell). */
  readonly accommodation: number;
}

/** The solution of Clausing’s integral equation for a slit between wide plates, from a table of its ratio to the straight line. */
export function slitTransmission({ height, length, accommodation }: Slit): Outcome<Transmission> {
  const unknown = unlessKnown(accommodation);
  if (unknown) return unknown;
  const diffuse = accommodation === 1;
  return success({
    value: slitChance(length / height, accommodation),
    method: `Clausing’s integral equation for ${diffuse ? 'diffuse' : 'partly specular (Maxwell)'} plates, solved by its variational principle`,
    sources: transmissionSources.integralEquation,
    error: { key: 'transmission:slit', relative: diffuse ? 1e-4 : 4e-4 },
  });
}

function slitChance(l: number, accommodation: number): number {
  if (l === 0 || accommodation === 0) return 1;
  return slitReference(l, accommodation) * lookUp(slitTable, ...slitCoordinates(l, accommodation));
}

/** What a wall density that is a straight line gives, or its mean over the flights between diffuse reflections. */
export function slitReference(l: number, accommodation: number): number {
  return accommodation === 1 ? straightLine(l) : meanOverFlights(accommodation, (flights) => straightLine(l / flights));
}

export function slitCoordinates(l: number, accommodation: number): readonly [number, number] {
  return [Math.log1p(l), Math.log(accommodation)];
}

/** 2/l² ∫₀^l (l − z)(√(1 + z²) − z) dz, with a series where the terms cancel. */
function straightLine(l: number): number {
  if (l < 1e-2) return 1 - l / 3 + (l * l) / 12;
  const s = Math.sqrt(1 + l * l);
  const cubes = (s * s + s * l + l * l) / (s + l);
  return (2 / (l * l)) * ((cubes - 1) / 6 + (l * Math.asinh(l) - s + 1) / 2);
}
