import { Delaunay } from 'd3-delaunay'
import type { Cap } from './schedule.ts'

export type Pair = { readonly a: number; readonly b: number; readonly distance: number }

/** Neighbouring caps: the Delaunay edges of their plan positions. Caps in one line are neighbours along it; one cap has none. */
export function neighbourPairs(caps: readonly Cap[]): Pair[] {
  if (caps.length < 2) return []
  const pair = (a: number, b: number): Pair => ({
    a: Math.min(a, b),
    b: Math.max(a, b),
    distance: Math.hypot(caps[a]!.x - caps[b]!.x, caps[a]!.y - caps[b]!.y),
  })
  const delaunay = Delaunay.from(
    caps,
    (c) => c.x,
    (c) => c.y,
  )
  const pairs: Pair[] = []
  if (delaunay.triangles.length === 0 || delaunay.triangles.every((t) => t < 0) || isLine(caps)) {
    const order = caps.map((_, i) => i).sort((i, j) => caps[i]!.x - caps[j]!.x || caps[i]!.y - caps[j]!.y)
    for (let i = 1; i < order.length; i++) pairs.push(pair(order[i - 1]!, order[i]!))
  } else {
    for (let i = 0; i < caps.length; i++) for (const j of delaunay.neighbors(i)) if (j > i) pairs.push(pair(i, j))
  }
  // Two caps in one place settle alike; a distance of zero gives no distortion.
  return pairs.filter((p) => p.distance > 0).sort((p, q) => p.a - q.a || p.b - q.b)
}

/** Caps whose offsets from the line through the two that stand farthest apart vanish against its length. */
function isLine(caps: readonly Cap[]): boolean {
  const a = caps[0]!
  const far = caps.reduce(
    (best, c) => (Math.hypot(c.x - a.x, c.y - a.y) > Math.hypot(best.x - a.x, best.y - a.y) ? c : best),
    a,
  )
  const length = Math.hypot(far.x - a.x, far.y - a.y)
  return caps.every(
    (c) => Math.abs((far.x - a.x) * (c.y - a.y) - (far.y - a.y) * (c.x - a.x)) <= 1e-9 * length * length,
  )
}
