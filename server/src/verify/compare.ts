import { ours } from './ours';
import type { Page, ReferenceRow } from './row';
import { halfUnit } from './row';

/** A row of the book beside what we make of it. Values are in the unit of the row. */
export interface Comparison {
  readonly row: ReferenceRow;
  readonly printed: number;
  readonly ours: number;
  /** Ours less the printed value. */
  readonly difference: number;
  /** The difference that the row allows. */
  readonly tolerance: number;
  readonly verdict: 'within' | 'beyond';
  /** The error, 95 %, that we state for the figure, as a share of it. */
  readonly statedShare: number;
  /** Whether that error, and half a unit of the last printed digit, cover the difference. */
  readonly coverage: 'covered' | 'uncovered';
}

export function compareBook(book: readonly Page[]): readonly Comparison[] {
  return book.flatMap(({ rows }) => rows.map(compare));
}

export function compare(row: ReferenceRow): Comparison {
  const printed = Number(row.printed);
  const { value, stated: statedShare } = ours(row);
  const stated = halfUnit(row.printed) + statedShare * Math.abs(printed);
  const { within } = row;
  const tolerance = within === 'stated' ? stated : (within?.tolerance ?? halfUnit(row.printed));
  const difference = value - printed;
  return {
    row,
    printed,
    ours: value,
    difference,
    tolerance,
    verdict: reaches(tolerance, difference) ? 'within' : 'beyond',
    statedShare,
    coverage: reaches(stated, difference) ? 'covered' : 'uncovered',
  };
}

/** The last bit of a number that lies just half a unit away must not decide. What is no number lies within nothing. */
function reaches(tolerance: number, difference: number): boolean {
  return Math.abs(difference) <= tolerance * (1 + 1e-9);
}
