import type { Point } from '../piles/layout.ts'

/** A layout folded along the axes about which it is its own mirror image: each point kept stands for its images. */
export type Fold = {
  readonly mirrors: { readonly x: boolean; readonly y: boolean }
  /** Indices of the points kept, in the quarter (or half) where the mirrored coordinates are not negative. */
  readonly kept: Int32Array
  /** For each point its kept one, by place in `kept`. */
  readonly of: Int32Array
  /** How many points each kept one stands for. */
  readonly count: Float64Array
  /** Whether each kept point lies on a mirror axis: its x, its y is 0. */
  readonly onX: readonly boolean[]
  readonly onY: readonly boolean[]
}

/** Coordinates are compared in units of this share of the layout's extent: a little above their rounding. */
const SAME = 1e-12

/** Finds the mirror axes x = 0 and y = 0 of points given about their centroid. */
export function foldOf(points: readonly Point[]): Fold {
  return attempt(points, true) ?? attempt(points, false)!
}

function attempt(points: readonly Point[], allowed: boolean): Fold | undefined {
  const extent = points.reduce((most, p) => Math.max(most, Math.abs(p.x), Math.abs(p.y)), 0)
  const grain = SAME * extent + Number.MIN_VALUE
  const round = (v: number) => Math.round(v / grain)
  const key = (x: number, y: number) => `${round(x) || 0},${round(y) || 0}`
  const places = new Map(points.map((p, i) => [key(p.x, p.y), i]))
  const find = (x: number, y: number) => places.get(key(x, y))
  const mirrored = (sx: number, sy: number) => points.every((p) => find(sx * p.x, sy * p.y) !== undefined)
  const mirrors = { x: allowed && mirrored(-1, 1), y: allowed && mirrored(1, -1) }
  const fold = (p: Point): Point => ({ x: mirrors.x ? Math.abs(p.x) : p.x, y: mirrors.y ? Math.abs(p.y) : p.y })
  const kept: number[] = []
  const placeOf = new Map<number, number>()
  const of = new Int32Array(points.length)
  const count: number[] = []
  for (const [i, p] of points.entries()) {
    const q = fold(p)
    const home = find(q.x, q.y) ?? i
    let place = placeOf.get(home)
    if (place === undefined) {
      place = kept.length
      placeOf.set(home, place)
      kept.push(home)
      count.push(0)
    }
    of[i] = place
    count[place]!++
  }
  const onX = kept.map((i) => mirrors.x && round(points[i]!.x) === 0)
  const onY = kept.map((i) => mirrors.y && round(points[i]!.y) === 0)
  // Rounding can split a mirror pair; then the layout is taken as it is.
  const whole = kept.every(
    (_, place) => count[place] === (mirrors.x && !onX[place] ? 2 : 1) * (mirrors.y && !onY[place] ? 2 : 1),
  )
  if (!whole && allowed) return undefined
  return { mirrors, onX, onY, kept: Int32Array.from(kept), of, count: Float64Array.from(count) }
}
