import { refuse } from '../faults.ts'
import { factor, solveFactored } from '../numerics/cholesky.ts'
import type { Point } from '../piles/layout.ts'

/** Loads at the cap's origin: kN and kN.m, pressing signs. */
export type CapLoad = { readonly V: number; readonly Mx: number; readonly My: number }
/** A plane of settlements: at the centroid (m) and its slopes. */
export type Plane = { readonly centre: number; readonly alongX: number; readonly alongY: number }

/** A group of elastic piles prepared once: interaction factored, plane stiffness ready for any load. */
export type ElasticGroup = {
  readonly points: readonly Point[]
  readonly centroid: Point
  /** Flexibility of the plane for V, My, Mx at the centroid, 3 x 3 row-major: settlement, slope along x, slope along y. */
  readonly flexibility: Float64Array
  /** Pile loads for a plane of settlements. */
  readonly pileLoads: (plane: Plane) => Float64Array
  /** Settlements of piles under given loads, m. */
  readonly settlements: (loads: Float64Array) => Float64Array
  readonly plane: (load: CapLoad, pointer: string) => Plane
  /** Refuses a moment about an axis across which no pile stands. */
  readonly assertTaken: (load: CapLoad, pointer: string) => void
}

/** Second moments below this share of the larger one mean a single line of piles. */
const LINE = 1e-12

/** Prepares a group from the stiffness of one pile (kN/m) and the interaction factor at a spacing. Cost n^3/3. */
export function elasticGroup(
  points: readonly Point[],
  stiffness: number,
  interaction: (spacing: number) => number,
): ElasticGroup {
  const n = points.length
  const centroid = { x: points.reduce((s, p) => s + p.x, 0) / n, y: points.reduce((s, p) => s + p.y, 0) / n }
  const x = points.map((p) => p.x - centroid.x)
  const y = points.map((p) => p.y - centroid.y)
  const matrix = new Float64Array(n * n)
  for (let i = 0; i < n; i++) {
    for (let j = 0; j <= i; j++) {
      const alpha = i === j ? 1 : interaction(Math.hypot(x[i]! - x[j]!, y[i]! - y[j]!))
      matrix[i * n + j] = alpha / stiffness
      matrix[j * n + i] = alpha / stiffness
    }
  }
  const factored = Float64Array.from(matrix)
  if (!factor(factored, n)) refuse('not-finite', '/layout', { symbol: 'group flexibility' })
  // Modes that the layout can take: sinking, and turning about the principal axes along which the piles spread.
  const axes = principalAxes(x, y)
  const modes = [
    new Float64Array(n).fill(1),
    ...axes.map((u) => Float64Array.from(x, (xi, i) => xi * u.x + y[i]! * u.y)),
  ]
  const unit = modes.map((mode) => {
    const b = Float64Array.from(mode)
    solveFactored(factored, n, b)
    return b
  })
  const m = modes.length
  const inverse = invert(
    Float64Array.from({ length: m * m }, (_, k) => dot(modes[Math.floor(k / m)]!, unit[k % m]!)),
    m,
  )
  // From modes to V, My, Mx: the slope along an axis u adds u.x to alongX and u.y to alongY.
  const direction = [{ v: 1, x: 0, y: 0 }, ...axes.map((u) => ({ v: 0, x: u.x, y: u.y }))]
  const flexibility = new Float64Array(9)
  for (let a = 0; a < m; a++) {
    for (let b = 0; b < m; b++) {
      const [p, q] = [direction[a]!, direction[b]!]
      const rows = [p.v, p.x, p.y]
      const columns = [q.v, q.x, q.y]
      for (let r = 0; r < 3; r++)
        for (let c = 0; c < 3; c++) flexibility[r * 3 + c]! += rows[r]! * columns[c]! * inverse[a * m + b]!
    }
  }
  const settlements = (loads: Float64Array) =>
    Float64Array.from({ length: n }, (_, i) => dot(matrix.subarray(i * n, (i + 1) * n), loads))
  const atCentroid = (load: CapLoad) => ({ Mx: load.Mx - load.V * centroid.y, My: load.My - load.V * centroid.x })
  const reach = Math.max(...points.map((p) => Math.hypot(p.x, p.y)))
  const assertTaken = (load: CapLoad, pointer: string) => {
    if (axes.length === 2) return
    const { Mx, My } = atCentroid(load)
    const [u] = axes
    const left = u ? Math.abs(My * -u.y + Mx * u.x) : Math.hypot(Mx, My)
    // V on a line that passes the origin by rounding only leaves a moment of rounding.
    const size = Math.hypot(load.Mx, load.My) + Math.abs(load.V) * reach
    if (left > 1e-9 * size) refuse('line-cannot-take-moment', pointer, { moment: left, piles: n })
  }
  return {
    points,
    centroid,
    flexibility,
    settlements,
    pileLoads: (plane) => {
      const b = Float64Array.from(x, (xi, i) => plane.centre + plane.alongX * xi + plane.alongY * y[i]!)
      solveFactored(factored, n, b)
      return b
    },
    assertTaken,
    plane: (load, pointer) => {
      assertTaken(load, pointer)
      const { Mx, My } = atCentroid(load)
      const f = (r: number) =>
        flexibility[r * 3]! * load.V + flexibility[r * 3 + 1]! * My + flexibility[r * 3 + 2]! * Mx
      return { centre: f(0), alongX: f(1), alongY: f(2) }
    },
  }
}

function principalAxes(x: readonly number[], y: readonly number[]): Point[] {
  const xx = x.reduce((s, v) => s + v * v, 0)
  const yy = y.reduce((s, v) => s + v * v, 0)
  const xy = x.reduce((s, v, i) => s + v * y[i]!, 0)
  const angle = 0.5 * Math.atan2(2 * xy, xx - yy)
  const u = { x: Math.cos(angle), y: Math.sin(angle) }
  const along = xx * u.x ** 2 + 2 * xy * u.x * u.y + yy * u.y ** 2
  const across = xx + yy - along
  const least = LINE * Math.max(along, across) + Number.MIN_VALUE
  return [...(along > least ? [u] : []), ...(across > least ? [{ x: -u.y, y: u.x }] : [])]
}

const dot = (a: Float64Array, b: Float64Array): number => {
  let sum = 0
  for (let i = 0; i < a.length; i++) sum += a[i]! * b[i]!
  return sum
}

/** Inverse of a symmetric positive definite matrix of a few rows. */
function invert(a: Float64Array, n: number): Float64Array {
  const l = Float64Array.from(a)
  if (!factor(l, n)) refuse('not-finite', '/layout', { symbol: 'cap stiffness' })
  const out = new Float64Array(n * n)
  for (let c = 0; c < n; c++) {
    const b = new Float64Array(n)
    b[c] = 1
    solveFactored(l, n, b)
    for (let r = 0; r < n; r++) out[r * n + c] = b[r]!
  }
  return out
}
