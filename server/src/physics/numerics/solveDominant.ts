/**
 * Solves n linear equations whose matrix is diagonally dominant, which needs no pivoting (Gauss–Jordan). Each row holds its
 * coefficients and, last, its right-hand side; the last column becomes the solution.
 */
export function solveDominant(rows: Float64Array, n: number): void {
  const width = n + 1;
  for (let pivot = 0; pivot < n; pivot++) {
    const inverse = 1 / at(rows, pivot * width + pivot);
    for (let column = pivot; column < width; column++) {
      rows[pivot * width + column] = at(rows, pivot * width + column) * inverse;
    }
    for (let row = 0; row < n; row++) {
      const factor = at(rows, row * width + pivot);
      if (row === pivot || factor === 0) continue;
      for (let column = pivot; column < width; column++) {
        rows[row * width + column] = at(rows, row * width + column) - factor * at(rows, pivot * width + column);
      }
    }
  }
}

function at(values: Float64Array, index: number): number {
  return values[index] ?? 0;
}
