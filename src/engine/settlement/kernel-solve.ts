import { refuse } from '../faults.ts'
import { factor, solveFactored } from '../numerics/cholesky.ts'
import { conjugateGradient } from '../numerics/conjugate-gradient.ts'
import { LocalInverse } from '../numerics/local-inverse.ts'
import { timesPacked } from '../numerics/packed-symmetric.ts'
import type { Point } from '../piles/layout.ts'
import type { Fold } from './mirror-fold.ts'
import type { Mode } from './plane-modes.ts'

/** Up to so many unknowns Cholesky is the faster way. */
const DIRECT = 160

/** Piles' answers to a unit movement of each mode, and the largest residual of the solves. */
export type ModeLoads = { readonly loads: readonly Float64Array[]; readonly residual: number; readonly steps: number }

/** Whether a mode keeps (1) or turns (-1) its sign under the mirrors of x and of y. */
const parity = (mode: Mode) =>
  mode.v === 1 ? { x: 1, y: 1 } : Math.abs(mode.x) > Math.abs(mode.y) ? { x: -1, y: 1 } : { x: 1, y: -1 }

/**
 * Solves K p = mode for each mode, K_ij = entry(distance of i and j) symmetric positive definite. Mirror images of the layout are
 * folded away: a doubly symmetric one costs three systems of a quarter of the size. Large systems by conjugate gradients.
 */
export function solveModes(
  points: readonly Point[],
  fold: Fold,
  modes: readonly Mode[],
  entry: (distance: number) => number,
): ModeLoads {
  const classes = new Map<string, { x: number; y: number; modes: number[] }>()
  for (const [i, mode] of modes.entries()) {
    const p = parity(mode)
    const sign = { x: fold.mirrors.x ? p.x : 1, y: fold.mirrors.y ? p.y : 1 }
    const key = `${sign.x},${sign.y}`
    const known = classes.get(key)
    if (known) known.modes.push(i)
    else classes.set(key, { ...sign, modes: [i] })
  }
  const groups = [...classes.values()]
  const matrices = foldedMatrices(points, fold, groups, entry)
  const loads: Float64Array[] = []
  let [residual, steps] = [0, 0]
  for (const [c, group] of groups.entries()) {
    const rhs = group.modes.map((i) => {
      const { v, x, y } = modes[i]!
      return Float64Array.from(fold.kept, (k, place) => fold.count[place]! * (v + x * points[k]!.x + y * points[k]!.y))
    })
    const solved = solveClass(points, fold, matrices[c]!, rhs)
    residual = Math.max(residual, solved.residual)
    steps = Math.max(steps, solved.steps)
    for (const [r, i] of group.modes.entries())
      loads[i] = Float64Array.from(points, (p, j) => signOf(p, group) * solved.x[r]![fold.of[j]!]!)
  }
  return { loads, residual, steps }
}

const signOf = (p: Point, sign: { x: number; y: number }) =>
  (sign.x < 0 && p.x < 0 ? -1 : 1) * (sign.y < 0 && p.y < 0 ? -1 : 1)

/** One packed lower triangle per class: row a, column b is the sum over the images of b, times how many points a stands for. */
function foldedMatrices(
  points: readonly Point[],
  fold: Fold,
  groups: readonly { x: number; y: number }[],
  entry: (distance: number) => number,
): Float64Array[] {
  const n = fold.kept.length
  const out = groups.map(() => new Float64Array((n * (n + 1)) / 2))
  // Images in the order of the points they fold to, with their signs in each class.
  const order = Int32Array.from(points, (_, j) => j).sort((i, j) => fold.of[i]! - fold.of[j]!)
  const x = Float64Array.from(order, (j) => points[j]!.x)
  const y = Float64Array.from(order, (j) => points[j]!.y)
  const home = Int32Array.from(order, (j) => fold.of[j]!)
  for (const [g, group] of groups.entries()) {
    const sign = Float64Array.from(order, (j) => signOf(points[j]!, group))
    const packed = out[g]!
    for (let a = 0; a < n; a++) {
      const { x: px, y: py } = points[fold.kept[a]!]!
      const row = (a * (a + 1)) / 2
      const count = fold.count[a]!
      for (let j = 0; j < home.length && home[j]! <= a; j++) {
        const dx = px - x[j]!
        const dy = py - y[j]!
        packed[row + home[j]!]! += count * sign[j]! * entry(Math.sqrt(dx * dx + dy * dy))
      }
    }
    // A point on an axis about which the class is odd does not move: it stands alone.
    for (let a = 0; a < n; a++) {
      if (!still(fold, a, group)) continue
      for (let b = 0; b < n; b++) packed[a >= b ? (a * (a + 1)) / 2 + b : (b * (b + 1)) / 2 + a] = a === b ? 1 : 0
    }
  }
  return out
}

/** Whether a kept point lies on a mirror axis about which the class is odd. */
const still = ({ onX, onY }: Fold, place: number, sign: { x: number; y: number }): boolean =>
  (sign.x < 0 && onX[place]!) || (sign.y < 0 && onY[place]!)

function largestResidual(
  packed: Float64Array,
  n: number,
  x: readonly Float64Array[],
  b: readonly Float64Array[],
): number {
  const product = x.map(() => new Float64Array(n))
  timesPacked(packed, n, x, product)
  let most = 0
  for (const [s, side] of b.entries()) {
    const size = side.reduce((m, v) => Math.max(m, Math.abs(v)), 0)
    for (let i = 0; i < n; i++) most = Math.max(most, Math.abs(product[s]![i]! - side[i]!) / size)
  }
  return most
}

function solveClass(points: readonly Point[], fold: Fold, packed: Float64Array, rhs: readonly Float64Array[]) {
  const n = fold.kept.length
  const at = (i: number, j: number) => packed[i >= j ? (i * (i + 1)) / 2 + j : (j * (j + 1)) / 2 + i]!
  if (n <= DIRECT) {
    // Only the lower triangle is read.
    const full = new Float64Array(n * n)
    for (let i = 0, o = 0; i < n; i++) for (let j = 0; j <= i; j++, o++) full[i * n + j] = packed[o]!
    if (!factor(full, n)) refuse('not-finite', '/layout', { symbol: 'group flexibility' })
    const x = rhs.map((b) => {
      const s = Float64Array.from(b)
      solveFactored(full, n, s)
      return s
    })
    return { x, residual: largestResidual(packed, n, x, rhs), steps: 0 }
  }
  const xs = Float64Array.from(fold.kept, (k) => points[k]!.x)
  const ys = Float64Array.from(fold.kept, (k) => points[k]!.y)
  const inverse = new LocalInverse(xs, ys, at)
  const x = rhs.map(() => new Float64Array(n))
  const solved = inverse.definite
    ? conjugateGradient(
        (p, q) => timesPacked(packed, n, p, q),
        (r, z) => inverse.apply(r, z),
        rhs,
        x,
      )
    : undefined
  if (!solved) return refuse('not-finite', '/layout', { symbol: 'group flexibility' })
  return { x, ...solved }
}
