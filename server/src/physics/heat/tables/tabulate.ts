import { solveHeat } from '../kinetic/solveHeat';
import { columnAt, logarithmRoots, resistanceColumns } from './resistanceTable';
import type { ResistanceTable } from './resistanceTable';

/** The whole table, to six decimals. */
export function tabulate(): ResistanceTable {
  return logarithmRoots.map((_, row) =>
    Array.from({ length: resistanceColumns.count }, (__, column) => Number(tableEntry(row, column).toFixed(6))),
  );
}

/**
 * One entry, solved afresh. The model of Bhatnagar, Gross and Krook conducts 2/3 of what a gas of single atoms does, but
 * beyond the continuum resistance both resist alike: between the two solutions stands a profile that is straight in the
 * logarithm of the radius, with the walls at its ends.
 */
export function tableEntry(row: number, column: number): number {
  const logarithm = (logarithmRoots[row] ?? NaN) ** 2;
  const reduced = columnAt(column);
  const order = row === 0 ? 16 : 9;
  const flux =
    row === 0
      ? solveHeat({ kind: 'plates' }, reduced, order)
      : solveHeat({ kind: 'cylinders', outer: Math.exp(logarithm) }, reduced / logarithm, order);
  return 1 / flux - Math.sqrt(Math.PI) - 0.8 * reduced;
}
