/**
 * Cholesky factorisation in place of a symmetric positive definite matrix (row-major, n x n), lower triangle.
 * Returns false when a pivot is not positive. Cost n^3/3; relative error of a solve about n eps cond(A).
 */
export function factor(a: Float64Array, n: number): boolean {
  for (let j = 0; j < n; j++) {
    const rowJ = j * n
    let pivot = a[rowJ + j]!
    for (let k = 0; k < j; k++) pivot -= a[rowJ + k]! ** 2
    if (!(pivot > 0)) return false
    const root = Math.sqrt(pivot)
    a[rowJ + j] = root
    for (let i = j + 1; i < n; i++) {
      const rowI = i * n
      let sum = a[rowI + j]!
      for (let k = 0; k < j; k++) sum -= a[rowI + k]! * a[rowJ + k]!
      a[rowI + j] = sum / root
    }
  }
  return true
}

/** Solves L L^T x = b in place of b, with the factor of `factor`. */
export function solveFactored(l: Float64Array, n: number, b: Float64Array): void {
  for (let i = 0; i < n; i++) {
    let sum = b[i]!
    for (let k = 0; k < i; k++) sum -= l[i * n + k]! * b[k]!
    b[i] = sum / l[i * n + i]!
  }
  for (let i = n - 1; i >= 0; i--) {
    let sum = b[i]!
    for (let k = i + 1; k < n; k++) sum -= l[k * n + i]! * b[k]!
    b[i] = sum / l[i * n + i]!
  }
}
