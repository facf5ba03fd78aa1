import { factor, solveFactored } from '../../numerics/cholesky.ts'
import type { Point } from '../../piles/layout.ts'
import type { CurvePoint } from './hyperbolic-pile.ts'

/** Settlement of one pile by its load and the slope of that curve, m and m/kN. */
export type PileCurve = (load: number) => { readonly settlement: number; readonly slope: number }

/** Beyond the last point of a curve the pile gives way at so many times its last slope. */
const GIVING = 50

/** A monotone cubic through the points (Fritsch & Carlson 1980); negative loads, which pull, keep the first slope. */
export function pileCurve(points: readonly CurvePoint[]): PileCurve {
  const n = points.length
  const secant = points.slice(1).map((p, i) => (p.settlement - points[i]!.settlement) / (p.load - points[i]!.load))
  const slope = points.map((_, i) => {
    const [left, right] = [secant[i - 1], secant[i]]
    if (left === undefined || right === undefined) return (left ?? right)!
    return left * right <= 0 ? 0 : (2 * left * right) / (left + right)
  })
  const [first, last] = [points[0]!, points[n - 1]!]
  return (load) => {
    if (load <= first.load) return { settlement: slope[0]! * load, slope: slope[0]! }
    if (load >= last.load) {
      const steep = GIVING * slope[n - 1]!
      return { settlement: last.settlement + steep * (load - last.load), slope: steep }
    }
    let i = 0
    while (points[i + 1]!.load < load) i++
    const [a, b] = [points[i]!, points[i + 1]!]
    const h = b.load - a.load
    const t = (load - a.load) / h
    const [m0, m1] = [slope[i]! * h, slope[i + 1]! * h]
    const settlement =
      (1 + 2 * t) * (1 - t) ** 2 * a.settlement +
      t * (1 - t) ** 2 * m0 +
      t * t * (3 - 2 * t) * b.settlement +
      t * t * (t - 1) * m1
    const change =
      6 * t * (t - 1) * a.settlement +
      (1 - t) * (1 - 3 * t) * m0 +
      6 * t * (1 - t) * b.settlement +
      t * (3 * t - 2) * m1
    return { settlement, slope: change / h }
  }
}

/**
 * Piles with softening springs of their own under a rigid cap; what one does to another stays elastic. Newton on the pile loads, the plane
 * eliminated by the modes in which the piles spread. `modes` are rows of movements at the piles, first the sinking one; `load` is about the
 * centroid, one number a mode.
 */
export function pushGroup(
  points: readonly Point[],
  own: PileCurve,
  elastic: (distance: number) => number,
  modes: readonly Float64Array[],
  load: readonly number[],
): { loads: Float64Array; movement: Float64Array; residual: number } {
  const n = points.length
  const m = modes.length
  const between = new Float64Array(n * n)
  for (let i = 0; i < n; i++)
    for (let j = 0; j < i; j++)
      between[i * n + j] = between[j * n + i] = elastic(
        Math.hypot(points[i]!.x - points[j]!.x, points[i]!.y - points[j]!.y),
      )
  const loads = new Float64Array(n).fill(load[0]! / n)
  const movement = new Float64Array(m)
  let residual = Number.POSITIVE_INFINITY
  for (let step = 0; step < 80 && residual > 1e-10; step++) {
    const tangent = Float64Array.from(between)
    const settled = new Float64Array(n)
    for (let i = 0; i < n; i++) {
      const { settlement, slope } = own(loads[i]!)
      tangent[i * n + i] = slope
      let sum = settlement
      for (let j = 0; j < n; j++) sum += between[i * n + j]! * loads[j]!
      settled[i] = sum
    }
    if (!factor(tangent, n)) break
    // loads + tangent^-1 (plane - settled) must give the load: m equations for the plane.
    const answer = modes.map((mode) => {
      const b = Float64Array.from(mode)
      solveFactored(tangent, n, b)
      return b
    })
    const back = Float64Array.from(settled)
    solveFactored(tangent, n, back)
    const small = new Float64Array(m * m)
    const right = new Float64Array(m)
    for (let a = 0; a < m; a++) {
      let sum = load[a]!
      for (let i = 0; i < n; i++) sum += modes[a]![i]! * (back[i]! - loads[i]!)
      right[a] = sum
      for (let b = 0; b < m; b++) for (let i = 0; i < n; i++) small[a * m + b]! += modes[a]![i]! * answer[b]![i]!
    }
    if (!factor(small, m)) break
    solveFactored(small, m, right)
    const change = new Float64Array(n)
    let [largest, size] = [0, 0]
    for (let i = 0; i < n; i++) {
      let sum = -back[i]!
      for (let a = 0; a < m; a++) sum += right[a]! * answer[a]![i]!
      change[i] = sum
      largest = Math.max(largest, Math.abs(sum))
      size = Math.max(size, Math.abs(loads[i]!))
    }
    // Where the curve bends sharply a whole step can swing: take half of it then.
    const damp = step > 12 ? 0.5 : 1
    for (let i = 0; i < n; i++) loads[i]! += damp * change[i]!
    movement.set(right)
    residual = largest / (size || 1)
  }
  return { loads, movement, residual }
}
