/**
 * LU factorisation of a small matrix with symmetric structure and free values, kept in an envelope:
 * row `i` of the lower part and column `i` of the upper part start at `first[i]`.
 * No pivoting: nodal matrices have dominant diagonals. Structure after A. George, J. W. Liu,
 * "Computer Solution of Large Sparse Positive Definite Systems", 1981 (from memory: confirm).
 */
export class Envelope {
  readonly size: number;
  readonly first: Int32Array;
  /** Offset of row `i` in `lower` and of column `i` in `upper`. */
  readonly start: Int32Array;
  readonly lower: Float64Array;
  readonly upper: Float64Array;
  readonly diagonal: Float64Array;
  /** Reciprocals of the pivots after `factor`. */
  private readonly inverse: Float64Array;
  /** Room for one right-hand side. */
  readonly scratch: Float64Array;

  constructor(first: Int32Array) {
    const n = first.length;
    this.size = n;
    this.first = first;
    this.start = new Int32Array(n + 1);
    for (let i = 0; i < n; i++) this.start[i + 1] = this.start[i]! + (i - first[i]!);
    const profile = this.start[n]!;
    this.lower = new Float64Array(profile);
    this.upper = new Float64Array(profile);
    this.diagonal = new Float64Array(n);
    this.inverse = new Float64Array(n);
    this.scratch = new Float64Array(n);
  }

  /** Where the pair of entries (i, j) and (j, i) stands; -1 for the diagonal. */
  position(i: number, j: number): number {
    if (i === j) return -1;
    const row = Math.max(i, j);
    return this.start[row]! + Math.min(i, j) - this.first[row]!;
  }

  /** Adds to one entry, which must lie inside the envelope. */
  add(row: number, column: number, value: number): void {
    if (row === column) this.diagonal[row] = this.diagonal[row]! + value;
    else {
      const part = row > column ? this.lower : this.upper;
      const at = this.position(row, column);
      part[at] = part[at]! + value;
    }
  }

  copy(from: Envelope): void {
    this.lower.set(from.lower);
    this.upper.set(from.upper);
    this.diagonal.set(from.diagonal);
  }

  /** In place; false when a pivot vanishes or is not finite. */
  factor(): boolean {
    const { size, first, start, lower, upper, diagonal, inverse } = this;
    for (let i = 0; i < size; i++) {
      const fi = first[i]!;
      const si = start[i]! - fi;
      let pivot = diagonal[i]!;
      for (let j = fi; j < i; j++) {
        const fj = first[j]!;
        const sj = start[j]! - fj;
        let l = lower[si + j]!;
        let u = upper[si + j]!;
        for (let k = Math.max(fi, fj); k < j; k++) {
          l -= lower[si + k]! * upper[sj + k]!;
          u -= lower[sj + k]! * upper[si + k]!;
        }
        l *= inverse[j]!;
        lower[si + j] = l;
        upper[si + j] = u;
        pivot -= l * u;
      }
      if (!(Math.abs(pivot) > 0) || !Number.isFinite(pivot)) return false;
      inverse[i] = 1 / pivot;
    }
    return true;
  }

  /** Solves in place for the right-hand side that stands at `offset`. */
  solve(rhs: Float64Array, offset: number): void {
    const { size, first, start, lower, upper, inverse } = this;
    for (let i = 0; i < size; i++) {
      const fi = first[i]!;
      const si = start[i]! - fi;
      let sum = rhs[offset + i]!;
      for (let k = fi; k < i; k++) sum -= lower[si + k]! * rhs[offset + k]!;
      rhs[offset + i] = sum;
    }
    for (let i = size - 1; i >= 0; i--) {
      const fi = first[i]!;
      const si = start[i]! - fi;
      const x = rhs[offset + i]! * inverse[i]!;
      rhs[offset + i] = x;
      for (let k = fi; k < i; k++) rhs[offset + k] = rhs[offset + k]! - upper[si + k]! * x;
    }
  }
}
