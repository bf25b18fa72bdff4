import assert from 'node:assert/strict';
import type { Tolerance } from '../../server/src/verify/row';
import { halfUnit } from '../../server/src/verify/row';

export { halfUnit };

/** A value as a published source prints it, beside ours: of a function inside the program. Those of a gas stand in `server/src/verify/book`. */
export interface ReferenceRow {
  /** Copied as printed, in the unit in which it is printed. Its last digit sets the tolerance. */
  readonly printed: string;
  /** Ours, in the same unit. */
  readonly got: () => number;
  /** The source, or "common practice, no source". */
  readonly source: string;
  /** Table, equation or page, and "from memory" where it could not be looked up. */
  readonly where: string;
  /** Another tolerance, in the unit printed, and the reason why half a unit of the last digit is not it. */
  readonly within?: Tolerance;
}

/** One test for each row: ours must be the printed value, to half a unit of its last digit or within the stated tolerance. */
export function references(title: string, rows: readonly ReferenceRow[]): void {
  describe(title, () => {
    for (const row of rows) {
      it(`${row.printed} (${row.source}, ${row.where})`, () => {
        check(row);
      });
    }
  });
}

function check({ printed, got, within }: ReferenceRow): void {
  const value = got();
  const expected = Number(printed);
  const tolerance = within?.tolerance ?? halfUnit(printed);
  assert.ok(Number.isFinite(expected), `${printed} is not a number`);
  // The last bit of a number that lies just half a unit away must not decide.
  const difference = Math.abs(value - expected);
  assert.ok(
    difference <= tolerance * (1 + 1e-9),
    `${value} differs from ${printed} by ${difference}, more than ${tolerance}`,
  );
}
