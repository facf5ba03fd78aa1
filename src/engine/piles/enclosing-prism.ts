import { EngineFault, type Fault } from '../faults.ts'
import { statics } from '../sources/bibliography.ts'
import { formula } from '../trace/formula.ts'
import type { Sheet } from '../trace/sheet.ts'
import type { Term } from '../trace/term.ts'
import type { Point } from './layout.ts'

export const outerSide = formula({
  symbol: 'b',
  name: 'side of the enclosing rectangle',
  unit: 'm',
  text: 'e + d',
  where: { e: 'm', d: 'm' },
  source: statics('outer faces of the piles'),
})

export type Prism = { readonly breadth: Term<'m'>; readonly length: Term<'m'> }

/** So many pairs are told: a spacing that is too small makes every pile overlap. */
const MOST_PAIRS = 20

/** Refuses piles that overlap, each pair by their numbers. Gives the smallest spacing (Infinity for one pile). */
export function smallestSpacing(points: readonly Point[], width: number, pointer: string): number {
  // Sorted by x, only neighbours within the smallest distance so far are compared.
  const order = points.map((p, index) => ({ ...p, index })).sort((a, b) => a.x - b.x)
  const limit = width - 1e-9
  const overlaps: Fault[] = []
  let smallest = Number.POSITIVE_INFINITY
  for (let i = 0; i < order.length; i++) {
    for (let j = i + 1; j < order.length && order[j]!.x - order[i]!.x < Math.max(smallest, limit); j++) {
      const distance = Math.hypot(order[j]!.x - order[i]!.x, order[j]!.y - order[i]!.y)
      smallest = Math.min(smallest, distance)
      if (distance < limit && overlaps.length < MOST_PAIRS) {
        const [first, second] = [order[i]!.index + 1, order[j]!.index + 1].sort((a, b) => a - b) as [number, number]
        overlaps.push({ pointer, code: 'piles-overlap', facts: { first, second, spacing: distance, width, unit: 'm' } })
      }
    }
  }
  if (overlaps.length > 0) throw new EngineFault(overlaps)
  return smallest
}

/** Smallest-area rectangle around the outer faces of the piles, each `d` wide in every direction. */
export function enclosingPrism(sheet: Sheet, points: readonly Point[], d: Term<'m'>): Prism {
  const { along, across, angle } = smallestRectangle(points, d.value)
  const outside = Math.max(overshoot(points, angle, along), overshoot(points, angle + Math.PI / 2, across))
  const extent = (symbol: string, value: number) =>
    sheet.solution({
      symbol,
      name: 'extent of the pile axes along a side of the smallest rectangle',
      unit: 'm',
      value,
      method: 'convex hull, one side along each hull edge in turn',
      operands: [d],
      unknowns: [{ symbol: 'theta', value: angle, unit: 'rad' }],
      residuals: [{ name: 'pile axis outside the rectangle, m', value: outside }],
      tolerance: 1e-9,
      source: statics('smallest enclosing rectangle'),
    })
  const sides = [
    sheet.step(outerSide, { e: extent('e_1', along), d }, 'b_1'),
    sheet.step(outerSide, { e: extent('e_2', across), d }, 'b_2'),
  ]
  return {
    breadth: sheet.choice({ symbol: 'B', name: 'breadth of the block', unit: 'm' }, 'smallest', sides),
    length: sheet.choice({ symbol: 'L_g', name: 'length of the block', unit: 'm' }, 'largest', sides),
  }
}

const span = (points: readonly Point[], angle: number): [number, number] => {
  let low = Number.POSITIVE_INFINITY
  let high = Number.NEGATIVE_INFINITY
  for (const p of points) {
    const t = p.x * Math.cos(angle) + p.y * Math.sin(angle)
    if (t < low) low = t
    if (t > high) high = t
  }
  return [low, high]
}

/** How far the axes of all piles, not only those of the hull, reach beyond the extent found. */
function overshoot(points: readonly Point[], angle: number, extent: number): number {
  const [low, high] = span(points, angle)
  return Math.max(0, high - low - extent)
}

/** Between two hull edges the sides are concave in the angle, so the smallest area lies with a side along an edge. */
function smallestRectangle(points: readonly Point[], d: number): { along: number; across: number; angle: number } {
  const hull = convexHull(points)
  let best = { along: 0, across: 0, angle: 0 }
  let area = Number.POSITIVE_INFINITY
  for (let i = 0; i < hull.length; i++) {
    const a = hull[i]!
    const b = hull[(i + 1) % hull.length]!
    const angle = hull.length === 1 ? 0 : Math.atan2(b.y - a.y, b.x - a.x)
    const [low, high] = span(hull, angle)
    const [lowAcross, highAcross] = span(hull, angle + Math.PI / 2)
    const along = high - low
    const across = highAcross - lowAcross
    if ((along + d) * (across + d) < area * (1 - 1e-12)) {
      area = (along + d) * (across + d)
      best = { along, across, angle }
    }
  }
  return best
}

/** Andrew's monotone chain; a line gives its two ends, one pile itself. */
function convexHull(points: readonly Point[]): readonly Point[] {
  const sorted = [...points].sort((a, b) => a.x - b.x || a.y - b.y)
  if (sorted.length < 3) return sorted
  const half = (list: readonly Point[]): Point[] => {
    const out: Point[] = []
    for (const p of list) {
      while (out.length >= 2) {
        const [o, a] = [out[out.length - 2]!, out[out.length - 1]!]
        if ((a.x - o.x) * (p.y - o.y) - (a.y - o.y) * (p.x - o.x) > 0) break
        out.pop()
      }
      out.push(p)
    }
    return out.slice(0, -1)
  }
  return [...half(sorted), ...half(sorted.reverse())]
}
