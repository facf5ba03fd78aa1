import { Delaunay } from 'd3-delaunay'
import type { Cap } from './schedule.ts'

export type Pair = { readonly a: number; readonly b: number; readonly distance: number }
/** A plan position and the caps that stand there, in the order of the schedule. */
type Place = { readonly x: number; readonly y: number; readonly caps: readonly number[] }

/**
 * Neighbouring caps: the Delaunay edges of their plan positions, in rising order of a, then b. Caps in one line are
 * neighbours along it; one cap has none. Of several caps in one place each is a neighbour of the first cap of each
 * neighbouring place; among themselves they are none, since a distance of zero gives no distortion.
 */
export function neighbourPairs(caps: readonly Cap[]): Pair[] {
  const places = placesOf(caps)
  const pairs = new Map<string, Pair>()
  const join = (i: number, j: number, distance: number) => {
    const [a, b] = i < j ? [i, j] : [j, i]
    pairs.set(`${a} ${b}`, { a, b, distance })
  }
  for (const [i, j] of edges(places)) {
    const [p, q] = [places[i]!, places[j]!]
    const distance = Math.hypot(p.x - q.x, p.y - q.y)
    for (const cap of p.caps) join(cap, q.caps[0]!, distance)
    for (const cap of q.caps) join(cap, p.caps[0]!, distance)
  }
  return [...pairs.values()].sort((p, q) => p.a - q.a || p.b - q.b)
}

/** Distinct positions: the triangulation leaves a second point in one place without any edge. */
function placesOf(caps: readonly Cap[]): Place[] {
  const places = new Map<string, Place & { readonly caps: number[] }>()
  for (const [i, { x, y }] of caps.entries()) {
    const known = places.get(`${x} ${y}`)
    if (known) known.caps.push(i)
    else places.set(`${x} ${y}`, { x, y, caps: [i] })
  }
  return [...places.values()]
}

function edges(places: readonly Place[]): (readonly [number, number])[] {
  if (isLine(places)) {
    const order = places.map((_, i) => i).sort((i, j) => places[i]!.x - places[j]!.x || places[i]!.y - places[j]!.y)
    return order.slice(1).map((j, k) => [order[k]!, j])
  }
  const delaunay = Delaunay.from(
    places,
    (p) => p.x,
    (p) => p.y,
  )
  return places.flatMap((_, i) => [...delaunay.neighbors(i)].filter((j) => j > i).map((j) => [i, j] as const))
}

/** Places whose offsets from the line through the first and the one farthest from it vanish against its length. */
function isLine(places: readonly Place[]): boolean {
  if (places.length < 3) return true
  const a = places[0]!
  const from = (p: Place) => Math.hypot(p.x - a.x, p.y - a.y)
  const far = places.reduce((best, p) => (from(p) > from(best) ? p : best), a)
  const length = from(far)
  return places.every(
    (p) => Math.abs((far.x - a.x) * (p.y - a.y) - (far.y - a.y) * (p.x - a.x)) <= 1e-9 * length * length,
  )
}
