/** What conjugate gradients need of a symmetric positive definite matrix and of an approximation to its inverse. */
export type Operator = (x: readonly Float64Array[], y: readonly Float64Array[]) => void
export type Preconditioner = (r: Float64Array, z: Float64Array) => void

/** Rounding may stop a residual above its tolerance; above this it is no answer. */
const ACCEPTED = 1e-9

export type Solved = { readonly steps: number; readonly residual: number }

/**
 * Preconditioned conjugate gradients for several right-hand sides in step, so that a product reads the matrix once for all.
 * Solutions come in `x` (zero at the start). Ends when every residual is below `tolerance` of its right-hand side;
 * undefined when a direction shows that the matrix is not positive definite, or when the steps end above `ACCEPTED`.
 */
export function conjugateGradient(
  multiply: Operator,
  precondition: Preconditioner,
  b: readonly Float64Array[],
  x: readonly Float64Array[],
  tolerance = 1e-11,
  most = 500,
): Solved | undefined {
  const n = b[0]!.length
  const blank = () => b.map(() => new Float64Array(n))
  const [p, q, z] = [blank(), blank(), blank()]
  const r = b.map((v) => Float64Array.from(v))
  const size = b.map((v) => Math.sqrt(dot(v, v)) || 1)
  const rho = b.map((_, s) => {
    precondition(r[s]!, z[s]!)
    p[s]!.set(z[s]!)
    return dot(r[s]!, z[s]!)
  })
  const left = () => r.reduce((worst, v, s) => Math.max(worst, Math.sqrt(dot(v, v)) / size[s]!), 0)
  let residual = left()
  let steps = 0
  for (; residual > tolerance && steps < most; steps++) {
    multiply(p, q)
    for (let s = 0; s < b.length; s++) {
      const [ps, qs, rs, zs, xs] = [p[s]!, q[s]!, r[s]!, z[s]!, x[s]!]
      if (rho[s] === 0) continue
      const curve = dot(ps, qs)
      if (!(curve > 0)) return undefined
      const alpha = rho[s]! / curve
      for (let i = 0; i < n; i++) {
        xs[i]! += alpha * ps[i]!
        rs[i]! -= alpha * qs[i]!
      }
      precondition(rs, zs)
      const next = dot(rs, zs)
      const beta = next / rho[s]!
      rho[s] = next
      for (let i = 0; i < n; i++) ps[i] = zs[i]! + beta * ps[i]!
    }
    residual = left()
  }
  return residual <= ACCEPTED ? { steps, residual } : undefined
}

export function dot(a: Float64Array, b: Float64Array): number {
  let sum = 0
  for (let i = 0; i < a.length; i++) sum += a[i]! * b[i]!
  return sum
}
