import { Delaunay } from 'd3-delaunay'

export type Spot = { readonly x: number; readonly y: number; readonly value: number }
export type Contour = {
  readonly level: number
  readonly segments: readonly (readonly [number, number, number, number])[]
}

/**
 * Lines of equal value between spots, straight within each Delaunay triangle: what plane interpolation between neighbours
 * gives, and nothing outside them. Spots in one line have no triangle and so no contour.
 */
export function contours(spots: readonly Spot[], levels: readonly number[]): Contour[] {
  if (spots.length < 3) return []
  const { triangles } = Delaunay.from(
    spots,
    (s) => s.x,
    (s) => s.y,
  )
  return levels.flatMap((level): Contour[] => {
    const segments: [number, number, number, number][] = []
    for (let i = 0; i < triangles.length; i += 3) {
      const corners = [0, 1, 2].map((k) => spots[triangles[i + k]!]!)
      const cut = corners.flatMap((a, k) => crossing(a, corners[(k + 1) % 3]!, level))
      const [p, q] = cut
      if (p && q && (p[0] !== q[0] || p[1] !== q[1])) segments.push([p[0], p[1], q[0], q[1]])
    }
    return segments.length === 0 ? [] : [{ level, segments }]
  })
}

/** A corner that lies on the level counts as above it, so that each triangle is cut twice or not at all. */
function crossing(a: Spot, b: Spot, level: number): [number, number][] {
  if (a.value >= level === b.value >= level) return []
  const share = (level - a.value) / (b.value - a.value)
  return [[a.x + share * (b.x - a.x), a.y + share * (b.y - a.y)]]
}
