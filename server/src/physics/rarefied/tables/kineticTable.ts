import type { Section } from '../kineticSolution';

/**
 * The kinetic coefficients over ln δ and the fourth root of α, in forms that are smooth over both, and constant over α where
 * no molecule meets another: the part of G_P beyond the viscous one, and the logarithm of G_T, each after multiplication by
 * α/(2 − α). A row belongs to an accommodation, a column to a rarefaction.
 */
export interface KineticTable {
  readonly slip: readonly (readonly number[])[];
  readonly creep: readonly (readonly number[])[];
}

/** The rarefactions: so many to a decade. */
export const rarefactionGrid = { low: 1e-7, high: 100, perDecade: 8, count: 73 } as const;

const accommodationGrid = { low: 1e-3, count: 13 } as const;

export const lowestAccommodation = accommodationGrid.low;

/** Chebyshev's points between the fourth roots of the lowest accommodation and of 1, falling. */
export const accommodationRoots: readonly number[] = Array.from({ length: accommodationGrid.count }, (_, index) => {
  const low = accommodationGrid.low ** 0.25;
  return (1 + low) / 2 + ((1 - low) / 2) * Math.cos((Math.PI * index) / (accommodationGrid.count - 1));
});

export function rarefactionAt(column: number): number {
  return rarefactionGrid.low * 10 ** (column / rarefactionGrid.perDecade);
}

/** G_P far from the molecular end: Poiseuille's law. */
export function viscousPart(section: Section, delta: number): number {
  return section === 'tube' ? delta / 4 : delta / 6;
}
