/** A way in which a rigid cap moves: the movement is v + x X + y Y at a point (X, Y) from the centroid. */
export type Mode = { readonly v: number; readonly x: number; readonly y: number }

/** Second moments below this share of the larger one mean a single line of piles. */
const LINE = 1e-12

/** Sinking, and turning along the principal axes in which the piles spread: two, the line's own, or none. */
export function planeModes(x: Float64Array, y: Float64Array, mirrored: boolean): Mode[] {
  let [xx, yy, xy] = [0, 0, 0]
  for (let i = 0; i < x.length; i++) {
    xx += x[i]! ** 2
    yy += y[i]! ** 2
    xy += x[i]! * y[i]!
  }
  // The axes of a layout's mirror images are principal; rounding must not turn them where the moments are equal.
  const angle = mirrored ? (xx >= yy ? 0 : Math.PI / 2) : 0.5 * Math.atan2(2 * xy, xx - yy)
  const u = { x: Math.cos(angle), y: Math.sin(angle) }
  const along = xx * u.x ** 2 + 2 * xy * u.x * u.y + yy * u.y ** 2
  const across = xx + yy - along
  const least = LINE * Math.max(along, across) + Number.MIN_VALUE
  const sinking = { v: 1, x: 0, y: 0 }
  if (!(along > least)) return [sinking]
  if (!(across > least)) return [sinking, { v: 0, ...u }]
  if (mirrored) return [sinking, { v: 0, x: 1, y: 0 }, { v: 0, x: 0, y: 1 }]
  return [sinking, { v: 0, ...u }, { v: 0, x: -u.y, y: u.x }]
}
