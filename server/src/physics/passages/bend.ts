import { lookUp } from '../numerics/chebyshevTable';
import type { Outcome } from '../outcome';
import { failure, success } from '../outcome';
import { bendTable } from '../tables/bendTable';
import { mitreTable } from '../tables/mitreTable';
import { unlessDiffuse } from './accommodation';
import type { Transmission } from './transmission';
import { transmissionSources } from './transmission';
import { tubeChance } from './tube';

export interface Bend {
  /** m */
  readonly bore: number;
  /** rad */
  readonly angle: number;
  /** Of the centre line, m; 0 for a mitre, else at least half the bore. */
  readonly radius: number;
  /** Straight lengths before and after the turn, m; of a mitre, to where its inner sides meet. */
  readonly inletLength: number;
  readonly outletLength: number;
  readonly accommodation: number;
}

/**
 * That of the straight tube as long as the centre line, times a factor for the turn, which is near one and was found by
 * following molecules (Davis 1960). The factor knows the sum of the straight lengths, not how they are shared.
 */
export function bendTransmission({ bore, angle, radius, ...rest }: Bend): Outcome<Transmission> {
  const { inletLength, outletLength, accommodation } = rest;
  const unknown = unlessDiffuse(accommodation, 'bend');
  if (unknown) return unknown;
  const r = bore / 2;
  const straight = (inletLength + outletLength) / r;
  const isMitre = radius === 0;
  if (isMitre && angle > steepestMitre) {
    return failure({ kind: 'outside-range', quantity: 'angle of a mitre', value: angle, low: 0, high: steepestMitre });
  }
  const along = straight + (isMitre ? shortestMitre(angle) : (angle * radius) / r);
  const factor = isMitre
    ? lookUp(mitreTable, ...mitreCoordinates(angle, straight))
    : lookUp(bendTable, ...bendCoordinates(angle, radius / r, straight));
  return success({
    value: Math.min(1, factor * tubeChance(along, 1)),
    method: `${isMitre ? 'the mitred' : 'the bent'} tube by test-particle sampling with diffuse walls, as a factor on the straight tube of the same centre line`,
    sources: transmissionSources.bend,
    error: { key: 'transmission:bend', relative: 0.02 },
  });
}

/** rad */
export const steepestMitre = (2 * Math.PI) / 3;

/** The centre line of a mitre between the two sections at its inner corner, in radii. */
export function shortestMitre(angle: number): number {
  return 2 * Math.tan(angle / 2);
}

/** The angle, and how much straight tube there is, from 0 to 1. */
export function mitreCoordinates(angle: number, straight: number): readonly [number, number] {
  return [angle, shareOf(straight)];
}

/** The angle, the curvature in radii of the tube, and how much straight tube there is, from 0 to 1. */
export function bendCoordinates(angle: number, radius: number, straight: number): readonly [number, number, number] {
  return [angle, 1 / radius, shareOf(straight)];
}

function shareOf(straight: number): number {
  return straight / (straight + STRAIGHT);
}

/** The other way round. */
export function straightOf(share: number): number {
  return (STRAIGHT * share) / (1 - share);
}

const STRAIGHT = 4;
