/** Solves a·x = b for several right-hand sides by Gaussian elimination with partial pivoting; both are overwritten. */
export function linearSolve(a: readonly Float64Array[], b: readonly Float64Array[]): readonly Float64Array[] {
  const rows = a.map((row, index) => ({ row, right: b[index] ?? new Float64Array(0) }));
  for (let column = 0; column < rows.length; column += 1) {
    swap(rows, column, pivot(rows, column));
    const top = rows[column];
    if (!top) continue;
    for (const { row, right } of rows.slice(column + 1)) {
      const factor = (row[column] ?? 0) / (top.row[column] ?? 1);
      subtract(row, factor, top.row);
      subtract(right, factor, top.right);
    }
  }
  for (let column = rows.length - 1; column >= 0; column -= 1) {
    const bottom = rows[column];
    if (!bottom) continue;
    const scale = bottom.row[column] ?? 1;
    for (let k = 0; k < bottom.right.length; k += 1) bottom.right[k] = (bottom.right[k] ?? 0) / scale;
    for (const { row, right } of rows.slice(0, column)) subtract(right, row[column] ?? 0, bottom.right);
  }
  return rows.map(({ right }) => right);
}

interface Row {
  readonly row: Float64Array;
  readonly right: Float64Array;
}

function pivot(rows: readonly Row[], column: number): number {
  let best = column;
  for (let k = column + 1; k < rows.length; k += 1) if (size(rows, k, column) > size(rows, best, column)) best = k;
  return best;
}

function size(rows: readonly Row[], k: number, column: number): number {
  return Math.abs(rows[k]?.row[column] ?? 0);
}

function swap(rows: Row[], i: number, j: number): void {
  const [one, other] = [rows[i], rows[j]];
  if (one && other) [rows[i], rows[j]] = [other, one];
}

function subtract(from: Float64Array, factor: number, what: Float64Array): void {
  for (let k = 0; k < from.length; k += 1) from[k] = (from[k] ?? 0) - factor * (what[k] ?? 0);
}
