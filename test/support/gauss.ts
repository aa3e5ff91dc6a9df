/** Dense linear equations for the independent references. */

/**
 * Solves `matrix x = right` of `n` rows by elimination with partial pivoting; both are overwritten, `right` becomes x.
 * `matrix` is row by row. A singular matrix leaves values that are not finite.
 */
export function solveInPlace(matrix: Float64Array, right: Float64Array, n: number): void {
  for (let k = 0; k < n; k++) {
    let pivot = k;
    for (let i = k + 1; i < n; i++)
      if (Math.abs(matrix[i * n + k]!) > Math.abs(matrix[pivot * n + k]!)) pivot = i;
    if (pivot !== k) {
      for (let j = k; j < n; j++) {
        const swapped = matrix[k * n + j]!;
        matrix[k * n + j] = matrix[pivot * n + j]!;
        matrix[pivot * n + j] = swapped;
      }
      const swapped = right[k]!;
      right[k] = right[pivot]!;
      right[pivot] = swapped;
    }
    for (let i = k + 1; i < n; i++) {
      const factor = matrix[i * n + k]! / matrix[k * n + k]!;
      if (factor === 0) continue;
      for (let j = k + 1; j < n; j++) matrix[i * n + j] = matrix[i * n + j]! - factor * matrix[k * n + j]!;
      right[i] = right[i]! - factor * right[k]!;
    }
  }
  for (let k = n - 1; k >= 0; k--) {
    let sum = right[k]!;
    for (let j = k + 1; j < n; j++) sum -= matrix[k * n + j]! * right[j]!;
    right[k] = sum / matrix[k * n + k]!;
  }
}
