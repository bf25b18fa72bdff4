/**
 * How much more a gas resists than its continuum and its free-molecular resistance together, in units of T/(p √(2kT/m)) and for
 * diffuse walls, from the kinetic equation (solveHeat). A row belongs to a logarithm of the ratio of the radii, zero for
 * plates; a column to a rarefaction times that logarithm, which for plates is that on their distance.
 */
export type ResistanceTable = readonly (readonly number[])[];

/** The columns: so many to a decade. */
export const resistanceColumns = { low: 1e-3, perDecade: 4, count: 18 } as const;

export function columnAt(column: number): number {
  return resistanceColumns.low * 10 ** (column / resistanceColumns.perDecade);
}

/** Beyond this ratio of the radii, 100, the gas around the inner cylinder hardly knows of the outer one. */
export const highestLogarithm = Math.log(100);

/**
 * The roots of the logarithms: Chebyshev's points, rising. The longest ways between cylinders of nearly one radius grow as
 * one over the root.
 */
export const logarithmRoots: readonly number[] = Array.from({ length: 11 }, (_, row) => {
  return (Math.sqrt(highestLogarithm) / 2) * (1 - Math.cos((Math.PI * row) / 10));
});
