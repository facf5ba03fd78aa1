/** y = A x for each x; A symmetric, its lower triangle packed by rows: row i starts at i (i + 1) / 2. Three vectors share one reading. */
export function timesPacked(
  packed: Float64Array,
  n: number,
  x: readonly Float64Array[],
  y: readonly Float64Array[],
): void {
  if (x.length === 3) timesThree(packed, n, x, y)
  else for (let i = 0; i < x.length; i++) timesOne(packed, n, x[i]!, y[i]!)
}

function timesOne(packed: Float64Array, n: number, x: Float64Array, y: Float64Array): void {
  let o = 0
  for (let i = 0; i < n; i++) {
    const xi = x[i]!
    let sum = 0
    for (let j = 0; j < i; j++, o++) {
      const a = packed[o]!
      sum += a * x[j]!
      y[j]! += a * xi
    }
    y[i] = sum + packed[o++]! * xi
  }
}

function timesThree(
  packed: Float64Array,
  n: number,
  [x0, x1, x2]: readonly Float64Array[],
  [y0, y1, y2]: readonly Float64Array[],
): void {
  const [u, v, w] = [x0!, x1!, x2!]
  const [p, q, r] = [y0!, y1!, y2!]
  let o = 0
  for (let i = 0; i < n; i++) {
    const [ui, vi, wi] = [u[i]!, v[i]!, w[i]!]
    let [a0, a1, a2] = [0, 0, 0]
    for (let j = 0; j < i; j++, o++) {
      const a = packed[o]!
      a0 += a * u[j]!
      a1 += a * v[j]!
      a2 += a * w[j]!
      p[j]! += a * ui
      q[j]! += a * vi
      r[j]! += a * wi
    }
    const a = packed[o++]!
    p[i] = a0 + a * ui
    q[i] = a1 + a * vi
    r[i] = a2 + a * wi
  }
}
