import { refuse } from '../faults.ts'
import { centroidOf, type Point } from './layout.ts'

/** Pile loads under a rigid cap with pinned heads: P_i = V/n + a x_i + b y_i about the centroid of the piles. */
export type RigidCap = {
  readonly centroid: Point
  /** Slopes a (kN/m along x) and b (along y) of the load plane for V, Mx, My at the cap's origin. */
  readonly plane: (
    load: { V: number; Mx: number; My: number },
    pointer: string,
  ) => { mean: number; a: number; b: number }
  readonly load: (plane: { mean: number; a: number; b: number }, index: number) => number
}

/** Whether piles with these second moments about their centroid spread in a plane, not along one line only. */
export const spreads = (xx: number, yy: number, xy: number): boolean => xx * yy - xy * xy > 1e-12 * (xx + yy) ** 2

/** Prepares a layout once. A line of piles takes no moment about itself: refused with the moment named. */
export function rigidCap(points: readonly Point[]): RigidCap {
  const n = points.length
  const centroid = centroidOf(points)
  const at = points.map((p) => ({ x: p.x - centroid.x, y: p.y - centroid.y }))
  const [xx, yy, xy] = at.reduce(
    ([a, b, c], p) => [a + p.x * p.x, b + p.y * p.y, c + p.x * p.y] as [number, number, number],
    [0, 0, 0] as [number, number, number],
  )
  const total = xx + yy
  const determinant = xx * yy - xy * xy
  const spread = spreads(xx, yy, xy)
  const reach = Math.max(...points.map((p) => Math.hypot(p.x, p.y)))
  return {
    centroid,
    plane: (load, pointer) => {
      const My = load.My - load.V * centroid.x
      const Mx = load.Mx - load.V * centroid.y
      const mean = load.V / n
      if (spread) return { mean, a: (My * yy - Mx * xy) / determinant, b: (Mx * xx - My * xy) / determinant }
      // One line of piles (or one pile): minimum norm along the line, nothing across it.
      const along = total > 0 ? (My * xx + Mx * xy) / (total * total) : 0
      const across = total > 0 ? (My * xy + Mx * yy) / (total * total) : 0
      const left = Math.hypot(My - (xx * along + xy * across), Mx - (xy * along + yy * across))
      // V on a line that passes the origin by rounding only leaves a moment of rounding.
      const size = Math.hypot(load.Mx, load.My) + Math.abs(load.V) * reach
      if (left > 1e-9 * size) refuse('line-cannot-take-moment', pointer, { moment: left, piles: n })
      return { mean, a: along, b: across }
    },
    load: (plane, i) => plane.mean + plane.a * at[i]!.x + plane.b * at[i]!.y,
  }
}
