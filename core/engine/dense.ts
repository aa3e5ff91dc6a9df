/**
 * Dense LU with partial pivoting for the few-by-few system of the periodic condition.
 */

/**
 * Solves `matrix * X = rhs` in place: `matrix` is n by n, row by row; `rhs` is n by `columns`, row by row.
 * Returns false when the matrix is singular to working precision; the contents are then meaningless.
 */
export function solveDense(matrix: Float64Array, rhs: Float64Array, n: number, columns: number): boolean {
  for (let k = 0; k < n; k++) {
    let best = k;
    for (let i = k + 1; i < n; i++)
      if (Math.abs(matrix[i * n + k]!) > Math.abs(matrix[best * n + k]!)) best = i;
    const pivot = matrix[best * n + k]!;
    if (!(Math.abs(pivot) > 0) || !Number.isFinite(pivot)) return false;
    if (best !== k) {
      swapRows(matrix, n, best, k);
      swapRows(rhs, columns, best, k);
    }
    for (let i = k + 1; i < n; i++) {
      const factor = matrix[i * n + k]! / pivot;
      if (factor === 0) continue;
      for (let j = k + 1; j < n; j++) matrix[i * n + j] = matrix[i * n + j]! - factor * matrix[k * n + j]!;
      for (let j = 0; j < columns; j++)
        rhs[i * columns + j] = rhs[i * columns + j]! - factor * rhs[k * columns + j]!;
    }
  }
  for (let i = n - 1; i >= 0; i--) {
    for (let j = 0; j < columns; j++) {
      let sum = rhs[i * columns + j]!;
      for (let k = i + 1; k < n; k++) sum -= matrix[i * n + k]! * rhs[k * columns + j]!;
      rhs[i * columns + j] = sum / matrix[i * n + i]!;
    }
  }
  return true;
}

function swapRows(values: Float64Array, width: number, a: number, b: number): void {
  for (let j = 0; j < width; j++) {
    const held = values[a * width + j]!;
    values[a * width + j] = values[b * width + j]!;
    values[b * width + j] = held;
  }
}
