/**
 * Solves A x = b for a symmetric positive definite matrix of order n, given by rows, by Cholesky's factors. A row whose pivot
 * is lost in rounding depends on the rows before it and is left out: its unknown becomes zero.
 */
export function solvePositive(matrix: Float64Array, right: Float64Array, n: number): Float64Array {
  const factor = Float64Array.from(matrix);
  const at = (row: number, column: number): number => factor[row * n + column] ?? 0;
  for (let row = 0; row < n; row++) {
    for (let column = 0; column <= row; column++) {
      let sum = at(row, column);
      for (let k = 0; k < column; k++) sum -= at(row, k) * at(column, k);
      const pivot = column === row ? pivotOf(sum, matrix[row * n + row] ?? 0) : at(column, column);
      factor[row * n + column] = column === row ? pivot : sum / pivot;
    }
  }
  const x = Float64Array.from(right);
  for (let row = 0; row < n; row++) {
    let sum = x[row] ?? 0;
    for (let k = 0; k < row; k++) sum -= at(row, k) * (x[k] ?? 0);
    x[row] = sum / at(row, row);
  }
  for (let row = n - 1; row >= 0; row--) {
    let sum = x[row] ?? 0;
    for (let k = row + 1; k < n; k++) sum -= at(k, row) * (x[k] ?? 0);
    x[row] = sum / at(row, row);
  }
  return x;
}

function pivotOf(squared: number, diagonal: number): number {
  return squared > 1e-13 * diagonal ? Math.sqrt(squared) : Infinity;
}
