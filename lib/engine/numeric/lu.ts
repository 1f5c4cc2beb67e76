/**
 * LU factorisation with partial pivoting of a dense row-major matrix, in place.
 *
 * Array reads in this folder are cast with `as number`: every index is bounded by the loop beside it, and a run-time
 * check in the innermost loop would cost more than the arithmetic.
 */

/**
 * Factorises the leading n × n block of `a` (row stride `stride`) in place and records the row order in `pivots`. A right
 * side `b` given with it is carried along, exchanged and eliminated with the rows, so that `backSubstitute` finishes it.
 * Returns false when a pivot is zero or not finite; the contents of `a` are then of no use.
 */
export function factorise(
  a: Float64Array,
  n: number,
  stride: number,
  pivots: Int32Array,
  b?: Float64Array,
): boolean {
  for (let k = 0; k < n; k++) {
    let best = k;
    let largest = Math.abs(a[k * stride + k] as number);
    for (let i = k + 1; i < n; i++) {
      const size = Math.abs(a[i * stride + k] as number);
      if (size > largest) {
        largest = size;
        best = i;
      }
    }
    if (!(largest > 0) || largest === Infinity) return false;
    pivots[k] = best;
    const rowK = k * stride;
    if (best !== k) {
      const rowBest = best * stride;
      for (let j = 0; j < n; j++) {
        const held = a[rowK + j] as number;
        a[rowK + j] = a[rowBest + j] as number;
        a[rowBest + j] = held;
      }
      if (b !== undefined) {
        const held = b[k] as number;
        b[k] = b[best] as number;
        b[best] = held;
      }
    }
    const inverse = 1 / (a[rowK + k] as number);
    for (let i = k + 1; i < n; i++) {
      const rowI = i * stride;
      const lower = a[rowI + k] as number;
      if (lower === 0) continue;
      const factor = lower * inverse;
      a[rowI + k] = factor;
      if (b !== undefined) b[i] = (b[i] as number) - factor * (b[k] as number);
      for (let j = k + 1; j < n; j++) {
        a[rowI + j] = (a[rowI + j] as number) - factor * (a[rowK + j] as number);
      }
    }
  }
  return true;
}

/** Solves a·x = b with the factors of `factorise`, leaving x in `b`. */
export function substitute(
  a: Float64Array,
  n: number,
  stride: number,
  pivots: Int32Array,
  b: Float64Array,
): void {
  for (let k = 0; k < n; k++) {
    const p = pivots[k] as number;
    if (p !== k) {
      const held = b[k] as number;
      b[k] = b[p] as number;
      b[p] = held;
    }
  }
  for (let i = 1; i < n; i++) {
    let sum = b[i] as number;
    const row = i * stride;
    for (let j = 0; j < i; j++) sum -= (a[row + j] as number) * (b[j] as number);
    b[i] = sum;
  }
  backSubstitute(a, n, stride, b);
}

/** Solves U·x = b with the upper factor, leaving x in `b`. */
export function backSubstitute(a: Float64Array, n: number, stride: number, b: Float64Array): void {
  for (let i = n - 1; i >= 0; i--) {
    let sum = b[i] as number;
    const row = i * stride;
    for (let j = i + 1; j < n; j++) sum -= (a[row + j] as number) * (b[j] as number);
    b[i] = sum / (a[row + i] as number);
  }
}
